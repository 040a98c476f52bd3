import { LengthField } from '@/components/home/length-field';
import { RadioCourses } from '@/components/ui/choice-courses';
import { type CoverValues } from '@/lib/home/form-values';
import { type Cover, covers, keysOf, type UnitSystem } from '@/lib/schemas/vocabulary';
import { coverShares } from '@/lib/schemas/wall-cover';

const hints: Record<Cover, string> = {
  none: 'Only the eave',
  porch: 'A roof against the wall, lower or deeper than the eave',
  deck: 'Boards overhead that people walk on',
};

const shareWords: Record<(typeof coverShares)[number], string> = { '0.25': 'A quarter', '0.5': 'Half', '0.75': 'Three quarters', '1': 'All of it' };

const usual = (units: UnitSystem) =>
  units === 'us'
    ? { depth: [{ label: '6 ft', value: '6' }, { label: '8 ft', value: '8' }, { label: '10 ft', value: '10' }], height: [{ label: '7 ft', value: '7' }, { label: '8 ft', value: '8' }] }
    : { depth: [{ label: '1.8 m', value: '1.8' }, { label: '2.4 m', value: '2.4' }, { label: '3 m', value: '3' }], height: [{ label: '2.1 m', value: '2.1' }, { label: '2.4 m', value: '2.4' }] };

/** A porch roof or deck over part of a wall. What was entered stays in the form, out of sight, while there is none. */
export function CoverFields({ values, units }: { values: CoverValues; units: UnitSystem }) {
  const presets = usual(units);
  return (
    <div className="group/over grid gap-5">
      <RadioCourses legend="Is there a roof or a deck over it?" name="cover" options={keysOf(covers).map((value) => ({ value, label: covers[value], hint: hints[value] }))} defaultValue={values.cover} />
      <div className="grid gap-5 group-has-[input[value=none]:checked]/over:hidden">
        <div className="grid items-start gap-5 sm:grid-cols-2">
          <LengthField label="How deep is it?" name="coverDepth" units={units} defaultValue={values.coverDepth} hint="From the wall out to its edge." presets={presets.depth} />
          <LengthField label="How high is its underside?" name="coverHeight" units={units} defaultValue={values.coverHeight} hint="Above the wall’s foot." presets={presets.height} />
        </div>
        <RadioCourses inRow legend="How much of the wall’s width is under it?" name="coverShare" options={coverShares.map((value) => ({ value, label: shareWords[value] }))} defaultValue={values.coverShare} />
      </div>
    </div>
  );
}

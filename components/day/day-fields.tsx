import { RadioCourses } from '@/components/ui/choice-courses';
import { Field, SelectField } from '@/components/ui/field';
import { type FormValues } from '@/lib/schemas/action-state';
import { stainBases, type UnitSystem } from '@/lib/schemas/vocabulary';
import { wallSuns } from '@/lib/day/day-form';

/** What one knows standing beside the wall with a weather report. */
export function DayFields({ values, units }: { values: FormValues; units: UnitSystem }) {
  const was = (name: string) => (typeof values[name] === 'string' ? values[name] : undefined);
  const degrees = units === 'us' ? '°F' : '°C';
  return (
    <>
      <RadioCourses legend="What is to be done?" name="work" inRow defaultValue={was('work') ?? 'restain'} options={[{ value: 'restain', label: 'Restain' }, { value: 'recaulk', label: 'Recaulk' }]} />
      <div className="grid gap-6 sm:grid-cols-2">
        <Field label="Temperature now" name="temperature" unit={degrees} inputMode="text" autoComplete="off" defaultValue={was('temperature')} />
        <Field label="Humidity now" name="humidity" unit="%" inputMode="decimal" autoComplete="off" defaultValue={was('humidity')} />
        <Field label="Lowest in the next 24 hours" hint="Left empty, the dew point stands for it." name="low" unit={degrees} inputMode="text" autoComplete="off" optional defaultValue={was('low')} />
        <Field label="Wood moisture" hint="With a pin meter, where the wall is wettest." name="moisture" unit="%" inputMode="decimal" autoComplete="off" optional defaultValue={was('moisture')} />
        <Field label="Hours since rain" hint="0 while it rains; empty after days without." name="since" unit="h" inputMode="decimal" autoComplete="off" optional defaultValue={was('since')} />
        <Field label="Hours until rain" hint="Empty when none is expected." name="until" unit="h" inputMode="decimal" autoComplete="off" optional defaultValue={was('until')} />
      </div>
      <SelectField label="Stain" hint="Its can says it. Caulk needs no answer here." name="base" options={stainBases} defaultValue={was('base')} />
      <SelectField label="The wall to begin on" name="sun" options={wallSuns} empty="Not looked at yet" optional defaultValue={was('sun')} />
    </>
  );
}

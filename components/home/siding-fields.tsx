import { Field, SelectField } from '@/components/ui/field';
import { woods } from '@/lib/schemas/vocabulary';

export type SidingValues = { sidingNominalIn: string; wood: string; yearBuilt: string };

/** The most common log siding; a start that the owner corrects. Our own choice. */
export const usualSiding: SidingValues = { sidingNominalIn: '8', wood: 'pine-fir-spruce', yearBuilt: '' };

const nominals = { '6': '6 in nominal', '8': '8 in nominal', '10': '10 in nominal' };

export function SidingFields({ values = usualSiding }: { values?: SidingValues }) {
  return (
    <div className="grid items-end gap-5 sm:grid-cols-3">
      <SelectField label="Log siding" name="sidingNominalIn" hint="As it is sold." options={nominals} defaultValue={values.sidingNominalIn} />
      <SelectField label="Wood" name="wood" hint="As far as you know." options={woods} defaultValue={values.wood} />
      <Field label="Year built" name="yearBuilt" optional inputMode="numeric" maxLength={4} hint="Before 1978: lead." defaultValue={values.yearBuilt} />
    </div>
  );
}

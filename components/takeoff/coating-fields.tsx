'use client';

import { RadioCourses } from '@/components/ui/choice-courses';
import { Field, SelectField } from '@/components/ui/field';
import { type FormValues } from '@/lib/schemas/action-state';
import { typedIn } from '@/lib/schemas/calculator-values';
import { textures, type UnitSystem } from '@/lib/schemas/vocabulary';
import { sidingProfiles } from '@/lib/takeoff';

const sidings = sidingProfiles.map(({ nominalIn }) => ({ value: String(nominalIn), label: `${nominalIn} in siding` }));
const coats = [
  { value: '1', label: 'One coat' },
  { value: '2', label: 'Two coats' },
  { value: '3', label: 'Three coats' },
];

/** The siding, its surface, and what goes on it. */
export function CoatingFields({ units, values }: { units: UnitSystem; values: FormValues }) {
  const us = units === 'us';
  const number = (name: string) => ({ name, inputMode: 'decimal', autoComplete: 'off', defaultValue: typedIn(values, name) }) as const;
  const coverageUnit = us ? 'ft²/gal' : 'm²/L';
  return (
    <>
      <div className="grid items-start gap-6 sm:grid-cols-2">
        <SelectField label="Siding" name="siding" options={sidings} defaultValue={typedIn(values, 'siding')} hint="Nominal width of a course" />
        <Field label="Crown of the log" unit={us ? 'in' : 'cm'} hint="How far its face bulges" {...number('crown')} />
      </div>
      <RadioCourses legend="Surface" name="texture" inRow defaultValue={typedIn(values, 'texture')} options={Object.entries(textures).map(([value, label]) => ({ value, label }))} />
      <RadioCourses legend="Coats" name="coats" inRow defaultValue={typedIn(values, 'coats')} options={coats} />
      <fieldset className="grid gap-3">
        <legend className="mb-1.5 font-semibold">
          Coverage on the label <span className="font-normal text-quiet">(may stay empty)</span>
        </legend>
        <div className="grid grid-cols-2 items-start gap-x-6 gap-y-3">
          <Field label="From" unit={coverageUnit} {...number('coverageLow')} />
          <Field label="To" unit={coverageUnit} {...number('coverageHigh')} />
        </div>
      </fieldset>
      <div className="max-w-64">
        <Field label="Waste" unit="%" hint="Spills and what stays in the can" {...number('waste')} />
      </div>
    </>
  );
}

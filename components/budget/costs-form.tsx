'use client';

import { useRef } from 'react';
import { ActionForm } from '@/components/ui/action-form';
import { RadioCourses } from '@/components/ui/choice-courses';
import { Field } from '@/components/ui/field';
import { SubmitButton } from '@/components/ui/submit-button';
import { type ActionState } from '@/lib/schemas/action-state';
import { type CostsForm as Prices, perWords, priceFields } from '@/lib/schemas/costs';
import { type Doer, doers, keysOf, type UnitSystem } from '@/lib/schemas/vocabulary';

type CostsFormProps = {
  action: (previous: ActionState, form: FormData) => Promise<ActionState>;
  homeId: string;
  units: UnitSystem;
  /** The prices of the home. */
  start: Prices;
  /** What the fields are filled with when the choice of who does the work changes. */
  byDoer: Record<Doer, Prices>;
};

const options = [
  { value: 'self', label: doers.self, hint: 'Count material and hired tools' },
  { value: 'hired', label: doers.hired, hint: 'Count what the contractor bills' },
];
const hints: Partial<Record<keyof typeof priceFields, string>> = { trip: 'Travel, ladders, covering up: what each trip costs before any work is done.', strip: 'Needed when a coat is left too long.' };

/** What work costs at this home. Changing who does it fills in the prices that belong to that choice. */
export function CostsForm({ action, homeId, units, start, byDoer }: CostsFormProps) {
  const prices = useRef<HTMLDivElement>(null);
  const fill = (doer: string) => {
    const known = keysOf(doers).find((one) => one === doer);
    for (const field of prices.current?.querySelectorAll('input') ?? []) {
      const name = keysOf(priceFields).find((one) => one === field.name);
      if (known && name) field.value = byDoer[known][name];
    }
  };
  return (
    <ActionForm action={action}>
      <input type="hidden" name="homeId" value={homeId} />
      <input type="hidden" name="units" value={units} />
      <RadioCourses legend="Who does the work?" name="doer" options={options} defaultValue={start.doer} onPick={fill} />
      <div ref={prices} className="grid gap-6">
        {keysOf(priceFields).map((name) => (
          <Field key={name} label={priceFields[name].label} name={name} inputMode="decimal" autoComplete="off" defaultValue={start[name]} hint={hints[name]} unit={`$ ${perWords(name, units)}`.trim()} />
        ))}
      </div>
      <SubmitButton>Save the prices</SubmitButton>
    </ActionForm>
  );
}

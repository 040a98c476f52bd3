'use client';

import { useEffect } from 'react';
import { ContainerFields } from '@/components/takeoff/container-fields';
import { useTypedForm } from '@/components/takeoff/use-typed-form';
import { Button } from '@/components/ui/button';
import { CheckCourses } from '@/components/ui/choice-courses';
import { Field } from '@/components/ui/field';
import { Figure } from '@/components/ui/figure';
import { FormContext } from '@/components/ui/form-context';
import { FormMessage } from '@/components/ui/form-message';
import { type FormValues } from '@/lib/schemas/action-state';
import { typedIn } from '@/lib/schemas/calculator-values';
import { type CleanerAsk, answerCleaner, readCleaner } from '@/lib/schemas/cleaner-form';
import { type CleanerAnswer } from '@/lib/takeoff/cleaner';

export type CleanerCalculatorProps = { ask: CleanerAsk; start: FormValues; onValues?: ((values: FormValues) => void) | undefined };

function CleanerResult({ answer: { explanations } }: { answer: CleanerAnswer }) {
  return (
    <div className="grid gap-1">
      <Figure explanation={explanations.buy} size="large" />
      <Figure explanation={explanations.containers} label={null} />
      <div className="mt-2 border-t-2 border-lichen pt-2">
        <Figure explanation={explanations.mixed} />
      </div>
    </div>
  );
}

/** How much cleaner for the wash. Answers while one types; without scripts the form is sent and answered by the page. */
export function CleanerCalculator({ ask, start, onValues }: CleanerCalculatorProps) {
  const { form, values, reading, errors, on } = useTypedForm(start, (typed) => readCleaner(typed, ask));
  useEffect(() => onValues?.(values), [values, onValues]);
  const answer = answerCleaner(values, ask);
  const faulty = Object.keys(reading.faults).length > 0;
  const coverageUnit = ask.units === 'us' ? 'ft²/gal' : 'm²/L';
  const number = (name: string) => ({ name, inputMode: 'decimal', autoComplete: 'off', defaultValue: typedIn(values, name) }) as const;
  return (
    <FormContext value={{ ok: false, message: null, errors }}>
      <form ref={form} method="get" {...on} noValidate className="grid gap-x-10 gap-y-8 lg:grid-cols-[minmax(0,1fr)_minmax(0,24rem)]">
        {/* Enter in a field sends the form with its first button. */}
        <button type="submit" hidden />
        <div className="grid content-start gap-6">
          <CheckCourses legend="Which walls to wash?" name="cleanWalls[]" options={ask.walls.map(({ id, name }) => ({ value: id, label: name }))} defaultValues={Array.isArray(values.cleanWalls) ? values.cleanWalls.map(String) : []} />
          <div className="grid items-start gap-6 sm:grid-cols-2">
            <Field label="Mixed cleaner covers, from" unit={coverageUnit} hint="By its label; may stay empty" {...number('cleanerLow')} />
            <Field label="To" unit={coverageUnit} {...number('cleanerHigh')} />
            <Field label="Parts of water to one of cleaner" hint="0 when it is ready to use" {...number('cleanerParts')} />
          </div>
          <ContainerFields unit={ask.units === 'us' ? 'gal' : 'L'} values={values} group="cleanerContainers" of="Cleaner" />
          <noscript>
            <Button type="submit">Work it out</Button>
          </noscript>
        </div>
        <section aria-label="Cleaner to buy" className="grid content-start gap-4">
          {faulty ? <FormMessage tone="note">Look at the marked fields; the amount follows.</FormMessage> : null}
          {answer ? <CleanerResult answer={answer} /> : null}
          {!answer && !faulty ? <p className="text-quiet">Choose a wall to see how much cleaner it takes.</p> : null}
        </section>
      </form>
    </FormContext>
  );
}

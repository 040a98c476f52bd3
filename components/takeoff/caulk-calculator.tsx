'use client';

import { useEffect } from 'react';
import { CaulkResult } from '@/components/takeoff/caulk-result';
import { ContainerFields } from '@/components/takeoff/container-fields';
import { useEstimate } from '@/components/takeoff/use-estimate';
import { useTypedForm } from '@/components/takeoff/use-typed-form';
import { Button } from '@/components/ui/button';
import { CheckCourses } from '@/components/ui/choice-courses';
import { Field } from '@/components/ui/field';
import { FormContext } from '@/components/ui/form-context';
import { FormMessage } from '@/components/ui/form-message';
import { type FormValues } from '@/lib/schemas/action-state';
import { typedIn } from '@/lib/schemas/calculator-values';
import { type CaulkAsk, notedPipes, readCaulk } from '@/lib/schemas/sealant-form';
import { type SealantAnswer } from '@/lib/takeoff/sealant-need';

export type CaulkCalculatorProps = { ask: CaulkAsk; start: FormValues; first?: SealantAnswer | undefined; onAnswer?: ((answer: SealantAnswer | undefined) => void) | undefined };

/** How much caulk and backer rod. Answers while one types; without scripts the form is sent and answered by the page. */
export function CaulkCalculator({ ask, start, first, onAnswer }: CaulkCalculatorProps) {
  const { form, values, reading, errors, on } = useTypedForm(start, (typed) => readCaulk(typed, ask));
  const { body, faults } = reading;
  const noted = notedPipes(values, ask);
  const { answer, failure, waiting, retry } = useEstimate<SealantAnswer>('sealant', body, first);
  useEffect(() => onAnswer?.(answer), [answer, onAnswer]);
  const faulty = Object.keys(faults).length > 0;
  const number = (name: string) => ({ name, inputMode: 'decimal', autoComplete: 'off', defaultValue: typedIn(values, name) }) as const;
  return (
    <FormContext value={{ ok: false, message: null, errors }}>
      <form ref={form} method="get" {...on} noValidate className="grid gap-x-10 gap-y-8 lg:grid-cols-[minmax(0,1fr)_minmax(0,24rem)]">
        {/* Enter in a field sends the form with its first button. */}
        <button type="submit" hidden />
        <div className="grid content-start gap-6">
          <CheckCourses legend="Which walls to caulk?" name="caulkWalls[]" options={ask.walls.map(({ id, name }) => ({ value: id, label: name }))} defaultValues={Array.isArray(values.caulkWalls) ? values.caulkWalls.map(String) : []} />
          <div className="grid items-start gap-6 sm:grid-cols-2">
            <Field label="Joint width" unit={ask.units === 'us' ? 'in' : 'mm'} {...number('caulkWidth')} />
            <Field label="Pipes and fittings" hint={`Noted for these walls: ${noted}. Another number here counts instead, a foot round each`} placeholder={String(noted)} {...number('pipes')} />
            <Field label="Caulk lost" unit="%" hint="Spills and what stays in the container" {...number('caulkWaste')} />
          </div>
          <ContainerFields values={values} group="caulkContainers" of="Caulk" />
          <noscript>
            <Button type="submit">Work it out</Button>
          </noscript>
        </div>
        <section aria-label="Caulk to buy" aria-busy={waiting} className="grid content-start gap-4">
          {failure ? (
            <FormMessage tone="fault">
              <p>{failure} What you typed is still here.</p>
              <Button look="plain" onClick={retry}>
                Try again
              </Button>
            </FormMessage>
          ) : null}
          {faulty ? <FormMessage tone="note">{faults[''] ?? 'Look at the marked fields; the amount follows.'}</FormMessage> : null}
          {answer ? <CaulkResult answer={answer} units={ask.units} /> : null}
          {!answer && !faulty && !failure && !waiting ? <p className="text-quiet">Choose a wall to see how much caulk it takes.</p> : null}
        </section>
      </form>
    </FormContext>
  );
}

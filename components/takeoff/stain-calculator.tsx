'use client';

import { useEffect } from 'react';
import { CoatingFields } from '@/components/takeoff/coating-fields';
import { ContainerFields } from '@/components/takeoff/container-fields';
import { EditButton } from '@/components/takeoff/edit-button';
import { EstimateCourse, EstimateLine } from '@/components/takeoff/estimate-course';
import { useEstimate } from '@/components/takeoff/use-estimate';
import { useTypedForm } from '@/components/takeoff/use-typed-form';
import { WallRows } from '@/components/takeoff/wall-rows';
import { Button } from '@/components/ui/button';
import { CheckCourses } from '@/components/ui/choice-courses';
import { FormContext } from '@/components/ui/form-context';
import { type FormValues } from '@/lib/schemas/action-state';
import { readCalculator } from '@/lib/schemas/calculator';
import { notCounted } from '@/lib/schemas/calculator-words';
import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { type StainAnswer } from '@/lib/takeoff/estimate';

type HomeWall = { id: string; name: string; areaM2: number; areaText: string };

export type StainCalculatorProps = {
  /** Walls of a home to choose from, in the reader's own units; without them sizes are typed, in units to choose. */
  walls?: readonly HomeWall[];
  /** What the form starts with, as typed and filled up by `calculatorStart`. */
  start: FormValues;
  /** The estimate of `start`, made on the server. */
  first?: StainAnswer | undefined;
  /** Told of every new estimate. */
  onAnswer?: ((answer: StainAnswer | undefined) => void) | undefined;
};

/** How much stain to buy. Answers while one types; without scripts the form is sent and answered by the page. */
export function StainCalculator({ walls, start, first, onAnswer }: StainCalculatorProps) {
  const { form, values, reading, errors, on } = useTypedForm(start, readCalculator);
  const { answer, failure, waiting, retry } = useEstimate<StainAnswer>('stain', reading.body, first);
  const units: UnitSystem = values.units === 'metric' ? 'metric' : 'us';

  useEffect(() => onAnswer?.(answer), [answer, onAnswer]);
  const areas = walls?.map((wall) => ({ value: `${wall.areaM2}#${wall.id}`, label: wall.name, hint: wall.areaText }));
  const invitation = areas ? 'Choose a wall to see how much stain it takes.' : 'Type the width and height of a wall to see how much stain it takes.';
  const result = { answer, units, failure, waiting, retry, faulty: Object.keys(reading.faults).length > 0, fault: reading.faults[''], left: notCounted(values, reading.missing), nothing: reading.body ? null : invitation };
  return (
    <FormContext value={{ ok: false, message: null, errors }}>
      <form ref={form} method="get" {...on} noValidate className="grid gap-x-10 gap-y-8 lg:grid-cols-[minmax(0,1fr)_minmax(0,24rem)] lg:grid-rows-[auto_1fr] max-lg:[&_:is(input,select,button,summary)]:scroll-mb-24">
        {/* Enter in a field sends the form with its first button. */}
        <button type="submit" hidden />
        <input type="hidden" name="units" value={units} />
        <div key={`walls ${units}`} className="grid content-start gap-6">
          {areas ? (
            <CheckCourses legend="Which walls?" name="chosenM2[]" options={areas} defaultValues={Array.isArray(values.chosenM2) ? values.chosenM2.map(String) : []} />
          ) : (
            <>
              <WallRows units={units} values={values} />
              <div>
                <EditButton edit={units === 'us' ? 'to metric' : 'to us'} look="plain">
                  {units === 'us' ? 'In metres and litres instead' : 'In feet and gallons instead'}
                </EditButton>
              </div>
            </>
          )}
        </div>
        <EstimateCourse {...result} />
        <div key={`coating ${units}`} className="grid content-start gap-6 border-t-2 border-lichen pt-6">
          <CoatingFields units={units} values={values} />
          <ContainerFields unit={units === 'us' ? 'gal' : 'L'} values={values} />
          <noscript>
            <Button type="submit">Work it out</Button>
          </noscript>
        </div>
        <EstimateLine {...result} />
      </form>
    </FormContext>
  );
}

'use client';

import { useRef, useState } from 'react';
import { ContainerFields } from '@/components/takeoff/container-fields';
import { EstimateResult } from '@/components/takeoff/estimate-result';
import { useEstimate } from '@/components/takeoff/use-estimate';
import { WallRows } from '@/components/takeoff/wall-rows';
import { Button } from '@/components/ui/button';
import { CheckCourses, RadioCourses } from '@/components/ui/choice-courses';
import { Field, SelectField } from '@/components/ui/field';
import { FormContext } from '@/components/ui/form-context';
import { FormMessage } from '@/components/ui/form-message';
import { type FormValues } from '@/lib/schemas/action-state';
import { readForm } from '@/lib/schemas/form-values';
import { textures, type UnitSystem } from '@/lib/schemas/vocabulary';
import { type StainAnswer } from '@/lib/takeoff/estimate';

type HomeWall = { id: string; name: string; areaM2: number; areaText: string };

export type StainCalculatorProps = {
  units: UnitSystem;
  /** Walls of a home to choose from; without them sizes are typed. */
  walls?: readonly HomeWall[];
  /** What the form starts with, as typed. */
  start: FormValues;
  /** The estimate of `start`, made on the server. */
  first?: StainAnswer | undefined;
};

const sidings = [
  { value: '6', label: '6 in siding' },
  { value: '8', label: '8 in siding' },
  { value: '10', label: '10 in siding' },
];
const coats = [
  { value: '1', label: 'One coat' },
  { value: '2', label: 'Two coats' },
  { value: '3', label: 'Three coats' },
];
const text = (values: FormValues, name: string) => (typeof values[name] === 'string' ? values[name] : undefined);

/** How much stain to buy. Answers while one types; without scripts the form is sent and answered by the page. */
export function StainCalculator({ units, walls, start, first }: StainCalculatorProps) {
  const form = useRef<HTMLFormElement>(null);
  const [values, setValues] = useState<FormValues>(start);
  const { faults, answer, failure, waiting } = useEstimate(values, first);
  const read = () => {
    if (form.current) setValues(readForm(new FormData(form.current)));
  };
  const us = units === 'us';
  const areas = walls?.map((wall) => ({ value: `${wall.areaM2}#${wall.id}`, label: wall.name, hint: wall.areaText }));
  return (
    <FormContext value={Object.keys(faults).length > 0 ? { ok: false, message: null, errors: faults } : { ok: true, message: null }}>
      <div className="grid gap-10 lg:grid-cols-[minmax(0,1fr)_minmax(0,24rem)]">
        <form ref={form} method="get" onInput={read} onSubmit={(event) => { event.preventDefault(); read(); }} className="grid content-start gap-6" noValidate>
          <input type="hidden" name="units" value={units} />
          {areas ? <CheckCourses legend="Which walls?" name="chosenM2[]" options={areas} defaultValues={Array.isArray(start.chosenM2) ? start.chosenM2.map(String) : areas.map((area) => area.value)} /> : <WallRows units={units} start={start} onChange={read} />}
          <div className="grid gap-6 sm:grid-cols-2">
            <SelectField label="Siding" name="siding" options={sidings} defaultValue={text(start, 'siding') ?? '8'} hint="Nominal width of a course" />
            <Field label="Crown of the log" name="crown" inputMode="decimal" unit={us ? 'in' : 'cm'} defaultValue={text(start, 'crown')} hint="How far the face bulges" />
          </div>
          <RadioCourses legend="Surface" name="texture" inRow defaultValue={text(start, 'texture') ?? 'saw-textured'} options={Object.entries(textures).map(([value, label]) => ({ value, label }))} />
          <RadioCourses legend="Coats" name="coats" inRow defaultValue={text(start, 'coats') ?? '2'} options={coats} />
          <fieldset className="grid gap-3">
            <legend className="mb-1.5 font-semibold">Coverage on the label <span className="font-normal text-quiet">(may stay empty)</span></legend>
            <div className="grid gap-6 sm:grid-cols-2">
              <Field label="From" name="coverageLow" inputMode="decimal" unit={us ? 'ft²/gal' : 'm²/L'} defaultValue={text(start, 'coverageLow')} />
              <Field label="To" name="coverageHigh" inputMode="decimal" unit={us ? 'ft²/gal' : 'm²/L'} defaultValue={text(start, 'coverageHigh')} />
            </div>
          </fieldset>
          <div className="max-w-56">
            <Field label="Waste" name="waste" inputMode="decimal" unit="%" defaultValue={text(start, 'waste') ?? '10'} hint="Spills and what stays in the can" />
          </div>
          <ContainerFields units={units} start={start} onChange={read} />
          <noscript><Button type="submit">Work it out</Button></noscript>
        </form>
        <section aria-label="What to buy" aria-live="polite" aria-busy={waiting} className="lg:sticky lg:top-6 lg:self-start">
          {failure && !answer ? <FormMessage tone="fault">{failure} What you typed is still here.</FormMessage> : null}
          {Object.keys(faults).length > 0 ? <FormMessage tone="note">Look at the marked fields; the amount follows.</FormMessage> : null}
          {answer && Object.keys(faults).length === 0 ? <EstimateResult answer={answer} units={units} /> : null}
          {!answer && Object.keys(faults).length === 0 && !failure ? <p className="text-quiet">{walls ? 'Choose a wall to see how much stain it takes.' : 'Type the width and height of a wall to see how much stain it takes.'}</p> : null}
        </section>
      </div>
    </FormContext>
  );
}

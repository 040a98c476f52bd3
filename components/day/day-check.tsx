'use client';

import { type FormEvent, useRef, useState } from 'react';
import { DayAnswerCourse, DayAnswerLine } from '@/components/day/day-answer';
import { DayFields } from '@/components/day/day-fields';
import { Button } from '@/components/ui/button';
import { FormContext } from '@/components/ui/form-context';
import { checkDay } from '@/lib/day/check-day';
import { readDay } from '@/lib/day/day-form';
import { type FormValues } from '@/lib/schemas/action-state';
import { readForm } from '@/lib/schemas/form-values';
import { type UnitSystem } from '@/lib/schemas/vocabulary';

/** Whether today is the day. Answers while one types; without scripts the form is sent and answered by the page. */
export function DayCheck({ start, sent, units }: { start: FormValues; sent: boolean; units: UnitSystem }) {
  const form = useRef<HTMLFormElement>(null);
  const [values, setValues] = useState(start);
  const [asked, setAsked] = useState(sent);
  const { day, faults, missing } = readDay(values, units);
  const answer = day ? checkDay(day, units) : null;
  const errors = asked ? { ...missing, ...faults } : faults;
  const shown = { answer, work: day?.work ?? 'restain' };
  const typed = () => (form.current ? readForm(new FormData(form.current)) : values);
  const onSubmit = (event: FormEvent) => {
    event.preventDefault();
    setAsked(true);
    setValues(typed());
  };
  return (
    <FormContext value={{ ok: false, message: null, errors }}>
      <form ref={form} method="get" onInput={() => setValues(typed())} onSubmit={onSubmit} noValidate className="grid gap-x-10 gap-y-8 lg:grid-cols-[minmax(0,1fr)_minmax(0,24rem)]">
        {/* Enter in a field sends the form with its first button. */}
        <button type="submit" hidden />
        <div className="grid content-start gap-6">
          <DayFields values={start} units={units} />
          <noscript>
            <Button type="submit">Check the day</Button>
          </noscript>
        </div>
        <DayAnswerCourse {...shown} faulty={Object.keys(errors).length > 0} />
        <DayAnswerLine {...shown} />
      </form>
    </FormContext>
  );
}

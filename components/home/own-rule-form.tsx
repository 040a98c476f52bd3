'use client';

import { type FormEvent, useState } from 'react';
import { RuleDays } from '@/components/home/rule-days';
import { useRulePreview } from '@/components/home/use-rule-preview';
import { ActionForm } from '@/components/ui/action-form';
import { CheckCourses, RadioCourses } from '@/components/ui/choice-courses';
import { DateInput } from '@/components/ui/date-input';
import { Field, SelectField } from '@/components/ui/field';
import { FormMessage } from '@/components/ui/form-message';
import { Stepper } from '@/components/ui/stepper';
import { SubmitButton } from '@/components/ui/submit-button';
import { type OwnPreview } from '@/lib/care/own-preview';
import { monthNames } from '@/lib/calendar-words';
import { type RuleStart } from '@/lib/home/rule-start';
import { type ActionState } from '@/lib/schemas/action-state';
import { readForm } from '@/lib/schemas/form-values';
import { ruleUnits, ruleWays } from '@/lib/schemas/rule-ways';
import { type WorkKind } from '@/lib/schemas/vocabulary';

type OwnRuleFormProps = {
  action: (previous: ActionState, form: FormData) => Promise<ActionState>;
  target: { homeId: string; wallId: string; kind: WorkKind };
  start: RuleStart;
  /** The days of the rule that the form begins with. */
  first: OwnPreview;
};

const ways = [
  { value: 'simple', label: ruleWays.simple, hint: 'Such as every 5 years, in June' },
  { value: 'written', label: ruleWays.written, hint: 'A recurrence rule in the words of RFC 5545, the standard of calendars' },
];
const months = monthNames.map((label, i) => ({ value: String(i + 1), label }));

/** The owner's own rule for one kind of work on one wall. The days follow what is typed; without scripts they are checked when it is sent. */
export function OwnRuleForm({ action, target, start, first }: OwnRuleFormProps) {
  const [typed, setTyped] = useState<string | null>(null);
  const { preview, failure, waiting } = useRulePreview(target.homeId, typed, first);
  const onInput = (event: FormEvent<HTMLDivElement>) => {
    const form = event.target instanceof HTMLElement && event.target.closest('form');
    if (form) setTyped(JSON.stringify(readForm(new FormData(form))));
  };
  return (
    <ActionForm action={action} className="grid gap-6">
      {Object.entries(target).map(([name, value]) => (
        <input key={name} type="hidden" name={name} value={value} />
      ))}
      <div onInput={onInput} className="group/way grid gap-x-10 gap-y-8 lg:grid-cols-[minmax(0,1fr)_minmax(0,24rem)]">
        <div className="grid content-start gap-6">
          <RadioCourses legend="How do you want to say it?" name="how" options={ways} defaultValue={start.how} />
          <div className="grid gap-6 group-has-[input[value=written]:checked]/way:hidden">
            <div className="flex flex-wrap items-end gap-4">
              <Stepper label="Every" name="every" min={1} max={360} defaultValue={start.every} />
              <SelectField label="Years or months" name="unit" options={ruleUnits} defaultValue={start.unit} />
            </div>
            <div className="group-has-[option[value=months]:checked]/way:hidden">
              <CheckCourses legend="In which months?" hint="The rule falls on the 15th of each. With none chosen it keeps the day of the year on which it starts." name="months[]" options={months} defaultValues={start.months} />
            </div>
          </div>
          <div className="group-has-[input[value=simple]:checked]/way:hidden">
            <Field label="The rule" name="rule" defaultValue={start.rule} autoComplete="off" autoCapitalize="characters" spellCheck={false} hint="Like FREQ=YEARLY;INTERVAL=2;BYMONTH=5;BYDAY=1MO: every 2 years, the first Monday of May." />
          </div>
          <DateInput label="Counted from" name="startOn" defaultValue={start.startOn} hint="The rule has no day before this one. Work logged later restarts it for a restain or recaulk." />
        </div>
        <section aria-label="The days of this rule" aria-busy={waiting} aria-live="polite" className="grid content-start gap-4">
          <h3>When it falls</h3>
          {failure ? <FormMessage tone="fault">{failure}</FormMessage> : <RuleDays preview={preview} />}
        </section>
      </div>
      <SubmitButton>Save my rule</SubmitButton>
    </ActionForm>
  );
}

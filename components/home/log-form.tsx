'use client';

import { useRef, useState } from 'react';
import { CoatPutOn } from '@/components/home/coat-put-on';
import { OldFilmField } from '@/components/home/old-film-field';
import { WorkCautions } from '@/components/home/work-cautions';
import { ActionForm } from '@/components/ui/action-form';
import { Button } from '@/components/ui/button';
import { CheckCourses, type Choice, RadioCourses } from '@/components/ui/choice-courses';
import { DateInput } from '@/components/ui/date-input';
import { Field, SelectField, TextArea } from '@/components/ui/field';
import { SubmitButton } from '@/components/ui/submit-button';
import { type CalendarDay } from '@/lib/calendar';
import { type ActionState } from '@/lib/schemas/action-state';
import { type Sealant, sealants, type StainBase, type UnitSystem, type WorkKind } from '@/lib/schemas/vocabulary';

export type LogFormProps = {
  action: (previous: ActionState, form: FormData) => Promise<ActionState>;
  homeId: string;
  /** Made for this showing of the form: a second sending of it is the same record. */
  submissionKey: string;
  units: UnitSystem;
  today: CalendarDay;
  yesterday: CalendarDay;
  kind: WorkKind;
  walls: readonly { id: string; name: string; hint: string; stainBase: StainBase; sealant: Sealant }[];
  chosen: readonly string[];
  yearBuilt: number | null;
};

const kinds: Choice[] = [
  { value: 'restain', label: 'Restain', hint: 'A coat on the wood' },
  { value: 'recaulk', label: 'Recaulk', hint: 'New caulk in the joints' },
  { value: 'wash', label: 'Wash', hint: 'Dirt and mildew off' },
  { value: 'walkaround', label: 'Walkaround', hint: 'Looked at, without questions wall by wall' },
];

/** Logs work beside the wall: what, which walls, when; the rest may stay empty. */
export function LogForm(props: LogFormProps) {
  const { action, homeId, submissionKey, units, today, yesterday, walls, chosen, yearBuilt } = props;
  const [kind, setKind] = useState(props.kind);
  const [key] = useState(submissionKey);
  const wallRows = useRef<HTMLDivElement>(null);
  const chooseAll = () => wallRows.current?.querySelectorAll<HTMLInputElement>('input:not(:checked)').forEach((box) => box.click());
  return (
    <ActionForm action={action} className="grid max-w-2xl gap-8">
      <input type="hidden" name="homeId" value={homeId} />
      <input type="hidden" name="units" value={units} />
      <input type="hidden" name="submissionKey" value={key} />
      <RadioCourses legend="What was done?" name="kind" options={kinds} defaultValue={props.kind} onPick={(value) => setKind(value as WorkKind)} />
      <div ref={wallRows} className="grid gap-2">
        <CheckCourses legend="Which walls?" name="wallIds[]" options={walls.map((wall) => ({ value: wall.id, label: wall.name, hint: wall.hint }))} defaultValues={chosen} />
        <div className="needs-script">
          <Button look="plain" onClick={chooseAll}>
            Choose all walls
          </Button>
        </div>
      </div>
      <DateInput label="Which day?" name="doneOn" defaultValue={today} max={today} quick={[{ label: 'Today', value: today }, { label: 'Yesterday', value: yesterday }]} />
      {kind === 'restain' ? <CoatPutOn units={units} /> : null}
      {kind === 'recaulk' ? <SelectField label="Caulk" name="sealant" options={sealants} empty="The same as before" /> : null}
      {kind === 'restain' || kind === 'recaulk' ? <OldFilmField film={kind === 'restain' ? 'coat' : 'caulk'} /> : null}
      {kind === 'walkaround' ? null : <Field label="Product" name="product" optional maxLength={120} placeholder="As on the can" />}
      <div className="max-w-56">
        <Field label="Cost" name="cost" optional inputMode="decimal" unit="$" />
      </div>
      <TextArea label="Note" name="note" optional maxLength={2000} rows={3} />
      <WorkCautions facts={{ kinds: [kind], yearBuilt, stainBases: walls.map((wall) => wall.stainBase), sealants: walls.map((wall) => wall.sealant) }} />
      <SubmitButton wide pendingLabel="Logging it…">
        Log it
      </SubmitButton>
    </ActionForm>
  );
}

'use client';

import { useState } from 'react';
import { WallQuestions, type WalkedWall } from '@/components/home/wall-questions';
import { WorkCautions } from '@/components/home/work-cautions';
import { ActionForm } from '@/components/ui/action-form';
import { Course } from '@/components/ui/course';
import { DateInput } from '@/components/ui/date-input';
import { TextArea } from '@/components/ui/field';
import { SubmitButton } from '@/components/ui/submit-button';
import { type CalendarDay } from '@/lib/calendar';
import { type ActionState } from '@/lib/schemas/action-state';

type WalkaroundFormProps = {
  action: (previous: ActionState, form: FormData) => Promise<ActionState>;
  homeId: string;
  /** Made for this showing of the form: a second sending of it is the same walkaround. */
  submissionKey: string;
  today: CalendarDay;
  yesterday: CalendarDay;
  walls: readonly WalkedWall[];
  yearBuilt: number | null;
};

/** Around the house, a course a wall, in the order in which one walks. */
export function WalkaroundForm({ action, homeId, submissionKey, today, yesterday, walls, yearBuilt }: WalkaroundFormProps) {
  const [key] = useState(submissionKey);
  return (
    <ActionForm action={action} className="grid">
      <input type="hidden" name="homeId" value={homeId} />
      <input type="hidden" name="submissionKey" value={key} />
      {walls.map((wall) => (
        <WallQuestions key={wall.id} wall={wall} />
      ))}
      <Course heading="When">
        <div className="grid max-w-2xl gap-6">
          <DateInput label="Which day?" name="doneOn" defaultValue={today} max={today} quick={[{ label: 'Today', value: today }, { label: 'Yesterday', value: yesterday }]} />
          <TextArea label="Note" name="note" optional maxLength={2000} rows={3} />
          <WorkCautions facts={{ kinds: ['walkaround'], yearBuilt, stainBases: [], sealants: [] }} />
          <SubmitButton wide pendingLabel="Keeping it…">
            Keep this walkaround
          </SubmitButton>
        </div>
      </Course>
    </ActionForm>
  );
}

import { CoatFields } from '@/components/home/coat-fields';
import { HouseFields } from '@/components/home/house-fields';
import { LastDoneFields } from '@/components/home/last-done-fields';
import { PlaceFields } from '@/components/home/place-fields';
import { SidingFields } from '@/components/home/siding-fields';
import { ActionForm } from '@/components/ui/action-form';
import { Course } from '@/components/ui/course';
import { Field } from '@/components/ui/field';
import { SubmitButton } from '@/components/ui/submit-button';
import { type CalendarDay } from '@/lib/calendar';
import { type ActionState } from '@/lib/schemas/action-state';
import { type UnitSystem } from '@/lib/schemas/vocabulary';

type NewHomeFormProps = { action: (previous: ActionState, form: FormData) => Promise<ActionState>; units: UnitSystem; today: CalendarDay };

/** A home in one form, a course a subject; only its name and postal code have no ready answer. */
export function NewHomeForm({ action, units, today }: NewHomeFormProps) {
  return (
    <ActionForm action={action} className="grid">
      <input type="hidden" name="units" value={units} />
      <Course heading="Which home" aside="Only the name and the postal code have to be filled in.">
        <div className="grid max-w-3xl gap-6">
          <Field label="What do you call it?" name="name" required maxLength={60} autoComplete="off" placeholder="Larch Ridge" />
          <PlaceFields units={units} />
        </div>
      </Course>
      <Course heading="The house" aside="Four walls to start with. Add or take out walls afterwards.">
        <HouseFields units={units} />
      </Course>
      <Course heading="Siding">
        <div className="max-w-3xl">
          <SidingFields />
        </div>
      </Course>
      <Course heading="Wood and joints" aside="On most of its walls. A wall that differs is corrected afterwards.">
        <div className="max-w-3xl">
          <CoatFields />
        </div>
      </Course>
      <Course heading="Last time" aside="On all walls; each wall can have its own day afterwards.">
        <LastDoneFields today={today} stained={null} caulked={null} />
      </Course>
      <Course as="div" tone="quiet">
        <SubmitButton pendingLabel="Working out the sun on every wall…">Set up the home</SubmitButton>
      </Course>
    </ActionForm>
  );
}

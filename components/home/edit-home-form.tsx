import { PlaceFields } from '@/components/home/place-fields';
import { SidingFields } from '@/components/home/siding-fields';
import { ActionForm } from '@/components/ui/action-form';
import { Course } from '@/components/ui/course';
import { Field } from '@/components/ui/field';
import { SubmitButton } from '@/components/ui/submit-button';
import { type HomeFormValues } from '@/lib/home/form-values';
import { type ActionState } from '@/lib/schemas/action-state';
import { type UnitSystem } from '@/lib/schemas/vocabulary';

type EditHomeFormProps = { action: (previous: ActionState, form: FormData) => Promise<ActionState>; homeId: string; units: UnitSystem; values: HomeFormValues };

export function EditHomeForm({ action, homeId, units, values }: EditHomeFormProps) {
  return (
    <ActionForm action={action} className="grid">
      <input type="hidden" name="homeId" value={homeId} />
      <input type="hidden" name="units" value={units} />
      <Course heading="Name and place">
        <div className="grid max-w-3xl gap-6">
          <Field label="What do you call it?" name="name" required maxLength={60} defaultValue={values.name} />
          <PlaceFields units={units} defaults={values.place} />
        </div>
      </Course>
      <Course heading="Siding">
        <div className="grid max-w-3xl gap-6">
          <SidingFields values={values.siding} />
          <div>
            <SubmitButton>Save the home</SubmitButton>
          </div>
        </div>
      </Course>
    </ActionForm>
  );
}

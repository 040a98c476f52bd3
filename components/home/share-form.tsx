import { ActionForm } from '@/components/ui/action-form';
import { type Choice, RadioCourses } from '@/components/ui/choice-courses';
import { Field } from '@/components/ui/field';
import { SubmitButton } from '@/components/ui/submit-button';
import { type ActionState } from '@/lib/schemas/action-state';

const who: Choice[] = [
  { value: 'contractor', label: 'Contractor', hint: 'Sees walls and coming work, logs what they do' },
  { value: 'caretaker', label: 'Caretaker', hint: 'Sees the home and logs work' },
  { value: 'co-owner', label: 'Co-owner', hint: 'Sees, changes and logs; cannot archive or share' },
];

type ShareFormProps = { action: (previous: ActionState, form: FormData) => Promise<ActionState>; homeId: string };

export function ShareForm({ action, homeId }: ShareFormProps) {
  return (
    <ActionForm action={action}>
      <input type="hidden" name="homeId" value={homeId} />
      <Field label="Their e-mail address" name="email" type="email" autoComplete="off" hint="The one of their Eavewright account." />
      <RadioCourses legend="What are they to this home?" name="membership" options={who} defaultValue="contractor" />
      <SubmitButton pendingLabel="Sharing…">Share the home</SubmitButton>
    </ActionForm>
  );
}

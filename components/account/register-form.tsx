import { ActionForm } from '@/components/ui/action-form';
import { RadioCourses } from '@/components/ui/choice-courses';
import { Field } from '@/components/ui/field';
import { SubmitButton } from '@/components/ui/submit-button';
import { type ActionState } from '@/lib/schemas/action-state';

type Props = { action: (previous: ActionState, form: FormData) => Promise<ActionState> };

const roles = [
  { value: 'homeowner', label: 'I look after a home', hint: 'Owner, co-owner or caretaker' },
  { value: 'contractor', label: 'I refinish homes', hint: 'Owners share their homes with you' },
];

/** The company shows once "I refinish homes" is picked, by style alone. */
export function RegisterForm({ action }: Props) {
  return (
    <ActionForm action={action} className="group grid max-w-2xl gap-6">
      <RadioCourses legend="Who are you?" name="role" defaultValue="homeowner" options={roles} />
      <Field label="Your name" name="name" autoComplete="name" required />
      <div className="hidden group-has-[input[value=contractor]:checked]:block">
        <Field label="Company" name="company" autoComplete="organization" hint="Owners look for it when they share a home." />
      </div>
      <Field label="E-mail address" name="email" type="email" autoComplete="username" inputMode="email" required />
      <Field label="Password" name="password" type="password" autoComplete="new-password" hint="At least 10 characters. Three words in a row are easy to remember." required />
      <SubmitButton pendingLabel="One moment…">Make the account</SubmitButton>
    </ActionForm>
  );
}

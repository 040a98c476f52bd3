import { type Metadata } from 'next';
import { ActionForm } from '@/components/ui/action-form';
import { Course } from '@/components/ui/course';
import { Field } from '@/components/ui/field';
import { PageHead } from '@/components/ui/page-head';
import { SubmitButton } from '@/components/ui/submit-button';
import { askForReset } from './actions';

export const metadata: Metadata = { title: 'A new password' };

export default function ForgotPage() {
  return (
    <>
      <PageHead title="A new password" lead="We send a link to your address. It works once, for one hour." />
      <Course>
        <ActionForm action={askForReset}>
          <Field label="E-mail address" name="email" type="email" autoComplete="username" inputMode="email" required />
          <SubmitButton pendingLabel="Sending…">Send the link</SubmitButton>
        </ActionForm>
      </Course>
    </>
  );
}

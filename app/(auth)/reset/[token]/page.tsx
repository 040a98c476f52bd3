import { type Metadata } from 'next';
import { ActionForm } from '@/components/ui/action-form';
import { LinkButton } from '@/components/ui/button';
import { Course } from '@/components/ui/course';
import { Field } from '@/components/ui/field';
import { PageHead } from '@/components/ui/page-head';
import { SubmitButton } from '@/components/ui/submit-button';
import { tokenHolder } from '@/db/queries/account-tokens';
import { resetPassword } from './actions';

export const metadata: Metadata = { title: 'Set a new password', referrer: 'no-referrer' };

export default async function ResetPage({ params }: { params: Promise<{ token: string }> }) {
  const { token } = await params;
  const holder = tokenHolder(token, 'reset', new Date());
  if (!holder) {
    return (
      <>
        <PageHead title="This link no longer works" lead="It was used already, or it is older than one hour." />
        <Course><LinkButton href="/forgot">Ask for a new link</LinkButton></Course>
      </>
    );
  }
  return (
    <>
      <PageHead title="Set a new password" lead={`for ${holder.email}. You will be signed out everywhere else.`} />
      <Course>
        <ActionForm action={resetPassword}>
          <input type="hidden" name="token" value={token} />
          <Field label="New password" name="password" type="password" autoComplete="new-password" hint="At least 10 characters. Three words in a row are easy to remember." required />
          <SubmitButton>Set the password</SubmitButton>
        </ActionForm>
      </Course>
    </>
  );
}

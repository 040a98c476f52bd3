import { type Metadata } from 'next';
import { redirect } from 'next/navigation';
import { currentActor } from '@/app/_server/actor';
import { LinkForm, PasswordForm } from '@/components/account/sign-in-form';
import { LinkButton } from '@/components/ui/button';
import { Course } from '@/components/ui/course';
import { FormMessage } from '@/components/ui/form-message';
import { PageHead } from '@/components/ui/page-head';
import { safePath } from '@/lib/schemas/account';
import { signInFault } from '@/lib/sign-in-words';

export const metadata: Metadata = { title: 'Sign in' };

type Props = { searchParams: Promise<{ callbackUrl?: string; email?: string; said?: string; error?: string }> };

const notes: Record<string, string> = {
  'signed-out': 'You are signed out.',
  'password-set': 'Your new password is set. Sign in with it.',
};

export default async function SignInPage({ searchParams }: Props) {
  if (await currentActor()) redirect('/start');
  const { callbackUrl, email, said, error } = await searchParams;
  const goTo = safePath(callbackUrl);
  const note = said ? notes[said] : undefined;
  return (
    <>
      <PageHead title="Sign in" lead={goTo === '/start' ? undefined : 'Then you go on to the page you asked for.'} />
      {error ? <Course><FormMessage tone="fault">{signInFault(error)}</FormMessage></Course> : null}
      {note ? <Course><FormMessage tone="done">{note}</FormMessage></Course> : null}
      <Course heading="With your password">
        <PasswordForm goTo={goTo} email={email ?? ''} />
        <p className="mt-4"><LinkButton href="/forgot" look="plain">I do not know my password</LinkButton></p>
      </Course>
      <Course heading="With a link by mail" aside="No password to remember">
        <LinkForm goTo={goTo} />
      </Course>
      <Course heading="New here" tone="quiet">
        <LinkButton href="/register" look="quiet">Make an account</LinkButton>
      </Course>
    </>
  );
}

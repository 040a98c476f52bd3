import { type Metadata } from 'next';
import { currentActor } from '@/app/_server/actor';
import { VerifyForm } from '@/components/account/verify-form';
import { LinkButton } from '@/components/ui/button';
import { Course } from '@/components/ui/course';
import { PageHead } from '@/components/ui/page-head';
import { tokenHolder } from '@/db/queries/account-tokens';
import { confirmAddress } from './actions';

export const metadata: Metadata = { title: 'Confirm your address', referrer: 'no-referrer' };

export default async function VerifyPage({ params }: { params: Promise<{ token: string }> }) {
  const { token } = await params;
  const holder = tokenHolder(token, 'verify', new Date());
  if (!holder) {
    return (
      <>
        <PageHead title="This link no longer works" lead="It was used already, or it is older than two days. If your address is not confirmed yet, sign in: a new link can be sent from there." />
        <Course><LinkButton href="/sign-in">To sign-in</LinkButton></Course>
      </>
    );
  }
  const signedIn = (await currentActor())?.id === holder.id;
  const how = signedIn ? 'Reminders come to it from then on.' : 'Type the password that you chose for the account.';
  return (
    <>
      <PageHead title="Confirm your address" lead={<><strong className="break-words">{holder.email}</strong> is yours? {how}</>} />
      <Course><VerifyForm action={confirmAddress} token={token} email={holder.email} signedIn={signedIn} /></Course>
      {signedIn ? null : (
        <Course heading="You do not know the password?" tone="quiet">
          <p className="mb-4 max-w-2xl">Perhaps somebody else made this account with your address. Set a new password: that confirms the address too, and signs everybody else out.</p>
          <LinkButton href="/forgot" look="quiet">Set a new password</LinkButton>
        </Course>
      )}
    </>
  );
}

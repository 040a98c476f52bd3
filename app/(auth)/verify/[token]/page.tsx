import { type Metadata } from 'next';
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
        <PageHead title="This link no longer works" lead="It was used already, or it is older than two days. Sign in: if your address is not confirmed yet, a new link is sent." />
        <Course><LinkButton href="/sign-in">To sign-in</LinkButton></Course>
      </>
    );
  }
  return (
    <>
      <PageHead title="Confirm your address" lead={`${holder.email} is yours, and you made the account? Then type the password you chose.`} />
      <Course><VerifyForm action={confirmAddress} token={token} email={holder.email} /></Course>
    </>
  );
}

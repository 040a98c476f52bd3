import { type Metadata } from 'next';
import { redirect } from 'next/navigation';
import { buttonClass } from '@/components/ui/button';
import { Course } from '@/components/ui/course';
import { PageHead } from '@/components/ui/page-head';
import { safePath } from '@/lib/schemas/account';

export const metadata: Metadata = { title: 'Sign in with the link', referrer: 'no-referrer' };

type Props = { searchParams: Promise<{ token?: string; email?: string; callbackUrl?: string }> };

/** next-auth writes whole addresses; of these the path is taken, so that it stays on this site. */
function pathOf(url: string | undefined): string | undefined {
  if (!url || !URL.canParse(url)) return url;
  const { pathname, search } = new URL(url);
  return pathname + search;
}

/** The link in the mail leads here; only the button uses it up. */
export default async function SignInLinkPage({ searchParams }: Props) {
  const { token, email, callbackUrl } = await searchParams;
  if (!token || !email) redirect('/auth-error?error=Verification');
  return (
    <>
      <PageHead title="Sign in" lead={`as ${email}`} />
      <Course>
        <form method="get" action="/api/auth/callback/email">
          <input type="hidden" name="token" value={token} />
          <input type="hidden" name="email" value={email} />
          <input type="hidden" name="callbackUrl" value={safePath(pathOf(callbackUrl))} />
          <button type="submit" className={buttonClass('primary')}>Sign in on this device</button>
        </form>
      </Course>
    </>
  );
}

import { type Metadata } from 'next';
import { LinkButton } from '@/components/ui/button';
import { Course } from '@/components/ui/course';
import { PageHead } from '@/components/ui/page-head';
import { signInFault } from '@/lib/sign-in-words';

export const metadata: Metadata = { title: 'Signing in did not work' };

type Props = { searchParams: Promise<{ error?: string }> };

export default async function AuthErrorPage({ searchParams }: Props) {
  const { error = '' } = await searchParams;
  return (
    <>
      <PageHead title="Signing in did not work" lead={signInFault(error)} />
      <Course>
        <LinkButton href="/sign-in">Back to sign-in</LinkButton>
      </Course>
    </>
  );
}

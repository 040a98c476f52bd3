import { type Metadata } from 'next';
import { LinkButton } from '@/components/ui/button';
import { Course } from '@/components/ui/course';
import { PageHead } from '@/components/ui/page-head';

export const metadata: Metadata = { title: 'Signing in did not work' };

type Props = { searchParams: Promise<{ error?: string }> };

const reasons: Record<string, string> = {
  Verification: 'This link was used already, or it is older than two hours. Ask for a new one.',
  AccessDenied: 'Too many links were asked for. Wait a quarter of an hour, or use your password.',
  Configuration: 'Something is wrong on our side. Nothing of yours is lost; try again later.',
};

export default async function AuthErrorPage({ searchParams }: Props) {
  const { error = '' } = await searchParams;
  return (
    <>
      <PageHead title="Signing in did not work" lead={reasons[error] ?? 'Something went wrong on the way. Nothing of yours is lost; try once more.'} />
      <Course>
        <LinkButton href="/sign-in">Back to sign-in</LinkButton>
      </Course>
    </>
  );
}

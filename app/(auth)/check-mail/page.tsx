import { type Metadata } from 'next';
import { LinkButton } from '@/components/ui/button';
import { Course } from '@/components/ui/course';
import { PageHead } from '@/components/ui/page-head';

export const metadata: Metadata = { title: 'Look in your mail' };

export default function CheckMailPage() {
  return (
    <>
      <PageHead title="Look in your mail" lead="A message with a link is on its way. Open it on this device. If you have just made an account, you can sign in already." />
      <Course heading="Nothing there?">
        <ul className="list-disc pl-6">
          <li>It can take a few minutes.</li>
          <li>Look in the folder for unwanted mail.</li>
          <li>Was the address right? Register again, or ask for a new link; both are safe to repeat.</li>
        </ul>
        <p className="mt-4 flex flex-wrap gap-3">
          <LinkButton href="/sign-in" look="quiet">To sign-in</LinkButton>
          <LinkButton href="/register" look="plain">Register again</LinkButton>
        </p>
      </Course>
    </>
  );
}

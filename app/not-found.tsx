import { type Metadata } from 'next';
import { LinkButton } from '@/components/ui/button';
import { Course } from '@/components/ui/course';
import { PageHead } from '@/components/ui/page-head';
import { SiteHeader } from '@/components/ui/site-header';

export const metadata: Metadata = { title: 'Not found' };

export default function NotFound() {
  return (
    <>
      <SiteHeader />
      <main id="main">
        <PageHead title="There is nothing at this address" lead="It may have been removed, the link may be cut off, or the home may not be shared with the account you are signed in with." />
        <Course as="div">
          <div className="flex flex-wrap gap-3">
            <LinkButton href="/homes">Your homes</LinkButton>
            <LinkButton href="/" look="quiet">
              First page
            </LinkButton>
          </div>
        </Course>
      </main>
    </>
  );
}

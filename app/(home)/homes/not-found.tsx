import { LinkButton } from '@/components/ui/button';
import { Course } from '@/components/ui/course';
import { PageHead } from '@/components/ui/page-head';

export default function HomeNotFound() {
  return (
    <main id="main">
      <PageHead title="Not here" />
      <Course as="div">
        <p className="mb-4 max-w-prose">There is no such home or wall among those that you can see. It may have been archived or taken out, or its owner ended your access.</p>
        <LinkButton href="/homes">To your homes</LinkButton>
      </Course>
    </main>
  );
}

import { LinkButton } from '@/components/ui/button';
import { Course } from '@/components/ui/course';
import { PageHead } from '@/components/ui/page-head';

export default function SharedHomeNotFound() {
  return (
    <main id="main">
      <PageHead title="Not here" />
      <Course as="div">
        <p className="mb-4 max-w-prose">There is no such home among those that are shared with you. Its owner may have archived it or ended your access: ask them to share it again.</p>
        <LinkButton href="/work">To the work ahead</LinkButton>
      </Course>
    </main>
  );
}

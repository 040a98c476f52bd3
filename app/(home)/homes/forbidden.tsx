import { LinkButton } from '@/components/ui/button';
import { Course } from '@/components/ui/course';
import { PageHead } from '@/components/ui/page-head';

export default function HomeForbidden() {
  return (
    <main id="main">
      <PageHead title="Only its owners may do this" />
      <Course as="div">
        <p className="mb-4 max-w-prose">You can see this home and log work on it. Its walls and facts are changed by its owner or a co-owner: ask one of them, or ask to become a co-owner.</p>
        <LinkButton href="/homes">To your homes</LinkButton>
      </Course>
    </main>
  );
}

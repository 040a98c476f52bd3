import { Button, LinkButton } from '@/components/ui/button';
import { Course } from '@/components/ui/course';
import { PageHead } from '@/components/ui/page-head';

const digestOf = (error: unknown): string | undefined =>
  typeof error === 'object' && error !== null && 'digest' in error && typeof error.digest === 'string' ? error.digest : undefined;

/** What to show when a page could not be made: calm, with what was kept and what to do. */
export function FaultPage({ error, retry }: { error: unknown; retry: () => void }) {
  const digest = digestOf(error);
  return (
    <main id="main">
      <PageHead title="This page could not be shown" lead="Something went wrong on our side. Everything saved before is kept; nothing was changed by this." />
      <Course as="div">
        <div className="flex flex-wrap gap-3">
          <Button onClick={retry}>Try again</Button>
          <LinkButton href="/" look="quiet">
            First page
          </LinkButton>
        </div>
        {digest ? (
          <p className="mt-6 text-quiet">
            If it happens again, write to whoever runs this service and name the fault <b className="figures">{digest}</b>.
          </p>
        ) : null}
      </Course>
    </main>
  );
}

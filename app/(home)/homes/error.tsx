'use client';

import { Button, LinkButton } from '@/components/ui/button';
import { Course } from '@/components/ui/course';
import { PageHead } from '@/components/ui/page-head';

type Props = { error: Error & { digest?: string }; reset: () => void };

export default function HomeError({ error, reset }: Props) {
  return (
    <main id="main">
      <PageHead title="This page did not load" />
      <Course as="div">
        <p className="mb-4 max-w-prose">
          Something went wrong on our side. Nothing of your homes was changed.
          {error.digest ? ` If it stays so, tell us this number: ${error.digest}.` : ''}
        </p>
        <div className="flex flex-wrap gap-3">
          <Button onClick={reset}>Try again</Button>
          <LinkButton href="/homes" look="quiet">
            To your homes
          </LinkButton>
        </div>
      </Course>
    </main>
  );
}

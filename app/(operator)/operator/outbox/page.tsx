import { type Metadata } from 'next';
import { requireActor } from '@/app/_server/actor';
import { outboxPage } from '@/app/_server/outbox';
import { PageHead } from '@/components/ui/page-head';
import { outboxQuery } from '@/lib/schemas/outbox';
import { Outbox } from './outbox';

export const metadata: Metadata = { title: 'Outbox' };

export default async function OutboxPage({ searchParams }: { searchParams: Promise<Record<string, string | string[] | undefined>> }) {
  const actor = await requireActor(['operator']);
  const query = outboxQuery.parse(await searchParams);
  return (
    <main id="main">
      <PageHead title="Outbox" lead="Every mail of the service, newest first. What waits is tried again by itself, later each time." path={[{ href: '/operator', label: 'Service' }]} />
      <Outbox query={query} first={outboxPage(actor, query)} />
    </main>
  );
}

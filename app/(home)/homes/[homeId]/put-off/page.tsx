import { type Metadata } from 'next';
import { pageData, pageHome } from '@/app/_server/page-data';
import { PutOffChoices } from '@/components/plan/put-off-choices';
import { Course } from '@/components/ui/course';
import { EmptyState } from '@/components/ui/empty-state';
import { PageHead } from '@/components/ui/page-head';
import { putOffAt } from '@/db/queries/deferrals';
import { putOffChoices } from '@/db/queries/put-off';
import { logStart } from '@/lib/home/log-start';
import { dayIn } from '@/lib/calendar';
import { workKinds } from '@/lib/schemas/vocabulary';
import { putOff, takeUp } from './actions';

export const metadata: Metadata = { title: 'Put off' };

type Props = { params: Promise<{ homeId: string }>; searchParams: Promise<{ kind?: string | string[]; wall?: string | string[] }> };

export default async function PutOffPage({ params, searchParams }: Props) {
  const { actor, view } = await pageHome((await params).homeId);
  const { home } = view;
  const walls = view.walls.map(({ wall }) => wall);
  const now = new Date();
  const { kind, chosen } = logStart(await searchParams, view.walls.flatMap(({ items }) => items), walls, dayIn(home.timeZone, now));
  const choices = pageData(() => putOffChoices(actor, home.id, kind, chosen, now));
  const stands = putOffAt(home.id).filter((one) => one.kind === kind && chosen.includes(one.wallId));
  return (
    <main id="main">
      <PageHead title={`Put off: ${workKinds[kind].toLowerCase()}`} lead="What waiting means for each wall, before you decide." path={[{ href: '/homes', label: 'Homes' }, { href: `/homes/${home.id}`, label: home.name }, { href: `/homes/${home.id}/plan`, label: 'Plan' }]} />
      {choices.length === 0 ? (
        <Course as="div">
          <EmptyState title="Nothing to put off here" action={{ href: `/homes/${home.id}/plan`, label: 'Back to the plan' }}>
            <p>The plan holds no such work on these walls. It may have been logged in the meantime.</p>
          </EmptyState>
        </Course>
      ) : (
        <PutOffChoices homeId={home.id} kind={kind} walls={walls} choices={choices} stands={stands.map(({ wallId }) => wallId)} putOff={putOff} takeUp={takeUp} />
      )}
    </main>
  );
}

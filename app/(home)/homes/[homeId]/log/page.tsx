import { type Metadata } from 'next';
import { pageHome } from '@/app/_server/page-data';
import { LogForm } from '@/components/home/log-form';
import { Course } from '@/components/ui/course';
import { EmptyState } from '@/components/ui/empty-state';
import { PageHead } from '@/components/ui/page-head';
import { unitsOf } from '@/db/queries/units';
import { addDays, dayIn } from '@/lib/calendar';
import { directionWord } from '@/lib/home/direction';
import { logStart } from '@/lib/home/log-start';
import { log } from './actions';

export const metadata: Metadata = { title: 'Log work' };

type Props = { params: Promise<{ homeId: string }>; searchParams: Promise<{ kind?: string | string[]; wall?: string | string[] }> };

export default async function LogPage({ params, searchParams }: Props) {
  const { actor, view } = await pageHome((await params).homeId);
  const today = dayIn(view.home.timeZone, new Date());
  const { kind, chosen } = logStart(await searchParams, view.walls.flatMap(({ items }) => items), view.walls.map(({ wall }) => wall), today);
  const walls = view.walls.map(({ wall }) => ({ id: wall.id, name: wall.name, hint: `faces ${directionWord(wall.azimuthDeg)}`, stainBase: wall.stainBase, sealant: wall.sealant }));
  return (
    <main id="main">
      <PageHead title="Log work" lead="What was done, on which walls, when. The clock of those walls starts anew from that day." path={[{ href: '/homes', label: 'Homes' }, { href: `/homes/${view.home.id}`, label: view.home.name }]} />
      <Course as="div">
        {walls.length === 0 ? (
          <EmptyState title="No walls yet" action={{ href: `/homes/${view.home.id}/walls/new`, label: 'Add a wall' }}>
            <p>Work is logged on walls: add the first one, then log what was done on it.</p>
          </EmptyState>
        ) : (
          <LogForm action={log} homeId={view.home.id} submissionKey={crypto.randomUUID()} units={unitsOf(actor)} today={today} yesterday={addDays(today, -1)} kind={kind} walls={walls} chosen={chosen} yearBuilt={view.home.yearBuilt} />
        )}
      </Course>
    </main>
  );
}

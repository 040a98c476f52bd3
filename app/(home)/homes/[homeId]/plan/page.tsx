import { type Metadata } from 'next';
import { pageHome } from '@/app/_server/page-data';
import { whatWasSaid } from '@/app/_server/said';
import { Said } from '@/components/home/said';
import { Undo } from '@/components/home/undo';
import { PlanActions } from '@/components/plan/plan-actions';
import { PlanCourses } from '@/components/plan/plan-courses';
import { Course } from '@/components/ui/course';
import { EmptyState } from '@/components/ui/empty-state';
import { PageHead } from '@/components/ui/page-head';
import { putOffAt } from '@/db/queries/deferrals';
import { dayIn } from '@/lib/calendar';
import { justPutOff } from '@/lib/home/log-start';
import { planView } from '@/lib/home/plan-view';
import { can } from '@/lib/permissions';
import { workKinds } from '@/lib/schemas/vocabulary';
import { takeUp } from '../put-off/actions';

export const metadata: Metadata = { title: 'Plan' };

type Props = { params: Promise<{ homeId: string }>; searchParams: Promise<{ kind?: string | string[]; wall?: string | string[] }> };

export default async function PlanPage({ params, searchParams }: Props) {
  const { actor, view } = await pageHome((await params).homeId);
  const { home, membership, walls } = view;
  const plan = planView(home, walls.map(({ wall }) => wall), walls.flatMap(({ items }) => items), dayIn(home.timeZone, new Date()));
  const mayLog = can(actor, 'work.log', { membership });
  const mayPutOff = can(actor, 'work.putOff', { membership });
  const gone = mayPutOff ? justPutOff(await searchParams, putOffAt(home.id)) : null;
  return (
    <main id="main">
      <PageHead title="Plan" lead="Every wall’s next work. What falls into one season is one visit." path={[{ href: '/homes', label: 'Homes' }, { href: `/homes/${home.id}`, label: home.name }]} actions={<PlanActions homeId={home.id} mayLog={mayLog} />} />
      <Said words={await whatWasSaid()} />
      {gone ? <Undo done={`${workKinds[gone.kind]}: put off.`} label="Take it up again" action={takeUp} fields={{ homeId: home.id, kind: gone.kind, 'wallIds[]': gone.wallIds }} /> : null}
      {walls.length === 0 ? (
        <Course as="div">
          <EmptyState title="No walls, no plan" action={{ href: `/homes/${home.id}/walls/new`, label: 'Add a wall' }}>
            <p>Add a wall with its size and direction: the sun on it and its next work follow at once.</p>
          </EmptyState>
        </Course>
      ) : (
        <PlanCourses initial={plan} mayLog={mayLog} mayPutOff={mayPutOff} />
      )}
    </main>
  );
}

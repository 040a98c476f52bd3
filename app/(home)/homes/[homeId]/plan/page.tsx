import { type Metadata } from 'next';
import { pageHome } from '@/app/_server/page-data';
import { PlanCourses } from '@/components/plan/plan-courses';
import { LinkButton } from '@/components/ui/button';
import { Course } from '@/components/ui/course';
import { EmptyState } from '@/components/ui/empty-state';
import { PageHead } from '@/components/ui/page-head';
import { dayIn } from '@/lib/calendar';
import { planView } from '@/lib/home/plan-view';
import { can } from '@/lib/permissions';

export const metadata: Metadata = { title: 'Plan' };

type Props = { params: Promise<{ homeId: string }> };

export default async function PlanPage({ params }: Props) {
  const { actor, view } = await pageHome((await params).homeId);
  const { home, membership, walls } = view;
  const plan = planView(home, walls.map(({ wall }) => wall), walls.flatMap(({ items }) => items), dayIn(home.timeZone, new Date()));
  const mayLog = can(actor, 'work.log', { membership });
  return (
    <main id="main">
      <PageHead title="Plan" lead="Every wall’s next work. What falls into one season is one visit." path={[{ href: '/homes', label: 'Homes' }, { href: `/homes/${home.id}`, label: home.name }]} actions={mayLog ? <LinkButton href={`/homes/${home.id}/log`}>Log work</LinkButton> : null} />
      {walls.length === 0 ? (
        <Course as="div">
          <EmptyState title="No walls, no plan" action={{ href: `/homes/${home.id}/walls/new`, label: 'Add a wall' }}>
            <p>Add a wall with its size and direction: the sun on it and its next work follow at once.</p>
          </EmptyState>
        </Course>
      ) : (
        <PlanCourses initial={plan} mayLog={mayLog} />
      )}
    </main>
  );
}

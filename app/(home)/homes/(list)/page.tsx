import { type Metadata } from 'next';
import { requireActor } from '@/app/_server/actor';
import { whatWasSaid } from '@/app/_server/said';
import { FirstHome } from '@/components/home/first-home';
import { HomeCourse } from '@/components/home/home-course';
import { RemovedHomes } from '@/components/home/removed-homes';
import { Said } from '@/components/home/said';
import { Undo } from '@/components/home/undo';
import { LinkButton } from '@/components/ui/button';
import { Course } from '@/components/ui/course';
import { EmptyState } from '@/components/ui/empty-state';
import { PageHead } from '@/components/ui/page-head';
import { homesWithWork } from '@/db/queries/home-list';
import { archivedHome } from '@/db/queries/homes';
import { removedHomes } from '@/db/queries/removed-homes';
import { dayIn } from '@/lib/calendar';
import { nextTogether, workGroups } from '@/lib/home/next-work';
import { restore } from '../actions';

export const metadata: Metadata = { title: 'Homes' };

type Props = { searchParams: Promise<{ archived?: string }> };

export default async function HomesPage({ searchParams }: Props) {
  const actor = await requireActor(['homeowner']);
  const homes = homesWithWork(actor);
  const now = new Date();
  const gone = archivedHome(actor, (await searchParams).archived);
  return (
    <main id="main">
      <PageHead title="Homes" actions={homes.length > 0 ? <LinkButton href="/homes/new">Add a home</LinkButton> : null} />
      <Said words={await whatWasSaid()} />
      {gone ? <Undo done={`${gone.name} is removed. It can be brought back for 30 days.`} label="Bring it back" action={restore} fields={{ homeId: gone.id }} /> : null}
      <RemovedHomes homes={removedHomes(actor, now).filter(({ id }) => id !== gone?.id)} restore={restore} />
      {homes.length === 0 ? (
        <Course as="div">
          <EmptyState title="Start with one home" action={{ href: '/homes/new', label: 'Set up a home' }} example={<FirstHome />}>
            <p>Give its postal code, turn a compass until the plan matches the house, and say when it was last stained. From that comes what each wall needs, when, and why.</p>
          </EmptyState>
        </Course>
      ) : (
        <ul>
          {homes.map(({ home, membership, walls, items }) => {
            const today = dayIn(home.timeZone, now);
            const next = nextTogether(workGroups(items, walls, today));
            return <HomeCourse key={home.id} id={home.id} name={home.name} place={[home.place, home.state].filter(Boolean).join(', ')} membership={membership} wallCount={walls.length} next={next} today={today} />;
          })}
        </ul>
      )}
    </main>
  );
}

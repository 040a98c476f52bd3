import { type Metadata } from 'next';
import { pageHome } from '@/app/_server/page-data';
import { WalkaroundForm } from '@/components/home/walkaround-form';
import { Course } from '@/components/ui/course';
import { EmptyState } from '@/components/ui/empty-state';
import { PageHead } from '@/components/ui/page-head';
import { addDays, dayIn } from '@/lib/calendar';
import { walkedWalls } from '@/lib/home/walked-walls';
import { keepWalkaround } from './actions';

export const metadata: Metadata = { title: 'Walkaround' };

type Props = { params: Promise<{ homeId: string }> };

export default async function WalkaroundPage({ params }: Props) {
  const { view } = await pageHome((await params).homeId);
  const { home } = view;
  const today = dayIn(home.timeZone, new Date());
  const walls = walkedWalls(view.walls);
  return (
    <main id="main">
      <PageHead title="Walkaround" lead="Take a cup of water with you. Answer what you see; leave out what you cannot. The plan moves by your answers and says by how much." path={[{ href: '/homes', label: 'Homes' }, { href: `/homes/${home.id}`, label: home.name }]} />
      {walls.length === 0 ? (
        <Course as="div">
          <EmptyState title="No walls yet" action={{ href: `/homes/${home.id}/walls/new`, label: 'Add a wall' }}>
            <p>A walkaround goes from wall to wall: add the first one.</p>
          </EmptyState>
        </Course>
      ) : (
        <WalkaroundForm action={keepWalkaround} homeId={home.id} submissionKey={crypto.randomUUID()} today={today} yesterday={addDays(today, -1)} walls={walls} yearBuilt={home.yearBuilt} />
      )}
    </main>
  );
}

import { type Metadata } from 'next';
import { keepWalkaround } from '@/app/(home)/homes/[homeId]/walkaround/actions';
import { WalkaroundForm } from '@/components/home/walkaround-form';
import { Course } from '@/components/ui/course';
import { PageHead } from '@/components/ui/page-head';
import { addDays, dayIn } from '@/lib/calendar';
import { walkedWalls } from '@/lib/home/walked-walls';
import { sharedHome } from '../../shared-home';

export const metadata: Metadata = { title: 'Walkaround' };

type Props = { params: Promise<{ homeId: string }> };

export default async function ContractorWalkaroundPage({ params }: Props) {
  const { view } = await sharedHome((await params).homeId);
  const { home } = view;
  const today = dayIn(home.timeZone, new Date());
  const walls = walkedWalls(view.walls);
  return (
    <main id="main">
      <PageHead title="Walkaround" lead="What you see moves the owner’s plan, and says by how much. Leave out what you cannot see." path={[{ href: '/work', label: 'Work ahead' }, { href: `/work/${home.id}`, label: home.name }]} />
      {walls.length === 0 ? (
        <Course as="div">
          <p>The owner has not set up any walls yet: a walkaround goes from wall to wall.</p>
        </Course>
      ) : (
        <WalkaroundForm action={keepWalkaround} homeId={home.id} submissionKey={crypto.randomUUID()} today={today} yesterday={addDays(today, -1)} walls={walls} yearBuilt={home.yearBuilt} />
      )}
    </main>
  );
}

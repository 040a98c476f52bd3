import { type Metadata } from 'next';
import { log } from '@/app/(home)/homes/[homeId]/log/actions';
import { requireActor } from '@/app/_server/actor';
import { pageData } from '@/app/_server/page-data';
import { LogForm } from '@/components/home/log-form';
import { Course } from '@/components/ui/course';
import { PageHead } from '@/components/ui/page-head';
import { homeView } from '@/db/queries/home-view';
import { unitsOf } from '@/db/queries/units';
import { addDays, dayIn } from '@/lib/calendar';
import { directionWord } from '@/lib/home/direction';

export const metadata: Metadata = { title: 'Log work' };

type Props = { params: Promise<{ homeId: string }> };

export default async function ContractorLogPage({ params }: Props) {
  const actor = await requireActor(['contractor']);
  const { homeId } = await params;
  const view = pageData(() => homeView(actor, homeId));
  const today = dayIn(view.home.timeZone, new Date());
  const walls = view.walls.map(({ wall }) => ({ id: wall.id, name: wall.name, hint: `faces ${directionWord(wall.azimuthDeg)}`, stainBase: wall.stainBase, sealant: wall.sealant }));
  return (
    <main id="main">
      <PageHead title="Log work" lead="The owner sees it at once, and the clock of those walls starts anew." path={[{ href: '/work', label: 'Work ahead' }, { href: `/work/${homeId}`, label: view.home.name }]} />
      <Course as="div">
        <LogForm action={log} homeId={homeId} submissionKey={crypto.randomUUID()} units={unitsOf(actor)} today={today} yesterday={addDays(today, -1)} kind="restain" walls={walls} chosen={[]} yearBuilt={view.home.yearBuilt} />
      </Course>
    </main>
  );
}

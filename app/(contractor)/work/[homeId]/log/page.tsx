import { type Metadata } from 'next';
import { log } from '@/app/(home)/homes/[homeId]/log/actions';
import { LogForm } from '@/components/home/log-form';
import { Course } from '@/components/ui/course';
import { PageHead } from '@/components/ui/page-head';
import { unitsOf } from '@/db/queries/units';
import { addDays, dayIn } from '@/lib/calendar';
import { directionWord } from '@/lib/home/direction';
import { logStart } from '@/lib/home/log-start';
import { sharedHome } from '../../shared-home';

export const metadata: Metadata = { title: 'Log work' };

type Props = { params: Promise<{ homeId: string }>; searchParams: Promise<{ kind?: string | string[]; wall?: string | string[] }> };

export default async function ContractorLogPage({ params, searchParams }: Props) {
  const { actor, view } = await sharedHome((await params).homeId);
  const { home } = view;
  const today = dayIn(home.timeZone, new Date());
  const films = view.walls.flatMap(({ items }) => items).filter(({ kind }) => kind === 'restain' || kind === 'recaulk');
  const { kind, chosen } = logStart(await searchParams, films, view.walls.map(({ wall }) => wall), today);
  const walls = view.walls.map(({ wall }) => ({ id: wall.id, name: wall.name, hint: `faces ${directionWord(wall.azimuthDeg)}`, stainBase: wall.stainBase, sealant: wall.sealant }));
  return (
    <main id="main">
      <PageHead title="Log work" lead="The owner sees it at once, and the clock of those walls starts anew." path={[{ href: '/work', label: 'Work ahead' }, { href: `/work/${home.id}`, label: home.name }]} />
      <Course as="div">
        {walls.length === 0 ? (
          <p>The owner has not set up any walls yet: work is logged on walls.</p>
        ) : (
          <LogForm action={log} homeId={home.id} submissionKey={crypto.randomUUID()} units={unitsOf(actor)} today={today} yesterday={addDays(today, -1)} kind={kind} walls={walls} chosen={chosen} yearBuilt={home.yearBuilt} />
        )}
      </Course>
    </main>
  );
}

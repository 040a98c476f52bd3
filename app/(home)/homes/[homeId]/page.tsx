import { type Metadata } from 'next';
import { pageHome } from '@/app/_server/page-data';
import { whatWasSaid } from '@/app/_server/said';
import { FadeStrip } from '@/components/drawings/fade-strip';
import { fadeWalls, planWalls } from '@/components/home/drawn-walls';
import { HomeActions } from '@/components/home/home-actions';
import { HouseCourse } from '@/components/home/house-course';
import { NextCourse } from '@/components/home/next-course';
import { NoWalls } from '@/components/home/no-walls';
import { Said } from '@/components/home/said';
import { SeasonCourse } from '@/components/home/season-course';
import { Undo } from '@/components/home/undo';
import { UpcomingList } from '@/components/home/upcoming-list';
import { WallFigures } from '@/components/home/wall-figures';
import { Course } from '@/components/ui/course';
import { PageHead } from '@/components/ui/page-head';
import { unitsOf } from '@/db/queries/units';
import { takenOutWall } from '@/db/queries/walls';
import { workState } from '@/lib/care';
import { dayIn, monthOf } from '@/lib/calendar';
import { stationById } from '@/lib/climate';
import { decidingItem, nextTogether, workGroups } from '@/lib/home/next-work';
import { seasonsOf } from '@/lib/home/season';
import { can } from '@/lib/permissions';
import { bringBackWall } from './walls/actions';

type Props = { params: Promise<{ homeId: string }>; searchParams: Promise<{ removed?: string }> };

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  return { title: (await pageHome((await params).homeId)).view.home.name };
}

export default async function HomePage({ params, searchParams }: Props) {
  const { actor, view } = await pageHome((await params).homeId);
  const { home, membership, walls, records } = view;
  const may = (verb: 'home.edit' | 'work.log') => can(actor, verb, { membership });
  const gone = may('home.edit') ? takenOutWall(actor, home.id, (await searchParams).removed) : undefined;
  const today = dayIn(home.timeZone, new Date());
  const rows = walls.map(({ wall }) => wall);
  const groups = workGroups(walls.flatMap(({ items }) => items), rows, today);
  const together = nextTogether(groups);
  const item = decidingItem(together);
  const deciding = walls.find(({ wall }) => wall.id === item?.wallId);
  const { station, seasons } = seasonsOf(home, rows.map((wall) => wall.stainBase));
  return (
    <main id="main">
      <PageHead title={home.name} lead={[home.place, home.state].filter(Boolean).join(', ')} path={[{ href: '/homes', label: 'Homes' }]} actions={<HomeActions homeId={home.id} mayEdit={may('home.edit')} mayLog={may('work.log')} />} />
      <Said words={await whatWasSaid()} />
      {gone ? <Undo done={`${gone.name} was taken out. Its history is kept.`} label="Bring it back" action={bringBackWall} fields={{ homeId: home.id, wallId: gone.id }} /> : null}
      {deciding && item ? (
        <NextCourse homeId={home.id} groups={together} wallCount={rows.length} today={today} mayLog={may('work.log')} why={{ wall: deciding.wall.name, because: item.because }}>
          <WallFigures planned={deciding} home={home} station={stationById(home.stationId)} today={today} units={unitsOf(actor)} films={item.kind === 'recaulk' ? ['seal'] : ['coat']} />
        </NextCourse>
      ) : null}
      {walls.length === 0 ? <NoWalls homeId={home.id} /> : null}
      {walls.length > 0 ? (
        <>
          <HouseCourse walls={planWalls(home.id, walls, (item) => workState(item, today))} home={home} today={today} mayEdit={may('home.edit')} />
          <Course heading="Every wall through the years" aside="From fresh color to weathered gray. The thin line is the caulk.">
            <FadeStrip today={today} walls={fadeWalls(home.id, walls, records)} />
          </Course>
          <Course heading="After that">
            <UpcomingList groups={groups.filter((group) => !together.includes(group)).slice(0, 6)} wallCount={rows.length} today={today} />
          </Course>
          {seasons.length > 0 ? <SeasonCourse seasons={seasons} month={monthOf(today)} station={station} /> : null}
        </>
      ) : null}
    </main>
  );
}

import { type Metadata } from 'next';
import { requireActor } from '@/app/_server/actor';
import { pageData } from '@/app/_server/page-data';
import { whatWasSaid } from '@/app/_server/said';
import { FadeStrip } from '@/components/drawings/fade-strip';
import { SunSlider } from '@/components/drawings/sun-slider';
import { fadeWalls, planWalls } from '@/components/home/drawn-walls';
import { RecordCourse } from '@/components/home/record-course';
import { Said } from '@/components/home/said';
import { WallFigures } from '@/components/home/wall-figures';
import { UpcomingList } from '@/components/home/upcoming-list';
import { LinkButton } from '@/components/ui/button';
import { Course } from '@/components/ui/course';
import { Measure } from '@/components/ui/measure';
import { PageHead } from '@/components/ui/page-head';
import { homeView } from '@/db/queries/home-view';
import { unitsOf } from '@/db/queries/units';
import { workState } from '@/lib/care';
import { dayIn } from '@/lib/calendar';
import { stationById } from '@/lib/climate';
import { directionWord } from '@/lib/home/direction';
import { workGroups } from '@/lib/home/next-work';
import { finishes, sealants, stainBases, textures } from '@/lib/schemas/vocabulary';
import { wallAreaM2 } from '@/lib/takeoff';

export const metadata: Metadata = { title: 'Shared home' };

type Props = { params: Promise<{ homeId: string }> };

export default async function SharedHomePage({ params }: Props) {
  const actor = await requireActor(['contractor']);
  const { homeId } = await params;
  const { home, walls, records } = pageData(() => homeView(actor, homeId));
  const today = dayIn(home.timeZone, new Date());
  const units = unitsOf(actor);
  const station = stationById(home.stationId);
  const rows = walls.map(({ wall }) => wall);
  const anchor = (id: string) => `#wall-${id}`;
  const groups = workGroups(walls.flatMap(({ items }) => items), rows, today);
  return (
    <main id="main">
      <PageHead title={home.name} lead={[home.place, home.state].filter(Boolean).join(', ')} path={[{ href: '/work', label: 'Work ahead' }]} actions={<LinkButton href={`/work/${home.id}/log`}>Log work</LinkButton>} />
      <Said words={await whatWasSaid()} />
      <Course heading="Coming up"><UpcomingList groups={groups} wallCount={rows.length} today={today} /></Course>
      <Course heading="The house" aside="Touch a wall to read about it.">
        <SunSlider walls={planWalls(home.id, walls, (item) => workState(item, today)).map((wall) => ({ ...wall, href: anchor(wall.id) }))} place={{ latitude: home.latitude, longitude: home.longitude, timeZone: home.timeZone }} day={today} label={`${home.name} from above, north up`} />
      </Course>
      <Course heading="Every wall through the years">
        <FadeStrip today={today} walls={fadeWalls(home.id, walls, records).map((wall) => ({ ...wall, href: anchor(wall.id) }))} />
      </Course>
      {walls.map((planned) => (
        <Course key={planned.wall.id} id={`wall-${planned.wall.id}`} heading={planned.wall.name} aside={`faces ${directionWord(planned.wall.azimuthDeg)}`}>
          <p className="text-lg"><Measure kind="area" value={wallAreaM2({ ...planned.wall, openings: planned.openings })} units={units} /> · <Measure kind="length" value={planned.wall.widthM} units={units} /> × <Measure kind="length" value={planned.wall.heightM} units={units} /></p>
          <p className="text-quiet">{[finishes[planned.wall.finish], stainBases[planned.wall.stainBase], textures[planned.wall.texture], `${sealants[planned.wall.sealant]} caulk`].join(' · ')}</p>
          <div className="mt-2 grid max-w-4xl gap-x-10 sm:grid-cols-2"><WallFigures planned={planned} home={home} station={station} today={today} units={units} films={['coat', 'seal']} /></div>
        </Course>
      ))}
      <section aria-labelledby="record">
        <Course as="div" tone="quiet"><h2 id="record">Record</h2></Course>
        {records.length === 0 ? <Course as="div"><p className="text-quiet">Nothing is logged yet.</p></Course> : <ul>{records.map((record) => <RecordCourse key={record.id} record={record} walls={rows} units={units} />)}</ul>}
      </section>
    </main>
  );
}

import { type Metadata } from 'next';
import { putBack, takeBack } from '@/app/(home)/homes/[homeId]/record/actions';
import { whatWasSaid } from '@/app/_server/said';
import { FadeStrip } from '@/components/drawings/fade-strip';
import { SunSlider } from '@/components/drawings/sun-slider';
import { fadeWalls, planWalls } from '@/components/home/drawn-walls';
import { Said } from '@/components/home/said';
import { Undo } from '@/components/home/undo';
import { UpcomingList } from '@/components/home/upcoming-list';
import { SharedRecords } from '@/components/jobs/shared-records';
import { SharedWall } from '@/components/jobs/shared-wall';
import { StainFigures } from '@/components/jobs/stain-figures';
import { LinkButton } from '@/components/ui/button';
import { Course } from '@/components/ui/course';
import { Measure } from '@/components/ui/measure';
import { PageHead } from '@/components/ui/page-head';
import { PrintButton } from '@/components/ui/print-button';
import { unitsOf } from '@/db/queries/units';
import { removedRecord } from '@/db/queries/work';
import { workState } from '@/lib/care';
import { dayIn } from '@/lib/calendar';
import { stationById } from '@/lib/climate';
import { workGroups } from '@/lib/home/next-work';
import { stainForHome } from '@/lib/jobs/work-ahead';
import { can } from '@/lib/permissions';
import { workKinds, woods } from '@/lib/schemas/vocabulary';
import { wallAreaM2 } from '@/lib/takeoff';
import { sharedHome } from '../shared-home';

type Props = { params: Promise<{ homeId: string }>; searchParams: Promise<{ removed?: string }> };

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  return { title: (await sharedHome((await params).homeId)).view.home.name };
}

export default async function SharedHomePage({ params, searchParams }: Props) {
  const { actor, view } = await sharedHome((await params).homeId);
  const { home, membership, walls, records } = view;
  const gone = removedRecord(actor, home.id, (await searchParams).removed);
  const today = dayIn(home.timeZone, new Date());
  const units = unitsOf(actor);
  const rows = walls.map(({ wall }) => wall);
  const toWall = <T extends { id: string }>(wall: T) => ({ ...wall, href: `#wall-${wall.id}` });
  const areas = walls.map(({ wall, openings }) => ({ texture: wall.texture, areaM2: wallAreaM2({ ...wall, openings }) }));
  const stain = stainForHome(home, areas, units);
  const own = records.filter(({ createdBy }) => can(actor, 'work.remove', { membership, createdBy })).map(({ id }) => id);
  const facts = [`${home.sidingNominalIn} in log siding`, woods[home.wood], home.yearBuilt ? `built in ${home.yearBuilt}` : null].filter(Boolean).join(' · ');
  return (
    <main id="main">
      <PageHead title={home.name} lead={`${[home.place, home.state].filter(Boolean).join(', ')}. ${facts}`} path={[{ href: '/work', label: 'Work ahead' }]} actions={<><LinkButton href={`/work/${home.id}/log`}>Log work</LinkButton><LinkButton href={`/work/${home.id}/walkaround`} look="quiet">Walkaround</LinkButton><PrintButton>Print</PrintButton></>} />
      <Said words={await whatWasSaid()} />
      {gone ? <Undo done={`The ${workKinds[gone.kind].toLowerCase()} was taken back.`} label="Put it back" action={putBack} fields={{ recordId: gone.id }} /> : null}
      {walls.length === 0 ? <Course as="div"><p>The owner has not set up any walls yet. Their measures and work will stand here.</p></Course> : null}
      {walls.length > 0 ? (
        <>
          <Course heading="Coming up"><UpcomingList groups={workGroups(walls.flatMap(({ items }) => items), rows, today)} wallCount={rows.length} today={today} /></Course>
          <Course heading="All walls" aside="In two coats, with a tenth of waste.">
            <p className="text-lg"><Measure kind="area" value={areas.reduce((sum, { areaM2 }) => sum + areaM2, 0)} units={units} /> of wood</p>
            {stain ? <StainFigures stain={stain} units={units} /> : null}
          </Course>
          <Course heading="The house" aside="Touch a wall to read about it.">
            <SunSlider walls={planWalls(home.id, walls, (item) => workState(item, today)).map(toWall)} place={{ latitude: home.latitude, longitude: home.longitude, timeZone: home.timeZone }} day={today} label={`${home.name} from above, north up`} />
          </Course>
          <Course heading="Every wall through the years" aside="From fresh color to weathered grey. The thin line is the caulk.">
            <FadeStrip today={today} walls={fadeWalls(home.id, walls, records).map(toWall)} />
          </Course>
          {walls.map((planned) => <SharedWall key={planned.wall.id} planned={planned} home={home} station={stationById(home.stationId)} today={today} units={units} />)}
        </>
      ) : null}
      <SharedRecords records={records} walls={rows} units={units} own={own} takeBack={takeBack} />
    </main>
  );
}

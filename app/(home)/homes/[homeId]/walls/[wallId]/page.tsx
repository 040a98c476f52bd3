import { type Metadata } from 'next';
import { pageData, pageHome, pageWall } from '@/app/_server/page-data';
import { whatWasSaid } from '@/app/_server/said';
import { MonthlySun } from '@/components/charts/monthly-sun';
import { WallElevation } from '@/components/drawings/wall-elevation';
import { LearnedCourse } from '@/components/home/learned-course';
import { Neighbours } from '@/components/home/neighbours';
import { Said } from '@/components/home/said';
import { WallFigures } from '@/components/home/wall-figures';
import { WallRecord } from '@/components/home/wall-record';
import { WallWork } from '@/components/home/wall-work';
import { WhatIf } from '@/components/home/what-if';
import { LinkButton } from '@/components/ui/button';
import { Course } from '@/components/ui/course';
import { PageHead } from '@/components/ui/page-head';
import { unitsOf } from '@/db/queries/units';
import { wallWhatIf } from '@/db/queries/what-if';
import { dayIn } from '@/lib/calendar';
import { stationById } from '@/lib/climate';
import { coatLeft } from '@/lib/coat';
import { coverOfStored, coverWords } from '@/lib/home/cover';
import { directionWord } from '@/lib/home/direction';
import { recordsOfWall } from '@/lib/home/records-of-wall';
import { wallMeasures } from '@/lib/home/wall-measures';
import { can } from '@/lib/permissions';

type Props = { params: Promise<{ homeId: string; wallId: string }> };

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { homeId, wallId } = await params;
  return { title: (await pageWall(homeId, wallId)).wall.name };
}

export default async function WallPage({ params }: Props) {
  const { homeId, wallId } = await params;
  const { actor, view } = await pageHome(homeId);
  const planned = await pageWall(homeId, wallId);
  const { home, membership, walls } = view;
  const records = recordsOfWall(view.records, wallId);
  const { wall, openings, exposure, coat, items } = planned;
  const units = unitsOf(actor);
  const now = new Date();
  const today = dayIn(home.timeZone, now);
  const { words: size, courseM } = wallMeasures(wall, openings, home.sidingNominalIn, units);
  const cover = coverWords(wall, units);
  const words = cover ? `${size} ${cover}.` : size;
  const used = coat.startedOn ? 1 - coatLeft(coat.startedOn, coat.lifeMonths, today) : 0;
  const mayEdit = can(actor, 'home.edit', { membership });
  return (
    <main id="main">
      <PageHead title={wall.name} lead={`Faces ${directionWord(wall.azimuthDeg)}. ${words}`} path={[{ href: '/homes', label: 'Homes' }, { href: `/homes/${homeId}`, label: home.name }]} actions={mayEdit ? <LinkButton href={`/homes/${homeId}/walls/${wallId}/edit`} look="quiet">Edit this wall</LinkButton> : null} />
      <Said words={await whatWasSaid()} />
      <Course as="div">
        <div className="grid items-center gap-x-12 gap-y-6 lg:grid-cols-[3fr_2fr]">
          <WallElevation name={wall.name} widthM={wall.widthM} heightM={wall.heightM} gableHeightM={wall.gableHeightM} eaveDepthM={wall.eaveDepthM} courseM={courseM} openings={openings} cover={coverOfStored(wall)} colorHex={wall.colorHex} used={used} words={`${wall.name} from the front. ${words}`} />
          <div className="grid gap-x-10 gap-y-2 sm:grid-cols-2 sm:[&>details[open]]:col-span-full lg:grid-cols-1">
            <WallFigures planned={{ ...planned, exposure: null }} home={home} station={undefined} today={today} units={units} films={['coat', 'seal']} />
          </div>
        </div>
      </Course>
      <Course heading="Next work">
        <WallWork homeId={homeId} wallId={wallId} items={items} today={today} mayLog={can(actor, 'work.log', { membership })} mayEdit={mayEdit} mayPutOff={can(actor, 'work.putOff', { membership })} />
      </Course>
      <LearnedCourse films={[planned.coat, planned.seal]} />
      <Course heading="Sun">
        <div className="mb-4 grid gap-x-10 gap-y-2 sm:grid-cols-2 sm:[&>details[open]]:col-span-full">
          <WallFigures planned={planned} home={home} station={stationById(home.stationId)} today={today} units={units} films={[]} hours />
        </div>
        {exposure ? <MonthlySun wallName={wall.name} doseMonthly={exposure.doseMonthly} /> : null}
      </Course>
      <WhatIf view={pageData(() => wallWhatIf(actor, homeId, wallId, now))} />
      <WallRecord homeId={homeId} records={records} walls={walls.map((one) => one.wall)} units={units} />
      <Neighbours homeId={homeId} walls={walls.map((one) => one.wall)} wallId={wallId} />
    </main>
  );
}

import { type Metadata } from 'next';
import { pageHome } from '@/app/_server/page-data';
import { WorkCautions } from '@/components/home/work-cautions';
import { When } from '@/components/plan/when';
import { Buying } from '@/components/takeoff/buying';
import { Course } from '@/components/ui/course';
import { EmptyState } from '@/components/ui/empty-state';
import { PageHead } from '@/components/ui/page-head';
import { unitsOf } from '@/db/queries/units';
import { dayIn } from '@/lib/calendar';
import { buyingStart } from '@/lib/home/buying';
import { caulkStart } from '@/lib/home/caulk-start';
import { cleanerStart } from '@/lib/home/cleaner-start';
import { workGroups, workWords } from '@/lib/home/next-work';
import { answerForm } from '@/lib/takeoff/form-answer';
import { areaText } from '@/lib/units';

export const metadata: Metadata = { title: 'What to buy' };

type Props = { params: Promise<{ homeId: string }>; searchParams: Promise<Record<string, string | string[] | undefined>> };

export default async function BuyPage({ params, searchParams }: Props) {
  const { actor, view } = await pageHome((await params).homeId);
  const { home, walls } = view;
  const units = unitsOf(actor);
  const rows = walls.map(({ wall }) => wall);
  const today = dayIn(home.timeZone, new Date());
  const groups = workGroups(walls.flatMap(({ items }) => items), rows, today);
  const next = groups.find(({ kind }) => kind === 'restain');
  const toCaulk = groups.find(({ kind }) => kind === 'recaulk')?.walls.map(({ id }) => id) ?? [];
  const sent = await searchParams;
  const toStain = next?.walls.map(({ id }) => id) ?? [];
  const { areas, start } = buyingStart(home, walls, toStain, units, sent);
  return (
    <main id="main">
      <PageHead title="What to buy" lead="Stain, caulk, backer rod and cleaner for the walls you choose, in the cheapest containers that hold them." path={[{ href: '/homes', label: 'Homes' }, { href: `/homes/${home.id}`, label: home.name }]} />
      {next ? (
        <Course heading="Next restain">
          <p className="text-lg">
            <strong>{workWords([next], rows.length)}</strong>
          </p>
          <p>
            <When spell={next} today={today} capital />
          </p>
        </Course>
      ) : null}
      {areas.length === 0 ? (
        <Course as="div">
          <EmptyState title="No walls to measure yet" action={{ href: `/homes/${home.id}/walls/new`, label: 'Add a wall' }}>
            <p>The amount follows from the size of the walls, their siding and their surface.</p>
          </EmptyState>
        </Course>
      ) : (
        <Buying stain={{ walls: areas.map((area) => ({ ...area, areaText: areaText(area.areaM2, units) })), start, first: answerForm(start) }} caulk={caulkStart(home, walls, toCaulk, units, sent)} cleaner={cleanerStart(home, areas, toStain, units, sent)} />
      )}
      <Course heading="Before you open a can">
        <WorkCautions facts={{ kinds: ['restain'], yearBuilt: home.yearBuilt, stainBases: rows.map((wall) => wall.stainBase) }} />
      </Course>
    </main>
  );
}

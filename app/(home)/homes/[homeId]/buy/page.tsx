import { type Metadata } from 'next';
import { pageHome } from '@/app/_server/page-data';
import { WorkCautions } from '@/components/home/work-cautions';
import { When } from '@/components/plan/when';
import { StainCalculator } from '@/components/takeoff/stain-calculator';
import { Course } from '@/components/ui/course';
import { EmptyState } from '@/components/ui/empty-state';
import { PageHead } from '@/components/ui/page-head';
import { unitsOf } from '@/db/queries/units';
import { dayIn } from '@/lib/calendar';
import { buyingStart } from '@/lib/home/buying';
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
  const next = workGroups(walls.flatMap(({ items }) => items), rows, today).find(({ kind }) => kind === 'restain');
  const { areas, start } = buyingStart(home, walls, next?.walls.map(({ id }) => id) ?? [], units, await searchParams);
  return (
    <main id="main">
      <PageHead title="What to buy" lead="Stain for the walls you choose, and the cheapest cans that hold it." path={[{ href: '/homes', label: 'Homes' }, { href: `/homes/${home.id}`, label: home.name }]} />
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
      <Course as="div">
        {areas.length === 0 ? (
          <EmptyState title="No walls to measure yet" action={{ href: `/homes/${home.id}/walls/new`, label: 'Add a wall' }}>
            <p>The amount follows from the size of the walls, their siding and their surface.</p>
          </EmptyState>
        ) : (
          <StainCalculator walls={areas.map((area) => ({ ...area, areaText: areaText(area.areaM2, units) }))} start={start} first={answerForm(start)} />
        )}
      </Course>
      <Course heading="Before you open a can">
        <WorkCautions facts={{ kinds: ['restain'], yearBuilt: home.yearBuilt, stainBases: rows.map((wall) => wall.stainBase) }} />
      </Course>
    </main>
  );
}

import { type Metadata } from 'next';
import { pageHome } from '@/app/_server/page-data';
import { DayCheck } from '@/components/day/day-check';
import { ShadeList } from '@/components/day/shade-list';
import { WorkCautions } from '@/components/home/work-cautions';
import { Course } from '@/components/ui/course';
import { EmptyState } from '@/components/ui/empty-state';
import { PageHead } from '@/components/ui/page-head';
import { unitsOf } from '@/db/queries/units';
import { dayIn } from '@/lib/calendar';
import { exactDay } from '@/lib/calendar-words';
import { workGroups } from '@/lib/home/next-work';
import { shadeToday } from '@/lib/home/shade-today';
import { queryForm, type QueryValues, readForm } from '@/lib/schemas/form-values';

export const metadata: Metadata = { title: 'Is today the day?' };

type Props = { params: Promise<{ homeId: string }>; searchParams: Promise<QueryValues> };

export default async function DayPage({ params, searchParams }: Props) {
  const { actor, view } = await pageHome((await params).homeId);
  const { home, walls } = view;
  const sent = readForm(queryForm(await searchParams));
  const rows = walls.map(({ wall }) => wall);
  const today = dayIn(home.timeZone, new Date());
  const next = workGroups(walls.flatMap(({ items }) => items), rows, today).find(({ kind }) => kind === 'restain' || kind === 'recaulk');
  const nextWall = rows.find(({ id }) => id === next?.walls[0]?.id) ?? rows[0];
  const start = { work: next?.kind ?? 'restain', base: nextWall?.stainBase ?? 'waterborne', ...sent };
  return (
    <main id="main">
      <PageHead title="Is today the day?" lead="The weather in; go, wait or no out, with the limit behind each answer. Nothing is kept." path={[{ href: '/homes', label: 'Homes' }, { href: `/homes/${home.id}`, label: home.name }]} />
      <Course as="div">
        <DayCheck start={start} sent={'temperature' in sent} units={unitsOf(actor)} />
      </Course>
      <Course heading="Follow the shade" aside={`${exactDay(today)}, by the sun and by what stands in front of each wall. Clouds are not counted.`}>
        {rows.length > 0 ? (
          <ShadeList homeId={home.id} order={shadeToday(home, rows, today)} />
        ) : (
          <EmptyState title="No walls yet" action={{ href: `/homes/${home.id}/walls/new`, label: 'Add a wall' }}>
            <p>With a wall’s direction we can say when it is in the shade.</p>
          </EmptyState>
        )}
      </Course>
      <Course heading="Before you begin">
        <WorkCautions facts={{ kinds: ['restain', 'recaulk'], yearBuilt: home.yearBuilt, stainBases: rows.map((wall) => wall.stainBase), sealants: rows.map((wall) => wall.sealant) }} />
      </Course>
    </main>
  );
}

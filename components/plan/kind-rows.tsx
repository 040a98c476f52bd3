import { type Route } from 'next';
import Link from 'next/link';
import { When } from '@/components/plan/when';
import { LinkButton } from '@/components/ui/button';
import { Figure } from '@/components/ui/figure';
import { StateMark } from '@/components/ui/state-mark';
import { type CalendarDay } from '@/lib/calendar';
import { type PlanItem, type PlanVisit } from '@/lib/home/plan-view';
import { workKinds, type WorkKind } from '@/lib/schemas/vocabulary';

type KindRowsProps = { homeId: string; kind: WorkKind; items: PlanItem[]; visit: PlanVisit; today: CalendarDay; wallCount: number; mayLog: boolean; mayPutOff: boolean };

/** Items with the same reason and days are one row. */
function alike(items: PlanItem[]): PlanItem[][] {
  const rows = new Map<string, PlanItem[]>();
  for (const item of items) {
    const key = [item.because, item.state, item.opensOn, item.closesOn].join('|');
    rows.set(key, [...(rows.get(key) ?? []), item]);
  }
  return [...rows.values()];
}

/** One kind of work in a visit: on which walls, how it stands, why. */
export function KindRows({ homeId, kind, items, visit, today, wallCount, mayLog, mayPutOff }: KindRowsProps) {
  const query = new URLSearchParams([['kind', kind], ...items.map((item) => ['wall', item.wallId])]);
  return (
    <div>
      <div className="flex flex-wrap items-center justify-between gap-3">
        <h3>
          {workKinds[kind]}
          {items.length > 1 && items.length === wallCount ? ` all ${wallCount} walls` : ''}
        </h3>
        <span className="no-print flex flex-wrap">
          {mayLog ? (
            <LinkButton href={kind === 'walkaround' ? `/homes/${homeId}/walkaround?${query}` : `/homes/${homeId}/log?${query}`} look="plain">
              {kind === 'walkaround' ? 'Walk around now' : `Log this ${workKinds[kind].toLowerCase()}`}
            </LinkButton>
          ) : null}
          {mayPutOff ? (
            <LinkButton href={`/homes/${homeId}/put-off?${query}`} look="plain">
              Put off
            </LinkButton>
          ) : null}
        </span>
      </div>
      <ul>
        {alike(items).map((row) => (
          <Row key={row[0]?.wallId} homeId={homeId} row={row} visit={visit} today={today} />
        ))}
      </ul>
    </div>
  );
}

function Row({ homeId, row, visit, today }: { homeId: string; row: PlanItem[]; visit: PlanVisit; today: CalendarDay }) {
  const [first] = row;
  if (!first) return null;
  const otherDays = first.missedOn === null && (first.opensOn !== visit.opensOn || first.closesOn !== visit.closesOn);
  return (
    <li className="grid gap-x-6 border-t border-line py-3 md:grid-cols-[10rem_8rem_minmax(0,1fr)]">
      <div className="flex flex-wrap gap-x-4 md:block">
        {row.map((item) => (
          <Link key={item.wallId} href={`/homes/${homeId}/walls/${item.wallId}` as Route} className="link flex min-h-11 items-center font-semibold">
            {item.wallName}
          </Link>
        ))}
      </div>
      <p className="flex min-h-11 items-center self-start">
        <StateMark state={first.state} />
      </p>
      <div className="min-w-0 md:pt-2">
        {otherDays ? (
          <p>
            <When spell={first} today={today} capital />
          </p>
        ) : null}
        <p className="max-w-prose">{first.because}</p>
        <Figure explanation={first.explanation} />
      </div>
    </li>
  );
}

import { type Route } from 'next';
import Link from 'next/link';
import { When } from '@/components/plan/when';
import { LinkButton } from '@/components/ui/button';
import { Course } from '@/components/ui/course';
import { Figure } from '@/components/ui/figure';
import { StateMark } from '@/components/ui/state-mark';
import { aboutDay, aboutRange, exactRange, fromToday } from '@/lib/calendar-words';
import { type CalendarDay } from '@/lib/calendar';
import { type PlanItem, type PlanVisit } from '@/lib/home/plan-view';
import { workKinds, type WorkKind } from '@/lib/schemas/vocabulary';

/** Dirt comes off first, caulk goes on before stain. */
const sequence: WorkKind[] = ['walkaround', 'wash', 'recaulk', 'restain'];

type VisitCourseProps = { homeId: string; visit: PlanVisit; today: CalendarDay; mayLog: boolean };

/** Work that one trip does, in the order in which it is done. */
export function VisitCourse({ homeId, visit, today, mayLog }: VisitCourseProps) {
  const { opensOn, closesOn } = visit;
  const late = visit.items.some((item) => item.state === 'overdue');
  const aside = opensOn > today ? fromToday(opensOn, today) : closesOn < today ? `over since ${aboutDay(closesOn)}` : 'open now';
  return (
    <Course heading={<span title={exactRange(opensOn, closesOn)}>{aboutRange(opensOn, closesOn)}</span>} aside={aside} tone={late ? 'ember' : 'plain'}>
      <div className="grid gap-6">
        {sequence.map((kind) => {
          const items = visit.items.filter((item) => item.kind === kind);
          return items.length > 0 ? <KindRows key={kind} homeId={homeId} kind={kind} items={items} visit={visit} today={today} mayLog={mayLog} /> : null;
        })}
      </div>
    </Course>
  );
}

type KindRowsProps = { homeId: string; kind: WorkKind; items: PlanItem[]; visit: PlanVisit; today: CalendarDay; mayLog: boolean };

function KindRows({ homeId, kind, items, visit, today, mayLog }: KindRowsProps) {
  const query = new URLSearchParams([['kind', kind], ...items.map((item) => ['wall', item.wallId])]);
  return (
    <div>
      <div className="flex flex-wrap items-center justify-between gap-3">
        <h3>{workKinds[kind]}</h3>
        {mayLog ? (
          <span className="no-print">
            <LinkButton href={`/homes/${homeId}/log?${query}`} look="plain">
              Log this {workKinds[kind].toLowerCase()}
            </LinkButton>
          </span>
        ) : null}
      </div>
      <ul>
        {items.map((item) => (
          <li key={item.wallId} className="grid gap-x-6 border-t border-line py-3 md:grid-cols-[9rem_8rem_minmax(0,1fr)]">
            <Link href={`/homes/${homeId}/walls/${item.wallId}` as Route} className="link flex min-h-11 items-center font-semibold">
              {item.wallName}
            </Link>
            <span className="flex min-h-11 items-center">
              <StateMark state={item.state} />
            </span>
            <div className="min-w-0 pt-2">
              {item.opensOn !== visit.opensOn || item.closesOn !== visit.closesOn ? (
                <p>
                  <When spell={item} today={today} />
                </p>
              ) : null}
              <p className="max-w-prose">{item.because}</p>
              <Figure explanation={item.explanation} />
            </div>
          </li>
        ))}
      </ul>
    </div>
  );
}

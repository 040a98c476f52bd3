import { When } from '@/components/plan/when';
import { LinkButton } from '@/components/ui/button';
import { Figure } from '@/components/ui/figure';
import { StateMark } from '@/components/ui/state-mark';
import { workState } from '@/lib/care';
import { type WorkItem } from '@/lib/care/types';
import { type CalendarDay } from '@/lib/calendar';
import { urgency } from '@/lib/home/next-work';
import { withRule } from '@/lib/home/plan-view';
import { workKinds } from '@/lib/schemas/vocabulary';

type WallWorkProps = { homeId: string; wallId: string; items: readonly WorkItem[]; today: CalendarDay; mayLog: boolean };

/** What comes next on one wall, soonest first, each with its reason. */
export function WallWork({ homeId, wallId, items, today, mayLog }: WallWorkProps) {
  return (
    <ul>
      {items.toSorted((a, b) => urgency[workState(a, today)] - urgency[workState(b, today)]).map((item) => (
        <li key={item.kind} className="grid gap-x-6 gap-y-1 border-t border-line py-3 first:border-t-0 md:grid-cols-[8rem_minmax(0,1fr)_auto]">
          <p>
            <StateMark state={workState(item, today)} />
          </p>
          <div className="min-w-0">
            <p className="text-lg">
              <strong>{workKinds[item.kind]}</strong>: <When spell={{ state: workState(item, today), missedOn: item.missedOn, ...item.window }} today={today} />
            </p>
            <p className="max-w-prose">{item.because}</p>
            <Figure explanation={withRule(item)} />
          </div>
          {mayLog ? (
            <div className="no-print -ml-2 md:ml-0">
              <LinkButton href={`/homes/${homeId}/log?kind=${item.kind}&wall=${wallId}`} look="plain">
                Log it
              </LinkButton>
            </div>
          ) : null}
        </li>
      ))}
    </ul>
  );
}

import { When } from '@/components/plan/when';
import { LinkButton } from '@/components/ui/button';
import { Figure } from '@/components/ui/figure';
import { StateMark } from '@/components/ui/state-mark';
import { workState } from '@/lib/care';
import { type WorkItem } from '@/lib/care/types';
import { type CalendarDay } from '@/lib/calendar';
import { urgency } from '@/lib/home/next-work';
import { withRule } from '@/lib/home/plan-view';
import { keysOf, type WorkKind, workKinds } from '@/lib/schemas/vocabulary';

type WallWorkProps = { homeId: string; wallId: string; items: readonly WorkItem[]; today: CalendarDay; mayLog: boolean; mayEdit: boolean; mayPutOff: boolean };

function OwnRuleLink({ homeId, wallId, kind }: { homeId: string; wallId: string; kind: WorkKind }) {
  return (
    <LinkButton href={`/homes/${homeId}/walls/${wallId}/rule?kind=${kind}`} look="plain">
      Own rule<span className="sr-only"> for the {workKinds[kind].toLowerCase()}</span>
    </LinkButton>
  );
}

/** What comes next on one wall, soonest first, each with its reason. */
export function WallWork({ homeId, wallId, items, today, mayLog, mayEdit, mayPutOff }: WallWorkProps) {
  const unplanned = mayEdit ? keysOf(workKinds).filter((kind) => items.every((item) => item.kind !== kind)) : [];
  return (
    <ul>
      {items.toSorted((a, b) => urgency[workState(a, today)] - urgency[workState(b, today)]).map((item) => (
        <li key={item.kind} className="grid gap-x-6 gap-y-1 border-t border-line py-3 first:border-t-0 md:grid-cols-[8rem_minmax(0,1fr)_8rem]">
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
          <div className="no-print -ml-2 flex flex-wrap md:ml-0 md:flex-col md:items-start">
            {mayLog ? (
              <LinkButton href={item.kind === 'walkaround' ? `/homes/${homeId}/walkaround` : `/homes/${homeId}/log?kind=${item.kind}&wall=${wallId}`} look="plain">
                {item.kind === 'walkaround' ? 'Walk around' : 'Log it'}
              </LinkButton>
            ) : null}
            {mayPutOff ? (
              <LinkButton href={`/homes/${homeId}/put-off?kind=${item.kind}&wall=${wallId}`} look="plain">
                Put off<span className="sr-only"> the {workKinds[item.kind].toLowerCase()}</span>
              </LinkButton>
            ) : null}
            {mayEdit ? <OwnRuleLink homeId={homeId} wallId={wallId} kind={item.kind} /> : null}
          </div>
        </li>
      ))}
      {unplanned.map((kind) => (
        <li key={kind} className="no-print flex flex-wrap items-center justify-between gap-x-6 border-t border-line py-1 first:border-t-0">
          <p className="text-quiet">{workKinds[kind]}: nothing is planned.</p>
          <OwnRuleLink homeId={homeId} wallId={wallId} kind={kind} />
        </li>
      ))}
    </ul>
  );
}

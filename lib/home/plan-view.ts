import { visitsOf, workState } from '@/lib/care';
import { type WorkItem, type WorkState } from '@/lib/care/types';
import { type CalendarDay } from '@/lib/calendar';
import { type Explanation } from '@/lib/explain';
import { type WorkKind } from '@/lib/schemas/vocabulary';

type Named = { id: string; name: string };

export type PlanItem = {
  wallId: string;
  wallName: string;
  kind: WorkKind;
  state: WorkState;
  dueOn: CalendarDay;
  opensOn: CalendarDay;
  closesOn: CalendarDay;
  missedOn: CalendarDay | null;
  because: string;
  /** With the care rule among its inputs. */
  explanation: Explanation;
};

export type PlanVisit = { opensOn: CalendarDay; closesOn: CalendarDay; items: PlanItem[] };

/** A home's plan as JSON carries it. `revision` goes up with every change, so that of two plans the newer is known. */
export type PlanView = { homeId: string; revision: number; today: CalendarDay; wallCount: number; visits: PlanVisit[] };

const compact = (day: CalendarDay) => day.replaceAll('-', '');

/** The explanation of a date with its recurrence rule in the words of RFC 5545. */
export function withRule({ rule, startOn, explanation }: Pick<WorkItem, 'rule' | 'startOn' | 'explanation'>): Explanation {
  if (!rule || !startOn) return explanation;
  const text = `DTSTART;VALUE=DATE:${compact(startOn)} RRULE:${rule}`;
  if (explanation.inputs.some(({ value }) => value.includes(rule))) return explanation;
  return { ...explanation, inputs: [...explanation.inputs, { label: 'Care rule (RFC 5545)', value: text }] };
}

/** Every next piece of work of a home, in visits by season, walls in plan order. */
export function planView(home: { id: string; revision: number }, walls: readonly Named[], items: readonly WorkItem[], today: CalendarDay): PlanView {
  const place = new Map(walls.map((wall, i) => [wall.id, i]));
  const show = (item: WorkItem): PlanItem => ({
    wallId: item.wallId,
    wallName: walls[place.get(item.wallId) ?? -1]?.name ?? '',
    kind: item.kind,
    state: workState(item, today),
    dueOn: item.dueOn,
    opensOn: item.window.opensOn,
    closesOn: item.window.closesOn,
    missedOn: item.missedOn,
    because: item.because,
    explanation: withRule(item),
  });
  const inOrder = (a: WorkItem, b: WorkItem) => (place.get(a.wallId) ?? 0) - (place.get(b.wallId) ?? 0);
  const inPlanOrder = [...items].sort(inOrder);
  const visits = visitsOf(inPlanOrder).map((visit) => ({ opensOn: visit.opensOn, closesOn: visit.closesOn, items: visit.items.map(show) }));
  return { homeId: home.id, revision: home.revision, today, wallCount: walls.length, visits };
}

import { addDays, type CalendarDay } from '@/lib/calendar';
import { type HomePlan, type WorkItem, type WorkState } from './types';

/** Work is due soon when its window opens within so many days. Our rule. */
const soonDays = 60;

/** How work stands on a day: overdue once a window has closed without it. Our rule. */
export function workState({ window, missedOn }: Pick<WorkItem, 'window' | 'missedOn'>, today: CalendarDay): WorkState {
  if (missedOn || today > window.closesOn) return 'overdue';
  if (today >= window.opensOn) return 'due';
  return addDays(today, soonDays) >= window.opensOn ? 'due soon' : 'later';
}

const urgency: Record<WorkState, number> = { overdue: 0, due: 1, 'due soon': 2, later: 3 };

/** The most pressing work of a home: by state, then by the end of its window, then in plan order. */
export function nextItem(plan: HomePlan, today: CalendarDay): WorkItem | undefined {
  const end = ({ window }: WorkItem) => Number(window.closesOn.replaceAll('-', ''));
  return plan.walls
    .flatMap(({ items }) => items)
    .toSorted((a, b) => urgency[workState(a, today)] - urgency[workState(b, today)] || end(a) - end(b))[0];
}

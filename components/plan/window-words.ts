import { type WorkState } from '@/lib/care/types';
import { aboutDay, aboutRange, exactRange, fromToday } from '@/lib/calendar-words';
import { type CalendarDay } from '@/lib/calendar';

/** When work is to be done; `missedOn` is the day on which an earlier chance passed. */
export type Spell = { state: WorkState; opensOn: CalendarDay; closesOn: CalendarDay; missedOn: CalendarDay | null };

/** When a piece of work is to be done, in the words people use. */
export function windowWords({ state, opensOn, closesOn, missedOn }: Spell, today: CalendarDay): string {
  if (state === 'overdue') return `overdue since ${aboutDay(missedOn ?? closesOn)}${nextChance(opensOn, closesOn, today)}`;
  if (state === 'due') return `now, until ${aboutDay(closesOn)}`;
  return `${aboutRange(opensOn, closesOn)}, ${opensOn > today ? fromToday(opensOn, today) : 'open now'}`;
}

function nextChance(opensOn: CalendarDay, closesOn: CalendarDay, today: CalendarDay): string {
  if (closesOn < today) return '';
  if (opensOn <= today) return `; the season is open until ${aboutDay(closesOn)}`;
  return `; next chance ${aboutRange(opensOn, closesOn)}, ${fromToday(opensOn, today)}`;
}

/** The same, to the day: on hover and in print. */
export const exactWindow = ({ opensOn, closesOn }: Pick<Spell, 'opensOn' | 'closesOn'>): string => exactRange(opensOn, closesOn);

import { type WorkState } from '@/lib/care/types';
import { aboutDay, aboutRange, exactRange, fromToday } from '@/lib/calendar-words';
import { type CalendarDay } from '@/lib/calendar';

type Spell = { state: WorkState; opensOn: CalendarDay; closesOn: CalendarDay };

/** When a piece of work is to be done, in the words people use. */
export function windowWords({ state, opensOn, closesOn }: Spell, today: CalendarDay): string {
  if (state === 'overdue') return `should have been done by ${aboutDay(closesOn)}, ${fromToday(closesOn, today)}`;
  if (state === 'due') return `now, until ${aboutDay(closesOn)}`;
  return `${aboutRange(opensOn, closesOn)}, ${opensOn > today ? fromToday(opensOn, today) : 'open now'}`;
}

/** The same, to the day: on hover and in print. */
export const exactWindow = ({ opensOn, closesOn }: Spell): string => exactRange(opensOn, closesOn);

import { addMonths, type CalendarDay, daysBetween } from '@/lib/calendar';

/** Share of a film's life that remains on a day, 1 (fresh) to 0 (used up), by days. Before the start it is 1. */
export function coatLeft(startedOn: CalendarDay, lifeMonths: number, today: CalendarDay): number {
  const whole = daysBetween(startedOn, addMonths(startedOn, lifeMonths));
  return Math.min(1, Math.max(0, 1 - daysBetween(startedOn, today) / whole));
}

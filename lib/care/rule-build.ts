import { type CalendarDay } from '@/lib/calendar';
import { partsOf } from './rule-text';

const dayOfMonth = (day: CalendarDay) => Number(day.slice(8));

/** '28,29,30,31' for a start on the 31st: with BYSETPOS=-1 the last of them that the month has. */
const upTo = (day: number) => Array.from({ length: day - 27 }, (_, i) => 28 + i).join(',');

/**
 * Every so many months from a day. RFC 5545 skips months that lack the day; for starts on the 29th to 31st the rule falls on
 * the month's last possible day instead, so that no month is lost. Example: from 31 January every month: 28 February, 31 March.
 */
export function monthlyRule(startOn: CalendarDay, intervalMonths: number): string {
  const every = `FREQ=MONTHLY;INTERVAL=${intervalMonths}`;
  const day = dayOfMonth(startOn);
  return day <= 28 ? every : `${every};BYMONTHDAY=${upTo(day)};BYSETPOS=-1`;
}

/** The 15th of each of these months, every year. */
export const yearlyRule = (months: number[]): string => `FREQ=YEARLY;BYMONTH=${months.join(',')};BYMONTHDAY=15`;

/** A rule that takes its day from the start, and would skip months that lack it, gets the 28th instead. Our rule, for rules that restart with logged work. */
export function withSafeDay(rule: string, startOn: CalendarDay): string {
  const parts = partsOf(rule);
  const takesDay = ['YEARLY', 'MONTHLY'].includes(parts.get('FREQ') ?? '') && !['BYMONTHDAY', 'BYDAY', 'BYYEARDAY', 'BYWEEKNO'].some((name) => parts.has(name));
  if (!takesDay || dayOfMonth(startOn) <= 28) return rule;
  const month = parts.get('FREQ') === 'YEARLY' && !parts.has('BYMONTH') ? `;BYMONTH=${Number(startOn.slice(5, 7))}` : '';
  return `${rule.trim()}${month};BYMONTHDAY=28`;
}

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

/**
 * A rule that takes its day from a start on the 29th to 31st falls on the month's last possible day where the month is short;
 * if it names several months, on the 28th. Our rule, because rules restart with logged work, whatever its day.
 */
export function withSafeDay(rule: string, startOn: CalendarDay): string {
  const parts = partsOf(rule);
  const freq = parts.get('FREQ') ?? '';
  const takesDay = ['YEARLY', 'MONTHLY'].includes(freq) && !['BYMONTHDAY', 'BYDAY', 'BYYEARDAY', 'BYWEEKNO', 'BYSETPOS'].some((name) => parts.has(name));
  if (!takesDay || dayOfMonth(startOn) <= 28) return rule;
  const inMonth = freq === 'YEARLY' && !parts.has('BYMONTH') ? `;BYMONTH=${Number(startOn.slice(5, 7))}` : '';
  const oneSet = freq === 'MONTHLY' || !parts.get('BYMONTH')?.includes(',');
  return `${rule.trim()}${inMonth};BYMONTHDAY=${oneSet ? `${upTo(dayOfMonth(startOn))};BYSETPOS=-1` : '28'}`;
}

import { addMonths, type CalendarDay, toUtcDate } from '@/lib/calendar';
import { readRule } from './rule-check';
import { walkRule } from './rule-days';
import { RuleFault } from './rule-text';

/** Nobody plans more days than this at once. */
const mostDays = 10_000;

/**
 * The days of a recurrence rule (RFC 5545 §3.3.10) from `fromOn` to `toOn`, both included, in order.
 *
 * `rule` is the text with or without "RRULE:"; `startOn` is DTSTART. COUNT and INTERVAL count from the start. A start that
 * does not fit the rule is left out (the RFC leaves that case undefined). Days that do not exist are skipped, as the RFC
 * demands; `monthlyRule` writes rules that skip no month. HOURLY gives the days that have one of its hours, counted from
 * noon; MINUTELY, SECONDLY, BYHOUR, BYMINUTE and BYSECOND are refused.
 *
 * Throws RangeError on an invalid rule or day, and when more than 10,000 days are asked for.
 *
 * Example: FREQ=MONTHLY;BYMONTHDAY=15,30;COUNT=5 from 2007-01-15: 15 and 30 January, 15 February, 15 and 30 March 2007.
 */
export function expandRule(rule: string, startOn: CalendarDay, fromOn: CalendarDay, toOn: CalendarDay): CalendarDay[] {
  const parsed = readRule(rule);
  const [start, from, to] = [startOn, fromOn, toOn].map((day) => toUtcDate(day).getTime()) as [number, number, number];
  const days: CalendarDay[] = [];
  if (from > to || start > to) return days;
  walkRule(parsed, startOn, toOn, (day) => {
    if (day < fromOn) return true;
    if (days.length === mostDays) throw new RuleFault(`The rule has more than ${mostDays} days in that time.`);
    return days.push(day) > 0;
  });
  return days;
}

/** Plans look no further ahead than this many months. */
export const horizonMonths = 1200;

/** The first day of a rule after a day; null when the rule has ended, or has none in the next hundred years. */
export function nextOfRule(rule: string, startOn: CalendarDay, after: CalendarDay): CalendarDay | null {
  let found: CalendarDay | null = null;
  walkRule(readRule(rule), startOn, addMonths(startOn > after ? startOn : after, horizonMonths), (day) => {
    if (day > after) found = day;
    return found === null;
  });
  return found;
}

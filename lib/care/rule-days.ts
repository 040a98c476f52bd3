import { Frequency as RRuleFrequency, type Options, RRule, Weekday } from 'rrule';
import { addDays, type CalendarDay, dayOf, fromUtcDate, monthOf, toUtcDate, yearOf } from '@/lib/calendar';
import { type ByDay, type Rule, RuleFault } from './rule-text';
import { isInWeek } from './week-number';

/** More instants than this are not walked through; daily rules reach it after 328 years, hourly ones after 13. */
const mostSteps = 120_000;

/** Monday = 0. */
const weekdayOf = (day: CalendarDay) => (toUtcDate(day).getUTCDay() + 6) % 7;

/** Parts that the rule leaves open come from the start day (RFC 5545 §3.3.10). */
function completed(rule: Rule, startOn: CalendarDay): Rule {
  const { freq, byMonth, byMonthDay, byYearDay, byWeekNo, byDay } = rule;
  const open = byMonthDay.length + byYearDay.length + byDay.length === 0;
  const dayOfMonth = [Number(startOn.slice(8))];
  if (freq === 'YEARLY' && open && byWeekNo.length > 0) return { ...rule, byDay: [{ weekday: weekdayOf(startOn) }] };
  if (freq === 'YEARLY' && open) return { ...rule, byMonth: byMonth.length > 0 ? byMonth : [monthOf(startOn)], byMonthDay: dayOfMonth };
  if (freq === 'MONTHLY' && open) return { ...rule, byMonthDay: dayOfMonth };
  if (freq === 'WEEKLY' && open) return { ...rule, byDay: [{ weekday: weekdayOf(startOn) }] };
  return rule;
}

/** The first day of the year, month, week or day that a day belongs to: what BYSETPOS counts in. */
function periodOf({ freq, wkst }: Rule, day: CalendarDay): CalendarDay {
  if (freq === 'YEARLY') return dayOf(yearOf(day), 1, 1);
  if (freq === 'MONTHLY') return `${day.slice(0, 8)}01`;
  return freq === 'WEEKLY' ? addDays(day, -((weekdayOf(day) - wkst + 7) % 7)) : day;
}

/** rrule takes only days that are both numbered and plain; a plain one among numbered ones is written out. */
function numbered(byDay: ByDay[], most: number): ByDay[] {
  if (byDay.every(({ n }) => n === undefined)) return byDay;
  return byDay.flatMap((day) => (day.n === undefined ? Array.from({ length: most }, (_, i) => ({ ...day, n: i + 1 })) : [day]));
}

/**
 * The rule for rrule, from noon UTC of the start of the first period. COUNT, UNTIL and BYSETPOS are applied below, because
 * rrule takes a position that a set does not have for its first; BYWEEKNO, because it loses weeks across the turn of the year.
 */
function engine(rule: Rule, startOn: CalendarDay): RRule {
  const list = (values: number[]) => (values.length > 0 ? values : null);
  const byDay = numbered(rule.byDay, rule.freq === 'MONTHLY' || rule.byMonth.length > 0 ? 5 : 53);
  const options: Partial<Options> = {
    freq: RRuleFrequency[rule.freq],
    dtstart: new Date(toUtcDate(periodOf(rule, startOn)).getTime() + 43_200_000),
    interval: rule.interval,
    wkst: rule.wkst,
    bymonth: list(rule.byMonth),
    bymonthday: list(rule.byMonthDay),
    byyearday: list(rule.byYearDay),
    byweekday: byDay.length > 0 ? byDay.map(({ weekday, n }) => new Weekday(weekday, n)) : null,
    byminute: [0],
    bysecond: [0],
  };
  return new RRule(options, true);
}

/** The positions that BYSETPOS asks for, in order, each day once. */
function chosen(days: CalendarDay[], positions: number[]): CalendarDay[] {
  if (positions.length === 0) return days;
  const wanted = new Set(positions.map((at) => (at > 0 ? at - 1 : days.length + at)));
  return days.filter((_, i) => wanted.has(i));
}

/**
 * Walks through the days of a rule in order up to `through`, or until `visit` returns false or the rule ends. A start that does not fit the
 * rule is not a day of it. An hourly rule starts at noon and counts each day that has one of its hours once.
 */
export function walkRule(written: Rule, startOn: CalendarDay, through: CalendarDay, visit: (day: CalendarDay) => boolean): void {
  const rule = completed(written, startOn);
  let left = rule.count ?? Infinity;
  let last: CalendarDay | undefined;
  const offer = (day: CalendarDay, at: number): boolean => {
    if (day < startOn) return true;
    if (day > through) return false;
    if (rule.until !== undefined && at > rule.until) return false;
    left -= 1;
    const wantsMore = day === last || visit(day);
    last = day;
    return wantsMore && left > 0;
  };
  const noon = (day: CalendarDay) => toUtcDate(day).getTime() + 43_200_000;
  let period: CalendarDay | undefined;
  let gathered: CalendarDay[] = [];
  let isOver = false;
  const close = () => {
    isOver ||= !chosen(gathered, rule.bySetPos).every((day) => offer(day, noon(day)));
    gathered = [];
  };
  let steps = 0;
  engine(rule, startOn).all((date) => {
    if ((steps += 1) > mostSteps) throw new RuleFault('The rule has too many occurrences before that day.');
    const day = fromUtcDate(date);
    const within = rule.bySetPos.length > 0 ? periodOf(rule, day) : day;
    if (within > through) return false;
    if (rule.byWeekNo.length > 0 && !isInWeek(day, rule.byWeekNo, rule.wkst)) return true;
    if (rule.bySetPos.length === 0) return offer(day, date.getTime());
    if (within !== period) close();
    period = within;
    gathered.push(day);
    return !isOver;
  });
  if (!isOver) close();
}

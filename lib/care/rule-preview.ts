import { addDays, addMonths, type CalendarDay, daysBetween, monthOf, yearOf } from '@/lib/calendar';
import { exactDay, monthNames } from '@/lib/calendar-words';
import { withSafeDay } from './rule-build';
import { readRule } from './rule-check';
import { walkRule } from './rule-days';
import { horizonMonths, nextOfRule } from './rule-expand';
import { type Rule, RuleFault } from './rule-text';

/** The days of a rule that an owner is shown before saving it. */
const mostShown = 8;
/** Care of a wall falls at most once a month: its days lie at least as far apart as February is long. Our rule. */
const shortestGapDays = 28;
/** A rule starts at most this many years before or after today. Our rule. */
const yearsAround = 50;

export type PreviewFault = { ok: false; about: 'rule' | 'startOn'; error: string };

const refused = (error: string, about: PreviewFault['about'] = 'rule'): PreviewFault => ({ ok: false, about, error });

/** Runs a check of a rule; what is wrong with its text comes back as a fault. */
export function catching<T>(check: () => T): T | PreviewFault {
  try {
    return check();
  } catch (error) {
    if (error instanceof RuleFault) return refused(error.message);
    throw error;
  }
}

function whyNone(parsed: Rule, last: CalendarDay | null): string {
  const ended = last && (parsed.count !== undefined || parsed.until !== undefined);
  return ended ? `This rule has no day left: its last one was ${exactDay(last)}.` : 'This rule falls on no day in the next 100 years.';
}

/**
 * The next days of an owner's own rule from today on, up to eight, as the plan walks it; or why it cannot be planned by.
 * Daily, weekly and hourly rules are refused, because they fall more often than once a month or are searched for too long.
 *
 * Example: FREQ=YEARLY;INTERVAL=3;BYMONTH=6;BYMONTHDAY=15 from 2026-01-01, seen on 2026-12-01: 15 June 2029, 2032, 2035, …
 */
export function previewRule(rule: string, startOn: CalendarDay, today: CalendarDay): { ok: true; days: CalendarDay[] } | PreviewFault {
  if (Math.abs(yearOf(startOn) - yearOf(today)) > yearsAround) return refused(`Start it within ${yearsAround} years of today.`, 'startOn');
  return catching(() => {
    const parsed = readRule(withSafeDay(rule, startOn));
    if (parsed.freq !== 'YEARLY' && parsed.freq !== 'MONTHLY') return refused(`FREQ=${parsed.freq} is too often for the care of a wall. Use FREQ=YEARLY or FREQ=MONTHLY.`);
    const days: CalendarDay[] = [];
    let last: CalendarDay | null = null;
    let crowded: PreviewFault | null = null;
    walkRule(parsed, startOn, addMonths(startOn > today ? startOn : today, horizonMonths), (day) => {
      if (last && daysBetween(last, day) < shortestGapDays) crowded = refused(`This rule falls more often than once a month: on ${exactDay(last)} and again on ${exactDay(day)}.`);
      else last = day;
      if (day >= today && days.length < mostShown) days.push(day);
      return crowded === null;
    });
    return crowded ?? (days.length > 0 ? { ok: true, days } : refused(whyNone(parsed, last)));
  });
}

/**
 * Logged work restarts the rule of a restain or recaulk from its day. A rule that would then never fall on a day again is refused:
 * it is tried from twelve starts thirteen months apart, so from every month of the year, each in another year. A rule with an end may end.
 *
 * Example: FREQ=MONTHLY;INTERVAL=12;BYMONTH=5 never falls on a day when it starts in June.
 */
export function restartFault(rule: string, today: CalendarDay): PreviewFault | null {
  const { count, until } = readRule(rule);
  if (count !== undefined || until !== undefined) return null;
  for (let turn = 0; turn < 12; turn += 1) {
    const start = addMonths(today, 13 * turn);
    if (nextOfRule(withSafeDay(rule, start), start, addDays(start, -1)) === null) {
      return refused(`Logged work restarts this rule, and started in ${monthNames[monthOf(start) - 1]} ${yearOf(start)} it would fall on no day again. Try FREQ=YEARLY with BYMONTH.`);
    }
  }
  return null;
}

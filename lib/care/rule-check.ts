import { byDayIn, countIn, frequencies, type Frequency, numbersIn, partsOf, type Rule, RuleFault, untilIn, weekdayIn } from './rule-text';

const known = new Set(['FREQ', 'INTERVAL', 'COUNT', 'UNTIL', 'WKST', 'BYMONTH', 'BYMONTHDAY', 'BYYEARDAY', 'BYWEEKNO', 'BYDAY', 'BYSETPOS']);
const byParts = ['BYMONTH', 'BYMONTHDAY', 'BYYEARDAY', 'BYWEEKNO', 'BYDAY'];
const ofTheClock = ['BYHOUR', 'BYMINUTE', 'BYSECOND'];
const longestMonth = [31, 29, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31];

function refuse(when: boolean, text: string): void {
  if (when) throw new RuleFault(text);
}

function frequencyIn(parts: Map<string, string>): Frequency {
  const text = parts.get('FREQ');
  refuse(text === undefined, 'The rule needs a FREQ: YEARLY, MONTHLY, WEEKLY or DAILY.');
  refuse(text === 'MINUTELY' || text === 'SECONDLY', `FREQ=${text}: a care rule goes by days, not by the clock.`);
  const freq = frequencies.find((one) => one === text);
  if (!freq) throw new RuleFault(`FREQ=${text}: use YEARLY, MONTHLY, WEEKLY or DAILY.`);
  return freq;
}

/** What RFC 5545 §3.3.10 forbids ("MUST NOT"), by frequency. */
function checkTogether(rule: Rule, has: (name: string) => boolean): void {
  const { freq } = rule;
  refuse(has('COUNT') && has('UNTIL'), 'COUNT and UNTIL cannot stand together.');
  refuse(has('BYWEEKNO') && freq !== 'YEARLY', 'BYWEEKNO goes with FREQ=YEARLY only.');
  refuse(has('BYYEARDAY') && ['DAILY', 'WEEKLY', 'MONTHLY'].includes(freq), `BYYEARDAY does not go with FREQ=${freq}.`);
  refuse(has('BYMONTHDAY') && freq === 'WEEKLY', 'BYMONTHDAY does not go with FREQ=WEEKLY.');
  refuse(has('BYSETPOS') && !byParts.some(has), 'BYSETPOS needs another BY… part to choose from.');
  refuse(freq === 'HOURLY' && byParts.some(has), 'FREQ=HOURLY takes no BY… part here: a care rule goes by days.');
  const numbered = rule.byDay.some((day) => day.n !== undefined);
  refuse(numbered && freq !== 'MONTHLY' && freq !== 'YEARLY', 'Numbered days in BYDAY go with FREQ=MONTHLY or YEARLY only.');
  refuse(numbered && has('BYWEEKNO'), 'Numbered days in BYDAY do not go with BYWEEKNO.');
}

/** A rule that can never fall on any day would be searched for in vain. */
function checkPossible({ freq, byMonth, byMonthDay, byDay }: Rule): void {
  const withinMonth = freq === 'MONTHLY' || byMonth.length > 0;
  refuse(withinMonth && byDay.length > 0 && byDay.every(({ n }) => n !== undefined && Math.abs(n) > 5), 'No month has more than five of one weekday.');
  const months = byMonth.length > 0 ? byMonth : [1];
  const someDay = byMonthDay.length === 0 || months.some((month) => byMonthDay.some((day) => Math.abs(day) <= (longestMonth[month - 1] ?? 31)));
  refuse(!someDay, 'None of these months has such a day.');
}

/** Reads a rule, with or without the leading "RRULE:". Throws RuleFault (a RangeError) on one that is not valid. */
export function readRule(text: string): Rule {
  const parts = partsOf(text);
  const freq = frequencyIn(parts);
  for (const name of parts.keys()) {
    refuse(ofTheClock.includes(name), `${name}: a care rule goes by days, not by the clock.`);
    refuse(!known.has(name), `${name} is not a part of a recurrence rule.`);
  }
  const rule: Rule = {
    freq,
    interval: countIn(parts, 'INTERVAL') ?? 1,
    count: countIn(parts, 'COUNT'),
    until: untilIn(parts),
    wkst: weekdayIn(parts.get('WKST') ?? 'MO', 'WKST'),
    byMonth: numbersIn(parts, 'BYMONTH', 12, false),
    byMonthDay: numbersIn(parts, 'BYMONTHDAY', 31, true),
    byYearDay: numbersIn(parts, 'BYYEARDAY', 366, true),
    byWeekNo: numbersIn(parts, 'BYWEEKNO', 53, true),
    byDay: byDayIn(parts),
    bySetPos: numbersIn(parts, 'BYSETPOS', 366, true),
  };
  checkTogether(rule, (name) => parts.has(name));
  checkPossible(rule);
  return rule;
}

/** Whether a rule is one that can be planned by; if not, why, in words for whoever wrote it. */
export function checkRule(text: string): { ok: true } | { ok: false; error: string } {
  try {
    readRule(text);
    return { ok: true };
  } catch (error) {
    if (error instanceof RuleFault) return { ok: false, error: error.message };
    throw error;
  }
}

import { monthNames } from '@/lib/calendar-words';
import { monthsInWords } from '@/lib/coat';
import { partsOf } from './rule-text';

/** "Every so many years or months": the answers from which most owners' rules are made. Months (1–12) go with years only. */
export type SimpleRule = { every: number; unit: 'years' | 'months'; months: number[] };

/** The day of a named month on which a simple rule falls: its middle. Our rule. */
const middle = '15';

/** The recurrence rule (RFC 5545 §3.3.10) of simple answers. Without months it keeps the day of the year on which it starts. */
export function simpleRule({ every, unit, months }: SimpleRule): string {
  if (unit === 'months') return `FREQ=MONTHLY;INTERVAL=${every}`;
  const named = [...new Set(months)].sort((a, b) => a - b);
  return `FREQ=YEARLY;INTERVAL=${every}${named.length > 0 ? `;BYMONTH=${named.join(',')};BYMONTHDAY=${middle}` : ''}`;
}

/** The text of a rule as it is kept: capitals, no spaces around it, no leading "RRULE:". Throws RuleFault when it has no parts. */
export const tidyRule = (text: string): string => [...partsOf(text)].map(([name, value]) => `${name}=${value}`).join(';');

/** Of a monthly rule from the 29th to 31st: the month's last such day. */
const safeDays = ['28,29', '28,29,30', '28,29,30,31'];

/** The simple answers that a rule was made of; null when it is none of ours. */
export function readSimple(rule: string): SimpleRule | null {
  const parts = partsOf(rule);
  const [freq, interval = '1', byMonth, byMonthDay, bySetPos] = ['FREQ', 'INTERVAL', 'BYMONTH', 'BYMONTHDAY', 'BYSETPOS'].map((name) => parts.get(name));
  const others = [...parts.keys()].some((name) => !['FREQ', 'INTERVAL', 'BYMONTH', 'BYMONTHDAY', 'BYSETPOS'].includes(name));
  if (others || !/^\d{1,5}$/.test(interval)) return null;
  const every = Number(interval);
  if (freq === 'MONTHLY') {
    const plain = byMonthDay === undefined && bySetPos === undefined;
    const safe = bySetPos === '-1' && safeDays.includes(byMonthDay ?? '');
    return byMonth === undefined && (plain || safe) ? { every, unit: 'months', months: [] } : null;
  }
  if (freq !== 'YEARLY' || bySetPos !== undefined || byMonthDay !== (byMonth === undefined ? undefined : middle)) return null;
  const months = byMonth?.split(',').map(Number) ?? [];
  return months.every((month) => month >= 1 && month <= 12) ? { every, unit: 'years', months } : null;
}

const list = (words: string[]) => (words.length > 1 ? `${words.slice(0, -1).join(', ')} and ${words.at(-1)}` : (words[0] ?? ''));

/** 'every 3 years, on May 15 and September 15'; a rule that is none of ours 'as written: …'. */
export function ruleInWords(rule: string): string {
  const simple = readSimple(rule);
  if (!simple) return `as written: ${tidyRule(rule)}`;
  const { every, unit, months } = simple;
  if (unit === 'months') return every === 1 ? 'every month, counted from the start' : `every ${every} months${every > 12 ? ` (${monthsInWords(every)})` : ''}, counted from the start`;
  const years = every === 1 ? 'every year' : `every ${every} years`;
  return months.length > 0 ? `${years}, on ${list(months.map((month) => `${monthNames[month - 1]} ${middle}`))}` : `${years}, counted from the start`;
}

import { isValid, parse } from 'date-fns';

/** A calendar day without time or zone, 'YYYY-MM-DD'. */
export type CalendarDay = string;

const pattern = /^\d{4}-\d{2}-\d{2}$/;

/** True for a day that exists in the Gregorian calendar between the years 1900 and 2200. */
export function isCalendarDay(text: string): text is CalendarDay {
  if (!pattern.test(text)) return false;
  const year = Number(text.slice(0, 4));
  return year >= 1900 && year <= 2200 && isValid(parse(text, 'yyyy-MM-dd', new Date(0)));
}

const dayMs = 86_400_000;

/** Midnight UTC of a calendar day, for arithmetic and for rrule. Throws RangeError on a day that does not exist. */
export function toUtcDate(day: CalendarDay): Date {
  const [year, month, date] = [Number(day.slice(0, 4)), Number(day.slice(5, 7)), Number(day.slice(8))];
  const utc = new Date(Date.UTC(year, month - 1, date));
  const isThatDay = utc.getUTCFullYear() === year && utc.getUTCMonth() === month - 1 && utc.getUTCDate() === date;
  if (!isThatDay || !pattern.test(day)) throw new RangeError(`not a calendar day: ${day}`);
  return utc;
}

/** The calendar day that a UTC instant falls on in UTC. */
export const fromUtcDate = (date: Date): CalendarDay => dayOf(date.getUTCFullYear(), date.getUTCMonth() + 1, date.getUTCDate());

export const addDays = (day: CalendarDay, days: number): CalendarDay => fromUtcDate(new Date(toUtcDate(day).getTime() + days * dayMs));

/** Adds whole months; a day past the end of the target month becomes that month's last day. */
export function addMonths(day: CalendarDay, months: number): CalendarDay {
  const from = toUtcDate(day);
  const [year, month] = [from.getUTCFullYear(), from.getUTCMonth() + months];
  const lastOfMonth = new Date(Date.UTC(year, month + 1, 0));
  return dayOf(lastOfMonth.getUTCFullYear(), lastOfMonth.getUTCMonth() + 1, Math.min(from.getUTCDate(), lastOfMonth.getUTCDate()));
}

/** Whole days from `from` to `to`; negative when `to` is earlier. */
export const daysBetween = (from: CalendarDay, to: CalendarDay): number => (toUtcDate(to).getTime() - toUtcDate(from).getTime()) / dayMs;

/** Month 1–12. */
export const monthOf = (day: CalendarDay): number => Number(day.slice(5, 7));
export const yearOf = (day: CalendarDay): number => Number(day.slice(0, 4));

export const dayOf = (year: number, month: number, day: number): CalendarDay =>
  `${String(year).padStart(4, '0')}-${String(month).padStart(2, '0')}-${String(day).padStart(2, '0')}`;

/** Last day of a month (1–12). */
export const monthEnd = (year: number, month: number): CalendarDay => addDays(addMonths(dayOf(year, month, 1), 1), -1);

/** The calendar day at an instant in an IANA time zone. */
export function dayIn(timeZone: string, at: Date): CalendarDay {
  return new Intl.DateTimeFormat('en-CA', { timeZone, year: 'numeric', month: '2-digit', day: '2-digit' }).format(at);
}

/** The hour (0–23) on the clock at an instant in an IANA time zone. */
export const hourIn = (timeZone: string, at: Date): number => Number(new Intl.DateTimeFormat('en-US', { timeZone, hour: '2-digit', hourCycle: 'h23' }).format(at));

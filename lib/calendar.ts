import { addDays as addDaysFns, addMonths as addMonthsFns, differenceInCalendarDays, isValid, parse } from 'date-fns';

/** A calendar day without time or zone, 'YYYY-MM-DD'. */
export type CalendarDay = string;

const pattern = /^\d{4}-\d{2}-\d{2}$/;

/** True for a day that exists in the Gregorian calendar between the years 1900 and 2200. */
export function isCalendarDay(text: string): text is CalendarDay {
  if (!pattern.test(text)) return false;
  const year = Number(text.slice(0, 4));
  return year >= 1900 && year <= 2200 && isValid(parse(text, 'yyyy-MM-dd', new Date(0)));
}

/** Midnight UTC of a calendar day, for arithmetic and for rrule. Throws RangeError on a day that does not exist. */
export function toUtcDate(day: CalendarDay): Date {
  const date = new Date(`${day}T00:00:00Z`);
  if (Number.isNaN(date.getTime()) || date.toISOString().slice(0, 10) !== day) throw new RangeError(`not a calendar day: ${day}`);
  return date;
}

/** The calendar day that a UTC instant falls on in UTC. */
export function fromUtcDate(date: Date): CalendarDay {
  return date.toISOString().slice(0, 10);
}

// date-fns works in the machine's zone: keep its fields equal to the calendar's.
const local = (day: CalendarDay) => {
  const utc = toUtcDate(day);
  return new Date(utc.getUTCFullYear(), utc.getUTCMonth(), utc.getUTCDate(), 12);
};
const fromLocal = (date: Date): CalendarDay =>
  `${date.getFullYear()}-${String(date.getMonth() + 1).padStart(2, '0')}-${String(date.getDate()).padStart(2, '0')}`;

export const addDays = (day: CalendarDay, days: number): CalendarDay => fromLocal(addDaysFns(local(day), days));

/** Adds whole months; a day past the end of the target month becomes that month's last day. */
export const addMonths = (day: CalendarDay, months: number): CalendarDay => fromLocal(addMonthsFns(local(day), months));

/** Whole days from `from` to `to`; negative when `to` is earlier. */
export const daysBetween = (from: CalendarDay, to: CalendarDay): number => differenceInCalendarDays(local(to), local(from));

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

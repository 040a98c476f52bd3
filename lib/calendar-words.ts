import { type CalendarDay, daysBetween, monthEnd, monthOf, yearOf } from '@/lib/calendar';

export const monthNames = ['January', 'February', 'March', 'April', 'May', 'June', 'July', 'August', 'September', 'October', 'November', 'December'] as const;

const monthName = (day: CalendarDay) => monthNames[monthOf(day) - 1] ?? '';
const dayNumber = (day: CalendarDay) => Number(day.slice(8));
/** Thirds of a month: days 1–10 are early, 11–20 mid, the rest late. Our rule. */
const third = (day: CalendarDay) => (dayNumber(day) <= 10 ? 'early ' : dayNumber(day) <= 20 ? 'mid-' : 'late ');

/** 'June 10, 2027'. */
export const exactDay = (day: CalendarDay): string => `${monthName(day)} ${dayNumber(day)}, ${yearOf(day)}`;

/** 'mid-June 2027'. */
export const aboutDay = (day: CalendarDay): string => `${third(day)}${monthName(day)} ${yearOf(day)}`;

/** 'May 15 – August 9, 2027'; the first year is said only when it differs. */
export function exactRange(from: CalendarDay, to: CalendarDay): string {
  if (from === to) return exactDay(from);
  const start = yearOf(from) === yearOf(to) ? `${monthName(from)} ${dayNumber(from)}` : exactDay(from);
  return `${start} – ${exactDay(to)}`;
}

/** 'mid-May to early August 2027', 'June to August 2027' for whole months; one word when both ends say the same. */
export function aboutRange(from: CalendarDay, to: CalendarDay): string {
  const whole = dayNumber(from) === 1 && to === monthEnd(yearOf(to), monthOf(to));
  const words = (day: CalendarDay, withYear: boolean) => `${whole ? '' : third(day)}${monthName(day)}${withYear ? ` ${yearOf(day)}` : ''}`;
  const end = words(to, true);
  if (words(from, true) === end) return end;
  return `${words(from, yearOf(from) !== yearOf(to))} to ${end}`;
}

const count = (n: number, unit: string) => `${n} ${unit}${n === 1 ? '' : 's'}`;

/** 'today', 'tomorrow', 'in 5 weeks', '3 months ago'; days up to 13, then weeks up to 13, months up to 23, then years. */
export function fromToday(day: CalendarDay, today: CalendarDay): string {
  const days = daysBetween(today, day);
  if (days === 0) return 'today';
  if (days === 1) return 'tomorrow';
  if (days === -1) return 'yesterday';
  const size = Math.abs(days);
  const length =
    size < 14 ? count(size, 'day')
    : size < 91 ? count(Math.round(size / 7), 'week')
    : size < 700 ? count(Math.round(size / 30.44), 'month')
    : count(Math.round(size / 365.25), 'year');
  return days > 0 ? `in ${length}` : `${length} ago`;
}

/** '2027-05-15 09:30 UTC', for people who run the service. */
export const utcMinute = (at: Date): string => `${at.toISOString().slice(0, 16).replace('T', ' ')} UTC`;

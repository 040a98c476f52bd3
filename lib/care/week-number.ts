import { addDays, type CalendarDay, dayOf, daysBetween, toUtcDate, yearOf } from '@/lib/calendar';

/** First day of week 1: the first week with at least four days in the year (RFC 5545 §3.3.10, ISO 8601). */
function firstWeek(year: number, wkst: number): CalendarDay {
  const fourth = dayOf(year, 1, 4);
  const weekday = (toUtcDate(fourth).getUTCDay() + 6) % 7;
  return addDays(fourth, -((weekday - wkst + 7) % 7));
}

/** Whether a day lies in one of these weeks of its year; negative numbers count from the year's last week. `wkst`: Monday = 0. */
export function isInWeek(day: CalendarDay, weeks: number[], wkst: number): boolean {
  const year = [yearOf(day) + 1, yearOf(day), yearOf(day) - 1].find((one) => firstWeek(one, wkst) <= day) ?? yearOf(day);
  const week = Math.floor(daysBetween(firstWeek(year, wkst), day) / 7) + 1;
  const all = daysBetween(firstWeek(year, wkst), firstWeek(year + 1, wkst)) / 7;
  return weeks.includes(week) || weeks.includes(week - all - 1);
}

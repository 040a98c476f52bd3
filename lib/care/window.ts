import { addDays, addMonths, type CalendarDay, dayOf, daysBetween, monthEnd, yearOf } from '@/lib/calendar';
import { type SeasonMonths, type Window } from './types';

/** A film may be left this many days past the day on which it is used up, not longer. Our rule. */
const graceDays = 60;
/** The next season is waited for only when this many days of it are left within the grace. Our rule. */
const shortestDays = 14;
/** In a season longer than half a year the window opens this many months before the date, so that little of the film is thrown away. Our rule. */
const longSeasonDays = 184;
const longSeasonLeadMonths = 3;
/** Where no season is known, the window lies this far on both sides of the date. Our rule. */
const noSeasonDays = 30;

type Run = { opensOn: CalendarDay; closesOn: CalendarDay };

export const isAllYear = ({ fromMonth, toMonth }: SeasonMonths): boolean => (toMonth - fromMonth + 12) % 12 === 11;

/** The seasons of the years around a day, in order. A season of twelve months has no edges. */
export function runsAround(day: CalendarDay, seasons: SeasonMonths[]): Run[] {
  return seasons
    .flatMap(({ fromMonth, toMonth }) => {
      if (isAllYear({ fromMonth, toMonth })) return [{ opensOn: addMonths(day, -12), closesOn: addMonths(day, 12) }];
      const years = [-2, -1, 0, 1].map((shift) => yearOf(day) + shift);
      return years.map((year) => ({ opensOn: dayOf(year, fromMonth, 1), closesOn: monthEnd(fromMonth <= toMonth ? year : year + 1, toMonth) }));
    })
    .sort((a, b) => (a.opensOn < b.opensOn ? -1 : 1));
}

const earlier = (a: CalendarDay, b: CalendarDay) => (a < b ? a : b);
const later = (a: CalendarDay, b: CalendarDay) => (a > b ? a : b);

/**
 * The days on which work due on `dueOn` is best done. All of it is our rule.
 *
 * - In a season: that season. Otherwise the next season if it opens within 60 days, else the last one before.
 * - Never later than 60 days after `filmUsedUpOn`, the day the coat or seal has run out.
 * - Without a season: 30 days on both sides.
 *
 * Example: due 10 June with a season of May to September: 1 May to 9 August. Due 20 October: 1 May to 30 September before it.
 */
export function windowFor(dueOn: CalendarDay, seasons: SeasonMonths[], filmUsedUpOn: CalendarDay): Window {
  const limit = addDays(filmUsedUpOn, graceDays);
  const day = earlier(dueOn, limit);
  const runs = runsAround(day, seasons);
  const within = (run: Run, anchor: CalendarDay, moved: Window['moved']): Window => {
    const isLong = daysBetween(run.opensOn, run.closesOn) > longSeasonDays;
    return { opensOn: isLong ? later(run.opensOn, addMonths(anchor, -longSeasonLeadMonths)) : run.opensOn, closesOn: earlier(run.closesOn, limit), moved };
  };
  const around = runs.find((run) => run.opensOn <= day && day <= run.closesOn);
  if (around) return within(around, day, 'in season');
  const next = runs.find((run) => run.opensOn > day);
  if (next && daysBetween(day, next.opensOn) <= graceDays && addDays(next.opensOn, shortestDays) <= limit) return within(next, next.opensOn, 'to the next season');
  const before = runs.findLast((run) => run.closesOn < day);
  if (before) return within(before, before.closesOn, 'to the season before');
  return { opensOn: addDays(day, -noSeasonDays), closesOn: earlier(addDays(day, noSeasonDays), limit), moved: 'no season' };
}

/** The whole month in which a day lies: the window of yearly work. */
export const monthWindow = (day: CalendarDay): Window => ({ opensOn: `${day.slice(0, 8)}01`, closesOn: monthEnd(yearOf(day), Number(day.slice(5, 7))), moved: 'in season' });

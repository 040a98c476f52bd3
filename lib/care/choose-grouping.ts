import { addMonths, type CalendarDay, daysBetween } from '@/lib/calendar';
import { type FilmJob } from './film-jobs';
import { type Grouping } from './grouping';
import { wasteCents } from './trip-rules';
import { type YearsAhead, yearsAhead } from './years-ahead';

/** Choices of months within which a wall joins a trip, and the years by which they are judged. Our rule. */
export const joinChoices = [0, 3, 6, 9, 12, 15, 18, 21, 24] as const;
export const judgedYears = 20;

const daysInMonth = 30.44;

/** What the films are still worth at the end: the share of life left, in cents of a renewal. */
const worthLeft = (jobs: readonly FilmJob[], on: CalendarDay): number =>
  jobs.reduce((sum, job) => sum + wasteCents(Math.min(job.lifeMonths, Math.max(0, daysBetween(on, job.usedUpOn) / daysInMonth)), job), 0);

/** Cents a year of all trips, less what the films are worth at the end, so that choices which end on fresh coats are not blamed for them. */
export const yearlyCents = ({ trips, left }: YearsAhead, through: CalendarDay): number =>
  Math.round((trips.reduce((sum, { cents }) => sum + cents, 0) - worthLeft(left, through)) / judgedYears);

/** The day from which a home's film work is looked ahead: the first on which any of it can be done. The same on every day until the plan changes. */
export const firstDay = (jobs: readonly FilmJob[]): CalendarDay | null => jobs.map(({ window }) => window.opensOn).sort()[0] ?? null;

/**
 * Within how many months walls should share a trip: twenty years are played through for each choice, and the one that costs least
 * a year is taken, the smaller of two that cost the same. A home without film work has nothing to choose.
 */
export function chooseGrouping(jobs: readonly FilmJob[], tripCents: number): Grouping {
  const from = firstDay(jobs);
  if (from === null) return { months: 0, choices: [] };
  const through = addMonths(from, judgedYears * 12);
  const choices = joinChoices.map((months) => {
    const ahead = yearsAhead({ jobs, joinMonths: months, tripCents, notBefore: null, through });
    return { months, yearlyCents: yearlyCents(ahead, through), trips: ahead.trips.length };
  });
  const best = choices.reduce((least, one) => (one.yearlyCents < least.yearlyCents ? one : least));
  return { months: best.months, choices };
}

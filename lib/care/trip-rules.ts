import { addMonths, type CalendarDay, daysBetween, monthOf } from '@/lib/calendar';
import { ourRule } from '@/lib/our-rules';
import { type FilmJob } from './film-jobs';
import { stripAtShare } from './stripping';
import { dayOfVisit } from './with-restain';

const daysInMonth = 30.44;

export const joinSource = ourRule('join');
export const visitDaySource = ourRule('trip day');

/** A trip as the plan's visits are: the work whose window closes first, and all whose windows share days with it; `on` is the day on which it is reckoned. */
export type TripDays = { on: CalendarDay; opensOn: CalendarDay; closesOn: CalendarDay; jobs: FilmJob[] };

const latest = (days: readonly CalendarDay[]) => days.reduce((a, b) => (a > b ? a : b));

/** The first trip that open work makes, reckoned on the day that its first film is used up, or on the nearest day that suits all of it; not before a given day. */
export function firstTrip(open: readonly FilmJob[], notBefore: CalendarDay | null): TripDays | null {
  const [head, ...tail] = open;
  if (!head) return null;
  const first = tail.reduce((a, b) => (b.window.closesOn < a.window.closesOn ? b : a), head);
  const { closesOn } = first.window;
  const jobs = open.filter(({ window }) => window.opensOn <= closesOn);
  const opensOn = latest(jobs.map(({ window }) => window.opensOn));
  return { on: latest([dayOfVisit(first), opensOn, ...(notBefore === null ? [] : [notBefore])]), opensOn, closesOn, jobs };
}

/** Months of a film's life that are left when it is renewed on a day; 0 once it is used up. */
export const thrownAwayMonths = (on: CalendarDay, usedUpOn: CalendarDay): number => Math.max(0, daysBetween(on, usedUpOn) / daysInMonth);

/** Whether a coat renewed on a day has to be stripped first: it is older than 1.15 times its life. Our rule. */
export const needsStripping = (on: CalendarDay, { kind, usedUpOn, lifeMonths }: Pick<FilmJob, 'kind' | 'usedUpOn' | 'lifeMonths'>): boolean =>
  kind === 'restain' && daysBetween(usedUpOn, on) / daysInMonth / lifeMonths > stripAtShare - 1;

/** What renewing a film early throws away: the share of its life that is left, in cents of its renewal. */
export const wasteCents = (months: number, { lifeMonths, cents }: Pick<FilmJob, 'lifeMonths' | 'cents'>): number => (months / lifeMonths) * cents;

/** Whether work may be done early on a day: a coat can cure then, and nobody put the work off past it. */
const isOpen = ({ seasons, putOffTo }: FilmJob, on: CalendarDay): boolean =>
  (putOffTo === null || putOffTo <= on) && (seasons.length === 0 || seasons.some(({ fromMonth, toMonth }) => (monthOf(on) - fromMonth + 12) % 12 <= (toMonth - fromMonth + 12) % 12));

/** A job that would join a trip early, with the caulk that goes where its restain goes, and what that throws away. */
export type Joining = { job: FilmJob; caulk: FilmJob | null; months: number; wasteCents: number };

/**
 * What joins a trip on a day although its window opens later: work whose window opens within `joinMonths` of the trip and whose
 * film life thrown away costs less than another trip. Caulk that belongs to a restain goes with it; it counts for no more months
 * than the coat, because it would have gone early with the coat in any case.
 *
 * Example: a coat of 60 months for $140, renewed 12 months early: 12 / 60 × $140 = $28, less than a trip of $90, so it joins.
 */
export function joinings(jobs: readonly FilmJob[], on: CalendarDay, joinMonths: number, tripCents: number): Joining[] {
  if (joinMonths <= 0) return [];
  const limit = addMonths(on, joinMonths);
  return jobs.flatMap((job): Joining[] => {
    if (!job.mayJoin || job.withRestain || job.window.opensOn <= on || job.window.opensOn > limit || !isOpen(job, on)) return [];
    const caulk = (job.kind === 'restain' && jobs.find(({ wallId, withRestain }) => withRestain && wallId === job.wallId)) || null;
    const months = thrownAwayMonths(on, job.usedUpOn);
    const ofCaulk = caulk ? wasteCents(Math.min(months, thrownAwayMonths(on, caulk.usedUpOn)), caulk) : 0;
    const waste = wasteCents(months, job) + ofCaulk;
    return waste < tripCents ? [{ job, caulk, months, wasteCents: waste }] : [];
  });
}

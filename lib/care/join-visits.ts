import { type CalendarDay } from '@/lib/calendar';
import { type FilmJob } from './film-jobs';
import { firstTrip, joinings, type TripDays, wasteCents } from './trip-rules';
import { type Window } from './types';
import { runsAround } from './window';

/** Film work of the plan that joins an earlier trip. */
export type Joined = {
  job: FilmJob;
  window: Window;
  /** Whose work the trip is for, in the order of the jobs; the joining wall itself if it is for other work of that wall. */
  wallIds: string[];
  /** Life of the film itself that is thrown away, and what that is worth. */
  months: number;
  cents: number;
  /** Caulk that goes where this restain goes. */
  caulk: FilmJob | null;
  /** Nothing else was to be done on the days of its own window, so that its own trip is not needed. */
  savesTrip: boolean;
};

const overlap = (a: Window, b: Window) => a.opensOn <= b.closesOn && b.opensOn <= a.closesOn;

/** The days of a trip on which a joining wall's own coat can cure too. */
function sharedDays({ on, opensOn, closesOn }: TripDays, seasons: FilmJob['seasons']): Window {
  const run = runsAround(on, [...seasons]).find((one) => one.opensOn <= on && on <= one.closesOn);
  return { opensOn: run && run.opensOn > opensOn ? run.opensOn : opensOn, closesOn: run && run.closesOn < closesOn ? run.closesOn : closesOn, moved: 'to a visit' };
}

/**
 * Which of the planned film work joins an earlier trip, by the rule by which the years ahead are played through. Work that shares
 * days with a trip already needs no joining; nothing is moved later than its own window, or into days that are over.
 */
export function joinToVisits(jobs: readonly FilmJob[], { joinMonths, tripCents, today }: { joinMonths: number; tripCents: number; today: CalendarDay }): Joined[] {
  const joined: Joined[] = [];
  let open = [...jobs];
  for (let trip = firstTrip(open, null); trip; trip = firstTrip(open, null)) {
    const here = trip;
    const { on, jobs: along } = here;
    const rest = open.filter((job) => !along.includes(job));
    const days = ({ seasons }: FilmJob) => sharedDays(here, seasons);
    const found = joinings(rest, on, joinMonths, tripCents).filter(({ job }) => days(job).closesOn >= today);
    for (const { job, caulk, months } of found) {
      const others = along.filter(({ wallId }) => wallId !== job.wallId);
      const wallIds = [...new Set((others.length > 0 ? others : along).map(({ wallId }) => wallId))];
      const savesTrip = !jobs.some((one) => one !== job && one !== caulk && overlap(one.window, job.window));
      joined.push({ job, savesTrip, window: days(job), wallIds, months, cents: Math.round(wasteCents(months, job)), caulk });
    }
    const gone = new Set(found.flatMap(({ job, caulk }) => [job, caulk]));
    open = rest.filter((job) => !gone.has(job));
  }
  return joined;
}

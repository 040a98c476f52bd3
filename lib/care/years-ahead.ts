import { type CalendarDay } from '@/lib/calendar';
import { type FilmJob, type FilmKind } from './film-jobs';
import { firstTrip, joinings, needsStripping, thrownAwayMonths } from './trip-rules';
import { restainWindowFor } from './with-restain';

/** One film renewed on a trip. */
export type TripItem = {
  wallId: string;
  kind: FilmKind;
  /** Of the renewal itself. */
  cents: number;
  /** Of stripping first; 0 where the coat is not too old for a maintenance coat. */
  stripCents: number;
  /** Film life that was left, months. */
  thrownAwayMonths: number;
};

/** A trip to a home: the day on which it is reckoned to take place, what is done, and what all of it costs, the trip included. */
export type Trip = { on: CalendarDay; items: TripItem[]; cents: number };

export type YearsAhead = { trips: Trip[]; /** Film work as it stands after the last trip. */ left: FilmJob[] };

type Ahead = {
  jobs: readonly FilmJob[];
  /** 0–24: work that opens within so many months of a trip may join it. */
  joinMonths: number;
  tripCents: number;
  /** No trip is reckoned before this day; null to take every window as it stands. */
  notBefore: CalendarDay | null;
  through: CalendarDay;
};

/** Far more trips than forty years can hold; reached only if a film's next window did not move on, which is a bug. */
const mostTrips = 2000;

/**
 * The film work of a home through the years, trip by trip. The work whose window closes first makes a trip; work whose window
 * shares days with it goes along; work that opens later joins by `joinings`. Every film done starts anew on that day.
 */
export function yearsAhead({ jobs, joinMonths, tripCents, notBefore, through }: Ahead): YearsAhead {
  const trips: Trip[] = [];
  let open = [...jobs];
  for (;;) {
    const trip = firstTrip(open, notBefore);
    if (!trip || trip.on > through) return { trips, left: open };
    if (trips.length >= mostTrips) throw new Error('the years ahead do not end');
    const { on } = trip;
    const done = new Set(trip.jobs);
    for (const { job, caulk } of joinings(open.filter((job) => !done.has(job)), on, joinMonths, tripCents)) {
      done.add(job);
      if (caulk) done.add(caulk);
    }
    trips.push(tripOf(on, open.filter((job) => done.has(job)), tripCents));
    open = renewed(open, done, on);
  }
}

function tripOf(on: CalendarDay, jobs: readonly FilmJob[], tripCents: number): Trip {
  const items = jobs.map((job) => ({
    wallId: job.wallId,
    kind: job.kind,
    cents: job.cents,
    stripCents: needsStripping(on, job) ? job.stripCents : 0,
    thrownAwayMonths: thrownAwayMonths(on, job.usedUpOn),
  }));
  return { on, items, cents: items.reduce((sum, { cents, stripCents }) => sum + cents + stripCents, tripCents) };
}

/** What is open after a trip: films that were done start anew, and caulk looks for its wall's restain again. */
function renewed(open: readonly FilmJob[], done: ReadonlySet<FilmJob>, on: CalendarDay): FilmJob[] {
  const jobs = open.flatMap((job) => (done.has(job) ? renewedJob(job, on) : [job]));
  const touched = new Set([...done].map(({ wallId }) => wallId));
  return jobs.map((job) => (job.kind === 'recaulk' && !job.isOwnRule && touched.has(job.wallId) ? besideRestain(job, jobs) : job));
}

function renewedJob(job: FilmJob, on: CalendarDay): FilmJob[] {
  const next = job.nextAfter(on);
  if (!next) return [];
  return [{ ...job, ...next, missedOn: null, putOffTo: null, ownWindow: next.window, usedUpOn: job.lastsFrom(on), mayJoin: !job.isOwnRule, withRestain: false }];
}

/** Caulk in the window of its wall's restain where the two are near, as the plan has it; otherwise in its own. */
function besideRestain(job: FilmJob, jobs: readonly FilmJob[]): FilmJob {
  const restain = jobs.find(({ wallId, kind }) => kind === 'restain' && wallId === job.wallId);
  const shared = restain ? restainWindowFor(job.dueOn, restain) : null;
  return { ...job, window: shared ?? job.ownWindow, withRestain: shared !== null };
}

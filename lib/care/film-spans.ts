import { addMonths, type CalendarDay, daysBetween } from '@/lib/calendar';
import { dueAge, type FilmSeen } from '@/lib/coat/learning';
import { type FilmState } from '@/lib/schemas/vocabulary';

export type Sighting = { on: CalendarDay; state: FilmState };

/** One film from its day to the day it was renewed, and how it was found in between. */
export type FilmSpan = { startedOn: CalendarDay; sightings: Sighting[] };

const daysInYear = 365.25;
/** A film of unknown age that is found sound is taken to be half used. Our rule. */
const soundShare = 0.5;

const inOrder = (a: Sighting, b: Sighting) => (a.on < b.on ? -1 : a.on > b.on ? 1 : severity[a.state] - severity[b.state]);
const severity: Record<FilmState, number> = { sound: 0, due: 1, 'past due': 2 };

/**
 * The films of a wall, oldest first, each with what was seen of it. A sighting on the day of the renewal is of the film before it;
 * of two on one day the worse comes last, so that the order of logging never matters.
 */
export function filmSpans(startDays: readonly CalendarDay[], sightings: readonly Sighting[]): { before: Sighting[]; spans: FilmSpan[] } {
  const starts = [...new Set(startDays)].sort();
  const sorted = [...sightings].sort(inOrder);
  const spans = starts.map((startedOn, i) => ({ startedOn, sightings: sorted.filter(({ on }) => on > startedOn && on <= (starts[i + 1] ?? '9999')) }));
  return { before: sorted.filter(({ on }) => on <= (starts[0] ?? '9999')), spans };
}

/** What was last found: of a film that stayed worn, the day it was first seen to be; of a sound one, the latest day. */
export function lastFound(sightings: readonly Sighting[]): Sighting | null {
  const last = sightings.at(-1);
  if (!last || last.state === 'sound') return last ?? null;
  const soundBefore = sightings.findLastIndex(({ state }) => state === 'sound');
  return sightings[soundBefore + 1] ?? last;
}

/** A film that was looked at, for learning; null when nobody looked. `modelMonths`: what the model alone has it last. */
export function seenFilm({ startedOn, sightings }: FilmSpan, modelMonths: number): FilmSeen | null {
  const found = lastFound(sightings);
  return found && { startedOn, on: found.on, state: found.state, ageYears: daysBetween(startedOn, found.on) / daysInYear, modelYears: modelMonths / 12 };
}

/**
 * The day from which a film of unknown age is counted, reckoned back from how it was found: due means its whole life, past due more
 * (its age times 0.85 is its life), sound half of it. Found sound again, it is at most as old as leaves 1.15 times its age within its life.
 * Null when nobody looked. Our rule.
 *
 * Example: life 60 months, found sound on 1 May 2026: counted from 1 November 2023; found due on 1 May 2026: from 1 May 2021.
 */
export function assumedStart(sightings: readonly Sighting[], lifeMonths: number): CalendarDay | null {
  let start = null as CalendarDay | null;
  let worn = false;
  for (const { on, state } of sightings) {
    const asFound = addMonths(on, -Math.round(lifeMonths / dueAge({ state, ageYears: 1 })));
    if (state === 'sound') {
      const half = addMonths(on, -Math.round(lifeMonths * soundShare));
      start = start === null ? half : start > asFound ? start : asFound;
    } else if (!worn) start = asFound;
    worn = state !== 'sound';
  }
  return start;
}

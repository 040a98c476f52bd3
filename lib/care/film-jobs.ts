import { addMonths, type CalendarDay } from '@/lib/calendar';
import { unlessBegun } from './carry-over';
import { filmWork } from './film-work';
import { type KnownWall, knownWall } from './films';
import { putOffDay } from './put-off';
import { type CareHome, type CareWall, type FilmLife, type SeasonMonths, type WallPlan, type Window, type WorkItem } from './types';
import { windowFor } from './window';

export type FilmKind = 'restain' | 'recaulk';

/** When a film is used up (or the owner's rule asks for it), and the days on which it is best renewed. */
export type FilmTurn = { dueOn: CalendarDay; window: Window };

/** The next renewal of one film of one wall, with what is needed to look further ahead. */
export type FilmJob = FilmTurn & {
  wallId: string;
  kind: FilmKind;
  /** The day on which an earlier window closed without the work. */
  missedOn: CalendarDay | null;
  /** The day on which the film itself is used up; the same as `dueOn` but for an owner's own rule. */
  usedUpOn: CalendarDay;
  lifeMonths: number;
  /** Of a maintenance coat or of the caulk; stripping comes on top. */
  cents: number;
  stripCents: number;
  /** Only work that we computed and that is not late may be drawn to an earlier trip. */
  mayJoin: boolean;
  isOwnRule: boolean;
  /** It was put off to this day, so it joins no earlier trip. */
  putOffTo: CalendarDay | null;
  /** In which a coat can cure on this wall; a trip outside of them is not joined. */
  seasons: readonly SeasonMonths[];
  /** The window for its own date, before caulk goes with its wall's restain. */
  ownWindow: Window;
  /** Caulk whose window is that of its wall's restain. */
  withRestain: boolean;
  /** The day on which a film put on on a day is used up. */
  lastsFrom: (doneOn: CalendarDay) => CalendarDay;
  /** The turn that follows when it is done on a day; null when the owner's rule has ended. */
  nextAfter: (doneOn: CalendarDay) => FilmTurn | null;
};

/**
 * The turn after a film was renewed on `doneOn`: `lifeMonths` later, in a season that opens after that day.
 *
 * Example: done on 10 June 2026, 60 months, seasons of May to September: due 10 June 2031, 1 May to 9 August 2031.
 */
export function computedTurn(doneOn: CalendarDay, lifeMonths: number, seasons: SeasonMonths[]): FilmTurn {
  const dueOn = addMonths(doneOn, lifeMonths);
  return { dueOn, window: unlessBegun(windowFor(dueOn, seasons, dueOn), doneOn, seasons) };
}

function ownTurn(home: CareHome, known: KnownWall, kind: FilmKind, doneOn: CalendarDay): FilmTurn | null {
  const renewed = (film: FilmLife): FilmLife => ({ ...film, startedOn: doneOn, found: null, assumed: false });
  const item = filmWork(home, kind === 'restain' ? { ...known, coat: renewed(known.coat) } : { ...known, seal: renewed(known.seal) }, kind);
  return item && { dueOn: item.dueOn, window: item.window };
}

/** The same day asked for again, by another choice of grouping, is not worked out twice. */
function remembered(turn: (doneOn: CalendarDay) => FilmTurn | null): FilmJob['nextAfter'] {
  const known = new Map<CalendarDay, FilmTurn | null>();
  return (doneOn) => {
    const before = known.get(doneOn);
    if (before !== undefined) return before;
    const next = turn(doneOn);
    known.set(doneOn, next);
    return next;
  };
}

function filmJob(home: CareHome, known: KnownWall, item: WorkItem, kind: FilmKind): FilmJob {
  const { costs } = home;
  const { wall } = known;
  const film = kind === 'restain' ? known.coat : known.seal;
  const isOwnRule = home.ownRules.some((rule) => rule.wallId === wall.id && rule.kind === kind);
  const withRestain = item.basis === 'pulled to the restain';
  const { seasons } = home.seasons[wall.stainBase];
  return {
    wallId: wall.id,
    kind,
    dueOn: item.dueOn,
    window: item.window,
    missedOn: item.missedOn,
    usedUpOn: isOwnRule && film.startedOn ? addMonths(film.startedOn, film.lifeMonths) : item.dueOn,
    lifeMonths: film.lifeMonths,
    cents: Math.round(kind === 'restain' ? wall.areaM2 * costs.restainCentsPerM2 : wall.jointM * costs.recaulkCentsPerM),
    stripCents: kind === 'restain' ? Math.round(wall.areaM2 * costs.stripCentsPerM2) : 0,
    mayJoin: item.basis === 'computed' && item.missedOn === null,
    isOwnRule,
    putOffTo: putOffDay(item, home.deferrals),
    seasons,
    ownWindow: withRestain ? windowFor(item.dueOn, seasons, item.dueOn) : item.window,
    withRestain,
    lastsFrom: (doneOn) => addMonths(doneOn, film.lifeMonths),
    nextAfter: remembered((doneOn) => (isOwnRule ? ownTurn(home, known, kind, doneOn) : computedTurn(doneOn, film.lifeMonths, seasons))),
  };
}

function jobsOfWall(home: CareHome, wall: CareWall, plan: WallPlan): FilmJob[] {
  const known = knownWall(home, wall);
  return plan.items.flatMap((item) => (item.kind === 'restain' || item.kind === 'recaulk' ? [filmJob(home, known, item, item.kind)] : []));
}

/** The next film work of a home's walls as jobs; walls whose dates nobody knows have none. */
export const filmJobs = (home: CareHome, plans: readonly WallPlan[]): FilmJob[] =>
  plans.flatMap((plan) => {
    const wall = home.walls.find(({ id }) => id === plan.wallId);
    return wall ? jobsOfWall(home, wall, plan) : [];
  });

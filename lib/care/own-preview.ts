import { addMonths, type CalendarDay, daysBetween } from '@/lib/calendar';
import { exactDay } from '@/lib/calendar-words';
import { type WorkKind } from '@/lib/schemas/vocabulary';
import { knownWall } from './films';
import { ruleInWords } from './own-rule';
import { planHome } from './plan';
import { catching, type PreviewFault, previewRule, restartFault } from './rule-preview';
import { type CareHome, type FilmLife, type OwnRule, type SeasonMonths, type Window, type WorkItem } from './types';
import { monthWindow, windowFor } from './window';

/** A day of the rule, and the days between which the work is then done. */
export type RuleDay = { dueOn: CalendarDay; opensOn: CalendarDay; closesOn: CalendarDay };

export type OwnPreview =
  | {
      ok: true;
      words: string;
      countedFrom: CalendarDay;
      /** What the plan asks for first, then the days from today on. */
      days: RuleDay[];
      /** The day on which the window of the first one closed, if it has. */
      missedOn: CalendarDay | null;
      /** How far a rule for restaining outlives the coat, and what stripping the wall would add. */
      pastLife: { months: number; lifeMonths: number; stripCents: number } | null;
    }
  | PreviewFault;

const daysInMonth = 30.44;
const isFilm = (kind: WorkKind): kind is 'restain' | 'recaulk' => kind === 'restain' || kind === 'recaulk';
const sameWork = ({ wallId, kind }: Pick<OwnRule, 'wallId' | 'kind'>) => (one: Pick<OwnRule, 'wallId' | 'kind'>) => one.wallId === wallId && one.kind === kind;

/** What the plan says of one kind of work on one wall by some rules of the owner; the other walls are left out. */
const planned = (home: CareHome, work: Pick<OwnRule, 'wallId' | 'kind'>, ownRules: OwnRule[], today: CalendarDay): WorkItem | undefined =>
  planHome({ ...home, walls: home.walls.filter(({ id }) => id === work.wallId), ownRules }, today).walls.flatMap(({ items }) => items).find(sameWork(work));

/** What the computed rule says, as if the owner had none of their own. */
export function computedWork(home: CareHome, work: Pick<OwnRule, 'wallId' | 'kind'>, today: CalendarDay): WorkItem | undefined {
  const same = sameWork(work);
  return planned(home, work, home.ownRules.filter((one) => !same(one)), today);
}

/** Months by which the days of a rule lie past the life of the coat: the first one past the coat that is on, or the longest wait between two. */
function monthsPast({ startedOn, lifeMonths }: FilmLife, days: CalendarDay[]): number {
  const [first] = days;
  const now = startedOn && first ? daysBetween(addMonths(startedOn, lifeMonths), first) / daysInMonth : 0;
  const waits = days.slice(1).map((day, i) => daysBetween(days[i] ?? day, day) / daysInMonth - lifeMonths);
  return Math.max(0, Math.round(Math.max(now, ...waits)));
}

const windowOf = (kind: WorkKind, dueOn: CalendarDay, seasons: SeasonMonths[]): Window => (isFilm(kind) ? windowFor(dueOn, seasons, dueOn) : monthWindow(dueOn));

/** The plan looks forty years ahead for yearly work; a day so far off is not the reason that the last one is done. */
const farMonths = 12 * 39;

function whyNoWork([next]: CalendarDay[], today: CalendarDay): string {
  const far = next !== undefined && next > addMonths(today, farMonths);
  return far ? `The next day of this rule is ${exactDay(next)}: that is too far ahead to plan for.` : 'This rule has no day left: the work of its last one is done.';
}

/**
 * An owner's own rule before it is saved: the days on which it falls, with the window that each would get, or why it is refused.
 * A rule that is accepted always gives the plan a piece of work on one of its days.
 */
export function previewOwnRule(home: CareHome, own: OwnRule, today: CalendarDay): OwnPreview {
  const drawn = home.walls.find(({ id }) => id === own.wallId);
  if (!drawn) throw new Error('the wall of the rule is not a wall of the home');
  const { wall, coat, seal } = knownWall(home, drawn);
  const doneOn = own.kind === 'restain' ? coat.startedOn : own.kind === 'recaulk' ? seal.startedOn : null;
  const countedFrom = doneOn && doneOn > own.startOn ? doneOn : own.startOn;
  const shown = previewRule(own.rule, countedFrom, today);
  if (!shown.ok) return shown;
  const stuck = isFilm(own.kind) ? catching(() => restartFault(own.rule, today)) : null;
  if (stuck) return stuck;
  const same = sameWork(own);
  const item = planned(home, own, [...home.ownRules.filter((one) => !same(one)), own], today);
  if (!item) return { ok: false, about: 'rule', error: whyNoWork(shown.days, today) };
  const later = shown.days.filter((day) => day > item.dueOn);
  const { seasons } = home.seasons[wall.stainBase];
  const windows = later.map((dueOn) => ({ dueOn, window: windowOf(own.kind, dueOn, seasons) }));
  const months = own.kind === 'restain' ? monthsPast(coat, [item.dueOn, ...later]) : 0;
  return {
    ok: true,
    words: ruleInWords(own.rule),
    countedFrom,
    days: [{ dueOn: item.dueOn, window: item.window }, ...windows].slice(0, 8).map(({ dueOn, window: { opensOn, closesOn } }) => ({ dueOn, opensOn, closesOn })),
    missedOn: item.missedOn,
    pastLife: months > 0 ? { months, lifeMonths: coat.lifeMonths, stripCents: Math.round(home.costs.stripCentsPerM2 * wall.areaM2) } : null,
  };
}

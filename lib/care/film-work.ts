import { addDays, addMonths, type CalendarDay } from '@/lib/calendar';
import { aboutDay, exactDay, exactRange, monthNames } from '@/lib/calendar-words';
import { monthsInWords } from '@/lib/coat';
import { type Explanation, type Source } from '@/lib/explain';
import { ourRule } from '@/lib/our-rules';
import { filmStates, workKinds } from '@/lib/schemas/vocabulary';
import { comingWindow, unlessBegun } from './carry-over';
import { type KnownWall } from './films';
import { learnedWords } from './learned-words';
import { monthlyRule, withSafeDay } from './rule-build';
import { readRule } from './rule-check';
import { walkRule } from './rule-days';
import { horizonMonths, nextOfRule } from './rule-expand';
import { type CareHome, type FilmLife, type OwnRule, type SeasonMonths, type Window, type WorkItem } from './types';
import { windowFor } from './window';

type FilmKind = 'restain' | 'recaulk';

export const windowSource = ourRule('window');
const ruleSource: Source = { text: 'RFC 5545 (2009), §3.3.10, recurrence rules', ground: 'published' };
const caulkSeason: Source = { text: 'Caulk keeps to the coating season; ASTM C1193 gives 40 to 100 °F for sealants', ground: 'memory' };

/** A film found sound is asked for again after this many months at the earliest: the next walkaround comes first. Our rule. */
const soundMonths = 6;
const foundSource = ourRule('found');

/** The next restain or recaulk of a wall; null when there is no date to start from, or the owner's rule has ended. */
export function filmWork(home: CareHome, known: KnownWall, kind: FilmKind): WorkItem | null {
  const film = kind === 'restain' ? known.coat : known.seal;
  const own = home.ownRules.find((rule) => rule.wallId === known.wall.id && rule.kind === kind);
  const season = home.seasons[known.wall.stainBase];
  const turn = own ? ownTurn(own, film.startedOn, season.seasons) : computedTurn(film, season.seasons);
  if (!turn) return null;
  const because = [whyThen(kind, film, turn, own), whyWindow(turn.window), season.warning].filter(Boolean).join(' ');
  const isFound = !own && turn.dueOn !== turn.byRule;
  const { byRule: _byRule, ...facts } = turn;
  return {
    wallId: known.wall.id,
    kind,
    ...facts,
    missedOn: !own && film.found?.state === 'past due' ? film.found.on : null,
    lapsesOn: null,
    basis: own ? 'own rule' : isFound ? 'found' : 'computed',
    lifeMonths: film.lifeMonths,
    because,
    explanation: explain(kind, film, turn, season.seasons),
  };
}

/** `byRule` is what the care rule says; how the film was found may move the date away from it. */
type Turn = { rule: string; startOn: CalendarDay; byRule: CalendarDay; dueOn: CalendarDay; window: Window };

function computedTurn({ startedOn, lifeMonths, found }: FilmLife, seasons: SeasonMonths[]): Turn | null {
  if (!startedOn) return null;
  const rule = monthlyRule(startedOn, lifeMonths);
  const byRule = nextOfRule(rule, startedOn, startedOn);
  if (!byRule) return null;
  const dueOn = afterLooking(byRule, found);
  return { rule, startOn: startedOn, byRule, dueOn, window: unlessOver(unlessBegun(windowFor(dueOn, seasons, dueOn), startedOn, seasons), found, seasons) };
}

/** What was seen goes before what was reckoned. */
function afterLooking(byRule: CalendarDay, found: FilmLife['found']): CalendarDay {
  if (!found) return byRule;
  if (found.state === 'due') return found.on;
  if (found.state === 'past due') return found.on < byRule ? found.on : byRule;
  const rested = addMonths(found.on, soundMonths);
  return rested > byRule ? rested : byRule;
}

/** No season is asked for that was over when the film was found: then the one after it. */
const unlessOver = (window: Window, found: FilmLife['found'], seasons: SeasonMonths[]): Window =>
  found && window.closesOn < found.on ? comingWindow(addDays(found.on, -1), seasons, found.on) : window;

/** The owner's rule, from the latest work if that is later; its first date whose window opens after that work. */
function ownTurn(own: OwnRule, doneOn: CalendarDay | null, seasons: SeasonMonths[]): Turn | null {
  const startOn = doneOn && doneOn > own.startOn ? doneOn : own.startOn;
  const rule = withSafeDay(own.rule, startOn);
  let turn: Turn | null = null;
  walkRule(readRule(rule), startOn, addMonths(startOn, horizonMonths), (dueOn) => {
    const window = windowFor(dueOn, seasons, dueOn);
    if (!doneOn || window.opensOn > doneOn) turn = { rule, startOn, byRule: dueOn, dueOn, window };
    return turn === null;
  });
  return turn;
}

const filmWords = { restain: 'coat', recaulk: 'caulk' } as const;

function whyThen(kind: FilmKind, film: FilmLife, { dueOn, startOn, byRule }: Turn, own: OwnRule | undefined): string {
  if (own) return `The owner’s own rule, counted from ${exactDay(startOn)}, falls on ${exactDay(dueOn)}.`;
  const what = filmWords[kind];
  const found = film.found && `found ${filmStates[film.found.state].toLowerCase()} on ${exactDay(film.found.on)}`;
  const learned = learnedWords(film);
  const worn = found && film.found?.state !== 'sound';
  if (film.assumed) return `Nobody knows the day of this ${what}. It was ${found}, ${worn ? 'so its life is taken to be used up' : `so it is taken to last until ${aboutDay(dueOn)}`} (assumed).`;
  const month = `${monthNames[Number(startOn.slice(5, 7)) - 1]} ${startOn.slice(0, 4)}`;
  if (worn) return [`The ${what} of ${month} was ${found}; it had been expected to last until ${aboutDay(byRule)}.`, learned].filter(Boolean).join(' ');
  const reckoned = `The ${what} of ${month} lasts about ${monthsInWords(film.lifeMonths)} on this wall, until ${aboutDay(byRule)}.`;
  const rested = dueOn === byRule ? null : `It was ${found}, so it is left until ${aboutDay(dueOn)} at least.`;
  return [reckoned, rested, learned].filter(Boolean).join(' ');
}

function whyWindow({ moved }: Window): string | null {
  if (moved === 'to the season before') return 'No coating season comes soon after that, so it is done in the season before.';
  return moved === 'to the next season' ? 'The coating season opens soon after that.' : moved === 'no season' ? 'No month here is safely warm and dry enough.' : null;
}

const seasonWords = (seasons: SeasonMonths[]) =>
  seasons.map(({ fromMonth, toMonth }) => (fromMonth === toMonth ? monthNames[fromMonth - 1] : `${monthNames[fromMonth - 1]} to ${monthNames[toMonth - 1]}`)).join(', ') || 'none';

function explain(kind: FilmKind, film: FilmLife, { startOn, dueOn, window, rule }: Turn, seasons: SeasonMonths[]): Explanation {
  return {
    figure: `Next ${workKinds[kind].toLowerCase()} of this wall`,
    value: exactRange(window.opensOn, window.closesOn),
    formula: 'date = start + life, by the care rule; window = the coating season for that date',
    inputs: [
      { label: 'Counted from', value: `${exactDay(startOn)}${film.assumed ? ' (assumed)' : ''}` },
      { label: `Expected life of the ${filmWords[kind]}`, value: `${monthsInWords(film.lifeMonths)} (range ${film.lowYears} to ${film.highYears} years, severity ${film.severity.toFixed(2)})` },
      { label: 'Care rule (RFC 5545)', value: rule },
      ...(film.found ? [{ label: 'Found', value: `${filmStates[film.found.state].toLowerCase()} on ${exactDay(film.found.on)}` }] : []),
      { label: 'Date', value: exactDay(dueOn) },
      { label: 'Coating season', value: seasonWords(seasons) },
    ],
    sources: [...film.explanation.sources, ruleSource, windowSource, ...(film.found ? [foundSource] : []), ...(kind === 'recaulk' ? [caulkSeason] : [])],
  };
}

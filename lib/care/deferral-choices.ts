import { addDays, type CalendarDay, daysBetween } from '@/lib/calendar';
import { exactDay, exactRange } from '@/lib/calendar-words';
import { monthsInWords } from '@/lib/coat';
import { type ExplainedInput, type Explanation } from '@/lib/explain';
import { knownWall } from './films';
import { planWall } from './plan';
import { nextChance, putOffSource } from './put-off';
import { stripAtShare, stripSource } from './stripping';
import { type CareHome, type CareWall, type FilmLife, type WorkItem } from './types';
import { workKey } from './work-key';

/** What waiting costs a film. */
export type DeferralPrice = {
  /** Share of the film's life that is left when the later window opens; below 0 once it is used up. */
  leftThen: number;
  /** Months for which the wall stands without a sound film by then; 0 when it still has one. */
  monthsBare: number;
  /** Whether the coat has to be stripped first even if it does not wait. */
  stripsAnyway: boolean;
  /** Cents of stripping that waiting brings, because the coat will be too old for a maintenance coat; 0 when it will not, or already is. */
  stripCents: number;
  explanation: Explanation;
};

/** A piece of work that can be put off, what comes of it, and at what price. */
export type DeferralChoice = { wallId: string; item: WorkItem; notBefore: CalendarDay; after: WorkItem | null; price: DeferralPrice | null };

const daysInMonth = 30.44;
const percent = (share: number) => `${Math.round(share * 100)} %`.replace('-', '−');

/**
 * The price of waiting until a later window, in film life: what is left on the day it opens, and how long the wall stands bare by then.
 * Past 1.15 times its life a coat is stripped first (our rule), at the home's own price.
 *
 * Example: a coat of 60 months used up on 1 July 2026, put off to 1 May 2027: 304 days, 10 months bare, −17 % left, to be stripped.
 */
export function deferralPrice({ item, opensOn, film, stripCents }: { item: WorkItem; opensOn: CalendarDay; film: FilmLife; stripCents: number }): DeferralPrice {
  const leftOn = (day: CalendarDay) => -daysBetween(item.dueOn, day) / daysInMonth / film.lifeMonths;
  const tooOld = (day: CalendarDay) => item.kind === 'restain' && -leftOn(day) > stripAtShare - 1;
  const leftThen = leftOn(opensOn);
  const monthsBare = Math.max(0, Math.round(daysBetween(item.dueOn, opensOn) / daysInMonth));
  const stripsAnyway = tooOld(item.window.opensOn);
  const inputs: ExplainedInput[] = [
    { label: 'Used up', value: exactDay(item.dueOn) },
    { label: 'The later window opens', value: exactDay(opensOn) },
    { label: film.film === 'coat' ? 'Coat life of this wall' : 'Seal life of this wall', value: monthsInWords(film.lifeMonths) },
    { label: 'Bare by then', value: monthsBare === 0 ? 'no' : monthsInWords(monthsBare) },
  ];
  return {
    leftThen,
    monthsBare,
    stripsAnyway,
    stripCents: tooOld(opensOn) && !stripsAnyway ? Math.round(stripCents) : 0,
    explanation: {
      figure: film.film === 'coat' ? 'Coat left if it waits' : 'Seal left if it waits',
      value: percent(leftThen),
      formula: 'days from the opening of the later window to the day on which the film is used up ÷ days that it is expected to last',
      inputs,
      sources: [putOffSource, ...(item.kind === 'restain' ? [stripSource] : [])],
    },
  };
}

function choiceFor(home: CareHome, wall: CareWall, item: WorkItem, today: CalendarDay): DeferralChoice {
  const known = knownWall(home, wall);
  const isFilm = item.kind === 'restain' || item.kind === 'recaulk';
  const notBefore = isFilm ? nextChance(item, home.seasons[known.wall.stainBase].seasons).opensOn : addDays(item.window.closesOn, 1);
  const later = planWall({ ...home, deferrals: [...home.deferrals, { workKey: workKey(item), notBefore }] }, wall, today);
  const after = later.items.find(({ kind }) => kind === item.kind) ?? null;
  const film = item.kind === 'recaulk' ? known.seal : known.coat;
  const price = isFilm ? deferralPrice({ item, opensOn: after?.window.opensOn ?? notBefore, film, stripCents: home.costs.stripCentsPerM2 * wall.areaM2 }) : null;
  return { wallId: wall.id, item, notBefore, after, price };
}

/** One kind of work on some walls, each with what putting it off would mean. Work that the plan does not hold is left out. */
export function deferralChoices(home: CareHome, items: readonly WorkItem[], today: CalendarDay): DeferralChoice[] {
  return items.flatMap((item) => {
    const wall = home.walls.find(({ id }) => id === item.wallId);
    return wall ? [choiceFor(home, wall, item, today)] : [];
  });
}

/** What waiting does to one wall, in plain words. 'Moves from June 1 – August 9, 2027 to June 1 – August 31, 2028. By then …' */
export const waitWords = ({ item, after, price }: DeferralChoice): string => {
  const when = after ? `from ${exactRange(item.window.opensOn, item.window.closesOn)} to ${exactRange(after.window.opensOn, after.window.closesOn)}` : 'it is not asked for again';
  if (!price) return `Moves ${when}.`;
  const film = item.kind === 'restain' ? 'coat' : 'caulk';
  const bare = price.monthsBare > 0 ? ` By then the wall has stood ${monthsInWords(price.monthsBare)} past the end of its ${film}.` : ` The ${film} lasts until then.`;
  const strip = price.stripsAnyway ? ' It is too old for a maintenance coat already: it has to be stripped first in any case.' : '';
  return `Moves ${when}.${bare}${strip}`;
};

import { addDays, addMonths, type CalendarDay, daysBetween } from '@/lib/calendar';
import { aboutDay, aboutRange } from '@/lib/calendar-words';
import { type Explanation, type Source } from '@/lib/explain';
import { comingWindow } from './carry-over';
import { type CareDeferral, type FilmLife, type SeasonMonths, type Window, type WorkItem } from './types';
import { isAllYear } from './window';
import { workKey } from './work-key';

/** Where the calendar gives no season, putting off means so many months. Our rule. */
const restMonths = 6;
/** A coat older than this share of its life has to be stripped before it is renewed. Our rule: common practice puts a number to it nowhere. */
export const stripAtShare = 1.15;

const source: Source = { text: 'Work that was put off is not asked for before the season that it was put off to', ground: 'our rule' };

/** The window that holds a day, or the next one after it. */
const windowFrom = (day: CalendarDay, seasons: SeasonMonths[]): Window => ({ ...comingWindow(addDays(day, -1), seasons, day), moved: 'put off' });

/** The window to which work can be put off: the season after its own, or where there are none, half a year later. */
export function nextChance({ window }: Pick<WorkItem, 'window'>, seasons: SeasonMonths[]): Window {
  const hasSeason = seasons.length > 0 && !seasons.some(isAllYear);
  return windowFrom(hasSeason ? addDays(window.closesOn, 1) : addMonths(window.opensOn, restMonths), seasons);
}

/** Film work that somebody put off takes the window from that day on; it is no longer overdue, and its date stays what it was. */
export function putOff(item: WorkItem, deferrals: readonly CareDeferral[], seasons: SeasonMonths[]): WorkItem {
  const key = workKey(item);
  const notBefore = deferrals.flatMap((one) => (one.workKey === key ? [one.notBefore] : [])).sort().at(-1);
  if (!notBefore || notBefore <= item.window.opensOn) return item;
  const window = windowFrom(notBefore, seasons);
  const { explanation } = item;
  return {
    ...item,
    window,
    missedOn: null,
    basis: 'put off',
    because: `${item.because} It was put off to ${aboutRange(window.opensOn, window.closesOn)}.`,
    explanation: {
      ...explanation,
      value: aboutRange(window.opensOn, window.closesOn),
      formula: `${explanation.formula}; put off by the owner`,
      inputs: [...explanation.inputs, { label: 'Put off from', value: aboutRange(item.window.opensOn, item.window.closesOn) }],
      sources: [...explanation.sources, source],
    },
  };
}

/** What putting off costs a film. */
export type DeferralPrice = {
  window: Window;
  /** Share of the film's life that is left when the window opens; below 0 when it is used up. */
  leftThen: number;
  /** Months for which the wall stands without a sound film by then, 0 or more. */
  monthsBare: number;
  /** Whether a coat that old has to be stripped first. */
  strips: boolean;
  explanation: Explanation;
};

const percent = (share: number) => `${Math.round(share * 100)} %`;
const daysInMonth = 30.44;

/**
 * The price of waiting for a later window, in film life: what is left when that window opens, and for how long the wall stands bare by then.
 * Past 1.15 times its life a coat has to be stripped: the cost of that stands in `strips`. Our rule.
 *
 * Example: a coat of 60 months used up on 1 July 2026, put off to 1 May 2027: 10 months bare, −17 % left, to be stripped.
 */
export function deferralPrice(item: Pick<WorkItem, 'window' | 'dueOn' | 'kind'>, film: FilmLife, seasons: SeasonMonths[]): DeferralPrice {
  const window = nextChance(item, seasons);
  const days = daysBetween(item.dueOn, window.opensOn);
  const months = days / daysInMonth;
  const leftThen = -months / film.lifeMonths;
  const monthsBare = Math.max(0, Math.round(months));
  const strips = item.kind === 'restain' && -leftThen > stripAtShare - 1;
  return {
    window,
    leftThen,
    monthsBare,
    strips,
    explanation: {
      figure: film.film === 'coat' ? 'Coat left when it is put off' : 'Seal left when it is put off',
      value: percent(leftThen),
      formula: 'days from the opening of that window to the day on which the film is used up ÷ days of its life',
      inputs: [
        { label: 'Used up', value: aboutDay(item.dueOn) },
        { label: 'Window that it is put off to', value: aboutRange(window.opensOn, window.closesOn) },
        { label: 'Expected life', value: `${film.lifeMonths} months` },
        { label: 'Months without a sound film by then', value: String(monthsBare) },
      ],
      sources: [source, ...(item.kind === 'restain' ? [{ text: 'A coat older than 1.15 times its life is stripped before it is renewed', ground: 'our rule' as const }] : [])],
    },
  };
}

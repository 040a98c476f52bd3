import { addDays, type CalendarDay, daysBetween } from '@/lib/calendar';
import { aboutRange } from '@/lib/calendar-words';
import { ourRule } from '@/lib/our-rules';
import { type SeasonMonths, type Window, type WorkItem } from './types';
import { isAllYear, runsAround } from './window';

/** Where the calendar gives no season, a missed window is followed by others of this length. Our rule. */
const periodDays = 90;

const source = ourRule('carried over');

/** The coming window after one that closed on `missedOn`; the same on every day until it closes itself. */
export function comingWindow(missedOn: CalendarDay, seasons: SeasonMonths[], today: CalendarDay): Window {
  const after = addDays(missedOn, 1);
  const run = seasons.some(isAllYear) ? undefined : runsAround(today, seasons).find(({ closesOn }) => closesOn >= today);
  if (run) return { opensOn: run.opensOn > after ? run.opensOn : after, closesOn: run.closesOn, moved: 'to the coming season' };
  const opensOn = addDays(after, Math.floor(daysBetween(after, today) / periodDays) * periodDays);
  return { opensOn, closesOn: addDays(opensOn, periodDays - 1), moved: 'to the coming season' };
}

/** A window, or the one after it where it had begun on the day on which the film was put on. */
export function unlessBegun(window: Window, startedOn: CalendarDay, seasons: SeasonMonths[]): Window {
  if (window.opensOn > startedOn) return window;
  const over = window.closesOn > startedOn ? window.closesOn : startedOn;
  return comingWindow(over, seasons, addDays(over, 1));
}

/**
 * Film work is asked for until it is done: once its window has closed it is overdue and takes the coming season's window.
 * It lapses, to be planned anew, on the day after its window closes.
 *
 * Example: a restain for June to August 2026, not done; on 1 December 2026 its window is June to August 2027, overdue since 31 August 2026.
 */
export function carriedOver(item: WorkItem, seasons: SeasonMonths[], today: CalendarDay): WorkItem {
  const missedOn = item.window.closesOn;
  if (missedOn >= today) return { ...item, lapsesOn: addDays(missedOn, 1) };
  const window = comingWindow(missedOn, seasons, today);
  const { explanation } = item;
  return {
    ...item,
    window,
    missedOn: item.missedOn ?? missedOn,
    lapsesOn: addDays(window.closesOn, 1),
    because: `${item.because} That time has passed; the next chance is ${aboutRange(window.opensOn, window.closesOn)}.`,
    explanation: {
      ...explanation,
      value: aboutRange(window.opensOn, window.closesOn),
      formula: `${explanation.formula}; missed, so the coming season`,
      inputs: [...explanation.inputs, { label: 'Window that passed', value: aboutRange(item.window.opensOn, missedOn) }],
      sources: [...explanation.sources, source],
    },
  };
}

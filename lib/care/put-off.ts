import { addDays, addMonths, type CalendarDay } from '@/lib/calendar';
import { aboutRange } from '@/lib/calendar-words';
import { ourRule } from '@/lib/our-rules';
import { comingWindow } from './carry-over';
import { type CareDeferral, type SeasonMonths, type Window, type WorkItem } from './types';
import { isAllYear, runsAround } from './window';
import { workKey } from './work-key';

/** Where the calendar gives no season, putting off means so many months. Our rule. */
const restMonths = 6;
export const putOffSource = ourRule('put off');

/** The window that holds a day, or the next one after it. */
const windowFrom = (day: CalendarDay, seasons: SeasonMonths[]): Window => ({ ...comingWindow(addDays(day, -1), seasons, day), moved: 'put off' });

/** The season to which work can be put off: the one after its own, or where there are none, half a year later. */
export function nextChance({ window }: Pick<WorkItem, 'window'>, seasons: SeasonMonths[]): Window {
  if (seasons.length === 0 || seasons.some(isAllYear)) return windowFrom(addMonths(window.opensOn, restMonths), seasons);
  const own = runsAround(window.closesOn, seasons).find(({ opensOn, closesOn }) => opensOn <= window.closesOn && window.closesOn <= closesOn);
  return windowFrom(addDays(own?.closesOn ?? window.closesOn, 1), seasons);
}

/** The latest day to which somebody put this work off, if anybody did. */
export function putOffDay(item: WorkItem, deferrals: readonly CareDeferral[]): CalendarDay | null {
  const key = workKey(item);
  return deferrals.flatMap((one) => (one.workKey === key ? [one.notBefore] : [])).sort().at(-1) ?? null;
}

/** Film work that somebody put off takes the window from that day on; it is no longer overdue, and its date stays what it was. */
export function putOff(item: WorkItem, deferrals: readonly CareDeferral[], seasons: SeasonMonths[]): WorkItem {
  const notBefore = putOffDay(item, deferrals);
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
      sources: [...explanation.sources, putOffSource],
    },
  };
}

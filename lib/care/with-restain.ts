import { addDays, addMonths, type CalendarDay, dayOf, yearOf } from '@/lib/calendar';
import { aboutDay, exactDay, exactRange } from '@/lib/calendar-words';
import { type Source } from '@/lib/explain';
import { ourRule } from '@/lib/our-rules';
import { type Window, type WorkItem } from './types';

/** A recaulk due this near to the wall's restain is done with it. Our rule. */
const nearMonths = 18;
/** Caulk is left at most this long past its life, and a shared window has at least so many days. Our rule. */
const graceDays = 60;
const shortestDays = 14;

const caulkFirst: Source = { text: 'Caulk takes up color with the next coat and so goes on before it: common practice, no source', ground: 'common practice' };
const nearSource = ourRule('caulk with the coat');
const washSource = ourRule('wash with the coat');

/** The day on which work is taken to be done: its date where the window holds it, else the nearest end of the window; once missed, the opening. Our rule. */
export function dayOfVisit({ dueOn, window, missedOn }: Pick<WorkItem, 'dueOn' | 'window' | 'missedOn'>): CalendarDay {
  if (missedOn || dueOn < window.opensOn) return window.opensOn;
  return dueOn > window.closesOn ? window.closesOn : dueOn;
}

/** The restain's window for a recaulk, or null when the two are too far apart. */
export function restainWindowFor(recaulkOn: CalendarDay, restain: Pick<WorkItem, 'dueOn' | 'window' | 'missedOn'>): Window | null {
  const restainOn = dayOfVisit(restain);
  if (recaulkOn > addMonths(restainOn, nearMonths) || recaulkOn < addMonths(restainOn, -nearMonths)) return null;
  const limit = addDays(recaulkOn, graceDays);
  if (addDays(restain.window.opensOn, shortestDays) > limit) return null;
  return { ...restain.window, closesOn: restain.window.closesOn < limit ? restain.window.closesOn : limit };
}

/** The part of a window after the day on which the film was put on. */
function afterStart(window: Window | null, startOn: CalendarDay | null): Window | null {
  if (!window || !startOn || window.opensOn > startOn) return window;
  return window.closesOn > startOn ? { ...window, opensOn: addDays(startOn, 1) } : null;
}

/** The part of a window that lies in a year: a wash settles the wash of its own year, so it is not moved out of it. */
function withinYear(window: Window, year: number): Window | null {
  const [first, last] = [dayOf(year, 1, 1), dayOf(year, 12, 31)];
  if (window.closesOn < first || window.opensOn > last) return null;
  return { ...window, opensOn: window.opensOn > first ? window.opensOn : first, closesOn: window.closesOn < last ? window.closesOn : last };
}

function moved(item: WorkItem, window: Window, because: string, restain: WorkItem, sources: Source[]): WorkItem {
  const { explanation } = item;
  return {
    ...item,
    window,
    basis: 'pulled to the restain',
    because,
    explanation: {
      ...explanation,
      value: exactRange(window.opensOn, window.closesOn),
      formula: `${explanation.formula}; then the window of the wall’s restain`,
      inputs: [...explanation.inputs, { label: 'Restain of this wall', value: exactDay(restain.dueOn) }],
      sources: [...explanation.sources, ...sources],
    },
  };
}

/** A recaulk or wash of the wall that belongs with its restain takes the restain's window; other work stays as it is, and so do the owner's own rules. */
export function withRestain(item: WorkItem | null, restain: WorkItem | null): WorkItem | null {
  if (!item || !restain || !['computed', 'found'].includes(item.basis)) return item;
  if (item.kind === 'recaulk') {
    const window = afterStart(restainWindowFor(item.dueOn, restain), item.startOn);
    const because = `Caulk goes on before stain, so it is done with this wall’s restain and left to cure as its label says; on its own the caulk would last until ${aboutDay(item.dueOn)}.`;
    return window ? moved(item, window, because, restain, [caulkFirst, nearSource]) : item;
  }
  const window = withinYear(restain.window, yearOf(item.dueOn));
  return item.kind === 'wash' && window ? moved(item, window, 'The restain of this wall begins with a wash.', restain, [washSource]) : item;
}

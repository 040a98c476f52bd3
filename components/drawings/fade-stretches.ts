import { addDays, addMonths, type CalendarDay, daysBetween } from '@/lib/calendar';
import { type FadeWall, faded } from '@/components/drawings/fade-time';

/** A stretch of a wall's strip: a coat that fades, a used-up coat, or a time of which nothing is known. */
export type Stretch =
  | { what: 'coat'; from: CalendarDay; to: CalendarDay; colors: string[]; /** Share of coat life used up at its end, 0 to 1. */ used: number }
  | { what: 'used up'; from: CalendarDay; to: CalendarDay }
  | { what: 'not known'; from: CalendarDay; to: CalendarDay };

/** The day on which a film that began on `startedOn` is used up. Whole months, the rest in days of 30.44. */
export function usedUpOn(startedOn: CalendarDay, lifeMonths: number): CalendarDay {
  const whole = Math.floor(lifeMonths);
  return addDays(addMonths(startedOn, whole), Math.round((lifeMonths - whole) * 30.44));
}

/** The strip of one wall between two days: each earlier coat up to the next, the present one up to its coming restain. */
export function stretches(wall: FadeWall, from: CalendarDay, to: CalendarDay): Stretch[] {
  const restains = wall.past.filter((work) => work.kind === 'restain').map((work) => work.doneOn);
  const starts = [...new Set([...restains, ...(wall.coat.startedOn ? [wall.coat.startedOn] : [])])].sort();
  const next = wall.coming.filter((work) => work.kind === 'restain').map((work) => work.closesOn).sort()[0];
  const end = next && next < to ? next : to;
  const first = starts[0];
  if (first === undefined || wall.coat.startedOn === null) return [{ what: 'not known', from, to: end }];
  const coats = starts.flatMap((start, i) => coat(wall, start, starts[i + 1] ?? end));
  return [...(first > from ? [{ what: 'not known' as const, from, to: first }] : []), ...coats].filter((one) => one.to > from && one.from < end);
}

function coat(wall: FadeWall, from: CalendarDay, to: CalendarDay): Stretch[] {
  const gone = usedUpOn(from, wall.coat.lifeMonths);
  if (to <= from) return [];
  const used = Math.min(1, daysBetween(from, to) / Math.max(1, daysBetween(from, gone)));
  const fades: Stretch = { what: 'coat', from, to: gone < to ? gone : to, colors: [0, 0.25, 0.5, 0.75, 1].map((share) => faded(wall.colorHex, share * used)), used };
  return gone < to ? [fades, { what: 'used up', from: gone, to }] : [fades];
}

import { type CalendarDay, dayOf, daysBetween, yearOf } from '@/lib/calendar';
import { type WorkKind } from '@/lib/schemas/vocabulary';

type Film = { startedOn: CalendarDay | null; lifeMonths: number };

export type FadeWall = {
  id: string;
  name: string;
  href?: string | undefined;
  /** The coat's own colour, '#8a5a32'. */
  colorHex: string;
  coat: Film;
  seal: Film;
  past: readonly { kind: WorkKind; doneOn: CalendarDay }[];
  coming: readonly { kind: WorkKind; opensOn: CalendarDay; closesOn: CalendarDay }[];
};

export type Scale = { fromYear: number; toYear: number; at: (day: CalendarDay) => number };

const back = 10;
const ahead = 8;

/** Years drawn: from the earliest known work (at most 10 years back, at least 2) to the last coming work (3 to 8 years ahead). */
export function fadeScale(today: CalendarDay, walls: readonly FadeWall[]): Scale {
  const year = yearOf(today);
  const known = walls.flatMap((wall) => [wall.coat.startedOn, wall.seal.startedOn, ...wall.past.map((work) => work.doneOn)]).filter((day) => day !== null);
  const coming = walls.flatMap((wall) => wall.coming.map((work) => work.closesOn));
  const fromYear = Math.max(year - back, Math.min(year - 2, ...known.map(yearOf)));
  const toYear = Math.min(year + ahead, Math.max(year + 3, ...coming.map(yearOf))) + 1;
  const start = dayOf(fromYear, 1, 1);
  const days = daysBetween(start, dayOf(toYear, 1, 1));
  return { fromYear, toYear, at: (day) => Math.min(100, Math.max(0, (100 * daysBetween(start, day)) / days)) };
}

const channel = (hex: string, i: number) => parseInt(hex.slice(1 + 2 * i, 3 + 2 * i), 16);

/** The colour of weathered wood: a coat ends there in light and in dark. */
export const weathered = '#9b9a92';

/** A coat's colour when a share of its life (0–1) is used up: it holds at first, then goes to weathered grey. Our rule, for drawing only. */
export function faded(colorHex: string, used: number): string {
  const share = Math.min(1, Math.max(0, used)) ** 1.6;
  const mix = [0, 1, 2].map((i) => Math.round(channel(colorHex, i) + share * (channel(weathered, i) - channel(colorHex, i))));
  return `#${mix.map((value) => value.toString(16).padStart(2, '0')).join('')}`;
}

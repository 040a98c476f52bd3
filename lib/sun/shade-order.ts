import { TZDate } from '@date-fns/tz';
import { addDays, type CalendarDay, toUtcDate } from '@/lib/calendar';
import { type Place, type SunPosition, sunPosition } from './position';
import { litShareOf, stripsOf } from './strips';
import { directShare, type WallFace } from './wall-face';

/** A stretch of one day at a place: instants (ms), and what its clock shows, in minutes after midnight; 1440 is the day's end. */
export type DaySpan = { from: number; to: number; fromMinute: number; toMinute: number };

export type WallShade<W> = {
  wall: W;
  /** When the sun strikes the wall. */
  sun: DaySpan[];
  /** When it does not, from first to last daylight. */
  shade: DaySpan[];
  /** The longest of these: the time to work on it. Null where the sun never leaves the wall in daylight. */
  best: DaySpan | null;
};

export type ShadeOrder<W> = { daylight: DaySpan | null; walls: WallShade<W>[] };

const minuteMs = 60_000;
const radians = Math.PI / 180;
/** Trees that let less than this share of the light through count as shade. Our rule. */
const dappled = 0.5;

/** The instants at which the calendar day begins and ends at the place; 23 or 25 hours apart where the clock changes. */
function boundsOf(day: CalendarDay, timeZone: string): { start: number; end: number } {
  const midnight = (of: CalendarDay) => {
    const utc = toUtcDate(of);
    return new TZDate(utc.getUTCFullYear(), utc.getUTCMonth(), utc.getUTCDate(), timeZone).getTime();
  };
  return { start: midnight(day), end: midnight(addDays(day, 1)) };
}

/** Any part of the wall lit: above the horizon, in front of the wall, not wholly in the shadow of its eave and cover, not behind what stands in front. */
function strikes(sun: SunPosition, wall: WallFace, litShare: (tanProfile: number) => number, leafOn: boolean): boolean {
  const inFront = Math.cos((sun.azimuthDeg - wall.azimuthDeg) * radians);
  if (sun.elevationDeg <= 0 || inFront <= 0) return false;
  const lit = litShare(Math.tan(sun.elevationDeg * radians) / inFront);
  return lit > 0 && directShare(wall.horizon, leafOn, sun.azimuthDeg, sun.elevationDeg) >= dappled;
}

/** Runs of minutes for which `holds`, counted from the day's start. */
function runs(count: number, holds: (minute: number) => boolean): [number, number][] {
  const found: [number, number][] = [];
  let since = -1;
  for (let minute = 0; minute <= count; minute += 1) {
    const now = minute < count && holds(minute);
    if (now && since < 0) since = minute;
    if (!now && since >= 0) {
      found.push([since, minute]);
      since = -1;
    }
  }
  return found;
}

const length = (span: DaySpan) => span.to - span.from;
const middle = (span: DaySpan) => (span.from + span.to) / 2;

/**
 * When each wall is in the sun on a day, to the minute (judged at its middle, without refraction), and the walls in the order in which
 * work follows the shade: by the middle of each wall's longest time out of the sun in daylight, walls that the sun never leaves last. Our rule;
 * that work follows the shade around the house: Wood Handbook, FPL-GTR-190 (2010), p. 16-20.
 * Eave, cover and horizon count: a wall is in the sun while any of it is lit; under trees when at least half of the light passes.
 * @param day calendar day in the IANA `timeZone` of the place; days on which the clock changes have 23 or 25 hours
 * @param leafOn whether trees in front carry leaves
 */
export function shadeOrder<W extends WallFace>(place: Place, walls: readonly W[], day: CalendarDay, timeZone: string, leafOn = true): ShadeOrder<W> {
  const { start, end } = boundsOf(day, timeZone);
  const count = Math.round((end - start) / minuteMs);
  const path = Array.from({ length: count }, (_, minute) => sunPosition(new Date(start + (minute + 0.5) * minuteMs), place));
  const clock = (minute: number) => {
    const at = new TZDate(start + minute * minuteMs, timeZone);
    return minute === count ? 1440 : at.getHours() * 60 + at.getMinutes();
  };
  const span = ([from, to]: [number, number]): DaySpan => ({ from: start + from * minuteMs, to: start + to * minuteMs, fromMinute: clock(from), toMinute: clock(to) });
  const first = path.findIndex(({ elevationDeg }) => elevationDeg > 0);
  const last = path.findLastIndex(({ elevationDeg }) => elevationDeg > 0);
  const shaded = walls.map((wall): WallShade<W> => {
    const litShare = litShareOf(stripsOf(wall));
    const lit = path.map((sun) => strikes(sun, wall, litShare, leafOn));
    const shade = runs(count, (minute) => minute >= first && minute <= last && !lit[minute]).map(span);
    const best = shade.reduce<DaySpan | null>((longest, one) => (longest && length(longest) >= length(one) ? longest : one), null);
    return { wall, sun: runs(count, (minute) => lit[minute] === true).map(span), shade, best };
  });
  const rank = ({ best }: WallShade<W>) => (best ? middle(best) : Infinity);
  return {
    daylight: first < 0 ? null : span([first, last + 1]),
    walls: first < 0 ? shaded : shaded.toSorted((a, b) => (rank(a) === rank(b) ? 0 : rank(a) - rank(b))),
  };
}

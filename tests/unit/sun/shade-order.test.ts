import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { addDays } from '@/lib/calendar';
import { type DaySpan, directSunHours, type Place, shadeOrder, type WallFace } from '@/lib/sun';

const hours = (spans: readonly (DaySpan | null)[]) => spans.reduce((sum, span) => sum + (span ? span.to - span.from : 0), 0) / 3_600_000;
const facing = (...azimuths: number[]) => azimuths.map((azimuthDeg) => ({ azimuthDeg }));
const of = <W extends WallFace>(order: ReturnType<typeof shadeOrder<W>>, azimuthDeg: number) => order.walls.find(({ wall }) => wall.azimuthDeg === azimuthDeg)!;

const denver: [Place, string] = [{ latitude: 40, longitude: -105 }, 'America/Denver'];
const sydney: [Place, string] = [{ latitude: -33.87, longitude: 151.21 }, 'Australia/Sydney'];
const tromso: [Place, string] = [{ latitude: 69.65, longitude: 18.96 }, 'Europe/Oslo'];

describe('against direct sun hours, counted by the year', () => {
  // Both sample the same sun, every minute here and every five there: each edge is off by at most 2.5 minutes, either way alike.
  test.each([['Denver', denver], ['Sydney', sydney], ['Tromsø', tromso]] as const)('%s: the spans of 365 days add up to the hours of the year', (_, [place, timeZone]) => {
    const building = [{ fromAzimuthDeg: 120, toAzimuthDeg: 240, elevationDeg: 25, transmittanceLeafOn: 0, transmittanceLeafOff: 0 }];
    const walls: WallFace[] = [...facing(0, 90, 180, 270, 37), { azimuthDeg: 200, horizon: building }];
    const sums = new Map(walls.map((wall) => [wall, 0]));
    for (let day = '2027-01-01'; day < '2028-01-01'; day = addDays(day, 1)) {
      for (const { wall, sun } of shadeOrder(place, walls, day, timeZone).walls) sums.set(wall, (sums.get(wall) ?? 0) + hours(sun));
    }
    for (const [wall, sum] of sums) expect(Math.abs(sum - directSunHours(place, wall, 2027).annual)).toBeLessThan(2);
  }, 30_000);
});

describe('the clock of the place', () => {
  // On the meridian of its zone the sun is due south at noon less the equation of time: −9 min on March 13–14, +16 min on November 6–7 (Astronomical Almanac, from memory). There west walls enter the sun.
  test.each([
    ['2027-03-13', 12 * 60 + 9, 24], ['2027-03-14', 13 * 60 + 9, 23], ['2027-11-06', 12 * 60 + 44, 24], ['2027-11-07', 11 * 60 + 44, 25],
  ])('on %s a west wall enters the sun at minute %d of a day of %d hours', (day, minute, long) => {
    const order = shadeOrder(denver[0], facing(270, 0), day, denver[1]);
    expect(Math.abs((of(order, 270).sun[0]?.fromMinute ?? NaN) - minute)).toBeLessThanOrEqual(1);
    const next = shadeOrder(denver[0], facing(270), addDays(day, 1), denver[1]);
    const noonToNoon = ((next.walls[0]?.sun[0]?.from ?? NaN) - (of(order, 270).sun[0]?.from ?? NaN)) / 3_600_000;
    // Noon to noon is 24 hours of time on every day; only the clock jumps.
    expect(Math.abs(noonToNoon - 24)).toBeLessThan(0.02);
    // Near the south pole the sun is up all of these days.
    expect(hours([shadeOrder({ latitude: -89, longitude: -105 }, facing(0), day, denver[1]).daylight])).toBe(long);
  });

  test('under the midnight sun a day lasts from midnight to midnight and a north wall is lit around it', () => {
    const order = shadeOrder(tromso[0], facing(0, 180), '2027-06-21', tromso[1]);
    expect(order.daylight).toMatchObject({ fromMinute: 0, toMinute: 1440 });
    expect(of(order, 0).sun).toHaveLength(2);
    expect(of(order, 0).sun[0]?.fromMinute).toBe(0);
    expect(of(order, 0).sun[1]?.toMinute).toBe(1440);
  });

  test('a day without the sun has no daylight and no order of its own', () => {
    const order = shadeOrder(tromso[0], facing(270, 90), '2027-12-21', tromso[1]);
    expect(order.daylight).toBeNull();
    expect(order.walls.map(({ wall, sun, best }) => [wall.azimuthDeg, sun.length, best])).toEqual([[270, 0, null], [90, 0, null]]);
  });
});

describe('which walls the sun strikes', () => {
  test('opposite walls share the daylight, east and west evenly at midsummer', () => {
    const order = shadeOrder({ latitude: 45, longitude: 0 }, facing(90, 270, 0, 180, 30, 210), '2027-06-21', 'UTC');
    const total = hours([order.daylight]);
    for (const [one, other] of [[90, 270], [0, 180], [30, 210]] as const) expect(hours(of(order, one).sun) + hours(of(order, other).sun)).toBeCloseTo(total, 6);
    expect(Math.abs(hours(of(order, 90).sun) - hours(of(order, 270).sun))).toBeLessThan(2 / 60);
  });

  test('in the southern hemisphere north and south change places', () => {
    const here = shadeOrder({ latitude: 40, longitude: 0 }, facing(0, 180), '2027-12-21', 'UTC');
    const there = shadeOrder({ latitude: -40, longitude: 0 }, facing(0, 180), '2027-06-21', 'UTC');
    expect(of(here, 0).sun).toEqual([]);
    expect(of(there, 180).sun).toEqual([]);
    // Winter solstices: the sun is 23.44° from the equator on both.
    expect(Math.abs(hours(of(here, 180).sun) - hours(of(there, 0).sun))).toBeLessThan(2 / 60);
  });

  test('trees are shade in leaf and not when bare; an eave as deep as the wall is high shades at noon', () => {
    const trees = { azimuthDeg: 180, horizon: [{ fromAzimuthDeg: 90, toAzimuthDeg: 270, elevationDeg: 80, transmittanceLeafOn: 0.2, transmittanceLeafOff: 0.65 }] };
    expect(shadeOrder(denver[0], [trees], '2027-04-10', denver[1], true).walls[0]?.sun).toEqual([]);
    expect(hours(shadeOrder(denver[0], [trees], '2027-04-10', denver[1], false).walls[0]?.sun ?? [])).toBeGreaterThan(8);
    const deep = shadeOrder(denver[0], [{ azimuthDeg: 180, heightM: 2.5, eaveDepthM: 2.5 }], '2027-06-21', denver[1]);
    expect(deep.walls[0]?.sun).toEqual([]);
  });
});

describe('the order', () => {
  test('in summer west comes first, north around noon, east last', () => {
    const order = shadeOrder(denver[0], facing(90, 0, 270), '2027-07-15', denver[1]).walls.map(({ wall }) => wall.azimuthDeg);
    expect(order).toEqual([270, 0, 90]);
  });

  test('a wall that the sun never leaves comes last, without a time', () => {
    const { walls } = shadeOrder(denver[0], facing(180, 90), '2027-12-21', denver[1]);
    expect(walls.at(-1)).toMatchObject({ wall: { azimuthDeg: 180 }, best: null });
  });

  test('sun and shade fill the daylight without overlap; the best time is in the shade; the order is by its middle', () => {
    const azimuth = fc.integer({ min: 0, max: 359 });
    fc.assert(
      fc.property(fc.integer({ min: -65, max: 65 }), fc.integer({ min: 0, max: 364 }), fc.array(azimuth, { minLength: 1, maxLength: 6 }), fc.double({ min: 0, max: 2, noNaN: true }), (latitude, after, azimuths, eaveDepthM) => {
        const { daylight, walls } = shadeOrder({ latitude, longitude: 0 }, azimuths.map((azimuthDeg) => ({ azimuthDeg, eaveDepthM })), addDays('2027-01-01', after), 'UTC');
        for (const { sun, shade, best } of walls) {
          expect(hours(sun) + hours(shade)).toBeCloseTo(hours([daylight]), 9);
          const all = [...sun, ...shade].sort((a, b) => a.from - b.from);
          all.forEach((span, k) => expect(span.from).toBe(k === 0 ? daylight?.from : all[k - 1]?.to));
          if (best) expect(hours([best])).toBe(Math.max(...shade.map((span) => hours([span]))));
        }
        const middles = walls.map(({ best }) => (best ? best.from + best.to : Infinity));
        expect(middles).toEqual([...middles].sort((a, b) => a - b));
      }),
      { numRuns: 60 },
    );
  });
});

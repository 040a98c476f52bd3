import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { directSunHours, leafOnMonths, type Obstruction, sunDose } from '@/lib/sun';
import { skyOverHorizon } from '@/lib/sun/sky-view';
import { directShare } from '@/lib/sun/wall-face';

const radians = Math.PI / 180;
const opaque = (fromAzimuthDeg: number, toAzimuthDeg: number, elevationDeg: number): Obstruction => ({ fromAzimuthDeg, toAzimuthDeg, elevationDeg, transmittanceLeafOn: 0, transmittanceLeafOff: 0 });

/** The definition, added up patch by patch: what passes, weighted by cos(incidence) over the solid angle of each half degree of azimuth and elevation. */
function addedUp(azimuthDeg: number, horizon: Obstruction[], leafOn: boolean): number {
  const step = 0.5;
  let open = 0;
  let all = 0;
  for (let az = -90 + step / 2; az < 90; az += step) {
    for (let el = step / 2; el < 90; el += step) {
      const weight = Math.cos(el * radians) ** 2 * Math.cos(az * radians);
      all += weight;
      open += weight * directShare(horizon, leafOn, azimuthDeg + az, el);
    }
  }
  return open / all;
}

const part = fc.record({
  fromAzimuthDeg: fc.integer({ min: 0, max: 359 }),
  toAzimuthDeg: fc.integer({ min: 0, max: 359 }),
  elevationDeg: fc.integer({ min: 0, max: 90 }),
  transmittanceLeafOn: fc.constantFrom(0, 0.2, 0.5, 1),
  transmittanceLeafOff: fc.constantFrom(0, 0.3, 0.7, 1),
});

describe('sky over a horizon', () => {
  // Edges are whole degrees, so patches never straddle one; what is left is the midpoint rule's error.
  test('equals the integral of its definition, also where obstructions overlap', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 359 }), fc.array(part, { maxLength: 3 }), fc.boolean(), (azimuthDeg, horizon, leafOn) => {
        expect(Math.abs(skyOverHorizon({ azimuthDeg, horizon }, leafOn) - addedUp(azimuthDeg, horizon, leafOn))).toBeLessThan(0.0005);
      }),
      { numRuns: 100 },
    );
  });

  // View factor of an infinite opposite wall whose top stands at e: (1 − sin e)/2, radiation textbooks; a ring of horizon hides more to the sides.
  test('a ring of 30° leaves less than an endless wall whose top is at 30° straight ahead, and half the ring hides half', () => {
    const ring = skyOverHorizon({ azimuthDeg: 77, horizon: [opaque(0, 0, 30)] }, true);
    expect(ring).toBeLessThan(1 - Math.sin(30 * radians));
    expect(skyOverHorizon({ azimuthDeg: 77, horizon: [opaque(77, 257, 30)] }, true)).toBeCloseTo((1 + ring) / 2, 9);
  });

  test('what stands behind the wall hides nothing, of sky or sun', () => {
    const horizon = [opaque(300, 60, 60)];
    expect(skyOverHorizon({ azimuthDeg: 180, horizon }, true)).toBe(1);
    const ghi = [1.6, 2.5, 3.9, 4.9, 5.8, 6.5, 6.9, 5.9, 4.5, 2.9, 1.8, 1.4];
    const place = { latitude: 45.68, longitude: -111.04 };
    expect(sunDose(place, { azimuthDeg: 180, horizon }, ghi).annual).toBeCloseTo(sunDose(place, { azimuthDeg: 180 }, ghi).annual, 9);
  });

  test('leaves in front darken a wall; glass that passes all does not', () => {
    const tree = { ...opaque(120, 240, 50), transmittanceLeafOn: 0.2, transmittanceLeafOff: 0.7 };
    expect(skyOverHorizon({ azimuthDeg: 180, horizon: [tree] }, true)).toBeLessThan(skyOverHorizon({ azimuthDeg: 180, horizon: [tree] }, false));
    expect(skyOverHorizon({ azimuthDeg: 180, horizon: [{ ...tree, transmittanceLeafOn: 1 }] }, true)).toBe(1);
  });
});

describe('months with leaves (our rule)', () => {
  const months = (on: boolean[]) => on.flatMap((one, index) => (one ? [index + 1] : []));

  test('by temperature where it is known, else by hemisphere', () => {
    expect(months(leafOnMonths(45, [-5, 0, 5, 9.9, 10, 15, 20, 18, 12, 8, 2, -4]))).toEqual([5, 6, 7, 8, 9]);
    expect(months(leafOnMonths(45))).toEqual([5, 6, 7, 8, 9, 10]);
    expect(months(leafOnMonths(-33))).toEqual([1, 2, 3, 4, 11, 12]);
  });

  test('hours and dose use them without being told: bare trees let winter sun through', () => {
    const tree = { ...opaque(0, 0, 89), transmittanceLeafOn: 0, transmittanceLeafOff: 1 };
    const wall = { azimuthDeg: 180, horizon: [tree] };
    const north = { latitude: 45, longitude: 0 };
    const { monthly } = directSunHours(north, wall, 2027);
    const open = directSunHours(north, { azimuthDeg: 180 }, 2027).monthly;
    monthly.forEach((hours, month) => expect(hours).toBeCloseTo(month >= 4 && month <= 9 ? 0 : (open[month] ?? NaN), 9));
    const dose = sunDose(north, wall, new Array<number>(12).fill(4)).monthly;
    expect(dose[5]).toBeLessThan((dose[0] ?? NaN) / 2);
    expect(directSunHours({ latitude: -45, longitude: 0 }, wall, 2027).monthly[0]).toBe(0);
  });
});

describe('albedo', () => {
  // Ground light on a vertical wall is half of albedo × horizontal, an even ground seen under half of the view: 0.5 × 0.4 × 3 kWh/m² × 31 days more in a snowy January.
  test('month by month: snow in January adds its half of the reflected light and nothing elsewhere', () => {
    const ghi = new Array<number>(12).fill(3);
    const place = { latitude: 45, longitude: -100 };
    const bare = sunDose(place, { azimuthDeg: 0 }, ghi).monthly;
    const snow = sunDose(place, { azimuthDeg: 0 }, ghi, { albedo: [0.6, ...new Array<number>(11).fill(0.2)] }).monthly;
    expect((snow[0] ?? NaN) - (bare[0] ?? NaN)).toBeCloseTo(0.5 * 0.4 * 3 * 31, 9);
    expect(snow.slice(1)).toEqual(bare.slice(1));
  });
});

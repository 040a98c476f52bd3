import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { stations } from '@/lib/climate';
import { directSunHoursOn, shadeOrder, sunDose, sunPath, stripsOf, type WallFace } from '@/lib/sun';
import { litShareOf, skyShareOf } from '@/lib/sun/strips';

const station = fc.constantFrom(...stations.filter(({ latitude }) => latitude > 24 && latitude < 49.5));
const litShare = (strips: ReturnType<typeof stripsOf>, tanProfile: number) => litShareOf(strips)(tanProfile);
const metres = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const share = fc.double({ min: 0, max: 1, noNaN: true });
const bare = fc.record({ azimuthDeg: fc.integer({ min: 0, max: 359 }), heightM: metres(1.5, 8), eaveDepthM: fc.oneof(fc.constant(0), metres(0.05, 2)), eaveDropM: metres(0, 1) });
const cover = fc.record({ depthM: metres(0.3, 5), heightM: metres(0.5, 9), share });

const path = sunPath({ latitude: 45.68, longitude: -111.04 }, 2026);
const hours = (wall: WallFace) => directSunHoursOn(path, wall).annual;
const dose = (at: (typeof stations)[number], wall: WallFace) => sunDose(at, wall, at.ghiKwhM2Day).annual;

describe('a porch roof or a deck above', () => {
  test('at a profile angle of 45°, worked by hand', () => {
    // 2.4 m of wall under a 0.3 m eave; over half of it a roof 1 m deep at 2 m. Beside the roof 2.1 of 2.4 m are lit; under it the lower
    // 1.0 of 2 m; above it the eave shades 0.3 of 0.4 m. (2.1 + 1.0 + 0.1) / 4.8 = 2/3.
    const strips = stripsOf({ azimuthDeg: 180, heightM: 2.4, eaveDepthM: 0.3, cover: { depthM: 1, heightM: 2, share: 0.5 } });
    expect(strips.map((strip) => strip.share)).toEqual([0.5, expect.closeTo(5 / 12, 12), expect.closeTo(1 / 12, 12)]);
    expect(litShare(strips, 1)).toBeCloseTo(2 / 3, 12);
    // Sky under a roof as deep as the strip is high: √2 − 1 of it.
    expect(skyShareOf(stripsOf({ azimuthDeg: 180, heightM: 2, cover: { depthM: 2, heightM: 2, share: 1 } }))).toBeCloseTo(Math.SQRT2 - 1, 12);
  });

  test('a noon sun of 50° at the equinox (latitude 40°) leaves the strip under a porch roof 2 m deep at 2 m dark', () => {
    // tan 50° = 1.19175: the porch roof's shadow is 2.38 m long, so its strip of 2 of 2.5 m is dark: 1 − 0.25 × 2 / 2.5 = 0.8.
    // At 20° (tan 0.36397): shadow 0.72794 m of 2 m; 1 − 0.25 × 0.72794 / 2.5 = 0.92721.
    const strips = stripsOf({ azimuthDeg: 180, heightM: 2.5, cover: { depthM: 2, heightM: 2, share: 0.25 } });
    expect(litShare(strips, 1.19175)).toBeCloseTo(0.8, 12);
    expect(litShare(strips, 0.36397)).toBeCloseTo(0.92721, 5);
  });

  test('lights what a ray from each point of the wall can leave by', () => {
    const points = 4000;
    fc.assert(fc.property(bare, cover, metres(0.01, 6), (wall, over, tan) => {
      const blocked = (z: number, depth: number, underside: number) => underside > z && (underside - z) / tan < depth;
      const free = (z: number, covered: boolean) => !blocked(z, wall.eaveDepthM, wall.heightM + wall.eaveDropM) && !(covered && blocked(z, over.depthM, over.heightM));
      const lit = (covered: boolean) => Array.from({ length: points }, (_, k) => free(((k + 0.5) * wall.heightM) / points, covered)).filter(Boolean).length / points;
      const rays = (1 - over.share) * lit(false) + over.share * lit(true);
      // A border of sun and shade falls between two points: three borders, each within half a point's distance.
      expect(Math.abs(litShare(stripsOf({ ...wall, cover: over }), tan) - rays)).toBeLessThan(2 / points);
    }), { numRuns: 150 });
  });

  test('sees the sky that each point under it sees, where there is no eave', () => {
    fc.assert(fc.property(metres(1.5, 6), cover, (heightM, over) => {
      // From a point u below an endless edge d out, the sky between the ground's level and that edge counts u / √(u² + d²).
      const points = 2000;
      const seen = Array.from({ length: points }, (_, k) => {
        const u = over.heightM - ((k + 0.5) * heightM) / points;
        return u > 0 ? u / Math.hypot(u, over.depthM) : 1;
      }).reduce((sum, one) => sum + one / points, 0);
      expect(Math.abs(skyShareOf(stripsOf({ azimuthDeg: 0, heightM, cover: over })) - (1 - over.share + over.share * seen))).toBeLessThan(1e-3);
    }), { numRuns: 150 });
  });
});

describe('a cover and the year', () => {
  test('never raises hours or dose, and a deeper or wider one, or one brought down to the wall’s top, never raises the dose', () => {
    fc.assert(fc.property(station, bare, cover, metres(0, 2), metres(0.5, 1), share, (at, wall, over, deeper, lower, wider) => {
      const covered = dose(at, { ...wall, cover: over });
      expect(covered).toBeLessThanOrEqual(dose(at, wall) + 1e-9);
      expect(dose(at, { ...wall, cover: { ...over, depthM: over.depthM + deeper } })).toBeLessThanOrEqual(covered + 1e-9);
      expect(dose(at, { ...wall, cover: { ...over, share: over.share + (1 - over.share) * wider } })).toBeLessThanOrEqual(covered + 1e-9);
      if (over.heightM > wall.heightM) expect(dose(at, { ...wall, cover: { ...over, heightM: wall.heightM + (over.heightM - wall.heightM) * lower } })).toBeLessThanOrEqual(covered + 1e-9);
    }));
    fc.assert(fc.property(bare, cover, (wall, over) => {
      expect(hours({ ...wall, cover: over })).toBeLessThanOrEqual(hours(wall) + 1e-9);
    }), { numRuns: 20 });
  });

  test('a cover of no depth, over no width or at no height changes nothing, to the last digit', () => {
    fc.assert(fc.property(station, bare, cover, fc.constantFrom('depthM', 'heightM', 'share'), (at, wall, over, none) => {
      const nothing = { ...wall, cover: { ...over, [none]: 0 } };
      expect(dose(at, nothing)).toBe(dose(at, wall));
      expect(dose(at, { ...wall, cover: undefined })).toBe(dose(at, wall));
      expect(stripsOf(nothing)).toEqual(stripsOf(wall));
    }));
  });

  test('at the top of a wall without an eave, over all of it, it is an eave of that depth', () => {
    fc.assert(fc.property(station, fc.integer({ min: 0, max: 359 }), metres(1.5, 8), metres(0.1, 4), (at, azimuthDeg, heightM, depthM) => {
      const porch = { azimuthDeg, heightM, cover: { depthM, heightM, share: 1 } };
      const eave = { azimuthDeg, heightM, eaveDepthM: depthM, eaveDropM: 0 };
      expect(dose(at, porch)).toBeCloseTo(dose(at, eave), 9);
      expect(litShare(stripsOf(porch), 1.3)).toBeCloseTo(litShare(stripsOf(eave), 1.3), 12);
    }));
    const [porch, eave] = [{ azimuthDeg: 200, heightM: 2.5, cover: { depthM: 2, heightM: 2.5, share: 1 } }, { azimuthDeg: 200, heightM: 2.5, eaveDepthM: 2, eaveDropM: 0 }];
    expect(hours(porch)).toBeCloseTo(hours(eave), 9);
  });

  test('the dose is linear in the share of the width, between open and all covered', () => {
    fc.assert(fc.property(station, bare, cover, (at, wall, over) => {
      const [open, all, part] = [wall, { ...wall, cover: { ...over, share: 1 } }, { ...wall, cover: over }].map((one) => dose(at, one)) as [number, number, number];
      expect(part).toBeCloseTo((1 - over.share) * open + over.share * all, 8);
    }));
  });

  test('a wall wholly under a deep porch roof is out of the high sun, and one with any open part is not', () => {
    const place = { latitude: 45.68, longitude: -111.04 };
    const over = { depthM: 3, heightM: 2.5, share: 1 };
    const walls = [{ azimuthDeg: 180, heightM: 2.5 }, { azimuthDeg: 180, heightM: 2.5, cover: over }, { azimuthDeg: 180, heightM: 2.5, cover: { ...over, share: 0.5 } }];
    const inSun = new Map(shadeOrder(place, walls, '2026-06-21', 'America/Denver').walls.map(({ wall, sun }) => [wall, sun.reduce((sum, span) => sum + span.to - span.from, 0)]));
    const [open, covered, half] = walls.map((wall) => inSun.get(wall) ?? NaN) as [number, number, number];
    expect(covered).toBeLessThan(open / 2);
    expect(half).toBe(open);
  });
});

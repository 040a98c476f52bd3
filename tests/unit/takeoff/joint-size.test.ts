import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { backerRod, beadDepthM, leastJointM, otherDepthM } from '@/lib/takeoff/joint-size';
import { inchesToMetres, metresToInches } from '@/lib/units';

const width = fc.double({ min: 0.25, max: 1, noNaN: true }).map(inchesToMetres);

describe('size of a joint', () => {
  // Construction Waterproofing Handbook, 2nd ed. (2008), p. 5.6; the other column: Handbook of Adhesives and Sealants, p. 119.
  test.each([
    [0.25, 0.25, 0.25],
    [0.375, 0.375, 0.375],
    [0.5, 0.5, 0.5],
    [0.75, 0.375, 0.5],
    [1, 0.5, 0.5],
  ])('%d in wide: %d in deep, by the other handbook %d in', (wide, deep, other) => {
    expect(metresToInches(beadDepthM(inchesToMetres(wide)))).toBeCloseTo(deep, 9);
    expect(metresToInches(otherDepthM(inchesToMetres(wide)))).toBeCloseTo(other, 9);
  });

  test.each([[0.25, 0.375], [0.375, 0.5], [0.5, 0.625], [0.75, 1], [1, 1.25]])('%d in wide: rod of %d in', (wide, rod) => {
    expect(metresToInches(backerRod(inchesToMetres(wide)).diameterM)).toBeCloseTo(rod, 9);
  });

  test('never shallower than 1/4 in nor deeper than wide; the rod is at least a quarter wider', () => {
    fc.assert(fc.property(width, (wide) => {
      expect(beadDepthM(wide)).toBeGreaterThanOrEqual(leastJointM - 1e-9);
      expect(beadDepthM(wide)).toBeLessThanOrEqual(wide + 1e-9);
      expect(backerRod(wide).diameterM).toBeGreaterThanOrEqual(1.25 * wide - 1e-6);
    }));
  });

  test('out of range is refused', () => {
    expect(() => beadDepthM(inchesToMetres(0.2))).toThrow(RangeError);
    expect(() => backerRod(inchesToMetres(1.1))).toThrow(RangeError);
  });
});

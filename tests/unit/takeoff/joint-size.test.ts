import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { backerRod, beadDepthM, leastJointM } from '@/lib/takeoff/joint-size';
import { inchesToMetres } from '@/lib/units';

const width = fc.double({ min: 0.25, max: 1, noNaN: true }).map(inchesToMetres);

describe('size of a joint', () => {
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

import { describe, expect, test } from 'vitest';
import { beadDepthM, otherDepthM } from '@/lib/takeoff/joint-size';
import { inchesToMetres, metresToInches } from '@/lib/units';

describe('depth of a bead', () => {
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
});

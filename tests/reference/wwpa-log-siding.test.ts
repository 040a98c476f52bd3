import { describe, expect, test } from 'vitest';
import { courseCount, sidingProfile, sidingProfiles } from '@/lib/takeoff';

/** WWPA, Natural Wood Siding technical guide, table 4: nominal, dressed and exposed width, in, and feet of board to a square foot of wall, to two digits. */
const table = [
  [6, 5.4375, 4.9375, 2.43],
  [8, 7.125, 6.625, 1.81],
  [10, 9.125, 8.625, 1.39],
] as const;

describe('log cabin siding, WWPA table 4', () => {
  test('has these three sizes', () => expect(sidingProfiles.map(({ nominalIn }) => nominalIn)).toEqual(table.map(([nominal]) => nominal)));

  test.each(table)('nominal %d in: dressed %d, exposed %d, %d ft of board to the square foot', (nominalIn, dressedIn, exposedFaceIn, boardFt) => {
    expect(sidingProfile(nominalIn)).toEqual({ nominalIn, dressedIn, exposedFaceIn });
    expect(Math.abs(12 / (sidingProfile(nominalIn)?.exposedFaceIn ?? NaN) - boardFt)).toBeLessThan(0.006);
  });

  test('17 courses of nominal 8 in on a wall of 9 ft', () => {
    expect(courseCount(9 * 12, sidingProfile(8)?.exposedFaceIn ?? NaN)).toBe(17);
  });
});

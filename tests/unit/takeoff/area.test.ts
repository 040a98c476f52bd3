import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { wallAreaFt2, wallAreaM2 } from '@/lib/takeoff';

const size = (max: number) => fc.double({ min: 0, max, noNaN: true });
const wall = fc.record({ widthM: size(40), heightM: size(12), gableHeightM: size(8), openings: fc.array(fc.record({ widthM: size(3), heightM: size(3), count: fc.integer({ min: 0, max: 4 }) }), { maxLength: 4 }) });

describe('area of a wall', () => {
  // Plane geometry: a rectangle of 10 × 3 under a triangle of base 10 and height 2.
  test('a gable is half of its rectangle', () => expect(wallAreaM2({ widthM: 10, heightM: 3, gableHeightM: 2 })).toBe(40));

  test('never below zero, and an opening never adds', () => {
    fc.assert(
      fc.property(wall, (one) => {
        expect(wallAreaM2(one)).toBeGreaterThanOrEqual(0);
        expect(wallAreaM2(one)).toBeLessThanOrEqual(wallAreaM2({ ...one, openings: [] }));
      }),
    );
  });

  test('twice the lengths, four times the area', () => {
    fc.assert(
      fc.property(wall, ({ openings, ...one }) => {
        const twice = { widthM: 2 * one.widthM, heightM: 2 * one.heightM, gableHeightM: 2 * one.gableHeightM, openings: openings.map(({ widthM, heightM, count }) => ({ widthM: 2 * widthM, heightM: 2 * heightM, count })) };
        expect(wallAreaM2(twice)).toBeCloseTo(4 * wallAreaM2({ ...one, openings }), 6);
      }),
    );
  });

  test('the same numbers give the same area in either unit', () => {
    fc.assert(
      fc.property(wall, ({ openings, widthM, heightM, gableHeightM }) => {
        const feet = { widthFt: widthM, heightFt: heightM, gableHeightFt: gableHeightM, openings: openings.map((one) => ({ widthFt: one.widthM, heightFt: one.heightM, count: one.count })) };
        expect(wallAreaFt2(feet)).toBeCloseTo(wallAreaM2({ widthM, heightM, gableHeightM, openings }), 6);
      }),
    );
  });

  test.each([{ widthM: -1, heightM: 3 }, { widthM: NaN, heightM: 3 }, { widthM: 3, heightM: Infinity }, { widthM: 3, heightM: 3, openings: [{ widthM: 1, heightM: -1 }] }])('%o is refused', (one) => {
    expect(() => wallAreaM2(one)).toThrow(RangeError);
  });
});

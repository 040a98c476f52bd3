import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { jointLengthM, jointsOfWall, jointsOfWalls, type JointWall } from '@/lib/takeoff/joints';
import { feetToMetres, inchesToMetres, metresToFeet } from '@/lib/units';

const rule = { exposedFaceM: inchesToMetres(6.625), boardM: feetToMetres(16) };
const feet = (wall: JointWall) => Object.fromEntries(jointsOfWall(wall, rule).map(({ kind, lengthM }) => [kind, metresToFeet(lengthM)]));
const front: JointWall = {
  widthM: feetToMetres(30),
  heightM: feetToMetres(9),
  openings: [{ widthM: feetToMetres(3), heightM: feetToMetres(4), count: 3 }],
  penetrations: { count: 4, perimeterM: feetToMetres(1) },
};

const size = fc.double({ min: 0, max: 30, noNaN: true });
const opening = fc.record({ widthM: size, heightM: size, count: fc.integer({ min: 1, max: 5 }) });
const wall: fc.Arbitrary<JointWall> = fc.record({ widthM: size, heightM: size, gableHeightM: size, openings: fc.array(opening, { maxLength: 4 }), corners: fc.integer({ min: 0, max: 2 }) });

describe('joints that take caulk', () => {
  // By hand: 3 × 2 × (3 + 4) = 42; two corners, two lines each, half of them: 18; 108 in ÷ 6.625 in is 17 courses, 30 ft are two boards: 17 × 6.625 in = 9.385 ft; 4 × 1.
  test('a wall of 30 × 9 ft with three windows and four pipes', () => {
    const { openings, corners, butts, penetrations } = feet(front);
    expect([openings, corners, penetrations].map((length) => Number(length?.toFixed(9)))).toEqual([42, 18, 4]);
    expect(butts).toBeCloseTo((17 * 6.625) / 12, 9);
    expect(metresToFeet(jointLengthM(jointsOfWall(front, rule)))).toBeCloseTo(73.385, 3);
  });

  test('a gable of 34 ft by 6 ft: 11 courses of its mean width, 17 ft, with one joint each', () => {
    const flat = feet({ widthM: feetToMetres(34), heightM: feetToMetres(9) });
    const gabled = feet({ widthM: feetToMetres(34), heightM: feetToMetres(9), gableHeightM: feetToMetres(6) });
    expect((gabled.butts ?? 0) - (flat.butts ?? 0)).toBeCloseTo((11 * 6.625) / 12, 9);
  });

  test('four walls have four corners of two lines', () => {
    const plain = { widthM: 5, heightM: 3 };
    expect(jointsOfWalls([plain, plain, plain, plain], rule).find(({ kind }) => kind === 'corners')?.lengthM).toBeCloseTo(4 * 2 * 3, 9);
  });

  test('one more opening never shortens them', () => {
    fc.assert(fc.property(wall, opening, (one, more) => {
      const before = jointLengthM(jointsOfWall(one, rule));
      expect(jointLengthM(jointsOfWall({ ...one, openings: [...(one.openings ?? []), more] }, rule))).toBeGreaterThanOrEqual(before - 1e-9);
    }));
  });

  test('the joints of several walls are those of each, added up', () => {
    fc.assert(fc.property(fc.array(wall, { maxLength: 5 }), (walls) => {
      const apart = walls.reduce((sum, one) => sum + jointLengthM(jointsOfWall(one, rule)), 0);
      expect(jointLengthM(jointsOfWalls(walls, rule))).toBeCloseTo(apart, 6);
    }));
  });

  test('a board without length or a size below 0 is refused', () => {
    expect(() => jointsOfWall(front, { ...rule, boardM: 0 })).toThrow(RangeError);
    expect(() => jointsOfWall({ ...front, heightM: -1 }, rule)).toThrow(RangeError);
  });
});

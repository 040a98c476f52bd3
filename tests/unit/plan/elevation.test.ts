import fc from 'fast-check';
import { expect, it } from 'vitest';
import { courseLines, placeOpenings } from '@/lib/plan/elevation';
import { inset, labelsFit } from '@/lib/plan/labels';

it('keeps every opening on the wall and apart from the next', () => {
  const size = fc.double({ min: 0.3, max: 3, noNaN: true });
  const kind = fc.record({ kind: fc.constantFrom('window' as const, 'door' as const), widthM: size, heightM: size, count: fc.integer({ min: 1, max: 6 }) });
  fc.assert(
    fc.property(fc.double({ min: 1, max: 20, noNaN: true }), fc.double({ min: 1.5, max: 6, noNaN: true }), fc.array(kind, { maxLength: 4 }), (widthM, heightM, openings) => {
      const placed = placeOpenings({ widthM, heightM }, openings);
      expect(placed).toHaveLength(openings.reduce((sum, one) => sum + one.count, 0));
      placed.forEach((one, i) => {
        expect(one.x).toBeGreaterThanOrEqual(-1e-9);
        expect(one.x + one.widthM).toBeLessThanOrEqual((placed[i + 1]?.x ?? widthM) + 1e-9);
        expect(one.y).toBeGreaterThanOrEqual(0);
        expect(one.y + one.heightM).toBeLessThanOrEqual(heightM + 1e-9);
      });
    }),
  );
});

it('puts the door in the middle of its windows', () => {
  const placed = placeOpenings({ widthM: 10, heightM: 3 }, [{ kind: 'door', widthM: 1, heightM: 2, count: 1 }, { kind: 'window', widthM: 1, heightM: 1, count: 2 }]);
  expect(placed.map((one) => one.kind)).toEqual(['window', 'door', 'window']);
  expect(placed[1]!.x + 0.5).toBeCloseTo(5);
});

it('has one line fewer than courses: 9 ft at 6.625 in exposed are 17 courses', () => {
  expect(courseLines(9 * 12, 6.625)).toHaveLength(16);
});

const square = [{ x: 0, y: 0 }, { x: 100, y: 0 }, { x: 100, y: 100 }, { x: 0, y: 100 }];

it('refuses labels that leave the outline or cover each other', () => {
  const box = (x: number, y: number) => ({ x, y, width: 30, height: 20 });
  expect(labelsFit([box(30, 30), box(70, 70)], square)).toBe(true);
  expect(labelsFit([box(30, 30), box(50, 35)], square)).toBe(false);
  expect(labelsFit([box(5, 50)], square)).toBe(false);
  expect(labelsFit([box(5, 50)], undefined)).toBe(true);
});

it('clears a wall by the half of the box that points at it', () => {
  expect(inset({ width: 30, height: 20 }, { x: 0, y: 1 }, 4)).toBe(14);
  expect(inset({ width: 30, height: 20 }, { x: -1, y: 0 }, 4)).toBe(19);
});

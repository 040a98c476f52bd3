import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { eaveLine } from '@/lib/plan/eave-line';
import { doseClass } from '@/lib/plan/dose-class';
import { heading, outline, type PlanWall } from '@/lib/plan/outline';
import { area, isInside } from '@/lib/plan/polygon';

const walls = (...list: [azimuthDeg: number, widthM: number][]): PlanWall[] => list.map(([azimuthDeg, widthM], i) => ({ id: `w${i}`, azimuthDeg, widthM }));
const corners = (list: PlanWall[]) => outline(list).edges.map((edge) => edge.from);
const length = (edge: { from: { x: number; y: number }; to: { x: number; y: number } }) => Math.hypot(edge.to.x - edge.from.x, edge.to.y - edge.from.y);

describe('outline', () => {
  it('puts four walls at right angles into a rectangle: each wall on the side that it faces', () => {
    const plan = outline(walls([180, 12], [270, 8], [0, 12], [90, 8]));
    expect(plan.closed).toBe(true);
    const [south, west, north, east] = plan.edges;
    expect([south?.from.y, south?.to.y]).toEqual([expect.closeTo(-4), expect.closeTo(-4)]);
    expect([west?.from.x, west?.to.x]).toEqual([expect.closeTo(-6), expect.closeTo(-6)]);
    expect(north?.from.y).toBeCloseTo(4);
    expect(east?.from.x).toBeCloseTo(6);
  });

  it('works with the plan order running the other way around the house', () => {
    const plan = outline(walls([180, 12], [90, 8], [0, 12], [270, 8]));
    expect(plan.closed).toBe(true);
    expect(plan.edges[0]?.from.y).toBeCloseTo(-4);
    expect(plan.edges[1]?.from.x).toBeCloseTo(6);
  });

  it('lays out an L of six walls: its area is the rectangle less the notch', () => {
    const plan = corners(walls([180, 10], [270, 8], [0, 4], [90, 3], [0, 6], [90, 5]));
    expect(Math.abs(area(plan))).toBeCloseTo(10 * 8 - 6 * 3);
  });

  it('closes a gap of badly measured walls by changing widths only', () => {
    const plan = outline(walls([180, 12], [270, 8], [0, 11], [90, 8.4]));
    expect(plan.closed).toBe(true);
    expect(length(plan.edges[0]!)).toBeCloseTo(length(plan.edges[2]!));
    expect(length(plan.edges[0]!)).toBeGreaterThan(11);
    expect(length(plan.edges[0]!)).toBeLessThan(12);
  });

  it.each([
    ['no wall', walls()],
    ['one wall', walls([200, 9])],
    ['two opposite walls', walls([0, 9], [180, 9])],
    ['walls in an order that crosses', walls([0, 9], [180, 9], [90, 9], [270, 9])],
    ['three walls of a rectangle', walls([180, 12], [270, 8], [0, 12])],
  ])('draws the walls apart, each on its own side: %s', (_what, list) => {
    const plan = outline(list);
    expect(plan.closed).toBe(false);
    expect(plan.edges).toHaveLength(list.length);
    plan.edges.forEach((edge, i) => expect(length(edge)).toBeCloseTo(list[i]!.widthM));
  });

  it('keeps every direction, meets end to end and faces outward, for any convex house', () => {
    const house = fc.array(fc.record({ turn: fc.integer({ min: 20, max: 100 }), width: fc.integer({ min: 8, max: 10 }) }), { minLength: 3, maxLength: 8 });
    fc.assert(
      fc.property(house, fc.integer({ min: 0, max: 359 }), (turns, start) => {
        const total = turns.reduce((sum, one) => sum + one.turn, 0);
        let azimuth = start;
        const list = turns.map(({ turn, width }, i) => ({ id: `w${i}`, azimuthDeg: (azimuth += (turn * 360) / total) % 360, widthM: width }));
        const plan = outline(list);
        fc.pre(plan.closed);
        const ring = plan.edges.map((edge) => edge.from);
        plan.edges.forEach((edge, i) => {
          const next = plan.edges[(i + 1) % plan.edges.length]!;
          expect(Math.hypot(edge.to.x - next.from.x, edge.to.y - next.from.y)).toBeLessThan(1e-6);
          const u = heading(list[i]!.azimuthDeg + 90);
          expect((u.x * (edge.to.x - edge.from.x) + u.y * (edge.to.y - edge.from.y)) / length(edge)).toBeCloseTo(1);
          const middle = { x: (edge.from.x + edge.to.x) / 2, y: (edge.from.y + edge.to.y) / 2 };
          expect(isInside({ x: middle.x - edge.outward.x * 1e-3, y: middle.y - edge.outward.y * 1e-3 }, ring)).toBe(true);
          expect(isInside({ x: middle.x + edge.outward.x * 1e-3, y: middle.y + edge.outward.y * 1e-3 }, ring)).toBe(false);
        });
      }),
    );
  });
});

describe('eaveLine', () => {
  it('runs around a rectangle at the depth of each wall', () => {
    const plan = outline(walls([180, 12], [270, 8], [0, 12], [90, 8]));
    const line = eaveLine(plan.edges, [1, 0.5, 1, 0.5]);
    expect(Math.abs(area(line))).toBeCloseTo((12 + 2 * 0.5) * (8 + 2 * 1));
  });

  it('keeps the step between two walls in one line', () => {
    const plan = outline(walls([180, 6], [180, 6], [270, 8], [0, 12], [90, 8]));
    expect(eaveLine(plan.edges, [1, 0, 0, 0, 0])).toHaveLength(6);
  });
});

describe('doseClass', () => {
  it('has five equal steps from 250 to 1350 kWh/m² and takes the ends beyond', () => {
    expect([0, 250, 469, 470, 689, 690, 910, 1129, 1130, 1350, 2000].map(doseClass)).toEqual([1, 1, 1, 2, 2, 3, 4, 4, 5, 5, 5]);
  });
});

import { area, isSimple, type Point } from '@/lib/plan/polygon';

/** One wall as the plan needs it, in plan order. Azimuth of the outward normal, degrees clockwise from true north; width in m. */
export type PlanWall = { id: string; azimuthDeg: number; widthM: number };

/** One wall on the plan. x to the east, y to the north, m; `outward` is a unit vector. */
export type PlanEdge = { id: string; from: Point; to: Point; outward: Point };

/** `closed`: the edges meet end to end in plan order. Otherwise each stands for itself around a middle. */
export type Outline = { closed: boolean; edges: PlanEdge[] };

/** Unit vector of a direction. North is (0, 1), east (1, 0). */
export function heading(azimuthDeg: number): Point {
  const radians = (azimuthDeg * Math.PI) / 180;
  return { x: Math.sin(radians), y: Math.cos(radians) };
}

/** A turn in degrees brought to −180 (exclusive) … 180. */
const turn = (degrees: number) => {
  const positive = ((degrees % 360) + 360) % 360;
  return positive > 180 ? positive - 360 : positive;
};

/**
 * The outline of a house seen from above, from wall directions and widths alone. Our rule:
 *
 * 1. Walking clockwise around a house one goes along a wall in the direction azimuth + 90°; walking the other way,
 *    azimuth − 90°. The sum of the turns from wall to wall tells which way the plan order runs.
 * 2. The walls are laid end to end. Where measured widths leave a gap g, the widths are changed as little as possible
 *    and the directions not at all: δ_i = w_i (λ·u_i) with (Σ w_i u_i u_iᵀ) λ = −g, the least Σ δ_i²/w_i.
 * 3. If that would change a width by more than half, or the result crosses itself (a wrong order, too few walls),
 *    the walls are drawn apart, each at its own side of a middle.
 *
 * Example: widths 12, 8, 12, 8 m at 180°, 270°, 0°, 90° give a rectangle of 12 m by 8 m.
 */
export function outline(walls: readonly PlanWall[]): Outline {
  const around = walls.reduce((sum, wall, i) => sum + turn((walls[(i + 1) % walls.length]?.azimuthDeg ?? 0) - wall.azimuthDeg), 0);
  const along = walls.map((wall) => heading(wall.azimuthDeg + (around < 0 ? -90 : 90)));
  const widths = closingWidths(walls.map((wall) => wall.widthM), along);
  if (walls.length < 3 || !widths) return apart(walls);
  const corners = layEndToEnd(widths, along);
  if (!isSimple(corners) || Math.abs(area(corners)) < 0.05 * Math.max(...widths) ** 2) return apart(walls);
  const edges = walls.map((wall, i) => edge(wall, corners[i], corners[(i + 1) % corners.length]));
  return { closed: true, edges: centred(edges) };
}

const origin: Point = { x: 0, y: 0 };

const edge = (wall: PlanWall, from: Point = origin, to: Point = origin): PlanEdge => ({ id: wall.id, from, to, outward: heading(wall.azimuthDeg) });

function layEndToEnd(widths: readonly number[], along: readonly Point[]): Point[] {
  const corners: Point[] = [];
  let at = origin;
  widths.forEach((width, i) => {
    corners.push(at);
    const u = along[i] ?? origin;
    at = { x: at.x + u.x * width, y: at.y + u.y * width };
  });
  return corners;
}

/** Widths that close the outline; undefined when no small change does. */
function closingWidths(widths: readonly number[], along: readonly Point[]): number[] | undefined {
  let [xx, xy, yy, gapX, gapY] = [0, 0, 0, 0, 0];
  widths.forEach((w, i) => {
    const u = along[i] ?? origin;
    xx += w * u.x * u.x;
    xy += w * u.x * u.y;
    yy += w * u.y * u.y;
    gapX += w * u.x;
    gapY += w * u.y;
  });
  const determinant = xx * yy - xy * xy;
  if (determinant < 1e-9) return undefined;
  const lambda = { x: (-gapX * yy + gapY * xy) / determinant, y: (-gapY * xx + gapX * xy) / determinant };
  const share = along.map((u) => lambda.x * u.x + lambda.y * u.y);
  return share.every((s) => Math.abs(s) <= 0.5) ? widths.map((w, i) => w * (1 + (share[i] ?? 0))) : undefined;
}

/** Walls that make no closed outline: at a common distance from the middle; walls facing the same way stand side by side. */
function apart(walls: readonly PlanWall[]): Outline {
  const distance = Math.max(1, ...walls.map((wall) => wall.widthM)) * 0.55;
  const edges = walls.map((wall, i) => {
    const same = (other: PlanWall) => Math.abs(turn(other.azimuthDeg - wall.azimuthDeg)) < 1;
    const total = walls.filter(same).reduce((sum, other) => sum + other.widthM, 0);
    const before = walls.slice(0, i).filter(same).reduce((sum, other) => sum + other.widthM, 0);
    const out = heading(wall.azimuthDeg);
    const u = heading(wall.azimuthDeg + 90);
    const at = (along: number): Point => ({ x: out.x * distance + u.x * (along - total / 2), y: out.y * distance + u.y * (along - total / 2) });
    return edge(wall, at(before), at(before + wall.widthM));
  });
  return { closed: false, edges: centred(edges) };
}

/** Moves the middle of the bounding box to (0, 0). */
function centred(edges: PlanEdge[]): PlanEdge[] {
  const points = edges.flatMap((one) => [one.from, one.to]);
  const middle = (axis: 'x' | 'y') => (Math.min(...points.map((p) => p[axis])) + Math.max(...points.map((p) => p[axis]))) / 2;
  const shift = { x: middle('x'), y: middle('y') };
  const moved = (p: Point): Point => ({ x: p.x - shift.x, y: p.y - shift.y });
  return edges.map((one) => ({ ...one, from: moved(one.from), to: moved(one.to) }));
}

import { doseClass } from '@/lib/plan/dose-class';
import { eaveLine } from '@/lib/plan/eave-line';
import { type Box, inset, labelsFit } from '@/lib/plan/labels';
import { outline, type PlanEdge } from '@/lib/plan/outline';
import { type Point } from '@/lib/plan/polygon';
import { type MarkedState } from '@/components/ui/state-shape';

export type HousePlanWall = {
  id: string;
  name: string;
  azimuthDeg: number;
  widthM: number;
  eaveDepthM: number;
  doseKwhM2: number;
  state?: MarkedState | undefined;
  href?: string | undefined;
};

/** The drawing is 400 by 400; the compass ring runs at `ring` around its middle. */
export const size = 400;
export const ring = 180;
const reach = 154;

/** Sines differ in their last digits from one engine to the next: what is drawn on the server and again in the browser is rounded, so that both agree. */
export const steady = (value: number, decimals = 2) => Number(value.toFixed(decimals));
/** Radius of the state's mark on a wall. */
export const badge = 14;
const letter = { size: 17, width: 9.4, line: 20 };

export type DrawnWall = {
  wall: HousePlanWall;
  from: Point;
  to: Point;
  middle: Point;
  outward: Point;
  /** Thickness grows with the sun dose, so that the ramp reads without colour. */
  thickness: number;
  label: Box;
};

export type DrawnPlan = { walls: DrawnWall[]; corners: Point[]; eave: Point[]; closed: boolean; named: boolean };

const short = (name: string) => (name.length > 12 ? `${name.slice(0, 11)}…` : name);
export const planLabel = (drawn: DrawnWall, index: number, named: boolean) => (named ? short(drawn.wall.name) : String(index + 1));

/** Walls in drawing units: x to the right, y down, north up. */
export function drawPlan(walls: readonly HousePlanWall[]): DrawnPlan {
  const { edges, closed } = outline(walls);
  const eave = closed ? eaveLine(edges, walls.map((wall) => wall.eaveDepthM)) : [];
  const furthest = Math.max(1, ...[...eave, ...edges.flatMap((edge) => [edge.from, edge.to])].map((p) => Math.hypot(p.x, p.y)));
  const place = (p: Point): Point => ({ x: steady(size / 2 + (p.x * reach) / furthest), y: steady(size / 2 - (p.y * reach) / furthest) });
  const corners = edges.map((edge) => place(edge.from));
  const draw = (named: boolean) => edges.flatMap((edge, i) => (walls[i] ? [drawWall(walls[i], edge, place, named)] : []));
  const withNames = draw(true);
  const named = labelsFit(withNames.map((wall) => wall.label), closed ? corners : undefined);
  return { walls: named ? withNames : draw(false), corners, eave: eave.map(place), closed, named };
}

function drawWall(wall: HousePlanWall, edge: PlanEdge, place: (p: Point) => Point, named: boolean): DrawnWall {
  const [from, to] = [place(edge.from), place(edge.to)];
  const middle = { x: (from.x + to.x) / 2, y: (from.y + to.y) / 2 };
  const outward = { x: steady(edge.outward.x, 4), y: steady(-edge.outward.y, 4) };
  const thickness = 6 + 3 * doseClass(wall.doseKwhM2);
  const width = Math.max(short(wall.name).length, 4.5) * letter.width;
  const box = named ? { width, height: 2 * letter.line } : { width: 26, height: 26 };
  const back = !named ? 0 : inset(box, outward, wall.state ? badge + 4 : thickness / 2 + 6);
  return { wall, from, to, middle, outward, thickness, label: { x: middle.x - outward.x * back, y: middle.y - outward.y * back, ...box } };
}

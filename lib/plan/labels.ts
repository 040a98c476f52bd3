import { isInside, type Point } from '@/lib/plan/polygon';

/** A text box by its middle and size, in drawing units. */
export type Box = Point & { width: number; height: number };

const corners = (box: Box): Point[] =>
  [-0.5, 0.5].flatMap((dx) => [-0.5, 0.5].map((dy) => ({ x: box.x + dx * box.width, y: box.y + dy * box.height })));

const overlap = (a: Box, b: Box) => Math.abs(a.x - b.x) * 2 < a.width + b.width && Math.abs(a.y - b.y) * 2 < a.height + b.height;

/** True when every box lies inside the outline (if there is one) and none covers another. */
export const labelsFit = (boxes: readonly Box[], outline: readonly Point[] | undefined): boolean =>
  boxes.every((box, i) => (!outline || corners(box).every((corner) => isInside(corner, outline))) && boxes.slice(i + 1).every((other) => !overlap(box, other)));

/** How far inward from a wall's middle its box must stand to clear the wall by `gap`. `inward` is a unit vector. */
export const inset = (size: { width: number; height: number }, inward: Point, gap: number): number =>
  gap + (Math.abs(inward.x) * size.width + Math.abs(inward.y) * size.height) / 2;

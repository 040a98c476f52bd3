export type Point = { x: number; y: number };

const cross = (o: Point, a: Point, b: Point) => (a.x - o.x) * (b.y - o.y) - (a.y - o.y) * (b.x - o.x);

const pairs = (corners: readonly Point[]) => corners.map((from, i) => [from, corners[(i + 1) % corners.length] ?? from] as const);

/** Signed area by the shoelace formula: positive when the corners run anticlockwise (x right, y up). */
export const area = (corners: readonly Point[]): number => pairs(corners).reduce((sum, [a, b]) => sum + (a.x * b.y - b.x * a.y) / 2, 0);

/** True when no two edges that are not neighbours touch. */
export function isSimple(corners: readonly Point[]): boolean {
  const edges = pairs(corners);
  return edges.every(([a, b], i) =>
    edges.every(([c, d], j) => {
      const neighbours = i === j || (i + 1) % edges.length === j || (j + 1) % edges.length === i;
      return neighbours || !touch(a, b, c, d);
    }),
  );
}

function touch(a: Point, b: Point, c: Point, d: Point): boolean {
  const near = 1e-9;
  const sides = [cross(a, b, c), cross(a, b, d), cross(c, d, a), cross(c, d, b)] as const;
  if (sides.every((side) => Math.abs(side) < near)) {
    const overlap = (axis: 'x' | 'y') => Math.max(Math.min(a[axis], b[axis]), Math.min(c[axis], d[axis])) <= Math.min(Math.max(a[axis], b[axis]), Math.max(c[axis], d[axis])) + near;
    return overlap('x') && overlap('y');
  }
  return sides[0] * sides[1] <= near && sides[2] * sides[3] <= near;
}

/** Even-odd rule: is the point inside? Points on the edge may fall either way. */
export function isInside(point: Point, corners: readonly Point[]): boolean {
  return pairs(corners).reduce((inside, [a, b]) => {
    if (a.y > point.y === b.y > point.y) return inside;
    const x = a.x + ((point.y - a.y) / (b.y - a.y)) * (b.x - a.x);
    return point.x < x ? !inside : inside;
  }, false);
}

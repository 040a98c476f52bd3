import { type PlanEdge } from '@/lib/plan/outline';
import { type Point } from '@/lib/plan/polygon';

/**
 * The edge of the eaves seen from above: each wall's line moved outward by its eave depth (m), neighbours cut where they meet.
 * Neighbours in one line, or meeting so sharply that the cut runs off, keep their own ends.
 */
export function eaveLine(edges: readonly PlanEdge[], depthsM: readonly number[]): Point[] {
  const moved = edges.map((edge, i) => {
    const depth = depthsM[i] ?? 0;
    const out = (p: Point): Point => ({ x: p.x + edge.outward.x * depth, y: p.y + edge.outward.y * depth });
    return { from: out(edge.from), to: out(edge.to) };
  });
  return moved.flatMap((line, i) => {
    const before = moved[(i + moved.length - 1) % moved.length] ?? line;
    const corner = meet(before, line);
    const reach = 3 * Math.max(...depthsM, 0.1);
    return corner && Math.hypot(corner.x - line.from.x, corner.y - line.from.y) <= reach ? [corner] : [before.to, line.from];
  });
}

type Line = { from: Point; to: Point };

function meet(a: Line, b: Line): Point | undefined {
  const [ax, ay, bx, by] = [a.to.x - a.from.x, a.to.y - a.from.y, b.to.x - b.from.x, b.to.y - b.from.y];
  const determinant = ax * by - ay * bx;
  if (Math.abs(determinant) < 1e-6 * Math.hypot(ax, ay) * Math.hypot(bx, by)) return undefined;
  const t = ((b.from.x - a.from.x) * by - (b.from.y - a.from.y) * bx) / determinant;
  return { x: a.from.x + t * ax, y: a.from.y + t * ay };
}

import { onRing } from '@/components/drawings/compass-ring';
import { type DrawnWall, ring, steady } from '@/components/drawings/plan-layout';

export type SunNow = { azimuthDeg: number; elevationDeg: number };

const radians = (deg: number) => (deg * Math.PI) / 180;

/** Cosine of the angle at which the sun strikes a wall, without its eave; 0 when it does not. */
export function strikes(sun: SunNow, azimuthDeg: number): number {
  if (sun.elevationDeg <= 0) return 0;
  return Math.max(0, Math.cos(radians(sun.elevationDeg)) * Math.cos(radians(sun.azimuthDeg - azimuthDeg)));
}

/** Short rays that end on the wall, all in the sun's direction; longer where it strikes more squarely. */
export function Rays({ drawn, sun }: { drawn: DrawnWall; sun: SunNow }) {
  const strength = strikes(sun, drawn.wall.azimuthDeg);
  if (strength < 0.01) return null;
  const length = Math.hypot(drawn.to.x - drawn.from.x, drawn.to.y - drawn.from.y);
  const count = Math.max(2, Math.round(length / 22));
  const toSun = { x: Math.sin(radians(sun.azimuthDeg)), y: -Math.cos(radians(sun.azimuthDeg)) };
  return (
    <g aria-hidden="true" stroke="var(--sun)" strokeWidth="3.5" strokeLinecap="round">
      {Array.from({ length: count }, (_, i) => {
        const share = (i + 0.5) / count;
        const clear = drawn.thickness / 2 + 6;
        const x = drawn.from.x + (drawn.to.x - drawn.from.x) * share + drawn.outward.x * clear;
        const y = drawn.from.y + (drawn.to.y - drawn.from.y) * share + drawn.outward.y * clear;
        const reach = 4 + 16 * strength;
        return <line key={i} x1={steady(x)} y1={steady(y)} x2={steady(x + toSun.x * reach)} y2={steady(y + toSun.y * reach)} />;
      })}
    </g>
  );
}

/** The sun on the compass ring: full above the horizon, an empty circle below it. */
export function SunMark({ sun }: { sun: SunNow }) {
  const p = onRing(sun.azimuthDeg, ring);
  const up = sun.elevationDeg > 0;
  return (
    <g aria-hidden="true">
      <circle cx={p.x} cy={p.y} r="15" fill={up ? 'var(--sun)' : 'var(--snow)'} stroke="var(--ink)" strokeWidth="2" strokeDasharray={up ? undefined : '4 4'} />
    </g>
  );
}

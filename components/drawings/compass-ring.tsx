import { ring, size, steady } from '@/components/drawings/plan-layout';

const middle = size / 2;
const at = (azimuthDeg: number, radius: number) => {
  const radians = (azimuthDeg * Math.PI) / 180;
  return { x: steady(middle + radius * Math.sin(radians)), y: steady(middle - radius * Math.cos(radians)) };
};
const letters = [['N', 0], ['E', 90], ['S', 180], ['W', 270]] as const;

/** North up: a ring with a tick every 15 degrees, the four directions in letters and an arrow at north. */
export function CompassRing() {
  const ticks = Array.from({ length: 24 }, (_, i) => i * 15).filter((deg) => deg % 90 !== 0);
  return (
    <g aria-hidden="true">
      <circle cx={middle} cy={middle} r={ring} fill="none" stroke="var(--line)" strokeWidth="1.5" />
      {ticks.map((deg) => {
        const [inner, outer] = [at(deg, ring - (deg % 45 === 0 ? 7 : 4)), at(deg, ring + (deg % 45 === 0 ? 7 : 4))];
        return <line key={deg} x1={inner.x} y1={inner.y} x2={outer.x} y2={outer.y} stroke="var(--lichen)" strokeWidth="1.5" />;
      })}
      {letters.map(([name, deg]) => {
        const p = at(deg, ring);
        return (
          <g key={name}>
            <circle cx={p.x} cy={p.y} r="13" fill="var(--snow)" />
            <text x={p.x} y={p.y + 6} textAnchor="middle" fontSize="17" fontWeight={name === 'N' ? 800 : 500} fill={name === 'N' ? 'var(--ink)' : 'var(--quiet)'}>
              {name}
            </text>
          </g>
        );
      })}
      <path d={`M${middle - 7} ${middle - ring - 11} L${middle} ${middle - ring - 20} L${middle + 7} ${middle - ring - 11} Z`} fill="var(--ink)" />
    </g>
  );
}

export { at as onRing };

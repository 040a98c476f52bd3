import { CompassRing } from '@/components/drawings/compass-ring';
import { DoseLegend } from '@/components/drawings/dose-ramp';
import { drawPlan, type HousePlanWall, size } from '@/components/drawings/plan-layout';
import { Rays, strikes, SunMark, type SunNow } from '@/components/drawings/plan-sun';
import { PlanWallMark } from '@/components/drawings/plan-wall';
import { StateShape } from '@/components/ui/state-shape';

export type { HousePlanWall } from '@/components/drawings/plan-layout';

type HousePlanProps = {
  /** In plan order: the order in which one walks around the house. */
  walls: readonly HousePlanWall[];
  /** Where the sun stands; lights the walls that it strikes. */
  sun?: SunNow | undefined;
  label?: string;
  /** The ramp of sun doses under the drawing. */
  legend?: boolean;
};

const points = (list: readonly { x: number; y: number }[]) => list.map((p) => `${p.x.toFixed(1)},${p.y.toFixed(1)}`).join(' ');

/** The home from above, north up. Each wall's thickness and colour tell its sun dose; a wall with an address is a link. */
export function HousePlan({ walls, sun, label = 'House plan from above, north up', legend = true }: HousePlanProps) {
  const plan = drawPlan(walls);
  return (
    <figure className="min-w-0">
      <svg viewBox={`0 0 ${size} ${size}`} className="mx-auto block h-auto w-full max-w-[28rem] overflow-visible" role="group" aria-label={label}>
        <CompassRing />
        {plan.closed ? (
          <>
            <polygon points={points(plan.eave)} fill="none" stroke="var(--lichen)" strokeWidth="1.5" strokeDasharray="7 4" />
            <polygon points={points(plan.corners)} fill="var(--inset)" />
          </>
        ) : null}
        {sun ? plan.walls.map((drawn) => <Rays key={drawn.wall.id} drawn={drawn} sun={sun} />) : null}
        {plan.walls.map((drawn, i) => (
          <PlanWallMark key={drawn.wall.id} drawn={drawn} index={i} named={plan.named} lit={sun ? strikes(sun, drawn.wall.azimuthDeg) > 0 : undefined} />
        ))}
        {plan.closed ? plan.corners.map((corner, i) => <LogEnd key={i} {...corner} />) : null}
        {sun ? <SunMark sun={sun} /> : null}
      </svg>
      {plan.named ? null : (
        <ol className="mx-auto mt-3 max-w-[28rem] columns-2 gap-6">
          {plan.walls.map((drawn, i) => (
            <li key={drawn.wall.id} className="flex break-inside-avoid items-center gap-1.5 py-0.5">
              <span className="figures">{i + 1}</span> {drawn.wall.state ? <StateShape state={drawn.wall.state} size={18} /> : null} {drawn.wall.name} <span className="figures whitespace-nowrap">{Math.round(drawn.wall.doseKwhM2).toLocaleString('en-US')}</span>
            </li>
          ))}
        </ol>
      )}
      {legend ? (
        <figcaption className="mx-auto mt-3 max-w-[28rem]">
          <DoseLegend />
        </figcaption>
      ) : null}
    </figure>
  );
}

/** The crossing log ends at a corner. */
function LogEnd({ x, y }: { x: number; y: number }) {
  return (
    <g aria-hidden="true">
      <circle cx={x} cy={y} r="10" fill="var(--snow)" stroke="var(--ink)" strokeWidth="2" />
      <circle cx={x} cy={y} r="4.5" fill="none" stroke="var(--driftwood)" strokeWidth="2" />
    </g>
  );
}

import { doseBounds } from '@/lib/plan/dose-class';

/** The ramp with what it means. */
export function DoseLegend() {
  return (
    <div className="text-sm text-quiet">
      <DoseRamp />
      Sun dose of a mean year, kWh/m². Dashed line: edge of the eaves.
    </div>
  );
}

/** Legend of the sun-dose ramp: five steps, thicker and redder with more sun. */
function DoseRamp() {
  return (
    <svg viewBox="0 0 312 44" className="block h-auto w-full max-w-80" role="img" aria-label={`Sun dose of a mean year in kWh/m², five steps from ${doseBounds[0]} to ${doseBounds[5]}`}>
      {[1, 2, 3, 4, 5].map((step) => {
        const thickness = 6 + 3 * step;
        return <rect key={step} x={20 + (step - 1) * 54} y={22 - thickness} width="54" height={thickness} fill={`var(--dose-${step})`} stroke="var(--ink)" strokeWidth="1" />;
      })}
      {doseBounds.map((bound, i) => (
        <text key={bound} x={20 + i * 54} y="40" textAnchor="middle" fontSize="15" fill="var(--ink)">
          {bound}
        </text>
      ))}
    </svg>
  );
}

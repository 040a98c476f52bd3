import { useId } from 'react';
import { FadeLegend } from '@/components/drawings/fade-marks';
import { FadeMarks, FadeRow, row } from '@/components/drawings/fade-row';
import { FadeTable } from '@/components/drawings/fade-table';
import { fadeScale, type FadeWall, type Scale } from '@/components/drawings/fade-time';
import { type CalendarDay, dayOf } from '@/lib/calendar';

export type { FadeWall } from '@/components/drawings/fade-time';

const axis = 40;

type FadeStripProps = { today: CalendarDay; walls: readonly FadeWall[]; legend?: boolean };

/** One course per wall, years across: each coat from its own colour to weathered grey, with past and coming work on it. */
export function FadeStrip({ today, walls, legend = true }: FadeStripProps) {
  const defs = useId().replace(/[^a-zA-Z0-9-]/g, '');
  const scale = fadeScale(today, walls);
  const height = axis + walls.length * row.height;
  const now = `${scale.at(today).toFixed(3)}%`;
  return (
    <figure className="min-w-0">
      <svg width="100%" height={height} className="block overflow-visible" role="group" aria-label="Fade strips: one row per wall; the table after it says the same">
        <Patterns defs={defs} />
        <Years scale={scale} height={height} />
        {walls.map((wall, i) => (
          <FadeRow key={wall.id} wall={wall} scale={scale} today={today} top={axis + i * row.height} defs={defs} />
        ))}
        <line x1={now} x2={now} y1={axis - 5} y2={height} stroke="var(--ink)" strokeWidth="2.5" pointerEvents="none" />
        {walls.map((wall, i) => (
          <FadeMarks key={wall.id} wall={wall} scale={scale} top={axis + i * row.height} />
        ))}
        <text x={now} y="14" textAnchor="middle" fontSize="15" fontWeight="700" fill="var(--ink)">
          today
        </text>
      </svg>
      <FadeTable today={today} walls={walls} />
      {legend ? <FadeLegend /> : null}
    </figure>
  );
}

function Patterns({ defs }: { defs: string }) {
  return (
    <defs>
      <pattern id={`${defs}-hatch`} width="8" height="8" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
        <rect width="8" height="8" fill="var(--snow)" />
        <rect width="2.5" height="8" fill="var(--lichen)" />
      </pattern>
      <pattern id={`${defs}-checks`} width="22" height="28" patternUnits="userSpaceOnUse">
        <path d="M1 8.5h9l3-1.5h4M9 20.5h9l3 1.5M1 26h5M14 4h6M2 15h7" fill="none" stroke="#4d4c46" strokeWidth="1.5" strokeLinecap="round" />
      </pattern>
    </defs>
  );
}

/** A hairline each New Year; every second label on wide screens, every fifth year on phones. */
function Years({ scale, height }: { scale: Scale; height: number }) {
  const years = Array.from({ length: scale.toYear - scale.fromYear }, (_, i) => scale.fromYear + i);
  return (
    <g aria-hidden="true">
      {years.map((year) => {
        const x = `${scale.at(dayOf(year, 1, 1)).toFixed(3)}%`;
        const label = year % 5 === 0 ? '' : year % 2 === 0 ? 'max-md:hidden' : 'max-lg:hidden';
        return (
          <g key={year}>
            <line x1={x} x2={x} y1={axis - 6} y2={height} stroke="var(--line)" />
            <text x={x} dx="3" y={axis - 10} fontSize="14" fill="var(--quiet)" className={label}>
              {year}
            </text>
          </g>
        );
      })}
    </g>
  );
}

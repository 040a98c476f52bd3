import { type Route } from 'next';
import Link from 'next/link';
import { FadeMark } from '@/components/drawings/fade-marks';
import { type Stretch, stretches, usedUpOn } from '@/components/drawings/fade-stretches';
import { type FadeWall, type Scale, weathered } from '@/components/drawings/fade-time';
import { type CalendarDay, dayOf } from '@/lib/calendar';

/** Heights within a row, px. */
export const row = { height: 92, name: 22, strip: 34, stripHeight: 28, seal: 68, care: 80 };

type RowProps = { wall: FadeWall; scale: Scale; today: CalendarDay; top: number; defs: string };

const percent = (value: number) => `${value.toFixed(3)}%`;

export function FadeRow({ wall, scale, today, top, defs }: RowProps) {
  const from = dayOf(scale.fromYear, 1, 1);
  const to = dayOf(scale.toYear, 1, 1);
  const name = (
    <text x="0" y={top + row.name} fontSize="17" fontWeight="700" fill="var(--ink)">
      {wall.name}
    </text>
  );
  return (
    <g>
      <line x1="0" x2="100%" y1={top + row.height - 0.5} y2={top + row.height - 0.5} stroke="var(--line)" />
      {wall.href ? (
        <Link href={wall.href as Route} className="fade-link">
          <rect x="0" y={top} width="100%" height={row.height} fill="transparent" className="fade-hit" />
          {name}
        </Link>
      ) : (
        name
      )}
      <g pointerEvents="none">
        {stretches(wall, from, to).map((stretch, i) => (
          <StretchBar key={stretch.from} stretch={stretch} scale={scale} y={top + row.strip} defs={defs} fade={`${defs}-${wall.id}-${i}`} />
        ))}
        <SealLine wall={wall} scale={scale} y={top + row.seal} today={today} defs={defs} />
      </g>
    </g>
  );
}

type StretchProps = { stretch: Stretch; scale: Scale; y: number; defs: string; fade: string };

function StretchBar({ stretch, scale, y, defs, fade }: StretchProps) {
  const [x, end] = [scale.at(stretch.from), scale.at(stretch.to)];
  const box = { x: percent(x), y, width: percent(Math.max(0, end - x)), height: row.stripHeight };
  if (stretch.what === 'not known') {
    return (
      <>
        <rect {...box} fill={`url(#${defs}-hatch)`} stroke="var(--lichen)" strokeDasharray="4 3" />
        {end - x > 22 ? (
          <svg x={box.x} y={y} width={box.width} height={row.stripHeight}>
            <text x="50%" y="19" textAnchor="middle" fontSize="15" fill="var(--ink)" stroke="var(--snow)" strokeWidth="6" paintOrder="stroke">
              not known
            </text>
          </svg>
        ) : null}
      </>
    );
  }
  if (stretch.what === 'used up') {
    return (
      <>
        <rect {...box} fill={weathered} />
        <rect {...box} fill={`url(#${defs}-checks)`} />
      </>
    );
  }
  return (
    <>
      <linearGradient id={fade}>
        {stretch.colors.map((color, i) => (
          <stop key={i} offset={i / (stretch.colors.length - 1)} stopColor={color} />
        ))}
      </linearGradient>
      <rect {...box} fill={`url(#${fade})`} />
      <svg {...box} viewBox="0 0 100 100" preserveAspectRatio="none">
        <path d={`M0 0L100 ${100 * stretch.used}V0Z`} fill="rgb(255 255 255 / 24%)" />
        <path d={`M0 0L100 ${100 * stretch.used}`} stroke="rgb(255 255 255 / 75%)" strokeWidth="1.5" vectorEffect="non-scaling-stroke" />
      </svg>
    </>
  );
}

function SealLine({ wall, scale, y, today, defs }: { wall: FadeWall; scale: Scale; y: number; today: CalendarDay; defs: string }) {
  if (wall.seal.startedOn === null) return <rect x="0" y={y} width={percent(scale.at(today))} height="5" fill={`url(#${defs}-hatch)`} />;
  const [x, end] = [scale.at(wall.seal.startedOn), scale.at(usedUpOn(wall.seal.startedOn, wall.seal.lifeMonths))];
  return (
    <>
      <rect x={percent(x)} y={y} width={percent(Math.max(0, end - x))} height="5" fill="var(--lichen)" />
      <line x1={percent(end)} x2={percent(end)} y1={y - 3} y2={y + 8} stroke="var(--lichen)" strokeWidth="2" />
    </>
  );
}

/** Past and coming work of one wall, above the line of today. */
export function FadeMarks({ wall, scale, top }: Omit<RowProps, 'defs' | 'today'>) {
  const [from, to] = [dayOf(scale.fromYear, 1, 1), dayOf(scale.toYear, 1, 1)];
  const lane = { restain: row.strip + row.stripHeight / 2, recaulk: row.seal + 2.5, wash: row.care, walkaround: row.care };
  const done = wall.past.filter((work) => work.doneOn >= from).map((work) => ({ kind: work.kind, at: scale.at(work.doneOn), done: true }));
  const coming = wall.coming
    .filter((work) => work.opensOn < to)
    .map((work) => ({ kind: work.kind, at: (scale.at(work.opensOn) + scale.at(work.closesOn)) / 2, done: false }));
  return [...done, ...coming].map((mark) => (
    <svg pointerEvents="none" key={`${mark.kind}-${mark.at}-${mark.done}`} x={percent(mark.at)} y={top + lane[mark.kind]} overflow="visible">
      <FadeMark kind={mark.kind} done={mark.done} />
    </svg>
  ));
}

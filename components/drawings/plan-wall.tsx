import { type Route } from 'next';
import Link from 'next/link';
import { type ReactNode } from 'react';
import { badge, type DrawnWall, planLabel } from '@/components/drawings/plan-layout';
import { type MarkedState, StateShape } from '@/components/ui/state-shape';
import { directionWord } from '@/lib/home/direction';
import { doseClass, doseWords } from '@/lib/plan/dose-class';

const round = (dose: number) => Math.round(dose).toLocaleString('en-US');

/** One wall in words, for those who do not see the drawing. */
export function wallWords({ wall }: DrawnWall, index: number, lit?: boolean): string {
  const words = [
    `${index + 1}. ${wall.name}, faces ${directionWord(wall.azimuthDeg)}`,
    `sun dose ${round(wall.doseKwhM2)} kWh/m² a year, ${doseWords[doseClass(wall.doseKwhM2)]}`,
    ...(wall.state ? [wall.state] : []),
    ...(lit === undefined ? [] : [lit ? 'in the sun now' : 'in shade now']),
  ];
  return words.join('; ');
}

type PlanWallProps = { drawn: DrawnWall; index: number; named: boolean; lit?: boolean | undefined };

export function PlanWallMark({ drawn, index, named, lit }: PlanWallProps) {
  const { wall, from, to, thickness } = drawn;
  const line = { x1: from.x, y1: from.y, x2: to.x, y2: to.y };
  const words = wallWords(drawn, index, lit);
  const content = (
    <>
      <title>{words}</title>
      <line {...line} stroke="transparent" strokeWidth="46" />
      <line {...line} stroke="var(--ink)" strokeWidth={thickness + 3} className="plan-edge" />
      <line {...line} stroke={`var(--dose-${doseClass(wall.doseKwhM2)})`} strokeWidth={thickness} />
      {wall.state && named ? <Badge at={drawn.middle} state={wall.state} /> : null}
      <Label drawn={drawn} index={index} named={named} />
    </>
  );
  if (!wall.href) {
    return (
      <g role="img" aria-label={words}>
        {content}
      </g>
    );
  }
  return (
    <Link href={wall.href as Route} aria-label={words} className="plan-link">
      {content}
    </Link>
  );
}

function Badge({ at, state }: { at: { x: number; y: number }; state: MarkedState }) {
  return (
    <>
      <circle cx={at.x} cy={at.y} r={badge} fill="var(--snow)" stroke="var(--ink)" strokeWidth="2" />
      <StateShape state={state} x={at.x - 9} y={at.y - (state === 'overdue' ? 10 : 9)} size={18} />
    </>
  );
}

function Label({ drawn, index, named }: { drawn: DrawnWall; index: number; named: boolean }): ReactNode {
  const { label, wall } = drawn;
  const text = planLabel(drawn, index, named);
  if (!named) {
    return (
      <>
        <circle cx={label.x} cy={label.y} r="13" fill="var(--snow)" stroke="var(--ink)" strokeWidth="1.5" />
        <text x={label.x} y={label.y + 6} textAnchor="middle" fontSize="17" fontWeight="700" fill="var(--ink)">
          {text}
        </text>
      </>
    );
  }
  const top = label.y - label.height / 2 + 15;
  return (
    <>
      <text x={label.x} y={top} textAnchor="middle" fontSize="17" fontWeight="700" fill="var(--ink)">
        {text}
      </text>
      <text x={label.x} y={top + 20} textAnchor="middle" fontSize="17" fill="var(--ink)" className="figures">
        {round(wall.doseKwhM2)}
      </text>
    </>
  );
}

import { type WorkState } from '@/lib/care/types';

export type MarkedState = WorkState | 'done' | 'put off' | 'not known';

type Shape = { color: string; path?: string; line?: string };

const ring = 'M10 3a7 7 0 1 0 .01 0';

const shapes: Record<MarkedState, Shape> = {
  later: { color: 'var(--lichen)', line: ring },
  'due soon': { color: 'var(--honey)', path: 'M10 3a7 7 0 0 1 0 14z', line: ring },
  due: { color: 'var(--spruce)', path: ring },
  overdue: { color: 'var(--ember)', path: 'M10 1.5 19 18H1Z' },
  done: { color: 'var(--spruce)', line: 'm3.5 10.5 4.5 4.5L17 5.5' },
  'put off': { color: 'var(--lichen)', line: 'M4 5v10M9 5v10M13 6l5 4-5 4' },
  'not known': { color: 'var(--lichen)', line: 'M3 17 17 3M3 10l7-7M10 17l7-7' },
};

/** The shape of a state, 20 by 20; also for use inside another drawing. Carries no words: say the state beside it. */
export function StateShape({ state, size = 20, x, y }: { state: MarkedState; size?: number; x?: number; y?: number }) {
  const { color, path, line } = shapes[state];
  return (
    <svg x={x} y={y} viewBox="0 0 20 20" width={size} height={size} aria-hidden="true" className="shrink-0">
      {path ? <path d={path} fill={color} /> : null}
      {line ? <path d={line} fill="none" stroke={color} strokeWidth="2.5" strokeLinecap="round" /> : null}
      {state === 'overdue' ? <path d="M10 7.5v5M10 15.2v.2" stroke="var(--snow)" strokeWidth="2.2" strokeLinecap="round" /> : null}
    </svg>
  );
}

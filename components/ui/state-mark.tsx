import { type ReactNode } from 'react';
import { type WorkState } from '@/lib/care/types';

export type MarkedState = WorkState | 'done' | 'put off' | 'not known';

type Shape = { color: string; path: string; open?: string };

const shapes: Record<MarkedState, Shape> = {
  later: { color: 'text-lichen', path: '', open: 'M10 3a7 7 0 1 0 .01 0' },
  'due soon': { color: 'text-honey', path: 'M10 3a7 7 0 0 1 0 14z', open: 'M10 3a7 7 0 1 0 .01 0' },
  due: { color: 'text-spruce', path: 'M10 3a7 7 0 1 0 .01 0' },
  overdue: { color: 'text-ember', path: 'M10 1.5 19 18H1Z' },
  done: { color: 'text-spruce', path: '', open: 'm3.5 10.5 4.5 4.5L17 5.5' },
  'put off': { color: 'text-lichen', path: '', open: 'M4 5v10M9 5v10M13 6l5 4-5 4' },
  'not known': { color: 'text-lichen', path: '', open: 'M3 17 17 3M3 10l7-7M10 17l7-7' },
};

type StateMarkProps = { state: MarkedState; children?: ReactNode };

/** How work stands: a shape and a word, so that neither colour nor sight is needed. */
export function StateMark({ state, children }: StateMarkProps) {
  const shape = shapes[state];
  return (
    <span className="inline-flex items-center gap-2 font-semibold whitespace-nowrap">
      <svg viewBox="0 0 20 20" width="20" height="20" aria-hidden="true" className={`shrink-0 ${shape.color}`}>
        {shape.path ? <path d={shape.path} fill="currentColor" /> : null}
        {shape.open ? <path d={shape.open} fill="none" stroke="currentColor" strokeWidth="2.5" strokeLinecap="round" /> : null}
        {state === 'overdue' ? <path d="M10 7.5v5M10 15.2v.2" stroke="var(--snow)" strokeWidth="2.2" strokeLinecap="round" /> : null}
      </svg>
      {children ?? state.charAt(0).toUpperCase() + state.slice(1)}
    </span>
  );
}

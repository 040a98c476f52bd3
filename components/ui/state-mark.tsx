import { type ReactNode } from 'react';
import { type MarkedState, StateShape } from '@/components/ui/state-shape';

type StateMarkProps = { state: MarkedState; children?: ReactNode };

/** How work stands: a shape and a word, so that neither colour nor sight is needed. */
export function StateMark({ state, children }: StateMarkProps) {
  return (
    <span className="inline-flex items-center gap-2 align-bottom font-semibold whitespace-nowrap">
      <StateShape state={state} />
      {children ?? state.charAt(0).toUpperCase() + state.slice(1)}
    </span>
  );
}

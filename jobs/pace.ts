import { setTimeout as pause } from 'node:timers/promises';

/** Lets at most `perSecond` callers pass in a second, evenly, by a clock that never jumps. */
export function pace(perSecond: number): () => Promise<void> {
  const stepMs = 1000 / perSecond;
  let nextAt = performance.now();
  return async () => {
    const now = performance.now();
    const mine = Math.max(nextAt, now);
    nextAt = mine + stepMs;
    // Timers are good for about a millisecond; shorter waits are made up for by the next.
    if (mine - now >= 1) await pause(mine - now);
  };
}

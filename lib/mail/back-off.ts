/**
 * How long a mail waits after a failed attempt. Our rule: one minute after the first, doubled each time, at most six hours,
 * spread by ±25 % so that many mails do not come back at once; given up after the 20th attempt, about three days.
 */
export const mostAttempts = 20;
const longestMs = 6 * 3_600_000;

/** Milliseconds until the next attempt. `attempts` made so far (from 1), `jitter` in 0–1. Worked example: (3, 0.5) → 240 000. */
export function backOffMs(attempts: number, jitter: number): number {
  const plain = Math.min(60_000 * 2 ** (attempts - 1), longestMs);
  return Math.round(plain * (0.75 + 0.5 * jitter));
}

/** The longest that a mail can have to wait after so many attempts: a later day than that comes from a clock that was wrong. */
export const longestBackOffMs = (attempts: number): number => (attempts === 0 ? 0 : backOffMs(attempts, 1));

/**
 * How long a mail waits when the mail server as a whole is in trouble, by the mail's age. Our rule: a quarter of its age, at
 * least one minute, at most one hour, spread by ±25 %. Such tries are not counted, so that a long outage loses nothing.
 */
export const outageWaitMs = (ageMs: number, jitter: number): number => Math.round(Math.min(Math.max(ageMs / 4, 60_000), 3_600_000) * (0.75 + 0.5 * jitter));

import { setTimeout as pause } from 'node:timers/promises';
import { transaction } from '@/db/queries/transaction';

type Waiting = { work: () => void; done: () => void; failed: (error: unknown) => void };

/** How long an outcome is held when the database cannot be written (disk full), before the run gives up. */
const holdForMs = 20_000;
const againAfterMs = 500;

/**
 * Writes what comes in during one turn of the event loop in one transaction: many answers of the mail server cost one wait
 * for the disk. What cannot be written is tried again for a while: an answer of the mail server must not be forgotten.
 */
export function writeTogether(holdMs = holdForMs): { write: (work: () => void) => Promise<void>; isStuck: () => boolean } {
  let waiting: Waiting[] = [];
  let failures = 0;
  const once = (batch: Waiting[]) => transaction(() => batch.forEach(({ work }) => work()));
  const flush = async () => {
    const batch = waiting;
    waiting = [];
    const since = performance.now();
    for (;;) {
      try {
        once(batch);
        failures = 0;
        return batch.forEach(({ done }) => done());
      } catch (error) {
        failures += 1;
        if (performance.now() - since > holdMs) return batch.forEach(({ failed }) => failed(error));
        await pause(againAfterMs);
      }
    }
  };
  const write = (work: () => void) =>
    new Promise<void>((done, failed) => {
      waiting.push({ work, done, failed });
      if (waiting.length === 1) setImmediate(() => void flush());
    });
  return { write, isStuck: () => failures > 0 };
}

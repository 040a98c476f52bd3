import { setTimeout as pause } from 'node:timers/promises';
import { transaction } from '@/db/queries/transaction';

type Waiting = { work: () => void; done: () => void; failed: (error: unknown) => void };

/** How long an outcome is held when the database cannot be written (disk full), before the run gives up. */
const holdForMs = 5_000;
const againAfterMs = 500;
/** Under load, outcomes are gathered for so long, and no more than so many, before they are written; otherwise at once. */
const gatherMs = 25;
const mostUnwritten = 64;

export type Book = {
  /** Resolves when it is written. */
  write: (work: () => void) => Promise<void>;
  /** Resolves at once unless too much is waiting to be written; `settled` tells of trouble. */
  note: (work: () => void) => Promise<void>;
  settled: () => Promise<void>;
  isStuck: () => boolean;
};

/**
 * Writes many outcomes in one transaction, so that they cost one wait for the disk between them. What cannot be written is
 * tried again for a while: an answer of the mail server must not be forgotten.
 */
export function writeTogether(): Book {
  let waiting: Waiting[] = [];
  let failures = 0;
  let lastWrite = Number.NEGATIVE_INFINITY;
  let trouble: { error: unknown } | undefined;
  const open = new Set<Promise<void>>();

  const flush = async () => {
    const batch = waiting;
    waiting = [];
    const since = performance.now();
    for (;;) {
      try {
        transaction(() => batch.forEach(({ work }) => work()));
        failures = 0;
        lastWrite = performance.now();
        return batch.forEach(({ done }) => done());
      } catch (error) {
        failures += 1;
        if (performance.now() - since > holdForMs) return batch.forEach(({ failed }) => failed(error));
        await pause(againAfterMs);
      }
    }
  };
  const write = (work: () => void) =>
    new Promise<void>((done, failed) => {
      waiting.push({ work, done, failed });
      if (waiting.length > 1) return;
      const soonMs = lastWrite + gatherMs - performance.now();
      if (soonMs > 1) setTimeout(() => void flush(), soonMs);
      else setImmediate(() => void flush());
    });
  const note = (work: () => void): Promise<void> => {
    const written = write(work).catch((error: unknown) => void (trouble ??= { error }));
    open.add(written);
    void written.then(() => open.delete(written));
    return waiting.length < mostUnwritten ? Promise.resolve() : written;
  };
  const settled = async () => {
    await Promise.all(open);
    if (trouble) throw trouble.error;
  };
  return { write, note, settled, isStuck: () => failures > 0 };
}

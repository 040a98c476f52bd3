import { and, eq, gt, isNotNull, isNull, sql } from 'drizzle-orm';
import { longestBackOffMs, mostAttempts, outageWaitMs } from '@/lib/mail/back-off';
import { database, transaction } from '../client';
import { mail } from '../schema';
import { leaseMs } from './mail';

/** A clock may be out by this much without anything being thought of it. */
const toleranceMs = 60_000;

const longestOutageWaitMs = outageWaitMs(Number.MAX_SAFE_INTEGER, 1);

/**
 * After a clock was set back, mails can wait for a time that no rule would have given them, and claims can run for too long.
 * Pulls both in: such mails are due now, such claims run from now on. A claim whose holder lives is renewed by it and stays.
 */
export function pullInFarTimes(now: Date): number {
  const after = (ms: number) => new Date(now.getTime() + ms);
  const open = sql`${mail.state} in ('queued', 'sending')`;
  const later = (ms: number) => and(open, eq(mail.state, 'queued'), gt(mail.nextAttemptAt, after(ms + toleranceMs)));
  return transaction(() => {
    let pulled = database().update(mail).set({ nextAttemptAt: now }).where(and(later(0), eq(mail.attempts, 0), isNull(mail.lastError))).run().changes;
    pulled += database().update(mail).set({ nextAttemptAt: now }).where(and(later(longestOutageWaitMs), eq(mail.attempts, 0), isNotNull(mail.lastError))).run().changes;
    for (let attempts = 1; attempts < mostAttempts; attempts += 1) {
      const wait = Math.max(longestBackOffMs(attempts), longestOutageWaitMs);
      pulled += database().update(mail).set({ nextAttemptAt: now }).where(and(later(wait), eq(mail.attempts, attempts))).run().changes;
    }
    database().update(mail).set({ nextAttemptAt: now }).where(and(open, eq(mail.state, 'sending'), gt(mail.nextAttemptAt, now))).run();
    database().update(mail).set({ leaseUntil: after(leaseMs) }).where(and(open, eq(mail.state, 'sending'), gt(mail.leaseUntil, after(leaseMs)))).run();
    return pulled;
  });
}

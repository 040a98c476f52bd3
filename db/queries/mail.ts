import { and, asc, eq, lte, or, sql } from 'drizzle-orm';
import { backOffMs, mostAttempts } from '@/lib/mail/back-off';
import { checkQueuedProps, isSecret, type MailKind, type QueuedProps } from '@/lib/mail/registry';
import { database, transaction } from '../client';
import { mail } from '../schema';

export type MailRow = typeof mail.$inferSelect;

type NewMail<K extends MailKind> = {
  kind: K;
  idempotencyKey: string;
  toAddress: string;
  userId?: string | null;
  homeId?: string | null;
  props: QueuedProps<K>;
  now?: Date;
};

/** A claim that was never finished (the process died) is free again after this time. Longer than any attempt takes. */
export const leaseMs = 5 * 60_000;

const mailHost = () => {
  const site = process.env.NEXTAUTH_URL;
  return site && URL.canParse(site) ? new URL(site).hostname : 'localhost';
};

/** Puts a mail into the outbox and returns its id; a second request with the same key returns the first one's id. */
export function enqueueMail<K extends MailKind>(wanted: NewMail<K>): string {
  const id = crypto.randomUUID();
  const { now = new Date(), ...row } = wanted;
  const made = database()
    .insert(mail)
    .values({ ...row, id, props: checkQueuedProps(wanted.kind, wanted.props), messageId: `<${id}@${mailHost()}>`, nextAttemptAt: now, createdAt: now })
    .onConflictDoNothing({ target: mail.idempotencyKey })
    .returning({ id: mail.id })
    .get();
  if (made) return made.id;
  const earlier = database().select({ id: mail.id }).from(mail).where(eq(mail.idempotencyKey, wanted.idempotencyKey)).get();
  if (!earlier) throw new Error('a mail was neither made nor found');
  return earlier.id;
}

export type ClaimedMail = MailRow & { leaseToken: string };

/** The literal list lets SQLite use the partial index `mail_open`. */
const open = (now: Date) =>
  and(
    sql`${mail.state} in ('queued', 'sending')`,
    or(and(eq(mail.state, 'queued'), lte(mail.nextAttemptAt, now)), and(eq(mail.state, 'sending'), lte(mail.leaseUntil, now))),
  );

/**
 * Takes up to `limit` mails that are due, oldest first, for this caller alone: one immediate transaction, so that two
 * processes never hold the same mail. `id` asks for one mail only.
 */
export function claimMail(now: Date, limit: number, id?: string): ClaimedMail[] {
  return transaction(() => {
    const due = database()
      .select()
      .from(mail)
      .where(id ? and(open(now), eq(mail.id, id)) : open(now))
      .orderBy(asc(mail.nextAttemptAt))
      .limit(limit)
      .all();
    const leaseUntil = new Date(now.getTime() + leaseMs);
    return due.map((row) => {
      const claim = { state: 'sending' as const, attempts: row.attempts + 1, leaseToken: crypto.randomUUID(), leaseUntil };
      database().update(mail).set(claim).where(eq(mail.id, row.id)).run();
      return { ...row, ...claim };
    });
  });
}

/** Ends a claim; without effect (false) when the lease ran out and somebody else holds the mail now. */
function finish(claimed: ClaimedMail, change: Partial<typeof mail.$inferInsert>): boolean {
  const done = database()
    .update(mail)
    .set({ leaseToken: null, leaseUntil: null, ...change })
    .where(and(eq(mail.id, claimed.id), eq(mail.state, 'sending'), eq(mail.leaseToken, claimed.leaseToken)))
    .run();
  return done.changes === 1;
}

const scrubbed = (claimed: ClaimedMail) => (isSecret(claimed.kind) ? { props: {} } : {});

export const markSent = (claimed: ClaimedMail, subject: string, now: Date): boolean =>
  finish(claimed, { state: 'sent', subject, sentAt: now, lastError: null, ...scrubbed(claimed) });

/** Nobody will take this mail: the address was refused, or it could not be written. */
export const markRefused = (claimed: ClaimedMail, error: string, subject?: string): boolean =>
  finish(claimed, { state: 'refused', lastError: error, ...(subject ? { subject } : {}), ...scrubbed(claimed) });

/** What it was about is done or no longer wanted. */
export const markCancelled = (claimed: ClaimedMail, reason: string): boolean =>
  finish(claimed, { state: 'cancelled', lastError: reason, ...scrubbed(claimed) });

/** Later again, by the back-off rule; `jitter` in 0–1. After the last attempt the mail is given up. */
export function markRetry(claimed: ClaimedMail, error: string, now: Date, jitter: number, subject?: string): 'queued' | 'refused' {
  if (claimed.attempts >= mostAttempts) {
    markRefused(claimed, `Given up after ${claimed.attempts} attempts. Last: ${error}`, subject);
    return 'refused';
  }
  const nextAttemptAt = new Date(now.getTime() + backOffMs(claimed.attempts, jitter));
  finish(claimed, { state: 'queued', nextAttemptAt, lastError: error, ...(subject ? { subject } : {}) });
  return 'queued';
}

import { and, asc, desc, eq, inArray, lte, or, sql } from 'drizzle-orm';
import { backOffMs, mostAttempts, outageWaitMs } from '@/lib/mail/back-off';
import { awaitedKinds, checkQueuedProps, isSecret, type MailKind, type QueuedProps } from '@/lib/mail/registry';
import { database, type Database, transaction } from '../client';
import { mail, user } from '../schema';

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

/** A claim that was never finished (the process died) is free again after this time. Whoever lives renews its claims well before. */
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
    lte(mail.nextAttemptAt, now),
    or(eq(mail.state, 'queued'), and(eq(mail.state, 'sending'), lte(mail.leaseUntil, now))),
  );

const awaitedFirst = desc(inArray(mail.kind, [...awaitedKinds]));

/** The mails that are due: links that somebody waits for first, then oldest first. */
export const dueMails = (now: Date, limit: number, id?: string) =>
  database()
    .select({ id: mail.id })
    .from(mail)
    .where(id ? and(open(now), eq(mail.id, id)) : open(now))
    .orderBy(awaitedFirst, asc(mail.nextAttemptAt), asc(mail.createdAt))
    .limit(limit);

/**
 * Takes up to `limit` mails that are due for this caller alone: one statement in one immediate transaction, so that two
 * processes never hold the same mail. `id` asks for one mail only. `attempts` of what is returned counts the try to come;
 * the row counts a try only when it has an answer, so that a process that is killed uses up none.
 */
export function claimMail(now: Date, limit: number, id?: string): ClaimedMail[] {
  const leaseToken = crypto.randomUUID();
  const rows = transaction(() => {
    const due = dueMails(now, limit, id).all().map((row) => row.id);
    if (due.length === 0) return [];
    const leaseUntil = new Date(now.getTime() + leaseMs);
    const taken = database().update(mail).set({ state: 'sending', leaseToken, leaseUntil }).where(inArray(mail.id, due)).returning().all();
    return taken.sort((a, b) => due.indexOf(a.id) - due.indexOf(b.id));
  });
  return rows.map((row) => ({ ...row, attempts: row.attempts + 1, leaseToken }));
}

const heldBy = (leaseToken: string) => and(eq(mail.state, 'sending'), eq(mail.leaseToken, leaseToken));

/** Whether this claim still counts (neither taken over nor withdrawn in the meantime), and whether mail to its address comes back. */
export function stateOfClaim(claimed: ClaimedMail): 'held' | 'bounced' | 'lost' {
  const row = prepared().state.get({ id: claimed.id, token: claimed.leaseToken, address: claimed.toAddress.trim().toLowerCase() });
  return row ? (row.bouncedAt ? 'bounced' : 'held') : 'lost';
}

/** What is asked and said for every single mail, prepared once a connection. */
const prepare = (db: Database) => {
  const held = and(eq(mail.id, sql.placeholder('id')), eq(mail.state, 'sending'), eq(mail.leaseToken, sql.placeholder('token')));
  const change = { state: 'sent' as const, lastError: null, leaseToken: null, leaseUntil: null, subject: sql`${sql.placeholder('subject')}`, attempts: sql`${sql.placeholder('attempts')}`, sentAt: sql`${sql.placeholder('sentAt')}` };
  return {
    state: db.select({ bouncedAt: user.bouncedAt }).from(mail).leftJoin(user, eq(user.email, sql.placeholder('address'))).where(held).prepare(),
    sent: db.update(mail).set(change).where(held).prepare(),
    sentSecret: db.update(mail).set({ ...change, props: {} }).where(held).prepare(),
  };
};
const preparedOf = new WeakMap<Database, ReturnType<typeof prepare>>();
function prepared(): ReturnType<typeof prepare> {
  const db = database();
  const known = preparedOf.get(db) ?? prepare(db);
  preparedOf.set(db, known);
  return known;
}

const withIds = (claimed: ClaimedMail[]) => inArray(mail.id, claimed.map((one) => one.id));
const tokensOf = (claimed: ClaimedMail[]) => and(eq(mail.state, 'sending'), inArray(mail.leaseToken, [...new Set(claimed.map((one) => one.leaseToken))]));

/** Holds claims for longer, so that a slow mail server does not let somebody else take the same mail. */
export function renewLeases(claimed: ClaimedMail[], now: Date): void {
  if (claimed.length === 0) return;
  database().update(mail).set({ leaseUntil: new Date(now.getTime() + leaseMs) }).where(and(withIds(claimed), tokensOf(claimed))).run();
}

/** Puts claims back that were not tried. */
export function releaseMail(claimed: ClaimedMail[]): void {
  if (claimed.length === 0) return;
  database().update(mail).set({ state: 'queued', leaseToken: null, leaseUntil: null }).where(and(withIds(claimed), tokensOf(claimed))).run();
}

/** Ends a claim; without effect (false) when the lease ran out and somebody else holds the mail now. */
function finish(claimed: ClaimedMail, change: Partial<typeof mail.$inferInsert>): boolean {
  const done = database()
    .update(mail)
    .set({ leaseToken: null, leaseUntil: null, attempts: claimed.attempts, ...change })
    .where(and(eq(mail.id, claimed.id), heldBy(claimed.leaseToken)))
    .run();
  return done.changes === 1;
}

const scrubbed = (claimed: ClaimedMail) => (isSecret(claimed.kind) ? { props: {} } : {});

export function markSent(claimed: ClaimedMail, subject: string, now: Date): boolean {
  const { sent, sentSecret } = prepared();
  const values = { id: claimed.id, token: claimed.leaseToken, subject, attempts: claimed.attempts, sentAt: now.getTime() };
  return (isSecret(claimed.kind) ? sentSecret : sent).run(values).changes === 1;
}

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

/** The mail server as a whole is in trouble: later again, and the try is not counted. */
export function markHeldUp(claimed: ClaimedMail, error: string, now: Date, jitter: number, subject?: string): boolean {
  const nextAttemptAt = new Date(now.getTime() + outageWaitMs(now.getTime() - claimed.createdAt.getTime(), jitter));
  return finish(claimed, { state: 'queued', attempts: claimed.attempts - 1, nextAttemptAt, lastError: error, ...(subject ? { subject } : {}) });
}

import { asc, count, desc, eq, inArray, sql } from 'drizzle-orm';
import { isSecret } from '@/lib/mail/registry';
import { type Actor, Refused } from '@/lib/permissions';
import { database, transaction } from '../client';
import { delivery, home, mail, user, wall } from '../schema';
import { demand } from '../scope';

/** What the operator sees of a mail: not what it is written from, which may hold a link to sign in. */
const columns = {
  id: mail.id,
  kind: mail.kind,
  toAddress: mail.toAddress,
  personName: user.name,
  homeName: home.name,
  messageId: mail.messageId,
  subject: mail.subject,
  state: mail.state,
  attempts: mail.attempts,
  nextAttemptAt: mail.nextAttemptAt,
  sentAt: mail.sentAt,
  lastError: mail.lastError,
  createdAt: mail.createdAt,
};

const views = () =>
  database().select(columns).from(mail).leftJoin(user, eq(user.id, mail.userId)).leftJoin(home, eq(home.id, mail.homeId));

export type MailView = ReturnType<ReturnType<typeof views>['all']>[number];
export type MailState = MailView['state'];
export type MailPage = { mails: MailView[]; page: number; pages: number; counts: Record<MailState, number> };

export const mailsPerPage = 50;

/** Newest first; `page` from 1. `counts` are of the whole outbox. */
export function listMails(actor: Actor, page: number, state?: MailState): MailPage {
  demand(actor, 'mail.view');
  const counts: Record<MailState, number> = { queued: 0, sending: 0, sent: 0, refused: 0, cancelled: 0 };
  for (const row of database().select({ state: mail.state, n: count() }).from(mail).groupBy(mail.state).all()) counts[row.state] = row.n;
  const total = state ? counts[state] : Object.values(counts).reduce((sum, n) => sum + n, 0);
  const pages = Math.max(1, Math.ceil(total / mailsPerPage));
  const shown = Math.min(Math.max(1, page), pages);
  const mails = views()
    .where(state ? eq(mail.state, state) : undefined)
    .orderBy(desc(mail.createdAt), desc(mail.id))
    .limit(mailsPerPage)
    .offset((shown - 1) * mailsPerPage)
    .all();
  return { mails, page: shown, pages, counts };
}

const deliveryColumns = { mailId: delivery.mailId, kind: delivery.kind, stage: delivery.stage, dueOn: delivery.dueOn, wallName: wall.name };
export type DeliveryView = { mailId: string; kind: string; stage: string; dueOn: string; wallName: string };

/** What each of these mails reminds of, in plan order. */
export function listDeliveries(actor: Actor, mailIds: string[]): DeliveryView[] {
  demand(actor, 'mail.view');
  if (mailIds.length === 0) return [];
  return database()
    .select(deliveryColumns)
    .from(delivery)
    .innerJoin(wall, eq(wall.id, delivery.wallId))
    .where(inArray(delivery.mailId, mailIds))
    .orderBy(asc(wall.position), asc(delivery.dueOn))
    .all();
}

export function oneMail(actor: Actor, mailId: string): MailView & { deliveries: DeliveryView[] } {
  demand(actor, 'mail.view');
  const row = views().where(eq(mail.id, mailId)).get();
  if (!row) throw new Refused('not found', 'That mail');
  return { ...row, deliveries: listDeliveries(actor, [mailId]) };
}

export type RetryAnswer = { retried: true } | { retried: false; why: string };

/** Queues a mail again for now: one that waits for its next attempt, or one that was refused. */
export function retryMail(actor: Actor, mailId: string, now: Date): RetryAnswer {
  demand(actor, 'mail.retry');
  return transaction(() => {
    const row = database().select({ state: mail.state, empty: sql<number>`${mail.props} = '{}'`, kind: mail.kind }).from(mail).where(eq(mail.id, mailId)).get();
    if (!row) throw new Refused('not found', 'That mail');
    if (row.state === 'refused' && row.empty && isSecret(row.kind)) {
      return { retried: false, why: 'Its link was deleted when it was given up. The person has to ask for a new one.' };
    }
    if (row.state !== 'refused' && row.state !== 'queued') return { retried: false, why: `It is ${row.state}, so there is nothing to retry.` };
    database().update(mail).set({ state: 'queued', attempts: 0, nextAttemptAt: now }).where(eq(mail.id, mailId)).run();
    return { retried: true };
  });
}

import 'server-only';
import { listDeliveries, listMails } from '@/db/queries/mail-view';
import { exactDay } from '@/lib/calendar-words';
import { type Actor } from '@/lib/permissions';
import { type OutboxPage, type OutboxQuery } from '@/lib/schemas/outbox';

/** One page of the outbox as JSON carries it: for the page's first view and for its later reads. */
export function outboxPage(actor: Actor, query: OutboxQuery): OutboxPage {
  const { mails, ...rest } = listMails(actor, query.page, query.state);
  const deliveries = listDeliveries(actor, mails.map((row) => row.id));
  return {
    ...rest,
    mails: mails.map((row) => ({
      id: row.id,
      kind: row.kind,
      to: row.toAddress,
      homeName: row.homeName,
      subject: row.subject,
      state: row.state,
      attempts: row.attempts,
      createdAt: row.createdAt.toISOString(),
      sentAt: row.sentAt?.toISOString() ?? null,
      nextAttemptAt: row.nextAttemptAt.toISOString(),
      lastError: row.lastError,
      about: deliveries.filter((one) => one.mailId === row.id).map((one) => `${one.wallName}: ${one.kind}, ${one.stage}, due ${exactDay(one.dueOn)}`),
    })),
  };
}

import { closeDatabase } from '@/db/client';
import { claimMail, type ClaimedMail, markCancelled, markRefused, markRetry, markSent } from '@/db/queries/mail';
import { reminderPropsOf } from '@/db/queries/reminder-props';
import { type Rendered } from '@/lib/mail/letter';
import { renderMail } from '@/lib/mail/registry';
import { environment } from './environment';
import { failureOf, type MailTransport, smtpTransport } from './transport';

export type DeliveryCounts = { sent: number; retried: number; refused: number; cancelled: number };
type Outcome = { state: keyof DeliveryCounts; noConnection?: boolean };

/** Mails in the air at one time. */
const atOnce = 4;

/** A clock that starts at `now` and runs on: leases must not be counted from the start of a long run. */
function clockFrom(now: Date): () => Date {
  const startedAt = performance.now();
  return () => new Date(now.getTime() + (performance.now() - startedAt));
}

/** Sends everything in the outbox that is due. Stops early when the mail server cannot be reached. */
export async function deliverDue(now: Date, transport?: MailTransport): Promise<DeliveryCounts> {
  const counts: DeliveryCounts = { sent: 0, retried: 0, refused: 0, cancelled: 0 };
  const clock = clockFrom(now);
  let way = transport;
  for (;;) {
    const claimed = claimMail(clock(), atOnce);
    if (claimed.length === 0) return counts;
    way ??= smtpTransport(environment().SMTP_URL);
    const sending = way;
    const outcomes = await Promise.all(claimed.map((one) => deliverOne(one, sending, clock)));
    for (const { state } of outcomes) counts[state] += 1;
    if (outcomes.some((outcome) => outcome.noConnection)) return counts;
  }
}

/** Sends one mail at once, for links that somebody waits for. Trouble with the mail server leaves it in the outbox; the scheduler goes on. */
export async function deliverMail(mailId: string, transport?: MailTransport): Promise<keyof DeliveryCounts | 'not due'> {
  const clock = () => new Date();
  const [claimed] = claimMail(clock(), 1, mailId);
  if (!claimed) return 'not due';
  return (await deliverOne(claimed, transport ?? smtpTransport(environment().SMTP_URL), clock)).state;
}

async function deliverOne(claimed: ClaimedMail, transport: MailTransport, clock: () => Date): Promise<Outcome> {
  const later = (error: string, subject?: string): Outcome => ({ state: markRetry(claimed, error, clock(), Math.random(), subject) === 'queued' ? 'retried' : 'refused' });
  const contents = contentsOf(claimed, clock());
  if ('trouble' in contents) return later(contents.trouble);
  if ('nothing' in contents) {
    markCancelled(claimed, contents.nothing);
    return { state: 'cancelled' };
  }
  const written = write(claimed.kind, contents.props);
  if ('fault' in written) {
    markRefused(claimed, `It could not be written: ${written.fault}`);
    return { state: 'refused' };
  }
  try {
    const to = { name: '', address: contents.to };
    await transport.sendMail({ from: environment().MAIL_FROM, to, messageId: claimed.messageId, headers: { 'Auto-Submitted': 'auto-generated' }, ...written });
  } catch (error) {
    const failure = failureOf(error);
    if (failure.kind !== 'refused') return { ...later(failure.message, written.subject), noConnection: failure.kind === 'no connection' };
    markRefused(claimed, failure.message, written.subject);
    return { state: 'refused' };
  }
  markSent(claimed, written.subject, clock());
  return { state: 'sent' };
}

type Contents = { to: string; props: unknown } | { nothing: string } | { trouble: string };

/** What the mail is written from; for a reminder, the plan as it stands at this moment. */
function contentsOf(claimed: ClaimedMail, now: Date): Contents {
  if (claimed.kind !== 'reminder') return { to: claimed.toAddress, props: claimed.props };
  try {
    return reminderPropsOf(claimed, environment().NEXTAUTH_URL, now);
  } catch (error) {
    return { trouble: `The plan could not be read: ${messageOf(error)}` };
  }
}

/** A fault in one mail must not hold up the others. */
function write(kind: string, props: unknown): Rendered | { fault: string } {
  try {
    return renderMail(kind, props);
  } catch (error) {
    return { fault: messageOf(error) };
  }
}

const messageOf = (error: unknown) => (error instanceof Error ? error.message : String(error)).slice(0, 500);

async function main() {
  environment();
  const counts = await deliverDue(new Date());
  console.log(`Mail: ${counts.sent} sent, ${counts.retried} to try again, ${counts.refused} refused, ${counts.cancelled} cancelled.`);
  closeDatabase();
}

if (process.argv[1]?.endsWith('jobs/deliver.ts')) {
  main().catch((error: unknown) => {
    console.error(error instanceof Error ? error.message : error);
    process.exit(1);
  });
}

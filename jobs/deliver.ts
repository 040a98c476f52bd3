import { closeDatabase } from '@/db/client';
import { claimMail, type ClaimedMail, markCancelled, markHeldUp, markRefused, markRetry, markSent, stateOfClaim } from '@/db/queries/mail';
import { pullInFarTimes } from '@/db/queries/mail-clock';
import { reminderPropsOf } from '@/db/queries/reminder-props';
import { type Rendered } from '@/lib/mail/letter';
import { hasRunOut, isAwaited, renderMail } from '@/lib/mail/registry';
import { holdClaims } from './claims';
import { environment } from './environment';
import { pace } from './pace';
import { connections, failureOf, type MailTransport, smtpPool, smtpTransport } from './transport';
import { unsubscribeHeaders } from './unsubscribe';
import { type Book, writeTogether } from './write-together';

/** What became of the mails of a run. `heldUp`: the mail server as a whole was in trouble; they wait and lose nothing. */
export type DeliveryCounts = { sent: number; retried: number; refused: number; cancelled: number; heldUp: number };
type Outcome = { state: keyof DeliveryCounts; dropped?: boolean };

/** Mails under way at one time: while some are with the mail server, the next are being written. */
const atOnce = 2 * connections;

/** After so many cut lines in succession the mail server is taken to be in trouble. */
const mostCuts = 3;

/** A clock that starts at `now` and runs on, whatever is done to the machine's clock: leases must not be counted from the start of a long run. */
function clockFrom(now: Date): () => Date {
  const startedAt = performance.now();
  return () => new Date(now.getTime() + (performance.now() - startedAt));
}

/**
 * Sends what is due in the outbox: at most MAIL_PER_RUN mails and MAIL_PER_SECOND, links that somebody waits for first; the rest
 * waits for the next turn. Stops early when the mail server does not serve us, or when outcomes cannot be written down.
 */
export async function deliverDue(now: Date, transport?: MailTransport): Promise<DeliveryCounts> {
  const counts: DeliveryCounts = { sent: 0, retried: 0, refused: 0, cancelled: 0, heldUp: 0 };
  const clock = clockFrom(now);
  pullInFarTimes(now);
  const claims = holdClaims(clock, environment().MAIL_PER_RUN);
  const passes = pace(environment().MAIL_PER_SECOND);
  const book = writeTogether();
  let way = transport;
  let cuts = 0;
  const worker = async () => {
    while (counts.heldUp === 0 && cuts < mostCuts && !book.isStuck()) {
      const one = claims.next();
      if (!one) return;
      try {
        const { state, dropped } = await deliverOne(one, (way ??= smtpPool(environment().SMTP_URL)), clock, book, passes);
        counts[state] += 1;
        cuts = dropped ? cuts + 1 : 0;
      } finally {
        claims.done(one);
      }
    }
  };
  const ends = await Promise.allSettled(Array.from({ length: atOnce }, worker));
  if (!transport) way?.close?.();
  claims.end();
  await book.settled();
  for (const end of ends) if (end.status === 'rejected') throw end.reason;
  return counts;
}

/** Sends one mail at once, for links that somebody waits for. Trouble with the mail server leaves it in the outbox; the scheduler goes on. */
export async function deliverMail(mailId: string, transport?: MailTransport): Promise<keyof DeliveryCounts | 'not due'> {
  const clock = () => new Date();
  const [claimed] = claimMail(clock(), 1, mailId);
  if (!claimed) return 'not due';
  const book = writeTogether();
  const { state } = await deliverOne(claimed, transport ?? smtpTransport(environment().SMTP_URL), clock, book);
  await book.settled();
  return state;
}

async function deliverOne(claimed: ClaimedMail, transport: MailTransport, clock: () => Date, book: Book, passes?: () => Promise<void>): Promise<Outcome> {
  await passes?.();
  const state = stateOfClaim(claimed);
  if (state === 'lost') return { state: 'cancelled' };
  const contents: Contents = state === 'bounced' && !isAwaited(claimed.kind) ? { nothing: 'Mail to this address comes back.' } : contentsOf(claimed, clock());
  if ('trouble' in contents) return later(claimed, book, contents.trouble, clock);
  if ('nothing' in contents) {
    await book.write(() => void markCancelled(claimed, contents.nothing));
    return { state: 'cancelled' };
  }
  const written = rendered(claimed.kind, contents.props);
  if ('fault' in written) {
    await book.write(() => void markRefused(claimed, `It could not be written: ${written.fault}`));
    return { state: 'refused' };
  }
  try {
    const to = { name: '', address: contents.to };
    const headers = { 'Auto-Submitted': 'auto-generated', ...unsubscribeHeaders(claimed, environment().NEXTAUTH_URL) };
    await transport.sendMail({ from: environment().MAIL_FROM, to, messageId: claimed.messageId, headers, ...written });
  } catch (error) {
    return afterFailure(claimed, book, error, clock, written.subject);
  }
  await book.note(() => void markSent(claimed, written.subject, clock()));
  return { state: 'sent' };
}

async function later(claimed: ClaimedMail, book: Book, error: string, clock: () => Date, subject?: string): Promise<Outcome> {
  let state: 'queued' | 'refused' = 'queued';
  await book.write(() => void (state = markRetry(claimed, error, clock(), Math.random(), subject)));
  return { state: state === 'queued' ? 'retried' : 'refused' };
}

async function afterFailure(claimed: ClaimedMail, book: Book, error: unknown, clock: () => Date, subject: string): Promise<Outcome> {
  const { kind, message } = failureOf(error);
  if (kind === 'later') return later(claimed, book, message, clock, subject);
  if (kind === 'dropped') return { ...(await later(claimed, book, message, clock, subject)), dropped: true };
  if (kind === 'server') {
    await book.write(() => void markHeldUp(claimed, message, clock(), Math.random(), subject));
    return { state: 'heldUp' };
  }
  await book.write(() => void markRefused(claimed, message, subject));
  return { state: 'refused' };
}

type Contents = { to: string; props: unknown } | { nothing: string } | { trouble: string };

/** What the mail is written from; for a reminder, the plan as it stands at this moment. */
function contentsOf(claimed: ClaimedMail, now: Date): Contents {
  if (hasRunOut(claimed.props, claimed.createdAt, now)) return { nothing: 'Its link had run out before it could be sent.' };
  if (claimed.kind !== 'reminder') return { to: claimed.toAddress, props: claimed.props };
  try {
    return reminderPropsOf(claimed, environment().NEXTAUTH_URL, now);
  } catch (error) {
    return { trouble: `The plan could not be read: ${messageOf(error)}` };
  }
}

/** A fault in one mail must not hold up the others. */
function rendered(kind: string, props: unknown): Rendered | { fault: string } {
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
  console.log(`Mail: ${counts.sent} sent, ${counts.retried} to try again, ${counts.refused} refused, ${counts.cancelled} cancelled, ${counts.heldUp} held up by the mail server.`);
  closeDatabase();
}

if (process.argv[1]?.endsWith('jobs/deliver.ts')) {
  main().catch((error: unknown) => {
    console.error(error instanceof Error ? error.message : error);
    process.exit(1);
  });
}

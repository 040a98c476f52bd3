import { setImmediate as otherWork } from 'node:timers/promises';
import { closeDatabase } from '@/db/client';
import { finishJobRun, startJobRun } from '@/db/queries/job-runs';
import { homesToRemind, remindHome, type ReminderCounts } from '@/db/queries/reminders';
import { replanLapsed } from '@/db/queries/replan';
import { deliverDue, type DeliveryCounts } from './deliver';
import { environment } from './environment';
import { type MailTransport } from './transport';

export type ReminderRun = { replanned: number; homes: number; items: number; deliveries: number; mails: number } & DeliveryCounts;

/**
 * Plans homes anew whose plan lapsed, queues what has become due at each home, and sends the outbox.
 * Safe to run at any time and twice at once: nothing is sent twice. A home that fails does not hold up the others; the run
 * then throws at its end. Leaves a row in job_run with the counts, and with the error if there was one.
 */
export async function runReminders(now: Date, options: { deliver?: boolean; transport?: MailTransport } = {}): Promise<ReminderRun> {
  const runId = startJobRun('reminders', now);
  const outcome: ReminderRun = { replanned: 0, homes: 0, items: 0, deliveries: 0, mails: 0, sent: 0, retried: 0, refused: 0, cancelled: 0, heldUp: 0 };
  const faults: unknown[] = [];
  const attempt = async (part: () => Promise<void> | void) => {
    try {
      await part();
    } catch (error) {
      faults.push(error);
    }
  };
  await attempt(() => void (outcome.replanned = replanLapsed(now)));
  await attempt(async () => {
    for (const due of homesToRemind(now)) {
      await attempt(() => addTo(outcome, remindHome(due.homeId, due.today, now)));
      await otherWork();
    }
  });
  if (options.deliver ?? true) await attempt(async () => void Object.assign(outcome, await deliverDue(now, options.transport)));
  finishJobRun(runId, new Date(), outcome, faults.length > 0 ? faults.map(messageOf).join('; ').slice(0, 2000) : null);
  if (faults.length > 0) throw faults[0];
  return outcome;
}

function addTo(outcome: ReminderRun, counts: ReminderCounts): void {
  outcome.homes += 1;
  outcome.items += counts.items;
  outcome.deliveries += counts.deliveries;
  outcome.mails += counts.mails;
}

const messageOf = (error: unknown) => (error instanceof Error ? error.message : String(error));

/** The counts in one line. */
export const inWords = (run: ReminderRun): string =>
  `Reminders: ${run.replanned} homes planned anew, ${run.items} pieces of work due at ${run.homes} homes, ${run.mails} mails queued. ` +
  `Mail: ${run.sent} sent, ${run.retried} to try again, ${run.refused} refused, ${run.cancelled} cancelled, ${run.heldUp} held up by the mail server.`;

async function main() {
  environment();
  console.log(inWords(await runReminders(new Date())));
  closeDatabase();
}

if (process.argv[1]?.endsWith('jobs/reminders.ts')) {
  main().catch((error: unknown) => {
    console.error(error instanceof Error ? error.message : error);
    process.exit(1);
  });
}

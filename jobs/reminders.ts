import { setImmediate as otherWork } from 'node:timers/promises';
import { closeDatabase } from '@/db/client';
import { finishJobRun, startJobRun } from '@/db/queries/job-runs';
import { homesToRemind, remindHome } from '@/db/queries/reminders';
import { replanLapsed } from '@/db/queries/replan';
import { deliverDue, type DeliveryCounts } from './deliver';
import { environment } from './environment';
import { type MailTransport } from './transport';

export type ReminderRun = { replanned: number; homes: number; items: number; deliveries: number; mails: number } & DeliveryCounts;

/**
 * Plans homes anew whose plan lapsed, queues what has become due at each home, and sends the outbox.
 * Safe to run at any time and twice at once: nothing is sent twice. Leaves a row in job_run, also when it fails.
 */
export async function runReminders(now: Date, options: { deliver?: boolean; transport?: MailTransport } = {}): Promise<ReminderRun> {
  const runId = startJobRun('reminders', now);
  try {
    const outcome: ReminderRun = { replanned: replanLapsed(now), homes: 0, items: 0, deliveries: 0, mails: 0, sent: 0, retried: 0, refused: 0, cancelled: 0 };
    for (const { homeId, today } of homesToRemind(now)) {
      const counts = remindHome(homeId, today, now);
      outcome.homes += 1;
      outcome.items += counts.items;
      outcome.deliveries += counts.deliveries;
      outcome.mails += counts.mails;
      await otherWork();
    }
    if (options.deliver ?? true) Object.assign(outcome, await deliverDue(now, options.transport));
    finishJobRun(runId, new Date(), { outcome });
    return outcome;
  } catch (error) {
    finishJobRun(runId, new Date(), { error: error instanceof Error ? error.message : String(error) });
    throw error;
  }
}

/** The counts in one line. */
export const inWords = (run: ReminderRun): string =>
  `Reminders: ${run.replanned} homes planned anew, ${run.items} pieces of work due at ${run.homes} homes, ${run.mails} mails queued. ` +
  `Mail: ${run.sent} sent, ${run.retried} to try again, ${run.refused} refused, ${run.cancelled} cancelled.`;

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

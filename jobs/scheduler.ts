import { setTimeout as pause } from 'node:timers/promises';
import { closeDatabase } from '@/db/client';
import { runBackup } from './backup';
import { deliverDue } from './deliver';
import { environment } from './environment';
import { runPurge } from './purge';
import { inWords, runReminders } from './reminders';

export type Schedule = { now: () => Date; deliver: () => Promise<unknown>; remind: () => Promise<unknown>; keep?: () => Promise<unknown>; everyMs?: number; remindEveryMs?: number; keepEveryMs?: number };

const complain = (what: string, error: unknown) =>
  console.error(JSON.stringify({ level: 'error', at: new Date().toISOString(), job: what, message: error instanceof Error ? error.message : String(error) }));

/** Mail every minute, reminders at the start and every hour, data kept (backup, purge) at the start and every day, one after the other, until the signal. A failure is told and the next turn comes. */
export async function runSchedule(schedule: Schedule, until: AbortSignal): Promise<void> {
  const { everyMs = 60_000, remindEveryMs = 3_600_000, keepEveryMs = 86_400_000 } = schedule;
  let lastReminders = Number.NEGATIVE_INFINITY;
  let lastKept = Number.NEGATIVE_INFINITY;
  while (!until.aborted) {
    const at = schedule.now().getTime();
    // A clock that was set back must not put the reminders off.
    if (at < lastReminders || at - lastReminders >= remindEveryMs) {
      lastReminders = at;
      await schedule.remind().catch((error: unknown) => complain('reminders', error));
    } else {
      await schedule.deliver().catch((error: unknown) => complain('deliver', error));
    }
    if (schedule.keep && (at < lastKept || at - lastKept >= keepEveryMs)) {
      lastKept = at;
      await schedule.keep().catch((error: unknown) => complain('keep', error));
    }
    await pause(everyMs, undefined, { signal: until }).catch(() => undefined);
  }
}

async function main() {
  environment();
  const stop = new AbortController();
  process.on('SIGTERM', () => stop.abort());
  process.on('SIGINT', () => stop.abort());
  console.log('Scheduler: mail every minute, reminders every hour, a backup every day.');
  await runSchedule(
    {
      now: () => new Date(),
      deliver: () => deliverDue(new Date()),
      remind: async () => console.log(inWords(await runReminders(new Date()))),
      keep: async () => {
        console.log(`Purge: ${runPurge(new Date())} homes.`);
        console.log(`Backup: ${(await runBackup(new Date())).file}`);
      },
    },
    stop.signal,
  );
  closeDatabase();
}

if (process.argv[1]?.endsWith('jobs/scheduler.ts')) {
  main().catch((error: unknown) => {
    console.error(error instanceof Error ? error.message : error);
    process.exit(1);
  });
}

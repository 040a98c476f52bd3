import { count, desc, eq, inArray, min } from 'drizzle-orm';
import { database } from '../client';
import { jobRun, mail } from '../schema';

export type Health = { database: 'up'; lastReminderRun: { startedAt: string; ok: boolean } | null; outbox: { waiting: number; oldestAgeSeconds: number } };

/** Whether the database answers, how the last reminder run went, and how long the oldest mail has been waiting. Public: counts and instants only. */
export function health(now: Date): Health {
  const run = database().select().from(jobRun).where(eq(jobRun.job, 'reminders')).orderBy(desc(jobRun.startedAt)).limit(1).get();
  const queue = database().select({ waiting: count(), oldest: min(mail.createdAt) }).from(mail).where(inArray(mail.state, ['queued', 'sending'])).get();
  const oldest = queue?.oldest ? new Date(queue.oldest) : null;
  return {
    database: 'up',
    lastReminderRun: run ? { startedAt: run.startedAt.toISOString(), ok: run.finishedAt !== null && run.error === null } : null,
    outbox: { waiting: queue?.waiting ?? 0, oldestAgeSeconds: oldest ? Math.max(0, Math.round((now.getTime() - oldest.getTime()) / 1000)) : 0 },
  };
}

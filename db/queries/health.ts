import { count, desc, eq, inArray, min, sql } from 'drizzle-orm';
import { database } from '../client';
import journal from '../migrations/meta/_journal.json';
import { jobRun, mail } from '../schema';

type Working = {
  ok: true;
  database: 'up';
  migrations: 'applied';
  lastReminderRun: { startedAt: string; ok: boolean } | null;
  outbox: { waiting: number; oldestAgeSeconds: number };
};
export type Health = Working | { ok: false; database: 'up'; migrations: 'pending' };

/** Whether the newest migration that this build knows has been applied. */
function isMigrated(): boolean {
  const table = database().get<{ name: string } | undefined>(sql`select name from sqlite_master where type = 'table' and name = '__drizzle_migrations'`);
  if (!table) return false;
  const newest = database().get<{ at: number | null }>(sql`select max(created_at) as at from __drizzle_migrations`);
  return (newest?.at ?? 0) >= Math.max(...journal.entries.map(({ when }) => when));
}

/**
 * Whether the database answers with the schema that this build wants, how the last reminder run went, and how long the oldest
 * mail has been waiting. Public: counts and instants only. Throws when the database cannot be read.
 */
export function health(now: Date): Health {
  if (!isMigrated()) return { ok: false, database: 'up', migrations: 'pending' };
  const run = database().select().from(jobRun).where(eq(jobRun.job, 'reminders')).orderBy(desc(jobRun.startedAt)).limit(1).get();
  const queue = database().select({ waiting: count(), oldest: min(mail.createdAt) }).from(mail).where(inArray(mail.state, ['queued', 'sending'])).get();
  const oldest = queue?.oldest ? new Date(queue.oldest) : null;
  return {
    ok: true,
    database: 'up',
    migrations: 'applied',
    lastReminderRun: run ? { startedAt: run.startedAt.toISOString(), ok: run.finishedAt !== null && run.error === null } : null,
    outbox: { waiting: queue?.waiting ?? 0, oldestAgeSeconds: oldest ? Math.max(0, Math.round((now.getTime() - oldest.getTime()) / 1000)) : 0 },
  };
}

import { desc, eq } from 'drizzle-orm';
import { type Actor } from '@/lib/permissions';
import { database } from '../client';
import { jobRun } from '../schema';
import { demand } from '../scope';

export type JobRun = typeof jobRun.$inferSelect;

export const startJobRun = (job: string, now: Date): string =>
  database().insert(jobRun).values({ job, startedAt: now }).returning({ id: jobRun.id }).get().id;

export function finishJobRun(runId: string, at: Date, outcome: Record<string, number>, error: string | null): void {
  database().update(jobRun).set({ finishedAt: at, outcome, error }).where(eq(jobRun.id, runId)).run();
}

/** Newest first. */
export function recentJobRuns(actor: Actor, limit: number): JobRun[] {
  demand(actor, 'mail.view');
  return database().select().from(jobRun).orderBy(desc(jobRun.startedAt), desc(jobRun.id)).limit(limit).all();
}

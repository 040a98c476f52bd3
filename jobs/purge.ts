import { closeDatabase } from '@/db/client';
import { finishJobRun, startJobRun } from '@/db/queries/job-runs';
import { purgeRemovedHomes } from '@/db/queries/removed-homes';
import { environment } from './environment';

/** Deletes for good what was removed more than thirty days ago; how many homes. Leaves a row in job_run. */
export function runPurge(now: Date): number {
  const runId = startJobRun('purge', now);
  const purged = purgeRemovedHomes(now);
  finishJobRun(runId, new Date(), { purged }, null);
  return purged;
}

if (process.argv[1]?.endsWith('jobs/purge.ts')) {
  environment();
  console.log(`Purge: ${runPurge(new Date())} homes deleted for good.`);
  closeDatabase();
}

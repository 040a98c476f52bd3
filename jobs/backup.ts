import { closeSync, fsyncSync, mkdirSync, openSync, readdirSync, renameSync, rmSync } from 'node:fs';
import path from 'node:path';
import { closeDatabase, openSqlite } from '@/db/client';
import { faultOfDatabase } from '@/db/database-file';
import { finishJobRun, startJobRun } from '@/db/queries/job-runs';
import { backupsToKeep } from '@/lib/backup-rotation';
import { environment } from './environment';

/** More pages than a database can have. */
const allPages = 0x7fffffff;

const pattern = /^eavewright-(\d{4})(\d\d)(\d\d)T(\d\d)(\d\d)(\d\d)Z\.db$/;

export const backupName = (at: Date): string => `eavewright-${at.toISOString().slice(0, 19).replace(/[-:]/g, '')}Z.db`;

/** When a backup of this name was made; null for any other file. */
export function instantOf(name: string): Date | null {
  const parts = pattern.exec(name);
  if (!parts) return null;
  const [, year, month, day, hour, minute, second] = parts;
  return new Date(`${year}-${month}-${day}T${hour}:${minute}:${second}Z`);
}

function toDisk(file: string): void {
  const handle = openSync(file, 'r+');
  try {
    fsyncSync(handle);
  } finally {
    closeSync(handle);
  }
}

/** Removes the backups that the rotation does not keep, and nothing else. */
function rotate(folder: string): number {
  const made = readdirSync(folder).flatMap((name) => instantOf(name) ?? []);
  const keep = new Set(backupsToKeep(made).map(backupName));
  const gone = made.map(backupName).filter((name) => !keep.has(name));
  for (const name of gone) rmSync(path.join(folder, name));
  return gone.length;
}

/**
 * Copies the running database into a folder while others write to it, checks the copy, and only then gives it its name:
 * 'eavewright-20261201T060000Z.db'. Older backups go by the rotation. Throws, and leaves no half file under such a name, when
 * anything fails.
 */
export async function backupDatabase(now: Date, source: string, folder: string): Promise<{ file: string; removed: number }> {
  mkdirSync(folder, { recursive: true });
  const file = path.join(folder, backupName(now));
  const part = `${file}.part`;
  const sqlite = openSqlite(source);
  try {
    // All pages in one step: a copy in several would start anew whenever somebody else writes. Writers are not held up by it.
    await sqlite.backup(part, { progress: () => allPages });
    toDisk(part);
    const fault = faultOfDatabase(part);
    if (fault) throw new Error(`The backup is not sound. ${fault}`);
    renameSync(part, file);
    return { file, removed: rotate(folder) };
  } finally {
    sqlite.close();
    for (const ending of ['', '-wal', '-shm', '-journal']) rmSync(`${part}${ending}`, { force: true });
  }
}

/** One backup, with a row in job_run that says how it went. */
export async function runBackup(now: Date): Promise<{ file: string; removed: number }> {
  const { DATABASE_FILE, BACKUP_DIR } = environment();
  const runId = startJobRun('backup', now);
  try {
    const made = await backupDatabase(now, path.resolve(DATABASE_FILE), path.resolve(BACKUP_DIR));
    finishJobRun(runId, new Date(), { backups: 1, removed: made.removed }, null);
    return made;
  } catch (error) {
    finishJobRun(runId, new Date(), {}, error instanceof Error ? error.message : String(error));
    throw error;
  }
}

async function main() {
  const { file, removed } = await runBackup(new Date());
  console.log(`Backup: ${file}, checked; ${removed} older ones removed.`);
  closeDatabase();
}

if (process.argv[1]?.endsWith('jobs/backup.ts')) {
  main().catch((error: unknown) => {
    console.error(error instanceof Error ? error.message : error);
    process.exit(1);
  });
}

import { copyFileSync, existsSync, renameSync, rmSync } from 'node:fs';
import path from 'node:path';
import { faultOfDatabase, isInUse } from '@/db/database-file';
import { migrateDatabase } from '@/db/migrate';
import { backupName } from './backup';
import { environment } from './environment';

/** A database and the files that SQLite keeps beside it. */
const endings = ['', '-wal', '-shm'];

function move(from: string, to: string): void {
  for (const ending of endings) if (existsSync(`${from}${ending}`)) renameSync(`${from}${ending}`, `${to}${ending}`);
}

/** Moves the database out of the way; returns where it is now. */
function setAside(file: string, now: Date): string | null {
  if (!existsSync(file)) return null;
  const aside = path.join(path.dirname(file), `before-restore-${backupName(now)}`);
  move(file, aside);
  return aside;
}

function putBack(keptAt: string | null, file: string): void {
  for (const ending of endings) rmSync(`${file}${ending}`, { force: true });
  if (keptAt) move(keptAt, file);
}

/**
 * Puts a backup in the place of the database and brings it to the newest schema. Refuses a backup that is not sound, and, unless
 * forced, a database that somebody has open. What was there before is kept beside it, and is put back when the restored one cannot be
 * brought to the newest schema. Throws with what to do.
 */
export async function restoreDatabase(backup: string, file: string, now: Date, force = false): Promise<{ keptAt: string | null }> {
  const fault = faultOfDatabase(backup);
  if (fault) throw new Error(`${backup} was not restored. ${fault}`);
  if (!force && isInUse(file)) throw new Error('The database is in use. Stop the application and the scheduler first, or add --force.');
  const part = `${file}.part`;
  try {
    copyFileSync(backup, part);
    const keptAt = setAside(file, now);
    try {
      renameSync(part, file);
      await migrateDatabase(file);
      const after = faultOfDatabase(file);
      if (after) throw new Error(`The restored database is not sound. ${after}`);
    } catch (error) {
      putBack(keptAt, file);
      throw new Error(`${backup} was not restored; what was there before is back in place. ${error instanceof Error ? error.message : String(error)}`, { cause: error });
    }
    return { keptAt };
  } finally {
    rmSync(part, { force: true });
  }
}

async function main() {
  const backup = process.argv.slice(2).find((word) => !word.startsWith('--'));
  if (!backup) throw new Error('Which backup? npm run job:restore -- data/backups/eavewright-….db');
  const file = path.resolve(environment().DATABASE_FILE);
  const { keptAt } = await restoreDatabase(path.resolve(backup), file, new Date(), process.argv.includes('--force'));
  console.log(`Restored ${backup} to ${file}, migrated and checked.${keptAt ? ` What was there before is at ${keptAt}.` : ''}`);
}

if (process.argv[1]?.endsWith('jobs/restore.ts')) {
  main().catch((error: unknown) => {
    console.error(error instanceof Error ? error.message : error);
    process.exit(1);
  });
}

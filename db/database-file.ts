import { existsSync } from 'node:fs';
import Sqlite from 'better-sqlite3';

/** What is wrong with a database file, in one sentence; null when SQLite finds nothing and it is one of ours. */
export function faultOfDatabase(file: string): string | null {
  let sqlite: Sqlite.Database | undefined;
  try {
    sqlite = new Sqlite(file, { readonly: true, fileMustExist: true });
    const checked = sqlite.pragma('integrity_check', { simple: true });
    if (checked !== 'ok') return `Its pages are damaged: ${String(checked).slice(0, 200)}`;
    const broken = sqlite.pragma('foreign_key_check') as unknown[];
    if (broken.length > 0) return `${broken.length} of its rows refer to rows that are not there.`;
    const known = sqlite.prepare("select count(*) from sqlite_master where type = 'table' and name in ('home', 'wall', 'work_record', '__drizzle_migrations')").pluck().get();
    return known === 4 ? null : 'It is not a database of Eavewright.';
  } catch (error) {
    return `It cannot be read: ${error instanceof Error ? error.message : String(error)}`;
  } finally {
    sqlite?.close();
  }
}

/** Whether another process has the database open: an exclusive lock is then refused. */
export function isInUse(file: string): boolean {
  if (!existsSync(file)) return false;
  const sqlite = new Sqlite(file, { timeout: 500 });
  try {
    sqlite.pragma('locking_mode = EXCLUSIVE');
    sqlite.exec('BEGIN EXCLUSIVE; COMMIT;');
    return false;
  } catch {
    return true;
  } finally {
    sqlite.close();
  }
}

import { mkdirSync } from 'node:fs';
import path from 'node:path';
import Sqlite from 'better-sqlite3';
import { type BetterSQLite3Database, drizzle } from 'drizzle-orm/better-sqlite3';
import * as schema from './schema';

export type Database = BetterSQLite3Database<typeof schema>;
type Open = { file: string; sqlite: Sqlite.Database; db: Database };

const holder = globalThis as typeof globalThis & { eavewrightDatabase?: Open };

const wantedFile = () =>
  path.resolve(/* turbopackIgnore: true */ process.cwd(), process.env.DATABASE_FILE || 'data/eavewright.db');

/** Opens a SQLite file with write-ahead log, foreign keys and a busy timeout. */
export function openSqlite(file: string): Sqlite.Database {
  mkdirSync(path.dirname(file), { recursive: true });
  const sqlite = new Sqlite(file);
  sqlite.pragma('busy_timeout = 10000');
  sqlite.pragma('journal_mode = WAL');
  sqlite.pragma('synchronous = FULL');
  sqlite.pragma('foreign_keys = ON');
  return sqlite;
}

function open(): Open {
  const file = wantedFile();
  const current = holder.eavewrightDatabase;
  if (current && current.file === file && current.sqlite.open) return current;
  current?.sqlite.close();
  const sqlite = openSqlite(file);
  return (holder.eavewrightDatabase = { file, sqlite, db: drizzle(sqlite, { schema }) });
}

/** The one connection of this process, opened on first use. Calls inside `transaction` take part in it. */
export const database = (): Database => open().db;

/** Runs synchronous work in one immediate transaction; nested calls join the outer one. */
export function transaction<T>(work: () => T): T {
  const { sqlite } = open();
  if (sqlite.inTransaction) return work();
  return sqlite.transaction(work).immediate();
}

export function closeDatabase(): void {
  holder.eavewrightDatabase?.sqlite.close();
  delete holder.eavewrightDatabase;
}

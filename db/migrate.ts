import path from 'node:path';
import { drizzle } from 'drizzle-orm/better-sqlite3';
import { migrate } from 'drizzle-orm/better-sqlite3/migrator';
import { openSqlite } from './client';
import { loadDotEnv } from './dot-env';
import { loadPostalCodes, postalEdition } from './postal-codes';

/** Brings a database file to the newest schema and loads the postal codes if their edition changed. */
export async function migrateDatabase(file: string): Promise<{ postalCodes: number }> {
  const sqlite = openSqlite(file);
  try {
    migrate(drizzle(sqlite), { migrationsFolder: path.join(process.cwd(), 'db', 'migrations') });
    sqlite.exec('create table if not exists reference_edition (name text primary key, edition text not null)');
    const loaded = sqlite.prepare("select edition from reference_edition where name = 'postal_code'").pluck().get();
    if (loaded === postalEdition) return { postalCodes: 0 };
    const postalCodes = await loadPostalCodes(sqlite);
    sqlite.prepare("insert or replace into reference_edition (name, edition) values ('postal_code', ?)").run(postalEdition);
    return { postalCodes };
  } finally {
    sqlite.close();
  }
}

async function main() {
  loadDotEnv();
  const file = path.resolve(process.cwd(), process.env.DATABASE_FILE || 'data/eavewright.db');
  const { postalCodes } = await migrateDatabase(file);
  console.log(`Database ready: ${file}${postalCodes ? ` (${postalCodes} postal codes loaded)` : ''}`);
}

if (process.argv[1]?.endsWith('db/migrate.ts')) void main();

import { existsSync, mkdirSync, renameSync, rmSync } from 'node:fs';
import path from 'node:path';
import { closeDatabase, openSqlite } from '@/db/client';
import { migrateDatabase } from '@/db/migrate';
import { createHome } from '@/db/queries/homes';
import { changeHome } from '@/db/queries/replan';
import { siteFor } from '@/db/queries/site';
import { addWall } from '@/db/queries/walls';
import { actorOf, insertUser } from '@/tests/fixtures/home';

const folder = path.resolve(import.meta.dirname, '..', '.out');
/** Homes that are due on each of the days from this one on; all other work is far away. */
export const firstDay = '2027-05-15';
export const duePerDay = 500;
export const days = ['2027-05-15', '2027-05-16', '2027-05-17'];
const planned = new Date('2026-12-01T12:00:00Z');

/** One home with two walls, planned as any other, in an otherwise empty database. */
function model(): string {
  const owner = actorOf(insertUser({ email: 'owner0@example.test' }));
  const site = siteFor({ postalCode: '59715' });
  if (!site.found) throw new Error('no place');
  const home = createHome(owner, { name: 'Home 0', postalCode: '59715', ...site.site });
  changeHome(home.id, planned, () => {
    for (const [name, azimuthDeg] of [['South', 180], ['West', 270]] as const) addWall(owner, home.id, { name, azimuthDeg, widthM: 9.1, heightM: 2.7, openings: [], stained: null, caulked: null });
  });
  return home.id;
}

/** How each table's rows are copied for home number `n` (from 1): the columns that differ, as SQL. */
const copies: Record<string, Record<string, string>> = {
  user: { id: "'u' || n", email: "'owner' || n || '@example.test'" },
  home: { id: "'h' || n", name: "'Home ' || n", created_by: "'u' || n", replan_on: 'null' },
  home_member: { home_id: "'h' || n", user_id: "'u' || n", added_by: 'null' },
  wall: { id: "t.id || '-' || n", home_id: "'h' || n" },
  wall_plan: { wall_id: "t.wall_id || '-' || n" },
  work_item: {
    wall_id: "t.wall_id || '-' || n",
    home_id: "'h' || n",
    opens_on: "'2027-05-15'",
    due_on: "'2027-06-10'",
    closes_on: "'2027-08-09'",
    remind_on: `case when t.kind = 'wash' and n <= ${duePerDay * days.length} then date('${firstDay}', '+' || ((n - 1) / ${duePerDay}) || ' days') else '2031-05-15' end`,
  },
};

/** A database of so many homes; made once and kept. */
export async function manyHomes(n: number): Promise<string> {
  const file = path.join(folder, `homes-${n}.db`);
  if (existsSync(file)) return file;
  mkdirSync(folder, { recursive: true });
  const making = `${file}.part`;
  rmSync(making, { force: true });
  await migrateDatabase(making);
  process.env.DATABASE_FILE = making;
  model();
  closeDatabase();
  const sqlite = openSqlite(making);
  sqlite.pragma('synchronous = OFF');
  sqlite.pragma('foreign_keys = OFF');
  sqlite.transaction(() => {
    for (const [table, changed] of Object.entries(copies)) {
      const columns = sqlite.prepare<[], { name: string }>(`pragma table_info(${table})`).all().map((column) => column.name);
      const values = columns.map((column) => changed[column] ?? `t.${column}`);
      sqlite.exec(`create temp table model_${table} as select * from ${table}`);
      sqlite.exec(`with recursive numbers(n) as (select 1 union all select n + 1 from numbers where n < ${n}) insert into ${table} (${columns.join(', ')}) select ${values.join(', ')} from numbers, model_${table} t`);
    }
  })();
  sqlite.pragma('wal_checkpoint(TRUNCATE)');
  sqlite.close();
  renameSync(making, file);
  return file;
}

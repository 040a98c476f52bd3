import { spawn } from 'node:child_process';
import { existsSync, mkdtempSync, readdirSync, readFileSync, rmSync, truncateSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import Sqlite from 'better-sqlite3';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { closeDatabase, database } from '@/db/client';
import { faultOfDatabase } from '@/db/database-file';
import { purgeRemovedHomes, removedHomes } from '@/db/queries/removed-homes';
import { recentJobRuns } from '@/db/queries/job-runs';
import { home, workItem } from '@/db/schema';
import { backupDatabase, backupName, runBackup } from '@/jobs/backup';
import { restoreDatabase } from '@/jobs/restore';
import { setEnvironment } from '@/tests/fixtures/environment';
import { actorOf, insertFourWalls, insertHome, insertMember, insertUser, insertWorkItem } from '@/tests/fixtures/home';
import { useFreshDatabase } from '@/tests/setup/fresh-database';

const fresh = useFreshDatabase();
const root = path.resolve(import.meta.dirname, '..', '..');
const now = new Date('2026-12-01T06:00:00Z');
let folder = '';

beforeEach(() => {
  setEnvironment();
  folder = mkdtempSync(path.join(tmpdir(), 'eavewright-backups-'));
});
afterEach(() => rmSync(folder, { recursive: true, force: true }));

const homesIn = (file: string) => {
  const sqlite = new Sqlite(file, { readonly: true });
  const names = sqlite.prepare('select name from home order by name').pluck().all();
  sqlite.close();
  return names;
};

describe('a backup', () => {
  it('is a checked copy under its instant, and leaves a row that says so', async () => {
    insertHome({ name: 'Kept' });
    process.env.BACKUP_DIR = folder;
    const { file } = await backupDatabase(now, fresh.file(), folder);
    expect(path.basename(file)).toBe('eavewright-20261201T060000Z.db');
    expect(readdirSync(folder)).toEqual(['eavewright-20261201T060000Z.db']);
    expect(faultOfDatabase(file)).toBeNull();
    expect(homesIn(file)).toEqual(['Kept']);
  });

  it('taken while another process writes holds whole transactions without a gap', async () => {
    const writer = spawn(process.execPath, ['--import', 'tsx', path.join('tests', 'fixtures', 'write-process.ts')], { cwd: root, env: process.env });
    const ended = new Promise((resolve) => writer.once('close', resolve));
    try {
      await new Promise<void>((resolve, reject) => {
        writer.stdout.on('data', () => resolve());
        writer.once('close', () => reject(new Error('the writer did not start')));
      });
      const { file } = await backupDatabase(now, fresh.file(), folder);
      expect(faultOfDatabase(file)).toBeNull();
      const copy = new Sqlite(file, { readonly: true });
      const { rows, last } = copy.prepare("select count(*) as rows, max(started_at) as last from job_run where job = 'load'").get() as { rows: number; last: number };
      copy.close();
      expect(last).toBeGreaterThanOrEqual(20);
      expect(rows).toBe(2 * last);
    } finally {
      writer.kill('SIGKILL');
      await ended;
    }
  }, 60_000);

  it('goes by the rotation and touches no other file', async () => {
    writeFileSync(path.join(folder, 'notes.txt'), 'mine');
    for (let day = 0; day < 12; day += 1) writeFileSync(path.join(folder, backupName(new Date(now.getTime() - (day + 1) * 86_400_000))), 'old');
    const { removed } = await backupDatabase(now, fresh.file(), folder);
    const left = readdirSync(folder);
    expect(left).toContain('notes.txt');
    expect(left).toContain(backupName(now));
    expect(removed).toBe(12 - (left.length - 2));
    expect(removed).toBeGreaterThan(0);
  });

  it('that cannot be written leaves no half file', async () => {
    writeFileSync(path.join(folder, 'taken'), 'a file where the folder should be');
    await expect(backupDatabase(now, fresh.file(), path.join(folder, 'taken'))).rejects.toThrow(/EEXIST|ENOTDIR/);
    expect(readdirSync(folder)).toEqual(['taken']);
  });

  it('run by the job is written down', async () => {
    const operator = actorOf(insertUser({ role: 'operator' }));
    process.env.BACKUP_DIR = folder;
    setEnvironment({ BACKUP_DIR: folder });
    await runBackup(now).catch(() => undefined);
    const [run] = recentJobRuns(operator, 1);
    expect(run).toMatchObject({ job: 'backup', error: null, outcome: { backups: 1, removed: 0 } });
  });
});

describe('restoring', () => {
  it('puts the backup in place, migrates it, and keeps what was there', async () => {
    insertHome({ name: 'Before' });
    const { file } = await backupDatabase(now, fresh.file(), folder);
    insertHome({ name: 'Lost since' });
    closeDatabase();
    const { keptAt } = await restoreDatabase(file, fresh.file(), now);
    expect(homesIn(fresh.file())).toEqual(['Before']);
    expect(keptAt && homesIn(keptAt)).toEqual(['Before', 'Lost since']);
    expect(database().select().from(home).all()).toHaveLength(1);
  });

  it('puts back what was there when the backup cannot be brought to the newest schema', async () => {
    const { file } = await backupDatabase(now, fresh.file(), folder);
    const forgetful = new Sqlite(file);
    forgetful.exec('delete from __drizzle_migrations');
    forgetful.close();
    insertHome({ name: 'Standing' });
    closeDatabase();
    await expect(restoreDatabase(file, fresh.file(), now)).rejects.toThrow(/back in place/);
    expect(homesIn(fresh.file())).toEqual(['Standing']);
  });

  it('refuses a damaged or a foreign file, and a database that somebody has open', async () => {
    const { file } = await backupDatabase(now, fresh.file(), folder);
    const damaged = path.join(folder, 'damaged.db');
    writeFileSync(damaged, readFileSync(file));
    truncateSync(damaged, 60_000);
    await expect(restoreDatabase(damaged, fresh.file(), now)).rejects.toThrow(/was not restored/);
    const foreign = path.join(folder, 'foreign.db');
    new Sqlite(foreign).exec('create table other (id)').close();
    await expect(restoreDatabase(foreign, fresh.file(), now)).rejects.toThrow(/not a database of Eavewright/);
    database().select().from(home).all();
    const other = new Sqlite(fresh.file());
    other.prepare('select count(*) from home').get();
    await expect(restoreDatabase(file, fresh.file(), now)).rejects.toThrow(/in use/);
    other.close();
    expect(existsSync(fresh.file())).toBe(true);
  });
});

describe('a removed home', () => {
  const removedFor = (days: number, plusMs = 0) => new Date(now.getTime() - days * 86_400_000 - plusMs);

  it('can be brought back for thirty days by its owner, and is then deleted with everything of it', () => {
    const owner = actorOf(insertUser());
    const young = insertHome({ name: 'Young', archivedAt: removedFor(30, -1) }, owner);
    const old = insertHome({ name: 'Old', archivedAt: removedFor(30) }, owner);
    const standing = insertHome({ name: 'Standing' }, owner);
    insertMember(old, actorOf(insertUser()), 'caretaker');
    const [wall] = insertFourWalls(old);
    if (wall) insertWorkItem(wall);
    expect(removedHomes(owner, now)).toEqual([{ id: young.id, name: 'Young', daysLeft: 1 }]);
    expect(removedHomes(actorOf(insertUser()), now)).toEqual([]);
    expect(purgeRemovedHomes(now)).toBe(1);
    expect(database().select({ id: home.id }).from(home).all().map(({ id }) => id).sort()).toEqual([young.id, standing.id].sort());
    expect(database().select().from(workItem).all()).toEqual([]);
    expect(purgeRemovedHomes(now)).toBe(0);
  });
});

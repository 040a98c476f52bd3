import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { sql } from 'drizzle-orm';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { GET } from '@/app/api/health/route';
import { closeDatabase, database } from '@/db/client';
import { finishJobRun, startJobRun } from '@/db/queries/job-runs';
import { claimMail, enqueueMail, markRefused } from '@/db/queries/mail';
import { setEnvironment } from '@/tests/fixtures/environment';
import { useFreshDatabase } from '@/tests/setup/fresh-database';

vi.mock('@/app/_server/actor', () => ({ currentActor: () => Promise.resolve(null) }));

const fresh = useFreshDatabase();

const folders: string[] = [];
const emptyFolder = () => {
  const folder = mkdtempSync(path.join(tmpdir(), 'eavewright-health-'));
  folders.push(folder);
  return folder;
};

beforeEach(() => {
  setEnvironment();
  vi.useFakeTimers({ now: new Date('2027-05-15T18:00:00Z'), toFake: ['Date'] });
});
afterEach(() => {
  vi.useRealTimers();
  process.env.DATABASE_FILE = fresh.file();
  closeDatabase();
  for (const folder of folders.splice(0)) rmSync(folder, { recursive: true, force: true });
});

async function ask(): Promise<{ status: number; body: unknown }> {
  const response = await GET(new Request('https://eavewright.example/api/health'), { params: Promise.resolve({}) });
  expect(response.headers.get('cache-control')).toBe('no-store');
  return { status: response.status, body: await response.json() };
}

const queue = (key: string) =>
  enqueueMail({ kind: 'shared', idempotencyKey: key, toAddress: 'crew@example.test', props: { homeName: 'Cabin', place: null, byName: 'Ada', membership: 'contractor', url: 'https://eavewright.example/homes/h1' }, now: new Date() });

describe('GET /api/health', () => {
  it('is well with nothing to do', async () => {
    expect(await ask()).toEqual({ status: 200, body: { ok: true, database: 'up', migrations: 'applied', lastReminderRun: null, outbox: { waiting: 0, oldestAgeSeconds: 0 } } });
  });

  it('says how the last reminder run went and what waits, without a word about whom', async () => {
    finishJobRun(startJobRun('reminders', new Date('2027-05-13T09:00:00Z')), new Date('2027-05-13T09:00:05Z'), { mails: 2 }, 'no connection');
    finishJobRun(startJobRun('reminders', new Date('2027-05-14T09:00:00Z')), new Date('2027-05-14T09:00:05Z'), { mails: 2 }, null);
    startJobRun('deliver', new Date('2027-05-15T09:00:00Z'));
    queue('refused');
    for (const claimed of claimMail(new Date(), 1)) markRefused(claimed, '550 no', 'Shared');
    queue('waiting');
    vi.setSystemTime(new Date('2027-05-15T18:10:00Z'));
    const { status, body } = await ask();
    expect([status, body]).toEqual([200, { ok: true, database: 'up', migrations: 'applied', lastReminderRun: { startedAt: '2027-05-14T09:00:00.000Z', ok: true }, outbox: { waiting: 1, oldestAgeSeconds: 600 } }]);
  });

  it('knows a run that failed from one that did not', async () => {
    finishJobRun(startJobRun('reminders', new Date()), new Date(), {}, 'no connection');
    expect((await ask()).body).toMatchObject({ lastReminderRun: { ok: false } });
  });

  it('is a 503 while a migration is missing', async () => {
    database().run(sql`delete from __drizzle_migrations`);
    expect(await ask()).toEqual({ status: 503, body: { ok: false, database: 'up', migrations: 'pending' } });
    process.env.DATABASE_FILE = path.join(emptyFolder(), 'new.db');
    expect(await ask()).toEqual({ status: 503, body: { ok: false, database: 'up', migrations: 'pending' } });
  });

  it('is a 503 when the database cannot be read, and tells nobody why', async () => {
    const file = path.join(emptyFolder(), 'broken.db');
    writeFileSync(file, 'this is not a database, and long enough to be taken for one: '.repeat(40));
    process.env.DATABASE_FILE = file;
    vi.mocked(console.error).mockImplementation(() => undefined);
    expect(await ask()).toEqual({ status: 503, body: { ok: false, database: 'down' } });
    expect(vi.mocked(console.error).mock.calls).toHaveLength(1);
    vi.mocked(console.error).mockClear();
  });
});

import { afterAll, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import { database } from '@/db/client';
import { jobRun } from '@/db/schema';
import { setEnvironment } from '@/tests/fixtures/environment';
import { allMail, insertFourWalls, insertHome, insertUser, insertWorkItem } from '@/tests/fixtures/home';
import { startSmtp, type TestSmtp } from '@/tests/fixtures/smtp';
import { useFreshDatabase } from '@/tests/setup/fresh-database';

vi.mock('@/app/_server/actor', () => ({ currentActor: () => Promise.resolve(null) }));

useFreshDatabase();

let smtp: TestSmtp;
beforeAll(async () => void (smtp = await startSmtp()));
afterAll(() => smtp.stop());

const secret = 'a cron secret of the tests';
const none = { params: Promise.resolve({}) };

/** The route as a server that starts with this environment has it. */
async function route(values: Record<string, string>) {
  vi.resetModules();
  setEnvironment({ SMTP_URL: smtp.url, ...values });
  return import('@/app/api/cron/reminders/route');
}

const request = (authorization?: string) => new Request('https://eavewright.example/api/cron/reminders', { method: 'POST', headers: authorization ? { authorization } : {} });

describe('POST /api/cron/reminders', () => {
  beforeEach(() => {
    vi.useFakeTimers({ now: new Date('2027-05-15T18:00:00Z'), toFake: ['Date'] });
    const walls = insertFourWalls(insertHome({}, insertUser()));
    insertWorkItem({ id: walls[2]?.id ?? '', homeId: walls[2]?.homeId ?? '' }, { remindOn: '2027-05-15' });
    return () => void vi.useRealTimers();
  });

  it('runs for whoever has the secret and answers with the counts', async () => {
    const { POST } = await route({ CRON_SECRET: secret });
    const response = await POST(request(`Bearer ${secret}`), none);
    expect(response.status).toBe(200);
    expect(await response.json()).toMatchObject({ homes: 1, mails: 1, sent: 1, refused: 0 });
    expect(smtp.received).toHaveLength(1);
    expect(database().select().from(jobRun).all()).toHaveLength(1);
    expect(await (await POST(request(`Bearer ${secret}`), none)).json()).toMatchObject({ homes: 0, mails: 0, sent: 0 });
    expect(smtp.received).toHaveLength(1);
  });

  it.each([undefined, 'Bearer wrong', `Basic ${secret}`, secret, 'Bearer ', `Bearer ${secret} `.repeat(2)])('refuses "%s" and runs nothing', async (authorization) => {
    const { POST } = await route({ CRON_SECRET: secret });
    const response = await POST(request(authorization), none);
    expect(response.status).toBe(401);
    expect(response.headers.get('content-type')).toContain('application/problem+json');
    expect([allMail().length, database().select().from(jobRun).all().length]).toEqual([0, 0]);
  });

  it('refuses everybody while no secret is set', async () => {
    const { POST } = await route({ CRON_SECRET: '' });
    for (const authorization of [undefined, 'Bearer ', `Bearer ${secret}`]) expect((await POST(request(authorization), none)).status).toBe(503);
    expect(allMail()).toEqual([]);
  });

  it('is not offered by GET, which a link could call', async () => {
    expect(Object.keys(await route({ CRON_SECRET: secret }))).toEqual(['POST']);
  });
});

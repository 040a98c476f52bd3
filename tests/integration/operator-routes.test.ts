import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { GET } from '@/app/api/operator/mail/route';
import { POST } from '@/app/api/operator/mail/[id]/retry/route';
import { claimMail, enqueueMail, markRefused } from '@/db/queries/mail';
import { type Actor } from '@/lib/permissions';
import { type OutboxPage } from '@/lib/schemas/outbox';
import { setEnvironment } from '@/tests/fixtures/environment';
import { actorOf, allMail, insertUser } from '@/tests/fixtures/home';
import { startSmtp, type TestSmtp } from '@/tests/fixtures/smtp';
import { useFreshDatabase } from '@/tests/setup/fresh-database';

const signedIn = vi.hoisted(() => ({ actor: null as Actor | null }));
vi.mock('@/app/_server/actor', () => ({ currentActor: () => Promise.resolve(signedIn.actor) }));

useFreshDatabase();

let smtp: TestSmtp;
beforeAll(async () => {
  smtp = await startSmtp();
  setEnvironment({ SMTP_URL: smtp.url });
});
afterAll(() => smtp.stop());

const list = (query = '') => GET(new Request(`https://eavewright.example/api/operator/mail${query}`), { params: Promise.resolve({}) });
const retry = (id: string) => POST(new Request(`https://eavewright.example/api/operator/mail/${id}/retry`, { method: 'POST' }), { params: Promise.resolve({ id }) });

const refusedMail = () => {
  const id = enqueueMail({
    kind: 'shared',
    idempotencyKey: 'k',
    toAddress: 'crew@example.test',
    props: { homeName: 'Cabin', place: null, byName: 'Ada', membership: 'contractor', url: 'https://eavewright.example/homes/h1' },
    now: new Date('2027-05-15T18:00:00Z'),
  });
  for (const claimed of claimMail(new Date('2027-05-15T18:00:00Z'), 1)) markRefused(claimed, '550 mailbox full', 'Ada shared Cabin with you');
  return id;
};

describe('the operator’s routes', () => {
  it('answer 401 to nobody and 403 to homeowners and contractors', async () => {
    const id = refusedMail();
    const people: [Actor | null, number][] = [[null, 401], [actorOf(insertUser({ role: 'homeowner' })), 403], [actorOf(insertUser({ role: 'contractor' })), 403]];
    for (const [actor, status] of people) {
      signedIn.actor = actor;
      expect([(await list()).status, (await retry(id)).status]).toEqual([status, status]);
    }
    expect(allMail()[0]?.state).toBe('refused');
  });

  it('list the outbox, filtered by state; a wrong query shows the first page', async () => {
    signedIn.actor = actorOf(insertUser({ role: 'operator' }));
    refusedMail();
    const page = (await (await list('?state=refused')).json()) as OutboxPage;
    expect(page.mails).toMatchObject([{ to: 'crew@example.test', state: 'refused', subject: 'Ada shared Cabin with you', lastError: '550 mailbox full', attempts: 1 }]);
    expect(((await (await list('?state=sent')).json()) as OutboxPage).mails).toEqual([]);
    expect(((await (await list('?state=nonsense&page=-3')).json()) as OutboxPage).mails).toHaveLength(1);
  });

  it('retry a refused mail at once; a second time there is nothing to retry', async () => {
    signedIn.actor = actorOf(insertUser({ role: 'operator' }));
    const id = refusedMail();
    vi.useFakeTimers({ now: new Date('2027-05-16T18:00:00Z'), toFake: ['Date'] });
    const response = await retry(id);
    vi.useRealTimers();
    expect([response.status, await response.json()]).toEqual([200, { state: 'sent' }]);
    expect(smtp.received.map((got) => got.subject)).toEqual(['Ada shared Cabin with you']);
    expect((await retry(id)).status).toBe(409);
    expect((await retry('nothing')).status).toBe(404);
  });
});

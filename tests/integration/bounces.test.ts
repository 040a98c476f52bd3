import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import { database } from '@/db/client';
import { bouncedPeople, recordBounce, sendAgain } from '@/db/queries/bounces';
import { enqueueMail } from '@/db/queries/mail';
import { markVerified } from '@/db/queries/people';
import { recipientsOf } from '@/db/queries/reminder-people';
import { bounce, user } from '@/db/schema';
import { deliverDue } from '@/jobs/deliver';
import { Refused } from '@/lib/permissions';
import { type BounceReport } from '@/lib/mail/bounce-rules';
import { setEnvironment } from '@/tests/fixtures/environment';
import { actorOf, allMail, insertHome, insertUser } from '@/tests/fixtures/home';
import { addresseeOf, startSmtp, type TestSmtp } from '@/tests/fixtures/smtp';
import { useFreshDatabase } from '@/tests/setup/fresh-database';

vi.mock('@/app/_server/actor', () => ({ currentActor: () => Promise.resolve(null) }));
setEnvironment();
useFreshDatabase();

const secret = 'a bounce secret of the tests';
const now = new Date('2027-05-15T18:00:00Z');
const day = 86_400_000;

let smtp: TestSmtp;
beforeAll(async () => void (smtp = await startSmtp()));
afterAll(() => smtp.stop());
beforeEach(() => smtp.received.splice(0));

async function post(body: string, type: string, values: Record<string, string> = { BOUNCE_SECRET: secret }, authorization = `Bearer ${secret}`) {
  vi.resetModules();
  setEnvironment(values);
  const { POST } = await import('@/app/api/mail/bounces/route');
  const response = await POST(new Request('https://eavewright.example/api/mail/bounces', { method: 'POST', body, headers: { 'content-type': type, authorization } }), { params: Promise.resolve({}) });
  return { status: response.status, json: (await response.json()) as unknown };
}
const postJson = (value: unknown) => post(JSON.stringify(value), 'application/json');

const shared = (key: string, to: string) =>
  enqueueMail({ kind: 'shared', idempotencyKey: key, toAddress: to, props: { homeName: 'Cabin', place: null, byName: 'Ada', membership: 'caretaker', url: 'https://eavewright.example/homes/h1' }, now });
const resetLink = (to: string) => enqueueMail({ kind: 'reset', idempotencyKey: `reset:${to}`, toAddress: to, props: { name: null, url: 'https://eavewright.example/reset?token=x', hours: 1 }, now });
const report = (values: Partial<BounceReport>): BounceReport => ({ key: crypto.randomUUID(), messageId: null, address: null, permanent: true, status: '5.1.1', detail: '550 no such user', ...values });
const bouncedAt = (id: string) => database().select().from(user).where(eq(user.id, id)).get()?.bouncedAt ?? null;

const notice = (messageId: string, address: string, action = 'failed', status = '5.1.1') =>
  [
    'From: MAILER-DAEMON@mx.example', 'To: reminders@eavewright.example', 'Message-ID: <notice-1@mx.example>', 'Subject: Not delivered', 'MIME-Version: 1.0',
    'Content-Type: multipart/report; report-type=delivery-status; boundary="b1"', '', '--b1', 'Content-Type: text/plain', '', 'Sorry.', '--b1', 'Content-Type: message/delivery-status', '',
    'Reporting-MTA: dns; mx.example', '', `Final-Recipient: rfc822; ${address}`, `Action: ${action}`, `Status: ${status}`, 'Diagnostic-Code: smtp; 550 5.1.1 no such', ' user', '', '--b1',
    'Content-Type: message/rfc822', '', `Message-ID: ${messageId}`, 'Subject: Cabin', '', 'Hello', '--b1--', '',
  ].join('\r\n');

describe('POST /api/mail/bounces', () => {
  it('fails closed: without a secret for everybody, with one for whoever lacks it', async () => {
    expect((await post('{}', 'application/json', { BOUNCE_SECRET: '' })).status).toBe(503);
    expect((await post('{}', 'application/json', { BOUNCE_SECRET: secret, CRON_SECRET: 'cron secret of the tests' }, 'Bearer cron secret of the tests')).status).toBe(401);
    expect(database().select().from(bounce).all()).toEqual([]);
  });

  it('takes JSON once, finds the person by the mail, and stops what waits, but for links that were asked for', async () => {
    const ada = insertUser({ email: 'ada@example.test' });
    shared('waiting', ada.email);
    shared('other', 'bob@example.test');
    resetLink(ada.email);
    const messageId = allMail().find((row) => row.toAddress === ada.email)?.messageId;
    const body = { id: 'evt-1', messageId, permanent: true, status: '5.1.1', detail: 'no such user' };
    expect(await postJson(body)).toEqual({ status: 200, json: { outcomes: ['stopped'] } });
    expect(await postJson(body)).toEqual({ status: 200, json: { outcomes: ['known'] } });
    expect(database().select().from(bounce).all()).toMatchObject([{ address: ada.email, isPermanent: true, status: '5.1.1', detail: 'no such user' }]);
    expect(bouncedAt(ada.id)).not.toBeNull();
    shared('queued afterwards', ada.email);
    expect(await deliverDue(now, smtp.transport)).toMatchObject({ sent: 2, cancelled: 1 });
    expect(smtp.received.map((got) => [addresseeOf(got), got.subject?.includes('password')]).sort()).toEqual([[ada.email, true], ['bob@example.test', false]]);
    expect(allMail().filter((row) => row.state === 'cancelled').map((row) => row.lastError)).toEqual(['Mail to this address comes back.', 'Mail to this address comes back.']);
  });

  it.each(['message/rfc822', 'text/plain'])('takes a delivery status message as %s, also one that was passed on to an address unknown to us', async (type) => {
    const ada = insertUser({ email: 'ada@example.test' });
    shared('m', ada.email);
    const raw = notice(allMail()[0]?.messageId ?? '', 'forwarded@elsewhere.example');
    expect(await post(raw, type)).toEqual({ status: 200, json: { outcomes: ['stopped'] } });
    expect(await post(raw, type)).toEqual({ status: 200, json: { outcomes: ['known'] } });
    expect(database().select().from(bounce).all()).toMatchObject([{ mailId: allMail()[0]?.id, address: ada.email, status: '5.1.1', detail: '550 5.1.1 no such user' }]);
    expect(bouncedAt(ada.id)).not.toBeNull();
  });

  it('refuses what it cannot read, and keeps a report of an address that nobody has', async () => {
    expect((await post('Subject: hello\r\n\r\nNo report here.', 'text/plain')).status).toBe(422);
    expect((await postJson({ id: 'x', permanent: true })).status).toBe(422);
    expect((await post('{', 'application/json')).status).toBe(400);
    expect(await postJson({ id: 'y', permanent: true, address: 'nobody@example.test' })).toEqual({ status: 200, json: { outcomes: ['nobody'] } });
  });
});

describe('bounces for now', () => {
  it('are noted, and the fifth within fourteen days counts as one for good', () => {
    const ada = insertUser();
    const soft = (days: number) => recordBounce(report({ address: ada.email, permanent: false, status: '4.2.2' }), new Date(now.getTime() + days * day));
    expect([soft(0), soft(10), soft(11), soft(12), soft(15)]).toEqual(['noted', 'noted', 'noted', 'noted', 'noted']);
    expect(bouncedAt(ada.id)).toBeNull();
    expect(soft(16)).toBe('stopped');
    expect(bouncedAt(ada.id)).toEqual(new Date(now.getTime() + 16 * day));
  });
});

describe('a person whose mail comes back', () => {
  it('gets no reminders until the operator lifts it or the address is confirmed again', () => {
    const ada = insertUser();
    const home = insertHome({}, ada);
    const operator = actorOf(insertUser({ role: 'operator' }));
    const stop = () => recordBounce(report({ address: ada.email.toUpperCase() }), now);
    expect([recipientsOf(home.id).length, stop(), recipientsOf(home.id).length]).toEqual([1, 'stopped', 0]);
    expect(bouncedPeople(operator)).toMatchObject({ total: 1, people: [{ email: ada.email, status: '5.1.1', detail: '550 no such user' }] });
    sendAgain(operator, ada.id);
    expect([recipientsOf(home.id).length, bouncedPeople(operator).total]).toEqual([1, 0]);
    stop();
    markVerified(ada.id, now);
    expect(bouncedAt(ada.id)).toBeNull();
  });

  it('is seen and lifted by the operator alone', () => {
    const ada = insertUser();
    for (const actor of [actorOf(ada), actorOf(insertUser({ role: 'contractor' }))]) {
      expect(() => bouncedPeople(actor)).toThrow(Refused);
      expect(() => sendAgain(actor, ada.id)).toThrow(Refused);
    }
  });
});

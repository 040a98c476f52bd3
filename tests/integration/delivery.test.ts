import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { enqueueMail } from '@/db/queries/mail';
import { deliverDue, deliverMail } from '@/jobs/deliver';
import { smtpTransport } from '@/jobs/transport';
import { setEnvironment } from '@/tests/fixtures/environment';
import { allMail } from '@/tests/fixtures/home';
import { addresseeOf, startSmtp, type TestSmtp } from '@/tests/fixtures/smtp';
import { useFreshDatabase } from '@/tests/setup/fresh-database';

setEnvironment();
useFreshDatabase();

const now = new Date('2027-05-15T15:00:00Z');
const minute = 60_000;
const link = 'https://eavewright.example/confirm?token=abc&x=1';

let smtp: TestSmtp;
beforeAll(async () => void (smtp = await startSmtp()));
afterAll(() => smtp.stop());
beforeEach(() => smtp.received.splice(0));
afterEach(() => expect(smtp.answers.splice(0)).toEqual([]));

const enqueue = (key: string, at = now) => enqueueMail({ kind: 'verify', idempotencyKey: key, toAddress: `${key}@example.test`, props: { name: 'Zoë', url: link, hours: 24 }, now: at });
const none = { sent: 0, retried: 0, refused: 0, cancelled: 0, heldUp: 0 };

describe('delivery to a real mail server', () => {
  it('sends subject, HTML, plain text and the stable message id, once', async () => {
    enqueue('zoe');
    expect(await deliverDue(now, smtp.transport)).toEqual({ ...none, sent: 1 });
    expect(await deliverDue(now, smtp.transport)).toEqual(none);
    const [got] = smtp.received;
    const [row] = allMail();
    expect(smtp.received).toHaveLength(1);
    expect(got?.subject).toBe('Confirm your address for Eavewright');
    expect(got?.messageId).toBe(row?.messageId);
    expect(got?.from?.value).toEqual([{ name: 'Eavewright', address: 'reminders@eavewright.example' }]);
    expect(addresseeOf(got)).toBe('zoe@example.test');
    expect(got?.headers.get('auto-submitted')).toBe('auto-generated');
    expect(got?.html).toContain('href="https://eavewright.example/confirm?token=abc&amp;x=1"');
    expect(got?.text?.split('\n')).toContain(link);
    expect(got?.text).toContain('Zoë, somebody');
    expect(row).toMatchObject({ state: 'sent', attempts: 1, subject: 'Confirm your address for Eavewright', props: {} });
  });

  it('sends many, in several rounds', async () => {
    const keys = Array.from({ length: 23 }, (_, i) => `person${i}`);
    for (const key of keys) enqueue(key);
    expect(await deliverDue(now, smtp.transport)).toEqual({ ...none, sent: 23 });
    const to = smtp.received.map(addresseeOf);
    expect(to.sort()).toEqual(keys.map((key) => `${key}@example.test`).sort());
  });

  it.each([{ rcpt: 451 }, { data: 452 }])('tries again later after a 4xx answer (%j)', async (answer) => {
    enqueue('busy');
    smtp.answers.push(answer);
    expect(await deliverDue(now, smtp.transport)).toEqual({ ...none, retried: 1 });
    const [row] = allMail();
    expect(row).toMatchObject({ state: 'queued', attempts: 1 });
    expect(row?.lastError).toContain('as told by the test');
    const wait = (row?.nextAttemptAt.getTime() ?? 0) - now.getTime();
    // One minute ± 25 %, counted from the moment of the answer.
    expect(wait).toBeGreaterThanOrEqual(0.75 * minute);
    expect(wait).toBeLessThan(1.25 * minute + 15_000);
    expect(await deliverDue(new Date(now.getTime() + 0.7 * minute), smtp.transport)).toEqual(none);
    expect(await deliverDue(new Date(now.getTime() + 2 * minute), smtp.transport)).toEqual({ ...none, sent: 1 });
    expect(smtp.received[0]?.messageId).toBe(row?.messageId);
  });

  it.each([{ rcpt: 550 }, { data: 554 }])('stops after a 5xx answer (%j)', async (answer) => {
    enqueue('gone');
    smtp.answers.push(answer);
    expect(await deliverDue(now, smtp.transport)).toEqual({ ...none, refused: 1 });
    expect(allMail()[0]).toMatchObject({ state: 'refused', attempts: 1, props: {} });
    expect(await deliverDue(new Date(now.getTime() + 9e9), smtp.transport)).toEqual(none);
    expect(smtp.received).toEqual([]);
  });

  it('does not blame the recipient when our own address or sign-in is refused', async () => {
    enqueue('innocent');
    smtp.answers.push({ from: 550 });
    expect(await deliverDue(now, smtp.transport)).toEqual({ ...none, heldUp: 1 });
    const soon = (minutes: number) => new Date(now.getTime() + minutes * minute);
    expect(await deliverDue(soon(5), smtpTransport(smtp.url.replace('smtp://', 'smtp://user:password@')))).toEqual({ ...none, heldUp: 1 });
    expect(allMail()[0]).toMatchObject({ state: 'queued', attempts: 0 });
    expect(await deliverDue(soon(15), smtp.transport)).toEqual({ ...none, sent: 1 });
  });

  it('gives up on an address that no mail server could take', async () => {
    enqueueMail({ kind: 'verify', idempotencyKey: 'odd', toAddress: 'nobody\r\n@ex ample', props: { name: null, url: link, hours: 24 }, now });
    expect(await deliverDue(now, smtp.transport)).toEqual({ ...none, refused: 1 });
  });

  it('tries again when the line is cut in the middle of a message', async () => {
    enqueue('cut');
    smtp.answers.push('drop');
    expect(await deliverDue(now, smtp.transport)).toEqual({ ...none, retried: 1 });
    expect(await deliverDue(new Date(now.getTime() + 2 * minute), smtp.transport)).toEqual({ ...none, sent: 1 });
  });

  it('stops after one round when nobody answers, and leaves the rest untouched', async () => {
    for (let i = 0; i < 30; i += 1) enqueue(`person${i}`);
    const { heldUp, ...others } = await deliverDue(now, smtpTransport('smtp://127.0.0.1:1'));
    expect(others).toEqual({ sent: 0, retried: 0, refused: 0, cancelled: 0 });
    expect(heldUp).toBeLessThan(10);
    expect(allMail().filter((row) => row.lastError === null)).toHaveLength(30 - heldUp);
    expect(allMail().every((row) => row.attempts === 0)).toBe(true);
    expect(allMail().every((row) => row.state === 'queued')).toBe(true);
  });

  it('does not let one mail that cannot be written hold up the others', async () => {
    const bad = enqueue('bad');
    enqueue('good');
    const { database } = await import('@/db/client');
    database().run(`update mail set props = '{"url":"javascript:alert(1)","name":null,"hours":1}' where id = '${bad}'`);
    expect(await deliverDue(now, smtp.transport)).toEqual({ ...none, sent: 1, refused: 1 });
    expect(allMail().find((row) => row.id === bad)?.lastError).toContain('could not be written');
  });
});

describe('a mail that somebody waits for', () => {
  it('goes out at once', async () => {
    const id = enqueue('waiting', new Date());
    expect(await deliverMail(id, smtp.transport)).toBe('sent');
    expect(await deliverMail(id, smtp.transport)).toBe('not due');
    expect(smtp.received).toHaveLength(1);
  });

  it('stays in the outbox when the mail server is down, without an error for the page', async () => {
    const id = enqueue('waiting', new Date());
    expect(await deliverMail(id)).toBe('heldUp');
    expect(allMail()[0]).toMatchObject({ state: 'queued', attempts: 0, props: { url: link } });
  });
});

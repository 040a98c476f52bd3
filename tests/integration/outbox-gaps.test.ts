import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { eq } from 'drizzle-orm';
import { database } from '@/db/client';
import { claimMail, enqueueMail, leaseMs, markHeldUp, markRetry, renewLeases } from '@/db/queries/mail';
import { pullInFarTimes } from '@/db/queries/mail-clock';
import { mail } from '@/db/schema';
import { deliverDue } from '@/jobs/deliver';
import { environment } from '@/jobs/environment';
import { smtpPool } from '@/jobs/transport';
import { setEnvironment } from '@/tests/fixtures/environment';
import { allMail } from '@/tests/fixtures/home';
import { addresseeOf, startSmtp, type TestSmtp } from '@/tests/fixtures/smtp';
import { useFreshDatabase } from '@/tests/setup/fresh-database';

setEnvironment({ MAIL_PER_RUN: '3' });
useFreshDatabase();

const now = new Date('2027-05-15T15:00:00Z');
const later = (ms: number) => new Date(now.getTime() + ms);
const minute = 60_000;
const hour = 60 * minute;
const none = { sent: 0, retried: 0, refused: 0, cancelled: 0, heldUp: 0 };

let smtp: TestSmtp;
beforeAll(async () => void (smtp = await startSmtp()));
afterAll(() => smtp.stop());
beforeEach(() => smtp.received.splice(0));
afterEach(() => expect(smtp.answers.splice(0)).toEqual([]));

const shared = (key: string, at = now) =>
  enqueueMail({ kind: 'shared', idempotencyKey: key, toAddress: `${key}@example.test`, props: { homeName: 'Cabin', place: null, byName: 'Ada', membership: 'caretaker', url: 'https://eavewright.example/homes/h1' }, now: at });
const link = (key: string, at = now) => enqueueMail({ kind: 'sign-in', idempotencyKey: key, toAddress: `${key}@example.test`, props: { url: 'https://eavewright.example/in?token=x', hours: 1 }, now: at });
const rowOf = (id: string) => database().select().from(mail).where(eq(mail.id, id)).get();

describe('what one run sends', () => {
  it('ends at its limit; the rest waits untouched, and the oldest comes first', async () => {
    for (const i of [4, 2, 5, 1, 3]) shared(`m${i}`, later(-10 * minute + i * minute));
    expect(await deliverDue(now, smtp.transport)).toEqual({ ...none, sent: 3 });
    expect(smtp.received.map(addresseeOf).sort()).toEqual(['m1@example.test', 'm2@example.test', 'm3@example.test']);
    expect(allMail().filter((row) => row.state === 'queued' && row.attempts === 0 && row.leaseToken === null)).toHaveLength(2);
    expect(await deliverDue(now, smtp.transport)).toEqual({ ...none, sent: 2 });
  });

  it('begins with links that somebody waits for', async () => {
    for (let i = 0; i < 4; i += 1) shared(`old${i}`, later(-hour));
    link('waiting', later(-minute));
    await deliverDue(now, smtp.transport);
    expect(smtp.received.map(addresseeOf)).toContain('waiting@example.test');
  });

  it('has limits that can be set and have plain defaults', () => {
    expect(environment()).toMatchObject({ MAIL_PER_RUN: 3, MAIL_PER_SECOND: 20 });
  });

  it('leaves out a link that has run out while the mail server was down', async () => {
    link('late', later(-2 * hour));
    expect(await deliverDue(now, smtp.transport)).toEqual({ ...none, cancelled: 1 });
    expect(allMail()[0]).toMatchObject({ state: 'cancelled', lastError: 'Its link had run out before it could be sent.', props: {} });
  });
});

describe('trouble of the mail server as a whole', () => {
  // 530 and 535: RFC 4954 §6; 421: RFC 5321 §4.2.2; 521: RFC 7504.
  it.each([{ rcpt: 530 }, { data: 530 }, { rcpt: 421 }, { from: 550 }, { from: 451 }, { rcpt: 521 }])('refuses no mail and uses up no try (%j)', async (answer) => {
    const id = shared('one');
    for (let turn = 0; turn < 3; turn += 1) {
      smtp.answers.push(answer);
      expect(await deliverDue(later(turn * 2 * hour), smtp.transport)).toEqual({ ...none, heldUp: 1 });
    }
    expect(rowOf(id)).toMatchObject({ state: 'queued', attempts: 0 });
    expect(await deliverDue(later(60 * hour), smtp.transport)).toEqual({ ...none, sent: 1 });
    expect(smtp.received[0]?.messageId).toBe(rowOf(id)?.messageId);
  });

  it('is told apart from a mail that is too large', async () => {
    shared('large');
    smtp.answers.push({ from: 552 });
    expect(await deliverDue(now, smtp.transport)).toEqual({ ...none, refused: 1 });
  });

  it('is told apart by a pool of connections as well, which sends nothing again by itself', async () => {
    const pool = smtpPool(smtp.url);
    shared('cut');
    smtp.answers.push('drop');
    expect(await deliverDue(now, pool)).toEqual({ ...none, retried: 1 });
    expect(rowOf(allMail()[0]?.id ?? '')?.attempts).toBe(1);
    expect(await deliverDue(later(2 * minute), pool)).toEqual({ ...none, sent: 1 });
    pool.close?.();
  });
});

describe('a lease', () => {
  it('that is renewed keeps the mail from others for as long as its holder lives', () => {
    shared('slow');
    const held = claimMail(now, 1);
    for (let at = 0; at < 5; at += 1) {
      renewLeases(held, later(at * (leaseMs - minute)));
      expect(claimMail(later((at + 1) * (leaseMs - minute)), 1)).toEqual([]);
    }
    expect(claimMail(later(4 * (leaseMs - minute) + leaseMs), 1)).toHaveLength(1);
  });
});

describe('a clock that was set back', () => {
  it.each([hour, 24 * hour])('by %d ms does not stall what waits', (back) => {
    const fresh = shared('fresh');
    const tried = shared('tried');
    const heldUp = shared('held up');
    for (const claimed of claimMail(now, 3).filter((one) => one.id !== fresh)) {
      if (claimed.id === tried) markRetry(claimed, '451 not now', now, 0.5);
      else markHeldUp(claimed, 'connection refused', now, 0.5);
    }
    database().update(mail).set({ state: 'queued', leaseToken: null, leaseUntil: null }).where(eq(mail.id, fresh)).run();
    const then = later(-back);
    pullInFarTimes(then);
    expect(claimMail(then, 9).map((one) => one.id)).toContain(fresh);
    // What has been tried waits no longer than a rule could have made it wait.
    for (const id of [tried, heldUp]) expect((rowOf(id)?.nextAttemptAt.getTime() ?? 0) - then.getTime()).toBeLessThanOrEqual(76 * minute);
  });

  it('lets a claim of somebody who died run out, and one of somebody who lives stay', () => {
    shared('dead');
    claimMail(now, 1);
    const then = later(-24 * hour);
    pullInFarTimes(then);
    expect(claimMail(then, 1)).toEqual([]);
    const ended = new Date(then.getTime() + leaseMs);
    expect(claimMail(ended, 1)).toHaveLength(1);

    database().delete(mail).run();
    shared('alive');
    const alive = claimMail(now, 9);
    expect(alive).toHaveLength(1);
    for (let turn = 0; turn < 4; turn += 1) {
      const at = later(-24 * hour + turn * (leaseMs - minute));
      pullInFarTimes(at);
      expect(claimMail(at, 9).map((one) => one.id)).not.toContain(alive[0]?.id);
      renewLeases(alive, later(turn * (leaseMs - minute)));
    }
  });

  it('leaves ordinary waits alone', () => {
    shared('ordinary');
    for (const claimed of claimMail(now, 1)) markRetry(claimed, '451 not now', now, 1);
    expect(pullInFarTimes(later(1000))).toBe(0);
  });
});

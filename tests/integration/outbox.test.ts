import { eq } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { database } from '@/db/client';
import { claimMail, type ClaimedMail, dueMails, enqueueMail, leaseMs, markRefused, markRetry, markSent } from '@/db/queries/mail';
import { listDeliveries, listMails, mailsPerPage, oneMail, retryMail } from '@/db/queries/mail-view';
import { mail } from '@/db/schema';
import { mostAttempts } from '@/lib/mail/back-off';
import { Refused } from '@/lib/permissions';
import { roles, type Role } from '@/lib/schemas/vocabulary';
import { actorOf, allMail, insertUser } from '@/tests/fixtures/home';
import { planOf } from '@/tests/fixtures/query-plan';
import { runScript } from '@/tests/fixtures/run-script';
import { useFreshDatabase } from '@/tests/setup/fresh-database';

useFreshDatabase();

const now = new Date('2027-05-15T15:00:00Z');
const later = (ms: number) => new Date(now.getTime() + ms);
const minute = 60_000;

const enqueue = (key: string, at = now) =>
  enqueueMail({ kind: 'sign-in', idempotencyKey: key, toAddress: `${key}@example.test`, props: { url: `https://eavewright.example/in?token=${key}`, hours: 1 }, now: at });

const only = (claimed: ClaimedMail[]): ClaimedMail => {
  expect(claimed).toHaveLength(1);
  return claimed[0] as ClaimedMail;
};
const rowOf = (id: string) => database().select().from(mail).where(eq(mail.id, id)).get();

describe('the outbox', () => {
  it('makes one mail of two requests with the same key', () => {
    const first = enqueue('once');
    expect(enqueue('once')).toBe(first);
    expect(allMail()).toHaveLength(1);
  });

  it('gives each mail a message id of its own that stays through every attempt', () => {
    const ids = [enqueue('a'), enqueue('b')];
    const before = ids.map((id) => rowOf(id)?.messageId);
    expect(new Set(before).size).toBe(2);
    for (const claimed of claimMail(now, 5)) markRetry(claimed, 'later please', now, 0.5);
    expect(claimMail(later(10 * minute), 5).map((one) => one.messageId).sort()).toEqual([...before].sort());
  });

  it('refuses props that do not fit the kind', () => {
    expect(() => enqueueMail({ kind: 'sign-in', idempotencyKey: 'x', toAddress: 'x@example.test', props: { url: 'nonsense', hours: 1 } })).toThrow();
    expect(allMail()).toHaveLength(0);
  });
});

describe('a claim', () => {
  it('takes what is due, oldest first, and nobody gets it again while the lease runs', () => {
    const third = enqueue('third', later(-1 * minute));
    const first = enqueue('first', later(-3 * minute));
    enqueue('not yet', later(1));
    const second = enqueue('second', later(-2 * minute));
    expect(claimMail(now, 2).map((one) => one.id)).toEqual([first, second]);
    expect(claimMail(now, 2).map((one) => one.id)).toEqual([third]);
    expect(claimMail(now, 2)).toEqual([]);
  });

  it('of a process that died is free again when its lease has run out', () => {
    const id = enqueue('left behind');
    const dead = only(claimMail(now, 1));
    expect(claimMail(later(leaseMs - 1), 1)).toEqual([]);
    const taken = only(claimMail(later(leaseMs), 1));
    // A try that never had an answer is not counted.
    expect([taken.id, taken.attempts]).toEqual([id, 1]);
    // The first holder comes back too late: its word does not count.
    expect(markSent(dead, 'Subject', later(leaseMs))).toBe(false);
    expect(rowOf(id)?.state).toBe('sending');
    expect(markSent(taken, 'Subject', later(leaseMs))).toBe(true);
    expect(rowOf(id)).toMatchObject({ state: 'sent', subject: 'Subject', sentAt: later(leaseMs), leaseToken: null });
  });

  it('by id takes that mail only, and only when it is due', () => {
    enqueue('other');
    const wanted = enqueue('wanted');
    expect(only(claimMail(now, 1, wanted)).id).toBe(wanted);
    expect(claimMail(now, 1, wanted)).toEqual([]);
  });

  it('is never shared by two processes on the same file', async () => {
    const ids = Array.from({ length: 120 }, (_, i) => enqueue(`mail-${i}`));
    const bites = await Promise.all([runScript('claim-process.ts', now.toISOString()), runScript('claim-process.ts', now.toISOString())]);
    const claimed = bites.map((printed) => JSON.parse(printed) as string[]);
    expect(claimed.flat().sort()).toEqual([...ids].sort());
  });

  it('reads the index of open mails, not the whole table', () => {
    expect(planOf(dueMails(now, 4))).toContainEqual(expect.stringMatching(/^SEARCH mail USING INDEX mail_open/));
  });
});

describe('what becomes of a mail', () => {
  it('waits longer after each failure and is given up after the last attempt', () => {
    const id = enqueue('never');
    let at = now;
    for (let attempt = 1; attempt <= mostAttempts; attempt += 1) {
      const outcome = markRetry(only(claimMail(at, 1)), '451 not now', at, 0.5);
      expect(outcome).toBe(attempt < mostAttempts ? 'queued' : 'refused');
      const row = rowOf(id);
      if (outcome === 'queued') {
        expect(row?.nextAttemptAt.getTime()).toBe(at.getTime() + Math.min(minute * 2 ** (attempt - 1), 360 * minute));
        expect(claimMail(new Date((row?.nextAttemptAt.getTime() ?? 0) - 1), 1)).toEqual([]);
        at = row?.nextAttemptAt ?? at;
      } else {
        expect(row?.lastError).toBe('Given up after 20 attempts. Last: 451 not now');
      }
    }
    expect(claimMail(later(365 * 24 * 60 * minute), 1)).toEqual([]);
  });

  it('loses its secret link once it is sent or given up, but keeps it while it waits', () => {
    const [sent, refused, waiting] = ['sent', 'refused', 'waiting'].map((key) => enqueue(key));
    for (const claimed of claimMail(now, 3)) {
      if (claimed.id === sent) markSent(claimed, 'Subject', now);
      if (claimed.id === refused) markRefused(claimed, '550 no such person');
      if (claimed.id === waiting) markRetry(claimed, '451 not now', now, 0.5);
    }
    expect(rowOf(sent ?? '')?.props).toEqual({});
    expect(rowOf(refused ?? '')?.props).toEqual({});
    expect(rowOf(waiting ?? '')?.props).toMatchObject({ url: 'https://eavewright.example/in?token=waiting' });
  });
});

describe('the operator', () => {
  const operator = () => actorOf(insertUser({ role: 'operator' }));

  it('sees mails newest first, in pages, with the counts of each state', () => {
    const actor = operator();
    for (let i = 0; i < mailsPerPage + 2; i += 1) enqueue(`m${i}`, later(i * 1000));
    const first = listMails(actor, 1);
    expect([first.mails.length, first.pages, first.counts.queued]).toEqual([mailsPerPage, 2, mailsPerPage + 2]);
    expect(first.mails[0]?.toAddress).toBe(`m${mailsPerPage + 1}@example.test`);
    expect(listMails(actor, 2).mails.map((row) => row.toAddress)).toEqual(['m1@example.test', 'm0@example.test']);
    expect(listMails(actor, 99).page).toBe(2);
    expect(listMails(actor, 1, 'sent')).toMatchObject({ mails: [], pages: 1 });
  });

  it('never sees what a mail is written from: it may hold a link to sign in', () => {
    const id = enqueue('secret');
    expect(JSON.stringify([listMails(operator(), 1), oneMail(operator(), id)])).not.toContain('token=');
  });

  it('retries a waiting mail at once and a refused one from the beginning, but not one without its link', () => {
    const actor = operator();
    const waiting = enqueue('waiting');
    markRetry(only(claimMail(now, 1)), '451 not now', now, 0.5);
    expect(claimMail(now, 1)).toEqual([]);
    expect(retryMail(actor, waiting, now)).toEqual({ retried: true });
    const again = only(claimMail(now, 1));
    expect([again.id, again.attempts]).toEqual([waiting, 1]);
    markRefused(again, '550 no such person');
    expect(retryMail(actor, waiting, now)).toMatchObject({ retried: false });

    const shared = enqueueMail({
      kind: 'shared',
      idempotencyKey: 'shared',
      toAddress: 'crew@example.test',
      props: { homeName: 'Cabin', place: null, byName: 'Ada', membership: 'contractor', url: 'https://eavewright.example/homes/h1' },
      now,
    });
    markRefused(only(claimMail(now, 1)), '550 mailbox full');
    expect(retryMail(actor, shared, now)).toEqual({ retried: true });
    markSent(only(claimMail(now, 1)), 'Subject', now);
    expect(retryMail(actor, shared, now)).toMatchObject({ retried: false, why: expect.stringContaining('sent') as string });
  });

  it('alone may look and retry', () => {
    const id = enqueue('private');
    for (const role of (Object.keys(roles) as Role[]).filter((one) => one !== 'operator')) {
      const actor = actorOf(insertUser({ role }));
      for (const attempt of [() => listMails(actor, 1), () => listDeliveries(actor, [id]), () => oneMail(actor, id), () => retryMail(actor, id, now)]) {
        expect(attempt).toThrow(Refused);
        expect(attempt).toThrow(/not allowed/);
      }
    }
    expect(() => oneMail(operator(), 'nothing')).toThrow(/not found/);
    expect(() => retryMail(operator(), 'nothing', now)).toThrow(/not found/);
  });
});

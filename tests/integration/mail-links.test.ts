import fc from 'fast-check';
import { eq } from 'drizzle-orm';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { database } from '@/db/client';
import { mailActions, readLink, signLink } from '@/db/queries/mail-links';
import { homesToRemind } from '@/db/queries/reminders';
import { resumeHome, stopHome, stoppedHomes } from '@/db/queries/reminder-stops';
import { home, homeMember, reminderStop, workItem } from '@/db/schema';
import { unsubscribeHeaders } from '@/jobs/unsubscribe';
import { runReminders } from '@/jobs/reminders';
import { workKey } from '@/lib/care/work-key';
import { setEnvironment } from '@/tests/fixtures/environment';
import { actorOf, allDeliveries, allMail, insertFourWalls, insertHome, insertUser, insertWorkItem } from '@/tests/fixtures/home';
import { useFreshDatabase } from '@/tests/setup/fresh-database';

vi.mock('@/app/_server/actor', () => ({ currentActor: () => Promise.resolve(null) }));
vi.mock('next/headers', () => ({ headers: () => Promise.resolve(new Headers()) }));

setEnvironment();
useFreshDatabase();

const now = new Date('2027-05-15T18:00:00Z');

describe('a signed link', () => {
  const link = { action: 'log', userId: 'u', homeId: 'h', workKey: 'w:restain:2027-05-15', expiresAt: new Date('2027-05-29T18:00:00Z') } as const;

  it('reads back as it was signed, until it runs out', () => {
    fc.assert(
      fc.property(fc.constantFrom(...mailActions), fc.string(), fc.string(), fc.string(), (action, userId, homeId, key) => {
        const one = { action, userId, homeId, workKey: key, expiresAt: null };
        expect(readLink(signLink(one), now)).toEqual(one);
      }),
    );
    expect(readLink(signLink(link), new Date('2027-05-29T17:59:59Z'))).toEqual(link);
    expect(readLink(signLink(link), link.expiresAt)).toBe('expired');
  });

  it('is wrong when any letter of it is changed', () => {
    const token = signLink(link);
    fc.assert(
      fc.property(fc.nat(token.length - 1), fc.constantFrom('A', 'q', '7', '.', '-'), (at, letter) => {
        fc.pre(token[at] !== letter);
        const changed = token.slice(0, at) + letter + token.slice(at + 1);
        // The last letter of base64url holds spare bits: another one may stand for the same signature.
        if (at < token.length - 1) expect(readLink(changed, now)).toBe('wrong');
      }),
    );
    for (const none of ['', '.', 'a.b', `${token}.x`]) expect(readLink(none, now)).toBe('wrong');
  });

  it('is wrong under another secret', () => {
    const token = signLink(link);
    vi.stubEnv('NEXTAUTH_SECRET', 'another secret of the tests, 32 characters');
    expect(readLink(token, now)).toBe('wrong');
    vi.unstubAllEnvs();
  });
});

function springHome() {
  const owner = insertUser({ name: 'Ada' });
  const place = insertHome({ name: 'Spring Creek' }, owner);
  const items = insertFourWalls(place).slice(2).map((one) => insertWorkItem(one, { remindOn: '2027-05-15' }));
  return { owner, place, items };
}

const member = (homeId: string) => database().select().from(homeMember).where(eq(homeMember.homeId, homeId)).get();

describe('the unsubscribe address', () => {
  let spring: ReturnType<typeof springHome>;
  let url: string;
  beforeEach(() => {
    spring = springHome();
    url = /^<(.+)>$/.exec(unsubscribeHeaders({ kind: 'reminder', userId: spring.owner.id, homeId: spring.place.id }, 'https://eavewright.example')['List-Unsubscribe'] ?? '')?.[1] ?? '';
  });
  const call = async (method: 'GET' | 'POST', token: string, body?: string) => {
    const route = await import('@/app/api/mail/unsubscribe/[token]/route');
    const request = new Request(url, { method, ...(body === undefined ? {} : { body, headers: { 'content-type': 'application/x-www-form-urlencoded' } }) });
    return route[method](request, { params: Promise.resolve({ token }) });
  };
  const token = () => url.split('/').at(-1) ?? '';

  it('is on reminders only', () => {
    expect(url).toMatch(/^https:\/\/eavewright\.example\/api\/mail\/unsubscribe\/[\w.-]+$/);
    expect(unsubscribeHeaders({ kind: 'verify', userId: 'u', homeId: 'h' }, 'https://eavewright.example')).toEqual({});
  });

  it('changes nothing when it is opened', async () => {
    const answer = await call('GET', token());
    expect([answer.status, answer.headers.get('location'), answer.headers.get('referrer-policy')]).toEqual([303, `https://eavewright.example/do/${token()}`, 'no-referrer']);
    expect(member(spring.place.id)?.remindersStoppedAt).toBeNull();
  });

  it('stops the reminders of that home with one click, once and for all', async () => {
    expect((await call('POST', token(), 'List-Unsubscribe=One-Click')).status).toBe(200);
    const first = member(spring.place.id)?.remindersStoppedAt;
    expect(first).toBeInstanceOf(Date);
    expect((await call('POST', token(), 'List-Unsubscribe=One-Click')).status).toBe(200);
    expect(member(spring.place.id)?.remindersStoppedAt).toEqual(first);
    expect(await runReminders(now, { deliver: false })).toMatchObject({ mails: 0 });
  });

  it('does nothing for another body, a wrong token, or the token of a piece of work', async () => {
    const other = signLink({ action: 'stop', userId: spring.owner.id, homeId: spring.place.id, workKey: 'x', expiresAt: null });
    expect((await call('POST', token(), 'hello')).status).toBe(422);
    expect((await call('POST', `${token()}x`, 'List-Unsubscribe=One-Click')).status).toBe(404);
    expect((await call('POST', other, 'List-Unsubscribe=One-Click')).status).toBe(404);
    expect(member(spring.place.id)?.remindersStoppedAt).toBeNull();
  });
});

describe('stopped reminders', () => {
  it('of a home are listed and can be taken up again', async () => {
    const { owner, place } = springHome();
    stopHome(owner.id, place.id, now);
    expect(stoppedHomes(actorOf(owner))).toEqual([{ id: place.id, name: 'Spring Creek' }]);
    resumeHome(actorOf(owner), place.id);
    database().update(workItem).set({ remindOn: '2027-05-15' }).run();
    expect(await runReminders(now, { deliver: false })).toMatchObject({ mails: 1, deliveries: 2 });
  });

  it('of one piece of work leave the rest', async () => {
    const { owner, place, items } = springHome();
    const [item] = items;
    if (!item) throw new Error('no item');
    database().insert(reminderStop).values({ userId: owner.id, homeId: place.id, wallId: item.wallId, kind: item.kind, workKey: workKey(item) }).run();
    expect(await runReminders(now, { deliver: false })).toMatchObject({ mails: 1, deliveries: 1 });
    expect(allDeliveries().map((one) => one.wallId)).not.toContain(item.wallId);
    expect(allMail()).toHaveLength(1);
  });
});

function southOf(place: Parameters<typeof insertFourWalls>[0]) {
  const wall = insertFourWalls(place)[2];
  if (!wall) throw new Error('no wall');
  return wall;
}

describe('the morning at the home', () => {
  // Clock changes as in the tz database: America/Denver 2027-03-14 and 2027-11-07 at 2:00; Arizona and Hawaii keep one time all year.
  it.each([
    ['America/Denver', '2027-03-14', '2027-03-14T13:00:00Z'],
    ['America/Denver', '2027-11-07', '2027-11-07T14:00:00Z'],
    ['America/Phoenix', '2027-03-14', '2027-03-14T14:00:00Z'],
    ['Pacific/Honolulu', '2027-11-07', '2027-11-07T17:00:00Z'],
  ])('%s on %s begins at %s', (timeZone, day, at) => {
    const place = insertHome({ timeZone }, insertUser());
    insertWorkItem(southOf(place), { remindOn: day });
    const from = new Date(at);
    expect(homesToRemind(new Date(from.getTime() - 1000))).toEqual([]);
    expect(homesToRemind(from)).toEqual([{ homeId: place.id, today: day }]);
  });

  it.each(['America/Denver', 'America/Phoenix', 'Pacific/Honolulu'])('%s: one mail around each clock change, whenever the job runs', async (timeZone) => {
    for (const day of ['2027-03-14', '2027-11-07']) {
      const place = insertHome({ timeZone }, insertUser());
      insertWorkItem(southOf(place), { remindOn: day, opensOn: day });
      const start = Date.parse(`${day}T00:00:00Z`) - 12 * 3_600_000;
      for (let hour = 0; hour < 60; hour += 1) await runReminders(new Date(start + hour * 3_600_000), { deliver: false });
      expect(allMail().filter((mail) => mail.homeId === place.id)).toHaveLength(1);
      database().delete(home).run();
    }
  });
});

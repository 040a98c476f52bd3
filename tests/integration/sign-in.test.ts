import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, beforeEach, describe, expect, test, vi } from 'vitest';
import { database } from '@/db/client';
import { activePerson, endSessions, personByEmail, setPassword } from '@/db/queries/people';
import { mail, user, verificationToken } from '@/db/schema';
import { setEnvironment } from '@/tests/fixtures/environment';
import { actorOf, insertUser } from '@/tests/fixtures/home';
import { startSmtp, type TestSmtp } from '@/tests/fixtures/smtp';
import { faultIn, newVisitor, type SessionBody } from '@/tests/fixtures/visitor';
import { useFreshDatabase } from '@/tests/setup/fresh-database';

const request = vi.hoisted(() => ({ later: [] as (() => unknown)[], said: '', sender: '10.0.0.1' }));
vi.mock('next/headers', () => ({
  headers: () => Promise.resolve(new Headers({ 'x-forwarded-for': request.sender })),
  cookies: () => Promise.resolve({ set: (_: string, words: string) => void (request.said = words) }),
}));
vi.mock('next/server', () => ({ after: (work: () => unknown) => void request.later.push(work) }));

useFreshDatabase();

let smtp: TestSmtp;
beforeAll(async () => void (smtp = await startSmtp()));
afterAll(() => smtp.stop());
beforeEach(() => {
  vi.resetModules();
  delete (globalThis as { eavewrightLimits?: unknown }).eavewrightLimits;
  setEnvironment({ SMTP_URL: smtp.url });
  Object.assign(request, { later: [], said: '', sender: '10.0.0.1' });
  smtp.received.length = 0;
});

const visitor = async (sender?: string) => newVisitor((await import('@/app/_server/auth')).authOptions, sender);
const hashed = async (password: string) => (await import('@/app/_server/password')).hashPassword(password);
const deliverAll = async () => {
  for (const work of request.later.splice(0)) await work();
};
const linkInMail = () => new URL(/https:\/\/eavewright\.example\/sign-in\/link\?\S+/.exec(smtp.received.at(-1)?.text ?? '')?.[0] ?? 'none:');
const actorIn = (session: SessionBody) => activePerson(session.user?.id ?? '', session.signedInAt ?? 0);

describe('with a password', () => {
  test('the right one makes a session of that person; the address may be typed in capitals and with spaces', async () => {
    const person = insertUser({ passwordHash: await hashed('right words here') });
    const browser = await visitor();
    expect(faultIn(await browser.signIn(` ${person.email.toUpperCase()} `, 'right words here'))).toBeNull();
    const session = await browser.session();
    expect(session).toMatchObject({ user: { id: person.id }, signedInAt: expect.any(Number) as number });
    expect(JSON.stringify(session)).not.toContain('argon2');
    expect(actorIn(session)).toEqual(actorOf(person));
  });

  test('a wrong one, an unknown address and an account without a password get the same answer and no session', async () => {
    const person = insertUser({ passwordHash: await hashed('right words here') });
    const byLinkOnly = insertUser();
    const browser = await visitor();
    for (const [email, password] of [[person.email, 'wrong words here'], ['nobody@example.test', 'right words here'], [byLinkOnly.email, 'right words here'], ['no address', 'x']] as const) {
      expect(faultIn(await browser.signIn(email, password))).toBe('wrong');
    }
    expect(await browser.session()).toEqual({});
  });

  test('without the form’s own token (a form on another site) nobody is signed in', async () => {
    const person = insertUser({ passwordHash: await hashed('right words here') });
    const browser = await visitor();
    const answer = await browser.signIn(person.email, 'right words here', '/start', { csrfToken: 'made up' });
    expect(answer.to?.searchParams.get('csrf')).toBe('true');
    expect(await browser.session()).toEqual({});
  });

  test('before the address is confirmed it works too', async () => {
    const person = insertUser({ emailVerified: null, passwordHash: await hashed('right words here') });
    const browser = await visitor();
    await browser.signIn(person.email, 'right words here');
    expect(actorIn(await browser.session())).toMatchObject({ id: person.id });
    expect(personByEmail(person.email)?.emailVerified).toBeNull();
  });

  test('composed and decomposed letters are the same password', async () => {
    const person = insertUser({ passwordHash: await hashed('Tj\u00e4rnvik vid sj\u00f6n') });
    expect(faultIn(await (await visitor()).signIn(person.email, 'Tja\u0308rnvik vid sjo\u0308n'))).toBeNull();
  });
});

describe('too many tries', () => {
  test('after ten failures an account has to wait, even with the right password; another account does not', async () => {
    const person = insertUser({ passwordHash: await hashed('right words here') });
    const other = insertUser({ passwordHash: await hashed('right words here') });
    const browser = await visitor();
    for (let n = 0; n < 10; n += 1) expect(faultIn(await browser.signIn(person.email, 'wrong words here'))).toBe('wrong');
    expect(faultIn(await browser.signIn(person.email, 'right words here'))).toMatch(/^wait:1[0-5]$/);
    expect(faultIn(await browser.signIn(other.email, 'right words here'))).toBeNull();
  });

  test('only failures count, for the account and for the sender', async () => {
    const person = insertUser({ passwordHash: await hashed('right words here') });
    const browser = await visitor();
    for (let n = 0; n < 12; n += 1) expect(faultIn(await browser.signIn(person.email, 'right words here'))).toBeNull();
    const { startTry, tryWorked } = await import('@/app/_server/attempts');
    for (let n = 0; n < 70; n += 1) {
      expect(await startTry(`person${n}`, '10.0.0.1')).toBe(0);
      await tryWorked(`person${n}`, '10.0.0.1');
    }
  });

  test('after sixty failures on any accounts a sender has to wait, whatever it claims to be; another sender does not', async () => {
    const { startTry } = await import('@/app/_server/attempts');
    for (let n = 0; n < 59; n += 1) expect(await startTry(`guess${n}`, '203.0.113.9')).toBe(0);
    const fault = async (sender: string, email: string) => faultIn(await (await visitor(sender)).signIn(email, 'wrong words here'));
    expect(await fault('203.0.113.9', 'a@example.test')).toBe('wrong');
    expect(await fault('203.0.113.9', 'b@example.test')).toMatch(/^wait:/);
    expect(await fault('198.51.100.2, 203.0.113.9', 'c@example.test')).toMatch(/^wait:/);
    expect(await fault('203.0.113.10', 'd@example.test')).toBe('wrong');
  });

  test('a sixth link to one address within a quarter of an hour is refused', async () => {
    const browser = await visitor();
    for (let n = 0; n < 5; n += 1) expect(faultIn(await browser.askForLink('new@example.test'))).toBeNull();
    expect(faultIn(await browser.askForLink('NEW@example.test'))).toBe('AccessDenied');
    expect(faultIn(await browser.askForLink('other@example.test'))).toBeNull();
  });
});

describe('with an e-mailed link', () => {
  test('an unknown address becomes a homeowner with a confirmed address; the link works once', async () => {
    const browser = await visitor();
    expect(faultIn(await browser.askForLink(' New@Example.test ', '/homes/new'))).toBeNull();
    await deliverAll();
    expect(smtp.received).toHaveLength(1);
    const link = linkInMail();
    expect(link.pathname).toBe('/sign-in/link');
    expect((await browser.openLink(link)).to?.pathname).toBe('/homes/new');
    expect(actorIn(await browser.session())).toMatchObject({ email: 'new@example.test', role: 'homeowner' });
    expect(personByEmail('new@example.test')).toMatchObject({ emailVerified: expect.any(Date) as Date, passwordHash: null });

    const second = await visitor();
    expect(faultIn(await second.openLink(link))).toBe('Verification');
    expect(await second.session()).toEqual({});
  });

  test('the secret is stored nowhere once the mail is out', async () => {
    await (await visitor()).askForLink('new@example.test');
    await deliverAll();
    const secret = linkInMail().searchParams.get('token') ?? 'none';
    expect(secret.length).toBeGreaterThan(30);
    expect(JSON.stringify([database().select().from(mail).all(), database().select().from(verificationToken).all()])).not.toContain(secret);
  });

  test('a link that has expired, or is for another address, is refused', async () => {
    insertUser({ email: 'other@example.test' });
    const browser = await visitor();
    await browser.askForLink('new@example.test');
    await deliverAll();
    const link = linkInMail();
    const forOther = new URL(link);
    forOther.searchParams.set('email', 'other@example.test');
    expect(faultIn(await browser.openLink(forOther))).toBe('Verification');
    database().update(verificationToken).set({ expires: new Date(Date.now() - 1000) }).run();
    expect(faultIn(await browser.openLink(link))).toBe('Verification');
    expect(personByEmail('new@example.test')).toBeUndefined();
  });

  test('works beside a password on a confirmed account, and leaves the password', async () => {
    const person = insertUser({ role: 'contractor', passwordHash: await hashed('right words here') });
    const byLink = await visitor();
    await byLink.askForLink(person.email, '/work/jobs?season=spring');
    await deliverAll();
    expect((await byLink.openLink(linkInMail())).to?.href).toBe('https://eavewright.example/work/jobs?season=spring');
    expect(actorIn(await byLink.session())).toMatchObject({ id: person.id, role: 'contractor' });
    expect(faultIn(await (await visitor()).signIn(person.email, 'right words here'))).toBeNull();
    expect(request.said).toBe('');
  });

  test.each(['nobody', 'a@b', '"a"@example.test', 'a@example.test,b@example.test'])('%s is no address: nothing is sent', async (typed) => {
    expect(faultIn(await (await visitor()).askForLink(typed))).toBe('Address');
    expect(request.later).toHaveLength(0);
  });
});

describe('an account that somebody else made with your address', () => {
  test('is yours once you use a link: their password and their sessions end, and you are told', async () => {
    const trap = insertUser({ email: 'owner@example.test', emailVerified: null, passwordHash: await hashed('of the stranger') });
    const stranger = await visitor('203.0.113.66');
    await stranger.signIn(trap.email, 'of the stranger');
    expect(actorIn(await stranger.session())).toMatchObject({ id: trap.id });

    const owner = await visitor('198.51.100.7');
    await owner.askForLink('owner@example.test');
    await deliverAll();
    await owner.openLink(linkInMail());
    expect(actorIn(await owner.session())).toMatchObject({ id: trap.id });
    expect(request.said).toContain('no longer works');

    expect(actorIn(await stranger.session())).toBeNull();
    expect(faultIn(await stranger.signIn(trap.email, 'of the stranger'))).toBe('wrong');
  });
});

describe('sessions', () => {
  test('end when the person signs out everywhere or sets a password, in every browser', async () => {
    const person = insertUser({ passwordHash: await hashed('right words here') });
    const [phone, desk] = [await visitor(), await visitor()];
    await phone.signIn(person.email, 'right words here');
    await desk.signIn(person.email, 'right words here');
    endSessions(actorOf(person), new Date(Date.now() + 1));
    expect([actorIn(await phone.session()), actorIn(await desk.session())]).toEqual([null, null]);

    const { signedInAt = 0 } = await phone.session();
    setPassword(person.id, await hashed('other words here'), new Date(signedInAt), { provesAddress: false });
    expect(actorIn({ user: { id: person.id }, signedInAt: signedInAt - 1 })).toBeNull();
    expect(actorIn({ user: { id: person.id }, signedInAt })).toMatchObject({ id: person.id });
  });

  test('end with the account', async () => {
    const person = insertUser({ passwordHash: await hashed('right words here') });
    const browser = await visitor();
    await browser.signIn(person.email, 'right words here');
    database().delete(user).where(eq(user.id, person.id)).run();
    expect(actorIn(await browser.session())).toBeNull();
  });

  test('signing out forgets the session in this browser', async () => {
    const person = insertUser({ passwordHash: await hashed('right words here') });
    const browser = await visitor();
    await browser.signIn(person.email, 'right words here');
    await browser.signOut();
    expect(await browser.session()).toEqual({});
  });

  test('a cookie that was tampered with is no session', async () => {
    const person = insertUser({ passwordHash: await hashed('right words here') });
    const browser = await visitor();
    await browser.signIn(person.email, 'right words here');
    const name = Object.keys(browser.cookies).find((key) => key.includes('session-token')) ?? '';
    browser.cookies[name] = `${browser.cookies[name]?.slice(0, -4)}AAAA`;
    expect(await browser.session()).toEqual({});
  });
});

test.each(['https://elsewhere.example/', '//elsewhere.example', '/\\elsewhere.example', 'https://eavewright.example.evil.example/homes', 'https://eavewright.example@elsewhere.example/', 'javascript:alert(1)'])(
  'after signing in, %s does not lead off the site',
  async (callbackUrl) => {
    const person = insertUser({ passwordHash: await hashed('right words here') });
    const { to } = await (await visitor()).signIn(person.email, 'right words here', callbackUrl);
    expect(to?.href).toBe('https://eavewright.example/start');
  },
);

import { afterAll, beforeAll, beforeEach, describe, expect, test, vi } from 'vitest';
import { database } from '@/db/client';
import { issueToken, tokenHolder, useToken as takeToken } from '@/db/queries/account-tokens';
import { activePerson, personByEmail } from '@/db/queries/people';
import { accountToken, mail, user } from '@/db/schema';
import { type Actor } from '@/lib/permissions';
import { setEnvironment } from '@/tests/fixtures/environment';
import { send } from '@/tests/fixtures/form';
import { actorOf, insertUser } from '@/tests/fixtures/home';
import { addresseeOf, startSmtp, type TestSmtp } from '@/tests/fixtures/smtp';
import { useFreshDatabase } from '@/tests/setup/fresh-database';

const request = vi.hoisted(() => ({ later: [] as (() => unknown)[], actor: null as Actor | null }));
vi.mock('@/app/_server/actor', () => ({ currentActor: () => Promise.resolve(request.actor) }));
vi.mock('next/headers', () => ({ headers: () => Promise.resolve(new Headers()) }));
vi.mock('next/server', () => ({ after: (work: () => unknown) => void request.later.push(work) }));

useFreshDatabase();

let smtp: TestSmtp;
beforeAll(async () => void (smtp = await startSmtp()));
afterAll(() => smtp.stop());
beforeEach(() => {
  setEnvironment({ SMTP_URL: smtp.url });
  delete (globalThis as { eavewrightLimits?: unknown }).eavewrightLimits;
  Object.assign(request, { later: [], actor: null });
  smtp.received.length = 0;
});

const deliverAll = async () => {
  for (const work of request.later.splice(0)) await work();
};

const account = { name: 'Nils Aaberg', email: 'Nils@Example.test ', password: 'three words in a row', role: 'homeowner' };

async function register(values: Record<string, string>) {
  const { register: action } = await import('@/app/(auth)/register/actions');
  const outcome = await send(action, values);
  await deliverAll();
  return outcome;
}

const linkInMail = () => /https:\/\/eavewright\.example\/(?:verify|reset)\/([\w-]+)/.exec(smtp.received[0]?.text ?? '')?.[1] ?? '';

describe('registering', () => {
  test('makes an unverified account with a hashed password and sends one mail to confirm it', async () => {
    expect(await register(account)).toEqual({ to: '/check-mail' });
    const row = personByEmail('nils@example.test');
    expect(row).toMatchObject({ role: 'homeowner', emailVerified: null, name: 'Nils Aaberg' });
    expect(row?.passwordHash).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
    expect(smtp.received).toHaveLength(1);
    expect(linkInMail()).not.toBe('');
  });

  test('the secret of the link is kept neither in the outbox nor in the table of links', async () => {
    await register(account);
    const token = linkInMail();
    const everything = JSON.stringify([database().select().from(mail).all(), database().select().from(accountToken).all(), database().select().from(user).all()]);
    expect(everything).not.toContain(token);
  });

  test.each([
    [{ role: 'operator' }, 'role'], [{ password: 'short' }, 'password'], [{ password: 'nils@example.test' }, 'password'], [{ password: 'Password123' }, 'password'],
    [{ email: 'nils' }, 'email'], [{ name: ' ' }, 'name'], [{ role: 'contractor' }, 'company'],
  ])('refuses %j beside its field and gives back what was typed', async (wrong, field) => {
    const { state } = await register({ ...account, ...wrong });
    expect(state).toMatchObject({ ok: false, errors: { [field]: expect.any(String) as string }, values: { name: { ...account, ...wrong }.name } });
    expect(state?.values).not.toHaveProperty('password');
    expect(database().select().from(user).all()).toHaveLength(0);
  });

  test('an address that has an account gets the same answer; its holder is told by mail and keeps password and role', async () => {
    const holder = insertUser({ email: 'nils@example.test', role: 'contractor', passwordHash: 'kept' });
    expect(await register(account)).toEqual({ to: '/check-mail' });
    expect(personByEmail('nils@example.test')).toMatchObject({ id: holder.id, role: 'contractor', passwordHash: 'kept' });
    expect(smtp.received[0]?.subject).toContain('already have');
  });

  test('an address that waits for its confirmation gets the link again; the first password stays', async () => {
    await register(account);
    const first = personByEmail('nils@example.test')?.passwordHash;
    expect(await register({ ...account, password: 'of somebody else', name: 'Somebody' })).toEqual({ to: '/check-mail' });
    expect(personByEmail('nils@example.test')).toMatchObject({ passwordHash: first, name: 'Nils Aaberg' });
    expect(smtp.received.map(({ subject }) => subject)).toEqual(Array(2).fill('Confirm your address for Eavewright'));
  });

  test('fields that the form does not have are not read', async () => {
    await register({ ...account, emailVerified: '2020-01-01', id: 'mine', remindersOn: 'false', passwordHash: 'x' });
    expect(personByEmail('nils@example.test')).toMatchObject({ emailVerified: null, remindersOn: true, id: expect.not.stringMatching(/^mine$/) as string });
  });

  test('no address is mailed more than five times in a quarter of an hour, whatever is asked for', async () => {
    const { askForReset } = await import('@/app/(auth)/forgot/actions');
    for (let n = 0; n < 4; n += 1) expect(await send(askForReset, { email: 'nils@example.test' })).toEqual({ to: '/check-mail' });
    expect(await register(account)).toEqual({ to: '/check-mail' });
    expect((await register(account)).state).toMatchObject({ ok: false, message: expect.stringMatching(/^Too many tries\. Wait 1\d minutes/) as string });
    expect(smtp.received).toHaveLength(1);
  });
});

describe('confirming the address', () => {
  const confirm = async (token: string, password?: string) => {
    const { confirmAddress } = await import('@/app/(auth)/verify/[token]/actions');
    return (await send(confirmAddress, { token, password })).state;
  };
  const confirmedAt = () => personByEmail('nils@example.test')?.emailVerified;
  const actor = () => {
    const person = personByEmail('nils@example.test');
    return person ? actorOf(person) : null;
  };

  test('needs the link and the password, and works once', async () => {
    await register(account);
    const token = linkInMail();
    expect(await confirm(token, 'another password')).toMatchObject({ ok: false, errors: { password: expect.any(String) as string } });
    expect(await confirm(token)).toMatchObject({ ok: false, errors: { password: expect.any(String) as string } });
    expect(confirmedAt()).toBeNull();
    expect(await confirm(token, account.password)).toMatchObject({ ok: true });
    expect(confirmedAt()).toBeInstanceOf(Date);
    expect(await confirm(token, account.password)).toMatchObject({ ok: false });
  });

  test('a session of the same account stands for the password, one of another account does not', async () => {
    await register(account);
    request.actor = actorOf(insertUser());
    expect(await confirm(linkInMail())).toMatchObject({ ok: false });
    request.actor = actor();
    expect(await confirm(linkInMail())).toMatchObject({ ok: true });
    expect(confirmedAt()).toBeInstanceOf(Date);
  });

  test('a password with spaces at its ends is taken as it was typed', async () => {
    await register({ ...account, password: '  spaces at the ends  ' });
    expect(await confirm(linkInMail(), 'spaces at the ends')).toMatchObject({ ok: false });
    expect(await confirm(linkInMail(), '  spaces at the ends  ')).toMatchObject({ ok: true });
  });

  test('the link can be sent again from inside, and only until the address is confirmed', async () => {
    await register(account);
    request.actor = actor();
    const { sendVerifyAgain } = await import('@/app/(account)/account/actions');
    expect((await send(sendVerifyAgain, {})).state).toMatchObject({ ok: true });
    await deliverAll();
    expect(smtp.received).toHaveLength(2);
    smtp.received.shift();
    expect(await confirm(linkInMail())).toMatchObject({ ok: true });
    expect((await send(sendVerifyAgain, {})).state).toMatchObject({ ok: true });
    await deliverAll();
    expect(smtp.received).toHaveLength(1);
  });

  test('looking at the link does not use it up', async () => {
    await register(account);
    const token = linkInMail();
    expect(tokenHolder(token, 'verify', new Date())?.email).toBe('nils@example.test');
    expect(await confirm(token, account.password)).toMatchObject({ ok: true });
  });

  test('a made-up link is refused', async () => expect(await confirm('made-up', account.password)).toMatchObject({ ok: false }));
});

describe('one-use links', () => {
  const now = new Date('2027-03-01T12:00:00Z');

  test('expire: a new password after one hour, a confirmation after two days', () => {
    const person = insertUser();
    const reset = issueToken(person.id, 'reset', now);
    expect(tokenHolder(reset, 'reset', new Date(now.getTime() + 59 * 60_000))?.id).toBe(person.id);
    expect(tokenHolder(reset, 'reset', new Date(now.getTime() + 61 * 60_000))).toBeUndefined();
    expect(tokenHolder(reset, 'verify', now)).toBeUndefined();
    const verify = issueToken(person.id, 'verify', now);
    expect(tokenHolder(verify, 'verify', new Date(now.getTime() + 47 * 3_600_000))?.id).toBe(person.id);
    expect(tokenHolder(verify, 'verify', new Date(now.getTime() + 49 * 3_600_000))).toBeUndefined();
    expect(takeToken(verify, 'verify', new Date(now.getTime() + 49 * 3_600_000))).toBe(false);
  });

  test('work once, and a newer one replaces an older', () => {
    const person = insertUser();
    const first = issueToken(person.id, 'reset', now);
    const second = issueToken(person.id, 'reset', now);
    expect(takeToken(first, 'reset', now)).toBe(false);
    expect(takeToken(second, 'reset', now)).toBe(true);
    expect(takeToken(second, 'reset', now)).toBe(false);
  });
});

describe('a new password', () => {
  test('by link: replaces the old one, proves the address, and ends earlier sessions', async () => {
    const person = insertUser({ emailVerified: null, passwordHash: 'old' });
    const before = Date.now() - 1000;
    const token = issueToken(person.id, 'reset', new Date());
    const { resetPassword } = await import('@/app/(auth)/reset/[token]/actions');
    expect(await send(resetPassword, { token, password: 'a new set of words' })).toEqual({ to: '/sign-in?said=password-set' });
    const after = personByEmail(person.email);
    expect(after?.passwordHash).toMatch(/^\$argon2id/);
    expect(after?.emailVerified).toBeInstanceOf(Date);
    expect(activePerson(person.id, before)).toBeNull();
    expect(activePerson(person.id, Date.now() + 1000)).toMatchObject({ id: person.id });
    expect((await send(resetPassword, { token, password: 'yet another set' })).state).toMatchObject({ ok: false });
    expect(personByEmail(person.email)?.passwordHash).toBe(after?.passwordHash);
  });

  test('by link: a weak one, or the address itself, leaves the link good for another try', async () => {
    const person = insertUser({ passwordHash: 'old' });
    const token = issueToken(person.id, 'reset', new Date());
    const { resetPassword } = await import('@/app/(auth)/reset/[token]/actions');
    for (const password of ['short', person.email.toUpperCase()]) expect((await send(resetPassword, { token, password })).state).toMatchObject({ ok: false, errors: { password: expect.any(String) as string } });
    expect(await send(resetPassword, { token, password: 'a new set of words' })).toEqual({ to: '/sign-in?said=password-set' });
  });

  test('asked for: a link that works goes to the account’s address', async () => {
    const person = insertUser({ email: 'nils@example.test' });
    const { askForReset } = await import('@/app/(auth)/forgot/actions');
    expect(await send(askForReset, { email: 'Nils@Example.test' })).toEqual({ to: '/check-mail' });
    expect(smtp.received).toHaveLength(0);
    await deliverAll();
    expect(addresseeOf(smtp.received[0])).toBe('nils@example.test');
    expect(tokenHolder(linkInMail(), 'reset', new Date())?.id).toBe(person.id);
  });

  test('asking for one answers the same for an address without an account, and sends nothing', async () => {
    const { askForReset } = await import('@/app/(auth)/forgot/actions');
    expect(await send(askForReset, { email: 'nobody@example.test' })).toEqual({ to: '/check-mail' });
    await deliverAll();
    expect(smtp.received).toHaveLength(0);
  });
});

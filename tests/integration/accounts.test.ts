import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, beforeEach, describe, expect, test, vi } from 'vitest';
import { authAdapter } from '@/db/auth-adapter';
import { database } from '@/db/client';
import { issueToken, tokenHolder, useToken as takeToken } from '@/db/queries/account-tokens';
import { activePerson, personByEmail, setPassword } from '@/db/queries/people';
import { mail, user } from '@/db/schema';
import { safePath } from '@/lib/schemas/account';
import { setEnvironment } from '@/tests/fixtures/environment';
import { send } from '@/tests/fixtures/form';
import { insertUser } from '@/tests/fixtures/home';
import { startSmtp, type TestSmtp } from '@/tests/fixtures/smtp';
import { useFreshDatabase } from '@/tests/setup/fresh-database';

vi.mock('next/headers', () => ({ headers: () => Promise.resolve(new Headers()), cookies: () => Promise.resolve({ set: () => {} }) }));
vi.mock('next-auth', () => ({ getServerSession: () => Promise.resolve(null), default: () => () => {} }));

useFreshDatabase();

let smtp: TestSmtp;
beforeAll(async () => void (smtp = await startSmtp()));
afterAll(() => smtp.stop());
beforeEach(() => {
  setEnvironment({ SMTP_URL: smtp.url });
  smtp.received.length = 0;
});

const account = { name: 'Nils Aaberg', email: 'Nils@Example.test ', password: 'three words in a row', role: 'homeowner' };

async function register(values: Record<string, string>) {
  const { register: action } = await import('@/app/(auth)/register/actions');
  return send(action, values);
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
    const everything = JSON.stringify([database().select().from(mail).all(), database().select().from(user).all()]);
    expect(everything).not.toContain(token);
  });

  test.each([
    [{ role: 'operator' }, 'role'], [{ password: 'short' }, 'password'], [{ password: 'nils@example.test' }, 'password'], [{ password: 'Password123' }, 'password'],
    [{ email: 'nils' }, 'email'], [{ name: ' ' }, 'name'], [{ role: 'contractor' }, 'company'],
  ])('refuses %j beside its field and gives back what was typed', async (wrong, field) => {
    const { state } = await register({ ...account, ...wrong });
    expect(state).toMatchObject({ ok: false, errors: { [field]: expect.any(String) as string }, values: { name: { ...account, ...wrong }.name } });
    expect(database().select().from(user).all()).toHaveLength(0);
  });

  test('an address that has an account gets the same answer; its holder is told by mail and keeps password and role', async () => {
    const holder = insertUser({ email: 'nils@example.test', role: 'contractor', passwordHash: 'kept' });
    expect(await register(account)).toEqual({ to: '/check-mail' });
    expect(personByEmail('nils@example.test')).toMatchObject({ id: holder.id, role: 'contractor', passwordHash: 'kept' });
    expect(smtp.received[0]?.subject).toContain('already have');
  });
});

describe('confirming the address', () => {
  const confirm = async (token: string, password: string) => {
    const { confirmAddress } = await import('@/app/(auth)/verify/[token]/actions');
    return (await send(confirmAddress, { token, password })).state;
  };

  test('needs the link and the password, and works once', async () => {
    await register(account);
    const token = linkInMail();
    expect(await confirm(token, 'another password')).toMatchObject({ ok: false, errors: { password: expect.any(String) as string } });
    expect(personByEmail('nils@example.test')?.emailVerified).toBeNull();
    expect(await confirm(token, account.password)).toMatchObject({ ok: true });
    expect(personByEmail('nils@example.test')?.emailVerified).toBeInstanceOf(Date);
    expect(await confirm(token, account.password)).toMatchObject({ ok: false });
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
  });

  test('asking for one answers the same for an address without an account, and sends nothing', async () => {
    const { askForReset } = await import('@/app/(auth)/forgot/actions');
    expect(await send(askForReset, { email: 'nobody@example.test' })).toEqual({ to: '/check-mail' });
    expect(smtp.received).toHaveLength(0);
  });
});

describe('the e-mailed sign-in link (next-auth adapter)', () => {
  test('a token is used once', async () => {
    const adapter = authAdapter();
    const expires = new Date(Date.now() + 60_000);
    await adapter.createVerificationToken?.({ identifier: 'a@example.test', token: 'hash', expires });
    expect(await adapter.useVerificationToken?.({ identifier: 'a@example.test', token: 'hash' })).toMatchObject({ identifier: 'a@example.test' });
    expect(await adapter.useVerificationToken?.({ identifier: 'a@example.test', token: 'hash' })).toBeNull();
  });

  test('a new address becomes a homeowner', async () => {
    const adapter = authAdapter();
    await adapter.createUser?.({ id: crypto.randomUUID(), email: 'new@example.test', emailVerified: new Date(), name: null });
    expect(personByEmail('new@example.test')).toMatchObject({ role: 'homeowner', passwordHash: null });
  });

  test('drops a password that somebody set before the address was proved, and keeps one set after', async () => {
    const adapter = authAdapter();
    const waiting = insertUser({ emailVerified: null, passwordHash: 'of somebody else' });
    await adapter.updateUser({ id: waiting.id, emailVerified: new Date() });
    expect(personByEmail(waiting.email)).toMatchObject({ passwordHash: null, emailVerified: expect.any(Date) as Date });
    setPassword(waiting.id, 'my own', new Date(), { provesAddress: false });
    await adapter.updateUser({ id: waiting.id, emailVerified: new Date() });
    expect(personByEmail(waiting.email)?.passwordHash).toBe('my own');
  });
});

describe('signing in with a password', () => {
  type Provider = { id: string; options?: { authorize?: (credentials: Record<string, string>, request: { headers: Record<string, string> }) => Promise<unknown> } };
  const authorize = async (email: string, password: string, sender = '10.0.0.1') => {
    const { authOptions } = await import('@/app/_server/auth');
    const provider = (authOptions.providers as unknown as Provider[]).find(({ id }) => id === 'credentials');
    return provider?.options?.authorize?.({ email, password }, { headers: { 'x-forwarded-for': sender } });
  };

  test('right password: the person; wrong password or unknown address: the same fault', async () => {
    const { hashPassword } = await import('@/app/_server/password');
    const person = insertUser({ passwordHash: await hashPassword('right words here') });
    expect(await authorize(person.email.toUpperCase(), 'right words here')).toMatchObject({ id: person.id });
    await expect(authorize(person.email, 'wrong words here')).rejects.toThrow('wrong');
    await expect(authorize('nobody@example.test', 'right words here')).rejects.toThrow('wrong');
  });

  test('an unconfirmed address is sent its link again instead', async () => {
    const { hashPassword } = await import('@/app/_server/password');
    const person = insertUser({ emailVerified: null, passwordHash: await hashPassword('right words here') });
    await expect(authorize(person.email, 'right words here')).rejects.toThrow('unverified');
    expect(smtp.received).toHaveLength(1);
  });

  test('the eleventh try in a quarter of an hour has to wait, even with the right password', async () => {
    const { hashPassword } = await import('@/app/_server/password');
    const person = insertUser({ passwordHash: await hashPassword('right words here') });
    for (let n = 0; n < 10; n += 1) await expect(authorize(person.email, 'wrong words here')).rejects.toThrow('wrong');
    await expect(authorize(person.email, 'right words here')).rejects.toThrow(/^wait:\d+$/);
  });
});

test.each([
  ['/homes/1?x=2', '/homes/1?x=2'], ['https://elsewhere.example/', '/start'], ['//elsewhere.example', '/start'], ['/\\elsewhere.example', '/start'], ['javascript:alert(1)', '/start'], [undefined, '/start'],
])('after signing in, %s leads to %s', (wanted, path) => expect(safePath(wanted)).toBe(path));

test('a session of a deleted account is none', () => {
  const person = insertUser();
  expect(activePerson(person.id, Date.now())).toMatchObject({ id: person.id });
  database().delete(user).where(eq(user.id, person.id)).run();
  expect(activePerson(person.id, Date.now())).toBeNull();
});

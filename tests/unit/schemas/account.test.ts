import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { email, newPassword, passwordSchema, profileSchema, registerSchema, safePath, verifySchema } from '@/lib/schemas/account';
import { signInFault } from '@/lib/sign-in-words';

const faultsOf = (parsed: { success: boolean; error?: { issues: { path: PropertyKey[] }[] } | undefined }) => parsed.error?.issues.map(({ path }) => path.join('.')) ?? [];

describe('an e-mail address', () => {
  test('is trimmed and in lower case', () => expect(email.parse('  Marit.Lund@Example.COM ')).toBe('marit.lund@example.com'));
  test.each(['', ' ', 'marit', 'marit@', '@example.com', 'marit@example', 'a b@example.com', 'a@example.com,b@example.com', '"a"@example.com', 'a@b@example.com', `${'x'.repeat(250)}@example.com`])('%j is none', (text) =>
    expect(email.safeParse(text).success).toBe(false),
  );
});

describe('a new password', () => {
  test.each(['three words in a row', 'Kx7-Kx7-Kx', 'längre än tio', ' '.repeat(3) + 'spaces count'])('%j will do', (text) => expect(newPassword.parse(text)).toBe(text));
  test.each(['', 'nine char', 'Password123', 'QWERTYUIOP', 'eavewright1', 'aaaaaaaaaaaa'])('%j will not', (text) => expect(newPassword.safeParse(text).success).toBe(false));

  test('has at most 200 bytes, counted in UTF-8', () => {
    expect(newPassword.safeParse('ab'.repeat(100)).success).toBe(true);
    expect(newPassword.safeParse('ab'.repeat(100) + 'a').success).toBe(false);
    expect(newPassword.safeParse('äb'.repeat(67)).success).toBe(false);
  });
});

describe('registering', () => {
  const form = { name: 'Marit Lund', email: 'marit@example.com', password: 'three words in a row', role: 'homeowner' };
  test('takes a homeowner without a company, and a contractor with one', () => {
    expect(registerSchema.parse(form)).toEqual({ ...form, company: undefined });
    expect(registerSchema.parse({ ...form, role: 'contractor', company: ' Ridge Finishing ' })).toMatchObject({ company: 'Ridge Finishing' });
  });

  test.each([
    [{ role: 'operator' }, 'role'], [{ role: undefined }, 'role'], [{ role: 'contractor' }, 'company'], [{ role: 'contractor', company: '  ' }, 'company'],
    [{ password: 'Marit@Example.com' }, 'password'], [{ name: ' ' }, 'name'],
  ])('%j is marked at %s', (wrong, field) => expect(faultsOf(registerSchema.safeParse({ ...form, ...wrong }))).toEqual([field]));
});

test('a password that is checked, not chosen, is never trimmed', () => {
  expect(verifySchema.parse({ token: 't', password: ' x ' }).password).toBe(' x ');
  expect(passwordSchema.parse({ current: ' x ', password: 'three words in a row' }).current).toBe(' x ');
});

test('a profile without the checkbox means no reminders', () => expect(profileSchema.parse({ name: 'Marit', units: 'us' })).toMatchObject({ remindersOn: false }));

describe('where to go after signing in', () => {
  test.each(['/homes/1?x=2', '/', '/work/jobs?season=spring#top'])('%s stays as it is', (path) => expect(safePath(path)).toBe(path));
  test.each([undefined, null, '', 'homes', 'https://elsewhere.example/', '//elsewhere.example', '/\\elsewhere.example', '/\t/elsewhere.example', '/\n/elsewhere.example', 'javascript:alert(1)'])('%j becomes the start', (path) => expect(safePath(path)).toBe('/start'));

  test('whatever is asked for, a browser stays on this site', () => {
    const piece = fc.constantFrom('/', '\\', '//', ':', '@', '.', '?', '#', '%2f', '\t', '\n', ' ', 'https', 'elsewhere.example', 'a');
    const wanted = fc.oneof(fc.array(piece, { maxLength: 8 }).map((parts) => parts.join('')), fc.string({ unit: 'binary' }));
    fc.assert(fc.property(wanted, (path) => new URL(safePath(path), 'https://eavewright.example').origin === 'https://eavewright.example'), { numRuns: 2000 });
  });
});

describe('what the codes of sign-in mean', () => {
  test('waiting is told in minutes', () => {
    expect(signInFault('wait:7')).toContain('Wait 7 minutes');
    expect(signInFault('wait:1')).toContain('Wait a minute');
  });

  test('a wrong password does not tell whether the account exists', () => expect(signInFault('wrong')).toBe(signInFault('CredentialsSignin')));

  // The codes of next-auth 4 for these providers: https://next-auth.js.org/configuration/pages
  test.each(['Configuration', 'AccessDenied', 'Verification', 'EmailCreateAccount', 'EmailSignin', 'CredentialsSignin', 'SessionRequired'])('%s has its own words', (code) => expect(signInFault(code)).not.toBe(signInFault('Default')));

  test.each(['', 'Default', 'constructor', '<script>', 'wait:x'])('%j gets the plain answer', (code) => expect(signInFault(code)).toBe(signInFault('something new')));
});

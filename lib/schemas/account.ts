import { z } from 'zod';
import { checkbox, choice, neededText, shortText } from '@/lib/schemas/measures';
import { keysOf, unitSystems } from '@/lib/schemas/vocabulary';

export const email = z
  .string({ error: 'The e-mail address is missing.' })
  .trim()
  .toLowerCase()
  .min(1, 'The e-mail address is missing.')
  .max(254, 'This is not an e-mail address.')
  .pipe(z.email('This is not an e-mail address. It looks like name@example.com.'));

/** The first guesses of whoever tries passwords, long enough to pass otherwise. From memory. */
const tooCommon = new Set(
  `1234567890 0123456789 0987654321 12345678910 123456789a 1234512345 1q2w3e4r5t 1qaz2wsx3edc qwertyuiop qwerty12345 qwerty123456 asdfghjkl1
  password12 password123 password1234 passwordpassword passw0rd123 iloveyou12 iloveyou123 welcome123 letmein123 administrator changeme123
  football123 baseball123 princess123 sunshine123 eavewright eavewright1 eavewright123`.split(/\s+/),
);
const oneCharacter = /^(.)\1*$/u;

export const mostPasswordBytes = 200;

export const newPassword = z
  .string({ error: 'The password is missing.' })
  .min(1, 'The password is missing.')
  .min(10, 'The password needs at least 10 characters. Three words in a row are easy to remember.')
  .refine((text) => new TextEncoder().encode(text).length <= mostPasswordBytes, 'This password is too long: 200 plain letters at most.')
  .refine((text) => !tooCommon.has(text.toLowerCase()) && !oneCharacter.test(text), 'This password is among the first that anybody tries. Choose another.');

/** A password as it was chosen: never trimmed. */
const password = z.string({ error: 'The password is missing.' }).min(1, 'The password is missing.').max(mostPasswordBytes, 'This is not the password: it is too long.');

const notTheEmail = (form: { email: string; password: string }) => form.password.toLowerCase() !== form.email;
const notTheEmailFault = { path: ['password'], error: 'The password may not be your e-mail address.' };

export const registerSchema = z
  .object({
    name: neededText('Your name', 80),
    email,
    password: newPassword,
    /** An operator is never made by a form. */
    role: choice(['homeowner', 'contractor'], 'who you are'),
    company: shortText('The company name', 80),
  })
  .refine(notTheEmail, notTheEmailFault)
  .refine((form) => form.role !== 'contractor' || form.company, { path: ['company'], error: 'The company name is missing: owners look for it.' });

/** The password may be absent where a session shows who it is. */
export const verifySchema = z.object({ token: neededText('The link', 100), password: password.optional() });
export const forgotSchema = z.object({ email });
export const resetSchema = z.object({ token: neededText('The link', 100), password: newPassword });
export const profileSchema = z.object({ name: neededText('Your name', 80), units: choice(keysOf(unitSystems), 'your units'), company: shortText('The company name', 80), remindersOn: checkbox });
export const passwordSchema = z.object({ current: password.optional(), password: newPassword });

/** Where to go after signing in: a path of this site, never another address. */
export function safePath(wanted: string | null | undefined, fallback = '/start'): string {
  if (!wanted || !wanted.startsWith('/') || wanted.startsWith('//') || /[\\\s\u0000-\u001f]/.test(wanted)) return fallback;
  return wanted;
}

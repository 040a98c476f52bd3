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

/** Among the commonest, or too easy to guess for a tool about houses. */
const tooCommon = new Set(['1234567890', '0123456789', 'password12', 'password123', 'qwertyuiop', 'iloveyou12', '1111111111', 'eavewright', 'eavewright1', 'welcome123', 'letmein123']);

export const newPassword = z
  .string({ error: 'The password is missing.' })
  .min(10, 'The password needs at least 10 characters. Three words in a row are easy to remember.')
  .refine((text) => new TextEncoder().encode(text).length <= 200, 'The password may have at most 200 characters.')
  .refine((text) => !tooCommon.has(text.toLowerCase()), 'This password is among the first that anybody tries. Choose another.');

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

export const verifySchema = z.object({ token: neededText('The link', 100), password: neededText('The password', 200) });
export const forgotSchema = z.object({ email });
export const resetSchema = z.object({ token: neededText('The link', 100), password: newPassword });
export const profileSchema = z.object({ name: neededText('Your name', 80), units: choice(keysOf(unitSystems), 'your units'), company: shortText('The company name', 80), remindersOn: checkbox });
export const passwordSchema = z.object({ current: z.string().max(200).optional(), password: newPassword });

/** Where to go after signing in: a path of this site, never another address. */
export function safePath(wanted: string | null | undefined, fallback = '/start'): string {
  if (!wanted || !wanted.startsWith('/') || wanted.startsWith('//') || /[\\\s\u0000-\u001f]/.test(wanted)) return fallback;
  return wanted;
}

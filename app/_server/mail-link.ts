import 'server-only';
import { createHash } from 'node:crypto';
import { type MailLink, readLink } from '@/db/queries/mail-links';
import { currentSender, startTry, waitWords } from './attempts';

/** The link behind a token, or why there is none. Tokens that we never signed are counted against whoever sends them. */
export async function mailLinkOf(token: string, now: Date): Promise<MailLink | string> {
  const link = readLink(token, now);
  if (link === 'expired') return 'This link has run out: links in reminders work for 14 days.';
  if (link !== 'wrong') return link;
  const sender = await currentSender();
  const wait = await startTry(`mail link ${sender}`, sender);
  return wait > 0 ? waitWords(wait) : 'This link is not complete. Open it from the mail again.';
}

/** A submission key in the form of a UUID that follows from the token: the same link logs once. */
export function submissionKeyOf(token: string): string {
  const hex = createHash('sha256').update(`logged by ${token}`).digest('hex');
  return [hex.slice(0, 8), hex.slice(8, 12), `8${hex.slice(13, 16)}`, `8${hex.slice(17, 20)}`, hex.slice(20, 32)].join('-');
}

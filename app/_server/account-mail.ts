import 'server-only';
import { createHash } from 'node:crypto';
import { issueToken, tokenHours, type TokenPurpose } from '@/db/queries/account-tokens';
import { enqueueMail } from '@/db/queries/mail';
import { type PersonRow } from '@/db/queries/people';
import { deliverMail } from '@/jobs/deliver';
import { environment } from './environment';

const address = (path: string) => new URL(path, environment().NEXTAUTH_URL).toString();
const keyOf = (secret: string) => createHash('sha256').update(secret).digest('hex').slice(0, 32);

/** Mails with a link that somebody waits for: put into the outbox, then sent at once; trouble leaves them there for the scheduler. */
async function sendAccountLink(kind: TokenPurpose, person: PersonRow): Promise<void> {
  const token = issueToken(person.id, kind, new Date());
  const props = { name: person.name, url: address(`/${kind}/${token}`), hours: tokenHours[kind] };
  await deliverMail(enqueueMail({ kind, idempotencyKey: `${kind}:${keyOf(token)}`, toAddress: person.email, userId: person.id, props }));
}

export const sendVerifyLink = (person: PersonRow): Promise<void> => sendAccountLink('verify', person);
export const sendResetLink = (person: PersonRow): Promise<void> => sendAccountLink('reset', person);

/** The link opens a page with a button: mail scanners that follow links do not use it up. */
export async function sendSignInLink(toAddress: string, callback: string, token: string, hours: number): Promise<void> {
  const page = address('/sign-in/link');
  const url = `${page}?${new URL(callback).searchParams.toString()}`;
  await deliverMail(enqueueMail({ kind: 'sign-in', idempotencyKey: `sign-in:${keyOf(token)}`, toAddress, props: { url, hours } }));
}

/** Somebody registered with an address that has an account: its holder is told, the one who registered is not. */
export async function sendAlreadyKnown(person: PersonRow): Promise<void> {
  const hour = new Date().toISOString().slice(0, 13);
  const props = { name: person.name, signInUrl: address('/sign-in'), forgotUrl: address('/forgot') };
  await deliverMail(enqueueMail({ kind: 'already-known', idempotencyKey: `already-known:${person.id}:${hour}`, toAddress: person.email, userId: person.id, props }));
}

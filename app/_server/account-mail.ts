import 'server-only';
import { createHash } from 'node:crypto';
import { after } from 'next/server';
import { issueToken, tokenHours, type TokenPurpose } from '@/db/queries/account-tokens';
import { enqueueMail } from '@/db/queries/mail';
import { type PersonRow } from '@/db/queries/people';
import { deliverMail } from '@/jobs/deliver';
import { environment } from './environment';

const address = (path: string) => new URL(path, environment().NEXTAUTH_URL).toString();
const keyOf = (secret: string) => createHash('sha256').update(secret).digest('hex').slice(0, 32);

/** Mails that somebody waits for go out right after the answer, which so takes equally long whether there was one to send. Trouble leaves them in the outbox for the scheduler. */
const sendSoon = (mailId: string) => after(() => deliverMail(mailId));

function sendAccountLink(kind: TokenPurpose, person: PersonRow): void {
  const token = issueToken(person.id, kind, new Date());
  const props = { name: person.name, url: address(`/${kind}/${token}`), hours: tokenHours[kind] };
  sendSoon(enqueueMail({ kind, idempotencyKey: `${kind}:${keyOf(token)}`, toAddress: person.email, userId: person.id, props }));
}

export const sendVerifyLink = (person: PersonRow): void => sendAccountLink('verify', person);
export const sendResetLink = (person: PersonRow): void => sendAccountLink('reset', person);

/** The link opens a page with a button: mail scanners that follow links do not use it up. */
export function sendSignInLink(toAddress: string, callback: string, token: string, hours: number): void {
  const url = `${address('/sign-in/link')}?${new URL(callback).searchParams.toString()}`;
  sendSoon(enqueueMail({ kind: 'sign-in', idempotencyKey: `sign-in:${keyOf(token)}`, toAddress, props: { url, hours } }));
}

/** Somebody registered with an address that has an account: its holder is told, the one who registered is not. */
export function sendAlreadyKnown(person: PersonRow): void {
  const hour = new Date().toISOString().slice(0, 13);
  const props = { name: person.name, signInUrl: address('/sign-in'), forgotUrl: address('/forgot') };
  sendSoon(enqueueMail({ kind: 'already-known', idempotencyKey: `already-known:${person.id}:${hour}`, toAddress: person.email, userId: person.id, props }));
}

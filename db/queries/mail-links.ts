import { createHmac, hkdfSync, timingSafeEqual } from 'node:crypto';

/** What a link in a mail may do without sign-in. 'stop home' is the unsubscribe address of reminder mails. */
export const mailActions = ['log', 'put off', 'stop', 'stop home'] as const;
export type MailAction = (typeof mailActions)[number];

/** One person, one home, one piece of work (`workKey`; empty for 'stop home') and one action. */
export type MailLink = { action: MailAction; userId: string; homeId: string; workKey: string; expiresAt: Date | null };

/** How long the link to a piece of work lasts. Our rule; unsubscribe addresses do not run out. */
export const linkDays = 14;

function key(): Buffer {
  const secret = process.env.NEXTAUTH_SECRET;
  if (!secret) throw new Error('NEXTAUTH_SECRET is not set');
  return Buffer.from(hkdfSync('sha256', secret, '', 'eavewright mail links 1', 32));
}

const macOf = (payload: string): Buffer => createHmac('sha256', key()).update(payload).digest();

export function signLink({ action, userId, homeId, workKey, expiresAt }: MailLink): string {
  const seconds = expiresAt ? Math.floor(expiresAt.getTime() / 1000) : '';
  const payload = Buffer.from(JSON.stringify([mailActions.indexOf(action), userId, homeId, workKey, seconds])).toString('base64url');
  return `${payload}.${macOf(payload).toString('base64url')}`;
}

/** The link that we signed, 'expired' when its time is over, or 'wrong' for anything else. The payload is read only once its signature holds. */
export function readLink(token: string, now: Date): MailLink | 'wrong' | 'expired' {
  const [payload, mac, ...rest] = token.split('.');
  if (!payload || !mac || rest.length > 0) return 'wrong';
  const given = Buffer.from(mac, 'base64url');
  const expected = macOf(payload);
  if (given.length !== expected.length || !timingSafeEqual(given, expected)) return 'wrong';
  const [index, userId, homeId, workKey, seconds] = JSON.parse(Buffer.from(payload, 'base64url').toString()) as [number, string, string, string, number | ''];
  const action = mailActions[index];
  if (!action) return 'wrong';
  const expiresAt = seconds === '' ? null : new Date(seconds * 1000);
  return expiresAt && expiresAt <= now ? 'expired' : { action, userId, homeId, workKey, expiresAt };
}

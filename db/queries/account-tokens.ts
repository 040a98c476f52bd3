import { createHash, randomBytes } from 'node:crypto';
import { and, eq, gt, isNull } from 'drizzle-orm';
import { database, transaction } from '../client';
import { accountToken, user } from '../schema';
import { type PersonRow } from './people';

export type TokenPurpose = 'verify' | 'reset';

/** Hours that a link works. Our rule. */
export const tokenHours: Record<TokenPurpose, number> = { verify: 48, reset: 1 };

const hashOf = (token: string) => createHash('sha256').update(token).digest('hex');

export function withdrawTokens(userId: string, purpose: TokenPurpose): void {
  database().delete(accountToken).where(and(eq(accountToken.userId, userId), eq(accountToken.purpose, purpose))).run();
}

/** A new one-use link's secret; only its hash is kept. Earlier links of the same purpose stop working. */
export function issueToken(userId: string, purpose: TokenPurpose, now: Date): string {
  const token = randomBytes(32).toString('base64url');
  transaction(() => {
    withdrawTokens(userId, purpose);
    const expiresAt = new Date(now.getTime() + tokenHours[purpose] * 3_600_000);
    database().insert(accountToken).values({ tokenHash: hashOf(token), userId, purpose, expiresAt }).run();
  });
  return token;
}

const open = (token: string, purpose: TokenPurpose, now: Date) =>
  and(eq(accountToken.tokenHash, hashOf(token)), eq(accountToken.purpose, purpose), isNull(accountToken.usedAt), gt(accountToken.expiresAt, now));

/** Whose link it is, if it still works; using it up is left to `useToken`. */
export function tokenHolder(token: string, purpose: TokenPurpose, now: Date): PersonRow | undefined {
  return database().select({ user }).from(accountToken).innerJoin(user, eq(user.id, accountToken.userId)).where(open(token, purpose, now)).get()?.user;
}

/** Uses a link up; false when it was used, has expired, or never was. */
export const useToken = (token: string, purpose: TokenPurpose, now: Date): boolean =>
  database().update(accountToken).set({ usedAt: now }).where(open(token, purpose, now)).run().changes === 1;

import { DrizzleAdapter } from '@auth/drizzle-adapter';
import { eq } from 'drizzle-orm';
import { database } from './client';
import { account, session, user, verificationToken } from './schema';

/**
 * The tables as next-auth wants them. An e-mailed link proves the address: a password set before that by whoever registered it
 * is dropped, so that nobody can lie in wait in an account made with somebody else's address.
 */
export function authAdapter() {
  const adapter = DrizzleAdapter(database(), { usersTable: user, accountsTable: account, sessionsTable: session, verificationTokensTable: verificationToken });
  return {
    ...adapter,
    updateUser: async (change: { id: string; emailVerified?: Date | null }) => {
      const before = database().select().from(user).where(eq(user.id, change.id)).get();
      const proves = change.emailVerified && before && before.emailVerified === null;
      const set = { ...(change.emailVerified ? { emailVerified: before?.emailVerified ?? change.emailVerified } : {}), ...(proves ? { passwordHash: null } : {}) };
      return database().update(user).set(set).where(eq(user.id, change.id)).returning().get();
    },
  };
}

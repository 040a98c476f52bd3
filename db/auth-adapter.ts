import { DrizzleAdapter } from '@auth/drizzle-adapter';
import { eq, lt } from 'drizzle-orm';
import { database, transaction } from './client';
import { liftBounce } from './queries/bounces';
import { account, session, user, verificationToken } from './schema';

type AdapterOfTables = ReturnType<typeof DrizzleAdapter>;
type Method = keyof AdapterOfTables & string;
/** The instant at which an e-mailed link was used. */
type Proof = { id: string; emailVerified?: Date | null };

const tables = { usersTable: user, accountsTable: account, sessionsTable: session, verificationTokensTable: verificationToken };

// next-auth lists the adapter's own methods, so each is a real property; the database opens when one is called.
const late = <M extends Method>(method: M): NonNullable<AdapterOfTables[M]> =>
  ((...args: unknown[]) => (DrizzleAdapter(database(), tables)[method] as (...given: unknown[]) => unknown)(...args)) as NonNullable<AdapterOfTables[M]>;

/**
 * An e-mailed link proves the address. A password set before that by whoever registered it is dropped and their sessions end,
 * so that nobody can lie in wait in an account made with somebody else's address.
 */
function proveAddress({ id, emailVerified }: Proof) {
  return transaction(() => {
    const before = database().select().from(user).where(eq(user.id, id)).get();
    if (!before) throw new Error('the account does not exist');
    if (emailVerified) liftBounce(id);
    if (!emailVerified || before.emailVerified) return before;
    return database().update(user).set({ emailVerified, passwordHash: null, sessionsValidFrom: emailVerified }).where(eq(user.id, id)).returning().get();
  });
}

/** What next-auth stores: people, and the hashes of sign-in links. Sessions are signed cookies and have no row. */
export const authAdapter = {
  createUser: late('createUser'),
  getUser: late('getUser'),
  getUserByEmail: late('getUserByEmail'),
  getUserByAccount: late('getUserByAccount'),
  linkAccount: late('linkAccount'),
  updateUser: (change: Proof) => Promise.resolve(proveAddress(change)),
  createVerificationToken: (token: { identifier: string; token: string; expires: Date }) => {
    database().delete(verificationToken).where(lt(verificationToken.expires, new Date())).run();
    return late('createVerificationToken')(token);
  },
  useVerificationToken: late('useVerificationToken'),
};

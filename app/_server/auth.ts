import 'server-only';
import { type NextAuthOptions } from 'next-auth';
import { type Adapter } from 'next-auth/adapters';
import CredentialsProvider from 'next-auth/providers/credentials';
import EmailProvider from 'next-auth/providers/email';
import { authAdapter } from '@/db/auth-adapter';
import { personByEmail } from '@/db/queries/people';
import { email as emailSchema, mostPasswordBytes, safePath } from '@/lib/schemas/account';
import { sendSignInLink } from './account-mail';
import { currentSender, senderIn, startMail, startTry, tryWorked } from './attempts';
import { environment } from './environment';
import { logFault } from './log';
import { passwordMatches } from './password';
import { say } from './said';

const linkHours = 2;

/** Throws codes that the sign-in form turns into words. Whoever has not confirmed the address yet may sign in too. */
async function authorize(credentials: Record<'email' | 'password', string> | undefined, sender: string) {
  const email = emailSchema.safeParse(credentials?.email);
  const password = credentials?.password ?? '';
  if (!email.success || password === '' || password.length > mostPasswordBytes) throw new Error('wrong');
  const wait = await startTry(email.data, sender);
  if (wait > 0) throw new Error(`wait:${wait}`);
  const person = personByEmail(email.data);
  if (!(await passwordMatches(password, person?.passwordHash)) || !person) throw new Error('wrong');
  await tryWorked(email.data, sender);
  return { id: person.id, email: person.email, name: person.name };
}

/** The link is about to prove the address, and the adapter drops a password from before: the person learns it on the next page. */
async function tellOfDroppedPassword(email: string) {
  const person = personByEmail(email);
  if (!person || person.emailVerified || !person.passwordHash) return;
  await say('Your address is confirmed. The password that was set before that no longer works; you can set a new one under Account.');
}

/** A cookie of an earlier secret is nobody's fault: whoever has it is simply signed out. */
function logTrouble(code: string, about: unknown) {
  if (code === 'JWT_SESSION_ERROR') return;
  const cause = about instanceof Error ? about : (about as { error?: unknown }).error;
  logFault(new Error(`next-auth ${code}: ${cause instanceof Error ? cause.message : String(cause)}`));
}

export const authOptions: NextAuthOptions = {
  adapter: authAdapter as unknown as Adapter,
  session: { strategy: 'jwt', maxAge: 60 * 24 * 3600 },
  pages: { signIn: '/sign-in', verifyRequest: '/check-mail', error: '/auth-error' },
  logger: { error: logTrouble },
  providers: [
    CredentialsProvider({
      name: 'password',
      credentials: { email: { label: 'E-mail' }, password: { label: 'Password', type: 'password' } },
      authorize: (credentials, request) => authorize(credentials, senderIn(request.headers?.['x-forwarded-for'] as string | undefined)),
    }),
    EmailProvider({
      maxAge: linkHours * 3600,
      from: 'unused: the outbox sends',
      normalizeIdentifier: (identifier) => identifier.trim().toLowerCase(),
      sendVerificationRequest: ({ identifier, url, token }) => sendSignInLink(identifier, url, token, linkHours),
    }),
  ],
  callbacks: {
    signIn: async ({ user, account, email }) => {
      if (account?.provider !== 'email') return true;
      const address = emailSchema.safeParse(user.email);
      if (!address.success) return `${environment().NEXTAUTH_URL}/auth-error?error=Address`;
      if (email?.verificationRequest) return (await startMail(address.data, await currentSender())) === 0;
      await tellOfDroppedPassword(address.data);
      return true;
    },
    jwt: ({ token, user }) => (user ? { sub: user.id, signedInAt: Date.now() } : token),
    session: ({ session, token }) => ({ ...session, user: { id: token.sub ?? '' }, signedInAt: Number(token.signedInAt ?? 0) }),
    redirect: ({ url, baseUrl }) => {
      const path = url.startsWith(baseUrl) ? url.slice(baseUrl.length) : url;
      return `${baseUrl}${safePath(path)}`;
    },
  },
};

import 'server-only';
import { type NextAuthOptions } from 'next-auth';
import { type Adapter } from 'next-auth/adapters';
import CredentialsProvider from 'next-auth/providers/credentials';
import EmailProvider from 'next-auth/providers/email';
import { authAdapter } from '@/db/auth-adapter';
import { personByEmail } from '@/db/queries/people';
import { email as emailSchema, safePath } from '@/lib/schemas/account';
import { sendSignInLink, sendVerifyLink } from './account-mail';
import { countAttempt, forgetAttempts } from './attempts';
import { passwordMatches } from './password';

const linkHours = 2;

/** Error codes that the sign-in form turns into words. */
async function authorize(credentials: Record<'email' | 'password', string> | undefined, sender: string) {
  const email = emailSchema.safeParse(credentials?.email);
  const password = credentials?.password ?? '';
  if (!email.success || password === '' || password.length > 400) throw new Error('wrong');
  const wait = await countAttempt(email.data, sender);
  if (wait > 0) throw new Error(`wait:${wait}`);
  const person = personByEmail(email.data);
  if (!(await passwordMatches(password, person?.passwordHash)) || !person) throw new Error('wrong');
  if (!person.emailVerified) {
    await sendVerifyLink(person);
    throw new Error('unverified');
  }
  await forgetAttempts(email.data);
  return { id: person.id, email: person.email, name: person.name };
}

const senderOf = (headers: Record<string, unknown> | undefined) => String(headers?.['x-forwarded-for'] ?? 'local').split(',')[0]?.trim() ?? 'local';

// The adapter opens the database when it is first asked, not when this module loads.
const lazyAdapter = new Proxy({} as Adapter, { get: (_, method) => authAdapter()[method as keyof ReturnType<typeof authAdapter>] });

export const authOptions: NextAuthOptions = {
  adapter: lazyAdapter,
  session: { strategy: 'jwt', maxAge: 60 * 24 * 3600 },
  pages: { signIn: '/sign-in', verifyRequest: '/check-mail', error: '/auth-error', newUser: '/start' },
  providers: [
    CredentialsProvider({
      name: 'password',
      credentials: { email: { label: 'E-mail' }, password: { label: 'Password', type: 'password' } },
      authorize: (credentials, request) => authorize(credentials, senderOf(request.headers)),
    }),
    EmailProvider({
      maxAge: linkHours * 3600,
      from: 'unused: the outbox sends',
      normalizeIdentifier: (identifier) => emailSchema.parse(identifier),
      sendVerificationRequest: ({ identifier, url, token }) => sendSignInLink(identifier, url, token, linkHours),
    }),
  ],
  callbacks: {
    signIn: async ({ user, email }) => !email?.verificationRequest || (await countAttempt(`link:${user.email}`, 'links')) === 0,
    jwt: ({ token, user }) => (user ? { sub: user.id, signedInAt: Date.now() } : token),
    session: ({ session, token }) => ({ ...session, user: { id: token.sub ?? '' }, signedInAt: Number(token.signedInAt ?? 0) }),
    redirect: ({ url, baseUrl }) => {
      const path = url.startsWith(baseUrl) ? url.slice(baseUrl.length) : url;
      return `${baseUrl}${safePath(path)}`;
    },
  },
};

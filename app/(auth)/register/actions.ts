'use server';

import { redirect } from 'next/navigation';
import { sendAlreadyKnown, sendVerifyLink } from '@/app/_server/account-mail';
import { defineAction } from '@/app/_server/action';
import { hashPassword } from '@/app/_server/password';
import { personByEmail, registerPerson } from '@/db/queries/people';
import { registerSchema } from '@/lib/schemas/account';

/** Answers the same whether the address had an account or not; its holder learns the truth by mail. */
export const register = defineAction({
  verb: 'anyone',
  schema: registerSchema,
  prepare: ({ password }) => hashPassword(password),
  run: (_, { name, email, role, company }, passwordHash) => {
    const made = registerPerson({ name, email, role, company: role === 'contractor' ? company : undefined, passwordHash: passwordHash as string });
    return { made, known: made ? undefined : personByEmail(email) };
  },
  after: async ({ made, known }) => {
    if (made) await sendVerifyLink(made);
    else if (known && !known.emailVerified) await sendVerifyLink(known);
    else if (known) await sendAlreadyKnown(known);
    redirect('/check-mail');
  },
});

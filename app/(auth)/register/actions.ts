'use server';

import { redirect } from 'next/navigation';
import { sendAlreadyKnown, sendVerifyLink } from '@/app/_server/account-mail';
import { defineAction, FieldFault } from '@/app/_server/action';
import { currentSender, startMail, waitWords } from '@/app/_server/attempts';
import { hashPassword } from '@/app/_server/password';
import { personByEmail, registerPerson } from '@/db/queries/people';
import { registerSchema } from '@/lib/schemas/account';

/** Answers the same whether the address had an account or not; its holder learns the truth by mail. */
export const register = defineAction({
  verb: 'anyone',
  schema: registerSchema,
  prepare: async ({ email, password }) => {
    const wait = await startMail(email, await currentSender());
    return wait > 0 ? new FieldFault({ '': waitWords(wait) }) : hashPassword(password);
  },
  run: (_, { name, email, role, company }, prepared) => {
    if (prepared instanceof FieldFault) return prepared;
    const made = registerPerson({ name, email, role, company: role === 'contractor' ? company : undefined, passwordHash: prepared as string });
    return { made, known: made ? undefined : personByEmail(email) };
  },
  after: ({ made, known }) => {
    if (made) sendVerifyLink(made);
    else if (known && !known.emailVerified) sendVerifyLink(known);
    else if (known) sendAlreadyKnown(known);
    redirect('/check-mail');
  },
});

'use server';

import { redirect } from 'next/navigation';
import { sendResetLink } from '@/app/_server/account-mail';
import { defineAction, FieldFault } from '@/app/_server/action';
import { currentSender, startMail, waitWords } from '@/app/_server/attempts';
import { personByEmail } from '@/db/queries/people';
import { forgotSchema } from '@/lib/schemas/account';

/** Answers the same whether the address has an account or not. */
export const askForReset = defineAction({
  verb: 'anyone',
  schema: forgotSchema,
  prepare: async ({ email }) => startMail(email, await currentSender()),
  run: (_, { email }, wait) => (Number(wait) > 0 ? new FieldFault({ '': waitWords(Number(wait)) }) : { person: personByEmail(email) }),
  after: ({ person }) => {
    if (person) sendResetLink(person);
    redirect('/check-mail');
  },
});

'use server';

import { redirect } from 'next/navigation';
import { sendResetLink } from '@/app/_server/account-mail';
import { defineAction, FieldFault } from '@/app/_server/action';
import { countAttempt } from '@/app/_server/attempts';
import { personByEmail } from '@/db/queries/people';
import { forgotSchema } from '@/lib/schemas/account';

export const askForReset = defineAction({
  verb: 'anyone',
  schema: forgotSchema,
  prepare: ({ email }) => countAttempt(`reset:${email}`, 'reset'),
  run: (_, { email }, wait) => (Number(wait) > 0 ? new FieldFault({ '': `Too many tries. Wait ${String(wait)} minutes.` }) : { person: personByEmail(email) }),
  after: async (result) => {
    if (!(result instanceof FieldFault) && result.person) await sendResetLink(result.person);
    redirect('/check-mail');
  },
});

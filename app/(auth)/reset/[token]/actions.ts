'use server';

import { redirect } from 'next/navigation';
import { defineAction, FieldFault } from '@/app/_server/action';
import { hashPassword } from '@/app/_server/password';
import { tokenHolder, useToken as takeToken } from '@/db/queries/account-tokens';
import { setPassword } from '@/db/queries/people';
import { resetSchema } from '@/lib/schemas/account';

const stale = 'This link was used already, or it is older than one hour. Ask for a new one.';

export const resetPassword = defineAction({
  verb: 'anyone',
  schema: resetSchema,
  prepare: ({ password }) => hashPassword(password),
  run: (_, { token, password }, passwordHash) => {
    const now = new Date();
    const holder = tokenHolder(token, 'reset', now);
    if (!holder) return new FieldFault({ '': stale });
    if (password.toLowerCase() === holder.email) return new FieldFault({ password: 'The password may not be your e-mail address.' });
    takeToken(token, 'reset', now);
    setPassword(holder.id, passwordHash as string, now, { provesAddress: true });
    return null;
  },
  after: () => redirect('/sign-in?said=password-set'),
});

'use server';

import { defineAction, FieldFault } from '@/app/_server/action';
import { countAttempt } from '@/app/_server/attempts';
import { passwordMatches } from '@/app/_server/password';
import { tokenHolder, useToken as takeToken } from '@/db/queries/account-tokens';
import { markVerified } from '@/db/queries/people';
import { verifySchema } from '@/lib/schemas/account';

const stale = 'This link was used already, or it is older than two days. Sign in: if the address is not confirmed yet, a new link is sent.';

/** The password is asked for once more: whoever holds only the mailbox cannot confirm an account that somebody else made with its address. */
export const confirmAddress = defineAction({
  verb: 'anyone',
  schema: verifySchema,
  prepare: async ({ token, password }) => {
    const holder = tokenHolder(token, 'verify', new Date());
    if (!holder) return { fault: new FieldFault({ '': stale }) };
    const wait = await countAttempt(holder.email, 'verify');
    if (wait > 0) return { fault: new FieldFault({ '': `Too many tries. Wait ${wait} minutes.` }) };
    return (await passwordMatches(password, holder.passwordHash)) ? { holder } : { fault: new FieldFault({ password: 'This is not the password that the account was made with.' }) };
  },
  run: (_, { token }, prepared) => {
    const now = new Date();
    const { fault, holder } = prepared as { fault?: FieldFault; holder?: { id: string } };
    if (fault) return fault;
    if (!holder || !takeToken(token, 'verify', now)) return new FieldFault({ '': stale });
    markVerified(holder.id, now);
    return null;
  },
});

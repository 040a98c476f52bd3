'use server';

import { defineAction, FieldFault } from '@/app/_server/action';
import { currentActor } from '@/app/_server/actor';
import { currentSender, startTry, tryWorked, waitWords } from '@/app/_server/attempts';
import { passwordMatches } from '@/app/_server/password';
import { tokenHolder, useToken as takeToken } from '@/db/queries/account-tokens';
import { markVerified, type PersonRow } from '@/db/queries/people';
import { verifySchema } from '@/lib/schemas/account';

const stale = 'This link was used already, or it is older than two days. Sign in: a new one can be sent from there.';

/** Null when it is shown that the account is this person's own: by a session, or by its password. */
async function notTheirs(holder: PersonRow, password: string | undefined): Promise<FieldFault | null> {
  if ((await currentActor())?.id === holder.id) return null;
  if (!password) return new FieldFault({ password: 'The password is missing.' });
  const sender = await currentSender();
  const wait = await startTry(holder.email, sender);
  if (wait > 0) return new FieldFault({ '': waitWords(wait) });
  if (!(await passwordMatches(password, holder.passwordHash))) return new FieldFault({ password: 'This is not the password that the account was made with.' });
  await tryWorked(holder.email, sender);
  return null;
}

/** Needs the mailbox and the account: whoever holds only the mailbox does not confirm, by pressing a button, an account that somebody else made with the address. */
export const confirmAddress = defineAction({
  verb: 'anyone',
  schema: verifySchema,
  prepare: async ({ token, password }) => {
    const holder = tokenHolder(token, 'verify', new Date());
    return holder ? notTheirs(holder, password) : new FieldFault({ '': stale });
  },
  run: (_, { token }, fault) => {
    if (fault instanceof FieldFault) return fault;
    const now = new Date();
    const holder = tokenHolder(token, 'verify', now);
    if (!holder || !takeToken(token, 'verify', now)) return new FieldFault({ '': stale });
    markVerified(holder.id, now);
    return null;
  },
});

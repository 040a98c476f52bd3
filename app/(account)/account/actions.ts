'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { z } from 'zod';
import { sendVerifyLink } from '@/app/_server/account-mail';
import { defineAction, FieldFault } from '@/app/_server/action';
import { currentActor } from '@/app/_server/actor';
import { currentSender, startMail, startTry, tryWorked, waitWords } from '@/app/_server/attempts';
import { hashPassword, passwordMatches } from '@/app/_server/password';
import { endSessions, personById, profileOf, setPassword, updateProfile } from '@/db/queries/people';
import { resumeHome } from '@/db/queries/reminder-stops';
import { passwordSchema, profileSchema } from '@/lib/schemas/account';

export const saveProfile = defineAction({
  verb: 'signed in',
  schema: profileSchema,
  run: (actor, input) => {
    if (actor.role === 'contractor' && !input.company) return new FieldFault({ company: 'The company name is missing: owners look for it.' });
    return updateProfile(actor, input);
  },
  after: () => revalidatePath('/', 'layout'),
});

/** Null when whoever asks knows the password of today, or there is none. */
async function notKnown(current: string | undefined): Promise<FieldFault | null> {
  const actor = await currentActor();
  const profile = actor ? profileOf(actor) : undefined;
  if (!profile?.hasPassword) return null;
  const sender = await currentSender();
  const wait = await startTry(profile.email, sender);
  if (wait > 0) return new FieldFault({ '': waitWords(wait) });
  if (!(await passwordMatches(current ?? '', profile.passwordHash))) return new FieldFault({ current: 'This is not your password of today.' });
  await tryWorked(profile.email, sender);
  return null;
}

export const changePassword = defineAction({
  verb: 'signed in',
  schema: passwordSchema,
  prepare: async ({ current, password }) => (await notKnown(current)) ?? hashPassword(password),
  run: (actor, { password }, prepared) => {
    if (prepared instanceof FieldFault) return prepared;
    if (password.toLowerCase() === actor.email) return new FieldFault({ password: 'The password may not be your e-mail address.' });
    return setPassword(actor.id, prepared as string, new Date(), { provesAddress: false });
  },
  after: () => redirect('/sign-in?said=password-set'),
});

export const signOutEverywhere = defineAction({
  verb: 'signed in',
  schema: z.object({}),
  run: (actor) => endSessions(actor, new Date()),
  after: () => redirect('/sign-in?said=signed-out'),
});

export const sendVerifyAgain = defineAction({
  verb: 'signed in',
  schema: z.object({}),
  prepare: async () => startMail((await currentActor())?.email ?? '', await currentSender()),
  run: (actor, _, wait) => {
    if (Number(wait) > 0) return new FieldFault({ '': waitWords(Number(wait)) });
    return { person: personById(actor.id) };
  },
  after: ({ person }) => {
    if (person && !person.emailVerified) sendVerifyLink(person);
  },
});

export const remindAgain = defineAction({
  verb: 'signed in',
  schema: z.object({ homeId: z.string().min(1).max(60) }),
  run: (actor, { homeId }) => resumeHome(actor, homeId),
  after: () => revalidatePath('/account'),
});

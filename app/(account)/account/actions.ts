'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { defineAction, FieldFault } from '@/app/_server/action';
import { currentActor } from '@/app/_server/actor';
import { countAttempt } from '@/app/_server/attempts';
import { hashPassword, passwordMatches } from '@/app/_server/password';
import { endSessions, profileOf, setPassword, updateProfile } from '@/db/queries/people';
import { passwordSchema, profileSchema } from '@/lib/schemas/account';
import { z } from 'zod';

export const saveProfile = defineAction({
  verb: 'signed in',
  schema: profileSchema,
  run: (actor, input) => updateProfile(actor, input),
  after: () => revalidatePath('/', 'layout'),
});

export const changePassword = defineAction({
  verb: 'signed in',
  schema: passwordSchema,
  prepare: async ({ current, password }) => {
    const actor = await currentActor();
    const profile = actor ? profileOf(actor) : undefined;
    const wait = await countAttempt(`change:${profile?.email}`, 'change');
    if (wait > 0) return new FieldFault({ '': `Too many tries. Wait ${wait} minutes.` });
    const known = profile?.hasPassword ? await passwordMatches(current ?? '', profile.passwordHash) : true;
    return known ? hashPassword(password) : new FieldFault({ current: 'This is not your password of today.' });
  },
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

'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { defineAction, FieldFault } from '@/app/_server/action';
import { movePlan, sayMoves } from '@/app/_server/plan-moves';
import { homeView } from '@/db/queries/home-view';
import { homeOf } from '@/db/queries/homes';
import { logWork } from '@/db/queries/work';
import { dayIn } from '@/lib/calendar';
import { learnedChange } from '@/lib/home/learned-change';
import { dayNotYet } from '@/lib/home/not-yet';
import { walkaroundSchema } from '@/lib/schemas/walkaround';

/** Keeps a walkaround; the plan moves by what was seen, and the home's page says by how much and why. */
export const keepWalkaround = defineAction({
  verb: 'work.log',
  schema: walkaroundSchema,
  run: (actor, { homeId, submissionKey, doneOn, note, findings }) => {
    const now = new Date();
    const { home } = homeOf(actor, homeId, 'work.log');
    const today = dayIn(home.timeZone, now);
    if (doneOn > today) return new FieldFault({ doneOn: dayNotYet(doneOn, today) });
    const before = homeView(actor, homeId).walls;
    const work = { homeId, submissionKey, kind: 'walkaround' as const, doneOn, note, wallIds: findings.map(({ wallId }) => wallId) };
    const { moves } = movePlan(homeId, now, () => logWork(actor, work, findings));
    return [...moves, ...learnedChange(before, homeView(actor, homeId).walls)];
  },
  after: async (changes, { homeId }, actor) => {
    await sayMoves('Walkaround kept.', changes);
    revalidatePath(`/homes/${homeId}`, 'layout');
    redirect(actor.role === 'contractor' ? `/work/${homeId}` : `/homes/${homeId}`);
  },
});

'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { defineAction, FieldFault } from '@/app/_server/action';
import { say } from '@/app/_server/said';
import { itemsOf } from '@/db/queries/home-view';
import { homeOf } from '@/db/queries/homes';
import { changeHome } from '@/db/queries/replan';
import { wallsOfHome } from '@/db/queries/walls';
import { logWork } from '@/db/queries/work';
import { dayIn } from '@/lib/calendar';
import { dayNotYet } from '@/lib/home/not-yet';
import { planChange } from '@/lib/home/plan-change';
import { logWorkSchema } from '@/lib/schemas/work';

/** Logs a piece of work; the clocks of its walls restart, and the home's page says what moved. */
export const log = defineAction({
  verb: 'work.log',
  schema: logWorkSchema,
  run: (actor, input) => {
    const now = new Date();
    const { home } = homeOf(actor, input.homeId, 'work.log');
    const today = dayIn(home.timeZone, now);
    if (input.doneOn > today) return new FieldFault({ doneOn: dayNotYet(input.doneOn, today) });
    const before = itemsOf([home.id]);
    const { isNew } = changeHome(home.id, now, () => logWork(actor, input));
    const walls = wallsOfHome(home.id).map(({ wall }) => wall);
    return { isNew, changes: planChange(before, itemsOf([home.id]), walls) };
  },
  after: async ({ isNew, changes }, { homeId }, actor) => {
    await say(isNew ? ['Logged.', ...(changes.length > 0 ? changes : ['Nothing in the plan moves.'])].join(' ') : 'Logged. It arrived twice and made one record. To log more work, open the form again.');
    revalidatePath(`/homes/${homeId}`, 'layout');
    redirect(actor.role === 'contractor' ? `/work/${homeId}` : `/homes/${homeId}`);
  },
});

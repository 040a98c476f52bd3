'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { defineAction, FieldFault } from '@/app/_server/action';
import { movePlan, sayMoves } from '@/app/_server/plan-moves';
import { say } from '@/app/_server/said';
import { homeOf } from '@/db/queries/homes';
import { logWork } from '@/db/queries/work';
import { dayIn } from '@/lib/calendar';
import { dayNotYet } from '@/lib/home/not-yet';
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
    const { result, moves } = movePlan(home.id, now, () => logWork(actor, input));
    return { isNew: result.isNew, moves };
  },
  after: async ({ isNew, moves }, { homeId }, actor) => {
    await (isNew ? sayMoves('Logged.', moves) : say('Logged. It arrived twice and made one record. To log more work, open the form again.'));
    revalidatePath(`/homes/${homeId}`, 'layout');
    redirect(actor.role === 'contractor' ? `/work/${homeId}` : `/homes/${homeId}`);
  },
});

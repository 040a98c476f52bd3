'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { defineAction } from '@/app/_server/action';
import { movePlan, sayMoves } from '@/app/_server/plan-moves';
import { setCosts } from '@/db/queries/costs';
import { homeOf } from '@/db/queries/homes';
import { sharingChange } from '@/lib/home/budget-words';
import { costsSchema } from '@/lib/schemas/costs';

/** Keeps what work costs at a home; the plan may gather walls into other trips, and the page says so. */
export const saveCosts = defineAction({
  verb: 'home.edit',
  schema: costsSchema,
  run: (actor, { homeId, costs }) => {
    const now = new Date();
    const shared = () => homeOf(actor, homeId, 'home.edit').home.grouping?.months ?? null;
    const before = shared();
    const { moves } = movePlan(homeId, now, () => setCosts(actor, homeId, costs, now));
    return [sharingChange(before, shared()), ...moves].filter((words) => words !== null);
  },
  after: async (changes, { homeId }) => {
    await sayMoves('The prices are saved.', changes);
    revalidatePath(`/homes/${homeId}`, 'layout');
    redirect(`/homes/${homeId}/budget`);
  },
});

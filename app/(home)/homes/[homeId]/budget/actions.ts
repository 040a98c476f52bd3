'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { defineAction } from '@/app/_server/action';
import { say } from '@/app/_server/said';
import { setCosts } from '@/db/queries/costs';
import { itemsOf } from '@/db/queries/home-view';
import { homeOf } from '@/db/queries/homes';
import { changeHome } from '@/db/queries/replan';
import { wallsOfHome } from '@/db/queries/walls';
import { sharingChange } from '@/lib/home/budget-words';
import { planChange } from '@/lib/home/plan-change';
import { costsSchema } from '@/lib/schemas/costs';

/** Keeps what work costs at a home; the plan may gather walls into other trips, and the page says so. */
export const saveCosts = defineAction({
  verb: 'home.edit',
  schema: costsSchema,
  run: (actor, { homeId, costs }) => {
    const now = new Date();
    const shared = () => homeOf(actor, homeId, 'home.edit').home.grouping?.months ?? null;
    const [before, items] = [shared(), itemsOf([homeId])];
    changeHome(homeId, now, () => setCosts(actor, homeId, costs, now));
    const moves = planChange(items, itemsOf([homeId]), wallsOfHome(homeId).map(({ wall }) => wall));
    return [sharingChange(before, shared()), ...moves].filter((words) => words !== null);
  },
  after: async (changes, { homeId }) => {
    await say(['The prices are saved.', ...(changes.length > 0 ? changes : ['Nothing in the plan moves.'])].join(' '));
    revalidatePath(`/homes/${homeId}`, 'layout');
    redirect(`/homes/${homeId}/budget`);
  },
});

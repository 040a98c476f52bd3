'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { defineAction, FieldFault } from '@/app/_server/action';
import { say } from '@/app/_server/said';
import { itemsOf } from '@/db/queries/home-view';
import { removeOwnRule, setOwnRule } from '@/db/queries/own-rules';
import { changeHome } from '@/db/queries/replan';
import { careOfWall } from '@/db/queries/wall-care';
import { wallsOfHome } from '@/db/queries/walls';
import { previewOwnRule } from '@/lib/care/own-preview';
import { planChange } from '@/lib/home/plan-change';
import { faultField, ownRuleSchema, ruleTarget } from '@/lib/schemas/own-rule';

/** Keeps an owner's own rule; the wall's page says what moved. */
export const saveRule = defineAction({
  verb: 'home.edit',
  schema: ownRuleSchema,
  run: (actor, { homeId, wallId, kind, how, rule, startOn }) => {
    const now = new Date();
    const { home, today } = careOfWall(actor, homeId, wallId, now);
    const preview = previewOwnRule(home, { wallId, kind, rule, startOn }, today);
    if (!preview.ok) return new FieldFault({ [faultField(how, preview.about)]: preview.error });
    const before = itemsOf([homeId]);
    changeHome(homeId, now, () => setOwnRule(actor, homeId, wallId, kind, { rule, startOn }));
    return planChange(before, itemsOf([homeId]), wallsOfHome(homeId).map(({ wall }) => wall));
  },
  after: async (changes, { homeId, wallId }) => {
    await say(['Your rule is saved.', ...(changes.length > 0 ? changes : ['Nothing in the plan moves.'])].join(' '));
    revalidatePath(`/homes/${homeId}`, 'layout');
    redirect(`/homes/${homeId}/walls/${wallId}`);
  },
});

/** Goes back to the computed rule. */
export const dropRule = defineAction({
  verb: 'home.edit',
  schema: ruleTarget,
  run: (actor, { homeId, wallId, kind }) => {
    const before = itemsOf([homeId]);
    changeHome(homeId, new Date(), () => removeOwnRule(actor, homeId, wallId, kind));
    return planChange(before, itemsOf([homeId]), wallsOfHome(homeId).map(({ wall }) => wall));
  },
  after: async (changes, { homeId, wallId }) => {
    await say(['The plan goes by the computed rule again.', ...(changes.length > 0 ? changes : ['Nothing in the plan moves.'])].join(' '));
    revalidatePath(`/homes/${homeId}`, 'layout');
    redirect(`/homes/${homeId}/walls/${wallId}`);
  },
});

'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { defineAction, FieldFault } from '@/app/_server/action';
import { movePlan, sayMoves } from '@/app/_server/plan-moves';
import { removeOwnRule, setOwnRule } from '@/db/queries/own-rules';
import { careOfWall } from '@/db/queries/wall-care';
import { previewOwnRule } from '@/lib/care/own-preview';
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
    return movePlan(homeId, now, () => setOwnRule(actor, homeId, wallId, kind, { rule, startOn })).moves;
  },
  after: async (moves, { homeId, wallId }) => {
    await sayMoves('Your rule is saved.', moves);
    revalidatePath(`/homes/${homeId}`, 'layout');
    redirect(`/homes/${homeId}/walls/${wallId}`);
  },
});

/** Goes back to the computed rule. */
export const dropRule = defineAction({
  verb: 'home.edit',
  schema: ruleTarget,
  run: (actor, { homeId, wallId, kind }) => movePlan(homeId, new Date(), () => removeOwnRule(actor, homeId, wallId, kind)).moves,
  after: async (moves, { homeId, wallId }) => {
    await sayMoves('The plan goes by the computed rule again.', moves);
    revalidatePath(`/homes/${homeId}`, 'layout');
    redirect(`/homes/${homeId}/walls/${wallId}`);
  },
});

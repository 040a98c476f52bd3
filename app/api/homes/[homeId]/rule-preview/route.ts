import { defineHandler } from '@/app/_server/handler';
import { careOfWall } from '@/db/queries/wall-care';
import { previewOwnRule } from '@/lib/care/own-preview';
import { ownRuleSchema } from '@/lib/schemas/own-rule';

/** The days of an own rule before it is saved, or why it is refused. Nothing is kept. */
export const POST = defineHandler({
  verb: 'home.edit',
  schema: ownRuleSchema,
  run: ({ actor, params, input: { wallId, kind, rule, startOn } }) => {
    const { home, today } = careOfWall(actor, params.homeId ?? '', wallId, new Date());
    return previewOwnRule(home, { wallId, kind, rule, startOn }, today);
  },
});

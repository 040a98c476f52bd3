'use server';

import { type Route } from 'next';
import { redirect } from 'next/navigation';
import { defineAction, FieldFault } from '@/app/_server/action';
import { movePlan, sayMoves } from '@/app/_server/plan-moves';
import { putOffWork, takeUpWork } from '@/db/queries/put-off';
import { putOffSchema } from '@/lib/schemas/put-off';

export const putOff = defineAction({
  verb: 'work.putOff',
  schema: putOffSchema,
  run: (actor, { homeId, kind, wallIds }) => {
    const now = new Date();
    const { result, moves } = movePlan(homeId, now, () => putOffWork(actor, homeId, kind, wallIds, now));
    return result === 0 ? new FieldFault({ '': 'The plan holds no such work on these walls any more. Open it again from the plan.' }) : moves;
  },
  after: async (moves, { homeId, kind, wallIds }) => {
    await sayMoves('Put off.', moves);
    redirect(`/homes/${homeId}/plan?${new URLSearchParams([['kind', kind], ...wallIds.map((id) => ['wall', id])])}` as Route);
  },
});

export const takeUp = defineAction({
  verb: 'work.putOff',
  schema: putOffSchema,
  run: (actor, { homeId, kind, wallIds }) => {
    const now = new Date();
    return movePlan(homeId, now, () => takeUpWork(actor, homeId, kind, wallIds, now)).moves;
  },
  after: async (moves, { homeId }) => {
    await sayMoves('Taken up again.', moves);
    redirect(`/homes/${homeId}/plan`);
  },
});

'use server';

import { type Route } from 'next';
import { redirect } from 'next/navigation';
import { defineAction } from '@/app/_server/action';
import { movePlan, sayMoves } from '@/app/_server/plan-moves';
import { homeOfRecord, removeRecord, restoreRecord } from '@/db/queries/work';
import { type Actor } from '@/lib/permissions';
import { recordTarget } from '@/lib/schemas/targets';

/** The page that lists the records to this reader. */
const recordPage = (actor: Actor, homeId: string, query = '') => `${actor.role === 'contractor' ? `/work/${homeId}` : `/homes/${homeId}/record`}${query}` as Route;

function change(actor: Actor, recordId: string, work: (now: Date) => unknown) {
  const now = new Date();
  const homeId = homeOfRecord(actor, recordId);
  return { homeId, moves: movePlan(homeId, now, () => work(now)).moves };
}

export const takeBack = defineAction({
  verb: 'work.remove',
  schema: recordTarget,
  run: (actor, { recordId }) => change(actor, recordId, (now) => removeRecord(actor, recordId, now)),
  after: async ({ homeId, moves }, { recordId }, actor) => {
    await sayMoves('Taken back.', moves);
    redirect(recordPage(actor, homeId, `?removed=${recordId}`));
  },
});

export const putBack = defineAction({
  verb: 'work.remove',
  schema: recordTarget,
  run: (actor, { recordId }) => change(actor, recordId, () => restoreRecord(actor, recordId)),
  after: async ({ homeId, moves }, _input, actor) => {
    await sayMoves('Back in the record.', moves);
    redirect(recordPage(actor, homeId));
  },
});

'use server';

import { type Route } from 'next';
import { redirect } from 'next/navigation';
import { defineAction } from '@/app/_server/action';
import { say } from '@/app/_server/said';
import { itemsOf } from '@/db/queries/home-view';
import { changeHome } from '@/db/queries/replan';
import { wallsOfHome } from '@/db/queries/walls';
import { homeOfRecord, removeRecord, restoreRecord } from '@/db/queries/work';
import { type Actor } from '@/lib/permissions';
import { planChange } from '@/lib/home/plan-change';
import { recordTarget } from '@/lib/schemas/targets';

/** The page that lists the records to this reader. */
const recordPage = (actor: Actor, homeId: string, query = '') => `${actor.role === 'contractor' ? `/work/${homeId}` : `/homes/${homeId}/record`}${query}` as Route;

function change(actor: Actor, recordId: string, work: (now: Date) => unknown) {
  const now = new Date();
  const homeId = homeOfRecord(actor, recordId);
  const before = itemsOf([homeId]);
  changeHome(homeId, now, () => work(now));
  const walls = wallsOfHome(homeId).map(({ wall }) => wall);
  return { homeId, changes: planChange(before, itemsOf([homeId]), walls) };
}

export const takeBack = defineAction({
  verb: 'work.remove',
  schema: recordTarget,
  run: (actor, { recordId }) => change(actor, recordId, (now) => removeRecord(actor, recordId, now)),
  after: async ({ homeId, changes }, { recordId }, actor) => {
    await say(['Taken back.', ...changes].join(' '));
    redirect(recordPage(actor, homeId, `?removed=${recordId}`));
  },
});

export const putBack = defineAction({
  verb: 'work.remove',
  schema: recordTarget,
  run: (actor, { recordId }) => change(actor, recordId, () => restoreRecord(actor, recordId)),
  after: async ({ homeId, changes }, _input, actor) => {
    await say(['Back in the record.', ...changes].join(' '));
    redirect(recordPage(actor, homeId));
  },
});

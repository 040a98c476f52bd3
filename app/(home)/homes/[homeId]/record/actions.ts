'use server';

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
  after: async ({ homeId, changes }, { recordId }) => {
    await say(['Taken back.', ...changes].join(' '));
    redirect(`/homes/${homeId}/record?removed=${recordId}`);
  },
});

export const putBack = defineAction({
  verb: 'work.remove',
  schema: recordTarget,
  run: (actor, { recordId }) => change(actor, recordId, () => restoreRecord(actor, recordId)),
  after: async ({ homeId, changes }) => {
    await say(['Back in the record.', ...changes].join(' '));
    redirect(`/homes/${homeId}/record`);
  },
});

'use server';

import { type Route } from 'next';
import { redirect } from 'next/navigation';
import { defineAction, FieldFault } from '@/app/_server/action';
import { say } from '@/app/_server/said';
import { itemsOf } from '@/db/queries/home-view';
import { putOffWork, takeUpWork } from '@/db/queries/put-off';
import { changeHome } from '@/db/queries/replan';
import { wallsOfHome } from '@/db/queries/walls';
import { planChange } from '@/lib/home/plan-change';
import { putOffSchema } from '@/lib/schemas/put-off';

function moved<T>(homeId: string, work: (now: Date) => T): { result: T; changes: string[] } {
  const now = new Date();
  const before = itemsOf([homeId]);
  const result = changeHome(homeId, now, () => work(now));
  const walls = wallsOfHome(homeId).map(({ wall }) => wall);
  return { result, changes: planChange(before, itemsOf([homeId]), walls) };
}

export const putOff = defineAction({
  verb: 'work.putOff',
  schema: putOffSchema,
  run: (actor, { homeId, kind, wallIds }) => {
    const { result, changes } = moved(homeId, (now) => putOffWork(actor, homeId, kind, wallIds, now));
    return result === 0 ? new FieldFault({ '': 'The plan holds no such work on these walls any more. Open it again from the plan.' }) : changes;
  },
  after: async (changes, { homeId, kind, wallIds }) => {
    await say(['Put off.', ...changes].join(' '));
    redirect(`/homes/${homeId}/plan?${new URLSearchParams([['kind', kind], ...wallIds.map((id) => ['wall', id])])}` as Route);
  },
});

export const takeUp = defineAction({
  verb: 'work.putOff',
  schema: putOffSchema,
  run: (actor, { homeId, kind, wallIds }) => moved(homeId, (now) => takeUpWork(actor, homeId, kind, wallIds, now)).changes,
  after: async (changes, { homeId }) => {
    await say(['Taken up again.', ...changes].join(' '));
    redirect(`/homes/${homeId}/plan`);
  },
});

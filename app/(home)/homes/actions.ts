'use server';

import { redirect } from 'next/navigation';
import { defineAction, FieldFault } from '@/app/_server/action';
import { say } from '@/app/_server/said';
import { archiveHome, restoreHome } from '@/db/queries/homes';
import { replanHome } from '@/db/queries/replan';
import { homeTarget } from '@/lib/schemas/targets';

/** Takes a home out of every list; the list offers it back. */
export const archive = defineAction({
  verb: 'home.archive',
  schema: homeTarget,
  run: (actor, { homeId }) => archiveHome(actor, homeId, new Date()),
  after: (_, { homeId }) => redirect(`/homes?archived=${homeId}`),
});

export const restore = defineAction({
  verb: 'home.archive',
  schema: homeTarget,
  run: (actor, { homeId }) => {
    if (!restoreHome(actor, homeId)) return new FieldFault({ '': 'There is no archived home of yours to bring back.' });
    replanHome(homeId, new Date());
    return homeId;
  },
  after: async (homeId) => {
    await say('The home is back, with everything that was in it.');
    redirect(`/homes/${homeId}`);
  },
});

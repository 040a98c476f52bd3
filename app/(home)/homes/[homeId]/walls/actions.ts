'use server';

import { redirect } from 'next/navigation';
import { z } from 'zod';
import { defineAction, FieldFault } from '@/app/_server/action';
import { movePlan, sayMoves } from '@/app/_server/plan-moves';
import { say } from '@/app/_server/said';
import { homeOf } from '@/db/queries/homes';
import { changeHome } from '@/db/queries/replan';
import { addWall, removeWall, restoreWall, updateWall, wallOf } from '@/db/queries/walls';
import { dayIn } from '@/lib/calendar';
import { notYet } from '@/lib/home/not-yet';
import { homeTarget, wallTarget } from '@/lib/schemas/targets';
import { wallSchema } from '@/lib/schemas/wall';

export const addWallToHome = defineAction({
  verb: 'home.edit',
  schema: z.intersection(homeTarget, wallSchema),
  run: (actor, { homeId, ...change }) => {
    const now = new Date();
    const { home } = homeOf(actor, homeId, 'home.edit');
    const early = notYet(change, dayIn(home.timeZone, now));
    if (early) return new FieldFault(early);
    return changeHome(homeId, now, () => addWall(actor, homeId, change));
  },
  after: async (wall) => {
    await say(`${wall.name} is part of the home now.`);
    redirect(`/homes/${wall.homeId}/walls/${wall.id}`);
  },
});

export const saveWall = defineAction({
  verb: 'home.edit',
  schema: z.intersection(wallTarget, wallSchema),
  run: (actor, { homeId, wallId, ...change }) => {
    const now = new Date();
    const { home } = wallOf(actor, homeId, wallId, 'home.edit');
    const early = notYet(change, dayIn(home.timeZone, now));
    if (early) return new FieldFault(early);
    return movePlan(homeId, now, () => updateWall(actor, wallId, { ...change, colorName: change.colorName ?? null }));
  },
  after: async ({ result: wall, moves }) => {
    await sayMoves(`${wall.name} is saved.`, moves);
    redirect(`/homes/${wall.homeId}/walls/${wall.id}`);
  },
});

export const takeOutWall = defineAction({
  verb: 'home.edit',
  schema: wallTarget,
  run: (actor, { homeId, wallId }) => {
    wallOf(actor, homeId, wallId, 'home.edit');
    return changeHome(homeId, new Date(), () => removeWall(actor, wallId, new Date()));
  },
  after: (_, { homeId, wallId }) => redirect(`/homes/${homeId}?removed=${wallId}`),
});

export const bringBackWall = defineAction({
  verb: 'home.edit',
  schema: wallTarget,
  run: (actor, { homeId, wallId }) => changeHome(homeId, new Date(), () => restoreWall(actor, homeId, wallId)),
  after: async (_, { homeId, wallId }) => {
    await say('The wall is back, with its history.');
    redirect(`/homes/${homeId}/walls/${wallId}`);
  },
});

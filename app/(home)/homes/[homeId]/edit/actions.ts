'use server';

import { redirect } from 'next/navigation';
import { z } from 'zod';
import { defineAction, FieldFault } from '@/app/_server/action';
import { movePlan, sayMoves } from '@/app/_server/plan-moves';
import { siteFault } from '@/app/_server/site-fault';
import { homeOf, updateHome } from '@/db/queries/homes';
import { siteFor } from '@/db/queries/site';
import { turnWalls } from '@/db/queries/walls';
import { homeSchema } from '@/lib/schemas/home';
import { homeTarget, turnSchema } from '@/lib/schemas/targets';

export const saveHome = defineAction({
  verb: 'home.edit',
  schema: z.intersection(homeTarget, homeSchema),
  run: (actor, input) => {
    homeOf(actor, input.homeId, 'home.edit');
    const site = siteFor(input);
    if (!site.found) return new FieldFault(siteFault(site));
    const { name, postalCode, wood, sidingNominalIn } = input;
    const facts = { name, postalCode, wood, sidingNominalIn, elevationM: input.elevationM ?? null, yearBuilt: input.yearBuilt ?? null, climateZoneOverride: input.climateZoneOverride ?? null };
    return movePlan(input.homeId, new Date(), () => updateHome(actor, input.homeId, { ...site.site, ...facts }));
  },
  after: async ({ result: home, moves }) => {
    await sayMoves(`${home.name} is saved.`, moves);
    redirect(`/homes/${home.id}`);
  },
});

/** Turns the whole house: every wall keeps its place and takes the new direction. */
export const turnHome = defineAction({
  verb: 'home.edit',
  schema: turnSchema,
  run: (actor, { homeId, compassDeg }) => {
    const { home } = homeOf(actor, homeId, 'home.edit');
    return movePlan(homeId, new Date(), () => {
      turnWalls(actor, homeId, compassDeg - home.compassDeg);
      updateHome(actor, homeId, { compassDeg });
    }).moves;
  },
  after: async (moves, { homeId }) => {
    await sayMoves('The house is turned; the sun on every wall was worked out anew.', moves);
    redirect(`/homes/${homeId}`);
  },
});

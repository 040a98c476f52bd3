'use server';

import { redirect } from 'next/navigation';
import { defineAction, FieldFault } from '@/app/_server/action';
import { say } from '@/app/_server/said';
import { siteFault } from '@/app/_server/site-fault';
import { createHome } from '@/db/queries/homes';
import { replanHome } from '@/db/queries/replan';
import { siteFor } from '@/db/queries/site';
import { addWall } from '@/db/queries/walls';
import { dayIn } from '@/lib/calendar';
import { fourWalls } from '@/lib/home/four-walls';
import { notYet } from '@/lib/home/not-yet';
import { newHomeSchema } from '@/lib/schemas/home';

/** Sets up a home with four walls and plans it. */
export const create = defineAction({
  verb: 'home.create',
  schema: newHomeSchema,
  run: (actor, input) => {
    const now = new Date();
    const site = siteFor(input);
    if (!site.found) return new FieldFault(siteFault(site));
    const early = notYet(input, dayIn(site.site.timeZone, now));
    if (early) return new FieldFault(early);
    const { name, postalCode, elevationM, climateZoneOverride, compassDeg, wood, sidingNominalIn, yearBuilt } = input;
    const home = createHome(actor, { ...site.site, name, postalCode, elevationM, climateZoneOverride, compassDeg, wood, sidingNominalIn, yearBuilt });
    const { finish, stainBase, colorHex, colorName, texture, sealant, stained, caulked } = input;
    for (const wall of fourWalls(input)) {
      addWall(actor, home.id, { ...wall, finish, stainBase, colorHex, colorName, texture, sealant, stained, caulked, openings: [] }, wall.position);
    }
    replanHome(home.id, now);
    return home;
  },
  after: async (home) => {
    await say(`${home.name} is set up with four walls. Open a wall to correct its own size, windows and dates.`);
    redirect(`/homes/${home.id}`);
  },
});

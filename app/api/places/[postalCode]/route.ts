import { z } from 'zod';
import { defineHandler } from '@/app/_server/handler';
import { problem } from '@/app/_server/problem';
import { siteFor } from '@/db/queries/site';
import { postalCode } from '@/lib/schemas/home';

const degrees = z.coerce.number().min(-180).max(180).optional();

/** Where a postal code is: place, county, climate zone, station; or the question that is open. */
export const GET = defineHandler({
  verb: 'signed in',
  schema: z.object({ latitude: degrees, longitude: degrees, climateZoneOverride: z.string().max(2).optional() }),
  run: ({ input, params }) => {
    const code = postalCode.safeParse(params.postalCode);
    if (!code.success) return problem(422, 'Not a postal code', code.error.issues[0]?.message);
    return siteFor({ ...input, postalCode: code.data });
  },
});

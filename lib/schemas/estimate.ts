import { z } from 'zod';
import { choice } from '@/lib/schemas/measures';
import { keysOf, textures } from '@/lib/schemas/vocabulary';
import { profileFactor, sidingProfile } from '@/lib/takeoff';
import { exampleContainers } from '@/lib/takeoff/stain';
import { squareMetresPerSquareFoot } from '@/lib/units';

const between = (min: number, max: number, what: string) => z.number({ error: `${what} should be a number.` }).min(min, `${what} should be at least ${min}.`).max(max, `${what} should be at most ${max}.`);

const feet = z.object({
  widthFt: between(0.1, 400, 'Width'),
  heightFt: between(0.1, 100, 'Height'),
  gableHeightFt: between(0, 60, 'Gable height').default(0),
  openings: z.array(z.object({ widthFt: between(0, 60, 'Width'), heightFt: between(0, 60, 'Height'), count: z.number().int().min(1).max(100).default(1) })).max(100).default([]),
});

const wallArea = feet.transform((wall, ctx) => {
  const holes = wall.openings.reduce((sum, one) => sum + one.widthFt * one.heightFt * one.count, 0);
  const areaFt2 = wall.widthFt * (wall.heightFt + wall.gableHeightFt / 2) - holes;
  if (areaFt2 < 0) ctx.addIssue({ code: 'custom', path: ['openings'], message: 'The doors and windows are larger than the wall.' });
  return Math.max(0, areaFt2);
});

const profile = z
  .union([z.object({ nominalIn: z.union([z.literal(6), z.literal(8), z.literal(10)]), crownHeightIn: between(0, 4, 'Crown height').default(1) }), z.object({ exposedFaceIn: between(1, 24, 'Exposed face'), crownHeightIn: between(0, 12, 'Crown height') })])
  .transform((given, ctx) => {
    const exposedFaceIn = 'nominalIn' in given ? (sidingProfile(given.nominalIn)?.exposedFaceIn ?? NaN) : given.exposedFaceIn;
    if (given.crownHeightIn <= exposedFaceIn / 2) return profileFactor(exposedFaceIn, given.crownHeightIn);
    ctx.addIssue({ code: 'custom', path: ['crownHeightIn'], message: 'The crown cannot be higher than half the exposed face.' });
    return z.NEVER;
  });

const coverage = z.object({ low: between(20, 2000, 'Coverage'), high: between(20, 2000, 'Coverage') }).refine(({ low, high }) => high >= low, { path: ['high'], error: 'The upper coverage is less than the lower.' });

const container = z.object({ gal: between(1 / 128, 60, 'Container size'), priceCents: z.number({ error: 'The price should be a number of cents.' }).int().min(0, 'The price cannot be negative.').max(10_000_000) });

/** Body of POST /api/estimates/stain. Walls in ft, or one area in ft² or m². */
export const estimateSchema = z
  .object({
    walls: z.array(wallArea).min(1, 'At least one wall.').max(200, 'At most 200 walls.').optional(),
    areaFt2: between(0, 100_000, 'Area').optional(),
    areaM2: between(0, 10_000, 'Area').optional(),
    profile: profile.default(profileFactor(6.625, 1)),
    texture: choice(keysOf(textures), 'a surface'),
    coats: z.number({ error: 'Coats should be 1, 2 or 3.' }).int('Coats should be 1, 2 or 3.').min(1, 'Coats should be 1, 2 or 3.').max(3, 'Coats should be 1, 2 or 3.').default(2),
    coverageFt2PerGal: coverage.optional(),
    wastePercent: between(0, 50, 'Waste').default(10),
    containers: z.array(container).min(1, 'At least one container size.').max(12, 'At most 12 container sizes.').default(exampleContainers),
  })
  .transform((body, ctx) => {
    const given = [body.walls, body.areaFt2, body.areaM2].filter((one) => one !== undefined).length;
    if (given !== 1) ctx.addIssue({ code: 'custom', path: ['walls'], message: 'Give either walls, areaFt2 or areaM2.' });
    const areaM2 = body.areaM2 ?? (body.areaFt2 ?? (body.walls ?? []).reduce((sum, area) => sum + area, 0)) * squareMetresPerSquareFoot;
    return {
      areaM2,
      profileFactor: body.profile,
      texture: body.texture,
      coats: body.coats,
      coverage: body.coverageFt2PerGal,
      wasteShare: body.wastePercent / 100,
      sizes: body.containers,
    };
  });

export type EstimateBody = z.input<typeof estimateSchema>;

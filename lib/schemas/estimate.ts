import { z } from 'zod';
import { choice } from '@/lib/schemas/measures';
import { keysOf, textures, unitSystems } from '@/lib/schemas/vocabulary';
import { sidingProfile, wallAreaM2 } from '@/lib/takeoff';
import { exampleContainers } from '@/lib/takeoff/stain';
import { feetToMetres, squareMetresPerSquareFoot } from '@/lib/units';

export const between = (min: number, max: number, what: string) => z.number({ error: `${what} should be a number.` }).min(min, `${what} should be at least ${min}.`).max(max, `${what} should be at most ${max}.`);
export const whole = (min: number, max: number, words: string) => z.number({ error: words }).int(words).min(min, words).max(max, words);

/** A list whose length is judged before its members, so that an endless one costs nothing. */
export const list = <S extends z.ZodType>(member: S, most: number, what: string, least = 0) =>
  z.array(z.unknown(), { error: `${what} should be a list.` }).min(least, `At least one of ${what.toLowerCase()}.`).max(most, `${what}: at most ${most}.`).pipe(z.array(member));

const opening = z
  .object({ widthFt: between(0, 60, 'Width'), heightFt: between(0, 60, 'Height'), count: whole(1, 100, 'The count should be a whole number from 1 to 100.').default(1) })
  .transform(({ widthFt, heightFt, count }) => ({ widthM: feetToMetres(widthFt), heightM: feetToMetres(heightFt), count }));

export const wall = z
  .object({ widthFt: between(0.1, 400, 'Width'), heightFt: between(0.1, 100, 'Height'), gableHeightFt: between(0, 60, 'Gable height').default(0), openings: list(opening, 100, 'Openings').default([]) })
  .transform(({ widthFt, heightFt, gableHeightFt, openings }, ctx) => {
    const solid = { widthM: feetToMetres(widthFt), heightM: feetToMetres(heightFt), gableHeightM: feetToMetres(gableHeightFt) };
    const holesM2 = openings.reduce((sum, one) => sum + one.widthM * one.heightM * one.count, 0);
    if (holesM2 > wallAreaM2(solid) * (1 + 1e-9)) ctx.addIssue({ code: 'custom', path: ['openings'], message: 'The doors and windows are larger than the wall.' });
    return { ...solid, openings };
  });

const nominal = z.literal([6, 8, 10], { error: 'The nominal width should be 6, 8 or 10.' });

/** Chord and crown of a course's face, in: by the siding's nominal width, with the usual inch of crown unless said, or both as measured. */
const profile = z
  .preprocess(
    (given) => (typeof given === 'number' ? { nominalIn: given } : given),
    z.object({ nominalIn: nominal.optional(), exposedFaceIn: between(1, 24, 'Exposed face').optional(), crownHeightIn: between(0, 12, 'Crown height').optional() }, { error: 'The profile should be a nominal width, or an exposed face and a crown height.' }),
  )
  .transform(({ nominalIn, exposedFaceIn, crownHeightIn }, ctx) => {
    const face = exposedFaceIn ?? (nominalIn === undefined ? undefined : sidingProfile(nominalIn)?.exposedFaceIn);
    const crown = crownHeightIn ?? (exposedFaceIn === undefined ? 1 : undefined);
    const fault = (path: string, message: string) => {
      ctx.addIssue({ code: 'custom', path: [path], message });
      return z.NEVER;
    };
    if (face === undefined) return fault('exposedFaceIn', 'Give the nominal width or the exposed face of a course.');
    if (crown === undefined) return fault('crownHeightIn', 'Give the crown height with the exposed face.');
    if (crown > face / 2) return fault('crownHeightIn', 'The crown cannot be higher than half the exposed face.');
    return { exposedFaceIn: face, crownHeightIn: crown };
  });

const coverage = z
  .object({ low: between(20, 2000, 'Coverage'), high: between(20, 2000, 'Coverage') }, { error: 'Coverage should be a range: low and high.' })
  .refine(({ low, high }) => high >= low, { path: ['high'], error: 'The upper coverage is less than the lower.' });

const cents = 'The price should be a whole number of cents, 0 or more.';
const container = z.object({ gal: between(1 / 128, 60, 'Container size'), priceCents: whole(0, 10_000_000, cents) });

const mostM2 = 100_000 * squareMetresPerSquareFoot;

/** Body of POST /api/estimates/stain. Walls in ft, or one area in ft² or m². */
export const estimateSchema = z
  .object(
    {
      units: z.enum(keysOf(unitSystems), { error: 'Units should be us or metric.' }).default('us'),
      walls: list(wall, 200, 'Walls', 1).optional(),
      areaFt2: between(0, 100_000, 'Area').optional(),
      areaM2: between(0, mostM2, 'Area').optional(),
      profile: profile.prefault({ nominalIn: 8 }),
      texture: choice(keysOf(textures), 'a surface'),
      coats: whole(1, 3, 'Coats should be 1, 2 or 3.').default(2),
      coverageFt2PerGal: coverage.optional(),
      wastePercent: between(0, 50, 'Waste').default(10),
      containers: list(container, 12, 'Containers', 1).default(exampleContainers),
    },
    { error: 'The body should be a JSON object.' },
  )
  .transform((body, ctx) => {
    const { units, walls, profile: face, texture, coats, coverageFt2PerGal, wastePercent, containers } = body;
    const given = [walls, body.areaFt2, body.areaM2].filter((one) => one !== undefined).length;
    if (given !== 1) ctx.addIssue({ code: 'custom', path: ['walls'], message: 'Give either walls, areaFt2 or areaM2.' });
    const areaM2 = body.areaM2 ?? (body.areaFt2 === undefined ? (walls ?? []).reduce((sum, one) => sum + wallAreaM2(one), 0) : body.areaFt2 * squareMetresPerSquareFoot);
    if (areaM2 > mostM2 * (1 + 1e-9)) ctx.addIssue({ code: 'custom', path: ['walls'], message: 'More than 100,000 ft² of wall: make an estimate for each part.' });
    return { units, walls, areaM2, profile: face, texture, coats, coverage: coverageFt2PerGal, wasteShare: wastePercent / 100, sizes: containers };
  });

/** The body as it is sent; lists are judged member by member, so they are named here. */
export type EstimateBody = {
  units?: 'us' | 'metric';
  walls?: { widthFt: number; heightFt: number; gableHeightFt?: number; openings?: { widthFt: number; heightFt: number; count?: number }[] }[];
  areaFt2?: number;
  areaM2?: number;
  profile?: 6 | 8 | 10 | { nominalIn: 6 | 8 | 10; crownHeightIn?: number } | { exposedFaceIn: number; crownHeightIn: number };
  texture: keyof typeof textures;
  coats?: number;
  coverageFt2PerGal?: { low: number; high: number };
  wastePercent?: number;
  containers?: { gal: number; priceCents: number }[];
};

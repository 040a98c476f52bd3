import { z } from 'zod';
import { choice, neededText, readLength, shortText } from '@/lib/schemas/measures';
import { azimuth, coatSchema, recalledDay, sizes } from '@/lib/schemas/wall';
import { climateZones, keysOf, unitSystems, woods } from '@/lib/schemas/vocabulary';

export const postalCode = z
  .string({ error: 'The postal code is missing.' })
  .trim()
  .regex(/^\d{5}(-\d{4})?$/, 'A US postal code has five digits, like 59715.')
  .transform((code) => code.slice(0, 5));

const yearBuilt = z
  .string()
  .trim()
  .optional()
  .transform((text, ctx) => {
    if (!text) return undefined;
    const year = Number(text);
    if (!Number.isInteger(year) || year < 1600 || year > 2100) {
      ctx.addIssue({ code: 'custom', message: 'The year built should have four digits, like 1994.' });
      return undefined;
    }
    return year;
  });

const elevation = z.string().trim().optional();

export const sidingNominals = ['6', '8', '10'] as const;
const zoneOverride = z.union([z.enum(climateZones), z.literal('')]).optional().transform((zone) => zone || undefined);

const aboutHome = z.object({
  units: z.enum(keysOf(unitSystems)),
  name: neededText('A name for the home', 60),
  postalCode,
  /** Asked for only where the postal code has no place on the map. */
  latitude: shortText('Latitude', 20),
  longitude: shortText('Longitude', 20),
  elevation,
  climateZoneOverride: zoneOverride,
  wood: choice(keysOf(woods), 'a wood'),
  sidingNominalIn: z.enum(sidingNominals, { error: 'Choose the siding width.' }).transform(Number),
  yearBuilt,
});

const coordinate = (text: string | undefined, limit: number, field: string, ctx: z.RefinementCtx): number | undefined => {
  if (!text) return undefined;
  const degrees = Number(text);
  if (Number.isFinite(degrees) && Math.abs(degrees) <= limit) return degrees;
  ctx.addIssue({ code: 'custom', path: [field], message: `${field === 'latitude' ? 'Latitude' : 'Longitude'} should be degrees between −${limit} and ${limit}, like ${field === 'latitude' ? '45.68' : '−111.04'}.` });
  return undefined;
};

const place = (form: z.output<typeof aboutHome>, ctx: z.RefinementCtx) => ({
  latitude: coordinate(form.latitude, 72, 'latitude', ctx),
  longitude: coordinate(form.longitude, 180, 'longitude', ctx),
  elevationM: form.elevation ? readLength(form.elevation, form.units, { min: 0, max: 4000, what: 'Height above sea level' }, ctx, ['elevation']) : undefined,
});

/** Facts of a home that exists already. */
export const homeSchema = aboutHome.transform((form, ctx) => ({ ...form, ...place(form, ctx) }));

const fourWalls = aboutHome.extend(coatSchema.shape).extend({
  compassDeg: azimuth,
  frontWidth: z.string().optional(),
  sideWidth: z.string().optional(),
  wallHeight: z.string().optional(),
  gableHeight: z.string().optional(),
  gablesOn: choice(['front', 'sides', 'none'], 'where the gables are'),
  eaveDepth: z.string().optional(),
  stained: recalledDay('stained'),
  caulked: recalledDay('caulked'),
});

/** A new home with four walls at right angles; out come SI values. */
export const newHomeSchema = fourWalls.transform((form, ctx) => {
  const read = (text: string | undefined, size: keyof typeof sizes, field: string) => readLength(text, form.units, sizes[size], ctx, [field]);
  return {
    ...form,
    ...place(form, ctx),
    frontWidthM: read(form.frontWidth, 'width', 'frontWidth'),
    sideWidthM: read(form.sideWidth, 'width', 'sideWidth'),
    wallHeightM: read(form.wallHeight, 'height', 'wallHeight'),
    gableHeightM: form.gablesOn === 'none' ? 0 : read(form.gableHeight, 'gable', 'gableHeight'),
    eaveDepthM: read(form.eaveDepth, 'eaveDepth', 'eaveDepth'),
  };
});

export type HomeInput = z.output<typeof homeSchema>;
export type NewHomeInput = z.output<typeof newHomeSchema>;

import { z } from 'zod';
import { choice, neededText, readLength } from '@/lib/schemas/measures';
import { azimuth, coatSchema, lengthUnits, recalledDay, sizes } from '@/lib/schemas/wall';
import { climateZones, keysOf, unitSystems, type UnitSystem, woods } from '@/lib/schemas/vocabulary';

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

export const sidingNominals = ['6', '8', '10'] as const;
const zoneOverride = z.union([z.enum(climateZones), z.literal('')]).optional().transform((zone) => zone || undefined);

const aboutHome = z.object({
  units: z.enum(keysOf(unitSystems)),
  name: neededText('A name for the home', 60),
  postalCode,
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

const typed = z.string().trim().optional();

/** Coordinates and height, read on their own so that every wrong field is marked at once. Degrees, m. */
const place = z.object({ units: lengthUnits, latitude: typed, longitude: typed, elevation: typed }).transform((form, ctx) => {
  const [given, missing] = form.latitude ? ['latitude', 'longitude'] : ['longitude', 'latitude'];
  if (!form.latitude !== !form.longitude) ctx.addIssue({ code: 'custom', path: [missing], message: `Give both, or empty the ${given}.` });
  return { spot: spotOf(form, ctx) };
});

const spotOf = (form: { units: UnitSystem; latitude?: string | undefined; longitude?: string | undefined; elevation?: string | undefined }, ctx: z.RefinementCtx) => ({
  latitude: coordinate(form.latitude, 72, 'latitude', ctx),
  longitude: coordinate(form.longitude, 180, 'longitude', ctx),
  elevationM: form.elevation ? readLength(form.elevation, form.units, { min: 0, max: 4000, what: 'Height above sea level' }, ctx, ['elevation']) : undefined,
});

/** Facts of a home that exists already. */
export const homeSchema = z.intersection(aboutHome, place).transform(({ spot, ...form }) => ({ ...form, ...spot }));

const fourWalls = aboutHome.extend(coatSchema.shape).extend({
  compassDeg: azimuth,
  gablesOn: choice(['front', 'sides', 'none'], 'where the gables are'),
  stained: recalledDay('stained'),
  caulked: recalledDay('caulked'),
});

/** The lengths of a house with four walls, m. */
const houseLengths = z
  .object({ units: lengthUnits, frontWidth: typed, sideWidth: typed, wallHeight: typed, gableHeight: typed, gablesOn: typed, eaveDepth: typed })
  .transform((form, ctx) => {
    const read = (text: string | undefined, size: keyof typeof sizes, field: string) => readLength(text, form.units, sizes[size], ctx, [field]);
    return {
      metres: {
        frontWidthM: read(form.frontWidth, 'width', 'frontWidth'),
        sideWidthM: read(form.sideWidth, 'width', 'sideWidth'),
        wallHeightM: read(form.wallHeight, 'height', 'wallHeight'),
        gableHeightM: form.gablesOn === 'none' ? 0 : read(form.gableHeight, 'gable', 'gableHeight'),
        eaveDepthM: read(form.eaveDepth, 'eaveDepth', 'eaveDepth'),
      },
    };
  });

/** A new home with four walls at right angles; out come SI values. */
export const newHomeSchema = z.intersection(fourWalls, z.intersection(place, houseLengths)).transform(({ spot, metres, ...form }) => ({ ...form, ...spot, ...metres }));

export type HomeInput = z.output<typeof homeSchema>;
export type NewHomeInput = z.output<typeof newHomeSchema>;

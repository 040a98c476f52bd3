import { z } from 'zod';
import { isCalendarDay } from '@/lib/calendar';
import { checkbox, choice, neededText, readLength, shortText } from '@/lib/schemas/measures';
import { coverShares, readCover } from '@/lib/schemas/wall-cover';
import { covers, finishes, keysOf, sealants, shades, stainBases, textures, unitSystems } from '@/lib/schemas/vocabulary';

/** Plausible sizes of a house's parts, m. Our rule. */
export const sizes = {
  width: { min: 0.5, max: 60, what: 'Width' },
  height: { min: 0.5, max: 15, what: 'Height' },
  gable: { min: 0, max: 10, what: 'Gable height', optional: true },
  eaveDepth: { min: 0, max: 6, what: 'Eave depth', optional: true },
  eaveDrop: { min: 0, max: 3, what: 'Eave drop', optional: true },
  openingWidth: { min: 0.1, max: 12, what: 'Width' },
  openingHeight: { min: 0.1, max: 6, what: 'Height' },
} as const;

/** The system that lengths are typed in. */
export const lengthUnits = z.enum(keysOf(unitSystems)).catch('us');

export const azimuth = z.coerce
  .number({ error: 'Direction should be a number of degrees, 0 to 359.' })
  .min(0, 'Direction should be 0 to 359 degrees.')
  .max(360, 'Direction should be 0 to 359 degrees.')
  .transform((degrees) => degrees % 360);

/** A day in the past that may also be "not known". An empty date without that answer is a fault. */
export const recalledDay = (what: string) =>
  z.object({ on: z.string().trim().optional(), notKnown: checkbox }).transform((answer, ctx) => {
    if (answer.notKnown) return null;
    if (!answer.on) {
      ctx.addIssue({ code: 'custom', path: ['on'], message: `Say when it was last ${what}, or choose "Not known".` });
      return null;
    }
    if (!isCalendarDay(answer.on)) {
      ctx.addIssue({ code: 'custom', path: ['on'], message: 'This day does not exist. Write it like 2021-06-15.' });
      return null;
    }
    return answer.on;
  });

const opening = z.object({
  kind: z.enum(['window', 'door']),
  count: z.coerce.number({ error: 'How many?' }).int('How many? A whole number.').min(1, 'At least 1, or remove the row.').max(50, 'At most 50.'),
});

export const coatSchema = z.object({
  finish: choice(keysOf(finishes), 'a finish'),
  stainBase: choice(keysOf(stainBases), 'oil or waterborne'),
  colorHex: z.string().regex(/^#[0-9a-fA-F]{6}$/, 'Choose a color.'),
  colorName: shortText('The color name', 60),
  texture: choice(keysOf(textures), 'a surface'),
  sealant: choice(keysOf(sealants), 'a caulk'),
});

const wallFields = coatSchema.extend({
  units: z.enum(keysOf(unitSystems)),
  name: neededText('A name', 40),
  azimuthDeg: azimuth,
  shade: choice(keysOf(shades), 'what stands in front'),
  shadeHeightDeg: z.coerce.number({ error: 'Height of the shade should be a number of degrees.' }).min(0).max(80, 'At most 80 degrees.').default(0),
  cover: choice(keysOf(covers), 'what is over it').default('none'),
  coverShare: choice(coverShares, 'how much of the width is under it').default('1').transform(Number),
  corners: z.coerce.number({ error: 'How many corners?' }).int('How many corners? A whole number.').min(0, 'None is 0.').max(2, 'A wall has at most two corners.').default(2),
  pipes: z.coerce.number({ error: 'How many pipes and fittings?' }).int('How many pipes and fittings? A whole number.').min(0, 'None is 0.').max(100, 'At most 100.').default(0),
  weatherSide: checkbox,
  openings: z.record(z.string().regex(/^\d+$/), opening).default({}),
  stained: recalledDay('stained'),
  caulked: recalledDay('caulked'),
});

const typed = z.string().optional();
const typedOpening = z.object({ width: typed, height: typed }).catch({});

/** The lengths of the wall form, read on their own so that every wrong field is marked at once. In m. */
const wallLengths = z
  .object({ units: lengthUnits, width: typed, height: typed, gableHeight: typed, eaveDepth: typed, eaveDrop: typed, cover: typed, coverDepth: typed, coverHeight: typed, openings: z.record(z.string(), typedOpening).catch({}) })
  .transform(({ units, openings, ...form }, ctx) => {
    const read = (text: string | undefined, size: keyof typeof sizes, ...path: string[]) => readLength(text, units, sizes[size], ctx, path);
    const heightM = read(form.height, 'height', 'height');
    return {
      metres: {
        widthM: read(form.width, 'width', 'width'),
        heightM,
        gableHeightM: read(form.gableHeight, 'gable', 'gableHeight'),
        eaveDepthM: read(form.eaveDepth, 'eaveDepth', 'eaveDepth'),
        eaveDropM: read(form.eaveDrop, 'eaveDrop', 'eaveDrop'),
        ...readCover(form, units, heightM, ctx),
      },
      openingMetres: Object.entries(openings).map(([row, one]) => ({
        row,
        widthM: read(one.width, 'openingWidth', 'openings', row, 'width'),
        heightM: read(one.height, 'openingHeight', 'openings', row, 'height'),
      })),
    };
  });

/** The wall form: lengths as typed in the person's units; out come metres. */
export const wallSchema = z.intersection(wallFields, wallLengths).transform((form, ctx) => {
  const { units: _units, openings, metres, openingMetres, ...rest } = form;
  const wall = {
    ...rest,
    ...metres,
    openings: openingMetres.flatMap(({ row, ...size }) => {
      const one = openings[row];
      return one ? [{ kind: one.kind, count: one.count, ...size }] : [];
    }),
  };
  const gross = wall.widthM * (wall.heightM + wall.gableHeightM / 2);
  const holes = wall.openings.reduce((sum, one) => sum + one.widthM * one.heightM * one.count, 0);
  if (gross > 0 && holes >= gross) ctx.addIssue({ code: 'custom', path: ['openings'], message: 'The doors and windows are larger than the wall.' });
  return wall;
});

export type WallInput = z.output<typeof wallSchema>;

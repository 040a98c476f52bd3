import { z } from 'zod';
import { type FormValues } from '@/lib/schemas/action-state';
import { type EstimateBody } from '@/lib/schemas/estimate';
import { choice, readLength } from '@/lib/schemas/measures';
import { keysOf, textures, unitSystems } from '@/lib/schemas/vocabulary';
import { litresPerGallon, metresPerFoot, metresPerInch, squareMetresPerSquareFoot } from '@/lib/units';

const numberText = (what: string, min: number, max: number) =>
  z.string().trim().optional().transform((text, ctx) => {
    if (!text) return undefined;
    const value = Number(text.replace(',', '.').replace(/^\$/, ''));
    if (Number.isFinite(value) && value >= min && value <= max) return value;
    ctx.addIssue({ code: 'custom', message: `${what} should be a number between ${min} and ${max}.` });
    return undefined;
  });

const typedWall = z.object({ width: z.string().optional(), height: z.string().optional(), gable: z.string().optional(), openings: numberText('Doors and windows', 0, 100_000) });
const typedContainer = z.object({ size: numberText('The size', 0.01, 230), price: numberText('The price', 0, 100_000) });

/** A bare number is inches or centimetres; empty is the usual inch. */
function crownInches(typed: string | undefined, us: boolean, ctx: z.RefinementCtx): number {
  const text = typed?.trim();
  if (!text) return 1;
  const value = Number(text.replace(',', '.')) * (us ? 1 : 1 / (100 * metresPerInch));
  if (Number.isFinite(value) && value >= 0 && value <= 4) return value;
  ctx.addIssue({ code: 'custom', path: ['crown'], message: us ? 'The crown should be between 0 and 4 in.' : 'The crown should be between 0 and 10 cm.' });
  return 1;
}

/** The calculator's form as typed, in the reader's units; comes out as the body of the estimate. Empty wall rows are left out. */
export const calculatorSchema = z
  .object({
    units: z.enum(keysOf(unitSystems)).default('us'),
    walls: z.record(z.string().regex(/^\d{1,3}$/), typedWall).optional(),
    /** Walls of a home that were chosen, each as its area in m² and its id: '24.5#id'. */
    chosenM2: z.array(z.string().transform((one) => Number(one.split('#')[0])).pipe(z.number().min(0).max(10_000))).optional(),
    siding: z.enum(['6', '8', '10']).default('8'),
    crown: z.string().optional(),
    texture: choice(keysOf(textures), 'a surface').default('saw-textured'),
    coats: z.enum(['1', '2', '3'], { error: 'Coats should be 1, 2 or 3.' }).default('2'),
    coverageLow: numberText('Coverage', 0.5, 2000),
    coverageHigh: numberText('Coverage', 0.5, 2000),
    waste: numberText('Waste', 0, 50),
    containers: z.record(z.string().regex(/^\d{1,2}$/), typedContainer).optional(),
  })
  .transform((form, ctx): EstimateBody => {
    const us = form.units === 'us';
    const toFt = (text: string | undefined, what: string, min: number, max: number, path: string[], optional = false) => readLength(text, form.units, { min, max, what, optional }, ctx, path) / metresPerFoot;
    const walls = Object.entries(form.walls ?? {}).filter(([, wall]) => wall.width || wall.height || wall.gable || wall.openings).map(([row, wall]) => {
      const at = (field: string) => ['walls', row, field];
      const openingsFt2 = (wall.openings ?? 0) / (us ? 1 : squareMetresPerSquareFoot);
      const sized = { widthFt: toFt(wall.width, 'Width', 0.1, 60, at('width')), heightFt: toFt(wall.height, 'Height', 0.1, 15, at('height')), gableHeightFt: toFt(wall.gable, 'Gable height', 0, 10, at('gable'), true) };
      const gross = sized.widthFt * (sized.heightFt + sized.gableHeightFt / 2);
      if (gross > 0 && openingsFt2 > gross) ctx.addIssue({ code: 'custom', path: at('openings'), message: 'The doors and windows are larger than the wall.' });
      return openingsFt2 > 0 ? { ...sized, openings: [{ widthFt: Math.sqrt(openingsFt2), heightFt: Math.sqrt(openingsFt2) }] } : sized;
    });
    const crownIn = crownInches(form.crown, us, ctx);
    const perGal = (value: number) => (us ? value : (value * litresPerGallon) / squareMetresPerSquareFoot);
    const { coverageLow, coverageHigh } = form;
    if ((coverageLow === undefined) !== (coverageHigh === undefined)) ctx.addIssue({ code: 'custom', path: [coverageLow === undefined ? 'coverageLow' : 'coverageHigh'], message: 'The label gives a range: fill in both.' });
    if (coverageLow !== undefined && coverageHigh !== undefined && coverageLow > coverageHigh) ctx.addIssue({ code: 'custom', path: ['coverageHigh'], message: 'The upper coverage is less than the lower.' });
    const sizes = Object.values(form.containers ?? {}).flatMap(({ size, price }) => (size !== undefined && price !== undefined ? [{ gal: us ? size : size / litresPerGallon, priceCents: Math.round(price * 100) }] : []));
    return {
      ...(form.chosenM2 ? { areaM2: form.chosenM2.reduce((sum, area) => sum + area, 0) } : { walls }),
      profile: { nominalIn: Number(form.siding) as 6 | 8 | 10, crownHeightIn: crownIn },
      texture: form.texture,
      coats: Number(form.coats),
      ...(coverageLow !== undefined && coverageHigh !== undefined ? { coverageFt2PerGal: { low: perGal(coverageLow), high: perGal(coverageHigh) } } : {}),
      ...(form.waste !== undefined ? { wastePercent: form.waste } : {}),
      ...(sizes.length > 0 ? { containers: sizes } : {}),
    };
  });

/** A form's values as the estimate's body, or the faults beside their fields. */
export function readCalculator(values: FormValues): { body: EstimateBody } | { faults: Record<string, string> } {
  const parsed = calculatorSchema.safeParse(values);
  if (parsed.success) return { body: parsed.data };
  const faults: Record<string, string> = {};
  for (const issue of parsed.error.issues) faults[issue.path.join('.')] ??= issue.message;
  return { faults };
}

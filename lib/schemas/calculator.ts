import { z } from 'zod';
import { type FormValues } from '@/lib/schemas/action-state';
import { rowsOf, typedIn } from '@/lib/schemas/calculator-values';
import { type Bounds, type Note, readContainers, readNumber, type SizeReader } from '@/lib/schemas/container-rows';
import { type EstimateBody, estimateSchema } from '@/lib/schemas/estimate';
import { readLength } from '@/lib/schemas/measures';
import { textures, type UnitSystem } from '@/lib/schemas/vocabulary';
import { sidingProfile } from '@/lib/takeoff';
import { litresPerGallon, metresPerFoot, metresPerInch, squareMetresPerSquareFoot } from '@/lib/units';

/** The form as read: the estimate's body when nothing is wrong and something is there; faults by field; fields that a begun row still lacks. */
export type CalculatorReading = { body: EstimateBody | null; faults: Record<string, string>; missing: Record<string, string> };

/** Feet of a length field; undefined when it is empty. */
function readFeet(row: FormValues, field: string, path: string, bounds: Bounds, note: Note): number | undefined {
  const text = typedIn(row, field);
  if (text.trim() === '') return undefined;
  const addIssue = (issue: { message: string }) => void (note.faults[`${path}.${field}`] = issue.message);
  return readLength(text, note.units, bounds, { addIssue }, []) / metresPerFoot;
}

/** Both sides of a wall or an opening. A row with neither is empty; with one it lacks the other and does not count. */
function readSides(row: FormValues, path: string, most: { width: number; height: number }, note: Note): { widthFt: number; heightFt: number } | null {
  const widthFt = readFeet(row, 'width', path, { min: 0.1, max: most.width, what: 'Width' }, note);
  const heightFt = readFeet(row, 'height', path, { min: 0.1, max: most.height, what: 'Height' }, note);
  if (widthFt !== undefined && heightFt !== undefined) return { widthFt, heightFt };
  if (widthFt !== undefined) note.missing[`${path}.height`] = 'The height is still missing.';
  if (heightFt !== undefined) note.missing[`${path}.width`] = 'The width is still missing.';
  return null;
}

function readWall(row: FormValues, path: string, note: Note) {
  const gableHeightFt = readFeet(row, 'gable', path, { min: 0, max: 10, what: 'Gable height' }, note) ?? 0;
  const openings = rowsOf(row, 'openings').flatMap(([key, one]) => {
    const at = `${path}.openings.${key}`;
    const sides = readSides(one, at, { width: 18, height: 18 }, note);
    const count = readNumber(typedIn(one, 'count'), `${at}.count`, { min: 1, max: 100, what: 'The count' }, note) ?? 1;
    return sides ? [{ ...sides, count: Math.round(count) }] : [];
  });
  const sides = readSides(row, path, { width: 60, height: 15 }, note);
  if (!sides) return [];
  const holes = openings.reduce((sum, one) => sum + one.widthFt * one.heightFt * one.count, 0);
  const gross = sides.widthFt * (sides.heightFt + gableHeightFt / 2);
  if (gross > 0 && holes > gross * (1 + 1e-9)) note.faults[`${path}.openings`] = 'The doors and windows are larger than the wall.';
  return [{ ...sides, gableHeightFt, openings }];
}

/** Smallest and largest can, US gallons. */
export const canRange = { min: 1 / 128, max: 60 };

/** Cans by the gallon or the litre. */
export const canSize = (units: UnitSystem): SizeReader => (text) => (units === 'us' ? { number: text, unit: 'gal', gallons: 1 } : { number: text, unit: 'L', gallons: 1 / litresPerGallon });

type CoverageFields = { low: string; high: string };

/** A range of coverage, ft² per gallon, as the label says it; undefined where it says none. */
export function readCoverage(values: FormValues, note: Note, fields: CoverageFields = { low: 'coverageLow', high: 'coverageHigh' }): { low: number; high: number } | undefined {
  const us = note.units === 'us';
  const one = (field: string) => readNumber(typedIn(values, field), field, { min: 20, max: 2000, what: 'Coverage', unit: us ? 'ft²/gal' : 'm²/L' }, note, us ? 1 : litresPerGallon / squareMetresPerSquareFoot);
  const [from, to] = [one(fields.low), one(fields.high)];
  const low = from ?? to;
  const high = to ?? from;
  if (low === undefined || high === undefined) return undefined;
  if (low > high) note.faults[fields.high] = 'This should not be less than the figure before it.';
  return { low, high };
}

const chosen = z.array(z.string().transform((one) => Number(one.split('#')[0])).pipe(z.number().min(0).max(10_000)));

/** Walls as typed, or the chosen walls of a home, each as its area in m² and its id: '24.5#id'. */
function readArea(values: FormValues, note: Note): Pick<EstimateBody, 'walls' | 'areaM2'> | null {
  if (values.chosenM2 === undefined) {
    const walls = rowsOf(values, 'walls').flatMap(([key, row]) => readWall(row, `walls.${key}`, note));
    return walls.length > 0 ? { walls } : null;
  }
  const areas = chosen.safeParse(values.chosenM2);
  if (!areas.success) note.faults.chosenM2 = 'Choose from these walls.';
  const areaM2 = (areas.data ?? []).reduce((sum, area) => sum + area, 0);
  return areaM2 > 0 ? { areaM2 } : null;
}

const has = <K extends string>(record: Record<K, unknown>, key: string): key is K => Object.hasOwn(record, key);

function readBody(values: FormValues, note: Note): EstimateBody | null {
  const us = note.units === 'us';
  const nominalIn = ([6, 8, 10] as const).find((size) => String(size) === typedIn(values, 'siding')) ?? 8;
  const mostCrown = (sidingProfile(nominalIn)?.exposedFaceIn ?? 0) / 2;
  const crownHeightIn = readNumber(typedIn(values, 'crown'), 'crown', { min: 0, max: mostCrown, what: 'The crown', unit: us ? 'in' : 'cm' }, note, us ? 1 : 1 / (100 * metresPerInch)) ?? 1;
  const wastePercent = readNumber(typedIn(values, 'waste'), 'waste', { min: 0, max: 50, what: 'Waste' }, note) ?? 10;
  const texture = typedIn(values, 'texture');
  const coats = Number(typedIn(values, 'coats') || '2');
  if (!has(textures, texture)) note.faults.texture = 'Choose a surface.';
  if (![1, 2, 3].includes(coats)) note.faults.coats = 'Choose how many coats.';
  const area = readArea(values, note);
  const containers = readContainers(values, 'containers', { ...canRange, read: canSize(note.units) }, note);
  const coverage = readCoverage(values, note);
  return area && has(textures, texture) ? { units: note.units, ...area, profile: { nominalIn, crownHeightIn }, texture, coats, ...(coverage ? { coverageFt2PerGal: coverage } : {}), wastePercent, containers } : null;
}

/** Reads the form as typed, in the reader's units. */
export function readCalculator(values: FormValues): CalculatorReading {
  const faults: Record<string, string> = {};
  const missing: Record<string, string> = {};
  const body = readBody(values, { faults, missing, units: values.units === 'metric' ? 'metric' : 'us' });
  if (Object.keys(faults).length > 0 || !body) return { body: null, faults, missing };
  const judged = estimateSchema.safeParse(body);
  if (judged.success) return { body, faults, missing };
  return { body: null, faults: { '': judged.error.issues[0]?.message ?? 'This cannot be worked out.' }, missing };
}

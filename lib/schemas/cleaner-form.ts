import { type FormValues } from '@/lib/schemas/action-state';
import { canRange, canSize, readCoverage } from '@/lib/schemas/calculator';
import { containerRows, typedIn, typedSizes } from '@/lib/schemas/calculator-values';
import { type Note, readContainers, readNumber } from '@/lib/schemas/container-rows';
import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { type CleanerAnswer, cleanerNeeded, type CleanerNeed, exampleCleaners, usualPartsWater } from '@/lib/takeoff/cleaner';

/** The walls of a home that may be washed, with their flat area, and the true over flat area of their siding. */
export type CleanerAsk = { walls: readonly { id: string; name: string; areaM2: number }[]; profileFactor: number; units: UnitSystem };

/** What the form starts with, where nothing else was sent. */
export const usualCleaner = (ids: readonly string[], units: UnitSystem, sent: FormValues = {}): FormValues => ({
  cleanWalls: [...ids],
  cleanerLow: '',
  cleanerHigh: '',
  cleanerParts: String(usualPartsWater),
  cleanerContainers: containerRows(sent, 'cleanerContainers', typedSizes(exampleCleaners, units)),
});

type CleanerReading = Pick<Note, 'faults' | 'missing'> & { need: CleanerNeed | null };

/** Reads the form: what is needed when nothing is wrong and a wall is chosen; faults by field; what a begun container row still lacks. */
export function readCleaner(values: FormValues, { walls, profileFactor, units }: CleanerAsk): CleanerReading {
  const ids = Array.isArray(values.cleanWalls) ? values.cleanWalls : [];
  const areaM2 = walls.filter(({ id }) => ids.includes(id)).reduce((sum, wall) => sum + wall.areaM2, 0);
  if (areaM2 === 0) return { need: null, faults: {}, missing: {} };
  const note: Note = { faults: {}, missing: {}, units };
  const coverage = readCoverage(values, note, { low: 'cleanerLow', high: 'cleanerHigh' });
  const partsWater = readNumber(typedIn(values, 'cleanerParts'), 'cleanerParts', { min: 0, max: 100, what: 'Parts of water' }, note) ?? usualPartsWater;
  const sizes = readContainers(values, 'cleanerContainers', { ...canRange, read: canSize(units) }, note);
  const { faults, missing } = note;
  const fine = Object.keys(faults).length === 0 && sizes.length > 0;
  return { need: fine ? { areaM2, profileFactor, coverage, partsWater, sizes, units } : null, faults, missing };
}

/** What the form comes to; undefined while something is wrong or no wall is chosen. */
export function answerCleaner(values: FormValues, ask: CleanerAsk): CleanerAnswer | undefined {
  const { need } = readCleaner(values, ask);
  return need ? cleanerNeeded(need) : undefined;
}

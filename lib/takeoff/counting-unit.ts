import { litresPerGallon } from '@/lib/units';

/** US gallons. */
export const fluidOunce = 1 / 128;
/** Metric cans are sold by the millilitre, and a can may be typed in thousandths of a gallon. */
const millilitre = 0.001 / litresPerGallon;
const typedGal = 0.001;
/** Sizes that share no unit are counted in at most this many parts of the finest one. */
const mostParts = 64;

const commonDivisor = (a: number, b: number): number => (b === 0 ? a : commonDivisor(b, a % b));

/** The largest whole multiple of `step` that divides every size; undefined when one is no whole multiple of it. */
function sharedBy(sizesGal: readonly number[], step: number): number | undefined {
  const counts = sizesGal.map((gal) => Math.round(gal / step));
  const whole = sizesGal.every((gal, i) => (counts[i] as number) > 0 && Math.abs(gal / step - (counts[i] as number)) < 1e-6);
  return whole ? step * counts.reduce(commonDivisor) : undefined;
}

/**
 * The unit, in gallons, in which containers are counted without rounding: quart, gallon and five gallons give a quart, 0.75 L and 2.5 L give
 * 0.25 L. Sizes that share none (a fluid-ounce cartridge beside a 600 mL sausage) are counted in a part of the finest unit, as small as
 * the most units to search through allow for the need: a container then loses less than that part.
 */
export function countingUnit(sizesGal: readonly number[], neededGal: number, finestGal: number, mostUnits: number): number {
  const shared = sharedBy(sizesGal, finestGal) ?? sharedBy(sizesGal, millilitre) ?? sharedBy(sizesGal, typedGal);
  if (shared !== undefined) return shared;
  const parts = Math.floor((mostUnits * finestGal) / Math.max(neededGal, finestGal));
  return finestGal / Math.min(mostParts, Math.max(1, parts));
}

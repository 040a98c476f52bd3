import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { areaText, litresPerGallon, squareMetresPerSquareFoot, volumeText } from '@/lib/units';
import { type StainEstimate, type StainNeed, stainNeeded } from './stain';

/** What the estimate's handler and the calculator answer with: the estimate and the areas behind it. */
export type StainAnswer = StainEstimate & { areaM2: number; areaFt2: number; profileFactor: number };

export function stainAnswer(need: StainNeed): StainAnswer {
  return { ...stainNeeded(need), areaM2: need.areaM2, areaFt2: need.areaM2 / squareMetresPerSquareFoot, profileFactor: need.profileFactor };
}

/** '1 × 5 gal and 2 × 1 gal' in the reader's units. */
export const containersText = (containers: StainEstimate['containers'], units: UnitSystem): string =>
  containers.length === 0 ? 'nothing' : containers.map(({ gal, count }) => `${count} × ${containerText(gal, units)}`).join(' and ');

const names: Record<string, string> = { '0.25': '1 qt', '1': '1 gal', '5': '5 gal' };
export const containerText = (gal: number, units: UnitSystem): string => (units === 'us' ? (names[String(gal)] ?? volumeText(gal * litresPerGallon, 'us')) : volumeText(gal * litresPerGallon, 'metric'));

/** 'for 234 ft² of wall'. */
export const areaSentence = (areaM2: number, units: UnitSystem): string => `for ${areaText(areaM2, units)} of wall`;

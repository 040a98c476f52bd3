import { type UnitSystem } from '@/lib/schemas/vocabulary';

/** ft² in one m², exact by the international foot of 0.3048 m. */
const squareFeet = 1 / 0.3048 ** 2;

/** '270 ft²' or '25.1 m²'. */
export const areaInWords = (areaM2: number, units: UnitSystem): string =>
  units === 'us' ? `${Math.round(areaM2 * squareFeet)} ft²` : `${areaM2.toFixed(1)} m²`;

import { sealants, type Sealant } from '@/lib/schemas/vocabulary';
import { filmLife, type Life } from './life';
import { sealantLife } from './service-life';
import { type Weathering, type Weights } from './severity';

export type SealInput = Weathering & { sealant: Sealant; factor?: number };

/** Our rule. */
const weights: Weights = { sun: 0.6, rain: 0.4 };

/**
 * Months that caulk lasts in the joints of a wall; the range is the trade's, from memory, the place within it is our rule.
 * Joints in full sun and at log ends go first.
 *
 * Example: acrylic latex (5–10 years), dose 1350 kWh/m² and Scheffer 0: severity 0.6, 10 − 0.6 × 5 = 7 years: 84 months.
 */
export const sealLife = ({ sealant, factor = 1, ...weathering }: SealInput): Life =>
  filmLife({ figure: 'Seal life of this wall', what: [{ label: 'Sealant', value: sealants[sealant] }], range: sealantLife[sealant], weights, factor }, weathering);

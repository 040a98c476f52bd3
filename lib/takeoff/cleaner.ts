import { type Explanation, type Source } from '@/lib/explain';
import { ourRule } from '@/lib/our-rules';
import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { areaText, gallonsToLitres, litresPerGallon, squareMetresPerSquareFoot, volumeText } from '@/lib/units';
import { cheapestContainers, type ContainerCount, type ContainerSize, priceOfContainers } from './containers';
import { containersExplained } from './explained';

export type CleanerNeed = {
  /** Flat area to be washed, m². */
  areaM2: number;
  /** True over flat area of the siding's face, at least 1. */
  profileFactor: number;
  /** From the product's label, ft² per gallon of mixed cleaner; wins over the usual range. */
  coverage?: { low: number; high: number } | undefined;
  /** Parts of water to one of concentrate, 0 to 100; 0 is cleaner that is ready to use. */
  partsWater: number;
  sizes: readonly ContainerSize[];
  units: UnitSystem;
};

export type CleanerAnswer = {
  /** Mixed cleaner, L: the range by coverage. */
  lowL: number;
  highL: number;
  /** Concentrate to buy for, L: for the thirsty end. */
  buyL: number;
  containers: ContainerCount[];
  priceCents: number;
  explanations: { buy: Explanation; mixed: Explanation; containers: Explanation };
};

/** ft² to a gallon of mixed cleaner on wood siding. From memory; common practice, no source. */
export const cleanerCoverage = { low: 100, high: 200 };

/** Parts of water to one of concentrate until the label says otherwise. Our rule. */
export const usualPartsWater = 4;

/** Containers that the form starts with; the prices are our own invention: type what your shop asks. */
export const exampleCleaners: ContainerSize[] = [
  { gal: 0.25, priceCents: 1400 },
  { gal: 1, priceCents: 3900 },
  { gal: 5, priceCents: 16500 },
];

const coverageSource: Source = { text: 'How far mixed cleaner goes, from memory', ground: 'common practice' };
const ratioSource = ourRule('cleaner');

/** '100–200 ft² per gallon'; '2.5–4.9 m² per liter'. */
function coverageText({ low, high }: { low: number; high: number }, units: UnitSystem): string {
  const figure = (ft2PerGal: number) => Number((units === 'us' ? ft2PerGal : (ft2PerGal * squareMetresPerSquareFoot) / litresPerGallon).toFixed(units === 'us' ? 0 : 1));
  return `${figure(low)}–${figure(high)} ${units === 'us' ? 'ft² per gallon' : 'm² per liter'}`;
}

/**
 * Cleaner for a wash: mixed cleaner = area × profile factor ÷ coverage, a range; concentrate to buy = its upper end ÷ (parts of water + 1),
 * in the cheapest containers that hold it.
 * @throws RangeError for a value out of the ranges named in `CleanerNeed`
 * @example 234 ft², factor 1.06, 100–200 ft²/gal, four parts of water: 1.24–2.48 gal mixed, 0.496 gal of concentrate
 */
export function cleanerNeeded(need: CleanerNeed): CleanerAnswer {
  const { areaM2, profileFactor, partsWater, sizes, units, coverage = cleanerCoverage } = need;
  if (!(areaM2 >= 0) || !(profileFactor >= 1) || !(partsWater >= 0 && partsWater <= 100)) throw new RangeError('area, profile or mixing ratio out of range');
  if (!(coverage.low > 0) || !(coverage.high >= coverage.low)) throw new RangeError('the coverage must be a range above 0');
  const washedFt2 = (areaM2 / squareMetresPerSquareFoot) * profileFactor;
  const [lowL, highL] = [gallonsToLitres(washedFt2 / coverage.high), gallonsToLitres(washedFt2 / coverage.low)];
  const buyGal = washedFt2 / coverage.low / (partsWater + 1);
  const buyL = gallonsToLitres(buyGal);
  const containers = cheapestContainers(buyGal, sizes);
  const priceCents = priceOfContainers(containers, sizes);
  const explanations = { ...cleanerExplained(need, { lowL, highL, buyL }), containers: containersExplained(buyGal, containers, sizes, priceCents, units) };
  return { lowL, highL, buyL, containers, priceCents, explanations };
}

function cleanerExplained({ areaM2, profileFactor, coverage, partsWater, units }: CleanerNeed, { lowL, highL, buyL }: Pick<CleanerAnswer, 'lowL' | 'highL' | 'buyL'>): Pick<CleanerAnswer['explanations'], 'buy' | 'mixed'> {
  const mixed: Explanation = {
    figure: 'Mixed cleaner',
    value: `${volumeText(lowL, units)} to ${volumeText(highL, units)}`,
    formula: 'area × profile factor ÷ coverage',
    inputs: [
      { label: 'Wall area', value: areaText(areaM2, units) },
      { label: 'Profile factor', value: profileFactor.toFixed(3) },
      { label: 'Coverage', value: `${coverageText(coverage ?? cleanerCoverage, units)}${coverage ? ', from the label' : ''}` },
    ],
    sources: [coverage ? { text: 'The product’s label', ground: 'published' } : coverageSource],
  };
  const buy: Explanation = {
    figure: 'Cleaner to buy',
    value: volumeText(buyL, units),
    formula: 'mixed cleaner, its upper end ÷ (parts of water + 1 part of concentrate)',
    inputs: [...mixed.inputs, { label: mixed.figure, value: mixed.value }, { label: 'Parts of water to one', value: String(partsWater) }],
    sources: [...mixed.sources, ratioSource],
  };
  return { buy, mixed };
}

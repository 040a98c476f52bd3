import { type Explanation } from '@/lib/explain';
import { type Texture } from '@/lib/schemas/vocabulary';
import { litresPerGallon, squareMetresPerSquareFoot } from '@/lib/units';
import { cheapestContainers, type ContainerCount, type ContainerSize } from './containers';
import { coverageFt2PerGal, coverageSource } from './coverage';

export type StainNeed = {
  /** Flat area to be coated, m². */
  areaM2: number;
  /** True over flat area of the siding's face, 1 to 1.6. */
  profileFactor: number;
  texture: Texture;
  coats: number;
  /** From the product's label, ft² per gallon and coat; wins over the table. */
  coverage?: { low: number; high: number } | undefined;
  /** Spills, wet edges and what stays in the can, 0–0.5. */
  wasteShare: number;
  sizes: ContainerSize[];
};

export type StainEstimate = {
  lowGal: number;
  highGal: number;
  /** What to buy for: the thirsty end of the range with waste. */
  buyGal: number;
  buyL: number;
  containers: ContainerCount[];
  priceCents: number;
  explanation: Explanation;
};

/** Containers that the calculator starts with; the prices are our own invention: type what your shop asks. */
export const exampleContainers: ContainerSize[] = [
  { gal: 0.25, priceCents: 2400 },
  { gal: 1, priceCents: 6800 },
  { gal: 5, priceCents: 29500 },
];

const number = (value: number, digits = 2) => Number(value.toFixed(digits)).toLocaleString('en-US');

/**
 * Stain for an area: area × profile factor × coats ÷ coverage gives a range; the figure to buy is its upper end plus waste.
 * @throws RangeError for values outside the ranges named in `StainNeed`
 * @example 234 ft², factor 1.06, two coats, saw-textured: 2.48–4.96 gal
 */
export function stainNeeded(need: StainNeed): StainEstimate {
  const coverage = need.coverage ?? coverageFt2PerGal[need.texture];
  if (!(need.areaM2 >= 0) || !(need.profileFactor >= 1) || !(need.coats >= 1) || !(need.wasteShare >= 0 && need.wasteShare <= 0.5)) throw new RangeError('area, profile, coats or waste out of range');
  if (!(coverage.low > 0) || !(coverage.high >= coverage.low)) throw new RangeError('the coverage must be a range above 0');
  const coatedFt2 = (need.areaM2 / squareMetresPerSquareFoot) * need.profileFactor * need.coats;
  const lowGal = coatedFt2 / coverage.high;
  const highGal = coatedFt2 / coverage.low;
  const buyGal = highGal * (1 + need.wasteShare);
  const containers = cheapestContainers(buyGal, need.sizes);
  const priceOf = (gal: number) => Math.min(...need.sizes.filter((size) => size.gal === gal).map((size) => size.priceCents));
  return {
    lowGal,
    highGal,
    buyGal,
    buyL: buyGal * litresPerGallon,
    containers,
    priceCents: containers.reduce((sum, { gal, count }) => sum + priceOf(gal) * count, 0),
    explanation: explain(need, coverage, { lowGal, highGal, buyGal }),
  };
}

function explain(need: StainNeed, coverage: { low: number; high: number }, gallons: { lowGal: number; highGal: number; buyGal: number }): Explanation {
  return {
    figure: 'Stain to buy',
    value: `${number(gallons.buyGal)} gal (range ${number(gallons.lowGal)}–${number(gallons.highGal)} gal)`,
    formula: 'area × profile factor × coats ÷ coverage; to buy: the upper end × (1 + waste)',
    inputs: [
      { label: 'Flat area', value: `${number(need.areaM2 / squareMetresPerSquareFoot, 0)} ft² (${number(need.areaM2, 1)} m²)` },
      { label: 'Profile factor', value: number(need.profileFactor, 4) },
      { label: 'Coats', value: String(need.coats) },
      { label: 'Coverage', value: `${number(coverage.low)}–${number(coverage.high)} ft² per gallon and coat${need.coverage ? ', from the label' : ''}` },
      { label: 'Waste', value: `${number(need.wasteShare * 100)} %` },
    ],
    sources: [
      need.coverage ? { text: 'The product’s label', ground: 'published' } : { text: coverageSource, ground: 'published' },
      { text: 'Profile factor: exact geometry of a circle segment', ground: 'published' },
      { text: 'Buying for the thirsty end of the range, and the share of waste', ground: 'our rule' },
    ],
  };
}

import { type Explanation } from '@/lib/explain';
import { type Texture, type UnitSystem } from '@/lib/schemas/vocabulary';
import { litresPerGallon, squareMetresPerSquareFoot } from '@/lib/units';
import { cheapestContainers, type ContainerCount, type ContainerSize, priceOfContainers } from './containers';
import { coverageFt2PerGal } from './coverage';
import { stainExplained } from './explained';

export type Coating = {
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
};

export type StainNeed = Coating & {
  sizes: readonly ContainerSize[];
  /** Of the words in the explanation; US customary unless said. */
  units?: UnitSystem | undefined;
};

/** US gallons: the range by coverage, and what to buy for: its thirsty end with waste. */
export type StainRange = { lowGal: number; highGal: number; buyGal: number };

export type StainEstimate = StainRange & {
  lowL: number;
  highL: number;
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

/**
 * Stain for an area: area × profile factor × coats ÷ coverage gives a range; the figure to buy is its upper end plus waste.
 * @throws RangeError for values outside the ranges named in `Coating`
 * @example 234 ft², factor 1.06, two coats, saw-textured: 2.48–4.96 gal
 */
export function stainRange(coating: Coating): StainRange {
  const { areaM2, profileFactor, texture, coats, wasteShare } = coating;
  const coverage = coating.coverage ?? coverageFt2PerGal[texture];
  if (!(areaM2 >= 0) || !(profileFactor >= 1) || !(coats >= 1) || !(wasteShare >= 0 && wasteShare <= 0.5)) throw new RangeError('area, profile, coats or waste out of range');
  if (!(coverage.low > 0) || !(coverage.high >= coverage.low)) throw new RangeError('the coverage must be a range above 0');
  const coatedFt2 = (areaM2 / squareMetresPerSquareFoot) * profileFactor * coats;
  const highGal = coatedFt2 / coverage.low;
  return { lowGal: coatedFt2 / coverage.high, highGal, buyGal: highGal * (1 + wasteShare) };
}

/** A range as litres, cheapest containers and their price. */
export function bought(range: StainRange, sizes: readonly ContainerSize[]): Omit<StainEstimate, 'explanation'> {
  const { lowGal, highGal, buyGal } = range;
  const containers = cheapestContainers(buyGal, sizes);
  return { lowGal, highGal, buyGal, lowL: lowGal * litresPerGallon, highL: highGal * litresPerGallon, buyL: buyGal * litresPerGallon, containers, priceCents: priceOfContainers(containers, sizes) };
}

/** Stain for an area as in `stainRange`, with the cheapest containers for it. */
export function stainNeeded(need: StainNeed): StainEstimate {
  const range = stainRange(need);
  return { ...bought(range, need.sizes), explanation: stainExplained([need], range, need.units ?? 'us') };
}

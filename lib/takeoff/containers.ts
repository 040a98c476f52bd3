import { countingUnit, fluidOunce } from './counting-unit';

export type ContainerSize = { gal: number; priceCents: number };
export type ContainerCount = { gal: number; count: number };

/** What is searched through: 3,200 gal by fluid ounces. */
const mostUnits = 409_600;
const mostGal = 50_000;

/**
 * The cheapest mix of containers that holds at least the need; among equally cheap ones the fewest containers, then the least left over.
 * Exact: dynamic programming over the largest unit of which all sizes are whole multiples (see `countingUnit`); sizes that share none are
 * rounded down to a small one, so that the mix always holds the need. Of a need above 409,600 units (3,200 gal by the ounce) the part
 * above is filled with the size that is cheapest by the gallon, which is still exact for sizes up to 640 units: a cheapest mix exists that
 * holds less than 640 × 640 units in the other sizes (any 640 of those have some among them whose contents are whole containers of the cheapest).
 * @param neededGal US gallons, 0 to 50,000
 * @param sizes container sizes in US gallons (at least an ounce) with prices in cents ≥ 0
 * @param finestGal the ounces, or parts of one, that sizes may be whole multiples of; a fluid ounce unless said
 * @returns counts above 0, largest size first; empty for no need
 * @throws RangeError for a need or size out of range, or no sizes
 */
export function cheapestContainers(neededGal: number, sizes: readonly ContainerSize[], finestGal = fluidOunce): ContainerCount[] {
  if (!(neededGal >= 0) || neededGal > mostGal) throw new RangeError('the need must be between 0 and 50,000 gallons');
  if (sizes.length === 0) throw new RangeError('at least one container size is needed');
  if (sizes.some(({ gal, priceCents }) => !(gal >= finestGal) || !(priceCents >= 0) || !Number.isFinite(gal + priceCents))) throw new RangeError('a container needs a size and a price');
  const unitGal = countingUnit(sizes.map(({ gal }) => gal), neededGal, finestGal, mostUnits);
  const units = sizes.map(({ gal }) => Math.floor(gal / unitGal + 1e-6));
  const need = Math.ceil(neededGal / unitGal - 1e-6);
  if (need === 0) return [];
  const best = bestByContents(units, sizes);
  const bulk = Math.max(0, Math.ceil((need - mostUnits) / (units[best] as number)));
  const counts = cheapestFor(Math.max(0, need - bulk * (units[best] as number)), units, sizes);
  if (bulk > 0) counts.set(best, (counts.get(best) ?? 0) + bulk);
  return [...counts].map(([i, count]) => ({ gal: (sizes[i] as ContainerSize).gal, count })).sort((a, b) => b.gal - a.gal);
}

/** What a mix costs, each size at its least price. */
export const priceOfContainers = (containers: readonly ContainerCount[], sizes: readonly ContainerSize[]): number =>
  containers.reduce((sum, { gal, count }) => sum + count * Math.min(...sizes.filter((size) => size.gal === gal).map(({ priceCents }) => priceCents)), 0);

/** The size with the least price for its contents; the larger of two alike. */
function bestByContents(units: readonly number[], sizes: readonly ContainerSize[]): number {
  const perUnit = (i: number) => (sizes[i] as ContainerSize).priceCents / (units[i] as number);
  return units.reduce((best, size, i) => (perUnit(i) < perUnit(best) || (perUnit(i) === perUnit(best) && size > (units[best] as number)) ? i : best), 0);
}

/** How many of each size, by its place in the list. */
function cheapestFor(need: number, units: readonly number[], sizes: readonly ContainerSize[]): Map<number, number> {
  // best[k]: least (price, containers, −contents) to hold at least k units; `last` is the container put in last.
  const price = new Float64Array(need + 1);
  const containers = new Int32Array(need + 1);
  const contents = new Float64Array(need + 1);
  const last = new Int16Array(need + 1).fill(-1);
  for (let k = 1; k <= need; k += 1) {
    price[k] = Infinity;
    for (let i = 0; i < sizes.length; i += 1) {
      const before = Math.max(0, k - (units[i] as number));
      const p = (price[before] as number) + (sizes[i] as ContainerSize).priceCents;
      const n = (containers[before] as number) + 1;
      const c = (contents[before] as number) + (units[i] as number);
      const better = p < (price[k] as number) || (p === price[k] && (n < (containers[k] as number) || (n === containers[k] && c < (contents[k] as number))));
      if (!better) continue;
      price[k] = p;
      containers[k] = n;
      contents[k] = c;
      last[k] = i;
    }
  }
  const counts = new Map<number, number>();
  for (let k = need; k > 0; ) {
    const i = last[k] as number;
    counts.set(i, (counts.get(i) ?? 0) + 1);
    k = Math.max(0, k - (units[i] as number));
  }
  return counts;
}

export type ContainerSize = { gal: number; priceCents: number };
export type ContainerCount = { gal: number; count: number };

/** Sizes are whole numbers of this: a fluid ounce, so that quarts and metric cans come out whole enough. */
const fluidOunce = 1 / 128;
/** What is searched through: 3,200 gal by fluid ounces. */
const mostUnits = 409_600;
const mostGal = 50_000;

/**
 * The cheapest mix of containers that holds at least the need; among equally cheap ones the fewest containers, then the least left over.
 * Exact: dynamic programming over fluid ounces (1/128 gal), sizes rounded down and the need up to whole ounces. Of a need above
 * 3,200 gal the part above is filled with the size that is cheapest by the gallon, which is still exact for sizes up to 5 gal:
 * a cheapest mix exists that holds less than 640 × 640 ounces in the other sizes (any 640 of those have some among them whose
 * contents are whole containers of the cheapest). With a finer unit all of these bounds shrink by as much.
 * @param neededGal US gallons, 0 to 50,000
 * @param sizes container sizes in US gallons (at least an ounce) with prices in cents ≥ 0
 * @param unitGal what sizes are counted in; a fluid ounce unless said
 * @returns counts above 0, largest size first; empty for no need
 * @throws RangeError for a need or size out of range, or no sizes
 */
export function cheapestContainers(neededGal: number, sizes: readonly ContainerSize[], unitGal = fluidOunce): ContainerCount[] {
  if (!(neededGal >= 0) || neededGal > mostGal) throw new RangeError('the need must be between 0 and 50,000 gallons');
  if (sizes.length === 0) throw new RangeError('at least one container size is needed');
  const units = sizes.map(({ gal, priceCents }) => {
    if (!(gal >= unitGal) || !(priceCents >= 0) || !Number.isFinite(gal + priceCents)) throw new RangeError('a container needs a size and a price');
    return Math.floor(gal / unitGal + 1e-6);
  });
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

import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { cheapestContainers } from '@/lib/takeoff';

type Size = { gal: number; priceCents: number };

/** Every mix up to the count that one size alone would need: slow and plainly right. */
function bruteForce(need: number, sizes: Size[]): number {
  const [size, ...rest] = sizes;
  if (!size) return need <= 1e-9 ? 0 : Infinity;
  let best = Infinity;
  for (let count = 0; count <= Math.ceil(need / size.gal - 1e-9) || count === 0; count += 1) {
    best = Math.min(best, count * size.priceCents + bruteForce(Math.max(0, need - count * size.gal), rest));
  }
  return best;
}

const sizes = fc.uniqueArray(fc.record({ gal: fc.constantFrom(0.25, 0.5, 1, 2, 5), priceCents: fc.integer({ min: 1, max: 40000 }) }), { minLength: 1, maxLength: 4, selector: ({ gal }) => gal });
const need = fc.integer({ min: 0, max: 80 }).map((quarters) => quarters / 4);
const priceOf = (mix: { gal: number; count: number }[], of: Size[]) => mix.reduce((sum, { gal, count }) => sum + count * (of.find((size) => size.gal === gal)?.priceCents ?? NaN), 0);

describe('cheapestContainers', () => {
  test('covers the need at the price that trying every mix finds', () => {
    fc.assert(
      fc.property(need, sizes, (gallons, offered) => {
        const mix = cheapestContainers(gallons, offered);
        expect(mix.reduce((sum, { gal, count }) => sum + gal * count, 0)).toBeGreaterThanOrEqual(gallons - 1e-9);
        expect(priceOf(mix, offered)).toBe(bruteForce(gallons, offered));
      }),
      { numRuns: 300 },
    );
  });

  test('a need of thousands of gallons, as a plain search by quarter gallons finds it', () => {
    const plainSearch = (needed: number, of: Size[]): number => {
      const best = [0];
      for (let quarters = 1; quarters <= needed * 4; quarters += 1) best[quarters] = Math.min(...of.map(({ gal, priceCents }) => priceCents + (best[Math.max(0, quarters - gal * 4)] ?? 0)));
      return best[needed * 4] ?? NaN;
    };
    fc.assert(
      fc.property(fc.integer({ min: 3195, max: 4200 }), sizes, (gallons, offered) => {
        const mix = cheapestContainers(gallons, offered);
        expect(mix.reduce((sum, { gal, count }) => sum + gal * count, 0)).toBeGreaterThanOrEqual(gallons);
        expect(priceOf(mix, offered)).toBe(plainSearch(gallons, offered));
      }),
      { numRuns: 25 },
    );
  });

  test('greed is not enough: 6 gal in fives at $60 and threes at $25 is two threes', () => {
    expect(cheapestContainers(6, [{ gal: 5, priceCents: 6000 }, { gal: 3, priceCents: 2500 }])).toEqual([{ gal: 3, count: 2 }]);
  });

  test('at equal price the fewest containers, then the least left over', () => {
    expect(cheapestContainers(4, [{ gal: 1, priceCents: 500 }, { gal: 5, priceCents: 2000 }])).toEqual([{ gal: 5, count: 1 }]);
    expect(cheapestContainers(4, [{ gal: 5, priceCents: 2000 }, { gal: 4, priceCents: 2000 }])).toEqual([{ gal: 4, count: 1 }]);
  });

  test('nothing needed, nothing bought; nonsense is refused', () => {
    expect(cheapestContainers(0, [{ gal: 1, priceCents: 1 }])).toEqual([]);
    expect(() => cheapestContainers(-1, [{ gal: 1, priceCents: 1 }])).toThrow(RangeError);
    expect(() => cheapestContainers(NaN, [{ gal: 1, priceCents: 1 }])).toThrow(RangeError);
    expect(() => cheapestContainers(1, [])).toThrow(RangeError);
    expect(() => cheapestContainers(1, [{ gal: 0, priceCents: 1 }])).toThrow(RangeError);
  });
});

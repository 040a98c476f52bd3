import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { cheapestContainers } from '@/lib/takeoff';

type Size = { gal: number; priceCents: number };

type Mix = { cost: number; count: number; held: number };
const better = (a: Mix, b: Mix) => a.cost < b.cost || (a.cost === b.cost && (a.count < b.count || (a.count === b.count && a.held < b.held - 1e-9)));

/** Every mix up to the count that one size alone would need: slow and plainly right. Cheapest, then fewest, then least left over. */
function bruteForce(need: number, sizes: Size[], so: Mix = { cost: 0, count: 0, held: 0 }): Mix {
  const [size, ...rest] = sizes;
  if (!size) return so.held >= need - 1e-9 ? so : { cost: Infinity, count: 0, held: 0 };
  let best: Mix = { cost: Infinity, count: 0, held: 0 };
  for (let n = 0; n === 0 || so.held + (n - 1) * size.gal < need - 1e-9; n += 1) {
    const mix = bruteForce(need, rest, { cost: so.cost + n * size.priceCents, count: so.count + n, held: so.held + n * size.gal });
    if (better(mix, best)) best = mix;
  }
  return best;
}

const sizes = fc.uniqueArray(fc.record({ gal: fc.constantFrom(0.25, 0.5, 1, 2, 5), priceCents: fc.integer({ min: 1, max: 40000 }) }), { minLength: 1, maxLength: 4, selector: ({ gal }) => gal });
const need = fc.integer({ min: 0, max: 80 }).map((quarters) => quarters / 4);
const priceOf = (mix: { gal: number; count: number }[], of: Size[]) => mix.reduce((sum, { gal, count }) => sum + count * (of.find((size) => size.gal === gal)?.priceCents ?? NaN), 0);

describe('cheapestContainers', () => {
  const asMix = (mix: { gal: number; count: number }[], offered: Size[]): Mix => ({ cost: priceOf(mix, offered), count: mix.reduce((sum, { count }) => sum + count, 0), held: mix.reduce((sum, { gal, count }) => sum + gal * count, 0) });

  test('is the mix that trying every one finds: cheapest, then fewest, then least left over', () => {
    fc.assert(
      fc.property(need, sizes, (gallons, offered) => {
        const [ours, truth] = [asMix(cheapestContainers(gallons, offered), offered), bruteForce(gallons, offered)];
        expect(ours.held).toBeGreaterThanOrEqual(gallons - 1e-9);
        expect([ours.cost, ours.count]).toEqual([truth.cost, truth.count]);
        expect(ours.held).toBeCloseTo(truth.held, 9);
      }),
      { numRuns: 300 },
    );
  });

  test('the same at few prices, where much is equally cheap', () => {
    const few = fc.uniqueArray(fc.record({ gal: fc.constantFrom(0.25, 0.5, 1, 2, 5), priceCents: fc.constantFrom(250, 500, 1000, 2000, 5000) }), { minLength: 1, maxLength: 4, selector: ({ gal }) => gal });
    fc.assert(
      fc.property(need, few, (gallons, offered) => {
        const [ours, truth] = [asMix(cheapestContainers(gallons, offered), offered), bruteForce(gallons, offered)];
        expect([ours.cost, ours.count]).toEqual([truth.cost, truth.count]);
        expect(ours.held).toBeCloseTo(truth.held, 9);
      }),
      { numRuns: 300 },
    );
  });

  test('caulk by the fluid ounce and the millilitre, at any prices', () => {
    const tubes = [10.1 / 128, 20 / 128, 0.6 / 3.785411784, 29 / 128];
    const prices = fc.tuple(...tubes.map(() => fc.integer({ min: 1, max: 4000 })));
    // 600 mL share no unit with the ounces: a container is counted at most 1/64 of a tenth of an ounce too small, so a need within that of full ones is left out.
    const clear = (gallons: number, offered: Size[]) => {
      const less = offered.map((size) => ({ ...size, gal: size.gal - 1 / 81_920 }));
      return bruteForce(gallons, less).cost === bruteForce(gallons, offered).cost;
    };
    fc.assert(
      fc.property(prices, fc.integer({ min: 1, max: 1200 }), (cents, tenths) => {
        const offered = tubes.map((gal, i) => ({ gal, priceCents: cents[i] ?? 1 }));
        const gallons = (tenths + 0.5) / 1280;
        fc.pre(clear(gallons, offered));
        const ours = asMix(cheapestContainers(gallons, offered, 1 / 1280), offered);
        expect(ours.held).toBeGreaterThanOrEqual(gallons - 1e-9);
        expect(ours.cost).toBe(bruteForce(gallons, offered).cost);
      }),
      { numRuns: 100 },
    );
  });

  test('metric cans, and cans in thousandths of a gallon, at any need, full ones included', () => {
    const metric = fc.constantFrom(0.375, 0.75, 1, 2.5, 5, 10).map((litres) => litres / 3.785411784);
    const typed = fc.constantFrom(0.198, 0.264, 0.66, 1.32, 2.5);
    const offer = (gal: fc.Arbitrary<number>) => fc.uniqueArray(fc.record({ gal, priceCents: fc.integer({ min: 1, max: 20000 }) }), { minLength: 1, maxLength: 3, selector: (size) => size.gal });
    const wanted = fc.integer({ min: 0, max: 8000 }).map((thousandths) => thousandths / 1000 + 1e-4);
    fc.assert(
      fc.property(fc.oneof(offer(metric), offer(typed)), wanted, fc.boolean(), (offered, amount, full) => {
        const gallons = full ? Math.ceil(amount) * (offered[0]?.gal ?? 1) : amount;
        const [ours, truth] = [asMix(cheapestContainers(gallons, offered), offered), bruteForce(gallons, offered)];
        expect(ours.held).toBeGreaterThanOrEqual(gallons - 1e-6);
        expect([ours.cost, ours.count]).toEqual([truth.cost, truth.count]);
      }),
      { numRuns: 200 },
    );
  });

  test('one can of 0.75 L holds 0.75 L', () => {
    const can = 0.75 / 3.785411784;
    expect(cheapestContainers(can, [{ gal: can, priceCents: 2000 }, { gal: 2.5 / 3.785411784, priceCents: 5000 }])).toEqual([{ gal: can, count: 1 }]);
  });

  test('sizes that share no unit still hold the need, at most one part of the finest unit too careful', () => {
    const cartridge = 10.1 / 128;
    const sausage = 0.6 / 3.785411784;
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 3000 }).map((n) => n / 1000), fc.integer({ min: 1, max: 3000 }), fc.integer({ min: 1, max: 3000 }), (gallons, a, b) => {
        const offered = [{ gal: cartridge, priceCents: a }, { gal: sausage, priceCents: b }];
        const ours = asMix(cheapestContainers(gallons, offered, 1 / 1280), offered);
        expect(ours.held).toBeGreaterThanOrEqual(gallons - 1e-6);
        expect(ours.cost).toBeGreaterThanOrEqual(bruteForce(gallons, offered).cost);
        expect(ours.cost).toBeLessThanOrEqual(bruteForce(gallons + 40 / 1280 / 64, offered).cost);
      }),
      { numRuns: 100 },
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

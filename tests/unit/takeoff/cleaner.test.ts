import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { cleanerStart } from '@/lib/home/cleaner-start';
import { answerCleaner, readCleaner } from '@/lib/schemas/cleaner-form';
import { cleanerNeeded, type CleanerNeed, exampleCleaners } from '@/lib/takeoff/cleaner';
import { ft2ToM2, litresToGallons } from '@/lib/units';

const need: CleanerNeed = { areaM2: ft2ToM2(234), profileFactor: 1.06, partsWater: 4, sizes: exampleCleaners, units: 'us' };

const needs = fc.record({
  areaM2: fc.double({ min: 0, max: 500, noNaN: true }),
  profileFactor: fc.double({ min: 1, max: Math.PI / 2, noNaN: true }),
  partsWater: fc.integer({ min: 0, max: 20 }),
  sizes: fc.constant(exampleCleaners),
  units: fc.constantFrom('us' as const, 'metric' as const),
});
const labels = fc.tuple(fc.integer({ min: 20, max: 500 }), fc.integer({ min: 0, max: 500 })).map(([low, more]) => ({ low, high: low + more }));

describe('cleaner for a wash', () => {
  // By hand: 234 ft² × 1.06 = 248.04 ft²; at 200 and 100 ft²/gal 1.2402 and 2.4804 gal mixed; one part in five of the larger: 0.49608 gal, two quarts at $14.00.
  test('234 ft² of log siding', () => {
    const { lowL, highL, buyL, containers, priceCents } = cleanerNeeded(need);
    expect([lowL, highL, buyL].map(litresToGallons)).toEqual([1.2402, 2.4804, 0.49608].map((gallons) => expect.closeTo(gallons, 9)));
    expect([containers, priceCents]).toEqual([[{ gal: 0.25, count: 2 }], 2800]);
  });

  test('with a label the usual range never matters: the amounts are those of the label', () => {
    fc.assert(
      fc.property(needs, labels, (one, coverage) => {
        const { lowL, highL, explanations } = cleanerNeeded({ ...one, coverage });
        const washed = (one.areaM2 / 0.09290304) * one.profileFactor;
        expect(litresToGallons(lowL)).toBeCloseTo(washed / coverage.high, 9);
        expect(litresToGallons(highL)).toBeCloseTo(washed / coverage.low, 9);
        expect(explanations.mixed.sources.map(({ ground }) => ground)).toEqual(['published']);
      }),
    );
  });

  test('the containers hold the concentrate, and more water takes no more of it', () => {
    fc.assert(
      fc.property(needs, (one) => {
        const [strong, weak] = [cleanerNeeded(one), cleanerNeeded({ ...one, partsWater: one.partsWater + 1 })];
        expect(strong.containers.reduce((sum, { gal, count }) => sum + gal * count, 0)).toBeGreaterThanOrEqual(litresToGallons(strong.buyL) - 1e-6); // Counted to a millionth of a quart.
        expect(strong.buyL).toBeCloseTo(strong.highL / (one.partsWater + 1), 9);
        expect(weak.priceCents).toBeLessThanOrEqual(strong.priceCents);
      }),
    );
  });

  test.each([{ partsWater: -1 }, { partsWater: 101 }, { areaM2: NaN }, { profileFactor: 0.9 }, { coverage: { low: 0, high: 100 } }, { coverage: { low: 200, high: 100 } }])('%j is refused', (wrong) => {
    expect(() => cleanerNeeded({ ...need, ...wrong })).toThrow(RangeError);
  });
});

describe('the form of the cleaner', () => {
  const home = { sidingNominalIn: 8, crownHeightM: 0.0254 };
  const areas = [{ id: 'a', name: 'Front', areaM2: 21.739 }, { id: 'b', name: 'Side', areaM2: 13 }];
  const startIn = (units: 'us' | 'metric', sent = {}) => cleanerStart(home, areas, ['a'], units, sent);
  const answerIn = (units: 'us' | 'metric', sent = {}) => {
    const { ask, start } = startIn(units, sent);
    return answerCleaner(start, ask);
  };

  test('starts with the walls whose work is next', () => {
    expect(startIn('us').start.cleanWalls).toEqual(['a']);
    expect(litresToGallons(answerIn('us')?.highL ?? NaN)).toBeCloseTo(2.48, 2);
  });

  // 40.74583 ft² per gallon are a square meter per liter (NIST SP 811); typed to four digits behind the point, so within a thousandth.
  test('customary and metric give the same volume', () => {
    expect(answerIn('metric')?.highL).toBeCloseTo(answerIn('us')?.highL ?? NaN, 9);
    fc.assert(
      fc.property(labels, ({ low, high }) => {
        const us = answerIn('us', { cleanerLow: String(low), cleanerHigh: String(high) });
        const metric = answerIn('metric', { cleanerLow: (low / 40.74583).toFixed(4), cleanerHigh: (high / 40.74583).toFixed(4) });
        fc.pre(us !== undefined && metric !== undefined);
        expect(Math.abs((metric?.highL ?? NaN) / (us?.highL ?? NaN) - 1)).toBeLessThan(0.001);
      }),
      { numRuns: 30 },
    );
  });

  test.each([['cleanerParts', '-1'], ['cleanerParts', 'some'], ['cleanerLow', '1'], ['cleanerHigh', 'far']])('%s of "%s" is a fault at its field', (field, text) => {
    const { ask, start } = startIn('us');
    const { need: read, faults } = readCleaner({ ...start, [field]: text }, ask);
    expect([read, Object.keys(faults)]).toEqual([null, [field]]);
  });

  test('what was sent comes back, and no wall chosen is neither an amount nor a fault', () => {
    expect(startIn('us', { 'cleanWalls[]': 'b', cleanerParts: '9' }).start).toMatchObject({ cleanWalls: ['b'], cleanerParts: '9' });
    const { ask, start } = startIn('us');
    expect(readCleaner({ ...start, cleanWalls: [] }, ask)).toEqual({ need: null, faults: {}, missing: {} });
  });
});

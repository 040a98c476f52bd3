import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { exampleContainers, type StainNeed, stainNeeded, stainRange } from '@/lib/takeoff';

const need = fc.record({
  areaM2: fc.double({ min: 0, max: 400, noNaN: true }),
  profileFactor: fc.double({ min: 1, max: Math.PI / 2, noNaN: true }),
  texture: fc.constantFrom('smooth' as const, 'saw-textured' as const),
  coats: fc.integer({ min: 1, max: 3 }),
  wasteShare: fc.double({ min: 0, max: 0.5, noNaN: true }),
});
const with3 = (one: Omit<StainNeed, 'sizes'>): StainNeed => ({ ...one, sizes: exampleContainers });

describe('stain needed', () => {
  test('low ≤ high ≤ to buy ≤ what the containers hold; litres are the gallons', () => {
    fc.assert(
      fc.property(need, (one) => {
        const stain = stainNeeded(with3(one));
        expect(stain.lowGal).toBeLessThanOrEqual(stain.highGal);
        expect(stain.highGal).toBeLessThanOrEqual(stain.buyGal + 1e-12);
        // Counted to a millionth of a quart.
        expect(stain.containers.reduce((sum, { gal, count }) => sum + gal * count, 0)).toBeGreaterThanOrEqual(stain.buyGal - 1e-6);
        expect(stain.buyL).toBeCloseTo(stain.buyGal * 3.785411784, 9);
      }),
    );
  });

  test('in proportion to area, coats and profile', () => {
    fc.assert(
      fc.property(need, fc.integer({ min: 2, max: 4 }), (one, times) => {
        const base = stainRange(one).highGal * times;
        expect(stainRange({ ...one, areaM2: one.areaM2 * times }).highGal).toBeCloseTo(base, 9);
        expect(stainRange({ ...one, coats: one.coats * times }).highGal).toBeCloseTo(base, 9);
      }),
    );
  });

  test('the label wins over the table', () => {
    const one = { areaM2: 92.90304, profileFactor: 1, texture: 'smooth' as const, coats: 1, wasteShare: 0 };
    expect(stainRange(one)).toMatchObject({ lowGal: expect.closeTo(2.5, 9), highGal: expect.closeTo(5, 9) });
    expect(stainRange({ ...one, coverage: { low: 125, high: 250 } })).toMatchObject({ lowGal: expect.closeTo(4, 9), highGal: expect.closeTo(8, 9) });
  });

  test('the explanation carries figure, inputs, formula and sources, and says which are ours', () => {
    const { explanation } = stainNeeded(with3({ areaM2: 21.74, profileFactor: 1.06, texture: 'saw-textured', coats: 2, wasteShare: 0.1 }));
    expect(explanation.figure).toBe('Stain to buy');
    expect(explanation.value).toBe('5.5 gal');
    expect(explanation.inputs.find(({ label }) => label === 'Wall area')?.value).toBe('234 ft²');
    expect(explanation.sources.some(({ text, ground }) => text.includes('FPL-GTR-190') && ground === 'published')).toBe(true);
    expect(explanation.sources.some(({ ground }) => ground === 'our rule')).toBe(true);
  });

  const sound = { areaM2: 20, profileFactor: 1.06, texture: 'smooth' as const, coats: 2, wasteShare: 0.1 };
  test.each([{ areaM2: -1 }, { profileFactor: 0.9 }, { coats: 0 }, { wasteShare: 0.6 }, { wasteShare: -0.1 }, { coverage: { low: 0, high: 100 } }, { coverage: { low: 200, high: 100 } }, { areaM2: NaN }])('%o is refused', (wrong) => {
    expect(() => stainRange({ ...sound, ...wrong })).toThrow(RangeError);
  });
});

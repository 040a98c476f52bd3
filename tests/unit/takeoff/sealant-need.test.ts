import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { exampleSealants, sealantAnswer, sealantFigures } from '@/lib/takeoff/sealant-need';
import { feetToMetres, inchesToMetres, litresPerGallon, metresToInches } from '@/lib/units';
import { readCsv } from '../../fixtures/csv';

const cartridge = { gal: 10.1 / 128, priceCents: 900 };
const need = (feet: number, widthIn = 0.25, wasteShare = 0, sizes = [cartridge]) => ({ joints: [{ kind: 'openings' as const, lengthM: feetToMetres(feet) }], widthM: inchesToMetres(widthIn), wasteShare, sizes });
const count = (feet: number) => sealantFigures(need(feet)).containers[0]?.count;

describe('caulk for joints', () => {
  // sealant-yield.csv: a container of 10.1 fl oz fills 24.3 ft of 1/4 × 1/4 in (exactly 24.304).
  test('one container holds 24.2 ft, two are needed for 24.5', () => {
    expect([count(24.2), count(24.5), count(48.5), count(0)]).toEqual([1, 2, 2, undefined]);
  });

  // Rows whose bead has the depth of the rule: 1/4 × 1/4 and 3/4 × 3/8 in. Volume of a bead as in³ per foot, a gallon is 231 in³.
  const rows = readCsv('sealant-yield.csv').filter((row) => ['0.0625', '0.28125'].includes(row.area_in2 ?? ''));
  test.each(rows)('$width_in × $depth_in in: $in3_per_lin_ft in³ a foot', (row) => {
    const { lowL, depthM } = sealantFigures(need(100, Number(row.width_in)));
    expect(metresToInches(depthM)).toBeCloseTo(Number(row.depth_in), 9);
    expect((lowL / litresPerGallon) * 231).toBeCloseTo(100 * Number(row.in3_per_lin_ft), 6);
  });
  test('both rows are there', () => expect(rows.length).toBe(2));

  test('a joint of 3/4 in: 0.375 by one handbook, 0.5 in by the other, and waste on the deeper', () => {
    const { lowL, highL, buyL, rodLengthM, rodDiameterM } = sealantFigures(need(100, 0.75, 0.1));
    expect(highL / lowL).toBeCloseTo(0.5 / 0.375, 9);
    expect(buyL / highL).toBeCloseTo(1.1, 9);
    expect([rodLengthM, rodDiameterM]).toEqual([expect.closeTo(feetToMetres(110), 9), expect.closeTo(inchesToMetres(1), 9)]);
  });

  // By hand: 30 fl oz are 72.2 ft of 1/4 × 1/4 in. Three of 10.1 hold 30.3 fl oz for $27, the cheapest of all mixes but 10.1 + 20 ($25).
  test('the cheapest mix, to a tenth of a fluid ounce', () => {
    expect(sealantFigures(need(72.2, 0.25, 0, exampleSealants))).toMatchObject({ priceCents: 2500, containers: [{ gal: 20 / 128, count: 1 }, { gal: 10.1 / 128, count: 1 }] });
  });

  test('the containers hold what is to be bought, and longer joints never take less', () => {
    const width = fc.double({ min: 0.25, max: 1, noNaN: true });
    const feet = fc.double({ min: 0, max: 2000, noNaN: true });
    fc.assert(fc.property(feet, feet, width, (a, b, wide) => {
      const [less, more] = [Math.min(a, b), Math.max(a, b)].map((length) => sealantFigures(need(length, wide, 0.1, exampleSealants)));
      const heldL = (more?.containers ?? []).reduce((sum, { gal, count: n }) => sum + gal * n * litresPerGallon, 0);
      expect(heldL).toBeGreaterThanOrEqual((more?.buyL ?? NaN) - 1e-6);
      expect(more?.priceCents).toBeGreaterThanOrEqual(less?.priceCents ?? NaN);
    }), { numRuns: 50 });
  });

  test('every figure says what it came from', () => {
    const { explanations } = sealantAnswer({ ...need(73, 0.25, 0.1, exampleSealants), rule: { exposedFaceM: 0.168, boardM: 4.88 } });
    for (const { value, inputs, sources } of Object.values(explanations)) expect([value, inputs.length > 0, sources.length > 0]).toEqual([expect.stringMatching(/\d/), true, true]);
    expect(explanations.depth.sources.map(({ text }) => text).join()).toContain('differs');
  });
});

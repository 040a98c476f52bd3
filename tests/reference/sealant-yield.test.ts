import { describe, expect, test } from 'vitest';
import { sealantYieldFt } from '@/lib/takeoff';
import { readCsv } from '../fixtures/csv';

/** A US fluid ounce is 231/128 in³ (NIST Handbook 44, appendix C); a millilitre 1/16.387064 in³. */
const containersIn3: Record<string, number> = {
  'US gallon lin ft': 231,
  '10.1 fl oz cartridge lin ft': (10.1 * 231) / 128,
  '20 fl oz sausage lin ft': (20 * 231) / 128,
  '600 mL sausage lin ft': 600 / 16.387064,
  '30 fl oz cartridge lin ft': (30 * 231) / 128,
};

describe('feet of joint from one container, exact arithmetic (two decimals in the table)', () => {
  // The table's last row is a triangular bead: half of width × depth.
  const rectangular = readCsv('sealant-yield.csv').filter((row) => Math.abs(Number(row.width_in) * Number(row.depth_in) - Number(row.area_in2)) < 1e-9);
  test('the table is there', () => expect(rectangular.length).toBe(4));

  test.each(rectangular)('$width_in × $depth_in in', (row) => {
    for (const [column, volume] of Object.entries(containersIn3)) {
      expect(Math.abs(sealantYieldFt(Number(row.width_in), Number(row.depth_in), volume) - Number(row[column]))).toBeLessThan(0.011);
    }
  });

  test('a cartridge of 10.1 fl oz fills 24.3 ft of ¼ × ¼ in, not 50', () => {
    expect(sealantYieldFt(0.25, 0.25, (10.1 * 231) / 128)).toBeCloseTo(24.3, 1);
  });
});

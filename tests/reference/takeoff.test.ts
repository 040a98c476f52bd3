import { describe, expect, test } from 'vitest';
import { courseCount, profileFactor, sealantYieldFt, sidingProfile, stainNeeded, wallAreaFt2 } from '@/lib/takeoff';
import { exampleContainers } from '@/lib/takeoff/stain';
import { squareMetresPerSquareFoot } from '@/lib/units';
import { readCsv } from '../fixtures/csv';

/** A US fluid ounce is 231/128 in³ (NIST Handbook 44, appendix C); a millilitre 1/16.387064 in³. */
const containersIn3: Record<string, number> = {
  'US gallon lin ft': 231,
  '10.1 fl oz cartridge lin ft': (10.1 * 231) / 128,
  '20 fl oz sausage lin ft': (20 * 231) / 128,
  '600 mL sausage lin ft': 600 / 16.387064,
  '30 fl oz cartridge lin ft': (30 * 231) / 128,
};

describe('area factor of a rounded face, exact geometry (published to four digits)', () => {
  test.each(readCsv('profile-area-factor.csv'))('$exposed_face_in in face, $crown_height_in in crown', (row) => {
    expect(profileFactor(Number(row.exposed_face_in), Number(row.crown_height_in))).toBeCloseTo(Number(row.area_factor), 4);
  });

  test('flat is 1, a half-round is π/2', () => {
    expect(profileFactor(8, 0)).toBe(1);
    expect(profileFactor(8, 4)).toBeCloseTo(Math.PI / 2, 12);
  });
});

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

describe('a worked wall: 30 ft × 9 ft less 36 ft² of openings', () => {
  const areaFt2 = wallAreaFt2({ widthFt: 30, heightFt: 9, openings: [{ widthFt: 3, heightFt: 4, count: 3 }] });

  test('234 ft²', () => expect(areaFt2).toBeCloseTo(234, 9));

  test('17 courses of nominal 8 in siding (WWPA technical guide, table 4: exposed face 6.625 in)', () => {
    expect(courseCount(9 * 12, sidingProfile(8)?.exposedFaceIn ?? NaN)).toBe(17);
  });

  test('two coats on saw-textured wood at 100–200 ft²/gal (Wood Handbook p. 16-20), factor 1.06: 2.48–4.96 gal', () => {
    const estimate = stainNeeded({ areaM2: areaFt2 * squareMetresPerSquareFoot, profileFactor: 1.06, texture: 'saw-textured', coats: 2, wasteShare: 0, sizes: exampleContainers });
    expect(estimate.lowGal).toBeCloseTo(2.48, 2);
    expect(estimate.highGal).toBeCloseTo(4.96, 2);
    expect(estimate.buyGal).toBe(estimate.highGal);
  });

  test('smooth wood drinks half of that: 200–400 ft²/gal', () => {
    const estimate = stainNeeded({ areaM2: areaFt2 * squareMetresPerSquareFoot, profileFactor: 1.06, texture: 'smooth', coats: 2, wasteShare: 0, sizes: exampleContainers });
    expect(estimate.highGal).toBeCloseTo(2.48, 2);
  });
});

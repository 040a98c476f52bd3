import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { stations } from '@/lib/climate';
import { directSunHoursOn, sunDose, sunPath } from '@/lib/sun';

/** What must hold everywhere, whatever the method. */
const station = fc.constantFrom(...stations.filter(({ latitude }) => latitude > 24 && latitude < 49.5));
const dose = (at: (typeof stations)[number], azimuthDeg: number, more = {}) => sunDose(at, { azimuthDeg, heightM: 2.7, ...more }, at.ghiKwhM2Day);

describe('sun dose', () => {
  // Hour-by-hour truth runs from 2.1 (Miami) to 3.0 (Golden); the method's lean towards darker north walls takes the clear high West to 3.8.
  test('south gets between 1.9 and 3.8 times north in the 48 states', () => {
    fc.assert(fc.property(station, (at) => {
      const ratio = dose(at, 180).annual / dose(at, 0).annual;
      expect(ratio).toBeGreaterThan(1.9);
      expect(ratio).toBeLessThan(3.8);
    }), { numRuns: 300 });
  });

  test('east and west are alike (hours are symmetric about noon) and over NE and NW, which are over north', () => {
    fc.assert(fc.property(station, (at) => {
      expect(dose(at, 90).annual).toBeCloseTo(dose(at, 270).annual, 6);
      expect(dose(at, 90).annual).toBeGreaterThan(dose(at, 45).annual);
      expect(dose(at, 315).annual).toBeGreaterThan(dose(at, 0).annual);
    }));
  });

  test('in June east and west get more than south', () => {
    fc.assert(fc.property(station, (at) => {
      expect(dose(at, 90).monthly[5]).toBeGreaterThan(dose(at, 180).monthly[5] ?? NaN);
    }));
  });

  test('a deeper eave, a higher obstruction or a darker ground never raises it', () => {
    fc.assert(
      fc.property(station, fc.integer({ min: 0, max: 359 }), fc.double({ min: 0, max: 4, noNaN: true }), fc.double({ min: 0, max: 2, noNaN: true }), (at, azimuth, depth, deeper) => {
        expect(dose(at, azimuth, { eaveDepthM: depth + deeper }).annual).toBeLessThanOrEqual(dose(at, azimuth, { eaveDepthM: depth }).annual + 1e-9);
      }),
    );
    fc.assert(
      fc.property(station, fc.integer({ min: 0, max: 359 }), fc.double({ min: 0, max: 40, noNaN: true }), fc.double({ min: 0, max: 40, noNaN: true }), (at, azimuth, height, higher) => {
        const horizon = (elevationDeg: number) => ({ horizon: [{ fromAzimuthDeg: (azimuth + 300) % 360, toAzimuthDeg: (azimuth + 60) % 360, elevationDeg, transmittanceLeafOn: 0.2, transmittanceLeafOff: 0.6 }] });
        expect(dose(at, azimuth, horizon(height + higher)).annual).toBeLessThanOrEqual(dose(at, azimuth, horizon(height)).annual + 1e-9);
      }),
    );
  });

  test('the southern hemisphere mirrors the northern: a north wall there is a south wall here, half a year later', () => {
    const ghi = [2, 3, 4, 5, 6, 7, 7, 6, 5, 4, 3, 2];
    const shifted = [...ghi.slice(6), ...ghi.slice(0, 6)];
    const here = sunDose({ latitude: 40, longitude: 0 }, { azimuthDeg: 180 }, ghi).annual;
    const there = sunDose({ latitude: -40, longitude: 0 }, { azimuthDeg: 0 }, shifted).annual;
    // Earth is 3 % nearer to the sun in January than in July, which moves clearness and so the diffuse share.
    expect(Math.abs(there / here - 1)).toBeLessThan(0.04);
  });

  test('eleven months, or a negative one, are refused', () => {
    expect(() => sunDose({ latitude: 45, longitude: 0 }, { azimuthDeg: 0 }, new Array<number>(11).fill(3))).toThrow(RangeError);
    expect(() => sunDose({ latitude: 45, longitude: 0 }, { azimuthDeg: 0 }, new Array<number>(12).fill(-1))).toThrow(RangeError);
  });
});

describe('direct sun hours', () => {
  const path = sunPath({ latitude: 45.68, longitude: -111.04 }, 2027);

  test('opposite walls share the whole daylight, and turning all the way round changes nothing', () => {
    fc.assert(fc.property(fc.integer({ min: 0, max: 359 }), (azimuth) => {
      const both = directSunHoursOn(path, { azimuthDeg: azimuth }).annual + directSunHoursOn(path, { azimuthDeg: azimuth + 180 }).annual;
      expect(both).toBeCloseTo(path.month.length * path.hoursPerSample, 6);
      expect(directSunHoursOn(path, { azimuthDeg: azimuth + 360 }).annual).toBeCloseTo(directSunHoursOn(path, { azimuthDeg: azimuth }).annual, 6);
    }), { numRuns: 30 });
  });

  test('an opaque wall in front as high as the zenith leaves none', () => {
    const horizon = [{ fromAzimuthDeg: 0, toAzimuthDeg: 0, elevationDeg: 90, transmittanceLeafOn: 0, transmittanceLeafOff: 0 }];
    expect(directSunHoursOn(path, { azimuthDeg: 180, horizon }).annual).toBe(0);
  });
});

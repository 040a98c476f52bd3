import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { climateAt, groundAlbedo, nearestStation, stations } from '@/lib/climate';
import { sunDose } from '@/lib/sun';

const at = (latitude: number, longitude: number) => climateAt(nearestStation({ latitude, longitude }).station);

describe('what the ground reflects', () => {
  it('is worked by hand: 0.2 from 0 °C, 0.6 from −6 °C, a straight line between', () => {
    expect(groundAlbedo([-20, -6, -4.5, -3, 0, 25])).toEqual([0.6, 0.6, 0.5, 0.4, 0.2, 0.2].map((one) => expect.closeTo(one, 12) as number));
  });

  it('is snow in a Duluth January and never in Miami', () => {
    // NOAA normals 2006–2020: Duluth's January mean is about −12 °C, its July mean 19 °C; Miami's coldest month is about 20 °C.
    const duluth = groundAlbedo(at(46.84, -92.19).meanC);
    expect(duluth[0]).toBeCloseTo(0.6, 12);
    expect(duluth[6]).toBe(0.2);
    expect(groundAlbedo(at(25.8, -80.3).meanC)).toEqual(new Array<number>(12).fill(0.2));
  });

  it('stays within 0.2 and 0.6, and warmth never adds snow', () => {
    const celsius = fc.double({ min: -50, max: 45, noNaN: true });
    fc.assert(fc.property(celsius, celsius, (a, b) => {
      const [cold, warm] = groundAlbedo([Math.min(a, b), Math.max(a, b)]) as [number, number];
      expect(cold).toBeGreaterThanOrEqual(warm);
      expect(warm).toBeGreaterThanOrEqual(0.2);
      expect(cold).toBeLessThanOrEqual(0.6 + 1e-12);
    }));
  });

  it('adds half of the further reflected light to a wall, whatever it faces', () => {
    fc.assert(fc.property(fc.constantFrom(...stations), fc.integer({ min: 0, max: 359 }), (station, azimuthDeg) => {
      const albedo = groundAlbedo(climateAt(station).meanC);
      const [white, bare] = [{ albedo }, {}].map((options) => sunDose(station, { azimuthDeg }, station.ghiKwhM2Day, options).monthly) as [number[], number[]];
      const days = [31, 28.25, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31];
      white.forEach((dose, month) => {
        const horizontal = (station.ghiKwhM2Day[month] ?? NaN) * (days[month] ?? NaN);
        if (bare[month] !== 0) expect(dose - (bare[month] ?? NaN)).toBeCloseTo(0.5 * ((albedo[month] ?? NaN) - 0.2) * horizontal, 8);
      });
    }));
  });
});

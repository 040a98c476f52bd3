import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { dewPointC } from '@/lib/day/dew-point';

/** Saturation pressure of water, °C and kPa: IAPWS-IF97 steam tables (from memory), as in every engineering handbook. */
const steamTable = [
  [0.01, 0.6117], [5, 0.8726], [10, 1.2282], [15, 1.7058], [20, 2.3393], [25, 3.1699], [30, 4.247], [35, 5.629], [40, 7.3849],
] as const;

const air = fc.double({ min: -30, max: 50, noNaN: true });
const humidity = fc.double({ min: 1, max: 100, noNaN: true });

describe('dew point', () => {
  // The formula's pressures are within 0.4 %, which near 20 °C is 0.06 K; the table rounds to a hundredth of that.
  test.each(steamTable)('air that holds what saturates it at %d °C condenses there', (dewPoint, pressure) => {
    for (const [celsius, saturated] of steamTable.filter(([celsius]) => celsius >= dewPoint)) {
      expect(Math.abs(dewPointC(celsius, (pressure / saturated) * 100) - dewPoint)).toBeLessThan(0.06);
    }
  });

  test('saturated air condenses at its own temperature; drier air only below it', () => {
    fc.assert(fc.property(air, humidity, (celsius, percent) => {
      expect(dewPointC(celsius, 100)).toBeCloseTo(celsius, 9);
      expect(dewPointC(celsius, percent)).toBeLessThanOrEqual(celsius + 1e-9);
    }));
  });

  test('rises with humidity and with temperature', () => {
    fc.assert(fc.property(fc.double({ min: -30, max: 45, noNaN: true }), fc.double({ min: 1, max: 95, noNaN: true }), fc.double({ min: 0.1, max: 5, noNaN: true }), (celsius, percent, more) => {
      expect(dewPointC(celsius, percent + more)).toBeGreaterThan(dewPointC(celsius, percent));
      expect(dewPointC(celsius + more, percent)).toBeGreaterThan(dewPointC(celsius, percent));
    }));
  });

  test.each([[20, 0], [20, 101], [20, NaN], [51, 50], [-41, 50], [NaN, 50]])('%d °C at %d %% is refused', (celsius, percent) => {
    expect(() => dewPointC(celsius, percent)).toThrow(RangeError);
  });
});

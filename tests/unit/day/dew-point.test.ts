import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { dewPointC } from '@/lib/day/dew-point';

const air = fc.double({ min: -30, max: 50, noNaN: true });
const humidity = fc.double({ min: 1, max: 100, noNaN: true });

describe('dew point', () => {
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

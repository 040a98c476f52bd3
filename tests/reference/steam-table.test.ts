import { describe, expect, test } from 'vitest';
import { dewPointC } from '@/lib/day/dew-point';

/** Saturation pressure of water, °C and kPa: IAPWS-IF97 steam tables (from memory), as in every engineering handbook. */
const steamTable = [
  [0.01, 0.6117], [5, 0.8726], [10, 1.2282], [15, 1.7058], [20, 2.3393], [25, 3.1699], [30, 4.247], [35, 5.629], [40, 7.3849],
] as const;

describe('dew point against the steam table', () => {
  // The formula's pressures are within 0.4 %, which near 20 °C is 0.06 K; the table rounds to a hundredth of that.
  test.each(steamTable)('air that holds what saturates it at %d °C condenses there', (dewPoint, pressure) => {
    for (const [celsius, saturated] of steamTable.filter(([celsius]) => celsius >= dewPoint)) {
      expect(Math.abs(dewPointC(celsius, (pressure / saturated) * 100) - dewPoint)).toBeLessThan(0.06);
    }
  });
});

import { describe, expect, test } from 'vitest';
import { backerRod } from '@/lib/takeoff/joint-size';
import { inchesToMetres, metresToInches } from '@/lib/units';
import { dayWith, fahrenheit } from '@/tests/fixtures/fine-day';

/** ASTM C1193 and C1330 practice, from memory, medium confidence. */

test('sealant between 40 and 100 °F (ASTM C1193)', () => {
  const verdicts = [39, 40, 100, 101].map((degrees) => dayWith({ work: 'recaulk', temperatureC: fahrenheit(degrees), humidityPercent: 30, lowC: 5 }).verdict);
  expect(verdicts).toEqual(['wait', 'go', 'go', 'wait']);
});

describe('backer rod: the next size that is 25 to 33 % wider than the joint, or the nearest above', () => {
  test.each([[0.25, 0.375], [0.375, 0.5], [0.5, 0.625], [0.75, 1], [1, 1.25]])('%d in wide: rod of %d in', (wide, rod) => {
    expect(metresToInches(backerRod(inchesToMetres(wide)).diameterM)).toBeCloseTo(rod, 9);
  });
});

import { describe, expect, test } from 'vitest';
import { lowestTemperature } from '@/lib/climate';
import { finishLife } from '@/lib/coat/service-life';
import { coverageFt2PerGal, stainNeeded } from '@/lib/takeoff';
import { exampleContainers } from '@/lib/takeoff/stain';
import { dayWith, fahrenheit } from '@/tests/fixtures/fine-day';

/** Wood Handbook: Wood as an Engineering Material, FPL-GTR-190 (USDA Forest Products Laboratory, 2010), ch. 16. Exact: the table's own figures. */

describe('years that a finish lasts', () => {
  // Water repellent: Table 16-5, read. The others by wood and surface: Table 16-4, from memory.
  test.each([
    ['water-repellent', 'smooth', 'cedar-redwood', 1, 3],
    ['tinted-clear', 'smooth', 'cedar-redwood', 1, 2],
    ['tinted-clear', 'saw-textured', 'cedar-redwood', 2, 3],
    ['tinted-clear', 'smooth', 'pine-fir-spruce', 1, 2],
    ['tinted-clear', 'saw-textured', 'pine-fir-spruce', 2, 3],
    ['semitransparent', 'smooth', 'cedar-redwood', 2, 4],
    ['semitransparent', 'saw-textured', 'cedar-redwood', 4, 8],
    ['semitransparent', 'smooth', 'pine-fir-spruce', 2, 3],
    ['semitransparent', 'saw-textured', 'pine-fir-spruce', 4, 7],
    ['solid-color', 'smooth', 'cedar-redwood', 6, 10],
    ['solid-color', 'saw-textured', 'cedar-redwood', 10, 15],
    ['solid-color', 'smooth', 'pine-fir-spruce', 6, 8],
    ['solid-color', 'saw-textured', 'pine-fir-spruce', 8, 10],
  ] as const)('%s, %s, %s: %d to %d', (finish, texture, wood, lowYears, highYears) => {
    expect(finishLife(finish, texture, wood)).toMatchObject({ lowYears, highYears });
  });

  // Table 16-5, read: for wood in general. Every row of ours lies within it, but for what page 16-20 and Table 16-4 say of smooth wood.
  test.each([
    ['water-repellent', 1, 3],
    ['tinted-clear', 2, 3],
    ['semitransparent', 4, 8],
    ['solid-color', 6, 15],
  ] as const)('%s on saw-textured wood: within %d to %d', (finish, low, high) => {
    for (const wood of ['cedar-redwood', 'pine-fir-spruce'] as const) {
      const { lowYears, highYears } = finishLife(finish, 'saw-textured', wood);
      expect([lowYears >= low, highYears <= high]).toEqual([true, true]);
    }
  });

  test('semitransparent on new smooth wood: 2 to 4 (p. 16-20, read)', () => {
    expect(finishLife('semitransparent', 'smooth', 'cedar-redwood')).toMatchObject({ lowYears: 2, highYears: 4 });
  });
});

describe('how far oil semitransparent stain goes, p. 16-20', () => {
  test('200–400 ft² a gallon on smooth wood, 100–200 on saw-textured or weathered wood', () => {
    expect(coverageFt2PerGal).toEqual({ smooth: { low: 200, high: 400 }, 'saw-textured': { low: 100, high: 200 } });
  });

  // 234 ft² of wall × 1.06; in two digits.
  const stained = (texture: 'smooth' | 'saw-textured') => stainNeeded({ areaM2: 234 * 0.09290304, profileFactor: 1.06, texture, coats: 2, wasteShare: 0, sizes: exampleContainers });

  test('two coats on 234 ft² of saw-textured siding: 2.48–4.96 gal', () => {
    expect(stained('saw-textured')).toMatchObject({ lowGal: expect.closeTo(2.48, 2), highGal: expect.closeTo(4.96, 2) });
    expect(stained('saw-textured').buyGal).toBe(stained('saw-textured').highGal);
  });

  test('smooth wood takes half of that', () => expect(stained('smooth').highGal).toBeCloseTo(2.48, 2));
});

describe('coldest month for a coat, p. 16-23', () => {
  test('50 °F for waterborne finishes, 40 °F for oil', () => {
    expect(lowestTemperature.waterborne.celsius).toBeCloseTo(fahrenheit(50), 9);
    expect(lowestTemperature.oil.celsius).toBeCloseTo(fahrenheit(40), 9);
  });
});

describe('limits of the day, p. 16-23', () => {
  test.each([
    ['waterborne', 50, 'go'], ['waterborne', 49.9, 'wait'], ['waterborne', 40.9, 'no'],
    ['oil', 40, 'go'], ['oil', 39.9, 'wait'], ['oil', 30, 'no'],
  ] as const)('%s at %d °F: %s', (base, degrees, verdict) => {
    expect(dayWith({ base, temperatureC: fahrenheit(degrees), humidityPercent: 40 }).verdict).toBe(verdict);
  });

  test('a waterborne finish needs 50 °F all night', () => {
    expect(dayWith({ lowC: fahrenheit(50) }).verdict).toBe('go');
    expect(dayWith({ lowC: fahrenheit(49.9) }).verdict).toBe('no');
  });

  test('without a forecast the dew point stands for the night', () => {
    // Air of 20 °C condenses at 10.0 °C from 52.5 % on: 1.2282 of 2.3393 kPa (IAPWS steam tables).
    expect(dayWith({ lowC: undefined, humidityPercent: 51 }).verdict).toBe('no');
    expect(dayWith({ lowC: undefined, humidityPercent: 54 }).verdict).toBe('go');
  });

  test('oil stays off walls that the sun heats or soon will; waterborne off walls in the sun', () => {
    expect(['shade', 'sun soon', 'sun'].map((wallSun) => dayWith({ base: 'oil', wallSun: wallSun as 'sun' }).verdict)).toEqual(['go', 'wait', 'wait']);
    expect(['shade', 'sun soon', 'sun'].map((wallSun) => dayWith({ wallSun: wallSun as 'sun' }).verdict)).toEqual(['go', 'go', 'wait']);
  });
});

test('wood is finished below 20 % moisture (ch. 13 and 16, from memory)', () => {
  expect([19.9, 20].map((woodMoisturePercent) => dayWith({ woodMoisturePercent }).verdict)).toEqual(['go', 'no']);
});

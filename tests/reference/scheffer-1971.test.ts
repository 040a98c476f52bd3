import { describe, expect, test } from 'vitest';
import { decayHazard, schefferIndex, stationById } from '@/lib/climate';

describe('Scheffer (1971) on NOAA normals 2006–2020, indices computed by a separate program to two digits', () => {
  const cases: [station: string, index: number, hazard: string, tempF: number[], wetDays: number[]][] = [
    ['USW00024153', 26.35, 'low', [25.3, 28.4, 37.1, 44.0, 53.3, 60.6, 69.5, 67.3, 58.0, 44.0, 32.8, 24.2], [12.0, 13.0, 11.7, 11.2, 11.7, 12.1, 4.4, 5.9, 6.9, 11.3, 11.4, 12.9]],
    ['USW00003017', 30.06, 'low', [31.8, 31.7, 42.2, 48.0, 56.8, 69.5, 75.5, 73.5, 65.5, 51.0, 40.8, 30.1], [4.3, 5.6, 5.9, 8.1, 11.4, 6.9, 8.7, 6.8, 5.3, 5.7, 4.1, 5.1]],
    ['USW00014913', 41.41, 'moderate', [12.1, 13.6, 27.9, 39.7, 52.2, 61.6, 68.4, 66.1, 57.9, 44.4, 30.6, 16.8], [9.5, 9.0, 9.3, 11.0, 12.5, 12.1, 10.9, 11.4, 11.2, 12.2, 10.9, 11.3]],
    ['USW00003812', 77.44, 'high', [38.4, 42.0, 49.2, 57.5, 65.3, 72.8, 75.2, 74.4, 69.1, 58.3, 47.6, 42.5], [10.2, 10.0, 11.5, 10.9, 11.9, 12.7, 14.5, 13.1, 9.1, 8.3, 8.2, 10.7]],
  ];

  test.each(cases)('%s: %d, %s', (id, index, hazard, tempF, wetDays) => {
    expect(schefferIndex(tempF, wetDays)).toBeCloseTo(index, 2);
    expect(decayHazard(schefferIndex(tempF, wetDays))).toBe(hazard);
    const station = stationById(id);
    expect(station?.meanF).toEqual(tempF);
    expect(station?.wetDays).toEqual(wetDays);
  });

  test('eleven months are refused', () => expect(() => schefferIndex(new Array<number>(11).fill(50), new Array<number>(12).fill(10))).toThrow(RangeError));
});

import { describe, expect, test } from 'vitest';
import { climateZone, decayHazard, nearestStation, schefferIndex, stationById, stations, zoneGround } from '@/lib/climate';
import { countiesByZone } from '@/lib/climate/data/zones';

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

describe('the table of stations', () => {
  test('795 stations with twelve plausible values each', () => {
    expect(stations.length).toBe(795);
    for (const station of stations) {
      for (const list of [station.meanF, station.maxF, station.minF, station.wetDays, station.ghiKwhM2Day, station.humidityPct]) {
        expect(list.length).toBe(12);
        expect(list.every(Number.isFinite)).toBe(true);
      }
      station.meanF.forEach((mean, month) => {
        expect(station.minF[month]).toBeLessThanOrEqual(mean);
        expect(station.maxF[month]).toBeGreaterThanOrEqual(mean);
      });
    }
  });

  test('a station is its own nearest', () => {
    for (const station of stations.filter((_, index) => index % 40 === 0)) {
      expect(nearestStation(station).station.id).toBe(station.id);
    }
  });
});

describe('IECC climate zones, US DOE / PNNL county list', () => {
  test('3,108 counties of 48 states, each once', () => {
    const all = Object.values(countiesByZone).flatMap((counties) => counties.split(' '));
    expect(all.length).toBe(3108);
    expect(new Set(all).size).toBe(3108);
  });

  // Single counties read in the published list.
  test.each([
    ['30031', '6B'], ['30063', '6B'], ['37021', '4A'], ['27137', '7A'], ['12086', '1A'], ['53033', '4C'], ['48141', '3B'], ['06075', '3C'], ['04013', '2B'], ['01001', '3A'],
  ])('county %s: %s', (fips, zone) => {
    expect(climateZone(fips)).toBe(zone);
    expect(zoneGround(fips)).toBe('published');
  });

  test.each([['09110', '5A'], ['09190', '5A'], ['46102', climateZone('46113')], ['15001', '1A'], ['11001', '4A'], ['02020', '7'], ['02090', '8'], ['02185', '8'], ['02050', '8'], ['02068', '7'], ['72127', undefined], ['', undefined]])(
    'outside the list: %s is %s',
    (fips, zone) => expect(climateZone(fips)).toBe(zone),
  );
});

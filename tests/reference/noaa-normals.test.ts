import { describe, expect, test } from 'vitest';
import { nearestStation, stations } from '@/lib/climate';

describe('NOAA NCEI US climate normals 2006–2020, the table of stations', () => {
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

import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { climateAt, coatingSeason, nearestStation, stations } from '@/lib/climate';

const at = (latitude: number, longitude: number) => climateAt(nearestStation({ latitude, longitude }).station);

describe('coating season', () => {
  test('each month obeys its own limits: no good month with nights under the limit', () => {
    fc.assert(
      fc.property(fc.constantFrom(...stations), fc.constantFrom('oil' as const, 'waterborne' as const), (station, base) => {
        const { months, seasons } = coatingSeason(climateAt(station), base);
        const limit = base === 'oil' ? 40 : 50; // °F, Wood Handbook p. 16-23
        for (const month of months) {
          if (month.rating === 'good') expect(station.minF[month.month - 1]).toBeGreaterThanOrEqual(limit - 1e-9);
          expect(month.threeDryDays).toBeGreaterThanOrEqual(0);
          expect(month.threeDryDays).toBeLessThanOrEqual(1);
        }
        expect(seasons.length).toBeGreaterThan(0);
      }),
    );
  });

  test('what oil may not do, waterborne may not either (its limit is higher)', () => {
    fc.assert(
      fc.property(fc.constantFrom(...stations), (station) => {
        const oil = coatingSeason(climateAt(station), 'oil').months;
        coatingSeason(climateAt(station), 'waterborne').months.forEach((month, index) => {
          if (month.rating === 'good') expect(oil[index]?.rating).toBe('good');
        });
      }),
    );
  });

  // Judged against common practice (no source): summer in the north, no deep winter, dry winters in Florida.
  test('Duluth paints in summer, Miami in the dry half of the year, across New Year', () => {
    expect(coatingSeason(at(46.79, -92.1), 'oil').seasons).toEqual([{ fromMonth: 5, toMonth: 9 }]);
    expect(coatingSeason(at(25.76, -80.19), 'oil').seasons).toEqual([{ fromMonth: 10, toMonth: 5 }]);
  });

  test('Phoenix with oil has no closed month', () => {
    expect(coatingSeason(at(33.45, -112.07), 'oil').seasons).toEqual([{ fromMonth: 1, toMonth: 12 }]);
  });

  test('where no month is good, two months are offered with a warning', () => {
    const hilo = coatingSeason(at(19.72, -155.06), 'oil');
    expect(hilo.months.some((month) => month.rating === 'good')).toBe(false);
    expect(hilo.warning).toContain('No month here');
    expect(hilo.seasons.length).toBeGreaterThan(0);
  });

  test('a home 1,000 m above its station is 6.5 °C cooler (ICAO standard atmosphere)', () => {
    const { station } = nearestStation({ latitude: 39.74, longitude: -104.99 });
    const up = climateAt(station, station.elevationM + 1000);
    expect(climateAt(station).meanC[0]! - up.meanC[0]!).toBeCloseTo(6.5, 9);
    expect(up.scheffer).toBeLessThan(climateAt(station).scheffer);
  });
});

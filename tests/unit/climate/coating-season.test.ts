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

  test('where no month is good, two months are offered with a warning', () => {
    const hilo = coatingSeason(at(19.72, -155.06), 'oil');
    expect(hilo.months.some((month) => month.rating === 'good')).toBe(false);
    expect(hilo.warning).toContain('No month here');
    expect(hilo.seasons.length).toBeGreaterThan(0);
  });

  // Reasons speak of what decides: the night's limit (Wood Handbook p. 16-23), rain, and heat (no coat on a hot surface, same page).
  test('each reason gives its figures, and says what stands against the month', () => {
    const month = (latitude: number, longitude: number, number: number) => coatingSeason(at(latitude, longitude), 'waterborne').months[number - 1];
    expect(month(46.87, -113.99, 1)?.reason).toMatch(/^January: nights fall to 18 °F \(-8 °C\), under the 50 °F \(10 °C\) that the coat needs; 23 % chance/);
    expect(month(25.76, -80.19, 8)?.reason).toMatch(/only \d % chance of three dry days in a row/);
    expect(month(33.45, -112.07, 7)).toMatchObject({ rating: 'good' });
    expect(month(33.45, -112.07, 7)?.reason).toMatch(/days reach 10\d °F \(4\d °C\): start early and keep to the shade\.$/);
    expect(month(33.45, -112.07, 3)?.reason).not.toContain('shade');
  });

  // Common practice (no source): mountains and the far north in high summer only, the mild South from spring to fall, the wet Northwest in its dry summer.
  test.each([
    ['Missoula', 46.87, -113.99, [{ fromMonth: 6, toMonth: 9 }], [{ fromMonth: 7, toMonth: 8 }]],
    ['Asheville', 35.6, -82.55, [{ fromMonth: 4, toMonth: 10 }], [{ fromMonth: 5, toMonth: 9 }]],
    ['Seattle', 47.61, -122.33, [{ fromMonth: 5, toMonth: 9 }], [{ fromMonth: 6, toMonth: 9 }]],
    ['Fairbanks', 64.84, -147.72, [{ fromMonth: 6, toMonth: 8 }], [{ fromMonth: 6, toMonth: 7 }]],
    ['Phoenix', 33.45, -112.07, [{ fromMonth: 1, toMonth: 12 }], [{ fromMonth: 3, toMonth: 11 }]],
  ])('%s', (_name, latitude, longitude, oil, waterborne) => {
    expect(coatingSeason(at(latitude, longitude), 'oil').seasons).toEqual(oil);
    expect(coatingSeason(at(latitude, longitude), 'waterborne').seasons).toEqual(waterborne);
  });

  test('seasons hold exactly the good months', () => {
    fc.assert(
      fc.property(fc.constantFrom(...stations), fc.constantFrom('oil' as const, 'waterborne' as const), (station, base) => {
        const { months, seasons, warning } = coatingSeason(climateAt(station), base);
        fc.pre(warning === undefined);
        const within = (month: number) => seasons.filter(({ fromMonth, toMonth }) => (fromMonth <= toMonth ? month >= fromMonth && month <= toMonth : month >= fromMonth || month <= toMonth)).length;
        for (const { month, rating } of months) expect(within(month)).toBe(rating === 'good' ? 1 : 0);
      }),
    );
  });

  test('a home 1,000 m above its station is 6.5 °C cooler (ICAO standard atmosphere)', () => {
    const { station } = nearestStation({ latitude: 39.74, longitude: -104.99 });
    const up = climateAt(station, station.elevationM + 1000);
    expect(climateAt(station).meanC[0]! - up.meanC[0]!).toBeCloseTo(6.5, 9);
    expect(up.scheffer).toBeLessThan(climateAt(station).scheffer);
  });
});

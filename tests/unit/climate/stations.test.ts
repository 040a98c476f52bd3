import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { climateAt, decayHazard, distanceKm, nearestStation, schefferIndex, stationById, stations, timeZoneAt } from '@/lib/climate';

const place = fc.record({ latitude: fc.double({ min: 24, max: 49, noNaN: true }), longitude: fc.double({ min: -125, max: -67, noNaN: true }) });
const at = (latitude: number, longitude: number) => ({ latitude, longitude });

describe('great-circle distance', () => {
  // Arcs of a sphere of 6,371 km: a quarter and a half of its girth, and one degree of a meridian.
  test.each([[at(0, 0), at(0, 90), (Math.PI / 2) * 6371], [at(90, 0), at(-90, 0), Math.PI * 6371], [at(40, -100), at(41, -100), (Math.PI / 180) * 6371], [at(10, 179.5), at(10, 179.5), 0]])('%o to %o', (a, b, km) => {
    expect(distanceKm(a, b)).toBeCloseTo(km, 6);
  });

  test('the same both ways, across the date line too', () => {
    fc.assert(
      fc.property(place, place, (a, b) => {
        expect(distanceKm(a, b)).toBeCloseTo(distanceKm(b, a), 9);
      }),
    );
    expect(distanceKm(at(0, 179.5), at(0, -179.5))).toBeCloseTo((Math.PI / 180) * 6371, 6);
  });
});

describe('the station that stands for a home', () => {
  test('without a height none is nearer', () => {
    fc.assert(
      fc.property(place, (home) => {
        const found = nearestStation(home);
        for (const station of stations) expect(distanceKm(home, station)).toBeGreaterThanOrEqual(found.distanceKm);
        expect(found.heightDifferenceM).toBe(0);
      }),
      { numRuns: 40 },
    );
  });

  test('with a height none costs less, 100 m counting as 10 km', () => {
    fc.assert(
      fc.property(place, fc.integer({ min: 0, max: 3500 }), (home, elevationM) => {
        const found = nearestStation({ ...home, elevationM });
        const cost = (station: (typeof stations)[number]) => distanceKm(home, station) + Math.abs(station.elevationM - elevationM) / 10;
        for (const station of stations) expect(cost(station)).toBeGreaterThanOrEqual(cost(found.station) - 1e-9);
        expect(found.heightDifferenceM).toBe(found.station.elevationM - elevationM);
      }),
      { numRuns: 40 },
    );
  });

  test('no station of that name is no station', () => expect(stationById('nowhere')).toBeUndefined());
});

describe('climate of a home', () => {
  test('without a height it is the station’s own, in °C', () => {
    const station = stationById('USW00024153');
    if (!station) throw new Error('Missoula is missing');
    const climate = climateAt(station);
    // Missoula, NOAA normals: July mean 69.5 °F.
    expect(climate.meanC[6]).toBeCloseTo((69.5 - 32) / 1.8, 9);
    expect(climate.wetDays).toEqual(station.wetDays);
    expect(climate.scheffer).toBeCloseTo(26.35, 2);
  });

  test('higher is colder by 6.5 °C per km in every month, and never likelier to rot', () => {
    fc.assert(
      fc.property(fc.constantFrom(...stations), fc.integer({ min: 0, max: 2000 }), fc.integer({ min: 1, max: 1500 }), (station, low, more) => {
        const [below, above] = [climateAt(station, low), climateAt(station, low + more)];
        above.minC.forEach((value, month) => expect((below.minC[month] ?? NaN) - value).toBeCloseTo(0.0065 * more, 9));
        expect(above.scheffer).toBeLessThanOrEqual(below.scheffer);
      }),
    );
  });
});

describe('Scheffer index', () => {
  const twelve = (value: fc.Arbitrary<number>) => fc.array(value, { minLength: 12, maxLength: 12 });
  const year = fc.tuple(twelve(fc.double({ min: -20, max: 100, noNaN: true })), twelve(fc.double({ min: 0, max: 31, noNaN: true })));

  test('a warmer or wetter month never lowers it; frost and three wet days add nothing', () => {
    fc.assert(
      fc.property(year, fc.nat(11), fc.double({ min: 0, max: 20, noNaN: true }), ([tempF, wet], month, more) => {
        const index = schefferIndex(tempF, wet);
        const raised = (values: number[]) => values.map((value, i) => (i === month ? value + more : value));
        expect(schefferIndex(raised(tempF), wet)).toBeGreaterThanOrEqual(index);
        expect(schefferIndex(tempF, raised(wet))).toBeGreaterThanOrEqual(index);
        expect(schefferIndex(tempF.map((value) => Math.min(value, 35)), wet)).toBe(0);
        expect(schefferIndex(tempF, wet.map((value) => Math.min(value, 3)))).toBe(0);
      }),
    );
  });

  // Whole Building Design Guide: under 35 low, 35 to 65 moderate, over 65 high.
  test.each([[0, 'low'], [34.99, 'low'], [35, 'moderate'], [65, 'moderate'], [65.01, 'high']] as const)('%d is %s', (index, hazard) => expect(decayHazard(index)).toBe(hazard));

  // The driest US deserts have none, the wettest coast of Hawaii the most: the index is about 0 to 300 (our check of the whole table).
  test('every station lies between 0 and 320, desert low, Hilo highest', () => {
    const all = stations.map((station) => ({ station, index: schefferIndex(station.meanF, station.wetDays) })).sort((a, b) => a.index - b.index);
    expect(all[0]?.index).toBeGreaterThanOrEqual(0);
    expect(all.at(-1)?.index).toBeLessThan(320);
    expect(all.at(-1)?.station.name).toContain('Hilo');
    const desert = all.filter(({ station }) => ['AZ', 'NV'].includes(station.state) && station.elevationM < 1000);
    expect(desert.length).toBeGreaterThan(2);
    for (const { index } of desert) expect(decayHazard(index)).toBe('low');
  });
});

describe('time zone', () => {
  // IANA zones of well-known places: Arizona keeps no daylight time outside the Navajo Nation.
  test.each([[46.87, -113.99, 'America/Denver'], [33.45, -112.07, 'America/Phoenix'], [25.76, -80.19, 'America/New_York'], [64.84, -147.72, 'America/Anchorage'], [21.3, -157.86, 'Pacific/Honolulu'], [41.88, -87.63, 'America/Chicago']])(
    '%d, %d: %s',
    (latitude, longitude, zone) => expect(timeZoneAt(latitude, longitude)).toBe(zone),
  );
});

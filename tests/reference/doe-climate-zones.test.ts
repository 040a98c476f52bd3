import { describe, expect, test } from 'vitest';
import { climateZone, zoneGround } from '@/lib/climate';
import { countiesByZone } from '@/lib/climate/data/zones';

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

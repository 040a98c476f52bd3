import { climateZone, nearestStation, timeZoneAt } from '@/lib/climate';
import { climateZones } from '@/lib/schemas/vocabulary';

/** A postal code as the table holds it. Degrees north and east. */
export type PostalPlace = { code: string; place: string; state: string; county: string; countyFips: string; latitude: number; longitude: number };

/** What somebody typed: the postal code, and where asked, the place on the map and the climate zone. */
export type TypedPlace = {
  postalCode: string;
  latitude?: number | undefined;
  longitude?: number | undefined;
  elevationM?: number | undefined;
  climateZoneOverride?: string | undefined;
};

/** Where a home is, as it is stored. The zone is null where the table of counties has none and the owner chose it. */
export type SiteFacts = {
  place: string;
  state: string;
  county: string;
  countyFips: string;
  latitude: number;
  longitude: number;
  timeZone: string;
  climateZone: string | null;
  stationId: string;
};

export type Site = { found: true; site: SiteFacts; station: { name: string; distanceKm: number } };
/** What has to be answered before the home has a climate. */
export type SiteQuestion = { found: false; ask: 'coordinates' | 'zone'; why: string };

/** A code without a state is a military post office (APO, FPO): its place on the map is only where the mail goes. */
const isMilitary = (found: PostalPlace) => found.state === '';

/** Where to go on the map: what was typed wins over the middle of the postal code. Null when neither says. */
function spotOf(typed: TypedPlace, found: PostalPlace | undefined): { latitude: number; longitude: number } | null {
  if (typed.latitude !== undefined && typed.longitude !== undefined) return { latitude: typed.latitude, longitude: typed.longitude };
  if (!found || isMilitary(found)) return null;
  return { latitude: found.latitude, longitude: found.longitude };
}

function whyCoordinates(code: string, found: PostalPlace | undefined): string {
  if (found) return `${code} is a military post office, not a place. Say where the home stands: degrees north, like 45.68.`;
  return `The postal code ${code} is not in our table. Check its digits, or say where the home stands: degrees north, like 45.68.`;
}

/** Place, time zone, climate zone and station of a home, or the question that is still open. `found` is the postal code's row, if there is one. */
export function resolveSite(typed: TypedPlace, found: PostalPlace | undefined): Site | SiteQuestion {
  const spot = spotOf(typed, found);
  if (!spot) return { found: false, ask: 'coordinates', why: whyCoordinates(typed.postalCode, found) };
  const zone = found?.countyFips ? climateZone(found.countyFips) : undefined;
  if (!zone && !(climateZones as readonly string[]).includes(typed.climateZoneOverride ?? '')) {
    const where = found?.county ? `${found.county}, ${found.state}` : `the postal code ${typed.postalCode}`;
    return { found: false, ask: 'zone', why: `The county table has no climate zone for ${where}. Choose the one on your building permit, or one from the map of your energy code.` };
  }
  const { station, distanceKm } = nearestStation({ ...spot, elevationM: typed.elevationM });
  return {
    found: true,
    site: {
      place: found?.place ?? `Postal code ${typed.postalCode}`,
      state: found?.state ?? '',
      county: found?.county ?? '',
      countyFips: found?.countyFips ?? '',
      ...spot,
      timeZone: timeZoneAt(spot.latitude, spot.longitude),
      climateZone: zone ?? null,
      stationId: station.id,
    },
    station: { name: `${station.name}, ${station.state}`, distanceKm },
  };
}

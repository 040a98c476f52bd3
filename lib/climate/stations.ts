import table from './data/stations.json';

/**
 * Climate stations. Sources: NOAA NCEI U.S. Climate Normals 2006–2020 (temperature, wet days, rain); NREL TMY3 (radiation, humidity),
 * credit NREL / US DOE, from the radiation station named in `radiationFrom`. Monthly lists start with January.
 */
export type Station = {
  id: string;
  name: string;
  state: string;
  latitude: number;
  longitude: number;
  elevationM: number;
  meanF: number[];
  maxF: number[];
  minF: number[];
  /** Days with at least 0.01 in of precipitation. */
  wetDays: number[];
  rainIn: number[];
  /** Mean daily global horizontal radiation, kWh/m². */
  ghiKwhM2Day: number[];
  humidityPct: number[];
  radiationFrom: string;
  radiationDistanceKm: number;
};

type Row = [string, string, string, number, number, number, number[], number[], number[], number[], number[], number[], number[], string, number];

const toStation = ([id, name, state, latitude, longitude, elevationM, meanF, maxF, minF, wetDays, rainIn, ghiKwhM2Day, humidityPct, radiationFrom, radiationDistanceKm]: Row): Station => ({
  id, name, state, latitude, longitude, elevationM, meanF, maxF, minF, wetDays, rainIn, ghiKwhM2Day, humidityPct, radiationFrom, radiationDistanceKm,
});

export const stations: Station[] = (table.rows as unknown as Row[]).map(toStation);

const byId = new Map(stations.map((station) => [station.id, station]));

export const stationById = (id: string): Station | undefined => byId.get(id);

const earthRadiusKm = 6371;
const radians = Math.PI / 180;

/** Great-circle distance, km (haversine on a sphere of 6,371 km). */
export function distanceKm(a: { latitude: number; longitude: number }, b: { latitude: number; longitude: number }): number {
  const lat = ((b.latitude - a.latitude) * radians) / 2;
  const lon = ((b.longitude - a.longitude) * radians) / 2;
  const chord = Math.sin(lat) ** 2 + Math.cos(a.latitude * radians) * Math.cos(b.latitude * radians) * Math.sin(lon) ** 2;
  return 2 * earthRadiusKm * Math.asin(Math.min(1, Math.sqrt(chord)));
}

/** A hundred metres of height count as ten kilometres of distance. Our rule: 100 m is 0.65 °C of mean temperature, about what 70–100 km of latitude make; rain and fog change with height faster than with distance. */
const kmPerMetreOfHeight = 0.1;

/**
 * The station whose climate stands for a place: least distance plus the penalty for height difference when the height is known.
 * @returns the station, its distance in km and its height above the place in m (0 when the place's height is not known)
 */
export function nearestStation(place: { latitude: number; longitude: number; elevationM?: number | null | undefined }): { station: Station; distanceKm: number; heightDifferenceM: number } {
  const heightOver = (station: Station) => (place.elevationM === undefined || place.elevationM === null ? 0 : station.elevationM - place.elevationM);
  let best: { station: Station; cost: number; distanceKm: number } | undefined;
  for (const station of stations) {
    const distance = distanceKm(place, station);
    const cost = distance + Math.abs(heightOver(station)) * kmPerMetreOfHeight;
    if (!best || cost < best.cost) best = { station, cost, distanceKm: distance };
  }
  if (!best) throw new Error('the table of stations is empty');
  return { station: best.station, distanceKm: best.distanceKm, heightDifferenceM: heightOver(best.station) };
}

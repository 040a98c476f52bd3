import { groundAlbedo } from '@/lib/climate';
import { coverOfStored, type StoredCover } from '@/lib/home/cover';
import { shadeHorizon } from '@/lib/home/shade';
import { type Shade } from '@/lib/schemas/vocabulary';
import { directSunHoursOn, leafOnMonths, type Place, sunDose, type SunPath, sunPath, type WallFace } from '@/lib/sun';

export type ExposedWall = { azimuthDeg: number; heightM: number; eaveDepthM: number; eaveDropM: number; shade: Shade; shadeHeightDeg: number } & StoredCover;

export type Exposure = { sunHours: number; sunHoursMonthly: number[]; doseKwhM2: number; doseMonthly: number[] };

/** What the sun does at a home's place in a mean year, shared by its walls. */
export type SunSite = { place: Place; ghiKwhM2Day: number[]; leafOnMonths: boolean[]; albedo: number[] };

/** Sun hours are counted in this year; another differs by less than two hours. Our rule. */
const countedYear = 2026;

export const sunSite = (place: Place, climate: { meanC: number[]; ghiKwhM2Day: number[] }): SunSite => ({
  place,
  ghiKwhM2Day: climate.ghiKwhM2Day,
  leafOnMonths: leafOnMonths(place.latitude, climate.meanC),
  albedo: groundAlbedo(climate.meanC),
});

/** The year's sun positions at a home; about a hundred milliseconds, so made once for all of its walls. */
export const pathOf = (site: SunSite): SunPath => sunPath(site.place, countedYear);

const rounded = (values: number[]) => values.map((value) => Number(value.toFixed(2)));

/** A stored wall as the sun sees it. */
export const faceOf = (wall: ExposedWall): WallFace => ({
  azimuthDeg: wall.azimuthDeg,
  heightM: wall.heightM,
  eaveDepthM: wall.eaveDepthM,
  eaveDropM: wall.eaveDropM,
  cover: coverOfStored(wall),
  horizon: shadeHorizon(wall),
});

/** Sun dose of a wall in a mean year and in its months, kWh/m². */
const sunDoseOf = (wall: ExposedWall, { place, ghiKwhM2Day, ...options }: SunSite) => sunDose(place, faceOf(wall), ghiKwhM2Day, options);

/** To hundredths, as it is stored. */
const roundedYear = (annual: number) => Number(annual.toFixed(2));

/** Sun dose of a wall in a mean year, kWh/m², without the year's path: as `exposureOf` has it. */
export const doseOf = (wall: ExposedWall, site: SunSite): number => roundedYear(sunDoseOf(wall, site).annual);

/** Direct sun hours and sun dose (kWh/m²) of a wall in a mean year, rounded to hundredths. */
export function exposureOf(wall: ExposedWall, site: SunSite, path: SunPath): Exposure {
  const hours = directSunHoursOn(path, faceOf(wall), site.leafOnMonths);
  const dose = sunDoseOf(wall, site);
  return {
    sunHours: roundedYear(hours.annual),
    sunHoursMonthly: rounded(hours.monthly),
    doseKwhM2: roundedYear(dose.annual),
    doseMonthly: rounded(dose.monthly),
  };
}

/** Everything that a wall's exposure depends on, as text: equal text, equal exposure. Raise the edition when the method changes. */
export const exposureInputs = (wall: ExposedWall, site: SunSite, stationId: string): string =>
  JSON.stringify({
    edition: 3,
    at: [site.place.latitude, site.place.longitude],
    stationId,
    leaves: site.leafOnMonths.map(Number).join(''),
    albedo: site.albedo,
    wall: [wall.azimuthDeg, wall.heightM, wall.eaveDepthM, wall.eaveDropM, wall.shade, wall.shadeHeightDeg],
    cover: coverOfStored(wall) ?? null,
  });

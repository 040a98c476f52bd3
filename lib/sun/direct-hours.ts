import { leafOnMonths } from './leaf-months';
import { type Place, sunPosition } from './position';
import { litShareOf, stripsOf } from './strips';
import { directShare, type WallFace } from './wall-face';

export type SunHours = { annual: number; monthly: number[] };

/** Every daylight sample of one year at one place; the walls of a home share it. Angles in degrees; the rest saves trigonometry. */
export type SunPath = {
  latitude: number;
  hoursPerSample: number;
  month: Uint8Array;
  azimuthDeg: Float64Array;
  elevationDeg: Float64Array;
  cosAzimuth: Float64Array;
  sinAzimuth: Float64Array;
  tanElevation: Float64Array;
};

const stepMinutes = 5;
const stepMs = stepMinutes * 60_000;
const radians = Math.PI / 180;

/** Sun positions above the horizon at the middle of every 5 minutes of a year, months by the place's mean solar time zone. */
export function sunPath(place: Place, year: number): SunPath {
  const offsetMs = Math.round(place.longitude / 15) * 3_600_000;
  const endOfMonth = Array.from({ length: 12 }, (_, month) => Date.UTC(year, month + 1, 1) - offsetMs);
  const start = Date.UTC(year, 0, 1) - offsetMs;
  const samples = Math.round(((endOfMonth[11] ?? start) - start) / stepMs);
  const month = new Uint8Array(samples);
  const [azimuthDeg, elevationDeg, cosAzimuth, sinAzimuth, tanElevation] = Array.from({ length: 5 }, () => new Float64Array(samples)) as [Float64Array, Float64Array, Float64Array, Float64Array, Float64Array];
  const at = new Date(0);
  let lit = 0;
  let thisMonth = 0;
  for (let k = 0; k < samples; k += 1) {
    const time = start + (k + 0.5) * stepMs;
    if (time >= (endOfMonth[thisMonth] ?? Infinity)) thisMonth += 1;
    at.setTime(time);
    const sun = sunPosition(at, place);
    if (sun.elevationDeg <= 0) continue;
    month[lit] = thisMonth;
    azimuthDeg[lit] = sun.azimuthDeg;
    elevationDeg[lit] = sun.elevationDeg;
    cosAzimuth[lit] = Math.cos(sun.azimuthDeg * radians);
    sinAzimuth[lit] = Math.sin(sun.azimuthDeg * radians);
    tanElevation[lit] = Math.tan(sun.elevationDeg * radians);
    lit += 1;
  }
  const cut = (values: Float64Array) => values.subarray(0, lit);
  return { latitude: place.latitude, hoursPerSample: stepMinutes / 60, month: month.subarray(0, lit), azimuthDeg: cut(azimuthDeg), elevationDeg: cut(elevationDeg), cosAzimuth: cut(cosAzimuth), sinAzimuth: cut(sinAzimuth), tanElevation: cut(tanElevation) };
}

/**
 * Hours in a year with the sun above a flat horizon and in front of the wall, weighted by the sunlit share under an eave and a
 * cover and by what passes the horizon's obstructions. cos(incidence) = cos(elevation)·cos(azimuth difference) > 0.
 * @param leafOn the twelve months in which trees carry leaves; by latitude unless said
 */
export function directSunHoursOn(path: SunPath, wall: WallFace, leafOn: readonly boolean[] = leafOnMonths(path.latitude)): SunHours {
  const monthly = new Float64Array(12);
  const litShare = litShareOf(stripsOf(wall));
  const cosWall = Math.cos(wall.azimuthDeg * radians);
  const sinWall = Math.sin(wall.azimuthDeg * radians);
  const obstructed = (wall.horizon?.length ?? 0) > 0;
  for (let k = 0; k < path.month.length; k += 1) {
    const inFront = (path.cosAzimuth[k] as number) * cosWall + (path.sinAzimuth[k] as number) * sinWall;
    if (inFront <= 0) continue;
    const month = path.month[k] as number;
    const lit = litShare((path.tanElevation[k] as number) / inFront);
    const passed = obstructed ? directShare(wall.horizon, leafOn[month] ?? true, path.azimuthDeg[k] as number, path.elevationDeg[k] as number) : 1;
    monthly[month] = (monthly[month] as number) + lit * passed * path.hoursPerSample;
  }
  return { annual: monthly.reduce((sum, hours) => sum + hours, 0), monthly: [...monthly] };
}

/** As `directSunHoursOn`, for one wall at a place. Hours; with an eave or a cover weighted by the sunlit share. */
export const directSunHours = (place: Place, wall: WallFace, year: number): SunHours => directSunHoursOn(sunPath(place, year), wall);

import { type Place, sunPosition } from './position';
import { directShare, eaveOf, sunlitShare, type WallFace } from './wall-face';

export type SunHours = { annual: number; monthly: number[] };

/** Every daylight sample of one year at one place; walls of a home share it. */
export type SunPath = { hoursPerSample: number; month: Uint8Array; azimuthDeg: Float64Array; elevationDeg: Float64Array; latitude: number };

const stepMinutes = 5;

/** Sun positions above the horizon at the middle of every 5 minutes of a year, months by the place's mean solar time zone. */
export function sunPath(place: Place, year: number): SunPath {
  const offsetMs = Math.round(place.longitude / 15) * 3_600_000;
  const start = Date.UTC(year, 0, 1) - offsetMs;
  const samples = Math.round((Date.UTC(year + 1, 0, 1) - Date.UTC(year, 0, 1)) / (stepMinutes * 60_000));
  const month: number[] = [];
  const azimuths: number[] = [];
  const elevations: number[] = [];
  const at = new Date(0);
  for (let k = 0; k < samples; k += 1) {
    at.setTime(start + (k + 0.5) * stepMinutes * 60_000);
    const { azimuthDeg, elevationDeg } = sunPosition(at, place);
    if (elevationDeg <= 0) continue;
    month.push(new Date(at.getTime() + offsetMs).getUTCMonth());
    azimuths.push(azimuthDeg);
    elevations.push(elevationDeg);
  }
  return { hoursPerSample: stepMinutes / 60, month: Uint8Array.from(month), azimuthDeg: Float64Array.from(azimuths), elevationDeg: Float64Array.from(elevations), latitude: place.latitude };
}

const radians = Math.PI / 180;

/**
 * Hours in a year with the sun above a flat horizon and in front of the wall, weighted by the sunlit share under an eave
 * and by what passes the horizon's obstructions. cos(incidence) = cos(elevation)·cos(azimuth difference) > 0.
 */
export function directSunHoursOn(path: SunPath, wall: WallFace, leafOnMonths: boolean[] = []): SunHours {
  const monthly = new Array<number>(12).fill(0);
  const eave = eaveOf(wall);
  for (let k = 0; k < path.month.length; k += 1) {
    const elevation = path.elevationDeg[k] as number;
    const azimuth = path.azimuthDeg[k] as number;
    const inFront = Math.cos((azimuth - wall.azimuthDeg) * radians);
    if (inFront <= 0) continue;
    const month = path.month[k] as number;
    const lit = sunlitShare(eave, Math.tan(elevation * radians) / inFront);
    const passed = wall.horizon?.length ? directShare(wall.horizon, leafOnMonths[month] ?? true, azimuth, elevation) : 1;
    monthly[month] = (monthly[month] ?? 0) + lit * passed * path.hoursPerSample;
  }
  return { annual: monthly.reduce((sum, hours) => sum + hours, 0), monthly };
}

/** As `directSunHoursOn`, for one wall at a place. Hours; with an eave weighted by the sunlit share. */
export const directSunHours = (place: Place, wall: WallFace, year: number): SunHours => directSunHoursOn(sunPath(place, year), wall);

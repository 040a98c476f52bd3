import { leafOnMonths } from './leaf-months';
import { type Place } from './position';
import { skyOverHorizon } from './sky-view';
import { litShareOf, skyShareOf, stripsOf } from './strips';
import { directShare, type WallFace } from './wall-face';

export type Dose = { annual: number; monthly: number[] };
export type DoseOptions = {
  /** Of the ground, 0–1: one value or twelve. Default 0.2; snow about 0.6. */
  albedo?: number | number[] | undefined;
  /** In which months trees carry leaves; by latitude unless said. Counts only with a horizon of trees. */
  leafOnMonths?: boolean[] | undefined;
};

/** Mean day of each month as day of the year. Klein (1977), Solar Energy 19:325, table 1: 17 Jan, 16 Feb, 16 Mar, 15 Apr, 15 May, 11 Jun, 17 Jul, 16 Aug, 15 Sep, 15 Oct, 14 Nov, 10 Dec. */
const meanDay = [17, 47, 75, 105, 135, 162, 198, 228, 258, 288, 318, 344] as const;
const daysInMonth = [31, 28.25, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31] as const;
const solarConstant = 1.367; // kW/m², World Radiation Center
const radians = Math.PI / 180;
const clamp = (value: number, low: number, high: number) => Math.min(high, Math.max(low, value));

/** Sun's declination on a day of the year, radians: Cooper (1969), as in Duffie & Beckman eq. 1.6.1a. */
const declination = (dayOfYear: number) => 23.45 * radians * Math.sin((2 * Math.PI * (284 + dayOfYear)) / 365);

/** Sunset hour angle, radians: 0 in polar night, π in polar day. */
const sunsetAngle = (latitude: number, dec: number) => Math.acos(clamp(-Math.tan(latitude) * Math.tan(dec), -1, 1));

/** Daily extraterrestrial radiation on the horizontal, kWh/m²: Duffie & Beckman eq. 1.10.3. */
function extraterrestrial(latitude: number, dec: number, ws: number, dayOfYear: number): number {
  const distance = 1 + 0.033 * Math.cos((2 * Math.PI * dayOfYear) / 365);
  return ((24 / Math.PI) * solarConstant * distance) * (Math.cos(latitude) * Math.cos(dec) * Math.sin(ws) + ws * Math.sin(latitude) * Math.sin(dec));
}

/** Monthly diffuse share from clearness Kt: Erbs, Klein & Duffie (1982), Solar Energy 28:293; by sunset hour angle below or above 81.4°. */
export function diffuseShare(kt: number, ws: number): number {
  const k = clamp(kt, 0.3, 0.8);
  return ws <= 81.4 * radians ? 1.391 - 3.56 * k + 4.189 * k ** 2 - 2.137 * k ** 3 : 1.311 - 3.022 * k + 3.427 * k ** 2 - 1.821 * k ** 3;
}

const steps = 96;

/** Shares of the day's total (Collares-Pereira & Rabl 1979) and diffuse (Liu & Jordan 1960) at equal steps of hour angle, each summing to 1. */
function dayShape(ws: number): { hourAngle: number; total: number; diffuse: number }[] {
  const a = 0.409 + 0.5016 * Math.sin(ws - 60 * radians);
  const b = 0.6609 - 0.4767 * Math.sin(ws - 60 * radians);
  const points = Array.from({ length: steps }, (_, k) => {
    const hourAngle = -ws + ((k + 0.5) * 2 * ws) / steps;
    const diffuse = Math.max(0, Math.cos(hourAngle) - Math.cos(ws));
    return { hourAngle, diffuse, total: Math.max(0, (a + b * Math.cos(hourAngle)) * diffuse) };
  });
  const sum = (pick: (point: (typeof points)[number]) => number) => points.reduce((all, point) => all + pick(point), 0) || 1;
  const totals = sum((point) => point.total);
  const diffuses = sum((point) => point.diffuse);
  return points.map((point) => ({ hourAngle: point.hourAngle, total: point.total / totals, diffuse: point.diffuse / diffuses }));
}

type Day = { latitude: number; dec: number; ws: number; h0: number; horizontal: number };

/** kWh/m² on the wall on a month's mean day. */
function onMeanDay(day: Day, wall: WallFace, albedo: number, leafOn: boolean): number {
  const { latitude, dec, horizontal } = day;
  const diffuseDay = horizontal * diffuseShare(horizontal / day.h0, day.ws);
  const anisotropy = clamp((horizontal - diffuseDay) / day.h0, 0, 1);
  const strips = stripsOf(wall);
  const litShare = litShareOf(strips);
  const sky = 0.5 * skyShareOf(strips) * skyOverHorizon(wall, leafOn);
  let onWall = 0.5 * albedo * horizontal;
  for (const { hourAngle, total, diffuse } of dayShape(day.ws)) {
    const up = Math.sin(latitude) * Math.sin(dec) + Math.cos(latitude) * Math.cos(dec) * Math.cos(hourAngle);
    const north = Math.cos(latitude) * Math.sin(dec) - Math.sin(latitude) * Math.cos(dec) * Math.cos(hourAngle);
    const east = -Math.cos(dec) * Math.sin(hourAngle);
    const incidence = north * Math.cos(wall.azimuthDeg * radians) + east * Math.sin(wall.azimuthDeg * radians);
    const diffuseNow = diffuseDay * diffuse;
    const beam = Math.max(0, horizontal * total - diffuseNow);
    const rb = Math.max(0, incidence) / Math.max(up, 0.05);
    const lit = incidence > 0 ? litShare(Math.max(0, up) / incidence) * directShare(wall.horizon, leafOn, Math.atan2(east, north) / radians, Math.asin(clamp(up, -1, 1)) / radians) : 0;
    onWall += lit * (beam * rb + diffuseNow * anisotropy * Math.min(rb, 5)) + diffuseNow * (1 - anisotropy) * sky;
  }
  return onWall;
}

/**
 * Solar energy that a vertical wall receives in a mean year, kWh/m².
 * Method: monthly mean days, Erbs diffuse share, Collares-Pereira–Rabl and Liu–Jordan hourly shapes, Hay & Davies (1980) sky, overhang on beam and sky.
 * @param ghiKwhM2Day twelve monthly means of daily global horizontal radiation, kWh/m²·day, January first
 * @throws RangeError unless twelve finite values ≥ 0 are given
 */
export function sunDose(place: Place, wall: WallFace, ghiKwhM2Day: number[], options: DoseOptions = {}): Dose {
  if (ghiKwhM2Day.length !== 12 || ghiKwhM2Day.some((value) => !(value >= 0))) throw new RangeError('twelve monthly values of radiation are needed');
  const latitude = place.latitude * radians;
  const leafOn = options.leafOnMonths ?? leafOnMonths(place.latitude);
  const monthly = ghiKwhM2Day.map((horizontal, month) => {
    const dayOfYear = meanDay[month] ?? 1;
    const dec = declination(dayOfYear);
    const ws = sunsetAngle(latitude, dec);
    const h0 = extraterrestrial(latitude, dec, ws, dayOfYear);
    if (h0 < 0.01 || horizontal === 0) return 0;
    const albedo = Array.isArray(options.albedo) ? (options.albedo[month] ?? 0.2) : (options.albedo ?? 0.2);
    return (daysInMonth[month] ?? 30) * onMeanDay({ latitude, dec, ws, h0, horizontal }, wall, albedo, leafOn[month] ?? true);
  });
  return { annual: monthly.reduce((sum, value) => sum + value, 0), monthly };
}

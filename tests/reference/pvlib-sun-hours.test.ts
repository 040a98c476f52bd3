import { describe, expect, test } from 'vitest';
import { directSunHours, directSunHoursOn, type SunPath, sunPath } from '@/lib/sun';
import { readCsv } from '../fixtures/csv';

/**
 * Against pvlib (NREL SPA), samples every minute of 2027 on a flat horizon. Tolerance ±2 h a year: steps of five minutes differ
 * from one minute by up to 1.5 h a year, another ephemeris by 1.2 h (both stated with the reference). By month ±1 h.
 */
const perYear = 2;
const perMonth = 1;
const paths = new Map<string, SunPath>();
const wallRows = (name: string) => readCsv(name).filter((row) => /^\d+$/.test(row.wall_azimuth_deg ?? ''));

function pathAt(row: Record<string, string>): SunPath {
  const known = paths.get(row.place ?? '');
  if (known) return known;
  const path = sunPath({ latitude: Number(row.lat), longitude: Number(row.lon) }, 2027);
  paths.set(row.place ?? '', path);
  return path;
}

describe('hours in a year', () => {
  const rows = wallRows('sunhours_annual.csv');
  test('the table is there', () => expect(rows.length).toBe(24));

  test.each(rows)('$place, wall $wall_azimuth_deg°', (row) => {
    const wall = { azimuthDeg: Number(row.wall_azimuth_deg) };
    const eave = { ...wall, heightM: 2.4384, eaveDepthM: 0.6096, eaveDropM: 0 };
    expect(Math.abs(directSunHoursOn(pathAt(row), wall).annual - Number(row.sun_hours))).toBeLessThan(perYear);
    expect(Math.abs(directSunHoursOn(pathAt(row), eave).annual - Number(row.eave_area_weighted_sun_hours))).toBeLessThan(perYear);
  });

  test('one wall at a place gives the same as the shared path', () => {
    const [row] = rows;
    if (!row) throw new Error('no row');
    const place = { latitude: Number(row.lat), longitude: Number(row.lon) };
    expect(directSunHours(place, { azimuthDeg: 90 }, 2027)).toEqual(directSunHoursOn(pathAt(row), { azimuthDeg: 90 }));
  });
});

describe('hours by month', () => {
  const rows = wallRows('sunhours_monthly.csv');
  test('the table is there', () => expect(rows.length).toBe(288));

  test.each(rows)('$place, wall $wall_azimuth_deg°, month $month', (row) => {
    const month = Number(row.month) - 1;
    const { monthly } = directSunHoursOn(pathAt(row), { azimuthDeg: Number(row.wall_azimuth_deg) });
    expect(Math.abs((monthly[month] ?? NaN) - Number(row.sun_hours))).toBeLessThan(perMonth);
  });
});

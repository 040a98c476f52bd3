import { getPosition } from 'suncalc';
import { bench, describe } from 'vitest';
import { exposureOf, pathOf, sunSite } from '@/lib/home/exposure';
import { climateAt, nearestStation } from '@/lib/climate';

/** One home of four walls, a whole year in steps of five minutes, against the same number of bare suncalc calls. */
const place = { latitude: 45.68, longitude: -111.04 };
const site = sunSite(place, climateAt(nearestStation(place).station));
const walls = [0, 90, 180, 270].map((azimuthDeg) => ({ azimuthDeg, heightM: 2.7, eaveDepthM: 0.45, eaveDropM: 0, shade: 'open' as const, shadeHeightDeg: 0, cover: 'none' as const, coverDepthM: 0, coverHeightM: 0, coverShare: 1 }));
const calls = (365 * 24 * 60) / 5;
const start = Date.UTC(2026, 0, 1);

describe('sun on one home for a year', () => {
  bench('bare suncalc calls', () => {
    for (let k = 0; k < calls; k += 1) getPosition(new Date(start + k * 300_000), place.latitude, place.longitude);
  });

  bench('four walls: hours and dose', () => {
    const path = pathOf(site);
    for (const wall of walls) exposureOf(wall, site, path);
  });
});

import { describe, expect, it } from 'vitest';
import { nearestStation } from '@/lib/climate';
import { sunDoseExplained, sunHoursExplained } from '@/lib/home/explained';
import { type UnitSystem } from '@/lib/schemas/vocabulary';

const wall = { azimuthDeg: 180, eaveDepthM: 0.4572, shade: 'open' as const, shadeHeightDeg: 0, cover: 'none' as const, coverDepthM: 2.4384, coverHeightM: 2.1336, coverShare: 0.5 };
const porch = { ...wall, cover: 'porch' as const };
const place = (latitude: number, longitude: number, elevationM: number | null = null) => ({ where: { latitude, longitude, elevationM }, station: nearestStation({ latitude, longitude }).station });
const duluth = place(46.84, -92.19);
const miami = place(25.8, -80.3);
const explained = (of: typeof wall | typeof porch, { where, station }: typeof duluth, units: UnitSystem = 'us') => sunDoseExplained(900, of, where, station, units);
const value = (of: ReturnType<typeof explained>, label: string) => of.inputs.find((input) => input.label === label)?.value;
const sources = (of: { sources: { text: string }[] }) => of.sources.map(({ text }) => text).join('\n');

describe('how a sun dose came about', () => {
  it('says what the ground was taken to reflect, with the months of snow in the order of a winter', () => {
    // NOAA normals 2006–2020, Duluth: November to March have a mean below freezing, April and October do not.
    expect(value(explained(wall, duluth), 'Reflected by the ground')).toBe('20 %; with snow up to 60 %: November, December, January, February, March');
    expect(sources(explained(wall, duluth))).toContain('Snow on the ground');
    expect(value(explained(wall, miami), 'Reflected by the ground')).toBe('20 %');
    expect(sources(explained(wall, miami))).not.toContain('Snow');
    // 6.5 °C colder for each km: 12 months below −6 °C need a home 5 km above Miami.
    expect(value(explained(wall, { ...miami, where: { ...miami.where, elevationM: 6000 } }), 'Reflected by the ground')).toContain('January, February, March, April, May, June, July');
  });

  it('names the porch roof in the reader’s units, and only where there is one', () => {
    expect(value(explained(porch, duluth), 'Over it')).toBe('A porch roof, 8 ft deep, 7 ft up, over 50 % of the width');
    expect(value(explained(porch, duluth, 'metric'), 'Over it')).toBe('A porch roof, 2.44 m deep, 2.13 m up, over 50 % of the width');
    expect(sources(explained(porch, duluth))).toContain('the deeper shade counts');
    expect(sources(sunHoursExplained(2000, porch, duluth.where, 'us'))).toContain('the deeper shade counts');
    for (const bare of [explained(wall, duluth), sunHoursExplained(2000, wall, duluth.where, 'us')]) {
      expect(value(bare, 'Over it')).toBeUndefined();
      expect(sources(bare)).not.toContain('porch');
    }
  });
});

import { describe, expect, it } from 'vitest';
import { buyingStart } from '@/lib/home/buying';
import { leftExplained } from '@/lib/home/explained';
import { homeValues, openingValues, wallLengths } from '@/lib/home/form-values';
import { notYet } from '@/lib/home/not-yet';
import { wallMeasures } from '@/lib/home/wall-measures';
import { homeSchema } from '@/lib/schemas/home';
import { wallSchema } from '@/lib/schemas/wall';
import { wallForm } from '@/tests/fixtures/home-forms';

const ft = (feet: number) => feet * 0.3048;
const stored = { widthM: ft(30), heightM: ft(9), gableHeightM: ft(7.5), eaveDepthM: ft(1.5), eaveDropM: 0, azimuthDeg: 202.5 };
const openings = [{ kind: 'door' as const, widthM: ft(3), heightM: ft(80 / 12), count: 2 }];

describe('forms filled from what is stored', () => {
  it('shows a wall as it was typed, and reads it back as it was stored', () => {
    expect(wallLengths(stored, 'us')).toEqual({ width: '30', height: '9', gableHeight: '7 ft 6 in', eaveDepth: '1 ft 6 in', eaveDrop: '0', azimuthDeg: 202.5 });
    for (const units of ['us', 'metric'] as const) {
      const { azimuthDeg, ...lengths } = wallLengths(stored, units);
      const [door] = openingValues(openings, units);
      const read = wallSchema.parse({ ...wallForm(), stained: { notKnown: 'on' }, caulked: { notKnown: 'on' }, units, ...lengths, azimuthDeg: String(azimuthDeg), openings: { 0: door } });
      // Metres in forms have three decimals: half a millimetre.
      for (const name of ['widthM', 'heightM', 'gableHeightM', 'eaveDepthM', 'eaveDropM'] as const) expect(Math.abs(read[name] - stored[name])).toBeLessThanOrEqual(0.0005);
      expect(read.azimuthDeg).toBe(202.5);
      expect(read.openings).toEqual([{ kind: 'door', count: 2, widthM: expect.closeTo(ft(3), 3) as number, heightM: expect.closeTo(ft(80 / 12), 3) as number }]);
    }
  });

  it('shows coordinates only where they are not those of the postal code', () => {
    const home = { name: 'Larch Ridge', postalCode: '59715', latitude: 45.67, longitude: -111.04, elevationM: ft(4990), climateZoneOverride: null, sidingNominalIn: 8, wood: 'other', yearBuilt: null };
    expect(homeValues(home, { latitude: 45.67, longitude: -111.04 }, 'us').place).toEqual({ postalCode: '59715', latitude: '', longitude: '', elevation: '4990', climateZoneOverride: '' });
    const own = homeValues(home, { latitude: 45.6, longitude: -111.04 }, 'us');
    expect(own.place).toMatchObject({ latitude: '45.67', longitude: '-111.04' });
    expect(homeSchema.parse({ units: 'us', name: own.name, ...own.place, ...own.siding })).toMatchObject({ latitude: 45.67, longitude: -111.04, elevationM: expect.closeTo(ft(4990), 2) as number });
  });

  it('says what is wrong with days that have not come', () => {
    expect(notYet({ stained: '2026-12-01', caulked: null }, '2026-12-01')).toBeNull();
    expect(notYet({ stained: '2026-12-02', caulked: '2027-01-01' }, '2026-12-01')).toEqual({
      'stained.on': 'December 2, 2026 has not come yet: today is December 1, 2026 at the home.',
      'caulked.on': 'January 1, 2027 has not come yet: today is December 1, 2026 at the home.',
    });
  });
});

describe('a wall in words', () => {
  it('names its size and its wood', () => {
    // 30 × 9 + 30 × 7.5 / 2 − 2 × 3 × 6⅔ = 342.5 ft².
    expect(wallMeasures(stored, openings, 8, 'us').words).toBe('30 ft wide, 9 ft high, gable 7.5 ft, 2 doors: 343 ft² of wood.');
  });

  it('says what is left of a coat, and nothing where its start is not known', () => {
    const film = { film: 'coat' as const, startedOn: '2026-01-01', lifeMonths: 12, lowYears: 1, highYears: 2, severity: 1, factor: 1, learned: [], assumed: false, found: null, explanation: { figure: '', value: '', formula: '', inputs: [], sources: [] } };
    // 73 of 365 days are a fifth.
    expect(leftExplained(film, '2026-03-15')?.percent).toBe(80);
    expect(leftExplained({ ...film, startedOn: null }, '2026-03-15')).toBeNull();
  });
});

describe('what to buy for a home', () => {
  const home = { sidingNominalIn: 8, crownHeightM: 0.0254 };
  const wall = (id: string, texture: 'smooth' | 'saw-textured') => ({ wall: { id, name: id, texture, ...stored }, openings });

  it('starts with the walls whose restain is next, in the reader’s units', () => {
    const { areas, start } = buyingStart(home, [wall('a', 'smooth'), wall('b', 'saw-textured')], ['a'], 'us', {});
    // 342.5 ft² × 0.09290304 m²/ft².
    expect(areas.map(({ areaM2 }) => areaM2)).toEqual([31.819, 31.819]);
    expect(start).toMatchObject({ chosenM2: ['31.819#a'], siding: '8', crown: '1', texture: 'smooth' });
    expect(buyingStart(home, [wall('a', 'smooth')], [], 'metric', {}).start).toMatchObject({ chosenM2: ['31.819#a'], crown: '2.54' });
  });

  it('keeps what was sent without scripts', () => {
    expect(buyingStart(home, [wall('a', 'smooth'), wall('b', 'saw-textured')], ['a'], 'us', { 'chosenM2[]': '31.819#b', coats: '1', other: 'x' }).start).toMatchObject({ chosenM2: ['31.819#b'], coats: '1' });
  });
});

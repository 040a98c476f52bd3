import { describe, expect, test } from 'vitest';
import { caulkForHome } from '@/lib/jobs/caulk-for-home';
import { workAhead } from '@/lib/jobs/work-ahead';
import { metresToFeet } from '@/lib/units';
import { workItem } from '@/tests/fixtures/work-item';

const home = { id: 'cabin', name: 'Cabin', place: '', state: 'MT', timeZone: 'America/Denver', sidingNominalIn: 8, crownHeightM: 0.0254 };
/** 30 × 9 ft with three windows of 3 × 4 ft. */
const wall = { id: 'w', name: 'Front', position: 0, azimuthDeg: 180, widthM: 9.144, heightM: 2.7432, gableHeightM: 0, corners: 2, pipes: 0, texture: 'smooth' as const };
const openings = [{ widthM: 0.9144, heightM: 1.2192, count: 3 }];
const visitOf = (kind: 'recaulk' | 'restain') => workAhead([{ home, wall, openings, item: workItem('w', kind, '2027-06-01') }], new Date('2026-12-01T18:00:00Z'), 'us').seasons[0]?.visits[0];

describe('caulk for a visit', () => {
  // By hand: 42 ft round windows, 18 ft of corners, 17 × 6.625 in of butt joints: 69.385 ft; 69.385 × 1.1 ÷ 24.304 ft a container (sealant-yield.csv) are 3.14 of 10.1 fl oz, 31.7 fl oz.
  test('joints, and containers that hold them with a tenth of waste', () => {
    const caulk = visitOf('recaulk')?.caulk;
    expect(metresToFeet(caulk?.lengthM ?? NaN)).toBeCloseTo(69.385, 3);
    const heldFloz = (caulk?.containers ?? []).reduce((sum, { gal, count }) => sum + gal * count * 128, 0);
    expect(heldFloz).toBeGreaterThanOrEqual(31.7);
  });

  // By hand: of the 69.385 ft above the corners are 18 ft; four pipes are a foot of joint each.
  test('the corners and pipes that are noted for a wall are what is counted', () => {
    const lengthFt = (corners: number, pipes: number) => metresToFeet(caulkForHome(home, [{ ...wall, corners, pipes, openings }], 'us')?.lengthM ?? NaN);
    expect([lengthFt(2, 0), lengthFt(0, 0), lengthFt(1, 4)].map((feet) => feet.toFixed(3))).toEqual(['69.385', '51.385', '64.385']);
  });

  test('a visit that only stains takes none', () => {
    expect(visitOf('restain')?.caulk).toBeNull();
    expect(caulkForHome(home, [], 'us')).toBeNull();
  });
});

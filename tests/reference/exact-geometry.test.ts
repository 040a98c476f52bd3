import { describe, expect, test } from 'vitest';
import { profileFactor, wallAreaFt2 } from '@/lib/takeoff';
import { readCsv } from '../fixtures/csv';

describe('area factor of a rounded face, exact geometry (published to four digits)', () => {
  test.each(readCsv('profile-area-factor.csv'))('$exposed_face_in in face, $crown_height_in in crown', (row) => {
    expect(profileFactor(Number(row.exposed_face_in), Number(row.crown_height_in))).toBeCloseTo(Number(row.area_factor), 4);
  });

  test('flat is 1, a half-round is π/2', () => {
    expect(profileFactor(8, 0)).toBe(1);
    expect(profileFactor(8, 4)).toBeCloseTo(Math.PI / 2, 12);
  });
});

describe('a worked wall: 30 ft × 9 ft less 36 ft² of openings', () => {
  test('234 ft²', () => {
    expect(wallAreaFt2({ widthFt: 30, heightFt: 9, openings: [{ widthFt: 3, heightFt: 4, count: 3 }] })).toBeCloseTo(234, 9);
  });
});

import { describe, expect, it } from 'vitest';
import { coatLeft, monthsInWords } from '@/lib/coat';

describe('coat left', () => {
  it('goes from 1 to 0 by days and stays within them', () => {
    // 2023-06-10 to 2027-06-10 is 1461 days.
    expect(coatLeft('2023-06-10', 48, '2023-06-10')).toBe(1);
    expect(coatLeft('2023-06-10', 48, '2024-06-10')).toBeCloseTo(1 - 366 / 1461, 12);
    expect(coatLeft('2023-06-10', 48, '2027-06-09')).toBeCloseTo(1 / 1461, 12);
    expect(coatLeft('2023-06-10', 48, '2027-06-10')).toBe(0);
    expect(coatLeft('2023-06-10', 48, '2040-01-01')).toBe(0);
    expect(coatLeft('2023-06-10', 48, '2020-01-01')).toBe(1);
  });
});

describe('months in words', () => {
  it('says years and months', () => {
    expect([1, 11, 12, 13, 24, 55].map(monthsInWords)).toEqual(['1 month', '11 months', '1 year', '1 year 1 month', '2 years', '4 years 7 months']);
  });
});

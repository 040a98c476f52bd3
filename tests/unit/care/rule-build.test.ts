import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { addDays, addMonths } from '@/lib/calendar';
import { expandRule, monthlyRule } from '@/lib/care';
import { withSafeDay } from '@/lib/care/rule-build';

describe('rules of every so many months', () => {
  it('writes the plain form up to the 28th, and the last possible day after it', () => {
    expect(monthlyRule('2026-05-28', 55)).toBe('FREQ=MONTHLY;INTERVAL=55');
    expect(monthlyRule('2026-05-29', 55)).toBe('FREQ=MONTHLY;INTERVAL=55;BYMONTHDAY=28,29;BYSETPOS=-1');
    expect(monthlyRule('2026-05-30', 1)).toBe('FREQ=MONTHLY;INTERVAL=1;BYMONTHDAY=28,29,30;BYSETPOS=-1');
    expect(monthlyRule('2026-05-31', 1)).toBe('FREQ=MONTHLY;INTERVAL=1;BYMONTHDAY=28,29,30,31;BYSETPOS=-1');
  });

  it('clamps to the end of February, leap years too', () => {
    expect(expandRule(monthlyRule('2027-12-31', 1), '2027-12-31', '2027-12-31', '2028-04-30')).toEqual(['2027-12-31', '2028-01-31', '2028-02-29', '2028-03-31', '2028-04-30']);
    expect(expandRule(monthlyRule('2028-02-29', 12), '2028-02-29', '2028-01-01', '2032-12-31')).toEqual(['2028-02-29', '2029-02-28', '2030-02-28', '2031-02-28', '2032-02-29']);
  });

  // date-fns adds months with the same clamping.
  it('loses and doubles nothing, from any day, against date-fns', () => {
    const starts = fc.oneof(fc.integer({ min: 0, max: 12_000 }).map((n) => addDays('2000-01-01', n)), fc.constantFrom('2024-02-29', '2025-01-29', '2025-01-30', '2025-01-31', '2026-10-31'));
    fc.assert(
      fc.property(starts, fc.integer({ min: 1, max: 130 }), (start, months) => {
        const expected = Array.from({ length: 9 }, (_, i) => addMonths(start, i * months));
        expect(expandRule(monthlyRule(start, months), start, start, expected[8] ?? start)).toEqual(expected);
      }),
    );
  });
});

describe('a rule that restarts on a day that not every month has', () => {
  it('falls on the last possible day instead of skipping', () => {
    const days = (rule: string, start: string, to: string) => expandRule(withSafeDay(rule, start), start, start, to);
    expect(days('FREQ=YEARLY;BYMONTH=6', '2026-05-31', '2027-12-31')).toEqual(['2026-06-30', '2027-06-30']);
    expect(days('FREQ=YEARLY', '2028-02-29', '2032-12-31')).toEqual(['2028-02-29', '2029-02-28', '2030-02-28', '2031-02-28', '2032-02-29']);
    expect(days('FREQ=MONTHLY;INTERVAL=9', '2026-05-30', '2028-05-31')).toEqual(['2026-05-30', '2027-02-28', '2027-11-30']);
    expect(days('FREQ=YEARLY;BYMONTH=2,8', '2026-08-31', '2027-12-31')).toEqual(['2027-02-28', '2027-08-28']);
  });

  it('leaves rules alone that name their day, or start early enough', () => {
    expect(withSafeDay('FREQ=YEARLY;BYMONTH=6', '2026-05-28')).toBe('FREQ=YEARLY;BYMONTH=6');
    expect(withSafeDay('FREQ=MONTHLY;BYDAY=1SA', '2026-05-31')).toBe('FREQ=MONTHLY;BYDAY=1SA');
    expect(withSafeDay('FREQ=WEEKLY', '2026-05-31')).toBe('FREQ=WEEKLY');
  });
});

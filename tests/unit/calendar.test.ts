import { addDays as addDaysThere, addMonths as addMonthsThere, differenceInCalendarDays, format, parseISO } from 'date-fns';
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { addDays, addMonths, daysBetween, fromUtcDate, isCalendarDay, toUtcDate } from '@/lib/calendar';

const anyDay = fc.date({ min: new Date('1900-01-01T00:00:00Z'), max: new Date('2200-12-31T00:00:00Z'), noInvalidDate: true }).map((date) => date.toISOString().slice(0, 10));
const there = (date: Date) => format(date, 'yyyy-MM-dd');

describe('days, months and spans, as date-fns has them', () => {
  test('days later and earlier', () => {
    fc.assert(
      fc.property(anyDay, fc.integer({ min: -20_000, max: 20_000 }), (day, days) => {
        expect(addDays(day, days)).toBe(there(addDaysThere(parseISO(day), days)));
      }),
    );
  });

  test('months later and earlier, short months to their last day', () => {
    fc.assert(
      fc.property(anyDay, fc.integer({ min: -600, max: 600 }), (day, months) => {
        expect(addMonths(day, months)).toBe(there(addMonthsThere(parseISO(day), months)));
      }),
    );
    expect(addMonths('2028-01-31', 1)).toBe('2028-02-29');
  });

  test('days between', () => {
    fc.assert(
      fc.property(anyDay, anyDay, (from, to) => {
        expect(daysBetween(from, to)).toBe(differenceInCalendarDays(parseISO(to), parseISO(from)));
      }),
    );
  });
});

test('a day and its midnight are the same thing', () => {
  fc.assert(
      fc.property(anyDay, (day) => {
        expect([toUtcDate(day).toISOString(), fromUtcDate(toUtcDate(day))]).toEqual([`${day}T00:00:00.000Z`, day]);
      }),
    );
});

test.each(['2027-02-29', '2027-13-01', '2027-00-10', '2027-1-1', '2027-01-1a', ' 2027-1-01', '2027/01/01', ''])('%j is no day', (text) => {
  expect(() => toUtcDate(text)).toThrow(RangeError);
  expect(isCalendarDay(text)).toBe(false);
});

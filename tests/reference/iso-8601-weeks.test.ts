import { getISODay, getISOWeek, getISOWeeksInYear } from 'date-fns';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { addDays } from '@/lib/calendar';
import { expandRule } from '@/lib/care';

const weekdays = ['MO', 'TU', 'WE', 'TH', 'FR', 'SA', 'SU'] as const;
const some = <T>(values: readonly T[], most: number) => fc.uniqueArray(fc.constantFrom(...values), { minLength: 1, maxLength: most });
const starts = fc.integer({ min: 0, max: 1500 }).map((n) => addDays('2022-01-01', n));

/** Week and weekday of every day of some years by date-fns (ISO 8601 weeks, which RFC 5545 names for WKST=MO). */
function byIsoWeek(weeks: number[], days: number[], from: string, to: string): string[] {
  const found: string[] = [];
  for (let day = from; day <= to; day = addDays(day, 1)) {
    const noon = new Date(`${day}T12:00:00`);
    const week = getISOWeek(noon);
    const fits = weeks.includes(week) || weeks.includes(week - getISOWeeksInYear(noon) - 1);
    if (fits && days.includes(getISODay(noon))) found.push(day);
  }
  return found;
}

describe('week numbers, against date-fns', () => {
  it('gives the same days, at the turn of the year too', () => {
    fc.assert(
      fc.property(some([1, 2, 20, 51, 52, 53, -1, -2, -53], 3), some([1, 2, 3, 4, 5, 6, 7], 3), starts, (weeks, days, start) => {
        const rule = `FREQ=YEARLY;BYWEEKNO=${weeks.join(',')};BYDAY=${days.map((day) => weekdays[day - 1]).join(',')}`;
        expect(expandRule(rule, start, start, addDays(start, 2500))).toEqual(byIsoWeek(weeks, days, start, addDays(start, 2500)));
      }),
      { numRuns: 60 },
    );
  }, 30_000);
});

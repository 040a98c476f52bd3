import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { budget } from '@/lib/care/budget';
import { filmJobs } from '@/lib/care/film-jobs';
import { groupedPlan } from '@/lib/care/grouped-plan';
import { planWall } from '@/lib/care/plan';
import { type CareHome } from '@/lib/care/types';
import { yearsAhead } from '@/lib/care/years-ahead';
import { anyCareHome, careHome, careRecord, careWall } from '@/tests/fixtures/care-home';

const today = '2027-01-01';
const budgetOf = (home: CareHome, years?: number) => {
  const { walls, grouping } = groupedPlan(home, home.walls.map((wall) => planWall(home, wall, today)), today);
  return { plan: budget(home, walls, grouping, today, years), walls, grouping };
};

/*
 * By hand: one wall of 25.08 m², coat of 66 months from 10 December 2021, so restained on 10 June 2027, then on 10 December 2032 in
 * the season before it, by 30 September 2032. Restain 25.08 × $5.50 = $137.94, trip $90, wash 25.08 × $0.60 = $15.05.
 */
const home = careHome({ walls: [careWall({ name: 'Front' })], records: [careRecord('restain', '2021-12-10'), careRecord('wash', '2026-05-10')] });

describe('one wall, by hand', () => {
  const { plan } = budgetOf(home, 6);

  test('a year with a restain costs the trip and the coat, any other the wash', () => {
    expect(plan.years.map(({ year, cents }) => [year, cents])).toEqual([[2027, 9000 + 13_794], [2028, 1505], [2029, 1505], [2030, 1505], [2031, 1505], [2032, 9000 + 13_794]]);
    expect(plan.years[0]).toMatchObject({ tripCents: 9000, restainCents: 13_794, stripCents: 0, recaulkCents: 0, washCents: 0, washed: [] });
    expect(plan.years[5]?.trips.map(({ on }) => on)).toEqual(['2032-09-30']);
    expect(plan.years[1]?.washed).toEqual(['w1']);
  });

  test('the total and the mean of six years', () => {
    expect(plan.cents).toBe(2 * 22_794 + 4 * 1505);
    // From 1 January 2027 to 31 December 2032 are 2,192 days, 6.0014 years.
    expect(plan.yearlyCents).toBe(Math.round(51_608 / (2192 / 365.25)));
  });

  test('what nobody knows is named, not counted', () => {
    expect(plan.missing).toEqual([{ wallId: 'w1', kind: 'recaulk' }]);
  });
});

test('a wash by the owner’s own rule, every third year, is counted in those years only', () => {
  const ownRules = [{ wallId: 'w1', kind: 'wash' as const, rule: 'FREQ=YEARLY;INTERVAL=3;BYMONTH=5;BYMONTHDAY=15', startOn: '2028-01-01' }];
  const { plan } = budgetOf({ ...home, ownRules }, 6);
  expect(plan.years.filter(({ washCents }) => washCents > 0).map(({ year }) => year)).toEqual([2028, 2031]);
});

test('fifteen years, this one first', () => {
  expect(budgetOf(home).plan.years.map(({ year }) => year)).toEqual(Array.from({ length: 15 }, (_, i) => 2027 + i));
});

test('in any home, the years hold all trips and washes, and nothing else', () => {
  fc.assert(
    fc.property(anyCareHome, fc.integer({ min: 0, max: 100_000 }), (made, tripCents) => {
      const any = { ...made, costs: { ...made.costs, tripCents } };
      const { plan, walls, grouping } = budgetOf(any);
      const { trips } = yearsAhead({ jobs: filmJobs(any, walls), joinMonths: grouping.months, tripCents, notBefore: today, through: plan.through });
      const washes = plan.years.reduce((sum, { washCents }) => sum + washCents, 0);
      expect(plan.cents).toBe(trips.reduce((sum, { cents }) => sum + cents, 0) + washes);
      expect(plan.years.reduce((sum, { cents }) => sum + cents, 0)).toBe(plan.cents);
      for (const { washed, washCents } of plan.years) expect(washCents).toBe(washed.length * Math.round(25.08 * 60));
    }),
    { numRuns: 100 },
  );
});

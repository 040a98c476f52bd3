import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { addDays, addMonths, daysBetween } from '@/lib/calendar';
import { planHome } from '@/lib/care';
import { chooseGrouping } from '@/lib/care/choose-grouping';
import { filmJobs } from '@/lib/care/film-jobs';
import { yearsAhead } from '@/lib/care/years-ahead';
import { anyCareHome } from '@/tests/fixtures/care-home';
import { filmJob } from '@/tests/fixtures/film-job';

const ahead = { joinMonths: 0, tripCents: 9000, notBefore: null, through: '2048-05-01' };

/*
 * Reckoned by hand. Two coats of 60 months for $140 each, one used up on 1 July 2028, the other on 1 June 2029; season May to
 * September, so the windows open on 1 May and close 60 days past the date. 335 days lie between the first trip and the second
 * coat's end: 335 / 30.44 = 11.0 months, 11.0 / 60 × $140 = $25.68.
 */
const two = [filmJob('A', '2028-07-01'), filmJob('B', '2029-06-01')];
const days = (joinMonths: number, tripCents = 9000) => yearsAhead({ ...ahead, jobs: two, joinMonths, tripCents }).trips.map(({ on, items }) => `${on} ${items.map(({ wallId }) => wallId).join('')}`);

describe('two walls a season apart', () => {
  test('go their own ways when nothing may join: eight trips in twenty years', () => {
    expect(days(0)).toEqual(['2028-07-01 A', '2029-06-01 B', '2033-07-01 A', '2034-06-01 B', '2038-07-01 A', '2039-06-01 B', '2043-07-01 A', '2044-06-01 B']);
  });

  test('share every trip once the second window opens within the months: 1 May 2029 is ten months after the first trip', () => {
    expect(days(9)).toEqual(days(0));
    expect(days(12)).toEqual(['2028-07-01 AB', '2033-07-01 AB', '2038-07-01 AB', '2043-07-01 AB']);
  });

  test('a coat joins only while what it throws away, $25.68, is less than a trip', () => {
    expect(days(12, 2568)).toHaveLength(4);
    expect(days(12, 2567)).toHaveLength(8);
  });

  test('the trip says what each coat throws away and what all of it costs', () => {
    const [first] = yearsAhead({ ...ahead, jobs: two, joinMonths: 12 }).trips;
    expect(first?.items.map(({ thrownAwayMonths }) => thrownAwayMonths.toFixed(2))).toEqual(['0.00', '11.01']);
    expect(first?.cents).toBe(9000 + 2 * 14_000);
  });

  /* Apart: 8 × $230, less 61 and 396 days of life left on 1 May 2048, (61 + 396) / 30.44 / 60 × $140 = $35.03; a year $90.25.
     Together: 4 × $370, less 2 × 61 days, $9.35; a year $73.53. */
  test('the choice that costs least a year is taken, the smallest of equals', () => {
    const { months, choices } = chooseGrouping(two, 9000);
    expect(months).toBe(12);
    expect(choices.map(({ yearlyCents }) => yearlyCents)).toEqual([9025, 9025, 9025, 9025, 7353, 7353, 7353, 7353, 7353]);
    expect(choices.map(({ trips }) => trips)).toEqual([8, 8, 8, 8, 4, 4, 4, 4, 4]);
  });
});

describe('what goes along', () => {
  test('work whose window holds the day of the trip, whatever the choice', () => {
    const trips = yearsAhead({ ...ahead, jobs: [filmJob('A', '2028-07-01'), filmJob('B', '2028-08-20')], through: '2029-01-01' }).trips;
    expect(trips.map(({ on, items }) => [on, items.length])).toEqual([['2028-07-01', 2]]);
  });

  test('work whose windows share days goes together on the first day that suits all of it', () => {
    const inWindow = (opensOn: string, closesOn: string) => ({ window: { opensOn, closesOn, moved: 'in season' as const } });
    const jobs = [filmJob('A', '2028-05-10', inWindow('2028-02-10', '2028-07-09')), filmJob('B', '2028-09-01', inWindow('2028-06-01', '2028-10-31'))];
    expect(yearsAhead({ ...ahead, jobs, through: '2029-01-01' }).trips.map(({ on, items }) => [on, items.length])).toEqual([['2028-06-01', 2]]);
  });

  test('work that may not be drawn forward waits for its own window', () => {
    const jobs = [filmJob('A', '2028-07-01'), filmJob('B', '2029-06-01', { mayJoin: false })];
    expect(yearsAhead({ ...ahead, jobs, joinMonths: 24, through: '2030-01-01' }).trips.map(({ on }) => on)).toEqual(['2028-07-01', '2029-06-01']);
  });

  test('caulk due within 18 months of its wall’s next restain takes the restain’s window: due February 2034, done in July 2033', () => {
    const jobs = [filmJob('A', '2028-07-01'), filmJob('A', '2028-08-01', { kind: 'recaulk', lifeMonths: 67, stripCents: 0 })];
    const { trips } = yearsAhead({ ...ahead, jobs, through: '2034-12-31' });
    expect(trips.map(({ on, items }) => [on, items.map(({ kind }) => kind)])).toEqual([['2028-07-01', ['restain', 'recaulk']], ['2033-07-01', ['restain', 'recaulk']]]);
  });

  test('no trip before the day on which one looks', () => {
    expect(yearsAhead({ ...ahead, jobs: two, notBefore: '2028-07-20', through: '2029-01-01' }).trips.map(({ on }) => on)).toEqual(['2028-07-20']);
  });
});

/* 1.15 × 60 months is 9 months past the end, 273.96 days: the 274th day past 1 July 2028 is 1 April 2029. */
test('a coat older than 1.15 times its life is stripped first', () => {
  const lateOn = (day: string) => [filmJob('A', '2028-07-01', { window: { opensOn: day, closesOn: day, moved: 'put off' }, missedOn: day })];
  const strip = (day: string) => yearsAhead({ ...ahead, jobs: lateOn(day), through: '2029-12-31' }).trips[0]?.items[0]?.stripCents;
  expect(strip(addDays('2028-07-01', 273))).toBe(0);
  expect(strip(addDays('2028-07-01', 274))).toBe(35_000);
});

const today = '2026-12-01';
const through = '2046-12-01';
const anyMonths = fc.constantFrom(0, 3, 9, 12, 24);
const anyTripCents = fc.integer({ min: 0, max: 100_000 });

describe('in any home', () => {
  test('no film is lost: never more than its life, 60 days of grace and the wait for a season between two works on it', () => {
    fc.assert(
      fc.property(anyCareHome, anyMonths, anyTripCents, (home, joinMonths, tripCents) => {
        const jobs = filmJobs(home, planHome(home, today).walls);
        const { trips } = yearsAhead({ jobs, joinMonths, tripCents, notBefore: today, through });
        for (const job of jobs) {
          const done = trips.filter(({ items }) => items.some(({ wallId, kind }) => wallId === job.wallId && kind === job.kind)).map(({ on }) => on);
          const most = daysBetween('2026-12-01', addMonths('2026-12-01', job.lifeMonths)) + 2 + 60 + 366;
          if (done[0]) [...done.slice(1), through].forEach((on, i) => expect(daysBetween(done[i] ?? '', on)).toBeLessThanOrEqual(most));
          else expect(job.window.closesOn > through || job.dueOn > through).toBe(true);
        }
      }),
      { numRuns: 150 },
    );
  });

  test('trips go forward in time, and cost the sum of their parts', () => {
    fc.assert(
      fc.property(anyCareHome, anyMonths, anyTripCents, (home, joinMonths, tripCents) => {
        const { trips } = yearsAhead({ jobs: filmJobs(home, planHome(home, today).walls), joinMonths, tripCents, notBefore: today, through });
        trips.forEach(({ on, items, cents }, i) => {
          expect(on > (trips[i - 1]?.on ?? '2026-11-30')).toBe(true);
          expect(cents).toBe(tripCents + items.reduce((sum, item) => sum + item.cents + item.stripCents, 0));
        });
      }),
      { numRuns: 150 },
    );
  });

  test('where a trip costs nothing, all goes as with no months to join by', () => {
    fc.assert(
      fc.property(anyCareHome, anyMonths, (home, joinMonths) => {
        const jobs = filmJobs(home, planHome(home, today).walls);
        const trips = (months: number) => yearsAhead({ jobs, joinMonths: months, tripCents: 0, notBefore: today, through }).trips;
        expect(trips(joinMonths)).toEqual(trips(0));
      }),
      { numRuns: 150 },
    );
  });
});

const anyDue = fc.integer({ min: 0, max: 2000 }).map((n) => addDays('2027-01-01', n));
const anyLife = fc.integer({ min: 24, max: 120 });
const anyJobs = fc.array(fc.record({ dueOn: anyDue, lifeMonths: anyLife, cents: fc.integer({ min: 2000, max: 40_000 }) }), { minLength: 1, maxLength: 5 }).map((list) => list.map(({ dueOn, ...values }, i) => filmJob(`w${i}`, dueOn, values)));

describe('of any coats', () => {
  test('with no months to join by, all goes as if no work might be drawn forward', () => {
    fc.assert(
      fc.property(anyJobs, anyTripCents, (jobs, tripCents) => {
        const held = jobs.map((job) => ({ ...job, mayJoin: false, isOwnRule: true }));
        expect(yearsAhead({ ...ahead, jobs, tripCents }).trips).toEqual(yearsAhead({ ...ahead, jobs: held, joinMonths: 24, tripCents }).trips);
      }),
      { numRuns: 150 },
    );
  });

  test('a trip that costs more takes along at least what a cheaper one would', () => {
    fc.assert(
      fc.property(anyJobs, anyMonths, anyTripCents, anyTripCents, (jobs, joinMonths, a, b) => {
        const first = (tripCents: number) => yearsAhead({ ...ahead, jobs, joinMonths, tripCents }).trips[0]?.items.map(({ wallId }) => wallId);
        expect(first(Math.max(a, b))).toEqual(expect.arrayContaining(first(Math.min(a, b)) ?? []));
      }),
      { numRuns: 200 },
    );
  });

  /* Only for equal lives: coats of different lives that were joined once may part again at worse times, so that a dearer trip can mean one trip more. */
  test('two coats of one life never make more trips where a trip costs more', () => {
    fc.assert(
      fc.property(anyDue, anyDue, anyLife, anyMonths, anyTripCents, anyTripCents, (one, other, lifeMonths, joinMonths, a, b) => {
        const jobs = [filmJob('A', one, { lifeMonths }), filmJob('B', other, { lifeMonths })];
        const count = (tripCents: number) => yearsAhead({ ...ahead, jobs, joinMonths, tripCents }).trips.length;
        expect(count(Math.max(a, b))).toBeLessThanOrEqual(count(Math.min(a, b)));
      }),
      { numRuns: 200 },
    );
  });

  test('the choice taken costs no more a year than walls that go their own ways', () => {
    fc.assert(
      fc.property(anyJobs, anyTripCents, (jobs, tripCents) => {
        const { months, choices } = chooseGrouping(jobs, tripCents);
        const cost = (of: number) => choices.find((choice) => choice.months === of)?.yearlyCents ?? Number.NaN;
        for (const choice of choices) expect(cost(months) < choice.yearlyCents || (cost(months) === choice.yearlyCents && months <= choice.months)).toBe(true);
      }),
      { numRuns: 60 },
    );
  });
});

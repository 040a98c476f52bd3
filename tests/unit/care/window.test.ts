import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { addDays, addMonths, monthOf } from '@/lib/calendar';
import { windowFor } from '@/lib/care';
import { type SeasonMonths } from '@/lib/care/types';
import { anySeasons } from '@/tests/fixtures/care-home';

const summer = [{ fromMonth: 5, toMonth: 9 }];
const at = (dueOn: string, seasons: SeasonMonths[], usedUpOn = dueOn) => {
  const { opensOn, closesOn, moved } = windowFor(dueOn, seasons, usedUpOn);
  return [opensOn, closesOn, moved];
};

describe('windows, worked by hand', () => {
  it('takes the season that the date falls in, at most 60 days past the date', () => {
    expect(at('2027-06-10', summer)).toEqual(['2027-05-01', '2027-08-09', 'in season']);
    expect(at('2027-05-01', summer)).toEqual(['2027-05-01', '2027-06-30', 'in season']);
    expect(at('2027-09-30', summer)).toEqual(['2027-05-01', '2027-09-30', 'in season']);
  });

  it('takes the season before when none opens within 60 days', () => {
    expect(at('2027-10-20', summer)).toEqual(['2027-05-01', '2027-09-30', 'to the season before']);
    expect(at('2027-01-05', summer)).toEqual(['2026-05-01', '2026-09-30', 'to the season before']);
    // 1 March is 61 days before 1 May.
    expect(at('2027-03-01', summer)).toEqual(['2026-05-01', '2026-09-30', 'to the season before']);
  });

  it('waits for the season that opens soon, if two weeks of it are left before the 60 days are over', () => {
    expect(at('2027-04-01', summer)).toEqual(['2027-05-01', '2027-05-31', 'to the next season']);
    // 16 March + 60 days = 15 May; 17 March + 60 days = 16 May.
    expect(at('2027-03-16', summer)).toEqual(['2027-05-01', '2027-05-15', 'to the next season']);
    expect(at('2027-03-15', summer)).toEqual(['2026-05-01', '2026-09-30', 'to the season before']);
  });

  it('wraps the turn of the year, and ends February right', () => {
    const winter = [{ fromMonth: 11, toMonth: 2 }];
    expect(at('2028-01-20', winter)).toEqual(['2027-11-01', '2028-02-29', 'in season']);
    expect(at('2027-01-20', winter)).toEqual(['2026-11-01', '2027-02-28', 'in season']);
    expect(at('2026-11-05', winter)).toEqual(['2026-11-01', '2027-01-04', 'in season']);
    expect(at('2027-06-01', winter)).toEqual(['2026-11-01', '2027-02-28', 'to the season before']);
  });

  it('chooses between two seasons of a year', () => {
    const twice = [{ fromMonth: 4, toMonth: 5 }, { fromMonth: 9, toMonth: 10 }];
    expect(at('2027-07-10', twice)).toEqual(['2027-04-01', '2027-05-31', 'to the season before']);
    expect(at('2027-07-25', twice)).toEqual(['2027-09-01', '2027-09-23', 'to the next season']);
    expect(at('2027-10-31', twice)).toEqual(['2027-09-01', '2027-10-31', 'in season']);
  });

  it('opens three months before the date in a season longer than half a year', () => {
    expect(at('2027-10-20', [{ fromMonth: 3, toMonth: 11 }])).toEqual(['2027-07-20', '2027-11-30', 'in season']);
    expect(at('2027-01-10', [{ fromMonth: 1, toMonth: 12 }])).toEqual(['2026-10-10', '2027-03-11', 'in season']);
    expect(at('2027-01-10', [{ fromMonth: 3, toMonth: 11 }])).toEqual(['2026-08-30', '2026-11-30', 'to the season before']);
  });

  it('lies around the date where no month is good', () => {
    expect(at('2028-02-10', [])).toEqual(['2028-01-11', '2028-03-11', 'no season']);
  });

  it('holds to the day the film is used up when the date is later', () => {
    expect(at('2027-09-20', summer, '2027-05-10')).toEqual(['2027-05-01', '2027-07-09', 'in season']);
    expect(at('2028-06-10', summer, '2027-05-10')).toEqual(['2027-05-01', '2027-07-09', 'in season']);
  });
});

const anyDay = fc.integer({ min: 0, max: 20_000 }).map((n) => addDays('2000-01-01', n));
const isInSeason = (day: string, seasons: SeasonMonths[]) =>
  seasons.some(({ fromMonth, toMonth }) => (monthOf(day) - fromMonth + 12) % 12 <= (toMonth - fromMonth + 12) % 12);

describe('windows, whatever the date and season', () => {
  it('never reach more than 60 days past the day the film is used up, nor further back than a year and a half', () => {
    fc.assert(
      fc.property(anyDay, anySeasons, fc.integer({ min: -400, max: 400 }), (dueOn, seasons, shift) => {
        const usedUpOn = addDays(dueOn, shift);
        const { opensOn, closesOn } = windowFor(dueOn, seasons, usedUpOn);
        expect(closesOn <= addDays(usedUpOn, 60)).toBe(true);
        expect(opensOn <= closesOn).toBe(true);
        expect(opensOn >= addMonths(dueOn < usedUpOn ? dueOn : usedUpOn, -18)).toBe(true);
      }),
    );
  });

  it('begin and end in a season, and hold the date if it is in one', () => {
    fc.assert(
      fc.property(anyDay, anySeasons.filter((list) => list.length > 0), (dueOn, seasons) => {
        const { opensOn, closesOn, moved } = windowFor(dueOn, seasons, dueOn);
        expect(isInSeason(opensOn, seasons) && isInSeason(closesOn, seasons)).toBe(true);
        expect(moved === 'in season').toBe(isInSeason(dueOn, seasons));
        expect(moved === 'in season').toBe(opensOn <= dueOn && dueOn <= closesOn);
        if (moved === 'to the season before') expect(closesOn < dueOn).toBe(true);
      }),
    );
  });
});

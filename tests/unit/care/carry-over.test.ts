import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { addDays } from '@/lib/calendar';
import { planHome } from '@/lib/care';
import { unlessBegun } from '@/lib/care/carry-over';
import { nextStageDay, stageOn } from '@/lib/care/stages';
import { workState } from '@/lib/care/state';
import { careHome, careRecord } from '../../fixtures/care-home';

/** A restain of June 2017 on walls that want one every few years: long overdue. */
const late = careHome({ records: [careRecord('restain', '2017-06-10')] });
const restain = (today: string, home = late) => planHome(home, today).walls[0]?.items.find(({ kind }) => kind === 'restain');

describe('work whose window passed', () => {
  test('moves to the coming season, stays overdue, and says so', () => {
    const item = restain('2026-12-01');
    expect(item?.missedOn).toMatch(/^202[0-5]-/);
    expect(item && item.window.opensOn > '2026-12-01').toBe(true);
    expect(item && workState(item, '2026-12-01')).toBe('overdue');
    expect(item?.because).toContain('the next chance is');
    expect(item?.lapsesOn).toBe(addDays(item?.window.closesOn ?? '', 1));
  });

  test('is brought up again before and at the opening of each coming season, however old', () => {
    for (const year of [2026, 2027, 2031]) {
      const item = restain(`${year}-12-01`);
      if (!item) throw new Error('no restain');
      const book = nextStageDay(item, `${year}-12-01`);
      expect(book).toBe(addDays(item.window.opensOn, -120));
      expect(stageOn(item, book ?? '')?.stage).toBe('book');
      expect(stageOn(item, item.window.opensOn)?.stage).toBe('open');
    }
  });

  test('is over once it is logged', () => {
    const done = careHome({ records: [careRecord('restain', '2017-06-10'), careRecord('restain', '2026-08-20')] });
    const item = restain('2026-12-01', done);
    expect(item?.missedOn).toBeNull();
    expect(item && workState(item, '2026-12-01')).toBe('later');
  });

  test('on any day: a window that has not closed, and the same until it lapses', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 4000 }), fc.double({ min: 0, max: 1, noNaN: true }), (days, share) => {
        const today = addDays('2022-01-01', days);
        const item = restain(today);
        if (!item?.lapsesOn) throw new Error('it must lapse');
        expect(item.window.closesOn >= today).toBe(true);
        const span = (Date.parse(item.lapsesOn) - Date.parse(today)) / 86_400_000 - 1;
        expect(restain(addDays(today, Math.round(span * share)))).toEqual(item);
      }),
    );
  });

  test('the coming caulk joins an overdue restain where it is due within 18 months', () => {
    const home = careHome({ records: [careRecord('restain', '2017-06-10'), careRecord('recaulk', '2020-06-10')] });
    const [wall] = planHome(home, '2026-12-01').walls;
    const caulk = wall?.items.find(({ kind }) => kind === 'recaulk');
    const stain = wall?.items.find(({ kind }) => kind === 'restain');
    expect(caulk?.window.opensOn).toBe(stain?.window.opensOn);
  });
});

describe('a window that had begun when the film was put on', () => {
  const season = [{ fromMonth: 5, toMonth: 9 }];
  const window = { opensOn: '2026-05-01', closesOn: '2026-08-09', moved: 'in season' as const };

  test('gives way to the days after that one', () => {
    expect(unlessBegun(window, '2026-04-30', season)).toBe(window);
    // Put on in the window: what is left of the season. Put on after the window, in the season: the days after that.
    expect(unlessBegun(window, '2026-06-01', season)).toMatchObject({ opensOn: '2026-08-10', closesOn: '2026-09-30' });
    expect(unlessBegun(window, '2026-09-01', season)).toMatchObject({ opensOn: '2026-09-02', closesOn: '2026-09-30' });
    expect(unlessBegun(window, '2026-10-01', season)).toMatchObject({ opensOn: '2027-05-01', closesOn: '2027-09-30' });
  });
});

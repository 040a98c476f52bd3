import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { addDays } from '@/lib/calendar';
import { planHome } from '@/lib/care';
import { type CareHome, type WorkItem } from '@/lib/care/types';
import { type WorkKind } from '@/lib/schemas/vocabulary';
import { anyCareHome, careHome, careRecord, careWall } from '@/tests/fixtures/care-home';

const today = '2026-03-20';
const itemOf = (home: CareHome, kind: WorkKind, on = today, wallId = 'w1'): WorkItem | undefined =>
  planHome(home, on).walls.find((wall) => wall.wallId === wallId)?.items.find((item) => item.kind === kind);

describe('restain', () => {
  // Severity of the fixture's wall 0.65 × 0.5 + 0.35 × 0.5 = 0.5: 7 − 0.5 × 3 = 5.5 years, 66 months.
  it('counts the coat’s life from the latest restain', () => {
    const home = careHome({ records: [careRecord('restain', '2021-06-10'), careRecord('restain', '2017-06-10')] });
    expect(itemOf(home, 'restain')).toMatchObject({
      rule: 'FREQ=MONTHLY;INTERVAL=66',
      startOn: '2021-06-10',
      dueOn: '2026-12-10',
      window: { opensOn: '2026-05-01', closesOn: '2026-09-30', moved: 'to the season before' },
      missedOn: null,
      lapsesOn: '2026-10-01',
      basis: 'computed',
      lifeMonths: 66,
      because: 'The coat of June 2021 lasts about 5 years 6 months on this wall, until early December 2026. No coating season comes soon after that, so it is done in the season before.',
    });
  });

  it('keeps a start on the last day of a month on last days', () => {
    expect(itemOf(careHome({ records: [careRecord('restain', '2021-08-31')] }), 'restain')).toMatchObject({ rule: 'FREQ=MONTHLY;INTERVAL=66;BYMONTHDAY=28,29,30,31;BYSETPOS=-1', dueOn: '2027-02-28' });
  });

  it('uses the finish and base that the latest restain put on', () => {
    const records = [careRecord('restain', '2024-06-10', { finish: 'solid-color', stainBase: 'waterborne' })];
    const plan = planHome(careHome({ records }), today);
    // Solid color on saw-textured pine 8–10 years, severity 0.5: 9 years. Waterborne season June to August.
    expect(plan.walls[0]?.coat).toMatchObject({ lifeMonths: 108, lowYears: 8, highYears: 10 });
    expect(plan.walls[0]?.items.find(({ kind }) => kind === 'restain')).toMatchObject({ dueOn: '2033-06-10', window: { opensOn: '2033-06-01', closesOn: '2033-08-09' } });
    const later = [...records, careRecord('restain', '2025-06-10')];
    expect(planHome(careHome({ records: later }), today).walls[0]?.coat.lifeMonths).toBe(66);
  });

  it('says when no month is good, with the climate’s warning', () => {
    const seasons = { oil: { seasons: [], warning: 'July comes nearest.' }, waterborne: { seasons: [] } };
    const item = itemOf(careHome({ seasons, records: [careRecord('restain', '2021-06-10')] }), 'restain');
    expect(item?.window).toEqual({ opensOn: '2026-11-10', closesOn: '2027-01-09', moved: 'no season' });
    expect(item?.because).toMatch(/No month here is safely warm and dry enough\. July comes nearest\.$/);
  });

  it('leaves other walls alone', () => {
    const walls = [careWall(), careWall({ id: 'w2', name: 'North', position: 1, doseKwhM2: 250 })];
    const home = careHome({ walls, records: [careRecord('restain', '2021-06-10', { wallIds: ['w2'] })] });
    expect(itemOf(home, 'restain')).toBeUndefined();
    // Severity 0.35 × 0.5 = 0.175: 7 − 0.525 = 6.475 years, 78 months.
    expect(itemOf(home, 'restain', today, 'w2')).toMatchObject({ lifeMonths: 78, dueOn: '2027-12-10' });
  });
});

describe('recaulk', () => {
  // Severity 0.5 of 5–10 years: 7.5 years, 90 months.
  it('counts from the latest recaulk and keeps to the coating season', () => {
    const item = itemOf(careHome({ records: [careRecord('recaulk', '2020-01-12')] }), 'recaulk');
    expect(item).toMatchObject({ dueOn: '2027-07-12', lifeMonths: 90, window: { opensOn: '2027-05-01', closesOn: '2027-09-10' }, basis: 'computed' });
    expect(item?.explanation.sources.map(({ ground }) => ground)).toContain('memory');
  });

  it('follows the sealant that was put on', () => {
    // Silicone 15–20 years, severity 0.5: 17.5 years.
    expect(itemOf(careHome({ records: [careRecord('recaulk', '2020-01-12', { sealant: 'silicone' })] }), 'recaulk')).toMatchObject({ lifeMonths: 210, dueOn: '2037-07-12' });
  });
});

describe('missed work', () => {
  // Due 10 December 2026, window May to September 2026.
  const missed = careHome({ records: [careRecord('restain', '2021-06-10'), careRecord('recaulk', '2025-06-10')] });

  it('takes the season that comes, stays overdue, and keeps its date', () => {
    expect(itemOf(missed, 'restain', '2026-09-30')).toMatchObject({ missedOn: null, window: { closesOn: '2026-09-30' } });
    for (const day of ['2026-10-01', '2027-03-01', '2027-09-30']) {
      expect(itemOf(missed, 'restain', day)).toMatchObject({ dueOn: '2026-12-10', missedOn: '2026-09-30', lapsesOn: '2027-10-01', window: { opensOn: '2027-05-01', closesOn: '2027-09-30', moved: 'to the coming season' } });
    }
    expect(itemOf(missed, 'restain', '2027-10-01')).toMatchObject({ missedOn: '2026-09-30', window: { opensOn: '2028-05-01', closesOn: '2028-09-30' } });
  });

  it('is over once it is logged', () => {
    const done = { ...missed, records: [...missed.records, careRecord('restain', '2027-07-01')] };
    expect(itemOf(done, 'restain', '2027-07-01')).toMatchObject({ dueOn: '2033-01-01', missedOn: null });
  });
});

describe('the owner’s own rule', () => {
  const own = { wallId: 'w1', kind: 'restain' as const, rule: 'FREQ=YEARLY;INTERVAL=3;BYMONTH=6;BYMONTHDAY=15', startOn: '2026-01-01' };

  it('stands in for the computed one, also where the coat’s day is not known', () => {
    expect(itemOf(careHome({ ownRules: [own] }), 'restain')).toMatchObject({ rule: own.rule, startOn: '2026-01-01', dueOn: '2026-06-15', basis: 'own rule' });
  });

  it('restarts with logged work, and takes work in its window as that date’s', () => {
    const home = careHome({ ownRules: [own], records: [careRecord('restain', '2026-05-20')] });
    expect(itemOf(home, 'restain', '2026-05-21')).toMatchObject({ startOn: '2026-05-20', dueOn: '2029-06-15' });
  });

  it('does not vanish when it restarts on a day that its month lacks', () => {
    const yearly = { ...own, rule: 'FREQ=YEARLY;BYMONTH=6' };
    expect(itemOf(careHome({ ownRules: [yearly], records: [careRecord('restain', '2026-08-31')] }), 'restain')).toMatchObject({ dueOn: '2027-06-30' });
  });

  it('ends with its last date', () => {
    expect(itemOf(careHome({ ownRules: [{ ...own, rule: 'FREQ=YEARLY;UNTIL=20251231' }] }), 'restain')).toBeUndefined();
  });
});

describe('logging', () => {
  it('gives the same plan in any order, and when work is logged twice on a day', () => {
    fc.assert(
      fc.property(anyCareHome, fc.infiniteStream(fc.nat()), fc.integer({ min: 0, max: 11 }), (home, picks, twice) => {
        const shuffled = home.records.map((record) => ({ record, at: picks.next().value ?? 0 })).sort((a, b) => a.at - b.at).map(({ record }) => record);
        const again = home.records[twice];
        expect(planHome({ ...home, records: shuffled }, '2027-08-01')).toEqual(planHome(home, '2027-08-01'));
        if (again) expect(planHome({ ...home, records: [...shuffled, { ...again, id: 'again' }] }, '2027-08-01')).toEqual(planHome(home, '2027-08-01'));
      }),
    );
  });

  it('never asks for film work before or on the day of the work it counts from, nor later than 60 days past its life', () => {
    fc.assert(
      fc.property(anyCareHome, (home) => {
        const items = planHome(home, '2027-08-01').walls.flatMap((wall) => wall.items);
        for (const { startOn, dueOn, window, missedOn, lapsesOn } of items.filter((item) => item.kind === 'restain' || item.kind === 'recaulk')) {
          expect(startOn !== null && startOn < dueOn).toBe(true);
          expect(window.closesOn > (startOn ?? '')).toBe(true);
          expect(lapsesOn).toBe(addDays(window.closesOn, 1));
          expect((missedOn ?? window.closesOn) <= addDays(dueOn, 60)).toBe(true);
        }
      }),
    );
  });
});

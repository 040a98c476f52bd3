import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { addDays, daysBetween } from '@/lib/calendar';
import { planHome } from '@/lib/care';
import { type CareHome, type CareRecord, type WorkItem } from '@/lib/care/types';
import { washMonth } from '@/lib/care/yearly-work';
import { type WorkKind } from '@/lib/schemas/vocabulary';
import { anyCareHome, careHome, careRecord } from '@/tests/fixtures/care-home';

/** Stained and caulked in 2024, so that every date is known. */
const knownHome = (values: Partial<CareHome> = {}, ...more: CareRecord[]) =>
  careHome({ ...values, records: [careRecord('restain', '2024-06-10'), careRecord('recaulk', '2024-06-01'), ...more] });
const itemOf = (home: CareHome, kind: WorkKind, on: string): WorkItem | undefined => planHome(home, on).walls[0]?.items.find((item) => item.kind === kind);
const spell = (item: WorkItem | undefined) => item && [item.window.opensOn, item.window.closesOn, item.lapsesOn];

describe('wash', () => {
  it('falls in the first month of a season that opens in spring, else in April or October', () => {
    expect(washMonth(45, [{ fromMonth: 5, toMonth: 9 }])).toBe(5);
    expect(washMonth(28, [{ fromMonth: 11, toMonth: 4 }])).toBe(4);
    expect(washMonth(20, [{ fromMonth: 1, toMonth: 12 }])).toBe(4);
    expect(washMonth(33, [{ fromMonth: 9, toMonth: 10 }, { fromMonth: 3, toMonth: 5 }])).toBe(3);
    expect(washMonth(-41, [{ fromMonth: 11, toMonth: 3 }])).toBe(11);
    expect(washMonth(-41, [])).toBe(10);
    expect(washMonth(45, [])).toBe(4);
  });

  it('is asked for in that month, then lapses when the next year’s begins', () => {
    const home = knownHome();
    expect(itemOf(home, 'wash', '2026-03-20')).toMatchObject({ rule: 'FREQ=YEARLY;BYMONTH=5;BYMONTHDAY=15', startOn: '2026-03-01', dueOn: '2026-05-15', basis: 'computed' });
    expect(spell(itemOf(home, 'wash', '2026-03-20'))).toEqual(['2026-05-01', '2026-05-31', '2027-05-01']);
    expect(spell(itemOf(home, 'wash', '2027-04-30'))).toEqual(['2026-05-01', '2026-05-31', '2027-05-01']);
    expect(spell(itemOf(home, 'wash', '2027-05-01'))).toEqual(['2027-05-01', '2027-05-31', '2028-05-01']);
  });

  it('is settled by a wash or a restain in its year, or by a late one', () => {
    for (const record of [careRecord('wash', '2026-01-05'), careRecord('wash', '2026-11-05'), careRecord('restain', '2026-08-01')]) {
      expect(spell(itemOf(knownHome({}, record), 'wash', '2026-12-01'))).toEqual(['2027-05-01', '2027-05-31', '2028-05-01']);
    }
    expect(spell(itemOf(knownHome({}, careRecord('wash', '2027-02-05')), 'wash', '2027-03-01'))).toEqual(['2028-05-01', '2028-05-31', '2029-05-01']);
    expect(spell(itemOf(knownHome({}, careRecord('recaulk', '2026-05-05')), 'wash', '2026-12-01'))).toEqual(['2026-05-01', '2026-05-31', '2027-05-01']);
  });

  it('comes in the southern spring south of the equator', () => {
    const oil = { seasons: [{ fromMonth: 10, toMonth: 3 }] };
    expect(itemOf(knownHome({ latitude: -43.5, seasons: { oil, waterborne: oil } }), 'wash', '2026-03-20')?.window).toMatchObject({ opensOn: '2026-10-01', closesOn: '2026-10-31' });
  });

  it('joins the wall’s restain in its year', () => {
    // 66 months from 10 January 2021: 10 July 2026.
    const home = careHome({ records: [careRecord('restain', '2021-01-10'), careRecord('recaulk', '2024-06-01')] });
    expect(itemOf(home, 'wash', '2026-03-20')).toMatchObject({ basis: 'pulled to the restain', window: { opensOn: '2026-05-01', closesOn: '2026-09-08' }, because: 'The restain of this wall begins with a wash.' });
  });
});

describe('walkaround', () => {
  it('comes in April and October', () => {
    const home = knownHome();
    expect(itemOf(home, 'walkaround', '2026-03-20')).toMatchObject({ rule: 'FREQ=YEARLY;BYMONTH=4,10;BYMONTHDAY=15', basis: 'computed' });
    expect(spell(itemOf(home, 'walkaround', '2026-03-20'))).toEqual(['2026-04-01', '2026-04-30', '2026-10-01']);
    expect(spell(itemOf(home, 'walkaround', '2026-10-01'))).toEqual(['2026-10-01', '2026-10-31', '2027-04-01']);
  });

  it('is settled by a look in its half year, or up to 30 days before', () => {
    const next = (doneOn: string, on: string) => spell(itemOf(knownHome({}, careRecord('walkaround', doneOn)), 'walkaround', on))?.[0];
    expect(next('2026-03-25', '2026-03-26')).toBe('2026-10-01');
    expect(next('2026-08-10', '2026-08-11')).toBe('2026-10-01');
    expect(next('2026-09-10', '2026-09-11')).toBe('2027-04-01');
    expect(next('2026-02-10', '2026-03-26')).toBe('2026-04-01');
  });
});

describe('own rules for yearly work', () => {
  const own = { wallId: 'w1', kind: 'wash' as const, rule: 'FREQ=MONTHLY;INTERVAL=2', startOn: '2026-04-30' };

  it('are asked for month by month', () => {
    expect(itemOf(knownHome({ ownRules: [own] }), 'wash', '2026-06-20')).toMatchObject({ dueOn: '2026-06-30', basis: 'own rule', lapsesOn: '2026-08-01' });
    expect(itemOf(knownHome({ ownRules: [own] }, careRecord('wash', '2026-06-02')), 'wash', '2026-06-20')).toMatchObject({ dueOn: '2026-08-30', lapsesOn: '2026-10-01' });
  });

  it('end with their last date', () => {
    const ended = { ...own, rule: 'FREQ=MONTHLY;INTERVAL=2;COUNT=1' };
    expect(itemOf(knownHome({ ownRules: [ended] }), 'wash', '2026-06-20')).toMatchObject({ dueOn: '2026-04-30', lapsesOn: null });
    expect(itemOf(knownHome({ ownRules: [ended] }, careRecord('wash', '2026-04-30')), 'wash', '2026-06-20')).toBeUndefined();
  });
});

describe('dates that nobody knows', () => {
  it('bring one walkaround forward to the 30 days after setting up, and no made-up date', () => {
    const items = planHome(careHome(), '2026-03-20').walls[0]?.items ?? [];
    expect(items.map(({ kind }) => kind)).toEqual(['walkaround', 'wash']);
    expect(items[0]).toMatchObject({ rule: null, startOn: null, basis: 'date not known', window: { opensOn: '2026-03-20', closesOn: '2026-04-19' }, lapsesOn: '2026-10-01' });
    expect(items[0]?.because).toBe('Nobody knows when this wall was last stained or caulked, so walk around it first. Logging those days, or a restain and a recaulk, settles it.');
  });

  it('say which date is missing', () => {
    expect(itemOf(careHome({ records: [careRecord('restain', '2024-06-10')] }), 'walkaround', '2026-03-20')?.because).toMatch(/last caulked, .* or a recaulk/);
    expect(itemOf(careHome({ records: [careRecord('recaulk', '2024-06-10')] }), 'walkaround', '2026-03-20')?.because).toMatch(/last stained, .* or a restain/);
  });

  it('stay not known after the look, which comes again in its season', () => {
    const home = careHome({ records: [careRecord('walkaround', '2026-03-28')] });
    expect(itemOf(home, 'walkaround', '2026-03-29')).toMatchObject({ basis: 'date not known', rule: 'FREQ=YEARLY;BYMONTH=4,10;BYMONTHDAY=15', window: { opensOn: '2026-10-01' } });
  });

  it('are settled by logged work', () => {
    expect(itemOf(knownHome(), 'walkaround', '2026-03-20')?.basis).toBe('computed');
  });
});

describe('the plan between two lapses', () => {
  it('is the same on every day', () => {
    fc.assert(
      fc.property(anyCareHome, fc.integer({ min: 0, max: 900 }), fc.double({ min: 0, max: 1, noNaN: true }), (home, start, share) => {
        const from = addDays('2026-03-20', start);
        const plan = planHome(home, from);
        const lapsesOn = plan.walls.flatMap((wall) => wall.items.flatMap((item) => item.lapsesOn ?? [])).sort()[0] ?? '';
        expect(lapsesOn > from).toBe(true);
        const last = addDays(lapsesOn, -1);
        expect(planHome(home, addDays(from, Math.round(daysBetween(from, last) * share)))).toEqual(plan);
        expect(planHome(home, last)).toEqual(plan);
      }),
    );
  });
});

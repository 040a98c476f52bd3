import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { nextItem, planHome, visitsOf, workState } from '@/lib/care';
import { anyCareHome, careHome, careRecord, careWall } from '@/tests/fixtures/care-home';

const walls = [careWall({ id: 'w2', name: 'North', position: 1, doseKwhM2: 250 }), careWall()];
const both = { wallIds: ['w1', 'w2'] };
// Coat 66 months on w1 and 78 on w2; caulk 90 and 114 months (severity 0.5 and 0.4 × 0.5 = 0.2: 5–10 years, 7.5 and 9 years).
const home = careHome({
  walls,
  records: [careRecord('restain', '2021-01-10', { wallIds: ['w1'] }), careRecord('restain', '2020-02-10', { wallIds: ['w2'] }), careRecord('recaulk', '2025-06-01', both), careRecord('walkaround', '2026-03-10', both)],
});

describe('visits', () => {
  it('gather the work of one season, walls in plan order and work in working order', () => {
    // w1 due 10 July 2026, window May to 8 September; w2 due 10 August 2026, window May to September.
    const [first] = planHome(home, '2026-03-20').visits;
    expect(first).toMatchObject({ opensOn: '2026-05-01', closesOn: '2026-09-08' });
    expect(first?.items.map(({ wallId, kind }) => `${wallId} ${kind}`)).toEqual(['w1 wash', 'w1 restain', 'w2 wash', 'w2 restain']);
  });

  it('keep work apart that shares no day', () => {
    const visits = planHome({ ...home, costs: { ...home.costs, tripCents: 0 } }, '2026-03-20').visits;
    expect(visits.map(({ opensOn, items }) => [opensOn, items.length])).toEqual([['2026-05-01', 4], ['2026-10-01', 2], ['2032-05-01', 1], ['2034-05-01', 1]]);
  });

  it('hold every item once, on days that suit all of a visit', () => {
    fc.assert(
      fc.property(anyCareHome, (any) => {
        const items = planHome(any, '2027-08-01').walls.flatMap((wall) => wall.items);
        const visits = visitsOf(items);
        expect(visits.flatMap((visit) => visit.items).length).toBe(items.length);
        expect(new Set(visits.flatMap((visit) => visit.items))).toEqual(new Set(items));
        for (const visit of visits) {
          expect(visit.opensOn <= visit.closesOn).toBe(true);
          for (const { window } of visit.items) expect(window.opensOn <= visit.opensOn && visit.closesOn <= window.closesOn).toBe(true);
        }
        expect(visits.map(({ opensOn }) => opensOn)).toEqual(visits.map(({ opensOn }) => opensOn).sort());
      }),
    );
  });
});

describe('how work stands', () => {
  const item = { window: { opensOn: '2027-05-01', closesOn: '2027-08-09', moved: 'in season' as const }, missedOn: null };

  it('goes by the window', () => {
    const states = ['2027-03-01', '2027-03-02', '2027-04-30', '2027-05-01', '2027-08-09', '2027-08-10'].map((day) => workState(item, day));
    expect(states).toEqual(['later', 'due soon', 'due soon', 'due', 'due', 'overdue']);
  });

  it('is overdue from the first window that was missed', () => {
    expect(workState({ ...item, missedOn: '2026-08-09' }, '2027-03-01')).toBe('overdue');
  });
});

describe('the most pressing work', () => {
  it('is overdue work first, then what closes first', () => {
    expect(nextItem(planHome(home, '2026-03-20'), '2026-03-20')).toMatchObject({ kind: 'wash', wallId: 'w1' });
    expect(nextItem(planHome(home, '2026-10-05'), '2026-10-05')).toMatchObject({ kind: 'wash', wallId: 'w1', window: { closesOn: '2026-05-31' } });
    expect(nextItem({ homeId: 'h', walls: [], visits: [], grouping: { months: 0, choices: [] } }, '2026-10-05')).toBeUndefined();
  });
});

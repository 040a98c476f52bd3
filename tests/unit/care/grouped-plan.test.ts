import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { addDays, daysBetween } from '@/lib/calendar';
import { groupedPlan } from '@/lib/care/grouped-plan';
import { planWall } from '@/lib/care/plan';
import { type CareHome, type CareRecord, type WorkItem } from '@/lib/care/types';
import { workKey } from '@/lib/care/work-key';
import { anyCareHome, careHome, careRecord, careWall } from '@/tests/fixtures/care-home';

const today = '2026-12-01';
const front = careWall({ id: 'f', name: 'Front' });
const back = careWall({ id: 'b', name: 'Back', position: 1 });
const plans = (home: CareHome, on = today) => home.walls.map((wall) => planWall(home, wall, on));
const grouped = (home: CareHome, on = today) => groupedPlan(home, plans(home, on), on);
const itemOf = (home: CareHome, wallId: string, kind: WorkItem['kind'], on = today) => grouped(home, on).walls.find((wall) => wall.wallId === wallId)?.items.find((item) => item.kind === kind);
const spell = (item: WorkItem | undefined) => item && [item.window.opensOn, item.window.closesOn, item.basis];
const at = (records: CareRecord[], values: Partial<CareHome> = {}) => careHome({ walls: [front, back], records, ...values });
const on = (wallId: string) => ({ wallIds: [wallId] });

/*
 * Coats of 66 months. Front of 10 December 2021: used up on 10 June 2027, window 1 May to 9 August 2027. Back of 10 November 2022:
 * used up on 10 May 2028, window from 1 May 2028. 335 days are 11.0 months; 11.0 / 66 × 25.08 m² × $5.50 = $23.00, a trip is $90.
 */
const apart = [careRecord('restain', '2021-12-10', on('f')), careRecord('restain', '2022-11-10', on('b'))];

describe('a wall that is due a season later', () => {
  test('joins the trip for the first one, and says what that throws away and saves', () => {
    const item = itemOf(at(apart), 'b', 'restain');
    expect(item).toMatchObject({ dueOn: '2028-05-10', window: { opensOn: '2027-05-01', closesOn: '2027-08-09', moved: 'to a visit' }, basis: 'joined to a visit', lapsesOn: '2027-08-10', missedOn: null });
    expect(item?.because).toBe('Done in one trip with Front: it throws away 11 months of this coat, about $23, and saves a trip of about $90; on its own it would last until early May 2028.');
    expect(item?.explanation).toMatchObject({ value: 'May 1 – August 9, 2027', inputs: expect.arrayContaining([{ label: 'Window on its own', value: 'May 1 – July 9, 2028' }, { label: 'A trip at this home’s prices', value: '$90' }]) });
    expect(item?.explanation.sources.filter(({ text }) => /another trip|first film is used up/.test(text)).map(({ ground }) => ground)).toEqual(['our rule', 'our rule']);
    expect(grouped(at(apart)).grouping.months).toBe(12);
  });

  test('stays in its own season where a trip costs less than that', () => {
    const cheap = at(apart, { costs: { ...careHome().costs, tripCents: 2200 } });
    expect(spell(itemOf(cheap, 'b', 'restain'))).toEqual(['2028-05-01', '2028-07-09', 'computed']);
  });

  test('stays where its own coat cannot cure in that season’s days', () => {
    const home = { ...at(apart), walls: [front, { ...back, stainBase: 'waterborne' as const }], seasons: { oil: { seasons: [{ fromMonth: 5, toMonth: 6 }] }, waterborne: { seasons: [{ fromMonth: 7, toMonth: 8 }] } } };
    expect(itemOf(home, 'b', 'restain')?.basis).toBe('computed');
  });

  test('shares only the days on which its own coat can cure', () => {
    const home = { ...at(apart), walls: [front, { ...back, stainBase: 'waterborne' as const }] };
    expect(spell(itemOf(home, 'b', 'restain'))).toEqual(['2027-06-01', '2027-08-09', 'joined to a visit']);
  });

  test('stays when somebody put it off past the trip, followed an own rule, or found it due', () => {
    const home = at(apart);
    const item = plans(home)[1]?.items.find(({ kind }) => kind === 'restain');
    expect(itemOf({ ...home, deferrals: [{ workKey: item ? workKey(item) : '', notBefore: '2028-05-01' }] }, 'b', 'restain')?.basis).toBe('computed');
    const ownRules = [{ wallId: 'b', kind: 'restain' as const, rule: 'FREQ=YEARLY;INTERVAL=5;BYMONTH=6;BYMONTHDAY=15', startOn: '2023-06-16' }];
    expect(spell(itemOf({ ...home, ownRules }, 'b', 'restain'))).toEqual(['2028-05-01', '2028-08-14', 'own rule']);
    expect(itemOf({ ...home, findings: [{ wallId: 'b', recordId: 'r', on: '2026-11-20', coat: 'due', seal: null }] }, 'b', 'restain')?.basis).toBe('found');
  });
});

test('two walls that share a later trip: neither claims to save it alone', () => {
  const left = careWall({ id: 'l', name: 'Left side', position: 2 });
  const home = { ...at([...apart, careRecord('restain', '2022-11-20', on('l'))]), walls: [front, back, left] };
  expect(itemOf(home, 'b', 'restain')?.because).toContain('about $23, less than another trip of about $90; on its own');
  expect(itemOf(home, 'l', 'restain')?.basis).toBe('joined to a visit');
});

test('caulk that goes with the restain goes with it to the earlier trip, and so does the wash of that year', () => {
  // Caulk of 90 months from 10 May 2021: used up on 10 November 2028, six months after the coat.
  const home = at([...apart, careRecord('recaulk', '2021-05-10', on('b')), careRecord('wash', '2026-05-10', { wallIds: ['f', 'b'] })]);
  const item = itemOf(home, 'b', 'recaulk');
  expect(spell(item)).toEqual(['2027-05-01', '2027-08-09', 'pulled to the restain']);
  expect(item?.because).toMatch(/on its own the caulk would last until early November 2028\. That restain shares an earlier trip\.$/);
  expect(spell(itemOf(home, 'b', 'wash'))).toEqual(['2027-05-01', '2027-08-09', 'pulled to the restain']);
});

test('the wash of the year that a restain leaves goes back to its own month', () => {
  // Washed early in 2027, so the next wash is that of 2028; the restain of 2028 moves to the trip of 2027.
  const home = at([...apart, careRecord('wash', '2027-03-10', { wallIds: ['f', 'b'] })]);
  expect(spell(plans(home, '2027-03-20')[1]?.items.find(({ kind }) => kind === 'wash'))).toEqual(['2028-05-01', '2028-07-09', 'pulled to the restain']);
  expect(spell(itemOf(home, 'b', 'wash', '2027-03-20'))).toEqual(['2028-05-01', '2028-05-31', 'computed']);
});

test('a home of one wall, or without known dates, is left as it was', () => {
  const bare = at([]);
  expect(grouped(bare)).toEqual({ walls: plans(bare), grouping: { months: 0, choices: [] } });
  const single = careHome({ walls: [front], records: [careRecord('restain', '2021-12-10', on('f'))] });
  expect(grouped(single).walls).toEqual(plans(single));
});

const items = (walls: { items: WorkItem[] }[]) => walls.flatMap((wall) => wall.items);

describe('in any home', () => {
  test('only computed work moves, earlier, never into a time that has passed, and its date stays', () => {
    fc.assert(
      fc.property(anyCareHome, fc.integer({ min: 0, max: 100_000 }), (made, tripCents) => {
        const home = { ...made, costs: { ...made.costs, tripCents } };
        const before = items(plans(home));
        const after = items(grouped(home).walls);
        expect(after).toHaveLength(before.length);
        before.forEach((old, i) => {
          const now = after[i] as WorkItem;
          expect([now.wallId, now.kind, now.dueOn, now.missedOn]).toEqual([old.wallId, old.kind, old.dueOn, old.missedOn]);
          if (now.kind === 'wash' || now.window.moved !== 'to a visit') return;
          expect(['computed', 'pulled to the restain']).toContain(old.basis);
          expect(now.window.closesOn < old.window.opensOn && now.window.closesOn >= today && now.window.opensOn <= now.window.closesOn).toBe(true);
          expect(now.lapsesOn).toBe(addDays(now.window.closesOn, 1));
        });
      }),
      { numRuns: 200 },
    );
  });

  test('the plan is the same on every day until the next one on which it lapses', () => {
    fc.assert(
      fc.property(anyCareHome, fc.double({ min: 0, max: 1, noNaN: true }), (home, share) => {
        const plan = grouped(home);
        const lapses = items(plan.walls).flatMap(({ lapsesOn }) => lapsesOn ?? []).sort()[0];
        const later = addDays(today, Math.floor(share * Math.max(0, daysBetween(today, lapses ?? '2027-12-01') - 1)));
        expect(grouped(home, later)).toEqual(plan);
      }),
      { numRuns: 100 },
    );
  });
});

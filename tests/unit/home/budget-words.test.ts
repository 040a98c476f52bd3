import { describe, expect, test } from 'vitest';
import { type Budget, type BudgetYear } from '@/lib/care/budget';
import { type TripItem } from '@/lib/care/years-ahead';
import { missingWords, sharingChange, yearWords } from '@/lib/home/budget-words';

const walls = [{ id: 'f', name: 'Front' }, { id: 'l', name: 'Left side' }, { id: 'b', name: 'Back' }];
const item = (wallId: string, kind: TripItem['kind'], stripCents = 0): TripItem => ({ wallId, kind, cents: 100, stripCents, thrownAwayMonths: 0 });
const year = (values: Partial<BudgetYear>): BudgetYear => ({ year: 2027, tripCents: 0, restainCents: 0, stripCents: 0, recaulkCents: 0, washCents: 0, cents: 0, trips: [], washed: [], ...values });

describe('a year in words', () => {
  test('a sentence a trip, and one for the wash', () => {
    const trips = [
      { on: '2027-06-10', cents: 0, items: [item('b', 'restain', 5000), item('f', 'restain'), item('f', 'recaulk')] },
      { on: '2027-09-01', cents: 0, items: ['f', 'l', 'b'].map((id) => item(id, 'recaulk')) },
    ];
    expect(yearWords(year({ trips, washed: ['l'] }), walls)).toEqual(['June: strip and restain Back; restain Front; recaulk Front.', 'September: recaulk all 3 walls.', 'Wash Left side.']);
  });

  test('a year without work has none', () => expect(yearWords(year({}), walls)).toEqual([]));
});

test('what is not counted is named', () => {
  const plan = (missing: Budget['missing']): Budget => ({ years: [], cents: 0, yearlyCents: 0, from: '2027-01-01', through: '2041-12-31', missing });
  expect(missingWords(plan([{ wallId: 'f', kind: 'restain' }, { wallId: 'f', kind: 'recaulk' }, { wallId: 'b', kind: 'recaulk' }]), walls)).toBe('Not counted, because there is no day to count from: the restain of Front; the recaulk of Front and Back.');
  expect(missingWords(plan([]), walls)).toBeNull();
});

test('a change in the sharing of trips is said, and only a change', () => {
  expect(sharingChange(0, 12)).toBe('Walls due within 12 months of a trip may share it.');
  expect(sharingChange(12, 0)).toBe('Each wall waits for its own season.');
  expect(sharingChange(12, 12)).toBeNull();
});

import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { addDays, addMonths, daysBetween, isCalendarDay, yearOf } from '@/lib/calendar';
import { planHome } from '@/lib/care';
import { type CareFinding, type CareHome, type CareRecord, type WorkItem } from '@/lib/care/types';
import { workKey } from '@/lib/care/work-key';
import { filmStates, keysOf } from '@/lib/schemas/vocabulary';
import { anyCareHome } from '@/tests/fixtures/care-home';

const state = fc.option(fc.constantFrom(...keysOf(filmStates)), { nil: null });
const anyFinding: fc.Arbitrary<Omit<CareFinding, 'recordId'>> = fc.record({
  wallId: fc.constantFrom('w1', 'w2'),
  on: fc.integer({ min: 0, max: 6500 }).map((n) => addDays('2010-01-01', n)),
  coat: state,
  seal: state,
});
/** Homes whose walls were also looked at, and some of whose work was put off. */
const anyHistory: fc.Arbitrary<CareHome> = fc
  .record({ home: anyCareHome, findings: fc.array(anyFinding, { maxLength: 8 }), putOff: fc.array(fc.nat({ max: 7 }), { maxLength: 2 }), later: fc.integer({ min: 1, max: 500 }) })
  .map(({ home, findings, putOff, later }) => {
    const seen: CareHome = { ...home, findings: findings.map((one, i) => ({ ...one, recordId: `f${i}` })) };
    const items = planHome(seen, '2027-08-01').walls.flatMap((wall) => wall.items);
    const chosen = putOff.flatMap((i) => items[i] ?? []);
    return { ...seen, deferrals: chosen.map((item) => ({ workKey: workKey(item), notBefore: addDays(item.window.closesOn, later) })) };
  });

const isFilm = ({ kind }: WorkItem) => kind === 'restain' || kind === 'recaulk';
const itemsOf = (home: CareHome, today: string) => planHome(home, today).walls.flatMap((wall) => wall.items);

describe('any history', () => {
  it('asks for each kind of work on each wall once, on days that exist, in a window that is not over', () => {
    fc.assert(
      fc.property(anyHistory, fc.integer({ min: 0, max: 3000 }), (home, later) => {
        const today = addDays('2027-08-01', later);
        const items = itemsOf(home, today);
        expect(new Set(items.map(({ wallId, kind }) => `${wallId} ${kind}`)).size).toBe(items.length);
        for (const { window, dueOn, missedOn } of items) {
          for (const day of [window.opensOn, window.closesOn, dueOn, missedOn ?? today]) expect(isCalendarDay(day)).toBe(true);
          expect(window.opensOn <= window.closesOn).toBe(true);
        }
        for (const item of items.filter(isFilm)) {
          expect(item.window.closesOn >= today).toBe(true);
          expect(item.window.opensOn > (item.startOn ?? '')).toBe(true);
        }
      }),
    );
  });

  it('loses no work: a wall has its walkaround and wash, and its film work exactly when its film has a day', () => {
    fc.assert(
      fc.property(anyHistory, (home) => {
        for (const { coat, seal, items } of planHome(home, '2027-08-01').walls) {
          const has = (kind: string) => items.some((item) => item.kind === kind);
          expect([has('walkaround'), has('wash'), has('restain'), has('recaulk')]).toEqual([true, true, coat.startedOn !== null, seal.startedOn !== null]);
        }
      }),
    );
  });

  it('does not depend on the order in which work and findings were written down', () => {
    fc.assert(
      fc.property(anyHistory, fc.infiniteStream(fc.double({ min: 0, max: 1, noNaN: true })), (home, random) => {
        const shuffled = <T>(list: readonly T[]) => list.map((value) => ({ value, at: random.next().value as number })).sort((a, b) => a.at - b.at).map(({ value }) => value);
        const again = { ...home, records: shuffled(home.records), findings: shuffled(home.findings), deferrals: shuffled(home.deferrals) };
        expect(planHome(again, '2027-08-01')).toEqual(planHome(home, '2027-08-01'));
      }),
    );
  });

  it('keeps a film’s life within its published range times its factor, which stays between a half and two', () => {
    fc.assert(
      fc.property(anyHistory, (home) => {
        for (const film of planHome(home, '2027-08-01').walls.flatMap(({ coat, seal }) => [coat, seal])) {
          expect(film.factor >= 0.5 && film.factor <= 2).toBe(true);
          expect(film.lifeMonths).toBeGreaterThanOrEqual(Math.round(film.lowYears * 12 * film.factor) - 1);
          expect(film.lifeMonths).toBeLessThanOrEqual(Math.round(film.highYears * 12 * film.factor) + 1);
        }
      }),
    );
  });

  it('is south of the equator what it is north of it half a year later', () => {
    fc.assert(
      fc.property(anyHistory, (home) => {
        const wash = (latitude: number) => itemsOf({ ...home, latitude, records: [], findings: [], deferrals: [], seasons: { oil: { seasons: [] }, waterborne: { seasons: [] } } }, '2026-03-20').find(({ kind }) => kind === 'wash')?.dueOn.slice(5, 7);
        expect([wash(45), wash(-45)]).toEqual(['04', '10']);
      }),
      { numRuns: 5 },
    );
  });
});

/** Somebody who does everything that is asked for, on some day of its window, for so many years. */
function lived(home: CareHome, years: number, pick: () => number): CareRecord[] {
  const done: CareRecord[] = [];
  let today = home.since;
  const end = addMonths(today, years * 12);
  for (let i = 0; today < end; i += 1) {
    if (i > 40 * years) throw new Error('the plan asks for the same work again and again');
    const items = itemsOf({ ...home, records: [...home.records, ...done] }, today);
    // What closes first is done first, so that nothing is missed.
    const next = items.toSorted((a, b) => (a.window.closesOn < b.window.closesOn ? -1 : 1))[0];
    if (!next) throw new Error('the plan has run out of work');
    const from = next.window.opensOn > today ? next.window.opensOn : today;
    today = addDays(from, Math.floor(pick() * (daysBetween(from, next.window.closesOn) + 1)));
    done.push({ id: `d${i}`, kind: next.kind, doneOn: today, wallIds: [next.wallId] });
  }
  return done;
}

describe('twelve years of doing what is asked', () => {
  const start = fc.constantFrom('2024-02-29', '2023-08-31', '2025-12-31', '2025-06-15');
  const season = fc.constantFrom<CareHome['seasons']['oil']['seasons']>([{ fromMonth: 5, toMonth: 9 }], [{ fromMonth: 11, toMonth: 2 }], [{ fromMonth: 1, toMonth: 12 }], [{ fromMonth: 7, toMonth: 7 }], [{ fromMonth: 3, toMonth: 5 }, { fromMonth: 9, toMonth: 10 }]);

  it('washes every spring, walks around twice a year, and renews each film once a life: no occurrence is lost and none comes twice', () => {
    fc.assert(
      fc.property(anyCareHome, start, season, fc.infiniteStream(fc.double({ min: 0, max: 0.999, noNaN: true })), (any, startedOn, seasons, random) => {
        const [wall] = any.walls;
        if (!wall) throw new Error('no wall');
        const records: CareRecord[] = (['restain', 'recaulk'] as const).map((kind) => ({ id: kind, kind, doneOn: startedOn, wallIds: [wall.id] }));
        const home: CareHome = { ...any, walls: [wall], records, seasons: { oil: { seasons }, waterborne: { seasons } }, since: startedOn };
        const years = 12;
        const done = lived(home, years, () => random.next().value as number);
        const plan = planHome(home, home.since).walls[0];
        for (let year = yearOf(startedOn) + 1; year < yearOf(startedOn) + years; year += 1) {
          const of = (kind: string) => done.filter((record) => record.kind === kind && yearOf(record.doneOn) === year).length;
          expect([year, of('wash') + of('restain') >= 1, of('wash') <= 1, of('walkaround')]).toEqual([year, true, true, 2]);
        }
        for (const [kind, film] of [['restain', plan?.coat], ['recaulk', plan?.seal]] as const) {
          const days = [startedOn, ...done.filter((record) => record.kind === kind).map(({ doneOn }) => doneOn)];
          const life = (film?.lifeMonths ?? 0) * 30.44;
          days.slice(1).forEach((day, i) => {
            const gap = daysBetween(days[i] ?? day, day);
            // At most 60 days past its life (our rule); only a film whose season had begun when it was put on waits for the next one.
            expect([kind, gap <= life + 62 || gap <= 366 + 92]).toEqual([kind, true]);
            expect([kind, gap > 0]).toEqual([kind, true]);
          });
          expect(daysBetween(days.at(-1) ?? '', addMonths(startedOn, years * 12))).toBeLessThanOrEqual(Math.max(life, 366) + 366);
        }
      }),
      { numRuns: 40 },
    );
  });
});

import fc from 'fast-check';
import ICAL from 'ical.js';
import { describe, expect, it } from 'vitest';
import { addDays, addMonths } from '@/lib/calendar';
import { planHome } from '@/lib/care';
import { computedWork, previewOwnRule } from '@/lib/care/own-preview';
import { readSimple, ruleInWords, type SimpleRule, simpleRule, tidyRule } from '@/lib/care/own-rule';
import { withSafeDay } from '@/lib/care/rule-build';
import { expandRule } from '@/lib/care/rule-expand';
import { previewRule, restartFault } from '@/lib/care/rule-preview';
import { type OwnRule } from '@/lib/care/types';
import { keysOf, workKinds } from '@/lib/schemas/vocabulary';
import { anyCareHome, careHome, careRecord } from '@/tests/fixtures/care-home';

const today = '2026-12-01';
const simple: fc.Arbitrary<SimpleRule> = fc.oneof(
  fc.record({ every: fc.integer({ min: 1, max: 30 }), unit: fc.constant('years' as const), months: fc.subarray([1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12]) }),
  fc.record({ every: fc.integer({ min: 1, max: 360 }), unit: fc.constant('months' as const), months: fc.constant<number[]>([]) }),
);
const anyStart = fc.integer({ min: -9000, max: 4000 }).map((n) => addDays(today, n));
const faultOf = (rule: string, startOn = today) => {
  const shown = previewRule(rule, startOn, today);
  return shown.ok ? null : shown.error;
};

describe('the words of a rule', () => {
  it.each([
    ['FREQ=YEARLY;INTERVAL=3;BYMONTH=5,9;BYMONTHDAY=15', 'every 3 years, on May 15 and September 15'],
    ['FREQ=YEARLY;BYMONTH=4,7,10;BYMONTHDAY=15', 'every year, on April 15, July 15 and October 15'],
    ['FREQ=YEARLY;INTERVAL=5', 'every 5 years, counted from the start'],
    ['FREQ=MONTHLY;INTERVAL=62', 'every 62 months (5 years 2 months), counted from the start'],
    ['FREQ=MONTHLY;INTERVAL=6', 'every 6 months, counted from the start'],
    ['FREQ=MONTHLY;INTERVAL=60;BYMONTHDAY=28,29,30,31;BYSETPOS=-1', 'every 60 months (5 years), counted from the start'],
    [' rrule:freq=yearly;bymonth=5;byday=1mo ', 'as written: FREQ=YEARLY;BYMONTH=5;BYDAY=1MO'],
    ['FREQ=YEARLY;BYMONTH=5;BYMONTHDAY=15;COUNT=3', 'as written: FREQ=YEARLY;BYMONTH=5;BYMONTHDAY=15;COUNT=3'],
    ['FREQ=MONTHLY;BYMONTHDAY=31', 'as written: FREQ=MONTHLY;BYMONTHDAY=31'],
  ])('%s', (rule, words) => expect(ruleInWords(rule)).toBe(words));

  it('gives the answers back that a rule was made of', () => {
    fc.assert(
      fc.property(simple, (answers) => {
        expect(readSimple(simpleRule(answers))).toEqual(answers);
      }),
    );
  });

  it('keeps a written rule without blanks, small letters and prefix', () => expect(tidyRule(' RRULE:freq=yearly;bymonth=5 ')).toBe('FREQ=YEARLY;BYMONTH=5'));
});

describe('what is refused', () => {
  it.each([
    ['FREQ=DAILY;BYMONTH=2;BYMONTHDAY=29;BYDAY=MO', 'FREQ=DAILY is too often'],
    ['FREQ=WEEKLY;INTERVAL=52', 'Use FREQ=YEARLY or FREQ=MONTHLY'],
    ['FREQ=HOURLY;INTERVAL=9000', 'FREQ=HOURLY is too often'],
    ['FREQ=MONTHLY;BYMONTHDAY=1,15', 'on December 1, 2026 and again on December 15, 2026'],
    ['FREQ=YEARLY;BYYEARDAY=1,-1', 'on December 31, 2026 and again on January 1, 2027'],
    ['FREQ=YEARLY;BYDAY=MO', 'more often than once a month'],
    ['FREQ=MONTHLY;INTERVAL=12;BYMONTH=5', 'no day in the next 100 years'],
    ['FREQ=YEARLY;BYMONTH=1;BYYEARDAY=366', 'no day in the next 100 years'],
    ['FREQ=YEARLY;BYMONTH=6;BYMONTHDAY=31', 'None of these months has such a day'],
    ['FREQ=YEARLY;BYMONTH=13', 'BYMONTH=13'],
    ['every spring', 'should be a name and a value'],
  ])('%s', (rule, words) => expect(faultOf(rule)).toContain(words));

  it('a rule that has ended, with its last day', () => {
    expect(faultOf('FREQ=YEARLY;BYMONTH=6;BYMONTHDAY=15;COUNT=3', '2022-01-01')).toBe('This rule has no day left: its last one was June 15, 2024.');
    expect(faultOf('FREQ=YEARLY;BYMONTH=6;BYMONTHDAY=15;UNTIL=20261130', '2022-01-01')).toBe('This rule has no day left: its last one was June 15, 2026.');
    expect(faultOf('FREQ=YEARLY;BYMONTH=6;BYMONTHDAY=15;UNTIL=20270615', '2022-01-01')).toBeNull();
  });

  it('a start more than fifty years away', () => {
    expect(previewRule('FREQ=YEARLY', '1976-01-01', today).ok).toBe(true);
    expect(previewRule('FREQ=YEARLY', '1975-12-31', today)).toMatchObject({ ok: false, about: 'startOn' });
    expect(previewRule('FREQ=YEARLY', '2077-01-01', today)).toMatchObject({ ok: false, about: 'startOn' });
  });

  it('a rule for films that the next logged work would leave without a day', () => {
    expect(faultOf('FREQ=MONTHLY;INTERVAL=12;BYMONTH=5', '2027-05-01')).toBeNull();
    expect(restartFault('FREQ=MONTHLY;INTERVAL=12;BYMONTH=5', today)?.error).toContain('would fall on no day again');
    // February 29 every second year: from an odd year on never a leap year.
    expect(restartFault('FREQ=YEARLY;INTERVAL=2;BYMONTH=2;BYMONTHDAY=29', today)?.error).toContain('started in February 2029 it');
    expect(restartFault('FREQ=YEARLY;INTERVAL=3;BYMONTH=2;BYMONTHDAY=29', today)).toBeNull();
    expect(previewOwnRule(careHome(), { wallId: 'w1', kind: 'restain', rule: 'FREQ=MONTHLY;INTERVAL=12;BYMONTH=5', startOn: '2027-05-01' }, today).ok).toBe(false);
    expect(previewOwnRule(careHome(), { wallId: 'w1', kind: 'wash', rule: 'FREQ=MONTHLY;INTERVAL=12;BYMONTH=5', startOn: '2027-05-01' }, today).ok).toBe(true);
  });
});

describe('the days of a rule, against ical.js', () => {
  it('are the next eight of any simple rule', () => {
    fc.assert(
      fc.property(simple, anyStart, (answers, startOn) => {
        // ical.js has its own reading of BYMONTHDAY without BYMONTH in yearly rules; from the 28th on the plan writes such days out.
        fc.pre(Number(startOn.slice(8)) <= 28);
        const walk = ICAL.Recur.fromString(simpleRule(answers)).iterator(ICAL.Time.fromDateString(startOn));
        const through = addMonths(startOn > today ? startOn : today, 1200);
        const days: string[] = [];
        for (let at = walk.next(); at && days.length < 8 && at.toString() <= through; at = walk.next()) if (at.toString() >= today && at.toString() >= startOn) days.push(at.toString());
        const shown = previewRule(simpleRule(answers), startOn, today);
        expect(shown.ok ? shown.days : []).toEqual(days);
      }),
    );
  });
});

describe('what an owner is shown', () => {
  const own = (rule: string, kind: OwnRule['kind'] = 'restain', startOn = '2026-01-01'): OwnRule => ({ wallId: 'w1', kind, rule, startOn });
  const shown = (rule: OwnRule, records = [careRecord('restain', '2024-06-10')]) => {
    const preview = previewOwnRule(careHome({ records }), rule, today);
    if (!preview.ok) throw new Error(preview.error);
    return preview;
  };

  it('the window that each day gets: in a season of May to September, at most 60 days past the day', () => {
    const { days, words } = shown(own('FREQ=YEARLY;INTERVAL=3;BYMONTH=6;BYMONTHDAY=15', 'restain', '2029-01-01'));
    expect(words).toBe('every 3 years, on June 15');
    expect(days.slice(0, 2)).toEqual([
      { dueOn: '2029-06-15', opensOn: '2029-05-01', closesOn: '2029-08-14' },
      { dueOn: '2032-06-15', opensOn: '2032-05-01', closesOn: '2032-08-14' },
    ]);
  });

  it('the whole month for a wash', () => {
    expect(shown(own('FREQ=YEARLY;BYMONTH=6;BYMONTHDAY=15', 'wash', '2027-01-01')).days[0]).toEqual({ dueOn: '2027-06-15', opensOn: '2027-06-01', closesOn: '2027-06-30' });
  });

  it('a day that has passed without the work comes first, with the coming season', () => {
    const { days, missedOn } = shown(own('FREQ=YEARLY;BYMONTH=6;BYMONTHDAY=15'), []);
    expect(days.slice(0, 2)).toEqual([
      { dueOn: '2026-06-15', opensOn: '2027-05-01', closesOn: '2027-09-30' },
      { dueOn: '2027-06-15', opensOn: '2027-05-01', closesOn: '2027-08-14' },
    ]);
    expect(missedOn).toBe('2026-08-14');
  });

  it('counts from the latest work when that is later than the start', () => {
    expect(shown(own('FREQ=MONTHLY;INTERVAL=60', 'restain', '2020-01-01'))).toMatchObject({ countedFrom: '2024-06-10', days: [{ dueOn: '2029-06-10' }, { dueOn: '2034-06-10' }, {}, {}, {}, {}, {}, {}] });
  });

  it('months past the life of the coat, for a restain only', () => {
    const life = planHome(careHome({ records: [careRecord('restain', '2024-06-10')] }), today).walls[0]?.coat.lifeMonths ?? 0;
    expect(shown(own(`FREQ=MONTHLY;INTERVAL=${life}`)).pastLife).toBeNull();
    expect(shown(own(`FREQ=MONTHLY;INTERVAL=${life + 7}`)).pastLife).toMatchObject({ months: 7, lifeMonths: life });
    expect(shown(own(`FREQ=MONTHLY;INTERVAL=${life + 7}`, 'recaulk')).pastLife).toBeNull();
    // 14 dollars a square metre by the example prices, 25.08 m².
    expect(shown(own('FREQ=MONTHLY;INTERVAL=240')).pastLife?.stripCents).toBe(35112);
  });

  it('why a rule leaves nothing to do', () => {
    const wash = (rule: string, startOn: string, records = [careRecord('wash', '2026-12-01')]) => previewOwnRule(careHome({ records }), own(rule, 'wash', startOn), today);
    expect(wash('FREQ=YEARLY;INTERVAL=70', '2020-12-01')).toMatchObject({ ok: false, error: 'The next day of this rule is December 1, 2090: that is too far ahead to plan for.' });
    expect(wash('FREQ=YEARLY;COUNT=1', '2026-12-20')).toMatchObject({ ok: false, error: 'This rule has no day left: the work of its last one is done.' });
    expect(wash('FREQ=YEARLY;COUNT=1', '2026-12-20', [])).toMatchObject({ ok: true, days: [{ dueOn: '2026-12-20' }] });
    expect(previewOwnRule(careHome({ records: [careRecord('restain', '2026-08-01')] }), own('FREQ=YEARLY;BYMONTH=8;BYMONTHDAY=15;UNTIL=20260930'), '2026-08-02')).toMatchObject({ ok: false, error: 'This rule has no day left: the work of its last one is done.' });
  });

  it('what the computed rule says stays the same', () => {
    const home = careHome({ records: [careRecord('restain', '2024-06-10')] });
    const item = planHome(home, today).walls[0]?.items.find(({ kind }) => kind === 'restain');
    expect(computedWork({ ...home, ownRules: [own('FREQ=YEARLY')] }, { wallId: 'w1', kind: 'restain' }, today)).toEqual(item);
  });
});

const written = fc.oneof(
  simple.map(simpleRule),
  fc.tuple(simple.map(simpleRule), fc.constantFrom(';COUNT=2', ';COUNT=9', ';UNTIL=20270101', ';UNTIL=20450630')).map((parts) => parts.join('')),
  fc.constantFrom('FREQ=YEARLY;BYMONTH=5;BYDAY=1MO', 'FREQ=MONTHLY;BYDAY=5MO', 'FREQ=MONTHLY;INTERVAL=2;BYMONTHDAY=-1', 'FREQ=YEARLY;BYYEARDAY=100,200', 'FREQ=YEARLY;BYWEEKNO=20;BYDAY=TU', 'FREQ=YEARLY;INTERVAL=70', 'FREQ=MONTHLY;INTERVAL=12;BYMONTH=5', 'FREQ=YEARLY;BYMONTH=2;BYMONTHDAY=29'),
);

describe('a rule that is accepted', () => {
  it('gives the plan a piece of work on one of its days, the first one shown', () => {
    let accepted = 0;
    fc.assert(
      fc.property(anyCareHome, written, anyStart, fc.constantFrom(...keysOf(workKinds)), (home, rule, startOn, kind) => {
        const own = { wallId: 'w1', kind, rule, startOn };
        const preview = previewOwnRule(home, own, today);
        if (!preview.ok) return;
        accepted += 1;
        const item = planHome({ ...home, ownRules: [own] }, today).walls[0]?.items.find((one) => one.kind === kind);
        const from = item?.startOn ?? '';
        expect(item?.dueOn).toBe(preview.days[0]?.dueOn);
        expect(expandRule(withSafeDay(rule, from), from, item?.dueOn ?? '', item?.dueOn ?? '')).toEqual([item?.dueOn]);
        expect(preview.days.map(({ dueOn }) => dueOn)).toEqual(preview.days.map(({ dueOn }) => dueOn).toSorted());
      }),
    );
    expect(accepted).toBeGreaterThan(20);
  });
});

import { describe, expect, it } from 'vitest';
import { checkRule, expandRule } from '@/lib/care';

const errorOf = (rule: string) => {
  const checked = checkRule(rule);
  return checked.ok ? null : checked.error;
};

describe('rules that can be planned by', () => {
  it.each([
    'FREQ=YEARLY;BYMONTH=5',
    'RRULE:FREQ=MONTHLY;INTERVAL=6',
    ' rrule:freq=weekly;byday=mo ',
    'BYMONTHDAY=-1;FREQ=MONTHLY',
    'FREQ=YEARLY;UNTIL=20301231',
    'FREQ=YEARLY;UNTIL=20301231T235959Z',
    'FREQ=YEARLY;BYMONTH=2;BYMONTHDAY=29',
  ])('%s', (rule) => expect(checkRule(rule)).toEqual({ ok: true }));
});

describe('rules that RFC 5545 §3.3.10 forbids, or that go by the clock', () => {
  it.each([
    ['', /empty/],
    ['every spring', /name and a value/],
    ['INTERVAL=2', /needs a FREQ/],
    ['FREQ=FORTNIGHTLY', /use YEARLY/],
    ['FREQ=DAILY;COUNT=3;UNTIL=20301231', /cannot stand together/],
    ['FREQ=DAILY;DAILY', /name and a value/],
    ['FREQ=DAILY;FREQ=DAILY', /once only/],
    ['FREQ=DAILY;INTERVAL=0', /INTERVAL=0/],
    ['FREQ=DAILY;INTERVAL=-1', /INTERVAL=-1/],
    ['FREQ=DAILY;COUNT=0', /COUNT=0/],
    ['FREQ=DAILY;SEASON=SPRING', /SEASON is not a part/],
    ['FREQ=YEARLY;BYMONTH=13', /BYMONTH=13/],
    ['FREQ=YEARLY;BYMONTH=-1', /BYMONTH=-1/],
    ['FREQ=MONTHLY;BYMONTHDAY=0', /BYMONTHDAY=0/],
    ['FREQ=MONTHLY;BYMONTHDAY=32', /BYMONTHDAY=32/],
    ['FREQ=MONTHLY;BYDAY=XX', /BYDAY=XX/],
    ['FREQ=MONTHLY;BYDAY=0MO', /BYDAY=0MO/],
    ['FREQ=WEEKLY;BYDAY=1MO', /Numbered days/],
    ['FREQ=YEARLY;BYWEEKNO=20;BYDAY=1MO', /Numbered days/],
    ['FREQ=MONTHLY;BYWEEKNO=20', /BYWEEKNO goes with/],
    ['FREQ=MONTHLY;BYYEARDAY=20', /BYYEARDAY does not/],
    ['FREQ=WEEKLY;BYMONTHDAY=20', /BYMONTHDAY does not/],
    ['FREQ=MONTHLY;BYSETPOS=1', /BYSETPOS needs/],
    ['FREQ=YEARLY;UNTIL=20300230', /UNTIL=20300230/],
    ['FREQ=YEARLY;UNTIL=soon', /UNTIL=SOON/],
    ['FREQ=YEARLY;BYMONTH=2,4;BYMONTHDAY=31', /None of these months/],
    ['FREQ=MONTHLY;BYDAY=6MO', /five of one weekday/],
    ['FREQ=MINUTELY', /not by the clock/],
    ['FREQ=DAILY;BYHOUR=9', /not by the clock/],
    ['FREQ=HOURLY;BYDAY=MO', /takes no BY… part/],
    [`FREQ=DAILY;BYMONTH=${'1,'.repeat(250)}1`, /longer than/],
  ])('%.60s', (rule, error) => {
    expect(errorOf(rule)).toMatch(error);
    expect(() => expandRule(rule, '2026-01-01', '2026-01-01', '2027-01-01')).toThrow(RangeError);
  });
});

describe('expansion', () => {
  it('refuses days that do not exist', () => {
    expect(() => expandRule('FREQ=DAILY', '2026-02-30', '2026-01-01', '2026-12-31')).toThrow(RangeError);
  });

  it('stops at ten thousand days instead of running on', () => {
    expect(expandRule('FREQ=DAILY', '2000-01-01', '2000-01-01', '2027-05-18')).toHaveLength(10_000);
    expect(() => expandRule('FREQ=DAILY', '2000-01-01', '2000-01-01', '2027-05-19')).toThrow(/more than 10000 days/);
    expect(() => expandRule('FREQ=HOURLY', '2000-01-01', '2100-01-01', '2100-12-31')).toThrow(/too many occurrences/);
  });

  it('is empty before the start, and when the ends are crossed', () => {
    expect(expandRule('FREQ=DAILY', '2026-05-01', '2026-01-01', '2026-04-30')).toEqual([]);
    expect(expandRule('FREQ=DAILY', '2026-05-01', '2026-06-01', '2026-05-15')).toEqual([]);
  });

  it('skips what a month or year does not have, as the RFC demands', () => {
    expect(expandRule('FREQ=MONTHLY', '2026-01-31', '2026-01-01', '2026-07-31')).toEqual(['2026-01-31', '2026-03-31', '2026-05-31', '2026-07-31']);
    expect(expandRule('FREQ=YEARLY', '2024-02-29', '2024-01-01', '2033-01-01')).toEqual(['2024-02-29', '2028-02-29', '2032-02-29']);
    expect(expandRule('FREQ=MONTHLY;BYDAY=MO;BYSETPOS=-5', '2026-01-01', '2026-01-01', '2026-06-30')).toEqual(['2026-03-02', '2026-06-01']);
  });

  it('joins plain and numbered days', () => {
    // June 2026: Mondays 1, 8, 15, 22, 29; second Tuesday 9.
    expect(expandRule('FREQ=MONTHLY;BYDAY=MO,2TU;COUNT=6', '2026-06-01', '2026-06-01', '2026-07-31')).toEqual(['2026-06-01', '2026-06-08', '2026-06-09', '2026-06-15', '2026-06-22', '2026-06-29']);
  });

  it('counts positions in the whole first week, and takes the weekday of the start for a week number', () => {
    // The week of Wednesday 3 June 2026 has its first chosen day, Monday, before the start.
    expect(expandRule('FREQ=WEEKLY;BYDAY=MO,WE;BYSETPOS=1', '2026-06-03', '2026-06-01', '2026-06-20')).toEqual(['2026-06-08', '2026-06-15']);
    // 11 May 2026 is the Monday of ISO week 20.
    expect(expandRule('FREQ=YEARLY;BYWEEKNO=20', '2026-05-11', '2026-01-01', '2026-12-31')).toEqual(['2026-05-11']);
  });
});

import { describe, expect, it } from 'vitest';
import { aboutDay, aboutRange, exactDay, exactRange, fromToday } from '@/lib/calendar-words';

describe('days in words', () => {
  it('names the third of the month', () => {
    expect(['2027-05-01', '2027-05-10', '2027-05-11', '2027-05-20', '2027-05-21', '2027-05-31'].map(aboutDay)).toEqual([
      'early May 2027', 'early May 2027', 'mid-May 2027', 'mid-May 2027', 'late May 2027', 'late May 2027',
    ]);
  });

  it('writes a day out without a leading zero', () => {
    expect(exactDay('2028-02-09')).toBe('February 9, 2028');
    expect(exactDay('2028-02-29')).toBe('February 29, 2028');
  });

  it('says the year twice only when it differs', () => {
    expect(exactRange('2027-05-15', '2027-08-09')).toBe('May 15 – August 9, 2027');
    expect(exactRange('2027-11-20', '2028-02-10')).toBe('November 20, 2027 – February 10, 2028');
    expect(exactRange('2027-05-15', '2027-05-15')).toBe('May 15, 2027');
    expect(aboutRange('2027-11-25', '2028-02-05')).toBe('late November 2027 to early February 2028');
    expect(aboutRange('2027-05-12', '2027-05-19')).toBe('mid-May 2027');
    expect(aboutRange('2027-04-01', '2027-04-30')).toBe('April 2027');
    expect(aboutRange('2027-06-01', '2027-08-31')).toBe('June to August 2027');
    expect(aboutRange('2027-11-01', '2028-02-29')).toBe('November 2027 to February 2028');
    expect(aboutRange('2027-06-01', '2027-08-30')).toBe('early June to late August 2027');
    expect(aboutRange('2027-05-25', '2027-09-02')).toBe('late May to early September 2027');
  });

  it('counts from today in the largest unit that stays honest', () => {
    const today = '2027-05-15';
    expect(fromToday('2027-05-15', today)).toBe('today');
    expect(fromToday('2027-05-16', today)).toBe('tomorrow');
    expect(fromToday('2027-05-14', today)).toBe('yesterday');
    expect(fromToday('2027-05-28', today)).toBe('in 13 days');
    expect(fromToday('2027-05-29', today)).toBe('in 2 weeks');
    expect(fromToday('2027-06-19', today)).toBe('in 5 weeks');
    expect(fromToday('2027-02-15', today)).toBe('13 weeks ago');
    expect(fromToday('2028-05-15', today)).toBe('in 12 months');
    expect(fromToday('2031-05-15', today)).toBe('in 4 years');
  });
});

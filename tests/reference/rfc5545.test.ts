import { describe, expect, it } from 'vitest';
import { expandRule } from '@/lib/care';
import { rfcExamples } from '@/tests/fixtures/reference/rrule-rfc5545';

describe('examples of RFC 5545 §3.8.5.3, exact', () => {
  it.each(rfcExamples)('$title', ({ start, rule, through, days }) => {
    expect(expandRule(rule, start, start, through ?? '2030-12-31')).toEqual(days);
  });

  it.each(rfcExamples)('$title: any part of it, both ends included', ({ start, rule, days }) => {
    const [first = '', last = ''] = [days[Math.floor(days.length / 3)], days.at(-1)];
    expect(expandRule(rule, start, first, last)).toEqual(days.slice(Math.floor(days.length / 3)));
  });
});

import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { backOffMs, mostAttempts } from '@/lib/mail/back-off';

const minute = 60_000;

describe('the wait after a failed attempt', () => {
  it('doubles from one minute to at most six hours', () => {
    expect([1, 2, 3, 4, 5].map((attempts) => backOffMs(attempts, 0.5) / minute)).toEqual([1, 2, 4, 8, 16]);
    expect(backOffMs(mostAttempts, 0.5)).toBe(6 * 60 * minute);
  });

  it('is spread by a quarter either way and never shorter after a later attempt with the same jitter', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: mostAttempts - 1 }), fc.double({ min: 0, max: 1, noNaN: true }), (attempts, jitter) => {
        const middle = backOffMs(attempts, 0.5);
        expect(backOffMs(attempts, jitter)).toBeGreaterThanOrEqual(0.75 * middle - 1);
        expect(backOffMs(attempts, jitter)).toBeLessThanOrEqual(1.25 * middle + 1);
        expect(backOffMs(attempts + 1, jitter)).toBeGreaterThanOrEqual(backOffMs(attempts, jitter));
      }),
    );
  });

  it('adds up to two to four days before a mail is given up', () => {
    const total = (jitter: number) => Array.from({ length: mostAttempts - 1 }, (_, i) => backOffMs(i + 1, jitter)).reduce((a, b) => a + b);
    const day = 24 * 60 * minute;
    expect(total(0)).toBeGreaterThan(2 * day);
    expect(total(1)).toBeLessThan(4 * day);
  });
});

import { describe, expect, test } from 'vitest';
import { clockText, shadeWords } from '@/lib/day/shade-words';
import { type DaySpan } from '@/lib/sun';

const span = (fromMinute: number, toMinute: number): DaySpan => ({ fromMinute, toMinute, from: fromMinute * 60_000, to: toMinute * 60_000 });
const daylight = span(6 * 60, 20 * 60);
const words = (sun: DaySpan[], shade: DaySpan[]) => shadeWords({ sun, shade }, daylight);

describe('shade in words', () => {
  test.each([[970, '4:10 PM'], [5, '12:05 AM'], [720, '12:00 PM'], [783, '1:05 PM'], [0, 'midnight'], [1440, 'midnight'], [1438, 'midnight'], [719, '12:00 PM']])('minute %d is %s', (minute, text) => {
    expect(clockText(minute)).toBe(text);
  });

  test('the day begins and ends with the light', () => {
    expect(words([span(360, 780)], [span(780, 1200)])).toBe('in the shade from 1:00 PM');
    expect(words([span(780, 1200)], [span(360, 780)])).toBe('in the shade until 1:00 PM');
    expect(words([span(490, 1020)], [span(360, 490), span(1020, 1200)])).toBe('in the shade until 8:10 AM and from 5:00 PM');
    expect(words([span(360, 500), span(1020, 1200)], [span(500, 1020)])).toBe('in the shade from 8:20 AM to 5:00 PM');
  });

  test('minutes at the edge count for nothing', () => {
    expect(words([], [daylight])).toBe('in the shade all day');
    expect(words([span(360, 366)], [span(366, 1200)])).toBe('in the shade all day');
    expect(words([span(360, 1195)], [span(1195, 1200)])).toBe('in the sun all day');
    expect(shadeWords({ sun: [], shade: [] }, null)).toBe('in the shade all day');
  });
});

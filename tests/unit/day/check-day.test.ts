import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { checkDay } from '@/lib/day/check-day';
import { type Day } from '@/lib/day/checks';
import { dayWith, fahrenheit } from '@/tests/fixtures/fine-day';

const rank = { go: 0, wait: 1, no: 2 };
const worse = (change: Partial<Day>) => rank[dayWith(change).verdict];

const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const anyDay: fc.Arbitrary<Day> = fc.record({
  work: fc.constantFrom('restain' as const, 'recaulk' as const),
  base: fc.constantFrom('oil' as const, 'waterborne' as const),
  temperatureC: number(-20, 45),
  lowC: fc.option(number(-25, 30), { nil: undefined }),
  humidityPercent: number(5, 100),
  hoursSinceRain: fc.oneof(number(0, 80), fc.constant(Infinity)),
  hoursToRain: fc.oneof(number(0, 80), fc.constant(Infinity)),
  woodMoisturePercent: fc.option(number(5, 40), { nil: undefined }),
  wallSun: fc.constantFrom(undefined, 'shade' as const, 'sun soon' as const, 'sun' as const),
});
const more = number(0, 20);

describe('our own rules', () => {
  test('a day without rain before and after; while it rains and within 4 hours of rain, none', () => {
    expect([0, 0.5, 23.9, 24, Infinity].map((hoursSinceRain) => dayWith({ hoursSinceRain }).verdict)).toEqual(['no', 'wait', 'wait', 'go', 'go']);
    expect([0, 3.9, 4, 23.9, 24, Infinity].map((hoursToRain) => dayWith({ hoursToRain }).verdict)).toEqual(['no', 'no', 'wait', 'wait', 'go', 'go']);
  });

  test('no stain above 90 °F, no oil below 40 °F at night, no sealant in frost: wait', () => {
    expect([90, 90.1].map((degrees) => dayWith({ temperatureC: fahrenheit(degrees) }).verdict)).toEqual(['go', 'wait']);
    expect([40, 39.9].map((degrees) => dayWith({ base: 'oil', lowC: fahrenheit(degrees) }).verdict)).toEqual(['go', 'wait']);
    expect([0, -0.1].map((lowC) => dayWith({ work: 'recaulk', lowC }).verdict)).toEqual(['go', 'wait']);
  });

  test('each says that it is ours', () => {
    const ours = (change: Partial<Day>) => dayWith(change).checks.filter(({ source }) => source.ground === 'our rule').map(({ what }) => what);
    expect(ours({})).toEqual(['Rain before', 'Rain after']);
    expect(ours({ base: 'oil', temperatureC: 35 })).toEqual(['Temperature now', 'Lowest in the next 24 hours', 'Rain before', 'Rain after']);
  });
});

test('a surface stands 3 °C above the dew point (ISO 8502-4)', () => {
  // Air of 20 °C condenses at 17 °C at 83 % (1.9384 of 2.3393 kPa, IAPWS steam tables, from memory).
  expect([82, 84].map((humidityPercent) => dayWith({ humidityPercent, lowC: 18 }).verdict)).toEqual(['go', 'wait']);
});

describe('whatever the day', () => {
  const never = (name: string, change: (day: Day, by: number) => Partial<Day>) =>
    test(name, () => {
      fc.assert(fc.property(anyDay, more, (day, by) => {
        expect(worse({ ...day, ...change(day, by) })).toBeLessThanOrEqual(worse(day));
      }), { numRuns: 500 });
    });

  never('warmer is never worse up to the hot limit', (day, by) => ({ temperatureC: Math.max(day.temperatureC, Math.min(day.temperatureC + by, fahrenheit(90))) }));
  never('a warmer night is never worse', (day, by) => (day.lowC === undefined ? {} : { lowC: day.lowC + by }));
  never('a longer dry spell before or after is never worse', (day, by) => ({ hoursSinceRain: day.hoursSinceRain + by, hoursToRain: day.hoursToRain + by }));
  never('drier wood is never worse', (day, by) => (day.woodMoisturePercent === undefined ? {} : { woodMoisturePercent: day.woodMoisturePercent - by }));
  never('drier air is never worse where the night is forecast', (day, by) => (day.lowC === undefined ? {} : { humidityPercent: Math.max(1, day.humidityPercent - by) }));
  never('shade is never worse', () => ({ wallSun: 'shade' }));

  test('the verdict is that of its worst check, and each names a limit and a source', () => {
    fc.assert(fc.property(anyDay, fc.constantFrom('us' as const, 'metric' as const), (day, units) => {
      const { verdict, checks } = checkDay(day, units);
      expect(rank[verdict]).toBe(Math.max(...checks.map((check) => rank[check.verdict])));
      for (const { limit, because, source } of checks) expect([limit, because, source.text].every((words) => words.length > 5)).toBe(true);
      expect(checks.map(({ limit, because }) => limit + because).join()).not.toMatch(units === 'us' ? /°C|NaN|Infinity/ : /°F|NaN|Infinity/);
    }));
  });
});

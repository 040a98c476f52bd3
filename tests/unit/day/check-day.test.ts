import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { checkDay } from '@/lib/day/check-day';
import { type Day } from '@/lib/day/checks';

const fine: Day = { work: 'restain', base: 'waterborne', temperatureC: 20, lowC: 12, humidityPercent: 50, hoursSinceRain: 48, hoursToRain: 48, woodMoisturePercent: 12, wallSun: 'shade' };
const of = (change: Partial<Day>) => checkDay({ ...fine, ...change }, 'us');
const rank = { go: 0, wait: 1, no: 2 };
const worse = (change: Partial<Day>) => rank[of(change).verdict];
const fahrenheit = (degrees: number) => ((degrees - 32) * 5) / 9;

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

describe('limits of the Wood Handbook, FPL-GTR-190, p. 16-23', () => {
  test.each([
    ['waterborne', 50, 'go'], ['waterborne', 49.9, 'wait'], ['waterborne', 40.9, 'no'],
    ['oil', 40, 'go'], ['oil', 39.9, 'wait'], ['oil', 30, 'no'],
  ] as const)('%s at %d °F: %s', (base, degrees, verdict) => {
    expect(of({ base, temperatureC: fahrenheit(degrees), humidityPercent: 40 }).verdict).toBe(verdict);
  });

  test('a waterborne finish needs 50 °F all night', () => {
    expect(of({ lowC: fahrenheit(50) }).verdict).toBe('go');
    expect(of({ lowC: fahrenheit(49.9) }).verdict).toBe('no');
  });

  test('without a forecast the dew point stands for the night', () => {
    // Air of 20 °C condenses at 10.0 °C from 52.5 % on: 1.2282 of 2.3393 kPa (IAPWS steam tables).
    expect(of({ lowC: undefined, humidityPercent: 51 }).verdict).toBe('no');
    expect(of({ lowC: undefined, humidityPercent: 54 }).verdict).toBe('go');
  });

  test('oil stays off walls that the sun heats or soon will; waterborne off walls in the sun', () => {
    expect(['shade', 'sun soon', 'sun'].map((wallSun) => of({ base: 'oil', wallSun: wallSun as 'sun' }).verdict)).toEqual(['go', 'wait', 'wait']);
    expect(['shade', 'sun soon', 'sun'].map((wallSun) => of({ wallSun: wallSun as 'sun' }).verdict)).toEqual(['go', 'go', 'wait']);
  });
});

test('sealant between 40 and 100 °F (ASTM C1193)', () => {
  const verdicts = [39, 40, 100, 101].map((degrees) => of({ work: 'recaulk', temperatureC: fahrenheit(degrees), humidityPercent: 30, lowC: 5 }).verdict);
  expect(verdicts).toEqual(['wait', 'go', 'go', 'wait']);
});

test('wood is finished below 20 % moisture', () => {
  expect([19.9, 20].map((woodMoisturePercent) => of({ woodMoisturePercent }).verdict)).toEqual(['go', 'no']);
});

describe('our own rules', () => {
  test('a day without rain before and after; while it rains and within 4 hours of rain, none', () => {
    expect([0, 0.5, 23.9, 24, Infinity].map((hoursSinceRain) => of({ hoursSinceRain }).verdict)).toEqual(['no', 'wait', 'wait', 'go', 'go']);
    expect([0, 3.9, 4, 23.9, 24, Infinity].map((hoursToRain) => of({ hoursToRain }).verdict)).toEqual(['no', 'no', 'wait', 'wait', 'go', 'go']);
  });

  test('no stain above 90 °F, no oil below 40 °F at night, no sealant in frost: wait', () => {
    expect([90, 90.1].map((degrees) => of({ temperatureC: fahrenheit(degrees) }).verdict)).toEqual(['go', 'wait']);
    expect([40, 39.9].map((degrees) => of({ base: 'oil', lowC: fahrenheit(degrees) }).verdict)).toEqual(['go', 'wait']);
    expect([0, -0.1].map((lowC) => of({ work: 'recaulk', lowC }).verdict)).toEqual(['go', 'wait']);
  });

  test('each says that it is ours', () => {
    const ours = (change: Partial<Day>) => of(change).checks.filter(({ source }) => source.ground === 'our rule').map(({ what }) => what);
    expect(ours({})).toEqual(['Rain before', 'Rain after']);
    expect(ours({ base: 'oil', temperatureC: 35 })).toEqual(['Temperature now', 'Lowest in the next 24 hours', 'Rain before', 'Rain after']);
  });
});

test('a surface stands 3 °C above the dew point (ISO 8502-4)', () => {
  // Air of 20 °C condenses at 17 °C at 83 % (1.9384 of 2.3393 kPa, IAPWS steam tables, from memory).
  expect([82, 84].map((humidityPercent) => of({ humidityPercent, lowC: 18 }).verdict)).toEqual(['go', 'wait']);
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

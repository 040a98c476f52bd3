import { describe, expect, test } from 'vitest';
import { readDay } from '@/lib/day/day-form';

const typed = { work: 'restain', base: 'oil', temperature: '68', low: '50', humidity: '45', since: '', until: '30', moisture: '', sun: '' };

describe('the day check as typed', () => {
  test('reads the units of the reader; what is empty is not known, and no rain', () => {
    const { day } = readDay(typed, 'us');
    expect(day).toMatchObject({ work: 'restain', base: 'oil', humidityPercent: 45, hoursSinceRain: Infinity, hoursToRain: 30, woodMoisturePercent: undefined, wallSun: undefined });
    expect(day?.temperatureC).toBeCloseTo(20, 9);
    expect(day?.lowC).toBeCloseTo(10, 9);
    expect(readDay({ ...typed, temperature: '20,5', low: '−3' }, 'metric').day).toMatchObject({ temperatureC: 20.5, lowC: -3 });
  });

  test('an untouched form asks for temperature and humidity and finds no fault', () => {
    expect(readDay({}, 'us')).toEqual({ day: null, faults: {}, missing: { temperature: expect.any(String) as string, humidity: expect.any(String) as string } });
  });

  test.each([['temperature', 'warm'], ['temperature', '200'], ['humidity', '0'], ['humidity', '101'], ['low', '69'], ['since', '-1'], ['until', 'soon'], ['moisture', '1e9']])('%s “%s” is a fault there, and there is no answer', (name, value) => {
    const { day, faults } = readDay({ ...typed, [name]: value }, 'us');
    expect(day).toBeNull();
    expect(Object.keys(faults)).toEqual([name]);
  });

  test('a choice that is none falls back', () => {
    expect(readDay({ ...typed, work: 'x', base: 'toString', sun: 'constructor' }, 'us').day).toMatchObject({ work: 'restain', base: 'waterborne', wallSun: undefined });
  });
});

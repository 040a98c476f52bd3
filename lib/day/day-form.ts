import { type FormValues } from '@/lib/schemas/action-state';
import { stainBases, type UnitSystem } from '@/lib/schemas/vocabulary';
import { fahrenheitToCelsius, temperatureText } from '@/lib/units';
import { type Day, type WallSun } from './checks';

/** `missing` is what an answer still waits for; `faults` is what could not be read. */
export type DayReading = { day: Day | null; faults: Record<string, string>; missing: Record<string, string> };

export const wallSuns: Record<WallSun, string> = { shade: 'In the shade, and for hours to come', 'sun soon': 'In the shade, sun within a few hours', sun: 'In the sun' };

const airC = { min: -40, max: 50 };
const mostHours = 240;

const typed = (values: FormValues, name: string) => (typeof values[name] === 'string' ? values[name].trim() : '');

/** '12', '-3.5', '−3,5'; NaN for anything else. */
const numberOf = (text: string) => (/^[+-]?\d+(\.\d+)?$/.test(text.replace('−', '-').replace(',', '.')) ? Number(text.replace('−', '-').replace(',', '.')) : NaN);

/** The day check as it was typed, temperatures in the reader's units, hours and percents plain. An empty field is not known; no rain for empty hours. */
export function readDay(values: FormValues, units: UnitSystem): DayReading {
  const faults: Record<string, string> = {};
  const missing: Record<string, string> = {};
  const within = (name: string, what: string, low: number, high: number, unit: string): number | undefined => {
    const text = typed(values, name);
    if (text === '') return undefined;
    const value = numberOf(text);
    if (value >= low && value <= high) return value;
    faults[name] = `${what} should be a number from ${low} to ${high}${unit}.`;
    return undefined;
  };
  const celsius = (name: string, what: string): number | undefined => {
    const text = typed(values, name);
    if (text === '') return undefined;
    const value = units === 'us' ? fahrenheitToCelsius(numberOf(text)) : numberOf(text);
    if (value >= airC.min && value <= airC.max) return value;
    faults[name] = `${what} should be a number from ${temperatureText(airC.min, units)} to ${temperatureText(airC.max, units)}.`;
    return undefined;
  };
  const temperatureC = celsius('temperature', 'The temperature');
  const humidityPercent = within('humidity', 'Humidity', 1, 100, ' %');
  const lowC = celsius('low', 'The lowest temperature');
  const hoursSinceRain = within('since', 'Hours since rain', 0, mostHours, '') ?? Infinity;
  const hoursToRain = within('until', 'Hours until rain', 0, mostHours, '') ?? Infinity;
  const woodMoisturePercent = within('moisture', 'Wood moisture', 1, 100, ' %');
  if (typed(values, 'temperature') === '') missing.temperature = 'The temperature is missing.';
  if (typed(values, 'humidity') === '') missing.humidity = 'Humidity is missing: any weather report says it.';
  if (lowC !== undefined && temperatureC !== undefined && lowC > temperatureC) faults.low = 'The lowest of the next 24 hours cannot be above the temperature now.';
  if (temperatureC === undefined || humidityPercent === undefined || Object.keys(faults).length > 0) return { day: null, faults, missing };
  const base = typed(values, 'base');
  const wallSun = typed(values, 'sun');
  const day: Day = {
    work: typed(values, 'work') === 'recaulk' ? 'recaulk' : 'restain',
    base: Object.hasOwn(stainBases, base) ? (base as Day['base']) : 'waterborne',
    temperatureC,
    humidityPercent,
    lowC,
    hoursSinceRain,
    hoursToRain,
    woodMoisturePercent,
    wallSun: Object.hasOwn(wallSuns, wallSun) ? (wallSun as WallSun) : undefined,
  };
  return { day, faults, missing };
}

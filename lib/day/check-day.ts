import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { aboveDew, type Check, type Day, moisture, nightLow, rainAfter, rainBefore, sun, temperatureNow, type Verdict } from './checks';

const order: Record<Verdict, number> = { go: 0, wait: 1, no: 2 };

export type DayAnswer = { verdict: Verdict; checks: Check[] };

/**
 * Whether today is a day for the work: as good as its worst check. Every check carries its limit and who says so.
 * @param units of the words only
 * @throws RangeError for air that `dewPointC` does not know
 * @example checkDay({ work: 'restain', base: 'oil', temperatureC: 18, lowC: 9, humidityPercent: 50, hoursSinceRain: 48, hoursToRain: 72 }, 'us').verdict // 'go'
 */
export function checkDay(day: Day, units: UnitSystem): DayAnswer {
  const checks = [temperatureNow(day, units), nightLow(day, units), sun(day), aboveDew(day, units), rainBefore(day), rainAfter(day), moisture(day)].filter((check) => check !== null);
  const verdict = checks.reduce<Verdict>((worst, check) => (order[check.verdict] > order[worst] ? check.verdict : worst), 'go');
  return { verdict, checks };
}

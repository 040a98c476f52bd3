import { type SeasonMonths } from '@/lib/care/types';
import { monthNames } from '@/lib/calendar-words';
import { type StainBase } from '@/lib/schemas/vocabulary';
import { type Climate } from './home-climate';

export type MonthRating = 'good' | 'marginal' | 'no';
export type CoatingMonth = { month: number; rating: MonthRating; reason: string; threeDryDays: number; nightLowC: number; dayHighC: number };
export type CoatingSeason = { months: CoatingMonth[]; seasons: SeasonMonths[]; warning?: string | undefined };

/** Lowest temperature at which a finish may be put on and cure, °C, and its source. */
export const lowestTemperature: Record<StainBase, { celsius: number; source: string }> = {
  waterborne: { celsius: 10, source: 'Wood Handbook, FPL-GTR-190 (2010), p. 16-23: 50 °F, and expected to stay above it for 24 hours' },
  oil: { celsius: (40 - 32) / 1.8, source: 'Wood Handbook, FPL-GTR-190 (2010), p. 16-23: 40 °F' },
};

/** A night this far under the limit is marginal if the days are warm: paint on a warm day, early. Our rule. */
const marginalBelowC = 5;
/** A warm day is this far above the limit. Our rule. */
const warmDayAboveC = 8;
/** Chance of three dry days in a row, with wet days independent: (1 − wet days/days)³. At least 15 % is good, at least 7 % marginal. Our rule. */
const dryChance = { good: 0.15, marginal: 0.07 };
/** Days over this bring a caution, not a worse rating: no coat goes on a surface hot in the sun (Wood Handbook, p. 16-23); the figure is our rule. */
const hotDayC = 32;

const days = [31, 28.25, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31] as const;
const percent = (share: number) => `${Math.round(share * 100)} %`;
const both = (celsius: number) => `${Math.round(celsius * 1.8 + 32)} °F (${Math.round(celsius)} °C)`;

function rateMonth(climate: Climate, index: number, limitC: number): CoatingMonth {
  const nightLowC = climate.minC[index] ?? 0;
  const dayHighC = climate.maxC[index] ?? 0;
  const threeDryDays = Math.max(0, 1 - (climate.wetDays[index] ?? 0) / (days[index] ?? 30)) ** 3;
  const byNight: MonthRating = nightLowC >= limitC ? 'good' : nightLowC >= limitC - marginalBelowC && dayHighC >= limitC + warmDayAboveC ? 'marginal' : 'no';
  const byRain: MonthRating = threeDryDays >= dryChance.good ? 'good' : threeDryDays >= dryChance.marginal ? 'marginal' : 'no';
  const rating: MonthRating = byNight === 'no' || byRain === 'no' ? 'no' : byNight === 'marginal' || byRain === 'marginal' ? 'marginal' : 'good';
  const night = `nights fall to ${both(nightLowC)}${byNight === 'good' ? '' : `, under the ${both(limitC)} that the coat needs`}`;
  const rain = `${byRain === 'good' ? '' : 'only '}${percent(threeDryDays)} chance of three dry days in a row`;
  const heat = dayHighC > hotDayC ? `; days reach ${both(dayHighC)}: start early and keep to the shade` : '';
  return { month: index + 1, rating, reason: `${monthNames[index]}: ${night}; ${rain}${heat}.`, threeDryDays, nightLowC, dayHighC };
}

/** Runs of months of one rating, joined across the turn of the year. */
function runs(months: CoatingMonth[], wanted: MonthRating): SeasonMonths[] {
  const isIn = (index: number) => months[(index + 12) % 12]?.rating === wanted;
  if (months.every((_, index) => isIn(index))) return [{ fromMonth: 1, toMonth: 12 }];
  const starts = months.flatMap((_, index) => (isIn(index) && !isIn(index - 1) ? [index] : []));
  return starts.map((start) => {
    let end = start;
    while (isIn(end + 1)) end += 1;
    return { fromMonth: start + 1, toMonth: (end % 12) + 1 };
  });
}

/** The two months that come nearest: least shortfall of the night, then driest. */
function bestTwo(months: CoatingMonth[], limitC: number): number[] {
  const shortfall = ({ nightLowC, threeDryDays }: CoatingMonth) => Math.max(0, limitC - nightLowC) / marginalBelowC + Math.max(0, dryChance.good - threeDryDays) / dryChance.good;
  return [...months].sort((a, b) => shortfall(a) - shortfall(b)).slice(0, 2).map(({ month }) => month).sort((a, b) => a - b);
}

/**
 * In which months a coat can cure at a home, each with its reason; runs of good months are the seasons.
 * Where no month is good, the two that come nearest are offered with a warning. Our rule, on published limits (see `lowestTemperature`).
 */
export function coatingSeason(climate: Climate, base: StainBase): CoatingSeason {
  const limitC = lowestTemperature[base].celsius;
  const months = Array.from({ length: 12 }, (_, index) => rateMonth(climate, index, limitC));
  const seasons = runs(months, 'good');
  if (seasons.length > 0) return { months, seasons };
  const two = bestTwo(months, limitC);
  const [first, second] = two as [number, number];
  const together = second - first === 1 || (first === 1 && second === 12);
  const named = two.map((month) => monthNames[month - 1]).join(' and ');
  return {
    months,
    seasons: together ? [first === 1 && second === 12 ? { fromMonth: 12, toMonth: 1 } : { fromMonth: first, toMonth: second }] : two.map((month) => ({ fromMonth: month, toMonth: month })),
    warning: `No month here is safely warm and dry enough. ${named} come nearest: wait for a good forecast and follow the label.`,
  };
}

import { type Source } from '@/lib/explain';
import { type StainBase, type UnitSystem } from '@/lib/schemas/vocabulary';
import { temperatureText } from '@/lib/units';
import { dewPointC } from './dew-point';
import { aboveDewPoint, coldest, dewPointForNight, dryAfter, dryBefore, forSealant, hottestForStain, mayWarmUpC, nightForStain, sunOnWall, woodMoisture } from './limits';

/** 'no': the limit is broken and today will not mend it. 'wait': a better hour or day may come, or only a rule of our own is broken. */
export type Verdict = 'go' | 'wait' | 'no';
export type WallSun = 'shade' | 'sun soon' | 'sun';
export type DayWork = 'restain' | 'recaulk';

/** °C, %, hours. Left out: not known. */
export type Day = {
  work: DayWork;
  base: StainBase;
  temperatureC: number;
  /** Lowest expected in the next 24 hours; without it the dew point stands for it. */
  lowC?: number | undefined;
  humidityPercent: number;
  /** 0 while it rains; Infinity when none is remembered or expected. */
  hoursSinceRain: number;
  hoursToRain: number;
  woodMoisturePercent?: number | undefined;
  wallSun?: WallSun | undefined;
};

export type Check = { what: string; verdict: Verdict; because: string; limit: string; source: Source };

/** Rounding between °F and °C must not turn a limit that is just met. */
const closeC = 1e-9;

const hours = (count: number) => `${Math.round(count * 10) / 10} ${count === 1 ? 'hour' : 'hours'}`;

export function temperatureNow(day: Day, units: UnitSystem): Check {
  const said = (celsius: number) => temperatureText(celsius, units);
  const stain = day.work === 'restain';
  const low = stain ? coldest[day.base] : { celsius: forSealant.coldestC, source: forSealant.source };
  const high = stain ? hottestForStain : { celsius: forSealant.hottestC, source: forSealant.source };
  const at = day.temperatureC;
  const common = { what: 'Temperature now', limit: `${said(low.celsius)} to ${said(high.celsius)}` };
  if (at < low.celsius - mayWarmUpC - closeC) return { ...common, verdict: 'no', because: `${said(at)} is far too cold.`, source: low.source };
  if (at < low.celsius - closeC) return { ...common, verdict: 'wait', because: `${said(at)} is too cold; it may warm up.`, source: low.source };
  if (at > high.celsius + closeC) return { ...common, verdict: 'wait', because: `${said(at)} is too hot; take a cooler hour.`, source: high.source };
  return { ...common, verdict: 'go', because: `${said(at)} is within the limits.`, source: low.source };
}

export function nightLow(day: Day, units: UnitSystem): Check {
  const said = (celsius: number) => temperatureText(celsius, units);
  const rule = day.work === 'restain' ? nightForStain[day.base] : { celsius: forSealant.nightC, source: forSealant.night, short: 'wait' as const };
  const low = day.lowC ?? dewPointC(day.temperatureC, day.humidityPercent);
  const from = day.lowC === undefined ? ', by the dew point' : '';
  const warm = low >= rule.celsius - closeC;
  const source = day.lowC === undefined ? { text: `${rule.source.text}. ${dewPointForNight.text}`, ground: rule.source.ground } : rule.source;
  return {
    what: 'Lowest in the next 24 hours',
    verdict: warm ? 'go' : rule.short,
    because: `${said(low)}${from}: ${warm ? 'warm enough' : 'too cold for fresh work'}.`,
    limit: `at least ${said(rule.celsius)}`,
    source,
  };
}

export function aboveDew(day: Day, units: UnitSystem): Check {
  const dew = dewPointC(day.temperatureC, day.humidityPercent);
  const dry = day.temperatureC - dew >= aboveDewPoint.kelvin;
  return {
    what: 'Damp air',
    verdict: dry ? 'go' : 'wait',
    because: `The dew point is ${temperatureText(dew, units)}: ${dry ? 'the wall stays dry' : 'the wall may be damp with dew'}.`,
    limit: `air at least ${units === 'us' ? '5 °F' : '3 °C'} above its dew point`,
    source: aboveDewPoint.source,
  };
}

export function rainBefore({ hoursSinceRain }: Day): Check {
  const verdict = hoursSinceRain <= 0 ? 'no' : hoursSinceRain < dryBefore.hours ? 'wait' : 'go';
  const because = hoursSinceRain <= 0 ? 'It is raining.' : Number.isFinite(hoursSinceRain) ? `The last rain is ${hours(hoursSinceRain)} ago.` : 'No rain for days.';
  return { what: 'Rain before', verdict, because, limit: `dry for ${hours(dryBefore.hours)}`, source: dryBefore.source };
}

export function rainAfter({ hoursToRain }: Day): Check {
  const verdict = hoursToRain < dryAfter.atLeastHours ? 'no' : hoursToRain < dryAfter.hours ? 'wait' : 'go';
  const because = hoursToRain <= 0 ? 'Rain is about to fall.' : Number.isFinite(hoursToRain) ? `Rain is expected in ${hours(hoursToRain)}.` : 'No rain is expected.';
  return { what: 'Rain after', verdict, because, limit: `dry for ${hours(dryAfter.hours)}`, source: dryAfter.source };
}

/** Nothing where nobody measured. */
export function moisture({ woodMoisturePercent: percent, work }: Day): Check | null {
  if (percent === undefined) return null;
  const dry = percent < woodMoisture.percent;
  return {
    what: work === 'restain' ? 'Wood moisture' : 'Wood moisture at the joint',
    verdict: dry ? 'go' : 'no',
    because: `${percent} % is ${dry ? 'dry enough' : 'too wet'}.`,
    limit: `below ${woodMoisture.percent} %`,
    source: work === 'restain' ? woodMoisture.source : woodMoisture.forJoint,
  };
}

/** Only stain is spoiled by sun; nothing where nobody looked. */
export function sun({ wallSun, work, base }: Day): Check | null {
  if (wallSun === undefined || work !== 'restain') return null;
  const shaded = wallSun === 'shade' || (wallSun === 'sun soon' && base === 'waterborne');
  const because = { shade: 'The wall is in the shade.', 'sun soon': 'The sun will reach the wall within a few hours.', sun: 'The sun is on the wall.' }[wallSun];
  return {
    what: 'Sun on the wall',
    verdict: shaded ? 'go' : 'wait',
    because: shaded ? because : `${because} Begin on a wall in the shade.`,
    limit: base === 'oil' ? 'in the shade, and for hours to come' : 'in the shade',
    source: sunOnWall[base],
  };
}

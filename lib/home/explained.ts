import { coatLeft, monthsInWords } from '@/lib/coat';
import { exactDay, monthNames } from '@/lib/calendar-words';
import { type CalendarDay } from '@/lib/calendar';
import { assumedSource } from '@/lib/care/learned-words';
import { type FilmLife } from '@/lib/care/types';
import { climateAt, type Station } from '@/lib/climate';
import { bareGroundAlbedo, groundAlbedo } from '@/lib/climate/snow';
import { type ExplainedInput, type Explanation } from '@/lib/explain';
import { coverWords, type StoredCover } from '@/lib/home/cover';
import { directionWord } from '@/lib/home/direction';
import { ourRule } from '@/lib/our-rules';
import { shades, type Shade, type UnitSystem } from '@/lib/schemas/vocabulary';
import { lengthText } from '@/lib/units';

type SunlitWall = { azimuthDeg: number; eaveDepthM: number; shade: Shade; shadeHeightDeg: number } & StoredCover;
type Where = { latitude: number; longitude: number };

const whole = (value: number) => Math.round(value).toLocaleString('en-US');

function wallInputs(wall: SunlitWall, units: UnitSystem): ExplainedInput[] {
  const cover = coverWords(wall, units);
  return [
    { label: 'Faces', value: `${whole(wall.azimuthDeg)}°, ${directionWord(wall.azimuthDeg)}` },
    { label: 'Depth of the eave', value: lengthText(wall.eaveDepthM, units) },
    ...(cover ? [{ label: 'Over it', value: cover }] : []),
    { label: 'In front', value: wall.shade === 'open' ? shades.open : `${shades[wall.shade]}, ${whole(wall.shadeHeightDeg)}° high` },
  ];
}

/** '20 %; with snow up to 60 %: November, December, January'. Months are said in the order of a winter. */
function reflected(albedo: readonly number[]): string {
  const percent = (share: number) => `${whole(share * 100)} %`;
  const white = (month: number) => (albedo[month % 12] ?? bareGroundAlbedo) > bareGroundAlbedo;
  const first = Math.max(0, albedo.findIndex((_, month) => white(month) && !white(month + 11)));
  const months = monthNames.flatMap((_, k) => (white(first + k) ? (monthNames[(first + k) % 12] ?? []) : []));
  return months.length === 0 ? percent(bareGroundAlbedo) : `${percent(bareGroundAlbedo)}; with snow up to ${percent(Math.max(...albedo))}: ${months.join(', ')}`;
}

const coverRule = ourRule('cover');
const snowRule = ourRule('snow');

const placeInput = ({ latitude, longitude }: Where) => ({ label: 'Place', value: `${latitude.toFixed(2)}° N, ${longitude.toFixed(2)}° E` });

export const sunHoursExplained = (hours: number, wall: SunlitWall, where: Where, units: UnitSystem): Explanation => ({
  figure: 'Direct sun in a year',
  value: `${whole(hours)} hours`,
  formula: 'the time in which the sun stands above the horizon and in front of the wall, weighted by the share of the wall that its eave, a porch roof or deck over it and what stands in front leave in the sun',
  inputs: [placeInput(where), ...wallInputs(wall, units)],
  sources: [
    { text: 'Sun position: suncalc 2, after Meeus, Astronomical Algorithms, ch. 25; its refraction taken out', ground: 'published' },
    ourRule('sun hours'),
    ...(wall.cover === 'none' ? [] : [coverRule]),
  ],
});

/** The ground reflects by the station's winters, corrected for the home's height; 20 % all year where the station is not known. */
export function sunDoseExplained(dose: number, wall: SunlitWall, where: Where & { elevationM: number | null }, station: Station | undefined, units: UnitSystem): Explanation {
  const albedo = station ? groundAlbedo(climateAt(station, where.elevationM).meanC) : [];
  return {
    figure: 'Sun dose of a mean year',
    value: `${whole(dose)} kWh/m²`,
    formula: 'direct sun + light of the sky + light from the ground onto the wall, hour by hour on the mean day of each month, with the clouds of a mean year',
    inputs: [
      placeInput(where),
      ...wallInputs(wall, units),
      { label: 'Reflected by the ground', value: reflected(albedo) },
      ...(station ? [{ label: 'Sunshine measured for', value: `${station.name}, ${station.state}` }] : []),
    ],
    sources: [
      { text: 'Radiation by month: NREL TMY3, credit NREL / US DOE', ground: 'published' },
      { text: 'Diffuse share: Erbs, Klein & Duffie (1982), Solar Energy 28:293', ground: 'published' },
      { text: 'Hours of a day: Collares-Pereira & Rabl (1979); Liu & Jordan (1960)', ground: 'published' },
      { text: 'Sky over a tilted surface: Hay & Davies (1980)', ground: 'published' },
      ourRule('shade'),
      ...(wall.cover === 'none' ? [] : [coverRule]),
      ...(albedo.some((share) => share > bareGroundAlbedo) ? [snowRule] : []),
    ],
  };
}

/** The share of a coat or seal that remains today, as whole percent; null when its start is not known. */
export function leftExplained(film: FilmLife, today: CalendarDay): { percent: number; explanation: Explanation } | null {
  if (film.startedOn === null) return null;
  const percent = Math.round(100 * coatLeft(film.startedOn, film.lifeMonths, today));
  return {
    percent,
    explanation: {
      figure: film.film === 'coat' ? 'Coat left' : 'Seal left',
      value: `${percent} %`,
      formula: '1 − days since it was put on ÷ days that it is expected to last',
      inputs: [
        { label: 'Put on', value: `${exactDay(film.startedOn)}${film.assumed ? ' (assumed)' : ''}` },
        { label: film.film === 'coat' ? 'Coat life of this wall' : 'Seal life of this wall', value: monthsInWords(film.lifeMonths) },
        { label: 'Today', value: exactDay(today) },
      ],
      sources: [ourRule('even wear'), ...(film.assumed ? [assumedSource] : [])],
    },
  };
}

'use client';

import { TZDate } from '@date-fns/tz';
import { useId, useState } from 'react';
import { HousePlan, type HousePlanWall } from '@/components/drawings/house-plan';
import { strikes } from '@/components/drawings/plan-sun';
import { addDays, type CalendarDay, daysBetween, dayOf, toUtcDate, yearOf } from '@/lib/calendar';
import { monthNames } from '@/lib/calendar-words';
import { directionWord } from '@/lib/home/direction';
import { sunPosition } from '@/lib/sun/position';

type SunSliderProps = {
  walls: readonly HousePlanWall[];
  /** Degrees north, degrees east, and the home's IANA time zone. */
  place: { latitude: number; longitude: number; timeZone: string };
  /** Where the sliders stand at first: a day, and minutes after local midnight. */
  day: CalendarDay;
  minutes?: number;
  label?: string;
};

const seasons = [['Spring', 3, 20], ['Midsummer', 6, 21], ['Fall', 9, 22], ['Midwinter', 12, 21]] as const;

const dayWords = (day: CalendarDay) => `${monthNames[Number(day.slice(5, 7)) - 1]} ${Number(day.slice(8))}`;
const clock = (minutes: number) => {
  const hour = Math.floor(minutes / 60) % 24;
  return `${hour % 12 === 0 ? 12 : hour % 12}:${String(minutes % 60).padStart(2, '0')} ${hour < 12 ? 'AM' : 'PM'}`;
};

/** The instant of a local wall-clock time. */
function instant(day: CalendarDay, minutes: number, timeZone: string): Date {
  const date = toUtcDate(day);
  return new Date(new TZDate(date.getUTCFullYear(), date.getUTCMonth(), date.getUTCDate(), Math.floor(minutes / 60), minutes % 60, timeZone).getTime());
}

/** The house plan with the sun moved around it by time of day and day of the year. */
export function SunSlider({ walls, place, day, minutes = 15 * 60, label }: SunSliderProps) {
  const [now, setNow] = useState({ day, minutes });
  const start = dayOf(yearOf(day), 1, 1);
  const sun = sunPosition(instant(now.day, now.minutes, place.timeZone), place);
  const lit = walls.filter((wall) => strikes(sun, wall.azimuthDeg) > 0).map((wall) => wall.name);
  return (
    <div className="grid items-center gap-x-12 gap-y-6 lg:grid-cols-[minmax(0,28rem)_minmax(0,1fr)]">
      <HousePlan walls={walls} sun={sun} {...(label ? { label } : {})} />
      <div className="needs-script grid gap-4">
        <Slider
          label="Time of day"
          words={clock(now.minutes)}
          max={1430}
          step={10}
          value={now.minutes}
          onChange={(value) => setNow({ ...now, minutes: value })}
        />
        <Slider
          label="Day of the year"
          words={dayWords(now.day)}
          max={364}
          step={1}
          value={Math.min(364, daysBetween(start, now.day))}
          onChange={(value) => setNow({ ...now, day: addDays(start, value) })}
        />
        <div className="flex flex-wrap gap-2">
          {seasons.map(([name, month, date]) => (
            <button
              key={name}
              type="button"
              className="min-h-11 rounded-md border-2 border-lichen bg-snow px-3 font-semibold hover:bg-inset"
              onClick={() => setNow({ ...now, day: dayOf(yearOf(day), month, date) })}
            >
              {name}
            </button>
          ))}
        </div>
        <p role="status" className="min-h-[4.5em] border-l-8 border-sun pl-4">
          {sun.elevationDeg > 0 ? (
            <>
              The sun stands in the {directionWord(sun.azimuthDeg)}, <b className="figures">{Math.round(sun.elevationDeg)}°</b> high. In the sun: <b>{lit.join(', ') || 'no wall'}</b>.
            </>
          ) : (
            'The sun is below the horizon: every wall is in the dark.'
          )}
        </p>
      </div>
    </div>
  );
}

type SliderProps = { label: string; words: string; max: number; step: number; value: number; onChange: (value: number) => void };

function Slider({ label, words, max, step, value, onChange }: SliderProps) {
  const id = useId();
  return (
    <div>
      <div className="flex items-baseline justify-between gap-4">
        <label htmlFor={id} className="font-semibold">
          {label}
        </label>
        <output htmlFor={id} className="figures text-lg">
          {words}
        </output>
      </div>
      <input id={id} type="range" min="0" max={max} step={step} value={value} aria-valuetext={words} onChange={(event) => onChange(event.target.valueAsNumber)} className="h-11 w-full accent-spruce" />
    </div>
  );
}

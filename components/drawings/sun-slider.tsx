'use client';

import { TZDate } from '@date-fns/tz';
import { useState } from 'react';
import { DoseLegend } from '@/components/drawings/dose-ramp';
import { HousePlan, type HousePlanWall } from '@/components/drawings/house-plan';
import { Slider } from '@/components/drawings/slider';
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

type Now = { day: CalendarDay; minutes: number };

/** The house plan with the sun moved around it by time of day and day of the year. */
export function SunSlider({ walls, place, day, minutes = 15 * 60, label }: SunSliderProps) {
  const [now, setNow] = useState<Now>({ day, minutes });
  const sun = sunPosition(instant(now.day, now.minutes, place.timeZone), place);
  const lit = walls.filter((wall) => strikes(sun, wall.azimuthDeg) > 0).map((wall) => wall.name);
  return (
    <div className="grid items-center gap-x-12 gap-y-6 lg:grid-cols-[minmax(0,28rem)_minmax(0,1fr)]">
      <HousePlan walls={walls} sun={sun} legend={false} {...(label ? { label } : {})} />
      <div className="grid gap-5">
        <Controls now={now} onChange={setNow} />
        <p role="status" className="min-h-[3em] border-l-8 border-sun pl-4">
          {sun.elevationDeg > 0 ? (
            <>
              The sun stands in the {directionWord(sun.azimuthDeg)}, <b className="figures">{Math.round(sun.elevationDeg)}°</b> high. In the sun: <b>{lit.join(', ') || 'no wall'}</b>.
            </>
          ) : (
            'The sun is below the horizon: every wall is in the dark.'
          )}
        </p>
        <DoseLegend />
      </div>
    </div>
  );
}

function Controls({ now, onChange }: { now: Now; onChange: (now: Now) => void }) {
  const year = yearOf(now.day);
  const start = dayOf(year, 1, 1);
  return (
    <div className="needs-script no-print grid gap-2">
      <Slider label="Time of day" words={clock(now.minutes)} max={1430} step={10} value={now.minutes} onChange={(minutes) => onChange({ ...now, minutes })} />
      <Slider label="Day of the year" words={dayWords(now.day)} max={364} step={1} value={Math.min(364, daysBetween(start, now.day))} onChange={(days) => onChange({ ...now, day: addDays(start, days) })} />
      <div className="grid grid-cols-2 gap-2 sm:grid-cols-4 lg:grid-cols-2">
        {seasons.map(([name, month, date]) => (
          <button
            key={name}
            type="button"
            className="min-h-11 rounded-md border-2 border-lichen bg-snow px-3 font-semibold hover:bg-inset"
            onClick={() => onChange({ ...now, day: dayOf(year, month, date) })}
          >
            {name}
          </button>
        ))}
      </div>
    </div>
  );
}

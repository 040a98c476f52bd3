import { Figure } from '@/components/ui/figure';
import { monthsInWords } from '@/lib/coat';
import { type CalendarDay } from '@/lib/calendar';
import { type FilmLife } from '@/lib/care/types';
import { type Station } from '@/lib/climate';
import { type StoredCover } from '@/lib/home/cover';
import { leftExplained, sunDoseExplained, sunHoursExplained } from '@/lib/home/explained';
import { type Shade, type UnitSystem } from '@/lib/schemas/vocabulary';

type WallFiguresProps = {
  planned: {
    wall: { name: string; azimuthDeg: number; eaveDepthM: number; shade: Shade; shadeHeightDeg: number } & StoredCover;
    exposure: { sunHours: number; doseKwhM2: number } | null;
    coat: FilmLife;
    seal: FilmLife;
  };
  home: { latitude: number; longitude: number; elevationM: number | null };
  station: Station | undefined;
  today: CalendarDay;
  units: UnitSystem;
  films: readonly ('coat' | 'seal')[];
  /** Hours of direct sun too. */
  hours?: boolean;
};

/** A wall's figures, each to be opened for how it comes about. */
export function WallFigures({ planned, home, station, today, units, films, hours = false }: WallFiguresProps) {
  const { wall, exposure } = planned;
  return (
    <>
      {films.map((name) => (
        <FilmFigures key={name} film={planned[name]} today={today} />
      ))}
      {exposure ? <Figure size="large" label={`Sun dose, ${wall.name}`} explanation={sunDoseExplained(exposure.doseKwhM2, wall, home, station, units)} /> : null}
      {exposure && hours ? <Figure size="large" explanation={sunHoursExplained(exposure.sunHours, wall, home, units)} /> : null}
    </>
  );
}

function FilmFigures({ film, today }: { film: FilmLife; today: CalendarDay }) {
  const left = leftExplained(film, today);
  return (
    <>
      {left ? <Figure size="large" explanation={left.explanation} /> : <p className="py-2 text-quiet">{film.film === 'coat' ? 'Coat' : 'Seal'} left: not known. A walkaround tells.</p>}
      <Figure size="large" label={film.film === 'coat' ? 'Coat life' : 'Seal life'} value={monthsInWords(film.lifeMonths)} explanation={film.explanation} />
    </>
  );
}

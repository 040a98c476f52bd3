import { YearBand } from '@/components/drawings/year-band';
import { FormMessage } from '@/components/ui/form-message';
import { Course } from '@/components/ui/course';
import { type CoatingSeason } from '@/lib/climate';
import { stainBases, type StainBase } from '@/lib/schemas/vocabulary';

type SeasonCourseProps = { seasons: readonly { base: StainBase; season: CoatingSeason }[]; month: number; station: string };

/** In which months a coat can cure at this home, for each kind of stain that is on its walls. */
export function SeasonCourse({ seasons, month, station }: SeasonCourseProps) {
  return (
    <Course heading="Coating season" aside={`Months in which a coat can cure here, in the climate of ${station}.`}>
      <div className="grid gap-6">
        {seasons.map(({ base, season }) => (
          <div key={base} className="grid gap-3">
            <h3>{stainBases[base]}</h3>
            {season.warning ? <FormMessage tone="note">{season.warning}</FormMessage> : null}
            <YearBand months={season.months} now={month} label={`Months in which ${stainBases[base].toLowerCase()} can cure here`} />
          </div>
        ))}
      </div>
    </Course>
  );
}

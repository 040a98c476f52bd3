import { FormMessage } from '@/components/ui/form-message';
import { type Site, type SiteQuestion } from '@/lib/home/site';
import { distanceText } from '@/lib/units';
import { type UnitSystem } from '@/lib/schemas/vocabulary';

type PlaceAnswerProps = { answer: Site | SiteQuestion | undefined; loading: boolean; failed: boolean; started: boolean; units: UnitSystem };

/** A station farther than this says little about the home, km. Our rule. */
const farKm = 150;

/** What the postal code told us, said politely to screen readers as it changes. */
export function PlaceAnswer({ answer, loading, failed, started, units }: PlaceAnswerProps) {
  return (
    <div aria-live="polite" className="min-h-16">
      {!started ? <p className="text-quiet">Five digits: from them come the place, its time, its climate and the sun.</p> : null}
      {started && failed ? <p className="text-quiet">The look-up did not answer. Go on: it is done again when you save.</p> : null}
      {started && !answer && loading ? <p className="text-quiet">Looking it up…</p> : null}
      {started && answer?.found === false ? <FormMessage tone="note">{answer.why}</FormMessage> : null}
      {started && answer?.found ? <Found site={answer} units={units} /> : null}
    </div>
  );
}

function Found({ site: { site: facts, station }, units }: { site: Site; units: UnitSystem }) {
  const where = [facts.place, facts.state].filter(Boolean).join(', ');
  return (
    <div>
      <p className="text-lg font-semibold">
        {where}
        {facts.county ? <span className="font-normal text-quiet"> · {facts.county} county</span> : null}
      </p>
      <p className="text-quiet">
        {facts.climateZone ? `Climate zone ${facts.climateZone} · ` : ''}
        climate of {station.name}, {distanceText(station.distanceKm, units)} away
      </p>
      {station.distanceKm > farKm ? <FormMessage tone="note">That station is far away: take its sun and rain figures as a rough guide.</FormMessage> : null}
    </div>
  );
}

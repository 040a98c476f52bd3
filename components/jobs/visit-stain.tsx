import { Figure } from '@/components/ui/figure';
import { type JobVisit } from '@/lib/jobs/work-ahead';
import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { containersText } from '@/lib/takeoff/words';
import { volumeText } from '@/lib/units';

/** The stain of a visit: to buy, in which containers, and the range that goes on the wall. */
export function VisitStain({ visit: { stain }, units }: { visit: JobVisit; units: UnitSystem }) {
  return (
    <div className="border-t-2 border-lichen pt-3">
      {stain ? (
        <div className="grid gap-x-10 sm:grid-cols-2 xl:grid-cols-3 sm:[&>details[open]]:col-span-full">
          <Figure explanation={stain.explanation} value={volumeText(stain.buyL, units)} />
          <Figure explanation={stain.explanations.containers} label="In containers" value={containersText(stain.containers, units)} />
          <Figure explanation={stain.explanations.used} value={`${volumeText(stain.lowL, units)} to ${volumeText(stain.highL, units)}`} />
        </div>
      ) : (
        <p className="text-quiet">No stain: caulk only.</p>
      )}
    </div>
  );
}

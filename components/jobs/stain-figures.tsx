import { Figure } from '@/components/ui/figure';
import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { containersText } from '@/lib/takeoff/words';
import { type WallsEstimate } from '@/lib/takeoff/stain-for-walls';
import { volumeText } from '@/lib/units';

/** Stain: to buy, in which containers, and the range that goes on the wall. */
export function StainFigures({ stain, units }: { stain: WallsEstimate; units: UnitSystem }) {
  return (
    <div className="grid gap-x-10 sm:grid-cols-2 sm:[&>details[open]]:col-span-full">
      <Figure explanation={stain.explanation} value={volumeText(stain.buyL, units)} />
      <Figure explanation={stain.explanations.containers} label="In containers" value={containersText(stain.containers, units)} />
      <Figure explanation={stain.explanations.used} value={`${volumeText(stain.lowL, units)} to ${volumeText(stain.highL, units)}`} />
    </div>
  );
}

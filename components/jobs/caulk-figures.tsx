import { Figure } from '@/components/ui/figure';
import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { type SealantAnswer } from '@/lib/takeoff/sealant-need';
import { sealantContainersText } from '@/lib/takeoff/sealant-words';

/** Caulk: the joints to fill, the containers, and the rod behind it. */
export function CaulkFigures({ caulk, units }: { caulk: SealantAnswer; units: UnitSystem }) {
  return (
    <div className="grid gap-x-10 sm:grid-cols-2 sm:[&>details[open]]:col-span-full">
      <Figure explanation={caulk.explanations.length} label="Joints to caulk" />
      <Figure explanation={caulk.explanations.containers} label="Caulk" value={sealantContainersText(caulk.containers, units)} />
      <Figure explanation={caulk.explanations.rod} />
    </div>
  );
}

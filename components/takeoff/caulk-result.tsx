import { Figure } from '@/components/ui/figure';
import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { type SealantAnswer } from '@/lib/takeoff/sealant-need';
import { sealantVolumeText } from '@/lib/takeoff/sealant-words';

/** Caulk and backer rod to buy; each figure opens to how it came about. */
export function CaulkResult({ answer, units }: { answer: SealantAnswer; units: UnitSystem }) {
  const { explanations, buyL } = answer;
  return (
    <div className="grid gap-1">
      <Figure explanation={explanations.buy} value={sealantVolumeText(buyL, units)} size="large" />
      <Figure explanation={explanations.containers} label={null} />
      <div className="mt-2 border-t-2 border-lichen pt-2">
        <Figure explanation={explanations.length} />
        <Figure explanation={explanations.depth} />
        <Figure explanation={explanations.rod} />
      </div>
    </div>
  );
}

import { Figure } from '@/components/ui/figure';
import { Money } from '@/components/ui/measure';
import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { type StainAnswer } from '@/lib/takeoff/estimate';
import { containersText } from '@/lib/takeoff/words';
import { areaText, volumeText } from '@/lib/units';

type Props = { answer: StainAnswer; units: UnitSystem };

/** What to buy, in ten seconds: the amount, the containers, the price; each figure opens to how it came about. */
export function EstimateResult({ answer, units }: Props) {
  const { explanation, explanations } = answer;
  const range = `${volumeText(answer.lowL, units)} to ${volumeText(answer.highL, units)}`;
  return (
    <div className="grid gap-1">
      <Figure explanation={explanation} value={volumeText(answer.buyL, units)} size="large" />
      <Figure
        explanation={explanations.containers}
        label={null}
        value={
          <>
            {containersText(answer.containers, units)}, <Money cents={answer.priceCents} />
          </>
        }
      />
      <div className="mt-2 border-t-2 border-lichen pt-2">
        <Figure explanation={explanations.used} value={range} />
        <Figure explanation={explanations.area} value={areaText(answer.areaM2, units)} />
        <Figure explanation={explanations.surface} value={areaText(answer.areaM2 * answer.profileFactor, units)} />
      </div>
      <p className="mt-2 text-sm text-quiet">The label of your product has its own coverage: type it in, it is better than any table.</p>
    </div>
  );
}

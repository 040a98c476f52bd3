import { Figure } from '@/components/ui/figure';
import { Money } from '@/components/ui/measure';
import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { containersText, type StainAnswer } from '@/lib/takeoff/estimate';
import { areaText, gallonsToLitres, volumeText } from '@/lib/units';

type Props = { answer: StainAnswer; units: UnitSystem };

/** What to buy, in ten seconds: the amount, the containers, the price; each opens to how it came about. */
export function EstimateResult({ answer, units }: Props) {
  const range = `${volumeText(gallonsToLitres(answer.lowGal), units)} to ${volumeText(gallonsToLitres(answer.highGal), units)}`;
  return (
    <div className="grid gap-4">
      <Figure explanation={answer.explanation} value={volumeText(answer.buyL, units)} size="large" />
      <dl className="grid max-w-xl gap-x-6 gap-y-2 sm:grid-cols-[auto_minmax(0,1fr)]">
        <dt className="text-quiet">Cheapest containers</dt>
        <dd className="font-semibold">{containersText(answer.containers, units)}</dd>
        <dt className="text-quiet">Their price</dt>
        <dd className="figures"><Money cents={answer.priceCents} /></dd>
        <dt className="text-quiet">Between</dt>
        <dd>{range}, by how thirsty the wood is</dd>
        <dt className="text-quiet">Wall area</dt>
        <dd>{areaText(answer.areaM2, units)}, {areaText(answer.areaM2 * answer.profileFactor, units)} counting the round of the logs</dd>
      </dl>
      <p className="text-sm text-quiet">The label of your product has its own coverage: type it in, it is better than any table.</p>
    </div>
  );
}

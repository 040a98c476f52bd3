import { PrintButton } from '@/components/ui/print-button';
import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { type CleanerAnswer } from '@/lib/takeoff/cleaner';
import { type StainAnswer } from '@/lib/takeoff/estimate';
import { type SealantAnswer } from '@/lib/takeoff/sealant-need';
import { sealantContainersText } from '@/lib/takeoff/sealant-words';
import { containersText } from '@/lib/takeoff/words';

type ShoppingListProps = { stain: StainAnswer | undefined; caulk: SealantAnswer | undefined; cleaner?: CleanerAnswer | undefined; units: UnitSystem };

/** What to bring home, to take along on paper. */
export function ShoppingList({ stain, caulk, cleaner, units }: ShoppingListProps) {
  const rows = [
    ...(stain ? [{ what: 'Stain', amount: containersText(stain.containers, units) }] : []),
    ...(caulk ? [{ what: 'Caulk', amount: sealantContainersText(caulk.containers, units) }, { what: 'Backer rod', amount: caulk.explanations.rod.value }] : []),
    ...(cleaner ? [{ what: 'Cleaner', amount: containersText(cleaner.containers, units) }] : []),
  ];
  if (rows.length === 0) return <p className="text-quiet">Choose walls above; the list follows.</p>;
  return (
    <div className="grid gap-4">
      <dl className="max-w-2xl">
        {rows.map(({ what, amount }) => (
          <div key={what} className="grid grid-cols-[8rem_minmax(0,1fr)] gap-x-4 border-t border-line py-2">
            <dt>{what}</dt>
            <dd className="figures">{amount}</dd>
          </div>
        ))}
      </dl>
      <p>
        <PrintButton>Print the list</PrintButton>
      </p>
    </div>
  );
}

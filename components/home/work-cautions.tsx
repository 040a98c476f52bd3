import { CautionList } from '@/components/ui/caution-list';
import { type CautionFacts, cautionsFor } from '@/lib/cautions';

/** Harm that is easily forgotten after the work, or that must be known before anybody sands: never folded away. */
const first = ['lead', 'oil-rags'];

export function WorkCautions({ facts }: { facts: CautionFacts }) {
  const all = cautionsFor(facts);
  const open = all.filter((caution) => first.includes(caution.id));
  const more = all.filter((caution) => !first.includes(caution.id));
  return (
    <div className="grid gap-2">
      <CautionList cautions={open} />
      {more.length > 0 ? (
        <details>
          <summary className="link min-h-11 py-2 font-semibold">
            {open.length > 0 ? `${more.length} more` : more.length} {more.length === 1 ? 'caution' : 'cautions'} for this work
          </summary>
          <CautionList cautions={more} />
        </details>
      ) : null}
    </div>
  );
}

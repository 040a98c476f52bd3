import { type Caution, cautionsDefer } from '@/lib/cautions';

/** Where people get hurt by this work, each with who says so. */
export function CautionList({ cautions }: { cautions: readonly Caution[] }) {
  if (cautions.length === 0) return null;
  return (
    <div className="border-l-8 border-honey bg-honey-wash px-4 py-4">
      <ul className="grid gap-4">
        {cautions.map((caution) => (
          <li key={caution.id}>
            <p className="font-display text-lg font-bold">{caution.hazard}</p>
            <p className="mt-1 max-w-prose">{caution.text}</p>
            <p className="text-sm text-quiet">
              {caution.authority}
              {caution.status === 'from memory' ? ' (cited from memory)' : ''}
            </p>
          </li>
        ))}
      </ul>
      <p className="mt-4 max-w-prose font-semibold">{cautionsDefer}</p>
    </div>
  );
}

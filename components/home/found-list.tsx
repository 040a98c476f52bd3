import { type ShownRecord } from '@/components/home/shown-record';
import { foundWords } from '@/lib/home/found-words';

type FoundListProps = { findings: ShownRecord['findings']; walls: readonly { id: string; name: string }[] };

/** How each wall was found, a line a wall. */
export function FoundList({ findings, walls }: FoundListProps) {
  const rows = walls.flatMap(({ id, name }) => findings.filter(({ wallId }) => wallId === id).map((one) => ({ id, name, words: foundWords(one) })));
  if (rows.length === 0) return null;
  return (
    <ul>
      {rows.map(({ id, name, words }) => (
        <li key={id}>
          {name}: {words}
        </li>
      ))}
    </ul>
  );
}

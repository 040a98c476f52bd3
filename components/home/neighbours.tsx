import { type Route } from 'next';
import Link from 'next/link';

type NeighboursProps = { homeId: string; walls: readonly { id: string; name: string }[]; wallId: string };

/** The walls on either side, as one walks around the house. */
export function Neighbours({ homeId, walls, wallId }: NeighboursProps) {
  const here = walls.findIndex(({ id }) => id === wallId);
  const before = walls.at(here - 1);
  const after = walls[(here + 1) % walls.length];
  if (walls.length < 2 || !before || !after) return null;
  const to = (wall: { id: string }) => `/homes/${homeId}/walls/${wall.id}` as Route;
  return (
    <nav aria-label="Around the house" className="course course-quiet no-print">
      <div className="within flex justify-between gap-6 py-4">
        <Link href={to(before)} className="link flex min-h-12 items-center font-semibold">
          ← {before.name}
        </Link>
        <Link href={to(after)} className="link flex min-h-12 items-center text-right font-semibold">
          {after.name} →
        </Link>
      </div>
    </nav>
  );
}

import Link from 'next/link';
import { clockText, shadeWords } from '@/lib/day/shade-words';
import { type ShadeOrder } from '@/lib/sun';

type ShadeListProps = { homeId: string; order: ShadeOrder<{ id: string; name: string }> };

/** The walls in the order in which work follows the shade, each with when it is out of the sun. */
export function ShadeList({ homeId, order }: ShadeListProps) {
  const { daylight, walls } = order;
  return (
    <>
      <p className="mb-3 text-quiet">{daylight ? `Daylight from ${clockText(daylight.fromMinute)} to ${clockText(daylight.toMinute)}.` : 'The sun does not rise today.'}</p>
      <ol className="border-t border-line">
        {walls.map((shaded, place) => (
          <li key={shaded.wall.id} className="grid min-h-14 grid-cols-[2rem_minmax(0,1fr)] items-center border-b border-line py-2">
            <span aria-hidden="true" className="figures text-lg text-quiet">
              {place + 1}
            </span>
            <span>
              <Link href={`/homes/${homeId}/walls/${shaded.wall.id}`} className="link font-semibold">
                {shaded.wall.name}
              </Link>
              : {shadeWords(shaded, daylight)}
            </span>
          </li>
        ))}
      </ol>
    </>
  );
}

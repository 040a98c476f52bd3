import { EmptyState } from '@/components/ui/empty-state';
import { exampleContainers } from '@/lib/takeoff/stain';
import { stainForWalls } from '@/lib/takeoff/stain-for-walls';
import { containersText } from '@/lib/takeoff/words';
import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { areaText, ft2ToM2, volumeText } from '@/lib/units';

/** A south wall of 270 ft², smooth, as an example of what will stand here. */
const wall = { areaM2: ft2ToM2(270), texture: 'smooth' } as const;

/** Says to a contractor how homes come here, and what they will see of them. */
export function NoHomes({ email, units }: { email: string; units: UnitSystem }) {
  const stain = stainForWalls([wall], { profileFactor: 1.06, coats: 2, wasteShare: 0.1, sizes: exampleContainers, units });
  const example = stain ? (
    <>
      <p className="text-sm text-quiet">An example of a row</p>
      <p className="font-semibold">South, {areaText(wall.areaM2, units)}</p>
      <p>Restain, June to August. The coat is used up by July.</p>
      <p>
        {volumeText(stain.buyL, units)} of stain: {containersText(stain.containers, units)}.
      </p>
    </>
  ) : null;
  return (
    <EmptyState title="No home is shared with you yet" example={example}>
      <p>
        Ask an owner to share their home with <strong>{email}</strong>: they open the home, choose Share, and type that address.
      </p>
      <p>From then on its coming restains and recaulks stand here by season, each wall with its area and its stain.</p>
    </EmptyState>
  );
}

import { parseLength, readLength } from '@/lib/schemas/measures';
import { type UnitSystem } from '@/lib/schemas/vocabulary';

/** Shares of a wall's width that a porch roof or deck may be over, as the form sends them. Our own choice. */
export const coverShares = ['0.25', '0.5', '0.75', '1'] as const;

/** Plausible sizes of a porch roof or deck, m; its underside at most this far above the wall's top. Our rule. */
const depth = { min: 0.3, max: 6, what: 'Its depth' } as const;
const lowest = 1;
const overTop = 1;
const highestWall = 15;

type Faults = Parameters<typeof readLength>[3];
type Typed = { cover?: string | undefined; coverDepth?: string | undefined; coverHeight?: string | undefined };

/** What was entered for a cover that is not chosen is kept where it can be read, and never a fault. */
const kept = (text: string | undefined, units: UnitSystem) => {
  const metres = text ? parseLength(text, units) : null;
  return metres !== null && metres <= highestWall + overTop ? metres : 0;
};

/** Reads depth and height of a porch roof or deck inside a schema's transform, in m; faults at their fields, only when there is one. */
export function readCover({ cover, coverDepth, coverHeight }: Typed, units: UnitSystem, heightM: number, ctx: Faults) {
  if (!cover || cover === 'none') return { coverDepthM: kept(coverDepth, units), coverHeightM: kept(coverHeight, units) };
  const read = (text: string | undefined, range: { min: number; max: number; what: string }, ask: string, name: string) => {
    if (text?.trim()) return readLength(text, units, range, ctx, [name]);
    ctx.addIssue({ code: 'custom', path: [name], message: ask });
    return 0;
  };
  const height = { min: lowest, max: (heightM > 0 ? heightM : highestWall) + overTop, what: 'The height of its underside' };
  return {
    coverDepthM: read(coverDepth, depth, 'Say how deep it is: from the wall out to its edge.', 'coverDepth'),
    coverHeightM: read(coverHeight, height, 'Say how high its underside is above the wall’s foot.', 'coverHeight'),
  };
}

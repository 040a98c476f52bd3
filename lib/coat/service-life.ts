import { type Source } from '@/lib/explain';
import { type Finish, type Sealant, type Texture, type Wood } from '@/lib/schemas/vocabulary';

/** Years that a film lasts before it wants renewing, shortest and longest, with where the two figures come from. */
export type ServiceLife = { lowYears: number; highYears: number; source: Source };

const handbook = 'Wood Handbook, FPL-GTR-190 (USDA Forest Products Laboratory, 2010), ch. 16';
/** Read in the source. */
const general: Source = { text: `${handbook}, Table 16-5, vertical exposure`, ground: 'published' };
/** Recalled, not read again: good to about a year. */
const byWood: Source = { text: `${handbook}, Table 16-4, siding by wood and texture`, ground: 'memory' };
const trade: Source = { text: 'Service life of exterior joint sealants: uncertain', ground: 'common practice' };

const life = (lowYears: number, highYears: number, source: Source): ServiceLife => ({ lowYears, highYears, source });

type KnownWood = Exclude<Wood, 'other'>;
type ByTexture = Record<Texture, ServiceLife>;

/**
 * Expected service life of finishes on vertical siding, in years.
 *
 * Pigmented finishes: Wood Handbook, Table 16-4, by wood and texture. Water repellent: Table 16-5 has one row for every
 * wood and texture. Table 16-5 (read in the source) gives for wood in general: tinted clear 2–3, semitransparent 4–8 on
 * saw-textured or weathered wood (2–4 on new smooth wood, p. 16-20), solid color 6–15.
 */
const finishLives: Record<Exclude<Finish, 'water-repellent'>, Record<KnownWood, ByTexture>> = {
  'tinted-clear': {
    'cedar-redwood': { smooth: life(1, 2, byWood), 'saw-textured': life(2, 3, byWood) },
    'pine-fir-spruce': { smooth: life(1, 2, byWood), 'saw-textured': life(2, 3, byWood) },
  },
  semitransparent: {
    'cedar-redwood': { smooth: life(2, 4, byWood), 'saw-textured': life(4, 8, byWood) },
    'pine-fir-spruce': { smooth: life(2, 3, byWood), 'saw-textured': life(4, 7, byWood) },
  },
  'solid-color': {
    'cedar-redwood': { smooth: life(6, 10, byWood), 'saw-textured': life(10, 15, byWood) },
    'pine-fir-spruce': { smooth: life(6, 8, byWood), 'saw-textured': life(8, 10, byWood) },
  },
};
const waterRepellent = life(1, 3, general);

/**
 * The published range for a finish on a wall. Our rule: where the wood is another one or not known, the shorter-lived of
 * the two listed woods stands in (pine, fir or spruce), because recoating late costs more than recoating early.
 */
export function finishLife(finish: Finish, texture: Texture, wood: Wood): ServiceLife {
  if (finish === 'water-repellent') return waterRepellent;
  return finishLives[finish][wood === 'other' ? 'pine-fir-spruce' : wood][texture];
}

/** Years that caulk lasts in an exterior joint. No published table was found: figures of the trade, from memory. */
export const sealantLife: Record<Sealant, ServiceLife> = {
  'acrylic-latex': life(5, 10, trade),
  polyurethane: life(5, 15, trade),
  silicone: life(15, 20, trade),
};

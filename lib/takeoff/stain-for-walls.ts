import { textures, type Texture } from '@/lib/schemas/vocabulary';
import { litresPerGallon, m2ToFt2 } from '@/lib/units';
import { cheapestContainers } from './containers';
import { type StainEstimate, type StainNeed, stainNeeded } from './stain';

export type StainedWall = { areaM2: number; texture: Texture };

/**
 * Stain for several walls bought together: each texture by its own coverage, the containers for the sum. Null for no area.
 * Ranges as in `stainNeeded`.
 */
export function stainForWalls(walls: readonly StainedWall[], common: Omit<StainNeed, 'areaM2' | 'texture'>): StainEstimate | null {
  const areaOf = (texture: Texture) => walls.reduce((sum, wall) => (wall.texture === texture ? sum + wall.areaM2 : sum), 0);
  const parts = (Object.keys(textures) as Texture[]).map((texture) => ({ texture, areaM2: areaOf(texture) })).filter(({ areaM2 }) => areaM2 > 0);
  const estimates = parts.map((part) => stainNeeded({ ...common, ...part }));
  const [first] = estimates;
  if (!first) return null;
  if (estimates.length === 1) return first;
  const sum = (pick: (estimate: StainEstimate) => number) => estimates.reduce((all, estimate) => all + pick(estimate), 0);
  const buyGal = sum(({ buyGal: gal }) => gal);
  const containers = cheapestContainers(buyGal, common.sizes);
  const priceOf = (gal: number) => Math.min(...common.sizes.filter((size) => size.gal === gal).map(({ priceCents }) => priceCents));
  return {
    lowGal: sum(({ lowGal }) => lowGal),
    highGal: sum(({ highGal }) => highGal),
    buyGal,
    buyL: buyGal * litresPerGallon,
    containers,
    priceCents: containers.reduce((all, { gal, count }) => all + priceOf(gal) * count, 0),
    explanation: {
      ...first.explanation,
      value: `${buyGal.toFixed(2)} gal`,
      formula: `${first.explanation.formula}; each surface by its own coverage, then added`,
      inputs: [
        ...parts.map(({ texture, areaM2 }) => ({ label: textures[texture], value: `${Math.round(m2ToFt2(areaM2))} ft² (${areaM2.toFixed(1)} m²)` })),
        ...first.explanation.inputs.filter(({ label }) => label !== 'Flat area' && label !== 'Coverage'),
      ],
    },
  };
}

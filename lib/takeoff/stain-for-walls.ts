import { type Explanation } from '@/lib/explain';
import { keysOf, textures, type Texture } from '@/lib/schemas/vocabulary';
import { containersExplained, stainExplained, usedExplained } from './explained';
import { bought, type StainEstimate, type StainNeed, type StainRange, stainRange } from './stain';

export type StainedWall = { areaM2: number; texture: Texture };
export type WallsEstimate = StainEstimate & { explanations: { used: Explanation; containers: Explanation } };

const sum = (ranges: readonly StainRange[], pick: (range: StainRange) => number) => ranges.reduce((all, range) => all + pick(range), 0);

/** Stain for several walls bought together: each texture by its own coverage, the containers for the sum. Null for no area. Ranges as in `stainRange`. */
export function stainForWalls(walls: readonly StainedWall[], common: Omit<StainNeed, 'areaM2' | 'texture'>): WallsEstimate | null {
  const { sizes, units = 'us' } = common;
  const areaOf = (texture: Texture) => walls.reduce((all, wall) => (wall.texture === texture ? all + wall.areaM2 : all), 0);
  const coatings = keysOf(textures).map((texture) => ({ ...common, texture, areaM2: areaOf(texture) })).filter(({ areaM2 }) => areaM2 > 0);
  if (coatings.length === 0) return null;
  const ranges = coatings.map(stainRange);
  const range = { lowGal: sum(ranges, ({ lowGal }) => lowGal), highGal: sum(ranges, ({ highGal }) => highGal), buyGal: sum(ranges, ({ buyGal }) => buyGal) };
  const mix = bought(range, sizes);
  const explanations = { used: usedExplained(coatings, range, units), containers: containersExplained(range.buyGal, mix.containers, sizes, mix.priceCents, units) };
  return { ...mix, explanation: stainExplained(coatings, range, units), explanations };
}

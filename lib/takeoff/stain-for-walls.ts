import { keysOf, textures, type Texture } from '@/lib/schemas/vocabulary';
import { stainExplained } from './explained';
import { bought, type StainEstimate, type StainNeed, type StainRange, stainRange } from './stain';

export type StainedWall = { areaM2: number; texture: Texture };

const sum = (ranges: readonly StainRange[], pick: (range: StainRange) => number) => ranges.reduce((all, range) => all + pick(range), 0);

/** Stain for several walls bought together: each texture by its own coverage, the containers for the sum. Null for no area. Ranges as in `stainRange`. */
export function stainForWalls(walls: readonly StainedWall[], common: Omit<StainNeed, 'areaM2' | 'texture'>): StainEstimate | null {
  const areaOf = (texture: Texture) => walls.reduce((all, wall) => (wall.texture === texture ? all + wall.areaM2 : all), 0);
  const coatings = keysOf(textures).map((texture) => ({ ...common, texture, areaM2: areaOf(texture) })).filter(({ areaM2 }) => areaM2 > 0);
  if (coatings.length === 0) return null;
  const ranges = coatings.map(stainRange);
  const range = { lowGal: sum(ranges, ({ lowGal }) => lowGal), highGal: sum(ranges, ({ highGal }) => highGal), buyGal: sum(ranges, ({ buyGal }) => buyGal) };
  return { ...bought(range, common.sizes), explanation: stainExplained(coatings, range, common.units ?? 'us') };
}

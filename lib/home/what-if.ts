import { type WorkCosts } from '@/lib/care/costs';
import { coatLife, type Life } from '@/lib/coat';
import { coverOfStored } from '@/lib/home/cover';
import { doseOf, type ExposedWall, type SunSite } from '@/lib/home/exposure';
import { type Finish, finishes, keysOf, type Texture, textures, type UnitSystem, type Wood } from '@/lib/schemas/vocabulary';
import { feetToMetres } from '@/lib/units';

/** A stored wall as it stands now: with the finish of its latest coat, its flat area, and its own factor k (0.5–2). */
export type WhatIfWall = ExposedWall & { finish: Finish; texture: Texture; wood: Wood; weatherSide: boolean; areaM2: number; factor: number };

export type Change = { kind: 'eave'; byM: number } | { kind: 'finish'; finish: Finish } | { kind: 'texture'; texture: Texture };

/** A coat on the wall: the sun dose in a mean year (kWh/m²), how long it lasts, and what restaining costs a year, in cents. */
export type CoatCost = { doseKwhM2: number; life: Life; centsAYear: number };

/** The same after a change, with the difference to what is there: longer and dearer are above 0. */
export type Variant = CoatCost & { change: Change; longerMonths: number; dearerCents: number };

/** What a change is judged by; `scheffer` is the decay index of the place. */
export type WhatIfPlace = { site: SunSite; scheffer: number; costs: Pick<WorkCosts, 'restainCentsPerM2'> };

/** How much deeper an eave is tried, m: 1 and 2 ft, or 30 and 60 cm. Our rule. */
export const eaveSteps: Record<UnitSystem, readonly number[]> = { us: [feetToMetres(1), feetToMetres(2)], metric: [0.3, 0.6] };

/** The wall after a change; everything else of it stays, its own factor too. */
export function changedWall(wall: WhatIfWall, change: Change): WhatIfWall {
  if (change.kind === 'eave') return { ...wall, eaveDepthM: wall.eaveDepthM + change.byM };
  return change.kind === 'finish' ? { ...wall, finish: change.finish } : { ...wall, texture: change.texture };
}

/**
 * Coat life of a wall and what its coats cost a year: area × price of a restain ÷ life in years. A restain costs the same by the
 * square metre whatever the finish, and what the change itself costs (carpentry, stripping) is left out: our rules.
 *
 * Example: 20 m² at $5.50/m² and a coat of 60 months: $110 ÷ 5 years = $22 a year.
 */
export function coatCost(wall: WhatIfWall, { site, scheffer, costs }: WhatIfPlace, doseKwhM2 = doseOf(wall, site)): CoatCost {
  const life = coatLife({ ...wall, cover: coverOfStored(wall), doseKwhM2, scheffer });
  return { doseKwhM2, life, centsAYear: (wall.areaM2 * costs.restainCentsPerM2 * 12) / life.months };
}

/** What one change would do to the wall's coat. */
export function variantOf(wall: WhatIfWall, change: Change, place: WhatIfPlace, now: CoatCost): Variant {
  // Only the eave changes the sun.
  const then = coatCost(changedWall(wall, change), place, change.kind === 'eave' ? undefined : now.doseKwhM2);
  return { ...then, change, longerMonths: then.life.months - now.life.months, dearerCents: then.centsAYear - now.centsAYear };
}

/** What a deeper eave, each other finish and the other surface would change, one at a time. */
export function whatIf(wall: WhatIfWall, place: WhatIfPlace, units: UnitSystem): { now: CoatCost; variants: Variant[] } {
  const now = coatCost(wall, place);
  const changes: Change[] = [
    ...eaveSteps[units].map((byM): Change => ({ kind: 'eave', byM })),
    ...keysOf(finishes).filter((finish) => finish !== wall.finish).map((finish): Change => ({ kind: 'finish', finish })),
    ...keysOf(textures).filter((texture) => texture !== wall.texture).map((texture): Change => ({ kind: 'texture', texture })),
  ];
  return { now, variants: changes.map((change) => variantOf(wall, change, place, now)) };
}

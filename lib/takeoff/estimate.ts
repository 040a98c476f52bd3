import { type Explanation } from '@/lib/explain';
import { squareMetresPerSquareFoot } from '@/lib/units';
import { type WallSizes } from './area';
import { areaExplained, containersExplained, surfaceExplained, usedExplained } from './explained';
import { profileFactor } from './profile';
import { type StainEstimate, type StainNeed, stainNeeded } from './stain';

/** What is asked: walls by their sizes, or only their area; the face of a course as chord and crown, in. */
export type StainAsk = Omit<StainNeed, 'profileFactor'> & { walls?: readonly WallSizes[] | undefined; profile: { exposedFaceIn: number; crownHeightIn: number } };

/** What the estimate's handler and the calculator answer with: the estimate and the areas behind it, each explained. */
export type StainAnswer = StainEstimate & {
  areaM2: number;
  areaFt2: number;
  profileFactor: number;
  explanations: { used: Explanation; area: Explanation; surface: Explanation; containers: Explanation };
};

export function stainAnswer(ask: StainAsk): StainAnswer {
  const { areaM2, walls, profile, sizes, units = 'us' } = ask;
  const factor = profileFactor(profile.exposedFaceIn, profile.crownHeightIn);
  const need = { ...ask, profileFactor: factor };
  const estimate = stainNeeded(need);
  const explanations = {
    used: usedExplained([need], estimate, units),
    area: areaExplained(areaM2, walls, units),
    surface: surfaceExplained(areaM2, factor, profile, units),
    containers: containersExplained(estimate.buyGal, estimate.containers, sizes, estimate.priceCents, units),
  };
  return { ...estimate, areaM2, areaFt2: areaM2 / squareMetresPerSquareFoot, profileFactor: factor, explanations };
}

import { finishes, type Finish, textures, type Texture, woods, type Wood } from '@/lib/schemas/vocabulary';
import { filmLife, type Life } from './life';
import { finishLife } from './service-life';
import { type Weathering, type Weights } from './severity';

export type CoatInput = Weathering & {
  finish: Finish;
  texture: Texture;
  wood: Wood;
  /** The wall's own factor k, 0.5–2; 1 when nothing has been learned. */
  factor?: number;
};

/** The less pigment, the more the sun counts. Our rule. */
const weights: Record<Finish, Weights> = {
  'water-repellent': { sun: 0.7, rain: 0.3 },
  'tinted-clear': { sun: 0.7, rain: 0.3 },
  semitransparent: { sun: 0.65, rain: 0.35 },
  'solid-color': { sun: 0.5, rain: 0.5 },
};

/**
 * Months that a coat lasts on a wall: the Forest Products Laboratory's range for the finish, texture and wood
 * (Wood Handbook 2010, ch. 16), placed within the range by the wall's sun and rain (our rule).
 *
 * Example: semitransparent on saw-textured pine (4–7 years), dose 1000 kWh/m², Scheffer 40, no eave, not the weather side:
 * sun share 0.682, rain share 0.40, severity 0.65 × 0.682 + 0.35 × 0.40 = 0.583, life 7 − 0.583 × 3 = 5.25 years: 63 months.
 */
export function coatLife({ finish, texture, wood, factor = 1, ...weathering }: CoatInput): Life {
  const what = [
    { label: 'Finish', value: finishes[finish] },
    { label: 'Surface', value: textures[texture] },
    { label: 'Wood', value: wood === 'other' ? `${woods.other}: counted as ${woods['pine-fir-spruce'].toLowerCase()} (our rule)` : woods[wood] },
  ];
  return filmLife({ figure: 'Coat life of this wall', what, range: finishLife(finish, texture, wood), weights: weights[finish], factor }, weathering);
}

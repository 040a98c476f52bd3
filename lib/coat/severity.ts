import { type ExplainedInput, type Source } from '@/lib/explain';
import { ourRule } from '@/lib/our-rules';
import { coverOf, type WallCover } from '@/lib/sun/wall-face';

/** What wears a film on one wall. */
export type Weathering = {
  /** Sun dose of the wall, kWh/m² a year. */
  doseKwhM2: number;
  /** Scheffer index of the place; about 0–100 on the US mainland, more in the wettest corners. */
  scheffer: number;
  /** Height of the wall, m. */
  heightM: number;
  /** Horizontal depth of the eave, m. */
  eaveDepthM: number;
  /** True for a wall that faces the driving rain. */
  weatherSide: boolean;
  /** A porch roof or a deck above. */
  cover?: WallCover | undefined;
};

/** How much sun and rain count; the two add up to 1. */
export type Weights = { sun: number; rain: number };

/** The dose (kWh/m² a year) at which sun does least and most. Our rule: about the range of walls in the 48 states. */
const gentlestDose = 250;
const hardestDose = 1350;
const hardestScheffer = 100;
/** Share of the rain that still reaches a wall under an eave half as deep as the wall is high, or deeper. Our rule. */
const shelteredShare = 0.3;
const shelteringDepth = 0.5;
const weatherSideFactor = 1.2;

const clamp = (x: number) => Math.min(1, Math.max(0, x));

/** Sun share, 0–1: where the dose lies between 250 and 1350 kWh/m² a year. Our rule. Example: 800 → 0.5. */
export const sunShare = (doseKwhM2: number): number => clamp((doseKwhM2 - gentlestDose) / (hardestDose - gentlestDose));

/** How far an overhang shelters the wall under it, 0–1: in full when it is half as deep as that wall is high. Our rule. */
const shelter = (depthM: number, heightM: number) => clamp(Math.max(0, depthM) / (shelteringDepth * heightM));

/** The part of the wall's area under its cover, and how deep the cover is for the height of that part. */
function underCover({ heightM, cover }: Pick<Weathering, 'heightM' | 'cover'>) {
  const over = coverOf({ cover });
  if (!over) return undefined;
  const below = Math.min(over.heightM, heightM);
  return { area: (over.share * below) / heightM, share: over.share, deep: over.depthM / below, sheltered: shelter(over.depthM, below) };
}

/**
 * Share of the rain that reaches the wall, 0.3–1. Our rule. What is under a cover counts by its area, sheltered by the cover or the
 * eave, whichever shelters more. Examples: a 0.6 m eave over 2.4 m of wall → 0.65; no eave, and half of the width under a porch roof
 * 1.2 m deep and 2.4 m up → 0.65.
 */
export function rainExposure({ heightM, eaveDepthM, weatherSide, cover }: Pick<Weathering, 'heightM' | 'eaveDepthM' | 'weatherSide' | 'cover'>): number {
  const byEave = shelter(eaveDepthM, heightM);
  const under = underCover({ heightM, cover });
  const sheltered = under ? (1 - under.area) * byEave + under.area * Math.max(byEave, under.sheltered) : byEave;
  return Math.min(1, (1 - (1 - shelteredShare) * sheltered) * (weatherSide ? weatherSideFactor : 1));
}

/** Rain share, 0–1: the place's decay climate (Scheffer 1971) times the wall's exposure to rain. Our rule. */
export const rainShare = (weathering: Weathering): number => clamp(weathering.scheffer / hardestScheffer) * rainExposure(weathering);

/** 0 (gentlest) to 1 (hardest): weighted sum of sun and rain share. Our rule. */
export const severityOf = (weathering: Weathering, weights: Weights): number =>
  clamp(weights.sun * sunShare(weathering.doseKwhM2) + weights.rain * rainShare(weathering));

const severitySources: Source[] = [
  ourRule('severity'),
  { text: 'Scheffer, A climate index for estimating potential for decay in wood structures above ground, Forest Products Journal 21(10), 1971', ground: 'published' },
];

/** Named only where a wall has a cover. */
const coverSource = ourRule('rain under an eave');

export const sourcesOfSeverity = (weathering: Weathering): Source[] => (underCover(weathering) ? [...severitySources, coverSource] : severitySources);

const share = (x: number) => x.toFixed(2);
const percent = (x: number) => `${Math.round(x * 100)} %`;

export function severityInputs(weathering: Weathering, weights: Weights): ExplainedInput[] {
  const { doseKwhM2, scheffer, heightM, eaveDepthM, weatherSide } = weathering;
  const under = underCover(weathering);
  return [
    { label: 'Sun dose', value: `${Math.round(doseKwhM2)} kWh/m² a year` },
    { label: 'Scheffer index', value: String(Math.round(scheffer)) },
    { label: 'Eave depth', value: `${percent(eaveDepthM / heightM)} of the wall's height` },
    ...(under ? [{ label: 'Porch roof or deck', value: `over ${percent(under.share)} of the width, ${percent(under.deep)} as deep as the wall under it is high` }] : []),
    { label: 'Weather side', value: weatherSide ? 'yes' : 'no' },
    { label: `Sun share, weight ${weights.sun.toFixed(2)}`, value: share(sunShare(doseKwhM2)) },
    { label: `Rain share, weight ${weights.rain.toFixed(2)}`, value: share(rainShare(weathering)) },
    { label: 'Severity', value: share(severityOf(weathering, weights)) },
  ];
}

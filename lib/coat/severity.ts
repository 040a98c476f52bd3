import { type ExplainedInput, type Source } from '@/lib/explain';

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

/** Share of the rain that reaches the wall, 0.3–1. Our rule. Example: a 0.6 m eave over 2.4 m of wall → 0.65. */
export function rainExposure({ heightM, eaveDepthM, weatherSide }: Pick<Weathering, 'heightM' | 'eaveDepthM' | 'weatherSide'>): number {
  const sheltered = clamp(Math.max(0, eaveDepthM) / (shelteringDepth * heightM));
  return Math.min(1, (1 - (1 - shelteredShare) * sheltered) * (weatherSide ? weatherSideFactor : 1));
}

/** Rain share, 0–1: the place's decay climate (Scheffer 1971) times the wall's exposure to rain. Our rule. */
export const rainShare = (weathering: Weathering): number => clamp(weathering.scheffer / hardestScheffer) * rainExposure(weathering);

/** 0 (gentlest) to 1 (hardest): weighted sum of sun and rain share. Our rule. */
export const severityOf = (weathering: Weathering, weights: Weights): number =>
  clamp(weights.sun * sunShare(weathering.doseKwhM2) + weights.rain * rainShare(weathering));

export const severitySources: Source[] = [
  { text: 'Where on the published range a wall falls: sun share (dose − 250) / 1100 kWh/m², rain share Scheffer / 100 × exposure', ground: 'our rule' },
  { text: 'Scheffer, A climate index for estimating potential for decay in wood structures above ground, Forest Products Journal 21(10), 1971', ground: 'published' },
];

const share = (x: number) => x.toFixed(2);

export function severityInputs(weathering: Weathering, weights: Weights): ExplainedInput[] {
  const { doseKwhM2, scheffer, heightM, eaveDepthM, weatherSide } = weathering;
  return [
    { label: 'Sun dose', value: `${Math.round(doseKwhM2)} kWh/m² a year` },
    { label: 'Scheffer index', value: String(Math.round(scheffer)) },
    { label: 'Eave depth', value: `${Math.round((eaveDepthM / heightM) * 100)} % of the wall's height` },
    { label: 'Weather side', value: weatherSide ? 'yes' : 'no' },
    { label: `Sun share, weight ${weights.sun.toFixed(2)}`, value: share(sunShare(doseKwhM2)) },
    { label: `Rain share, weight ${weights.rain.toFixed(2)}`, value: share(rainShare(weathering)) },
    { label: 'Severity', value: share(severityOf(weathering, weights)) },
  ];
}

/**
 * Climate index for decay of wood above ground: Σ max(0, T − 35)·max(0, D − 3)/30 over twelve months.
 * Source: T. C. Scheffer (1971), A climate index for estimating potential for decay in wood structures above ground,
 * Forest Products Journal 21(10):25–31; the formula in °F from memory, high confidence.
 * @param meanTempF twelve monthly mean temperatures, °F
 * @param wetDays twelve monthly numbers of days with at least 0.01 in of precipitation
 * @returns 0 and up; under 35 low, 35–65 moderate, over 65 high
 * @throws RangeError unless twelve finite values of each are given
 * @example Missoula, MT (NOAA normals 2006–2020): 26.35
 */
export function schefferIndex(meanTempF: number[], wetDays: number[]): number {
  const isYear = (values: number[]) => values.length === 12 && values.every(Number.isFinite);
  if (!isYear(meanTempF) || !isYear(wetDays)) throw new RangeError('twelve monthly temperatures and numbers of wet days are needed');
  return meanTempF.reduce((sum, temp, month) => sum + (Math.max(0, temp - 35) * Math.max(0, (wetDays[month] ?? 0) - 3)) / 30, 0);
}

export type DecayHazard = 'low' | 'moderate' | 'high';

/** Classes of the Whole Building Design Guide. */
export const decayHazard = (index: number): DecayHazard => (index < 35 ? 'low' : index <= 65 ? 'moderate' : 'high');

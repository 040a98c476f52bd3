import { type Source } from '@/lib/explain';
import { inchesToMetres, metresToInches } from '@/lib/units';

/** Least width and depth of a bead, m. Source: `depthSources[0]`. */
export const leastJointM = inchesToMetres(0.25);
/** Widest joint that this bead suits, m. Our rule: beyond 1 in the makers give the depth. */
export const widestJointM = inchesToMetres(1);

const half = inchesToMetres(0.5);
const hair = 1e-9;

export const depthSources: Source[] = [
  { text: 'Construction Waterproofing Handbook, 2nd ed. (2008), p. 5.6: at least 1/4 × 1/4 in; up to 1/2 in wide as deep as wide; wider: half the width, at most 1/2 in', ground: 'published' },
  { text: 'Handbook of Adhesives and Sealants, p. 119, differs: joints of 1/2 to 1 in about 1/2 in deep', ground: 'published' },
];

export const rodSources: Source[] = [
  { text: 'Closed-cell rod 25 to 33 % wider than the joint: practice by ASTM C1193 and C1330', ground: 'memory' },
  { text: 'Diameters that shops have: common practice, no source', ground: 'common practice' },
];

function fits(widthM: number): number {
  if (!(widthM >= leastJointM - hair && widthM <= widestJointM + hair)) throw new RangeError('a joint is 1/4 to 1 in wide');
  return widthM;
}

/**
 * Depth of a bead, m, by the joint's width, m (1/4 to 1 in): up to 1/2 in as deep as wide, wider half of that, from 1/4 to 1/2 in.
 * Source: Construction Waterproofing Handbook, 2nd ed. (2008), p. 5.6 (read in the source).
 * @throws RangeError for a width out of range
 * @example beadDepthM(inchesToMetres(0.75)) // 3/8 in
 */
export function beadDepthM(widthM: number): number {
  return fits(widthM) <= half + hair ? widthM : Math.min(half, Math.max(leastJointM, widthM / 2));
}

/**
 * The depth by the other handbook where it differs: about 1/2 in for joints wider than 1/2 in. m in, m out.
 * Source: Handbook of Adhesives and Sealants, p. 119 (read in the source).
 */
export const otherDepthM = (widthM: number): number => (fits(widthM) <= half + hair ? widthM : half);

/** Diameters of backer rod, in. Common practice, no source. */
export const rodDiametersIn = [0.25, 0.375, 0.5, 0.625, 0.75, 0.875, 1, 1.25, 1.5] as const;

export type BackerRod = { fromM: number; toM: number; diameterM: number };

/**
 * Backer rod for a joint: 25 to 33 % wider than it, and the next diameter that shops have, which at narrow joints is wider than that.
 * Source: practice by ASTM C1193 and C1330, from memory. m in, m out.
 * @throws RangeError for a width out of range
 * @example backerRod(inchesToMetres(0.5)).diameterM // 5/8 in
 */
export function backerRod(widthM: number): BackerRod {
  const fromM = 1.25 * fits(widthM);
  const next = rodDiametersIn.find((diameter) => diameter >= metresToInches(fromM) - 1e-6);
  if (next === undefined) throw new RangeError('no rod is that thick');
  return { fromM, toM: 1.33 * widthM, diameterM: inchesToMetres(next) };
}

import { type Explanation } from '@/lib/explain';
import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { inchesToMetres, litresPerGallon, litresToGallons } from '@/lib/units';
import { cheapestContainers, type ContainerCount, type ContainerSize, priceOfContainers } from './containers';
import { backerRod, beadDepthM, otherDepthM } from './joint-size';
import { type Joint, jointLengthM, type JointRule } from './joints';
import { sealantExplained } from './sealant-explained';

/** US fluid ounces to the gallon. */
export const fluidOuncesPerGallon = 128;

/** Containers that caulk comes in; the prices are our own invention: type what your shop asks. */
export const exampleSealants: ContainerSize[] = [
  { gal: 10.1 / fluidOuncesPerGallon, priceCents: 900 },
  { gal: 20 / fluidOuncesPerGallon, priceCents: 1600 },
  { gal: 0.6 / litresPerGallon, priceCents: 1650 },
  { gal: 29 / fluidOuncesPerGallon, priceCents: 2300 },
];

/** Boards up to 16 ft long; a joint of 1/4 in; a tenth of waste; a foot round a pipe. Our rules; the joint: common practice, no source. */
export const usualJoint = { widthM: inchesToMetres(0.25), boardM: inchesToMetres(192), wasteShare: 0.1, pipePerimeterM: inchesToMetres(12) };

export type SealantNeed = {
  joints: readonly Joint[];
  /** Joint width, m, 1/4 to 1 in. */
  widthM: number;
  /** 0 to 0.5. */
  wasteShare: number;
  sizes: readonly ContainerSize[];
  units?: UnitSystem | undefined;
  /** What the joints were counted with, where they were; for the words. */
  rule?: JointRule | undefined;
};

export type SealantFigures = {
  lengthM: number;
  widthM: number;
  depthM: number;
  /** L in the joints: by our depth, and by the deeper of the two handbooks. */
  lowL: number;
  highL: number;
  /** L to buy for: the deeper bead, with waste. */
  buyL: number;
  containers: ContainerCount[];
  priceCents: number;
  rodDiameterM: number;
  rodLengthM: number;
};

export type SealantAnswer = SealantFigures & { joints: Joint[]; explanations: { buy: Explanation; containers: Explanation; length: Explanation; depth: Explanation; rod: Explanation } };

/** Cubic metres to litres. */
const litres = 1000;

/**
 * Caulk for joints: length × width × depth, and with waste what to buy: for the deeper of two handbooks' beads where they differ. Whole
 * containers, the cheapest mix, counted in tenths of a fluid ounce so that 10.1 fl oz are just that. Backer rod: the joints' length with waste.
 * @throws RangeError for a width, waste or size out of range
 * @example 24.2 ft of 1/4 × 1/4 in without waste: one container of 10.1 fl oz (it fills 24.3 ft)
 */
export function sealantFigures({ joints, widthM, wasteShare, sizes }: SealantNeed): SealantFigures {
  if (!(wasteShare >= 0 && wasteShare <= 0.5)) throw new RangeError('waste must be 0 to 0.5');
  const lengthM = jointLengthM(joints);
  const depthM = beadDepthM(widthM);
  const lowL = lengthM * widthM * depthM * litres;
  const highL = lengthM * widthM * otherDepthM(widthM) * litres;
  const buyL = highL * (1 + wasteShare);
  const containers = cheapestContainers(litresToGallons(buyL), sizes, 1 / (10 * fluidOuncesPerGallon));
  return { lengthM, widthM, depthM, lowL, highL, buyL, containers, priceCents: priceOfContainers(containers, sizes), rodDiameterM: backerRod(widthM).diameterM, rodLengthM: lengthM * (1 + wasteShare) };
}

/** The figures, each explained; the joints by kind where they were counted from walls. */
export function sealantAnswer(need: SealantNeed): SealantAnswer {
  const figures = sealantFigures(need);
  return { ...figures, joints: need.rule ? [...need.joints] : [], explanations: sealantExplained(need, figures) };
}

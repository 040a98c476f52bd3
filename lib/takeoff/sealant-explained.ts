import { type Explanation } from '@/lib/explain';
import { ourRule } from '@/lib/our-rules';
import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { lengthText, litresPerGallon, metresToInches } from '@/lib/units';
import { backerRod, depthSources, otherDepthM, rodSources } from './joint-size';
import { jointKinds } from './joints';
import { type SealantFigures, type SealantNeed } from './sealant-need';
import { sealantContainersText, sealantContainerText, sealantVolumeText } from './sealant-words';

const dollars = (cents: number) => (cents / 100).toLocaleString('en-US', { style: 'currency', currency: 'USD' });
const percent = (share: number) => `${Number((share * 100).toFixed(2))} %`;

/** Joint sizes: 0.375 in; 9.5 mm. */
export const jointSizeText = (metres: number, units: UnitSystem): string => (units === 'us' ? `${Number(metresToInches(metres).toFixed(3))} in` : `${Number((metres * 1000).toFixed(1))} mm`);

/** How each figure of the sealant came about. */
export function sealantExplained(need: SealantNeed, figures: SealantFigures): Record<'buy' | 'containers' | 'length' | 'depth' | 'rod', Explanation> {
  return { buy: buyExplained(need, figures), containers: containersExplained(need, figures), length: lengthExplained(need, figures), depth: depthExplained(need, figures), rod: rodExplained(need, figures) };
}

function buyExplained({ wasteShare, units = 'us' }: SealantNeed, { lengthM, widthM, depthM, lowL, highL, buyL }: SealantFigures): Explanation {
  const range = highL > lowL ? `${sealantVolumeText(lowL, units)} to ${sealantVolumeText(highL, units)}` : sealantVolumeText(lowL, units);
  const deeper = highL > lowL ? [{ label: 'Depth by the other handbook', value: jointSizeText(otherDepthM(widthM), units) }] : [];
  return {
    figure: 'Caulk to buy',
    value: sealantVolumeText(buyL, units),
    formula: 'joint length × width × depth × (1 + waste), by the deeper bead',
    inputs: [
      { label: 'Joint length', value: lengthText(lengthM, units) },
      { label: 'Width', value: jointSizeText(widthM, units) },
      { label: 'Depth', value: jointSizeText(depthM, units) },
      ...deeper,
      { label: 'In the joints', value: range },
      { label: 'Waste', value: percent(wasteShare) },
    ],
    sources: [{ text: 'Volume: exact geometry of a rectangular bead', ground: 'published' }, ...depthSources, ourRule('deeper bead')],
  };
}

function containersExplained({ sizes, units = 'us' }: SealantNeed, { buyL, containers, priceCents }: SealantFigures): Explanation {
  const heldL = containers.reduce((sum, { gal, count }) => sum + gal * count * litresPerGallon, 0);
  return {
    figure: 'Cheapest containers',
    value: `${sealantContainersText(containers, units)}, ${dollars(priceCents)}`,
    formula: 'of all mixes that hold the amount the one with the least price; of equally cheap ones the fewest containers, then the least left over',
    inputs: [
      { label: 'Amount to hold', value: sealantVolumeText(buyL, units) },
      ...[...sizes].sort((a, b) => b.gal - a.gal).map(({ gal, priceCents: each }) => ({ label: sealantContainerText(gal, units), value: `${dollars(each)} each` })),
      { label: 'Left over', value: sealantVolumeText(Math.max(0, heldL - buyL), units) },
    ],
    sources: [ourRule('every mix'), ourRule('shop prices')],
  };
}

function lengthExplained({ joints, units = 'us', rule }: SealantNeed, { lengthM }: SealantFigures): Explanation {
  const there = joints.filter((joint) => joint.lengthM > 0);
  const counted = rule ? [{ label: 'Exposed face of a course', value: jointSizeText(rule.exposedFaceM, units) }, { label: 'Longest board', value: lengthText(rule.boardM, units) }] : [];
  return {
    figure: 'Joint length',
    value: lengthText(lengthM, units),
    formula: rule ? there.map(({ kind }) => `${jointKinds[kind].label}: ${jointKinds[kind].formula}`).join('. ') : 'as given',
    inputs: [...(rule ? there.map(({ kind, lengthM: length }) => ({ label: jointKinds[kind].label, value: lengthText(length, units) })) : []), ...counted],
    sources: rule
      ? [...there.map(({ kind }) => ({ text: jointKinds[kind].source, ground: jointKinds[kind].ground })), { text: 'The horizontal seams between courses stay open: common practice, no source', ground: 'common practice' }]
      : [],
  };
}

function depthExplained({ units = 'us' }: SealantNeed, { widthM, depthM }: SealantFigures): Explanation {
  return {
    figure: 'Depth of the bead',
    value: jointSizeText(depthM, units),
    formula: 'up to 1/2 in wide: as deep as wide; wider: half the width; from 1/4 to 1/2 in',
    inputs: [{ label: 'Width', value: jointSizeText(widthM, units) }, { label: 'By the other handbook', value: jointSizeText(otherDepthM(widthM), units) }],
    sources: [...depthSources, ourRule('label')],
  };
}

function rodExplained({ wasteShare, units = 'us' }: SealantNeed, { widthM, lengthM, rodDiameterM, rodLengthM }: SealantFigures): Explanation {
  const { fromM, toM } = backerRod(widthM);
  return {
    figure: 'Backer rod',
    value: `${lengthText(rodLengthM, units)} of ${jointSizeText(rodDiameterM, units)}`,
    formula: 'joint length × (1 + waste); the next diameter from 1.25 × width up',
    inputs: [
      { label: 'Joint length', value: lengthText(lengthM, units) },
      { label: 'Waste', value: percent(wasteShare) },
      { label: '25 to 33 % wider than the joint', value: `${jointSizeText(fromM, units)} to ${jointSizeText(toM, units)}` },
    ],
    sources: [...rodSources, ourRule('rod')],
  };
}

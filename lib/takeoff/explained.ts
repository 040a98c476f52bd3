import { type ExplainedInput, type Explanation, type Source } from '@/lib/explain';
import { textures, type UnitSystem } from '@/lib/schemas/vocabulary';
import { areaText, gallonsToLitres, lengthText, litresPerGallon, smallLengthText, squareMetresPerSquareFoot, volumeText, inchesToMetres } from '@/lib/units';
import { wallAreaM2, type WallSizes } from './area';
import { type ContainerCount, type ContainerSize } from './containers';
import { coverageFt2PerGal, coverageSource } from './coverage';
import { type Coating, type StainRange } from './stain';
import { containersText, containerText } from './words';

const plain = (value: number, digits = 2) => Number(value.toFixed(digits)).toLocaleString('en-US');
const volume = (gallons: number, units: UnitSystem) => volumeText(gallonsToLitres(gallons), units);
const dollars = (cents: number) => (cents / 100).toLocaleString('en-US', { style: 'currency', currency: 'USD' });

function coverageText({ low, high }: { low: number; high: number }, units: UnitSystem): string {
  if (units === 'us') return `${plain(low, 0)}–${plain(high, 0)} ft² per gallon and coat`;
  const metric = (ft2PerGal: number) => plain((ft2PerGal * squareMetresPerSquareFoot) / litresPerGallon, 1);
  return `${metric(low)}–${metric(high)} m² per litre and coat`;
}

const geometry: Source = { text: 'Profile factor: exact geometry of a circle segment', ground: 'published' };
const thirsty: Source = { text: 'Buying for the thirsty end of the range, and the share of waste', ground: 'our rule' };

/** How much stain, for one surface or for several that are bought together. */
export function stainExplained(coatings: readonly Coating[], range: StainRange, units: UnitSystem): Explanation {
  const [first] = coatings;
  const several = coatings.length > 1;
  const perSurface = coatings.flatMap((coating): ExplainedInput[] => {
    const coverage = coating.coverage ?? coverageFt2PerGal[coating.texture];
    const of = several ? `, ${textures[coating.texture].toLowerCase()}` : '';
    return [
      { label: `Wall area${of}`, value: areaText(coating.areaM2, units) },
      { label: `Coverage${of}`, value: `${coverageText(coverage, units)}${coating.coverage ? ', from the label' : ''}` },
    ];
  });
  const fromTable = coatings.some(({ coverage }) => !coverage);
  return {
    figure: 'Stain to buy',
    value: volume(range.buyGal, units),
    formula: `area × profile factor × coats ÷ coverage${several ? ', surface by surface, added up' : ''}; to buy: the upper end × (1 + waste)`,
    inputs: [
      ...perSurface,
      { label: 'Profile factor', value: plain(first?.profileFactor ?? 1, 3) },
      { label: 'Coats', value: String(first?.coats ?? 0) },
      { label: 'Goes on the wall', value: `${volume(range.lowGal, units)} to ${volume(range.highGal, units)}` },
      { label: 'Waste', value: `${plain((first?.wasteShare ?? 0) * 100)} %` },
    ],
    sources: [fromTable ? { text: coverageSource, ground: 'published' } : { text: 'The product’s label', ground: 'published' }, geometry, thirsty],
  };
}

/** Which containers, and why these. */
export function containersExplained(buyGal: number, containers: readonly ContainerCount[], sizes: readonly ContainerSize[], priceCents: number, units: UnitSystem): Explanation {
  const held = containers.reduce((sum, { gal, count }) => sum + gal * count, 0);
  return {
    figure: 'Cheapest containers',
    value: `${containersText(containers, units)}, ${dollars(priceCents)}`,
    formula: 'of all mixes that hold the amount the one with the least price; of equally cheap ones the fewest containers, then the least left over',
    inputs: [
      { label: 'Amount to hold', value: volume(buyGal, units) },
      ...[...sizes].sort((a, b) => b.gal - a.gal).map(({ gal, priceCents: each }) => ({ label: containerText(gal, units), value: `${dollars(each)} each` })),
      { label: 'Left over', value: volume(Math.max(0, held - buyGal), units) },
    ],
    sources: [{ text: 'Every mix is weighed, to the fluid ounce', ground: 'our rule' }, { text: 'Prices as typed; those that the form starts with are our examples', ground: 'our rule' }],
  };
}

const wallText = (wall: WallSizes, units: UnitSystem) => {
  const gable = wall.gableHeightM ? ` + gable ${lengthText(wall.gableHeightM, units)}` : '';
  const holesM2 = wallAreaM2({ ...wall, openings: [] }) - wallAreaM2(wall);
  return `${lengthText(wall.widthM, units)} × ${lengthText(wall.heightM, units)}${gable}${holesM2 > 0 ? ` − ${areaText(holesM2, units)}` : ''} = ${areaText(wallAreaM2(wall), units)}`;
};

/** The flat area of walls; of an area that was given only itself. */
export function areaExplained(areaM2: number, walls: readonly WallSizes[] | undefined, units: UnitSystem): Explanation {
  return {
    figure: 'Wall area',
    value: areaText(areaM2, units),
    formula: walls ? 'width × height + width × gable height ÷ 2 − doors and windows, added up' : 'the areas of the walls added up',
    inputs: walls ? walls.map((wall, i) => ({ label: `Wall ${i + 1}`, value: wallText(wall, units) })) : [{ label: 'Walls together', value: areaText(areaM2, units) }],
    sources: [{ text: 'Exact geometry', ground: 'published' }],
  };
}

/** The area that the round of the logs really has. */
export function surfaceExplained(areaM2: number, factor: number, profile: { exposedFaceIn: number; crownHeightIn: number }, units: UnitSystem): Explanation {
  const inches = (value: number) => smallLengthText(inchesToMetres(value), units);
  return {
    figure: 'Round surface',
    value: areaText(areaM2 * factor, units),
    formula: 'wall area × 2R · asin(c ÷ 2R) ÷ c, with R = (c² ÷ 4 + h²) ÷ 2h',
    inputs: [
      { label: 'Wall area', value: areaText(areaM2, units) },
      { label: 'c, exposed face of a course', value: inches(profile.exposedFaceIn) },
      { label: 'h, crown of the log', value: inches(profile.crownHeightIn) },
      { label: 'Profile factor', value: plain(factor, 3) },
    ],
    sources: [geometry, { text: 'Exposed face: WWPA, Natural Wood Siding technical guide, table 4', ground: 'published' }],
  };
}

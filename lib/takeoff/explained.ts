import { type ExplainedInput, type Explanation, type Source } from '@/lib/explain';
import { ourRule } from '@/lib/our-rules';
import { textures, type UnitSystem } from '@/lib/schemas/vocabulary';
import { areaText, gallonsToLitres, lengthText, litresPerGallon, metresPerInch, squareMetresPerSquareFoot, volumeText } from '@/lib/units';
import { wallAreaM2, type WallSizes } from './area';
import { type ContainerCount, type ContainerSize } from './containers';
import { coverageFt2PerGal, coverageSource } from './coverage';
import { type Coating, type StainRange } from './stain';
import { containersText, containerText } from './words';

const plain = (value: number, digits = 2) => Number(value.toFixed(digits)).toLocaleString('en-US');
/** To a hundredth: an opened figure is more exact than the one it explains. */
const volume = (gallons: number, units: UnitSystem) => (units === 'us' ? `${plain(gallons)} gal` : `${plain(gallonsToLitres(gallons))} L`);
const small = (inches: number, units: UnitSystem) => (units === 'us' ? `${plain(inches, 3)} in` : `${plain(inches * 100 * metresPerInch, 2)} cm`);
const dollars = (cents: number) => (cents / 100).toLocaleString('en-US', { style: 'currency', currency: 'USD' });

function coverageText({ low, high }: { low: number; high: number }, units: UnitSystem): string {
  if (units === 'us') return `${plain(low, 0)}–${plain(high, 0)} ft² per gallon and coat`;
  const metric = (ft2PerGal: number) => plain((ft2PerGal * squareMetresPerSquareFoot) / litresPerGallon, 1);
  return `${metric(low)}–${metric(high)} m² per litre and coat`;
}

const geometry: Source = { text: 'Profile factor: exact geometry of a circle segment', ground: 'published' };

/** What goes on the wall: one surface, or several that are bought together. */
export function usedExplained(coatings: readonly Coating[], range: StainRange, units: UnitSystem): Explanation {
  const [first] = coatings;
  const several = coatings.length > 1;
  const perSurface = coatings.flatMap((coating): ExplainedInput[] => {
    const of = several ? `, ${textures[coating.texture].toLowerCase()}` : '';
    const coverage = coverageText(coating.coverage ?? coverageFt2PerGal[coating.texture], units);
    return [
      { label: `Wall area${of}`, value: areaText(coating.areaM2, units) },
      { label: `Coverage${of}`, value: `${coverage}${coating.coverage ? ', from the label' : ''}` },
    ];
  });
  const table: Source = { text: coverageSource, ground: 'published' };
  return {
    figure: 'Goes on the wall',
    value: `${volume(range.lowGal, units)} to ${volume(range.highGal, units)}`,
    formula: `area × profile factor × coats ÷ coverage${several ? ', surface by surface, added up' : ''}`,
    inputs: [...perSurface, { label: 'Profile factor', value: plain(first?.profileFactor ?? 1, 3) }, { label: 'Coats', value: String(first?.coats ?? 0) }],
    sources: [coatings.some(({ coverage }) => !coverage) ? table : { text: 'The product’s label', ground: 'published' }, geometry],
  };
}

/** How much stain to buy. */
export function stainExplained(coatings: readonly Coating[], range: StainRange, units: UnitSystem): Explanation {
  const used = usedExplained(coatings, range, units);
  return {
    figure: 'Stain to buy',
    value: volumeText(gallonsToLitres(range.buyGal), units),
    formula: `(${used.formula}), its upper end × (1 + waste)`,
    inputs: [...used.inputs, { label: used.figure, value: used.value }, { label: 'Waste', value: `${plain((coatings[0]?.wasteShare ?? 0) * 100)} %` }, { label: 'To buy', value: volume(range.buyGal, units) }],
    sources: [...used.sources, ourRule('thirsty end')],
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
    sources: [ourRule('every mix'), ourRule('shop prices')],
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
  return {
    figure: 'Round surface',
    value: areaText(areaM2 * factor, units),
    formula: 'wall area × 2R · asin(c ÷ 2R) ÷ c, with R = (c² ÷ 4 + h²) ÷ 2h',
    inputs: [
      { label: 'Wall area', value: areaText(areaM2, units) },
      { label: 'c, exposed face of a course', value: small(profile.exposedFaceIn, units) },
      { label: 'h, crown of the log', value: small(profile.crownHeightIn, units) },
      { label: 'Profile factor', value: plain(factor, 3) },
    ],
    sources: [geometry, { text: 'Exposed face: WWPA, Natural Wood Siding technical guide, table 4', ground: 'published' }],
  };
}

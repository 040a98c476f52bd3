import { type FormValue, type FormValues } from '@/lib/schemas/action-state';
import { parseLength } from '@/lib/schemas/measures';
import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { type ContainerSize } from '@/lib/takeoff';
import { exampleContainers } from '@/lib/takeoff/stain';
import { lengthField, litresPerGallon, metresPerInch, squareMetresPerSquareFoot } from '@/lib/units';

/** The calculator's form as typed: fields by name, walls, their openings and containers in rows under number keys. */

const isGroup = (value: FormValue | undefined): value is FormValues => typeof value === 'object' && !Array.isArray(value);
const isRowKey = (key: string) => /^\d{1,3}$/.test(key);

/** The group at a dotted path: 'walls.0.openings'. */
const groupAt = (values: FormValues, path: string): FormValues =>
  path.split('.').reduce<FormValues>((group, key) => {
    const next = Object.hasOwn(group, key) ? group[key] : undefined;
    return isGroup(next) ? next : {};
  }, values);

/** Rows under a path, in the order in which they were added. */
export const rowsOf = (values: FormValues, path: string): [key: string, row: FormValues][] =>
  Object.entries(groupAt(values, path)).flatMap(([key, row]) => (isRowKey(key) && isGroup(row) ? [[key, row]] : []));

/** What is typed in one field; '' when nothing is. */
export const typedIn = (row: FormValues, field: string): string => {
  const value = Object.hasOwn(row, field) ? row[field] : undefined;
  return typeof value === 'string' ? value : '';
};

function changed(values: FormValues, path: string[], change: (group: FormValues) => FormValues): FormValues {
  const [head, ...rest] = path;
  if (head === undefined) return change(values);
  return { ...values, [head]: changed(groupAt(values, head), rest, change) };
}

const without = (values: FormValues, key: string): FormValues => Object.fromEntries(Object.entries(values).filter(([one]) => one !== key));

const addable = /^(walls|walls\.\d+\.openings|containers|caulkContainers|cleanerContainers)$/;
const droppable = /^(walls\.\d+|walls\.\d+\.openings\.\d+|(?:containers|caulkContainers|cleanerContainers)\.\d+)$/;

/** Does what a button of the form says: 'add walls', 'drop walls.1', 'to metric'. Anything else changes nothing. */
export function editCalculator(values: FormValues, edit: string): FormValues {
  const [act, target = ''] = edit.split(' ');
  const path = target.split('.');
  if (act === 'to' && (target === 'us' || target === 'metric')) return inUnits(values, target);
  if (act === 'drop' && droppable.test(target)) return changed(values, path.slice(0, -1), (group) => without(group, path.at(-1) ?? ''));
  if (act !== 'add' || !addable.test(target)) return values;
  const next = Math.max(-1, ...rowsOf(values, target).map(([key]) => Number(key))) + 1;
  return changed(values, path, (group) => ({ ...group, [next]: { width: '', height: '', size: '', price: '' } }));
}

const fields = { siding: '8', texture: 'saw-textured', coats: '2', coverageLow: '', coverageHigh: '', waste: '10' };
const usualCrown: Record<UnitSystem, string> = { us: '1', metric: '2.5' };
const mostRows = 50;

const picked = (row: FormValues, names: readonly string[]): FormValues => Object.fromEntries(names.map((name) => [name, typedIn(row, name)]));
const asRows = (rows: readonly FormValues[]): FormValues => Object.fromEntries(rows.map((row, key) => [String(key), row]));
const tidied = (rows: readonly [string, FormValues][], tidy: (row: FormValues) => FormValues): FormValues => Object.fromEntries(rows.slice(0, mostRows).map(([key, row]) => [key, tidy(row)]));

/** Container rows as sent, or the examples where none were. */
export const containerRows = (sent: FormValues, group: string, examples: readonly { size: string; price: string }[]): FormValues => {
  const rows = tidied(rowsOf(sent, group), (one) => picked(one, ['size', 'price']));
  return Object.keys(rows).length > 0 ? rows : asRows(examples);
};

/** Containers by the gallon as they are typed in a system of units. */
export const typedSizes = (sizes: readonly ContainerSize[], units: UnitSystem) =>
  sizes.map(({ gal, priceCents }) => ({ size: units === 'us' ? String(gal) : (gal * litresPerGallon).toFixed(2), price: (priceCents / 100).toFixed(2) }));

/** Whatever was sent as the form's values: what is missing gets its usual value, what does not belong is left out. */
export function calculatorStart(sent: FormValues, units: UnitSystem): FormValues {
  const sentWalls = rowsOf(sent, 'walls');
  const walls = tidied(sentWalls.length > 0 ? sentWalls : [['0', {}]], (wall) => ({ ...picked(wall, ['width', 'height', 'gable']), openings: tidied(rowsOf(wall, 'openings'), (one) => picked(one, ['width', 'height', 'count'])) }));
  const texts = Object.entries({ ...fields, crown: usualCrown[units] }).map(([name, usual]) => [name, typeof sent[name] === 'string' ? sent[name] : usual]);
  return {
    units,
    ...Object.fromEntries(texts),
    walls,
    containers: containerRows(sent, 'containers', typedSizes(exampleContainers, units)),
    ...(Array.isArray(sent.chosenM2) ? { chosenM2: sent.chosenM2.filter((one) => typeof one === 'string') } : {}),
  };
}

/** A wall to begin with: 30 ft by 9 ft with three windows, or nearly so in metres. */
export const exampleWalls: Record<UnitSystem, FormValues> = {
  us: asRows([{ width: '30', height: '9', gable: '', openings: asRows([{ width: '3', height: '4', count: '3' }]) }]),
  metric: asRows([{ width: '9', height: '2.7', gable: '', openings: asRows([{ width: '0.9', height: '1.2', count: '3' }]) }]),
};

/** A number as typed, times a factor; what cannot be read stays as it is. */
const scaled = (text: string, factor: number, digits: number): string => {
  const value = Number(text.replace(',', '.'));
  return text.trim() === '' || !Number.isFinite(value) ? text : String(Number((value * factor).toFixed(digits)));
};

/** The same form in the other units. */
function inUnits(values: FormValues, to: UnitSystem): FormValues {
  const from: UnitSystem = values.units === 'metric' ? 'metric' : 'us';
  if (from === to) return values;
  const power = to === 'metric' ? 1 : -1;
  const by = (text: string, factor: number, digits: number) => scaled(text, factor ** power, digits);
  const length = (text: string) => {
    const metres = text.trim() ? parseLength(text, from) : null;
    return metres === null ? text : lengthField(metres, to);
  };
  const lengths = (row: FormValues, names: string[]) => Object.fromEntries(names.map((name) => [name, length(typedIn(row, name))]));
  const coverage = squareMetresPerSquareFoot / litresPerGallon;
  return {
    ...values,
    units: to,
    crown: by(typedIn(values, 'crown'), 100 * metresPerInch, 2),
    coverageLow: by(typedIn(values, 'coverageLow'), coverage, 2),
    coverageHigh: by(typedIn(values, 'coverageHigh'), coverage, 2),
    walls: tidied(rowsOf(values, 'walls'), (wall) => ({ ...lengths(wall, ['width', 'height', 'gable']), openings: tidied(rowsOf(wall, 'openings'), (one) => ({ ...one, ...lengths(one, ['width', 'height']) })) })),
    containers: tidied(rowsOf(values, 'containers'), (one) => ({ ...one, size: by(typedIn(one, 'size'), litresPerGallon, 2) })),
  };
}

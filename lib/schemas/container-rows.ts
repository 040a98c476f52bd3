import { type FormValues } from '@/lib/schemas/action-state';
import { rowsOf, typedIn } from '@/lib/schemas/calculator-values';
import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { type ContainerSize } from '@/lib/takeoff';

/** What reading finds at fault or still missing, by field. */
export type Note = { faults: Record<string, string>; missing: Record<string, string>; units: UnitSystem };
export type Bounds = { min: number; max: number; what: string; unit?: string };

/** A number as typed; undefined when empty or at fault. `factor` takes it to the unit of the bounds. */
export function readNumber(text: string, path: string, { min, max, what, unit = '' }: Bounds, note: Note, factor = 1): number | undefined {
  if (text.trim() === '') return undefined;
  const plain = text.trim().replace(/^\$/, '').replace(/,(?=\d{3}\b)/g, '').replace(',', '.');
  const value = Number(plain) * factor;
  if (/^\d*\.?\d+\.?$/.test(plain) && value >= min * (1 - 1e-9) && value <= max * (1 + 1e-9)) return value;
  const bound = (one: number) => Number((one / factor).toPrecision(3)).toLocaleString('en-US');
  note.faults[path] = `${what} should be a number from ${bound(min)} to ${bound(max)}${unit ? ` ${unit}` : ''}.`;
  return undefined;
}

/** A size as typed: its number, the unit it is in, and US gallons to that unit. */
export type SizeReader = (text: string) => { number: string; unit: string; gallons: number };

/** Containers of one group of rows, smallest and largest in US gallons. Empty rows do not count; a begun row lacks its other field. */
export function readContainers(values: FormValues, group: string, { min, max, read }: { min: number; max: number; read: SizeReader }, note: Note): ContainerSize[] {
  const rows = rowsOf(values, group);
  const sizes = rows.flatMap(([key, row]) => {
    const at = `${group}.${key}`;
    const { number, unit, gallons } = read(typedIn(row, 'size'));
    const gal = readNumber(number, `${at}.size`, { min, max, what: 'The size', unit }, note, gallons);
    const price = readNumber(typedIn(row, 'price'), `${at}.price`, { min: 0, max: 100_000, what: 'The price' }, note);
    if (gal !== undefined && price !== undefined) return [{ gal, priceCents: Math.round(price * 100) }];
    if (gal !== undefined && !note.faults[`${at}.price`]) note.missing[`${at}.price`] = 'The price is still missing.';
    if (price !== undefined && !note.faults[`${at}.size`]) note.missing[`${at}.size`] = 'The size is still missing.';
    return [];
  });
  const [first] = rows;
  if (sizes.length === 0 && first && Object.keys(note.faults).length === 0) note.faults[`${group}.${first[0]}.size`] = 'At least one container with its size and price is needed.';
  return sizes;
}

import { z } from 'zod';
import { type UnitSystem } from '@/lib/schemas/vocabulary';

const metresPerFoot = 0.3048;
const metresPerInch = 0.0254;

const number = String.raw`(\d+(?:[.,]\d+)?)`;
const feetAndInches = new RegExp(String.raw`^${number}\s*(?:ft|feet|foot|'|′)?\s*(?:${number}\s*(?:in|inch|inches|"|″|''))?$`, 'i');
const inchesOnly = new RegExp(String.raw`^${number}\s*(?:in|inch|inches|"|″|'')$`, 'i');
const metricLength = new RegExp(String.raw`^${number}\s*(mm|cm|m)?$`, 'i');

const asNumber = (text: string) => Number(text.replace(',', '.'));

/**
 * A length as people write it, in m: `30`, `30.5`, `30 ft 6 in`, `30' 6"`, `18 in` in customary units; `9.1`, `9.1 m`, `45 cm` in metric.
 * A bare number is feet or metres. A unit that is written wins over the reader's system. Null when it is not a length.
 */
export function parseLength(text: string, units: UnitSystem): number | null {
  const trimmed = text.trim();
  const metric = metricLength.exec(trimmed);
  if (metric?.[1] && (units === 'metric' || metric[2])) {
    const factor = { mm: 0.001, cm: 0.01, m: 1 }[(metric[2] ?? 'm').toLowerCase()] ?? 1;
    return asNumber(metric[1]) * factor;
  }
  const inches = inchesOnly.exec(trimmed);
  if (inches?.[1]) return asNumber(inches[1]) * metresPerInch;
  const feet = feetAndInches.exec(trimmed);
  if (!feet?.[1] || (units === 'metric' && !/[a-z'"′″]/i.test(trimmed))) return null;
  return asNumber(feet[1]) * metresPerFoot + (feet[2] ? asNumber(feet[2]) * metresPerInch : 0);
}

type Range = { min: number; max: number; what: string; optional?: boolean };
/** What a schema's context does here: takes a fault at a field. */
type Faults = { addIssue: (issue: { code: 'custom'; path: (string | number)[]; message: string }) => void };

const example = (units: UnitSystem) => (units === 'us' ? 'for example 30 or 30 ft 6 in' : 'for example 9.1 or 9.1 m');
const bound = (metres: number, units: UnitSystem) =>
  units === 'us' ? `${Number((metres / metresPerFoot).toFixed(1))} ft` : `${Number(metres.toFixed(2))} m`;

/** Reads one length field inside a schema's transform; adds an issue at `path` and returns 0 when it is wrong. An empty optional field is 0. */
export function readLength(text: string | undefined, units: UnitSystem, range: Range, ctx: Faults, path: (string | number)[]): number {
  const fault = (message: string) => {
    ctx.addIssue({ code: 'custom', path, message });
    return 0;
  };
  if (!text?.trim()) return range.optional ? 0 : fault(`${range.what} is missing: ${example(units)}.`);
  const metres = parseLength(text, units);
  if (metres === null || !Number.isFinite(metres)) return fault(`${range.what} could not be read: write it like ${example(units)}.`);
  if (metres < range.min - 1e-9 || metres > range.max + 1e-9) {
    return fault(`${range.what} should be between ${bound(range.min, units)} and ${bound(range.max, units)}.`);
  }
  return metres;
}

/** A checkbox: present means yes. */
export const checkbox = z.union([z.literal('on'), z.literal('true'), z.literal('yes'), z.literal(''), z.boolean()]).optional().transform((value) => value === true || (typeof value === 'string' && value !== ''));

/** An optional short text; empty becomes undefined. */
export const shortText = (what: string, most: number) =>
  z.string().trim().max(most, `${what} may have at most ${most} characters.`).optional().transform((text) => text || undefined);

export const neededText = (what: string, most: number) =>
  z.string({ error: `${what} is missing.` }).trim().min(1, `${what} is missing.`).max(most, `${what} may have at most ${most} characters.`);

/** A closed choice with a plain message. */
export const choice = <const T extends readonly [string, ...string[]]>(values: T, what: string) => z.enum(values, { error: `Choose ${what}.` });

/** A money amount in dollars as typed ('1,250.50', '$40'), in cents. Empty is undefined. */
export const dollars = (what: string) =>
  z.string().trim().optional().transform((text, ctx) => {
    if (!text) return undefined;
    const plain = text.replace(/[$,\s]/g, '');
    if (!/^\d{1,7}(\.\d{1,2})?$/.test(plain)) {
      ctx.addIssue({ code: 'custom', message: `${what} could not be read: write it like 240 or 240.50.` });
      return undefined;
    }
    return Math.round(Number(plain) * 100);
  });

/** Monday first, as in rrule. */
export const weekdays = ['MO', 'TU', 'WE', 'TH', 'FR', 'SA', 'SU'] as const;
export const frequencies = ['YEARLY', 'MONTHLY', 'WEEKLY', 'DAILY', 'HOURLY'] as const;
export type Frequency = (typeof frequencies)[number];

/** A weekday (0 = Monday), or the n-th one of a month or year; negative n counts from the end. */
export type ByDay = { weekday: number; n?: number };

/** A recurrence rule of RFC 5545 §3.3.10 over calendar days, read and found valid. Absent parts are empty lists. */
export type Rule = {
  freq: Frequency;
  interval: number;
  count?: number | undefined;
  /** The last instant (ms, UTC) at which an occurrence may lie. */
  until?: number | undefined;
  wkst: number;
  byMonth: number[];
  byMonthDay: number[];
  byYearDay: number[];
  byWeekNo: number[];
  byDay: ByDay[];
  bySetPos: number[];
};

/** What is wrong with a rule, in words for the person who wrote it. */
export class RuleFault extends RangeError {}

const fault = (text: string): never => {
  throw new RuleFault(text);
};

const longestText = 500;

/** The parts of the text by name. */
export function partsOf(text: string): Map<string, string> {
  const body = text.trim().toUpperCase().replace(/^RRULE:/, '');
  if (body === '') fault('The rule is empty. Write one like FREQ=YEARLY;BYMONTH=5.');
  if (body.length > longestText) fault(`The rule is longer than ${longestText} characters.`);
  const parts = new Map<string, string>();
  for (const part of body.split(';')) {
    const [name = '', value = '', ...more] = part.split('=');
    if (!/^[A-Z-]+$/.test(name) || value === '' || more.length > 0) fault(`“${part}” should be a name and a value, like INTERVAL=2.`);
    if (parts.has(name)) fault(`${name} may be given once only.`);
    parts.set(name, value);
  }
  return parts;
}

/** Whole numbers between −most and most, without 0; `signed` allows those below it. */
export function numbersIn(parts: Map<string, string>, name: string, most: number, signed: boolean): number[] {
  const text = parts.get(name);
  if (text === undefined) return [];
  return text.split(',').map((one) => {
    const n = /^[+-]?\d{1,3}$/.test(one) ? Number(one) : 0;
    const range = signed ? `from 1 to ${most} or −${most} to −1` : `from 1 to ${most}`;
    return n !== 0 && Math.abs(n) <= most && (signed || n > 0) ? n : fault(`${name}=${one}: whole numbers ${range} are allowed.`);
  });
}

export function countIn(parts: Map<string, string>, name: string): number | undefined {
  const text = parts.get(name);
  if (text === undefined) return undefined;
  return /^\d{1,5}$/.test(text) && Number(text) > 0 ? Number(text) : fault(`${name}=${text}: a whole number from 1 to 99999 is needed.`);
}

export function weekdayIn(text: string, name: string): number {
  const index = (weekdays as readonly string[]).indexOf(text);
  return index >= 0 ? index : fault(`${name}=${text}: days are ${weekdays.join(', ')}.`);
}

export const byDayIn = (parts: Map<string, string>): ByDay[] =>
  (parts.get('BYDAY')?.split(',') ?? []).map((one) => {
    const match = /^([+-]?\d{1,2})?([A-Z]{2})$/.exec(one) ?? fault(`BYDAY=${one}: write it like MO, 1SU or -1FR.`);
    const weekday = weekdayIn(match[2] ?? '', 'BYDAY');
    if (match[1] === undefined) return { weekday };
    const n = Number(match[1]);
    return n !== 0 && Math.abs(n) <= 53 ? { weekday, n } : fault(`BYDAY=${one}: the number goes from 1 to 53 or −53 to −1.`);
  });

/**
 * UNTIL as the last instant, ms UTC. A date counts as a whole day. A date with time ends there; an occurrence lies at
 * noon UTC of its day, so midnight leaves that day out, as in the RFC's example UNTIL=19971224T000000Z.
 */
export function untilIn(parts: Map<string, string>): number | undefined {
  const text = parts.get('UNTIL');
  if (text === undefined) return undefined;
  const match = /^(\d{4})(\d{2})(\d{2})(?:T([01]\d|2[0-3])([0-5]\d)([0-5]\d)Z?)?$/.exec(text);
  const day = match ? `${match[1]}-${match[2]}-${match[3]}` : '';
  const instant = new Date(`${day}T${match?.[4] ? `${match[4]}:${match[5]}:${match[6]}` : '23:59:59'}Z`);
  const exists = !Number.isNaN(instant.getTime()) && instant.toISOString().startsWith(day);
  return exists ? instant.getTime() : fault(`UNTIL=${text}: write the last day like UNTIL=20301231.`);
}

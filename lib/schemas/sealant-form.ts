import { type FormValues } from '@/lib/schemas/action-state';
import { containerRows, typedIn } from '@/lib/schemas/calculator-values';
import { type Note, readContainers, type SizeReader } from '@/lib/schemas/container-rows';
import { type SealantBody, sealantSchema } from '@/lib/schemas/sealant';
import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { exampleSealants, fluidOuncesPerGallon, type SealantAnswer, sealantAnswer } from '@/lib/takeoff/sealant-need';
import { sealantContainerText } from '@/lib/takeoff/sealant-words';
import { litresPerGallon, metresPerInch } from '@/lib/units';

/** A home's wall as the form of the caulk takes it, in ft as it is sent. */
export type CaulkWall = { id: string; name: string } & NonNullable<SealantBody['walls']>[number];

export type CaulkAsk = { walls: readonly CaulkWall[]; nominalIn: number; units: UnitSystem };

const mmPerInch = metresPerInch * 1000;
const fields = { caulkWidth: 'jointWidthIn', pipes: 'penetrations.count', caulkWaste: 'wastePercent' } as const;

/** Containers as their labels say them, in either system of units. */
const examples = exampleSealants.map(({ gal, priceCents }) => ({ size: sealantContainerText(gal, 'us'), price: (priceCents / 100).toFixed(2) }));

/** What the form starts with, where nothing else was sent: pipes as noted for the walls. The joint: common practice, no source. */
export const usualCaulk = (ids: readonly string[], units: UnitSystem, sent: FormValues = {}): FormValues => ({
  caulkWalls: [...ids],
  caulkWidth: units === 'us' ? '0.25' : String(mmPerInch / 4),
  pipes: '',
  caulkWaste: '10',
  caulkContainers: containerRows(sent, 'caulkContainers', examples),
});

/** '10.1 fl oz', '600 mL'; a bare number is in the reader's own unit. */
const caulkSize = (units: UnitSystem): SizeReader => (text) => {
  const [, number = text, unit = ''] = /^(.*?)\s*(fl\.? ?oz\.?|oz\.?|ml)$/i.exec(text.trim()) ?? [];
  const metric = unit ? /^ml$/i.test(unit) : units === 'metric';
  return metric ? { number, unit: 'mL', gallons: 1 / (1000 * litresPerGallon) } : { number, unit: 'fl oz', gallons: 1 / fluidOuncesPerGallon };
};

/** Smallest and largest container of caulk, US gallons: 1 and 64 fl oz. */
const sizeRange = { min: 1 / fluidOuncesPerGallon, max: 64 / fluidOuncesPerGallon };

const chosenWalls = (values: FormValues, { walls }: CaulkAsk) => {
  const ids = Array.isArray(values.caulkWalls) ? values.caulkWalls : [];
  return walls.filter(({ id }) => ids.includes(id));
};

/** Pipes and fittings noted for the walls that are chosen. */
export const notedPipes = (values: FormValues, ask: CaulkAsk): number => chosenWalls(values, ask).reduce((sum, { pipes = 0 }) => sum + pipes, 0);

const numberIn = (values: FormValues, field: string): number => {
  const text = typedIn(values, field).trim().replace(',', '.');
  return text === '' ? NaN : Number(text);
};

type CaulkReading = Pick<Note, 'faults' | 'missing'> & { body: SealantBody | null };

/** Reads the form: the body when nothing is wrong and a wall is chosen; faults by field; what a begun container row still lacks. */
export function readCaulk(values: FormValues, ask: CaulkAsk): CaulkReading {
  const { nominalIn, units } = ask;
  const chosen = chosenWalls(values, ask);
  if (chosen.length === 0) return { body: null, faults: {}, missing: {} };
  const note: Note = { faults: {}, missing: {}, units };
  const asNoted = typedIn(values, 'pipes').trim() === '';
  const body = {
    units,
    walls: chosen.map(({ widthFt, heightFt, gableHeightFt = 0, openings = [], corners = 2, pipes = 0 }) => ({ widthFt, heightFt, gableHeightFt, openings, corners, pipes: asNoted ? pipes : 0 })),
    jointWidthIn: numberIn(values, 'caulkWidth') / (units === 'us' ? 1 : mmPerInch),
    nominalIn: nominalIn as 6 | 8 | 10,
    penetrations: { count: asNoted ? 0 : numberIn(values, 'pipes') },
    wastePercent: numberIn(values, 'caulkWaste'),
    containers: readContainers(values, 'caulkContainers', { ...sizeRange, read: caulkSize(units) }, note).map(({ gal, priceCents }) => ({ floz: gal * fluidOuncesPerGallon, priceCents })),
  };
  const judged = sealantSchema.safeParse(body);
  for (const { path, message } of judged.error?.issues ?? []) {
    const field = Object.entries(fields).find(([, sent]) => sent === path.join('.'))?.[0];
    // What is wrong with a container is said at its own row.
    if (!field && path[0] === 'containers' && Object.keys(note.faults).length > 0) continue;
    note.faults[field ?? ''] = field === 'caulkWidth' ? `A joint is ${units === 'us' ? '0.25 to 1 in' : '6.35 to 25.4 mm'} wide.` : message;
  }
  const { faults, missing } = note;
  return { body: Object.keys(faults).length > 0 ? null : body, faults, missing };
}

/** The estimate of the form, where the form is made on the server. */
export function answerCaulk(values: FormValues, ask: CaulkAsk): SealantAnswer | undefined {
  const { body } = readCaulk(values, ask);
  return body ? sealantAnswer(sealantSchema.parse(body)) : undefined;
}

import { type FormValues } from '@/lib/schemas/action-state';
import { typedIn } from '@/lib/schemas/calculator-values';
import { type SealantBody, sealantSchema } from '@/lib/schemas/sealant';
import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { type SealantAnswer, sealantAnswer } from '@/lib/takeoff/sealant-need';
import { metresPerInch } from '@/lib/units';

/** A home's wall as the form of the caulk takes it, in ft as it is sent. */
export type CaulkWall = { id: string; name: string } & NonNullable<SealantBody['walls']>[number];

export type CaulkAsk = { walls: readonly CaulkWall[]; nominalIn: number; units: UnitSystem };

const mmPerInch = metresPerInch * 1000;
const fields = { caulkWidth: 'jointWidthIn', pipes: 'penetrations.count', caulkWaste: 'wastePercent' } as const;

/** What the form starts with. The joint: common practice, no source. */
export const usualCaulk = (ids: readonly string[], units: UnitSystem): FormValues => ({ caulkWalls: [...ids], caulkWidth: units === 'us' ? '0.25' : String(mmPerInch / 4), pipes: '0', caulkWaste: '10' });

const numberIn = (values: FormValues, field: string): number => {
  const text = typedIn(values, field).trim().replace(',', '.');
  return text === '' ? NaN : Number(text);
};

/** Reads the form: the body when nothing is wrong and a wall is chosen; faults by field. */
export function readCaulk(values: FormValues, { walls, nominalIn, units }: CaulkAsk): { body: SealantBody | null; faults: Record<string, string> } {
  const ids = Array.isArray(values.caulkWalls) ? values.caulkWalls : [];
  const chosen = walls.filter(({ id }) => ids.includes(id)).map(({ widthFt, heightFt, gableHeightFt = 0, openings = [] }) => ({ widthFt, heightFt, gableHeightFt, openings }));
  if (chosen.length === 0) return { body: null, faults: {} };
  const width = numberIn(values, 'caulkWidth') / (units === 'us' ? 1 : mmPerInch);
  const body = { units, walls: chosen, jointWidthIn: width, nominalIn: nominalIn as 6 | 8 | 10, penetrations: { count: numberIn(values, 'pipes') }, wastePercent: numberIn(values, 'caulkWaste') };
  const judged = sealantSchema.safeParse(body);
  if (judged.success) return { body, faults: {} };
  const faults: Record<string, string> = {};
  for (const { path, message } of judged.error.issues) {
    const field = Object.entries(fields).find(([, sent]) => sent === path.join('.'))?.[0] ?? '';
    faults[field] = field === 'caulkWidth' ? `A joint is ${units === 'us' ? '0.25 to 1 in' : '6.35 to 25.4 mm'} wide.` : message;
  }
  return { body: null, faults };
}

/** The estimate of the form, where the form is made on the server. */
export function answerCaulk(values: FormValues, ask: CaulkAsk): SealantAnswer | undefined {
  const { body } = readCaulk(values, ask);
  return body ? sealantAnswer(sealantSchema.parse(body)) : undefined;
}

import { z } from 'zod';
import { isCalendarDay } from '@/lib/calendar';
import { choice, dollars, neededText, shortText } from '@/lib/schemas/measures';
import { filmStates, finishes, keysOf, sealants, stainBases, unitSystems, workKinds } from '@/lib/schemas/vocabulary';

const litresPerGallon = 3.785411784;

export const optionalChoice = <T extends [string, ...string[]]>(values: T) =>
  z.union([z.enum(values), z.literal('')]).optional().transform((value) => (value || undefined) as T[number] | undefined);

const amount = z.string().trim().optional().transform((text, ctx) => {
  if (!text) return undefined;
  const value = Number(text.replace(',', '.'));
  if (Number.isFinite(value) && value >= 0 && value <= 5000) return value;
  ctx.addIssue({ code: 'custom', message: 'The amount could not be read: write it like 3 or 3.5.' });
  return undefined;
});

const fields = z.object({
  homeId: neededText('The home', 60),
  submissionKey: z.uuid('Reload the page and send this again.'),
  units: z.enum(keysOf(unitSystems)),
  kind: choice(keysOf(workKinds), 'what was done'),
  wallIds: z.array(z.string().min(1).max(60), { error: 'Choose at least one wall.' }).min(1, 'Choose at least one wall.').max(60),
  doneOn: z.string({ error: 'Say which day.' }).trim().refine(isCalendarDay, 'Say which day, like 2026-06-15.'),
  product: shortText('The product', 120),
  amount,
  cost: dollars('The cost'),
  note: shortText('The note', 2000),
  finish: optionalChoice(keysOf(finishes)),
  stainBase: optionalChoice(keysOf(stainBases)),
  colorHex: z.union([z.string().regex(/^#[0-9a-fA-F]{6}$/, 'Choose a color.'), z.literal('')]).optional().transform((hex) => hex || undefined),
  sealant: optionalChoice(keysOf(sealants)),
  /** How the coat or caulk that was renewed was found. */
  oldFilm: optionalChoice(keysOf(filmStates)),
});

/** The log form: the amount in gallons or litres as typed; out come litres. What does not belong to the kind of work is dropped. */
export const logWorkSchema = fields.transform((form) => {
  const { amount: typed, units, cost, ...rest } = form;
  const amountL = typed === undefined ? undefined : units === 'us' ? typed * litresPerGallon : typed;
  const coat = rest.kind === 'restain';
  return {
    ...rest,
    wallIds: [...new Set(rest.wallIds)],
    costCents: cost,
    amountL,
    finish: coat ? rest.finish : undefined,
    stainBase: coat ? rest.stainBase : undefined,
    colorHex: coat ? rest.colorHex : undefined,
    sealant: rest.kind === 'recaulk' ? rest.sealant : undefined,
    oldFilm: coat || rest.kind === 'recaulk' ? rest.oldFilm : undefined,
  };
});

export type LogWorkInput = z.output<typeof logWorkSchema>;

export const removeWorkSchema = z.object({ recordId: neededText('The record', 60) });

import { z } from 'zod';
import { isCalendarDay } from '@/lib/calendar';
import { alsoAnswers, caulkAnswers, coatFound, colorAnswers, filmAnswers, sealFound, type WalkaroundAnswers, waterAnswers } from '@/lib/home/walkaround';
import { checkbox, shortText } from '@/lib/schemas/measures';
import { homeTarget } from '@/lib/schemas/targets';
import { keysOf } from '@/lib/schemas/vocabulary';
import { optionalChoice } from '@/lib/schemas/work';

const oneWall = z
  .object({
    water: optionalChoice(keysOf(waterAnswers)),
    color: optionalChoice(keysOf(colorAnswers)),
    film: optionalChoice(keysOf(filmAnswers)),
    caulk: optionalChoice(keysOf(caulkAnswers)),
    also: z.partialRecord(z.enum(keysOf(alsoAnswers)), checkbox).default({}),
  })
  .transform(({ also, ...seen }): WalkaroundAnswers => ({ ...seen, also: keysOf(alsoAnswers).filter((one) => also[one]) }));

const saysSomething = ({ also, ...seen }: WalkaroundAnswers) => also.length > 0 || Object.values(seen).some((answer) => answer !== undefined);

/** A walkaround: what was seen on each wall. Walls without an answer were not looked at; how the films stand follows from the answers. */
export const walkaroundSchema = homeTarget
  .extend({
    submissionKey: z.uuid('Reload the page and send this again.'),
    doneOn: z.string({ error: 'Say which day.' }).trim().refine(isCalendarDay, 'Say which day, like 2026-06-15.'),
    note: shortText('The note', 2000),
    walls: z.record(z.string().min(1).max(60), oneWall, { error: 'Answer a question about at least one wall.' }),
  })
  .transform(({ walls, ...rest }, ctx) => {
    const findings = Object.entries(walls).flatMap(([wallId, answers]) => (saysSomething(answers) ? [{ wallId, answers, coat: coatFound(answers), seal: sealFound(answers) }] : []));
    if (findings.length === 0) ctx.addIssue({ code: 'custom', path: [], message: 'Nothing is answered yet. Answer what you saw on at least one wall.' });
    return { ...rest, findings };
  });

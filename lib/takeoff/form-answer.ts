import { type FormValues } from '@/lib/schemas/action-state';
import { readCalculator } from '@/lib/schemas/calculator';
import { estimateSchema } from '@/lib/schemas/estimate';
import { type StainAnswer, stainAnswer } from './estimate';

/** The estimate of a calculator's form, where the form is made on the server; undefined while something is wrong or nothing is there. */
export function answerForm(values: FormValues): StainAnswer | undefined {
  const { body } = readCalculator(values);
  const ask = body ? estimateSchema.safeParse(body) : undefined;
  return ask?.success ? stainAnswer(ask.data) : undefined;
}

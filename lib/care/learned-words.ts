import { exactDay } from '@/lib/calendar-words';
import { yearOf } from '@/lib/calendar';
import { learningSource } from '@/lib/coat/learning';
import { type ExplainedInput, type Explanation } from '@/lib/explain';
import { ourRule } from '@/lib/our-rules';
import { filmStates } from '@/lib/schemas/vocabulary';
import { type FilmLife } from './types';

const names = { coat: 'coat', seal: 'caulk' } as const;
/** A difference under this is not worth a sentence, percent. Our rule. */
const worthSaying = 2;

const years = (value: number) => `${value.toFixed(1)} years`;

/** 'This wall’s coat has worn 18 % faster than the model since 2021.', or null where nothing, or next to nothing, was learned. */
export function learnedWords({ film, factor, learned }: Pick<FilmLife, 'film' | 'factor' | 'learned'>): string | null {
  const [first] = learned;
  if (!first) return null;
  const percent = Math.round(100 * Math.abs(1 / factor - 1));
  const since = `since ${yearOf(first.startedOn)}`;
  if (percent < worthSaying) return `This wall’s ${names[film]} has worn as the model says ${since}.`;
  return `This wall’s ${names[film]} has worn ${percent} % ${factor < 1 ? 'faster' : 'slower'} than the model ${since}.`;
}

/** How a film was found, and what it did to the wall's factor: one line a film, oldest first. */
export const learnedInputs = ({ film, learned }: Pick<FilmLife, 'film' | 'learned'>): ExplainedInput[] =>
  learned.map(({ startedOn, on, state, ageYears, modelYears, before, after }) => ({
    label: `${film === 'coat' ? 'Coat' : 'Caulk'} of ${exactDay(startedOn)}: ${filmStates[state].toLowerCase()} on ${exactDay(on)}, ${years(ageYears)} old; the model said ${years(modelYears)}`,
    value: `factor ${before.toFixed(2)} → ${after.toFixed(2)}`,
  }));

export const assumedSource = ourRule('assumed age');

/** The explanation of a life with what the wall's own history added to it. */
export function lifeExplained({ explanation, ...film }: FilmLife): Explanation {
  const sources = [...explanation.sources, ...(film.learned.length > 0 ? [learningSource] : []), ...(film.assumed ? [assumedSource] : [])];
  return { ...explanation, inputs: [...explanation.inputs, ...learnedInputs(film)], sources };
}

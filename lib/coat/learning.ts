import { type CalendarDay } from '@/lib/calendar';
import { ourRule } from '@/lib/our-rules';
import { type FilmState } from '@/lib/schemas/vocabulary';

/** A film of the past that was looked at: how old it was, how it was found, how long the model had it last. Ages in years. */
export type FilmSeen = { startedOn: CalendarDay; on: CalendarDay; state: FilmState; ageYears: number; modelYears: number };

/** What one film taught: the wall's factor before and after it. */
export type LearnedStep = FilmSeen & { before: number; after: number };

/** Log standard deviations: of what walls do apart from the model, and of one finding. Our rule. */
const priorSd = 0.25;
const sightings: Record<FilmState, { ageTimes: number; sd: number }> = {
  due: { ageTimes: 1, sd: 0.15 },
  'past due': { ageTimes: 0.85, sd: 0.25 },
  sound: { ageTimes: 1.15, sd: 0.25 },
};
const least = 0.5;
const most = 2;

/** Where a factor comes from, for whoever opens a life that was learned from. */
export const learningSource = ourRule('learning');

/** An age below this (a month) says nothing: its logarithm would run away. Our rule. */
const youngestYears = 1 / 12;

/** The age that a finding stands for, years: when a coat found so was due. Our rule. */
export const dueAge = ({ state, ageYears }: Pick<FilmSeen, 'state' | 'ageYears'>): number => sightings[state].ageTimes * ageYears;

/**
 * The wall's own factor k from the films that were looked at, oldest first; each film counts once. A normal-normal update of log k:
 * prior 0 with standard deviation 0.25; a film found due at age a observes log(a / modelled life) with 0.15; past due counts as 0.85 a,
 * with 0.25; sound beyond what was expected of it (modelled life × k so far) as 1.15 a, with 0.25; sound before that teaches nothing.
 * k stays within 0.5–2. Our rule.
 *
 * Example: modelled 5 years, found due at 4: log 0.8 = −0.223, weight 0.15⁻² / (0.15⁻² + 0.25⁻²) = 0.735; k = exp(−0.164) = 0.849.
 */
export function learnedFactor(seen: readonly FilmSeen[]): { factor: number; steps: LearnedStep[] } {
  let precision = 1 / priorSd ** 2;
  let weighted = 0;
  let factor = 1;
  const steps: LearnedStep[] = [];
  for (const film of seen) {
    if (film.ageYears < youngestYears || (film.state === 'sound' && film.ageYears <= film.modelYears * factor)) continue;
    const weight = 1 / sightings[film.state].sd ** 2;
    weighted += weight * Math.log(dueAge(film) / film.modelYears);
    precision += weight;
    const before = factor;
    factor = Math.min(most, Math.max(least, Math.exp(weighted / precision)));
    steps.push({ ...film, before, after: factor });
  }
  return { factor, steps };
}

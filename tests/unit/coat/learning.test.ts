import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type FilmSeen, learnedFactor } from '@/lib/coat/learning';
import { filmStates, keysOf } from '@/lib/schemas/vocabulary';

const seen = (values: Partial<FilmSeen>): FilmSeen => ({ startedOn: '2020-06-01', on: '2024-06-01', state: 'due', ageYears: 4, modelYears: 5, ...values });

/** The update written as Bayes' rule on a grid of log k: an independent way to the same mean. */
function meanOnGrid(observations: { x: number; sd: number }[]): number {
  let [mass, moment] = [0, 0];
  for (let logK = -4; logK <= 4; logK += 0.0005) {
    const density = Math.exp(-0.5 * (logK / 0.25) ** 2 - observations.reduce((sum, { x, sd }) => sum + 0.5 * ((x - logK) / sd) ** 2, 0));
    mass += density;
    moment += density * logK;
  }
  return Math.exp(moment / mass);
}

describe('a wall’s own factor', () => {
  it('is 1 when nothing was seen', () => {
    expect(learnedFactor([])).toEqual({ factor: 1, steps: [] });
  });

  // Weights by hand: 1/0.15² = 44.44, 1/0.25² = 16: a due coat moves log k by 44.44/60.44 of the way, the others by half.
  it.each([
    { film: seen({ state: 'due', ageYears: 4 }), factor: Math.exp((44.444444 / 60.444444) * Math.log(4 / 5)) },
    { film: seen({ state: 'past due', ageYears: 4 }), factor: Math.exp(0.5 * Math.log((0.85 * 4) / 5)) },
    { film: seen({ state: 'sound', ageYears: 6 }), factor: Math.exp(0.5 * Math.log((1.15 * 6) / 5)) },
  ])('follows a film found $film.state at $film.ageYears of 5 years', ({ film, factor }) => {
    expect(learnedFactor([film]).factor).toBeCloseTo(factor, 6);
  });

  it('learns nothing from a film that was sound before its time, nor from one a few days old', () => {
    expect(learnedFactor([seen({ state: 'sound', ageYears: 4.9 })])).toEqual({ factor: 1, steps: [] });
    expect(learnedFactor([seen({ state: 'due', ageYears: 0.02 })])).toEqual({ factor: 1, steps: [] });
  });

  it('measures “beyond what was expected” by what it knows so far', () => {
    const worn = seen({ state: 'due', ageYears: 3 });
    // After the first film k = exp(0.735 × log 0.6) = 0.687, so 3.5 of 5 years is beyond the expected 3.43.
    expect(learnedFactor([worn, seen({ state: 'sound', ageYears: 3.5 })]).steps).toHaveLength(2);
    expect(learnedFactor([worn, seen({ state: 'sound', ageYears: 3.4 })]).steps).toHaveLength(1);
  });

  it('agrees with Bayes’ rule on a grid', () => {
    const films = [seen({ ageYears: 4 }), seen({ state: 'past due', ageYears: 6.5 }), seen({ state: 'due', ageYears: 5.5 })];
    const expected = meanOnGrid([{ x: Math.log(4 / 5), sd: 0.15 }, { x: Math.log((0.85 * 6.5) / 5), sd: 0.25 }, { x: Math.log(5.5 / 5), sd: 0.15 }]);
    expect(learnedFactor(films).factor).toBeCloseTo(expected, 4);
  });

  it('stays between 0.5 and 2, and each step begins where the one before ended', () => {
    const film = fc.record({ state: fc.constantFrom(...keysOf(filmStates)), ageYears: fc.double({ min: 0.001, max: 60, noNaN: true }), modelYears: fc.double({ min: 0.1, max: 20, noNaN: true }) });
    fc.assert(
      fc.property(fc.array(film, { maxLength: 12 }), (films) => {
        const { factor, steps } = learnedFactor(films.map(seen));
        expect(factor).toBeGreaterThanOrEqual(0.5);
        expect(factor).toBeLessThanOrEqual(2);
        steps.forEach((step, i) => expect(step.before).toBe(steps[i - 1]?.after ?? 1));
        expect(steps.at(-1)?.after ?? 1).toBe(factor);
      }),
    );
  });

  it('rises with the age at which a film is found due', () => {
    const years = fc.double({ min: 0.1, max: 30, noNaN: true });
    fc.assert(
      fc.property(years, years, (a, b) => {
        const [younger, older] = a < b ? [a, b] : [b, a];
        expect(learnedFactor([seen({ ageYears: older })]).factor).toBeGreaterThanOrEqual(learnedFactor([seen({ ageYears: younger })]).factor);
      }),
    );
  });
});

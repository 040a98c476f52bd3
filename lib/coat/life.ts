import { type ExplainedInput, type Explanation } from '@/lib/explain';
import { monthsInWords } from './life-words';
import { type ServiceLife } from './service-life';
import { severityInputs, severityOf, sourcesOfSeverity, type Weathering, type Weights } from './severity';

/** How long a film lasts on one wall. */
export type Life = {
  /** Whole months, at least 1. */
  months: number;
  lowYears: number;
  highYears: number;
  /** 0 (gentlest, the long end of the range) to 1 (hardest, the short end). */
  severity: number;
  explanation: Explanation;
};

export type Film = { figure: string; what: ExplainedInput[]; range: ServiceLife; weights: Weights; factor: number };

/**
 * Life in months = 12 × (high − severity × (high − low)) × factor, rounded to whole months. Our rule on published ranges;
 * inside the range while the factor is 1. The factor (0.5–2) is what a wall's own history has taught.
 *
 * Example: 4–8 years, severity 0.55, factor 1: 12 × (8 − 0.55 × 4) = 69.6, so 70 months.
 */
export function filmLife(film: Film, weathering: Weathering): Life {
  const { lowYears, highYears, source } = film.range;
  const severity = severityOf(weathering, film.weights);
  const years = highYears - severity * (highYears - lowYears);
  const months = Math.max(1, Math.round(years * 12 * film.factor));
  return {
    months,
    lowYears,
    highYears,
    severity,
    explanation: {
      figure: film.figure,
      value: monthsInWords(months),
      formula: 'high − severity × (high − low), × the wall’s own factor; severity = sun weight × sun share + rain weight × rain share',
      inputs: [
        ...film.what,
        { label: 'Range for this film', value: `${lowYears} to ${highYears} years` },
        ...severityInputs(weathering, film.weights),
        { label: 'The wall’s own factor', value: film.factor.toFixed(2) },
      ],
      sources: [source, ...sourcesOfSeverity(weathering)],
    },
  };
}

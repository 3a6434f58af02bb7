import { type Covariance, classicalCovariance, coefficientError } from '../engine/covariance.ts';
import type { Fit } from '../engine/fit.ts';
import { tTwoSided, tTwoSidedQuantile } from '../stats/distributions.ts';
import { predictorCount } from './terms.ts';

/** One coefficient, spelled as the record has it. */
export interface CoefficientFigures {
  readonly name: string;
  /** Name of the first term that has the column; "intercept" for the constant. */
  readonly term: string;
  readonly estimate: number;
  /** Null where there are no degrees of freedom or the fit is exact; so for the four that follow. */
  readonly standard_error: number | null;
  readonly t: number | null;
  readonly p_value: number | null;
  readonly lower: number | null;
  readonly upper: number | null;
  /** Null for the intercept, and in a model with fewer than two other columns. */
  readonly vif: number | null;
}

/**
 * Estimates with standard errors √V_jj, t on the covariance's degrees of freedom (n − p for the classical one),
 * two-sided p-values and intervals, in the order of the kept columns.
 * @param columnNames by union column
 * @param confidence of the intervals, between 0 and 1
 * @param covariance null where there is none: nothing is then said of the errors
 */
export function coefficientFigures(
  fit: Fit,
  columnNames: readonly string[],
  confidence: number,
  covariance: Covariance | null = classicalCovariance(fit),
): CoefficientFigures[] {
  const df = covariance?.df ?? 0;
  const reach = covariance === null ? 0 : tTwoSidedQuantile(1 - confidence, df);
  const inflated = predictorCount(fit) >= 2;
  return fit.columns.map((column, j) => {
    const estimate = fit.estimates[j]!;
    const vif = fit.vif[j]!;
    const known = {
      name: columnNames[column]!,
      term: fit.candidate.terms.find((term) => term.columns.includes(column))?.name ?? 'intercept',
      estimate,
      vif: inflated && Number.isFinite(vif) ? vif : null,
    };
    const error = covariance === null ? 0 : coefficientError(covariance, j);
    // An error of 0 is one too small to be held: nothing can be said of it either.
    if (!(error > 0) || !Number.isFinite(error))
      return { ...known, standard_error: null, t: null, p_value: null, lower: null, upper: null };
    const t = estimate / error;
    return {
      ...known,
      standard_error: error,
      t,
      p_value: tTwoSided(t, df),
      lower: estimate - reach * error,
      upper: estimate + reach * error,
    };
  });
}

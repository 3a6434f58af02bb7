import type { Fit } from '../engine/fit.ts';
import { tTwoSided, tTwoSidedQuantile } from '../stats/distributions.ts';
import { testable } from './f-test.ts';
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
 * Estimates with classical standard errors √(s² (X′WX)⁻¹_jj), t on n − p, two-sided p-values and intervals, in
 * the order of the kept columns.
 * @param columnNames by union column
 * @param confidence of the intervals, between 0 and 1
 */
export function coefficientFigures(
  fit: Fit,
  columnNames: readonly string[],
  confidence: number,
): CoefficientFigures[] {
  const p = fit.columns.length;
  const df = fit.degreesOfFreedom;
  const canTest = testable(fit);
  const variance = canTest ? fit.residualSumOfSquares / df : 0;
  const reach = canTest ? tTwoSidedQuantile(1 - confidence, df) : 0;
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
    const error = Math.sqrt(fit.inverse[j * p + j]! * variance);
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

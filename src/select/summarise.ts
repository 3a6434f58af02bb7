import type { FitContext } from '../engine/fit.ts';
import { aic } from './criteria/aic.ts';
import { aicc } from './criteria/aicc.ts';
import { bic } from './criteria/bic.ts';
import { mallowsCp } from './criteria/mallows-cp.ts';
import { press } from './criteria/press.ts';
import { finiteOrNull } from './criterion.ts';
import { type FTest, overallF } from './f-test.ts';
import { adjustedRSquared, predictedRSquared, residualStandardError, rSquared } from './r-squared.ts';
import { largestVif } from './terms.ts';

/** The figures of one candidate that come from its fit, spelled as the record has them. Null: not defined. */
export interface CandidateFigures {
  readonly rows: number;
  readonly coefficient_count: number;
  readonly r_squared: number | null;
  readonly adjusted_r_squared: number | null;
  readonly predicted_r_squared: number | null;
  readonly residual_standard_error: number | null;
  readonly residual_sum_of_squares: number;
  readonly degrees_of_freedom: number;
  readonly log_likelihood: number | null;
  readonly aic: number | null;
  readonly aicc: number | null;
  readonly bic: number | null;
  readonly mallows_cp: number | null;
  readonly press: number | null;
  readonly overall_f: FTest | null;
  readonly largest_vif: number | null;
  readonly condition_number: number | null;
}

/** All figures of the fit `context.fits[index]` but its coefficients; one p-value, that of the overall F. */
export function summarise(index: number, context: FitContext): CandidateFigures {
  const fit = context.fits[index]!;
  const pressValue = press.value(index, context);
  return {
    rows: fit.rowCount,
    coefficient_count: fit.columns.length,
    r_squared: rSquared(fit),
    adjusted_r_squared: adjustedRSquared(fit),
    predicted_r_squared: predictedRSquared(fit, pressValue),
    residual_standard_error: residualStandardError(fit),
    residual_sum_of_squares: fit.residualSumOfSquares,
    degrees_of_freedom: fit.degreesOfFreedom,
    log_likelihood: fit.logLikelihood === null ? null : finiteOrNull(fit.logLikelihood),
    aic: aic.value(index, context),
    aicc: aicc.value(index, context),
    bic: bic.value(index, context),
    mallows_cp: mallowsCp.value(index, context),
    press: pressValue,
    overall_f: overallF(fit),
    largest_vif: largestVif(fit),
    condition_number: finiteOrNull(fit.conditionNumber),
  };
}

import { classicalCovariance, coefficientError } from '../../engine/covariance.ts';
import type { Factor } from '../../engine/factor.ts';
import { columnNorm } from '../../engine/kernel.ts';
import { rSquared } from '../../select/r-squared.ts';
import { tTwoSidedQuantile } from '../../stats/distributions.ts';
import { fUpperQuantile } from '../../stats/f-quantile.ts';
import type { Chosen } from '../chosen.ts';

/** What a coefficient is beside its estimate. Null: not defined, as for the intercept. */
export interface CoefficientMeasures {
  readonly name: string;
  /** b_j s_xj/s_y, with the (weighted) standard deviations of the column and of the response on its fitted scale. */
  readonly standardised: number | null;
  /** Of the column and the response, both without what the other columns explain. */
  readonly partial_correlation: number | null;
  /** The same, with the response as it is: its square is what R² would lose without the column. */
  readonly semi_partial_correlation: number | null;
  /** Interval that holds for all coefficients together; null where not asked for or there is no standard error. */
  readonly simultaneous_lower: number | null;
  readonly simultaneous_upper: number | null;
}

export interface Simultaneous {
  readonly method: 'bonferroni' | 'scheffe';
  /** What the standard error is multiplied by. */
  readonly multiplier: number;
  readonly sentence: string;
}

/**
 * Partial and semi-partial correlations from t: r² = t²/(t² + n − p), sr² = t²(1 − R²)/(n − p), with the sign of t. They
 * describe the sample, so that t is the classical one whatever standard errors are declared.
 * @param factor that of the union, for the columns' standard deviations
 */
export function coefficientMeasures(
  chosen: Chosen,
  factor: Factor,
  simultaneous: Simultaneous | null,
): CoefficientMeasures[] {
  const { fit, columns, covariance } = chosen;
  const classical = classicalCovariance(fit);
  const unexplained = 1 - (rSquared(fit) ?? Number.NaN);
  const responseAt = factor.predictorCount + fit.candidate.responseColumn;
  // Column 0 of the union is the intercept: what is below the triangle's first row is about the mean.
  const spread = (column: number) =>
    columnNorm(factor.triangle, column, 1, column + 1) / factor.scales[column]!;
  const ofResponse = spread(responseAt);
  return fit.columns.map((column, j) => {
    const estimate = fit.estimates[j]!;
    const error = covariance === null ? null : coefficientError(covariance, j);
    const half = simultaneous === null || error === null ? null : simultaneous.multiplier * error;
    const t = classical === null || column === 0 ? null : estimate / coefficientError(classical, j);
    const df = fit.degreesOfFreedom;
    return {
      name: columns[column]!.name,
      standardised: column === 0 ? null : orNull((estimate * spread(column)) / ofResponse),
      partial_correlation: t === null ? null : orNull(t / Math.sqrt(t * t + df)),
      semi_partial_correlation: t === null ? null : orNull(t * Math.sqrt(unexplained / df)),
      simultaneous_lower: half === null ? null : estimate - half,
      simultaneous_upper: half === null ? null : estimate + half,
    };
  });
}

function orNull(value: number): number | null {
  return Number.isFinite(value) ? value : null;
}

/**
 * The multiplier of standard errors that makes intervals hold for all p coefficients together: t at (1 − confidence)/p
 * (Bonferroni), or √(p F) on p and the covariance's degrees of freedom (Scheffé 1953), which holds for every combination
 * of them as well. Null where not asked for.
 */
export function simultaneousOf(chosen: Chosen): Simultaneous | null {
  const { study, covariance, fit } = chosen;
  const { simultaneous: method, confidence } = study.inference;
  if (method === 'none' || covariance === null) return null;
  const p = fit.columns.length;
  const percent = `${Number((confidence * 100).toPrecision(6))} %`;
  return method === 'bonferroni'
    ? {
        method,
        multiplier: tTwoSidedQuantile((1 - confidence) / p, covariance.df),
        sentence: `The simultaneous intervals hold for all ${p} coefficients together with ${percent} confidence or more (Bonferroni).`,
      }
    : {
        method,
        multiplier: Math.sqrt(p * fUpperQuantile(1 - confidence, p, covariance.df)),
        sentence: `The simultaneous intervals hold for all ${p} coefficients and every combination of them together with ${percent} confidence (Scheffé 1953).`,
      };
}

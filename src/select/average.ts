import { type Covariance, classicalCovariance, coefficientError } from '../engine/covariance.ts';
import type { Fit, FitContext } from '../engine/fit.ts';
import { normalQuantile } from '../stats/distributions.ts';
import type { SelectionPlan } from '../study/study.ts';
import type { Admission } from './admission.ts';
import { evidenceWeights } from './evidence.ts';
import type { Ranked } from './rank.ts';

/** Inference over the admitted candidates, each by its weight of evidence. */
export interface Averaged {
  /** Admitted candidates with a value and standard errors, by index, best first; weights sum to 1. */
  readonly candidates: readonly { readonly candidate: number; readonly weight: number }[];
  readonly coefficients: readonly AveragedCoefficient[];
}

export interface AveragedCoefficient {
  /** Union column. */
  readonly column: number;
  /** Weight of the candidates that have it. */
  readonly weight: number;
  /** Over all candidates, 0 in those without it. */
  readonly estimate: number;
  readonly standardError: number;
  readonly lower: number;
  readonly upper: number;
  /** Over the candidates that have it, their weights scaled to 1. */
  readonly whereIncluded: { readonly estimate: number; readonly standardError: number };
}

/**
 * Averages over candidates (Burnham & Anderson 2002, 4.2 and 4.3): the estimate Σ w b, and the unconditional standard error
 * Σ w √(var + (b − b̄)²), which carries the candidates' disagreement; weights of evidence among the admitted ones. Intervals by the normal
 * quantile. Null where none is admitted with a standard error.
 * @param confidence of the intervals, between 0 and 1
 */
export function averaged(
  plan: SelectionPlan,
  context: FitContext,
  ranking: readonly Ranked[],
  admissions: readonly Admission[],
  confidence: number,
): Averaged | null {
  const covarianceOf = (index: number): Covariance | null =>
    context.covariances === undefined
      ? classicalCovariance(context.fits[index]!)
      : (context.covariances[index] ?? null);
  const among = ranking.filter(
    ({ candidate, value }) =>
      value !== null && admissions[candidate]!.admitted && covarianceOf(candidate) !== null,
  );
  if (among.length === 0) return null;
  const best = among.reduce((least, { value }) => Math.min(least, value!), Number.POSITIVE_INFINITY);
  const weights = evidenceWeights(
    plan.rankBy,
    among.map(({ value }) => value! - best),
  ).map((weight) => weight ?? 0);
  const models = among.map(({ candidate }, k) => ({
    candidate,
    weight: weights[k]!,
    fit: context.fits[candidate]!,
    covariance: covarianceOf(candidate)!,
  }));
  const columns = [...new Set(models.flatMap(({ fit }) => fit.columns))].sort((a, b) => a - b);
  const reach = -normalQuantile((1 - confidence) / 2);
  return {
    candidates: models.map(({ candidate, weight }) => ({ candidate, weight })),
    coefficients: columns.map((column): AveragedCoefficient => {
      const each = models.map(({ weight, fit, covariance }) => ({
        weight,
        ...estimateOf(fit, covariance, column),
      }));
      const having = each.filter(({ has }) => has);
      const weight = having.reduce((sum, one) => sum + one.weight, 0);
      const all = unconditional(each);
      const scaled = having.map((one) => ({
        ...one,
        weight: weight > 0 ? one.weight / weight : 1 / having.length,
      }));
      return {
        column,
        weight,
        ...all,
        lower: all.estimate - reach * all.standardError,
        upper: all.estimate + reach * all.standardError,
        whereIncluded: unconditional(scaled),
      };
    }),
  };
}

function estimateOf(
  fit: Fit,
  covariance: Covariance,
  column: number,
): { readonly has: boolean; readonly estimate: number; readonly error: number } {
  const at = fit.columns.indexOf(column);
  return at < 0
    ? { has: false, estimate: 0, error: 0 }
    : { has: true, estimate: fit.estimates[at]!, error: coefficientError(covariance, at) };
}

/** Σ w b and Σ w √(error² + (b − b̄)²). */
export function unconditional(
  each: readonly { readonly weight: number; readonly estimate: number; readonly error: number }[],
): { readonly estimate: number; readonly standardError: number } {
  const estimate = each.reduce((sum, one) => sum + one.weight * one.estimate, 0);
  const standardError = each.reduce(
    (sum, one) => sum + one.weight * Math.hypot(one.error, one.estimate - estimate),
    0,
  );
  return { estimate, standardError };
}

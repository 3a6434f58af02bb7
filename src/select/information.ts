import type { LeanFit } from '../engine/fit.ts';
import { finiteOrNull } from './criterion.ts';

/** k = p + 1: the error variance counts as a parameter. */
export function parameterCount(fit: LeanFit): number {
  return fit.columns.length + 1;
}

/** −2 ln L + penalty(k, n); null where the likelihood has no bound or the penalty is not defined. */
export function informationCriterion(fit: LeanFit, penalty: (k: number, n: number) => number): number | null {
  if (fit.logLikelihood === null) return null;
  return finiteOrNull(-2 * fit.logLikelihood + penalty(parameterCount(fit), fit.rowCount));
}

export function whyNoLikelihood(fit: LeanFit): string {
  return fit.exact || fit.degreesOfFreedom < 1
    ? 'it fits these rows exactly, so its likelihood has no upper bound'
    : 'its likelihood is not a finite number';
}

import type { LeanFit } from '../engine/fit.ts';

/**
 * R² = 1 − RSS/TSS, TSS about the (weighted) mean with an intercept and about zero without one; 1 for an
 * exact fit. Null where the response does not vary.
 */
export function rSquared(fit: LeanFit): number | null {
  if (!varies(fit)) return null;
  return fit.exact ? 1 : 1 - fit.residualSumOfSquares / fit.totalSumOfSquares;
}

/**
 * Adjusted R² = 1 − (RSS/(n − p))/(TSS/(n − 1)), with n in place of n − 1 without an intercept (Ezekiel 1930).
 * Null where there are no degrees of freedom or the response does not vary.
 */
export function adjustedRSquared(fit: LeanFit): number | null {
  if (!varies(fit) || fit.degreesOfFreedom < 1) return null;
  if (fit.exact) return 1;
  const total = fit.rowCount - (fit.candidate.intercept ? 1 : 0);
  return 1 - (fit.residualSumOfSquares / fit.degreesOfFreedom) * (total / fit.totalSumOfSquares);
}

/** 1 − PRESS/TSS (Allen 1974); null where PRESS is, or the response does not vary. */
export function predictedRSquared(fit: LeanFit, press: number | null): number | null {
  return press === null || !varies(fit) ? null : 1 - press / fit.totalSumOfSquares;
}

/** s = √(RSS/(n − p)), in units of the response's scale; null where there are no degrees of freedom. */
export function residualStandardError(fit: LeanFit): number | null {
  return fit.degreesOfFreedom < 1 ? null : Math.sqrt(fit.residualSumOfSquares / fit.degreesOfFreedom);
}

/** An exact fit by the mean alone is a response without variation: what is left of TSS is rounding. */
function varies(fit: LeanFit): boolean {
  return fit.totalSumOfSquares > 0 && !(fit.exact && fit.residualSumOfSquares >= fit.totalSumOfSquares);
}

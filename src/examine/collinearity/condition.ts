import { Matrix, SingularValueDecomposition } from 'ml-matrix';
import { CLEAR, inverseOfTriangle, singularValues } from '../../engine/condition-number.ts';
import type { Factor } from '../../engine/factor.ts';
import type { Fit } from '../../engine/fit.ts';
import { columnNorm } from '../../engine/kernel.ts';

/** Condition indices of the design with the shares of each coefficient's variance that go with them. */
export interface Condition {
  /** η_k, ascending, the first 1. Length p. */
  readonly indices: number[];
  /** proportions[k][j]: the share of the variance of coefficient j that goes with index k; each coefficient's add up to 1. */
  readonly proportions: number[][];
}

/**
 * Columns of √w X, the intercept included, scaled to unit length and not centred; index: largest singular value over
 * each; proportions v²_jk/d²_k over their sum (Belsley, Kuh & Welsch 1980). From R⁻¹, whose singular values are the
 * reciprocals, so that the smallest of R, which the largest index hangs on, keeps its digits; the small indices from R
 * where they are lost beside it.
 * @param factor that of the union, for the columns' lengths
 */
export function conditionOf(fit: Fit, factor: Factor): Condition {
  const p = fit.columns.length;
  if (p === 0) return { indices: [], proportions: [] };
  const scaled = new Matrix(p, p);
  fit.columns.forEach((column, i) => {
    const length = columnNorm(factor.triangle, column, 0, column + 1) / factor.scales[column]!;
    // (R D⁻¹)⁻¹ = D R⁻¹ with D the lengths.
    for (let j = i; j < p; j++) scaled.set(i, j, length * fit.rootInverse[j * p + i]!);
  });
  const { diagonal, leftSingularVectors: vectors } = new SingularValueDecomposition(scaled, {
    computeLeftSingularVectors: true,
    computeRightSingularVectors: false,
  });
  // Singular values of the inverse descend, so that the indices do from the largest: turned round.
  const order = Array.from({ length: p }, (_, k) => p - 1 - k);
  const ofR = diagonal[p - 1]! > CLEAR * diagonal[0]! ? null : singularValues(inverseOfTriangle(scaled));
  const indexOf = (k: number): number => {
    if (ofR === null) return diagonal[k]! / diagonal[p - 1]!;
    const own = ofR[p - 1 - k]! / ofR[0]!;
    return own > CLEAR ? 1 / own : diagonal[k]! * ofR[0]!;
  };
  const variances = fit.columns.map((_, j) =>
    order.reduce((sum, k) => sum + (vectors.get(j, k) * diagonal[k]!) ** 2, 0),
  );
  return {
    indices: order.map(indexOf),
    proportions: order.map((k) =>
      fit.columns.map((_, j) => shareOf((vectors.get(j, k) * diagonal[k]!) ** 2, variances[j]!, k === p - 1)),
    ),
  };
}

/** A coefficient whose variance is lost beside the others' depends on none of them: all of it goes with the first index. */
function shareOf(part: number, whole: number, isFirst: boolean): number {
  if (whole > 0) return part / whole;
  return isFirst ? 1 : 0;
}

import { Matrix, SingularValueDecomposition } from 'ml-matrix';

/**
 * The largest condition index: columns of √w X scaled to unit length, not centred, largest over smallest
 * singular value (Belsley, Kuh & Welsch 1980). From R⁻¹, whose singular values are the reciprocals: the
 * smallest singular value of R, which the index hangs on, is then the largest of R⁻¹ and keeps its digits; where the
 * other end is lost beside it, it is taken from R itself.
 *
 * @param rootInverse R⁻¹, p × p upper triangular, column-major, of unscaled columns
 * @param lengths ‖√w x_j‖ of the kept columns
 */
export function conditionIndex(rootInverse: Float64Array, p: number, lengths: Float64Array): number {
  if (p < 2) return 1;
  const scaled = new Matrix(p, p);
  // (R D⁻¹)⁻¹ = D R⁻¹ with D the lengths.
  for (let j = 0; j < p; j++)
    for (let i = 0; i <= j; i++) scaled.set(i, j, lengths[i]! * rootInverse[j * p + i]!);
  const values = singularValues(scaled);
  const least = values[p - 1]! / values[0]!;
  return least > CLEAR ? 1 / least : values[0]! * singularValues(inverseOfTriangle(scaled))[0]!;
}

/** A singular value below this share of the largest has lost digits beside it. */
export const CLEAR = 1e-8;

/** In descending order. */
export function singularValues(a: Matrix): number[] {
  return new SingularValueDecomposition(a, {
    computeLeftSingularVectors: false,
    computeRightSingularVectors: false,
  }).diagonal;
}

/** The inverse of an upper triangle, by back substitution. */
export function inverseOfTriangle(a: Matrix): Matrix {
  const p = a.columns;
  const inverse = new Matrix(p, p);
  for (let j = 0; j < p; j++) {
    inverse.set(j, j, 1 / a.get(j, j));
    for (let i = j - 1; i >= 0; i--) {
      let sum = 0;
      for (let k = i + 1; k <= j; k++) sum += a.get(i, k) * inverse.get(k, j);
      inverse.set(i, j, -sum / a.get(i, i));
    }
  }
  return inverse;
}

import { Matrix, SingularValueDecomposition } from 'ml-matrix';

/**
 * The largest condition index: columns of √w X scaled to unit length, not centred, largest over smallest
 * singular value (Belsley, Kuh & Welsch 1980). From R⁻¹, whose singular values are the reciprocals: the
 * smallest singular value of R, which the index hangs on, is then the largest of R⁻¹ and keeps its digits.
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
  const values = new SingularValueDecomposition(scaled, {
    computeLeftSingularVectors: false,
    computeRightSingularVectors: false,
  }).diagonal;
  return values[0]! / values[p - 1]!;
}

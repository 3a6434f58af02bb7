import { Matrix, QrDecomposition } from 'ml-matrix';
import { type Covariance, errorOf } from '../engine/covariance.ts';
import { type FTest, fTest } from './f-test.ts';

/**
 * What is left of a statement's error, as a share of it, once the statements before it are known, below which its
 * variance is taken for none. A share as small as honest near dependencies leave is above rounding only where the
 * covariance is the classical one, which is then of full rank.
 */
const NO_VARIANCE = 1e-11;

/**
 * Wald's test of C b = c in the form d′(C V C′)⁻¹d/q with d = C b − c, held against F on q and the covariance's own
 * degrees of freedom (Wald 1943). Null where C V C′ is singular: the statements depend on one another, or a clustered
 * covariance has too few clusters to tell them apart.
 *
 * @param statements the q rows of C, each of length p
 * @param differences d, length q
 */
export function waldTest(
  covariance: Covariance,
  statements: readonly Float64Array[],
  differences: readonly number[],
): FTest | null {
  const q = statements.length;
  const { root, variance, df, clusters } = covariance;
  if (clusters !== null && q > clusters.count - 1) return null;
  const p = statements[0]!.length;
  // C V C′ = variance · M′M with M = root′C′, and M = Q T gives T′T: the product is never formed.
  const lengths = new Float64Array(q);
  const m = new Matrix(p, q);
  statements.forEach((statement, i) => {
    const column = new Float64Array(p);
    for (let j = 0; j < p; j++) for (let k = 0; k < p; k++) column[j]! += root[j * p + k]! * statement[k]!;
    const length = Math.hypot(...column);
    lengths[i] = length;
    for (let j = 0; j < p; j++) m.set(j, i, length > 0 ? column[j]! / length : 0);
  });
  if (q > p || statements.some((statement) => !(errorOf(covariance, statement) > 0))) return null;
  const triangle = q === 1 ? Matrix.ones(1, 1) : new QrDecomposition(m).upperTriangularMatrix;
  const z = new Float64Array(q);
  let sum = 0;
  for (let i = 0; i < q; i++) {
    if (Math.abs(triangle.get(i, i)) <= NO_VARIANCE && covariance.kind !== 'classical') return null;
    let value = differences[i]! / lengths[i]!;
    for (let k = 0; k < i; k++) value -= triangle.get(k, i) * z[k]!;
    z[i] = value / triangle.get(i, i);
    sum += z[i]! * z[i]!;
  }
  return fTest(sum / (q * variance), q, df);
}

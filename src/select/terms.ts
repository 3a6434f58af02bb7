import { Matrix, QrDecomposition } from 'ml-matrix';
import { type Covariance, classicalCovariance } from '../engine/covariance.ts';
import type { Fit } from '../engine/fit.ts';
import type { ModelTerm } from '../model/design.ts';
import type { FTest } from './f-test.ts';
import { waldTest } from './wald-test.ts';

type TermColumns = Pick<ModelTerm, 'columns'>;

export interface GeneralisedVif {
  /** det R₁₁ · det R₂₂ / det R; the VIF where the term has one column. At least 1. */
  readonly value: number;
  /** value^(1/(2 · columns)): comparable among terms; the square root of the VIF for one column. */
  readonly perColumn: number;
  /** Columns of the term that were kept in the fit. */
  readonly columns: number;
}

/** Positions among `fit.columns` of the term's columns that were kept, ascending, each once. */
export function keptPositions(fit: Fit, term: TermColumns): number[] {
  const positions: number[] = [];
  for (let j = 0; j < fit.columns.length; j++) if (term.columns.includes(fit.columns[j]!)) positions.push(j);
  return positions;
}

/**
 * F test of all kept columns of a term together, in Wald's form b₁′ V₁₁⁻¹ b₁/q, which for least squares with
 * the classical covariance equals the partial F against the model without them (Wald 1943). Null where
 * nothing can be tested: no column kept, no degrees of freedom, an exact fit, or more columns than the covariance
 * can tell apart (as many clusters, or more).
 */
export function jointF(
  fit: Fit,
  term: TermColumns,
  covariance: Covariance | null = classicalCovariance(fit),
): FTest | null {
  const at = keptPositions(fit, term);
  if (at.length === 0 || covariance === null) return null;
  const p = fit.columns.length;
  return waldTest(
    covariance,
    at.map((j) => Float64Array.from({ length: p }, (_, k) => (k === j ? 1 : 0))),
    at.map((j) => fit.estimates[j]!),
  );
}

/**
 * Generalised variance inflation factor of a term (Fox & Monette 1992), from the correlations of the columns,
 * about zero without an intercept. Null where no column of the term was kept, and in a model with fewer than
 * two columns beside the intercept, where there is nothing to be collinear with.
 *
 * By Jacobi's identity for minors, det R₂₂/det R is the term's own minor of R⁻¹, so that only two determinants of the
 * term's size are needed. Both are read off triangles, not off products of columns.
 */
export function generalisedVif(fit: Fit, term: TermColumns): GeneralisedVif | null {
  const at = keptPositions(fit, term).filter((j) => fit.columns[j] !== 0);
  const q = at.length;
  if (q === 0 || predictorCount(fit) < 2) return null;
  if (q === 1) {
    const value = fit.vif[at[0]!]!;
    return Number.isFinite(value) ? { value, perColumn: Math.sqrt(value), columns: 1 } : null;
  }
  const back = inverseRows(fit, at);
  const forth = centredColumns(fit, at);
  let half = logDeterminant(back.rows) + logDeterminant(forth.rows);
  for (let i = 0; i < q; i++) half += Math.log(back.lengths[i]!) + Math.log(forth.lengths[i]!);
  const log = Math.max(0, 2 * half);
  const value = Math.exp(log);
  return Number.isFinite(value) ? { value, perColumn: Math.exp(log / (2 * q)), columns: q } : null;
}

/** Largest VIF among the columns; null in a model with fewer than two columns beside the intercept. */
export function largestVif(fit: Fit): number | null {
  if (predictorCount(fit) < 2) return null;
  let largest = 0;
  for (const vif of fit.vif) if (vif > largest) largest = vif;
  return largest > 0 && Number.isFinite(largest) ? largest : null;
}

/** Kept columns beside the intercept. */
export function predictorCount(fit: Fit): number {
  return fit.columns.length - (fit.columns[0] === 0 ? 1 : 0);
}

interface ScaledColumns {
  /** Columns of unit length. */
  readonly rows: Matrix;
  /** What each was divided by. */
  readonly lengths: readonly number[];
}

/** Rows `at` of R⁻¹ as columns of unit length, p × q. */
function inverseRows(fit: Fit, at: readonly number[]): ScaledColumns {
  const p = fit.columns.length;
  return scaled(at.map((j) => Array.from({ length: p }, (_, k) => fit.rootInverse[k * p + j]!)));
}

/**
 * Columns `at` of R as columns of unit length, without the row of the intercept: their cross-products are
 * those of the design's columns about their means.
 */
function centredColumns(fit: Fit, at: readonly number[]): ScaledColumns {
  const p = fit.columns.length;
  const from = fit.columns[0] === 0 ? 1 : 0;
  return scaled(
    at.map((j) => {
      // Column j of R solves R⁻¹ r = e_j.
      const column = new Array<number>(p).fill(0);
      column[j] = 1;
      for (let i = j; i >= 0; i--) {
        const value = column[i]! / fit.rootInverse[i * p + i]!;
        column[i] = value;
        for (let k = 0; k < i; k++) column[k]! -= value * fit.rootInverse[i * p + k]!;
      }
      return column.slice(from);
    }),
  );
}

function scaled(columns: readonly (readonly number[])[]): ScaledColumns {
  const lengths = columns.map((column) => Math.hypot(...column));
  const rows = new Matrix(columns[0]!.length, columns.length);
  columns.forEach((column, j) => {
    column.forEach((value, i) => {
      rows.set(i, j, value / lengths[j]!);
    });
  });
  return { rows, lengths };
}

/** ½ ln det(A′A). */
function logDeterminant(a: Matrix): number {
  const triangle = new QrDecomposition(a).upperTriangularMatrix;
  let sum = 0;
  for (let i = 0; i < a.columns; i++) sum += Math.log(Math.abs(triangle.get(i, i)));
  return sum;
}

import { DEPENDENT_IN_DOUBLES } from './fit-candidate.ts';

/** Arrays that are used again from solve to solve, and what the last one found. Everything is in the rows' scaled units. */
export interface SolveScratch {
  /** The columns taken from the triangle, m rows each, then the response. */
  readonly work: Float64Array;
  /** b by position among the columns; 0 for one that depends on those before it. */
  readonly estimates: Float64Array;
  /** 1 for a column that was solved for, by position. */
  readonly kept: Uint8Array;
  /** Row of the work at which a column's pivot lies, by position; for one that depends, how many were kept before it. */
  readonly pivots: Int32Array;
  /** What is left of a response beside the columns it was predicted from; see `heldOutSquares`. */
  readonly rest: Float64Array;
  /** Σ w (y − Xb)² of the last solve. */
  residualSquares: number;
}

/** @param width m, the columns of the triangle */
export function solveScratch(width: number): SolveScratch {
  return {
    work: new Float64Array(width * (width + 1)),
    estimates: new Float64Array(width),
    kept: new Uint8Array(width),
    pivots: new Int32Array(width),
    rest: new Float64Array(width),
    residualSquares: 0,
  };
}

/**
 * Least squares on some columns of a factor, and nothing but that: no inverse, no spans. Householder reflections of the
 * columns' small upper trapezoid, then back substitution (Golub & Van Loan, Matrix Computations, 5.1 and 5.3). Made for a
 * great many solves: it allocates nothing. A column that depends on those before it is passed over by the rule
 * of `fitCandidate`.
 *
 * @param triangle R, m × m, column-major, double arithmetic
 * @param columns union columns; cheapest in ascending order
 * @param responseAt column of the response in R
 * @returns the rank: how many columns were kept
 */
export function solveColumns(
  triangle: Float64Array,
  m: number,
  columns: ArrayLike<number>,
  responseAt: number,
  scratch: SolveScratch,
): number {
  const { work, estimates, kept, pivots } = scratch;
  const p = columns.length;
  const height = responseAt + 1;
  let end = 0;
  for (let j = 0; j < p; j++) end = Math.max(end, columns[j]! + 1);
  const top = end;
  for (let j = 0; j < p; j++) copyColumn(triangle, columns[j]! * m, columns[j]! + 1, work, j * m, top);
  const y = p * m;
  copyColumn(triangle, responseAt * m, height, work, y, height);

  let rank = 0;
  end = 0;
  for (let j = 0; j < p; j++) {
    const at = j * m;
    end = Math.max(end, columns[j]! + 1);
    let above = 0;
    for (let i = at; i < at + rank; i++) above += work[i]! * work[i]!;
    const pivot = at + rank;
    const last = at + end;
    let below = 0;
    for (let i = pivot + 1; i < last; i++) below += work[i]! * work[i]!;
    const alpha = pivot < last ? work[pivot]! : 0;
    const left = alpha * alpha + below;
    pivots[j] = rank;
    if (left <= DEPENDENT_IN_DOUBLES ** 2 * (above + left)) {
      kept[j] = 0;
      continue;
    }
    kept[j] = 1;
    if (below > 0) {
      const norm = Math.sqrt(left);
      const head = alpha > 0 ? alpha + norm : alpha - norm;
      const factor = 2 / (head * head + below);
      work[pivot] = alpha > 0 ? -norm : norm;
      for (let k = j + 1; k <= p; k++) {
        const shift = (k - j) * m;
        let dot = head * work[pivot + shift]!;
        for (let i = pivot + 1; i < last; i++) dot += work[i]! * work[i + shift]!;
        dot *= factor;
        work[pivot + shift]! -= dot * head;
        for (let i = pivot + 1; i < last; i++) work[i + shift]! -= dot * work[i]!;
      }
    }
    rank++;
  }

  let squares = 0;
  for (let i = y + rank; i < y + height; i++) squares += work[i]! * work[i]!;
  scratch.residualSquares = squares;
  for (let j = p - 1; j >= 0; j--) {
    if (kept[j] === 0) {
      estimates[j] = 0;
      continue;
    }
    const i = pivots[j]!;
    let value = work[y + i]!;
    for (let k = j + 1; k < p; k++) if (kept[k] === 1) value -= work[k * m + i]! * estimates[k]!;
    estimates[j] = value / work[j * m + i]!;
  }
  return rank;
}

function copyColumn(
  from: Float64Array,
  at: number,
  count: number,
  to: Float64Array,
  target: number,
  height: number,
): void {
  for (let i = 0; i < count; i++) to[target + i] = from[at + i]!;
  for (let i = count; i < height; i++) to[target + i] = 0;
}

/**
 * How a column that was passed over in the last solve depends on the kept ones before it: x_j = Σ z_k x_k in the rows of the
 * factor. Rows for which this does not hold cannot be predicted.
 * @returns z by position among the columns, in scaled units; 0 for columns that were not kept or come later
 */
export function dependencyOf(m: number, position: number, scratch: SolveScratch): Float64Array {
  const { work, kept, pivots } = scratch;
  const z = new Float64Array(position);
  for (let j = position - 1; j >= 0; j--) {
    if (kept[j] === 0) continue;
    const i = pivots[j]!;
    let value = work[position * m + i]!;
    for (let k = j + 1; k < position; k++) if (kept[k] === 1) value -= work[k * m + i]! * z[k]!;
    z[j] = value / work[j * m + i]!;
  }
  return z;
}

/**
 * Σ w (y − Xb)² over the rows of another factor, ‖R_y − R_C b‖² = ‖q − Rb‖² + ρ², in scaled units; the first element of what is
 * left, in `scratch.rest[0]`, times R₀₀ is Σ w (y − Xb) where column 0 is the intercept.
 * @param estimates b in scaled units, by position among `columns`
 */
export function heldOutSquares(
  triangle: Float64Array,
  m: number,
  columns: ArrayLike<number>,
  estimates: ArrayLike<number>,
  responseAt: number,
  scratch: SolveScratch,
): number {
  const { rest } = scratch;
  const height = responseAt + 1;
  const y = responseAt * m;
  for (let i = 0; i < height; i++) rest[i] = triangle[y + i]!;
  for (let j = 0; j < columns.length; j++) {
    const b = estimates[j]!;
    if (b === 0) continue;
    const column = columns[j]!;
    const at = column * m;
    for (let i = 0; i <= column; i++) rest[i]! -= b * triangle[at + i]!;
  }
  let squares = 0;
  for (let i = 0; i < height; i++) squares += rest[i]! * rest[i]!;
  return squares;
}

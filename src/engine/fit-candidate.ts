import type { CandidateModel } from '../model/design.ts';
import { conditionIndex } from './condition-number.ts';
import { dependencySentence } from './dependency.ts';
import { columnsOf, type Factor } from './factor.ts';
import type { DependentColumn, Fit } from './fit.ts';
import { backSubstitute, columnNorm, eliminate, type Matrix, matrix } from './kernel.ts';

/** What a fit needs to know of the rows beside their factor. */
export interface RowFacts {
  /** Σ ln w, 0 without weights. */
  readonly logWeights: number;
  /** J per response column. */
  readonly logJacobians: readonly number[];
  /** Names of the union's columns, for sentences. */
  readonly columnNames: readonly string[];
  /** Variables of each union column, to tell curves of one variable from dependencies among several. */
  readonly columnVariables: readonly (readonly string[])[];
}

/**
 * A column is taken to depend exactly on the ones before it when what is left of it after they are taken out
 * is below this share of its length. Data written in decimals leave rounding of about 1e-16; an honest
 * predictor that is so nearly dependent could not be told from rounding of its own values.
 */
export const DEPENDENT = 1e-13;

/**
 * The same in double arithmetic, where what is left of a dependent column is rounding that the columns before it have
 * magnified: shares up to 1e-11 were seen, while the tenth power in NIST's Filip, as near to dependent as honest data
 * comes, keeps 5e-8.
 */
export const DEPENDENT_IN_DOUBLES = 1e-10;

/** The share that decides in the arithmetic of a matrix. */
export function dependentShare(m: Matrix): number {
  return m.lo === null ? DEPENDENT_IN_DOUBLES : DEPENDENT;
}

/** Below this share of its length (about the mean) a column's dependency is worth a warning. */
const NEARLY_DEPENDENT = 1e-5;

/**
 * Fits one candidate from the factor alone: its columns of R are taken, triangularised again and solved. The
 * cost depends on the number of columns, not of rows. The arithmetic is that of the factor.
 * @param needs the condition number costs as much as all the rest, and is NaN where it is not needed
 */
export function fitCandidate(
  factor: Factor,
  candidate: CandidateModel,
  facts: RowFacts,
  needs: 'all' | 'no condition number' = 'all',
): Fit {
  const { predictorCount: union, scales } = factor;
  const responseAt = union + candidate.responseColumn;
  const height = responseAt + 1;
  const own = candidate.columns;
  const inCandidate = new Uint8Array(union);
  for (const column of own) inCandidate[column] = 1;
  const others: number[] = [];
  for (let j = 0; j < union; j++) if (inCandidate[j] === 0) others.push(j);

  const order = [...own, ...others, responseAt];
  const work = columnsOf(factor, order, height);
  const kept: number[] = [];
  const keptAt: number[] = [];
  const dropped: DependentColumn[] = [];
  const nearlyDependent: DependentColumn[] = [];
  // Rows below the last column taken so far are still zero, in whatever order the candidate has its columns.
  let end = 0;
  for (let j = 0; j < own.length; j++) {
    const column = own[j]!;
    const rank = kept.length;
    end = Math.max(end, column + 1);
    const left = columnNorm(work, j, rank, end);
    const length = columnNorm(work, j, 0, end);
    if (left <= dependentShare(work) * length) {
      dropped.push(describe(work, j, column, 'exact', 0));
      continue;
    }
    const centred = candidate.intercept && kept[0] === 0 ? columnNorm(work, j, 1, end) : length;
    if (left < NEARLY_DEPENDENT * centred && involvesSeveral(column)) {
      nearlyDependent.push(describe(work, j, column, 'nearly', left / centred));
    }
    eliminate(work, j, rank, end, order.length);
    kept.push(column);
    keptAt.push(j);
  }
  const p = kept.length;
  const y = order.length - 1;

  const solution = matrix(p, 1, work.lo !== null);
  copyTop(work, y, solution, 0, p);
  backSubstitute(work, keptAt, solution, 0);
  const responseScale = scales[responseAt]!;
  const estimates = Float64Array.from(
    kept,
    (column, j) => (solution.hi[j]! * scales[column]!) / responseScale,
  );

  const rootInverse = invertTriangle(work, keptAt, kept, scales);
  const inverse = squareOf(rootInverse, p);
  const residual = columnNorm(work, y, p, height);
  const rss = (residual / responseScale) ** 2;
  const tss = (responseNorm(factor, responseAt, candidate.intercept) / responseScale) ** 2;
  const size = (responseNorm(factor, responseAt, false) / responseScale) ** 2;
  const exact = isExact(rss, size);
  const n = factor.rowCount;

  const span = new Uint32Array((union + 31) >> 5);
  const ownMask = new Uint32Array(span.length);
  for (const column of own) setBit(span, column);
  for (const column of kept) setBit(ownMask, column);
  for (let j = 0; j < others.length; j++) {
    const at = own.length + j;
    if (columnNorm(work, at, p, height) <= 10 * dependentShare(work) * columnNorm(work, at, 0, height))
      setBit(span, others[j]!);
  }

  return {
    candidate,
    rowCount: n,
    columns: kept,
    dropped,
    nearlyDependent,
    estimates,
    inverse,
    rootInverse,
    residualSumOfSquares: rss,
    totalSumOfSquares: tss,
    degreesOfFreedom: n - p,
    exact,
    logLikelihood: exact ? null : logLikelihood(n, rss, facts, candidate.responseColumn),
    vif: inflation(factor, candidate, kept, inverse),
    conditionNumber: needs === 'all' ? conditionIndex(rootInverse, p, lengthsOf(factor, kept)) : Number.NaN,
    span,
    own: ownMask,
    arithmetic: work.lo === null ? 'plain' : 'extended',
  };

  function describe(
    m: Matrix,
    j: number,
    column: number,
    how: 'exact' | 'nearly',
    share: number,
  ): DependentColumn {
    const coefficients = matrix(kept.length, 1, m.lo !== null);
    copyTop(m, j, coefficients, 0, kept.length);
    backSubstitute(m, keptAt, coefficients, 0);
    const parts = kept.map((other, k) => ({
      name: facts.columnNames[other]!,
      isIntercept: other === 0,
      coefficient: (coefficients.hi[k]! * scales[other]!) / scales[column]!,
      share:
        (Math.abs(coefficients.hi[k]!) * columnNorm(factor.triangle, other, 0, other + 1)) /
        columnNorm(factor.triangle, column, 0, column + 1),
    }));
    return { column, sentence: dependencySentence(facts.columnNames[column]!, parts, how, share) };
  }

  function involvesSeveral(column: number): boolean {
    const variables = new Set(facts.columnVariables[column]);
    return kept.some(
      (other) => other !== 0 && facts.columnVariables[other]!.some((name) => !variables.has(name)),
    );
  }
}

/**
 * −n/2 (ln 2π + ln(RSS/n) + 1) + ½ Σ ln w + J: every constant kept, so that scales and weights compare. Null where
 * the Jacobian is not finite: a response of 0 on the square-root scale has no density there.
 */
export function logLikelihood(n: number, rss: number, facts: RowFacts, response: number): number | null {
  const value =
    (-n / 2) * (Math.log(2 * Math.PI) + Math.log(rss / n) + 1) +
    facts.logWeights / 2 +
    facts.logJacobians[response]!;
  return Number.isFinite(value) ? value : null;
}

/** Whether RSS is not even the rounding of the response's own decimals, Σ w y² being its size. */
export function isExact(rss: number, size: number): boolean {
  return rss <= 1e-27 * size;
}

function copyTop(from: Matrix, column: number, to: Matrix, target: number, count: number): void {
  for (let i = 0; i < count; i++) {
    to.hi[target * to.stride + i] = from.hi[column * from.stride + i]!;
    if (from.lo !== null && to.lo !== null)
      to.lo[target * to.stride + i] = from.lo[column * from.stride + i]!;
  }
}

/** R⁻¹ of the kept columns in true units, p × p upper triangular, column-major, rounded to doubles. */
function invertTriangle(
  work: Matrix,
  keptAt: readonly number[],
  kept: readonly number[],
  scales: Float64Array,
): Float64Array {
  const p = kept.length;
  const unit = matrix(p, p, work.lo !== null);
  for (let j = 0; j < p; j++) {
    unit.hi[j * p + j] = 1;
    backSubstitute(work, keptAt.slice(0, j + 1), unit, j);
  }
  const inverse = unit.hi;
  for (let j = 0; j < p; j++) for (let i = 0; i <= j; i++) inverse[j * p + i]! *= scales[kept[i]!]!;
  return inverse;
}

/** (X′WX)⁻¹ = R⁻¹ R⁻ᵀ. */
function squareOf(root: Float64Array, p: number): Float64Array {
  const square = new Float64Array(p * p);
  for (let j = 0; j < p; j++) {
    for (let i = 0; i <= j; i++) {
      let sum = 0;
      for (let k = j; k < p; k++) sum += root[k * p + i]! * root[k * p + j]!;
      square[j * p + i] = sum;
      square[i * p + j] = sum;
    }
  }
  return square;
}

/** ‖√w (y − ȳ)‖, or ‖√w y‖ where not about the mean, in scaled units. */
function responseNorm(factor: Factor, at: number, aboutMean: boolean): number {
  return columnNorm(factor.triangle, at, aboutMean ? 1 : 0, at + 1);
}

function lengthsOf(factor: Factor, kept: readonly number[]): Float64Array {
  return Float64Array.from(
    kept,
    (column) => columnNorm(factor.triangle, column, 0, column + 1) / factor.scales[column]!,
  );
}

/** VIF_j = (X′WX)⁻¹_jj · Σ w (x_j − x̄_j)², about zero without an intercept (Marquardt 1970). */
function inflation(
  factor: Factor,
  candidate: CandidateModel,
  kept: readonly number[],
  inverse: Float64Array,
): Float64Array {
  const p = kept.length;
  return Float64Array.from(kept, (column, j) => {
    if (column === 0) return Number.NaN;
    const spread =
      columnNorm(factor.triangle, column, candidate.intercept ? 1 : 0, column + 1) / factor.scales[column]!;
    return Math.max(1, inverse[j * p + j]! * spread * spread);
  });
}

function setBit(mask: Uint32Array, bit: number): void {
  mask[bit >> 5]! |= 1 << (bit & 31);
}

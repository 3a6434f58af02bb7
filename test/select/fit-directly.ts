/**
 * Fits of small, well-conditioned problems by Gram–Schmidt on plain arrays: independent of the engine, for the
 * tests of what comes after it.
 */
import type { Fit, FitContext } from '../../src/engine/fit.ts';
import type { CandidateModel, ModelTerm } from '../../src/model/design.ts';

export interface Problem {
  /** Predictors by name; union column 0 is the intercept, then these in order. */
  readonly columns: Readonly<Record<string, readonly number[]>>;
  /** One response, or several on different scales. */
  readonly y: readonly number[] | readonly (readonly number[])[];
  readonly candidates: readonly Candidate[];
}

export interface Candidate {
  readonly name: string;
  /** Terms by the names of their columns; a plain name is a term of one column. */
  readonly terms: readonly (string | { readonly name: string; readonly columns: readonly string[] })[];
  readonly intercept?: boolean;
  readonly response?: number;
}

const dot = (a: readonly number[], b: readonly number[]) =>
  a.reduce((sum, value, i) => sum + value * b[i]!, 0);
const minus = (a: readonly number[], b: readonly number[], times: number) =>
  a.map((value, i) => value - times * b[i]!);
const norm = (a: readonly number[]) => Math.sqrt(dot(a, a));

/** What is left of `x` beside the orthonormal `basis`; twice, for full orthogonality. */
function residual(x: readonly number[], basis: readonly (readonly number[])[]): number[] {
  let left = [...x];
  for (let pass = 0; pass < 2; pass++) for (const q of basis) left = minus(left, q, dot(left, q));
  return left;
}

export function fitsOf(problem: Problem): FitContext {
  const names = ['intercept', ...Object.keys(problem.columns)];
  const responses = (Array.isArray(problem.y[0]) ? problem.y : [problem.y]) as readonly (readonly number[])[];
  const n = responses[0]!.length;
  const union = [Array.from({ length: n }, () => 1), ...Object.values(problem.columns)];
  const models = problem.candidates.map((candidate): CandidateModel => {
    const terms = candidate.terms.map((term): ModelTerm => {
      const { name, columns } = typeof term === 'string' ? { name: term, columns: [term] } : term;
      return {
        name,
        plan: { kind: 'variable', variable: name },
        columns: columns.map((each) => names.indexOf(each)),
      };
    });
    const intercept = candidate.intercept ?? true;
    return {
      name: candidate.name,
      response: { variable: 'y', scale: { kind: 'natural' } },
      intercept,
      terms,
      columns: [...(intercept ? [0] : []), ...new Set(terms.flatMap((term) => term.columns))],
      responseColumn: candidate.response ?? 0,
    };
  });
  const one = (model: CandidateModel) => fitDirectly(union, responses[model.responseColumn]!, model);
  const solved = models.map(one);
  const all = [...new Set(models.flatMap((model) => model.columns))].sort((a, b) => a - b);
  return {
    fits: solved.map(({ fit }) => fit),
    press: solved.map(({ press }) => press),
    pressOmitted: null,
    fullModelVariance: responses.map((_, responseColumn) => {
      const { fit } = one({ ...models[0]!, intercept: all[0] === 0, columns: all, responseColumn });
      return fit.degreesOfFreedom < 1 || fit.exact ? null : fit.residualSumOfSquares / fit.degreesOfFreedom;
    }),
    columnNames: names,
  };
}

export function fitDirectly(
  union: readonly (readonly number[])[],
  y: readonly number[],
  candidate: CandidateModel,
): { readonly fit: Fit; readonly press: number | null } {
  const n = y.length;
  const basis: number[][] = [];
  const columns: number[] = [];
  const dropped: { column: number; sentence: string }[] = [];
  for (const column of candidate.columns) {
    const left = residual(union[column]!, basis);
    if (norm(left) <= 1e-10 * norm(union[column]!)) {
      dropped.push({ column, sentence: 'depends on the others in these rows' });
      continue;
    }
    basis.push(left.map((value) => value / norm(left)));
    columns.push(column);
  }
  const p = columns.length;
  // R = Q′X and its inverse, column by column.
  const r = columns.map((column) => basis.map((q) => dot(q, union[column]!)));
  const rootInverse = new Float64Array(p * p);
  for (let j = 0; j < p; j++) {
    for (let i = j; i >= 0; i--) {
      let value = i === j ? 1 : 0;
      for (let k = i + 1; k <= j; k++) value -= r[k]![i]! * rootInverse[j * p + k]!;
      rootInverse[j * p + i] = value / r[i]![i]!;
    }
  }
  const inverse = new Float64Array(p * p);
  for (let i = 0; i < p; i++) {
    for (let j = 0; j < p; j++) {
      for (let k = 0; k < p; k++) inverse[j * p + i]! += rootInverse[k * p + i]! * rootInverse[k * p + j]!;
    }
  }
  const estimates = new Float64Array(p);
  for (let i = 0; i < p; i++)
    for (let k = 0; k < p; k++) estimates[i]! += rootInverse[k * p + i]! * dot(basis[k]!, y);
  const e = residual(y, basis);
  const rss = dot(e, e);
  const mean = candidate.intercept ? y.reduce((sum, value) => sum + value, 0) / n : 0;
  const tss = y.reduce((sum, value) => sum + (value - mean) ** 2, 0);
  const exact = rss <= 1e-24 * dot(y, y);
  const leverages = y.map((_, i) => basis.reduce((sum, q) => sum + q[i]! ** 2, 0));
  const full = leverages.some((h) => h > 1 - 1e-9);
  const words = (union.length + 31) >> 5;
  const own = new Uint32Array(words);
  const span = new Uint32Array(words);
  for (const column of columns) own[column >> 5]! |= 1 << (column & 31);
  union.forEach((x, column) => {
    if (norm(residual(x, basis)) <= 1e-9 * norm(x)) span[column >> 5]! |= 1 << (column & 31);
  });
  const fit: Fit = {
    candidate,
    rowCount: n,
    columns,
    dropped,
    nearlyDependent: [],
    estimates,
    inverse,
    rootInverse,
    residualSumOfSquares: rss,
    totalSumOfSquares: tss,
    degreesOfFreedom: n - p,
    exact,
    logLikelihood: exact ? null : (-n / 2) * (Math.log(2 * Math.PI) + Math.log(rss / n) + 1),
    vif: Float64Array.from(columns, (column) =>
      column === 0 ? Number.NaN : vifBySweep(union, columns, column),
    ),
    conditionNumber: 1,
    span,
    own,
    arithmetic: 'plain',
  };
  const press =
    full || n - p < 1 ? null : e.reduce((sum, value, i) => sum + (value / (1 - leverages[i]!)) ** 2, 0);
  return { fit, press };
}

/** 1/(1 − R_j²), by regressing the column on the others (Marquardt 1970). */
function vifBySweep(
  union: readonly (readonly number[])[],
  columns: readonly number[],
  column: number,
): number {
  const others: number[][] = [];
  for (const other of columns) {
    if (other === column) continue;
    const left = residual(union[other]!, others);
    others.push(left.map((value) => value / norm(left)));
  }
  const x = union[column]!;
  const mean = columns[0] === 0 ? x.reduce((sum, value) => sum + value, 0) / x.length : 0;
  const left = residual(x, others);
  return x.reduce((sum, value) => sum + (value - mean) ** 2, 0) / dot(left, left);
}

import { factorAt } from '../engine/fold-factors.ts';
import { heldOutSquares, type SolveScratch, solveColumns, solveScratch } from '../engine/solve-columns.ts';
import type { DesignRows } from '../model/design-rows.ts';
import type { Folds } from './folds.ts';
import { leaveOneOut } from './leave-one-out.ts';
import { ownScaleErrors } from './own-scale.ts';
import { type Dependency, dependenciesOf, type Pending, unpredictable } from './unpredictable-rows.ts';
import {
  ratioVariance,
  sum,
  type Validation,
  type ValidationFigures,
  type ValidationInput,
} from './validation.ts';
import { type Fold, visitFolds } from './visit-folds.ts';
import { counted } from './words.ts';

/** Multiplications up to which candidates on another scale are held against rows on the own scale although that does not rank. */
const OWN_SCALE_BUDGET = 5e8;

/**
 * Cross-validation of every candidate. On the natural scale it is exact and from factors alone: one for each fold, each candidate
 * solved from the other folds' factors together and its held-out error read off the fold's own. On other scales every
 * fold takes passes over the rows, for the mean on the own scale by smearing over the training residuals.
 *
 * Standard error: of the ratio Σ S_f/Σ W_f over the folds f of a set (Cochran, Sampling Techniques, 1977, 6.4), which for folds of equal
 * weight is the standard deviation of their mean squared errors over √folds (Breiman, Friedman, Olshen & Stone 1984);
 * with repeats the root of the mean of its squares, since repeats bring no further rows.
 *
 * Where a coefficient cannot be estimated without a fold, those of the fold's rows that it touches cannot be predicted. They are
 * left out of the figures of all candidates, so that all are compared on the same rows; but a candidate that cannot predict
 * more than a tenth of the held-out rows has no figures instead (common practice, no source).
 */
export function crossValidate(input: ValidationInput): Validation {
  const { folds, fits, rows, own } = input;
  if (folds.sets[0]?.kind === 'single') return leaveOneOut(input);
  const scratch = solveScratch(rows.width);
  const affordable = input.ranks || ownScaleCost(input) <= OWN_SCALE_BUDGET;
  const isNatural = fits.map((fit) => fit.candidate.response.scale.kind === 'natural');
  const skipped = fits.map((_, c) => !isNatural[c] && !affordable);
  const table = foldTable(folds, fits.length);
  const pending: Pending[] = [];
  const total = folds.sets.length * folds.count;

  folds.sets.forEach((set, s) => {
    visitFolds(rows, set, (fold) => {
      const at = s * folds.count + fold.fold;
      table.weights[at] = weightOf(fold, rows);
      table.rows[at] = fold.heldOut.rowCount;
      table.responses[at] = responseSum(rows, own, fold.heldOutRows);
      for (let c = 0; c < fits.length; c++) {
        if (skipped[c]) continue;
        const dependencies = tryCandidate(fold, c, at);
        if (dependencies.length > 0) pending.push({ set: s, fold: fold.fold, candidate: c, dependencies });
      }
      input.onProgress?.(at, total);
    });
  });
  const heldOut = sum(table.rows);
  const beyond = pending.length === 0 ? null : unpredictable(input, pending, heldOut);
  if (beyond !== null) {
    folds.sets.forEach((set, s) => {
      if (!pending.some((one) => one.set === s)) return;
      visitFolds(rows, set, (fold) => {
        const at = s * folds.count + fold.fold;
        const out = beyond.rowsOut.get(at);
        if (out === undefined) return;
        const all = fold.heldOutRows();
        const kept = all.filter((_, i) => out[i] === 0);
        const rest: Fold = {
          ...fold,
          heldOut: factorAt(rows, kept),
          heldOutRows: () => kept,
        };
        table.weights[at] = weightOf(rest, rows);
        table.rows[at] = kept.length;
        table.responses[at] = responseSum(rows, own, rest.heldOutRows);
        for (let c = 0; c < fits.length; c++)
          if (!skipped[c] && !beyond.excluded.has(c)) tryCandidate(rest, c, at);
      });
    });
  }

  const why = fits.map((_, c) => {
    if (skipped[c])
      return `it was not worked out: on its response scale it takes passes over ${rows.rowCount} rows for each fold, and does not rank`;
    const count = beyond?.excluded.get(c);
    return count === undefined
      ? null
      : `${count} of the ${counted(heldOut, 'held-out row')} cannot be predicted by it without themselves`;
  });
  const figures = fits.map((_, c) => (why[c] === null ? table.figuresOf(c) : null));
  const weight = sum(table.weights);
  return {
    figures,
    whyNot: why.map((one, c) => one ?? (figures[c] === null ? whyNoFigures(weight) : null)),
    meanResponse: sum(table.responses) / weight,
    rowsLeftOut: heldOut - sum(table.rows),
    losses: beyond?.losses ?? [],
  };

  /** Puts one candidate's errors in a fold into the table; gives the columns that could not be estimated for it. */
  function tryCandidate(fold: Fold, c: number, at: number): readonly Dependency[] {
    const { columns, candidate } = fits[c]!;
    const responseAt = rows.predictorCount + candidate.responseColumn;
    const rank = solveColumns(fold.training.triangle.hi, rows.width, columns, responseAt, scratch);
    const dependencies = rank < columns.length ? dependenciesOf(columns, rows.width, scratch) : [];
    if (isNatural[c]) {
      const { squares, total: errors } = naturalErrors(fold, columns, responseAt, rows, scratch);
      table.squares[c]![at] = squares;
      table.errors[c]![at] = errors;
    } else {
      const { scales } = rows;
      const model = {
        columns,
        estimates: Float64Array.from(
          columns,
          (column, j) => (scratch.estimates[j]! * scales[column]!) / scales[responseAt]!,
        ),
        responseColumn: candidate.responseColumn,
        scale: candidate.response.scale,
      };
      const { squares, sum: errors } = ownScaleErrors(
        rows,
        own,
        model,
        fold.trainingRows(),
        fold.heldOutRows(),
      );
      table.squares[c]![at] = squares;
      table.errors[c]![at] = errors;
    }
    return dependencies;
  }
}

/** Σ w (y − Xb)² and Σ w (y − Xb) over the held-out rows, in true units, from their factor and the last solve. */
export function naturalErrors(
  fold: Pick<Fold, 'heldOut'>,
  columns: readonly number[],
  responseAt: number,
  rows: DesignRows,
  scratch: SolveScratch,
): { readonly squares: number; readonly total: number } {
  const triangle = fold.heldOut.triangle.hi;
  const scale = rows.scales[responseAt]!;
  const squares = heldOutSquares(triangle, rows.width, columns, scratch.estimates, responseAt, scratch);
  return {
    squares: squares / (scale * scale),
    total: (triangle[0]! * scratch.rest[0]!) / (scale * rows.scales[0]!),
  };
}

function whyNoFigures(weight: number): string {
  return weight > 0
    ? 'its predictions of held-out rows are not all finite on the response’s own scale'
    : 'no held-out row can be predicted';
}

function ownScaleCost({ rows, fits, folds }: ValidationInput): number {
  const passes = folds.count * folds.sets.length;
  return fits.reduce(
    (cost, fit) =>
      cost +
      (fit.candidate.response.scale.kind === 'natural' ? 0 : passes * rows.rowCount * fit.columns.length),
    0,
  );
}

/** Σ w over the held-out rows: the square of R₀₀, column 0 being the intercept. */
function weightOf({ heldOut }: Fold, rows: DesignRows): number {
  return rows.rootWeights === null ? heldOut.rowCount : (heldOut.triangle.hi[0]! / rows.scales[0]!) ** 2;
}

function responseSum(rows: DesignRows, own: Float64Array, heldOutRows: () => Int32Array): number {
  let total = 0;
  for (const row of heldOutRows())
    total += own[row]! * (rows.rootWeights === null ? 1 : rows.rootWeights[row]! ** 2);
  return total;
}

function foldTable(folds: Folds, candidates: number) {
  const cells = folds.sets.length * folds.count;
  const squares = Array.from({ length: candidates }, () => new Float64Array(cells));
  const errors = Array.from({ length: candidates }, () => new Float64Array(cells));
  const weights = new Float64Array(cells);
  const rows = new Float64Array(cells);
  const figuresOf = (c: number): ValidationFigures | null => {
    const weight = sum(weights);
    const meanSquaredError = sum(squares[c]!) / weight;
    if (!(weight > 0) || !Number.isFinite(meanSquaredError)) return null;
    const variances = folds.sets.map((_, s) => {
      const from = s * folds.count;
      return ratioVariance(
        squares[c]!.subarray(from, from + folds.count),
        weights.subarray(from, from + folds.count),
      );
    });
    const variance = variances.reduce((a, b) => a + b, 0) / variances.length;
    return {
      rows: sum(rows),
      meanSquaredError,
      standardError: Number.isNaN(variance) ? null : Math.sqrt(variance),
      meanError: sum(errors[c]!) / weight,
    };
  };
  return { squares, errors, weights, rows, responses: new Float64Array(cells), figuresOf };
}

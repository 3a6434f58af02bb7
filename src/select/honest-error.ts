import type { Fit } from '../engine/fit.ts';
import { factorAt } from '../engine/fold-factors.ts';
import { rowsAt } from '../engine/rows-at.ts';
import { solveColumns, solveScratch } from '../engine/solve-columns.ts';
import type { CandidateModel } from '../model/design.ts';
import { namesOfChosen } from './candidate-name.ts';
import { naturalErrors } from './cross-validate.ts';
import type { Folds } from './folds.ts';
import { type Ground, materialOf } from './material.ts';
import { ownScaleErrors } from './own-scale.ts';
import type { Procedure } from './procedure.ts';
import { dependenciesOf, rowsBeyond } from './unpredictable-rows.ts';
import { ratioVariance, sum } from './validation.ts';
import { type Fold, visitFolds } from './visit-folds.ts';
import { counted, named, significant } from './words.ts';

export interface ErrorFigures {
  readonly meanSquaredError: number;
  /** Of the mean squared error, over the folds; null with fewer than two. */
  readonly standardError: number | null;
}

/** The error of choosing and predicting, beside what it is to be held against; all on the response's own scale. */
export interface HonestError {
  /** Held-out rows, each repeat counted. */
  readonly rows: number;
  /** Held-out rows that could not be predicted, and are in none of the figures. */
  readonly rowsLeftOut: number;
  readonly procedure: ErrorFigures;
  /** Of predicting the mean of the other rows. */
  readonly mean: ErrorFigures;
  /** Of the candidate chosen from all rows, in the same folds: flattered, since those rows had a say in its choice. Null where none was chosen. */
  readonly winner: ErrorFigures | null;
  /** Mean squared error of the mean less that of the procedure, by fold. */
  readonly gain: { readonly value: number; readonly standardError: number | null };
  /** How often each candidate was chosen, most often first; null: none was admitted, and the mean was predicted. */
  readonly choices: readonly { readonly candidate: string | null; readonly folds: number }[];
  readonly folds: number;
  readonly sentence: string;
}

export interface HonestInput {
  readonly ground: Ground;
  /** The folds without which the choice is made again. */
  readonly folds: Folds;
  readonly procedure: Procedure;
  /** What was chosen from all rows. */
  readonly winner: Fit | null;
  readonly onProgress?: ((done: number, total: number) => void) | undefined;
}

/**
 * Nested cross-validation (Stone 1974; Varma & Simon 2006): without each fold the whole choice is made again, and what it chooses predicts the
 * fold. Where it chooses none, the mean of the other rows is predicted. Null where no row can be predicted.
 */
export function honestError({
  ground,
  folds,
  procedure,
  winner,
  onProgress,
}: HonestInput): HonestError | null {
  const { rows, own } = ground;
  const cells = folds.sets.length * folds.count;
  const scratch = solveScratch(rows.width);
  const nameOf = namesOfChosen(ground.design);
  const weights = new Float64Array(cells);
  const table = {
    procedure: new Float64Array(cells),
    mean: new Float64Array(cells),
    winner: new Float64Array(cells),
  };
  const choices = new Map<string | null, number>();
  let heldOut = 0;
  let kept = 0;
  let done = 0;

  folds.sets.forEach((set, s) => {
    visitFolds(rows, set, (fold) => {
      const at = s * folds.count + fold.fold;
      const training = fold.trainingRows();
      const chosen = procedure(materialOf(ground, fold.training, training, null));
      const name = chosen === null ? null : nameOf(chosen.candidate);
      choices.set(name, (choices.get(name) ?? 0) + 1);
      const judged = [chosen?.candidate, winner?.candidate].filter((one) => one !== undefined);
      const rest = predictable(fold, judged);
      heldOut += fold.heldOut.rowCount;
      kept += rest.heldOut.rowCount;
      const mean = meanErrors(training, rest.heldOutRows());
      weights[at] = mean.weight;
      table.mean[at] = mean.squares;
      table.procedure[at] = chosen === null ? mean.squares : squaresOf(rest, chosen.candidate, training);
      if (winner !== null) table.winner[at] = squaresOf(rest, winner.candidate, training);
      done++;
      onProgress?.(done, cells);
    });
  });

  const weight = sum(weights);
  if (!(weight > 0)) return null;
  const figures = (squares: Float64Array): ErrorFigures => ({
    meanSquaredError: sum(squares) / weight,
    standardError: errorOf(squares),
  });
  const gains = table.mean.map((squares, at) => squares - table.procedure[at]!);
  const gain = { value: sum(gains) / weight, standardError: errorOf(gains) };
  const result = {
    rows: kept,
    rowsLeftOut: heldOut - kept,
    procedure: figures(table.procedure),
    mean: figures(table.mean),
    winner: winner === null ? null : figures(table.winner),
    gain,
    choices: [...choices]
      .map(([candidate, count]) => ({ candidate, folds: count }))
      .sort((a, b) => b.folds - a.folds || compareNames(a.candidate, b.candidate)),
    folds: done,
  };
  if (!Number.isFinite(result.procedure.meanSquaredError)) return null;
  return { ...result, sentence: sentenceOf(result) };

  /** Over the folds of each set; sets bring no further rows. */
  function errorOf(squares: Float64Array): number | null {
    const variances = folds.sets.map((_, s) => {
      const from = s * folds.count;
      return ratioVariance(
        squares.subarray(from, from + folds.count),
        weights.subarray(from, from + folds.count),
      );
    });
    const variance = variances.reduce((a, b) => a + b, 0) / variances.length;
    return Number.isNaN(variance) ? null : Math.sqrt(variance);
  }

  /** The fold without the rows that one of the candidates cannot predict from the others. */
  function predictable(fold: Fold, candidates: readonly CandidateModel[]): Fold {
    const all = fold.heldOutRows();
    const out = new Uint8Array(all.length);
    for (const { columns, responseColumn } of candidates) {
      const responseAt = rows.predictorCount + responseColumn;
      if (
        solveColumns(fold.training.triangle.hi, rows.width, columns, responseAt, scratch) === columns.length
      )
        continue;
      for (const dependency of dependenciesOf(columns, rows.width, scratch)) {
        rowsBeyond(dependency, rowsAt(rows, all, null)).forEach((beyond, i) => {
          if (beyond === 1) out[i] = 1;
        });
      }
    }
    if (!out.includes(1)) return fold;
    const index = all.filter((_, i) => out[i] === 0);
    return { ...fold, heldOut: factorAt(rows, index), heldOutRows: () => index };
  }

  function squaresOf(fold: Fold, candidate: CandidateModel, training: Int32Array): number {
    const { columns, responseColumn } = candidate;
    const { scale } = candidate.response;
    const responseAt = rows.predictorCount + responseColumn;
    solveColumns(fold.training.triangle.hi, rows.width, columns, responseAt, scratch);
    if (scale.kind === 'natural') return naturalErrors(fold, columns, responseAt, rows, scratch).squares;
    const estimates = Float64Array.from(
      columns,
      (column, j) => (scratch.estimates[j]! * rows.scales[column]!) / rows.scales[responseAt]!,
    );
    return ownScaleErrors(
      rows,
      own,
      { columns, estimates, responseColumn, scale },
      training,
      fold.heldOutRows(),
    ).squares;
  }

  /** Of predicting the mean of the training rows, by weight. */
  function meanErrors(
    training: Int32Array,
    held: Int32Array,
  ): { readonly squares: number; readonly weight: number } {
    const weightAt = (row: number) => (rows.rootWeights === null ? 1 : rows.rootWeights[row]! ** 2);
    let whole = 0;
    let total = 0;
    for (const row of training) {
      whole += weightAt(row);
      total += weightAt(row) * own[row]!;
    }
    const mean = total / whole;
    let squares = 0;
    let heldWeight = 0;
    for (const row of held) {
      heldWeight += weightAt(row);
      squares += weightAt(row) * (own[row]! - mean) ** 2;
    }
    return { squares, weight: heldWeight };
  }
}

function compareNames(a: string | null, b: string | null): number {
  if (a === null || b === null) return a === b ? 0 : a === null ? 1 : -1;
  return a < b ? -1 : a > b ? 1 : 0;
}

/** What the figures say to a reader: whether choosing and fitting beats predicting the mean. */
function sentenceOf({
  procedure,
  mean,
  winner,
  gain,
  choices,
  folds,
}: Omit<HonestError, 'sentence'>): string {
  const root = (figures: ErrorFigures) => significant(Math.sqrt(figures.meanSquaredError), 4);
  const beside = `The whole procedure, choice and fit, predicts rows that it has not seen with a root mean squared error of ${root(procedure)}, the mean alone with ${root(mean)}`;
  const verdict =
    gain.value <= 0
      ? ': it is no better than the mean.'
      : gain.standardError !== null && gain.value <= gain.standardError
        ? ': the difference is within one standard error, so it cannot be told to be better than the mean.'
        : '.';
  const flattered =
    winner !== null && winner.meanSquaredError < procedure.meanSquaredError
      ? ` The chosen candidate’s own figure in the same folds, ${root(winner)}, is flattered by its choice.`
      : '';
  const [most] = choices;
  const often =
    most === undefined
      ? ''
      : most.candidate === null
        ? ` In ${most.folds} of ${counted(folds, 'fold')} no candidate was admitted.`
        : ` Of ${counted(folds, 'choice')} made anew, ${most.folds} fell on ${named(most.candidate)}.`;
  return `${beside}${verdict}${flattered}${often}`;
}

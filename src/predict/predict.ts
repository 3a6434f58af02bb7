import type { Column } from '../data/table.ts';
import { errorOf } from '../engine/covariance.ts';
import type { Chosen } from '../examine/chosen.ts';
import { rootForm } from '../examine/effects/settings.ts';
import type { DesignColumn } from '../model/design.ts';
import { designRows } from '../model/design-rows.ts';
import { fromScale, isDecreasing, scaleName } from '../model/response-scale.ts';
import { wholeNumber } from '../numerals.ts';
import type { Place, Report, Severity } from '../problem.ts';
import { tTwoSidedQuantile } from '../stats/distributions.ts';
import type { Scale } from '../study/study.ts';
import { outsideData } from './outside-data.ts';
import {
  emptyFigures,
  orNull,
  type PredictedColumns,
  type Prediction,
  predictionAt,
} from './predicted-columns.ts';
import { type Predictor, predictorOf } from './predictor.ts';

export type { Prediction } from './predicted-columns.ts';

/** Rows to be predicted: every variable of the model, declared and derived. */
export interface PredictionRows {
  readonly rowCount: number;
  /** The label of a row, worked out when it is asked for. */
  readonly labelOf: (row: number) => string;
  readonly columns: ReadonlyMap<string, Column>;
  /** What the analyst gave for each row, for the record. */
  readonly given: readonly (readonly { variable: string; value: number | string | boolean }[])[];
  readonly placeOf: (row: number) => Place;
  /** How much it matters that a row cannot be predicted. */
  readonly severity: Severity;
}

/** The label of every row. */
export function labelsOf({ rowCount, labelOf }: PredictionRows): string[] {
  return Array.from({ length: rowCount }, (_, row) => labelOf(row));
}

export interface PredictionTotal {
  readonly rows: number;
  readonly estimate: number;
  /** Null where the model fits exactly. */
  readonly lower: number | null;
  readonly upper: number | null;
  readonly mean: number | null;
}

export interface Predicted {
  readonly predictions: Prediction[];
  /** Null where not asked for, or where the response's scale is not natural. */
  readonly total: PredictionTotal | null;
}

/** Residuals that the smearing estimate averages over: all up to this many, else evenly spaced order statistics. */
export const SMEARING_RESIDUALS = 2000;

/** What predictions are asked for besides each row's own. */
export interface PredictRequest {
  /** Confidence of the intervals, between 0 and 1. */
  readonly interval: number;
  /** Per source, the group of each of its rows, from 0; left out where no totals of groups are wanted. */
  readonly groups?: { readonly count: number; readonly of: readonly Int32Array[] };
}

export interface PredictedRows {
  readonly predicted: PredictedColumns;
  /** Of all rows predicted, then of each group; all null where the response's scale is not natural or no row is predicted. */
  readonly totals: readonly (PredictionTotal | null)[];
}

/** The chosen model's predictions at the rows of a study. The chosen model has degrees of freedom. */
export function predict(
  chosen: Chosen,
  sources: readonly PredictionRows[],
  smearing: Float64Array | null,
  report: Report,
): Predicted {
  const { interval, total } = chosen.study.predict;
  const predictor = predictorOf(chosen, smearing);
  for (const rows of sources) reportWithoutWeight(predictor, rows, report);
  const { predicted, totals } = predictRows(predictor, sources, { interval }, report);
  const predictions = Array.from({ length: predicted.count }, (_, k) => {
    const rows = sources[predicted.source[k]!]!;
    const row = predicted.row[k]!;
    return predictionAt(predicted, k, rows.labelOf(row), rows.given[row]!);
  });
  return { predictions, total: total ? totals[0]! : null };
}

/**
 * Predictions at rows. Mean: x′b ± t √(x′Vx), V the declared covariance of the estimates; new row: the
 * classical s²/w is added, w the row's weight where it gives one, else 1. A total adds the rows' covariance:
 * Σ s²/w + 1′XVX′1. Intervals are taken back to the own scale by their ends, the mean there by smearing (Duan 1983).
 *
 * A row at which the model has no answer that can be computed, or one that no response can have, is reported and
 * left out. An exact fit says nothing of how far rows lie from it.
 */
export function predictRows(
  predictor: Predictor,
  sources: readonly PredictionRows[],
  { interval, groups }: PredictRequest,
  report: Report,
): PredictedRows {
  const { estimates, rootInverse, s, covariance, smearing, largestLeverage } = predictor;
  const { scale } = predictor.response;
  // Where the scale falls, the lower end on it is the upper one.
  const down = isDecreasing(scale) ? 1 : -1;
  const p = estimates.length;
  const t = tTwoSidedQuantile(1 - interval, predictor.degreesOfFreedom);
  // x′Vx/s²: with the classical covariance, the leverage.
  const classical = covariance !== null && covariance.root === rootInverse;
  const shareOf = (x: Float64Array, leverage: number) => {
    if (covariance === null || s === null) return 0;
    return classical ? leverage : (errorOf(covariance, x) / s) ** 2;
  };
  const sums = Array.from({ length: 1 + (groups?.count ?? 0) }, () => emptySum(p));
  const most = sources.reduce((sum, { rowCount }) => sum + rowCount, 0);
  const figures = emptyFigures(most);
  const [sourceOf, rowOf] = [new Int32Array(most), new Int32Array(most)];
  const outside = new Map<number, readonly string[]>();
  let count = 0;

  sources.forEach((rows, source) => {
    const at = rowsOf(predictor.columns, rows);
    const weightOf = weightsAt(predictor.weights, rows);
    const outsideAt = outsideData(predictor, rows.columns, rows.rowCount);
    for (let i = 0; i < rows.rowCount; i++) {
      const row = at(i);
      const centre = dot(row, estimates);
      const leverage = rootForm(rootInverse, p, row) ** 2;
      const weight = weightOf(i);
      const estimate = fromScale(centre, scale);
      if (!(Number.isFinite(centre) && Number.isFinite(leverage) && Number.isFinite(estimate))) {
        unpredictable(predictor, rows, i, centre, leverage, report);
        continue;
      }
      const share = shareOf(row, leverage);
      addRow(sums[0]!, row, centre, weight);
      if (groups !== undefined) addRow(sums[1 + groups.of[source]![i]!]!, row, centre, weight);
      const forNewRow = t * Math.sqrt(1 / weight + share);
      const forMean = t * Math.sqrt(share);
      const ways = outsideAt(i, weight * leverage > largestLeverage * (1 + 1e-9));
      if (ways.length > 0) outside.set(count, ways);
      sourceOf[count] = source;
      rowOf[count] = i;
      figures.estimate[count] = estimate;
      figures.lower[count] = endAt(centre, s, down * forNewRow, scale);
      figures.upper[count] = endAt(centre, s, -down * forNewRow, scale);
      figures.mean_lower[count] = endAt(centre, s, down * forMean, scale);
      figures.mean_upper[count] = endAt(centre, s, -down * forMean, scale);
      figures.mean[count] = (smearing === null ? null : smearedMean(centre, smearing, scale)) ?? Number.NaN;
      figures.leverage[count] = leverage;
      count++;
    }
  });
  const totals = sums.map((sum): PredictionTotal | null => {
    if (scale.kind !== 'natural' || sum.rows === 0) return null;
    const share = shareOf(sum.columns, rootForm(rootInverse, p, sum.columns) ** 2);
    const reach = t * Math.sqrt(sum.newRows + share);
    const [lower, upper] = [-reach, reach].map((each) => endAt(sum.centres, s, each, scale));
    return {
      rows: sum.rows,
      estimate: sum.centres,
      lower: orNull(lower!),
      upper: orNull(upper!),
      mean: null,
    };
  });
  return { predicted: { count, figures, outside, source: sourceOf, row: rowOf }, totals };
}

/** What a total is worked out from. */
interface Sum {
  rows: number;
  /** Σ x′b. */
  centres: number;
  /** Σ 1/w. */
  newRows: number;
  /** X′1. */
  readonly columns: Float64Array;
}

function emptySum(p: number): Sum {
  return { rows: 0, centres: 0, newRows: 0, columns: new Float64Array(p) };
}

function addRow(sum: Sum, row: Float64Array, centre: number, weight: number): void {
  sum.rows++;
  sum.centres += centre;
  sum.newRows += 1 / weight;
  for (let j = 0; j < row.length; j++) sum.columns[j]! += row[j]!;
}

/** The rows of the chosen model's design, one at a time, in an array that is used again. */
export function designAt(chosen: Chosen, rows: PredictionRows): (row: number) => Float64Array {
  const columns = chosen.fit.columns.map((column) => chosen.columns[column]!);
  return rowsOf(columns, rows);
}

/** Rows formed at a time. */
const BLOCK = 256;

/** Rows are formed in blocks, and so are best asked for in order. */
function rowsOf(columns: readonly DesignColumn[], rows: PredictionRows): (row: number) => Float64Array {
  const p = columns.length;
  const design = designRows(columns, rows, [], null);
  const all = columns.map((_, j) => j);
  const block = new Float64Array(BLOCK * p);
  const row = new Float64Array(p);
  let start = -1;
  return (i) => {
    if (start < 0 || i < start || i >= start + BLOCK) {
      start = i;
      design.fill(all, start, Math.min(start + BLOCK, rows.rowCount), BLOCK, block, null);
    }
    for (let j = 0; j < p; j++) row[j] = block[j * BLOCK + i - start]! / design.scales[j]!;
    return row;
  };
}

/** The weight of each row to be predicted: its own where it gives one, else 1. */
export function weightsOf(chosen: Chosen, rows: PredictionRows): (row: number) => number {
  return weightsAt(chosen.study.weights, rows);
}

function weightsAt(weights: string | null, rows: PredictionRows): (row: number) => number {
  const given = weightsGiven(weights, rows);
  return (row) => given(row) ?? 1;
}

/** The weight that a row gives; null where it gives none above 0. */
function weightsGiven(weights: string | null, { columns }: PredictionRows): (row: number) => number | null {
  const column = weights === null ? undefined : columns.get(weights);
  return (row) => (column?.kind === 'number' && column.values[row]! > 0 ? column.values[row]! : null);
}

/**
 * Warns of rows that give no weight above 0 to a model whose rows were weighted: at weight 1 they may be far less certain,
 * or far more, than any row fitted.
 */
export function reportWithoutWeight(
  { weights, s }: Pick<Predictor, 'weights' | 's'>,
  rows: PredictionRows,
  report: Report,
): void {
  if (weights === null || s === null) return;
  const given = weightsGiven(weights, rows);
  let first = -1;
  let count = 0;
  for (let row = 0; row < rows.rowCount; row++) {
    if (given(row) === null && count++ === 0) first = row;
  }
  if (count === 0) return;
  const lacks = `no ${weights} above 0, by which the rows fitted are weighted`;
  const label = `"${rows.labelOf(first)}"`;
  report({
    code: 'prediction_value_missing',
    severity: 'warning',
    place: rows.placeOf(first),
    message:
      count === 1
        ? `The row ${label} gives ${lacks}: its interval for a new row is that of weight 1.`
        : `${wholeNumber(count)} rows give ${lacks} (the first is ${label}): their intervals for a new row are those of weight 1.`,
    hint: `Give ${weights}, or what it is derived from.`,
  });
}

function dot(a: Float64Array, b: Float64Array): number {
  let sum = 0;
  for (let j = 0; j < a.length; j++) sum += a[j]! * b[j]!;
  return sum;
}

/** centre + s · reach on the own scale; NaN where there is no s, or no end. */
function endAt(centre: number, s: number | null, reach: number, scale: Scale): number {
  if (s === null) return Number.NaN;
  const value = fromScale(centre + s * reach, scale);
  if (Number.isFinite(value)) return value;
  // Beyond the image of the scale lies the end of the own scale: zero, or none at all.
  const endless = scale.kind === 'reciprocal' || (scale.kind === 'box_cox' && scale.lambda < 0);
  return Number.isNaN(value) && !endless ? 0 : Number.NaN;
}

/** An end of an interval, on the fitted scale, taken back to the own one; null where there it has none. */
export function endOf(z: number, scale: Scale): number | null {
  return orNull(endAt(z, 0, 0, scale));
}

function unpredictable(
  predictor: Predictor,
  rows: PredictionRows,
  row: number,
  centre: number,
  leverage: number,
  report: Report,
): void {
  const { variable, scale } = predictor.response;
  const label = `The row "${rows.labelOf(row)}" cannot be predicted`;
  const place = rows.placeOf(row);
  const hint = 'Predict nearer to the data.';
  if (Number.isFinite(centre) && Number.isFinite(leverage) && Number.isNaN(fromScale(centre, scale))) {
    report({
      code: 'prediction_outside',
      severity: rows.severity,
      place,
      message: `${label}: the model leads to ${Number(centre.toPrecision(4))} on the ${scaleName(scale)} scale, where no ${variable} lies.`,
      hint,
    });
    return;
  }
  report({
    code: 'value_not_finite',
    severity: rows.severity,
    place,
    message: `${label}: what the model leads to there is too large to be computed with.`,
    hint,
  });
}

/** Mean of g⁻¹(x′b + e_i) over the residuals; null where one of them leaves the scale's image. */
function smearedMean(centre: number, residuals: Float64Array, scale: Scale): number | null {
  let sum = 0;
  for (const e of residuals) sum += fromScale(centre + e, scale);
  const mean = sum / residuals.length;
  return Number.isFinite(mean) ? mean : null;
}

/**
 * The residuals on the fitted scale, unweighted, that smearing averages over; null on the natural scale, where
 * the mean is x′b itself. Beyond `SMEARING_RESIDUALS` they are thinned to evenly spaced order statistics.
 */
export function smearingResiduals(chosen: Chosen): Float64Array | null {
  if (chosen.fit.candidate.response.scale.kind === 'natural') return null;
  const sorted = chosen.observed.map((y, i) => y - chosen.fitted[i]!).sort();
  const n = sorted.length;
  if (n <= SMEARING_RESIDUALS) return sorted;
  return Float64Array.from(
    { length: SMEARING_RESIDUALS },
    (_, k) => sorted[Math.floor(((k + 0.5) * n) / SMEARING_RESIDUALS)]!,
  );
}

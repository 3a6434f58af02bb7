import type { Column } from '../data/table.ts';
import { errorOf } from '../engine/covariance.ts';
import type { Chosen } from '../examine/chosen.ts';
import { rootForm } from '../examine/effects/settings.ts';
import { designRows } from '../model/design-rows.ts';
import { fromScale, isDecreasing, scaleName } from '../model/response-scale.ts';
import type { Place, Report, Severity } from '../problem.ts';
import { tTwoSidedQuantile } from '../stats/distributions.ts';
import type { Scale } from '../study/study.ts';
import { outsideData, rangedVariables } from './outside-data.ts';

/** Rows to be predicted: every variable of the model, declared and derived. */
export interface PredictionRows {
  readonly rowCount: number;
  readonly labels: readonly string[];
  readonly columns: ReadonlyMap<string, Column>;
  /** What the analyst gave for each row, for the record. */
  readonly given: readonly (readonly { variable: string; value: number | string | boolean }[])[];
  readonly placeOf: (row: number) => Place;
  /** How much it matters that a row cannot be predicted. */
  readonly severity: Severity;
}

/** One prediction, on the response's own scale. */
export interface Prediction {
  readonly label: string;
  readonly values: readonly { variable: string; value: number | string | boolean }[];
  /** x′b taken back to the response's own scale: its median there. */
  readonly estimate: number;
  /** Interval for a new row; both null where the model fits exactly, the upper one where it has no end. */
  readonly lower: number | null;
  readonly upper: number | null;
  /** Interval for the mean (the median where the scale is not natural) at this place; null likewise. */
  readonly mean_lower: number | null;
  readonly mean_upper: number | null;
  /** The mean on the own scale by smearing where the scale is not natural, else null. */
  readonly mean: number | null;
  readonly leverage: number;
  readonly outside: string[];
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

/**
 * Predictions at stated rows. Mean: x′b ± t √(x′Vx), V the declared covariance of the estimates; new row: the
 * classical s²/w is added, w the row's weight where it gives one, else 1. The total adds the rows' covariance:
 * Σ s²/w + 1′XVX′1. Intervals are taken back to the own scale by their ends, the mean there by smearing (Duan 1983).
 *
 * A row at which the model has no answer that can be computed, or one that no response can have, is reported and
 * left out. The chosen model has degrees of freedom; an exact fit says nothing of how far rows lie from it.
 */
export function predict(
  chosen: Chosen,
  sources: readonly PredictionRows[],
  smearing: Float64Array | null,
  report: Report,
): Predicted {
  const { fit, study } = chosen;
  const p = fit.columns.length;
  const { scale } = fit.candidate.response;
  const { s, covariance } = chosen;
  const t = tTwoSidedQuantile(1 - study.predict.interval, covariance?.df ?? fit.degreesOfFreedom);
  // x′Vx/s²: with the classical covariance, the leverage.
  const shareOf = (x: Float64Array) =>
    covariance === null || s === null ? 0 : (errorOf(covariance, x) / s) ** 2;
  const largestLeverage = chosen.leverages.reduce((most, h) => Math.max(most, h), 0);
  const ranged = rangedVariables(chosen);
  const sum = new Float64Array(p);
  let centres = 0;
  let newRows = 0;

  const predictions = sources.flatMap((rows) => {
    const at = designAt(chosen, rows);
    const weightOf = weightsOf(chosen, rows);
    return rows.labels.flatMap((label, i): Prediction[] => {
      const row = at(i);
      const centre = dot(row, fit.estimates);
      const leverage = rootForm(fit.rootInverse, p, row) ** 2;
      const weight = weightOf(i);
      const estimate = fromScale(centre, scale);
      if (!(Number.isFinite(centre) && Number.isFinite(leverage) && Number.isFinite(estimate))) {
        unpredictable(chosen, rows, i, centre, leverage, report);
        return [];
      }
      const share = shareOf(row);
      centres += centre;
      newRows += 1 / weight;
      for (let j = 0; j < p; j++) sum[j]! += row[j]!;
      const [lower, upper] = ends(centre, s, t * Math.sqrt(1 / weight + share), scale);
      const [meanLower, meanUpper] = ends(centre, s, t * Math.sqrt(share), scale);
      const remote = weight * leverage > largestLeverage * (1 + 1e-9);
      return [
        {
          label,
          values: rows.given[i]!,
          estimate,
          lower,
          upper,
          mean_lower: meanLower,
          mean_upper: meanUpper,
          mean: smearing === null ? null : smearedMean(centre, smearing, scale),
          leverage,
          outside: outsideData(rows.columns, i, ranged, chosen.spreads, remote),
        },
      ];
    });
  });
  const [lower, upper] = ends(centres, s, t * Math.sqrt(newRows + shareOf(sum)), scale);
  const wanted = study.predict.total && scale.kind === 'natural' && predictions.length > 0;
  return {
    predictions,
    total: wanted
      ? {
          rows: predictions.length,
          estimate: centres,
          lower,
          upper,
          mean: null,
        }
      : null,
  };
}

/** The rows of the chosen model's design, one at a time, in an array that is used again. */
export function designAt(chosen: Chosen, rows: PredictionRows): (row: number) => Float64Array {
  const { fit, columns } = chosen;
  const m = rows.rowCount;
  const design = designRows(
    fit.columns.map((column) => columns[column]!),
    rows,
    [],
    null,
  );
  const x = new Float64Array(m * fit.columns.length);
  design.fill(
    fit.columns.map((_, j) => j),
    0,
    m,
    m,
    x,
    null,
  );
  const row = new Float64Array(fit.columns.length);
  return (i) => {
    for (let j = 0; j < row.length; j++) row[j] = x[j * m + i]! / design.scales[j]!;
    return row;
  };
}

/** The weight of each row to be predicted: its own where it gives one, else 1. */
export function weightsOf(chosen: Chosen, rows: PredictionRows): (row: number) => number {
  const column = chosen.study.weights === null ? undefined : rows.columns.get(chosen.study.weights);
  return (row) => (column?.kind === 'number' && column.values[row]! > 0 ? column.values[row]! : 1);
}

function dot(a: Float64Array, b: Float64Array): number {
  let sum = 0;
  for (let j = 0; j < a.length; j++) sum += a[j]! * b[j]!;
  return sum;
}

/** centre ± s · reach on the own scale, lower end first; null where there is no s, or no end. */
function ends(centre: number, s: number | null, reach: number, scale: Scale): [number | null, number | null] {
  if (s === null) return [null, null];
  const a = endOf(centre - s * reach, scale);
  const b = endOf(centre + s * reach, scale);
  return isDecreasing(scale) ? [b, a] : [a, b];
}

/** An end beyond the image of the scale is the end of the own scale: zero, or none at all. */
export function endOf(z: number, scale: Scale): number | null {
  const value = fromScale(z, scale);
  if (Number.isFinite(value)) return value;
  const endless = scale.kind === 'reciprocal' || (scale.kind === 'box_cox' && scale.lambda < 0);
  return Number.isNaN(value) && !endless ? 0 : null;
}

function unpredictable(
  chosen: Chosen,
  rows: PredictionRows,
  row: number,
  centre: number,
  leverage: number,
  report: Report,
): void {
  const { variable, scale } = chosen.fit.candidate.response;
  const label = `The row "${rows.labels[row]}" cannot be predicted`;
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

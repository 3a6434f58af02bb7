import type { Column } from '../data/table.ts';
import type { Chosen } from '../examine/chosen.ts';
import { rootForm } from '../examine/effects/settings.ts';
import { designRows } from '../model/design-rows.ts';
import { fromScale, isDecreasing } from '../model/response-scale.ts';
import { tTwoSidedQuantile } from '../stats/distributions.ts';
import { outsideData } from './outside-data.ts';

/** Rows to be predicted: every variable of the model, declared and derived. */
export interface PredictionRows {
  readonly rowCount: number;
  readonly labels: readonly string[];
  readonly columns: ReadonlyMap<string, Column>;
  /** What the analyst gave for each row, for the record. */
  readonly given: readonly (readonly { variable: string; value: number | string | boolean }[])[];
}

/** One prediction, on the response's own scale. */
export interface Prediction {
  readonly label: string;
  readonly values: readonly { variable: string; value: number | string | boolean }[];
  /** x′b taken back to the response's own scale: its median there. */
  readonly estimate: number;
  /** Interval for a new row. */
  readonly lower: number;
  readonly upper: number;
  /** Interval for the mean (the median where the scale is not natural) at this place. */
  readonly mean_lower: number;
  readonly mean_upper: number;
  /** The mean on the own scale by smearing where the scale is not natural, else null. */
  readonly mean: number | null;
  readonly leverage: number;
  readonly outside: string[];
}

export interface PredictionTotal {
  readonly rows: number;
  readonly estimate: number;
  readonly lower: number;
  readonly upper: number;
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
 * Predictions at stated rows. Mean: x′b ± t s √(x′(X′WX)⁻¹x); new row: s²(1 + …), of weight 1. The total adds
 * the rows' covariance: m s² + s² 1′X(X′WX)⁻¹X′1. Intervals are taken back to the own scale by their ends, the
 * mean there by smearing (Duan 1983).
 *
 * The chosen model must have degrees of freedom; intervals of an exact fit have no width.
 */
export function predict(chosen: Chosen, rows: PredictionRows, smearing: Float64Array | null): Predicted {
  const { fit, columns, study } = chosen;
  const p = fit.columns.length;
  const m = rows.rowCount;
  const { scale } = fit.candidate.response;
  const s = chosen.s ?? 0;
  const t = fit.degreesOfFreedom < 1 ? Number.NaN : tTwoSidedQuantile(1 - study.predict.interval, fit.degreesOfFreedom);
  const design = designRows(fit.columns.map((column) => columns[column]!), rows, [], null);
  const x = new Float64Array(m * p);
  design.fill(fit.columns.map((_, j) => j), 0, m, m, x, null);
  const largestLeverage = chosen.leverages.reduce((most, h) => Math.max(most, h), 0);

  const sum = new Float64Array(p);
  const row = new Float64Array(p);
  let estimateTotal = 0;
  const predictions = Array.from({ length: m }, (_, i): Prediction => {
    let centre = 0;
    for (let j = 0; j < p; j++) {
      row[j] = x[j * m + i]! / design.scales[j]!;
      sum[j]! += row[j]!;
      centre += row[j]! * fit.estimates[j]!;
    }
    estimateTotal += centre;
    const root = rootForm(fit.rootInverse, p, row);
    const leverage = root * root;
    const halfMean = t * s * root;
    const halfNew = t * s * Math.sqrt(1 + leverage);
    const back = (low: number, high: number): [number, number] => {
      const a = fromScaleEnd(low, scale);
      const b = fromScaleEnd(high, scale);
      return isDecreasing(scale) ? [b, a] : [a, b];
    };
    const [lower, upper] = back(centre - halfNew, centre + halfNew);
    const [meanLower, meanUpper] = back(centre - halfMean, centre + halfMean);
    return {
      label: rows.labels[i]!,
      values: rows.given[i]!,
      estimate: fromScaleEnd(centre, scale),
      lower,
      upper,
      mean_lower: meanLower,
      mean_upper: meanUpper,
      mean: smearing === null ? null : smearedMean(centre, smearing, (z) => fromScale(z, scale)),
      leverage,
      outside: outsideData(chosen, rows.columns, i, leverage, largestLeverage),
    };
  });
  const natural = scale.kind === 'natural';
  const halfTotal = t * s * Math.sqrt(m + rootForm(fit.rootInverse, p, sum) ** 2);
  return {
    predictions,
    total:
      study.predict.total && natural && m > 0
        ? { rows: m, estimate: estimateTotal, lower: estimateTotal - halfTotal, upper: estimateTotal + halfTotal, mean: null }
        : null,
  };
}

/** An end beyond the image of the scale is the end of the own scale: zero, or no bound at all. */
function fromScaleEnd(z: number, scale: Chosen['fit']['candidate']['response']['scale']): number {
  const value = fromScale(z, scale);
  if (!Number.isNaN(value)) return value;
  return scale.kind === 'reciprocal' || (scale.kind === 'box_cox' && scale.lambda < 0) ? Number.MAX_VALUE : 0;
}

/** Mean of g⁻¹(x′b + e_i) over the residuals; null where one of them leaves the scale's image. */
function smearedMean(centre: number, residuals: Float64Array, back: (z: number) => number): number | null {
  let sum = 0;
  for (const e of residuals) sum += back(centre + e);
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

import { rowsAt } from '../engine/rows-at.ts';
import type { DesignRows } from '../model/design-rows.ts';
import { fromScale } from '../model/response-scale.ts';
import type { Scale } from '../study/study.ts';

/** Residuals that the mean is taken over where it has no closed form: all up to this many, else evenly spaced order statistics. */
const MOST_RESIDUALS = 2000;
const BLOCK = 512;

/**
 * The mean of g⁻¹(z + e) over training residuals e: Duan's smearing estimate (1983). Infinite or NaN where one of them
 * leads to no value of the response; on the square-root and power scales one beyond the image counts as 0, their end.
 * @param residuals on the fitted scale, unweighted; sorted in place where they are many
 */
export function smearing(residuals: Float64Array, scale: Scale): (z: number) => number {
  const n = residuals.length;
  if (scale.kind === 'natural') return (z) => z;
  if (scale.kind === 'log' || (scale.kind === 'box_cox' && scale.lambda === 0)) {
    let sum = 0;
    for (let i = 0; i < n; i++) sum += Math.exp(residuals[i]!);
    return (z) => (Math.exp(z) * sum) / n;
  }
  const ends = scale.kind === 'sqrt' || (scale.kind === 'box_cox' && scale.lambda > 0);
  const averaged = n <= MOST_RESIDUALS ? residuals : thinned(residuals);
  return (z) => {
    let sum = 0;
    for (let i = 0; i < averaged.length; i++) {
      const value = fromScale(z + averaged[i]!, scale);
      if (!(Number.isNaN(value) && ends)) sum += value;
    }
    return sum / averaged.length;
  };
}

function thinned(residuals: Float64Array): Float64Array {
  const sorted = residuals.sort();
  return Float64Array.from(
    { length: MOST_RESIDUALS },
    (_, k) => sorted[Math.floor(((k + 0.5) * sorted.length) / MOST_RESIDUALS)]!,
  );
}

/** A model as it is to predict rows that it was not fitted on. */
export interface TrainedModel {
  readonly columns: ArrayLike<number>;
  /** b in true units, by position among `columns`. */
  readonly estimates: ArrayLike<number>;
  readonly responseColumn: number;
  readonly scale: Scale;
}

/**
 * Σ w (y − ŷ)² and Σ w (y − ŷ) over held-out rows on the response's own scale, ŷ the mean there by smearing over the training
 * rows' residuals.
 * @param own y on its own scale, by row
 */
export function ownScaleErrors(
  rows: DesignRows,
  own: Float64Array,
  model: TrainedModel,
  training: Int32Array,
  heldOut: Int32Array,
): { readonly squares: number; readonly sum: number } {
  const fittedScale = rows.responses[model.responseColumn]!;
  const residuals = linearPredictor(rows, model, training);
  for (let i = 0; i < residuals.length; i++) residuals[i] = fittedScale[training[i]!]! - residuals[i]!;
  const mean = smearing(residuals, model.scale);
  const predicted = linearPredictor(rows, model, heldOut);
  let squares = 0;
  let sum = 0;
  for (let i = 0; i < heldOut.length; i++) {
    const row = heldOut[i]!;
    const weight = rows.rootWeights === null ? 1 : rows.rootWeights[row]! ** 2;
    const error = own[row]! - mean(predicted[i]!);
    squares += weight * error * error;
    sum += weight * error;
  }
  return { squares, sum };
}

/** x′b of the rows at the positions, on the fitted scale, unweighted. */
export function linearPredictor(rows: DesignRows, model: TrainedModel, index: Int32Array): Float64Array {
  const p = model.columns.length;
  const view = rowsAt(rows, index, null);
  const columns = Array.from(model.columns);
  const b = columns.map((column, j) => model.estimates[j]! / rows.scales[column]!);
  const block = new Float64Array(BLOCK * p);
  const z = new Float64Array(index.length);
  for (let from = 0; from < index.length; from += BLOCK) {
    const count = Math.min(BLOCK, index.length - from);
    view.fill(columns, from, from + count, BLOCK, block, null);
    for (let j = 0; j < p; j++) {
      for (let i = 0; i < count; i++) z[from + i]! += b[j]! * block[j * BLOCK + i]!;
    }
  }
  if (view.rootWeights !== null) for (let i = 0; i < z.length; i++) z[i]! /= view.rootWeights[i]!;
  return z;
}

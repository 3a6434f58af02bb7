import type { Fit } from '../engine/fit.ts';
import type { DesignRows } from '../model/design-rows.ts';
import type { Folds } from './folds.ts';

/** How well a candidate predicts rows that it was not fitted on, on the response's own scale. */
export interface ValidationFigures {
  /** Held-out rows, each repeat counted. */
  readonly rows: number;
  /** Σ w (y − ŷ)²/Σ w. */
  readonly meanSquaredError: number;
  /** Of the mean squared error, over the folds; null with fewer than two folds. */
  readonly standardError: number | null;
  /** Σ w (y − ŷ)/Σ w: positive where the candidate predicts too little. */
  readonly meanError: number;
}

/** A column that could not be estimated without a fold. */
export interface FoldLoss {
  /** Union column; null where a row is fitted by itself alone, whichever column does it. */
  readonly column: number | null;
  /** Names of the folds, each once. */
  readonly folds: readonly string[];
  /** Held-out rows that could therefore not be predicted, each repeat counted. */
  readonly rows: number;
  /** Candidates that have the column, by index. */
  readonly candidates: readonly number[];
}

export interface Validation {
  /** By candidate; null where it has none. */
  readonly figures: readonly (ValidationFigures | null)[];
  /** By candidate: why it has no figures, as a clause; null where it has. */
  readonly whyNot: readonly (string | null)[];
  /** Mean of the response over the rows held out, by weight. */
  readonly meanResponse: number;
  /** Held-out rows left out of every candidate's figures. */
  readonly rowsLeftOut: number;
  readonly losses: readonly FoldLoss[];
}

export interface ValidationInput {
  readonly rows: DesignRows;
  /** The response on its own scale, by row. */
  readonly own: Float64Array;
  readonly fits: readonly Fit[];
  readonly folds: Folds;
  /** Figures are needed whatever they cost. */
  readonly ranks: boolean;
  readonly onProgress?: ((done: number, total: number) => void) | undefined;
}

/** A candidate that cannot predict more of the held-out rows than this has no figures; of fewer, all candidates go without. */
export const MOST_UNPREDICTABLE = 0.1;

/** Variance of the ratio Σ a/Σ w over units with w > 0, k/(k − 1) · Σ (a − ratio · w)²/(Σ w)²; NaN with fewer than two. */
export function ratioVariance(a: Float64Array, w: Float64Array): number {
  const whole = sum(w);
  const ratio = sum(a) / whole;
  let units = 0;
  let squares = 0;
  for (let i = 0; i < a.length; i++) {
    if (!(w[i]! > 0)) continue;
    units++;
    squares += (a[i]! - ratio * w[i]!) ** 2;
  }
  return units < 2 ? Number.NaN : ((units / (units - 1)) * squares) / (whole * whole);
}

/** Σ values. */
export function sum(values: Float64Array): number {
  let total = 0;
  for (const value of values) total += value;
  return total;
}

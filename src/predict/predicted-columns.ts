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

/** The figures of a prediction, in the order in which tables have them. */
export const PREDICTED_FIGURES = [
  'estimate',
  'lower',
  'upper',
  'mean_lower',
  'mean_upper',
  'mean',
  'leverage',
] as const;

export type PredictedFigure = (typeof PREDICTED_FIGURES)[number];

/** Many predictions, a column for each figure: an object for each of a million rows would cost more than its figures. */
export interface PredictedColumns {
  readonly count: number;
  /** `count` of each, on the response's own scale; NaN where there is none. */
  readonly figures: { readonly [figure in PredictedFigure]: Float64Array };
  /** By prediction that lies outside the data: in which ways. */
  readonly outside: ReadonlyMap<number, readonly string[]>;
  /** By prediction: its source, and its row there. */
  readonly source: Int32Array;
  readonly row: Int32Array;
}

/** Columns for up to `most` predictions. */
export function emptyFigures(most: number): PredictedColumns['figures'] {
  const column = () => new Float64Array(most);
  return {
    estimate: column(),
    lower: column(),
    upper: column(),
    mean_lower: column(),
    mean_upper: column(),
    mean: column(),
    leverage: column(),
  };
}

/** One of the predictions by itself. */
export function predictionAt(
  { figures, outside }: PredictedColumns,
  at: number,
  label: string,
  values: Prediction['values'],
): Prediction {
  return {
    label,
    values,
    estimate: figures.estimate[at]!,
    lower: orNull(figures.lower[at]!),
    upper: orNull(figures.upper[at]!),
    mean_lower: orNull(figures.mean_lower[at]!),
    mean_upper: orNull(figures.mean_upper[at]!),
    mean: orNull(figures.mean[at]!),
    leverage: figures.leverage[at]!,
    outside: [...(outside.get(at) ?? [])],
  };
}

/** A figure of the columns by itself: null where there is none. */
export function orNull(figure: number): number | null {
  return Number.isNaN(figure) ? null : figure;
}

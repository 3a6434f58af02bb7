import { type Bootstrap, ERRORS_STREAM, ends } from '../examine/bootstrap.ts';
import type { Chosen } from '../examine/chosen.ts';
import { fromScale, isDecreasing } from '../model/response-scale.ts';
import { randomFrom } from '../stats/random.ts';
import { designAt, endOf, labelsOf, type PredictionRows, weightsOf } from './predict.ts';

/** Intervals of one prediction by the bootstrap, on the response's own scale; null where an end does not exist. */
export interface BootstrapPrediction {
  readonly label: string;
  readonly lower: number | null;
  readonly upper: number | null;
  readonly mean_lower: number | null;
  readonly mean_upper: number | null;
}

/** Rows × repetitions × coefficients up to which predictions are drawn. */
const WORK = 3e8;

/**
 * Intervals of predictions from the repetitions. Mean: quantiles of x′b*. New row: x′b plus quantiles of its error
 * ε* − x′(b* − b), with ε* drawn from the residuals and divided by √w of the row (Davison & Hinkley 1997, 6.3). The ends
 * are taken back to the own scale. Null where there are too many rows.
 */
export function bootstrapPredictions(
  chosen: Chosen,
  sources: readonly PredictionRows[],
  { estimates, used, errors, plan }: Bootstrap,
): BootstrapPrediction[] | null {
  const { fit, study } = chosen;
  const p = fit.columns.length;
  const { scale } = fit.candidate.response;
  const count = sources.reduce((sum, rows) => sum + rows.rowCount, 0);
  if (used < 2 || count * used * p > WORK) return null;
  const random = randomFrom(plan.seed, ERRORS_STREAM);
  const means = new Float64Array(used);
  const news = new Float64Array(used);
  return sources.flatMap((rows) => {
    const at = designAt(chosen, rows);
    const weightOf = weightsOf(chosen, rows);
    return labelsOf(rows).flatMap((label, i): BootstrapPrediction[] => {
      const x = at(i);
      const root = Math.sqrt(weightOf(i));
      let centre = 0;
      for (let j = 0; j < p; j++) centre += x[j]! * fit.estimates[j]!;
      // Left out of the predictions themselves for the same reason.
      if (!Number.isFinite(fromScale(centre, scale))) return [];
      for (let k = 0; k < used; k++) {
        let value = 0;
        for (let j = 0; j < p; j++) value += x[j]! * estimates[k * p + j]!;
        means[k] = value;
        news[k] = centre + errors[random.below(errors.length)]! / root - (value - centre);
      }
      const [lower, upper] = ownEnds(news);
      const [meanLower, meanUpper] = ownEnds(means);
      return [{ label, lower, upper, mean_lower: meanLower, mean_upper: meanUpper }];
    });
  });

  function ownEnds(values: Float64Array): [number | null, number | null] {
    const [low, high] = ends(values.slice().sort(), study.predict.interval);
    const a = endOf(low, scale);
    const b = endOf(high, scale);
    return isDecreasing(scale) ? [b, a] : [a, b];
  }
}

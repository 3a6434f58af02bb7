import { classicalCovariance, errorOf } from '../engine/covariance.ts';
import type { FitContext } from '../engine/fit.ts';
import type { Chosen } from '../examine/chosen.ts';
import { designRows } from '../model/design-rows.ts';
import { fromScale, isDecreasing } from '../model/response-scale.ts';
import type { Report } from '../problem.ts';
import { type Averaged, unconditional } from '../select/average.ts';
import { listedUpTo } from '../select/words.ts';
import { normalQuantile } from '../stats/distributions.ts';
import { endOf, labelsOf, type PredictionRows } from './predict.ts';
import { statedRows } from './prediction-rows.ts';

/** The mean at a stated row (the median where the scale is not natural), averaged over candidates; own scale. */
export interface AveragedPrediction {
  readonly label: string;
  readonly estimate: number;
  readonly lower: number | null;
  readonly upper: number | null;
}

/**
 * Σ w x′b over the candidates on the fitted scale with the unconditional standard error Σ w √(x′Vx + (x′b − mean)²) (Burnham & Anderson
 * 2002, 4.3), taken back to the own scale; intervals for the mean by the normal quantile at the study's prediction
 * interval. Rows at which a candidate has no finite answer are left out.
 */
export function averagePredictions(
  chosen: Chosen,
  context: FitContext,
  averaged: Averaged,
  report: Report,
): AveragedPrediction[] {
  const rows = rowsOfAll(chosen, context, averaged, report);
  const { scale } = chosen.fit.candidate.response;
  const reach = -normalQuantile((1 - chosen.study.predict.interval) / 2);
  const used = [...new Set(averaged.candidates.flatMap(({ candidate }) => context.fits[candidate]!.columns))];
  const design = designRows(
    used.map((column) => chosen.columns[column]!),
    rows,
    [],
    null,
  );
  const values = new Float64Array(rows.rowCount * used.length);
  const all = used.map((_, j) => j);
  design.fill(all, 0, rows.rowCount, rows.rowCount, values, null);
  return labelsOf(rows).flatMap((label, row): AveragedPrediction[] => {
    const at = (column: number) => {
      const j = used.indexOf(column);
      return values[j * rows.rowCount + row]! / design.scales[j]!;
    };
    const each = averaged.candidates.map(({ candidate, weight }) => {
      const fit = context.fits[candidate]!;
      const covariance =
        context.covariances === undefined
          ? classicalCovariance(fit)
          : (context.covariances[candidate] ?? null);
      const x = Float64Array.from(fit.columns, at);
      return {
        weight,
        estimate: x.reduce((sum, value, j) => sum + value * fit.estimates[j]!, 0),
        error: covariance === null ? 0 : errorOf(covariance, x),
      };
    });
    const { estimate, standardError } = unconditional(each);
    const ends = [estimate - reach * standardError, estimate + reach * standardError].map((end) =>
      endOf(end, scale),
    );
    const centre = fromScale(estimate, scale);
    if (!Number.isFinite(centre)) return [];
    const [lower, upper] = isDecreasing(scale) ? ends.reverse() : ends;
    return [{ label, estimate: centre, lower: lower ?? null, upper: upper ?? null }];
  });
}

/** The stated rows that give what every averaged candidate needs; the others are told of once, as a warning. */
function rowsOfAll(chosen: Chosen, context: FitContext, averaged: Averaged, report: Report): PredictionRows {
  const columns = averaged.candidates.flatMap(({ candidate }) => context.fits[candidate]!.candidate.columns);
  const all = { ...chosen.fit.candidate, columns: [...new Set(columns)].sort((a, b) => a - b) };
  const rows = statedRows({ ...chosen, fit: { ...chosen.fit, candidate: all } }, () => {});
  const usable = labelsOf(rows);
  const stated = chosen.study.predict.rows.map(({ label }) => label);
  const without = stated.filter((label) => !usable.includes(label));
  if (without.length > 0) {
    report({
      code: 'prediction_value_missing',
      severity: 'warning',
      place: chosen.study.placeOf(['selection', 'average']),
      message: `${listedUpTo(
        without.map((label) => `"${label}"`),
        3,
      )} ${without.length === 1 ? 'has' : 'have'} no averaged prediction: not every variable of the admitted candidates has a value there that can be used.`,
      hint: 'Give under predict.rows what every admitted candidate needs.',
    });
  }
  return rows;
}

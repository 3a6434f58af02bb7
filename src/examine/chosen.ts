import { type Covariance, declaredCovariance } from '../engine/covariance.ts';
import type { Fit } from '../engine/fit.ts';
import { FULL_LEVERAGE, visitRows } from '../engine/row-figures.ts';
import type { DesignColumn } from '../model/design.ts';
import type { DesignRows } from '../model/design-rows.ts';
import type { Sample } from '../prepare/sample.ts';
import type { Spread } from '../prepare/spread.ts';
import type { Study } from '../study/study.ts';

/** The chosen model with the figures of each row: what every diagnostic reads. Arrays have length n, in file order. */
export interface Chosen {
  readonly study: Study;
  readonly sample: Sample;
  /** By variable, over the rows used. */
  readonly spreads: ReadonlyMap<string, Spread>;
  /** The union's columns; `fit.columns` are indexes into them. */
  readonly columns: readonly DesignColumn[];
  readonly fit: Fit;
  /** s = √(RSS/(n − p)); null where there are no degrees of freedom or the fit is exact. */
  readonly s: number | null;
  /** The declared covariance of the estimates; null as for s. */
  readonly covariance: Covariance | null;
  /** √w (y − Xb), on the fitted scale. */
  readonly residuals: Float64Array;
  readonly leverages: Float64Array;
  /** Xb, on the fitted scale, unweighted. */
  readonly fitted: Float64Array;
  /** y on the fitted scale. */
  readonly observed: Float64Array;
}

/**
 * One pass over the rows: residuals, leverages and fitted values of the chosen model; and a second one where its
 * declared covariance is not the classical one.
 */
export function examineRows(
  study: Study,
  sample: Sample,
  spreads: ReadonlyMap<string, Spread>,
  columns: readonly DesignColumn[],
  fit: Fit,
  rows: DesignRows,
): Chosen {
  const n = rows.rowCount;
  const residuals = new Float64Array(n);
  const leverages = new Float64Array(n);
  visitRows(fit, rows, (from, count, e, h) => {
    residuals.set(e.subarray(0, count), from);
    leverages.set(h.subarray(0, count), from);
  });
  const observed = rows.responses[fit.candidate.responseColumn]!;
  const { rootWeights } = rows;
  const fitted = observed.map((y, i) => y - residuals[i]! / (rootWeights === null ? 1 : rootWeights[i]!));
  const s =
    fit.degreesOfFreedom < 1 || fit.exact ? null : Math.sqrt(fit.residualSumOfSquares / fit.degreesOfFreedom);
  const covariance = declaredCovariance(study.inference.standardErrors, fit, rows, sample);
  return { study, sample, spreads, columns, fit, s, covariance, residuals, leverages, fitted, observed };
}

/** e_i/(s √(1 − h_i)); null where s is undefined or the leverage is 1. */
export function standardisedResidual(chosen: Chosen, row: number): number | null {
  const h = chosen.leverages[row]!;
  return chosen.s === null || h > FULL_LEVERAGE
    ? null
    : chosen.residuals[row]! / (chosen.s * Math.sqrt(1 - h));
}

/** D_i = e_i² h_i/(p s² (1 − h_i)²) (Cook 1977); null as for the standardised residual. */
export function cooksDistance(chosen: Chosen, row: number): number | null {
  const z = standardisedResidual(chosen, row);
  const h = chosen.leverages[row]!;
  return z === null ? null : (z * z * h) / (chosen.fit.columns.length * (1 - h));
}

/**
 * The deleted residual t_i = z_i √((n − p − 1)/(n − p − z_i²)), on n − p − 1 degrees of freedom (Belsley, Kuh &
 * Welsch 1980); null where undefined; infinite where the row alone spoils an otherwise exact fit.
 */
export function deletedResidual(chosen: Chosen, row: number): number | null {
  const z = standardisedResidual(chosen, row);
  const df = chosen.fit.degreesOfFreedom;
  if (z === null || df < 2) return null;
  return z * Math.sqrt((df - 1) / Math.max(0, df - z * z));
}

/**
 * s_(i), the residual standard error without the row: s²_(i) = (s²(n − p) − e²/(1 − h))/(n − p − 1) (Belsley, Kuh &
 * Welsch 1980); null as for the deleted residual, 0 where the row alone spoils an otherwise exact fit.
 */
export function deletedDeviation(chosen: Chosen, row: number): number | null {
  const z = standardisedResidual(chosen, row);
  const df = chosen.fit.degreesOfFreedom;
  if (z === null || df < 2) return null;
  return chosen.s! * Math.sqrt(Math.max(0, df - z * z) / (df - 1));
}

/** DFFITS = t_i √(h/(1 − h)) (Belsley, Kuh & Welsch 1980); null where undefined. */
export function fittedShift(chosen: Chosen, row: number): number | null {
  const t = deletedResidual(chosen, row);
  const h = chosen.leverages[row]!;
  return t === null || !Number.isFinite(t) ? null : t * Math.sqrt(h / (1 - h));
}

/**
 * COVRATIO = (s²_(i)/s²)^p/(1 − h), the determinant of the coefficients' covariance without the row over that with it
 * (Belsley, Kuh & Welsch 1980); null where undefined.
 */
export function covarianceRatio(chosen: Chosen, row: number): number | null {
  const spread = deletedDeviation(chosen, row);
  if (spread === null) return null;
  const ratio = (spread / chosen.s!) ** (2 * chosen.fit.columns.length) / (1 - chosen.leverages[row]!);
  return Number.isFinite(ratio) ? ratio : null;
}

/** How a row is named to a person: its identity where the study declares one, else its line in the file. */
export function rowName(sample: Sample, row: number): string {
  const id = sample.ids?.[row];
  if (id === undefined) return `line ${sample.lines[row]}`;
  // A bare number would read as a count.
  return /^\d+$/.test(id) ? `row ${id}` : id;
}

/** The same at the start of a sentence; an identity keeps its letters as they are. */
export function rowNameFirst(sample: Sample, row: number): string {
  return rowName(sample, row).replace(
    /^(line|row) (?=\d+$)/,
    (word) => word[0]!.toUpperCase() + word.slice(1),
  );
}

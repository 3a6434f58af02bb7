import type { Fit } from '../engine/fit.ts';
import { FULL_LEVERAGE, visitRows } from '../engine/row-figures.ts';
import { linearPredictor, smearing } from './own-scale.ts';
import {
  MOST_UNPREDICTABLE,
  ratioVariance,
  sum,
  type Validation,
  type ValidationFigures,
  type ValidationInput,
} from './validation.ts';
import { counted } from './words.ts';

/** Rows × rows × columns up to which a candidate on another scale is worked out although that does not rank. */
const OWN_SCALE_BUDGET = 5e8;

/**
 * Every row predicted from all the others, by one pass for each candidate: the error is e/(1 − h) with h the leverage (Allen 1974).
 * On other scales each row's own model b − (X′WX)⁻¹x w e/(1 − h) predicts it, with smearing over the other rows' residuals.
 *
 * A row with leverage 1 cannot be predicted from the others: the rule of `crossValidate` holds for it too.
 */
export function leaveOneOut(input: ValidationInput): Validation {
  const { rows, own, fits, folds } = input;
  const n = rows.rowCount;
  const weights = rows.rootWeights?.map((root) => root * root) ?? new Float64Array(n).fill(1);
  const full = fits.map((fit) => fullRows(fit, input));
  const out = new Uint8Array(n);
  const candidatesOfRow = new Map<number, number[]>();
  full.forEach((list, c) => {
    if (list.length > MOST_UNPREDICTABLE * n) return;
    for (const row of list) {
      out[row] = 1;
      candidatesOfRow.set(row, [...(candidatesOfRow.get(row) ?? []), c]);
    }
  });
  const used = weights.map((weight, i) => (out[i] === 1 ? 0 : weight));
  const count = n - sum(Float64Array.from(out));
  const weight = sum(used);

  const results = fits.map((fit, c): ValidationFigures | string => {
    input.onProgress?.(c, fits.length);
    if (full[c]!.length > MOST_UNPREDICTABLE * n)
      return `${full[c]!.length} of the ${counted(n, 'row')} cannot be predicted by it without themselves`;
    const natural = fit.candidate.response.scale.kind === 'natural';
    if (!natural && !input.ranks && n * n * fit.columns.length > OWN_SCALE_BUDGET)
      return `it was not worked out: on its response scale it takes a pass over ${n} rows for each row, and does not rank`;
    if (count === 0) return 'no row can be predicted from the others';
    const errors = natural ? naturalErrors(fit, input) : transformedErrors(fit, input);
    const squares = errors.map((error, i) => (out[i] === 1 ? 0 : weights[i]! * error * error));
    const meanSquaredError = sum(squares) / weight;
    if (!Number.isFinite(meanSquaredError))
      return 'its predictions of held-out rows are not all finite on the response’s own scale';
    const variance = ratioVariance(squares, used);
    return {
      rows: count,
      meanSquaredError,
      standardError: Number.isNaN(variance) ? null : Math.sqrt(variance),
      meanError: sum(errors.map((error, i) => (out[i] === 1 ? 0 : weights[i]! * error))) / weight,
    };
  });
  return {
    figures: results.map((one) => (typeof one === 'string' ? null : one)),
    whyNot: results.map((one) => (typeof one === 'string' ? one : null)),
    meanResponse: sum(own.map((y, i) => y * used[i]!)) / weight,
    rowsLeftOut: n - count,
    losses:
      candidatesOfRow.size === 0
        ? []
        : [
            {
              column: null,
              folds: [...candidatesOfRow.keys()].sort((a, b) => a - b).map(folds.nameOf),
              rows: candidatesOfRow.size,
              candidates: [...new Set([...candidatesOfRow.values()].flat())].sort((a, b) => a - b),
            },
          ],
  };
}

function fullRows(fit: Fit, { rows }: ValidationInput): number[] {
  const found: number[] = [];
  visitRows(fit, rows, (from, count, _residuals, leverages) => {
    for (let i = 0; i < count; i++) if (leverages[i]! > FULL_LEVERAGE) found.push(from + i);
  });
  return found;
}

/** y − ŷ₍ᵢ₎ of each row, unweighted; NaN at leverage 1. */
function naturalErrors(fit: Fit, { rows }: ValidationInput): Float64Array {
  const errors = new Float64Array(rows.rowCount);
  visitRows(fit, rows, (from, count, residuals, leverages) => {
    for (let i = 0; i < count; i++) {
      const left = 1 - leverages[i]!;
      const root = rows.rootWeights === null ? 1 : rows.rootWeights[from + i]!;
      errors[from + i] = leverages[i]! > FULL_LEVERAGE ? Number.NaN : residuals[i]! / (left * root);
    }
  });
  return errors;
}

/** y − ŷ₍ᵢ₎ of each row on the own scale, ŷ₍ᵢ₎ the mean there. */
function transformedErrors(fit: Fit, { rows, own }: ValidationInput): Float64Array {
  const n = rows.rowCount;
  const p = fit.columns.length;
  const onFitted = naturalErrors(fit, { rows } as ValidationInput);
  const observed = rows.responses[fit.candidate.responseColumn]!;
  const { scale } = fit.candidate.response;
  const all = Int32Array.from({ length: n }, (_, i) => i);
  const block = new Float64Array(p);
  const x = new Float64Array(p);
  return Float64Array.from(own, (y, row) => {
    const error = onFitted[row]!;
    if (Number.isNaN(error)) return Number.NaN;
    const root = rows.rootWeights === null ? 1 : rows.rootWeights[row]!;
    rows.fill(fit.columns, row, row + 1, 1, block, null);
    for (let j = 0; j < p; j++) x[j] = block[j]! / rows.scales[fit.columns[j]!]! / root;
    const estimates = fit.estimates.map((b, j) => {
      let step = 0;
      for (let k = 0; k < p; k++) step += fit.inverse[k * p + j]! * x[k]!;
      return b - step * root * root * error;
    });
    const z = linearPredictor(
      rows,
      { columns: fit.columns, estimates, responseColumn: fit.candidate.responseColumn, scale },
      all,
    );
    const residuals = new Float64Array(n - 1);
    for (let i = 0, k = 0; i < n; i++) if (i !== row) residuals[k++] = observed[i]! - z[i]!;
    return y - smearing(residuals, scale)(observed[row]! - error);
  });
}

import type { Fit } from '../engine/fit.ts';
import { type DesignRows, designRows } from '../model/design-rows.ts';
import type { Chosen } from './chosen.ts';
import { inTimeOrder } from './time-rows.ts';

/** The orthonormal design of the chosen model, rows in time order where there is one. */
export function orthonormalRows({ columns, sample, study, fit }: Chosen): Float64Array {
  const rows = designRows(
    fit.columns.map((column) => columns[column]!),
    sample,
    [],
    study.weights,
  );
  const own = { ...fit, columns: fit.columns.map((_, j) => j) };
  return orthonormalDesign(own, inTimeOrder(rows, sample.timeOrder));
}

/**
 * Q of √w X = QR for a fit, n × p, column-major, rows as in `rows`. What rounding leaves of R⁻¹ is taken out by one pass of
 * modified Gram–Schmidt, so that the columns are orthonormal to the last digits. Held whole: for modest n only.
 * @param rows of the union's columns that `fit.columns` are indexes into
 */
export function orthonormalDesign(fit: Fit, rows: DesignRows): Float64Array {
  const n = rows.rowCount;
  const p = fit.columns.length;
  const x = new Float64Array(n * p);
  rows.fill(fit.columns, 0, n, n, x, null);
  const q = new Float64Array(n * p);
  for (let j = 0; j < p; j++) {
    for (let k = 0; k <= j; k++) {
      const r = fit.rootInverse[j * p + k]! / rows.scales[fit.columns[k]!]!;
      for (let i = 0; i < n; i++) q[j * n + i]! += r * x[k * n + i]!;
    }
    for (let k = 0; k < j; k++) {
      let dot = 0;
      for (let i = 0; i < n; i++) dot += q[k * n + i]! * q[j * n + i]!;
      for (let i = 0; i < n; i++) q[j * n + i]! -= dot * q[k * n + i]!;
    }
    let squares = 0;
    for (let i = j * n; i < (j + 1) * n; i++) squares += q[i]! * q[i]!;
    const length = Math.sqrt(squares);
    for (let i = j * n; i < (j + 1) * n; i++) q[i]! /= length;
  }
  return q;
}

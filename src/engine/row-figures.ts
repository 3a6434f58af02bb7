import type { DesignRows } from '../model/design-rows.ts';
import type { Fit } from './fit.ts';

const BLOCK = 256;

/** Called with figures of consecutive rows; the arrays are reused from block to block. */
export type RowVisitor = (
  from: number,
  count: number,
  weightedResiduals: Float64Array,
  leverages: Float64Array,
) => void;

/**
 * One pass over the rows of a fit: √w (y − Xb) on the fitted scale, and the leverage h = ‖x′R⁻¹‖² of the
 * weighted row, which lies in [0, 1]. Rows by block in order.
 */
export function visitRows(fit: Fit, rows: DesignRows, visit: RowVisitor): void {
  const p = fit.columns.length;
  const { scales } = rows;
  const responseAt = rows.predictorCount + fit.candidate.responseColumn;
  const order = [...fit.columns, responseAt];
  const block = new Float64Array(BLOCK * (p + 1));
  const residuals = new Float64Array(BLOCK);
  const leverages = new Float64Array(BLOCK);
  const projected = new Float64Array(BLOCK);
  const estimates = fit.estimates.map((estimate, j) => estimate / scales[fit.columns[j]!]!);
  const root = fit.rootInverse.map((value, k) => value / scales[fit.columns[k % p]!]!);
  const responseScale = scales[responseAt]!;
  const y = p * BLOCK;
  for (let from = 0; from < rows.rowCount; from += BLOCK) {
    const count = Math.min(BLOCK, rows.rowCount - from);
    rows.fill(order, from, from + count, BLOCK, block, null);
    for (let i = 0; i < count; i++) residuals[i] = block[y + i]! / responseScale;
    for (let j = 0; j < p; j++) {
      const b = estimates[j]!;
      const at = j * BLOCK;
      for (let i = 0; i < count; i++) residuals[i]! -= b * block[at + i]!;
    }
    leverages.fill(0);
    for (let j = 0; j < p; j++) {
      project(root, p, j, block, count, projected);
      for (let i = 0; i < count; i++) leverages[i]! += projected[i]! * projected[i]!;
    }
    for (let i = 0; i < count; i++) if (leverages[i]! > 1) leverages[i] = 1;
    visit(from, count, residuals, leverages);
  }
}

/** projected = Σ_k root[k, j] · column k, k ≤ j, four columns at a time to spare the memory. */
function project(
  root: Float64Array,
  p: number,
  j: number,
  block: Float64Array,
  count: number,
  projected: Float64Array,
): void {
  projected.fill(0);
  let k = 0;
  for (; k + 3 <= j; k += 4) {
    const r0 = root[j * p + k]!;
    const r1 = root[j * p + k + 1]!;
    const r2 = root[j * p + k + 2]!;
    const r3 = root[j * p + k + 3]!;
    const at = k * BLOCK;
    for (let i = at; i < at + count; i++) {
      projected[i - at]! +=
        r0 * block[i]! + r1 * block[i + BLOCK]! + (r2 * block[i + 2 * BLOCK]! + r3 * block[i + 3 * BLOCK]!);
    }
  }
  for (; k <= j; k++) {
    const r = root[j * p + k]!;
    const at = k * BLOCK;
    for (let i = at; i < at + count; i++) projected[i - at]! += r * block[i]!;
  }
}

/** A leverage this near 1 leaves no residual of its own: the row is fitted by itself alone. */
export const FULL_LEVERAGE = 1 - 1e-10;

/**
 * PRESS = Σ (e_i/(1 − h_i))² with weighted residuals (Allen 1974); null where a leverage is 1, since the row
 * cannot then be predicted from the others.
 */
export function press(fit: Fit, rows: DesignRows): number | null {
  let sum = 0;
  let full = false;
  visitRows(fit, rows, (_from, count, residuals, leverages) => {
    for (let i = 0; i < count; i++) {
      if (leverages[i]! > FULL_LEVERAGE) full = true;
      else sum += (residuals[i]! / (1 - leverages[i]!)) ** 2;
    }
  });
  return full ? null : sum;
}

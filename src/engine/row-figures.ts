import type { DesignRows } from '../model/design-rows.ts';
import type { Fit } from './fit.ts';
import { visitProjected } from './projected-rows.ts';

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
  visitProjected(fit, rows, null, ({ rows: positions, count, residuals, leverages }) =>
    visit(positions[0]!, count, residuals, leverages),
  );
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

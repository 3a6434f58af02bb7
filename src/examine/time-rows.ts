import { rowsAt } from '../engine/rows-at.ts';
import type { DesignRows } from '../model/design-rows.ts';

/** The rows in time order; as they are where no time is declared or the file is in order already. */
export function inTimeOrder(rows: DesignRows, order: Int32Array | null): DesignRows {
  return order === null || order.every((row, t) => row === t) ? rows : rowsAt(rows, order, null);
}

import type { DesignRows } from '../model/design-rows.ts';

/** Elements up to which rows that are read a great many times are formed once and kept: 64 MB. */
export const DENSE_BUDGET = 8e6;

/** The same rows, formed once, for work that reads them over and over; the rows themselves where they are too many. */
export function denseRows(rows: DesignRows): DesignRows {
  const { rowCount: n, width: m } = rows;
  if (n * m > DENSE_BUDGET) return rows;
  const values = new Float64Array(n * m);
  rows.fill(
    Array.from({ length: m }, (_, j) => j),
    0,
    n,
    n,
    values,
    null,
  );
  return {
    ...rows,
    fill(columns, from, to, stride, hi, lo) {
      if (lo !== null) {
        rows.fill(columns, from, to, stride, hi, lo);
        return;
      }
      for (let c = 0; c < columns.length; c++) {
        const source = columns[c]! * n;
        const target = c * stride - from;
        for (let i = from; i < to; i++) hi[target + i] = values[source + i]!;
      }
    },
  };
}

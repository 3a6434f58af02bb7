import type { DesignRows } from '../model/design-rows.ts';

/** Rows of the whole that are read at once. */
const CHUNK = 512;
/** Rows between two wanted ones are read along where there are no more than this. */
const GAP = 8;

/**
 * Some rows of a design, as a design: row i is row index[i] of the whole, times multipliers[i] where multipliers are
 * given (√count of a row that was drawn several times). Cheapest where the indexes ascend.
 * @param index positions in the whole, in any order
 */
export function rowsAt(rows: DesignRows, index: Int32Array, multipliers: Float64Array | null): DesignRows {
  const scratch = new Float64Array(CHUNK * rows.width);
  let low: Float64Array | null = null;
  const pick = (values: Float64Array) => Float64Array.from(index, (row) => values[row]!);
  const roots = rows.rootWeights === null ? null : pick(rows.rootWeights);
  if (roots !== null && multipliers !== null)
    for (let i = 0; i < roots.length; i++) roots[i]! *= multipliers[i]!;
  return {
    rowCount: index.length,
    width: rows.width,
    predictorCount: rows.predictorCount,
    scales: rows.scales,
    rootWeights: roots ?? multipliers,
    responses: rows.responses.map(pick),
    fill(columns, from, to, stride, hi, lo) {
      if (lo !== null) low ??= new Float64Array(CHUNK * rows.width);
      for (let at = from; at < to; ) {
        const first = index[at]!;
        let end = at + 1;
        while (
          end < to &&
          index[end]! >= index[end - 1]! &&
          index[end]! - index[end - 1]! <= GAP &&
          index[end]! - first < CHUNK
        )
          end++;
        rows.fill(columns, first, index[end - 1]! + 1, CHUNK, scratch, lo === null ? null : low);
        for (let c = 0; c < columns.length; c++) {
          const source = c * CHUNK - first;
          const target = c * stride - from;
          for (let i = at; i < end; i++) hi[target + i] = scratch[source + index[i]!]!;
          if (lo !== null) for (let i = at; i < end; i++) lo[target + i] = low![source + index[i]!]!;
        }
        at = end;
      }
      if (multipliers === null) return;
      for (let c = 0; c < columns.length; c++) {
        const target = c * stride - from;
        for (let i = from; i < to; i++) hi[target + i]! *= multipliers[i]!;
        if (lo !== null) for (let i = from; i < to; i++) lo[target + i]! *= multipliers[i]!;
      }
    },
  };
}

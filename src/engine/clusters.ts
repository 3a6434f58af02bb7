import type { Column } from '../data/table.ts';

/** Which cluster each row is in. */
export interface Clusters {
  /** G. */
  readonly count: number;
  /** 0 … G − 1 per row, by order of first appearance. Length n. */
  readonly codes: Int32Array;
  /** Positions of the rows cluster by cluster, or null where the rows lie so already. */
  readonly order: Int32Array | null;
}

/** Clusters by the values of a column without missing values. */
export function clustersOf(column: Column): Clusters {
  const values = column.kind === 'category' ? column.codes : column.values;
  const n = values.length;
  const codes = new Int32Array(n);
  const known = new Map<string | number | null, number>();
  let together = true;
  for (let i = 0; i < n; i++) {
    const value = values[i]!;
    let code = known.get(value);
    if (code === undefined) {
      code = known.size;
      known.set(value, code);
    } else if (code !== codes[i - 1]) together = false;
    codes[i] = code;
  }
  return { count: known.size, codes, order: together ? null : sortedByCode(codes, known.size) };
}

/** Positions by code, those of one code in their own order (counting sort). */
function sortedByCode(codes: Int32Array, count: number): Int32Array {
  const starts = new Int32Array(count + 1);
  for (let i = 0; i < codes.length; i++) starts[codes[i]! + 1]!++;
  for (let g = 0; g < count; g++) starts[g + 1]! += starts[g]!;
  const order = new Int32Array(codes.length);
  for (let i = 0; i < codes.length; i++) order[starts[codes[i]!]!++] = i;
  return order;
}

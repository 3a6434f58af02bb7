import type { Piece } from '../../model/design.ts';
import { designRows } from '../../model/design-rows.ts';
import type { Sample } from '../../prepare/sample.ts';

const BLOCK = 1024;

/**
 * Means of products of pieces over the rows used, unweighted, in one pass; an empty product is 1. Products that are
 * asked for twice are formed once.
 */
export function productMeans(products: readonly (readonly Piece[])[], sample: Sample): number[] {
  const keys = products.map((pieces) => JSON.stringify(pieces));
  const distinct = [...new Map(products.map((pieces, k) => [keys[k]!, pieces]))].filter(
    ([, pieces]) => pieces.length > 0,
  );
  const rows = designRows(
    distinct.map(([name, pieces]) => ({ name, pieces, unit: null })),
    sample,
    [],
    null,
  );
  const n = sample.rowCount;
  const all = distinct.map((_, j) => j);
  const block = new Float64Array(BLOCK * distinct.length);
  const sums = new Float64Array(distinct.length);
  for (let from = 0; from < n; from += BLOCK) {
    const count = Math.min(BLOCK, n - from);
    rows.fill(all, from, from + count, BLOCK, block, null);
    for (let j = 0; j < distinct.length; j++) {
      let sum = 0;
      for (let i = j * BLOCK; i < j * BLOCK + count; i++) sum += block[i]!;
      sums[j]! += sum;
    }
  }
  const means = new Map(distinct.map(([name], j) => [name, sums[j]! / n / rows.scales[j]!]));
  return keys.map((key) => means.get(key) ?? 1);
}

import { quantileSorted } from 'd3-array';

/**
 * The size that two thirds of the values do not exceed, signs apart; null for no values. About one standard
 * deviation of normal values (0.97 of it), and a single wild value does not move it.
 */
export function twoThirds(values: readonly number[]): number | null {
  if (values.length === 0) return null;
  return quantileOf(values.map(Math.abs), 2 / 3);
}

/** The quantile of numbers in any order; NaN for none. */
export function quantileOf(values: readonly number[], share: number): number {
  // A typed array sorts by itself, several times quicker than by a comparison of ours.
  const sorted: ArrayLike<number> = Float64Array.from(values).sort();
  return quantileSorted(sorted as number[], share) ?? Number.NaN;
}

/** Product-moment correlation; null where either side does not vary or there are fewer than three pairs. */
export function correlation(a: readonly number[], b: readonly number[]): number | null {
  const n = a.length;
  if (n < 3) return null;
  const ma = a.reduce((s, v) => s + v, 0) / n;
  const mb = b.reduce((s, v) => s + v, 0) / n;
  let ab = 0;
  let aa = 0;
  let bb = 0;
  for (let i = 0; i < n; i++) {
    ab += (a[i]! - ma) * (b[i]! - mb);
    aa += (a[i]! - ma) ** 2;
    bb += (b[i]! - mb) ** 2;
  }
  return aa > 0 && bb > 0 ? ab / Math.sqrt(aa * bb) : null;
}

/** Ranks from 1, ties sharing their mean rank; their correlation is the rank correlation (Spearman 1904). */
export function ranks(values: readonly number[]): number[] {
  const order = values.map((_, i) => i).sort((i, j) => values[i]! - values[j]!);
  const result = new Array<number>(values.length).fill(0);
  for (let start = 0; start < order.length; ) {
    let end = start;
    while (end < order.length && values[order[end]!] === values[order[start]!]) end++;
    for (let k = start; k < end; k++) result[order[k]!] = (start + end + 1) / 2;
    start = end;
  }
  return result;
}

/** Share of the variation of `values` between the groups named by `texts`; null where nothing varies. */
export function shareBetween(values: readonly number[], texts: readonly string[]): number | null {
  const mean = values.reduce((s, v) => s + v, 0) / values.length;
  const total = values.reduce((s, v) => s + (v - mean) ** 2, 0);
  if (!(total > 0)) return null;
  const groups = new Map<string, number[]>();
  for (const [i, text] of texts.entries()) push(groups, text, values[i]!);
  let between = 0;
  for (const group of groups.values()) {
    between += group.length * (group.reduce((s, v) => s + v, 0) / group.length - mean) ** 2;
  }
  return between / total;
}

/** Rows in order of x, cut into bins of about equal count; each with its middle and how far two thirds of y reach. */
export function spreadAlong(
  x: readonly number[],
  y: readonly number[],
  bins: number,
): { middle: number; spread: number }[] {
  const order = x
    .map((_, i) => i)
    .filter((i) => Number.isFinite(x[i]!))
    .sort((i, j) => x[i]! - x[j]!);
  const result: { middle: number; spread: number }[] = [];
  for (let b = 0; b < bins; b++) {
    const rows = order.slice(
      Math.floor((b * order.length) / bins),
      Math.floor(((b + 1) * order.length) / bins),
    );
    if (rows.length < 3) continue;
    result.push({
      middle: quantileSorted(
        rows.map((i) => x[i]!),
        0.5,
      ) as number,
      spread: twoThirds(rows.map((i) => y[i]!)) as number,
    });
  }
  return result;
}

function push(groups: Map<string, number[]>, key: string, value: number): void {
  const known = groups.get(key);
  if (known === undefined) groups.set(key, [value]);
  else known.push(value);
}

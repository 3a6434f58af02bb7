import type { DesignRows } from '../model/design-rows.ts';
import { addPair, multiplyPair, pair, SPLITTER } from '../stats/double-double.ts';
import type { Fit } from './fit.ts';
import { logLikelihood, type RowFacts } from './fit-candidate.ts';

const BLOCK = 512;
const MOST_STEPS = 8;

/**
 * Iterative refinement of a fit that came from a factor in double arithmetic (Björck 1967, with the
 * correction solved through R): each step is one pass over the rows that forms the residuals y − Xb and
 * their products with the columns in double-double, b itself carried as a pair. The error falls by about
 * condition × 1e-16 a step; it stops when the correction is below the last bit of every coefficient.
 *
 * Estimates and RSS are refined; the covariance keeps the factor's digits (about 16 less the digits of the
 * condition number).
 */
export function refineFit(fit: Fit, rows: DesignRows, facts: RowFacts): Fit {
  if (fit.arithmetic === 'extended') return fit;
  const p = fit.columns.length;
  const { scales } = rows;
  const responseAt = rows.predictorCount + fit.candidate.responseColumn;
  const responseScale = scales[responseAt]!;
  // Estimates in the rows' scaled units, as pairs.
  const high = Float64Array.from(
    fit.columns,
    (column, j) => (fit.estimates[j]! * responseScale) / scales[column]!,
  );
  const low = new Float64Array(p);
  const root = fit.rootInverse.map((value, k) => value / scales[fit.columns[k % p]!]!);

  let rss = 0;
  const sum = pair();
  let before = Number.POSITIVE_INFINITY;
  for (let step = 0; step < MOST_STEPS; step++) {
    const { gradient, squares } = residualPass(rows, fit.columns, responseAt, high, low);
    const corrections = solveThroughRoot(root, p, gradient);
    let largest = 0;
    let gain = 0;
    for (let i = 0; i < p; i++) {
      gain += corrections[i]! * gradient[i]!;
      largest = Math.max(largest, Math.abs(corrections[i]! / high[i]!));
    }
    // At b + correction the sum of squares is smaller by correction′ gradient.
    rss = Math.max(0, squares - gain);
    if (!Number.isFinite(largest) || largest >= before) break;
    for (let i = 0; i < p; i++) {
      addPair(high[i]!, low[i]!, corrections[i]!, 0, sum);
      high[i] = sum[0]!;
      low[i] = sum[1]!;
    }
    // The next correction would be smaller by the same rate as this one fell short of the whole estimate.
    const rate = Math.min(1, fit.conditionNumber * 2 ** -50);
    if (largest * rate < 2 ** -54) break;
    before = largest;
  }
  const residualSumOfSquares = rss / (responseScale * responseScale);
  return {
    ...fit,
    estimates: Float64Array.from(fit.columns, (column, j) => (high[j]! * scales[column]!) / responseScale),
    residualSumOfSquares,
    logLikelihood: fit.exact
      ? null
      : logLikelihood(fit.rowCount, residualSumOfSquares, facts, fit.candidate.responseColumn),
    arithmetic: 'refined',
  };
}

/** R⁻¹ (R⁻ᵀ g): through the root and not its square, which would lose twice the digits. */
function solveThroughRoot(root: Float64Array, p: number, g: Float64Array): Float64Array {
  const half = new Float64Array(p);
  for (let j = 0; j < p; j++) for (let i = 0; i <= j; i++) half[j]! += root[j * p + i]! * g[i]!;
  const whole = new Float64Array(p);
  for (let j = 0; j < p; j++) for (let i = 0; i <= j; i++) whole[i]! += root[j * p + i]! * half[j]!;
  return whole;
}

/** X′(y − Xb) and ‖y − Xb‖², all sums in double-double, in one pass. */
function residualPass(
  rows: DesignRows,
  columns: readonly number[],
  responseAt: number,
  bh: Float64Array,
  bl: Float64Array,
): { gradient: Float64Array; squares: number } {
  const p = columns.length;
  const order = [...columns, responseAt];
  const hi = new Float64Array(BLOCK * (p + 1));
  const lo = new Float64Array(BLOCK * (p + 1));
  const head = new Float64Array(BLOCK);
  const tail = new Float64Array(BLOCK);
  const sums = new Float64Array(p);
  const rests = new Float64Array(p);
  const squares = pair();
  const square = pair();
  const y = p * BLOCK;
  for (let from = 0; from < rows.rowCount; from += BLOCK) {
    const count = Math.min(BLOCK, rows.rowCount - from);
    rows.fill(order, from, from + count, BLOCK, hi, lo);
    for (let j = 0; j < p; j++) subtractMultiple(hi, lo, j * BLOCK, y, count, bh[j]!, bl[j]!);
    for (let i = 0; i < count; i++) {
      const r = hi[y + i]!;
      const c = SPLITTER * r;
      head[i] = c - (c - r);
      tail[i] = r - head[i]!;
    }
    for (let j = 0; j < p; j++) dotInto(hi, lo, j * BLOCK, y, count, head, tail, sums, rests, j);
    for (let i = y; i < y + count; i++) {
      multiplyPair(hi[i]!, lo[i]!, hi[i]!, lo[i]!, square);
      addPair(squares[0]!, squares[1]!, square[0]!, square[1]!, squares);
    }
  }
  return { gradient: sums.map((value, j) => value + rests[j]!), squares: squares[0]! };
}

/** y −= (bh + bl) · x over a block, as pairs. */
function subtractMultiple(
  hi: Float64Array,
  lo: Float64Array,
  x: number,
  y: number,
  count: number,
  bh: number,
  bl: number,
): void {
  const c = SPLITTER * bh;
  const bhh = c - (c - bh);
  const bhl = bh - bhh;
  for (let i = 0; i < count; i++) {
    const a = hi[x + i]!;
    const p = a * bh;
    const d = SPLITTER * a;
    const ah = d - (d - a);
    const al = a - ah;
    const error = al * bhl - (p - ah * bhh - al * bhh - ah * bhl) + (a * bl + lo[x + i]! * bh);
    const v = hi[y + i]!;
    const s = v - p;
    const part = s - v;
    const rest = v - (s - part) - (p + part) - error + lo[y + i]!;
    const sum = s + rest;
    hi[y + i] = sum;
    lo[y + i] = rest - (sum - s);
  }
}

/**
 * sums[j] + rests[j] += Σ x · r over a block, in twice the working precision. `head` and `tail` are the halves of
 * r, split once for all columns; two running sums keep the processor's pipeline full.
 */
function dotInto(
  hi: Float64Array,
  lo: Float64Array,
  x: number,
  r: number,
  count: number,
  head: Float64Array,
  tail: Float64Array,
  sums: Float64Array,
  rests: Float64Array,
  j: number,
): void {
  let sum = 0;
  let rest = 0;
  let sum2 = 0;
  let rest2 = 0;
  const even = count & ~1;
  for (let i = 0; i < even; i += 2) {
    const a = hi[x + i]!;
    const b = hi[r + i]!;
    const p = a * b;
    const c = SPLITTER * a;
    const ah = c - (c - a);
    const al = a - ah;
    const bh = head[i]!;
    const bl = tail[i]!;
    const s = sum + p;
    const part = s - sum;
    rest +=
      sum -
      (s - part) +
      (p - part) +
      (al * bl - (p - ah * bh - al * bh - ah * bl)) +
      (a * lo[r + i]! + lo[x + i]! * b);
    sum = s;

    const a2 = hi[x + i + 1]!;
    const b2 = hi[r + i + 1]!;
    const p2 = a2 * b2;
    const c2 = SPLITTER * a2;
    const ah2 = c2 - (c2 - a2);
    const al2 = a2 - ah2;
    const bh2 = head[i + 1]!;
    const bl2 = tail[i + 1]!;
    const s2 = sum2 + p2;
    const part2 = s2 - sum2;
    rest2 +=
      sum2 -
      (s2 - part2) +
      (p2 - part2) +
      (al2 * bl2 - (p2 - ah2 * bh2 - al2 * bh2 - ah2 * bl2)) +
      (a2 * lo[r + i + 1]! + lo[x + i + 1]! * b2);
    sum2 = s2;
  }
  if (even < count) {
    multiplyPair(hi[x + even]!, lo[x + even]!, hi[r + even]!, lo[r + even]!, carried);
    addPair(sum, rest, carried[0]!, carried[1]!, carried);
    sum = carried[0]!;
    rest = carried[1]!;
  }
  addPair(sum, rest, sum2, rest2, carried);
  addPair(sums[j]!, rests[j]!, carried[0]!, carried[1]!, carried);
  sums[j] = carried[0]!;
  rests[j] = carried[1]!;
}

const carried = pair();

import type { DesignRows } from '../model/design-rows.ts';
import { eliminate, type Matrix, matrix } from './kernel.ts';

/**
 * The factor of a block of rows: the upper triangle R of the QR decomposition of [X | Y], which holds all
 * that least squares needs to know of those rows. R′R = [X | Y]′[X | Y].
 */
export interface Factor {
  /** m = P + q, the columns of [X | Y]. */
  readonly width: number;
  /** P. */
  readonly predictorCount: number;
  /** Rows that went in. */
  readonly rowCount: number;
  /** R, m × m, upper triangular, stride m; in double-double where the factor is extended. */
  readonly triangle: Matrix;
  /** Powers of two by which the columns were multiplied (see `DesignRows`). */
  readonly scales: Float64Array;
}

/** Rows in a block: with some twenty columns it stays in the second-level cache. */
const BLOCK = 512;

/** Multiplications (n · m²) up to which the factor is worked out in double-double: a tenth of a second or so. */
export const EXTENDED_BUDGET = 6e6;

/** The factor of rows from…to−1, streamed block by block in double arithmetic. */
export function factorRows(
  rows: DesignRows,
  from = 0,
  to = rows.rowCount,
  onProgress?: (done: number) => void,
): Factor {
  const m = rows.width;
  const triangle = matrix(m, m, false);
  const block = new Float64Array(BLOCK * m);
  const all = Array.from({ length: m }, (_, j) => j);
  for (let start = from; start < to; start += BLOCK) {
    const stop = Math.min(to, start + BLOCK);
    rows.fill(all, start, stop, BLOCK, block, null);
    absorb(triangle.hi, m, block, BLOCK, stop - start);
    if (onProgress !== undefined && ((start / BLOCK) & 127) === 127) onProgress(stop - from);
  }
  return {
    width: m,
    predictorCount: rows.predictorCount,
    rowCount: to - from,
    triangle,
    scales: rows.scales,
  };
}

/**
 * The factor of all rows in double-double: about 31 digits. Holds the whole block, so for small work only.
 * @param earlier an extended factor of other rows of the same design and scales, to which these are added; null for none
 */
export function factorExtended(rows: DesignRows, earlier: Factor | null = null): Factor {
  const m = rows.width;
  const n = rows.rowCount;
  const top = earlier === null ? 0 : m;
  const height = Math.max(top + n, m);
  const work = matrix(height, m, true);
  const all = Array.from({ length: m }, (_, j) => j);
  for (let j = 0; j < top; j++) {
    const { hi, lo } = earlier!.triangle;
    work.hi.set(hi.subarray(j * m, j * m + j + 1), j * height);
    work.lo!.set(lo!.subarray(j * m, j * m + j + 1), j * height);
  }
  rows.fill(all, 0, n, height, work.hi.subarray(top), work.lo!.subarray(top));
  for (let j = 0; j < m; j++) eliminate(work, j, j, height, m);
  const triangle = matrix(m, m, true);
  for (let j = 0; j < m; j++) {
    for (let i = 0; i <= j; i++) {
      triangle.hi[j * m + i] = work.hi[j * height + i]!;
      triangle.lo![j * m + i] = work.lo![j * height + i]!;
    }
  }
  return {
    width: m,
    predictorCount: rows.predictorCount,
    rowCount: n + (earlier?.rowCount ?? 0),
    triangle,
    scales: rows.scales,
  };
}

/**
 * The factor of two blocks together from their factors: stack and triangularise again (sequential QR
 * updating, Golub & Van Loan, 6.5; tall-and-skinny QR, Demmel, Grigori, Hoemmen & Langou 2012).
 * Both must be of the same design and scales. Double arithmetic.
 */
export function mergeFactors(a: Factor, b: Factor): Factor {
  const m = a.width;
  const triangle: Matrix = { hi: a.triangle.hi.slice(), lo: null, stride: m };
  absorb(triangle.hi, m, b.triangle.hi.slice(), m, m);
  return { ...a, rowCount: a.rowCount + b.rowCount, triangle };
}

/**
 * The listed columns of R side by side, `height` rows each, to be triangularised again.
 * @param extended in the factor's own arithmetic, or (false) rounded to doubles
 */
export function columnsOf(
  factor: Factor,
  columns: readonly number[],
  height: number,
  extended = factor.triangle.lo !== null,
): Matrix {
  const source = factor.triangle;
  const work = matrix(height, columns.length, extended);
  for (let j = 0; j < columns.length; j++) {
    const from = columns[j]! * source.stride;
    const top = Math.min(columns[j]! + 1, height);
    for (let i = 0; i < top; i++) work.hi[j * height + i] = source.hi[from + i]!;
    if (work.lo !== null) for (let i = 0; i < top; i++) work.lo[j * height + i] = source.lo![from + i]!;
  }
  return work;
}

/** Squares of a column below this are nothing beside its scaled magnitude. */
const NOTHING = 1e-290;

/**
 * Takes a block of rows into R by Householder reflections of [R; B], two reflections at a time over four
 * columns at a time, which spares most of the traffic to memory. B is destroyed. The diagonal of R comes out ≥ 0.
 *
 * @param r m × m upper triangle, column-major
 * @param b rows × m block, column-major with the given stride
 */
export function absorb(r: Float64Array, m: number, b: Float64Array, stride: number, rows: number): void {
  for (let j = 0; j < m; j += 2) {
    const first = j * stride;
    let sigma = 0;
    for (let i = first; i < first + rows; i++) sigma += b[i]! * b[i]!;
    let head = 0;
    let factor = 0;
    if (sigma > NOTHING) {
      const alpha = r[j * m + j]!;
      const norm = Math.sqrt(alpha * alpha + sigma);
      head = alpha <= 0 ? alpha - norm : -sigma / (alpha + norm);
      factor = 2 / (sigma + head * head);
      r[j * m + j] = norm;
    } else b.fill(0, first, first + rows);
    if (j + 1 === m) return;

    const second = first + stride;
    const across = (j + 1) * m + j;
    let dot = head * r[across]!;
    for (let i = 0; i < rows; i++) dot += b[first + i]! * b[second + i]!;
    dot *= factor;
    r[across]! -= dot * head;
    let sigma2 = 0;
    let cross = 0;
    for (let i = 0; i < rows; i++) {
      const v = b[first + i]!;
      const w = b[second + i]! - dot * v;
      b[second + i] = w;
      sigma2 += w * w;
      cross += w * v;
    }
    let head2 = 0;
    let factor2 = 0;
    if (sigma2 > NOTHING) {
      const alpha = r[across + 1]!;
      const norm = Math.sqrt(alpha * alpha + sigma2);
      head2 = alpha <= 0 ? alpha - norm : -sigma2 / (alpha + norm);
      factor2 = 2 / (sigma2 + head2 * head2);
      r[across + 1] = norm;
    } else {
      b.fill(0, second, second + rows);
      cross = 0;
    }

    let k = j + 2;
    for (; k + 3 < m; k += 4) {
      const p = k * stride;
      const q = p + stride;
      const t = q + stride;
      const u = t + stride;
      let p1 = 0;
      let p2 = 0;
      let q1 = 0;
      let q2 = 0;
      let t1 = 0;
      let t2 = 0;
      let u1 = 0;
      let u2 = 0;
      for (let i = 0; i < rows; i++) {
        const v = b[first + i]!;
        const w = b[second + i]!;
        const bp = b[p + i]!;
        const bq = b[q + i]!;
        const bt = b[t + i]!;
        const bu = b[u + i]!;
        p1 += v * bp;
        p2 += w * bp;
        q1 += v * bq;
        q2 += w * bq;
        t1 += v * bt;
        t2 += w * bt;
        u1 += v * bu;
        u2 += w * bu;
      }
      const rp = k * m + j;
      const rq = rp + m;
      const rt = rq + m;
      const ru = rt + m;
      p1 = (p1 + head * r[rp]!) * factor;
      q1 = (q1 + head * r[rq]!) * factor;
      t1 = (t1 + head * r[rt]!) * factor;
      u1 = (u1 + head * r[ru]!) * factor;
      r[rp]! -= p1 * head;
      r[rq]! -= q1 * head;
      r[rt]! -= t1 * head;
      r[ru]! -= u1 * head;
      p2 = (p2 - p1 * cross + head2 * r[rp + 1]!) * factor2;
      q2 = (q2 - q1 * cross + head2 * r[rq + 1]!) * factor2;
      t2 = (t2 - t1 * cross + head2 * r[rt + 1]!) * factor2;
      u2 = (u2 - u1 * cross + head2 * r[ru + 1]!) * factor2;
      r[rp + 1]! -= p2 * head2;
      r[rq + 1]! -= q2 * head2;
      r[rt + 1]! -= t2 * head2;
      r[ru + 1]! -= u2 * head2;
      for (let i = 0; i < rows; i++) {
        const v = b[first + i]!;
        const w = b[second + i]!;
        b[p + i] = b[p + i]! - p1 * v - p2 * w;
        b[q + i] = b[q + i]! - q1 * v - q2 * w;
        b[t + i] = b[t + i]! - t1 * v - t2 * w;
        b[u + i] = b[u + i]! - u1 * v - u2 * w;
      }
    }
    for (; k < m; k++) {
      const p = k * stride;
      let p1 = 0;
      let p2 = 0;
      for (let i = 0; i < rows; i++) {
        p1 += b[first + i]! * b[p + i]!;
        p2 += b[second + i]! * b[p + i]!;
      }
      const rp = k * m + j;
      p1 = (p1 + head * r[rp]!) * factor;
      r[rp]! -= p1 * head;
      p2 = (p2 - p1 * cross + head2 * r[rp + 1]!) * factor2;
      r[rp + 1]! -= p2 * head2;
      for (let i = 0; i < rows; i++) b[p + i] = b[p + i]! - p1 * b[first + i]! - p2 * b[second + i]!;
    }
  }
}

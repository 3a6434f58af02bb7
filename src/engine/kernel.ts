import { addPair, dividePair, multiplyPair, pair, SPLITTER, squareRootPair } from '../stats/double-double.ts';

/** A column-major matrix: element (i, j) is hi[j · stride + i] + lo[j · stride + i]; lo is null in double arithmetic. */
export interface Matrix {
  readonly hi: Float64Array;
  readonly lo: Float64Array | null;
  readonly stride: number;
}

/** A zero matrix; with `extended`, in double-double. */
export function matrix(rows: number, columns: number, extended: boolean): Matrix {
  const size = rows * columns;
  return { hi: new Float64Array(size), lo: extended ? new Float64Array(size) : null, stride: rows };
}

/** ‖ column[from…to) ‖, rounded to a double. */
export function columnNorm(m: Matrix, column: number, from: number, to: number): number {
  const at = column * m.stride;
  let sum = 0;
  for (let i = at + from; i < at + to; i++) sum += m.hi[i]! * m.hi[i]!;
  return Math.sqrt(sum);
}

/**
 * One Householder step: the reflection that turns `column` into zero below `row`, down to `end` (exclusive),
 * applied to every column after it. Golub & Van Loan, Matrix Computations, 5.1; the sign is chosen so that
 * nothing cancels. The matrix's own arithmetic is used throughout.
 */
export function eliminate(m: Matrix, column: number, row: number, end: number, columns: number): void {
  if (m.lo === null) eliminatePlain(m.hi, m.stride, column, row, end, columns);
  else eliminateExtended(m.hi, m.lo, m.stride, column, row, end, columns);
}

function eliminatePlain(
  a: Float64Array,
  stride: number,
  column: number,
  row: number,
  end: number,
  columns: number,
): void {
  const base = column * stride;
  const pivot = base + row;
  const last = base + end;
  let below = 0;
  for (let i = pivot + 1; i < last; i++) below += a[i]! * a[i]!;
  if (below === 0) return;
  const alpha = a[pivot]!;
  const norm = Math.sqrt(alpha * alpha + below);
  const head = alpha > 0 ? alpha + norm : alpha - norm;
  const factor = 2 / (head * head + below);
  a[pivot] = alpha > 0 ? -norm : norm;
  for (let k = column + 1; k < columns; k++) {
    const shift = (k - column) * stride;
    let dot = head * a[pivot + shift]!;
    for (let i = pivot + 1; i < last; i++) dot += a[i]! * a[i + shift]!;
    dot *= factor;
    a[pivot + shift]! -= dot * head;
    for (let i = pivot + 1; i < last; i++) a[i + shift]! -= dot * a[i]!;
  }
  a.fill(0, pivot + 1, last);
}

const t = pair();
const u = pair();

function eliminateExtended(
  hi: Float64Array,
  lo: Float64Array,
  stride: number,
  column: number,
  row: number,
  end: number,
  columns: number,
): void {
  const base = column * stride;
  const pivot = base + row;
  const last = base + end;
  dotExtended(hi, lo, pivot + 1, pivot + 1, end - row - 1, t);
  const belowHi = t[0]!;
  const belowLo = t[1]!;
  if (belowHi === 0) return;
  multiplyPair(hi[pivot]!, lo[pivot]!, hi[pivot]!, lo[pivot]!, t);
  addPair(t[0]!, t[1]!, belowHi, belowLo, t);
  squareRootPair(t[0]!, t[1]!, t);
  const sign = hi[pivot]! > 0 ? 1 : -1;
  const normHi = sign * t[0]!;
  const normLo = sign * t[1]!;
  addPair(hi[pivot]!, lo[pivot]!, normHi, normLo, t);
  const headHi = t[0]!;
  const headLo = t[1]!;
  multiplyPair(headHi, headLo, headHi, headLo, t);
  addPair(t[0]!, t[1]!, belowHi, belowLo, t);
  dividePair(2, 0, t[0]!, t[1]!, t);
  const factorHi = t[0]!;
  const factorLo = t[1]!;
  hi[pivot] = -normHi;
  lo[pivot] = -normLo;
  for (let k = column + 1; k < columns; k++) {
    const shift = (k - column) * stride;
    dotExtended(hi, lo, pivot + 1, pivot + 1 + shift, end - row - 1, t);
    multiplyPair(headHi, headLo, hi[pivot + shift]!, lo[pivot + shift]!, u);
    addPair(t[0]!, t[1]!, u[0]!, u[1]!, t);
    multiplyPair(t[0]!, t[1]!, factorHi, factorLo, t);
    const dotHi = -t[0]!;
    const dotLo = -t[1]!;
    multiplyPair(dotHi, dotLo, headHi, headLo, u);
    addPair(hi[pivot + shift]!, lo[pivot + shift]!, u[0]!, u[1]!, t);
    hi[pivot + shift] = t[0]!;
    lo[pivot + shift] = t[1]!;
    addMultipleExtended(hi, lo, pivot + 1, pivot + 1 + shift, end - row - 1, dotHi, dotLo);
  }
  hi.fill(0, pivot + 1, last);
  lo.fill(0, pivot + 1, last);
}

/** Dot product of two stretches in twice the working precision (Ogita, Rump & Oishi 2005), low parts included. */
export function dotExtended(
  hi: Float64Array,
  lo: Float64Array,
  a: number,
  b: number,
  count: number,
  out: Float64Array,
): void {
  let sum = 0;
  let rest = 0;
  for (let i = 0; i < count; i++) {
    const x = hi[a + i]!;
    const y = hi[b + i]!;
    const p = x * y;
    let c = SPLITTER * x;
    const xh = c - (c - x);
    const xl = x - xh;
    c = SPLITTER * y;
    const yh = c - (c - y);
    const yl = y - yh;
    const error = xl * yl - (p - xh * yh - xl * yh - xh * yl);
    const s = sum + p;
    const part = s - sum;
    rest += sum - (s - part) + (p - part) + error + (x * lo[b + i]! + lo[a + i]! * y);
    sum = s;
  }
  const s = sum + rest;
  out[0] = s;
  out[1] = rest - (s - sum);
}

/** target += (fh + fl) · source over a stretch, in double-double. */
function addMultipleExtended(
  hi: Float64Array,
  lo: Float64Array,
  source: number,
  target: number,
  count: number,
  fh: number,
  fl: number,
): void {
  const cf = SPLITTER * fh;
  const fhh = cf - (cf - fh);
  const fhl = fh - fhh;
  for (let i = 0; i < count; i++) {
    const x = hi[source + i]!;
    const p = fh * x;
    const c = SPLITTER * x;
    const xh = c - (c - x);
    const xl = x - xh;
    const error = fhl * xl - (p - fhh * xh - fhl * xh - fhh * xl) + (fh * lo[source + i]! + fl * x);
    const y = hi[target + i]!;
    const s = y + p;
    const part = s - y;
    const rest = y - (s - part) + (p - part) + error + lo[target + i]!;
    const sum = s + rest;
    hi[target + i] = sum;
    lo[target + i] = rest - (sum - s);
  }
}

/**
 * Solves R z = v in place by back substitution, R the leading p × p upper triangle of `m`; the right-hand side
 * is column `column` of `rhs`.
 */
export function backSubstitute(m: Matrix, columns: readonly number[], rhs: Matrix, column: number): void {
  const at = column * rhs.stride;
  for (let i = columns.length - 1; i >= 0; i--) {
    const diagonal = columns[i]! * m.stride + i;
    if (m.lo === null || rhs.lo === null) {
      let value = rhs.hi[at + i]!;
      for (let k = i + 1; k < columns.length; k++)
        value -= m.hi[columns[k]! * m.stride + i]! * rhs.hi[at + k]!;
      rhs.hi[at + i] = value / m.hi[diagonal]!;
      continue;
    }
    let high = rhs.hi[at + i]!;
    let low = rhs.lo[at + i]!;
    for (let k = i + 1; k < columns.length; k++) {
      const j = columns[k]! * m.stride + i;
      multiplyPair(m.hi[j]!, m.lo[j]!, rhs.hi[at + k]!, rhs.lo[at + k]!, t);
      addPair(high, low, -t[0]!, -t[1]!, t);
      high = t[0]!;
      low = t[1]!;
    }
    dividePair(high, low, m.hi[diagonal]!, m.lo[diagonal]!, t);
    rhs.hi[at + i] = t[0]!;
    rhs.lo[at + i] = t[1]!;
  }
}

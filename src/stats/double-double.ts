/**
 * Double-double arithmetic: a number is an unevaluated sum hi + lo of two doubles with |lo| ≤ ½ ulp(hi),
 * good to about 31 digits. Error-free sum: Knuth, The Art of Computer Programming vol. 2, 4.2.2;
 * error-free product by splitting: Dekker, Numerische Mathematik 18 (1971).
 *
 * The functions return the pair in a two-element scratch they are given, so that loops allocate nothing.
 * Inputs are finite and below 2^970 in size, else the splitting overflows.
 */
export type Pair = Float64Array;

/** 2²⁷ + 1: multiplying by it and subtracting splits a double into two halves. */
export const SPLITTER = 134217729;

export function pair(hi = 0, lo = 0): Pair {
  return Float64Array.of(hi, lo);
}

/** out = a + b, exactly. */
export function twoSum(a: number, b: number, out: Pair): void {
  const s = a + b;
  const part = s - a;
  out[0] = s;
  out[1] = a - (s - part) + (b - part);
}

/** out = a · b, exactly (barring underflow). */
export function twoProduct(a: number, b: number, out: Pair): void {
  const p = a * b;
  let c = SPLITTER * a;
  const ah = c - (c - a);
  const al = a - ah;
  c = SPLITTER * b;
  const bh = c - (c - b);
  const bl = b - bh;
  out[0] = p;
  out[1] = al * bl - (p - ah * bh - al * bh - ah * bl);
}

/** out = (ah + al) + (bh + bl). */
export function addPair(ah: number, al: number, bh: number, bl: number, out: Pair): void {
  const s = ah + bh;
  const part = s - ah;
  const error = ah - (s - part) + (bh - part) + al + bl;
  const hi = s + error;
  out[0] = hi;
  out[1] = error - (hi - s);
}

/** out = (ah + al) · (bh + bl). */
export function multiplyPair(ah: number, al: number, bh: number, bl: number, out: Pair): void {
  twoProduct(ah, bh, out);
  const p = out[0]!;
  const error = out[1]! + (ah * bl + al * bh);
  const hi = p + error;
  out[0] = hi;
  out[1] = error - (hi - p);
}

/** out = (ah + al) / (bh + bl); b is not zero. */
export function dividePair(ah: number, al: number, bh: number, bl: number, out: Pair): void {
  const q1 = ah / bh;
  multiplyPair(q1, 0, bh, bl, out);
  addPair(ah, al, -out[0]!, -out[1]!, out);
  const q2 = out[0]! / bh;
  const rh = out[0]!;
  const rl = out[1]!;
  multiplyPair(q2, 0, bh, bl, out);
  addPair(rh, rl, -out[0]!, -out[1]!, out);
  const q3 = out[0]! / bh;
  twoSum(q1, q2, out);
  addPair(out[0]!, out[1]!, q3, 0, out);
}

/** out = √(ah + al), a ≥ 0: one Newton step from the double root (Karp & Markstein 1997). */
export function squareRootPair(ah: number, al: number, out: Pair): void {
  if (ah <= 0) {
    out[0] = 0;
    out[1] = 0;
    return;
  }
  const root = Math.sqrt(ah);
  twoProduct(root, root, out);
  addPair(ah, al, -out[0]!, -out[1]!, out);
  twoSum(root, out[0]! / (2 * root), out);
}

/**
 * The arithmetic of expressions over blocks of rows. Within a calculation NaN stands for a missing value and
 * +Infinity for an undefined one (the logarithm of zero, a division by zero, an overflow); finite inputs never
 * give either without meaning it. Missing goes before undefined. Flags are 0 and 1. `n` is the number of rows;
 * `out` may be the same array as any input.
 */
export type Block = Float64Array;

const MISSING = Number.NaN;
const UNDEFINED = Number.POSITIVE_INFINITY;

/** The result of an operation that has none: missing if an operand is, else undefined. */
function noValue(x: number, y: number): number {
  return Number.isNaN(x) || Number.isNaN(y) ? MISSING : UNDEFINED;
}

export function add(out: Block, a: Block, b: Block, n: number): void {
  for (let i = 0; i < n; i++) {
    const result = a[i]! + b[i]!;
    out[i] = Number.isFinite(result) ? result : noValue(a[i]!, b[i]!);
  }
}

export function subtract(out: Block, a: Block, b: Block, n: number): void {
  for (let i = 0; i < n; i++) {
    const result = a[i]! - b[i]!;
    out[i] = Number.isFinite(result) ? result : noValue(a[i]!, b[i]!);
  }
}

export function multiply(out: Block, a: Block, b: Block, n: number): void {
  for (let i = 0; i < n; i++) {
    const result = a[i]! * b[i]!;
    out[i] = Number.isFinite(result) ? result : noValue(a[i]!, b[i]!);
  }
}

export function divide(out: Block, a: Block, b: Block, n: number): void {
  for (let i = 0; i < n; i++) {
    const result = a[i]! / b[i]!;
    // A finite number over an undefined one would come out as 0.
    out[i] = Number.isFinite(result) && Number.isFinite(b[i]!) ? result : noValue(a[i]!, b[i]!);
  }
}

/** Any function of two numbers, for finite operands. */
export function combine(
  out: Block,
  a: Block,
  b: Block,
  n: number,
  of: (x: number, y: number) => number,
): void {
  for (let i = 0; i < n; i++) {
    const x = a[i]!;
    const y = b[i]!;
    const result = Number.isFinite(x) && Number.isFinite(y) ? of(x, y) : Number.NaN;
    out[i] = Number.isFinite(result) ? result : noValue(x, y);
  }
}

/** Any function of one number, for finite operands. */
export function map(out: Block, a: Block, n: number, of: (x: number) => number): void {
  for (let i = 0; i < n; i++) {
    const x = a[i]!;
    const result = Number.isFinite(x) ? of(x) : x;
    out[i] = Number.isFinite(result) ? result : noValue(x, 0);
  }
}

/** Three-valued: false and anything is false. */
export function both(out: Block, a: Block, b: Block, n: number): void {
  for (let i = 0; i < n; i++) {
    const x = a[i]!;
    const y = b[i]!;
    out[i] = x === 0 || y === 0 ? 0 : Number.isFinite(x) && Number.isFinite(y) ? 1 : noValue(x, y);
  }
}

/** Three-valued: true or anything is true. */
export function either(out: Block, a: Block, b: Block, n: number): void {
  for (let i = 0; i < n; i++) {
    const x = a[i]!;
    const y = b[i]!;
    out[i] = x === 1 || y === 1 ? 1 : Number.isFinite(x) && Number.isFinite(y) ? 0 : noValue(x, y);
  }
}

/** `a` where the condition holds, `b` where it does not; what the other branch gives there is of no account. */
export function choose(out: Block, condition: Block, a: Block, b: Block, n: number): void {
  for (let i = 0; i < n; i++) {
    const holds = condition[i]!;
    out[i] = Number.isFinite(holds) ? (holds !== 0 ? a[i]! : b[i]!) : noValue(holds, 0);
  }
}

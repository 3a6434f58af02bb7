import fc from 'fast-check';

export const NAMES = ['a', 'b', 'c', 'd'];

export interface AnyProblem {
  readonly columns: Readonly<Record<string, readonly number[]>>;
  readonly y: readonly number[];
}

/** Four predictors and a response over 8 to 30 rows, well enough conditioned for comparisons to many digits. */
export function anyProblem(): fc.Arbitrary<AnyProblem> {
  return fc
    .tuple(fc.integer({ min: 8, max: 30 }), fc.integer({ min: 1, max: 2 ** 31 - 2 }))
    .map(([rows, seed]) => {
      const next = uniform(seed);
      const draw = () => Array.from({ length: rows }, () => 2 * next() - 1);
      const [a, b, c, d] = [draw(), draw(), draw(), draw()];
      // Some collinearity, and a response that depends on some of them.
      const mixed = d.map((value, i) => value + 0.8 * a[i]!);
      const y = draw().map((value, i) => 3 + value + 1.5 * a[i]! - 0.5 * b[i]!);
      return { columns: { a, b, c, d: mixed }, y };
    });
}

/** Numbers in [0, 1) by a multiplicative congruence (Park, Miller & Stockmeyer 1993). */
export function uniform(seed: number): () => number {
  let state = seed % 2147483647;
  return () => {
    state = (state * 48271) % 2147483647;
    return (state - 1) / 2147483646;
  };
}

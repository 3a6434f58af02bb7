import { describe, expect, test } from 'vitest';
import { fUpper, tTwoSidedQuantile } from '../../src/stats/distributions.ts';
import { fUpperQuantile } from '../../src/stats/f-quantile.ts';

describe('the quantile of F', () => {
  test('published points at 5 %: 3.49 on 2 and 20, 4.35 on 1 and 20, 2.71 on 5 and 20 (common tables, from memory)', () => {
    expect(fUpperQuantile(0.05, 2, 20)).toBeCloseTo(3.4928, 4);
    expect(fUpperQuantile(0.05, 1, 20)).toBeCloseTo(4.3512, 4);
    expect(fUpperQuantile(0.05, 5, 20)).toBeCloseTo(2.7109, 4);
  });

  test('gives its tail back', () => {
    for (const [d1, d2] of [
      [1, 1],
      [2, 7],
      [7, 9],
      [40, 3],
      [3, 100000],
    ] as const) {
      for (const p of [0.99, 0.5, 0.05, 1e-3, 1e-12])
        expect(fUpper(fUpperQuantile(p, d1, d2), d1, d2) / p).toBeCloseTo(1, 10);
    }
  });

  test('on one degree of freedom it is t squared', () => {
    expect(fUpperQuantile(0.05, 1, 13)).toBeCloseTo(tTwoSidedQuantile(0.05, 13) ** 2, 10);
  });

  test('out of the domain', () => {
    for (const [p, d1, d2] of [
      [0, 1, 1],
      [1, 1, 1],
      [Number.NaN, 1, 1],
      [0.5, 0, 1],
      [0.5, 1, -1],
    ] as const)
      expect(fUpperQuantile(p, d1, d2)).toBeNaN();
  });
});

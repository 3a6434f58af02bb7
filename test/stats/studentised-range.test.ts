import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { tTwoSided } from '../../src/stats/distributions.ts';
import { studentisedRange } from '../../src/stats/studentised-range.ts';

/** From scipy's studentised range, good to about 1e-12 absolutely: test/reference/inference/make.py. */
const figures: {
  upper: { q: number; k: number; df: number; p: number }[];
  quantile: { p: number; k: number; df: number; q: number }[];
} = JSON.parse(
  readFileSync(new URL('../reference/inference/studentised-range.json', import.meta.url), 'utf8'),
);

describe('the studentised range', () => {
  test('upper tails', () => {
    for (const { q, k, df, p } of figures.upper) {
      expect(Math.abs(studentisedRange(k, df).upper(q) - p), `q ${q}, k ${k}, df ${df}`).toBeLessThan(2e-11);
    }
  });

  test('quantiles', () => {
    for (const { q, k, df, p } of figures.quantile) {
      const found = studentisedRange(k, df).quantile(p);
      expect(Math.abs(found / q - 1), `p ${p}, k ${k}, df ${df}`).toBeLessThan(1e-9);
    }
  });

  test('published points: 3.578 of 3 means on 20, 5.305 of 5 on 6 at 5 % (Harter 1960, from memory)', () => {
    expect(studentisedRange(3, 20).quantile(0.05)).toBeCloseTo(3.578, 3);
    expect(studentisedRange(5, 6).quantile(0.05)).toBeCloseTo(5.305, 3);
  });

  test('two means: the t of their difference', () => {
    for (const q of [0.1, 1, 3, 9, 40])
      expect(studentisedRange(2, 11).upper(q)).toBeCloseTo(tTwoSided(q / Math.SQRT2, 11), 14);
  });

  test('far tails keep their digits, between the largest pair and the sum over pairs', () => {
    for (const [k, df] of [
      [3, 40],
      [6, 300],
      [15, 1000],
    ] as const) {
      for (const q of [10, 15, 25]) {
        const one = tTwoSided(q / Math.SQRT2, df);
        const tail = studentisedRange(k, df).upper(q);
        expect(tail).toBeGreaterThan(one);
        expect(tail).toBeLessThanOrEqual(((k * (k - 1)) / 2) * one * (1 + 1e-9));
      }
    }
  });

  test('a quantile gives its tail back, and tails fall', () => {
    for (const [k, df] of [
      [3, 1],
      [4, 2.5],
      [8, 17],
      [30, 5000],
    ] as const) {
      const range = studentisedRange(k, df);
      for (const p of [0.9, 0.5, 0.05, 1e-4, 1e-9])
        expect(range.upper(range.quantile(p)) / p).toBeCloseTo(1, 9);
      let before = 1;
      for (let q = 0.2; q < 20; q += 0.3) {
        const tail = range.upper(q);
        expect(tail).toBeLessThanOrEqual(before);
        before = tail;
      }
    }
  });

  test('the ends', () => {
    const range = studentisedRange(4, 10);
    expect(range.upper(0)).toBe(1);
    expect(range.upper(-3)).toBe(1);
    expect(range.upper(Number.NaN)).toBeNaN();
    expect(range.upper(1e-12)).toBeCloseTo(1, 12);
    expect(range.quantile(0)).toBeNaN();
    expect(range.quantile(1)).toBeNaN();
  });
});

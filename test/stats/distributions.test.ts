import { readFileSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  chiSquaredUpper,
  fUpper,
  normalQuantile,
  normalUpper,
  tTwoSided,
  tTwoSidedQuantile,
} from '../../src/stats/distributions.ts';

/** Made in 60-digit arithmetic: test/reference/distributions/. The result, as text, comes last. */
const TAILS = JSON.parse(
  readFileSync(new URL('../reference/distributions/tails.json', import.meta.url), 'utf8'),
) as Readonly<Record<string, readonly (readonly (number | string)[])[]>>;

/** Largest relative error over the cases that `keep` picks. */
function worst(
  name: string,
  of: (...given: number[]) => number,
  keep: (...given: number[]) => boolean,
): number {
  let largest = 0;
  let cases = 0;
  for (const row of TAILS[name]!) {
    const given = row.slice(0, -1) as number[];
    if (!keep(...given)) continue;
    const expected = Number(row.at(-1));
    const found = of(...given);
    cases++;
    const error = expected === 0 ? Math.abs(found) : Math.abs(found / expected - 1);
    largest = Math.max(largest, Number.isNaN(error) ? Number.POSITIVE_INFINITY : error);
  }
  expect(cases).toBeGreaterThan(4);
  return largest;
}

describe('against 60-digit arithmetic, down to 1e-300', () => {
  test('F', () => {
    expect(worst('f_upper', fUpper, (_f, _d1, d2) => d2 <= 200)).toBeLessThan(1e-12);
    expect(worst('f_upper', fUpper, (_f, _d1, d2) => d2 <= 100000)).toBeLessThan(1e-10);
    // At a million degrees of freedom the library's logarithms of factorials leave nine digits.
    expect(worst('f_upper', fUpper, (_f, _d1, d2) => d2 > 100000)).toBeLessThan(2e-9);
  });

  test('t, two-sided', () => {
    expect(worst('t_two_sided', tTwoSided, (_t, df) => df <= 400)).toBeLessThan(1e-12);
    expect(worst('t_two_sided', tTwoSided, (_t, df) => df === 10000)).toBeLessThan(1e-11);
    expect(worst('t_two_sided', tTwoSided, (_t, df) => df > 10000)).toBeLessThan(2e-9);
  });

  test('χ²', () => {
    expect(worst('chi_squared_upper', chiSquaredUpper, () => true)).toBeLessThan(2e-13);
  });

  test('normal', () => {
    expect(worst('normal_upper', normalUpper, () => true)).toBeLessThan(1e-13);
    expect(worst('normal_quantile', normalQuantile, () => true)).toBeLessThan(1e-15);
  });

  test('quantiles of t', () => {
    expect(worst('t_two_sided_quantile', tTwoSidedQuantile, (_p, df) => df <= 201)).toBeLessThan(1e-13);
    expect(worst('t_two_sided_quantile', tTwoSidedQuantile, (_p, df) => df === 1000)).toBeLessThan(1e-12);
    expect(worst('t_two_sided_quantile', tTwoSidedQuantile, (_p, df) => df > 1000)).toBeLessThan(1e-10);
  });

  test('the far tails are among the cases', () => {
    const smallest = (name: string) => Math.min(...TAILS[name]!.map((row) => Number(row.at(-1))));
    for (const name of ['f_upper', 't_two_sided', 'chi_squared_upper', 'normal_upper']) {
      expect(smallest(name)).toBeLessThan(1e-295);
      expect(smallest(name)).toBeGreaterThan(0);
    }
  });
});

describe('critical values of the NIST/SEMATECH e-Handbook of Statistical Methods (1.3.6.7, 4.6.1.5)', () => {
  test.each([
    [0.9, 1.372],
    [0.95, 1.812],
    [0.975, 2.228],
    [0.99, 2.764],
    [0.995, 3.169],
  ])('t on 10 degrees of freedom at %d: %d', (below, critical) => {
    expect(tTwoSidedQuantile(2 * (1 - below), 10)).toBeCloseTo(critical, 3);
  });

  test('t at 0.975 on 20 and 30 degrees of freedom', () => {
    expect(tTwoSidedQuantile(0.05, 20)).toBeCloseTo(2.086, 3);
    expect(tTwoSidedQuantile(0.05, 30)).toBeCloseTo(2.042, 3);
  });

  test.each([
    [1, 3.84146, 6.6349],
    [2, 5.99146, 9.21034],
    [4, 9.48773, 13.2767],
  ])('χ² on %d degrees of freedom at 0.95 and 0.99', (df, five, one) => {
    expect(chiSquaredUpper(five, df)).toBeCloseTo(0.05, 6);
    expect(chiSquaredUpper(one, df)).toBeCloseTo(0.01, 6);
  });

  test.each([
    [1, 3.285],
    [2, 3.0065],
    [3, 2.9238],
    [4, 2.9605],
    [5, 3.1075],
  ])('F at 0.10 on %d and 11 minus that', (k, critical) => {
    expect(fUpper(critical, k, 11 - k)).toBeCloseTo(0.1, 5);
  });

  test('F at 0.05 on 3 and 2, and on 18 and 20', () => {
    expect(fUpper(19.1643, 3, 2)).toBeCloseTo(0.05, 6);
    // Printed with two decimals.
    expect(fUpper(2.145, 18, 20)).toBeGreaterThan(0.05);
    expect(fUpper(2.155, 18, 20)).toBeLessThan(0.05);
  });
});

describe('closed forms', () => {
  // Common practice, no source: the tail on 2 numerator degrees of freedom, and of t on 1 and 2, are elementary.
  test('F on 2 and d: (1 + 2f/d)^(−d/2)', () => {
    for (const d of [1, 2, 5, 40, 300]) {
      for (const f of [1e-8, 0.3, 1, 7, 200]) {
        expect(fUpper(f, 2, d) / Math.exp((-d / 2) * Math.log1p((2 * f) / d))).toBeCloseTo(1, 11);
      }
    }
  });

  test('t on 1: 1 − 2 atan(t)/π, as 2 atan(1/t)/π', () => {
    for (const t of [1e-3, 1, 30, 1e8, 1e150])
      expect(tTwoSided(t, 1) / ((2 * Math.atan(1 / t)) / Math.PI)).toBeCloseTo(1, 12);
  });

  test('χ² on 2: exp(−x/2)', () => {
    for (const x of [1e-10, 0.1, 1, 50, 1400])
      expect(chiSquaredUpper(x, 2) / Math.exp(-x / 2)).toBeCloseTo(1, 12);
  });
});

describe('properties', () => {
  const df = fc.integer({ min: 1, max: 5000 });
  const size = fc.double({ min: 1e-6, max: 1e4, noNaN: true });

  test('tails fall as the statistic rises, and stay within 0 and 1', () => {
    fc.assert(
      fc.property(size, fc.double({ min: 1e-6, max: 1, noNaN: true }), df, df, (x, more, d1, d2) => {
        for (const tail of [
          (v: number) => fUpper(v, d1, d2),
          (v: number) => chiSquaredUpper(v, d1),
          (v: number) => tTwoSided(v, d1),
        ]) {
          const [here, further] = [tail(x), tail(x * (1 + more))];
          expect(here).toBeGreaterThanOrEqual(0);
          expect(here).toBeLessThanOrEqual(1);
          expect(further).toBeLessThanOrEqual(here * (1 + 1e-10));
        }
      }),
    );
  });

  test('the quantile of t inverts its tail', () => {
    fc.assert(
      fc.property(fc.double({ min: -30, max: -0.01, noNaN: true }), df, (logP, d) => {
        const p = Math.exp(logP);
        expect(tTwoSided(tTwoSidedQuantile(p, d), d) / p).toBeCloseTo(1, 11);
      }),
    );
  });

  test('the quantile of the normal inverts its tail', () => {
    fc.assert(
      fc.property(fc.double({ min: -300, max: -0.7, noNaN: true }), (logP) => {
        const p = Math.exp(logP);
        expect(normalUpper(-normalQuantile(p)) / p).toBeCloseTo(1, 11);
      }),
    );
  });

  test('F turned over: P(F > f) on d1, d2 and P(F > 1/f) on d2, d1 make 1', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.05, max: 20, noNaN: true }), df, df, (f, d1, d2) => {
        expect(fUpper(f, d1, d2) + fUpper(1 / f, d2, d1)).toBeCloseTo(1, 9);
      }),
    );
  });

  test('t with many degrees of freedom is normal, and χ² is F with many in the denominator', () => {
    expect(tTwoSided(2, 1e7) / (2 * normalUpper(2))).toBeCloseTo(1, 5);
    expect(fUpper(2, 3, 1e7) / chiSquaredUpper(6, 3)).toBeCloseTo(1, 5);
  });
});

describe('edges', () => {
  test('statistics too large to be told from infinity have tail 0, not a fault', () => {
    expect(chiSquaredUpper(1600, 3)).toBe(0);
    expect(chiSquaredUpper(Number.POSITIVE_INFINITY, 3)).toBe(0);
    expect(normalUpper(40)).toBe(0);
    expect(normalUpper(-40)).toBe(1);
    expect(normalUpper(Number.POSITIVE_INFINITY)).toBe(0);
    expect(normalUpper(Number.NEGATIVE_INFINITY)).toBe(1);
    expect(fUpper(1e300, 1, 1000)).toBe(0);
    expect(fUpper(Number.POSITIVE_INFINITY, 3, 4)).toBe(0);
    expect(tTwoSided(1e200, 5)).toBe(0);
    expect(tTwoSided(-3, 5)).toBe(tTwoSided(3, 5));
  });

  test('a statistic of 0, or too small to tell from it, has tail 1', () => {
    expect(fUpper(0, 3, 4)).toBe(1);
    expect(fUpper(-1e-18, 3, 4)).toBe(1);
    expect(tTwoSided(0, 4)).toBe(1);
    expect(tTwoSided(1e-200, 4)).toBe(1);
    expect(chiSquaredUpper(0, 4)).toBe(1);
    expect(chiSquaredUpper(1e-300, 4)).toBe(1);
    expect(normalUpper(0)).toBe(0.5);
    expect(normalUpper(1e-200)).toBe(0.5);
  });

  test('outside the domain the answer is NaN', () => {
    for (const bad of [
      fUpper(Number.NaN, 1, 2),
      fUpper(1, 0, 2),
      fUpper(1, 2, -1),
      tTwoSided(1, 0),
      tTwoSided(Number.NaN, 4),
      chiSquaredUpper(1, 0),
      chiSquaredUpper(Number.NaN, 1),
      normalUpper(Number.NaN),
      normalQuantile(Number.NaN),
      normalQuantile(-0.1),
      normalQuantile(1.1),
      tTwoSidedQuantile(0, 4),
      tTwoSidedQuantile(1, 4),
      tTwoSidedQuantile(0.05, 0),
    ]) {
      expect(bad).toBeNaN();
    }
    expect(normalQuantile(0)).toBe(Number.NEGATIVE_INFINITY);
    expect(normalQuantile(1)).toBe(Number.POSITIVE_INFINITY);
  });

  test('quantiles of t at the far end and on part of a degree of freedom', () => {
    // On 1 degree of freedom the tail is 2/(π t) there.
    expect(tTwoSidedQuantile(1e-300, 1) / (2e300 / Math.PI)).toBeCloseTo(1, 10);
    expect(tTwoSided(tTwoSidedQuantile(0.05, 0.5), 0.5)).toBeCloseTo(0.05, 12);
  });
});

/** The exact tails against published bounds, closed forms and each other. */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { exactTails, normalTails } from '../../src/examine/durbin-watson.ts';
import { orthonormalRows } from '../../src/examine/orthonormal-design.ts';
import { secondPass } from '../../src/examine/second-pass.ts';
import { numbers } from '../prepare/columns.ts';
import { uniform } from '../select/any-problem.ts';
import { chosenFrom } from './chosen-from.ts';

/** An orthonormal basis of the columns, by Gram–Schmidt done twice. */
function basis(columns: readonly (readonly number[])[]): Float64Array {
  const n = columns[0]!.length;
  const q = new Float64Array(n * columns.length);
  columns.forEach((column, j) => {
    const v = Float64Array.from(column);
    for (let round = 0; round < 2; round++)
      for (let k = 0; k < j; k++) {
        const u = q.subarray(k * n, (k + 1) * n);
        const dot = v.reduce((sum, value, i) => sum + value * u[i]!, 0);
        v.forEach((value, i) => {
          v[i] = value - dot * u[i]!;
        });
      }
    const length = Math.hypot(...v);
    q.set(
      v.map((value) => value / length),
      j * n,
    );
  });
  return q;
}

/** Columns cos(π (i + ½) j/n): the eigenvectors of the difference matrix, j = 0 the constant. */
const wave = (n: number, j: number) =>
  Array.from({ length: n }, (_, i) => Math.cos((Math.PI * (i + 0.5) * j) / n));

/**
 * The bounds of Durbin & Watson 1951 at 5 %, recomputed from the exact bounding distributions: n, k without the
 * intercept, dL, dU. dL is reached where the columns are the slowest waves and dU where they are the fastest.
 */
const BOUNDS = [
  [6, 1, 0.6102, 1.4001],
  [15, 1, 1.077, 1.3605],
  [15, 2, 0.9455, 1.5432],
  [20, 1, 1.2015, 1.4107],
  [20, 3, 0.9976, 1.6763],
  [50, 2, 1.4625, 1.6283],
  [100, 5, 1.571, 1.7804],
] as const;

describe('Durbin & Watson 1951, bounds at 5 %', () => {
  test.each(BOUNDS)('n %d, %d predictors: dL %d, dU %d', (n, k, low, high) => {
    const constant = wave(n, 0);
    const fastest = basis([constant, ...Array.from({ length: k }, (_, j) => wave(n, n - 1 - j))]);
    const slowest = basis([constant, ...Array.from({ length: k }, (_, j) => wave(n, j + 1))]);
    // Without its fastest waves the statistic is smallest, without its slowest largest.
    expect(exactTails(low, fastest, n, k + 1).lower).toBeCloseTo(0.05, 4);
    expect(exactTails(high, slowest, n, k + 1).lower).toBeCloseTo(0.05, 4);
  });

  test('bracket the p-value for any columns', () => {
    fc.assert(
      fc.property(fc.constantFrom(...BOUNDS), fc.integer({ min: 1, max: 1e9 }), ([n, k, low, high], seed) => {
        const next = uniform(seed);
        const q = basis([
          wave(n, 0),
          ...Array.from({ length: k }, () => Array.from({ length: n }, () => next())),
        ]);
        expect(exactTails(low, q, n, k + 1).lower).toBeLessThan(0.0502);
        expect(exactTails(high, q, n, k + 1).lower).toBeGreaterThan(0.0498);
      }),
      { numRuns: 40 },
    );
  });
});

describe('the tails', () => {
  test('three rows about their mean: the angle between two normal deviates, in closed form', () => {
    // The eigenvalues left are 1 and 3, so P(d ≤ d₀) = P(|tan angle| ≤ √((d₀ − 1)/(3 − d₀))) = 2/π atan of it.
    const q = basis([[1, 1, 1]]);
    for (const d of [1.001, 1.5, 2, 2.7, 2.999]) {
      const exact = (2 / Math.PI) * Math.atan(Math.sqrt((d - 1) / (3 - d)));
      expect(exactTails(d, q, 3, 1).lower).toBeCloseTo(exact, 12);
    }
    expect(exactTails(0.5, q, 3, 1).lower).toBeLessThan(1e-15);
    expect(exactTails(3.5, q, 3, 1).upper).toBeLessThan(1e-15);
  });

  test('add up to 1, rise with the statistic and stay between 0 and 1, at any statistic', () => {
    const q = basis([wave(12, 0), Array.from({ length: 12 }, (_, i) => i * i)]);
    let before = 0;
    for (let d = 0; d <= 4; d += 0.05) {
      const { lower, upper } = exactTails(d, q, 12, 2);
      expect(lower + upper).toBeCloseTo(1, 14);
      expect(lower).toBeGreaterThanOrEqual(before - 1e-14);
      expect(lower >= 0 && upper >= 0).toBe(true);
      before = lower;
    }
    expect(before).toBe(1);
  });

  test('far tails keep their digits: those of the sign-reversed form, 4 − d, are the same', () => {
    // Changing the sign of every other error turns A into 4I − A but for its two corners; without columns both
    // tails differ by those corners only, so the two are of one magnitude far out.
    const n = 300;
    const none = new Float64Array(0);
    const { lower } = exactTails(0.4, none, n, 0);
    const { upper } = exactTails(3.6, none, n, 0);
    expect(lower).toBeLessThan(1e-55);
    expect(lower).toBeGreaterThan(0);
    expect(Math.abs(Math.log10(upper) - Math.log10(lower))).toBeLessThan(2);
  });

  test('are near the normal approximation where there are many rows', () => {
    const n = 1500;
    const next = uniform(11);
    const draw = () => Array.from({ length: n }, () => next() - 0.5);
    const columns = [
      numbers('y', draw()),
      numbers('a', draw()),
      // A trend pulls the mean of the statistic up by what its neighbours share.
      numbers(
        't',
        Array.from({ length: n }, (_, i) => i),
      ),
    ];
    const { chosen } = chosenFrom(columns, { terms: ['a', 't'], time: 't' });
    const q = orthonormalRows(chosen);
    const sums = secondPass(chosen)!.neighbours!;
    for (const d of [1.88, 1.95, 2, 2.06, 2.1]) {
      const exact = exactTails(d, q, n, 3);
      const near = normalTails(d, n, 3, sums);
      expect(Math.abs(near.lower - exact.lower)).toBeLessThan(1e-4);
    }
  });
});

test('the sums over neighbours are the traces that they stand for, also across blocks', () => {
  const n = 20;
  const next = uniform(5);
  const draw = () => Array.from({ length: n }, () => next());
  // Out of time order in the file.
  const t = draw();
  const { chosen } = chosenFrom([numbers('y', draw()), numbers('a', draw()), numbers('t', t)], {
    terms: ['a'],
    time: 't',
  });
  const q = orthonormalRows(chosen);
  const at = (j: number, i: number) => q[j * n + i]!;
  const a = (i: number, k: number) =>
    i === k ? (i === 0 || i === n - 1 ? 1 : 2) : Math.abs(i - k) === 1 ? -1 : 0;
  const applied = (j: number) =>
    Array.from({ length: n }, (_, i) =>
      Array.from({ length: n }, (_, k) => a(i, k) * at(j, k)).reduce((x, y) => x + y),
    );
  const small = [0, 1].map((j) => [0, 1].map((k) => applied(k).reduce((sum, v, i) => sum + v * at(j, i), 0)));
  const sums = secondPass(chosen)!.neighbours!;
  expect(sums.first).toBeCloseTo(small[0]![0]! + small[1]![1]!, 12);
  expect(sums.second).toBeCloseTo(
    [0, 1].reduce((sum, j) => sum + applied(j).reduce((x, v) => x + v * v, 0), 0),
    12,
  );
  expect(sums.squared).toBeCloseTo(
    small.flat().reduce((sum, v) => sum + v * v, 0),
    12,
  );
});

/**
 * How often each test rejects where its null hypothesis holds: 5 % ± 1 % at 5 %. The numbers of repetitions make 1 %
 * about three standard errors, and the seed is fixed, so that the outcome is the same in every run. Tests with an exact
 * null distribution are tried in few rows; those whose distribution is that of very many rows in as many as it takes. The columns stay the same from sample to sample.
 */
import { beforeAll, describe, expect, test } from 'vitest';
import type { Chosen } from '../../src/examine/chosen.ts';
import { DIAGNOSTICS } from '../../src/examine/examine.ts';
import { orthonormalRows } from '../../src/examine/orthonormal-design.ts';
import { secondPass } from '../../src/examine/second-pass.ts';
import { normalQuantile } from '../../src/stats/distributions.ts';
import { randomFrom } from '../../src/stats/random.ts';
import { numbers } from '../prepare/columns.ts';
import { chosenFrom } from './chosen-from.ts';

const LEVEL = 0.05;
/** √(0.05 · 0.95/4400) = 0.33 %. */
const REPETITIONS = 4400;

/** The share of samples in which each test rejects; `passes` where the tests read more than the residuals. */
function rejections(names: readonly string[], n: number, passes: boolean): Map<string, number> {
  const random = randomFrom(1951);
  const time = Array.from({ length: n }, (_, i) => i);
  // The same in every repetition, with rows that repeat.
  const a = time.map((i) => i % 7);
  const b = time.map((i) => Math.floor(i / 7) % 3);
  const mean = a.map((value, i) => 10 + value - b[i]!);
  const first = mean.map((value, i) => value + Math.sin(9 * i));
  const { chosen } = chosenFrom([numbers('y', first), numbers('a', a), numbers('b', b), numbers('t', time)], {
    terms: ['a', 'b'],
    time: 't',
    examination: { lags: 2, splitAt: { variable: 't', value: n / 2, text: String(n / 2) } },
  });
  const diagnostics = DIAGNOSTICS.filter(({ name }) => names.includes(name));
  const counts = new Map(names.map((name) => [name, 0]));
  const q = orthonormalRows(chosen);
  const once = secondPass(chosen);
  for (let k = 0; k < REPETITIONS; k++) {
    const sample = withErrors(
      chosen,
      q,
      mean,
      Float64Array.from(time, () => normalQuantile(random.next())),
    );
    const second = passes ? secondPass(sample) : once;
    for (const { name, find } of diagnostics) {
      const found = find(sample, second, null);
      if (found?.p_value == null) throw new Error(`${name}: ${found?.verdict}`);
      if (found.p_value < LEVEL) counts.set(name, counts.get(name)! + 1);
    }
  }
  return new Map([...counts].map(([name, count]) => [name, count / REPETITIONS]));
}

/** The chosen model as it would be had the errors been these: e = ε − QQ′ε on the same columns. */
function withErrors(chosen: Chosen, q: Float64Array, mean: readonly number[], errors: Float64Array): Chosen {
  const n = errors.length;
  const residuals = errors.slice();
  for (let j = 0; j < q.length / n; j++) {
    let dot = 0;
    for (let i = 0; i < n; i++) dot += q[j * n + i]! * errors[i]!;
    for (let i = 0; i < n; i++) residuals[i]! -= dot * q[j * n + i]!;
  }
  const residualSumOfSquares = residuals.reduce((sum, e) => sum + e * e, 0);
  const observed = errors.map((error, i) => mean[i]! + error);
  return {
    ...chosen,
    fit: { ...chosen.fit, residualSumOfSquares },
    s: Math.sqrt(residualSumOfSquares / chosen.fit.degreesOfFreedom),
    residuals,
    observed,
    fitted: observed.map((y, i) => y - residuals[i]!),
  };
}

const GROUPS: readonly (readonly [rows: number, names: readonly string[], passes: boolean])[] = [
  [42, ['shape', 'lack_of_fit', 'same_in_both_parts', 'independence', 'outlying_rows', 'normality'], true],
  [168, ['equal_spread', 'uneven_spread', 'serial_correlation'], true],
  [840, ['skewness_and_tails', 'drift'], false],
];

describe.each(GROUPS)(
  'where nothing is wrong, 5 %% of samples of %d rows are rejected at 5 %%',
  (n, names, passes) => {
    let shares = new Map<string, number>();
    beforeAll(() => {
      shares = rejections(names, n, passes);
    }, 120_000);

    test.each(names)('%s', (name) => {
      expect(Math.abs(shares.get(name)! - LEVEL), String(shares.get(name))).toBeLessThan(0.01);
    });
  },
);

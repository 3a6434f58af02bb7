import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Column } from '../../src/data/table.ts';
import { clustersOf } from '../../src/engine/clusters.ts';
import {
  automaticLags,
  type Covariance,
  classicalCovariance,
  coefficientError,
  covarianceMatrix,
  declaredCovariance,
  errorOf,
} from '../../src/engine/covariance.ts';
import { EXTENDED_BUDGET, factorExtended, factorRows } from '../../src/engine/factor.ts';
import type { Fit } from '../../src/engine/fit.ts';
import { fitCandidate } from '../../src/engine/fit-candidate.ts';
import type { StandardErrorsPlan } from '../../src/study/study.ts';
import { type TestModel, testModel, variable } from './models.ts';

interface Case {
  readonly x: readonly number[];
  readonly z: readonly number[];
  readonly y: readonly number[];
}

const value = fc.double({ min: -10, max: 10, noNaN: true }).map((each) => Math.round(each * 100) / 100);
const cases: fc.Arbitrary<Case> = fc.integer({ min: 6, max: 40 }).chain((n) =>
  fc.record({
    x: fc.array(value, { minLength: n, maxLength: n }),
    z: fc.array(value, { minLength: n, maxLength: n }),
    y: fc.array(value, { minLength: n, maxLength: n }),
  }),
);

function fitted(data: Case): { readonly model: TestModel; readonly fit: Fit } {
  const model = testModel({ ...data }, [variable('x'), variable('z')], [[0, 1, 2]]);
  return { model, fit: fitCandidate(factorExtended(model.rows), model.design.candidates[0]!, model.facts) };
}

/** Cases in which three coefficients can be told apart and leave errors. */
function sound({ fit }: { readonly fit: Fit }): boolean {
  return (
    fit.columns.length === 3 && !fit.exact && fit.conditionNumber < 1e4 && fit.residualSumOfSquares > 1e-3
  );
}

const column = (values: readonly number[]): Column => ({
  kind: 'number',
  name: 'g',
  values: Float64Array.from(values),
});

function covariance(
  { model, fit }: ReturnType<typeof fitted>,
  plan: StandardErrorsPlan,
  groups: readonly number[] = [],
  timeOrder: Int32Array | null = null,
): Covariance {
  return declaredCovariance(plan, fit, model.rows, { columns: new Map([['g', column(groups)]]), timeOrder })!;
}

/** Equal but for rounding, which is measured by the classical covariance: the declared one may be nothing. */
function expectSame(a: Covariance, b: Covariance, factor = 1): void {
  const [left, right] = [covarianceMatrix(a), covarianceMatrix(b)];
  const classical = covarianceMatrix({ ...b, root: b.classicalRoot });
  const size = Math.max(...right.map(Math.abs), ...classical.map(Math.abs)) * factor;
  left.forEach((each, k) => {
    expect(Math.abs(each - factor * right[k]!)).toBeLessThanOrEqual(1e-9 * size);
  });
}

describe('covariances of the estimates', () => {
  test('clusters of one row each give HC0 times the factor', () => {
    fc.assert(
      fc.property(cases, (data) => {
        const at = fitted(data);
        fc.pre(sound(at));
        const n = data.y.length;
        const ids = data.y.map((_, i) => i);
        const clustered = covariance(at, { kind: 'clustered', by: 'g' }, ids);
        expectSame(clustered, covariance(at, { kind: 'hc0' }), (n / (n - 1)) * ((n - 1) / (n - 3)));
        expect(clustered.df).toBe(n - 1);
      }),
    );
  });

  test('HAC without lags is HC0, whatever the order', () => {
    fc.assert(
      fc.property(cases, (data) => {
        const at = fitted(data);
        fc.pre(sound(at));
        const backwards = Int32Array.from(data.y, (_, i) => data.y.length - 1 - i);
        expectSame(covariance(at, { kind: 'hac', lags: 0 }, [], backwards), covariance(at, { kind: 'hc0' }));
      }),
    );
  });

  test('HAC is the same forwards and backwards in time', () => {
    fc.assert(
      fc.property(cases, fc.integer({ min: 1, max: 5 }), (data, lags) => {
        const at = fitted(data);
        fc.pre(sound(at));
        const backwards = Int32Array.from(data.y, (_, i) => data.y.length - 1 - i);
        const plan = { kind: 'hac', lags } as const;
        expectSame(covariance(at, plan, [], backwards), covariance(at, plan));
      }),
    );
  });

  test('HAC agrees with the sum over lags', () => {
    fc.assert(
      fc.property(cases, fc.integer({ min: 1, max: 5 }), (data, lags) => {
        const at = fitted(data);
        fc.pre(sound(at));
        const { fit } = at;
        const n = data.y.length;
        const rows = data.y.map((_, i) => [1, data.x[i]!, data.z[i]!]);
        const scores = rows.map((row, i) => {
          const e = data.y[i]! - row.reduce((sum, each, j) => sum + each * fit.estimates[j]!, 0);
          return row.map((each) => each * e);
        });
        const middle = Array.from({ length: 3 }, () => [0, 0, 0]);
        for (let t = 0; t < n; t++) {
          for (let u = 0; u < n; u++) {
            const weight = Math.max(0, 1 - Math.abs(t - u) / (lags + 1));
            for (let j = 0; j < 3; j++)
              for (let k = 0; k < 3; k++) middle[j]![k]! += weight * scores[t]![j]! * scores[u]![k]!;
          }
        }
        const found = covarianceMatrix(covariance(at, { kind: 'hac', lags }));
        const inverse = fit.inverse;
        const size = Math.max(...found.map(Math.abs));
        for (let a = 0; a < 3; a++) {
          for (let b = 0; b < 3; b++) {
            let sum = 0;
            for (let j = 0; j < 3; j++)
              for (let k = 0; k < 3; k++) sum += inverse[3 * j + a]! * middle[j]![k]! * inverse[3 * k + b]!;
            expect(Math.abs(found[3 * b + a]! - sum)).toBeLessThanOrEqual(1e-7 * size);
          }
        }
      }),
    );
  });

  test('the order of the rows does not matter to clusters and to unequal spread', () => {
    fc.assert(
      fc.property(cases, (data) => {
        const at = fitted(data);
        fc.pre(sound(at));
        const groups = data.y.map((_, i) => i % 3);
        const turned = fitted({
          x: [...data.x].reverse(),
          z: [...data.z].reverse(),
          y: [...data.y].reverse(),
        });
        const plan = { kind: 'clustered', by: 'g' } as const;
        expectSame(covariance(turned, plan, [...groups].reverse()), covariance(at, plan, groups));
        expectSame(covariance(turned, { kind: 'hc3' }), covariance(at, { kind: 'hc3' }));
      }),
    );
  });

  test('a column in another unit, and the response', () => {
    fc.assert(
      fc.property(cases, fc.constantFrom('hc0', 'hc2', 'hc3', 'hc4'), (data, kind) => {
        const at = fitted(data);
        fc.pre(sound(at));
        const scaled = fitted({ ...data, x: data.x.map((x) => x * 1024), y: data.y.map((y) => y / 8) });
        const [before, after] = [covariance(at, { kind }), covariance(scaled, { kind })];
        [1 / 8, 1 / 8 / 1024, 1 / 8].forEach((factor, j) => {
          const error = coefficientError(before, j) * factor;
          // Where a row of its own fixes a coefficient, HC0 leaves it no error.
          if (error === 0) expect(coefficientError(after, j)).toBe(0);
          else expect(coefficientError(after, j) / error).toBeCloseTo(1, 8);
        });
      }),
    );
  });

  test('the error of a combination from the matrix', () => {
    fc.assert(
      fc.property(cases, fc.tuple(value, value, value), (data, c) => {
        const at = fitted(data);
        fc.pre(sound(at));
        for (const of of [classicalCovariance(at.fit)!, covariance(at, { kind: 'hc3' })]) {
          const v = covarianceMatrix(of);
          let variance = 0;
          for (let j = 0; j < 3; j++) for (let k = 0; k < 3; k++) variance += c[j]! * v[3 * j + k]! * c[k]!;
          expect(errorOf(of, c)).toBeCloseTo(Math.sqrt(Math.max(0, variance)), 6);
        }
      }),
    );
  });

  test('many rows, streamed in blocks and out of order, agree with few blocks in order', () => {
    const n = 3000;
    const x = Array.from({ length: n }, (_, i) => ((i * 7919) % 1009) / 100);
    const z = Array.from({ length: n }, (_, i) => ((i * 104729) % 997) / 50);
    const y = x.map((each, i) => 2 + each - z[i]! / 3 + (((i * 31337) % 991) / 991 - 0.5) * (1 + each));
    expect(n * 16).toBeLessThan(EXTENDED_BUDGET);
    const model = testModel({ x, z, y }, [variable('x'), variable('z')], [[0, 1, 2]]);
    const fit = fitCandidate(factorRows(model.rows), model.design.candidates[0]!, model.facts);
    // Interleaved clusters, and the same rows sorted by cluster.
    const groups = x.map((_, i) => i % 7);
    const order = x.map((_, i) => i).sort((a, b) => groups[a]! - groups[b]! || a - b);
    const pick = (values: readonly number[]) => order.map((i) => values[i]!);
    const sorted = testModel(
      { x: pick(x), z: pick(z), y: pick(y) },
      [variable('x'), variable('z')],
      [[0, 1, 2]],
    );
    const sortedFit = fitCandidate(factorRows(sorted.rows), sorted.design.candidates[0]!, sorted.facts);
    const plan = { kind: 'clustered', by: 'g' } as const;
    expectSame(
      covariance({ model, fit }, plan, groups),
      covariance({ model: sorted, fit: sortedFit }, plan, pick(groups)),
    );
    const held = covariance({ model, fit }, plan, groups);
    const source = { columns: new Map([['g', column(groups)]]), timeOrder: null };
    expectSame(declaredCovariance(plan, fit, model.rows, source, 0)!, held);
    const ids = x.map((_, i) => (i * 7) % n);
    const each = { columns: new Map([['g', column(ids)]]), timeOrder: null };
    expectSame(
      declaredCovariance(plan, fit, model.rows, each, 0)!,
      covariance({ model, fit }, { kind: 'hc0' }),
      n / (n - 3),
    );
    // Time runs through the interleaved rows in the order of their clusters.
    expectSame(
      covariance({ model, fit }, { kind: 'hac', lags: 11 }, [], Int32Array.from(order)),
      covariance({ model: sorted, fit: sortedFit }, { kind: 'hac', lags: 11 }),
    );
  });

  test('extreme magnitudes', () => {
    const data = { x: [1, 2, 3, 4, 5, 6], z: [1, 0, 2, 0, 1, 3], y: [1, 3, 2, 5, 4, 7] };
    const at = fitted(data);
    const tiny = fitted({ ...data, y: data.y.map((y) => y * 1e-60), x: data.x.map((x) => x * 1e60) });
    for (const kind of ['hc0', 'hc3'] as const) {
      const ratio =
        coefficientError(covariance(tiny, { kind }), 1) /
        coefficientError(covariance(at, { kind }), 1) /
        1e-120;
      expect(ratio).toBeCloseTo(1, 9);
    }
  });

  test('an exact fit, and one without degrees of freedom, have none', () => {
    const x = [1, 2, 3, 4, 5, 6];
    const z = [1, 0, 2, 0, 1, 3];
    const exact = fitted({ x, z, y: x });
    expect(
      declaredCovariance({ kind: 'hc3' }, exact.fit, exact.model.rows, {
        columns: new Map(),
        timeOrder: null,
      }),
    ).toBeNull();
    const full = fitted({ x: x.slice(0, 3), z: z.slice(0, 3), y: [1, 5, 2] });
    expect(classicalCovariance(full.fit)).toBeNull();
  });
});

describe('clusters that leave no sum of residuals', () => {
  test('give no error, not a tiny one', () => {
    // Three kinds of rows for three coefficients: the rows of each are a cluster.
    const z = [0, 0, 0, 1, 1, 1, 1];
    const at = fitted({ x: [0, 0, 0, 0, 0, 1, 1], z, y: [3, 5.3, 4.1, 7, 8.7, 10.2, 11] });
    const found = covariance(at, { kind: 'clustered', by: 'g' }, [0, 0, 0, 1, 1, 2, 2]);
    expect([0, 1, 2].map((j) => coefficientError(found, j))).toEqual([0, 0, 0]);
    expect(errorOf(found, [1, 1, 0])).toBe(0);
  });
});

describe('automatic lags', () => {
  test('the whole part of 4 (n/100)^(2/9)', () => {
    expect([1, 16, 100, 392, 1e4, 1e6].map(automaticLags)).toEqual([1, 2, 4, 5, 11, 30]);
  });
});

describe('clusters', () => {
  test('by order of first appearance; in place where they lie together', () => {
    expect(clustersOf(column([5, 5, 2, 2, 9]))).toEqual({
      count: 3,
      codes: Int32Array.from([0, 0, 1, 1, 2]),
      order: null,
    });
    expect(clustersOf(column([5, 2, 5, 9, 2]))).toEqual({
      count: 3,
      codes: Int32Array.from([0, 1, 0, 2, 1]),
      order: Int32Array.from([0, 2, 1, 4, 3]),
    });
    expect(clustersOf({ kind: 'text', name: 't', values: ['b', 'a', 'b'] }).count).toBe(2);
    const codes = {
      kind: 'category',
      name: 'c',
      levels: ['x', 'y'],
      baseline: 'x',
      codes: Int32Array.from([1, 1]),
    } as const;
    expect(clustersOf(codes)).toMatchObject({ count: 1, order: null });
    expect(clustersOf(column([]))).toMatchObject({ count: 0 });
  });
});

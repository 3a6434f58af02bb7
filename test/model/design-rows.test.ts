import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { CategoryColumn, Column } from '../../src/data/table.ts';
import type { DesignColumn, Piece } from '../../src/model/design.ts';
import { designRows } from '../../src/model/design-rows.ts';
import { columnName } from '../../src/model/names.ts';
import { fromScale, isDecreasing, logJacobian, toScale } from '../../src/model/response-scale.ts';
import type { Scale } from '../../src/study/study.ts';

const number = (name: string, values: number[]): Column => ({
  kind: 'number',
  name,
  values: Float64Array.from(values),
});
const category: CategoryColumn = {
  kind: 'category',
  name: 'vessel',
  levels: ['Skerry', 'Tern'],
  baseline: 'Skerry',
  codes: Int32Array.from([0, 1, 1]),
};

function valuesOf(pieces: Piece[], columns: Column[], weights: string | null = null): number[] {
  const column: DesignColumn = { name: columnName(pieces), pieces, unit: null };
  const rows = designRows(
    [column],
    { rowCount: 3, columns: new Map(columns.map((one) => [one.name, one])) },
    [],
    weights,
  );
  const hi = new Float64Array(3);
  const lo = new Float64Array(3);
  rows.fill([0], 0, 3, 3, hi, lo);
  const plain = new Float64Array(3);
  rows.fill([0], 0, 3, 3, plain, null);
  expect(Array.from(plain)).toEqual(Array.from(hi));
  return Array.from(hi, (value, i) => (value + lo[i]!) / rows.scales[0]!);
}

describe('design columns', () => {
  const x = number('x', [2, -3, 10]);

  test.each<[string, Piece[], number[]]>([
    ['intercept', [], [1, 1, 1]],
    ['x', [{ kind: 'variable', variable: 'x' }], [2, -3, 10]],
    ['x³', [{ kind: 'power', variable: 'x', to: 3 }], [8, -27, 1000]],
    ['vessel Tern', [{ kind: 'level', variable: 'vessel', level: 'Tern' }], [0, 1, 1]],
    ['x above 1', [{ kind: 'bend', variable: 'x', at: 1, side: 'above' }], [1, 0, 9]],
    ['x below 1', [{ kind: 'bend', variable: 'x', at: 1, side: 'below' }], [0, 4, 0]],
    [
      'x × vessel Tern',
      [
        { kind: 'variable', variable: 'x' },
        { kind: 'level', variable: 'vessel', level: 'Tern' },
      ],
      [0, -3, 10],
    ],
  ])('%s', (name, pieces, wanted) => {
    expect(columnName(pieces)).toBe(name);
    expect(valuesOf(pieces, [x, category])).toEqual(wanted);
  });

  test('every row is multiplied by the root of its weight', () => {
    expect(valuesOf([], [x, number('w', [4, 9, 0.25])], 'w')).toEqual([2, 3, 0.5]);
  });

  test('an extreme bound is looked into: only what the rows hold is scaled, and nothing becomes infinite', () => {
    const scaleOf = (pieces: Piece[], values: number[]) =>
      designRows(
        [{ name: '', pieces, unit: null }],
        { rowCount: values.length, columns: new Map([['x', number('x', values)]]) },
        [],
        null,
      ).scales[0]!;
    // 0 where x is far below the knots, however large the square of its size.
    expect(scaleOf([{ kind: 'spline', variable: 'x', knots: [-5, 0, 10], index: 1 }], [3, -2e60])).toBe(1);
    expect(Math.log2(scaleOf([{ kind: 'variable', variable: 'x' }], [3, 1e200]))).toBe(-664);
    const smallest = scaleOf([{ kind: 'power', variable: 'x', to: 3 }], [1.5e-108, 0]);
    expect(smallest).toBeGreaterThan(1e300);
    expect(smallest).toBeLessThan(Number.POSITIVE_INFINITY);
  });

  test('powers and products keep what a double would round away', () => {
    const third = number('x', [1 / 3, 0.1, 7]);
    const column: DesignColumn = { name: '', pieces: [{ kind: 'power', variable: 'x', to: 2 }], unit: null };
    const rows = designRows([column], { rowCount: 3, columns: new Map([['x', third]]) }, [], null);
    const hi = new Float64Array(3);
    const lo = new Float64Array(3);
    rows.fill([0], 0, 3, 3, hi, lo);
    // The exact square of the double 0.1, in whole numbers: (0.1 · 2^55)² / 2^110.
    const numerator = BigInt(0.1 * 2 ** 55) ** 2n;
    const exact = BigInt(hi[1]! * 2 ** 60) * 2n ** 50n + BigInt(Math.round(lo[1]! * 2 ** 110));
    expect(exact).toBe(numerator);
  });

  test('a natural spline is linear beyond its outer knots and smooth at them (Hastie, Tibshirani & Friedman, 5.2.1)', () => {
    const at = (values: number[]) =>
      valuesOf([{ kind: 'spline', variable: 'x', knots: [0, 1, 2, 4], index: 1 }], [number('x', values)]);
    fc.assert(
      fc.property(
        fc.double({ min: 4, max: 100, noNaN: true }),
        fc.double({ min: 0.01, max: 10, noNaN: true }),
        (start, step) => {
          const [a, b, c] = at([start, start + step, start + 2 * step]) as [number, number, number];
          expect(Math.abs(c - 2 * b + a)).toBeLessThan(1e-9 * Math.max(1, Math.abs(c)));
        },
      ),
    );
    expect(at([-5, -1, 0])).toEqual([0, 0, 0]);
    const h = 1e-4;
    const [below, knot, above] = at([1 - h, 1, 1 + h]) as [number, number, number];
    expect(Math.abs((above - knot - (knot - below)) / h)).toBeLessThan(1e-2);
  });
});

describe('response scales', () => {
  const scales: Scale[] = [
    { kind: 'natural' },
    { kind: 'log' },
    { kind: 'sqrt' },
    { kind: 'reciprocal' },
    { kind: 'box_cox', lambda: 0.5 },
    { kind: 'box_cox', lambda: 0 },
    { kind: 'box_cox', lambda: -1.5 },
  ];
  test.each(scales)('%o: there and back, monotone, and J is the log of its slope', (scale) => {
    fc.assert(
      fc.property(fc.double({ min: 0.05, max: 200, noNaN: true }), (y) => {
        expect(fromScale(toScale(y, scale), scale) / y).toBeCloseTo(1, 9);
        const h = y * 1e-5;
        const slope = (toScale(y + h, scale) - toScale(y - h, scale)) / (2 * h);
        expect(slope < 0).toBe(isDecreasing(scale));
        expect(logJacobian(Float64Array.of(y), scale)).toBeCloseTo(Math.log(Math.abs(slope)), 4);
      }),
    );
  });
});

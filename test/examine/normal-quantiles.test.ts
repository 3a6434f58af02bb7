import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { normalQuantiles, sortSpread } from '../../src/examine/normal-quantiles.ts';
import { normalQuantile } from '../../src/stats/distributions.ts';
import { randomFrom } from '../../src/stats/random.ts';
import { numbers } from '../prepare/columns.ts';
import { chosenFrom } from './chosen-from.ts';

function straight(n: number, wild: (i: number) => number = () => 0) {
  const random = randomFrom(7);
  const error = Array.from({ length: n }, () => normalQuantile(random.next() || 0.5));
  const x = error.map((_, i) => ((i * 37) % n) / n);
  const columns = [
    numbers(
      'y',
      error.map((e, i) => 3 + 2 * x[i]! + e + wild(i)),
    ),
    numbers('x', x),
  ];
  return chosenFrom(columns, { terms: ['x'] }).chosen;
}

describe('ordered residuals', () => {
  it('stand ascending beside normal quantiles, with an envelope about them', () => {
    const found = normalQuantiles(straight(80))!;
    expect(found.expected).toHaveLength(80);
    // Blom's place of the least of 80, by hand.
    expect(found.expected[0]).toBeCloseTo(normalQuantile(0.625 / 80.25), 14);
    for (const list of [found.expected, found.residual, found.lower!, found.upper!]) {
      expect(list).toHaveLength(80);
      expect([...list].sort((a, b) => a - b)).toEqual(list);
    }
    expect(found.lower!.every((low, i) => low < found.upper![i]!)).toBe(true);
    expect(found.simulations).toBe(79);
  });
  it('lie inside it where the errors are normal, as often as it says, and a wild one outside', () => {
    const inside = (wild: (i: number) => number): number[] => {
      const { residual, lower, upper } = normalQuantiles(straight(100, wild))!;
      return residual.flatMap((z, i) => (z < lower![i]! || z > upper![i]! ? [i] : []));
    };
    expect(inside(() => 0).length).toBeLessThan(20);
    expect(inside((i) => (i === 11 ? 9 : 0))).toContain(99);
  });
  it('have an envelope whose middle is the normal quantile, and whose width is that of an order statistic', () => {
    const { expected, lower, upper } = normalQuantiles(straight(400))!;
    const middle = expected.findIndex((q) => q > 0);
    expect((lower![middle]! + upper![middle]!) / 2).toBeCloseTo(expected[middle]!, 1);
    // In large samples the median less the mean has a variance of (π/2 − 1)/n.
    expect(upper![middle]! - lower![middle]!).toBeCloseTo(2 * 1.96 * Math.sqrt((Math.PI / 2 - 1) / 400), 1);
  });
  it('thin their middle and keep their ends', () => {
    const { residual, expected } = normalQuantiles(straight(1000))!;
    expect(residual.length).toBeLessThanOrEqual(240);
    expect(expected[1]).toBeCloseTo(normalQuantile(1.625 / 1000.25), 14);
    expect(expected.at(-40)).toBeCloseTo(normalQuantile((961 - 0.375) / 1000.25), 14);
  });
  it('step aside: no envelope for very many rows, nothing of an exact fit', () => {
    const many = normalQuantiles(straight(2001))!;
    expect([many.lower, many.upper, many.simulations]).toEqual([null, null, 0]);
    const x = [1, 2, 3, 4, 5];
    const exact = chosenFrom(
      [
        numbers(
          'y',
          x.map((v) => 2 * v),
        ),
        numbers('x', x),
      ],
      { terms: ['x'] },
    ).chosen;
    expect(normalQuantiles(exact)).toBeNull();
  });
  it('leave out a row that decides its own coefficient', () => {
    const x = [0, 0, 0, 0, 0, 0, 1];
    const y = [1, 2, 1.5, 1.2, 2.2, 0.4, 5];
    const { residual, lower } = normalQuantiles(
      chosenFrom([numbers('y', y), numbers('x', x)], { terms: ['x'] }).chosen,
    )!;
    expect(residual).toHaveLength(6);
    expect(lower!.every(Number.isFinite)).toBe(true);
  });
  it('are the same again', () => {
    expect(normalQuantiles(straight(50))).toEqual(normalQuantiles(straight(50)));
  });
});

it('numbers dealt into intervals come out as the language sorts them', () => {
  const number = fc.oneof(
    fc.double({ noNaN: true, noDefaultInfinity: true }),
    fc.integer({ min: -3, max: 3 }),
  );
  fc.assert(
    fc.property(fc.array(number, { maxLength: 60 }), (list) => {
      // The two zeros are equal here, and are told apart by nothing that follows.
      const values = Float64Array.from(list, (value) => value + 0);
      const expected = values.slice().sort();
      sortSpread(values, {
        starts: new Int32Array(2 * list.length + 1),
        sorted: new Float64Array(list.length),
      });
      expect(values).toEqual(expected);
    }),
  );
});

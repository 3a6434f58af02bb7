import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { type Factor, factorExtended, factorRows, mergeFactors } from '../../src/engine/factor.ts';
import type { Fit } from '../../src/engine/fit.ts';
import { fitCandidate } from '../../src/engine/fit-candidate.ts';
import { refineFit } from '../../src/engine/refine.ts';
import { press, visitRows } from '../../src/engine/row-figures.ts';
import { testModel, variable } from './models.ts';

/** Rows of y and three predictors from a small generator, so that a counterexample can be read. */
const tables = fc
  .record({ n: fc.integer({ min: 14, max: 700 }), seed: fc.integer({ min: 1, max: 1e6 }) })
  .map(({ n, seed }) => {
    let state = seed;
    const next = () => {
      state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
      return state / 2 ** 32 - 0.5;
    };
    const data: Record<string, number[]> = { y: [], a: [], b: [], c: [], w: [] };
    for (let i = 0; i < n; i++) {
      const [a, b, c] = [next(), next(), next()];
      data.a!.push(a * 10);
      data.b!.push(b + a);
      data.c!.push(c * 100 + 50);
      data.w!.push(0.5 + Math.abs(next()) * 4);
      data.y!.push(3 + 2 * a - b + 0.1 * c + next());
    }
    return data;
  });

const columns = ['a', 'b', 'c'].map(variable);
const all = [[0, 1, 2, 3]];

const close = (found: ArrayLike<number>, wanted: ArrayLike<number>, digits: number) => {
  expect(found.length).toBe(wanted.length);
  for (let j = 0; j < wanted.length; j++) {
    const scale = Math.max(1, Math.abs(wanted[j]!));
    expect(Math.abs(found[j]! - wanted[j]!) / scale).toBeLessThan(10 ** -digits);
  }
};

const fitOne = (factor: Factor, model: ReturnType<typeof testModel>): Fit =>
  fitCandidate(factor, model.design.candidates[0]!, model.facts);

describe('the factor', () => {
  test('streamed and extended factors give the same fit', () => {
    fc.assert(
      fc.property(tables, (data) => {
        const model = testModel(data, columns, all);
        const plain = fitOne(factorRows(model.rows), model);
        const extended = fitOne(factorExtended(model.rows), model);
        close(plain.estimates, extended.estimates, 11);
        close(plain.inverse, extended.inverse, 11);
        close([plain.residualSumOfSquares], [extended.residualSumOfSquares], 10);
        const refined = refineFit(plain, model.rows, model.facts);
        close(refined.estimates, extended.estimates, 15);
        close([refined.residualSumOfSquares], [extended.residualSumOfSquares], 14);
      }),
      { numRuns: 30 },
    );
  });

  test('merging factors of any partition, in any grouping, gives the fit of all rows', () => {
    fc.assert(
      fc.property(
        tables,
        fc.array(fc.double({ min: 0, max: 1, noNaN: true }), { maxLength: 4 }),
        (data, cuts) => {
          const model = testModel(data, columns, all);
          const n = model.rows.rowCount;
          const ends = [...new Set([0, ...cuts.map((cut) => Math.floor(cut * n)), n])].sort((a, b) => a - b);
          const parts = ends.slice(1).map((end, k) => factorRows(model.rows, ends[k]!, end));
          const whole = fitOne(factorRows(model.rows), model);
          const left = parts.reduce(mergeFactors);
          const right = parts.reduceRight((merged, part) => mergeFactors(part, merged));
          for (const factor of [left, right]) {
            expect(factor.rowCount).toBe(n);
            close(fitOne(factor, model).estimates, whole.estimates, 10);
          }
        },
      ),
      { numRuns: 30 },
    );
  });

  test('every candidate from the triangle equals a design of its own columns', () => {
    fc.assert(
      fc.property(tables, fc.subarray([1, 2, 3], { minLength: 1 }), fc.boolean(), (data, own, intercept) => {
        const chosen = intercept ? [0, ...own] : own;
        const union = testModel(data, columns, [chosen]);
        const alone = testModel(
          data,
          own.map((j) => columns[j - 1]!),
          [intercept ? [0, ...own.map((_, k) => k + 1)] : own.map((_, k) => k + 1)],
        );
        const a = fitOne(factorExtended(union.rows), union);
        const b = fitOne(factorExtended(alone.rows), alone);
        close(a.estimates, b.estimates, 14);
        close(
          [a.residualSumOfSquares, a.totalSumOfSquares],
          [b.residualSumOfSquares, b.totalSumOfSquares],
          13,
        );
        close(a.inverse, b.inverse, 13);
        close([a.conditionNumber], [b.conditionNumber], 10);
      }),
      { numRuns: 30 },
    );
  });

  test('columns come in the order in which the candidate declares them, with the same fit', () => {
    fc.assert(
      fc.property(tables, fc.shuffledSubarray([1, 2, 3], { minLength: 2 }), (data, own) => {
        const model = testModel(data, columns, [
          [0, ...own],
          [0, ...own.toSorted((a, b) => a - b)],
        ]);
        const factor = factorExtended(model.rows);
        const [declared, ascending] = model.design.candidates.map((one) =>
          fitCandidate(factor, one, model.facts),
        );
        expect(declared!.columns).toEqual([0, ...own]);
        const sorted = ascending!.columns.map(
          (column) => declared!.estimates[declared!.columns.indexOf(column)]!,
        );
        close(sorted, ascending!.estimates, 14);
        close([declared!.residualSumOfSquares], [ascending!.residualSumOfSquares], 14);
        close([press(declared!, model.rows)!], [press(ascending!, model.rows)!], 11);
      }),
      { numRuns: 30 },
    );
  });

  test('residuals are orthogonal to every column; with an intercept they sum to zero (common practice, no source)', () => {
    fc.assert(
      fc.property(tables, (data) => {
        const model = testModel(data, columns, all);
        const fit = fitOne(factorExtended(model.rows), model);
        const e: number[] = [];
        let leverage = 0;
        visitRows(fit, model.rows, (_from, count, residuals, leverages) => {
          for (let i = 0; i < count; i++) {
            e.push(residuals[i]!);
            leverage += leverages[i]!;
          }
        });
        for (const column of [e.map(() => 1), data.a!, data.b!, data.c!]) {
          const size = Math.sqrt(column.reduce((s, v) => s + v * v, 0) * e.reduce((s, v) => s + v * v, 0));
          expect(Math.abs(column.reduce((s, v, i) => s + v * e[i]!, 0)) / size).toBeLessThan(1e-11);
        }
        // The trace of the hat matrix is p.
        expect(leverage).toBeCloseTo(fit.columns.length, 9);
      }),
      { numRuns: 30 },
    );
  });

  test('the order of rows does not matter', () => {
    fc.assert(
      fc.property(tables, (data) => {
        const reversed = Object.fromEntries(
          Object.entries(data).map(([name, values]) => [name, [...values].reverse()]),
        );
        const a = testModel(data, columns, all);
        const b = testModel(reversed, columns, all);
        const one = fitOne(factorExtended(a.rows), a);
        const other = fitOne(factorExtended(b.rows), b);
        close(one.estimates, other.estimates, 15);
        close([one.residualSumOfSquares], [other.residualSumOfSquares], 15);
      }),
      { numRuns: 20 },
    );
  });

  test('rescaling a column by a power of two rescales its coefficient exactly, also to magnitudes whose squares overflow', () => {
    fc.assert(
      fc.property(tables, fc.integer({ min: -600, max: 600 }), (data, exponent) => {
        const factor = 2 ** exponent;
        const scaled = { ...data, a: data.a!.map((value) => value * factor) };
        const a = testModel(data, columns, all);
        const b = testModel(scaled, columns, all);
        for (const make of [factorRows, factorExtended]) {
          const one = fitOne(make(a.rows), a);
          const other = fitOne(make(b.rows), b);
          close([other.estimates[1]! * factor], [one.estimates[1]!], 12);
          close([other.estimates[0]!, other.estimates[2]!], [one.estimates[0]!, one.estimates[2]!], 12);
          expect(other.dropped).toEqual([]);
          close([other.conditionNumber], [one.conditionNumber], 8);
        }
      }),
      { numRuns: 40 },
    );
  });

  test('a whole-number weight is the same as that many copies of the row', () => {
    fc.assert(
      fc.property(tables, (data) => {
        const w = data.y!.map((_, i) => 1 + (i % 3));
        const copies = Object.fromEntries(
          Object.entries(data).map(([name, values]) => [
            name,
            values.flatMap((v, i) => Array.from({ length: w[i]! }, () => v)),
          ]),
        );
        const weighted = testModel({ ...data, w }, columns, all, { weights: 'w' });
        const copied = testModel(copies, columns, all);
        const a = fitOne(factorExtended(weighted.rows), weighted);
        const b = fitOne(factorExtended(copied.rows), copied);
        close(a.estimates, b.estimates, 13);
        close(a.inverse, b.inverse, 13);
        close(
          [a.residualSumOfSquares, a.totalSumOfSquares],
          [b.residualSumOfSquares, b.totalSumOfSquares],
          12,
        );
        expect(a.rowCount).toBe(data.y!.length);
      }),
      { numRuns: 20 },
    );
  });

  test('PRESS is the sum of squared errors of actual refits without each row', () => {
    fc.assert(
      fc.property(tables, (long) => {
        const data = Object.fromEntries(
          Object.entries(long).map(([name, values]) => [name, values.slice(0, 12)]),
        );
        const model = testModel(data, columns, all);
        const fit = fitOne(factorExtended(model.rows), model);
        let sum = 0;
        for (let i = 0; i < 12; i++) {
          const rest = Object.fromEntries(
            Object.entries(data).map(([name, values]) => [name, values.filter((_, k) => k !== i)]),
          );
          const without = testModel(rest, columns, all);
          const { estimates } = fitOne(factorExtended(without.rows), without);
          const x = [1, data.a![i]!, data.b![i]!, data.c![i]!];
          sum += (data.y![i]! - x.reduce((s, value, j) => s + value * estimates[j]!, 0)) ** 2;
        }
        close([press(fit, model.rows)!], [sum], 9);
      }),
      { numRuns: 20 },
    );
  });
});

describe('edges', () => {
  test('no predictor: the estimate is the mean (common practice, no source)', () => {
    const model = testModel({ y: [1, 2, 6] }, [], [[0]]);
    const fit = fitOne(factorExtended(model.rows), model);
    expect(Array.from(fit.estimates)).toEqual([3]);
    expect(fit.totalSumOfSquares).toBeCloseTo(14, 12);
    expect(fit.residualSumOfSquares).toBeCloseTo(14, 12);
  });

  test('one row', () => {
    const model = testModel({ y: [7], a: [2] }, [variable('a')], [[0, 1]]);
    for (const make of [factorRows, factorExtended]) {
      const fit = fitOne(make(model.rows), model);
      expect(fit.columns).toEqual([0]);
      expect(fit.degreesOfFreedom).toBe(0);
      expect(fit.estimates[0]).toBeCloseTo(7, 12);
    }
  });

  test('as many columns as rows: an exact fit without degrees of freedom', () => {
    const model = testModel({ y: [1, 5, 2], a: [1, 2, 4], b: [1, 0, 3] }, ['a', 'b'].map(variable), [
      [0, 1, 2],
    ]);
    const fit = fitOne(factorExtended(model.rows), model);
    expect(fit.degreesOfFreedom).toBe(0);
    expect(fit.exact).toBe(true);
  });

  test('a huge offset of a predictor costs no digits of its slope', () => {
    const a = Array.from({ length: 40 }, (_, i) => i);
    const y = a.map((v) => 2 * v + (v % 3));
    const near = testModel({ y, a }, [variable('a')], [[0, 1]]);
    const far = testModel({ y, a: a.map((v) => v + 2 ** 40) }, [variable('a')], [[0, 1]]);
    const one = fitOne(factorExtended(near.rows), near);
    const other = fitOne(factorExtended(far.rows), far);
    close([other.estimates[1]!], [one.estimates[1]!], 15);
  });
});

describe('dependent columns', () => {
  const laden = Array.from({ length: 30 }, (_, i) => ((i * 7) % 11) + i / 10);
  const empty = Array.from({ length: 30 }, (_, i) => ((i * 5) % 13) / 3);
  const y = laden.map((v, i) => v + empty[i]! + ((i * 3) % 7));
  const sentenceOf = (data: Record<string, number[]>) => {
    const names = Object.keys(data).filter((name) => name !== 'y');
    const model = testModel(data, names.map(variable), [[0, ...names.map((_, j) => j + 1)]]);
    return [factorRows, factorExtended].map((make) =>
      fitOne(make(model.rows), model).dropped.map((one) => one.sentence),
    );
  };

  test.each([
    [
      'a sum',
      { laden, empty, total: laden.map((v, i) => v + empty[i]!) },
      'total equals laden + empty in these rows',
    ],
    ['a copy', { laden, again: laden }, 'again equals laden in these rows'],
    [
      'a multiple with an offset',
      { laden, fahrenheit: laden.map((v) => 1.8 * v + 32) },
      'fahrenheit equals 32 + 1.8 × laden in these rows',
    ],
    [
      'a difference',
      { laden, empty, net: laden.map((v, i) => v - empty[i]!) },
      'net equals laden − empty in these rows',
    ],
    ['a constant', { laden, three: laden.map(() => 3) }, 'three is 3 in every row used'],
    ['zeros', { laden, none: laden.map(() => 0) }, 'none is 0 in every row used'],
    ['a negative copy', { laden, minus: laden.map((v) => -v) }, 'minus equals −laden in these rows'],
  ])('%s is named in a sentence, in both arithmetics', (_what, columnsOf, sentence) => {
    for (const sentences of sentenceOf({ y, ...columnsOf })) expect(sentences).toEqual([sentence]);
  });

  test('the fit goes on without it, as if it had never been there', () => {
    const model = testModel({ y, laden, again: laden, empty }, ['laden', 'again', 'empty'].map(variable), [
      [0, 1, 2, 3],
      [0, 1, 3],
    ]);
    const factor = factorExtended(model.rows);
    const [with_, without] = model.design.candidates.map((candidate) =>
      fitCandidate(factor, candidate, model.facts),
    );
    expect(with_!.columns).toEqual([0, 1, 3]);
    close(with_!.estimates, without!.estimates, 14);
    expect(Array.from(with_!.own)).toEqual(Array.from(without!.own));
  });

  test('a nearly dependent column stays and is named', () => {
    const almost = laden.map((v, i) => v + 1e-7 * ((i * 11) % 17));
    const model = testModel({ y, laden, almost }, ['laden', 'almost'].map(variable), [[0, 1, 2]]);
    const fit = fitOne(factorExtended(model.rows), model);
    expect(fit.dropped).toEqual([]);
    expect(fit.nearlyDependent).toHaveLength(1);
    expect(fit.nearlyDependent[0]!.sentence).toMatch(/^almost is nearly laden in these rows/);
  });

  test('the span says which columns a candidate contains, by space and not by name', () => {
    const total = laden.map((v, i) => v + empty[i]!);
    const model = testModel({ y, laden, empty, total }, ['laden', 'empty', 'total'].map(variable), [
      [0, 1, 2],
      [0, 3],
      [0, 1],
    ]);
    const factor = factorExtended(model.rows);
    const [both, sum, one] = model.design.candidates.map((candidate) =>
      fitCandidate(factor, candidate, model.facts),
    );
    expect(both!.span[0]).toBe(0b1111);
    expect(sum!.span[0]).toBe(0b1001);
    expect(one!.span[0]).toBe(0b0011);
  });
});

test('in doubles, rounding that a near dependency has magnified does not count as a direction', () => {
  // The difference of two columns that are large and alike: what rounding leaves of it is 5e-12 of its length.
  const a = Array.from({ length: 400 }, (_, i) => 1000 + ((i * 7919) % 401) / 400);
  const b = a.map((v, i) => v + 0.1 * Math.sin(i * 1.7));
  const difference = a.map((v, i) => b[i]! - v);
  const y = a.map((v, i) => v + ((i * 13) % 17));
  const model = testModel({ y, a, b, difference }, ['a', 'b', 'difference'].map(variable), [[0, 1, 2, 3]]);
  for (const make of [factorRows, factorExtended]) {
    expect(fitOne(make(model.rows), model).dropped.map((one) => one.sentence)).toEqual([
      'difference equals b − a in these rows',
    ]);
  }
});

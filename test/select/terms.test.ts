/** Joint F and generalised VIF against computations that share nothing with them. */
import fc from 'fast-check';
import { determinant, Matrix } from 'ml-matrix';
import { describe, expect, test } from 'vitest';
import { partialFTest } from '../../src/select/nesting.ts';
import { generalisedVif, jointF, largestVif } from '../../src/select/terms.ts';
import { tTwoSided } from '../../src/stats/distributions.ts';
import { HALD } from '../reference/hald-cement/hald-cement.ts';
import { anyProblem, NAMES } from './any-problem.ts';
import { fitsOf } from './fit-directly.ts';

/** Fox & Monette 1992, as printed: determinants of blocks of the correlation matrix. */
function byDeterminants(
  columns: readonly (readonly number[])[],
  own: readonly number[],
  centred: boolean,
): number {
  const about = columns.map((x) => {
    const mean = centred ? x.reduce((sum, value) => sum + value, 0) / x.length : 0;
    return x.map((value) => value - mean);
  });
  const product = (i: number, j: number) =>
    about[i]!.reduce((sum, value, k) => sum + value * about[j]![k]!, 0);
  const correlation = (i: number, j: number) => product(i, j) / Math.sqrt(product(i, i) * product(j, j));
  const minor = (at: readonly number[]) =>
    at.length === 0 ? 1 : determinant(new Matrix(at.map((i) => at.map((j) => correlation(i, j)))));
  const all = columns.map((_, j) => j);
  const others = all.filter((j) => !own.includes(j));
  return (minor(own) * minor(others)) / minor(all);
}

describe('joint F of a term', () => {
  test('equals the partial F against the model without it, and t² for one column', () => {
    fc.assert(
      fc.property(
        anyProblem(),
        fc.subarray(NAMES, { minLength: 1 }),
        fc.boolean(),
        ({ columns, y }, own, intercept) => {
          const others = NAMES.filter((name) => !own.includes(name));
          const { fits } = fitsOf({
            columns,
            y,
            candidates: [
              { name: 'all', terms: [{ name: 'term', columns: own }, ...others], intercept },
              { name: 'without', terms: others, intercept },
            ],
          });
          const [all, without] = fits;
          const test = jointF(all!, all!.candidate.terms[0]!)!;
          const partial = partialFTest(without!, all!);
          expect(test.df1).toBe(own.length);
          expect(test.df2).toBe(partial.df2);
          expect(test.statistic! / partial.statistic!).toBeCloseTo(1, 6);
          if (own.length === 1) {
            const j = all!.columns.indexOf(all!.candidate.terms[0]!.columns[0]!);
            const s2 = all!.residualSumOfSquares / all!.degreesOfFreedom;
            const t = all!.estimates[j]! / Math.sqrt(s2 * all!.inverse[j * all!.columns.length + j]!);
            expect(test.statistic! / t ** 2).toBeCloseTo(1, 10);
            expect(test.p_value! / tTwoSided(t, all!.degreesOfFreedom)).toBeCloseTo(1, 9);
          }
        },
      ),
    );
  });

  test('a column that was dropped is left out of the term', () => {
    const { fits } = fitsOf({
      columns: { a: [1, 2, 3, 4, 5, 7], b: [2, 4, 6, 8, 10, 14], c: [1, 0, 1, 1, 0, 0] },
      y: [1, 3, 2, 5, 4, 8],
      candidates: [
        {
          name: 'all',
          terms: ['a', { name: 'term', columns: ['b', 'c'] }, { name: 'gone', columns: ['b'] }],
        },
      ],
    });
    const [, term, gone] = fits[0]!.candidate.terms;
    expect(jointF(fits[0]!, term!)!.df1).toBe(1);
    expect(jointF(fits[0]!, gone!)).toBeNull();
    expect(generalisedVif(fits[0]!, term!)!.columns).toBe(1);
    expect(generalisedVif(fits[0]!, gone!)).toBeNull();
  });

  test('nothing can be tested without degrees of freedom or in an exact fit', () => {
    const { fits } = fitsOf({
      columns: { a: [1, 2, 4], b: [1, 0, 5], c: [3, 1, 1] },
      y: [2, 4, 8],
      candidates: [
        { name: 'exact', terms: ['a'] },
        { name: 'full', terms: ['b', 'c'] },
      ],
    });
    expect(fits[0]!.exact).toBe(true);
    expect(fits.map((fit) => jointF(fit, fit.candidate.terms[0]!))).toEqual([null, null]);
  });
});

describe('generalised VIF', () => {
  test('equals the determinants of Fox & Monette 1992', () => {
    fc.assert(
      fc.property(
        anyProblem(),
        fc.subarray(NAMES, { minLength: 1 }),
        fc.boolean(),
        ({ columns, y }, own, intercept) => {
          const others = NAMES.filter((name) => !own.includes(name));
          const { fits } = fitsOf({
            columns,
            y,
            candidates: [{ name: 'all', terms: [...others, { name: 'term', columns: own }], intercept }],
          });
          const found = generalisedVif(fits[0]!, fits[0]!.candidate.terms.at(-1)!)!;
          const expected = byDeterminants(
            NAMES.map((name) => columns[name]!),
            own.map((name) => NAMES.indexOf(name)),
            intercept,
          );
          expect(found.value / expected).toBeCloseTo(1, 6);
          expect(found.perColumn).toBeCloseTo(found.value ** (1 / (2 * own.length)), 10);
        },
      ),
    );
  });

  test('is symmetric: of a block and of the rest it is the same', () => {
    const { fits } = fitsOf({
      columns: HALD.columns,
      y: HALD.y,
      candidates: [
        {
          name: 'all',
          terms: [
            { name: 'one', columns: ['x1', 'x3'] },
            { name: 'two', columns: ['x2', 'x4'] },
          ],
        },
      ],
    });
    const [one, two] = fits[0]!.candidate.terms.map((term) => generalisedVif(fits[0]!, term)!.value);
    expect(one! / two!).toBeCloseTo(1, 10);
    expect(one).toBeGreaterThan(10);
  });

  test('of a term that is the whole model it is 1; with one predictor there is none', () => {
    const { fits } = fitsOf({
      columns: HALD.columns,
      y: HALD.y,
      candidates: [
        { name: 'whole', terms: [{ name: 'term', columns: ['x1', 'x2', 'x3'] }] },
        { name: 'one', terms: ['x1'] },
        { name: 'mean', terms: [] },
      ],
    });
    expect(generalisedVif(fits[0]!, fits[0]!.candidate.terms[0]!)!.value).toBeCloseTo(1, 10);
    expect(generalisedVif(fits[1]!, fits[1]!.candidate.terms[0]!)).toBeNull();
    expect(fits.map(largestVif).slice(1)).toEqual([null, null]);
  });

  test('does not change with the units or the origin of the columns', () => {
    const of = (columns: Readonly<Record<string, readonly number[]>>) => {
      const { fits } = fitsOf({
        columns,
        y: HALD.y,
        candidates: [{ name: 'all', terms: [{ name: 'term', columns: ['x1', 'x3'] }, 'x2'] }],
      });
      return generalisedVif(fits[0]!, fits[0]!.candidate.terms[0]!)!.value;
    };
    const { x1, x2, x3 } = HALD.columns;
    const moved = of({ x1: x1.map((x) => 1e-6 * x + 4e-6), x2, x3: x3.map((x) => 1e6 * x - 2e7) });
    expect(moved / of({ x1, x2, x3 })).toBeCloseTo(1, 8);
  });
});

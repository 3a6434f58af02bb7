/** Facts of the trade (common practice, no source), as properties. */
import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { FitContext } from '../../src/engine/fit.ts';
import { choose } from '../../src/select/choose.ts';
import { coefficientFigures } from '../../src/select/coefficients.ts';
import { overallF } from '../../src/select/f-test.ts';
import { isNested } from '../../src/select/nesting.ts';
import { partialFTable } from '../../src/select/partial-f.ts';
import { adjustedRSquared, rSquared } from '../../src/select/r-squared.ts';
import type { RankBy } from '../../src/study/study.ts';
import { anyProblem, NAMES } from './any-problem.ts';
import { type Candidate, fitsOf } from './fit-directly.ts';
import { collector, studyWith } from './study-with.ts';

const RANK_BY: readonly RankBy[] = [
  'adjusted_r_squared',
  'aic',
  'aicc',
  'bic',
  'mallows_cp',
  'press',
  'partial_f',
];

/** Distinct subsets of the four predictors. */
const anySubsets = (minLength = 2) =>
  fc.uniqueArray(fc.subarray(NAMES), { minLength, maxLength: 9, selector: (terms) => terms.join() });
const candidatesOf = (subsets: readonly (readonly string[])[]): Candidate[] =>
  subsets.map((terms) => ({ name: `{${terms.join(' ')}}`, terms }));

test('adding a column never lowers R², and raises adjusted R² exactly when its |t| is above 1', () => {
  fc.assert(
    fc.property(anyProblem(), fc.shuffledSubarray(NAMES, { minLength: 1 }), ({ columns, y }, terms) => {
      const { fits, columnNames } = fitsOf({
        columns,
        y,
        candidates: candidatesOf([terms.slice(0, -1), terms]),
      });
      const [without, with_] = fits;
      const { t } = coefficientFigures(with_!, columnNames, 0.95).at(-1)!;
      expect(rSquared(with_!)!).toBeGreaterThanOrEqual(rSquared(without!)! - 1e-12);
      const gain = adjustedRSquared(with_!)! - adjustedRSquared(without!)!;
      fc.pre(Math.abs(Math.abs(t!) - 1) > 1e-6);
      expect(gain > 0).toBe(Math.abs(t!) > 1);
    }),
  );
});

test('with one predictor F = t² and the p-values coincide', () => {
  fc.assert(
    fc.property(anyProblem(), fc.constantFrom(...NAMES), ({ columns, y }, name) => {
      const { fits, columnNames } = fitsOf({ columns, y, candidates: candidatesOf([[name]]) });
      const f = overallF(fits[0]!)!;
      const { t, p_value: p } = coefficientFigures(fits[0]!, columnNames, 0.95)[1]!;
      expect(f.statistic! / t! ** 2).toBeCloseTo(1, 8);
      expect(f.p_value! / p!).toBeCloseTo(1, 8);
    }),
  );
});

test('with no predictor the estimate is the mean, and R² and its kin are 0', () => {
  fc.assert(
    fc.property(anyProblem(), ({ columns, y }) => {
      const { fits, columnNames } = fitsOf({ columns, y, candidates: candidatesOf([[]]) });
      const mean = y.reduce((sum, value) => sum + value, 0) / y.length;
      expect(coefficientFigures(fits[0]!, columnNames, 0.95)[0]!.estimate).toBeCloseTo(mean, 12);
      expect(rSquared(fits[0]!)).toBeCloseTo(0, 12);
      expect(adjustedRSquared(fits[0]!)).toBeCloseTo(0, 12);
      expect(overallF(fits[0]!)).toBeNull();
    }),
  );
});

test('an interval holds its estimate in the middle, and the wider confidence the narrower', () => {
  fc.assert(
    fc.property(anyProblem(), ({ columns, y }) => {
      const { fits, columnNames } = fitsOf({ columns, y, candidates: candidatesOf([NAMES]) });
      const wide = coefficientFigures(fits[0]!, columnNames, 0.99);
      for (const [j, narrow] of coefficientFigures(fits[0]!, columnNames, 0.9).entries()) {
        expect((narrow.lower! + narrow.upper!) / 2).toBeCloseTo(narrow.estimate, 10);
        expect(wide[j]!.lower!).toBeLessThan(narrow.lower!);
        expect(wide[j]!.upper!).toBeGreaterThan(narrow.upper!);
        // The interval leaves out 0 exactly where the p-value is below one minus the confidence.
        expect(narrow.lower! > 0 || narrow.upper! < 0).toBe(narrow.p_value! < 0.1);
      }
    }),
  );
});

test('of two candidates at most one is nested in the other, and exactly where its terms are a proper subset', () => {
  fc.assert(
    fc.property(anyProblem(), anySubsets(), ({ columns, y }, subsets) => {
      const { fits } = fitsOf({ columns, y, candidates: candidatesOf(subsets) });
      const { rows, omitted } = partialFTable(fits, null, []);
      expect(omitted).toBeNull();
      const pairs = new Set(rows.map(({ smaller, larger }) => `${smaller}<${larger}`));
      expect(pairs.size).toBe(rows.length);
      subsets.forEach((small, i) => {
        subsets.forEach((large, j) => {
          const proper = small.length < large.length && small.every((name) => large.includes(name));
          expect(pairs.has(`${i}<${j}`)).toBe(proper);
          expect(isNested(fits[i]!, fits[j]!) && isNested(fits[j]!, fits[i]!)).toBe(false);
        });
      });
      for (const { statistic, p_value: p } of rows) {
        expect(statistic).toBeGreaterThanOrEqual(0);
        expect(p).toBeGreaterThanOrEqual(0);
        expect(p).toBeLessThanOrEqual(1);
      }
    }),
  );
});

test('choice and ranking do not depend on the order in which candidates are declared', () => {
  fc.assert(
    fc.property(
      anyProblem(),
      anySubsets(),
      fc.constantFrom(...RANK_BY),
      fc.constantFrom(0, 0.5, 4),
      fc.infiniteStream(fc.nat()),
      ({ columns, y }, subsets, rankBy, preferSmallerWithin, picks) => {
        const shuffled = shuffle(subsets, picks);
        const study = studyWith({ rankBy, preferSmallerWithin, admit: { vif: { atMost: 1.6 } } });
        const named = (order: readonly (readonly string[])[]) => {
          const context = fitsOf({ columns, y, candidates: candidatesOf(order) });
          const { problems, report } = collector();
          const choice = choose(study, context, report);
          expect(problems).toEqual([]);
          const name = (index: number) => context.fits[index]!.candidate.name;
          return {
            chosen: choice.chosen === null ? null : name(choice.chosen),
            ranking: choice.ranking.map(({ candidate }) => name(candidate)),
            refused: choice.admissions
              .flatMap(({ admitted }, index) => (admitted ? [] : [name(index)]))
              .sort(),
            partialF: choice.partialF
              .map((row) => `${name(row.smaller)}<${name(row.larger)} ${row.decided}`)
              .sort(),
          };
        };
        expect(named(shuffled)).toEqual(named(subsets));
      },
    ),
  );
});

test('the choice is the one that the definition describes, found by looking at every candidate', () => {
  fc.assert(
    fc.property(
      anyProblem(),
      anySubsets(),
      fc.constantFrom<RankBy>('aic', 'bic', 'press', 'mallows_cp'),
      fc.constantFrom(0, 1, 3, 20),
      ({ columns, y }, subsets, rankBy, within) => {
        const context = fitsOf({ columns, y, candidates: candidatesOf(subsets) });
        const choice = choose(
          studyWith({ rankBy, preferSmallerWithin: within }),
          context,
          collector().report,
        );
        const value = (index: number) => choice.ranking.find(({ candidate }) => candidate === index)!.value!;
        const size = (index: number) => context.fits[index]!.columns.length;
        const won = choice.chosen!;
        const best = Math.min(...context.fits.map((_, index) => value(index)));
        expect(value(won)).toBeLessThanOrEqual(best + within + 1e-9);
        for (const other of context.fits.keys()) {
          if (other === won || value(other) > best + within - 1e-9) continue;
          expect(size(other)).toBeGreaterThanOrEqual(size(won));
          if (size(other) === size(won)) expect(value(other)).toBeGreaterThanOrEqual(value(won) - 1e-9);
        }
      },
    ),
  );
});

test('by partial F no smaller candidate stands, and none that contains the chosen one improves on it', () => {
  fc.assert(
    fc.property(
      anyProblem(),
      anySubsets(),
      fc.constantFrom(0.01, 0.05, 0.3),
      ({ columns, y }, subsets, significance) => {
        const context: FitContext = fitsOf({ columns, y, candidates: candidatesOf(subsets) });
        const choice = choose(studyWith({ rankBy: 'partial_f', significance }), context, collector().report);
        const won = choice.chosen!;
        const improved = new Set(
          choice.partialF.filter((row) => row.p_value! <= significance).map((row) => row.smaller),
        );
        expect(improved.has(won)).toBe(false);
        for (const [index, fit] of context.fits.entries()) {
          if (fit.columns.length < context.fits[won]!.columns.length) expect(improved.has(index)).toBe(true);
        }
        for (const row of choice.partialF.filter(({ decided }) => decided)) {
          expect(row.smaller === won ? row.p_value! > significance : row.p_value! <= significance).toBe(true);
        }
      },
    ),
  );
});

function shuffle<T>(items: readonly T[], picks: Iterator<number>): T[] {
  const left = [...items];
  return items.map(() => left.splice((picks.next().value as number) % left.length, 1)[0]!);
}

/** Leaving out a row by formulas and merged factors against leaving it out of the data. */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Column } from '../../src/data/table.ts';
import { cooksDistance, covarianceRatio, fittedShift } from '../../src/examine/chosen.ts';
import { examine } from '../../src/examine/examine.ts';
import { secondPass } from '../../src/examine/second-pass.ts';
import { withoutRows } from '../../src/examine/without-row.ts';
import { choose } from '../../src/select/choose.ts';
import type { RankBy, Study } from '../../src/study/study.ts';
import { category, numbers } from '../prepare/columns.ts';
import { uniform } from '../select/any-problem.ts';
import { chosenFrom, type Fitted, type Wanted } from './chosen-from.ts';

function anyColumns(): fc.Arbitrary<readonly Column[]> {
  return fc
    .tuple(fc.integer({ min: 12, max: 30 }), fc.integer({ min: 1, max: 2 ** 31 - 2 }))
    .map(([n, seed]) => {
      const next = uniform(seed);
      const draw = () => Array.from({ length: n }, () => 2 * next() - 1);
      const a = draw();
      const b = draw();
      // One level that a single row has: without that row its column is gone.
      const kinds = a.map((_, i) => (i === 5 ? 'rare' : i % 2 === 0 ? 'even' : 'odd'));
      const y = draw().map((e, i) => 5 + a[i]! + 0.4 * b[i]! + e + (i === 3 ? 3 : 0));
      return [
        numbers('y', y),
        numbers('a', a),
        numbers('b', b),
        category('k', kinds),
        numbers(
          'w',
          draw().map((v) => 1.5 + v),
        ),
      ];
    });
}

const dropRow = (columns: readonly Column[], row: number): Column[] =>
  columns.map((column): Column => {
    const rest = <T>(values: Iterable<T>) => [...values].filter((_, i) => i !== row);
    if (column.kind === 'category') return { ...column, codes: Int32Array.from(rest(column.codes)) };
    if (column.kind === 'text') return { ...column, values: rest(column.values) };
    return { ...column, values: Float64Array.from(rest(column.values)) };
  });

const near = (found: number, figure: number, size = 1) =>
  expect(Math.abs(found - figure)).toBeLessThanOrEqual(1e-9 * Math.max(size, Math.abs(figure)));

const RULES: readonly RankBy[] = ['aicc', 'bic', 'adjusted_r_squared', 'mallows_cp', 'press', 'partial_f'];

function wantedBy(rankBy: RankBy, weights: boolean): Wanted {
  return {
    terms: ['a'],
    others: [{ terms: ['a', 'b'] }, { terms: ['a', 'k'] }, { terms: ['b', 'k'] }],
    ...(weights ? { weights: 'w' } : {}),
    change: (study: Study): Study => ({
      ...study,
      selection: {
        ...study.selection,
        rankBy,
        admit: { ...study.selection.admit, pValue: { atMost: 0.9 }, vif: { atMost: 3 } },
      },
    }),
  };
}

const choiceOf = ({ study, fitted }: Fitted) => choose(study, fitted, () => {}).chosen;

describe('without each influential row', () => {
  test.each(RULES)('%s: the choice is that of a run without the row', (rankBy) => {
    fc.assert(
      fc.property(anyColumns(), fc.boolean(), fc.boolean(), (columns, weights, merged) => {
        const wanted = wantedBy(rankBy, weights);
        const whole = chosenFrom(columns, wanted);
        const found = withoutRows(whole.chosen, whole, merged ? 0 : undefined);
        expect(found.choiceOmitted).toBeNull();
        expect(found.rows.length).toBe(10);
        for (const { row, chosen } of found.rows) {
          expect(chosen).toBe(choiceOf(chosenFrom(dropRow(columns, row), wanted)));
        }
      }),
      { numRuns: 12 },
    );
  });

  test('coefficients, their errors and DFBETAS are those of a fit without the row', () => {
    fc.assert(
      fc.property(anyColumns(), fc.boolean(), (columns, weights) => {
        const wanted: Wanted = { terms: ['a', 'b', 'k'], ...(weights ? { weights: 'w' } : {}) };
        const whole = chosenFrom(columns, wanted);
        const { chosen } = whole;
        const p = chosen.fit.columns.length;
        for (const { row, coefficients } of withoutRows(chosen, whole).rows) {
          const { chosen: less } = chosenFrom(dropRow(columns, row), wanted);
          if (row === 5) continue;
          coefficients.forEach(({ estimate, standardError, shift }, j) => {
            near(estimate, less.fit.estimates[j]!);
            near(standardError!, less.s! * Math.sqrt(less.fit.inverse[j * p + j]!));
            const unit = Math.sqrt(chosen.fit.inverse[j * p + j]!);
            near(shift!, (chosen.fit.estimates[j]! - less.fit.estimates[j]!) / (less.s! * unit));
          });
        }
      }),
      { numRuns: 20 },
    );
  });

  test('DFFITS, COVRATIO and the largest DFBETAS over all rows are those of fits without each row', () => {
    fc.assert(
      fc.property(anyColumns(), (columns) => {
        const wanted: Wanted = { terms: ['a', 'b'] };
        const { chosen } = chosenFrom(columns, wanted);
        const p = chosen.fit.columns.length;
        const largest = new Float64Array(p);
        for (let row = 0; row < chosen.sample.rowCount; row++) {
          const { chosen: less } = chosenFrom(dropRow(columns, row), wanted);
          const moved = Array.from(
            { length: p },
            (_, j) => chosen.fit.estimates[j]! - less.fit.estimates[j]!,
          );
          moved.forEach((change, j) => {
            const shift = change / (less.s! * Math.sqrt(chosen.fit.inverse[j * p + j]!));
            if (Math.abs(shift) > Math.abs(largest[j]!)) largest[j] = shift;
          });
          const x = [1, cellOf(columns, 'a', row), cellOf(columns, 'b', row)];
          const change = x.reduce((sum, value, j) => sum + value * moved[j]!, 0);
          near(fittedShift(chosen, row)!, change / (less.s! * Math.sqrt(chosen.leverages[row]!)));
          // det(s²_(i)(X′X)_(i)⁻¹)/det(s²(X′X)⁻¹), with det (X′X)_(i) = (1 − h) det X′X.
          const ratio = (less.s! / chosen.s!) ** (2 * p) / (1 - chosen.leverages[row]!);
          near(covarianceRatio(chosen, row)!, ratio);
        }
        const { shifts } = secondPass(chosen)!;
        largest.forEach((value, j) => {
          near(shifts.largest[j]!, value);
        });
      }),
      { numRuns: 8 },
    );
  });

  test('the first row is the one with the largest Cook’s distance, and the choice is told as a finding', () => {
    const columns = [
      numbers('y', [1, 2.1, 2.9, 4.2, 5, 6.1, 7, 8.2, 8.9, 30]),
      numbers('a', [1, 2, 3, 4, 5, 6, 7, 8, 9, 10]),
      numbers('b', [2, 1, 2, 1, 2, 1, 2, 1, 2, 9]),
    ];
    const whole = chosenFrom(columns, { terms: ['b'], others: [{ terms: ['a'] }] });
    expect(choiceOf(whole)).toBe(0);
    const found = withoutRows(whole.chosen, whole);
    expect(found.rows[0]!.row).toBe(9);
    expect(cooksDistance(whole.chosen, 9)).toBeGreaterThan(1);
    expect(found.rows[0]!.chosen).toBe(1);
    const finding = examine(whole.chosen, found).find(({ name }) => name === 'choice_without_a_row')!;
    expect(finding.statistic).toBeGreaterThanOrEqual(1);
    expect(finding.concern).toBe(2);
    expect(finding.verdict).toContain('without line 11 it would be Candidate 2');
  });

  test('a rule that the factor does not tell, robust p-values and a single candidate step aside with a sentence', () => {
    const columns = fc.sample(anyColumns(), { numRuns: 1, seed: 3 })[0]!;
    const change = (to: (study: Study) => Study): Fitted =>
      chosenFrom(columns, { ...wantedBy('aicc', false), change: to });
    const omitted = (fitted: Fitted) => withoutRows(fitted.chosen, fitted).choiceOmitted;
    const robust = change((study) => ({
      ...study,
      selection: { ...study.selection, admit: { ...study.selection.admit, pValue: { atMost: 0.1 } } },
      inference: { ...study.inference, standardErrors: { kind: 'hc3' } },
    }));
    expect(omitted(robust)).toContain('declared standard errors');
    const folds = change((study) => ({
      ...study,
      selection: { ...study.selection, rankBy: 'cross_validation' },
    }));
    expect(omitted(folds)).toContain('cross_validation');
    expect(omitted(chosenFrom(columns, { terms: ['a'] }))).toBe('There is only one candidate to choose.');
  });

  test('a row with leverage 1 is not among them', () => {
    const columns = fc.sample(anyColumns(), { numRuns: 1, seed: 4 })[0]!;
    const whole = chosenFrom(columns, { terms: ['a', 'k'] });
    expect(whole.chosen.leverages[5]).toBe(1);
    expect(withoutRows(whole.chosen, whole).rows.map(({ row }) => row)).not.toContain(5);
  });
});

function cellOf(columns: readonly Column[], name: string, row: number): number {
  const column = columns.find((each) => each.name === name);
  if (column === undefined || column.kind === 'category' || column.kind === 'text') throw new Error(name);
  return column.values[row]!;
}

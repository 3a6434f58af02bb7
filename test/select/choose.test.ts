import { describe, expect, test } from 'vitest';
import type { Fit, FitContext } from '../../src/engine/fit.ts';
import type { RecordCandidate, RecordCoefficient } from '../../src/record/record.ts';
import { choose } from '../../src/select/choose.ts';
import { type CoefficientFigures, coefficientFigures } from '../../src/select/coefficients.ts';
import { CRITERIA } from '../../src/select/criteria.ts';
import { evidenceWeights } from '../../src/select/evidence.ts';
import { ALL_PAIRS_UP_TO } from '../../src/select/partial-f.ts';
import { type CandidateFigures, summarise } from '../../src/select/summarise.ts';
import type { RankBy } from '../../src/study/study.ts';
import { HALD } from '../reference/hald-cement/hald-cement.ts';
import { uniform } from './any-problem.ts';
import { type Candidate, fitsOf } from './fit-directly.ts';
import { collector, type SelectionChange, studyWith } from './study-with.ts';

const hald = (...candidates: Candidate[]): FitContext =>
  fitsOf({ columns: HALD.columns, y: HALD.y, candidates });

function outcome(context: FitContext, change: SelectionChange) {
  const { problems, report } = collector();
  const choice = choose(studyWith(change), context, report);
  return {
    ...choice,
    problems,
    name: choice.chosen === null ? null : context.fits[choice.chosen]!.candidate.name,
  };
}

describe('what is said of the choice', () => {
  const context = hald(
    { name: 'One', terms: ['x1'] },
    { name: 'Pair', terms: ['x1', 'x2'] },
    { name: 'Pair, other', terms: ['x1', 'x4'] },
  );

  test('the winner and the one that comes next', () => {
    expect(outcome(context, { rankBy: 'mallows_cp' })).toMatchObject({
      name: 'Pair',
      because: expect.stringMatching(
        /^Pair has the lowest Mallows’ Cp \(\d.*\) of 3 admitted candidates; “Pair, other” comes next, \d.* behind\.$/,
      ),
    });
  });

  test('a single candidate', () => {
    expect(outcome(hald({ name: 'Pair', terms: ['x1', 'x2'] }), { rankBy: 'aic' }).because).toBe(
      'Pair is the only candidate.',
    );
    expect(outcome(hald({ name: 'Pair', terms: ['x1', 'x2'] }), { rankBy: 'partial_f' }).because).toBe(
      'Pair is the only candidate.',
    );
  });

  test('a better one that was refused, with the reason', () => {
    const { name, because } = outcome(context, {
      rankBy: 'aic',
      admit: { signs: new Map([['x2', 'negative']]) },
    });
    expect(name).toBe('Pair, other');
    expect(because).toMatch(
      /^“Pair, other” has the lowest AIC .* of 2 admitted candidates; One comes next, .* behind\. /,
    );
    expect(because).toContain(
      'Pair has a better value but was not admitted. The reason for Pair: The coefficient of x2 is 0.662, and must be negative.',
    );
  });

  test('none admitted, and why', () => {
    const { chosen, because, ranking, problems, partialF } = outcome(context, {
      rankBy: 'aic',
      admit: { rowsPerCoefficient: { atLeast: 10 } },
    });
    expect(chosen).toBeNull();
    expect(problems).toEqual([]);
    expect(ranking).toHaveLength(3);
    expect(partialF).toHaveLength(2);
    expect(because).toBe(
      'None of the 3 candidates was admitted. One: There are 13 rows for 2 coefficients, 6.50 for each, below 10. Pair: There are 13 rows for 3 coefficients, 4.33 for each, below 10. “Pair, other”: There are 13 rows for 3 coefficients, 4.33 for each, below 10.',
    );
    expect(
      outcome(hald({ name: 'One', terms: ['x1'] }), {
        rankBy: 'partial_f',
        admit: { pValue: { atMost: 0.001 } },
      }).because,
    ).toMatch(/^The only candidate was not admitted\. One: The p-value of x1 is 0\.0046, above 0\.001\.$/);
  });

  test('only one admitted', () => {
    const change = { admit: { rowsPerCoefficient: { atLeast: 5 } } };
    expect(outcome(context, { ...change, rankBy: 'adjusted_r_squared' }).because).toMatch(
      /^One is the only one admitted of 3 candidates\. Pair has a better value but was not admitted, and so does one other/,
    );
    expect(outcome(context, { ...change, rankBy: 'partial_f' }).because).toBe(
      'One is the only one admitted of 3 candidates.',
    );
  });

  test('partial F: what contains it and what was passed over', () => {
    const { because, name } = outcome(
      hald(
        { name: 'One', terms: ['x1'] },
        { name: 'Pair', terms: ['x1', 'x2'] },
        { name: 'All', terms: ['x1', 'x2', 'x3', 'x4'] },
      ),
      { rankBy: 'partial_f', preferSmallerWithin: 2 },
    );
    expect(name).toBe('Pair');
    expect(because).toMatch(
      /^Pair has the fewest coefficients \(3\) of the admitted candidates that no admitted candidate containing them improves on at a significance of 0\.05\. All contains it and does not improve on it \(F 0\.839 on 2 and 8, p-value 0\.47\)\. One is smaller, but Pair improves on it \(F 209 on 1 and 10, p-value 5\.0 × 10⁻⁸\)\. prefer_smaller_within plays no part where partial F chooses\.$/,
    );
  });
});

describe('ties', () => {
  // Two ways to write one column space, and one of the same value by symmetry.
  const columns = {
    a: [1, 2, 3, 4, 5, 6],
    twice: [2, 4, 6, 8, 10, 12],
    shifted: [1001, 1002, 1003, 1004, 1005, 1006],
  };
  const y = [1.1, 1.9, 3.2, 3.8, 5.3, 5.9];
  const context = fitsOf({
    columns,
    y,
    candidates: [
      { name: 'With a copy', terms: ['twice', 'a'] },
      { name: 'First', terms: ['a'] },
      { name: 'Second', terms: ['shifted'] },
    ],
  });

  test.each<RankBy>(['adjusted_r_squared', 'aic', 'aicc', 'bic', 'press', 'mallows_cp', 'partial_f'])(
    '%s: equal values go to the order of declaration, whatever the rounding says',
    (rankBy) => {
      const { name, ranking, because } = outcome(context, { rankBy });
      // A column that was dropped does not count as a coefficient.
      expect(name).toBe('With a copy');
      expect(ranking.map(({ candidate }) => candidate)).toEqual([0, 1, 2]);
      if (rankBy !== 'partial_f') {
        expect(ranking.map(({ difference }) => difference)).toEqual([0, 0, 0]);
        expect(because).toMatch(/First has the same value but is declared later\.$/);
      } else {
        expect(because).toContain('First has as few coefficients and stands as well, but is declared later.');
      }
    },
  );

  test('of equal values the fewest coefficients', () => {
    // Reported as equal, since a fit cannot gain nothing by a column and keep its AIC.
    const same = {
      ...context,
      press: [4, 4, 4],
      fits: [wider(context.fits[0]!), context.fits[1]!, context.fits[2]!],
    };
    const { name, because } = outcome(same, { rankBy: 'press' });
    expect(name).toBe('First');
    expect(because).toMatch(/Second has the same value but is declared later\.$/);
    const { because: two } = outcome({ ...same, press: [4, 4, 9] }, { rankBy: 'press' });
    expect(two).toMatch(/“?With a copy”? has the same value but has more coefficients\.$/);
  });

  function wider(fit: Fit): Fit {
    return { ...fit, columns: [...fit.columns, 2] };
  }
});

describe('problems', () => {
  test('criterion_undefined: no candidate has the criterion, with what would be defined', () => {
    const context = fitsOf({
      columns: { x: [1, 2, 3, 5] },
      y: [1, 3, 2, 6],
      candidates: [{ name: 'Line', terms: ['x'] }],
    });
    expect(outcome(context, { rankBy: 'aicc' }).problems).toEqual([
      {
        code: 'criterion_undefined',
        severity: 'error',
        place: { kind: 'source', file: 'study.yaml', line: 2, column: 1, length: 7 },
        message:
          'selection.rank_by is aicc, which is not defined for any candidate. For Line: with 2 coefficients it needs more than 4 rows, and there are 4.',
        hint: 'Defined here: adjusted_r_squared, aic, bic, mallows_cp and press.',
      },
    ]);
  });

  test('criterion_undefined: all terms together leave no degrees of freedom for Mallows’ Cp', () => {
    const context = fitsOf({
      columns: { a: [1, 2, 3, 5], b: [1, 0, 0, 1], c: [2, 5, 1, 1] },
      y: [1, 3, 2, 6],
      candidates: [
        { name: 'A', terms: ['a'] },
        { name: 'BC', terms: ['b', 'c'] },
      ],
    });
    const { problems, chosen } = outcome(context, { rankBy: 'mallows_cp' });
    expect(problems).toMatchObject([
      { code: 'criterion_undefined', message: expect.stringContaining('no error variance') },
    ]);
    expect(chosen).toBeNull();
  });

  test('criterion_undefined: PRESS that was not worked out says so', () => {
    const context = {
      ...hald({ name: 'One', terms: ['x1'] }),
      press: [null],
      pressOmitted: 'not worked out: too long',
    };
    expect(outcome(context, { rankBy: 'press' }).problems[0]!.message).toBe(
      'selection.rank_by is press, which is not defined for any candidate. For One: it was not worked out: too long.',
    );
  });

  const acrossScales = fitsOf({
    columns: HALD.columns,
    y: [HALD.y, HALD.y.map(Math.log)],
    candidates: [
      { name: 'Natural', terms: ['x1', 'x2'] },
      { name: 'Log', terms: ['x1', 'x2', 'x3'], response: 1 },
    ],
  });

  test.each<RankBy>(['adjusted_r_squared', 'mallows_cp', 'press', 'partial_f'])(
    'criterion_across_scales: %s cannot rank two response scales',
    (rankBy) => {
      expect(outcome(acrossScales, { rankBy }).problems).toMatchObject([
        {
          code: 'criterion_across_scales',
          severity: 'error',
          hint: expect.stringContaining('aic, aicc, bic or cross_validation'),
        },
      ]);
    },
  );

  test.each<RankBy>(['aic', 'aicc', 'bic'])('%s can, and scales are never nested', (rankBy) => {
    const { problems, partialF, chosen } = outcome(acrossScales, { rankBy });
    expect(problems).toEqual([]);
    expect(partialF).toEqual([]);
    expect(chosen).not.toBeNull();
  });
});

describe('many candidates', () => {
  const next = uniform(20240);
  const draw = () => Array.from({ length: 24 }, () => next() - 0.5);
  const names = Array.from({ length: 65 }, (_, k) => `x${k}`);
  const columns = Object.fromEntries(names.map((name) => [name, draw()]));
  const y = draw().map((noise, i) => noise + 4 * columns.x0![i]!);
  const candidates = (count: number): Candidate[] => [
    { name: 'Base', terms: ['x0'] },
    ...names.slice(1, count).map((name) => ({ name, terms: ['x0', name] })),
  ];

  test('up to 60 every nested pair is listed', () => {
    const { partialF, partialFOmitted } = outcome(
      fitsOf({ columns, y, candidates: candidates(ALL_PAIRS_UP_TO) }),
      { rankBy: 'bic' },
    );
    expect(partialF).toHaveLength(ALL_PAIRS_UP_TO - 1);
    expect(partialFOmitted).toBeNull();
  });

  test('beyond, those that involve the chosen one, and the others are counted', () => {
    const context = fitsOf({ columns, y, candidates: candidates(62) });
    const { chosen, partialF, partialFOmitted } = outcome(context, { rankBy: 'adjusted_r_squared' });
    expect(chosen).toBeGreaterThan(0);
    expect(partialF).toMatchObject([{ smaller: 0, larger: chosen, decided: false }]);
    expect(partialFOmitted).toBe(
      'With 62 candidates only those that involve the chosen candidate are listed; 60 other nested pairs are left out.',
    );
  });

  test('beyond, the pairs that decided stay', () => {
    const context = fitsOf({
      columns,
      y,
      candidates: [...candidates(60), { name: 'Mean', terms: [] }, { name: 'Apart', terms: ['x62', 'x63'] }],
    });
    const { name, partialF, partialFOmitted } = outcome(context, {
      rankBy: 'partial_f',
      significance: 0.0001,
    });
    expect(name).toBe('Base');
    expect(
      partialF.filter(({ decided, smaller }) => decided && context.fits[smaller]!.candidate.name === 'Mean'),
    ).toHaveLength(1);
    expect(partialF.filter(({ decided }) => decided).length).toBe(
      partialF.filter(({ smaller }) => smaller === 0).length + 1,
    );
    expect(partialFOmitted).toMatch(/^With 62 candidates only those that involve the chosen candidate/);
  });

  test('none admitted: none is listed', () => {
    const { partialF, partialFOmitted } = outcome(fitsOf({ columns, y, candidates: candidates(62) }), {
      rankBy: 'aic',
      admit: { adjustedRSquared: { atLeast: 1 } },
    });
    expect(partialF).toEqual([]);
    expect(partialFOmitted).toBe(
      'With 62 candidates no pair is listed because none was chosen; 61 other nested pairs are left out.',
    );
  });
});

describe('figures for the record', () => {
  test('are never NaN or infinite, whatever the fit', () => {
    const context = fitsOf({
      columns: { a: [1, 2, 4, 4], b: [1, 0, 5, 2], c: [1, 1, 0, 7], twice: [2, 4, 8, 8] },
      y: [2, 4, 8, 8],
      candidates: [
        { name: 'exact', terms: ['a'] },
        { name: 'full', terms: ['b', 'c', 'a'] },
        { name: 'dropped', terms: ['a', 'twice'] },
        { name: 'mean', terms: [] },
        { name: 'origin', terms: ['c'], intercept: false },
        { name: 'nothing', terms: [], intercept: false },
      ],
    });
    const shown = context.fits.map((fit, index) => ({
      ...summarise(index, context),
      coefficients: coefficientFigures(fit, context.columnNames, 0.95),
    }));
    const numbers: unknown[] = [];
    JSON.stringify(shown, (_, value: unknown) => {
      if (typeof value === 'number') numbers.push(value);
      return value;
    });
    expect(numbers.length).toBeGreaterThan(60);
    expect(numbers.every(Number.isFinite)).toBe(true);
    expect(shown[0]).toMatchObject({
      r_squared: 1,
      adjusted_r_squared: 1,
      log_likelihood: null,
      aic: null,
      aicc: null,
      bic: null,
    });
    expect(shown[0]!.overall_f).toEqual({ statistic: null, df1: 1, df2: 2, p_value: null });
    expect(shown[0]!.coefficients[1]).toMatchObject({
      standard_error: null,
      t: null,
      p_value: null,
      lower: null,
      upper: null,
    });
    expect(shown[1]).toMatchObject({ adjusted_r_squared: null, residual_standard_error: null, press: null });
    expect(shown[3]).toMatchObject({ overall_f: null, largest_vif: null });
    expect(shown[4]!.overall_f).toMatchObject({ df1: 1, df2: 3 });
  });

  test('a response that does not vary has no R²', () => {
    const context = fitsOf({ columns: {}, y: [0, 0, 0], candidates: [{ name: 'mean', terms: [] }] });
    expect(summarise(0, context)).toMatchObject({
      r_squared: null,
      adjusted_r_squared: null,
      predicted_r_squared: null,
    });
  });

  test('are spelled as in the record', () => {
    const context = hald({ name: 'One', terms: ['x1'] });
    // These two lines hold when they compile.
    const figures: Pick<RecordCandidate, keyof CandidateFigures> = summarise(0, context);
    const coefficients: readonly Pick<RecordCoefficient, keyof CoefficientFigures>[] = coefficientFigures(
      context.fits[0]!,
      context.columnNames,
      0.95,
    );
    for (const { name, value } of CRITERIA) {
      if (name !== 'partial_f' && name !== 'cross_validation') expect(figures[name]).toBe(value(0, context));
    }
    expect(coefficients.map(({ name, term }) => [name, term])).toEqual([
      ['intercept', 'intercept'],
      ['x1', 'x1'],
    ]);
  });
});

describe('weights of evidence (Burnham & Anderson 2002)', () => {
  test('are exp(−Δ/2) as shares', () => {
    const [a, b, c] = evidenceWeights('aicc', [0, 2, null]);
    expect(a! / b!).toBeCloseTo(Math.E, 12);
    expect(a! + b!).toBeCloseTo(1, 12);
    expect(c).toBeNull();
  });

  test('hold for very distant candidates, and only for information criteria', () => {
    expect(evidenceWeights('bic', [0, 1e6])).toEqual([1, 0]);
    expect(evidenceWeights('press', [0, 1])).toEqual([null, null]);
    expect(evidenceWeights('aic', [])).toEqual([]);
  });
});

import { describe, expect, test } from 'vitest';
import { ADMISSION_RULES, admissionSentences, admit } from '../../src/select/admission.ts';
import { choose } from '../../src/select/choose.ts';
import { criterionNamed } from '../../src/select/criteria.ts';
import type { AdmitPlan, RankBy } from '../../src/study/study.ts';
import { HALD } from '../reference/hald-cement/hald-cement.ts';
import { type Candidate, fitsOf, type Problem } from './fit-directly.ts';
import { collector, NO_RULES, studyWith } from './study-with.ts';

/** The reasons for refusing the one candidate of a problem. */
function reasons(
  problem: Problem,
  rules: Partial<AdmitPlan>,
  rankBy: RankBy = 'adjusted_r_squared',
): readonly string[] {
  const context = fitsOf(problem);
  return admit(studyWith({ rankBy, admit: rules }).selection, criterionNamed(rankBy), 0, context)
    .refusedBecause;
}

const hald = (...terms: Candidate['terms']): Problem => ({
  columns: HALD.columns,
  y: HALD.y,
  candidates: [{ name: 'it', terms }],
});
const all = hald('x1', 'x2', 'x3', 'x4');

describe('VIF', () => {
  test('names the terms above the limit, the largest first (published VIF 38.496, 254.423, 46.868, 282.513)', () => {
    expect(reasons(all, { vif: { atMost: 40 } })).toEqual([
      'VIF of x4 is 283, of x2 254 and of x3 46.9, above 40.',
    ]);
    expect(reasons(all, { vif: { atMost: 283 } })).toEqual([]);
  });

  test('x2 and x4 alone have 18.7 (published)', () => {
    expect(reasons(hald('x2', 'x4'), { vif: { atMost: 10 } })).toEqual([
      'VIF of x2 is 18.7 and of x4 18.7, above 10.',
    ]);
  });

  test('of a term of several columns it is the generalised factor by column, so a polynomial is not held against itself', () => {
    const x = Array.from({ length: 12 }, (_, i) => 20 + i);
    const problem = (terms: Candidate['terms']): Problem => ({
      columns: { x, 'x²': x.map((each) => each * each), z: [1, 3, 2, 5, 4, 6, 1, 2, 2, 7, 3, 1] },
      y: [3, 4, 4, 6, 5, 8, 7, 9, 8, 12, 11, 13],
      candidates: [{ name: 'it', terms }],
    });
    expect(reasons(problem(['x', 'x²', 'z']), { vif: { atMost: 10 } })).toHaveLength(1);
    expect(
      reasons(problem([{ name: 'x, degree 2', columns: ['x', 'x²'] }, 'z']), { vif: { atMost: 10 } }),
    ).toEqual([]);
  });

  test('one predictor has none to be collinear with', () => {
    expect(reasons(hald('x1'), { vif: { atMost: 1 } })).toEqual([]);
  });

  test('a figure is never rounded onto the limit that it breaks', () => {
    const [reason] = reasons(hald('x2', 'x4'), { vif: { atMost: 18.7 } });
    expect(reason).toBe('VIF of x2 is 18.74 and of x4 18.74, above 18.7.');
  });
});

describe('p-value', () => {
  // t = estimate/standard error of the published full model: 2.083, 0.705, 0.135, −0.203 on 8 degrees of freedom.
  test('names the terms above the limit, the largest first; the intercept is not one', () => {
    expect(reasons(all, { pValue: { atMost: 0.1 } })).toEqual([
      'The p-value of x3 is 0.90, of x4 0.84 and of x2 0.50, above 0.1.',
    ]);
    expect(reasons(all, { pValue: { atMost: 0.9 } })).toEqual([]);
  });

  test('a term of several columns is tested jointly', () => {
    const joint = hald('x1', { name: 'rest', columns: ['x2', 'x3', 'x4'] });
    expect(reasons(joint, { pValue: { atMost: 0.001 } })).toEqual([
      'The p-value of x1 is 0.071, above 0.001.',
    ]);
  });

  test('an exact fit has no p-values', () => {
    const exact: Problem = {
      columns: { x: [1, 2, 3, 4] },
      y: [3, 5, 7, 9],
      candidates: [{ name: 'it', terms: ['x'] }],
    };
    expect(reasons(exact, { pValue: { atMost: 0.05 } })).toEqual([
      'It fits these rows exactly, so no term has a p-value.',
    ]);
    expect(reasons(exact, {})).toEqual([]);
  });
});

describe('signs', () => {
  const rule = (name: string, sign: 'positive' | 'negative') => ({ signs: new Map([[name, sign]]) });

  test('hold for a term of one column', () => {
    expect(reasons(all, rule('x4', 'positive'))).toEqual([
      'The coefficient of x4 is −0.144, and must be positive.',
    ]);
    expect(reasons(all, rule('x4', 'negative'))).toEqual([]);
  });

  test('hold for a single coefficient of a term of several, and by the term’s name where it has one column', () => {
    const problem = hald({ name: 'pair', columns: ['x1', 'x2'] }, { name: 'alone', columns: ['x3'] });
    expect(reasons(problem, rule('x2', 'negative'))).toHaveLength(1);
    expect(reasons(problem, rule('alone', 'negative'))).toEqual([
      'The coefficient of alone is 0.250, and must be negative.',
    ]);
  });

  test('do not touch a candidate without the name', () => {
    expect(reasons(hald('x1'), rule('x4', 'positive'))).toEqual([]);
  });

  test('cannot be seen of a column that was dropped', () => {
    const problem: Problem = {
      columns: { a: [1, 2, 3, 4, 6], b: [2, 4, 6, 8, 12] },
      y: [1, 3, 2, 5, 7],
      candidates: [{ name: 'it', terms: ['a', 'b'] }],
    };
    expect(reasons(problem, rule('b', 'positive'))).toEqual([
      'b has no coefficient of its own here, because it depends on other columns; it must be positive.',
    ]);
  });
});

describe('rows per coefficient', () => {
  test('counts the intercept', () => {
    expect(reasons(all, { rowsPerCoefficient: { atLeast: 10 } })).toEqual([
      'There are 13 rows for 5 coefficients, 2.60 for each, below 10.',
    ]);
    expect(reasons(all, { rowsPerCoefficient: { atLeast: 2.6 } })).toEqual([]);
    expect(reasons(hald(), { rowsPerCoefficient: { atLeast: 13 } })).toEqual([]);
  });
});

describe('adjusted R²', () => {
  // Published: x2 and x4 together 61.6 %.
  test('is held against its limit', () => {
    const pair = hald('x2', 'x4');
    expect(reasons(pair, { adjustedRSquared: { atLeast: 0.75 } })).toEqual([
      'Adjusted R² is 0.616, below 0.75.',
    ]);
    expect(reasons(pair, { adjustedRSquared: { atLeast: 0.6 } })).toEqual([]);
  });

  test('is not defined where the response does not vary', () => {
    const constant: Problem = { columns: {}, y: [0, 0, 0], candidates: [{ name: 'it', terms: [] }] };
    expect(reasons(constant, { adjustedRSquared: { atLeast: 0.1 } }, 'partial_f')[0]).toBe(
      'Adjusted R² is not defined, because the response does not vary.',
    );
  });
});

describe('always', () => {
  const full: Problem = {
    columns: { a: [1, 2, 4], b: [1, 0, 5] },
    y: [2, 4, 9],
    candidates: [{ name: 'it', terms: ['a', 'b'] }],
  };

  test.each<RankBy>(['aic', 'press', 'partial_f'])('a candidate needs degrees of freedom (%s)', (rankBy) => {
    const rules = { pValue: { atMost: 0.1 }, adjustedRSquared: { atLeast: 0.5 } };
    expect(reasons(full, rules, rankBy)).toEqual([
      'With 3 rows for 3 coefficients no degrees of freedom are left.',
    ]);
  });

  test('a candidate needs a value of the criterion that is to choose', () => {
    const exact: Problem = {
      columns: { x: [1, 2, 3, 4] },
      y: [3, 5, 7, 9],
      candidates: [{ name: 'it', terms: ['x'] }],
    };
    expect(reasons(exact, {}, 'aic')).toEqual([
      'It cannot be ranked: AIC is not defined, because it fits these rows exactly, so its likelihood has no upper bound.',
    ]);
    expect(reasons(exact, {}, 'partial_f')).toEqual([
      'It fits these rows exactly, so no other candidate can be tested against it.',
    ]);
    const short: Problem = {
      columns: { x: [1, 2, 3, 5] },
      y: [3, 5, 8, 9],
      candidates: [{ name: 'it', terms: ['x'] }],
    };
    expect(reasons(short, {}, 'aicc')).toEqual([
      'It cannot be ranked: AICc is not defined, because with 2 coefficients it needs more than 4 rows, and there are 4.',
    ]);
  });

  test('a row that nothing else predicts leaves PRESS undefined', () => {
    const lone: Problem = {
      columns: { flag: [0, 0, 0, 0, 1] },
      y: [1, 3, 2, 5, 9],
      candidates: [{ name: 'it', terms: ['flag'] }],
    };
    expect(reasons(lone, {}, 'press')).toEqual([
      'It cannot be ranked: PRESS is not defined, because a row has leverage 1, so it cannot be predicted from the others.',
    ]);
  });
});

test('the declared rules are told one by one, in a fixed order', () => {
  expect(ADMISSION_RULES.map(({ name }) => name)).toEqual([
    'vif',
    'p_value',
    'signs',
    'rows_per_coefficient',
    'adjusted_r_squared',
  ]);
  expect(admissionSentences(NO_RULES)).toEqual([]);
  expect(
    admissionSentences({
      vif: { atMost: 10 },
      pValue: { atMost: 0.1 },
      signs: new Map([
        ['cargo', 'positive'],
        ['slope', 'negative'],
      ]),
      rowsPerCoefficient: { atLeast: 10 },
      adjustedRSquared: { atLeast: 0.75 },
    }),
  ).toEqual([
    'The VIF of every term must be at most 10; of a term with several columns, the generalised VIF to the power 1/columns.',
    'The p-value of every term must be at most 0.1.',
    'The coefficient of cargo must be positive where a candidate has it.',
    'The coefficient of slope must be negative where a candidate has it.',
    'There must be at least 10 rows for each coefficient.',
    'Adjusted R² must be at least 0.75.',
  ]);
});

describe('sign_name_unknown', () => {
  const context = fitsOf(hald('x1', { name: 'pair', columns: ['x2', 'x3'] }));
  const found = (name: string) => {
    const { problems, report } = collector();
    choose(studyWith({ rankBy: 'aic', admit: { signs: new Map([[name, 'positive']]) } }), context, report);
    return problems;
  };

  test('a name that no candidate has, with the nearest', () => {
    expect(found('xx1')).toEqual([
      {
        code: 'sign_name_unknown',
        severity: 'error',
        place: { kind: 'source', file: 'study.yaml', line: 4, column: 1, length: 3 },
        message:
          'selection.admit.signs names "xx1", which is neither a coefficient nor a term of one column in any candidate.',
        hint: 'Did you mean x1?',
      },
    ]);
    expect(found('cargo')[0]!.hint).toBe('The names are "x1", "intercept", "x2" and "x3".');
  });

  test('a term of several columns has no one sign', () => {
    expect(found('pair')).toMatchObject([
      {
        code: 'sign_name_unknown',
        message: 'selection.admit.signs names "pair", a term of 2 columns, which has no one sign.',
        hint: 'Name a single coefficient of it: "x2" and "x3".',
      },
    ]);
  });

  test('a name that one candidate has is known', () => {
    expect(found('x2')).toEqual([]);
  });
});

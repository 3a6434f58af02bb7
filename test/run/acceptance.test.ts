import { describe, expect, test } from 'vitest';
import { csvOf, runText } from './run-text.ts';

/** Invented: y near 3 + 2x, 14 days, one missing x, one row left out on purpose. */
const n = 14;
const x = Array.from({ length: n }, (_, i) => (i === 3 ? '' : i));
const y = Array.from({ length: n }, (_, i) => 3 + 2 * i + ((i * 5) % 3) / 10);
const day = Array.from({ length: n }, (_, i) => `2026-03-${String(i + 1).padStart(2, '0')}`);
const keep = Array.from({ length: n }, (_, i) => (i === 5 ? 'no' : 'yes'));
const DATA = csvOf({ y, x, day, keep });

const studyOf = (acceptance: string, response = 'y', terms = '[x]') => `
plumbrule: 1
title: Test
data:
  file: data.csv
  time: day
  variables: { y: { type: number }, x: { type: number }, day: { type: date }, keep: { type: flag } }
leave_out: [{ where: not keep, because: Not kept }]
response: ${response}
candidates:
  - { name: line, terms: ${terms} }
  - { name: mean, terms: [] }
predict: { rows: [{ label: a, x: 3 }, { label: b, x: 12 }] }
acceptance:
${acceptance}
`;

const accepted = async (acceptance: string, response?: string) => {
  const { record, problems } = await runText(studyOf(acceptance, response), { 'data.csv': DATA });
  expect(problems.filter(({ severity }) => severity === 'error')).toEqual([]);
  return record!;
};
const faults = async (acceptance: string, change = (text: string) => text) => {
  const { problems, record } = await runText(change(studyOf(acceptance)), { 'data.csv': DATA });
  expect(record).toBeNull();
  return problems
    .filter(({ severity }) => severity === 'error')
    .map(({ code, message, hint }) => `${code}: ${message} ${hint ?? ''}`);
};

describe('acceptance', () => {
  test('nothing inflates a column that stands alone: its factor is 1 (Marquardt 1970)', async () => {
    const { acceptance } = await accepted('  largest_vif: { at_most: 5 }');
    expect(acceptance).toMatchObject([{ criterion: 'largest_vif', value: 1, passed: true }]);
  });

  test('coefficients and signs are held against the chosen model, by coefficient or term', async () => {
    const { acceptance, candidates } = await accepted(`
  coefficients: { x: { at_least: 1.9, at_most: 2.1 }, intercept: { at_most: 0 } }
  signs: { x: positive, intercept: negative }`);
    const b = candidates[0]!.coefficients;
    expect(acceptance).toEqual([
      {
        criterion: 'coefficient',
        of: 'x',
        limit: 'at least 1.9 and at most 2.1',
        value: b[1]!.estimate,
        passed: true,
      },
      { criterion: 'coefficient', of: 'intercept', limit: 'at most 0', value: b[0]!.estimate, passed: false },
      { criterion: 'sign', of: 'x', limit: 'positive', value: b[1]!.estimate, passed: true },
      { criterion: 'sign', of: 'intercept', limit: 'negative', value: b[0]!.estimate, passed: false },
    ]);
  });

  test('CV(RMSE) and bias on the response’s own scale agree with their formulas', async () => {
    const limits = '\n  cv_rmse: { at_most: 1 }\n  bias: { at_least: -1, at_most: 1 }';
    const rows = [...Array(n).keys()].filter((i) => i !== 3 && i !== 5);
    const mean = rows.reduce((sum, i) => sum + y[i]!, 0) / rows.length;

    const natural = await accepted(limits);
    expect(natural.acceptance[0]!.value).toBeCloseTo(natural.model!.residual_standard_error! / mean, 13);
    expect(natural.acceptance[1]!.value).toBeCloseTo(0, 13);

    const log = await accepted(limits, '{ variable: y, scale: log }');
    const [b0, b1] = log.model!.columns.map(({ estimate }) => estimate);
    const errors = rows.map((i) => Math.exp(b0! + b1! * i) - y[i]!);
    const squares = errors.reduce((sum, e) => sum + e * e, 0);
    expect(log.acceptance[0]!.value).toBeCloseTo(Math.sqrt(squares / (rows.length - 2)) / mean, 12);
    expect(log.acceptance[1]!.value).toBeCloseTo(errors.reduce((a, b) => a + b) / rows.length / mean, 12);
    expect(Math.abs(log.acceptance[1]!.value as number)).toBeGreaterThan(1e-3);
  });

  test('rows lost are those that no rule takes out', async () => {
    const { acceptance } = await accepted(`
  rows_lost_share: { at_most: 0.05 }
  rows_per_coefficient: { at_least: 6 }`);
    expect(acceptance).toMatchObject([
      { value: 1 / n, passed: false },
      { value: 6, passed: true },
    ]);
  });

  test('widths are those of the widest stated prediction', async () => {
    const { acceptance, predictions } = await accepted(`
  prediction_interval_width: { at_most: 10 }
  relative_interval_width: { at_most: 0.001 }`);
    const widths = predictions.map(({ lower, upper }) => upper! - lower!);
    expect(acceptance[0]).toMatchObject({ value: Math.max(...widths), passed: true });
    const relative = predictions.map(({ estimate }, i) => widths[i]! / Math.abs(estimate));
    expect(acceptance[1]).toMatchObject({ value: Math.max(...relative), passed: false });
  });

  test('a p-value is that of the question named', async () => {
    const { acceptance, examination } = await accepted('\n  p_value: { equal_spread: { at_least: 1e-9 } }');
    const finding = examination!.findings.find(({ name }) => name === 'equal_spread')!;
    expect(finding.p_value).not.toBeNull();
    expect(acceptance[0]).toMatchObject({ criterion: 'p_value', of: 'equal_spread', value: finding.p_value });
  });

  test('the age of the newest row is counted to the day stated, never to a clock', async () => {
    const at = (on: string) => accepted(`\n  age_of_newest_row: { on: "${on}", at_most: 7 }`);
    expect((await at('2026-03-21')).acceptance[0]).toEqual({
      criterion: 'age_of_newest_row',
      limit: 'at most 7 days on 2026-03-21',
      value: 7,
      passed: true,
    });
    expect((await at('2026-03-22')).acceptance[0]).toMatchObject({ value: 8, passed: false });
  });

  test('names that are none are errors, with the nearest that is', async () => {
    expect(await faults('\n  p_value: { equal_spred: { at_least: 0.1 } }')).toEqual([
      expect.stringMatching(/^name_unknown: .*"equal_spred".* Did you mean equal_spread\?/),
    ]);
    expect(await faults('\n  signs: { xx: positive }\n  coefficients: { zz: { at_least: 1 } }')).toEqual([
      expect.stringMatching(/^sign_name_unknown: acceptance\.signs names "xx"/),
      expect.stringMatching(/^sign_name_unknown: acceptance\.coefficients names "zz"/),
    ]);
  });

  test('criteria that nothing could answer are errors', async () => {
    const age = '\n  age_of_newest_row: { on: "2026-03-21", at_most: 7 }';
    expect(await faults(age, (text) => text.replace('  time: day\n', ''))).toEqual([
      expect.stringMatching(/^type_unsuited: .*needs data\.time to name a date/),
    ]);
    expect(await faults(age.replace('2026-03-21', 'today'))).toEqual([
      expect.stringMatching(/^value_not_allowed: .*"today", which is not a day/),
    ]);
    const width = '\n  prediction_interval_width: { at_most: 1 }';
    expect(await faults(width, (text) => text.replace(/predict:.*\n/, ''))).toEqual([
      expect.stringMatching(/^limit_nonsense: .*the study predicts nothing/),
    ]);
    expect(await faults('\n  p_value: { equal_spread: { at_least: 2 } }')).toEqual([
      expect.stringMatching(/^limit_nonsense: .*p_value|^limit_nonsense: .*equal_spread is never above 1/),
    ]);
  });

  test('a coefficient that the chosen model does not have misses', async () => {
    const { record } = await runText(
      studyOf('\n  signs: { x: positive }\n  chosen: [mean]').replace(
        'predict:',
        'selection: { admit: { adjusted_r_squared: { at_least: -1 }, signs: { x: negative } } }\npredict:',
      ),
      { 'data.csv': DATA },
    );
    expect(record!.selection.chosen).toBe('mean');
    expect(record!.acceptance).toMatchObject([{ value: null, passed: false }, { passed: true }]);
  });
});

/**
 * Inference of whole runs against figures from 50-digit arithmetic that shares nothing with the program: see
 * test/reference/inference/make.py.
 */
import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import type { RecordModel } from '../../src/record/record.ts';
import { anscombe } from '../reference/anscombe.ts';
import { HALD } from '../reference/hald-cement/hald-cement.ts';
import { longley } from '../reference/longley.ts';
import { csv, modelOf, type Ran, runText, studyOf } from './run-text.ts';

const figures = JSON.parse(
  readFileSync(new URL('../reference/inference/figures.json', import.meta.url), 'utf8'),
);
const carsData = readFileSync(new URL('../reference/cars/cars.csv', import.meta.url), 'utf8');

/** Fails with the name of the figure where the two are further apart than the tolerance, relatively. */
function agree(what: string, found: number | null | undefined, figure: number, tolerance = 1e-9): void {
  expect(typeof found, what).toBe('number');
  const apart = Math.abs(found! - figure) / Math.abs(figure);
  expect(apart, `${what}: ${found}, not ${figure}`).toBeLessThanOrEqual(tolerance);
}

/** A figure that may be zero: within a share of one. */
function near(what: string, found: number | null | undefined, figure: number, tolerance = 1e-9): void {
  expect(typeof found, what).toBe('number');
  expect(Math.abs(found! - figure), `${what}: ${found}, not ${figure}`).toBeLessThanOrEqual(tolerance);
}

/** "hac 4" and "by cylinders" as the figures name them, as a study declares them. */
function declared(kind: string): string {
  const [word, value] = kind.split(' ');
  return word === 'hac' ? `{ hac_lags: ${value} }` : word === 'by' ? `{ clustered_by: ${value} }` : kind;
}

function agreeErrors(ran: Ran, kind: string, errors: readonly number[]): void {
  const model = modelOf(ran);
  const coefficients = ran.record!.candidates[0]!.coefficients;
  expect(coefficients.length).toBe(errors.length);
  errors.forEach((error, j) => {
    agree(`${kind}, ${coefficients[j]!.name}`, coefficients[j]!.standard_error, error);
    agree(`${kind}, covariance of ${coefficients[j]!.name}`, model.covariance![j]![j]!, error ** 2);
  });
}

const CARS_VARIABLES = `    first_sold: { type: date }
    economy: { type: number }
    weight: { type: number }
    horsepower: { type: number }
    cylinders: { type: integer }
    origin: { type: category, levels: [USA, Europe, Japan], baseline: USA }`;

function carsStudy(
  rest: string,
  terms = 'weight, horsepower, model_year, origin, { interaction: [weight, origin] }',
): string {
  return `plumbrule: 1
title: Cars
data:
  file: data.csv
  time: first_sold
  variables:
${CARS_VARIABLES}
derive:
  model_year: { expression: year(first_sold) }
response: economy
candidates:
  - name: Slope by origin
    terms: [${terms}]
${rest}
`;
}

const sets: readonly { name: string; study: (kind: string) => string; data: string }[] = [
  {
    name: 'longley',
    study: (kind) =>
      studyOf(longley, `inference: { standard_errors: ${declared(kind)} }`).replace(
        'file: data.csv',
        'file: data.csv\n  time: x6',
      ),
    data: csv(longley),
  },
  {
    name: 'hald',
    study: (kind) =>
      studyOf(
        { y: HALD.y, order: HALD.y.map((_, i) => i), ...HALD.columns },
        `inference: { standard_errors: ${declared(kind)} }`,
        'x1, x2, x3, x4',
      ).replace('file: data.csv', 'file: data.csv\n  time: order'),
    data: csv({ y: HALD.y, order: HALD.y.map((_, i) => i), ...HALD.columns }),
  },
  {
    name: 'cars',
    study: (kind) => carsStudy(`inference: { standard_errors: ${declared(kind)} }`),
    data: carsData,
  },
  {
    name: 'cars weighted',
    study: (kind) =>
      carsStudy(
        `weights: horsepower\ninference: { standard_errors: ${declared(kind)} }`,
        'weight, model_year',
      ),
    data: carsData,
  },
];

describe.each(sets)('$name', ({ name, study, data }) => {
  const set = figures[name];

  test.each(Object.keys(set.errors))('standard errors: %s', async (kind) => {
    agreeErrors(await runText(study(kind), data), kind, set.errors[kind]);
  });

  test('standardised coefficients, partial and semi-partial correlations, whatever the standard errors', async () => {
    for (const kind of ['classical', 'hc3']) {
      const { coefficients } = modelOf(await runText(study(kind), data)).inference!;
      expect(coefficients[0]).toMatchObject({
        name: 'intercept',
        standardised: null,
        partial_correlation: null,
      });
      for (const measure of set.measures) {
        const found = coefficients.find((each) => each.name === measure.name)!;
        for (const key of ['standardised', 'partial_correlation', 'semi_partial_correlation'] as const)
          agree(`${key} of ${measure.name}`, found[key], measure[key]);
      }
    }
  });

  test('condition indices and proportions', async () => {
    const { collinearity } = (await runText(study('classical'), data)).record!.examination!;
    expect(collinearity!.columns).toEqual(set.names);
    collinearity!.indices.forEach((index, k) => {
      agree(`index ${k}`, index, set.condition.indices[k]);
      collinearity!.proportions[k]!.forEach((share, j) => {
        near(`proportion ${k}, ${set.names[j]}`, share, set.condition.proportions[k][j]);
      });
    });
  });

  test('the automatic number of lags', async () => {
    const model = modelOf(await runText(study('hac auto'), data));
    expect(model.standard_errors).toMatchObject({ kind: 'hac', lags: set.automatic_lags });
  });
});

describe('Anscombe’s four sets', () => {
  test.each(['1', '2', '3', '4'] as const)('standard errors of set %s', async (key) => {
    const columns = anscombe[key];
    for (const kind of Object.keys(figures.anscombe[key].errors)) {
      const ran = await runText(studyOf(columns, `inference: { standard_errors: ${kind} }`), csv(columns));
      agreeErrors(ran, kind, figures.anscombe[key].errors[kind]);
      const { cautions } = modelOf(ran).standard_errors!;
      // In the fourth set one row alone fixes the slope.
      if (key === '4' && !['classical', 'hc0', 'hc1'].includes(kind)) {
        expect(cautions).toEqual([
          `${kind.toUpperCase()} is not defined for line 9, fitted by a coefficient of its own (leverage 1): such a row adds nothing to the standard errors, and that of its own coefficient says nothing.`,
        ]);
        expect(ran.record!.warnings.map(({ text }) => text)).toContain(cautions[0]);
      } else expect(cautions).toEqual([]);
    }
  });
});

describe('hypotheses', () => {
  const rest = (kind: string, more = '') => `inference:
  standard_errors: ${kind}
${more}  hypotheses:
    - { name: Alike, combination: { x3: 1, x4: -1 }, equals: -0.5 }
    - name: Neither
      all_of: [{ combination: { x2: 1 } }, { combination: { x5: 1 }, equals: 0.25 }]
    - { name: Alone, combination: { x6: 1 } }
`;

  test.each(['classical', 'hc3'])('single and joint, %s', async (kind) => {
    const ran = await runText(studyOf(longley, rest(kind)), csv(longley));
    const [single, joint, alone] = modelOf(ran).inference!.hypotheses;
    const expected = figures.longley.single[kind];
    for (const key of ['estimate', 'standard_error', 'lower', 'upper'] as const)
      agree(key, single!.equalities[0]![key], expected[key]);
    agree('t', single!.t, expected.t);
    agree('p', single!.test!.p_value, expected.p_value);
    expect(single!.equalities[0]).toMatchObject({ combination: 'x3 − x4', equals: -0.5 });
    agree('F', joint!.test!.statistic, figures.longley.joint[kind].statistic);
    agree('p of F', joint!.test!.p_value, figures.longley.joint[kind].p_value);
    expect(joint!.test).toMatchObject({ df1: 2, df2: 9 });
    expect(joint!.t).toBeNull();
    // A single coefficient equal to zero: the t of the table, squared.
    const coefficient = ran.record!.candidates[0]!.coefficients.at(-1)!;
    agree('t of x6', alone!.t, coefficient.t!);
    agree('F of x6', alone!.test!.statistic, coefficient.t! ** 2);
    agree('p of x6', alone!.test!.p_value, coefficient.p_value!);
    expect(alone!.verdict).toMatch(
      kind === 'classical'
        ? /^The data speak against it: the estimate is .+ \(95 % interval .+ to .+\), not 0 \(p-value 0.0030\)\.$/u
        : /^The data do not speak against it: .*, and 0 is within reach \(p-value 0.079\); that does not show that it holds\.$/u,
    );
    expect(joint!.verdict).toMatch(
      kind === 'classical'
        ? /^The data speak against it: 2 equalities .* \(p-value 0.0080\)\.$/
        : /^The data do not speak against it \(p-value/,
    );
  });

  test('a coefficient that the chosen model lacks, and one that no candidate has', async () => {
    const study = studyOf(longley, rest('classical')).replace(
      'candidates:\n',
      'candidates:\n  - name: Few\n    terms: [x3, x4]\n',
    );
    const both = `${study}selection: { admit: { vif: { at_most: 10 } } }\n`;
    const { hypotheses } = modelOf(await runText(both, csv(longley))).inference!;
    expect(hypotheses.map(({ verdict, test: f }) => [verdict.slice(0, 65), f === null])).toEqual([
      [expect.stringMatching(/^The data/), false],
      ['Not tested: the chosen model has no coefficient x2 and x5.', true],
      ['Not tested: the chosen model has no coefficient x6.', true],
    ]);
    const wrong = studyOf(longley, rest('classical')).replace('{ x5: 1 }', '{ x55: 1 }');
    const { record, problems } = await runText(wrong, csv(longley));
    expect(record).toBeNull();
    expect(problems).toEqual([
      {
        code: 'hypothesis_name_unknown',
        severity: 'error',
        place: expect.objectContaining({ kind: 'source', line: 22 }),
        message: 'A hypothesis names "x55", which is not a coefficient of any candidate.',
        hint: 'Did you mean x5?',
      },
    ]);
  });

  test('the name of a term of several columns', async () => {
    const study = carsStudy('inference: { hypotheses: [{ name: A, combination: { origin: 1 } }] }');
    const { problems } = await runText(study, carsData);
    expect(problems.map(({ code, message, hint }) => [code, message, hint])).toEqual([
      [
        'hypothesis_name_unknown',
        'A hypothesis names "origin", a term of 2 columns, not a coefficient.',
        'The coefficients of the term are "origin Europe" and "origin Japan".',
      ],
    ]);
  });
});

describe('simultaneous intervals', () => {
  test.each(['bonferroni', 'scheffe'] as const)('%s', async (method) => {
    const ran = await runText(studyOf(longley, `inference: { simultaneous: ${method} }`), csv(longley));
    const { simultaneous, coefficients } = modelOf(ran).inference!;
    agree('multiplier', simultaneous!.multiplier, figures.longley.simultaneous[method]);
    coefficients.forEach((each, j) => {
      const { estimate, standard_error: error } = ran.record!.candidates[0]!.coefficients[j]!;
      near('lower', (each.simultaneous_lower! - estimate) / error!, -figures.longley.simultaneous[method]);
      near('upper', (each.simultaneous_upper! - estimate) / error!, figures.longley.simultaneous[method]);
    });
  });

  test('not asked for', async () => {
    const { simultaneous, coefficients } = modelOf(await runText(studyOf(longley, ''), csv(longley)))
      .inference!;
    expect(simultaneous).toBeNull();
    expect(coefficients.every((each) => each.simultaneous_lower === null)).toBe(true);
  });
});

describe('levels of a category', () => {
  const term = (model: RecordModel, name: string) => model.terms.find((each) => each.name === name)!;

  describe.each(['classical', 'hc3', 'by model_year'])('%s', (kind) => {
    const expected = figures.cars.levels[kind];

    test.each(['holm', 'tukey_kramer'] as const)('means and pairs, %s', async (method) => {
      const inference = `inference: { standard_errors: ${declared(kind)}, level_comparisons: ${method} }`;
      const { means, comparisons, held } = term(
        modelOf(await runText(carsStudy(inference), carsData)),
        'origin',
      ).level_means!;
      expect(held).toContain('origin also acts together with other variables');
      expect(means.map(({ level, rows, own }) => [level, rows, own])).toEqual(
        expected.means.map((mean: { level: string; rows: number }) => [mean.level, mean.rows, null]),
      );
      means.forEach((mean, k) => {
        for (const key of ['estimate', 'lower', 'upper'] as const)
          agree(`${key} at ${mean.level}`, mean[key], expected.means[k][key]);
      });
      expect(comparisons!.method).toBe(method);
      expect(comparisons!.pairs.length).toBe(3);
      const tukey = method === 'tukey_kramer';
      comparisons!.pairs.forEach((pair, k) => {
        const figure = expected.pairs[k];
        const what = `${pair.level} and ${pair.other}`;
        expect([pair.level, pair.other]).toEqual([figure.level, figure.other]);
        agree(what, pair.estimate, figure.estimate);
        agree(what, pair.standard_error, figure.standard_error);
        agree(what, pair.p_value, figure.p_value, 1e-8);
        // The independent range is good to about 1e-12.
        if (tukey) near(what, pair.adjusted_p_value, figure.tukey, 1e-10);
        else agree(what, pair.adjusted_p_value, figure.holm, 1e-8);
        agree(what, pair.lower, figure[tukey ? 'tukey_lower' : 'lower'], 1e-8);
        agree(what, pair.upper, figure[tukey ? 'tukey_upper' : 'upper'], 1e-8);
      });
    });
  });

  test.each(['classical', 'hc3', 'by model_year'])('joint tests of terms, %s', async (kind) => {
    const model = modelOf(
      await runText(carsStudy(`inference: { standard_errors: ${declared(kind)} }`), carsData),
    );
    for (const name of ['origin', 'weight × origin']) {
      const found = term(model, name).joint_f!;
      const figure = figures.cars.joint[kind][name];
      agree(name, found.statistic, figure.statistic);
      agree(name, found.p_value, figure.p_value, 1e-8);
      expect([found.df1, found.df2]).toEqual([figure.df1, figure.df2]);
    }
  });

  test('not compared, and too many to list', async () => {
    const none = modelOf(await runText(carsStudy('inference: { level_comparisons: none }'), carsData));
    expect(term(none, 'origin').level_means!.comparisons).toBeNull();
    const n = 64;
    const columns = {
      y: Array.from({ length: n }, (_, i) => ((i * 7919) % 101) / 10),
      k: Array.from({ length: n }, (_, i) => `L${String(i % 16).padStart(2, '0')}`),
    };
    const { level_means: many } = term(modelOf(await runText(studyOf(columns, ''), csv(columns))), 'k');
    expect(many!.means.length).toBe(16);
    expect(many!.comparisons).toMatchObject({
      pairs: [],
      omitted: 'The 16 levels make 120 pairs; they are listed for up to 15 levels.',
    });
  });

  test('on a logarithmic scale, the own scale beside', async () => {
    const study = carsStudy('').replace('response: economy', 'response: { variable: economy, scale: log }');
    const { means } = term(modelOf(await runText(study, carsData)), 'origin').level_means!;
    for (const { estimate, lower, upper, own } of means) {
      agree('estimate', own!.estimate, Math.exp(estimate));
      agree('lower', own!.lower, Math.exp(lower!));
      agree('upper', own!.upper, Math.exp(upper!));
    }
  });
});

describe('predictions', () => {
  test.each(['hc3', 'by model_year'])(
    'the mean by the declared covariance, a new row with the classical s² beside: %s',
    async (kind) => {
      const ran = await runText(
        carsStudy(`inference: { standard_errors: ${declared(kind)} }
predict:
  interval: 0.9
  rows: [{ label: A, weight: 2100, horsepower: 68, first_sold: 1982-07-01, origin: Japan }]`),
        carsData,
      );
      const figure = figures.cars.prediction[kind];
      for (const key of ['estimate', 'mean_lower', 'mean_upper', 'lower', 'upper'] as const)
        agree(key, ran.record!.predictions[0]![key], figure[key]);
      expect(modelOf(ran).standard_errors!.sentence).toContain('add the classical s²');
    },
  );
});

/** What a declaration of standard errors can be told about, and how little data is borne. */
import { describe, expect, test } from 'vitest';
import { candidateCovariances } from '../../src/engine/candidate-covariances.ts';
import { factorExtended } from '../../src/engine/factor.ts';
import { fitCandidate } from '../../src/engine/fit-candidate.ts';
import type { Sample } from '../../src/prepare/sample.ts';
import type { Problem } from '../../src/problem.ts';
import { testModel, variable } from '../engine/models.ts';
import { studyWith } from '../select/study-with.ts';
import { type Columns, csv, modelOf, runText, studyOf } from './run-text.ts';

const n = 24;
const x = Array.from({ length: n }, (_, i) => ((i * 7919) % 97) / 10);
const y = x.map((each, i) => 2 + each + (((i * 104729) % 89) - 44) / 30);
const group = Array.from({ length: n }, (_, i) => ['u', 'v', 'w'][i % 3]!);
const place = Array.from({ length: n }, (_, i) => `p${i % 5}`);
const CLUSTERED = 'inference: { standard_errors: { clustered_by: group } }';

async function run(columns: Columns, rest: string, terms?: string) {
  return runText(studyOf(columns, rest, terms), csv(columns));
}

describe('clusters', () => {
  test('one cluster is an error at its place, also for check', async () => {
    const { record, problems } = await run({ y, x, group: group.map(() => 'u') }, CLUSTERED, 'x');
    expect(record).toBeNull();
    expect(problems).toEqual([
      {
        code: 'clusters_too_few',
        severity: 'error',
        place: expect.objectContaining({ kind: 'source', line: 13 }),
        message:
          'group has one value in all 24 rows used: with a single cluster nothing can be told of how clusters differ.',
        hint: 'Name a variable that puts the rows into several clusters, or declare other standard errors.',
      },
    ]);
  });

  test('a row without a cluster is lost under a reason', async () => {
    const { record } = await run(
      { y, x, group: group.map((each, i) => (i === 4 ? '' : each)) },
      CLUSTERED,
      'x',
    );
    expect(record!.data.rows_used).toBe(n - 1);
    expect(record!.data.left_out).toEqual([
      { because: 'missing group', kind: 'missing', rows: 1, variable: 'group', missing_any: 1 },
    ]);
  });

  test('more coefficients than clusters, and a term of as many columns as clusters', async () => {
    const ran = await run({ y, x, group, place }, CLUSTERED, 'x, place');
    const model = modelOf(ran);
    expect(model.standard_errors).toMatchObject({ kind: 'clustered', clusters: 3, df: 2 });
    expect(model.standard_errors!.cautions).toEqual([
      'group makes 3 clusters for 6 coefficients: no more than 2 of them can be tested together, and every standard error rests on little.',
    ]);
    expect(ran.record!.warnings).toContainEqual({
      about: 'standard errors',
      text: model.standard_errors!.cautions[0],
    });
    const [ofX, ofPlace] = model.terms;
    expect(ofX!.joint_f).toMatchObject({ df1: 1, df2: 2 });
    expect(ofPlace!.joint_f).toBeNull();
    expect(ran.record!.candidates[0]!.coefficients.every(({ standard_error }) => standard_error! > 0)).toBe(
      true,
    );
  });

  test('a rule about p-values refuses what cannot be tested', async () => {
    const { record } = await run(
      { y, x, group, place },
      `${CLUSTERED}\nselection: { admit: { p_value: { at_most: 0.9 } } }`,
      'x, place',
    );
    expect(record!.candidates[0]!.refused_because).toEqual([
      'The coefficients of place cannot be tested together with the declared standard errors.',
    ]);
  });

  test('levels that are the clusters', async () => {
    const model = modelOf(await run({ y, x, group }, CLUSTERED, 'x, group'));
    expect(model.standard_errors!.cautions.at(-1)).toMatch(/^The levels of group are the clusters/);
  });

  test('few clusters', async () => {
    const model = modelOf(
      await run({ y, x, place }, 'inference: { standard_errors: { clustered_by: place } }', 'x'),
    );
    expect(model.standard_errors!.cautions).toEqual([
      'place makes only 5 clusters: standard errors from so few tend to be too small.',
    ]);
  });
});

describe('lags', () => {
  const study = (lags: number) =>
    studyOf({ y, x, t: x }, `inference: { standard_errors: { hac_lags: ${lags} } }`, 'x').replace(
      'file: data.csv',
      'file: data.csv\n  time: t',
    );
  const t = Array.from({ length: n }, (_, i) => (i * 5) % n);

  test('as many as rows are an error at their place', async () => {
    const { problems } = await runText(study(n), csv({ y, x, t }));
    expect(problems).toEqual([
      {
        code: 'lags_too_many',
        severity: 'error',
        place: expect.objectContaining({ kind: 'source', line: 14 }),
        message: 'inference.standard_errors.hac_lags is 24, but there are only 24 rows.',
        hint: 'Write auto, or a number that is small beside the number of rows.',
      },
    ]);
  });

  test('rows out of time order, and repeated times', async () => {
    const order = Array.from({ length: n }, (_, i) => i).sort((a, b) => t[a]! - t[b]!);
    const pick = (values: readonly number[]) => order.map((i) => values[i]!);
    const shuffled = modelOf(await runText(study(3), csv({ y, x, t })));
    const sorted = modelOf(await runText(study(3), csv({ y: pick(y), x: pick(x), t: pick(t) })));
    shuffled.covariance!.flat().forEach((value, k) => {
      expect(value).toBeCloseTo(sorted.covariance!.flat()[k]!, 12);
    });
    const repeated = modelOf(
      await runText(study(3), csv({ y, x, t: t.map((each) => Math.floor(each / 4)) })),
    );
    expect(repeated.covariance!.flat().every(Number.isFinite)).toBe(true);
  });

  test('one fewer than rows', async () => {
    const model = modelOf(await runText(study(n - 1), csv({ y, x, t })));
    expect(model.covariance!.flat().every(Number.isFinite)).toBe(true);
  });
});

describe('too much work', () => {
  const data = { x, z: x.map((_, i) => (i * 31) % 7), y };
  const model = testModel(
    data,
    [variable('x'), variable('z')],
    [
      [0, 1],
      [0, 1, 2],
    ],
  );
  const factor = factorExtended(model.rows);
  const fits = model.design.candidates.map((candidate) => fitCandidate(factor, candidate, model.facts));
  const sample = { rowCount: n, columns: new Map(), timeOrder: null } as unknown as Sample;
  const study = (pValue: { atMost: number } | null) => {
    const plain = studyWith({ admit: { pValue } });
    return { ...plain, inference: { ...plain.inference, standardErrors: { kind: 'hc3' as const } } };
  };

  test('is an error where admission rests on it, else left out', () => {
    const problems: Problem[] = [];
    const report = (problem: Problem) => problems.push(problem);
    expect(candidateCovariances(study(null), sample, fits, model.rows, report, 100)).toEqual([null, null]);
    expect(problems).toEqual([]);
    candidateCovariances(study({ atMost: 0.1 }), sample, fits, model.rows, report, 100);
    expect(problems.map(({ code, severity, message }) => [code, severity, message])).toEqual([
      [
        'standard_errors_costly',
        'error',
        'selection.admit.p_value needs a pass over 24 rows for each of 2 candidates, because inference.standard_errors is not classical: more work than a run is to take.',
      ],
    ]);
  });

  test('is taken within the budget', () => {
    const found = candidateCovariances(study({ atMost: 0.1 }), sample, fits, model.rows, () => {}, n * 13);
    expect(found.map((each) => each?.kind)).toEqual(['hc3', 'hc3']);
  });
});

describe('little data', () => {
  test.each(['hc0', 'hc4', '{ clustered_by: group }'])('a fit that leaves no error: %s', async (kind) => {
    const columns = { y: [1, 2, 3, 4, 5, 6], x: [1, 2, 3, 4, 5, 6], group: ['u', 'v', 'u', 'v', 'u', 'v'] };
    const model = modelOf(
      await run(
        columns,
        `inference: { standard_errors: ${kind}, simultaneous: scheffe, hypotheses: [{ name: A, combination: { x: 1 } }] }\nselection: { rank_by: adjusted_r_squared }`,
        'x',
      ),
    );
    expect(model.covariance).toBeNull();
    expect(model.standard_errors).toMatchObject({ df: null, cautions: [] });
    expect(model.inference!.simultaneous).toBeNull();
    expect(model.inference!.hypotheses[0]).toMatchObject({ test: null, t: null });
    expect(model.inference!.coefficients[1]).toMatchObject({ partial_correlation: null });
  });

  test('the mean alone', async () => {
    const model = modelOf(await run({ y, x }, 'inference: { standard_errors: hc3 }', ''));
    const mean = y.reduce((sum, each) => sum + each, 0) / n;
    // HC3 of a mean: Σ e²/(1 − 1/n)² over n².
    const variance = y.reduce((sum, each) => sum + (each - mean) ** 2, 0) / (1 - 1 / n) ** 2 / n ** 2;
    expect(model.covariance![0]![0]).toBeCloseTo(variance, 14);
  });
});

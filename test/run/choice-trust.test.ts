/** What the study asks about its own choice, in whole runs of invented rows. */
import { describe, expect, test } from 'vitest';
import type { Problem } from '../../src/problem.ts';
import type { StudyRecord } from '../../src/record/record.ts';
import { recordFaults } from '../../src/record/record-faults.ts';
import { recordText } from '../../src/record/record-text.ts';
import { csvOf, runText } from './run-text.ts';

/** Invented rows of y on a and b in four vessels over n days; from a small generator. */
function rowsOf(n: number, seed = 5): Record<string, (number | string)[]> {
  let state = seed;
  const next = () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return state / 2 ** 32 - 0.5;
  };
  const data: Record<string, (number | string)[]> = { day: [], y: [], a: [], b: [], c: [], vessel: [] };
  for (let i = 0; i < n; i++) {
    const [a, b, c] = [next() * 6, next() * 4, next()];
    data.day!.push(i + 1);
    data.a!.push(a);
    data.b!.push(b);
    data.c!.push(c);
    data.vessel!.push(['Skerry', 'Tern', 'Holm', 'Ness'][Math.floor((next() + 0.5) * 4)]!);
    data.y!.push(20 + a + 0.5 * b + next() * 2);
  }
  return data;
}

const study = (selection: string, candidates?: string): string => `plumbrule: 1
title: Invented
data:
  file: rows.csv
  time: day
  variables:
    day: { type: integer }
    y: { type: number }
    a: { type: number }
    b: { type: number }
    c: { type: number }
    vessel: { type: category, levels: [Skerry, Tern, Holm, Ness] }
response: y
candidates:
${candidates ?? '  - { name: One, terms: [a] }\n  - { name: Two, terms: [a, b] }\n  - { name: Three, terms: [a, b, c] }'}
selection: ${selection}
`;

const PREDICT = `predict:
  rows:
    - { label: There, a: 1, b: 2, c: 0.3 }
`;

async function run(
  selection: string,
  data = rowsOf(60),
  candidates?: string,
): Promise<{ record: StudyRecord; problems: readonly Problem[] }> {
  const text = study(selection, candidates) + (candidates === undefined ? PREDICT : '');
  const { record, problems } = await runText(text, { 'rows.csv': csvOf(data) });
  expect(problems.filter(({ severity }) => severity === 'error')).toEqual([]);
  expect(recordFaults(record!)).toEqual([]);
  return { record: record!, problems };
}

async function faults(
  selection: string,
  data = rowsOf(60),
  candidates?: string,
): Promise<readonly Problem[]> {
  const { record, problems } = await runText(study(selection, candidates), { 'rows.csv': csvOf(data) });
  expect(record).toBeNull();
  return problems;
}

test('a study that does not ask has none of it in its record', async () => {
  const { record } = await run('{ rank_by: bic }');
  expect(Object.keys(record.selection)).toEqual([
    'rank_by',
    'prefer_smaller_within',
    'significance',
    'admission',
    'ranking',
    'chosen',
    'because',
  ]);
  expect(record.candidates[0]).not.toHaveProperty('validation');
  expect(record.selection.ranking.reduce((sum, { evidence }) => sum + evidence!, 0)).toBeCloseTo(1, 12);
});

test('everything at once gives the same bytes again', async () => {
  const all =
    '{ rank_by: aicc, validation: { repeats: 2 }, honest_error: { folds: 5 }, hold_out: { share: 0.2 }, stability: { repetitions: 50 }, average: true }';
  const [first, second] = [await run(all), await run(all)];
  expect(recordText(first.record)).toBe(recordText(second.record));
  const { selection } = first.record;
  expect(selection.validation).toMatchObject({
    by: 'rows',
    folds: 10,
    repeats: 2,
    seed: 1,
    rows_left_out: 0,
  });
  expect(selection.honest_error!.sentence).toContain('predicts rows that it has not seen');
  expect(selection.stability!.candidates.reduce((sum, { chosen }) => sum + chosen, 0)).toBe(50);
  expect(selection.hold_out).toMatchObject({ rows: 12, rows_not_predicted: 0, with_interval: 12 });
  expect(selection.averaged!.predictions.map(({ label }) => label)).toEqual(['There']);
  expect(first.problems).toEqual([]);
  const elsewhere = await run(
    all.replace('validation: { repeats: 2 }', 'validation: { repeats: 2, seed: 9 }'),
  );
  expect(elsewhere.record.candidates[0]!.validation!.mean_squared_error).not.toBe(
    first.record.candidates[0]!.validation!.mean_squared_error,
  );
});

test('averaged predictions lie between those of the candidates, and agree with the coefficients', async () => {
  const { record } = await run('{ rank_by: aicc, average: true }');
  const { averaged } = record.selection;
  const b = new Map(averaged!.coefficients.map(({ name, estimate }) => [name, estimate]));
  const by = b.get('intercept')! + b.get('a')! + 2 * b.get('b')! + 0.3 * b.get('c')!;
  expect(averaged!.predictions[0]!.estimate).toBeCloseTo(by, 10);
  expect(averaged!.predictions[0]!.lower!).toBeLessThan(by);
});

test('an averaged interval that leaves the image of the scale ends where a plain one does', async () => {
  const rows = rowsOf(60);
  const data = { ...rows, y: rows.a!.map((a, i) => (Number(a) / 3 + 1 + Number(rows.c![i]) * 2) ** 2) };
  const text = `${study('{ rank_by: aicc, average: true }').replace('response: y', 'response: { variable: y, scale: sqrt }')}predict:
  rows:
    - { label: Near nought, a: -4, b: 0, c: 0 }
`;
  const { record } = await runText(text, { 'rows.csv': csvOf(data) });
  const [averaged] = record!.selection.averaged!.predictions;
  expect(record!.predictions[0]!.mean_lower).toBe(0);
  expect(averaged!.lower).toBe(0);
  expect(averaged!.upper).toBeGreaterThan(averaged!.estimate);
});

test('a stated row that only some of the candidates can predict has no averaged prediction', async () => {
  const data = rowsOf(60);
  data.vessel = data.vessel!.map((vessel) => (vessel === 'Ness' ? 'Tern' : vessel));
  const text = `${study('{ rank_by: bic, average: true }', '  - { name: One, terms: [a, b] }\n  - { name: By vessel, terms: [a, b, vessel] }')}predict:
  rows: [{ label: New ship, a: 1, b: 2, vessel: Ness }, { label: Old ship, a: 1, b: 2, vessel: Tern }]
`;
  const { record, problems } = await runText(text, { 'rows.csv': csvOf(data) });
  expect(record!.selection.chosen).toBe('One');
  expect(record!.selection.averaged!.predictions.map(({ label }) => label)).toEqual(['Old ship']);
  expect(problems).toMatchObject([
    {
      code: 'prediction_value_missing',
      severity: 'warning',
      message: expect.stringContaining('"New ship" has no averaged prediction'),
    },
  ]);
});

test('the fewest coefficients within one standard error', async () => {
  const { record } = await run(
    '{ rank_by: cross_validation, one_standard_error: true, validation: { folds: 6 } }',
  );
  const value = new Map(record.selection.ranking.map((one) => [one.candidate, one.value!]));
  const best = record.candidates.reduce((a, b) => (value.get(a.name)! <= value.get(b.name)! ? a : b));
  const reach = value.get(best.name)! + best.validation!.standard_error!;
  const within = record.candidates.filter(({ name }) => value.get(name)! <= reach);
  const fewest = within.reduce((a, b) => (a.coefficient_count <= b.coefficient_count ? a : b));
  expect(record.selection.chosen).toBe(fewest.name);
  expect(record.selection.one_standard_error).toBe(true);
  if (fewest !== best) expect(record.selection.because).toContain('one standard error');
});

describe('rows set aside', () => {
  test('by a condition, which need not be of a variable that is fitted', async () => {
    const { record } = await run('{ hold_out: { where: \'vessel == "Ness"\' } }');
    const ness = rowsOf(60).vessel!.filter((vessel) => vessel === 'Ness').length;
    expect(record.selection.hold_out).toMatchObject({ rule: 'vessel == "Ness"', rows: ness });
    expect(record.data.rows_used).toBe(60 - ness);
  });

  test('a level that only they have cannot be predicted, and is counted', async () => {
    const data = rowsOf(60);
    data.vessel = data.vessel!.map((vessel, i) => (i === 59 ? 'Ness' : vessel === 'Ness' ? 'Tern' : vessel));
    const { record } = await run(
      '{ hold_out: { last: 10 } }',
      data,
      '  - { name: By vessel, terms: [a, b, vessel] }',
    );
    expect(record.selection.hold_out).toMatchObject({ rows: 10, rows_not_predicted: 1, with_interval: 9 });
  });

  test.each([
    ['where: "a > 1000"', 'sets aside none of the 60 rows'],
    ['where: "a < 1000"', 'sets aside all of the 60 rows'],
    ['share: 0.001', 'sets aside none'],
    ['last: 60', 'sets aside all'],
  ])('hold_out_nothing: %s', async (rule, says) => {
    const problems = await faults(`{ hold_out: { ${rule} } }`);
    expect(problems).toMatchObject([{ code: 'hold_out_nothing', severity: 'error' }]);
    expect(problems[0]!.message.replace('\u00a0', ' ')).toContain(says);
  });

  test('a condition without a finite value sets nothing aside and says so', async () => {
    const { record, problems } = await run('{ hold_out: { where: "log(a) > 0.5" } }');
    expect(problems).toMatchObject([{ code: 'value_not_finite', severity: 'warning' }]);
    expect(problems[0]!.message).toContain('it sets none of them aside');
    expect(record.selection.hold_out!.rows).toBe(
      rowsOf(60).a!.filter((a) => Number(a) > Math.exp(0.5)).length,
    );
  });

  test('no figures where none was chosen', async () => {
    const { record } = await run(
      '{ hold_out: { last: 10 }, admit: { adjusted_r_squared: { at_least: 0.9999 } } }',
    );
    expect(record.selection.chosen).toBeNull();
    expect(record.selection.hold_out).toMatchObject({ rows: 10, mean_error: null, inside: null });
  });
});

describe('choosing on one part and estimating on the other', () => {
  test('candidates are of the one, the model of the other, and together they are all rows', async () => {
    const { record } = await run('{ split_sample: { share: 0.4, seed: 3 } }');
    const split = record.selection.split_sample!;
    expect(split).toMatchObject({ share: 0.4, seed: 3, rows_choosing: 24, rows_estimating: 36 });
    expect(record.candidates.map(({ rows }) => rows)).toEqual([24, 24, 24]);
    expect(record.model!.rows).toBe(36);
    expect(split.estimated!.name).toBe(record.selection.chosen);
    expect(split.estimated!.rows).toBe(36);
    expect(record.model!.columns.map(({ estimate }) => estimate)).toEqual(
      split.estimated!.coefficients.map(({ estimate }) => estimate),
    );
    const chosen = record.candidates.find(({ name }) => name === record.selection.chosen)!;
    expect(chosen.coefficients[1]!.estimate).not.toBe(split.estimated!.coefficients[1]!.estimate);
    expect(record.data.rows_used).toBe(60);
  });

  test('split_too_small: a part of one row, or too few rows for the chosen candidate', async () => {
    expect(await faults('{ split_sample: { share: 0.99 } }')).toMatchObject([
      { code: 'split_too_small', message: expect.stringMatching(/leaves 1\srow for estimating, of 60/) },
    ]);
    expect(await faults('{ split_sample: { share: 0.95 } }')).toMatchObject([
      { code: 'split_too_small', message: expect.stringMatching(/leaves 3\srows for estimating/) },
    ]);
  });

  test('a level that one part lacks', async () => {
    const data = rowsOf(60);
    data.vessel = data.vessel!.map((_, i) => (i === 0 ? 'Tern' : 'Skerry'));
    const either = await Promise.all(
      [1, 2, 3, 4].map((seed) =>
        run(
          `{ split_sample: { seed: ${seed} } }`,
          data,
          '  - { name: By vessel, terms: [a, b, vessel] }\n  - { name: By vessel too, terms: [a, c, vessel] }',
        ),
      ),
    );
    // Of the part that lacks the level it is said, whichever it is.
    for (const { problems } of either)
      expect(problems.map(({ code }) => code).join()).toMatch(/predictor_constant|columns_dependent/);
    expect(either.flatMap(({ problems }) => problems.map(({ message }) => message)).join(' ')).toContain(
      'so it is estimated without that column',
    );
  });
});

describe('folds that cannot be had', () => {
  test('folds_too_many', async () => {
    expect(await faults('{ validation: { folds: 61 } }')).toMatchObject([
      { code: 'folds_too_many', place: { line: 18 } },
    ]);
    expect(await faults('{ honest_error: { by: group, group: vessel, folds: 5 } }')).toMatchObject([
      { code: 'folds_too_many' },
    ]);
  });

  test('origin_too_late', async () => {
    expect(await faults('{ validation: { by: time, start: 60 } }')).toMatchObject([
      { code: 'origin_too_late' },
    ]);
  });

  test('fold_unpredictable: which level, in which fold, and what was done', async () => {
    const data = rowsOf(60);
    data.vessel = data.vessel!.map((vessel, i) => (i === 7 ? 'Ness' : vessel === 'Ness' ? 'Tern' : vessel));
    const candidates = '  - { name: One, terms: [a] }\n  - { name: By vessel, terms: [a, vessel] }';
    const { record, problems } = await run('{ rank_by: cross_validation }', data, candidates);
    expect(problems).toMatchObject([{ code: 'fold_unpredictable', severity: 'warning' }]);
    expect(problems[0]!.message.replaceAll('\u00a0', ' ')).toMatch(
      /^Without fold \d+ the coefficient of vessel Ness cannot be estimated, so that 1 held-out row cannot be predicted by By vessel: they count in no candidate’s cross-validated error\.$/,
    );
    expect(record.selection.validation).toMatchObject({
      rows_left_out: 1,
      losses: [{ coefficient: 'vessel Ness', rows: 1, candidates: ['By vessel'] }],
    });
    expect(record.candidates.map(({ validation }) => validation!.rows)).toEqual([59, 59]);
    const one = await run(
      '{ rank_by: cross_validation, validation: { by: leave_one_out } }',
      data,
      candidates,
    );
    expect(one.problems[0]!.message).toContain(
      'Held out, line 9 cannot be predicted from the other rows by By vessel',
    );
  });

  test('criterion_undefined where no candidate can be validated', async () => {
    const problems = await faults(
      '{ rank_by: cross_validation, validation: { by: group, group: vessel } }',
      rowsOf(60),
      '  - { name: By vessel, terms: [a, vessel] }\n  - { name: By vessel too, terms: [b, vessel] }',
    );
    expect(problems.map(({ code }) => code)).toContain('criterion_undefined');
  });
});

test('a rolling origin, groups and blocks in one study', async () => {
  const { record } = await run(
    '{ validation: { by: time, start: 20, horizon: 5 }, honest_error: { by: group, group: vessel }, stability: { by: blocks, block_length: 6, repetitions: 40 } }',
  );
  expect(record.selection.validation).toMatchObject({
    by: 'time',
    folds: 8,
    start: 20,
    horizon: 5,
    seed: null,
  });
  expect(record.candidates[0]!.validation!.rows).toBe(40);
  expect(record.selection.honest_error).toMatchObject({ by: 'group', folds: 4, group: 'vessel', seed: 1 });
  expect(record.selection.stability).toMatchObject({ by: 'blocks', units: 10, block_length: 6 });
});

test('progress of long work is told', async () => {
  const { mkdtemp, rm, writeFile } = await import('node:fs/promises');
  const { tmpdir } = await import('node:os');
  const { join } = await import('node:path');
  const { runStudy } = await import('../../src/run/run-study.ts');
  const folder = await mkdtemp(join(tmpdir(), 'plumbrule-'));
  try {
    await writeFile(join(folder, 'study.yaml'), study('{ validation: {}, honest_error: {}, stability: {} }'));
    await writeFile(join(folder, 'rows.csv'), csvOf(rowsOf(60)));
    const stages = new Set<string>();
    await runStudy(join(folder, 'study.yaml'), { onProgress: (stage) => stages.add(stage) });
    expect([...stages]).toEqual(
      expect.arrayContaining([
        'cross-validating candidates',
        'choosing without each fold',
        'choosing from rows drawn anew',
      ]),
    );
  } finally {
    await rm(folder, { recursive: true });
  }
});

test('the report and the tables speak of the model as it is estimated, and of the rows of each part', async () => {
  const { record } = await run('{ split_sample: { share: 0.4, seed: 3 } }');
  const { estimatedCandidate } = await import('../../src/report/words/estimated.ts');
  const { coefficientsTable } = await import('../../src/record/tables.ts');
  expect(estimatedCandidate(record)).toBe(record.selection.split_sample!.estimated);
  expect(record.selection.because).toContain(
    'The choice was made on 24 rows; the chosen model is estimated from the other 36, which had no part in it.',
  );
  const slope = record.model!.columns[1]!.estimate;
  expect(coefficientsTable(record)).toContain(`,${slope},`);
});

test('a choice that is no better than the mean is among the warnings', async () => {
  const data = rowsOf(40);
  // Noise alone: y of other rows.
  data.y = data.y!.map((_, i) => data.c![(i * 17 + 5) % 40]!);
  const { record } = await run('{ rank_by: adjusted_r_squared, honest_error: {} }', data);
  expect(record.selection.honest_error!.gain.value).toBeLessThan(
    record.selection.honest_error!.gain.standard_error!,
  );
  expect(record.warnings).toContainEqual({
    about: 'the choice',
    text: record.selection.honest_error!.sentence,
  });
});

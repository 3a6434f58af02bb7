/** The examination block of a study, from its text to the record. */
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, test } from 'vitest';
import { recordText } from '../../src/record/record-text.ts';
import { runStudy } from '../../src/run/run-study.ts';
import { uniform } from '../select/any-problem.ts';

const folder = mkdtempSync(join(tmpdir(), 'examination-'));
afterAll(() => rmSync(folder, { recursive: true }));

const next = uniform(2024);
const months = Array.from({ length: 48 }, (_, i) => {
  const date = new Date(Date.UTC(2020, i, 1)).toISOString().slice(0, 10);
  const a = next() * 10;
  // The slope doubles half-way.
  const y = 20 + (i < 24 ? 1 : 2) * a + next();
  return `m${i},${date},${y},${a},${i % 5 === 0 ? '' : next()}`;
});
writeFileSync(join(folder, 'data.csv'), ['id,month,y,a,b', ...months].join('\n'));

async function run(examination: string, predict = '') {
  const path = join(folder, 'study.yaml');
  writeFileSync(
    path,
    `plumbrule: 1
title: A study
data:
  file: data.csv
  row_id: id
  time: month
  variables:
    id: { type: identifier }
    month: { type: date }
    y: { type: number }
    a: { type: number }
    b: { type: number }
response: y
candidates:
  - name: One
    terms: [a]
  - name: Two
    terms: [a, { power: a, to: 2 }]
${examination}
${predict}
`,
  );
  const progress: string[] = [];
  const result = await runStudy(path, { onProgress: (stage) => progress.push(stage) });
  expect(result.problems).toEqual([]);
  return { record: result.record!, progress };
}

describe('examination', () => {
  test('lags, split and bootstrap come into force and into the record', async () => {
    const { record, progress } = await run(
      `examination:
  lags: 3
  split_at: { variable: month, value: 2022-01-01 }
  bootstrap: { repetitions: 199, seed: 3, by: blocks, block_length: 6 }`,
      'predict: { rows: [{ label: Here, a: 5 }] }',
    );
    const found = (name: string) => record.examination!.findings.find((finding) => finding.name === name)!;
    expect(found('serial_correlation').df).toEqual([3]);
    expect(found('same_in_both_parts').concern).toBe(2);
    expect(found('same_in_both_parts').verdict).toContain(
      '24 rows below month 2022-01-01 and 24 from there on',
    );
    const bootstrap = record.examination!.bootstrap!;
    expect(bootstrap).toMatchObject({ by: 'blocks', repetitions: 199, used: 199, seed: 3, block_length: 6 });
    expect(bootstrap.coefficients.map(({ name }) => name)).toEqual(
      record.model!.columns.map(({ name }) => name),
    );
    expect(bootstrap.predictions.map(({ label }) => label)).toEqual(['Here']);
    expect(bootstrap.note).toBeNull();
    expect(progress).toContain('drawing rows again');
    const [first] = record.examination!.before_you_rely!;
    expect(first).toMatchObject({ about: 'constancy', finding: 'same_in_both_parts', concern: 2 });
    expect(record.study.settings).toContainEqual({ key: 'examination.lags', value: '3', written: true });
    const again = await run(
      `examination:
  lags: 3
  split_at: { variable: month, value: 2022-01-01 }
  bootstrap: { repetitions: 199, seed: 3, by: blocks, block_length: 6 }`,
      'predict: { rows: [{ label: Here, a: 5 }] }',
    );
    expect(recordText(again.record)).toBe(recordText(record));
  });

  test('without the block: a season of months, no split, no bootstrap', async () => {
    const { record, progress } = await run('');
    const { findings, bootstrap, influential_rows: rows, choice_omitted: omitted } = record.examination!;
    expect(findings.find(({ name }) => name === 'serial_correlation')!.df).toEqual([12]);
    expect(findings.map(({ name }) => name)).not.toContain('same_in_both_parts');
    expect(bootstrap).toBeNull();
    expect(progress).not.toContain('drawing rows again');
    expect(omitted).toBeNull();
    expect(rows).toHaveLength(10);
    for (const row of rows) {
      expect(['One', 'Two']).toContain(row.without!.chosen);
      expect(row.without!.coefficients).toHaveLength(record.model!.columns.length);
    }
  });

  test('rows that lack the variable of the split are fitted all the same', async () => {
    const { record } = await run('examination: { split_at: { variable: b, value: 0.5 } }');
    expect(record.data.rows_used).toBe(48);
    const found = record.examination!.findings.find(({ name }) => name === 'same_in_both_parts')!;
    expect(found.verdict).toBe('b is missing in some of the rows, so they cannot be split.');
  });
});

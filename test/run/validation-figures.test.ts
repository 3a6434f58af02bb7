/** Whole runs against fits made again without the rows held out: see test/reference/validation/README.md. */
import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { expect, test } from 'vitest';
import type { RecordCandidate, StudyRecord } from '../../src/record/record.ts';
import { recordFaults } from '../../src/record/record-faults.ts';
import { runText } from './run-text.ts';

const reference = (name: string) =>
  readFileSync(fileURLToPath(new URL(`../reference/${name}`, import.meta.url)), 'utf8');

type Validation = NonNullable<RecordCandidate['validation']>;

const figures = JSON.parse(reference('validation/cars.json')) as {
  schemes: Record<string, Record<string, Validation | null>>;
  honest_error: { choices: Record<string, number>; procedure: number; mean: number };
  hold_out: {
    chosen: string;
    mean_error: number;
    root_mean_squared_error: number;
    mean_bias_percent: number;
  };
};
const cars = reference('cars/cars.csv');

const CANDIDATES = {
  Numbers: '{ terms: [weight, horsepower, model_year] }',
  Curved: '{ terms: [{ polynomial: weight, degree: 2 }, horsepower, model_year] }',
  Weight: '{ terms: [weight] }',
  Origin: '{ terms: [weight, horsepower, model_year, origin] }',
  'Numbers, log': '{ terms: [weight, horsepower, model_year], scale: log }',
  'Numbers, root': '{ terms: [weight, horsepower, model_year], scale: sqrt }',
};

async function run(selection: string, names = Object.keys(CANDIDATES), weights = '~'): Promise<StudyRecord> {
  const study = `plumbrule: 1
title: Cars
data:
  file: cars.csv
  time: first_sold
  variables:
    first_sold: { type: date }
    economy: { type: number }
    weight: { type: number }
    horsepower: { type: number }
    acceleration: { type: number }
    origin: { type: category, levels: [USA, Europe, Japan] }
derive:
  model_year: { expression: year(first_sold) }
response: economy
weights: ${weights}
candidates:
${names.map((name) => `  - ${CANDIDATES[name as keyof typeof CANDIDATES].replace('{', `{ name: "${name}",`)}`).join('\n')}
selection: ${selection}
`;
  const { record, problems } = await runText(study, { 'cars.csv': cars });
  expect(problems.filter(({ severity }) => severity === 'error')).toEqual([]);
  expect(recordFaults(record!)).toEqual([]);
  return record!;
}

function agree(what: string, found: number | null | undefined, wanted: number, share = 1e-9): void {
  const off = Math.abs(found! - wanted) / Math.abs(wanted);
  expect(off <= share, `${what}: ${found} instead of ${wanted}, off by ${off}`).toBe(true);
}

const SCHEMES = {
  rows: '{ folds: 10, repeats: 2, seed: 5 }',
  group: '{ by: group, group: origin }',
  time: '{ by: time, start: 4, horizon: 2 }',
  leave_one_out: '{ by: leave_one_out }',
};

test.each(Object.keys(SCHEMES).flatMap((scheme) => [[scheme, false] as const, [scheme, true] as const]))(
  'cross-validated errors: %s, weighted: %s',
  async (scheme, weighted) => {
    const plan = SCHEMES[scheme as keyof typeof SCHEMES];
    const record = await run(
      `{ rank_by: cross_validation, validation: ${plan} }`,
      undefined,
      weighted ? 'acceleration' : '~',
    );
    const wanted = figures.schemes[`${scheme}${weighted ? ', weighted' : ''}`]!;
    for (const candidate of record.candidates) {
      const own = wanted[candidate.name];
      if (own === null || own === undefined) {
        expect(candidate.validation).toBeNull();
        expect(candidate.validation_omitted).toContain('cannot be predicted by it without themselves');
        expect(candidate.admitted).toBe(false);
        continue;
      }
      for (const key of Object.keys(own) as (keyof Validation)[]) {
        // A mean error is a small rest of errors of either sign: it is held against their size.
        if (key === 'mean_error' || key === 'mean_bias_percent') {
          const size = key === 'mean_error' ? own.root_mean_squared_error : own.cv_rmse_percent!;
          expect(Math.abs(candidate.validation![key]! - own[key]!)).toBeLessThan(1e-11 * size);
        } else agree(`${candidate.name}, ${key}`, candidate.validation![key], own[key]!);
      }
    }
    const best = Object.entries(wanted)
      .filter(([, own]) => own !== null)
      .sort(([, a], [, b]) => a!.mean_squared_error - b!.mean_squared_error)[0]![0];
    expect(record.selection.chosen).toBe(best);
    agree('ranking', record.selection.ranking[0]!.value, wanted[best]!.mean_squared_error);
  },
);

test('the error of choosing and fitting, and the choices made', async () => {
  const record = await run('{ rank_by: aicc, honest_error: { folds: 8, seed: 3 } }', [
    'Numbers',
    'Curved',
    'Weight',
    'Origin',
  ]);
  const { procedure, mean, choices } = figures.honest_error;
  const found = record.selection.honest_error!;
  agree('procedure', found.procedure.root_mean_squared_error, procedure);
  agree('mean', found.mean.root_mean_squared_error, mean);
  expect(Object.fromEntries(found.choices.map((one) => [one.candidate, one.folds]))).toEqual(choices);
});

test('the chosen model on the rows set aside', async () => {
  const record = await run('{ rank_by: aicc, hold_out: { last: 60 } }', [
    'Numbers',
    'Curved',
    'Weight',
    'Origin',
  ]);
  const { chosen, ...wanted } = figures.hold_out;
  const found = record.selection.hold_out!;
  expect(record.selection.chosen).toBe(chosen);
  for (const [key, value] of Object.entries(wanted)) agree(key, found[key as keyof typeof wanted], value);
  expect(record.data.rows_used).toBe(392 - 60);
  expect(record.data.left_out.at(-1)).toMatchObject({ kind: 'held_out', rows: 60 });
  expect(record.data.rows_read).toBe(
    record.data.rows_used + record.data.left_out.reduce((sum, { rows }) => sum + rows, 0),
  );
});

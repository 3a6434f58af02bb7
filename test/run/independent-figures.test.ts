/**
 * Whole runs against figures from 80-digit arithmetic that shares nothing with the program: see test/reference/cars/README.md and
 * test/reference/penguins/README.md. The first run of each study compares everything that holds between candidates; then each
 * candidate runs alone, so that the examination, the terms and the predictions of each are compared as well.
 */
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, relative } from 'node:path';
import { fileURLToPath } from 'node:url';
import { afterAll, describe, expect, test } from 'vitest';
import { parseDocument } from 'yaml';
import type { RecordCandidate, StudyRecord } from '../../src/record/record.ts';
import { runStudy } from '../../src/run/run-study.ts';

const TOLERANCE = 1e-10;
const here = fileURLToPath(new URL('../reference/', import.meta.url));
const scratch = mkdtempSync(join(tmpdir(), 'figures-'));
afterAll(() => rmSync(scratch, { recursive: true }));

interface FTest {
  statistic: number;
  df1: number;
  df2: number;
  p_value: number;
}

interface CandidateFigures {
  name: string;
  scale: string;
  coefficient_count: number;
  residual_sum_of_squares: number;
  residual_standard_error: number;
  degrees_of_freedom: number;
  r_squared: number;
  adjusted_r_squared: number;
  predicted_r_squared: number;
  press: number;
  log_likelihood: number;
  aic: number;
  aicc: number;
  bic: number;
  mallows_cp: number;
  overall_f: FTest;
  condition_number: number;
  largest_vif: number | null;
  coefficients: (Record<'estimate' | 'standard_error' | 't' | 'p_value' | 'lower' | 'upper', number> & {
    name: string;
    vif: number | null;
  })[];
  terms: {
    name: string;
    columns: string[];
    joint_f: FTest;
    generalised_vif: number | null;
    generalised_vif_per_column: number | null;
  }[];
  influential_rows: {
    row: number;
    leverage: number;
    standardised_residual: number;
    cooks_distance: number;
  }[];
  durbin_watson: number;
  breusch_pagan: { statistic: number; df: number; p_value: number } | null;
  predictions: (Record<'estimate' | 'mean_lower' | 'mean_upper' | 'lower' | 'upper' | 'leverage', number> & {
    label: string;
    mean: number | null;
  })[];
  prediction_total?: { rows: number; estimate: number; lower: number; upper: number };
}

interface Figures {
  rows: number;
  candidates: CandidateFigures[];
  partial_f: (FTest & { smaller: string; larger: string })[];
}

/** Fails with the name of the figure where the two are further apart than the tolerance, relatively. */
function agree(what: string, found: number | null | undefined, figure: number | null): void {
  if (figure === null) {
    expect(found, what).toBeNull();
    return;
  }
  expect(typeof found, what).toBe('number');
  const apart = Math.abs(found! - figure) / Math.abs(figure);
  expect(apart, `${what}: ${found}, not ${figure}`).toBeLessThanOrEqual(TOLERANCE);
}

function agreeF(
  what: string,
  found: { statistic: number | null; df1: number; df2: number; p_value: number | null } | null,
  figure: FTest,
) {
  agree(`${what}, statistic`, found?.statistic, figure.statistic);
  expect([found?.df1, found?.df2], `${what}, degrees of freedom`).toEqual([figure.df1, figure.df2]);
  agree(`${what}, p-value`, found?.p_value, figure.p_value);
}

const OF_CANDIDATE = [
  'residual_sum_of_squares',
  'residual_standard_error',
  'r_squared',
  'adjusted_r_squared',
  'predicted_r_squared',
  'press',
  'log_likelihood',
  'aic',
  'aicc',
  'bic',
  'condition_number',
  'largest_vif',
] as const;
const OF_COEFFICIENT = ['estimate', 'standard_error', 't', 'p_value', 'lower', 'upper'] as const;
const OF_PREDICTION = ['estimate', 'mean_lower', 'mean_upper', 'lower', 'upper', 'mean', 'leverage'] as const;

function agreeCandidate(found: RecordCandidate, figures: CandidateFigures): void {
  const { name } = figures;
  expect(found.coefficient_count, name).toBe(figures.coefficient_count);
  expect(found.degrees_of_freedom, name).toBe(figures.degrees_of_freedom);
  expect(found.scale, name).toBe(figures.scale);
  for (const key of OF_CANDIDATE) agree(`${name}: ${key}`, found[key], figures[key]);
  agreeF(`${name}: overall F`, found.overall_f, figures.overall_f);
  expect(found.coefficients.map((each) => each.name).sort(), name).toEqual(
    figures.coefficients.map((each) => each.name).sort(),
  );
  for (const figure of figures.coefficients) {
    const coefficient = found.coefficients.find((each) => each.name === figure.name)!;
    for (const key of OF_COEFFICIENT) {
      agree(`${name}: ${key} of ${figure.name}`, coefficient[key], figure[key]);
    }
    agree(`${name}: VIF of ${figure.name}`, coefficient.vif, figure.vif);
  }
}

/** What only the chosen model has. */
function agreeChosen(record: StudyRecord, figures: CandidateFigures, timed: boolean): void {
  const { name } = figures;
  expect(record.selection.chosen).toBe(name);
  expect(record.model!.terms.map((each) => each.name)).toEqual(figures.terms.map((each) => each.name));
  for (const figure of figures.terms) {
    const term = record.model!.terms.find((each) => each.name === figure.name)!;
    expect(term.columns, name).toEqual(figure.columns);
    agreeF(`${name}: joint F of ${figure.name}`, term.joint_f, figure.joint_f);
    agree(`${name}: generalised VIF of ${figure.name}`, term.generalised_vif, figure.generalised_vif);
    agree(`${name}: and per column`, term.generalised_vif_per_column, figure.generalised_vif_per_column);
  }
  const finding = (which: string) => record.examination!.findings.find((each) => each.name === which);
  if (timed) agree(`${name}: Durbin–Watson`, finding('independence')?.statistic, figures.durbin_watson);
  if (figures.breusch_pagan !== null) {
    agree(`${name}: Breusch–Pagan`, finding('equal_spread')?.statistic, figures.breusch_pagan.statistic);
    expect(finding('equal_spread')?.df).toEqual([figures.breusch_pagan.df]);
    agree(`${name}: Breusch–Pagan, p-value`, finding('equal_spread')?.p_value, figures.breusch_pagan.p_value);
  }
  figures.influential_rows.forEach((figure, position) => {
    const row = record.examination!.influential_rows[position]!;
    expect(row.row, `${name}: influential row ${position + 1}`).toBe(figure.row);
    for (const key of ['leverage', 'standardised_residual', 'cooks_distance'] as const) {
      agree(`${name}: ${key} of row ${figure.row}`, row[key], figure[key]);
    }
  });
  figures.predictions.forEach((figure, position) => {
    const prediction = record.predictions[position]!;
    expect(prediction.label).toBe(figure.label);
    for (const key of OF_PREDICTION)
      agree(`${name}: ${key} at ${figure.label}`, prediction[key], figure[key]);
  });
  if (figures.prediction_total !== undefined && record.prediction_total !== null) {
    for (const key of ['rows', 'estimate', 'lower', 'upper'] as const) {
      agree(`${name}: ${key} of the total`, record.prediction_total[key], figures.prediction_total[key]);
    }
  }
}

async function recordOf(study: string): Promise<StudyRecord> {
  const { record, problems } = await runStudy(study);
  expect(problems.filter((problem) => problem.severity === 'error')).toEqual([]);
  return record!;
}

/**
 * The study with one candidate only, on the rows that all its candidates share: a row with any value missing
 * is left out by a rule, since a single candidate would need fewer of them.
 */
function alone(study: string, dataFile: string, position: number): string {
  const document = parseDocument(readFileSync(study, 'utf8'));
  const candidates = document.toJS().candidates as unknown[];
  document.set('candidates', [candidates[position]]);
  document.setIn(['data', 'file'], relative(scratch, dataFile));
  const variables = Object.keys(document.toJS().data.variables as object);
  document.set(
    'leave_out',
    variables.map((name) => ({ where: `is_missing(${name})`, because: `No ${name}` })),
  );
  const file = join(scratch, 'alone.study.yaml');
  writeFileSync(file, document.toString());
  return file;
}

describe.each([
  ['cars', 'natural', true],
  ['cars', 'scales', true],
  ['cars', 'weighted', true],
  ['cars', 'through-zero', true],
  ['penguins', 'body-mass', false],
])('%s, %s', (folder, group, timed) => {
  const figures = JSON.parse(readFileSync(join(here, folder, `${group}.json`), 'utf8')) as Figures;
  const study = join(here, folder, `${group}.study.yaml`);

  test('every candidate, and what holds between them', async () => {
    const record = await recordOf(study);
    expect(record.data.rows_used).toBe(figures.rows);
    expect(record.candidates.map((each) => each.name)).toEqual(figures.candidates.map((each) => each.name));
    figures.candidates.forEach((each, position) => {
      agreeCandidate(record.candidates[position]!, each);
      agree(`${each.name}: Mallows’ Cp`, record.candidates[position]!.mallows_cp, each.mallows_cp);
    });
    const pair = (each: { smaller: string; larger: string }) => `${each.smaller} in ${each.larger}`;
    expect(record.partial_f.map(pair).sort()).toEqual(figures.partial_f.map(pair).sort());
    for (const figure of figures.partial_f) {
      agreeF(pair(figure), record.partial_f.find((each) => pair(each) === pair(figure))!, figure);
    }
    const best = [...figures.candidates].sort((a, b) => a.aicc - b.aicc).map((each) => each.name);
    expect(record.selection.ranking.map((each) => each.candidate)).toEqual(best);
  });

  test.each(figures.candidates.map((each, position) => [each.name, position] as const))(
    '%s alone',
    async (_, position) => {
      const record = await recordOf(alone(study, join(here, folder, `${folder}.csv`), position));
      agreeCandidate(record.candidates[0]!, figures.candidates[position]!);
      agreeChosen(record, figures.candidates[position]!, timed);
    },
  );
});

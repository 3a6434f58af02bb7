/** The later data file of each shipped study: what its README says of it. */
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { afterAll, describe, expect, test } from 'vitest';
import type { ComparedSide } from '../../src/compare/compare.ts';
import { renderComparison } from '../../src/report/render-comparison.ts';
import { runStudy } from '../../src/run/run-study.ts';
import { compared } from './sides.ts';

const pipelines = fileURLToPath(new URL('../../pipelines/', import.meta.url));
const scratch = mkdtempSync(join(tmpdir(), 'later-'));
afterAll(() => rmSync(scratch, { recursive: true }));

async function run(study: string, file?: string): Promise<ComparedSide> {
  const parameters = new Map(file === undefined ? [] : [['file', file]]);
  const { record, kept, problems } = await runStudy(study, { parameters });
  expect(problems.filter(({ severity }) => severity === 'error')).toEqual([]);
  return { record: record!, rows: kept!.rows, file: study };
}

async function both(name: string, file: string) {
  const study = join(pipelines, name, 'study.yaml');
  return [await run(study), await run(study, file)] as const;
}

const coefficient = (comparison: ReturnType<typeof compared>, name: string) =>
  comparison.models[0]!.coefficients.find((each) => each.name === name)!;

describe('ferry-fuel', () => {
  test('what the office did and what the yard did', async () => {
    const [before, now] = await both('ferry-fuel', 'crossings-later.csv');
    const comparison = compared(before, now);
    expect(comparison.rows).toMatchObject({ revised: 3, removed: 1, removed_rows: ['X0088'] });
    expect(comparison.rows!.revisions.map(({ id, variable }) => [id, variable])).toEqual([
      ['X0052', 'fuel'],
      ['X0171', 'fuel'],
      ['X0209', 'fuel'],
    ]);
    expect(comparison.rows!.added_rows[0]).toBe('X0126');
    expect(comparison.rows!.kept + comparison.rows!.revised! + comparison.rows!.removed).toBe(
      before.record.data.rows_used,
    );
    expect(comparison.rows!.kept + comparison.rows!.revised! + comparison.rows!.added).toBe(
      now.record.data.rows_used,
    );
    expect(comparison.choice).toMatchObject({ changed: false, difference: 0 });
    expect(comparison.declaration).toMatchObject({ study_changed: false });
    const tern = coefficient(comparison, 'vessel Tern');
    expect(comparison.models[0]!.largest_change!.name).toBe('vessel Tern');
    expect(tern.in_standard_errors).toBeLessThan(-4);
    expect(tern.parts!.added / tern.difference!).toBeGreaterThan(0.9);
    expect(tern.parts!.declaration).toBe(0);
    const { share_inside: share, share_upper: upper, same_surface: surface } = comparison.new_rows!;
    expect(share).toBeGreaterThan(0.55);
    expect(share).toBeLessThan(0.65);
    expect(upper).toBeLessThan(0.9);
    expect(surface!.p_value).toBeLessThan(1e-10);
    expect(renderComparison(comparison, now.record, { formats: ['markdown'] }, () => {}).markdown).toContain(
      'The coefficient that moved most is vessel Tern',
    );
  });
});

describe('cold-store-electricity', () => {
  test('a revised reading moves the saving; the new year lies where it was expected', async () => {
    const comparison = compared(...(await both('cold-store-electricity', 'months-later.csv')));
    expect(comparison.rows).toMatchObject({ kept: 34, revised: 1, added: 13, removed: 0 });
    expect(comparison.rows!.revisions).toMatchObject([{ id: '2024-02', variable: 'kwh' }]);
    expect(comparison.rows!.added_rows[0]).toBe('2023-03');
    const saving = coefficient(comparison, 'overhauled');
    // In errors that allow for related neighbours the intake's coefficient moves a little more, by the same reading.
    const largest = comparison.models[0]!.largest_change!;
    expect(largest.name).toBe('intake_per_day');
    const intake = coefficient(comparison, 'intake_per_day');
    expect(Math.abs(intake.in_standard_errors!)).toBeLessThan(1.4);
    expect(intake.parts!.revised / intake.difference!).toBeGreaterThan(0.5);
    expect(saving.in_standard_errors).toBeGreaterThan(0.8);
    expect(saving.in_standard_errors).toBeLessThan(1.4);
    expect(saving.parts!.revised / saving.difference!).toBeGreaterThan(0.5);
    expect(comparison.new_rows!.same_surface!.p_value).toBeGreaterThan(0.2);
    expect(comparison.new_rows!.predictive!.p_value).toBeGreaterThan(0.2);
  });
});

describe('workshop-repairs', () => {
  const study = join(pipelines, 'workshop-repairs', 'study.yaml');

  test('with the study as it is the fit stops at the level that is gone', async () => {
    const { record, problems } = await runStudy(study, {
      parameters: new Map([['file', 'repairs-later.csv']]),
    });
    expect(record).toBeNull();
    const messages = problems.map(({ message }) => message).join(' ');
    expect(messages).toContain('28 cells of kind are not declared levels (the first is "transmission"');
    expect(messages).toContain('no row fitted has kind "gearbox"');
  });

  test('with the new name declared, who was a gearbox is seen to be a transmission', async () => {
    const renamed = join(scratch, 'study.yaml');
    writeFileSync(renamed, readFileSync(study, 'utf8').replaceAll('gearbox', 'transmission'));
    const later = join(scratch, 'repairs-later.csv');
    writeFileSync(later, readFileSync(join(pipelines, 'workshop-repairs', 'repairs-later.csv')));
    const comparison = compared(await run(study), await run(renamed, 'repairs-later.csv'));
    expect(comparison.rows).toMatchObject({
      kept: 394,
      revised: 20,
      added: 111,
      removed: 0,
      revised_cells: [{ variable: 'kind', rows: 20 }],
    });
    expect(
      comparison.contract.map(({ kind, variable, name, likely, because }) => [
        kind,
        variable,
        name,
        likely,
        because,
      ]),
    ).toEqual([
      ['level_gone', 'kind', 'gearbox', 'transmission', 'rows'],
      ['level_new', 'kind', 'transmission', null, null],
      ['level_new', 'grade', 'specialist', null, null],
      ['range', 'technician_years', null, null, null],
    ]);
    expect(coefficient(comparison, 'kind gearbox')).toMatchObject({ after: null, parts: null });
    expect(comparison.new_rows!.not_scored).toEqual([
      { because: 'no earlier row has kind "transmission"', rows: 7 },
    ]);
    expect(comparison.new_rows!.same_surface!.p_value).toBeGreaterThan(0.2);
  });
});

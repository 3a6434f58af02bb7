/**
 * A refreshed study against figures from 80-digit arithmetic that shares nothing with the program, every step between the two
 * records a fit of its own: see test/reference/refresh/README.md.
 */
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { afterAll, describe, expect, test } from 'vitest';
import type { ComparedSide } from '../../src/compare/compare.ts';
import type { CoefficientChange, ComparisonTest } from '../../src/compare/comparison.ts';
import { predictFromRecord } from '../../src/predict-record.ts';
import { plumbrule } from '../cli/in-folder.ts';
import { runText } from '../run/run-text.ts';
import { compared } from './sides.ts';

const here = fileURLToPath(new URL('../reference/refresh/', import.meta.url));
const scratch = mkdtempSync(join(tmpdir(), 'refresh-'));
afterAll(() => rmSync(scratch, { recursive: true }));

type Coefficient = Omit<CoefficientChange, 'unit'>;
const read = (name: string) => readFileSync(join(here, name), 'utf8');
const FIGURES = JSON.parse(read('figures.json')) as {
  rows: Record<'kept' | 'revised' | 'added' | 'removed', number> & {
    removed_rows: string[];
    revised_cells: Record<string, string[]>;
  };
  residual_standard_error: { before: number; after: number };
  refreshed: Coefficient[];
  redeclared: Coefficient[];
  new_rows: Record<'rows' | 'scored' | 'bias' | 'root_mean_squared_error' | 'inside', number> & {
    share: [number, number];
    same_surface: ComparisonTest;
    predictive: ComparisonTest;
  };
  totals: (Record<'rows' | 'estimate' | 'lower' | 'upper', number> & { group: string | null })[];
};
const STUDY = read('refresh.study.yaml');
/** Other weights and another derived variable, so that the declaration has a part of its own. */
const REDECLARED = STUDY.replace('weights: beak_depth', 'weights: beak_length').replace(
  'log(beak_length)',
  'log(beak_length + 2)',
);

async function sideOf(study: string, file: string): Promise<ComparedSide> {
  const { record, kept, problems } = await runText(study.replace('file: earlier.csv', `file: ${file}`), {
    [file]: read(file),
  });
  expect(problems).toEqual([]);
  return { record: record!, rows: kept!.rows, file: 'record.json' };
}

/** Fails with the name of the figure; what is a difference is measured by what it is a difference of. */
function agree(what: string, found: number | null | undefined, figure: number | null, size = 0): void {
  if (figure === null) {
    expect(found, what).toBeNull();
    return;
  }
  const distance = Math.abs(found! - figure) / Math.max(Math.abs(figure), size);
  expect(distance === 0 || distance < 1e-10, `${what}: ${found} for ${figure}`).toBe(true);
}

function agreeOnCoefficients(found: readonly CoefficientChange[], figures: readonly Coefficient[]): void {
  expect(found.map(({ name }) => name)).toEqual(figures.map(({ name }) => name));
  figures.forEach((figure, k) => {
    const { name } = figure;
    const own = found[k]!;
    const size = Math.max(Math.abs(figure.before ?? 0), Math.abs(figure.after ?? 0));
    agree(`${name} before`, own.before, figure.before);
    agree(`${name} after`, own.after, figure.after);
    agree(`${name} error before`, own.before_standard_error, figure.before_standard_error);
    agree(`${name} error after`, own.after_standard_error, figure.after_standard_error);
    agree(`${name} difference`, own.difference, figure.difference, size);
    agree(`${name} in errors`, own.in_standard_errors, figure.in_standard_errors);
    if (figure.parts === null) {
      expect(own.parts, name).toBeNull();
      return;
    }
    for (const part of ['removed', 'revised', 'added', 'declaration'] as const) {
      agree(`${name} by ${part}`, own.parts![part], figure.parts[part], size);
    }
  });
}

function agreeOnTest(what: string, found: ComparisonTest | null, figure: ComparisonTest): void {
  expect(found, what).toMatchObject({ df1: figure.df1, df2: figure.df2 });
  agree(`${what}, F`, found!.statistic, figure.statistic);
  agree(`${what}, p`, found!.p_value, figure.p_value);
}

describe('penguins on the log scale, weighted, with HC3 errors and a new level', () => {
  test('rows, coefficients and their parts, new rows and what is asked of them', async () => {
    const { rows, models, new_rows, acceptance } = compared(
      await sideOf(STUDY, 'earlier.csv'),
      await sideOf(STUDY, 'later.csv'),
    );
    const { revised_cells: cells, removed_rows: gone, ...counts } = FIGURES.rows;
    expect(rows).toMatchObject({ ...counts, matched_by: 'row_id' });
    expect([...rows!.removed_rows].sort()).toEqual([...gone].sort());
    const revisions = (name: string) =>
      rows!.revisions
        .filter(({ variable }) => variable === name)
        .map(({ id }) => id)
        .sort();
    expect(
      Object.fromEntries(rows!.revised_cells.map(({ variable }) => [variable, revisions(variable)])),
    ).toEqual(Object.fromEntries(Object.entries(cells).map(([name, ids]) => [name, [...ids].sort()])));

    expect(models).toHaveLength(1);
    agree('s before', models[0]!.residual_standard_error.before, FIGURES.residual_standard_error.before);
    agree('s after', models[0]!.residual_standard_error.after, FIGURES.residual_standard_error.after);
    agreeOnCoefficients(models[0]!.coefficients, FIGURES.refreshed);

    const { share, same_surface, predictive, ...figures } = FIGURES.new_rows;
    const { rows: added, scored, inside, bias, root_mean_squared_error: rmse } = new_rows!;
    expect([added, scored, inside]).toEqual([figures.rows, figures.scored, figures.inside]);
    expect(new_rows!.not_scored).toEqual([
      { because: 'no earlier row has species "Gentoo"', rows: figures.rows - figures.scored },
    ]);
    agree('bias', bias, figures.bias);
    agree('root mean squared error', rmse, figures.root_mean_squared_error);
    agree('lower end of the share', new_rows!.share_lower, share[0]);
    agree('upper end of the share', new_rows!.share_upper, share[1]);
    agreeOnTest('first test', new_rows!.same_surface, same_surface);
    agreeOnTest('second test', new_rows!.predictive, predictive);

    const moves = FIGURES.refreshed.map(({ in_standard_errors: move }) => Math.abs(move ?? 0));
    const sex = FIGURES.refreshed.find(({ name }) => name === 'sex')!;
    expect(acceptance.map(({ criterion, of, passed }) => [criterion, of, passed])).toEqual([
      ['coefficient_change', undefined, true],
      ['coefficient_change', 'sex', true],
      ['new_rows_inside', undefined, true],
    ]);
    const wanted = [Math.max(...moves), Math.abs(sex.in_standard_errors!), figures.inside / figures.scored];
    for (const [k, figure] of wanted.entries()) agree(`criterion ${k + 1}`, acceptance[k]!.value, figure);
  });

  test('other weights and another derivation are the last part', async () => {
    const { models } = compared(await sideOf(STUDY, 'earlier.csv'), await sideOf(REDECLARED, 'later.csv'));
    agreeOnCoefficients(models[0]!.coefficients, FIGURES.redeclared);
  });
});

test('totals of groups from the record alone: errors of coefficients are shared, those of rows are not', async () => {
  const out = join(scratch, 'natural');
  const study = join(scratch, 'study.yaml');
  writeFileSync(study, STUDY.replace(', scale: log', ''));
  writeFileSync(join(scratch, 'earlier.csv'), read('earlier.csv'));
  expect((await plumbrule('fit', study, '--out', out, '--quiet')).status).toBe(0);
  const { totals, problems } = await predictFromRecord(
    join(out, 'record.json'),
    join(here, 'to-predict.csv'),
    {
      totalBy: 'island',
    },
  );
  expect(problems.filter(({ severity }) => severity === 'error')).toEqual([]);
  expect(totals.map(({ group, rows }) => [group, rows])).toEqual(
    FIGURES.totals.map(({ group, rows }) => [group, rows]),
  );
  FIGURES.totals.forEach((figure, k) => {
    for (const each of ['estimate', 'lower', 'upper'] as const) {
      agree(`${figure.group ?? 'all'}, ${each}`, totals[k]![each], figure[each]);
    }
  });
});

/**
 * Every diagnostic against figures from 50-digit arithmetic that shares nothing with the program; see
 * test/reference/diagnostics/README.md.
 */
import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import type { Column } from '../../src/data/table.ts';
import { type Chosen, covarianceRatio, deletedResidual, fittedShift } from '../../src/examine/chosen.ts';
import { examine } from '../../src/examine/examine.ts';
import { secondPass } from '../../src/examine/second-pass.ts';
import { category, numbers } from '../prepare/columns.ts';
import { anscombe } from '../reference/anscombe.ts';
import { HALD } from '../reference/hald-cement/hald-cement.ts';
import { longley } from '../reference/longley.ts';
import { chosenFrom, numberColumns, type Wanted } from './chosen-from.ts';

const TOLERANCE = 1e-8;
const here = new URL('../reference/', import.meta.url);

interface Test {
  statistic: number;
  df: number[];
  p_value: number;
}

interface Figures {
  rows: number;
  independence: { statistic: number; lower: number; upper: number };
  normality: Test & { w: number };
  response_scale?: { lambda: number; lower: number | null; upper: number | null };
  influence: {
    row: number;
    leverage: number;
    deleted_residual: number;
    dffits: number;
    covratio: number;
    dfbetas: number[];
    estimates: number[];
  }[];
  [test: string]: unknown;
}

const FIGURES = JSON.parse(readFileSync(new URL('diagnostics/figures.json', here), 'utf8')) as Record<
  string,
  Figures
>;

const cement = { ...HALD.columns, y: HALD.y, t: HALD.y.map((_, i) => i) };

function carColumns(): Column[] {
  const [header, ...lines] = readFileSync(new URL('cars/cars.csv', here), 'utf8').trim().split('\n');
  const names = header!.split(',');
  const cells = (name: string) => lines.map((line) => line.split(',')[names.indexOf(name)]!);
  const whole = lines.map((_, i) =>
    ['economy', 'weight', 'horsepower'].every((name) => cells(name)[i] !== ''),
  );
  const of = (name: string) => cells(name).filter((_, i) => whole[i]);
  return [
    numbers('y', of('economy').map(Number)),
    ...['weight', 'horsepower'].map((name) => numbers(name, of(name).map(Number))),
    numbers(
      'year',
      of('first_sold').map((date) => Number(date.slice(0, 4))),
    ),
    numbers(
      'sold',
      of('first_sold').map((date) => Date.parse(date) / 86400000),
      'date',
    ),
    category('origin', of('origin'), ['USA', 'Europe', 'Japan']),
  ];
}

const CASES: Record<string, () => Chosen> = {
  longley: () => of(numberColumns(longley), ['x1', 'x2', 'x3', 'x4', 'x5', 'x6'], 1, ['x6', 1955], 'x6'),
  'longley two': () => of(numberColumns(longley), ['x2', 'x4'], 2, ['x6', 1960], 'x6'),
  cement: () => of(numberColumns(cement), ['x1', 'x2'], 1, ['t', 6], 't'),
  'cement weighted': () => of(numberColumns(cement), ['x1', 'x2'], 2, ['t', 6], 't', { weights: 'x4' }),
  'cement through zero': () => of(numberColumns(cement), ['x1', 'x2'], 1, null, 't', { intercept: false }),
  ...Object.fromEntries(
    (['1', '2', '3', '4'] as const).map((set) => [
      `anscombe ${set}`,
      () => of(numberColumns({ ...anscombe[set], t: anscombe[set].y.map((_, i) => i) }), ['x'], 1, null, 't'),
    ]),
  ),
  cars: () => of(carColumns(), ['weight', 'horsepower', 'year', 'origin'], 3, ['year', 1976], 'sold'),
};

function of(
  columns: readonly Column[],
  terms: string[],
  lags: number,
  split: [string, number] | null,
  time: string,
  more: Partial<Wanted> = {},
): Chosen {
  const splitAt = split && { variable: split[0], value: split[1], text: String(split[1]) };
  return chosenFrom(columns, { terms, time, examination: { lags, splitAt }, ...more }).chosen;
}

function near(found: number | null, figure: number, what: string, tolerance = TOLERANCE): void {
  expect(found, what).not.toBeNull();
  const apart = Math.abs(found! - figure) / Math.max(Math.abs(figure), 1e-300);
  expect(apart, `${what}: ${found}, not ${figure}`).toBeLessThanOrEqual(tolerance);
}

const TESTS = [
  'equal_spread',
  'uneven_spread',
  'serial_correlation',
  'shape',
  'skewness_and_tails',
  'lack_of_fit',
  'same_in_both_parts',
  'drift',
];

describe.each(Object.keys(FIGURES))('%s', (name) => {
  const figures = FIGURES[name]!;
  const chosen = CASES[name]!();
  const findings = new Map(examine(chosen).map((finding) => [finding.name, finding]));

  test('the rows are those of the figures', () => {
    expect(chosen.sample.rowCount).toBe(figures.rows);
  });

  test.each(TESTS.filter((each) => figures[each] !== undefined))('%s', (each) => {
    const figure = figures[each] as Test;
    const found = findings.get(each)!;
    expect(found.df).toEqual(figure.df);
    if (Math.abs(figure.statistic) < 1e-20) {
      expect(Math.abs(found.statistic!)).toBeLessThan(1e-10);
      return;
    }
    near(found.statistic, figure.statistic, 'statistic');
    near(found.p_value, figure.p_value, 'p-value');
  });

  test.each(TESTS.filter((each) => figures[each] === undefined))(
    '%s: nothing where the figures have nothing',
    (each) => {
      // The cars' recursive residuals are left out of the figures for the time that refitting takes.
      if (name === 'cars' && each === 'drift') return;
      expect(findings.get(each)?.statistic ?? null).toBeNull();
    },
  );

  test('Durbin–Watson statistic and both tails', () => {
    const { statistic, lower, upper } = figures.independence;
    const found = findings.get('independence')!;
    near(found.statistic, statistic, 'statistic');
    const [resembling, opposing] = found.figures!.map((figure) => figure.value!);
    // Imhof's integral gives the figures with an absolute error of about 1e-15.
    const slack = (tail: number) => Math.max(TOLERANCE, 1e-15 / tail);
    near(resembling!, lower, 'lower tail', slack(lower));
    near(opposing!, upper, 'upper tail', slack(upper));
  });

  test('Shapiro–Wilk W by the published weights, and as another library of the same algorithm has it', () => {
    const found = findings.get('normality')!;
    near(found.statistic, figures.normality.w, 'W');
    near(found.statistic, figures.normality.statistic, 'W of the library', 1e-6);
    near(found.p_value, figures.normality.p_value, 'p-value of the library', 1e-3);
  });

  test('the best power of the response and its interval', () => {
    const found = findings.get('response_scale')!;
    const figure = figures.response_scale;
    if (figure === undefined) return;
    expect(Math.abs(found.statistic! - figure.lambda)).toBeLessThan(1e-7);
    const [lower, upper] = found.figures!.map(({ value }) => value!);
    expect(Math.abs(lower! - (figure.lower ?? -2))).toBeLessThan(1e-7);
    expect(Math.abs(upper! - (figure.upper ?? 2))).toBeLessThan(1e-7);
  });

  test('what each row does, from deletions carried out', () => {
    const largest = new Float64Array(chosen.fit.columns.length);
    for (const figure of figures.influence) {
      const { row } = figure;
      near(chosen.leverages[row]!, figure.leverage, 'leverage');
      near(deletedResidual(chosen, row), figure.deleted_residual, 'deleted residual');
      near(fittedShift(chosen, row), figure.dffits, 'DFFITS');
      near(covarianceRatio(chosen, row), figure.covratio, 'COVRATIO');
      figure.dfbetas.forEach((value, j) => {
        largest[j] = Math.max(largest[j]!, Math.abs(value));
      });
    }
    if (figures.influence.length < figures.rows - 1) return;
    const { shifts } = secondPass(chosen)!;
    largest.forEach((value, j) => {
      near(Math.abs(shifts.largest[j]!), value, 'largest DFBETAS');
    });
    const mark = 2 / Math.sqrt(figures.rows);
    expect(shifts.rowsBeyond).toBe(
      figures.influence.filter(({ dfbetas }) => dfbetas.some((value) => Math.abs(value) > mark)).length,
    );
  });
});

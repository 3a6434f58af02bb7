import { readFileSync } from 'node:fs';
import { Ajv2020 } from 'ajv/dist/2020.js';
import { type ComparedSide, compareRecords } from '../../src/compare/compare.ts';
import type { Comparison } from '../../src/compare/comparison.ts';
import { comparisonText } from '../../src/compare/comparison-text.ts';
import type { Problem } from '../../src/problem.ts';
import { runText } from '../run/run-text.ts';

export type Row = Readonly<Record<string, string>>;

/** The rows of test/reference/cars (its README says where they come from), in file order. */
export const CARS: readonly Row[] = (() => {
  const file = new URL('../reference/cars/cars.csv', import.meta.url);
  const [head, ...lines] = readFileSync(file, 'utf8').trim().split('\n');
  const names = head!.split(',');
  return lines.map((line) => {
    const cells = line.split(',');
    return Object.fromEntries(names.map((name, j) => [name, cells[j]!]));
  });
})();

export interface StudyParts {
  readonly data?: string;
  readonly derive?: string;
  readonly response?: string;
  readonly candidates?: string;
  readonly selection?: string;
  readonly more?: string;
}

/** A study of the cars; parts that are not given are the usual ones. */
export function carsStudy({ data, derive, response, candidates, selection, more }: StudyParts = {}): string {
  return `plumbrule: 1
title: Fuel economy of cars
data:
  file: cars.csv
  missing: [""]
${
  data ??
  `  row_id: car
  variables:
    car: { type: identifier }
    first_sold: { type: date }
    economy: { type: number, unit: mi/gal }
    weight: { type: number, unit: lb }
    horsepower: { type: number, unit: hp }
    origin: { type: category, baseline: USA }`
}
derive:
  model_year: { expression: ${derive ?? 'year(first_sold)'} }
${response ?? 'response: economy'}
candidates:
${candidates ?? '  - { name: All, terms: [weight, horsepower, model_year, origin] }'}
selection: { rank_by: aicc${selection === undefined ? '' : `, ${selection}`} }
${more ?? ''}
`;
}

export function csvText(rows: readonly Row[]): string {
  const names = Object.keys(rows[0]!);
  return `${[names.join(','), ...rows.map((row) => names.map((name) => row[name]).join(','))].join('\n')}\n`;
}

/** A run of a study on rows, as one side of a comparison. */
export async function sideOf(
  rows: readonly Row[],
  parts: StudyParts = {},
  files: Readonly<Record<string, string>> = {},
): Promise<ComparedSide> {
  const { record, kept, problems } = await runText(carsStudy(parts), { 'cars.csv': csvText(rows), ...files });
  if (record === null) throw new Error(problems.map(({ message }) => message).join('\n'));
  return { record, rows: kept?.rows ?? null, file: 'record.json' };
}

const isComparison = new Ajv2020({ strict: true, allowUnionTypes: true }).compile(
  JSON.parse(
    readFileSync(new URL('../../schemas/comparison.schema.json', import.meta.url), 'utf8'),
  ) as object,
);

/** Compares two sides; what comes out is as its schema says and has a text. */
export function compared(earlier: ComparedSide, later: ComparedSide): Comparison {
  const problems: Problem[] = [];
  const comparison = compareRecords(earlier, later, (problem) => problems.push(problem));
  if (comparison === null) throw new Error(problems.map(({ message }) => message).join('\n'));
  if (!isComparison(comparison)) throw new Error(JSON.stringify(isComparison.errors));
  comparisonText(comparison);
  return comparison;
}

export function estimatesOf({ record }: ComparedSide): Map<string, number> {
  return new Map(record.model!.columns.map(({ name, estimate }) => [name, estimate]));
}

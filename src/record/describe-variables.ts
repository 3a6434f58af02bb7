import type { Column, NumberColumn, Table } from '../data/table.ts';
import { namesIn } from '../expression/names-in.ts';
import { isMissing } from '../prepare/is-missing.ts';
import { termVariables } from '../prepare/needed-variables.ts';
import type { Sample } from '../prepare/sample.ts';
import type { Spread } from '../prepare/spread.ts';
import { declaredTerms } from '../study/declared-terms.ts';
import type { Study } from '../study/study.ts';
import type { RecordVariable } from './record.ts';

/** Every declared and derived variable: how it is used, what is missing, and its spread over the rows used. */
export function describeVariables(
  study: Study,
  table: Table,
  sample: Sample,
  spreads: ReadonlyMap<string, Spread>,
): RecordVariable[] {
  const uses = usesOf(study);
  const summaries = new Map(table.summaries.map((summary) => [summary.name, summary]));
  const declared = study.data.variables.map(
    (plan): RecordVariable => ({
      name: plan.name,
      label: plan.label ?? plan.name,
      unit: plan.unit,
      type: plan.type,
      derived_from: null,
      used_as: uses(plan.name),
      missing: summaries.get(plan.name)?.missing ?? 0,
      ...spreadOf(sample.columns.get(plan.name), spreads.get(plan.name)),
    }),
  );
  const derived = study.derive.map((plan): RecordVariable => {
    const column = sample.columns.get(plan.name);
    return {
      name: plan.name,
      label: plan.label ?? plan.name,
      unit: plan.unit,
      type: plan.type,
      derived_from: plan.text,
      used_as: uses(plan.name),
      missing: column === undefined ? 0 : countMissing(column, sample.rowCount),
      ...spreadOf(column, spreads.get(plan.name)),
    };
  });
  return [...declared, ...derived];
}

function countMissing(column: Column, rows: number): number {
  let count = 0;
  for (let i = 0; i < rows; i++) if (isMissing(column, i)) count++;
  return count;
}

type RecordSpread = Pick<
  RecordVariable,
  | 'smallest'
  | 'lower_quartile'
  | 'median'
  | 'mean'
  | 'upper_quartile'
  | 'largest'
  | 'standard_deviation'
  | 'levels'
>;

const NO_SPREAD: RecordSpread = {
  smallest: null,
  lower_quartile: null,
  median: null,
  mean: null,
  upper_quartile: null,
  largest: null,
  standard_deviation: null,
  levels: null,
};

function spreadOf(column: Column | undefined, spread: Spread | undefined): RecordSpread {
  if (column === undefined || column.kind === 'text') return NO_SPREAD;
  if (column.kind === 'category') {
    return { ...NO_SPREAD, levels: levelRows(column.levels, column.baseline, column.codes) };
  }
  if (spread === undefined) return NO_SPREAD;
  if (column.kind === 'flag') return { ...NO_SPREAD, levels: flagRows(column) };
  return {
    smallest: spread.smallest,
    lower_quartile: spread.lowerQuartile,
    median: spread.median,
    mean: spread.mean,
    upper_quartile: spread.upperQuartile,
    largest: spread.largest,
    standard_deviation: spread.standardDeviation,
    levels: null,
  };
}

function flagRows({ values, flagTexts }: NumberColumn): { level: string; rows: number }[] {
  const [no, yes] = flagTexts ?? ['no', 'yes'];
  const rowsOf = (wanted: number) =>
    values.reduce((count, value) => (value === wanted ? count + 1 : count), 0);
  return [
    { level: no, rows: rowsOf(0) },
    { level: yes, rows: rowsOf(1) },
  ];
}

function levelRows(
  levels: readonly string[],
  baseline: string,
  codes: Int32Array,
): { level: string; rows: number }[] {
  const counts = new Float64Array(levels.length);
  for (const code of codes) if (code >= 0) counts[code]!++;
  const rows = levels.map((level, code) => ({ level, rows: counts[code]! }));
  return [
    ...rows.filter(({ level }) => level === baseline),
    ...rows.filter(({ level }) => level !== baseline),
  ];
}

function usesOf(study: Study): (name: string) => string[] {
  const predictors = new Set(declaredTerms(study).flatMap(termVariables));
  const conditions = new Set(study.leaveOut.flatMap((rule) => [...namesIn(rule.where)]));
  const derivations = new Set(study.derive.flatMap((plan) => [...namesIn(plan.expression)]));
  return (name) => {
    const uses: [boolean, string][] = [
      [study.response.variable === name, 'response'],
      [predictors.has(name), 'predictor'],
      [study.weights === name, 'weights'],
      [study.data.rowId === name, 'row identity'],
      [study.data.time === name, 'time order'],
      [conditions.has(name), 'condition'],
      [derivations.has(name), 'derivation'],
    ];
    const told = uses.filter(([holds]) => holds).map(([, use]) => use);
    return told.length > 0 ? told : ['declared only'];
  };
}

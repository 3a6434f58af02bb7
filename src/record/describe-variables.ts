import type { Column, Table } from '../data/table.ts';
import { namesIn } from '../expression/names-in.ts';
import { isMissing } from '../prepare/is-missing.ts';
import { termVariables } from '../prepare/needed-variables.ts';
import type { Sample } from '../prepare/sample.ts';
import { quartilesOf } from '../stats/quartiles.ts';
import type { Study } from '../study/study.ts';
import type { RecordVariable } from './record.ts';

/** Every declared and derived variable: how it is used, what is missing, and its spread over the rows used. */
export function describeVariables(study: Study, table: Table, sample: Sample): RecordVariable[] {
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
      ...spreadOf(sample.columns.get(plan.name)),
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
      ...spreadOf(column),
    };
  });
  return [...declared, ...derived];
}

function countMissing(column: Column, rows: number): number {
  let count = 0;
  for (let i = 0; i < rows; i++) if (isMissing(column, i)) count++;
  return count;
}

type Spread = Pick<
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

const NO_SPREAD: Spread = {
  smallest: null,
  lower_quartile: null,
  median: null,
  mean: null,
  upper_quartile: null,
  largest: null,
  standard_deviation: null,
  levels: null,
};

function spreadOf(column: Column | undefined): Spread {
  if (column === undefined || column.kind === 'text') return NO_SPREAD;
  if (column.kind === 'category')
    return { ...NO_SPREAD, levels: levelRows(column.levels, column.baseline, column.codes) };
  // A variable that no candidate needs may be missing in rows that are used.
  const values = column.values.some(Number.isNaN)
    ? column.values.filter((value) => !Number.isNaN(value))
    : column.values;
  if (values.length === 0) return NO_SPREAD;
  if (column.kind === 'flag') {
    const ones = values.reduce((sum, value) => sum + value, 0);
    const [no, yes] = column.flagTexts ?? ['no', 'yes'];
    return {
      ...NO_SPREAD,
      levels: [
        { level: no, rows: values.length - ones },
        { level: yes, rows: ones },
      ],
    };
  }
  const quartiles = quartilesOf(values);
  const { mean, deviation } = meanAndDeviation(values);
  return {
    smallest: quartiles.smallest,
    lower_quartile: quartiles.lowerQuartile,
    median: quartiles.median,
    mean,
    upper_quartile: quartiles.upperQuartile,
    largest: quartiles.largest,
    standard_deviation: deviation,
    levels: null,
  };
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

/** In two passes, so that a large offset costs no digits; the deviation is null for one value. */
function meanAndDeviation(values: Float64Array): { mean: number; deviation: number | null } {
  let sum = 0;
  for (const value of values) sum += value;
  const mean = sum / values.length;
  let squares = 0;
  for (const value of values) squares += (value - mean) ** 2;
  return { mean, deviation: values.length < 2 ? null : Math.sqrt(squares / (values.length - 1)) };
}

function usesOf(study: Study): (name: string) => string[] {
  const predictors = new Set(study.candidates.flatMap((candidate) => candidate.terms.flatMap(termVariables)));
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

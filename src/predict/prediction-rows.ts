import { formatDate } from '../data/format-date.ts';
import { readTable } from '../data/read-table.ts';
import type { Column, Table } from '../data/table.ts';
import type { Chosen } from '../examine/chosen.ts';
import { isoDays } from '../expression/iso-date.ts';
import { nearest } from '../expression/nearest.ts';
import { baseVariables, evaluateDerived } from '../prepare/derive.ts';
import { isMissing } from '../prepare/is-missing.ts';
import type { Place, Report } from '../problem.ts';
import type { VariablePlan } from '../study/study.ts';
import { modelVariables, unknownLevels } from './outside-data.ts';
import type { PredictionRows } from './predict.ts';

type Given = PredictionRows['given'][number][number];

/** The declared variables that a row must give so that the chosen model can predict it, in order of declaration. */
export function variablesToGive(chosen: Chosen): VariablePlan[] {
  const { study } = chosen;
  const needed = new Set(modelVariables(chosen).flatMap((name) => [...baseVariables(name, study.derive)]));
  return study.data.variables.filter((plan) => needed.has(plan.name));
}

/** The rows written under `predict.rows`; those that cannot be predicted are reported as errors and left out. */
export function statedRows(chosen: Chosen, report: Report): PredictionRows {
  const plans = chosen.study.predict.rows;
  const wanted = variablesToGive(chosen);
  const { weights } = chosen.study;
  const weightPlan = chosen.study.data.variables.find((plan) => plan.name === weights);
  const base = new Map<string, Column>();
  for (const variable of weightPlan === undefined ? wanted : [...wanted, weightPlan]) {
    base.set(
      variable.name,
      columnOf(
        chosen,
        variable,
        plans.map((plan) => plan.values.get(variable.name)),
      ),
    );
  }
  const rows = {
    rowCount: plans.length,
    labels: plans.map((plan) => plan.label),
    given: plans.map((plan): Given[] => [...plan.values].map(([variable, value]) => ({ variable, value }))),
    columns: base,
  };
  return usable(chosen, rows, wanted, (row) => plans[row]!.place, 'error', report);
}

/** The rows of `predict.file`; those that cannot be predicted are reported as warnings and left out. */
export async function fileRows(chosen: Chosen, report: Report): Promise<PredictionRows | null> {
  const { study } = chosen;
  const file = study.predict.file;
  if (file === null) return null;
  const wanted = variablesToGive(chosen);
  const table = await readTable({ ...study.data, file }, study.folder, report, {
    require: new Set(wanted.map((plan) => plan.name)),
  });
  if (table === null) return null;
  const ids = study.data.rowId === null ? undefined : table.columns.get(study.data.rowId);
  const labels = Array.from(
    { length: table.rowCount },
    (_, i) => labelOf(ids, i) ?? `line ${table.lines[i]}`,
  );
  const rows = {
    rowCount: table.rowCount,
    labels,
    given: labels.map((_, i) =>
      wanted.map(({ name }) => ({ variable: name, value: shownValue(table, name, i) })),
    ),
    columns: table.columns,
  };
  return usable(
    chosen,
    rows,
    wanted,
    (row) => ({ kind: 'cell', file, row: table.lines[row]! }),
    'warning',
    report,
  );
}

function labelOf(ids: Column | undefined, row: number): string | null {
  if (ids === undefined) return null;
  if (ids.kind === 'text') return ids.values[row] ?? null;
  return ids.kind === 'category' ? (ids.levels[ids.codes[row]!] ?? null) : String(ids.values[row]);
}

function shownValue(table: Table, name: string, row: number): number | string {
  const column = table.columns.get(name)!;
  if (column.kind === 'category') return column.levels[column.codes[row]!] ?? '';
  if (column.kind === 'text') return column.values[row] ?? '';
  const value = column.values[row]!;
  if (column.kind === 'date') return Number.isNaN(value) ? '' : formatDate(value);
  if (column.kind === 'flag') return Number.isNaN(value) ? '' : (column.flagTexts?.[value as 0 | 1] ?? value);
  return value;
}

/** Adds the derived variables, and keeps the rows that have every value and no unknown level. */
function usable(
  chosen: Chosen,
  rows: PredictionRows,
  wanted: readonly VariablePlan[],
  placeOf: (row: number) => Place,
  severity: 'error' | 'warning',
  report: Report,
): PredictionRows {
  const { study } = chosen;
  const { columns } = evaluateDerived(derivationsAtHand(chosen), rows.columns, rows.rowCount);
  const names = [...new Set([...wanted.map((plan) => plan.name), ...modelVariables(chosen)])];
  const kept: number[] = [];
  for (let row = 0; row < rows.rowCount; row++) {
    const label = `The row "${rows.labels[row]}"`;
    const unknown = unknownLevels(chosen, columns, row);
    for (const { variable, level, known } of unknown) {
      const close = nearest(level, known);
      report({
        code: 'prediction_level_unknown',
        severity,
        place: placeOf(row),
        message: `${label} cannot be predicted: no row fitted has ${variable} "${level}".`,
        hint: close === null ? `The data has ${known.join(', ')}.` : `Did you mean ${close}?`,
      });
    }
    const missing = names.filter((name) => isMissing(columns.get(name)!, row));
    if (missing.length > 0) {
      const derived = study.derive.some((plan) => plan.name === missing[0]);
      report({
        code: 'prediction_value_missing',
        severity,
        place: placeOf(row),
        message: `${label} cannot be predicted: ${missing[0]} is ${derived ? 'undefined there' : 'missing'}.`,
        ...(derived ? {} : { hint: `Give a value for ${missing.join(', ')}.` }),
      });
    }
    if (unknown.length === 0 && missing.length === 0) kept.push(row);
  }
  return {
    rowCount: kept.length,
    labels: kept.map((row) => rows.labels[row]!),
    given: kept.map((row) => rows.given[row]!),
    columns: new Map([...columns].map(([name, column]) => [name, pick(column, kept)])),
  };
}

/** The derivations whose variables are all given; those that the chosen model rests on are among them. */
function derivationsAtHand(chosen: Chosen): Chosen['study']['derive'] {
  const { derive } = chosen.study;
  const given = new Set(variablesToGive(chosen).map((plan) => plan.name));
  return derive.filter((plan) => [...baseVariables(plan.name, derive)].every((name) => given.has(name)));
}

function pick(column: Column, rows: readonly number[]): Column {
  if (column.kind === 'category')
    return { ...column, codes: Int32Array.from(rows, (row) => column.codes[row]!) };
  if (column.kind === 'text') return { ...column, values: rows.map((row) => column.values[row] ?? null) };
  return { ...column, values: Float64Array.from(rows, (row) => column.values[row]!) };
}

/** A column of stated values, typed as the variable is. What is absent or cannot be read is missing. */
function columnOf(
  chosen: Chosen,
  plan: VariablePlan,
  values: readonly (number | string | boolean | undefined)[],
): Column {
  const like = chosen.sample.columns.get(plan.name);
  switch (plan.type) {
    case 'category': {
      const texts = values.map((value) => (value === undefined ? null : String(value)));
      const levels = [...new Set(texts.filter((text) => text !== null))];
      const baseline = like?.kind === 'category' ? like.baseline : (levels[0] ?? '');
      return {
        kind: 'category',
        name: plan.name,
        levels,
        baseline,
        codes: Int32Array.from(texts, (text) => (text === null ? -1 : levels.indexOf(text))),
      };
    }
    case 'text':
    case 'identifier':
      return {
        kind: 'text',
        name: plan.name,
        values: values.map((value) => (value === undefined ? null : String(value))),
      };
    case 'date':
      return {
        kind: 'date',
        name: plan.name,
        values: Float64Array.from(values, (value) =>
          typeof value === 'string' ? (isoDays(value) ?? Number.NaN) : Number.NaN,
        ),
      };
    case 'flag': {
      const texts =
        like !== undefined && like.kind === 'flag' ? like.flagTexts : (plan.flagValues ?? undefined);
      return {
        kind: 'flag',
        name: plan.name,
        values: Float64Array.from(values, (value) => flagOf(value, texts)),
      };
    }
    default:
      return {
        kind: 'number',
        name: plan.name,
        values: Float64Array.from(values, (value) => (typeof value === 'number' ? value : Number.NaN)),
      };
  }
}

function flagOf(
  value: number | string | boolean | undefined,
  texts: readonly [string, string] | undefined,
): number {
  if (typeof value === 'boolean') return value ? 1 : 0;
  if (value === 0 || value === 1) return value;
  if (typeof value !== 'string') return Number.NaN;
  const text = value.toLowerCase();
  if (text === texts?.[1].toLowerCase() || text === 'yes' || text === 'true') return 1;
  return text === texts?.[0].toLowerCase() || text === 'no' || text === 'false' ? 0 : Number.NaN;
}

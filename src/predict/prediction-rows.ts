import { FAULT_KINDS, showText } from '../data/fault-sentence.ts';
import type { OnBadCell } from '../data/faults.ts';
import { formatDate } from '../data/format-date.ts';
import { readTable } from '../data/read-table.ts';
import type { Column, Table } from '../data/table.ts';
import type { Chosen } from '../examine/chosen.ts';
import { isoDays } from '../expression/iso-date.ts';
import { nearest } from '../expression/nearest.ts';
import { baseVariables, evaluateDerived } from '../prepare/derive.ts';
import { gatherColumn } from '../prepare/gather.ts';
import { isMissing } from '../prepare/is-missing.ts';
import type { Report } from '../problem.ts';
import type { VariablePlan } from '../study/study.ts';
import { unknownLevels } from './outside-data.ts';
import type { PredictionRows } from './predict.ts';
import { type RowNeeds, rowNeedsOf } from './predictor.ts';

type Given = PredictionRows['given'][number][number];

/** The rows written under `predict.rows`; those that cannot be predicted are reported as errors and left out. */
export function statedRows(chosen: Chosen, report: Report): PredictionRows {
  const plans = chosen.study.predict.rows;
  const needs = rowNeedsOf(chosen);
  const base = new Map<string, Column>();
  for (const variable of [...needs.inputs, ...needs.extras]) {
    const values = plans.map((plan) => plan.values.get(variable.name));
    base.set(variable.name, columnOf(needs, variable, values));
  }
  const rows = {
    rowCount: plans.length,
    labelOf: (row: number) => plans[row]!.label,
    given: plans.map((plan): Given[] => [...plan.values].map(([variable, value]) => ({ variable, value }))),
    columns: base,
    placeOf: (row: number) => plans[row]!.place,
    severity: 'error' as const,
  };
  return usableRows(needs, rows, report).rows;
}

/** The rows of `predict.file`; those that cannot be predicted are reported as warnings and left out. */
export async function fileRows(chosen: Chosen, report: Report): Promise<PredictionRows | null> {
  const { study } = chosen;
  const file = study.predict.file;
  if (file === null) return null;
  const needs = rowNeedsOf(chosen);
  const unread = gatherUnread(needs);
  const table = await readTable({ ...study.data, file }, study.folder, report, {
    onBadCell: unread.onBadCell,
    require: new Set(needs.inputs.map((plan) => plan.name)),
    optional: new Set(needs.extras.map((plan) => plan.name)),
  });
  if (table === null) return null;
  const rows = {
    ...rowsOfTable(table, study.data.rowId),
    given: Array.from({ length: table.rowCount }, (_, i) =>
      needs.inputs.map(({ name }) => ({ variable: name, value: shownValue(table, name, i) })),
    ),
  };
  return usableRows(needs, rows, report, undefined, unread).rows;
}

/** The rows of a file as they are to be predicted, named by their identity where they have one, else by line. */
export function rowsOfTable(table: Table, rowId: string | null): PredictionRows {
  const ids = rowId === null ? undefined : table.columns.get(rowId);
  return {
    rowCount: table.rowCount,
    labelOf: (row) => identityOf(ids, row) ?? `line ${table.lines[row]}`,
    given: [],
    columns: table.columns,
    placeOf: (row) => ({ kind: 'cell', file: table.file, row: table.lines[row]! }),
    severity: 'warning',
  };
}

function identityOf(ids: Column | undefined, row: number): string | null {
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

/** Why values of a file could not be read, so that a row is not said to lack what it has. */
export interface UnreadCells {
  readonly onBadCell: OnBadCell;
  /** The first value of a row that could not be read, and why, as a clause; null where all could. */
  readonly inRow: (row: number) => string | null;
}

/** Gathers the cells of the variables that a row must give. */
export function gatherUnread({ inputs }: RowNeeds): UnreadCells {
  const wanted = new Set(inputs.map(({ name }) => name));
  const clauses = new Map<number, string>();
  return {
    onBadCell: (variable, row, code, text) => {
      if (!wanted.has(variable) || clauses.has(row)) return;
      clauses.set(row, `${variable} ${showText(text)} ${FAULT_KINDS[code][0]}`);
    },
    inRow: (row) => clauses.get(row) ?? null,
  };
}

export interface UsableRows {
  readonly rows: PredictionRows;
  /** By row kept: the row that it was. */
  readonly kept: Int32Array;
}

/**
 * Adds the derived variables, and keeps the rows that have every value and no unknown level; `leaveOut` is told of each
 * other row, with the first reason as a clause. A value in `unread` is there, but could not be read.
 */
export function usableRows(
  needs: RowNeeds,
  rows: PredictionRows,
  report: Report,
  leaveOut: (row: number, because: string) => void = () => {},
  unread: Pick<UnreadCells, 'inRow'> = { inRow: () => null },
): UsableRows {
  const { labelOf, placeOf, severity, rowCount } = rows;
  const derive = derivationsAtHand(needs, rows);
  const { columns } = evaluateDerived(derive, rows.columns, rowCount);
  const unknownAt = unknownLevels(needs, columns);
  const inputs = needs.inputs.map((plan) => plan.name);
  const names = [...new Set([...inputs, ...needs.model])];
  const incomplete = missingAnywhere(
    names.map((name) => columns.get(name)!),
    rowCount,
  );
  const usable = new Int32Array(rowCount);
  let count = 0;
  for (let row = 0; row < rowCount; row++) {
    const unknown = unknownAt === null ? [] : unknownAt(row);
    if (unknown.length === 0 && incomplete[row] === 0) {
      usable[count++] = row;
      continue;
    }
    const label = `The row "${labelOf(row)}"`;
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
    const derived = missing[0] !== undefined && !inputs.includes(missing[0]);
    const misread = unread.inRow(row);
    const lacks = misread ?? `${missing[0]} is ${derived ? 'undefined there' : 'missing'}`;
    if (missing.length > 0) {
      report({
        code: 'prediction_value_missing',
        severity,
        place: placeOf(row),
        message: `${label} cannot be predicted: ${lacks}.`,
        ...(derived || misread !== null ? {} : { hint: `Give a value for ${missing.join(', ')}.` }),
      });
    }
    const [strange] = unknown;
    leaveOut(row, strange === undefined ? lacks : `no row fitted has ${strange.variable} "${strange.level}"`);
  }
  const kept = usable.subarray(0, count);
  const whole = count === rowCount;
  return {
    kept,
    rows: {
      rowCount: count,
      labelOf: (row) => labelOf(kept[row]!),
      given: rows.given.length === 0 ? [] : Array.from(kept, (row) => rows.given[row]!),
      columns: whole
        ? columns
        : new Map([...columns].map(([name, column]) => [name, gatherColumn(column, kept)])),
      placeOf: (row) => placeOf(kept[row]!),
      severity,
    },
  };
}

/** 1 for each row in which one of the columns has no value. */
function missingAnywhere(columns: readonly Column[], rowCount: number): Uint8Array {
  const missing = new Uint8Array(rowCount);
  for (const column of columns) {
    if (column.kind === 'category' || column.kind === 'text') {
      for (let row = 0; row < rowCount; row++) if (isMissing(column, row)) missing[row] = 1;
    } else markMissing(column.values, missing);
  }
  return missing;
}

function markMissing(values: Float64Array, missing: Uint8Array): void {
  for (let row = 0; row < missing.length; row++) if (Number.isNaN(values[row]!)) missing[row] = 1;
}

/** The derivations whose variables the rows have; those that the model rests on are among them. */
function derivationsAtHand(needs: RowNeeds, rows: PredictionRows): RowNeeds['derive'] {
  return needs.derive.filter((plan) =>
    [...baseVariables(plan.name, needs.derive)].every((name) => rows.columns.has(name)),
  );
}

/** A column of stated values, typed as the variable is. What is absent or cannot be read is missing. */
function columnOf(
  needs: RowNeeds,
  plan: VariablePlan,
  values: readonly (number | string | boolean | undefined)[],
): Column {
  switch (plan.type) {
    case 'category': {
      const texts = values.map((value) => (value === undefined ? null : String(value)));
      const levels = [...new Set(texts.filter((text) => text !== null))];
      return {
        kind: 'category',
        name: plan.name,
        levels,
        baseline: levels[0] ?? '',
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
      const texts = needs.flagTexts.get(plan.name) ?? plan.flagValues ?? undefined;
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

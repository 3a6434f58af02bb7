import { checkBaseline } from '../data/fill-columns.ts';
import { listedValues } from '../data/listed-values.ts';
import { summarise } from '../data/summarise.ts';
import type { Column, Table } from '../data/table.ts';
import type { Report } from '../problem.ts';
import type { DataPlan } from '../study/study.ts';
import { gatherColumn, gatherLines } from './gather.ts';

/** The rows of one level of a variable. */
export interface LevelRows {
  readonly level: string;
  /** Indexes into the table, ascending. */
  readonly rows: Int32Array;
}

/**
 * The rows of a table by the levels that a variable has among them: those of a category in its order, integers
 * ascending, texts in the order of their UTF-16 code units, so that no locale matters. Rows in which it is missing
 * are under none.
 */
export function rowsByLevel(column: Column): LevelRows[] {
  const found = new Map<string | number, number[]>();
  for (let row = 0; row < lengthOf(column); row++) {
    const key = keyAt(column, row);
    if (key === null) continue;
    const rows = found.get(key);
    if (rows === undefined) found.set(key, [row]);
    else rows.push(row);
  }
  return [...found]
    .sort(([a], [b]) => (a < b ? -1 : a > b ? 1 : 0))
    .map(([key, rows]) => ({
      level: column.kind === 'category' ? column.levels[Number(key)]! : String(key),
      rows: Int32Array.from(rows),
    }));
}

function lengthOf(column: Column): number {
  return column.kind === 'category' ? column.codes.length : column.values.length;
}

/** A category's code, a number, or a text; null where missing. */
function keyAt(column: Column, row: number): string | number | null {
  if (column.kind === 'category') return column.codes[row]! < 0 ? null : column.codes[row]!;
  if (column.kind === 'text') return column.values[row] ?? null;
  const value = column.values[row]!;
  return Number.isNaN(value) ? null : value;
}

/**
 * Some rows of a table, with all that is known of its columns; what was found in them is not summed up.
 * @param rows ascending, each once
 */
export function partOfTable(table: Table, rows: Int32Array): Table {
  const lines = gatherLines(table.lines, rows);
  const own = new Set(lines);
  const badValues = table.badValues.filter((bad) => own.has(bad.row));
  return {
    ...table,
    rowCount: rows.length,
    columns: new Map([...table.columns].map(([name, column]) => [name, gatherColumn(column, rows)])),
    lines,
    badValues,
    badValueCount: badValues.length,
    badRows: table.badRows === null ? null : Uint8Array.from(rows, (row) => table.badRows![row]!),
    summaries: [],
  };
}

/**
 * Some rows of a table as a table, as if the file had held no others: levels that the study does not declare are
 * those in these rows, and what was found is summed up anew. Null where a baseline is not among them, which is reported.
 * @param rows ascending, each once
 */
export function tableOfRows(plan: DataPlan, table: Table, rows: Int32Array, report: Report): Table | null {
  const part = partOfTable(table, rows);
  const { badValues } = part;
  const badOf = (name: string) =>
    plan.onBadValue === 'leave_out_row' ? badValues.filter(({ variable }) => variable === name).length : 0;
  const columns = new Map<string, Column>();
  const summaries: Table['summaries'][number][] = [];
  let sound = true;
  for (const variable of plan.variables) {
    const gathered = part.columns.get(variable.name);
    if (gathered === undefined) continue;
    const column = variable.levels === null ? levelsPresent(gathered, variable.baseline) : gathered;
    sound = checkBaseline(plan, { variable, column }, report) && sound;
    columns.set(variable.name, column);
    summaries.push(summarise(variable, column, badOf(variable.name)));
  }
  if (!sound) return null;
  return { ...part, columns, badValues: listedValues(badValues, MOST_LISTED), summaries };
}

/** As many bad values as a table of a whole file lists. */
const MOST_LISTED = 20;

/** A category with only the levels that have a row, in their order. */
function levelsPresent(column: Column, baseline: string | null): Column {
  if (column.kind !== 'category') return column;
  const rows = new Int32Array(column.levels.length);
  for (const code of column.codes) if (code >= 0) rows[code]!++;
  const levels = column.levels.filter((_, code) => rows[code]! > 0);
  if (levels.length === column.levels.length) return column;
  const codes = new Int32Array(column.levels.length).fill(-1);
  levels.forEach((level, code) => {
    codes[column.levels.indexOf(level)] = code;
  });
  return {
    ...column,
    levels,
    codes: column.codes.map((code) => (code < 0 ? code : codes[code]!)),
    baseline: baseline ?? levels[0] ?? '',
  };
}

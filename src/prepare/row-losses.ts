import type { Column } from '../data/table.ts';
import { wholeNumber } from '../numerals.ts';
import type { UndefinedRows } from './evaluate-expression.ts';
import { isMissing } from './is-missing.ts';
import { listed } from './line-list.ts';
import type { Loss } from './sample.ts';

/** Which rows are still in, and under which reason each other one went. Reasons are applied one after the other. */
export interface RowLosses {
  /** 0 for a row still in, else 1 + the index of its reason in `losses`. Length: rows read. */
  readonly reasonOf: Uint16Array;
  readonly losses: Loss[];
}

export function startLosses(rowCount: number): RowLosses {
  return { reasonOf: new Uint16Array(rowCount), losses: [] };
}

export function rowsLeft(rows: RowLosses): number {
  return rows.losses.reduce((left, loss) => left - loss.rows, rows.reasonOf.length);
}

/** Takes out the rows still in where `applies` is 1. The reason is listed also where it takes no row. */
export function loseWhere(
  rows: RowLosses,
  applies: ArrayLike<number>,
  reason: Pick<Loss, 'because' | 'kind' | 'variable'>,
): void {
  const { reasonOf, losses } = rows;
  const code = losses.length + 1;
  let count = 0;
  for (let row = 0; row < reasonOf.length; row++) {
    if (applies[row] !== 1 || reasonOf[row] !== 0) continue;
    reasonOf[row] = code;
    count++;
  }
  losses.push({ ...reason, rows: count, missingAny: null });
}

/**
 * Takes out the rows in which any of the variables is missing or undefined, each under the first such variable.
 * A variable is listed where it lacks any value among the rows in at the start. Of a derived one the reason says
 * which of the columns under it are empty in the rows that it takes; `basesOf` gives those.
 */
export function loseMissing(
  rows: RowLosses,
  variables: readonly string[],
  columns: ReadonlyMap<string, Column>,
  undefinedRows: ReadonlyMap<string, UndefinedRows>,
  basesOf: (variable: string) => Iterable<string>,
): void {
  const { reasonOf, losses } = rows;
  const earlier = losses.length;
  for (const variable of variables) {
    const flags = undefinedRows.get(variable)?.flags ?? null;
    for (const kind of ['missing', 'undefined'] as const) {
      if (kind === 'undefined' && flags === null) continue;
      const code = losses.length + 1;
      let any = 0;
      const taken: number[] = [];
      eachMissing(columns.get(variable)!, (row) => {
        const reason = reasonOf[row]!;
        if (reason !== 0 && reason <= earlier) return;
        if ((flags !== null && flags[row] === 1) !== (kind === 'undefined')) return;
        any++;
        if (reason !== 0) return;
        reasonOf[row] = code;
        taken.push(row);
      });
      if (any === 0) continue;
      const bases = kind === 'missing' ? [...basesOf(variable)].filter((base) => base !== variable) : [];
      const because = `${kind} ${variable}${emptyBases(bases, columns, taken)}`;
      losses.push({ because, kind, rows: taken.length, variable, missingAny: any });
    }
  }
}

/**
 * ", as kwh has no value"; ", as kwh has no value in 3 and days in 1 of these" where neither lacks one in all rows. Not
 * "is empty": a cell may hold a text that is declared to mean a missing value.
 */
function emptyBases(
  bases: readonly string[],
  columns: ReadonlyMap<string, Column>,
  taken: readonly number[],
): string {
  const empty = bases.flatMap((base) => {
    const column = columns.get(base)!;
    const rows = taken.reduce((sum, row) => sum + (isMissing(column, row) ? 1 : 0), 0);
    return rows === 0 ? [] : [{ base, rows }];
  });
  const everywhere = empty.filter(({ rows }) => rows === taken.length).map(({ base }) => base);
  if (everywhere.length > 0) {
    return `, as ${listed(everywhere)} ${everywhere.length === 1 ? 'has' : 'have'} no value`;
  }
  if (empty.length === 0) return '';
  const [first, ...rest] = empty.map(({ base, rows }) => ({ base, rows: wholeNumber(rows) }));
  const others = rest.map(({ base, rows }) => `${base} in ${rows}`);
  return `, as ${listed([`${first!.base} has no value in ${first!.rows}`, ...others])} of these`;
}

/** Calls `visit` with every row in which the column has no value. */
function eachMissing(column: Column, visit: (row: number) => void): void {
  switch (column.kind) {
    case 'category':
      for (let row = 0; row < column.codes.length; row++) if (column.codes[row]! < 0) visit(row);
      return;
    case 'text':
      for (let row = 0; row < column.values.length; row++) if (column.values[row] === null) visit(row);
      return;
    default:
      for (let row = 0; row < column.values.length; row++) if (Number.isNaN(column.values[row]!)) visit(row);
  }
}

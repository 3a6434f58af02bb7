import type { Column } from '../data/table.ts';

/** Whether a column has no value in a row. */
export function isMissing(column: Column, row: number): boolean {
  if (column.kind === 'category') return column.codes[row]! < 0;
  if (column.kind === 'text') return column.values[row] === null;
  return Number.isNaN(column.values[row]!);
}

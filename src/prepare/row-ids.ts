import { formatDate } from '../data/format-date.ts';
import type { Column } from '../data/table.ts';

/** The identity of each of the rows as text; empty where it is missing. */
export function rowIds(column: Column, rows: Int32Array): readonly string[] {
  return Array.from(rows, (row) => {
    if (column.kind === 'text') return column.values[row] ?? '';
    if (column.kind === 'category') return column.levels[column.codes[row]!] ?? '';
    const value = column.values[row]!;
    if (Number.isNaN(value)) return '';
    if (column.kind === 'date') return formatDate(value);
    return column.kind === 'flag'
      ? (column.flagTexts?.[value === 0 ? 0 : 1] ?? String(value))
      : String(value);
  });
}

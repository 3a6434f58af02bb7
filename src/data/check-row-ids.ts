import type { DataPlan } from '../study/study.ts';
import type { Faults } from './faults.ts';
import type { Filled } from './fill-columns.ts';
import type { Column } from './table.ts';

/**
 * Reports rows whose identity is missing, or is that of an earlier row; the later row is the faulty one. Rows that
 * are left out already do not count.
 */
export function checkRowIds(
  plan: DataPlan,
  { column, faults: columnFaults }: Filled,
  faults: Faults,
  lines: Uint32Array,
): void {
  const stopsAlready = plan.onBadValue === 'stop' && columnFaults.count() > 0;
  const lineOf = new Map<string | number, number>();
  for (let row = 0; row < lines.length; row++) {
    if (faults.leftOut(row)) continue;
    const line = lines[row]!;
    const id = idOf(column, row);
    if (id === null) {
      // With `stop`, a cell that could not be read has been reported as itself.
      if (!stopsAlready || column.kind === 'text') columnFaults.add('row_id_missing', row, line, '');
      continue;
    }
    const earlier = lineOf.get(id);
    if (earlier === undefined) {
      lineOf.set(id, line);
    } else {
      const text = column.kind === 'category' ? column.levels[Number(id)]! : String(id);
      columnFaults.add('row_id_twice', row, line, text, earlier);
    }
  }
}

function idOf(column: Column, row: number): string | number | null {
  switch (column.kind) {
    case 'text':
      return column.values[row] ?? null;
    case 'category':
      return column.codes[row]! < 0 ? null : column.codes[row]!;
    default:
      return Number.isNaN(column.values[row]!) ? null : column.values[row]!;
  }
}

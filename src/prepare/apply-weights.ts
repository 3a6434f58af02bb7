import type { Column, Table } from '../data/table.ts';
import type { Report } from '../problem.ts';
import { lineList, rowCountText } from './line-list.ts';
import { loseWhere, type RowLosses } from './row-losses.ts';

/** Takes out the rows whose weight is zero. False, and an error, where a weight is negative or all are zero. */
export function applyWeights(
  name: string,
  columns: ReadonlyMap<string, Column>,
  table: Table,
  rows: RowLosses,
  report: Report,
): boolean {
  const column = columns.get(name)!;
  if (column.kind === 'category' || column.kind === 'text') {
    throw new Error(`The weights "${name}" are no numbers.`);
  }
  const zero = new Uint8Array(table.rowCount);
  const negative: number[] = [];
  let positive = 0;
  let zeroes = 0;
  for (let row = 0; row < table.rowCount; row++) {
    if (rows.reasonOf[row] !== 0) continue;
    const weight = column.values[row]!;
    if (weight < 0) negative.push(table.lines[row]!);
    else if (weight > 0) positive++;
    else if (weight === 0) {
      zero[row] = 1;
      zeroes++;
    }
  }
  if (negative.length > 0) {
    report({
      code: 'weight_negative',
      severity: 'error',
      place: { kind: 'cell', file: table.file, row: negative[0]!, variable: name },
      message: `The weight "${name}" is negative in ${rowCountText(negative.length)}: ${lineList(negative)}.`,
      hint: 'A weight is 0 (the row does not count) or more.',
    });
    return false;
  }
  if (zeroes > 0 && positive === 0) {
    report({
      code: 'weight_negative',
      severity: 'error',
      place: { kind: 'cell', file: table.file, variable: name },
      message: `No weight "${name}" is above 0, so that no row counts.`,
      hint: 'A weight is 0 (the row does not count) or more.',
    });
    return false;
  }
  if (zeroes > 0) loseWhere(rows, zero, { because: 'weight is zero', kind: 'left_out', variable: name });
  return true;
}

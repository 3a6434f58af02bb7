import type { Column } from '../data/table.ts';

/** Positions 0 … n − 1 in the order of the column's values; equal values keep the order of the rows. */
export function timeOrder(column: Column, rowCount: number): Int32Array {
  const order = Int32Array.from({ length: rowCount }, (_, position) => position);
  const compare = comparison(column);
  // Most files are in time order already, and then a million rows need no sorting.
  let sorted = true;
  for (let i = 1; i < rowCount && sorted; i++) sorted = compare(i - 1, i) <= 0;
  return sorted ? order : order.sort(compare);
}

function comparison(column: Column): (a: number, b: number) => number {
  switch (column.kind) {
    case 'category':
      return (a, b) => column.codes[a]! - column.codes[b]!;
    case 'text':
      return (a, b) => compareTexts(column.values[a] ?? '', column.values[b] ?? '');
    default:
      return (a, b) => column.values[a]! - column.values[b]!;
  }
}

/** By code units: the same on every machine, whatever its language. */
function compareTexts(a: string, b: string): number {
  return a < b ? -1 : a > b ? 1 : 0;
}

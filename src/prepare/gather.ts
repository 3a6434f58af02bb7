import type { Column } from '../data/table.ts';

/** The values of a column in the rows given, in their order. Levels of a category stay as they are. */
export function gatherColumn(column: Column, rows: Int32Array): Column {
  switch (column.kind) {
    case 'category': {
      const codes = new Int32Array(rows.length);
      for (let i = 0; i < rows.length; i++) codes[i] = column.codes[rows[i]!]!;
      return { ...column, codes };
    }
    case 'text':
      return { ...column, values: Array.from(rows, (row) => column.values[row] ?? null) };
    default: {
      const values = new Float64Array(rows.length);
      for (let i = 0; i < rows.length; i++) values[i] = column.values[rows[i]!]!;
      return { ...column, values };
    }
  }
}

/** The lines of the rows given. */
export function gatherLines(lines: Uint32Array, rows: Int32Array): Uint32Array {
  const gathered = new Uint32Array(rows.length);
  for (let i = 0; i < rows.length; i++) gathered[i] = lines[rows[i]!]!;
  return gathered;
}

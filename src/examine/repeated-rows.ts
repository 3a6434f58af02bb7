import type { Column } from '../data/table.ts';
import type { Chosen } from './chosen.ts';

/** Rows up to which they are grouped: each value of each variable is looked up. */
const MOST_ROWS = 2e5;

/** Which rows have the same values in every variable of the chosen model. */
export interface RepeatedRows {
  /** Number of different sets of values. */
  readonly count: number;
  /** The set of each row, 0 … count − 1. Length n. */
  readonly of: Int32Array;
}

/** Groups rows by the values of the chosen model's variables; null where no two rows share them all. */
export function repeatedRows({ columns, fit, sample }: Chosen): RepeatedRows | null | 'too many' {
  const n = sample.rowCount;
  if (n > MOST_ROWS) return 'too many';
  const names = new Set(
    fit.columns.flatMap((column) => columns[column]!.pieces.map((piece) => piece.variable)),
  );
  const of = new Int32Array(n);
  let count = 1;
  // A variable splits each group by its values; when every row stands alone there is no need to go on.
  for (const name of names) {
    count = split(of, count, sample.columns.get(name)!);
    if (count === n) return null;
  }
  return count === n ? null : { count, of };
}

function split(of: Int32Array, count: number, column: Column): number {
  const codes = codesOf(column);
  const groups = new Map<number, number>();
  for (let i = 0; i < of.length; i++) {
    // Codes are below the number of rows and groups too, so the pair is a whole number that a double holds.
    const key = codes[i]! * count + of[i]!;
    let group = groups.get(key);
    if (group === undefined) {
      group = groups.size;
      groups.set(key, group);
    }
    of[i] = group;
  }
  return groups.size;
}

function codesOf(column: Column): ArrayLike<number> {
  if (column.kind === 'category') return column.codes;
  const seen = new Map<number | string | null, number>();
  const values: ArrayLike<number | string | null> = column.values;
  return Array.from(values, (value) => {
    let code = seen.get(value);
    if (code === undefined) {
      code = seen.size;
      seen.set(value, code);
    }
    return code;
  });
}

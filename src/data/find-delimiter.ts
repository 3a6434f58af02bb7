import { rowParser } from './split-rows.ts';

const DELIMITERS = [',', ';', '\t', '|'] as const;
const ROWS_LOOKED_AT = 50;

/**
 * The delimiter of a table, from its first lines: the one under which the header names most of the expected
 * columns, then under which most rows have as many cells as the header, then with most cells, then the first of
 * comma, semicolon, tab and pipe.
 */
export function findDelimiter(head: string, newline: '\n' | '\r', expected: ReadonlySet<string>): string {
  let best = ',';
  let bestScore: readonly number[] = [];
  for (const delimiter of DELIMITERS) {
    const rows = rowParser({ delimiter, newline }, ROWS_LOOKED_AT)(head, false).data.filter(
      (row) => row.length > 1 || row[0]!.trim() !== '',
    );
    const header = rows[0] ?? [];
    const named = header.filter((name) => expected.has(name.trim())).length;
    const even = rows.filter((row) => row.length === header.length).length / Math.max(1, rows.length);
    const score = header.length > 1 ? [named, even, header.length] : [named, 0, 1];
    if (isGreater(score, bestScore)) {
      best = delimiter;
      bestScore = score;
    }
  }
  return best;
}

function isGreater(a: readonly number[], b: readonly number[]): boolean {
  for (let i = 0; i < a.length; i++) {
    if (a[i] !== b[i]) return a[i]! > (b[i] ?? Number.NEGATIVE_INFINITY);
  }
  return false;
}

import { wholeNumber } from '../numerals.ts';

const MOST_NAMED = 5;

/** "line 4", "lines 4, 9 and 12" or "lines 4, 9, 12, 17, 20 and 7 more". */
export function lineList(lines: readonly number[]): string {
  const named = lines.slice(0, MOST_NAMED);
  const more = lines.length - named.length;
  const parts = more > 0 ? [...named.map(String), `${wholeNumber(more)} more`] : named.map(String);
  return `${parts.length < 2 ? 'line' : 'lines'} ${listed(parts)}`;
}

/** "a", "a and b", "a, b and c". */
export function listed(items: readonly string[]): string {
  return items.length < 2 ? items.join('') : `${items.slice(0, -1).join(', ')} and ${items.at(-1)}`;
}

/** "1 row", "1 461 rows". */
export function rowCountText(rows: number): string {
  return `${wholeNumber(rows)} ${rows === 1 ? 'row' : 'rows'}`;
}

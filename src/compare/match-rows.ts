import { formatDate } from '../data/format-date.ts';
import type { Column } from '../data/table.ts';
import type { KeptRows } from '../record/read-sample.ts';
import type { ComparedRows, Revision } from './comparison.ts';

/** How many cells and rows are listed one by one; the counts are of all. */
const LISTED_CELLS = 50;
const LISTED_ROWS = 20;

/** The rows of two records side by side. */
export interface MatchedRows {
  readonly by: 'row_id' | 'content';
  /** Positions in the earlier rows of those in both, ascending; `keptLater` has the same rows' positions in the later. */
  readonly keptEarlier: Int32Array;
  readonly keptLater: Int32Array;
  readonly added: Int32Array;
  readonly removed: Int32Array;
}

/** The identity that occurs more than once, or null. */
export function repeatedId({ ids }: KeptRows): string | null {
  if (ids === null) return null;
  const seen = new Set<string>();
  for (const id of ids) {
    if (seen.has(id)) return id;
    seen.add(id);
  }
  return null;
}

/** Matches rows by identity, or where one side has none by all that both have of a row, each with one of its like. */
export function matchRows(earlier: KeptRows, later: KeptRows): MatchedRows {
  const by = earlier.ids !== null && later.ids !== null ? 'row_id' : 'content';
  const shared = [...earlier.columns.keys()].filter((name) => later.columns.has(name)).sort();
  const keyOf = (rows: KeptRows): ((row: number) => string) =>
    by === 'row_id' ? (row) => rows.ids![row]! : contentKey(shared.map((name) => rows.columns.get(name)!));
  const keyEarlier = keyOf(earlier);
  const keyLater = keyOf(later);
  const waiting = new Map<string, number[]>();
  for (let row = later.rowCount - 1; row >= 0; row--) {
    const key = keyLater(row);
    const places = waiting.get(key);
    if (places === undefined) waiting.set(key, [row]);
    else places.push(row);
  }
  const taken = new Uint8Array(later.rowCount);
  const keptEarlier: number[] = [];
  const keptLater: number[] = [];
  const removed: number[] = [];
  for (let row = 0; row < earlier.rowCount; row++) {
    const place = waiting.get(keyEarlier(row))?.pop();
    if (place === undefined) removed.push(row);
    else {
      keptEarlier.push(row);
      keptLater.push(place);
      taken[place] = 1;
    }
  }
  const added: number[] = [];
  for (let row = 0; row < later.rowCount; row++) if (taken[row] === 0) added.push(row);
  return {
    by,
    keptEarlier: Int32Array.from(keptEarlier),
    keptLater: Int32Array.from(keptLater),
    added: Int32Array.from(added),
    removed: Int32Array.from(removed),
  };
}

function contentKey(columns: readonly Column[]): (row: number) => string {
  return (row) => columns.map((column) => JSON.stringify(cellOf(column, row))).join(',');
}

/** Counts and lists of what was matched; which cells of kept rows have other values now. */
export function describeRows(earlier: KeptRows, later: KeptRows, matched: MatchedRows): ComparedRows {
  const { by, keptEarlier, keptLater, added, removed } = matched;
  const cells: { readonly variable: string; readonly at: number[] }[] = [];
  const touched = new Uint8Array(keptEarlier.length);
  if (by === 'row_id') {
    for (const [variable, before] of earlier.columns) {
      const now = later.columns.get(variable);
      if (now === undefined) continue;
      const differs = differenceOf(before, now);
      const at: number[] = [];
      for (let k = 0; k < keptEarlier.length; k++) {
        if (!differs(keptEarlier[k]!, keptLater[k]!)) continue;
        at.push(k);
        touched[k] = 1;
      }
      if (at.length > 0) cells.push({ variable, at });
    }
  }
  const revised = touched.reduce((sum, flag) => sum + flag, 0);
  const revisions = cells
    .flatMap(({ variable, at }) =>
      // No more than the first of each variable can be among the first of all.
      [...at]
        .sort((a, b) => keptLater[a]! - keptLater[b]!)
        .slice(0, LISTED_CELLS)
        .map((k) => ({ variable, k })),
    )
    .sort((a, b) => keptLater[a.k]! - keptLater[b.k]!)
    .slice(0, LISTED_CELLS)
    .map(
      ({ variable, k }): Revision => ({
        id: later.ids![keptLater[k]!]!,
        row: later.lines[keptLater[k]!]!,
        variable,
        earlier: cellOf(earlier.columns.get(variable)!, keptEarlier[k]!),
        later: cellOf(later.columns.get(variable)!, keptLater[k]!),
      }),
    );
  return {
    matched_by: by,
    kept: keptEarlier.length - revised,
    revised: by === 'row_id' ? revised : null,
    added: added.length,
    removed: removed.length,
    revised_cells: cells.map(({ variable, at }) => ({ variable, rows: at.length })),
    revisions,
    revision_count: cells.reduce((sum, { at }) => sum + at.length, 0),
    added_rows: namesOf(later, added),
    removed_rows: namesOf(earlier, removed),
  };
}

function namesOf(rows: KeptRows, index: Int32Array): string[] {
  return Array.from(index.subarray(0, LISTED_ROWS), (row) => rows.ids?.[row] ?? `line ${rows.lines[row]}`);
}

/** Whether a cell differs between two columns of one variable, whose kinds may differ too. */
function differenceOf(before: Column, now: Column): (rowBefore: number, rowNow: number) => boolean {
  if (before.kind === 'category' && now.kind === 'category') {
    // −1 stands for missing on both sides, −2 for a level that the other side does not have.
    const codeOf = before.levels.map((level) => {
      const code = now.levels.indexOf(level);
      return code < 0 ? -2 : code;
    });
    return (a, b) => {
      const code = before.codes[a]!;
      return (code < 0 ? -1 : codeOf[code]) !== now.codes[b];
    };
  }
  if (isNumeric(before) && isNumeric(now) && before.kind === now.kind) {
    return (a, b) => {
      const x = before.values[a]!;
      const y = now.values[b]!;
      return x !== y && !(Number.isNaN(x) && Number.isNaN(y));
    };
  }
  return (a, b) => cellOf(before, a) !== cellOf(now, b);
}

function isNumeric(column: Column): column is Extract<Column, { values: Float64Array }> {
  return column.kind !== 'category' && column.kind !== 'text';
}

/** The value of a cell for a person; null where missing. */
export function cellOf(column: Column, row: number): number | string | null {
  if (column.kind === 'category') return column.levels[column.codes[row]!] ?? null;
  if (column.kind === 'text') return column.values[row] ?? null;
  const value = column.values[row]!;
  if (Number.isNaN(value)) return null;
  if (column.kind === 'date') return formatDate(value);
  return column.kind === 'flag' ? (column.flagTexts?.[value === 0 ? 0 : 1] ?? value) : value;
}

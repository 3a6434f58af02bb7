import { DEPENDENT, dependentShare } from './fit-candidate.ts';
import { columnNorm, eliminate, type Matrix, matrix } from './kernel.ts';

/** Columns of all groups, one after the other: of group g from starts[g] on, starts[g + 1] excluded. */
export type GroupStarts = Int32Array;

/**
 * Groups of columns that may still be left out, in order, with the part of the triangle that is theirs. What stays for
 * good comes before them and needs no numbers any more: leaving out a later column changes none of its rows.
 */
export interface OpenTriangle {
  /** The open groups, by their index in the search. */
  readonly order: readonly number[];
  /** c: their columns. */
  readonly columns: number;
  /** c × c upper triangle, column-major. A column that depends on those before it has a row of zeros. */
  readonly triangle: Float64Array;
  /** The response's entries in those rows. */
  readonly response: Float64Array;
  /** RSS of everything: what stays and all that is open. */
  readonly residual: number;
}

/** What stands in the way of working with the inverse of a triangle. */
export interface Obstacle {
  /** The group whose column hangs on those before it. */
  readonly group: number;
  /** It depends on what stays, so that no set can have it. */
  readonly isHopeless: boolean;
}

/** Below this share of a column's length beside what stays, its inverse would lose more than half of the digits. */
const TOO_DEPENDENT = 1e-4;

/** The first column that depends, or nearly so, on those before it; null where none does. */
export function obstacleIn(open: OpenTriangle, starts: GroupStarts, lengths: Float64Array): Obstacle | null {
  const { triangle, columns } = open;
  let j = 0;
  for (const group of open.order) {
    for (let c = starts[group]!; c < starts[group + 1]!; c++) {
      let square = 0;
      for (let i = j * columns; i <= j * columns + j; i++) square += triangle[i]! * triangle[i]!;
      const length = Math.sqrt(square);
      const left = Math.abs(triangle[j * columns + j]!);
      if (length <= 10 * DEPENDENT * lengths[c]!) return { group, isHopeless: true };
      if (left <= TOO_DEPENDENT * length) return { group, isHopeless: false };
      j++;
    }
  }
  return null;
}

/**
 * Opens the columns of `work` from `first` on, whose last column is the response: those before `first` stay. `lengths` are
 * of the open columns, before anything was taken out.
 * @returns the triangle of the open columns, and their rank
 */
export function openColumns(
  work: Matrix,
  height: number,
  first: number,
  order: readonly number[],
  lengths: Float64Array,
  beyond: number,
): { readonly open: OpenTriangle; readonly rank: number } {
  const columns = lengths.length;
  const y = first + columns;
  for (let j = 0; j < first; j++) eliminate(work, j, j, height, y + 1);
  let rank = 0;
  const triangle = new Float64Array(columns * columns);
  const response = new Float64Array(columns);
  const rows = Array.from(lengths, (length, c) => {
    const j = first + c;
    const row = first + rank;
    // A dependent column gets a row of zeros, so that what comes later stands in rows of its own.
    if (columnNorm(work, j, Math.min(row, height), height) <= dependentShare(work) * length) return -1;
    eliminate(work, j, row, height, y + 1);
    rank++;
    return row;
  });
  rows.forEach((row, i) => {
    if (row < 0) return;
    for (let c = i; c < columns; c++) triangle[c * columns + i] = work.hi[(first + c) * height + row]!;
    response[i] = work.hi[y * height + row]!;
  });
  const residual = beyond + columnNorm(work, y, Math.min(first + rank, height), height) ** 2;
  return { open: { order, columns, triangle, response, residual }, rank };
}

/** The same with some groups staying for good and only `kept` left open; the others are left out. */
export function narrowed(
  from: OpenTriangle,
  staying: readonly number[],
  kept: readonly number[],
  starts: GroupStarts,
  lengths: Float64Array,
): OpenTriangle {
  const height = from.columns;
  const at = new Map<number, number>();
  let column = 0;
  for (const group of from.order) {
    at.set(group, column);
    column += starts[group + 1]! - starts[group]!;
  }
  const sources = [...staying, ...kept].flatMap((group) => columnsFrom(at.get(group)!, group, starts));
  const work = matrix(height, sources.length + 1, false);
  sources.forEach((source, j) => {
    for (let i = 0; i <= source; i++) work.hi[j * height + i] = from.triangle[source * height + i]!;
  });
  work.hi.set(from.response, sources.length * height);
  const first = staying.reduce((sum, group) => sum + starts[group + 1]! - starts[group]!, 0);
  const own = Float64Array.from(
    kept.flatMap((group) => columnsFrom(starts[group]!, group, starts)),
    (c) => lengths[c]!,
  );
  return openColumns(work, height, first, kept, own, from.residual).open;
}

function columnsFrom(first: number, group: number, starts: GroupStarts): number[] {
  return Array.from({ length: starts[group + 1]! - starts[group]! }, (_, c) => first + c);
}

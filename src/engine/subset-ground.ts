import { columnsOf, type Factor } from './factor.ts';
import { dependentShare } from './fit-candidate.ts';
import { columnNorm, eliminate } from './kernel.ts';
import type { SubsetGroup, SubsetSearch } from './subset-search.ts';
import { type OpenTriangle, openColumns } from './subset-triangle.ts';

/** A group as the search sees it: what depends on its own surroundings is gone. */
export interface GroundGroup {
  /** Its index in the search as it was asked for. */
  readonly index: number;
  /** Indexes into the groups of the ground. */
  readonly needs: readonly number[];
}

/** Where a search starts from: what is always in is taken out of all other columns and of the response. */
export interface SubsetGround {
  /** What a group needs stands before it. */
  readonly groups: readonly GroundGroup[];
  readonly hasNeeds: boolean;
  /** See `GroupStarts`. */
  readonly starts: Int32Array;
  /** Length of each column, before anything was taken out; by column of the ground. */
  readonly lengths: Float64Array;
  /** ln det of each group's own cross-products about the mean (about zero without an intercept). */
  readonly ownLogs: Float64Array;
  /** All groups open. */
  readonly open: OpenTriangle;
  /** Rank of what is always in. */
  readonly alwaysRank: number;
  /** Rank of all groups beside it. */
  readonly rank: number;
  /** RSS up to this is rounding: the fit is exact. */
  readonly exact: number;
  /** The factor's scale of the response. */
  readonly responseScale: number;
  /** Groups of the search that are left with no column: by their index there. */
  readonly idle: readonly number[];
}

export function subsetGround(factor: Factor, search: SubsetSearch): SubsetGround {
  const responseAt = factor.predictorCount + search.responseColumn;
  const height = responseAt + 1;
  const always = independent(factor, height, [], search.always);
  const own = search.groups.map(({ columns, needs }) => {
    const around = [...search.always, ...needs.flatMap((need) => search.groups[need]!.columns)];
    return independent(factor, height, [...new Set(around)], columns);
  });
  const idle = own.flatMap((columns, index) => (columns.length === 0 ? [index] : []));
  const order = search.groups
    .map((_, index) => index)
    .filter((index) => own[index]!.length > 0)
    .sort((a, b) => search.groups[a]!.needs.length - search.groups[b]!.needs.length || a - b);
  const at = new Map(order.map((index, g) => [index, g]));
  const groups = order.map((index) => ({ index, needs: needsAmong(search.groups[index]!, at) }));

  const columns = order.flatMap((index) => own[index]!);
  const starts = new Int32Array(order.length + 1);
  order.forEach((index, g) => {
    starts[g + 1] = starts[g]! + own[index]!.length;
  });

  const lengths = Float64Array.from(columns, (column) => columnNorm(factor.triangle, column, 0, column + 1));
  const work = columnsOf(factor, [...always, ...columns, responseAt], height, false);
  const { open, rank } = openColumns(
    work,
    height,
    always.length,
    order.map((_, g) => g),
    lengths,
    0,
  );

  return {
    groups,
    hasNeeds: groups.some(({ needs }) => needs.length > 0),
    starts,
    lengths,
    ownLogs: Float64Array.from(order, (index) => ownLog(factor, height, always.includes(0), own[index]!)),
    open,
    alwaysRank: always.length,
    rank,
    // As for a fit: not even the rounding of the response's own decimals.
    exact: 1e-27 * columnNorm(factor.triangle, responseAt, 0, height) ** 2,
    responseScale: factor.scales[responseAt]!,
    idle,
  };
}

/** A need without a column of its own is met by anything. */
function needsAmong(group: SubsetGroup, at: ReadonlyMap<number, number>): number[] {
  return group.needs.flatMap((need) => at.get(need) ?? []);
}

/** Those of `columns` that depend neither on `base` nor on earlier ones among them. */
function independent(
  factor: Factor,
  height: number,
  base: readonly number[],
  columns: readonly number[],
): number[] {
  const all = [...base, ...columns.filter((column) => !base.includes(column))];
  const work = columnsOf(factor, all, height, false);
  const kept: number[] = [];
  let rank = 0;
  all.forEach((column, j) => {
    if (
      columnNorm(work, j, rank, height) <=
      dependentShare(work) * columnNorm(factor.triangle, column, 0, column + 1)
    )
      return;
    eliminate(work, j, rank, height, all.length);
    rank++;
    if (columns.includes(column) && !base.includes(column)) kept.push(column);
  });
  return kept;
}

function ownLog(factor: Factor, height: number, intercept: boolean, columns: readonly number[]): number {
  const all = intercept ? [0, ...columns] : columns;
  const work = columnsOf(factor, all, height, false);
  let log = 0;
  all.forEach((_, j) => {
    eliminate(work, j, j, height, all.length);
    if (j > 0 || !intercept) log += 2 * Math.log(Math.abs(work.hi[j * height + j]!));
  });
  return log;
}

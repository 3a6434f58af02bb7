/** A set of groups that a search found. */
export interface SubsetEntry {
  /** Groups of the set beside what is always in, ascending. */
  readonly groups: readonly number[];
  /** RSS, in the units of the factor. */
  readonly residual: number;
}

/**
 * Which RSS a set of a size would have to be below to matter. A goal narrows this to sets that could still be chosen:
 * the sets are then ranked across sizes by a criterion that falls with RSS at a given size.
 */
export interface SubsetGoal {
  /** The criterion, the lower the better. */
  readonly value: (columns: number, residual: number) => number;
  /** The RSS at which a set of so many columns has that value. */
  readonly residualAt: (columns: number, value: number) => number;
  /** Sets this far behind the best may still be chosen, for being smaller. */
  readonly slack: number;
}

/** The best sets of each size so far, and the bounds that they give. Sizes are numbers of columns. */
export interface SubsetLists {
  /** By size: a set with an RSS at or above this cannot enter; −∞ where no set is wanted. */
  readonly entry: Float64Array;
  /** By size: RSS of the best set seen, admitted or not; −∞ where no set is wanted. */
  readonly overall: Float64Array;
  /** Says that so good sets are known to be found, by size: bounds before there are any. */
  readonly promise: (residuals: Float64Array) => void;
  /** Says that a set with this RSS is admitted, before the search comes upon it. */
  readonly aim: (size: number, residual: number) => void;
  readonly take: (size: number, entry: SubsetEntry) => void;
  readonly takeRefused: (size: number, entry: SubsetEntry) => void;
  readonly kept: (size: number) => readonly SubsetEntry[];
  readonly refused: (size: number) => SubsetEntry | null;
  /** Whether the first set kept of a size is known to be the best: its RSS is below what the goal asks for. */
  readonly isSettled: (size: number) => boolean;
}

/** An allowance for rounding where a bound is worked out backwards from a criterion's value. */
const ROUNDING = 1e-9;

/**
 * @param capacity by size: how many sets to keep, 0 where none is wanted
 * @param ceiling by size: sets with an RSS above it are of no use
 */
export function subsetLists(
  capacity: Int32Array,
  ceiling: Float64Array,
  goal: SubsetGoal | null,
): SubsetLists {
  const sizes = capacity.length;
  const lists: SubsetEntry[][] = Array.from({ length: sizes }, () => []);
  const refused: (SubsetEntry | null)[] = Array.from({ length: sizes }, () => null);
  const limit = ceiling.slice();
  const promised = new Float64Array(sizes).fill(Number.POSITIVE_INFINITY);
  const entry = new Float64Array(sizes);
  const overall = new Float64Array(sizes).fill(Number.POSITIVE_INFINITY);
  let best = Number.POSITIVE_INFINITY;
  for (let size = 0; size < sizes; size++) {
    tighten(size);
    if (capacity[size] === 0) overall[size] = Number.NEGATIVE_INFINITY;
  }

  return {
    entry,
    overall,
    promise(residuals) {
      residuals.forEach((residual, size) => {
        promised[size] = residual * (1 + ROUNDING);
        tighten(size);
      });
    },
    aim(size, residual) {
      if (goal !== null) towards(goal, goal.value(size, residual));
    },
    take(size, found) {
      const list = lists[size]!;
      if (list.length === capacity[size]) list.pop();
      const at = list.findIndex((other) => other.residual > found.residual);
      list.splice(at < 0 ? list.length : at, 0, found);
      overall[size] = Math.min(overall[size]!, found.residual);
      tighten(size);
      if (goal !== null) towards(goal, goal.value(size, found.residual));
    },
    takeRefused(size, found) {
      overall[size] = Math.min(overall[size]!, found.residual);
      const other = refused[size]!;
      if (other === null || found.residual < other.residual) refused[size] = found;
    },
    kept: (size) => lists[size]!,
    refused: (size) => refused[size]!,
    isSettled: (size) =>
      goal === null || (lists[size]![0]?.residual ?? Number.POSITIVE_INFINITY) < limit[size]!,
  };

  function tighten(size: number): void {
    const list = lists[size]!;
    if (capacity[size] === 0) entry[size] = Number.NEGATIVE_INFINITY;
    else {
      const worst = list.length < capacity[size]! ? Number.POSITIVE_INFINITY : list.at(-1)!.residual;
      entry[size] = Math.min(worst, limit[size]!, promised[size]!);
    }
  }

  function towards(aim: SubsetGoal, value: number): void {
    if (!(value < best)) return;
    best = value;
    for (let size = 0; size < sizes; size++) {
      limit[size] = Math.min(ceiling[size]!, aim.residualAt(size, best + aim.slack) * (1 + ROUNDING));
      tighten(size);
    }
  }
}

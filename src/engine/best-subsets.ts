import { type CountedMember, countBetween, countSubsets } from '../stats/count-subsets.ts';
import type { Factor } from './factor.ts';
import { backwardSets } from './subset-backward.ts';
import { subsetGround } from './subset-ground.ts';
import { inflationStack } from './subset-inflation.ts';
import { type SubsetEntry, type SubsetLists, subsetLists } from './subset-lists.ts';
import {
  aftermath,
  depart,
  departure,
  emptyDeparture,
  emptyNode,
  enter,
  type GroupLayout,
  leaversWith,
  type SubsetNode,
  type SubsetScratch,
  sortAscending,
  survey,
} from './subset-node.ts';
import type { SubsetSearch } from './subset-search.ts';
import { narrowed, type OpenTriangle, obstacleIn } from './subset-triangle.ts';

export interface FoundSubset {
  /** Indexes of groups beside what is always in, ascending. */
  readonly groups: readonly number[];
  /** Columns of the set, what is always in counted: the rank of its design. */
  readonly columnCount: number;
  /** RSS in the response's own units. */
  readonly residualSumOfSquares: number;
}

/** What was found of one size. */
export interface SubsetsOfSize {
  readonly columnCount: number;
  /** The best admitted sets, best first. */
  readonly kept: readonly FoundSubset[];
  /** The best set that is not admitted, where it is better than every admitted one of its size. */
  readonly refused: FoundSubset | null;
  /** Whether these are known to be the best of their size; false where a goal left the size aside. */
  readonly settled: boolean;
}

export interface SubsetsFound {
  /** By size, ascending; sizes of which nothing was found are left out. */
  readonly sizes: readonly SubsetsOfSize[];
  /** Subsets that the search covers, cut off or looked at. */
  readonly covered: number;
  /** False where the needs are too tangled to count and `covered` counts some that lack what they need. */
  readonly coveredExactly: boolean;
  /** Places of the search that were looked at. */
  readonly visited: number;
  /** False where the budget was spent before the end: nothing found is then known to be the best. */
  readonly finished: boolean;
  /** Groups that have no column of their own beside what they need. */
  readonly idle: readonly number[];
}

/** A lower bound counts this much lower: it carries the rounding of an inverse. */
const SAFE = 1 - 1e-10;

/** What stands at a rule's limit but for rounding is left to the exact test. */
const QUICK_MARGIN = 1e-6;

/** Multiplications that asking for admission is worth. */
const ADMISSION_COST = 1e5;

/** A search of this many multiplications takes about a minute. */
const BUDGET = 3e10;

/**
 * The best subsets of every size: of all sets of groups that keep every need and the limits, those with the least RSS
 * for each number of columns, exactly. Branch and bound from the triangle (Furnival & Wilson 1974; Gatu &
 * Kontoghiorghes 2006): starting from all groups together, each step leaves one out. RSS only rises on the way, so
 * that what hangs below a place is passed over when it cannot come below the worst kept set of any size there.
 * The bounds are RSS at the place, and RSS there with the least rise that so many leavers must bring: the larger of one
 * column's alone and of all together by the largest eigenvalue (see `takeScale`). The groups whose loss would cost
 * most leave first, since the largest branches hang there. Columns that hang on each other are settled on the
 * triangle, by trying each with and without, before inverses are used. Double arithmetic.
 */
export function bestSubsets(factor: Factor, search: SubsetSearch): SubsetsFound {
  const ground = subsetGround(factor, search);
  const { groups, starts, exact, rank } = ground;
  const groupCount = groups.length;
  const columnCount = ground.open.columns;
  const atLeast = Math.max(0, search.atLeast);
  const atMost = Math.min(search.atMost, groupCount);
  const { admits } = search;
  const hasRules = admits !== undefined;
  const budget = search.budget ?? BUDGET;

  const members: CountedMember[] = groups.map(({ needs }, g) => ({ weight: widthOf(g), needs }));
  const counts = countSubsets(members);
  const capacity = capacities();
  const lists = listsOf();
  const { entry, overall } = lists;

  const layout: GroupLayout = {
    starts,
    needs: groups.map(({ needs }) => needs),
    dependents: groups.map((_, g) =>
      groups.flatMap(({ needs }, other) => (needs.includes(g) ? [other] : [])),
    ),
    hasNeeds: groups.some(({ needs }) => needs.length > 0),
  };
  const { dependents } = layout;
  const nodes: SubsetNode[] = [];
  const scratch: SubsetScratch = {
    leavers: new Int32Array(columnCount + 1),
    step: emptyDeparture(columnCount),
    square: new Float64Array(columnCount * columnCount),
    values: new Float64Array(columnCount + 1),
  };
  const { leavers, step } = scratch;
  const singles = new Float64Array(columnCount + 1);
  const staying = new Int32Array(groupCount + 1);
  const inflated = inflationStack(ground, search.largestInflation ?? null);
  let visited = 0;
  let work = 0;
  let finished = true;

  start();
  settle(ground.open, 0, 0);
  return collect();

  /** Bounds from sets that are easily found: as many as are to be kept, or, with rules, the best that is admitted. */
  function start(): void {
    const sets = backwardSets(ground.open, ground.lengths, layout, atLeast, atMost);
    if (!hasRules) {
      lists.promise(
        Float64Array.from(
          capacity,
          (wanted, size) => sets.get(size)?.[wanted - 1]?.residual ?? Number.POSITIVE_INFINITY,
        ),
      );
      return;
    }
    if (search.goal == null) return;
    for (const [size, [best]] of sets) {
      if (best === undefined || capacity[size] === 0) continue;
      work += ADMISSION_COST;
      if (best.residual < entry[size]! && admits(asAsked(best.groups))) lists.aim(size, best.residual);
    }
  }

  function widthOf(group: number): number {
    return starts[group + 1]! - starts[group]!;
  }

  function nodeAt(level: number): SubsetNode {
    nodes[level] ??= emptyNode(groupCount - level, columnCount - level, groupCount);
    return nodes[level]!;
  }

  function stays(at: number, group: number): void {
    staying[at] = group;
    inflated.push(at, group);
  }

  /** What a set must come below to matter, once the first `count` staying groups are in it. */
  function boundsWith(count: number): Float64Array {
    return inflated.isAbove(count) ? overall : entry;
  }

  /** Tries every column that hangs on others with and without, until the rest can be inverted. */
  function settle(open: OpenTriangle, stayCount: number, stayColumns: number): void {
    if (!finished || stayCount > atMost || stayCount + open.order.length < atLeast) return;
    const whole = stayColumns + open.columns;
    if (isHopeless(open.residual, stayColumns, whole, boundsWith(stayCount))) return;
    visited++;
    work += 2 * open.columns ** 3;
    const obstacle = obstacleIn(open, starts, ground.lengths);
    if (obstacle === null) {
      const node = nodeAt(0);
      enter(open, node);
      const count = stayCount + node.groups;
      if (matters(whole, node.residual)) consider(node, stayCount, count, whole, node.residual, -1);
      visit(0, stayCount, stayColumns);
      return;
    }
    if (work > budget) {
      finished = false;
      return;
    }
    const { group } = obstacle;
    const without = open.order.filter((each) => each !== group && !dependents[group]!.includes(each));
    settle(narrowed(open, [], without, starts, ground.lengths), stayCount, stayColumns);
    if (obstacle.isHopeless) return;
    const taken = open.order.filter((each) => each === group || groups[group]!.needs.includes(each));
    const kept = open.order.filter((each) => !taken.includes(each));
    taken.forEach((each, k) => {
      stays(stayCount + k, each);
    });
    const columns = taken.reduce((sum, each) => sum + widthOf(each), 0);
    const narrow = narrowed(open, taken, kept, starts, ground.lengths);
    settle(narrow, stayCount + taken.length, stayColumns + columns);
  }

  /** Looks at the sets that lack one open group of a place and all that need it, and at the places below. */
  function visit(level: number, stayCount: number, stayColumns: number): void {
    const node = nodeAt(level);
    const { groups: count, columns } = node;
    if (count === 0) return;
    const whole = stayColumns + columns;
    const before = node.anchor;
    survey(node, layout, scratch);
    work += node.anchor === before ? columns * count : columns ** 3 / 2 + 8 * columns ** 2;
    for (let k = 0; k < count; k++) {
      const rss = node.residual + node.rises[k]!;
      const group = node.order[k]!;
      const width = dependents[group]!.length === 0 ? widthOf(group) : leaversWith(node, k, layout, leavers);
      if (matters(whole - width, rss) && !isRefusedQuickly(node, k, whole - width, rss)) {
        consider(node, stayCount, stayCount + countWithout(node, group), whole - width, rss, group);
      }
    }
    if (count === 1 || isHopelessBelow(node, stayColumns, whole, entry)) return;

    const child = nodeAt(level + 1);
    let smallest = stayColumns;
    for (let i = 0; i < count - 1 && stayCount + i <= atMost; i++) {
      const position = node.ranking[i]!;
      const group = node.order[position]!;
      if (mayGain(node, position, smallest, whole, entry)) {
        const bounds = boundsWith(stayCount + i);
        step.count = leaversWith(node, position, layout, leavers);
        openAfter(node, i, child);
        const isWanted = bounds === entry || mayGain(node, position, smallest, whole, bounds);
        if (isWanted && step.leftCount > 0 && stayCount + i + child.groups >= atLeast) {
          departure(node, leavers, step.count, step);
          aftermath(node, leavers, step);
          work += 2 * step.count * step.leftCount + 10 * step.leftCount;
          if (seesGain(node, smallest, bounds)) {
            depart(node, step, child);
            child.variances = node.variances;
            child.eigenvalue = node.eigenvalue;
            child.anchor = node.anchor;
            visited++;
            work += 2 * step.count * step.leftCount ** 2;
            if ((visited & 0xffff) === 0) search.onProgress?.(visited);
            if (work > budget) finished = false;
            if (finished) visit(level + 1, stayCount + i, smallest);
            if (!finished) return;
          }
        }
      }
      stays(stayCount + i, group);
      smallest += widthOf(group);
    }
  }

  /** The groups that stay open below when the i-th in order leaves: those after it but for its dependents. */
  function openAfter(node: SubsetNode, i: number, child: SubsetNode): void {
    const gone = dependents[node.order[node.ranking[i]!]!]!;
    let left = 0;
    child.groups = 0;
    for (let k = i + 1; k < node.groups; k++) {
      const at = node.ranking[k]!;
      const other = node.order[at]!;
      if (gone.length > 0 && gone.includes(other)) continue;
      child.order[child.groups++] = other;
      const first = node.offsets[at]!;
      for (let c = first; c < first + widthOf(other); c++) step.left[left++] = c;
    }
    step.leftCount = left;
  }

  function matters(size: number, rss: number): boolean {
    return rss < entry[size]! || (hasRules && rss < overall[size]!);
  }

  /** Whether nothing with an RSS of at least `lower` and a size in that range could matter. */
  function isHopeless(lower: number, smallest: number, largest: number, bounds: Float64Array): boolean {
    const bound = Math.max(lower * SAFE, exact);
    for (let size = smallest; size <= largest; size++) if (bounds[size]! > bound) return false;
    return true;
  }

  /** Whether nothing that lacks two or more open columns of a place could matter. */
  function isHopelessBelow(node: SubsetNode, smallest: number, whole: number, bounds: Float64Array): boolean {
    if (node.variances === null) return false;
    const { residual, sums } = node;
    for (let size = smallest; size <= whole - 2; size++) {
      if (bounds[size]! > Math.max((residual + sums[whole - size]!) * SAFE, exact)) return false;
    }
    return true;
  }

  /** Whether a set could matter that lacks the group at a position and at least one more. */
  function mayGain(
    node: SubsetNode,
    position: number,
    smallest: number,
    whole: number,
    bounds: Float64Array,
  ): boolean {
    const { residual, sums } = node;
    const hasScale = node.variances !== null;
    const width = widthOf(node.order[position]!);
    const alone = node.rises[position]!;
    const share = hasScale ? node.shares[position]! : 0;
    for (let size = smallest; size < whole - width; size++) {
      const together = hasScale ? share + sums[whole - size - width]! : 0;
      const rise = Math.max(alone, together);
      if (bounds[size]! > Math.max((residual + rise) * SAFE, exact)) return true;
    }
    return false;
  }

  /** The same once it is known what the departure does to the columns that are left: most places need not be made. */
  function seesGain(node: SubsetNode, smallest: number, bounds: Float64Array): boolean {
    const { leftCount: m, left, count, weights, stride, parts } = step;
    const { variances, eigenvalue, inverse, columns, ids, estimates } = node;
    if (variances === null || m < 3) return true;
    const { values } = scratch;
    for (let j = 0; j < m; j++) {
      const at = left[j]!;
      let estimate = estimates[at]!;
      let variance = inverse[at * columns + at]!;
      for (let k = 0; k < count; k++) {
        const weight = weights[k * stride + j]!;
        estimate -= weight * parts[k]!;
        variance -= weight * weight;
      }
      values[j] = (estimate * estimate) / (variances[ids[at]!]! * eigenvalue);
      singles[j] = (estimate * estimate) / variance;
    }
    sortAscending(values, m);
    sortAscending(singles, m);
    const base = node.residual + step.rise;
    let sum = 0;
    for (let gone = 1; gone <= m; gone++) {
      sum += values[gone - 1]!;
      const single = singles[gone - 1]!;
      const rise = Math.max(single, sum);
      if (bounds[smallest + m - gone]! > Math.max((base + rise) * SAFE, exact)) return true;
    }
    return false;
  }

  /**
   * Whether a set that lacks only the group at a position breaks a rule as can be seen from here, and is no better than
   * what is known of its size.
   */
  function isRefusedQuickly(node: SubsetNode, position: number, size: number, rss: number): boolean {
    const { quick } = search;
    if (quick === undefined || rss < overall[size]!) return false;
    const group = node.order[position]!;
    if (widthOf(group) > 1 || dependents[group]!.length > 0) return false;
    const { inverse, estimates, columns } = node;
    const at = node.offsets[position]!;
    const pivot = inverse[at * columns + at]!;
    const share = estimates[at]! / pivot;
    const p = ground.alwaysRank + size;
    const least = quick.smallestT2 === null ? 0 : quick.smallestT2(p) * (1 - QUICK_MARGIN);
    const variance = Math.max(rss, exact) / (factor.rowCount - p);
    for (let k = 0; k < node.groups; k++) {
      const other = node.order[k]!;
      if (k === position || widthOf(other) > 1) continue;
      const j = node.offsets[k]!;
      const cross = inverse[at * columns + j]!;
      const estimate = estimates[j]! - cross * share;
      const spread = inverse[j * columns + j]! - (cross * cross) / pivot;
      if (estimate * estimate < least * variance * spread) return true;
      const sign = quick.signs[groups[other]!.index]!;
      if (sign * estimate < 0 && estimate * estimate > QUICK_MARGIN * variance * spread) return true;
    }
    return false;
  }

  function countWithout(node: SubsetNode, group: number): number {
    const gone = dependents[group]!;
    if (gone.length === 0) return node.groups - 1;
    let count = 0;
    for (let k = 0; k < node.groups; k++) {
      const other = node.order[k]!;
      if (other !== group && !gone.includes(other)) count++;
    }
    return count;
  }

  /** Takes a set in: what stays, and the open groups but for `without` and all that need it. */
  function consider(
    node: SubsetNode,
    stayCount: number,
    count: number,
    size: number,
    residual: number,
    without: number,
  ): void {
    if (count < atLeast || count > atMost || capacity[size] === 0) return;
    const rss = Math.max(residual, exact);
    const gone = without < 0 ? [] : dependents[without]!;
    const own = [...staying.subarray(0, stayCount)];
    for (let k = 0; k < node.groups; k++) {
      const group = node.order[k]!;
      if (group !== without && !gone.includes(group)) own.push(group);
    }
    const found: SubsetEntry = { groups: own.sort((a, b) => a - b), residual: rss };
    if (hasRules) work += ADMISSION_COST;
    const isAdmitted = admits === undefined || admits(asAsked(found.groups));
    if (!isAdmitted) lists.takeRefused(size, found);
    else if (rss < entry[size]!) lists.take(size, found);
  }

  /** Groups by their index in the search as it was asked for. */
  function asAsked(own: readonly number[]): number[] {
    return own.map((g) => groups[g]!.index).sort((a, b) => a - b);
  }

  /** No more sets are waited for than there are of a size. */
  function capacities(): Int32Array {
    const most = Math.min(rank, search.mostColumns - ground.alwaysRank);
    return Int32Array.from({ length: columnCount + 1 }, (_, size) => {
      if (size > most) return 0;
      let sets = 0;
      for (let k = atLeast; k <= atMost; k++) sets += counts.counts[k]?.[size] ?? 0;
      return Math.min(search.keep, sets);
    });
  }

  function listsOf(): SubsetLists {
    const unit = ground.responseScale ** 2;
    const whole = (size: number) => ground.alwaysRank + size;
    const { goal = null, largestResidual } = search;
    const ceiling = Float64Array.from(capacity, (_, size) =>
      largestResidual === undefined
        ? Number.POSITIVE_INFINITY
        : largestResidual(whole(size)) * unit * (1 + 1e-9),
    );
    return subsetLists(
      capacity,
      ceiling,
      goal === null
        ? null
        : {
            value: (size, residual) => goal.value(whole(size), residual / unit),
            residualAt: (size, value) => goal.residualAt(whole(size), value) * unit,
            slack: goal.slack,
          },
    );
  }

  function collect(): SubsetsFound {
    const unit = ground.responseScale ** 2;
    const sizes: SubsetsOfSize[] = [];
    for (let size = 0; size <= columnCount; size++) {
      const told = (found: SubsetEntry): FoundSubset => ({
        groups: asAsked(found.groups),
        columnCount: ground.alwaysRank + size,
        residualSumOfSquares: found.residual / unit,
      });
      const kept = lists
        .kept(size)
        .map(told)
        .sort((a, b) => a.residualSumOfSquares - b.residualSumOfSquares || earlier(a.groups, b.groups));
      const refused = lists.refused(size);
      const leader = lists.kept(size)[0];
      const isBetter = refused !== null && (leader === undefined || refused.residual < leader.residual);
      if (kept.length === 0 && !isBetter) continue;
      sizes.push({
        columnCount: ground.alwaysRank + size,
        kept,
        refused: isBetter ? told(refused) : null,
        settled: finished && lists.isSettled(size),
      });
    }
    return {
      sizes,
      covered: countBetween(counts, atLeast, atMost, search.mostColumns - ground.alwaysRank),
      coveredExactly: counts.exact,
      visited,
      finished,
      idle: ground.idle,
    };
  }
}

function earlier(a: readonly number[], b: readonly number[]): number {
  for (let k = 0; k < Math.min(a.length, b.length); k++) if (a[k] !== b[k]) return a[k]! - b[k]!;
  return a.length - b.length;
}

import type { OpenTriangle } from './subset-triangle.ts';

/** How the columns of a search belong together. */
export interface GroupLayout {
  /** Columns of group g: from starts[g] on, starts[g + 1] excluded. */
  readonly starts: Int32Array;
  /** By group: those that must be in with it, and those that cannot be in without it. */
  readonly needs: readonly (readonly number[])[];
  readonly dependents: readonly (readonly number[])[];
  readonly hasNeeds: boolean;
}

/**
 * One place of the search for best subsets: what is known of the groups that may still be left out while all of them
 * are in. Leaving one out is then a step of elimination on the block (X′X)⁻¹ of the open columns, of a cost that does
 * not depend on what stays (the pivots of Furnival & Wilson 1974). The arrays are as large as the place may need and
 * are used again.
 */
export interface SubsetNode {
  /** Open groups in order, by their index in the search. */
  readonly order: Int32Array;
  groups: number;
  /** c: columns of the open groups. */
  columns: number;
  /** The open columns' block of (X′X)⁻¹, c × c, symmetric, rows one after the other. */
  readonly inverse: Float64Array;
  /** The open columns' estimates. */
  readonly estimates: Float64Array;
  /** RSS of everything at this place. */
  residual: number;
  /** By position: first column of the group there. */
  readonly offsets: Int32Array;
  /** By group: its position, where it is open. */
  readonly positions: Int32Array;
  /** By column: which column of the search it is. */
  readonly ids: Int32Array;
  /** By position: by how much RSS rises when the group there leaves, with all that need it. */
  readonly rises: Float64Array;
  /** Positions in the order in which the groups are to leave. */
  readonly ranking: Int32Array;
  /** Scale by which the estimates are measured for the bound that follows; by column of the search. */
  variances: Float64Array | null;
  /** An upper bound of the largest eigenvalue of the inverse, measured so. */
  eigenvalue: number;
  /** Columns that were open where the scale was taken. */
  anchor: number;
  /** sums[m]: RSS rises by at least this much when m open columns leave. */
  readonly sums: Float64Array;
  /** By position: the part of the group there in such a sum. */
  readonly shares: Float64Array;
}

/**
 * @param groups room for so many open groups
 * @param columns room for so many open columns
 * @param all groups of the whole search
 */
export function emptyNode(groups: number, columns: number, all: number): SubsetNode {
  return {
    order: new Int32Array(groups),
    groups: 0,
    columns: 0,
    inverse: new Float64Array(columns * columns),
    estimates: new Float64Array(columns),
    residual: 0,
    offsets: new Int32Array(groups),
    positions: new Int32Array(all),
    ids: new Int32Array(columns),
    rises: new Float64Array(groups),
    ranking: new Int32Array(groups),
    variances: null,
    eigenvalue: 1,
    anchor: 0,
    sums: new Float64Array(columns + 1),
    shares: new Float64Array(groups),
  };
}

/** Fills a node from a triangle without dependent columns. */
export function enter(open: OpenTriangle, node: SubsetNode): void {
  const { columns: c, triangle } = open;
  node.order.set(open.order);
  node.groups = open.order.length;
  node.columns = c;
  node.residual = open.residual;
  node.variances = null;
  const root = new Float64Array(c * c);
  for (let j = 0; j < c; j++) {
    const pivot = 1 / triangle[j * c + j]!;
    for (let k = 0; k < j; k++) {
      const factor = -triangle[j * c + k]! * pivot;
      for (let i = 0; i <= k; i++) root[j * c + i]! += factor * root[k * c + i]!;
    }
    root[j * c + j] = pivot;
  }
  for (let i = 0; i < c; i++) {
    let estimate = 0;
    for (let k = i; k < c; k++) estimate += root[k * c + i]! * open.response[k]!;
    node.estimates[i] = estimate;
    for (let j = 0; j <= i; j++) {
      let sum = 0;
      for (let k = i; k < c; k++) sum += root[k * c + i]! * root[k * c + j]!;
      node.inverse[i * c + j] = sum;
      node.inverse[j * c + i] = sum;
    }
  }
}

/** What leaves a node in one step, and what it does to the columns that are left open. */
export interface Departure {
  /** Columns that leave. */
  count: number;
  /** How much RSS rises. */
  rise: number;
  /** Positions in the parent's columns of those that are left open, and how many they are. */
  readonly left: Int32Array;
  leftCount: number;
  /** weights[k · stride + j]: row k of L⁻¹ times the parent's block between leavers and the j-th that is left. */
  readonly weights: Float64Array;
  readonly stride: number;
  /** L⁻¹ times the leavers' estimates. */
  readonly parts: Float64Array;
  /** Cholesky's factor of the leavers' block, rows one after the other. */
  readonly lower: Float64Array;
}

export function emptyDeparture(columns: number): Departure {
  const room = Math.max(1, columns);
  return {
    count: 0,
    rise: 0,
    left: new Int32Array(room),
    leftCount: 0,
    weights: new Float64Array(room * room),
    stride: room,
    parts: new Float64Array(room),
    lower: new Float64Array(room * room),
  };
}

/**
 * Works out the rise b′ V⁻¹ b for the columns at `leavers` (V their block of the inverse, b their estimates) by
 * Cholesky's decomposition.
 */
export function departure(node: SubsetNode, leavers: Int32Array, count: number, out: Departure): void {
  const { inverse, estimates, columns: c } = node;
  const { lower, parts } = out;
  out.count = count;
  out.rise = 0;
  for (let a = 0; a < count; a++) {
    const row = leavers[a]! * c;
    for (let b = 0; b <= a; b++) {
      let sum = inverse[row + leavers[b]!]!;
      for (let k = 0; k < b; k++) sum -= lower[a * count + k]! * lower[b * count + k]!;
      lower[a * count + b] = a === b ? Math.sqrt(sum) : sum / lower[b * count + b]!;
    }
    let part = estimates[leavers[a]!]!;
    for (let k = 0; k < a; k++) part -= lower[a * count + k]! * parts[k]!;
    part /= lower[a * count + a]!;
    parts[a] = part;
    out.rise += part * part;
  }
}

/** Completes a departure with what it does to the columns at `left`. */
export function aftermath(node: SubsetNode, leavers: Int32Array, out: Departure): void {
  const { inverse, columns: c } = node;
  const { lower, weights, stride, left, leftCount: m, count } = out;
  for (let a = 0; a < count; a++) {
    const row = leavers[a]! * c;
    const at = a * stride;
    const scale = 1 / lower[a * count + a]!;
    for (let j = 0; j < m; j++) {
      let sum = inverse[row + left[j]!]!;
      for (let k = 0; k < a; k++) sum -= lower[a * count + k]! * weights[k * stride + j]!;
      weights[at + j] = sum * scale;
    }
  }
}

/** The node that is left after a departure: V − W′W of the columns that are left. `order` and `groups` are the caller's. */
export function depart(parent: SubsetNode, out: Departure, child: SubsetNode): void {
  const { inverse: from, columns: c, estimates } = parent;
  const { inverse: to } = child;
  const { left, leftCount: m, weights, stride, count, parts } = out;
  child.columns = m;
  child.residual = parent.residual + out.rise;
  for (let i = 0; i < m; i++) {
    const source = left[i]! * c;
    const target = i * m;
    const weight = weights[i]!;
    child.estimates[i] = estimates[left[i]!]! - weight * parts[0]!;
    for (let j = 0; j <= i; j++) to[target + j] = from[source + left[j]!]! - weight * weights[j]!;
  }
  for (let k = 1; k < count; k++) {
    const at = k * stride;
    for (let i = 0; i < m; i++) {
      const weight = weights[at + i]!;
      child.estimates[i]! -= weight * parts[k]!;
      for (let j = 0; j <= i; j++) to[i * m + j]! -= weight * weights[at + j]!;
    }
  }
  for (let i = 1; i < m; i++) for (let j = 0; j < i; j++) to[j * m + i] = to[i * m + j]!;
}

/** Position of an open group; −1 where it is not open. */
function positionOf(node: SubsetNode, group: number): number {
  const at = node.positions[group]!;
  return at < node.groups && node.order[at] === group ? at : -1;
}

/** Lists the columns that leave with the group at a position; gives how many. */
export function leaversWith(
  node: SubsetNode,
  position: number,
  { starts, dependents }: GroupLayout,
  leavers: Int32Array,
): number {
  const group = node.order[position]!;
  const offset = node.offsets[position]!;
  const width = starts[group + 1]! - starts[group]!;
  let count = 0;
  for (let c = 0; c < width; c++) leavers[count++] = offset + c;
  for (const other of dependents[group]!) {
    const at = positionOf(node, other);
    if (at < 0) continue;
    for (let c = 0; c < starts[other + 1]! - starts[other]!; c++) leavers[count++] = node.offsets[at]! + c;
  }
  return count;
}

/** Scratch of a search. */
export interface SubsetScratch {
  readonly leavers: Int32Array;
  readonly step: Departure;
  readonly square: Float64Array;
  readonly values: Float64Array;
}

/** Places with fewer open columns are not worth the larger bound. */
const SCALE_FROM = 8;
/** The scale of the larger bound is taken again when no more than this share of the columns is left. */
const SCALE_AGAIN = 0.65;

/**
 * Works out of a node whose groups, inverse and estimates are there all the rest: what each group's loss would cost,
 * the order in which they leave, and the sums of the bound.
 */
export function survey(node: SubsetNode, layout: GroupLayout, scratch: SubsetScratch): void {
  const { starts, needs, dependents } = layout;
  const { leavers, step, values } = scratch;
  const { groups: count, columns, rises, ranking, ids } = node;
  let column = 0;
  for (let k = 0; k < count; k++) {
    const group = node.order[k]!;
    node.offsets[k] = column;
    node.positions[group] = k;
    for (let c = starts[group]!; c < starts[group + 1]!; c++) ids[column++] = c;
  }
  for (let k = 0; k < count; k++) {
    const group = node.order[k]!;
    const at = node.offsets[k]!;
    if (starts[group + 1]! - starts[group]! === 1 && dependents[group]!.length === 0) {
      rises[k] = (node.estimates[at]! * node.estimates[at]!) / node.inverse[at * columns + at]!;
    } else {
      departure(node, leavers, leaversWith(node, k, layout, leavers), step);
      // What rounding leaves untold cuts nothing off.
      rises[k] = Number.isFinite(step.rise) ? step.rise : 0;
    }
  }
  if (layout.hasNeeds) {
    // A group's loss takes with it those that need it, and costs no less: rounding must not say otherwise.
    for (let k = count - 1; k >= 0; k--) {
      for (const needed of needs[node.order[k]!]!) {
        const at = positionOf(node, needed);
        if (at >= 0) rises[at] = Math.max(rises[at]!, rises[k]!);
      }
    }
  }
  // Of equal losses the earlier group leaves first, so that what is needed stands before what needs it.
  for (let k = 0; k < count; k++) {
    let at = k;
    while (at > 0 && rises[ranking[at - 1]!]! < rises[k]!) {
      ranking[at] = ranking[at - 1]!;
      at--;
    }
    ranking[at] = k;
  }
  if (columns >= SCALE_FROM && (node.variances === null || columns <= SCALE_AGAIN * node.anchor))
    takeScale(node, starts.at(-1)!, scratch.square);
  if (node.variances === null) return;
  for (let k = 0; k < count; k++) {
    const group = node.order[k]!;
    const first = node.offsets[k]!;
    node.shares[k] = 0;
    for (let c = first; c < first + starts[group + 1]! - starts[group]!; c++) {
      const estimate = node.estimates[c]!;
      values[c] = (estimate * estimate) / (node.variances[ids[c]!]! * node.eigenvalue);
      node.shares[k]! += values[c]!;
    }
  }
  sortAscending(values, columns);
  for (let c = 0; c < columns; c++) node.sums[c + 1] = node.sums[c]! + values[c]!;
}

/**
 * Takes the scale of the bound from this node: of m columns that leave, with estimates b and block V of the inverse,
 * b′ V⁻¹ b ≥ Σ b_i²/v_i / λ, with v_i the diagonal and λ the largest eigenvalue of the inverse measured by it. Both hold
 * for all places below, whose inverses are smaller. λ is estimated by a few multiplications and made safe by
 * Cholesky's decomposition of μI − C, which exists only for a μ above it.
 */
function takeScale(node: SubsetNode, width: number, scratch: Float64Array): void {
  const { inverse, columns: c, ids } = node;
  const variances = new Float64Array(width);
  const units = new Float64Array(c);
  for (let i = 0; i < c; i++) {
    variances[ids[i]!] = inverse[i * c + i]!;
    units[i] = 1 / Math.sqrt(inverse[i * c + i]!);
  }
  node.variances = variances;
  node.anchor = c;
  let x = Float64Array.from({ length: c }, (_, i) => 1 + ((i * 7) % 5) / 10);
  let eigenvalue = 1;
  for (let step = 0; step < 6; step++) {
    const product = new Float64Array(c);
    let squares = 0;
    let before = 0;
    for (let i = 0; i < c; i++) before += x[i]! * x[i]!;
    for (let i = 0; i < c; i++) {
      let sum = 0;
      for (let j = 0; j < c; j++) sum += inverse[i * c + j]! * x[j]! * units[j]!;
      product[i] = sum * units[i]!;
      squares += product[i]! * product[i]!;
    }
    eigenvalue = Math.sqrt(squares / before);
    const scale = 1 / Math.sqrt(squares);
    for (let i = 0; i < c; i++) product[i]! *= scale;
    x = product;
  }
  let bound = eigenvalue * 1.03;
  while (bound < c && !isAbove(bound, inverse, units, c, scratch)) bound *= 1.08;
  // The trace is an upper bound in any case.
  node.eigenvalue = Math.min(bound, c);
}

/** Whether bound · I − C is positive definite, C the inverse measured by `units`. */
function isAbove(
  bound: number,
  inverse: Float64Array,
  units: Float64Array,
  c: number,
  lower: Float64Array,
): boolean {
  for (let i = 0; i < c; i++) {
    const row = i * c;
    for (let j = 0; j <= i; j++) {
      let sum = (i === j ? bound : 0) - inverse[row + j]! * units[i]! * units[j]!;
      const other = j * c;
      for (let k = 0; k < j; k++) sum -= lower[row + k]! * lower[other + k]!;
      if (i === j) {
        if (!(sum > 1e-10)) return false;
        lower[row + i] = Math.sqrt(sum);
      } else lower[row + j] = sum / lower[other + j]!;
    }
  }
  return true;
}

/** Ascending, in place: the lists are short, and nearly sorted more often than not. */
export function sortAscending(values: Float64Array, count: number): void {
  for (let gap = count > 12 ? 7 : 1; gap > 0; gap = gap === 7 ? 3 : gap === 3 ? 1 : 0) {
    for (let i = gap; i < count; i++) {
      const value = values[i]!;
      let at = i;
      while (at >= gap && values[at - gap]! > value) {
        values[at] = values[at - gap]!;
        at -= gap;
      }
      values[at] = value;
    }
  }
}

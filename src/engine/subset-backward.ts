import type { SubsetEntry } from './subset-lists.ts';
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
  survey,
} from './subset-node.ts';
import { type OpenTriangle, obstacleIn } from './subset-triangle.ts';

/** By size: sets as lists of groups, each once, with their RSS, the least first. */
export type SeenSets = ReadonlyMap<number, readonly SubsetEntry[]>;

/**
 * Good sets to start a search with: leaves out the group whose loss costs least, one after the other, and notes on the way
 * every set that lacks one group. None where columns depend on each other.
 */
export function backwardSets(
  open: OpenTriangle,
  lengths: Float64Array,
  layout: GroupLayout,
  atLeast: number,
  atMost: number,
): SeenSets {
  if (open.columns === 0 || obstacleIn(open, layout.starts, lengths) !== null) return new Map();
  const groupCount = open.order.length;
  const scratch: SubsetScratch = {
    leavers: new Int32Array(open.columns + 1),
    step: emptyDeparture(open.columns),
    square: new Float64Array(open.columns ** 2),
    values: new Float64Array(open.columns + 1),
  };
  const { leavers, step } = scratch;
  const seen = new Map<number, Map<string, SubsetEntry>>();
  let [node, next] = [room(), room()];
  enter(open, node);
  while (node.groups > 0) {
    survey(node, layout, scratch);
    for (let k = 0; k < node.groups; k++) note(node, k);
    const last = node.ranking[node.groups - 1]!;
    const leaving = node.order[last]!;
    const gone = layout.dependents[leaving]!;
    departure(node, leavers, leaversWith(node, last, layout, leavers), step);
    let left = 0;
    next.groups = 0;
    for (let k = 0; k < node.groups; k++) {
      const group = node.order[k]!;
      if (group === leaving || gone.includes(group)) continue;
      next.order[next.groups++] = group;
      const width = layout.starts[group + 1]! - layout.starts[group]!;
      for (let c = 0; c < width; c++) step.left[left++] = node.offsets[k]! + c;
    }
    step.leftCount = left;
    aftermath(node, leavers, step);
    depart(node, step, next);
    next.variances = null;
    [node, next] = [next, node];
  }
  return new Map(
    [...seen].map(([size, sets]) => [size, [...sets.values()].sort((a, b) => a.residual - b.residual)]),
  );

  function room(): SubsetNode {
    return emptyNode(groupCount, open.columns, groupCount);
  }

  function note(from: SubsetNode, position: number): void {
    const group = from.order[position]!;
    const gone = layout.dependents[group]!;
    const rest = [...from.order.subarray(0, from.groups)].filter(
      (each) => each !== group && !gone.includes(each),
    );
    if (rest.length < atLeast || rest.length > atMost) return;
    const size = from.columns - leaversWith(from, position, layout, leavers);
    const sets = seen.get(size) ?? new Map<string, SubsetEntry>();
    seen.set(size, sets);
    rest.sort((a, b) => a - b);
    sets.set(rest.join(), { groups: rest, residual: from.residual + from.rises[position]! });
  }
}

import type { SubsetGround } from './subset-ground.ts';

/**
 * Follows the groups that stay and tells where one of them is inflated beyond the limit by those before it. The
 * inflation of a column only grows as others join it, so that every set with these groups breaks the limit too.
 */
export interface InflationStack {
  /** Puts a group at a place of the stack; what stood there and after it is gone. */
  readonly push: (at: number, group: number) => void;
  /** Whether one of the first `count` groups is above the limit. */
  readonly isAbove: (count: number) => boolean;
}

/** What stands at the limit but for rounding is left to the exact test. */
const MARGIN = 1e-6;

export function inflationStack(ground: SubsetGround, most: number | null): InflationStack {
  if (most === null) return { push: () => {}, isAbove: () => false };
  const { starts, ownLogs } = ground;
  const { columns: c, triangle } = ground.open;
  const groups = ground.groups.length;
  const basis = new Float64Array(c * c);
  const stack = new Int32Array(groups + 1);
  const ends = new Int32Array(groups + 1);
  const above = new Uint8Array(groups + 1);
  // Groups of the stack that are worked out: most are gone again before anyone asks.
  let known = 0;
  return {
    push(at, group) {
      stack[at] = group;
      known = Math.min(known, at);
    },
    isAbove(count) {
      while (known < count) {
        workOut(known);
        known++;
      }
      return above[count] === 1;
    },
  };

  function workOut(at: number): void {
    const group = stack[at]!;
    let end = ends[at]!;
    let log = ownLogs[group]!;
    for (let column = starts[group]!; column < starts[group + 1]!; column++) {
      const target = end * c;
      for (let i = 0; i < c; i++) basis[target + i] = i <= column ? triangle[column * c + i]! : 0;
      // Gram and Schmidt's orthogonalisation, twice for full orthogonality.
      for (let pass = 0; pass < 2; pass++) for (let k = 0; k < end; k++) removePart(k * c, target);
      let square = 0;
      for (let i = 0; i < c; i++) square += basis[target + i]! ** 2;
      log -= Math.log(square);
      if (square === 0) continue;
      const length = Math.sqrt(square);
      for (let i = 0; i < c; i++) basis[target + i]! /= length;
      end++;
    }
    const width = starts[group + 1]! - starts[group]!;
    ends[at + 1] = end;
    above[at + 1] = above[at] === 1 || log > width * Math.log(most!) + MARGIN ? 1 : 0;
  }

  function removePart(unit: number, target: number): void {
    let dot = 0;
    for (let i = 0; i < c; i++) dot += basis[unit + i]! * basis[target + i]!;
    for (let i = 0; i < c; i++) basis[target + i]! -= dot * basis[unit + i]!;
  }
}

/** Every subset of groups of columns and its RSS, by Gram–Schmidt on plain arrays: shares nothing with the engine. */
export interface PlainGroup {
  readonly columns: readonly (readonly number[])[];
  readonly needs: readonly number[];
}

export interface PlainSubset {
  readonly groups: readonly number[];
  /** Columns of the groups, what is always in not counted. */
  readonly size: number;
  readonly residual: number;
  /** A column of it depends on others, so that a smaller set says the same. */
  readonly isDependent: boolean;
}

const dot = (a: readonly number[], b: readonly number[]) => {
  let sum = 0;
  for (let i = 0; i < a.length; i++) sum += a[i]! * b[i]!;
  return sum;
};

/** `x` without its part along the unit vectors, in two passes. */
function without(x: readonly number[], basis: readonly (readonly number[])[]): number[] {
  const left = [...x];
  for (let pass = 0; pass < 2; pass++) {
    for (const unit of basis) {
      const part = dot(left, unit);
      for (let i = 0; i < left.length; i++) left[i]! -= part * unit[i]!;
    }
  }
  return left;
}

export function allSubsets(
  always: readonly (readonly number[])[],
  groups: readonly PlainGroup[],
  y: readonly number[],
): PlainSubset[] {
  const found: PlainSubset[] = [];
  const start = extend([], y, always);
  grow(0, [], start.basis, start.left, 0, false);
  return found.filter(({ groups: own }) =>
    own.every((g) => groups[g]!.needs.every((need) => own.includes(need))),
  );

  function grow(
    from: number,
    own: readonly number[],
    basis: readonly (readonly number[])[],
    left: readonly number[],
    size: number,
    isDependent: boolean,
  ): void {
    found.push({ groups: own, size, residual: dot(left, left), isDependent });
    for (let g = from; g < groups.length; g++) {
      const { columns } = groups[g]!;
      const longer = extend(basis, left, columns);
      const depends = isDependent || longer.basis.length < basis.length + columns.length;
      grow(g + 1, [...own, g], longer.basis, longer.left, size + columns.length, depends);
    }
  }

  function extend(
    basis: readonly (readonly number[])[],
    left: readonly number[],
    columns: readonly (readonly number[])[],
  ): { basis: readonly (readonly number[])[]; left: readonly number[] } {
    const longer = [...basis];
    let rest = left;
    for (const column of columns) {
      const own = without(column, longer);
      const length = Math.sqrt(dot(own, own));
      if (length <= 1e-9 * Math.sqrt(dot(column, column))) continue;
      const unit = own.map((value) => value / length);
      longer.push(unit);
      rest = without(rest, [unit]);
    }
    return { basis: longer, left: rest };
  }
}

/** The `keep` best RSS of each size among the sets that pass. */
export function bestResiduals(
  subsets: readonly PlainSubset[],
  keep: number,
  passes: (subset: PlainSubset) => boolean,
): Map<number, number[]> {
  const best = new Map<number, number[]>();
  for (const subset of subsets) {
    if (subset.isDependent || !passes(subset)) continue;
    const list = best.get(subset.size) ?? [];
    list.push(subset.residual);
    best.set(subset.size, list);
  }
  for (const [size, list] of best) best.set(size, list.sort((a, b) => a - b).slice(0, keep));
  return best;
}

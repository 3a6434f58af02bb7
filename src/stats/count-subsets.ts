/** What counting needs to know of one member: how much it weighs, and which others must be in with it. */
export interface CountedMember {
  /** Whole number, at least 0. */
  readonly weight: number;
  /** Indexes of the members that are in whenever this one is; all of them, not only the next. */
  readonly needs: readonly number[];
}

export interface SubsetCounts {
  /** counts[members][weight]: how many sets there are of so many members and so much weight. */
  readonly counts: readonly Float64Array[];
  /** False where the needs are too tangled to count: some are then counted that lack a member they need. */
  readonly exact: boolean;
}

type Polynomial = readonly Float64Array[];

/** Steps of the recursion after which the needs of what is left are ignored. */
const MOST_STEPS = 2_000;

/**
 * How many subsets there are that keep every need, by their number of members and their weight; beyond 2^53 rounded.
 * Members that have nothing to do with each other are counted apart and multiplied; among the others the one with
 * the most ties is taken as out (and with it all that need it) and as in (and with it all that it needs).
 */
export function countSubsets(members: readonly CountedMember[]): SubsetCounts {
  let steps = 0;
  let exact = true;
  const all = members.map((_, index) => index);
  return { counts: countAmong(all), exact };

  function countAmong(among: readonly number[]): Polynomial {
    let product: Polynomial = [Float64Array.of(1)];
    for (const component of componentsOf(among)) product = multiply(product, countComponent(component));
    return product;
  }

  function countComponent(component: readonly number[]): Polynomial {
    const only = component[0]!;
    if (component.length === 1) return oneOrNone(members[only]!.weight);
    steps++;
    if (steps > MOST_STEPS) {
      exact = false;
      return component.reduce<Polynomial>(
        (product, each) => multiply(product, oneOrNone(members[each]!.weight)),
        [Float64Array.of(1)],
      );
    }
    const ties = (index: number) => component.filter((other) => areTied(index, other)).length;
    const most = Math.max(...component.map(ties));
    const pivot = component.find((index) => ties(index) === most)!;
    const without = component.filter((each) => each !== pivot && !members[each]!.needs.includes(pivot));
    const { needs } = members[pivot]!;
    const taken = component.filter((each) => each === pivot || needs.includes(each));
    const beside = component.filter((each) => !taken.includes(each));
    const weight = taken.reduce((sum, each) => sum + members[each]!.weight, 0);
    return add(countAmong(without), shift(countAmong(beside), taken.length, weight));
  }

  function componentsOf(among: readonly number[]): number[][] {
    const open = new Set(among);
    const components: number[][] = [];
    for (const start of among) {
      if (!open.delete(start)) continue;
      const component = [start];
      for (const each of component) {
        for (const other of open) {
          if (!areTied(each, other)) continue;
          open.delete(other);
          component.push(other);
        }
      }
      components.push(component);
    }
    return components;
  }

  function areTied(a: number, b: number): boolean {
    return a !== b && (members[a]!.needs.includes(b) || members[b]!.needs.includes(a));
  }
}

/** How many of the counted sets have between `least` and `most` members and at most `heaviest` weight. */
export function countBetween(
  { counts }: Pick<SubsetCounts, 'counts'>,
  least: number,
  most: number,
  heaviest = Number.POSITIVE_INFINITY,
): number {
  let sum = 0;
  for (let size = Math.max(0, least); size <= Math.min(most, counts.length - 1); size++) {
    counts[size]!.forEach((count, weight) => {
      if (weight <= heaviest) sum += count;
    });
  }
  return sum;
}

function oneOrNone(weight: number): Polynomial {
  const taken = new Float64Array(weight + 1);
  taken[weight] = 1;
  return [Float64Array.of(1), taken];
}

function multiply(a: Polynomial, b: Polynomial): Polynomial {
  const heaviest = widest(a) + widest(b) - 1;
  const product = Array.from({ length: a.length + b.length - 1 }, () => new Float64Array(heaviest));
  const spans = b.map(spanOf);
  a.forEach((left, i) => {
    const [from, to] = spanOf(left);
    b.forEach((right, j) => {
      const row = product[i + j]!;
      const [first, last] = spans[j]!;
      for (let u = from; u < to; u++) {
        for (let v = first; v < last; v++) row[u + v]! += left[u]! * right[v]!;
      }
    });
  });
  return product;
}

/** Where a row is not zero: most rows hold few weights. */
function spanOf(row: Float64Array): readonly [number, number] {
  let last = row.length;
  while (last > 0 && row[last - 1] === 0) last--;
  let first = 0;
  while (first < last && row[first] === 0) first++;
  return [first, last];
}

function add(a: Polynomial, b: Polynomial): Polynomial {
  const heaviest = Math.max(widest(a), widest(b));
  return Array.from({ length: Math.max(a.length, b.length) }, (_, i) => {
    const row = new Float64Array(heaviest);
    for (const source of [a[i], b[i]])
      source?.forEach((count, weight) => {
        row[weight]! += count;
      });
    return row;
  });
}

function shift(a: Polynomial, members: number, weight: number): Polynomial {
  const empty = Array.from({ length: members }, () => new Float64Array(1));
  const moved = a.map((row) => {
    const longer = new Float64Array(row.length + weight);
    longer.set(row, weight);
    return longer;
  });
  return [...empty, ...moved];
}

function widest(a: Polynomial): number {
  return a.reduce((most, row) => Math.max(most, row.length), 1);
}

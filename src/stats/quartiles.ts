export interface Quartiles {
  readonly smallest: number;
  readonly lowerQuartile: number;
  readonly median: number;
  readonly upperQuartile: number;
  readonly largest: number;
}

/**
 * Quartiles by linear interpolation between order statistics at (n − 1)p (definition 7 of Hyndman & Fan 1996),
 * found by selection, without sorting all values. No value may be NaN; all NaN for an empty array.
 */
export function quartilesOf(values: Float64Array): Quartiles {
  const work = values.slice();
  const last = work.length - 1;
  if (last < 0) {
    const none = Number.NaN;
    return { smallest: none, lowerQuartile: none, median: none, upperQuartile: none, largest: none };
  }
  // The median first: it parts the values, so that each quartile is then sought in one half only.
  const middle = Math.floor(last / 2);
  select(work, middle, 0, last);
  const quartile = Math.floor(last / 4);
  select(work, quartile, 0, middle);
  const upper = Math.floor((last * 3) / 4);
  select(work, upper, middle, last);
  const at = (share: number, position: number): number => {
    const rest = last * share - position;
    if (rest === 0) return work[position]!;
    let next = Number.POSITIVE_INFINITY;
    for (let i = position + 1; i <= last; i++) if (work[i]! < next) next = work[i]!;
    const gap = next - work[position]!;
    // Between the ends of the range of numbers the gap itself cannot be held.
    return gap < Number.POSITIVE_INFINITY
      ? work[position]! + rest * gap
      : (1 - rest) * work[position]! + rest * next;
  };
  let smallest = Number.POSITIVE_INFINITY;
  let largest = Number.NEGATIVE_INFINITY;
  for (let i = 0; i <= quartile; i++) if (work[i]! < smallest) smallest = work[i]!;
  for (let i = upper; i <= last; i++) if (work[i]! > largest) largest = work[i]!;
  return {
    smallest,
    lowerQuartile: at(0.25, quartile),
    median: at(0.5, middle),
    upperQuartile: at(0.75, upper),
    largest,
  };
}

/**
 * Puts the k-th smallest of work[left…right] in its place, smaller ones before it and larger ones after it
 * (Hoare 1961, pivot the median of three). On plain numbers: a comparison function would cost ten times as much
 * over a million values.
 */
function select(work: Float64Array, k: number, from: number, to: number): void {
  let left = from;
  let right = to;
  while (right > left) {
    const pivot = medianOfThree(work[left]!, work[(left + right) >> 1]!, work[right]!);
    let i = left - 1;
    let j = right + 1;
    for (;;) {
      do i++;
      while (work[i]! < pivot);
      do j--;
      while (work[j]! > pivot);
      if (i >= j) break;
      const value = work[i]!;
      work[i] = work[j]!;
      work[j] = value;
    }
    if (k <= j) right = j;
    else left = j + 1;
  }
}

function medianOfThree(a: number, b: number, c: number): number {
  return Math.max(Math.min(a, b), Math.min(Math.max(a, b), c));
}

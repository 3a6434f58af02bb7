import { quickselect } from 'd3-array';

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
  const n = work.length;
  if (n === 0) {
    return {
      smallest: Number.NaN,
      lowerQuartile: Number.NaN,
      median: Number.NaN,
      upperQuartile: Number.NaN,
      largest: Number.NaN,
    };
  }
  const last = n - 1;
  // Each selection leaves everything below its position smaller, so later ones look only to the right.
  let done = 0;
  const at = (position: number): number => {
    if (position > done || position === 0) quickselect(work, position, Math.min(done, position), last);
    done = Math.max(done, position);
    return work[position]!;
  };
  const quantile = (share: number): number => {
    const position = last * share;
    const below = Math.floor(position);
    const value = at(below);
    return below === position ? value : value + (position - below) * (at(below + 1) - value);
  };
  return {
    smallest: quantile(0),
    lowerQuartile: quantile(0.25),
    median: quantile(0.5),
    upperQuartile: quantile(0.75),
    largest: quantile(1),
  };
}

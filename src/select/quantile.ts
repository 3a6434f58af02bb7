/**
 * The quantile at `p` of sorted values, by linear interpolation between order statistics at (n − 1)p (definition 7 of
 * Hyndman & Fan 1996). NaN for none.
 */
export function quantileOf(sorted: Float64Array, p: number): number {
  const place = (sorted.length - 1) * p;
  const below = Math.floor(place);
  const low = sorted[below];
  if (low === undefined) return Number.NaN;
  const high = sorted[below + 1] ?? low;
  return low + (place - below) * (high - low);
}

/** Indexes of the largest values, largest first, NaN left out; earlier ones first among equals. */
export function largest(values: Float64Array, count: number): number[] {
  const found: number[] = [];
  let least = Number.NEGATIVE_INFINITY;
  for (let i = 0; i < values.length; i++) {
    const value = values[i]!;
    if (Number.isNaN(value) || (found.length === count && value <= least)) continue;
    let at = found.length;
    while (at > 0 && values[found[at - 1]!]! < value) at--;
    found.splice(at, 0, i);
    if (found.length > count) found.pop();
    least = values[found.at(-1)!]!;
  }
  return found;
}

/**
 * p-values adjusted for their number by Holm's steps (1979): the k-th smallest of m is multiplied by m − k + 1, and none
 * is below the one before it; at most 1.
 */
export function holm(pValues: readonly number[]): number[] {
  const order = pValues.map((_, k) => k).sort((a, b) => pValues[a]! - pValues[b]!);
  const adjusted = new Array<number>(pValues.length).fill(0);
  let most = 0;
  order.forEach((k, rank) => {
    most = Math.max(most, Math.min(1, (pValues.length - rank) * pValues[k]!));
    adjusted[k] = most;
  });
  return adjusted;
}

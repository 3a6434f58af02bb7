import { createRequire } from 'node:module';

const cephes = createRequire(import.meta.url)('cephes') as typeof import('cephes').default;

/**
 * The exact interval for a share of which k of n were seen (Clopper & Pearson 1934), through the inverse incomplete
 * beta function. [NaN, NaN] unless 0 ≤ k ≤ n, n ≥ 1 and the confidence lies between 0 and 1.
 */
export function binomialInterval(k: number, n: number, confidence: number): readonly [number, number] {
  if (!(n >= 1 && k >= 0 && k <= n && confidence > 0 && confidence < 1)) return [Number.NaN, Number.NaN];
  const tail = (1 - confidence) / 2;
  return [k === 0 ? 0 : cephes.incbi(k, n - k + 1, tail), k === n ? 1 : cephes.incbi(k + 1, n - k, 1 - tail)];
}

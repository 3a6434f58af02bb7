import type { RankBy } from '../study/study.ts';

const INFORMATION: readonly RankBy[] = ['aic', 'aicc', 'bic'];

/**
 * Weights of evidence exp(−Δ/2)/Σ exp(−Δ/2) over all candidates with a value (Burnham & Anderson 2002), for the
 * information criteria; for BIC they approximate posterior probabilities under equal prior ones. Null for the
 * other criteria and where a value is null.
 * @param differences Δ from the best value, or null
 */
export function evidenceWeights(rankBy: RankBy, differences: readonly (number | null)[]): (number | null)[] {
  if (!INFORMATION.includes(rankBy)) return differences.map(() => null);
  const raw = differences.map((delta) => (delta === null ? null : Math.exp(-delta / 2)));
  const sum = raw.reduce<number>((total, weight) => total + (weight ?? 0), 0);
  return raw.map((weight) => (weight === null ? null : weight / sum));
}

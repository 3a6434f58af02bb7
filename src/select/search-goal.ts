import type { SubsetGoal } from '../engine/subset-lists.ts';
import type { SelectionPlan } from '../study/study.ts';

/**
 * The criterion as a search needs it: as a cost of the number of coefficients p and RSS alone, constants left out, and
 * the RSS at which that cost is reached. Null for criteria that do not follow from these two.
 *
 * @param n rows
 * @param total TSS over its degrees of freedom: what adjusted R² is in units of
 * @param fullVariance s² of the union of all terms, or null
 */
export function searchGoal(
  plan: Pick<SelectionPlan, 'rankBy' | 'preferSmallerWithin'>,
  n: number,
  total: number,
  fullVariance: number | null,
): SubsetGoal | null {
  const slack = plan.preferSmallerWithin;
  const information = (penalty: (k: number) => number): SubsetGoal => ({
    value: (p, rss) => n * Math.log(rss) + penalty(p + 1),
    residualAt: (p, value) => Math.exp((value - penalty(p + 1)) / n),
    slack,
  });
  switch (plan.rankBy) {
    case 'aic':
      return information((k) => 2 * k);
    case 'aicc':
      return information((k) =>
        n <= k + 1 ? Number.POSITIVE_INFINITY : 2 * k + (2 * k * (k + 1)) / (n - k - 1),
      );
    case 'bic':
      return information((k) => k * Math.log(n));
    case 'adjusted_r_squared':
      return {
        value: (p, rss) => rss / (n - p),
        residualAt: (p, value) => value * (n - p),
        slack: slack * total,
      };
    case 'mallows_cp':
      if (fullVariance === null) return null;
      return {
        value: (p, rss) => rss / fullVariance + 2 * p,
        residualAt: (p, value) => (value - 2 * p) * fullVariance,
        slack,
      };
    default:
      return null;
  }
}

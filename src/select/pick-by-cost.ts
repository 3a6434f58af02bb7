import type { CriterionContext } from '../engine/fit.ts';
import type { SelectionPlan } from '../study/study.ts';
import { sameValue, slackOf } from './rank.ts';

export interface CostPick {
  readonly chosen: number;
  /** The one with the lowest cost. */
  readonly best: number;
  /** How many lie within the tolerance of the best. */
  readonly near: number;
}

/**
 * Among candidates within a tolerance of the lowest cost: the fewest coefficients, then the lower cost, then the order
 * of declaration. Null where there is none.
 * @param candidates indexes in the order of declaration
 */
export function pickByCost(
  candidates: readonly number[],
  cost: (index: number) => number,
  size: (index: number) => number,
  within: (best: number) => number,
): CostPick | null {
  const [first] = candidates;
  if (first === undefined) return null;
  const least = (indexes: readonly number[], of: (index: number) => number) =>
    indexes.reduce((smallest, index) => Math.min(smallest, of(index)), Number.POSITIVE_INFINITY);
  const lowest = least(candidates, cost);
  const best = candidates.find((index) => cost(index) === lowest) ?? first;
  const reach = within(best);
  const near = candidates.filter((index) => cost(index) - lowest <= reach + slackOf(lowest));
  const fewest = least(near, size);
  const smallest = near.filter((index) => size(index) === fewest);
  const lowestOfSmallest = least(smallest, cost);
  const chosen = smallest.find((index) => sameValue(lowestOfSmallest, cost(index)))!;
  return { chosen, best, near: near.length };
}

/** How far from the best candidate another may lie and still count as close, in units of the criterion. */
export function tolerance(plan: SelectionPlan, best: number, context: CriterionContext): number {
  return plan.oneStandardError
    ? (context.validation?.figures[best]?.standardError ?? 0)
    : plan.preferSmallerWithin;
}

import type { FitContext } from '../engine/fit.ts';
import type { SelectionPlan } from '../study/study.ts';
import type { Admission } from './admission.ts';
import type { Criterion } from './criterion.ts';
import { pickByCost, tolerance } from './pick-by-cost.ts';
import { costOf, type Ranked, sameValue, slackOf } from './rank.ts';
import { counted, limitText, named, significant } from './words.ts';

export interface ValuePick {
  readonly chosen: number;
  /** Sentences: which rule, how close the others. */
  readonly because: readonly string[];
}

/**
 * The choice by a criterion's value. Among the admitted candidates within `prefer_smaller_within` of the best
 * admitted one: the fewest coefficients, then the better value, then the order of declaration.
 * @param admitted indexes in the order of declaration, at least one, each with a value
 */
export function chooseByValue(
  plan: SelectionPlan,
  criterion: Criterion,
  context: FitContext,
  ranking: readonly Ranked[],
  admissions: readonly Admission[],
  admitted: readonly number[],
): ValuePick {
  const values = new Map(ranking.map(({ candidate, value }) => [candidate, value]));
  const cost = (index: number) => costOf(criterion, values.get(index)!);
  const size = (index: number) => context.fits[index]!.columns.length;
  const pick = pickByCost(admitted, cost, size, (best) => tolerance(plan, best, context))!;
  const { chosen, near } = pick;
  const best = cost(pick.best);

  const name = (index: number) => named(context.fits[index]!.candidate.name);
  const order = ranking.map(({ candidate }) => candidate).filter((index) => admissions[index]!.admitted);
  return { chosen, because: [mainSentence(), ...refusedAhead()] };

  function mainSentence(): string {
    const leader = order[0]!;
    const extreme = criterion.better === 'lower' ? 'lowest' : 'highest';
    if (admitted.length === 1) {
      const only =
        ranking.length === 1 ? 'the only candidate' : `the only one admitted of ${ranking.length} candidates`;
      return `${name(chosen)} is ${only}.`;
    }
    const leads = `has the ${extreme} ${criterion.title} (${significant(values.get(leader)!, 5)}) of ${counted(admitted.length, 'admitted candidate')}`;
    if (!sameValue(best, cost(chosen))) {
      return `${name(leader)} ${leads}, but ${name(chosen)}, ${behind(leader, chosen)}, has ${counted(size(chosen), 'coefficient')} instead of ${size(leader)}; of the ${near} candidates within ${margin()} of the best the study prefers the smallest.`;
    }
    const next = order.find((index) => index !== chosen)!;
    return `${name(chosen)} ${leads}; ${runnerUp(next)}.`;
  }

  function runnerUp(next: number): string {
    if (!sameValue(cost(chosen), cost(next))) return `${name(next)} comes next, ${behind(chosen, next)}`;
    const why = size(next) > size(chosen) ? 'has more coefficients' : 'is declared later';
    return `${name(next)} has the same value but ${why}`;
  }

  function margin(): string {
    return plan.oneStandardError
      ? `one standard error (${significant(tolerance(plan, pick.best, context), 2)})`
      : limitText(plan.preferSmallerWithin);
  }

  function behind(leader: number, other: number): string {
    return `${significant(Math.abs(cost(other) - cost(leader)), 2)} behind`;
  }

  /** Candidates that would have led had they been admitted. */
  function refusedAhead(): string[] {
    const ahead = ranking.filter(
      ({ candidate, value }) =>
        value !== null && !admissions[candidate]!.admitted && costOf(criterion, value) < best - slackOf(best),
    );
    if (ahead.length === 0) return [];
    const first = ahead[0]!.candidate;
    const others =
      ahead.length === 1
        ? ''
        : `, and so ${ahead.length === 2 ? 'does one other' : `do ${ahead.length - 1} others`} that ${ahead.length === 2 ? 'was' : 'were'} not admitted`;
    return [
      `${name(first)} has a better value but was not admitted${others}. The reason for ${name(first)}: ${admissions[first]!.refusedBecause.join(' ')}`,
    ];
  }
}

import type { Choice } from '../select/choose.ts';
import { criterionNamed } from '../select/criteria.ts';
import type { FoundFamily } from '../select/search-families.ts';
import { countText } from '../select/words.ts';
import type { SelectionPlan } from '../study/study.ts';
import type { RecordCandidate, RecordFamily, StudyRecord } from './record.ts';

/** How many models the choice was made among: the named ones and all that the searches cover. */
export function modelsLookedAt(named: number, families: readonly FoundFamily[]): number {
  return families.reduce((sum, { covered }) => sum + covered, named);
}

/** The families as the record has them. */
export function describeFamilies(
  families: readonly FoundFamily[],
  selection: SelectionPlan,
  choice: Choice,
  candidates: readonly RecordCandidate[],
): RecordFamily[] {
  const byName = new Map(candidates.map((candidate) => [candidate.name, candidate]));
  const values = new Map(choice.ranking.map(({ candidate, value }) => [candidates[candidate]!.name, value]));
  return families.map((family): RecordFamily => {
    const { plan, models } = family;
    const isSubsets = plan.kind === 'subsets';
    return {
      name: plan.name,
      kind: plan.kind,
      terms: plan.terms.map(({ always }, index) => ({ name: family.termNames[index]!, always })),
      hierarchy: plan.hierarchy,
      at_least: isSubsets ? plan.atLeast : null,
      at_most: isSubsets ? plan.atMost : null,
      keep: isSubsets ? plan.keep : null,
      leave_at: isSubsets ? null : plan.leaveAt,
      enter_at: isSubsets ? null : plan.enterAt,
      searched: family.covered,
      searched_exactly: family.coveredExactly,
      visited: family.visited,
      exact_for: family.exactFor,
      candidates: models.map(({ candidate }) => candidate),
      best_by_size: isSubsets ? bySize(models) : [],
      path: family.path.map(({ term, action, test }, index) => ({
        step: index + 1,
        action,
        term,
        statistic: test?.statistic ?? null,
        df1: test?.df1 ?? null,
        df2: test?.df2 ?? null,
        p_value: test?.p_value ?? null,
      })),
      ended_because: family.because,
      idle_terms: [...family.idle],
      note: isSubsets ? noteOf(selection, plan.keep) : null,
    };
  });

  function bySize(models: FoundFamily['models']): RecordFamily['best_by_size'] {
    const sizes = [...new Set(models.map(({ coefficientCount }) => coefficientCount))];
    return sizes.map((size) => {
      const own = models.filter(({ coefficientCount }) => coefficientCount === size);
      const best = own.find(({ admitted }) => admitted) ?? own[0]!;
      return {
        coefficient_count: size,
        candidate: best.candidate,
        value: values.get(best.candidate) ?? null,
        admitted: byName.get(best.candidate)!.admitted,
        settled: best.settled,
        better_refused: best.admitted ? (own.find(({ admitted }) => !admitted)?.candidate ?? null) : null,
      };
    });
  }
}

/** Criteria that do not follow from RSS and size rank what the search kept, and nothing else. */
function noteOf({ rankBy }: SelectionPlan, keep: number): string | null {
  if (rankBy !== 'press' && rankBy !== 'cross_validation' && rankBy !== 'partial_f') return null;
  const kept = keep === 1 ? 'the best one' : `the ${keep} best`;
  const { title } = criterionNamed(rankBy);
  return `The search goes by the residual sum of squares: ${title} is held only against ${kept} of each number of coefficients, and a model that it would prefer may not be among them.`;
}

/**
 * What p-values and intervals of a searched model leave out.
 * @param isEstimatedApart the chosen model is estimated from rows that had no part in the choice, so that they leave out nothing
 */
export function searchWarnings(
  named: number,
  families: readonly FoundFamily[],
  isEstimatedApart: boolean,
): StudyRecord['warnings'] {
  if (families.length === 0 || isEstimatedApart) return [];
  const atMost = families.some(({ coveredExactly }) => !coveredExactly) ? 'up to ' : '';
  const count = countText(modelsLookedAt(named, families));
  return [
    {
      about: 'selection',
      text: `The choice was made among ${atMost}${count} models. P-values, intervals and R² of the chosen one are worked out as if it had been the only one: they flatter it, the more so the more models were looked at. What it is worth is told by rows that had no part in the choice.`,
    },
  ];
}

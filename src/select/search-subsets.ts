import { bestSubsets, type SubsetsFound } from '../engine/best-subsets.ts';
import type { Factor } from '../engine/factor.ts';
import type { RowFacts } from '../engine/fit-candidate.ts';
import { columnNorm } from '../engine/kernel.ts';
import type { SubsetSearch } from '../engine/subset-search.ts';
import type { CandidateModel, FamilyModel } from '../model/design.ts';
import type { SelectionPlan, SubsetFamilyPlan } from '../study/study.ts';
import { familyCandidate } from './family-model.ts';
import { hasRules } from './search-admission.ts';
import { searchGoal } from './search-goal.ts';

/** Multiplications spent on the best of every size before only those that could be chosen are looked for. */
const EVERY_SIZE_BUDGET = 1.5e10;

export interface SubsetFamily extends FamilyModel {
  readonly plan: SubsetFamilyPlan;
}

export interface SubsetsQuestion {
  readonly family: SubsetFamily;
  readonly selection: SelectionPlan;
  readonly factor: Factor;
  readonly facts: RowFacts;
  readonly fullVariance: number | null;
  /** Whether a candidate keeps the rules of admission. */
  readonly admits: (candidate: CandidateModel) => boolean;
  /** The best of every size are wanted, and not only what could be chosen. */
  readonly everySize: boolean;
  readonly onProgress?: (visited: number) => void;
}

export interface SubsetsAnswer {
  /** Sets of optional terms, by index among them. */
  readonly found: SubsetsFound;
  /** The optional terms, by index in the family. */
  readonly optional: readonly number[];
  /** What the search is exact for; null where it was given up. */
  readonly exactFor: 'every size' | 'the choice' | null;
}

/** The terms of a model from the optional ones that it has, ascending. */
export function termsOf(family: SubsetFamily, optional: readonly number[], own: readonly number[]): number[] {
  const always = family.plan.terms.flatMap((term, index) => (term.always ? [index] : []));
  return [...always, ...own.map((k) => optional[k]!)].sort((a, b) => a - b);
}

/** Searches a family of subsets: for the best of every size, or, where that is too much, for those that could be chosen. */
export function searchSubsets(question: SubsetsQuestion): SubsetsAnswer {
  const { family, selection, factor, fullVariance } = question;
  const { plan, terms } = family;
  const optional = plan.terms.flatMap((term, index) => (term.always ? [] : [index]));
  const always = terms.filter((_, index) => plan.terms[index]!.always);
  const n = factor.rowCount;
  const { admit } = selection;
  const total = totalPerDegree(factor, family);
  const needless = plan.intercept || always.length > 0 ? 0 : 1;
  const search: SubsetSearch = {
    always: [...new Set([...(plan.intercept ? [0] : []), ...always.flatMap((term) => term.columns)])],
    groups: optional.map((index) => ({
      columns: terms[index]!.columns,
      needs: plan.terms[index]!.needs.flatMap((need) =>
        plan.terms[need]!.always ? [] : [optional.indexOf(need)],
      ),
    })),
    responseColumn: family.responseColumn,
    atLeast: Math.max(needless, plan.atLeast - always.length),
    atMost: plan.atMost - always.length,
    keep: plan.keep,
    mostColumns: mostColumns(),
    ...(admit.adjustedRSquared === null
      ? {}
      : { largestResidual: (p: number) => (1 - admit.adjustedRSquared!.atLeast) * total * (n - p) }),
    ...(hasRules(admit)
      ? {
          admits: (groups: readonly number[]) =>
            question.admits(familyCandidate(family, termsOf(family, optional, groups), plan.name)),
          largestInflation: admit.vif?.atMost ?? null,
        }
      : {}),
    ...(question.onProgress === undefined ? {} : { onProgress: question.onProgress }),
  };
  const goal = searchGoal(selection, n, total, fullVariance);
  if (goal === null || question.everySize) {
    const found = bestSubsets(factor, goal === null ? search : { ...search, budget: EVERY_SIZE_BUDGET });
    if (found.finished || goal === null)
      return { found, optional, exactFor: found.finished ? 'every size' : null };
  }
  const found = bestSubsets(factor, { ...search, goal });
  return { found, optional, exactFor: found.finished ? 'the choice' : null };

  /** A model must leave a degree of freedom, and keep the rule of rows for each coefficient. */
  function mostColumns(): number {
    const rule = admit.rowsPerCoefficient;
    return Math.min(n - 1, rule === null ? n : Math.floor((n / rule.atLeast) * (1 + 1e-12)));
  }
}

/** TSS over its degrees of freedom, as adjusted R² has it. */
function totalPerDegree(factor: Factor, { plan, responseColumn }: FamilyModel): number {
  const at = factor.predictorCount + responseColumn;
  const norm = columnNorm(factor.triangle, at, plan.intercept ? 1 : 0, at + 1) / factor.scales[at]!;
  return norm ** 2 / (factor.rowCount - (plan.intercept ? 1 : 0));
}

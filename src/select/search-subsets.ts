import { bestSubsets, type SubsetsFound } from '../engine/best-subsets.ts';
import type { Factor } from '../engine/factor.ts';
import type { RowFacts } from '../engine/fit-candidate.ts';
import { columnNorm } from '../engine/kernel.ts';
import type { SubsetSearch } from '../engine/subset-search.ts';
import type { CandidateModel, FamilyModel } from '../model/design.ts';
import { tTwoSidedQuantile } from '../stats/distributions.ts';
import type { SelectionPlan, SubsetFamilyPlan } from '../study/study.ts';
import { familyCandidate } from './family-model.ts';
import { hasRules } from './search-admission.ts';
import { searchGoal } from './search-goal.ts';

/** Multiplications spent on the best of every size before only those that could be chosen are looked for: half a minute. */
const EVERY_SIZE_BUDGET = 1.5e10;
/** The same with rules: where no set of a size is admitted, none can be known not to be without trying all. */
const WITH_RULES_BUDGET = 2e9;

export interface SubsetFamily extends FamilyModel {
  readonly plan: SubsetFamilyPlan;
}

export interface SubsetsQuestion {
  readonly family: SubsetFamily;
  readonly selection: SelectionPlan;
  readonly factor: Factor;
  readonly facts: RowFacts;
  readonly fullVariance: number | null;
  /** Whether p-values of the rules are classical. */
  readonly hasClassicalP: boolean;
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
  const { family, selection, factor, facts, fullVariance } = question;
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
          quick: {
            smallestT2: question.hasClassicalP ? smallestT2() : null,
            signs: optional.map((index) => signOf(index)),
          },
        }
      : {}),
    ...(question.onProgress === undefined ? {} : { onProgress: question.onProgress }),
  };
  const goal = searchGoal(selection, n, total, fullVariance);
  if (goal === null || question.everySize) {
    const found = bestSubsets(
      factor,
      goal === null ? search : { ...search, budget: hasRules(admit) ? WITH_RULES_BUDGET : EVERY_SIZE_BUDGET },
    );
    if (found.finished || goal === null)
      return { found, optional, exactFor: found.finished ? 'every size' : null };
  }
  const found = bestSubsets(factor, { ...search, goal });
  return { found, optional, exactFor: found.finished ? 'the choice' : null };

  /** t² at the limit of p-values, by the number of coefficients. */
  function smallestT2(): ((columns: number) => number) | null {
    const limit = admit.pValue?.atMost;
    if (limit === undefined) return null;
    const known: number[] = [];
    return (columns) => {
      known[columns] ??= tTwoSidedQuantile(limit, n - columns) ** 2;
      return known[columns]!;
    };
  }

  /** 1, −1 or 0, of a term of one column by either of its names. */
  function signOf(index: number): number {
    const [column, ...more] = terms[index]!.columns;
    if (column === undefined || more.length > 0) return 0;
    const sign = admit.signs.get(facts.columnNames[column]!) ?? admit.signs.get(terms[index]!.name);
    return sign === undefined ? 0 : sign === 'positive' ? 1 : -1;
  }

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

import { type Covariance, declaredCovariance } from '../engine/covariance.ts';
import type { Factor } from '../engine/factor.ts';
import type { Fit } from '../engine/fit.ts';
import { fullVariance } from '../engine/fit-all.ts';
import type { RowFacts } from '../engine/fit-candidate.ts';
import type { CandidateModel, Design, FamilyModel } from '../model/design.ts';
import type { DesignRows } from '../model/design-rows.ts';
import type { Sample } from '../prepare/sample.ts';
import type { FamilyPlan, StepFamilyPlan, Study } from '../study/study.ts';
import { contentKey, familyCandidate, letter } from './family-model.ts';
import { searchAdmission } from './search-admission.ts';
import { type PathStep, searchSteps } from './search-steps.ts';
import { type SubsetFamily, searchSubsets, termsOf } from './search-subsets.ts';

/** What a search is made on. */
export interface SearchGround {
  readonly factor: Factor;
  readonly facts: RowFacts;
  /** The rows, for p-values that are not classical. */
  readonly sample?: () => {
    readonly rows: DesignRows;
    readonly sample: Pick<Sample, 'columns' | 'timeOrder'>;
  };
}

/** A model that a search found. */
export interface FoundModel {
  /** Name of the candidate that it became, or of one before it with the same columns. */
  readonly candidate: string;
  readonly coefficientCount: number;
  /** Whether it keeps the rules of admission that the search keeps to. */
  readonly admitted: boolean;
  /** Whether it is known to be the best of its number of coefficients, or next in order. */
  readonly settled: boolean;
}

export interface FoundFamily {
  readonly plan: FamilyPlan;
  /** In the order of the plan's terms. */
  readonly termNames: readonly string[];
  /** By number of coefficients, then by RSS. Of elimination or selection, the model reached. */
  readonly models: readonly FoundModel[];
  /** Models that the search covers: all subsets that the family allows, or those fitted on the way. */
  readonly covered: number;
  /** Whether `covered` was counted; else it is an upper bound. */
  readonly coveredExactly: boolean;
  /** Places of the search, or models fitted. */
  readonly visited: number;
  /** What the search is exact for; null where it was given up, or is none (elimination and selection). */
  readonly exactFor: 'every size' | 'the choice' | null;
  /** Why the path ended; null for subsets. */
  readonly because: string | null;
  readonly path: readonly PathStep[];
  /** Terms that no model has, because in these rows they say nothing beside what they need. */
  readonly idle: readonly string[];
}

export interface FoundFamilies {
  /** Models that no candidate before them has. */
  readonly candidates: readonly CandidateModel[];
  readonly families: readonly FoundFamily[];
}

export interface SearchOptions {
  /** For the record: the best of every size. Otherwise only what could be chosen. */
  readonly everySize: boolean;
  readonly onProgress?: (family: string, visited: number) => void;
}

/**
 * Searches every family of a study, in order. The models found are ordinary candidates from there on; one with the
 * columns of an earlier candidate is that candidate.
 */
export function searchFamilies(
  study: Study,
  design: Design,
  ground: SearchGround,
  options: SearchOptions,
): FoundFamilies {
  const { factor, facts } = ground;
  const { selection } = study;
  const known = new Map(design.candidates.map((candidate) => [contentKey(candidate), candidate.name]));
  const candidates: CandidateModel[] = [];
  const variances = selection.rankBy === 'mallows_cp' ? fullVariance(factor, design, facts) : [];
  const hasClassicalP = study.inference.standardErrors.kind === 'classical';
  const admits = searchAdmission(selection.admit, factor, facts, covarianceOf());
  const families = design.families.map((family) =>
    isSubsets(family) ? subsets(family) : steps(family as FamilyModel & { plan: StepFamilyPlan }),
  );
  return { candidates, families };

  function covarianceOf(): ((fit: Fit) => Covariance | null) | null {
    const { standardErrors } = study.inference;
    const { sample } = ground;
    if (standardErrors.kind === 'classical' || selection.admit.pValue === null || sample === undefined)
      return null;
    const { rows, sample: own } = sample();
    return (fit) => declaredCovariance(standardErrors, fit, rows, own);
  }

  /** The name that the model goes by. */
  function taken(candidate: CandidateModel): string {
    const key = contentKey(candidate);
    const name = known.get(key);
    if (name !== undefined) return name;
    known.set(key, candidate.name);
    candidates.push(candidate);
    return candidate.name;
  }

  function subsets(family: SubsetFamily): FoundFamily {
    const { plan } = family;
    const { found, optional, exactFor } = searchSubsets({
      family,
      selection,
      factor,
      facts,
      fullVariance: variances[family.responseColumn] ?? null,
      hasClassicalP,
      admits,
      everySize: options.everySize,
      onProgress: (visited) => options.onProgress?.(plan.name, visited),
    });
    const models = found.sizes.flatMap(({ columnCount, kept, refused, settled }) => {
      const best = refused === null || !options.everySize ? [] : [{ set: refused, admitted: false }];
      const all = [...best, ...kept.map((set) => ({ set, admitted: true }))];
      return all.map(({ set, admitted }, k): FoundModel => {
        const terms = termsOf(family, optional, set.groups);
        const name = `${plan.name} ${columnCount}${letter(k)}`;
        return {
          candidate: taken(familyCandidate(family, terms, name)),
          coefficientCount: columnCount,
          admitted,
          settled: exactFor !== null && settled,
        };
      });
    });
    return {
      plan,
      termNames: family.terms.map(({ name }) => name),
      models,
      covered: found.covered,
      coveredExactly: found.coveredExactly,
      visited: found.visited,
      exactFor,
      because: null,
      path: [],
      idle: found.idle.map((k) => family.terms[optional[k]!]!.name),
    };
  }

  function steps(family: FamilyModel & { readonly plan: StepFamilyPlan }): FoundFamily {
    const { plan } = family;
    const found = searchSteps(family, factor, facts);
    const termNames = family.terms.map(({ name }) => name);
    const base = { plan, termNames, coveredExactly: true, exactFor: null, idle: [] };
    if (found === null) return { ...base, models: [], covered: 0, visited: 0, because: null, path: [] };
    const candidate = familyCandidate(family, found.terms, plan.name);
    return {
      ...base,
      models:
        candidate.columns.length === 0
          ? []
          : [
              {
                candidate: taken(candidate),
                coefficientCount: candidate.columns.length,
                admitted: true,
                settled: false,
              },
            ],
      covered: found.covered,
      visited: found.covered,
      because: found.because,
      path: found.path,
    };
  }
}

function isSubsets(family: FamilyModel): family is SubsetFamily {
  return family.plan.kind === 'subsets';
}

/** The candidates of a study from other rows: the named ones and those that the same searches find there. */
export function candidatesFrom(study: Study, design: Design, ground: SearchGround): CandidateModel[] {
  return [...design.candidates, ...searchFamilies(study, design, ground, { everySize: false }).candidates];
}

import { type Covariance, declaredCovariance } from '../engine/covariance.ts';
import type { Factor } from '../engine/factor.ts';
import type { CriterionContext, Fit, FitContext, LeanFit } from '../engine/fit.ts';
import { fullVariance } from '../engine/fit-all.ts';
import { fitCandidate, type RowFacts } from '../engine/fit-candidate.ts';
import { leanFit } from '../engine/lean-fit.ts';
import { press } from '../engine/row-figures.ts';
import { type SolveScratch, solveScratch } from '../engine/solve-columns.ts';
import type { CandidateModel, Design } from '../model/design.ts';
import type { DesignRows } from '../model/design-rows.ts';
import type { Sample } from '../prepare/sample.ts';
import type { Study } from '../study/study.ts';
import { admit } from './admission.ts';
import { chooseByPartialF } from './choose-by-partial-f.ts';
import { criterionNamed } from './criteria.ts';
import { crossValidate } from './cross-validate.ts';
import type { Folds } from './folds.ts';
import { pickByCost, tolerance } from './pick-by-cost.ts';
import { costOf, slackOf } from './rank.ts';

/** The rows that a choice is made from, and their factor; what needs passes over the rows is made only where a rule asks for it. */
export interface Material {
  readonly factor: Factor;
  readonly facts: RowFacts;
  readonly rows: () => DesignRows;
  /** The response on its own scale, by row of `rows`. */
  readonly own: () => Float64Array;
  /** By row of `rows`; null where candidates are not cross-validated. */
  readonly folds: () => Folds | null;
  /** The variables, for covariances that are not classical. */
  readonly sample: () => {
    readonly rows: DesignRows;
    readonly sample: Pick<Sample, 'columns' | 'timeOrder'>;
  };
}

/** The candidates of a study as far as they follow from the rows: those of its families that a search finds there. */
export type Search = (material: Pick<Material, 'factor' | 'facts' | 'sample'>) => readonly CandidateModel[];

/** The declared choice, to be made again from other rows: the fit of what it chooses, or null where it chooses none. */
export type Procedure = (material: Material) => Fit | null;

/**
 * The whole choice as the study declares it: candidates (those of families searched anew), admission, criterion and
 * tolerance. Candidates are fitted as far as the criterion reads them, and only those that could be chosen are fitted
 * in full and held against the admission rules. Double arithmetic, without refinement.
 */
export function declaredProcedure(study: Study, design: Design, search: Search | null): Procedure {
  const plan = study.selection;
  const criterion = criterionNamed(plan.rankBy);
  const needsCovariance = study.inference.standardErrors.kind !== 'classical' && plan.admit.pValue !== null;
  let scratch: SolveScratch | null = null;
  return (material) => {
    const { factor, facts } = material;
    scratch ??= solveScratch(factor.width);
    const candidates = search === null ? design.candidates : search(material);
    const fullFits = new Map<number, Fit>();
    const fitOf = (index: number): Fit => {
      const known = fullFits.get(index);
      if (known !== undefined) return known;
      const fit = fitCandidate(factor, candidates[index]!, facts, 'no condition number');
      fullFits.set(index, fit);
      return fit;
    };
    const covarianceOf = (fit: Fit): Covariance | null => {
      const { rows, sample } = material.sample();
      return declaredCovariance(study.inference.standardErrors, fit, rows, sample);
    };
    const isAdmitted = (index: number, context: CriterionContext): boolean => {
      const fit = fitOf(index);
      const own: FitContext = {
        ...contextOf(index, context),
        fits: [fit],
        columnNames: facts.columnNames,
        ...(needsCovariance ? { covariances: [covarianceOf(fit)] } : {}),
      };
      return admit(plan, criterion, 0, own).admitted;
    };

    if (criterion.name === 'partial_f') {
      const fits = candidates.map((_, index) => fitOf(index));
      const context = { fits, press: [], pressOmitted: null, fullModelVariance: [] };
      const admitted = [...fits.keys()].filter((index) => isAdmitted(index, context));
      const { chosen } = chooseByPartialF(plan, fits, admitted);
      return chosen === null ? null : fits[chosen]!;
    }

    const rowBound = criterion.name === 'press' || criterion.name === 'cross_validation';
    const fits: readonly LeanFit[] = candidates.map((candidate, index) =>
      rowBound ? fitOf(index) : leanFit(factor, candidate, facts, scratch!),
    );
    const context = criterionContext(fits);
    const cost = fits.map((_, index) => {
      const value = criterion.value(index, context);
      return value === null ? null : costOf(criterion, value);
    });
    const order = [...fits.keys()]
      .filter((index) => cost[index] !== null)
      .sort((a, b) => cost[a]! - cost[b]!);
    const first = order.findIndex((index) => isAdmitted(index, context));
    if (first < 0) return null;
    // Nothing beyond the tolerance of the best admitted one can be chosen.
    const best = order[first]!;
    const reach = tolerance(plan, best, context) + slackOf(cost[best]!);
    const near = order
      .slice(first)
      .filter(
        (index) => cost[index]! - cost[best]! <= reach && (index === best || isAdmitted(index, context)),
      )
      .sort((a, b) => a - b);
    const picked = pickByCost(
      near,
      (index) => cost[index]!,
      (index) => fits[index]!.columns.length,
      (lowest) => tolerance(plan, lowest, context),
    );
    return picked === null ? null : fitOf(picked.chosen);

    function criterionContext(known: readonly LeanFit[]): CriterionContext {
      const bare = { fits: known, press: [], pressOmitted: null, fullModelVariance: [] };
      switch (criterion.name) {
        case 'press':
          return {
            ...bare,
            press: known.map((fit, index) =>
              fit.degreesOfFreedom < 1 ? null : press(fitOf(index), material.rows()),
            ),
          };
        case 'mallows_cp':
          return { ...bare, fullModelVariance: fullVariance(factor, design, facts) };
        case 'cross_validation': {
          const folds = material.folds();
          if (folds === null) return bare;
          const all = known.map((_, index) => fitOf(index));
          return {
            ...bare,
            validation: crossValidate({
              rows: material.rows(),
              own: material.own(),
              fits: all,
              folds,
              ranks: true,
            }),
          };
        }
        default:
          return bare;
      }
    }
  };
}

/** The context of one candidate alone. */
function contextOf(index: number, context: CriterionContext): Omit<CriterionContext, 'fits'> {
  const { validation } = context;
  return {
    press: [context.press[index] ?? null],
    pressOmitted: context.pressOmitted,
    fullModelVariance: context.fullModelVariance,
    validation: validation && {
      figures: [validation.figures[index] ?? null],
      whyNot: [validation.whyNot[index] ?? null],
    },
  };
}

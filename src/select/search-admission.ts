import type { Covariance } from '../engine/covariance.ts';
import type { Factor } from '../engine/factor.ts';
import type { Fit, FitContext } from '../engine/fit.ts';
import { fitCandidate, type RowFacts } from '../engine/fit-candidate.ts';
import { partFactor } from '../engine/part-factor.ts';
import type { CandidateModel } from '../model/design.ts';
import { tTwoSidedQuantile } from '../stats/distributions.ts';
import type { AdmitPlan } from '../study/study.ts';
import { ADMISSION_RULES } from './admission.ts';

/** Whether any rule of admission is declared that a search must keep to set by set. */
export function hasRules(admit: AdmitPlan): boolean {
  return admit.vif !== null || admit.pValue !== null || admit.signs.size > 0;
}

/**
 * The declared rules of admission for a search: the same rules on a fit of the candidate's own columns in double
 * arithmetic. The covariance is asked for only where p-values are not classical, and needs a pass over the rows.
 */
export function searchAdmission(
  admit: AdmitPlan,
  factor: Factor,
  facts: RowFacts,
  covarianceOf: ((fit: Fit) => Covariance | null) | null,
): (candidate: CandidateModel) => boolean {
  const classical = covarianceOf === null ? admit : { ...admit, pValue: null };
  const limits: number[] = [];
  const plain: Factor = { ...factor, triangle: { ...factor.triangle, lo: null } };
  return (candidate) => {
    const part = partFactor(plain, candidate, facts);
    const fit = fitCandidate(part.factor, part.candidate, part.facts, 'no condition number');
    if (isFarBelow(fit) || !keeps(classical, contextOf(fit, part.facts))) return false;
    if (covarianceOf === null || admit.pValue === null) return true;
    const whole = fitCandidate(plain, candidate, facts, 'no condition number');
    return keeps(admit, { ...contextOf(whole, facts), covariances: [covarianceOf(whole)] });
  };

  /** Whether the p-value of a term of one column is above the limit, seen from its t: most sets are refused by this. */
  function isFarBelow(fit: Fit): boolean {
    if (classical.pValue === null || fit.degreesOfFreedom < 1) return false;
    const df = fit.degreesOfFreedom;
    limits[df] ??= tTwoSidedQuantile(classical.pValue.atMost, df) ** 2 * (1 - 1e-9);
    const p = fit.columns.length;
    const least = (limits[df]! * fit.residualSumOfSquares) / df;
    return fit.candidate.terms.some(({ columns }) => {
      const j = columns.length === 1 ? fit.columns.indexOf(columns[0]!) : -1;
      return j >= 0 && fit.estimates[j]! ** 2 < least * fit.inverse[j * p + j]!;
    });
  }
}

function contextOf(fit: Fit, facts: RowFacts): FitContext {
  return {
    fits: [fit],
    press: [null],
    pressOmitted: null,
    fullModelVariance: [],
    columnNames: facts.columnNames,
  };
}

function keeps(admit: AdmitPlan, context: FitContext): boolean {
  return ADMISSION_RULES.every((rule) => rule.refusals(admit, 0, context).length === 0);
}

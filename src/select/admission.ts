import type { FitContext } from '../engine/fit.ts';
import type { AdmitPlan, SelectionPlan } from '../study/study.ts';
import { adjustedRSquared } from './admission/adjusted-r-squared.ts';
import { pValue } from './admission/p-value.ts';
import { rowsPerCoefficient } from './admission/rows-per-coefficient.ts';
import { signs } from './admission/signs.ts';
import { vif } from './admission/vif.ts';
import type { AdmissionRule } from './admission-rule.ts';
import type { Criterion } from './criterion.ts';
import { counted } from './words.ts';

/** Every rule, in the order of the study file's reference. */
export const ADMISSION_RULES: readonly AdmissionRule[] = [
  vif,
  pValue,
  signs,
  rowsPerCoefficient,
  adjustedRSquared,
];

export interface Admission {
  readonly admitted: boolean;
  /** Each way in which the candidate breaks a rule, as a sentence; empty where admitted. */
  readonly refusedBecause: readonly string[];
}

/** The rules that the study declares, one sentence each. */
export function admissionSentences(admit: AdmitPlan): string[] {
  return ADMISSION_RULES.flatMap((rule) => rule.sentences(admit));
}

/**
 * Holds one candidate against the declared rules, and against two that always hold: it leaves degrees of
 * freedom, and the criterion that is to choose is defined for it.
 */
export function admit(
  plan: SelectionPlan,
  criterion: Criterion,
  index: number,
  context: FitContext,
): Admission {
  const refusedBecause = [
    ...degreesOfFreedom(index, context),
    ...ADMISSION_RULES.flatMap((rule) => rule.refusals(plan.admit, index, context)),
    ...rankable(criterion, index, context),
  ];
  return { admitted: refusedBecause.length === 0, refusedBecause };
}

function degreesOfFreedom(index: number, { fits }: FitContext): string[] {
  const { degreesOfFreedom: df, rowCount: n, columns } = fits[index]!;
  if (df >= 1) return [];
  return [
    `With ${counted(n, 'row')} for ${counted(columns.length, 'coefficient')} no degrees of freedom are left.`,
  ];
}

function rankable(criterion: Criterion, index: number, context: FitContext): string[] {
  const fit = context.fits[index]!;
  if (fit.degreesOfFreedom < 1) return [];
  if (criterion.name === 'partial_f') {
    return fit.exact ? ['It fits these rows exactly, so no other candidate can be tested against it.'] : [];
  }
  if (criterion.value(index, context) !== null) return [];
  return [
    `It cannot be ranked: ${criterion.title} is not defined, because ${criterion.whyUndefined(index, context)}.`,
  ];
}

import type { FitContext } from '../engine/fit.ts';
import type { AdmitPlan } from '../study/study.ts';

/** A rule that a candidate must keep to be chosen. */
export interface AdmissionRule {
  /** As the study file spells it. */
  readonly name: string;
  /** The declared rule as sentences; empty where the study does not declare it. */
  readonly sentences: (admit: AdmitPlan) => readonly string[];
  /** How the fit `context.fits[index]` breaks the rule, as sentences; empty where it keeps it or none is declared. */
  readonly refusals: (admit: AdmitPlan, index: number, context: FitContext) => readonly string[];
}

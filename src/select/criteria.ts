import type { RankBy } from '../study/study.ts';
import { adjustedRSquaredCriterion } from './criteria/adjusted-r-squared.ts';
import { aic } from './criteria/aic.ts';
import { aicc } from './criteria/aicc.ts';
import { bic } from './criteria/bic.ts';
import { crossValidation } from './criteria/cross-validation.ts';
import { mallowsCp } from './criteria/mallows-cp.ts';
import { partialF } from './criteria/partial-f.ts';
import { press } from './criteria/press.ts';
import type { Criterion } from './criterion.ts';

/** Every criterion, in the order of the study file's reference. */
export const CRITERIA: readonly Criterion[] = [
  adjustedRSquaredCriterion,
  aic,
  aicc,
  bic,
  mallowsCp,
  press,
  crossValidation,
  partialF,
];

export function criterionNamed(name: RankBy): Criterion {
  const found = CRITERIA.find((criterion) => criterion.name === name);
  if (found === undefined) throw new Error(`No criterion is named ${name}.`);
  return found;
}

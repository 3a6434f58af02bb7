import type { CriterionContext } from '../engine/fit.ts';
import type { RankBy } from '../study/study.ts';

/** A figure of a fit that candidates can be ranked by. */
export interface Criterion {
  /** As the study file spells it. */
  readonly name: RankBy;
  /** As a sentence says it: "AICc". */
  readonly title: string;
  readonly better: 'higher' | 'lower';
  /** Whether it can rank candidates whose responses are on different scales. */
  readonly acrossScales: boolean;
  /** What it is, in a sentence for people. */
  readonly description: string;
  /** Where it was published. */
  readonly source: string;
  /** Of the fit `context.fits[index]`; null where it is not defined, never NaN or infinite. */
  readonly value: (index: number, context: CriterionContext) => number | null;
  /** Why the value is null, as a clause without a full stop. Asked only where it is. */
  readonly whyUndefined: (index: number, context: CriterionContext) => string;
}

export function finiteOrNull(value: number): number | null {
  return Number.isFinite(value) ? value : null;
}

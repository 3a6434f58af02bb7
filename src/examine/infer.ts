import { covarianceMatrix } from '../engine/covariance.ts';
import type { Factor } from '../engine/factor.ts';
import type { ModelTerm } from '../model/design.ts';
import type { Chosen } from './chosen.ts';
import type { Reference } from './effects/settings.ts';
import {
  type CoefficientMeasures,
  coefficientMeasures,
  type Simultaneous,
  simultaneousOf,
} from './inference/coefficient-measures.ts';
import { type CurveSlopes, curveSlopes } from './inference/curve-slopes.ts';
import { type HypothesisResult, testHypotheses } from './inference/hypotheses.ts';
import { type LevelMeans, levelMeans } from './inference/level-means.ts';
import { type OwnScaleEffects, ownScaleEffects } from './inference/own-scale.ts';
import { type StandardErrors, standardErrorsOf } from './inference/standard-errors.ts';

export { standardErrorsOf };

/** What the chosen model says exactly, beside estimates and errors. */
export interface Inference {
  readonly standardErrors: StandardErrors;
  /** The covariance of the estimates, p rows of p; null where there is none. */
  readonly covariance: number[][] | null;
  readonly coefficients: CoefficientMeasures[];
  readonly simultaneous: Simultaneous | null;
  readonly hypotheses: HypothesisResult[];
  readonly ofTerm: (term: ModelTerm, reference: Reference) => TermInference;
}

export interface TermInference {
  readonly level_means: LevelMeans | null;
  readonly slopes_along: CurveSlopes | null;
  readonly own_scale: OwnScaleEffects | null;
}

/** @param factor that of the union of all candidates' columns */
export function infer(chosen: Chosen, factor: Factor): Inference {
  const simultaneous = simultaneousOf(chosen);
  const levels = levelMeans(chosen);
  const p = chosen.fit.columns.length;
  const matrix = chosen.covariance === null ? null : covarianceMatrix(chosen.covariance);
  return {
    standardErrors: standardErrorsOf(chosen),
    covariance:
      matrix === null
        ? null
        : Array.from({ length: p }, (_, j) => Array.from(matrix.subarray(j * p, (j + 1) * p))),
    coefficients: coefficientMeasures(chosen, factor, simultaneous),
    simultaneous,
    hypotheses: testHypotheses(chosen),
    ofTerm: (term, reference) => ({
      level_means: levels.get(term.name) ?? null,
      slopes_along: curveSlopes(chosen, term, reference),
      own_scale: ownScaleEffects(chosen, term, reference),
    }),
  };
}

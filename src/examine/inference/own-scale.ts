import { errorOf } from '../../engine/covariance.ts';
import type { ModelTerm } from '../../model/design.ts';
import { fromScale, scaleDerivative } from '../../model/response-scale.ts';
import { tTwoSidedQuantile } from '../../stats/distributions.ts';
import type { Chosen } from '../chosen.ts';
import { logarithmOf, percentOf, responseLogarithm, timesEffect } from '../effects/logarithms.ts';
import {
  designAt,
  type Effect,
  effectsBetween,
  moved,
  type Reference,
  type Setting,
} from '../effects/settings.ts';
import { stepsOf } from '../effects/term-effects.ts';

/** What a term says of the response on its own scale, where the raw coefficient does not say it. */
export interface OwnScaleEffects {
  readonly kind: 'percent' | 'elasticity' | 'per_doubling' | 'difference';
  /** What the figures are, and where they hold. */
  readonly sentence: string;
  readonly effects: (Effect & {
    /** "a step of 1 in cargo", "Tern rather than Skerry", "110 to 130". */
    readonly of: string;
  })[];
}

/**
 * Exact on logarithmic scales: per cent for a step of one, elasticities where the variable is a logarithm as well. The
 * response per doubling where the variable alone is a logarithm. On other scales the difference that the term's typical
 * steps make, at the reference, with an interval by the first-order (delta) method. Null where the coefficient says it
 * all, and for interactions and curves, whose slopes say it.
 */
export function ownScaleEffects(
  chosen: Chosen,
  term: ModelTerm,
  reference: Reference,
): OwnScaleEffects | null {
  if (term.plan.kind === 'interaction') return null;
  const { variable } = term.plan;
  const described = reference.variables.get(variable);
  if (described === undefined) return null;
  const response = responseLogarithm(chosen);
  const predictor = logarithmOf(chosen, variable);
  const { scale, variable: of } = chosen.fit.candidate.response;
  if (response === null && scale.kind !== 'natural') {
    const steps = typical(variable, reference);
    return {
      kind: 'difference',
      sentence: `The difference in ${of} on its own scale, the other variables at their reference; intervals are first-order approximations.`,
      effects: steps.flatMap((step) => {
        const effect = ownDifference(chosen, step.from, step.to);
        return Number.isFinite(effect.estimate) ? [{ of: step.of, ...effect }] : [];
      }),
    };
  }
  if (term.plan.kind !== 'variable') return null;
  const [first] = described.kind === 'number' ? stepsOfOne(variable, reference) : [];
  if (predictor !== null && first !== undefined) {
    const [effect] = effectsBetween(chosen, [[first.from, first.to]]);
    if (response !== null) {
      return {
        kind: 'elasticity',
        sentence: `Per cent of ${response.of} that go with one per cent more ${predictor.of}.`,
        effects: [{ of: predictor.of, ...timesEffect(effect!, response.lnBase / predictor.lnBase) }],
      };
    }
    return {
      kind: 'per_doubling',
      sentence: `The difference in ${of} that goes with twice the ${predictor.of}.`,
      effects: [{ of: predictor.of, ...timesEffect(effect!, Math.LN2 / predictor.lnBase) }],
    };
  }
  if (response === null) return null;
  const steps = described.kind === 'number' ? stepsOfOne(variable, reference) : typical(variable, reference);
  const found = effectsBetween(
    chosen,
    steps.map(({ from, to }): [Setting, Setting] => [from, to]),
  );
  return {
    kind: 'percent',
    sentence: `Per cent of ${response.of}, the other terms held.`,
    effects: steps.flatMap((step, k) => {
      const percent = percentOf(found[k]!, response.lnBase);
      return percent === null ? [] : [{ of: step.of, ...percent }];
    }),
  };
}

interface Step {
  readonly of: string;
  readonly from: Setting;
  readonly to: Setting;
}

function stepsOfOne(variable: string, { setting }: Reference): Step[] {
  const at = Number(setting.get(variable));
  return [{ of: `a step of 1 in ${variable}`, from: setting, to: moved(setting, { [variable]: at + 1 }) }];
}

function typical(variable: string, { variables, setting }: Reference): Step[] {
  const described = variables.get(variable)!;
  return stepsOf(described).map(({ from, to, fromText, toText }) => ({
    of: described.kind === 'number' ? `${fromText} to ${toText}` : `${toText} rather than ${fromText}`,
    from: moved(setting, { [variable]: from }),
    to: moved(setting, { [variable]: to }),
  }));
}

/** g⁻¹(x₁′b) − g⁻¹(x₀′b) with the interval from its gradient h(z₁)x₁ − h(z₀)x₀, h the derivative of g⁻¹. */
function ownDifference(chosen: Chosen, from: Setting, to: Setting): Effect {
  const { fit, covariance, study } = chosen;
  const { scale } = fit.candidate.response;
  const p = fit.columns.length;
  const at = designAt(chosen, [from, to]);
  const gradient = new Float64Array(p);
  const [z0, z1] = [0, 1].map((k) => {
    let z = 0;
    for (let j = 0; j < p; j++) z += at[2 * j + k]! * fit.estimates[j]!;
    return z;
  }) as [number, number];
  for (let j = 0; j < p; j++) {
    gradient[j] = scaleDerivative(z1, scale) * at[2 * j + 1]! - scaleDerivative(z0, scale) * at[2 * j]!;
  }
  const estimate = fromScale(z1, scale) - fromScale(z0, scale);
  if (covariance === null || !gradient.every(Number.isFinite)) return { estimate, lower: null, upper: null };
  const half =
    tTwoSidedQuantile(1 - study.inference.confidence, covariance.df) * errorOf(covariance, gradient);
  return { estimate, lower: estimate - half, upper: estimate + half };
}

import type { ModelTerm } from '../../model/design.ts';
import type { Chosen } from '../chosen.ts';
import { derivativeAt } from '../effects/derivative.ts';
import { percentOf, responseLogarithm } from '../effects/logarithms.ts';
import { type Effect, effects, moved, type Reference } from '../effects/settings.ts';
import { slopePlaces } from '../effects/term-effects.ts';

/** How steep a curve is at some places, the other variables held at their reference. */
export interface CurveSlopes {
  readonly variable: string;
  /** Whether the study declares the places; else they are the quartiles. */
  readonly declared: boolean;
  readonly places: (Effect & {
    readonly at: number;
    /** Per cent of the response for a step of one, where its scale is logarithmic; else null. */
    readonly percent: Effect | null;
  })[];
}

/** For a term that bends: a polynomial, a power, a bend or a spline; null for the rest. */
export function curveSlopes(chosen: Chosen, term: ModelTerm, reference: Reference): CurveSlopes | null {
  const { plan } = term;
  if (plan.kind === 'interaction' || plan.kind === 'variable') return null;
  const described = reference.variables.get(plan.variable);
  if (described?.kind !== 'number') return null;
  const declared = chosen.study.inference.slopesAt.get(plan.variable);
  const places = slopePlaces(described, declared);
  const effectOf = effects(chosen);
  const logarithm = responseLogarithm(chosen);
  return {
    variable: plan.variable,
    declared: declared !== undefined,
    places: places.map((at) => {
      const there = moved(reference.setting, { [plan.variable]: at });
      const slope = effectOf(derivativeAt(chosen, there, plan.variable));
      return { at, ...slope, percent: logarithm === null ? null : percentOf(slope, logarithm.lnBase) };
    }),
  };
}

import type { Expression } from '../../expression/expression.ts';
import type { Chosen } from '../chosen.ts';
import type { Effect } from './settings.ts';

/** A variable that is the logarithm of another: natural (base e) or to base 10. */
export interface Logarithm {
  readonly of: string;
  /** ln of the base. */
  readonly lnBase: number;
}

/** The logarithm that a derived variable is by its expression, exactly log(x) or log10(x); null for the rest. */
export function logarithmOf(chosen: Chosen, variable: string): Logarithm | null {
  const plan = chosen.study.derive.find((each) => each.name === variable);
  return plan === undefined ? null : logarithm(plan.expression);
}

function logarithm(expression: Expression): Logarithm | null {
  if (expression.kind !== 'call') return null;
  const lnBase = expression.function === 'log' ? 1 : expression.function === 'log10' ? Math.LN10 : null;
  const [inner] = expression.arguments;
  return lnBase !== null && inner?.kind === 'name' ? { of: inner.name, lnBase } : null;
}

/** The logarithm that the response is fitted as, by its scale or by its own expression; null for the rest. */
export function responseLogarithm(chosen: Chosen): Logarithm | null {
  const { variable, scale } = chosen.fit.candidate.response;
  if (scale.kind === 'log' || (scale.kind === 'box_cox' && scale.lambda === 0))
    return { of: variable, lnBase: 1 };
  return scale.kind === 'natural' ? logarithmOf(chosen, variable) : null;
}

/**
 * A difference of logarithms as a change in per cent: 100 (e^(d · lnBase) − 1), exact at the ends too. Null where it
 * is too large to be held; an end that is, likewise.
 */
export function percentOf({ estimate, lower, upper }: Effect, lnBase: number): Effect | null {
  const percent = (d: number | null) => {
    const value = d === null ? Number.NaN : 100 * Math.expm1(d * lnBase);
    return Number.isFinite(value) ? value : null;
  };
  const middle = percent(estimate);
  return middle === null ? null : { estimate: middle, lower: percent(lower), upper: percent(upper) };
}

/** An effect times a number; a negative one would turn the ends, and none is used. */
export function timesEffect({ estimate, lower, upper }: Effect, factor: number): Effect {
  return {
    estimate: factor * estimate,
    lower: lower === null ? null : factor * lower,
    upper: upper === null ? null : factor * upper,
  };
}

import type { FitContext } from '../engine/fit.ts';
import type { Criterion } from './criterion.ts';
import { evidenceWeights } from './evidence.ts';

/** One place of the ranking. */
export interface Ranked {
  /** From 1. */
  readonly rank: number;
  /** Index of the candidate. */
  readonly candidate: number;
  /** The criterion's value; null where it is not defined. */
  readonly value: number | null;
  /** Distance from the best value of all candidates, at least 0; null with the value. */
  readonly difference: number | null;
  /** Weight of evidence under an information criterion, else null. */
  readonly evidence: number | null;
}

/** Values that differ by less than this share of themselves are equal: the difference is rounding. */
const ROUNDING = 1e-10;

export function sameValue(a: number, b: number): boolean {
  return Math.abs(a - b) <= slackOf(a);
}

/** How far from `value` another may lie and still be the same but for rounding. */
export function slackOf(value: number): number {
  return ROUNDING * Math.abs(value);
}

/** The value as a cost: the lower, the better. */
export function costOf(criterion: Criterion, value: number): number {
  return criterion.better === 'lower' ? value : -value;
}

/**
 * All candidates, admitted or not: best value first; of equal values the fewest coefficients, then the order of
 * declaration; those without a value last, in the order of declaration.
 */
export function rank(criterion: Criterion, context: FitContext): Ranked[] {
  const values = context.fits.map((_, index) => criterion.value(index, context));
  const cost = (index: number) => costOf(criterion, values[index]!);
  const defined = [...values.keys()]
    .filter((index) => values[index] !== null)
    .sort((a, b) => cost(a) - cost(b) || a - b);
  const ordered = inGroups(defined, (index) => values[index]!).flatMap((group) =>
    group.sort((a, b) => context.fits[a]!.columns.length - context.fits[b]!.columns.length || a - b),
  );
  const best = defined.length === 0 ? 0 : values[defined[0]!]!;
  const places = [...ordered, ...[...values.keys()].filter((index) => values[index] === null)];
  const differences = places.map((candidate) => {
    const value = values[candidate]!;
    return value === null ? null : sameValue(best, value) ? 0 : Math.abs(value - best);
  });
  const evidence = evidenceWeights(criterion.name, differences);
  return places.map((candidate, k) => ({
    rank: k + 1,
    candidate,
    value: values[candidate]!,
    difference: differences[k]!,
    evidence: evidence[k]!,
  }));
}

/** Splits a sorted list where the value moves away from the first of its group. */
function inGroups(sorted: readonly number[], value: (index: number) => number): number[][] {
  const groups: number[][] = [];
  for (const index of sorted) {
    const group = groups.at(-1);
    if (group !== undefined && sameValue(value(group[0]!), value(index))) group.push(index);
    else groups.push([index]);
  }
  return groups;
}

/** Families over plain arrays, without a study file. */
import { factorRows } from '../../src/engine/factor.ts';
import type { Design, FamilyModel } from '../../src/model/design.ts';
import type { FamilyPlan, FamilyTermPlan } from '../../src/study/study.ts';
import { testModel, variable } from '../engine/models.ts';

export interface PlainTerm {
  readonly columns: readonly (readonly number[])[];
  readonly needs?: readonly number[];
  readonly always?: boolean;
}

type Limits =
  | { readonly kind: 'subsets'; readonly atLeast: number; readonly atMost: number; readonly keep: number }
  | {
      readonly kind: 'backward' | 'forward';
      readonly leaveAt: number | null;
      readonly enterAt: number | null;
    };

/** A design with one family "F" of these terms, named t0, t1, …, and its factor. */
export function familyOf(
  terms: readonly PlainTerm[],
  y: readonly number[],
  limits: Limits,
  intercept = true,
) {
  const columns = terms.flatMap((term) => term.columns);
  const data: Record<string, readonly number[]> = { y };
  columns.forEach((column, j) => {
    data[`x${j}`] = column;
  });
  const model = testModel(
    data,
    columns.map((_, j) => variable(`x${j}`)),
    [],
  );
  let at = 1;
  const plans = terms.map(({ needs = [], always = false }, index): FamilyTermPlan => {
    return {
      term: { kind: 'variable', variable: `t${index}` },
      always,
      needs,
      path: ['candidates', 0, index],
    };
  });
  const plan: FamilyPlan = {
    name: 'F',
    terms: plans,
    hierarchy: true,
    scale: { kind: 'natural' },
    intercept,
    position: 0,
    ...limits,
  };
  const family: FamilyModel = {
    plan,
    terms: terms.map((term, index) => {
      const own = term.columns.map((_, c) => at + c);
      at += term.columns.length;
      return { name: `t${index}`, plan: plans[index]!.term, columns: own };
    }),
    response: { variable: 'y', scale: { kind: 'natural' } },
    responseColumn: 0,
  };
  const design: Design = { ...model.design, families: [family] };
  return { design, family, facts: model.facts, rows: model.rows, factor: factorRows(model.rows) };
}

/** Numbers from a small generator, roughly normal: the same for a seed. */
export function drawn(seed: number): () => number {
  let state = Math.imul(seed, 2654435761) >>> 0;
  const uniform = () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return (state + 0.5) / 2 ** 32;
  };
  return () => uniform() + uniform() + uniform() + uniform() - 2;
}

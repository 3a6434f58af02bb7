/** Grounds of choices from plain arrays, without a study file. */

import type { Column } from '../../src/data/table.ts';
import { factorRows } from '../../src/engine/factor.ts';
import type { FittedAll } from '../../src/engine/fit-all.ts';
import { fitAll } from '../../src/engine/fit-all.ts';
import type { Sample } from '../../src/prepare/sample.ts';
import type { Folds } from '../../src/select/folds.ts';
import { type Ground, materialOf } from '../../src/select/material.ts';
import type { Material } from '../../src/select/procedure.ts';
import { type PieceLists, testModel } from '../engine/models.ts';

export interface Made {
  readonly ground: Ground;
  readonly fitted: FittedAll;
}

export function makeGround(
  data: Readonly<Record<string, readonly number[]>>,
  columns: PieceLists,
  candidates: readonly (readonly number[])[],
  options: { weights?: string; folds?: Folds; time?: boolean } = {},
): Made {
  const model = testModel(
    data,
    columns,
    candidates,
    options.weights === undefined ? {} : { weights: options.weights },
  );
  const n = data.y!.length;
  const own = Float64Array.from(data.y!);
  const positions = Int32Array.from({ length: n }, (_, i) => i);
  const sample: Sample = {
    rowCount: n,
    rows: positions,
    lines: Uint32Array.from(positions, (i) => i + 2),
    ids: null,
    columns: new Map(
      Object.entries(data).map(([name, values]): [string, Column] => [
        name,
        { kind: 'number', name, values: Float64Array.from(values) },
      ]),
    ),
    timeOrder: options.time === true ? positions : null,
    losses: [],
  };
  const fitted = fitAll(model.design, model.rows, own, { pressRanks: true });
  const ground: Ground = {
    sample,
    design: model.design,
    rows: model.rows,
    own,
    facts: fitted.facts,
    folds: options.folds ?? null,
  };
  return { ground, fitted };
}

/** Everything as material of one choice. */
export function allOf(ground: Ground): Material {
  const all = Int32Array.from({ length: ground.rows.rowCount }, (_, i) => i);
  return materialOf(ground, factorRows(ground.rows), all, null);
}

/** Numbers in (−½, ½) from a small generator. */
export function numbers(seed: number): () => number {
  let state = seed;
  return () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return state / 2 ** 32 - 0.5;
  };
}

import type { Factor } from '../engine/factor.ts';
import type { RowFacts } from '../engine/fit-candidate.ts';
import { rowsAt } from '../engine/rows-at.ts';
import type { Design } from '../model/design.ts';
import type { DesignRows } from '../model/design-rows.ts';
import { logJacobian } from '../model/response-scale.ts';
import { gatherColumn } from '../prepare/gather.ts';
import type { Sample } from '../prepare/sample.ts';
import { type Folds, restrictFolds } from './folds.ts';
import type { Material } from './procedure.ts';

/** What a choice is made from: all rows of it. */
export interface Ground {
  readonly sample: Sample;
  readonly design: Design;
  readonly rows: DesignRows;
  /** The response on its own scale, by row. */
  readonly own: Float64Array;
  readonly facts: RowFacts;
  /** How candidates are cross-validated within a choice; null where that does not rank. */
  readonly folds: Folds | null;
}

/**
 * The choice's material from some of the rows, each counted so many times.
 * @param index positions with a count, ascending, each once
 * @param counts by position in `index`; null: each once
 */
export function materialOf(
  ground: Ground,
  factor: Factor,
  index: Int32Array,
  counts: Int32Array | null,
): Material {
  const { sample, design, rows, own, folds } = ground;
  const roots = counts === null ? null : Float64Array.from(counts, Math.sqrt);
  const drawn = () => (counts === null ? index : repeated(index, counts));
  let made: DesignRows | null = null;
  return {
    factor,
    facts: factsOf(ground, drawn),
    rows: () => {
      made ??= rowsAt(rows, index, roots);
      return made;
    },
    own: () => Float64Array.from(index, (row) => own[row]!),
    folds: () => (folds === null ? null : restrictFolds(folds, index, sample.rowCount)),
    sample: () => {
      const all = drawn();
      const columns = new Map([...sample.columns].map(([name, column]) => [name, gatherColumn(column, all)]));
      return { rows: rowsAt(rows, all, null), sample: { columns, timeOrder: orderOf(sample, all) } };
    },
  };

  function factsOf({ facts }: Ground, rowsDrawn: () => Int32Array): RowFacts {
    const scaled = design.responses.some(({ scale }) => scale.kind !== 'natural');
    if (!scaled && rows.rootWeights === null) return facts;
    const all = rowsDrawn();
    const values = scaled ? Float64Array.from(all, (row) => own[row]!) : own;
    let logWeights = 0;
    if (rows.rootWeights !== null) for (const row of all) logWeights += 2 * Math.log(rows.rootWeights[row]!);
    return {
      ...facts,
      logWeights,
      logJacobians: design.responses.map(({ scale }) => logJacobian(values, scale)),
    };
  }
}

/** Each position as often as it counts. */
function repeated(index: Int32Array, counts: Int32Array): Int32Array {
  const all = new Int32Array(counts.reduce((sum, count) => sum + count, 0));
  let at = 0;
  index.forEach((row, i) => {
    all.fill(row, at, at + counts[i]!);
    at += counts[i]!;
  });
  return all;
}

/** The order in time of rows drawn from the sample, copies beside one another. */
function orderOf({ timeOrder, rowCount }: Sample, drawn: Int32Array): Int32Array | null {
  if (timeOrder === null) return null;
  const place = new Int32Array(rowCount);
  timeOrder.forEach((row, k) => {
    place[row] = k;
  });
  return Int32Array.from(drawn.keys()).sort((a, b) => place[drawn[a]!]! - place[drawn[b]!]! || a - b);
}

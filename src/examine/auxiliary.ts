import { columnsOf, EXTENDED_BUDGET, type Factor, factorExtended, factorRows } from '../engine/factor.ts';
import { dependentShare } from '../engine/fit-candidate.ts';
import { columnNorm, eliminate } from '../engine/kernel.ts';
import type { DesignRows } from '../model/design-rows.ts';

/** Writes rows from…to−1 of a column that is computed, not read, at `at`. */
export type ColumnWriter = (from: number, to: number, out: Float64Array, at: number) => void;

/**
 * Rows with computed columns behind those of `rows`, then computed responses. What is written is taken as it is: a column
 * that is to be weighted brings its weights. Values are of ordinary magnitude.
 */
export function rowsWith(
  rows: DesignRows,
  columns: readonly ColumnWriter[],
  responses: readonly ColumnWriter[],
): DesignRows {
  const own = rows.predictorCount;
  const writers = [...columns, ...responses];
  const width = own + writers.length;
  return {
    ...rows,
    width,
    predictorCount: own + columns.length,
    scales: Float64Array.from({ length: width }, (_, j) => (j < own ? rows.scales[j]! : 1)),
    responses: [],
    fill(wanted, from, to, stride, hi, lo) {
      const one = [0];
      for (let c = 0; c < wanted.length; c++) {
        const column = wanted[c]!;
        const at = c * stride;
        if (column < own) {
          one[0] = column;
          rows.fill(one, from, to, stride, hi.subarray(at), lo === null ? null : lo.subarray(at));
        } else {
          if (lo !== null) lo.fill(0, at, at + to - from);
          writers[column - own]!(from, to, hi, at);
        }
      }
    },
  };
}

/** The factor of all rows, in double-double where that costs next to nothing. */
export function factorOf(rows: DesignRows): Factor {
  return rows.rowCount * rows.width ** 2 <= EXTENDED_BUDGET ? factorExtended(rows) : factorRows(rows);
}

/** An auxiliary regression, for its sums of squares. */
export interface Auxiliary {
  /** Columns that were not dependent on earlier ones. */
  readonly rank: number;
  readonly residualSumOfSquares: number;
  /** About the mean where the regression has column 0, which is then the intercept; else about zero. */
  readonly totalSumOfSquares: number;
}

/**
 * Regresses response column `response` on some columns of a factor, in ascending order; exactly dependent ones join the
 * earlier ones. A candidate's fit without all that is not asked of an auxiliary regression.
 */
export function regress(factor: Factor, columns: readonly number[], response = 0): Auxiliary {
  const { triangle, predictorCount, scales } = factor;
  const at = predictorCount + response;
  const height = at + 1;
  const order = [...columns, at];
  const work = columnsOf(factor, order, height);
  let rank = 0;
  columns.forEach((column, j) => {
    const end = column + 1;
    if (columnNorm(work, j, rank, end) <= dependentShare(work) * columnNorm(work, j, 0, end)) return;
    eliminate(work, j, rank, end, order.length);
    rank++;
  });
  const scale = scales[at]!;
  return {
    rank,
    residualSumOfSquares: (columnNorm(work, columns.length, rank, height) / scale) ** 2,
    totalSumOfSquares: (columnNorm(triangle, at, columns[0] === 0 ? 1 : 0, height) / scale) ** 2,
  };
}

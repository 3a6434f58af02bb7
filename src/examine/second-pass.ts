import type { Factor } from '../engine/factor.ts';
import { FULL_LEVERAGE } from '../engine/row-figures.ts';
import { type DesignRows, designRows } from '../model/design-rows.ts';
import { type Auxiliary, type ColumnWriter, factorOf, regress, rowsWith } from './auxiliary.ts';
import { type Chosen, deletedDeviation } from './chosen.ts';
import { lagsOf } from './lags.ts';
import { inTimeOrder } from './time-rows.ts';

/**
 * What one more pass over the rows gives the diagnostics, beside the residuals and leverages of the first: one factor for
 * all auxiliary regressions, sums over neighbours in time, and how far each row moves each coefficient. Residuals are
 * taken in units of s, so that their squares are of ordinary size.
 */
export interface SecondPass {
  /** Regresses e/s (weighted) on the model's columns with ŷ² and ŷ³, with lagged residuals, or alone. */
  readonly regressResiduals: (added: 'powers' | 'lags') => Auxiliary;
  /** Regresses (e/s)² on the intercept and the model's columns, unweighted; null in a weighted study. */
  readonly regressSquares: (() => Auxiliary) | null;
  /** How far back the lagged residuals go; 0 where they were not asked for or cannot be had. */
  readonly lags: number;
  readonly neighbours: NeighbourSums | null;
  readonly shifts: CoefficientShifts;
}

/** Q = √w X R⁻¹ with rows in time order, A the matrix of first differences squared: e′Ae = Σ (e_t − e_{t−1})². */
export interface NeighbourSums {
  /** tr(Q′AQ). */
  readonly first: number;
  /** tr(Q′A²Q). */
  readonly second: number;
  /** tr((Q′AQ)²). */
  readonly squared: number;
}

/** DFBETAS over all rows (Belsley, Kuh & Welsch 1980). */
export interface CoefficientShifts {
  /** Rows in which that of some coefficient is beyond 2/√n. */
  readonly rowsBeyond: number;
  /** By coefficient: the largest in size, with its sign, and the row it belongs to (−1 where there is none). */
  readonly largest: Float64Array;
  readonly rows: Int32Array;
}

/** Makes the second pass; null where the chosen model leaves nothing to examine. */
export function secondPass(chosen: Chosen): SecondPass | null {
  const { fit, sample, study, columns, s } = chosen;
  if (s === null) return null;
  const kept = fit.columns.filter((column) => column !== 0);
  const weighted = study.weights !== null;
  const order = sample.timeOrder;
  const lags = lagsOf(chosen);
  const base = designRows(
    [columns[0]!, ...kept.map((column) => columns[column]!)],
    sample,
    [],
    study.weights,
  );
  const inOrder = inTimeOrder(base, order);
  const fill = residualWriters(chosen, inOrder, lags);
  const rows = rowsWith(
    inOrder,
    [...fill.powers, ...fill.lagged],
    weighted ? [fill.residual] : [fill.residual, fill.square],
  );
  const sums = rowSums(chosen, base.scales, order);
  const factor: Factor = factorOf(watched(rows, sums.take));

  const own = fit.columns.map((column) => (column === 0 ? 0 : kept.indexOf(column) + 1));
  const all = Array.from({ length: kept.length + 1 }, (_, j) => j);
  const from = { powers: kept.length + 1, lags: kept.length + 3 };
  const added = {
    powers: [from.powers, from.powers + 1],
    lags: Array.from({ length: lags }, (_, l) => from.lags + l),
  };
  return {
    regressResiduals: (which) => regress(factor, [...own, ...added[which]]),
    regressSquares: weighted ? null : () => regress(factor, all, 1),
    lags,
    neighbours: sums.neighbours(),
    shifts: sums.shifts(),
  };
}

/** The computed columns: rows are in time order where there is one. */
function residualWriters(chosen: Chosen, inOrder: DesignRows, lags: number) {
  const { residuals, fitted, sample, fit } = chosen;
  const s = chosen.s!;
  const n = sample.rowCount;
  const order = sample.timeOrder;
  const at = order === null ? (t: number) => t : (t: number) => order[t]!;
  const writer =
    (value: (t: number) => number): ColumnWriter =>
    (from, to, out, place) => {
      for (let t = from; t < to; t++) out[place + t - from] = value(t);
    };
  // With an intercept the powers may be taken about any centre: together with the fitted values, which the columns
  // hold, they say the same, and about the middle of their range they keep their digits.
  const { centre, reach } = middle(fitted, fit.candidate.intercept);
  const root = (t: number) => (inOrder.rootWeights === null ? 1 : inOrder.rootWeights[t]!);
  const level = (t: number) => (fitted[at(t)]! - centre) / reach;
  return {
    powers: [writer((t) => root(t) * level(t) ** 2), writer((t) => root(t) * level(t) ** 3)],
    lagged: Array.from({ length: lags }, (_, l) =>
      writer((t) => (t > l && t < n ? residuals[at(t - l - 1)]! / s : 0)),
    ),
    residual: writer((t) => residuals[at(t)]! / s),
    square: writer((t) => (residuals[at(t)]! / s) ** 2),
  };
}

function middle(values: Float64Array, centred: boolean): { centre: number; reach: number } {
  let least = Number.POSITIVE_INFINITY;
  let most = Number.NEGATIVE_INFINITY;
  for (const value of values) {
    if (value < least) least = value;
    if (value > most) most = value;
  }
  const centre = centred ? least / 2 + most / 2 : 0;
  const reach = Math.max(Math.abs(most - centre), Math.abs(least - centre));
  return { centre, reach: reach > 0 ? reach : 1 };
}

type Taker = (from: number, to: number, block: Float64Array, stride: number) => void;

/** Rows that show each block to `take` as it is formed, so that one pass serves two purposes. */
function watched(rows: DesignRows, take: Taker): DesignRows {
  return {
    ...rows,
    fill(wanted, from, to, stride, hi, lo) {
      rows.fill(wanted, from, to, stride, hi, lo);
      take(from, to, hi, stride);
    },
  };
}

/** Sums over rows of [intercept | kept columns | …], taken block by block in order. */
function rowSums(chosen: Chosen, scales: Float64Array, order: Int32Array | null) {
  const { fit, residuals, leverages } = chosen;
  const p = fit.columns.length;
  const n = residuals.length;
  const mark = 2 / Math.sqrt(n);
  // Without an intercept column 0 of the block is not the model's.
  const offset = fit.columns[0] === 0 ? 0 : 1;
  const root = fit.rootInverse.map((value, k) => value / scales[(k % p) + offset]!);
  const unit = Float64Array.from({ length: p }, (_, j) => Math.sqrt(fit.inverse[j * p + j]!));
  const q = new Float64Array(p);
  const largest = new Float64Array(p);
  const rows = new Int32Array(p).fill(-1);
  let rowsBeyond = 0;
  const neighbours = order === null ? null : neighbourSums(p);

  const take: Taker = (from, to, block, stride) => {
    for (let t = from; t < to; t++) {
      const i = order === null ? t : order[t]!;
      for (let j = 0; j < p; j++) {
        let sum = 0;
        for (let k = 0; k <= j; k++) sum += root[j * p + k]! * block[(k + offset) * stride + t - from]!;
        q[j] = sum;
      }
      neighbours?.add(q);
      const h = leverages[i]!;
      const spread = deletedDeviation(chosen, i);
      if (spread === null || !(spread > 0) || h > FULL_LEVERAGE) continue;
      const share = residuals[i]! / (spread * (1 - h));
      let beyond = false;
      for (let j = 0; j < p; j++) {
        let sum = 0;
        for (let k = j; k < p; k++) sum += fit.rootInverse[k * p + j]! * q[k]!;
        const shift = (sum * share) / unit[j]!;
        if (Math.abs(shift) > mark) beyond = true;
        if (Math.abs(shift) > Math.abs(largest[j]!)) {
          largest[j] = shift;
          rows[j] = i;
        }
      }
      if (beyond) rowsBeyond++;
    }
  };
  return {
    take,
    neighbours: (): NeighbourSums | null => neighbours?.finish() ?? null,
    shifts: (): CoefficientShifts => ({ rowsBeyond, largest, rows }),
  };
}

function neighbourSums(p: number) {
  const products = new Float64Array(p * p);
  // The last two rows of Q and the difference between them.
  const before = new Float64Array(p);
  const step = new Float64Array(p);
  let count = 0;
  let first = 0;
  let second = 0;
  return {
    add(q: Float64Array): void {
      for (let j = 0; j < p; j++) {
        const change = count === 0 ? 0 : q[j]! - before[j]!;
        // Row t − 1 of AQ: the difference to the row before it, less that to the row after.
        if (count > 0) second += (step[j]! - change) ** 2;
        first += change * change;
        step[j] = change;
        before[j] = q[j]!;
      }
      if (count > 0) {
        for (let j = 0; j < p; j++) for (let k = 0; k <= j; k++) products[j * p + k]! += step[j]! * step[k]!;
      }
      count++;
    },
    finish(): NeighbourSums {
      let squared = 0;
      for (let j = 0; j < p; j++) {
        second += step[j]! ** 2;
        for (let k = 0; k <= j; k++) squared += (j === k ? 1 : 2) * products[j * p + k]! ** 2;
      }
      return { first, second, squared };
    },
  };
}

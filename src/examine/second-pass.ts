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
  const order = sample.timeOrder;
  const roots = inOrder.rootWeights;
  // With an intercept the powers may be taken about any centre: together with the fitted values, which the columns
  // hold, they say the same, and about the middle of their range they keep their digits.
  const { centre, reach } = middle(fitted, fit.candidate.intercept);
  const power = (cube: boolean): ColumnWriter => {
    return (from, to, out, place) => {
      for (let t = from; t < to; t++) {
        const level = (fitted[order === null ? t : order[t]!]! - centre) / reach;
        out[place + t - from] = cube ? level * level * level : level * level;
      }
      if (roots !== null) for (let t = from; t < to; t++) out[place + t - from]! *= roots[t]!;
    };
  };
  const residual = (back: number, square = false): ColumnWriter => {
    return (from, to, out, place) => {
      for (let t = from; t < to; t++) {
        const e = t < back ? 0 : residuals[order === null ? t - back : order[t - back]!]! / s;
        out[place + t - from] = square ? e * e : e;
      }
    };
  };
  return {
    powers: [power(false), power(true)],
    lagged: Array.from({ length: lags }, (_, l) => residual(l + 1)),
    residual: residual(0),
    square: residual(0, true),
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

/** Sums over rows of [intercept | kept columns | …], taken block by block in order, column by column within a block. */
function rowSums(chosen: Chosen, scales: Float64Array, order: Int32Array | null) {
  const { fit, residuals, leverages } = chosen;
  const p = fit.columns.length;
  const n = residuals.length;
  const mark = 2 / Math.sqrt(n);
  // Without an intercept column 0 of the block is not the model's.
  const offset = fit.columns[0] === 0 ? 0 : 1;
  const root = fit.rootInverse.map((value, k) => value / scales[(k % p) + offset]!);
  const largest = new Float64Array(p);
  const rows = new Int32Array(p).fill(-1);
  const neighbours = order === null ? null : neighbourSums(p);
  let rowsBeyond = 0;
  let q = new Float64Array(0);
  let c = new Float64Array(0);
  let share = new Float64Array(0);
  let beyond = new Uint8Array(0);

  const take: Taker = (from, to, block, stride) => {
    const count = to - from;
    if (c.length < count) {
      q = new Float64Array(p * count);
      c = new Float64Array(count);
      share = new Float64Array(count);
      beyond = new Uint8Array(count);
    }
    q.fill(0);
    for (let j = 0; j < p; j++) {
      for (let k = 0; k <= j; k++) {
        const r = root[j * p + k]!;
        const at = (k + offset) * stride;
        const into = j * count;
        for (let i = 0; i < count; i++) q[into + i]! += r * block[at + i]!;
      }
    }
    neighbours?.add(q, count);
    // e/(s_(i)(1 − h)): what turns (X′X)⁻¹x into the change of the coefficients without the row, in units of s_(i).
    for (let i = 0; i < count; i++) {
      const row = order === null ? from + i : order[from + i]!;
      const spread = deletedDeviation(chosen, row);
      share[i] =
        spread === null || !(spread > 0) || leverages[row]! > FULL_LEVERAGE
          ? 0
          : residuals[row]! / (spread * (1 - leverages[row]!));
    }
    beyond.fill(0);
    for (let j = 0; j < p; j++) {
      c.fill(0);
      for (let k = j; k < p; k++) {
        const r = fit.rootInverse[k * p + j]!;
        const at = k * count;
        for (let i = 0; i < count; i++) c[i]! += r * q[at + i]!;
      }
      const unit = Math.sqrt(fit.inverse[j * p + j]!);
      for (let i = 0; i < count; i++) {
        const shift = (c[i]! * share[i]!) / unit;
        const size = Math.abs(shift);
        if (size > mark) beyond[i] = 1;
        if (size > Math.abs(largest[j]!)) {
          largest[j] = shift;
          rows[j] = order === null ? from + i : order[from + i]!;
        }
      }
    }
    for (let i = 0; i < count; i++) rowsBeyond += beyond[i]!;
  };
  return {
    take,
    neighbours: (): NeighbourSums | null => neighbours?.finish() ?? null,
    shifts: (): CoefficientShifts => ({ rowsBeyond, largest, rows }),
  };
}

function neighbourSums(p: number) {
  const products = new Float64Array(p * p);
  /** The last row of Q so far, and the difference between it and the one before. */
  const before = new Float64Array(p);
  const last = new Float64Array(p);
  let started = false;
  let first = 0;
  let second = 0;
  let steps = new Float64Array(0);
  return {
    /** Takes `count` rows of Q, p columns of that length. */
    add(q: Float64Array, count: number): void {
      if (steps.length < p * count) steps = new Float64Array(p * count);
      for (let j = 0; j < p; j++) {
        const at = j * count;
        let previous = started ? before[j]! : q[at]!;
        let step = last[j]!;
        for (let i = at; i < at + count; i++) {
          const change = q[i]! - previous;
          previous = q[i]!;
          steps[i] = change;
          first += change * change;
          // A row of AQ: its difference to the row before, less that of the row after to it. Before the first row
          // both are 0.
          second += (step - change) * (step - change);
          step = change;
        }
        before[j] = previous;
        last[j] = step;
      }
      for (let j = 0; j < p; j++) {
        for (let k = 0; k <= j; k++) {
          let sum = 0;
          for (let i = 0; i < count; i++) sum += steps[j * count + i]! * steps[k * count + i]!;
          products[j * p + k]! += sum;
        }
      }
      started = true;
    },
    finish(): NeighbourSums {
      let squared = 0;
      for (let j = 0; j < p; j++) {
        second += last[j]! ** 2;
        for (let k = 0; k <= j; k++) squared += (j === k ? 1 : 2) * products[j * p + k]! ** 2;
      }
      return { first, second, squared };
    },
  };
}

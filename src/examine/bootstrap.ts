import { absorb } from '../engine/factor.ts';
import type { Fit } from '../engine/fit.ts';
import { FULL_LEVERAGE } from '../engine/row-figures.ts';
import { rowsAt } from '../engine/rows-at.ts';
import { type DesignRows, designRows } from '../model/design-rows.ts';
import { type Random, randomFrom } from '../stats/random.ts';
import type { BootstrapPlan } from '../study/study.ts';
import type { Chosen } from './chosen.ts';

/** The chosen model fitted again to rows that were drawn. */
export interface Bootstrap {
  readonly plan: BootstrapPlan;
  /** Rows in a block where blocks were drawn, else null. */
  readonly blockLength: number | null;
  /** Repetitions in which every coefficient could be estimated. */
  readonly used: number;
  /** Estimates of each of them, one after the other: used × p. */
  readonly estimates: Float64Array;
  /** What new rows' errors are drawn from: e_i/√(1 − h_i) less their mean, weighted. Rows with leverage 1 have none. */
  readonly errors: Float64Array;
}

/** How the coefficients scatter over the repetitions. */
export interface BootstrapCoefficient {
  /** Mean of the repetitions less the estimate. */
  readonly bias: number;
  readonly standardError: number;
  /** Between quantiles of the repetitions. */
  readonly lower: number;
  readonly upper: number;
  /** Those quantiles mirrored at the estimate: right where the scatter about it, not its place, is repeated. */
  readonly basicLower: number;
  readonly basicUpper: number;
}

const BLOCK = 256;
/** A diagonal below this share of its column’s length: the rows drawn do not tell that column from earlier ones. */
const LOST = 1e-10;
/** Random numbers of the new rows’ errors, apart from those of the draws. */
export const ERRORS_STREAM = 1;

/**
 * Draws rows with replacement and fits again (Efron 1979); or draws residuals, each brought to equal variance and
 * centred, and adds them to the fitted values (Davison & Hinkley 1997, 6.2); or draws blocks of rows that follow one
 * another in time, any row beginning one (Künsch 1989). Rows drawn several times enter the factor with the square root
 * of their number. A repetition in which a coefficient cannot be estimated, such as that of a level none of whose rows
 * was drawn, is left out and counted. Null where the model leaves nothing to draw.
 */
export function bootstrap(
  chosen: Chosen,
  plan: BootstrapPlan,
  onProgress?: (done: number, total: number) => void,
): Bootstrap | null {
  if (chosen.s === null) return null;
  const { columns, fit, sample, study, observed } = chosen;
  const rows = designRows(
    fit.columns.map((column) => columns[column]!),
    sample,
    [observed],
    study.weights,
  );
  const p = fit.columns.length;
  const errors = errorsOf(chosen);
  const random = randomFrom(plan.seed);
  const blockLength =
    plan.by === 'blocks'
      ? Math.min(sample.rowCount, plan.blockLength ?? Math.ceil(Math.cbrt(sample.rowCount)))
      : null;
  const estimates = new Float64Array(plan.repetitions * p);
  let used = 0;
  for (let k = 0; k < plan.repetitions; k++) {
    const found =
      plan.by === 'residuals'
        ? fromResiduals(fit, rows, errors, random)
        : fromRows(rows, counts(chosen, blockLength, random));
    if (found !== null) estimates.set(found, p * used++);
    onProgress?.(k + 1, plan.repetitions);
  }
  return { plan, blockLength, used, estimates: estimates.subarray(0, used * p), errors };
}

/** e_i/√(1 − h_i), of √w e, less their mean: errors as the model would have them, at their full size. */
function errorsOf({ residuals, leverages }: Chosen): Float64Array {
  const raised = residuals
    .map((e, i) => (leverages[i]! > FULL_LEVERAGE ? Number.NaN : e / Math.sqrt(1 - leverages[i]!)))
    .filter((e) => !Number.isNaN(e));
  const mean = raised.reduce((sum, e) => sum + e / raised.length, 0);
  return raised.map((e) => e - mean);
}

/** How often each row is drawn: rows one by one, or blocks in time order until there are n of them. */
function counts({ sample }: Chosen, blockLength: number | null, random: Random): Int32Array {
  const n = sample.rowCount;
  const times = new Int32Array(n);
  if (blockLength === null) {
    for (let k = 0; k < n; k++) times[random.below(n)]!++;
    return times;
  }
  const order = sample.timeOrder!;
  for (let left = n; left > 0; left -= blockLength) {
    const start = random.below(n - blockLength + 1);
    for (let t = start; t < start + Math.min(left, blockLength); t++) times[order[t]!]!++;
  }
  return times;
}

/** b of the rows drawn, from their factor; null where the columns are dependent among them. */
function fromRows(rows: DesignRows, times: Int32Array): Float64Array | null {
  const drawn = Int32Array.from(times.keys()).filter((i) => times[i]! > 0);
  const view = rowsAt(
    rows,
    drawn,
    Float64Array.from(drawn, (i) => Math.sqrt(times[i]!)),
  );
  const m = rows.width;
  const r = new Float64Array(m * m);
  const block = new Float64Array(BLOCK * m);
  const all = Array.from({ length: m }, (_, j) => j);
  for (let from = 0; from < drawn.length; from += BLOCK) {
    const to = Math.min(drawn.length, from + BLOCK);
    view.fill(all, from, to, BLOCK, block, null);
    absorb(r, m, block, BLOCK, to - from);
  }
  return solve(r, rows.scales, m);
}

/** R b = z for the triangle [R | z], in true units. */
function solve(r: Float64Array, scales: Float64Array, m: number): Float64Array | null {
  const p = m - 1;
  const b = new Float64Array(p);
  for (let j = p - 1; j >= 0; j--) {
    let squares = 0;
    for (let i = 0; i <= j; i++) squares += r[j * m + i]! ** 2;
    const diagonal = r[j * m + j]!;
    if (!(Math.abs(diagonal) > LOST * Math.sqrt(squares))) return null;
    let value = r[p * m + j]!;
    for (let k = j + 1; k < p; k++) value -= r[k * m + j]! * b[k]!;
    b[j] = value / diagonal;
  }
  for (let j = 0; j < p; j++) b[j]! *= scales[j]! / scales[p]!;
  return b;
}

/** b + (X′WX)⁻¹X′√w r with r drawn anew for every row; through the root, in one pass over the rows. */
function fromResiduals(fit: Fit, rows: DesignRows, errors: Float64Array, random: Random): Float64Array {
  const p = fit.columns.length;
  const wanted = Array.from({ length: p }, (_, j) => j);
  const block = new Float64Array(BLOCK * p);
  const g = new Float64Array(p);
  for (let from = 0; from < rows.rowCount; from += BLOCK) {
    const to = Math.min(rows.rowCount, from + BLOCK);
    rows.fill(wanted, from, to, BLOCK, block, null);
    for (let i = 0; i < to - from; i++) {
      const error = errors[random.below(errors.length)]!;
      for (let j = 0; j < p; j++) g[j]! += block[j * BLOCK + i]! * error;
    }
  }
  const half = new Float64Array(p);
  for (let j = 0; j < p; j++)
    for (let i = 0; i <= j; i++) half[j]! += (fit.rootInverse[j * p + i]! * g[i]!) / rows.scales[i]!;
  const b = fit.estimates.slice();
  for (let j = 0; j < p; j++) for (let i = 0; i <= j; i++) b[i]! += fit.rootInverse[j * p + i]! * half[j]!;
  return b;
}

/** The scatter of each coefficient, with intervals of the given confidence; null for fewer than two repetitions. */
export function bootstrapCoefficients(
  { estimates, used }: Bootstrap,
  fit: Fit,
  confidence: number,
): BootstrapCoefficient[] | null {
  if (used < 2) return null;
  const p = fit.columns.length;
  return Array.from(fit.estimates, (estimate, j) => {
    const values = Float64Array.from({ length: used }, (_, k) => estimates[k * p + j]!).sort();
    const mean = values.reduce((sum, value) => sum + value / used, 0);
    const squares = values.reduce((sum, value) => sum + (value - mean) ** 2, 0);
    const [lower, upper] = ends(values, confidence);
    return {
      bias: mean - estimate,
      standardError: Math.sqrt(squares / (used - 1)),
      lower,
      upper,
      basicLower: 2 * estimate - upper,
      basicUpper: 2 * estimate - lower,
    };
  });
}

/** The quantiles of sorted values that leave half of 1 − confidence on each side. */
export function ends(sorted: Float64Array, confidence: number): [number, number] {
  const tail = (1 - confidence) / 2;
  return [quantile(sorted, tail), quantile(sorted, 1 - tail)];
}

/** The order statistic (B + 1)q, linear between two of them (Davison & Hinkley 1997, 2.4). */
function quantile(sorted: Float64Array, q: number): number {
  const exact = (sorted.length + 1) * q;
  // Whole for the usual numbers of repetitions, but for rounding.
  const near = Math.abs(exact - Math.round(exact)) < 1e-9 ? Math.round(exact) : exact;
  const place = Math.min(sorted.length, Math.max(1, near));
  const whole = Math.floor(place);
  const share = place - whole;
  const below = sorted[whole - 1]!;
  return whole >= sorted.length ? below : below + share * (sorted[whole]! - below);
}

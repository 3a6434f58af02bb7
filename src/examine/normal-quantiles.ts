import type { Fit } from '../engine/fit.ts';
import { FULL_LEVERAGE } from '../engine/row-figures.ts';
import { normalQuantile } from '../stats/distributions.ts';
import { randomFrom } from '../stats/random.ts';
import { type Chosen, standardisedResidual } from './chosen.ts';
import { orthonormalRows } from './orthonormal-design.ts';

/** Ordered residuals against what normal errors would give. Lists of equal length, ascending. */
export interface NormalQuantiles {
  /** Normal quantile at (i − 3/8)/(n + 1/4) (Blom 1958). */
  readonly expected: number[];
  /** The standardised residual of that rank. */
  readonly residual: number[];
  /** Between which 95 % of the residuals of that rank lie where the errors are normal; null where not simulated. */
  readonly lower: number[] | null;
  readonly upper: number[] | null;
  /** How often errors were drawn; 0 where they were not. */
  readonly simulations: number;
}

/** 2 of 80 places lie outside at each end: few enough drawings to cost a study of some hundred rows some milliseconds. */
const SIMULATIONS = 79;
const OUTSIDE = 2;
/** Beyond this many rows the envelope is narrower than a dot, and simulating takes long. */
const MOST_SIMULATED = 2000;
/** Ranks kept: all up to this many, else both ends whole and the middle thinned. */
const MOST_RANKS = 240;
const END = 40;
const SEED = 1;

/**
 * The standardised residuals in order with a simulated envelope: normal errors are drawn, the chosen model is fitted to them,
 * and the residuals of each rank are kept (Atkinson 1985, section 4.2; here with 79 drawings and pointwise 95 %). Null where
 * the model leaves nothing to examine. The rows of leverage 1 have no standardised residual and are left out.
 */
export function normalQuantiles(chosen: Chosen): NormalQuantiles | null {
  const { residuals, fit } = chosen;
  if (chosen.s === null) return null;
  const ordered = Float64Array.from(
    Array.from(residuals, (_, i) => standardisedResidual(chosen, i)).filter((z) => z !== null),
  ).sort();
  const m = ordered.length;
  if (m < 3) return null;
  const ranks = keptRanks(m);
  const simulated =
    residuals.length > MOST_SIMULATED ? null : envelope(orthonormalRows(chosen), fit, ranks, m);
  return {
    expected: ranks.map((i) => normalQuantile((i + 1 - 0.375) / (m + 0.25))),
    residual: ranks.map((i) => ordered[i]!),
    lower: simulated?.lower ?? null,
    upper: simulated?.upper ?? null,
    simulations: simulated === null ? 0 : SIMULATIONS,
  };
}

function keptRanks(m: number): number[] {
  if (m <= MOST_RANKS) return Array.from({ length: m }, (_, i) => i);
  const middle = MOST_RANKS - 2 * END;
  const between = Array.from(
    { length: middle },
    (_, k) => END + Math.floor(((k + 0.5) * (m - 2 * END)) / middle),
  );
  return [
    ...Array.from({ length: END }, (_, i) => i),
    ...new Set(between),
    ...Array.from({ length: END }, (_, i) => m - END + i),
  ];
}

/** @param q orthonormal columns of the design, n × p column-major; its rows may be in another order than those of `chosen` */
function envelope(
  q: Float64Array,
  fit: Fit,
  ranks: readonly number[],
  m: number,
): { lower: number[]; upper: number[] } {
  const p = fit.columns.length;
  const n = q.length / p;
  // Leverages are taken from Q again, since its rows are in time order and those of `chosen` are not.
  const spread = new Float64Array(n);
  for (let i = 0; i < n; i++) {
    let h = 0;
    for (let j = 0; j < p; j++) h += q[j * n + i]! ** 2;
    spread[i] = h > FULL_LEVERAGE ? 0 : Math.sqrt(1 - h);
  }
  const errors = normalNumbers(SIMULATIONS * n);
  // Of each rank only the outermost of all drawings are needed: the OUTSIDE smallest, ascending, and as many largest, descending.
  const low = new Float64Array(ranks.length * OUTSIDE).fill(Number.POSITIVE_INFINITY);
  const high = new Float64Array(ranks.length * OUTSIDE).fill(Number.NEGATIVE_INFINITY);
  const e = new Float64Array(n);
  const z = new Float64Array(m);
  const scratch = { starts: new Int32Array(2 * m + 1), sorted: new Float64Array(m) };
  for (let simulation = 0; simulation < SIMULATIONS; simulation++) {
    e.set(errors.subarray(simulation * n, (simulation + 1) * n));
    for (let j = 0; j < p; j++) {
      const column = q.subarray(j * n, (j + 1) * n);
      let dot = 0;
      for (let i = 0; i < n; i++) dot += column[i]! * e[i]!;
      for (let i = 0; i < n; i++) e[i]! -= dot * column[i]!;
    }
    let squares = 0;
    for (let i = 0; i < n; i++) squares += e[i]! * e[i]!;
    const s = Math.sqrt(squares / fit.degreesOfFreedom);
    let k = 0;
    for (let i = 0; i < n && k < m; i++) if (spread[i]! > 0) z[k++] = e[i]! / (s * spread[i]!);
    sortSpread(z, scratch);
    for (let r = 0; r < ranks.length; r++) {
      const value = z[ranks[r]!]!;
      keepOutermost(low, r * OUTSIDE, value, 1);
      keepOutermost(high, r * OUTSIDE, value, -1);
    }
  }
  const innermost = (kept: Float64Array) => ranks.map((_, r) => kept[(r + 1) * OUTSIDE - 1]!);
  return { lower: innermost(low), upper: innermost(high) };
}

/**
 * Sorts finite numbers that are spread more or less evenly, as residuals are, in a time that is about proportional to how
 * many there are: dealt into twice as many intervals of one width, then each moved past its few neighbours (Knuth, The Art
 * of Computer Programming, vol. 3, 5.2.5 and 5.2.1).
 * @param starts room for 2n + 1
 */
export function sortSpread(
  values: Float64Array,
  { starts, sorted }: { readonly starts: Int32Array; readonly sorted: Float64Array },
): void {
  const n = values.length;
  let low = Number.POSITIVE_INFINITY;
  let high = Number.NEGATIVE_INFINITY;
  for (let i = 0; i < n; i++) {
    const value = values[i]!;
    if (value < low) low = value;
    if (value > high) high = value;
  }
  const perWidth = (2 * n - 1) / (high - low);
  if (!(high > low) || !Number.isFinite(perWidth)) {
    values.sort();
    return;
  }
  starts.fill(0);
  for (let i = 0; i < n; i++) starts[Math.floor((values[i]! - low) * perWidth) + 1]!++;
  for (let k = 1; k <= 2 * n; k++) starts[k]! += starts[k - 1]!;
  for (let i = 0; i < n; i++) {
    const interval = Math.floor((values[i]! - low) * perWidth);
    sorted[starts[interval]!++] = values[i]!;
  }
  for (let i = 1; i < n; i++) {
    const value = sorted[i]!;
    let place = i;
    for (; place > 0 && sorted[place - 1]! > value; place--) sorted[place] = sorted[place - 1]!;
    sorted[place] = value;
  }
  values.set(sorted);
}

/** Puts a value among the OUTSIDE kept from `start` on, where it belongs there; `sign` 1 keeps the smallest, −1 the largest. */
function keepOutermost(kept: Float64Array, start: number, value: number, sign: 1 | -1): void {
  let place = start + OUTSIDE - 1;
  if (sign * value >= sign * kept[place]!) return;
  for (; place > start && sign * value < sign * kept[place - 1]!; place--) kept[place] = kept[place - 1]!;
  kept[place] = value;
}

/**
 * The first standard normal numbers of the seed, by inversion, which 0 cannot come out of. They are kept: a study that repeats
 * asks for the same ones in every run, and making them costs more than what is done with them.
 */
function normalNumbers(count: number): Float64Array {
  if (known.length < count) {
    const random = randomFrom(SEED);
    known = Float64Array.from({ length: count }, () => normalQuantile(Math.max(random.next(), 2 ** -54)));
  }
  return known;
}

let known: Float64Array = new Float64Array(0);

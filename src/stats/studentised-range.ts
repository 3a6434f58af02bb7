import { createRequire } from 'node:module';
import type { JStat } from 'jstat';
import { normalUpper, tTwoSided } from './distributions.ts';

/** The studentised range of some independent means. */
export interface StudentisedRange {
  /** P(Q > q); NaN for an argument that is no number. */
  readonly upper: (q: number) => number;
  /** The q with P(Q > q) = p; NaN unless 0 < p < 1. */
  readonly quantile: (p: number) => number;
}

/**
 * The studentised range of k ≥ 2 means on df > 0 degrees of freedom.
 *
 * With s the square root of χ²/df, the range of k standard normal values exceeds qs with probability
 * k ∫ φ(z) [Φ(z)^(k−1) − (Φ(z) − Φ(z − qs))^(k−1)] dz (Hartley 1942), and the tail is the mean of that over s. Both
 * integrals are taken by the trapezium rule, over z and over ln s, which on integrands that are analytic and die away
 * at both ends converges faster than any power of the step (Trefethen & Weideman 2014); every part is positive, so
 * that far tails keep their digits. Ranges are taken on one grid of ln(qs), whose inner integrals serve every q.
 */
export function studentisedRange(k: number, df: number): StudentisedRange {
  const upper = k === 2 ? (q: number) => tTwoSided(q / Math.SQRT2, df) : tailOf(k, df);
  const safely = (q: number) => (Number.isNaN(q) ? Number.NaN : q <= 0 ? 1 : upper(q));
  return { upper: safely, quantile: (p) => quantileOf(safely, p, k, df) };
}

function tailOf(k: number, df: number): (q: number) => number {
  const step = Math.min(0.1, 0.5 / Math.sqrt(2 * df));
  const inner = rangeTail(k);
  const known = new Map<number, number>();
  const innerAt = (i: number) => {
    let value = known.get(i);
    if (value === undefined) {
      value = inner(Math.exp(i * step));
      known.set(i, value);
    }
    return value;
  };
  // The density of u = ln s is C exp(df (u − (e^(2u) − 1)/2)), greatest at 0; C follows from its integral.
  const density = (u: number) => Math.exp(df * (u - Math.expm1(2 * u) / 2));
  return (q) => {
    const shift = Math.log(q);
    const middle = Math.round(shift / step);
    let mass = 0;
    let tail = 0;
    const add = (i: number): boolean => {
      const share = density(i * step - shift);
      mass += share;
      tail += share * innerAt(i);
      return share > 1e-22;
    };
    add(middle);
    for (let i = middle + 1; add(i); i++);
    for (let i = middle - 1; add(i); i--);
    return Math.min(1, tail / mass);
  };
}

const STEP = 0.2;
const REACH = 9;
/** Beyond this range even the tail of a great many means is nothing. */
const LARGEST_RANGE = 70;

/** P(range of k standard normal values > r). */
function rangeTail(k: number): (r: number) => number {
  const last = Math.ceil((LARGEST_RANGE / 2 + REACH) / STEP);
  const first = -Math.ceil(REACH / STEP);
  const count = last - first + 1;
  const below = new Float64Array(count);
  const weight = new Float64Array(count);
  for (let i = 0; i < count; i++) {
    const z = (first + i) * STEP;
    below[i] = normalUpper(-z);
    weight[i] = (k * STEP * Math.exp((-z * z) / 2)) / Math.sqrt(2 * Math.PI);
  }
  return (r) => {
    if (r >= LARGEST_RANGE) return 0;
    const stop = Math.ceil((r / 2 + REACH) / STEP) - first;
    let sum = 0;
    for (let i = 0; i <= stop; i++) {
      const z = (first + i) * STEP;
      const a = below[i]!;
      // a^(k−1) − (a − d)^(k−1) without cancellation.
      const share = Math.min(1, normalUpper(r - z) / a);
      sum += weight[i]! * -(a ** (k - 1)) * Math.expm1((k - 1) * Math.log1p(-share));
    }
    return Math.min(1, sum);
  };
}

const require = createRequire(import.meta.url);

/**
 * Where jstat sees the quantile: good to three digits or more, so a bracket about it is soon narrow; loaded only where
 * a quantile is asked for. Where it finds none the search starts from scratch.
 */
function firstGuess(p: number, k: number, df: number): number {
  const { jStat } = require('jstat') as { jStat: JStat };
  try {
    const guess = jStat.tukey.inv(1 - p, k, df);
    return guess > 0 && Number.isFinite(guess) ? guess : 2;
  } catch {
    // It gives up at few degrees of freedom and in far tails.
    return 2;
  }
}

/** By regula falsi on the logarithm of the tail, in Illinois form, within a bracket that it never leaves. */
function quantileOf(upper: (q: number) => number, p: number, k: number, df: number): number {
  if (!(p > 0) || !(p < 1)) return Number.NaN;
  const miss = (q: number) => Math.log(upper(q) / p);
  const guess = firstGuess(p, k, df);
  let low = guess * 0.999;
  let missLow = miss(low);
  for (let reach = 0.9; missLow < 0 && low > 1e-300; reach *= reach) {
    low *= reach;
    missLow = miss(low);
  }
  let high = guess * 1.001;
  let missHigh = miss(high);
  for (let reach = 1.1; missHigh > 0 && high < 1e12; reach *= reach) {
    high *= reach;
    missHigh = miss(high);
  }
  for (let step = 0; step < 100; step++) {
    let at = high - (missHigh * (high - low)) / (missHigh - missLow);
    if (!(at > low) || !(at < high)) at = low / 2 + high / 2;
    const now = miss(at);
    if (Math.abs(now) < 1e-15 || high - low <= 4e-16 * high) return at;
    if (now > 0) {
      low = at;
      missLow = now;
      missHigh /= 2;
    } else {
      high = at;
      missHigh = now;
      missLow /= 2;
    }
  }
  return low / 2 + high / 2;
}

import { normalUpper } from '../stats/distributions.ts';
import type { NeighbourSums } from './second-pass.ts';

/** Probabilities under unrelated normal errors. Each is right to many digits of itself, far tails included. */
export interface Tails {
  /** P(d ≤ the statistic): small where neighbours resemble each other. */
  readonly lower: number;
  /** P(d ≥ the statistic): small where they oppose each other. */
  readonly upper: number;
}

/** Σ (e_t − e_{t−1})²/Σ e_t² over residuals taken in the given order; between 0 and 4 (Durbin & Watson 1950). */
export function durbinWatson(residuals: Float64Array, order: Int32Array): number {
  let differences = 0;
  let squares = 0;
  let before = 0;
  for (let t = 0; t < order.length; t++) {
    const e = residuals[order[t]!]!;
    if (t > 0) differences += (e - before) ** 2;
    squares += e * e;
    before = e;
  }
  return differences / squares;
}

/** Mean and variance of the statistic (Durbin & Watson 1950), with tails of the normal distribution that has them. */
export function normalTails(statistic: number, n: number, p: number, sums: NeighbourSums): Tails {
  // tr A = 2(n − 1) and tr A² = 6n − 8; what the columns take away follows from M = I − QQ′.
  const trace = 2 * (n - 1) - sums.first;
  const square = 6 * n - 8 - 2 * sums.second + sums.squared;
  const df = n - p;
  const mean = trace / df;
  const variance = (2 * (square - trace * mean)) / (df * (df + 2));
  const z = (statistic - mean) / Math.sqrt(variance);
  return { lower: normalUpper(-z), upper: normalUpper(z) };
}

/**
 * Exact tails of the statistic d: P(d ≤ d₀) = P(u′M(A − d₀I)Mu ≤ 0) for normal u, by inverting the moment generating
 * function of the quadratic form (Imhof 1961) along a line through its saddle point (Helstrom 1983; Rice 1980), where the
 * integrand does not cancel, so that small tails keep their digits.
 *
 * No eigenvalues are needed. With Q an orthonormal basis of the columns and C = I − 2z(A − d₀I), which is tridiagonal, the
 * determinant of the form on the residuals' space is det C · det(Q′C⁻¹Q) (Jacobi's identity for complementary minors), at
 * a cost of n p² for each point. The real part of C is positive definite between the limits of z that are used, so every
 * pivot has a positive real part, and the logarithms of the pivots add up without a jump of the argument.
 *
 * @param q n × p, column-major, orthonormal, rows in time order; n > p
 */
export function exactTails(statistic: number, q: Float64Array, n: number, p: number): Tails {
  const form = { d: statistic, q, n, p, work: new Float64Array(2 * p), gram: new Float64Array(2 * p * p) };
  let differences = 0;
  for (let k = 0; k < n * p; k++) if (k % n !== 0) differences += (q[k]! - q[k - 1]!) ** 2;
  const mean = (2 * (n - 1) - differences) / (n - p);
  // The tail on the statistic's side of the mean has the better digits; the other follows. A has its eigenvalues
  // between 0 and 4, which bounds where the generating function is sure to exist.
  if (statistic < mean) {
    const lower = statistic > 0 ? tail(form, -EDGE / (2 * statistic)) : 0;
    return { lower, upper: 1 - lower };
  }
  const upper = statistic < 4 ? tail(form, EDGE / (2 * (4 - statistic))) : 0;
  return { lower: 1 - upper, upper };
}

interface Form {
  readonly d: number;
  readonly q: Float64Array;
  readonly n: number;
  readonly p: number;
  readonly work: Float64Array;
  readonly gram: Float64Array;
}

/** How near to the limit of the generating function the line may lie. */
const EDGE = 0.999;
const GOLDEN = (Math.sqrt(5) - 1) / 2;
/** The search for the saddle point need not be sharp: any line gives the same integral. */
const SEARCH = 9;
const FIRST_STEP = 0.5;
const FEWEST_STEP = FIRST_STEP / 32;
/** Halving the step squares the error: where two sums agree to this, the finer one is right to the last digits. */
const AGREED = 1e-7;

/** P on the side of `limit`: below 0 where it is negative. */
function tail(form: Form, limit: number): number {
  // ln M(c) − ln |c| is convex between 0 and the limit; the search runs over the logarithm of c.
  const height = (c: number): number => logGenerating(form, c, 0)[0]! - Math.log(Math.abs(c));
  let a = Math.log(1e-5);
  let b = 0;
  let x1 = b - GOLDEN * (b - a);
  let x2 = a + GOLDEN * (b - a);
  let f1 = height(limit * Math.exp(x1));
  let f2 = height(limit * Math.exp(x2));
  for (let step = 0; step < SEARCH; step++) {
    if (f1 < f2) {
      b = x2;
      x2 = x1;
      f2 = f1;
      x1 = b - GOLDEN * (b - a);
      f1 = height(limit * Math.exp(x1));
    } else {
      a = x1;
      x1 = x2;
      f1 = f2;
      x2 = a + GOLDEN * (b - a);
      f2 = height(limit * Math.exp(x2));
    }
  }
  const c = limit * Math.exp((a + b) / 2);
  // Where the integrand falls by the first e-fold along the line, and how far singularities are.
  const probe = 0.02 * Math.min(Math.abs(c), Math.abs(limit - c) + Math.abs(limit) * (1 - EDGE));
  const curvature = (height(c + probe) - 2 * height(c) + height(c - probe)) / probe ** 2;
  const width = Math.min(
    Math.abs(c),
    Math.abs(limit / EDGE - c),
    curvature > 0 ? 1 / Math.sqrt(curvature) : Number.POSITIVE_INFINITY,
  );
  const peak = logGenerating(form, c, 0)[0]!;
  // ∫ Re M(c + iu)/(c + iu) du with u = width · sinh v: the trapezium rule then gains digits geometrically.
  const term = (v: number): number => {
    const u = width * Math.sinh(v);
    const at = logGenerating(form, c, u);
    const angle = at[1]!;
    const size = Math.exp(at[0]! - peak);
    const real = (size * (c * Math.cos(angle) + u * Math.sin(angle))) / (c * c + u * u);
    return real * width * Math.cosh(v);
  };
  let sum = term(0) / 2 + sumOver(term, FIRST_STEP, FIRST_STEP);
  let step = FIRST_STEP;
  let value = step * sum;
  while (step > FEWEST_STEP) {
    sum += sumOver(term, step / 2, step);
    step /= 2;
    const finer = step * sum;
    const settled = Math.abs(finer - value) <= AGREED * Math.abs(finer);
    value = finer;
    if (settled) break;
  }
  const probability = (Math.sign(limit) * value * Math.exp(peak)) / Math.PI;
  return Math.min(1, Math.max(0, probability));
}

/** Σ term(from + k · step) until the terms are nothing beside the sum. */
function sumOver(term: (v: number) => number, from: number, step: number): number {
  let sum = 0;
  let largest = 0;
  let small = 0;
  for (let v = from; v < 200 && small < 4; v += step) {
    const value = term(v);
    if (!Number.isFinite(value)) break;
    sum += value;
    largest = Math.max(largest, Math.abs(value));
    small = Math.abs(value) <= 1e-17 * largest ? small + 1 : 0;
  }
  return sum;
}

const result = new Float64Array(2);

/** ln M(c + iu) as real part and argument, in a pair that is used again. */
function logGenerating(form: Form, c: number, u: number): Float64Array {
  const { d, q, n, p, work, gram } = form;
  gram.fill(0);
  work.fill(0);
  // Off the diagonal C has 2z, whose square is taken off each pivot.
  const offRe = 2 * c;
  const offIm = 2 * u;
  const squareRe = offRe * offRe - offIm * offIm;
  const squareIm = 2 * offRe * offIm;
  let log = 0;
  let angle = 0;
  let inverseRe = 0;
  let inverseIm = 0;
  let size = 1;
  for (let t = 0; t < n; t++) {
    const a = (t === 0 || t === n - 1 ? 1 : 2) - d;
    let pivotRe = 1 - 2 * c * a;
    let pivotIm = -2 * u * a;
    let multiplierRe = 0;
    let multiplierIm = 0;
    if (t > 0) {
      pivotRe -= squareRe * inverseRe - squareIm * inverseIm;
      pivotIm -= squareRe * inverseIm + squareIm * inverseRe;
      multiplierRe = offRe * inverseRe - offIm * inverseIm;
      multiplierIm = offRe * inverseIm + offIm * inverseRe;
    }
    const squared = pivotRe * pivotRe + pivotIm * pivotIm;
    // Squared sizes are gathered and their logarithm taken now and then.
    size *= squared;
    if (size > 1e200 || size < 1e-200) {
      log += Math.log(size);
      size = 1;
    }
    angle += Math.atan2(pivotIm, pivotRe);
    inverseRe = pivotRe / squared;
    inverseIm = -pivotIm / squared;
    for (let j = 0; j < p; j++) {
      const re = q[j * n + t]! - (multiplierRe * work[2 * j]! - multiplierIm * work[2 * j + 1]!);
      const im = -(multiplierRe * work[2 * j + 1]! + multiplierIm * work[2 * j]!);
      work[2 * j] = re;
      work[2 * j + 1] = im;
      const sideRe = re * inverseRe - im * inverseIm;
      const sideIm = re * inverseIm + im * inverseRe;
      for (let k = 0; k <= j; k++) {
        const at = 2 * (j * p + k);
        gram[at]! += sideRe * work[2 * k]! - sideIm * work[2 * k + 1]!;
        gram[at + 1]! += sideRe * work[2 * k + 1]! + sideIm * work[2 * k]!;
      }
    }
  }
  log += Math.log(size);
  // Pivots of the symmetric complex p × p matrix, lower triangle, row j at j · p.
  for (let j = 0; j < p; j++) {
    const diagonal = 2 * (j * p + j);
    const re = gram[diagonal]!;
    const im = gram[diagonal + 1]!;
    const squared = re * re + im * im;
    log += Math.log(squared);
    angle += Math.atan2(im, re);
    for (let i = j + 1; i < p; i++) {
      const at = 2 * (i * p + j);
      const factorRe = (gram[at]! * re + gram[at + 1]! * im) / squared;
      const factorIm = (gram[at + 1]! * re - gram[at]! * im) / squared;
      for (let k = j + 1; k <= i; k++) {
        const other = 2 * (k * p + j);
        const target = 2 * (i * p + k);
        gram[target]! -= factorRe * gram[other]! - factorIm * gram[other + 1]!;
        gram[target + 1]! -= factorRe * gram[other + 1]! + factorIm * gram[other]!;
      }
    }
  }
  result[0] = -log / 4;
  result[1] = -angle / 2;
  return result;
}

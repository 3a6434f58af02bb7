/**
 * Tail probabilities and quantiles of the distributions that the tests use, on the incomplete beta and
 * gamma functions of the cephes library. Upper tails are computed as such and never as 1 − a rounded
 * distribution function, so they keep their digits down to about 1e-300.
 *
 * Arguments out of the domain (NaN, degrees of freedom ≤ 0) give NaN.
 */
import { createRequire } from 'node:module';

// The package has a form that is ready at once and, for bundlers, one that compiles later and fails until then.
// Loaders differ in which of them an import gets; requiring it gets the first.
const cephes = createRequire(import.meta.url)('cephes') as typeof import('cephes').default;

/** P(F > f) for f ≥ 0 on d1 and d2 degrees of freedom. Abramowitz & Stegun 26.6.2. */
export function fUpper(f: number, d1: number, d2: number): number {
  if (!(d1 > 0) || !(d2 > 0) || Number.isNaN(f)) return Number.NaN;
  if (f <= 0) return 1;
  if (f === Number.POSITIVE_INFINITY) return 0;
  const tail = betaTail(d2 / 2, d1 / 2, d2 / (d2 + d1 * f));
  // Where f is small the argument above has lost digits of its distance from 1; there the lower tail is exact.
  return tail > 0.5 && d1 * f < d2 ? 1 - cephes.incbet(d1 / 2, d2 / 2, (d1 * f) / (d2 + d1 * f)) : tail;
}

/** P(|T| > |t|) on df degrees of freedom: the F tail of t² on 1 and df. */
export function tTwoSided(t: number, df: number): number {
  return fUpper(t * t, 1, df);
}

/** P(χ² > x) on df degrees of freedom. Abramowitz & Stegun 26.4.2. */
export function chiSquaredUpper(x: number, df: number): number {
  if (!(df > 0) || Number.isNaN(x)) return Number.NaN;
  return x <= 0 ? 1 : gammaTail(df / 2, x / 2);
}

/** P(Z > z), through the incomplete gamma function, which keeps the far tail. */
export function normalUpper(z: number): number {
  if (Number.isNaN(z)) return Number.NaN;
  const tail = gammaTail(0.5, (z * z) / 2) / 2;
  return z >= 0 ? tail : 1 - tail;
}

/** The z below which a standard normal variable falls with probability p; −∞ and ∞ for 0 and 1. */
export function normalQuantile(p: number): number {
  if (!(p >= 0) || !(p <= 1)) return Number.NaN;
  if (p === 0 || p === 1) return p === 0 ? Number.NEGATIVE_INFINITY : Number.POSITIVE_INFINITY;
  return cephes.ndtri(p);
}

/**
 * The t > 0 with P(|T| > t) = p on df degrees of freedom, 0 < p < 1. From the inverse incomplete beta
 * function, then polished by Newton steps on the tail itself, so that it inverts `tTwoSided`.
 */
export function tTwoSidedQuantile(p: number, df: number): number {
  if (!(df > 0) || !(p > 0) || !(p < 1)) return Number.NaN;
  const logConstant = cephes.lgam((df + 1) / 2) - cephes.lgam(df / 2) - 0.5 * Math.log(df * Math.PI);
  let t = df > 200 ? nearNormal(p, df) : fromBeta(p, df, logConstant);
  for (let step = 0; step < 4; step++) {
    const density = Math.exp(logConstant - ((df + 1) / 2) * Math.log1p((t * t) / df));
    const change = (tTwoSided(t, df) - p) / (2 * density);
    if (!Number.isFinite(change)) break;
    t += change;
    if (Math.abs(change) <= 1e-15 * t) break;
  }
  return t;
}

/** First Cornish–Fisher term about the normal quantile (Abramowitz & Stegun 26.7.5). */
function nearNormal(p: number, df: number): number {
  const z = -cephes.ndtri(p / 2);
  return z + (z ** 3 + z) / (4 * df);
}

/** Through the inverse incomplete beta, or the power law of the far tail where the library's cannot be held. */
function fromBeta(p: number, df: number, logConstant: number): number {
  try {
    const x = cephes.incbi(df / 2, 0.5, p);
    if (x > 0) return Math.sqrt((df * (1 - x)) / x);
  } catch {}
  return Math.exp((Math.LN2 + logConstant + ((df - 1) / 2) * Math.log(df) - Math.log(p)) / df);
}

/** Incomplete beta tail; kept apart so that one place guards the end points. */
function betaTail(a: number, b: number, x: number): number {
  return x >= 1 ? 1 : cephes.incbet(a, b, x);
}

/** Upper incomplete gamma, regularised. The library throws where a tail is too small to be held. */
function gammaTail(a: number, x: number): number {
  if (x === Number.POSITIVE_INFINITY) return 0;
  try {
    return cephes.igamc(a, x);
  } catch {
    return x < a ? 1 : 0;
  }
}

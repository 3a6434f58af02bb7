/**
 * Tail probabilities and quantiles of the distributions that the tests use, on the incomplete beta and
 * gamma functions of the cephes library. Upper tails are computed as such and never as 1 − a rounded
 * distribution function, so they keep their digits down to about 1e-300.
 *
 * Arguments out of the domain (NaN, degrees of freedom ≤ 0) give NaN.
 */
import cephes from 'cephes';

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
  return x <= 0 ? 1 : cephes.igamc(df / 2, x / 2);
}

/** P(Z > z), through the incomplete gamma function, which keeps the far tail. */
export function normalUpper(z: number): number {
  const tail = cephes.igamc(0.5, (z * z) / 2) / 2;
  return z >= 0 ? tail : 1 - tail;
}

/** The z below which a standard normal variable falls with probability p. */
export function normalQuantile(p: number): number {
  return cephes.ndtri(p);
}

/**
 * The t > 0 with P(|T| > t) = p on df degrees of freedom, 0 < p < 1. From the inverse incomplete beta
 * function, then polished by Newton steps on the tail itself, so that it inverts `tTwoSided`.
 */
export function tTwoSidedQuantile(p: number, df: number): number {
  if (!(df > 0) || !(p > 0) || !(p < 1)) return Number.NaN;
  let t = df > 200 ? nearNormal(p, df) : fromBeta(cephes.incbi(df / 2, 0.5, p), df);
  const logConstant = cephes.lgam((df + 1) / 2) - cephes.lgam(df / 2) - 0.5 * Math.log(df * Math.PI);
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

function fromBeta(x: number, df: number): number {
  return Math.sqrt((df * (1 - x)) / x);
}

/** Incomplete beta tail; kept apart so that one place guards the end points. */
function betaTail(a: number, b: number, x: number): number {
  return x >= 1 ? 1 : cephes.incbet(a, b, x);
}

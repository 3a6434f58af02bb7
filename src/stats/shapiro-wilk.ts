import { normalQuantile, normalUpper } from './distributions.ts';

/** Fewest and most values that the approximation was made for (Royston 1995). */
export const SHAPIRO_WILK_ROWS: readonly [number, number] = [3, 5000];

/**
 * W of Shapiro & Wilk with its p-value by Royston's approximation (Applied Statistics 44, 1995, AS R94): small where the
 * values do not look normal. Null for fewer than 3 or more than 5,000 values, and where all are equal.
 */
export function shapiroWilk(values: Float64Array): { readonly w: number; readonly p: number } | null {
  const n = values.length;
  if (n < SHAPIRO_WILK_ROWS[0] || n > SHAPIRO_WILK_ROWS[1]) return null;
  const x = values.slice().sort();
  const range = x[n - 1]! - x[0]!;
  if (!(range > 0)) return null;
  let mean = 0;
  for (let i = 0; i < n; i++) mean += (x[i]! - x[0]!) / range / n;
  const a = upperWeights(n);
  let products = 0;
  let squares = 0;
  for (let i = 0; i < n; i++) {
    const away = (x[i]! - x[0]!) / range - mean;
    squares += away * away;
    if (i < a.length) products += (a[i]! * (x[n - 1 - i]! - x[i]!)) / range;
  }
  // 1 − W is what the p-value hangs on, and W is at most 1 but for rounding.
  const w = Math.min(1, products ** 2 / squares);
  return { w, p: pValue(w, n) };
}

/** The weights of the differences x(n) − x(1), x(n − 1) − x(2), …; length ⌊n/2⌋. */
function upperWeights(n: number): Float64Array {
  const half = Math.floor(n / 2);
  if (n === 3) return Float64Array.of(Math.SQRT1_2);
  const m = Float64Array.from({ length: half }, (_, i) => -normalQuantile((i + 1 - 0.375) / (n + 0.25)));
  let sum = 0;
  for (const value of m) sum += 2 * value * value;
  const u = 1 / Math.sqrt(n);
  const root = Math.sqrt(sum);
  const first = m[0]! / root + polynomial(u, [0, 0.221157, -0.147981, -2.07119, 4.434685, -2.706056]);
  if (n <= 5) {
    const scale = Math.sqrt((sum - 2 * m[0]! ** 2) / (1 - 2 * first ** 2));
    return m.map((value, i) => (i === 0 ? first : value / scale));
  }
  const second = m[1]! / root + polynomial(u, [0, 0.042981, -0.293762, -1.752461, 5.682633, -3.582633]);
  const scale = Math.sqrt((sum - 2 * m[0]! ** 2 - 2 * m[1]! ** 2) / (1 - 2 * first ** 2 - 2 * second ** 2));
  return m.map((value, i) => (i === 0 ? first : i === 1 ? second : value / scale));
}

function pValue(w: number, n: number): number {
  if (n === 3) {
    // Exact for three values.
    return Math.min(1, Math.max(0, (6 / Math.PI) * (Math.asin(Math.sqrt(w)) - Math.asin(Math.sqrt(0.75)))));
  }
  if (w >= 1) return 1;
  const y = Math.log1p(-w);
  if (n <= 11) {
    const gamma = 0.459 * n - 2.273;
    if (y >= gamma) return 0;
    const mean = polynomial(n, [0.544, -0.39978, 0.025054, -6.714e-4]);
    const deviation = Math.exp(polynomial(n, [1.3822, -0.77857, 0.062767, -0.0020322]));
    return normalUpper((-Math.log(gamma - y) - mean) / deviation);
  }
  const x = Math.log(n);
  const mean = polynomial(x, [-1.5861, -0.31082, -0.083751, 0.0038915]);
  const deviation = Math.exp(polynomial(x, [-0.4803, -0.082676, 0.0030302]));
  return normalUpper((y - mean) / deviation);
}

/** c₀ + c₁x + c₂x² + … */
function polynomial(x: number, coefficients: readonly number[]): number {
  return coefficients.reduceRight((sum, c) => sum * x + c, 0);
}

/** A small least-squares solver for the fixtures: normal equations of scaled columns, enough for a dozen tame ones. */

export interface SmallFit {
  readonly b: number[];
  readonly inverse: number[][];
  readonly residuals: Float64Array;
  readonly fitted: Float64Array;
  readonly leverage: Float64Array;
  readonly rss: number;
  readonly tss: number;
}

export function leastSquares(x: readonly Float64Array[], y: Float64Array): SmallFit {
  const p = x.length;
  const n = y.length;
  const scale = x.map((column) => Math.sqrt(column.reduce((sum, v) => sum + v * v, 0)) || 1);
  const a = x.map((ci, i) =>
    x.map((cj, j) => ci.reduce((sum, v, r) => sum + v * cj[r]!, 0) / (scale[i]! * scale[j]!)),
  );
  const inverse = invert(a).map((row, i) => row.map((v, j) => v / (scale[i]! * scale[j]!)));
  const xy = x.map((column) => column.reduce((sum, v, r) => sum + v * y[r]!, 0));
  const b = inverse.map((row) => row.reduce((sum, v, j) => sum + v * xy[j]!, 0));
  const fitted = new Float64Array(n);
  const leverage = new Float64Array(n);
  for (let r = 0; r < n; r++) {
    for (let i = 0; i < p; i++) {
      fitted[r] = fitted[r]! + b[i]! * x[i]![r]!;
      for (let j = 0; j < p; j++) leverage[r] = leverage[r]! + x[i]![r]! * inverse[i]![j]! * x[j]![r]!;
    }
  }
  const residuals = y.map((v, r) => v - fitted[r]!);
  const mean = y.reduce((s, v) => s + v, 0) / n;
  return {
    b,
    inverse,
    residuals,
    fitted,
    leverage,
    rss: residuals.reduce((s, e) => s + e * e, 0),
    tss: y.reduce((s, v) => s + (v - mean) ** 2, 0),
  };
}

function invert(a: readonly number[][]): number[][] {
  const p = a.length;
  const m = a.map((row, i) => [...row, ...row.map((_, j) => (i === j ? 1 : 0))]);
  for (let k = 0; k < p; k++) {
    let best = k;
    for (let r = k + 1; r < p; r++) if (Math.abs(m[r]![k]!) > Math.abs(m[best]![k]!)) best = r;
    [m[k], m[best]] = [m[best]!, m[k]!];
    const pivot = m[k]![k]!;
    for (let j = 0; j < 2 * p; j++) m[k]![j] = m[k]![j]! / pivot;
    for (let r = 0; r < p; r++) {
      if (r === k) continue;
      const factor = m[r]![k]!;
      for (let j = 0; j < 2 * p; j++) m[r]![j] = m[r]![j]! - factor * m[k]![j]!;
    }
  }
  return m.map((row) => row.slice(p));
}

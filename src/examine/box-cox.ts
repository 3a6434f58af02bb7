import { factorRows } from '../engine/factor.ts';
import type { Fit } from '../engine/fit.ts';
import { columnNorm } from '../engine/kernel.ts';
import { type DesignRows, designRows, numbersOf } from '../model/design-rows.ts';
import { normalQuantile } from '../stats/distributions.ts';
import type { Scale } from '../study/study.ts';
import { type ColumnWriter, rowsWith } from './auxiliary.ts';
import type { Chosen } from './chosen.ts';

/** Powers of the response tried at once, as response columns of one factor. */
const POWERS = 21;
/** Powers tried inside each bracket of a later pass. */
const INNER = 6;
/** The first are tried from −WIDEST to WIDEST, later ones where the profile has not come down. */
const WIDEST = 2;
/** n m² up to which a pass is quick. */
const WORK = 3e8;
const MOST_PASSES = 5;
/** The interval's ends and the best power are settled to this. */
const SETTLED = 1e-9;

/** The profile of the likelihood over λ, by where it is highest and where it has come down by half a χ² quantile. */
export interface BoxCoxProfile {
  readonly lambda: number;
  readonly lower: number;
  readonly upper: number;
  /** λ of the declared scale. */
  readonly current: number;
  /** Whether the best power or an end of the interval lies beyond those tried. */
  readonly atEdge: boolean;
}

/**
 * ln L(λ) = −n/2 ln RSS(λ) + constant, with RSS of the scaled powers (y^λ − 1)/(λ ẏ^{λ − 1}), ẏ the geometric mean, on
 * the chosen model's columns (Box & Cox 1964). All powers of one pass are response columns of one factor; passes go on
 * where the profile is highest and where it crosses. A sentence where it cannot be had.
 */
export function boxCoxProfile(chosen: Chosen): BoxCoxProfile | string {
  const { fit, columns, sample, study } = chosen;
  const y = numbersOf(sample, fit.candidate.response.variable);
  const n = y.length;
  if (y.some((value) => !(value > 0)))
    return 'The response is not positive in every row, so powers of it cannot be compared.';
  if (!fit.candidate.intercept)
    return 'Without an intercept the powers of the response depend on its unit, so they cannot be compared.';
  if (n * (fit.columns.length + POWERS) ** 2 > WORK)
    return `Powers of the response are not compared in ${n} rows: it would take many passes over them.`;
  const logs = y.map(Math.log);
  const centre = logs.reduce((sum, log) => sum + log / n, 0);
  for (let i = 0; i < n; i++) logs[i]! -= centre;
  const reach = logs.reduce((most, log) => Math.max(most, Math.abs(log)), 0);
  if (!(reach > 1e-6))
    return 'The response hardly varies beside its size, so its powers cannot be told apart.';
  const base = designRows(
    fit.columns.map((column) => columns[column]!),
    sample,
    [],
    study.weights,
  );
  // Powers of a response that spans many magnitudes must not overflow in their squares.
  const widest = Math.min(WIDEST, 300 / reach);
  const profile = (powers: readonly number[]) => profileAt(fit, base, logs, powers);
  const drop = normalQuantile(0.5 + study.inference.confidence / 2) ** 2 / 2;
  return search(profile, widest, drop, lambdaOf(fit.candidate.response.scale));
}

interface Point {
  readonly lambda: number;
  readonly height: number;
}

/** ln L less a constant at each power, from one factor. */
function profileAt(fit: Fit, base: DesignRows, logs: Float64Array, powers: readonly number[]): Point[] {
  const writers = powers.map((lambda): ColumnWriter => {
    return (from, to, out, at) => {
      for (let i = from; i < to; i++) {
        const root = base.rootWeights === null ? 1 : base.rootWeights[i]!;
        // y/ẏ to the power, less 1, over λ: the scaled power but for the factor ẏ, which moves no maximum.
        const value = lambda === 0 ? logs[i]! : Math.expm1(lambda * logs[i]!) / lambda;
        out[at + i - from] = root * value;
      }
    };
  });
  const { triangle } = factorRows(rowsWith(base, [], writers));
  // The columns are the model's own, none of them dependent: what a power leaves stands below them in its column.
  const p = fit.columns.length;
  return powers.map((lambda, k) => ({
    lambda,
    height: -fit.rowCount * Math.log(columnNorm(triangle, p + k, p, p + k + 1)),
  }));
}

/** A grid, then finer ones about the best power and about each crossing, as many powers in each pass. */
function search(
  profile: (powers: readonly number[]) => Point[],
  widest: number,
  drop: number,
  current: number,
): BoxCoxProfile | string {
  let points = profile(spaced(-widest, widest, POWERS));
  if (points.some((point) => !Number.isFinite(point.height)))
    return 'Some power of the response is fitted exactly, so powers cannot be compared.';
  let found = read(points, drop);
  for (let pass = 1; pass < MOST_PASSES; pass++) {
    const targets = [found.lambda, found.lower, found.upper].flatMap(({ from, to }) =>
      to - from > SETTLED ? spaced(from, to, INNER + 2).slice(1, -1) : [],
    );
    if (targets.length === 0) break;
    points.push(...profile(targets));
    points.sort((a, b) => a.lambda - b.lambda);
    // Brackets may overlap, and a power tried twice tells nothing of the slope.
    points = points.filter((point, k) => k === 0 || point.lambda - points[k - 1]!.lambda > SETTLED);
    found = read(points, drop);
  }
  return {
    lambda: found.lambda.at,
    lower: found.lower.at,
    upper: found.upper.at,
    current,
    atEdge: found.atEdge,
  };
}

interface Bracket {
  readonly from: number;
  readonly to: number;
  /** Interpolated. */
  readonly at: number;
}

function read(points: readonly Point[], drop: number) {
  let best = 0;
  points.forEach((point, k) => {
    if (point.height > points[best]!.height) best = k;
  });
  const last = points.length - 1;
  const peak = peakAbout(points, best);
  const target = peak.height - drop;
  let left = best;
  while (left > 0 && points[left]!.height >= target) left--;
  let right = best;
  while (right < last && points[right]!.height >= target) right++;
  const low = points[left]!.height < target ? crossing(points, left, left + 1, target) : edge(points[0]!);
  const high =
    points[right]!.height < target ? crossing(points, right - 1, right, target) : edge(points[last]!);
  return {
    lambda: peak.bracket,
    lower: low,
    upper: high,
    atEdge: best === 0 || best === last || low.from === low.to || high.from === high.to,
  };
}

/** The top of the parabola through the best point and its neighbours. */
function peakAbout(points: readonly Point[], best: number): { bracket: Bracket; height: number } {
  const here = points[best]!;
  const before = points[best - 1];
  const after = points[best + 1];
  if (before === undefined || after === undefined) return { bracket: edge(here), height: here.height };
  const a = before.lambda - here.lambda;
  const b = after.lambda - here.lambda;
  const f = (before.height - here.height) / a;
  const g = (after.height - here.height) / b;
  const curvature = (g - f) / (b - a);
  const slope = f - curvature * a;
  // Where rounding has flattened the top there is nothing more to find.
  const flat =
    here.height - Math.min(before.height, after.height) <= 1e-10 * Math.max(1, Math.abs(here.height));
  const shift = curvature < 0 ? Math.min(b, Math.max(a, -slope / (2 * curvature))) : 0;
  const at = here.lambda + shift;
  const height = Math.max(here.height, here.height + slope * shift + curvature * shift * shift);
  if (flat) return { bracket: { from: at, to: at, at }, height };
  return { bracket: { from: before.lambda, to: after.lambda, at }, height };
}

function crossing(points: readonly Point[], left: number, right: number, target: number): Bracket {
  const a = points[left]!;
  const b = points[right]!;
  const share = (target - a.height) / (b.height - a.height);
  return { from: a.lambda, to: b.lambda, at: a.lambda + share * (b.lambda - a.lambda) };
}

function edge(point: Point): Bracket {
  return { from: point.lambda, to: point.lambda, at: point.lambda };
}

function spaced(from: number, to: number, count: number): number[] {
  return Array.from({ length: count }, (_, k) => from + ((to - from) * k) / (count - 1));
}

function lambdaOf(scale: Scale): number {
  switch (scale.kind) {
    case 'natural':
      return 1;
    case 'log':
      return 0;
    case 'sqrt':
      return 0.5;
    case 'reciprocal':
      return -1;
    case 'box_cox':
      return scale.lambda;
  }
}

import { factorRows } from '../engine/factor.ts';
import type { Fit } from '../engine/fit.ts';
import { columnNorm } from '../engine/kernel.ts';
import { type DesignRows, designRows, numbersOf } from '../model/design-rows.ts';
import { wholeNumber } from '../numerals.ts';
import { normalQuantile } from '../stats/distributions.ts';
import type { Scale } from '../study/study.ts';
import { type ColumnWriter, rowsWith } from './auxiliary.ts';
import type { Chosen } from './chosen.ts';

/** Powers of the response tried at once, as response columns of one factor. */
const POWERS = 21;
/** They are tried from −WIDEST to WIDEST. */
const WIDEST = 2;
/** Then three about where each figure is expected, this far apart: parabolas through them settle it to 1e-8 or so. */
const FINER = [0.03, 5e-4];
/** n m² up to which a pass is quick. */
const WORK = 3e8;

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
    return `Powers of the response are not compared in ${wholeNumber(n)} rows: it would take many passes over them.`;
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

/** A grid, then finer points about the best power and about each crossing. */
function search(
  profile: (powers: readonly number[]) => Point[],
  widest: number,
  drop: number,
  current: number,
): BoxCoxProfile | string {
  let points = profile(spaced(-widest, widest, POWERS));
  if (points.some((point) => !Number.isFinite(point.height)))
    return 'Some power of the response is fitted exactly, so powers cannot be compared.';
  for (const step of FINER) {
    const { lambda, lower, upper } = read(points, drop);
    const wanted = [lambda, lower, upper].flatMap((at) =>
      Math.abs(at) < widest ? [at - step, at, at + step] : [],
    );
    points = [...points, ...profile(wanted)].sort((a, b) => a.lambda - b.lambda);
    // A power tried twice tells nothing of the slope.
    points = points.filter((point, k) => k === 0 || point.lambda - points[k - 1]!.lambda > step * 1e-3);
  }
  return { ...read(points, drop), current };
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
  const low = points[left]!.height < target;
  const high = points[right]!.height < target;
  return {
    lambda: peak.lambda,
    lower: low ? crossing(points, left, left + 1, target) : points[0]!.lambda,
    upper: high ? crossing(points, right, right - 1, target) : points[last]!.lambda,
    atEdge: best === 0 || best === last || !low || !high,
  };
}

/** The top of the parabola through the best point and its neighbours. */
function peakAbout(points: readonly Point[], best: number): Point {
  const here = points[best]!;
  const before = points[best - 1];
  const after = points[best + 1];
  if (before === undefined || after === undefined) return here;
  const { slope, curvature } = parabola(here, before, after);
  if (!(curvature < 0)) return here;
  const shift = Math.min(
    after.lambda - here.lambda,
    Math.max(before.lambda - here.lambda, -slope / (2 * curvature)),
  );
  return { lambda: here.lambda + shift, height: here.height + slope * shift + curvature * shift * shift };
}

/** Where the parabola through two points on either side of the target, and their nearest neighbour, meets it. */
function crossing(points: readonly Point[], outer: number, inner: number, target: number): number {
  const a = points[outer]!;
  const b = points[inner]!;
  const width = b.lambda - a.lambda;
  const straight = ((target - a.height) / (b.height - a.height)) * width;
  const near = [Math.min(outer, inner) - 1, Math.max(outer, inner) + 1]
    .flatMap((k) => points[k] ?? [])
    .sort((c, d) => Math.abs(c.lambda - a.lambda) - Math.abs(d.lambda - a.lambda))[0];
  if (near === undefined) return a.lambda + straight;
  const { slope, curvature } = parabola(a, b, near);
  // Newton steps from the straight line's answer; the parabola is nearly straight between the two.
  let shift = straight;
  for (let k = 0; k < 20; k++) {
    shift -=
      (a.height - target + slope * shift + curvature * shift * shift) / (slope + 2 * curvature * shift);
  }
  const inside = shift / width;
  return a.lambda + (inside >= 0 && inside <= 1 ? shift : straight);
}

/** height ≈ origin's + slope · shift + curvature · shift², through three points. */
function parabola(origin: Point, one: Point, other: Point): { slope: number; curvature: number } {
  const a = one.lambda - origin.lambda;
  const b = other.lambda - origin.lambda;
  const f = (one.height - origin.height) / a;
  const g = (other.height - origin.height) / b;
  const curvature = (g - f) / (b - a);
  return { slope: f - curvature * a, curvature };
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

import { type Covariance, errorOf } from '../../engine/covariance.ts';
import { presentLevels } from '../../model/build-design.ts';
import type { ModelTerm, Piece } from '../../model/design.ts';
import { fromScale, isDecreasing } from '../../model/response-scale.ts';
import { tTwoSided, tTwoSidedQuantile } from '../../stats/distributions.ts';
import { studentisedRange } from '../../stats/studentised-range.ts';
import type { Scale } from '../../study/study.ts';
import type { Chosen } from '../chosen.ts';
import { type Effect, effects } from '../effects/settings.ts';
import { holm } from './holm.ts';
import { productMeans } from './product-means.ts';

/** What the model expects at each level of a category, and how levels differ pair by pair. On the fitted scale. */
export interface LevelMeans {
  readonly variable: string;
  /** Where everything else is held, as a sentence. */
  readonly held: string;
  readonly means: LevelMean[];
  /** Null where levels are not to be compared, or nothing can be tested. */
  readonly comparisons: LevelComparisons | null;
}

export interface LevelMean extends Effect {
  readonly level: string;
  /** Rows used that have it. */
  readonly rows: number;
  /** The same on the response's own scale, by its ends; null on the natural scale. */
  readonly own: OwnScale | null;
}

export interface OwnScale {
  readonly estimate: number | null;
  readonly lower: number | null;
  readonly upper: number | null;
}

export interface LevelComparisons {
  readonly method: 'holm' | 'tukey_kramer';
  /** How the p-values are adjusted and what the intervals hold for, as a sentence. */
  readonly sentence: string;
  readonly pairs: LevelPair[];
  /** Why pairs are not listed, as a sentence; null where all are. */
  readonly omitted: string | null;
}

/** The level less the other one. */
export interface LevelPair {
  readonly level: string;
  readonly other: string;
  readonly estimate: number;
  readonly standard_error: number;
  readonly lower: number;
  readonly upper: number;
  readonly p_value: number;
  readonly adjusted_p_value: number;
}

/** Levels up to which pairs are listed: 105 of them. */
export const MOST_COMPARED = 15;

/** For every term that is a category by itself, by name of term. One pass over the rows for all of them. */
export function levelMeans(chosen: Chosen): Map<string, LevelMeans> {
  const { fit, columns, sample } = chosen;
  const categories = fit.candidate.terms.flatMap((term) => {
    const variable = categoryOf(chosen, term);
    // Where a level's column had to be left out, its mean cannot be told from what it depends on.
    const whole = !fit.dropped.some(({ column }) =>
      columns[column]!.pieces.some((piece) => piece.variable === variable),
    );
    return variable === null || !whole ? [] : [{ term, variable }];
  });
  if (categories.length === 0) return new Map();
  const rest = categories.flatMap(({ variable }) =>
    fit.columns.map((column) => columns[column]!.pieces.filter((piece) => !isLevelOf(piece, variable))),
  );
  const means = productMeans(rest, sample);
  const p = fit.columns.length;
  return new Map(
    categories.map(({ term, variable }, k) => [
      term.name,
      meansOf(chosen, variable, means.slice(k * p, (k + 1) * p)),
    ]),
  );
}

function categoryOf({ sample }: Chosen, { plan }: ModelTerm): string | null {
  if (plan.kind !== 'variable') return null;
  return sample.columns.get(plan.variable)?.kind === 'category' ? plan.variable : null;
}

function isLevelOf(piece: Piece, variable: string): piece is Extract<Piece, { kind: 'level' }> {
  return piece.kind === 'level' && piece.variable === variable;
}

/** @param restMeans mean of each column without the category's own pieces */
function meansOf(chosen: Chosen, variable: string, restMeans: readonly number[]): LevelMeans {
  const { fit, columns, sample } = chosen;
  const column = sample.columns.get(variable);
  if (column?.kind !== 'category') throw new TypeError(`${variable} is not a category`);
  const levels = presentLevels(column);
  const rows = new Int32Array(column.levels.length);
  for (const code of column.codes) if (code >= 0) rows[code]!++;
  const settings = levels.map((level) =>
    Float64Array.from(fit.columns, (one, j) =>
      columns[one]!.pieces.every((piece) => !isLevelOf(piece, variable) || piece.level === level)
        ? restMeans[j]!
        : 0,
    ),
  );
  const effectOf = effects(chosen);
  const { scale } = fit.candidate.response;
  const crossed = fit.columns.some(
    (one) =>
      columns[one]!.pieces.length > 1 && columns[one]!.pieces.some((piece) => piece.variable === variable),
  );
  return {
    variable,
    held: `At the mean of every other column over the rows used${
      crossed
        ? `; ${variable} also acts together with other variables, so that levels differ otherwise elsewhere`
        : ''
    }.`,
    means: levels.map((level, k) => {
      const effect = effectOf(settings[k]!);
      return {
        level,
        rows: rows[column.levels.indexOf(level)]!,
        ...effect,
        own: scale.kind === 'natural' ? null : onOwnScale(effect, scale),
      };
    }),
    comparisons: compare(chosen, levels, settings),
  };
}

function compare(
  { study, covariance, fit }: Chosen,
  levels: readonly string[],
  settings: readonly Float64Array[],
): LevelComparisons | null {
  const { levelComparisons: method, confidence } = study.inference;
  if (method === 'none' || covariance === null || levels.length < 2) return null;
  const percent = `${Number((confidence * 100).toPrecision(6))} %`;
  const sentence =
    method === 'holm'
      ? `p-values are adjusted for the number of pairs by Holm’s steps (1979); each ${percent} interval is for its own pair alone.`
      : `p-values and ${percent} intervals hold for all pairs of levels together, by the studentised range (Tukey–Kramer).`;
  if (levels.length > MOST_COMPARED) {
    const pairs = (levels.length * (levels.length - 1)) / 2;
    const omitted = `The ${levels.length} levels make ${pairs} pairs; they are listed for up to ${MOST_COMPARED} levels.`;
    return { method, sentence, pairs: [], omitted };
  }
  const range = method === 'tukey_kramer' ? studentisedRange(levels.length, covariance.df) : null;
  const pairs = pairsOf(levels, settings, fit.estimates, covariance);
  const raw = pairs.map(({ t }) => tTwoSided(t, covariance.df));
  const adjusted = range === null ? holm(raw) : pairs.map(({ t }) => range.upper(Math.abs(t) * Math.SQRT2));
  const reach =
    range === null
      ? tTwoSidedQuantile(1 - confidence, covariance.df)
      : range.quantile(1 - confidence) / Math.SQRT2;
  return {
    method,
    sentence,
    pairs: pairs.map(({ level, other, estimate, error }, k) => ({
      level,
      other,
      estimate,
      standard_error: error,
      lower: estimate - reach * error,
      upper: estimate + reach * error,
      p_value: raw[k]!,
      adjusted_p_value: adjusted[k]!,
    })),
    omitted: null,
  };
}

interface Pair {
  readonly level: string;
  readonly other: string;
  readonly estimate: number;
  readonly error: number;
  readonly t: number;
}

/** Every pair, the later level less the earlier one; a pair without an error of its own is left out. */
function pairsOf(
  levels: readonly string[],
  settings: readonly Float64Array[],
  estimates: Float64Array,
  covariance: Covariance,
): Pair[] {
  return levels.flatMap((level, i) =>
    levels.slice(0, i).flatMap((other, j) => {
      const contrast = settings[i]!.map((value, k) => value - settings[j]![k]!);
      const estimate = contrast.reduce((sum, value, k) => sum + value * estimates[k]!, 0);
      const error = errorOf(covariance, contrast);
      return error > 0 ? [{ level, other, estimate, error, t: estimate / error }] : [];
    }),
  );
}

/** A place on the fitted scale with its interval, on the response's own; null where an end lies beyond the scale. */
export function onOwnScale({ estimate, lower, upper }: Effect, scale: Scale): OwnScale {
  const back = (z: number | null) => {
    const y = z === null ? Number.NaN : fromScale(z, scale);
    return Number.isFinite(y) ? y : null;
  };
  const [a, b] = [back(lower), back(upper)];
  return { estimate: back(estimate), lower: isDecreasing(scale) ? b : a, upper: isDecreasing(scale) ? a : b };
}

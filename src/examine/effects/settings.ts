import type { CategoryColumn, Column } from '../../data/table.ts';
import { type Covariance, errorOf } from '../../engine/covariance.ts';
import { baselineOf, presentLevels } from '../../model/build-design.ts';
import { designRows } from '../../model/design-rows.ts';
import type { Spread } from '../../prepare/spread.ts';
import { tTwoSidedQuantile } from '../../stats/distributions.ts';
import type { Chosen } from '../chosen.ts';

/** A value of every variable of the chosen model: a number, or a level of a category. */
export type Setting = ReadonlyMap<string, number | string>;

/** A difference between two settings as the model sees it, on the fitted scale. */
export interface Effect {
  readonly estimate: number;
  /** Null where the model has no standard error. */
  readonly lower: number | null;
  readonly upper: number | null;
}

/** Where the other variables are held while one moves. */
export interface Reference {
  readonly setting: Setting;
  readonly variables: ReadonlyMap<string, ReferenceVariable>;
}

export type ReferenceVariable =
  | (Spread & { readonly kind: 'number' | 'flag'; readonly texts: readonly [string, string] | null })
  | { readonly kind: 'category'; readonly levels: readonly string[]; readonly baseline: string };

/** Numbers at their mean, flags at 0, categories at their baseline. */
export function referenceOf(chosen: Chosen): Reference {
  const names = new Set(
    chosen.fit.candidate.columns.flatMap((column) =>
      chosen.columns[column]!.pieces.map((piece) => piece.variable),
    ),
  );
  const setting = new Map<string, number | string>();
  const variables = new Map<string, ReferenceVariable>();
  for (const name of names) {
    const described = describe(chosen.sample.columns.get(name)!, chosen.spreads.get(name));
    variables.set(name, described);
    setting.set(
      name,
      described.kind === 'category' ? described.baseline : described.kind === 'flag' ? 0 : described.mean,
    );
  }
  return { setting, variables };
}

function describe(column: Column, spread: Spread | undefined): ReferenceVariable {
  if (column.kind === 'category') {
    const levels = presentLevels(column);
    return { kind: 'category', levels, baseline: baselineOf(column, levels)! };
  }
  if (column.kind === 'text' || spread === undefined) {
    throw new TypeError(`${column.name} cannot be in a model`);
  }
  const kind = column.kind === 'flag' ? 'flag' : 'number';
  return { kind, ...spread, texts: column.flagTexts ?? null };
}

/** The setting with some variables moved. */
export function moved(setting: Setting, changes: Readonly<Record<string, number | string>>): Setting {
  return new Map([...setting, ...Object.entries(changes)]);
}

/**
 * The effect of moving from one setting to another, for each pair: c′b with c the difference of the two rows
 * of the design, and its confidence interval.
 */
export function effectsBetween(chosen: Chosen, pairs: readonly (readonly [Setting, Setting])[]): Effect[] {
  // A category may have one level only in the rows that a split leaves for estimating.
  if (pairs.length === 0) return [];
  const p = chosen.fit.columns.length;
  const at = designAt(chosen, pairs.flat());
  const effectOf = effects(chosen);
  const contrast = new Float64Array(p);
  return pairs.map((_, k) => {
    for (let j = 0; j < p; j++)
      contrast[j] = at[j * pairs.length * 2 + 2 * k + 1]! - at[j * pairs.length * 2 + 2 * k]!;
    return effectOf(contrast);
  });
}

/** The effect c′b of a contrast c with its confidence interval c′b ± t √(c′Vc), V the declared covariance. */
export function effects(chosen: Chosen): (contrast: Float64Array) => Effect {
  const { fit, covariance } = chosen;
  const t = reachOf(chosen, covariance);
  return (contrast) => {
    let estimate = 0;
    for (let j = 0; j < contrast.length; j++) estimate += contrast[j]! * fit.estimates[j]!;
    if (covariance === null) return { estimate, lower: null, upper: null };
    const half = t * errorOf(covariance, contrast);
    return { estimate, lower: estimate - half, upper: estimate + half };
  };
}

function reachOf(chosen: Chosen, covariance: Covariance | null): number {
  return covariance === null ? 0 : tTwoSidedQuantile(1 - chosen.study.inference.confidence, covariance.df);
}

/** √(c′(X′WX)⁻¹c) = ‖c′R⁻¹‖. */
export function rootForm(rootInverse: Float64Array, p: number, c: Float64Array): number {
  let sum = 0;
  for (let j = 0; j < p; j++) {
    let projected = 0;
    for (let k = 0; k <= j; k++) projected += rootInverse[j * p + k]! * c[k]!;
    sum += projected * projected;
  }
  return Math.sqrt(sum);
}

/** The chosen model's design columns at the settings: settings × p, column-major. */
export function designAt(chosen: Chosen, settings: readonly Setting[]): Float64Array {
  const { fit, columns, sample } = chosen;
  const source = new Map<string, Column>();
  for (const name of settings[0]?.keys() ?? []) {
    const like = sample.columns.get(name)!;
    source.set(
      name,
      like.kind === 'category' ? codesLike(like, settings, name) : numbersLike(settings, name),
    );
  }
  const rows = designRows(
    fit.columns.map((column) => columns[column]!),
    { rowCount: settings.length, columns: source },
    [],
    null,
  );
  const values = new Float64Array(settings.length * fit.columns.length);
  rows.fill(
    fit.columns.map((_, j) => j),
    0,
    settings.length,
    settings.length,
    values,
    null,
  );
  return values.map((value, k) => value / rows.scales[Math.floor(k / settings.length)]!);
}

function codesLike(like: CategoryColumn, settings: readonly Setting[], name: string): CategoryColumn {
  return {
    ...like,
    codes: Int32Array.from(settings, (setting) => like.levels.indexOf(String(setting.get(name)))),
  };
}

function numbersLike(settings: readonly Setting[], name: string): Column {
  return {
    kind: 'number',
    name,
    values: Float64Array.from(settings, (setting) => Number(setting.get(name))),
  };
}

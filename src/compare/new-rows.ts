import type { Column } from '../data/table.ts';
import { errorOf } from '../engine/covariance.ts';
import { presentLevels } from '../model/build-design.ts';
import { designRows } from '../model/design-rows.ts';
import { fromScale, toScale } from '../model/response-scale.ts';
import { isMissing } from '../prepare/is-missing.ts';
import type { RecordModel } from '../record/record.ts';
import { binomialInterval } from '../stats/binomial-interval.ts';
import { fUpper, tTwoSidedQuantile } from '../stats/distributions.ts';
import type { Side } from './attribute.ts';
import type { ComparisonTest, NewRows } from './comparison.ts';
import { categoriesOf, variablesOf } from './declaration.ts';
import { covarianceOf, evaluated, namesToPick, pickRows, type Refit, type Rows, refit } from './refit.ts';

/**
 * The rows added, held against the earlier model as it was: errors and the share inside its prediction intervals on the
 * response's own scale, and whether one set of coefficients holds for earlier and new rows (Chow 1960). Rows that it
 * cannot predict are counted by their reason.
 */
export function scoreNewRows(
  model: Refit,
  record: RecordModel,
  earlier: Side,
  later: Side,
  added: Int32Array,
): NewRows {
  const { declaration } = earlier;
  const all = evaluated(later.base, declaration);
  const names = namesToPick(model.definition, declaration);
  const { fit, notScored } = sorted(model, variablesOf(model.definition, declaration), all, added);
  const rows = pickRows(all, fit, names);
  const level = earlier.record.study.prediction_interval;
  const confidence = later.record.study.confidence;
  const scores = rows.rowCount === 0 ? null : score(model, record, earlier, rows, level);
  const share =
    scores === null || scores.inside === null
      ? null
      : binomialInterval(scores.inside, rows.rowCount, confidence);
  return {
    candidate: model.definition.name,
    rows: added.length,
    scored: rows.rowCount,
    not_scored: notScored,
    unit: record.response.unit,
    bias: scores?.bias ?? null,
    root_mean_squared_error: scores?.rmse ?? null,
    interval: level,
    inside: scores?.inside ?? null,
    share_inside: scores === null || scores.inside === null ? null : scores.inside / rows.rowCount,
    share_confidence: confidence,
    share_lower: share?.[0] ?? null,
    share_upper: share?.[1] ?? null,
    ...chowTests(model, earlier, rows),
  };
}

/** The added rows that the model can predict, and how many it cannot for each reason. */
function sorted(
  model: Refit,
  variables: readonly string[],
  all: Rows,
  added: Int32Array,
): { readonly fit: Int32Array; readonly notScored: NewRows['not_scored'] } {
  const absent = variables.filter((name) => !all.columns.has(name));
  if (absent.length > 0) {
    const because = `${absent.join(', ')} ${absent.length === 1 ? 'is' : 'are'} not among what was kept`;
    return { fit: new Int32Array(0), notScored: [{ because, rows: added.length }] };
  }
  const known = new Map(
    categoriesOf(model.definition.columns).flatMap((name) => {
      const column = model.rows.columns.get(name);
      return column?.kind === 'category' ? [[name, new Set(presentLevels(column))] as const] : [];
    }),
  );
  const counts = new Map<string, number>();
  const fit: number[] = [];
  for (const row of added) {
    const because = whyNot(row);
    if (because === null) fit.push(row);
    else counts.set(because, (counts.get(because) ?? 0) + 1);
  }
  return {
    fit: Int32Array.from(fit),
    notScored: [...counts].map(([because, rows]) => ({ because, rows })),
  };

  function whyNot(row: number): string | null {
    for (const name of variables) {
      const column = all.columns.get(name)!;
      if (isMissing(column, row)) return `${name} is missing or undefined`;
      const level = column.kind === 'category' ? column.levels[column.codes[row]!]! : null;
      if (level !== null && known.get(name)?.has(level) === false)
        return `no earlier row has ${name} "${level}"`;
    }
    const { variable, scale } = model.definition.response;
    const response = numberAt(all.columns.get(variable)!, row);
    return scale.kind !== 'natural' && !Number.isFinite(toScale(response, scale))
      ? `${variable} is not defined on the ${scale.kind} scale`
      : null;
  }
}

function numberAt(column: Column, row: number): number {
  return column.kind === 'category' || column.kind === 'text' ? Number.NaN : column.values[row]!;
}

interface Scores {
  /** Null where a prediction or its mean leaves the scale. */
  readonly bias: number | null;
  readonly rmse: number | null;
  readonly inside: number | null;
}

/** Rows read at once. */
const BLOCK = 1024;

function score(model: Refit, record: RecordModel, side: Side, rows: Rows, level: number): Scores {
  const { fit, s } = model;
  const { variable, scale } = model.definition.response;
  const p = fit.columns.length;
  const design = designRows(
    fit.columns.map((column) => model.columns[column]!),
    rows,
    [],
    null,
  );
  const wanted = fit.columns.map((_, j) => j);
  const covariance = covarianceOf(model, side.declaration);
  const t = covariance === null ? Number.NaN : tTwoSidedQuantile(1 - level, covariance.df);
  const response = rows.columns.get(variable)!;
  const weights = side.declaration.weights === null ? null : rows.columns.get(side.declaration.weights)!;
  const smearing = record.smearing;
  const block = new Float64Array(BLOCK * p);
  const x = new Float64Array(p);
  let errors = 0;
  let squares = 0;
  let inside = 0;
  for (let from = 0; from < rows.rowCount; from += BLOCK) {
    const count = Math.min(BLOCK, rows.rowCount - from);
    design.fill(wanted, from, from + count, BLOCK, block, null);
    for (let i = 0; i < count; i++) {
      let centre = 0;
      for (let j = 0; j < p; j++) {
        x[j] = block[j * BLOCK + i]! / design.scales[j]!;
        centre += x[j]! * fit.estimates[j]!;
      }
      const observed = numberAt(response, from + i);
      const expected = smearing === null ? fromScale(centre, scale) : meanOf(centre, smearing, scale);
      const error = observed - expected;
      errors += error;
      squares += error * error;
      if (s === null || covariance === null) continue;
      const weight = weights === null ? 1 : numberAt(weights, from + i);
      // The scales are monotone, so that the response lies inside on its own scale where it does on the fitted one.
      const reach = t * Math.sqrt((s * s) / weight + errorOf(covariance, x) ** 2);
      if (Math.abs(toScale(observed, scale) - centre) <= reach) inside++;
    }
  }
  return {
    bias: finite(errors / rows.rowCount),
    rmse: finite(Math.sqrt(squares / rows.rowCount)),
    inside: s === null || covariance === null ? null : inside,
  };
}

function finite(x: number): number | null {
  return Number.isFinite(x) ? x : null;
}

/** Duan's smearing (1983): the mean of g⁻¹(x′b + e) over the residuals of the record. */
function meanOf(
  centre: number,
  residuals: readonly number[],
  scale: Parameters<typeof fromScale>[1],
): number {
  let sum = 0;
  for (const e of residuals) sum += fromScale(centre + e, scale);
  return sum / residuals.length;
}

/**
 * Chow's tests (1960), with ranks in place of p so that new rows without some of the levels count rightly:
 * ((RSS − RSS₁ − RSS₂)/(r₁ + r₂ − r))/((RSS₁ + RSS₂)/(n₁ + n₂ − r₁ − r₂)), and without a fit of the new rows
 * ((RSS − RSS₁)/(n₂ + r₁ − r))/(RSS₁/(n₁ − r₁)).
 */
function chowTests(model: Refit, side: Side, rows: Rows): Pick<NewRows, 'same_surface' | 'predictive'> {
  const none = { same_surface: null, predictive: null };
  const n2 = rows.rowCount;
  if (n2 === 0 || model.fit.exact) return none;
  const pooled = refit(model.definition, side.declaration, joined(model.rows, rows));
  if (typeof pooled === 'string') return none;
  const alone = fitAlone(model, side, rows);
  const rss = pooled.fit.residualSumOfSquares;
  const rss1 = model.fit.residualSumOfSquares;
  const rank = pooled.fit.columns.length;
  const rank1 = model.fit.columns.length;
  const n1 = model.fit.rowCount;
  const predictive = fTest(rss - rss1, n2 + rank1 - rank, rss1, n1 - rank1);
  if (alone === null || n2 <= alone.rank) return { same_surface: null, predictive };
  const apart = rss1 + alone.rss;
  return {
    same_surface: fTest(rss - apart, rank1 + alone.rank - rank, apart, n1 + n2 - rank1 - alone.rank),
    predictive,
  };
}

function fTest(extra: number, df1: number, rest: number, df2: number): ComparisonTest | null {
  if (df1 < 1 || df2 < 1 || !(rest > 0)) return null;
  const statistic = Math.max(0, extra) / df1 / (rest / df2);
  return { statistic, df1, df2, p_value: fUpper(statistic, df1, df2) };
}

function fitAlone(
  model: Refit,
  side: Side,
  rows: Rows,
): { readonly rss: number; readonly rank: number } | null {
  const alone = refit(model.definition, side.declaration, rows, 'span');
  return typeof alone === 'string'
    ? null
    : { rss: alone.fit.residualSumOfSquares, rank: alone.fit.columns.length };
}

/** Two sets of rows one after the other, by the columns that both have. */
function joined(a: Rows, b: Rows): Rows {
  const columns = new Map<string, Column>();
  for (const [name, x] of a.columns) {
    const y = b.columns.get(name);
    if (y !== undefined) columns.set(name, join(x, y));
  }
  return { rowCount: a.rowCount + b.rowCount, columns };
}

function join(x: Column, y: Column): Column {
  if (x.kind === 'category' && y.kind === 'category') {
    const levels = [...new Set([...x.levels, ...y.levels])];
    const codes = new Int32Array(x.codes.length + y.codes.length);
    codes.set(x.codes);
    y.codes.forEach((code, row) => {
      codes[x.codes.length + row] = code < 0 ? -1 : levels.indexOf(y.levels[code]!);
    });
    return { ...x, levels, codes };
  }
  if (x.kind === 'text' && y.kind === 'text') return { ...x, values: [...x.values, ...y.values] };
  if (x.kind === 'category' || y.kind === 'category' || x.kind === 'text' || y.kind === 'text') return x;
  const values = new Float64Array(x.values.length + y.values.length);
  values.set(x.values);
  values.set(y.values, x.values.length);
  return { ...x, values };
}

import type { ColumnSeen } from './describe-column.ts';

/** A column that may explain the response, under the name that it has in the draft. */
export interface Predictor {
  readonly name: string;
  readonly seen: ColumnSeen;
}

export interface Proposed {
  readonly name: string;
  readonly terms: readonly string[];
}

export interface Proposal {
  readonly candidates: readonly Proposed[];
  /** Rows with a value for everything that a candidate uses. */
  readonly rows: number;
}

/** A column with more missing than this share would cost every candidate too many rows. */
const MOST_MISSING = 0.2;
/** Common practice, no single source: ten to twenty rows for each coefficient. */
const ROWS_PER_COEFFICIENT = 10;
const FEW = 3;
const MOST_TERMS = 15;
const MOST_LEVELS = 12;

/**
 * Candidates to begin with, none with fewer than ten rows for each coefficient: the few numbers that go with the
 * response most, all numbers, and numbers with categories. Where they would be fewer than two, the mean alone as well.
 */
export function proposeCandidates(response: Float64Array, predictors: readonly Predictor[]): Proposal {
  const usable = stillVarying(
    response,
    predictors.filter(
      ({ seen }) =>
        seen.missing <= MOST_MISSING * response.length &&
        (seen.type !== 'category' || seen.levels.length <= MOST_LEVELS),
    ),
  );
  const rows = completeRows(response, usable);
  let left = Math.floor(rows.length / ROWS_PER_COEFFICIENT) - 1;
  const take = (from: readonly Predictor[], most: number): Predictor[] => {
    const taken: Predictor[] = [];
    for (const predictor of from) {
      const width = predictor.seen.type === 'category' ? predictor.seen.levels.length - 1 : 1;
      if (taken.length >= most || width > left) continue;
      left -= width;
      taken.push(predictor);
    }
    return taken;
  };
  const strength = new Map(
    usable.map((one) => [one, Math.abs(correlation(one.seen.values, response, rows))]),
  );
  const numeric = usable
    .filter(({ seen }) => seen.type === 'number' || seen.type === 'integer')
    .sort((a, b) => strength.get(b)! - strength.get(a)!);
  const few = take(numeric, Math.min(FEW, Math.ceil(left / 2)));
  const all = [...few, ...take(numeric.slice(few.length), MOST_TERMS - few.length)];
  const others = take(
    usable.filter(({ seen }) => seen.type === 'category' || seen.type === 'flag'),
    MOST_TERMS,
  );
  const sets: [string, Predictor[]][] = [
    ['A few numbers', few],
    ['All numbers', all],
    ['Numbers and categories', [...all, ...others]],
  ];
  const candidates: Proposed[] = [];
  for (const [name, set] of sets) {
    const terms = set.map((one) => one.name);
    const isNew = candidates.every((candidate) => candidate.terms.join('\n') !== terms.join('\n'));
    if (terms.length > 0 && isNew) candidates.push({ name, terms });
  }
  if (candidates.length < 2) candidates.unshift({ name: 'The mean alone', terms: [] });
  return { candidates, rows: rows.length };
}

/** The predictors that have more than one value in the rows that all of them leave. */
function stillVarying(response: Float64Array, predictors: readonly Predictor[]): readonly Predictor[] {
  const rows = completeRows(response, predictors);
  const varying = predictors.filter(({ seen: { values, levels, type } }) => {
    const found = new Set(rows.map((row) => values[row]!));
    // A level without a row would be a column of zeroes; the draft declares the levels of the whole file.
    return found.size >= 2 && (type !== 'category' || found.size === levels.length);
  });
  return varying.length === predictors.length ? varying : stillVarying(response, varying);
}

function completeRows(response: Float64Array, predictors: readonly Predictor[]): number[] {
  const rows: number[] = [];
  for (let row = 0; row < response.length; row++) {
    if (Number.isNaN(response[row]!)) continue;
    if (predictors.every(({ seen }) => !Number.isNaN(seen.values[row]!))) rows.push(row);
  }
  return rows;
}

/** Pearson's correlation over the rows; 0 where it is not defined. */
function correlation(x: Float64Array, y: Float64Array, rows: readonly number[]): number {
  const n = rows.length;
  let [mx, my] = [0, 0];
  for (const row of rows) {
    mx += x[row]! / n;
    my += y[row]! / n;
  }
  let [xx, xy, yy] = [0, 0, 0];
  for (const row of rows) {
    xx += (x[row]! - mx) ** 2;
    yy += (y[row]! - my) ** 2;
    xy += (x[row]! - mx) * (y[row]! - my);
  }
  const r = xy / Math.sqrt(xx * yy);
  return Number.isFinite(r) ? r : 0;
}

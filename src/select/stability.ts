import { clustersOf } from '../engine/clusters.ts';
import { denseRows } from '../engine/dense-rows.ts';
import { absorb, type Factor, factorRows } from '../engine/factor.ts';
import type { Fit } from '../engine/fit.ts';
import { emptyFactor, factorParts } from '../engine/fold-factors.ts';
import { rowsAt } from '../engine/rows-at.ts';
import { type Random, randomFrom } from '../stats/random.ts';
import type { StabilityPlan } from '../study/study.ts';
import { namesOfChosen } from './candidate-name.ts';
import { rowsByPart } from './folds.ts';
import { type Ground, materialOf } from './material.ts';
import type { Procedure } from './procedure.ts';
import { quantileOf } from './quantile.ts';

/** How often what would be chosen from rows drawn anew. */
export interface Stability {
  readonly repetitions: number;
  /** Repetitions in which no candidate was admitted. */
  readonly noneAdmitted: number;
  /** Rows, groups or blocks that were drawn from. */
  readonly units: number;
  /** Rows in a block, where blocks were drawn. */
  readonly blockLength: number | null;
  /** Every candidate that was chosen at least once, most often first. */
  readonly candidates: readonly { readonly candidate: string; readonly chosen: number }[];
  /** How often a chosen candidate has the term, most often first. */
  readonly terms: readonly { readonly term: string; readonly chosen: number }[];
  /** Over the repetitions in which the chosen candidate has the column. */
  readonly coefficients: readonly CoefficientSpread[];
}

export interface CoefficientSpread {
  /** Union column. */
  readonly column: number;
  readonly responseColumn: number;
  readonly chosen: number;
  readonly positive: number;
  /** Quantiles at 0.05, 0.25, 0.5, 0.75 and 0.95. */
  readonly quantiles: readonly [number, number, number, number, number];
}

export interface StabilityInput {
  readonly plan: StabilityPlan;
  readonly ground: Ground;
  readonly procedure: Procedure;
  readonly onProgress?: ((done: number, total: number) => void) | undefined;
}

const LEVELS = [0.05, 0.25, 0.5, 0.75, 0.95] as const;

/**
 * The choice made again from rows drawn with replacement (bootstrap: Efron 1979; of the choice of a model: Sauerbrei &
 * Schumacher 1992): rows, whole groups, or blocks of rows that follow one another in time, cut once from the first row on
 * (Carlstein 1986). A row drawn k times counts as weight k, which gives the very factor of the drawn rows. Groups and blocks with more rows
 * than columns are drawn as factors, each times √k, and merged: exact, at a cost that does not depend on the number of rows.
 */
export function stability({ plan, ground, procedure, onProgress }: StabilityInput): Stability {
  const { rows } = ground;
  const nameOf = namesOfChosen(ground.design);
  const units = unitsOf(plan, ground);
  const random = randomFrom(plan.seed);
  const draw = units.rows === null ? rowDraws(ground, random) : unitDraws(ground, units.rows, random);
  const candidates = new Map<string, number>();
  const terms = new Map<string, number>();
  const estimates = new Map<number, number[]>();
  let noneAdmitted = 0;
  for (let repetition = 0; repetition < plan.repetitions; repetition++) {
    onProgress?.(repetition, plan.repetitions);
    const { factor, index, counts } = draw();
    const fit = procedure(materialOf(ground, factor, index, counts));
    if (fit === null) noneAdmitted++;
    else take(fit);
  }
  const byCount = (a: readonly [string, number], b: readonly [string, number]) =>
    b[1] - a[1] || (a[0] < b[0] ? -1 : 1);
  return {
    repetitions: plan.repetitions,
    noneAdmitted,
    units: units.count,
    blockLength: units.blockLength,
    candidates: [...candidates].sort(byCount).map(([candidate, chosen]) => ({ candidate, chosen })),
    terms: [...terms].sort(byCount).map(([term, chosen]) => ({ term, chosen })),
    coefficients: [...estimates]
      .sort((a, b) => a[0] - b[0])
      .map(([key, values]): CoefficientSpread => {
        const sorted = Float64Array.from(values).sort();
        const [a, b, c, d, e] = LEVELS.map((level) => quantileOf(sorted, level));
        return {
          column: key % rows.width,
          responseColumn: Math.floor(key / rows.width),
          chosen: values.length,
          positive: values.filter((value) => value > 0).length,
          quantiles: [a!, b!, c!, d!, e!],
        };
      }),
  };

  function take(fit: Fit): void {
    const { terms: own, responseColumn } = fit.candidate;
    const name = nameOf(fit.candidate);
    candidates.set(name, (candidates.get(name) ?? 0) + 1);
    for (const term of own) terms.set(term.name, (terms.get(term.name) ?? 0) + 1);
    fit.columns.forEach((column, j) => {
      const key = responseColumn * rows.width + column;
      const list = estimates.get(key);
      if (list === undefined) estimates.set(key, [fit.estimates[j]!]);
      else list.push(fit.estimates[j]!);
    });
  }
}

interface Units {
  readonly count: number;
  /** Positions of the rows of each, ascending; null where each row is one. */
  readonly rows: readonly Int32Array[] | null;
  readonly blockLength: number | null;
}

function unitsOf(plan: StabilityPlan, { sample, rows }: Ground): Units {
  const n = rows.rowCount;
  switch (plan.by) {
    case 'rows':
      return { count: n, rows: null, blockLength: null };
    case 'group': {
      const { codes, count } = clustersOf(sample.columns.get(plan.group!)!);
      return { count, rows: rowsByPart(codes, count), blockLength: null };
    }
    case 'blocks': {
      const length = Math.min(n, plan.blockLength ?? Math.ceil(Math.cbrt(n) - 1e-9));
      const count = Math.ceil(n / length);
      const order = sample.timeOrder!;
      const blocks = Array.from({ length: count }, (_, k) =>
        order.slice(k * length, (k + 1) * length).sort(),
      );
      return { count, rows: blocks, blockLength: length };
    }
  }
}

interface Drawn {
  readonly factor: Factor;
  /** Positions of the rows drawn, ascending, each once, and how often each was drawn. */
  readonly index: Int32Array;
  readonly counts: Int32Array;
}

function rowDraws({ rows }: Ground, random: Random): () => Drawn {
  const n = rows.rowCount;
  const dense = denseRows(rows);
  return () => {
    const counts = new Int32Array(n);
    for (let k = 0; k < n; k++) counts[random.below(n)]!++;
    return passOver(dense, counts);
  };
}

/** The factor of rows that count so many times, by a pass over them. */
function passOver(rows: Ground['rows'], counts: Int32Array): Drawn {
  let distinct = 0;
  let total = 0;
  for (const count of counts) {
    if (count > 0) distinct++;
    total += count;
  }
  const index = new Int32Array(distinct);
  const own = new Int32Array(distinct);
  let at = 0;
  counts.forEach((count, row) => {
    if (count === 0) return;
    index[at] = row;
    own[at++] = count;
  });
  const factor = factorRows(rowsAt(rows, index, Float64Array.from(own, Math.sqrt)));
  return { factor: { ...factor, rowCount: total }, index, counts: own };
}

function unitDraws({ rows }: Ground, units: readonly Int32Array[], random: Random): () => Drawn {
  const n = rows.rowCount;
  const m = rows.width;
  const g = units.length;
  // A factor of fewer rows than columns is no smaller than the rows themselves.
  const byFactors = n >= g * m;
  const partOf = new Int32Array(n);
  units.forEach((unit, k) => {
    for (const row of unit) partOf[row] = k;
  });
  const factors = byFactors ? factorParts(rows, partOf, g) : null;
  const dense = byFactors ? rows : denseRows(rows);
  const scaled = new Float64Array(m * m);
  return () => {
    const drawn = new Int32Array(g);
    for (let k = 0; k < g; k++) drawn[random.below(g)]!++;
    const counts = partOf.map((unit) => drawn[unit]!);
    if (factors === null) return passOver(dense, counts);
    const factor = emptyFactor(factors[0]!);
    let total = 0;
    drawn.forEach((count, k) => {
      if (count === 0) return;
      const one = factors[k]!;
      const root = Math.sqrt(count);
      for (let i = 0; i < m * m; i++) scaled[i] = one.triangle.hi[i]! * root;
      absorb(factor.triangle.hi, m, scaled, m, m);
      total += count * one.rowCount;
    });
    const index = Int32Array.from([...counts.keys()].filter((row) => counts[row]! > 0));
    return { factor: { ...factor, rowCount: total }, index, counts: index.map((row) => counts[row]!) };
  };
}

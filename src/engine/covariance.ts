import type { DesignRows } from '../model/design-rows.ts';
import type { Sample } from '../prepare/sample.ts';
import type { HeteroscedasticKind, StandardErrorsPlan } from '../study/study.ts';
import { type Clusters, clustersOf } from './clusters.ts';
import { absorb } from './factor.ts';
import type { Covariance, Fit } from './fit.ts';
import { type ProjectedBlock, visitProjected } from './projected-rows.ts';
import { FULL_LEVERAGE } from './row-figures.ts';

export type { Covariance };

const MOST_UNDEFINED = 5;

/** s²(X′WX)⁻¹ on n − p; null where the fit leaves no error variance: no degrees of freedom, or an exact fit. */
export function classicalCovariance(fit: Fit): Covariance | null {
  if (fit.degreesOfFreedom < 1 || fit.exact) return null;
  return {
    kind: 'classical',
    root: fit.rootInverse,
    classicalRoot: fit.rootInverse,
    variance: fit.residualSumOfSquares / fit.degreesOfFreedom,
    df: fit.degreesOfFreedom,
    lags: null,
    clusters: null,
    undefinedRows: [],
    undefinedCount: 0,
  };
}

/**
 * The declared covariance in at most one pass over the rows. With S = Σ q q′ω (q the row in the orthonormal basis of
 * the design) every one of them is R⁻¹ S R⁻ᵀ. S itself is never formed: the rows √ω q, sums of them within clusters,
 * or sums of them over a moving window of L + 1 rows (whose products carry the Bartlett weights) go into a triangle
 * T with T′T = S, which is therefore never indefinite.
 *
 * HC0 White 1980; HC1–HC3 MacKinnon & White 1985; HC4 Cribari-Neto 2004; clusters Liang & Zeger 1986; HAC Newey &
 * West 1987, without a small-sample factor. Weighted rows count as √w x and √w e. Null as for the classical one.
 */
export function declaredCovariance(
  plan: StandardErrorsPlan,
  fit: Fit,
  rows: DesignRows,
  sample: Pick<Sample, 'columns' | 'timeOrder'>,
  sumsHeld = SUMS_HELD,
): Covariance | null {
  const classical = classicalCovariance(fit);
  if (classical === null || plan.kind === 'classical') return classical;
  const s = Math.sqrt(classical.variance);
  const n = fit.rowCount;
  const p = fit.columns.length;
  const triangle = new Float64Array(p * p);
  const robust = (factor: number) => rootOf(fit, triangle, factor);
  switch (plan.kind) {
    case 'clustered': {
      const clusters = clustersOf(sample.columns.get(plan.by)!);
      const g = clusters.count;
      if (g * p <= sumsHeld) addClusters(fit, rows, clusters, s, triangle);
      else addClustersInTurn(fit, rows, clusters, s, triangle);
      return {
        ...classical,
        kind: 'clustered',
        root: robust(Math.sqrt((g / (g - 1)) * ((n - 1) / (n - p)))),
        df: g - 1,
        clusters: { by: plan.by, count: g },
      };
    }
    case 'hac': {
      const lags = plan.lags === 'auto' ? automaticLags(n) : plan.lags;
      addWindows(fit, rows, sample.timeOrder, lags, s, triangle);
      return { ...classical, kind: 'hac', root: robust(Math.sqrt(1 / (lags + 1))), lags };
    }
    default: {
      const { kind } = plan;
      const undefinedRows: number[] = [];
      let undefinedCount = 0;
      visitProjected(fit, rows, null, (block) => {
        for (let i = 0; i < block.count; i++) {
          const h = block.leverages[i]!;
          if (h > FULL_LEVERAGE && kind !== 'hc0' && kind !== 'hc1') {
            // The residual is zero whatever the row says: 0/0.
            undefinedCount++;
            if (undefinedRows.length < MOST_UNDEFINED) undefinedRows.push(block.rows[i]!);
            block.residuals[i] = 0;
          } else block.residuals[i]! *= stretch(kind, h, n, p) / s;
        }
        scaleRows(block, p);
        absorb(triangle, p, block.projected, block.stride, block.count);
      });
      return { ...classical, kind, root: robust(1), undefinedRows, undefinedCount };
    }
  }
}

/** ⌊4 (n/100)^(2/9)⌋ (Newey & West 1994, as a rule by n alone). */
export function automaticLags(n: number): number {
  return Math.floor(4 * (n / 100) ** (2 / 9));
}

/**
 * An error below this share of the classical one is rounding of nothing: where clusters leave no sum of residuals
 * at all, for example.
 */
const NOTHING = 1e-9;

/** √(c′Vc), for c of length p; 0 where it is nothing beside the classical one. */
export function errorOf(
  covariance: Pick<Covariance, 'root' | 'classicalRoot' | 'variance'>,
  c: ArrayLike<number>,
): number {
  const { root, classicalRoot, variance } = covariance;
  const length = projectedLength(root, c);
  const nothing = root !== classicalRoot && length <= NOTHING * projectedLength(classicalRoot, c);
  return nothing ? 0 : Math.sqrt(variance) * length;
}

/** ‖root′c‖. */
function projectedLength(root: Float64Array, c: ArrayLike<number>): number {
  const p = c.length;
  let sum = 0;
  for (let j = 0; j < p; j++) {
    let projected = 0;
    for (let k = 0; k < p; k++) projected += root[j * p + k]! * c[k]!;
    sum += projected * projected;
  }
  return Math.sqrt(sum);
}

/** √V_jj; 0 as for any combination. */
export function coefficientError(covariance: Covariance, j: number): number {
  const { root, classicalRoot, variance } = covariance;
  const length = rowLength(root, j);
  const nothing = root !== classicalRoot && length <= NOTHING * rowLength(classicalRoot, j);
  return nothing ? 0 : Math.sqrt(variance) * length;
}

function rowLength(root: Float64Array, j: number): number {
  const p = Math.round(Math.sqrt(root.length));
  let sum = 0;
  for (let k = 0; k < p; k++) sum += root[k * p + j]! * root[k * p + j]!;
  return Math.sqrt(sum);
}

/** V, p × p, column-major, symmetric. */
export function covarianceMatrix({ root, variance }: Covariance): Float64Array {
  const p = Math.round(Math.sqrt(root.length));
  const matrix = new Float64Array(p * p);
  for (let j = 0; j < p; j++) {
    for (let i = 0; i <= j; i++) {
      let sum = 0;
      for (let k = 0; k < p; k++) sum += root[k * p + i]! * root[k * p + j]!;
      matrix[j * p + i] = variance * sum;
      matrix[i * p + j] = variance * sum;
    }
  }
  return matrix;
}

/** What a squared residual is multiplied by, as a root: 1/(1 − h)^(δ/2) and the like. */
function stretch(kind: HeteroscedasticKind, h: number, n: number, p: number): number {
  switch (kind) {
    case 'hc0':
      return 1;
    case 'hc1':
      return Math.sqrt(n / (n - p));
    case 'hc2':
      return 1 / Math.sqrt(1 - h);
    case 'hc3':
      return 1 / (1 - h);
    case 'hc4':
      return (1 - h) ** (-Math.min(4, (n * h) / p) / 2);
  }
}

/** Each row of a block times its residual: q becomes q e. */
function scaleRows({ projected, residuals, stride, count }: ProjectedBlock, p: number): void {
  for (let j = 0; j < p; j++) {
    const at = j * stride;
    for (let i = 0; i < count; i++) projected[at + i]! *= residuals[i]!;
  }
}

/** Numbers (clusters × columns) up to which all sums are held at once: 32 MB. */
const SUMS_HELD = 4e6;

/** Sums of q e over the rows of each cluster, all of them held. */
function addClusters(
  fit: Fit,
  rows: DesignRows,
  { count: g, codes }: Clusters,
  s: number,
  triangle: Float64Array,
): void {
  const p = fit.columns.length;
  const sums = new Float64Array(g * p);
  visitProjected(fit, rows, null, ({ projected, residuals, rows: positions, stride, count }) => {
    for (let i = 0; i < count; i++) residuals[i]! /= s;
    for (let j = 0; j < p; j++) {
      const at = j * stride;
      const to = j * g;
      for (let i = 0; i < count; i++) sums[to + codes[positions[i]!]!]! += projected[at + i]! * residuals[i]!;
    }
  });
  absorb(triangle, p, sums, g, g);
}

/** The same with one sum held at a time: rows are visited cluster by cluster, which is slow where they lie apart. */
function addClustersInTurn(
  fit: Fit,
  rows: DesignRows,
  { codes, order }: Clusters,
  s: number,
  triangle: Float64Array,
): void {
  const p = fit.columns.length;
  const most = 256;
  const sums = new Float64Array(most * p);
  let at = -1;
  let open = -1;
  visitProjected(fit, rows, order, ({ projected, residuals, rows: positions, stride, count }) => {
    for (let i = 0; i < count; i++) {
      const cluster = codes[positions[i]!]!;
      if (cluster !== open) {
        open = cluster;
        at++;
        if (at === most) {
          absorb(triangle, p, sums, most, most);
          sums.fill(0);
          at = 0;
        }
      }
      const e = residuals[i]! / s;
      for (let j = 0; j < p; j++) sums[j * most + at]! += projected[j * stride + i]! * e;
    }
  });
  absorb(triangle, p, sums, most, at + 1);
}

/**
 * Sums of q e over every window of L + 1 rows in a row, those that reach over the ends included: n + L of them. A
 * window is the one before it plus the row that enters less the row that leaves, and is added up afresh once every
 * L + 1 rows, so that rounding does not gather.
 */
function addWindows(
  fit: Fit,
  rows: DesignRows,
  order: Int32Array | null,
  lags: number,
  s: number,
  triangle: Float64Array,
): void {
  const p = fit.columns.length;
  const length = lags + 1;
  // The last L + 1 rows, by column.
  const ring = new Float64Array(length * p);
  const sums = new Float64Array(p);
  let next = 0;
  /** Turns rows q e of a block into windows. */
  const enter = (block: Float64Array, stride: number, count: number) => {
    let slot = next;
    for (let j = 0; j < p; j++) {
      const of = j * length;
      let sum = sums[j]!;
      slot = next;
      for (let i = j * stride; i < j * stride + count; i++) {
        const score = block[i]!;
        sum += score - ring[of + slot]!;
        ring[of + slot] = score;
        slot++;
        if (slot === length) {
          slot = 0;
          sum = 0;
          for (let k = of; k < of + length; k++) sum += ring[k]!;
        }
        block[i] = sum;
      }
      sums[j] = sum;
    }
    next = slot;
    absorb(triangle, p, block, stride, count);
  };
  visitProjected(fit, rows, order, (block) => {
    for (let i = 0; i < block.count; i++) block.residuals[i]! /= s;
    scaleRows(block, p);
    enter(block.projected, block.stride, block.count);
  });
  const rest = 256;
  for (let done = 0; done < lags; done += rest)
    enter(new Float64Array(rest * p), rest, Math.min(rest, lags - done));
}

/** R⁻¹ T′ times a factor, p × p. */
function rootOf(fit: Fit, t: Float64Array, factor: number): Float64Array {
  const p = fit.columns.length;
  const root = new Float64Array(p * p);
  for (let j = 0; j < p; j++) {
    for (let i = 0; i < p; i++) {
      let sum = 0;
      // (R⁻¹ T′)_ij = Σ_k R⁻¹_ik T_jk; both are upper triangular.
      for (let k = Math.max(i, j); k < p; k++) sum += fit.rootInverse[k * p + i]! * t[k * p + j]!;
      root[j * p + i] = factor * sum;
    }
  }
  return root;
}

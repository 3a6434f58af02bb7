import type { DesignRows } from '../model/design-rows.ts';
import type { Sample } from '../prepare/sample.ts';
import type { HeteroscedasticKind, StandardErrorsPlan } from '../study/study.ts';
import { type Clusters, clustersOf } from './clusters.ts';
import { absorb } from './factor.ts';
import type { Fit } from './fit.ts';
import { type ProjectedBlock, visitProjected } from './projected-rows.ts';
import { FULL_LEVERAGE } from './row-figures.ts';

/**
 * The covariance of the estimates of a fit, as V = variance · root · root′, so that an error √(c′Vc) is the length of a
 * vector and keeps its digits where columns are nearly dependent.
 */
export interface Covariance {
  readonly kind: StandardErrorsPlan['kind'];
  /** p × p, column-major. */
  readonly root: Float64Array;
  /** R⁻¹, the root of the classical covariance: the measure of what is rounding. */
  readonly classicalRoot: Float64Array;
  /** s². */
  readonly variance: number;
  /** Degrees of freedom of t, and of the denominator of F. */
  readonly df: number;
  /** Lags of a HAC covariance, clusters of a clustered one; null for the rest. */
  readonly lags: number | null;
  readonly clusters: { readonly by: string; readonly count: number } | null;
  /** Positions in the sample of rows with a leverage of 1, for which HC2 to HC4 are not defined; at most a few. */
  readonly undefinedRows: readonly number[];
  readonly undefinedCount: number;
}

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
): Covariance | null {
  const classical = classicalCovariance(fit);
  if (classical === null || plan.kind === 'classical') return classical;
  const s = Math.sqrt(classical.variance);
  const n = fit.rowCount;
  const p = fit.columns.length;
  const triangle = triangleOf(p);
  switch (plan.kind) {
    case 'clustered': {
      const clusters = clustersOf(sample.columns.get(plan.by)!);
      sumClusters(fit, rows, clusters, s, triangle);
      const g = clusters.count;
      const factor = (g / (g - 1)) * ((n - 1) / (n - p));
      return {
        ...classical,
        kind: 'clustered',
        root: rootOf(fit, triangle.close(), Math.sqrt(factor)),
        df: g - 1,
        clusters: { by: plan.by, count: g },
      };
    }
    case 'hac': {
      const lags = plan.lags === 'auto' ? automaticLags(n) : plan.lags;
      sumWindows(fit, rows, sample.timeOrder, lags, s, triangle);
      return {
        ...classical,
        kind: 'hac',
        root: rootOf(fit, triangle.close(), Math.sqrt(1 / (lags + 1))),
        lags,
      };
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
            continue;
          }
          triangle.add(block, i, (block.residuals[i]! / s) * stretch(kind, h, n, p));
        }
      });
      return { ...classical, kind, root: rootOf(fit, triangle.close(), 1), undefinedRows, undefinedCount };
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
export function errorOf(covariance: Covariance, c: ArrayLike<number>): number {
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

/** Sums of q e over the rows of each cluster; rows are visited cluster by cluster. */
function sumClusters(fit: Fit, rows: DesignRows, clusters: Clusters, s: number, triangle: Triangle): void {
  const p = fit.columns.length;
  const sum = new Float64Array(p);
  let open = -1;
  visitProjected(fit, rows, clusters.order, (block) => {
    for (let i = 0; i < block.count; i++) {
      const cluster = clusters.codes[block.rows[i]!]!;
      if (cluster !== open) {
        if (open >= 0) triangle.addRow(sum);
        sum.fill(0);
        open = cluster;
      }
      addScore(sum, block, i, s);
    }
  });
  if (open >= 0) triangle.addRow(sum);
}

/**
 * Sums of q e over every window of L + 1 rows in a row, those that reach over the ends included: n + L of them. A
 * window is the one before it plus the row that enters less the row that leaves, and is added up afresh once every
 * L + 1 rows, so that rounding does not gather.
 */
function sumWindows(
  fit: Fit,
  rows: DesignRows,
  order: Int32Array | null,
  lags: number,
  s: number,
  triangle: Triangle,
): void {
  const p = fit.columns.length;
  const length = lags + 1;
  const ring = new Float64Array(length * p);
  const sum = new Float64Array(p);
  let next = 0;
  const enter = (block: ProjectedBlock | null, i: number) => {
    const slot = next * p;
    for (let j = 0; j < p; j++) {
      const score = block === null ? 0 : (block.projected[j * block.stride + i]! * block.residuals[i]!) / s;
      sum[j]! += score - ring[slot + j]!;
      ring[slot + j] = score;
    }
    next = (next + 1) % length;
    if (next === 0) {
      sum.fill(0);
      for (let k = 0; k < ring.length; k++) sum[k % p]! += ring[k]!;
    }
    triangle.addRow(sum);
  };
  visitProjected(fit, rows, order, (block) => {
    for (let i = 0; i < block.count; i++) enter(block, i);
  });
  for (let k = 0; k < lags; k++) enter(null, 0);
}

function addScore(sum: Float64Array, block: ProjectedBlock, i: number, s: number): void {
  const e = block.residuals[i]! / s;
  for (let j = 0; j < sum.length; j++) sum[j]! += block.projected[j * block.stride + i]! * e;
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

const BUFFER = 128;

interface Triangle {
  /** Takes row i of a block, times a factor. */
  readonly add: (block: ProjectedBlock, i: number, factor: number) => void;
  readonly addRow: (row: Float64Array) => void;
  /** T, p × p, column-major. */
  readonly close: () => Float64Array;
}

/** Gathers rows of length p and takes them into an upper triangle T, T′T = Σ row row′, a buffer at a time. */
function triangleOf(p: number): Triangle {
  const t = new Float64Array(p * p);
  const buffer = new Float64Array(BUFFER * p);
  let held = 0;
  const close = () => {
    if (held > 0) absorb(t, p, buffer, BUFFER, held);
    held = 0;
    return t;
  };
  const next = () => {
    held++;
    if (held === BUFFER) close();
  };
  return {
    add(block, i, factor) {
      for (let j = 0; j < p; j++) buffer[j * BUFFER + held] = factor * block.projected[j * block.stride + i]!;
      next();
    },
    addRow(row) {
      for (let j = 0; j < p; j++) buffer[j * BUFFER + held] = row[j]!;
      next();
    },
    close,
  };
}

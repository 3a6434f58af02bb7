import type { DesignRows } from '../model/design-rows.ts';
import type { Fit } from './fit.ts';

const BLOCK = 256;
/** Columns of a block lie a little apart, so that they do not compete for the same lines of the cache. */
const STRIDE = BLOCK + 8;

/** Rows of a block, in the order asked for; the arrays are reused from block to block. */
export interface ProjectedBlock {
  readonly count: number;
  /** Position in the sample of each row of the block. */
  readonly rows: Int32Array;
  /** √w (y − Xb) on the fitted scale. */
  readonly residuals: Float64Array;
  /** h = ‖q‖², in [0, 1]. */
  readonly leverages: Float64Array;
  /** q = R⁻ᵀ√w x of each row, p columns of `stride`: rows of the orthonormal basis of the design. */
  readonly projected: Float64Array;
  readonly stride: number;
}

/**
 * One pass over the rows of a fit with each row's place in the orthonormal basis of the design, in which sums of
 * products lose no digits to the condition of the columns.
 * @param order positions 0 … n − 1 in the order to visit; null for the order of the file
 */
export function visitProjected(
  fit: Fit,
  rows: DesignRows,
  order: Int32Array | null,
  visit: (block: ProjectedBlock) => void,
): void {
  const p = fit.columns.length;
  const { scales } = rows;
  const responseAt = rows.predictorCount + fit.candidate.responseColumn;
  const wanted = [...fit.columns, responseAt];
  const block = new Float64Array(STRIDE * (p + 1));
  const projected = new Float64Array(STRIDE * p);
  const residuals = new Float64Array(BLOCK);
  const leverages = new Float64Array(BLOCK);
  const positions = new Int32Array(BLOCK);
  const estimates = fit.estimates.map((estimate, j) => estimate / scales[fit.columns[j]!]!);
  const root = fit.rootInverse.map((value, k) => value / scales[fit.columns[k % p]!]!);
  const responseScale = scales[responseAt]!;
  const y = p * STRIDE;
  for (let from = 0; from < rows.rowCount; from += BLOCK) {
    const count = Math.min(BLOCK, rows.rowCount - from);
    for (let i = 0; i < count; i++) positions[i] = order === null ? from + i : order[from + i]!;
    fillStretches(rows, wanted, positions, count, block);
    for (let i = 0; i < count; i++) residuals[i] = block[y + i]! / responseScale;
    for (let j = 0; j < p; j++) {
      const b = estimates[j]!;
      const at = j * STRIDE;
      for (let i = 0; i < count; i++) residuals[i]! -= b * block[at + i]!;
    }
    projected.fill(0);
    leverages.fill(0);
    for (let j = 0; j < p; j++) {
      const to = j * STRIDE;
      project(root, p, j, block, count, projected, to);
      for (let i = 0; i < count; i++) leverages[i]! += projected[to + i]! * projected[to + i]!;
    }
    for (let i = 0; i < count; i++) if (leverages[i]! > 1) leverages[i] = 1;
    visit({ count, rows: positions, residuals, leverages, projected, stride: STRIDE });
  }
}

/** Rows at the positions, a stretch of neighbours at a time: files are mostly in order already. */
function fillStretches(
  rows: DesignRows,
  wanted: readonly number[],
  positions: Int32Array,
  count: number,
  block: Float64Array,
): void {
  for (let start = 0; start < count; ) {
    let stop = start + 1;
    while (stop < count && positions[stop] === positions[stop - 1]! + 1) stop++;
    const first = positions[start]!;
    rows.fill(wanted, first, first + stop - start, STRIDE, block.subarray(start), null);
    start = stop;
  }
}

/** projected[to…] = Σ_k root[k, j] · column k, k ≤ j, four columns at a time to spare the memory. */
function project(
  root: Float64Array,
  p: number,
  j: number,
  block: Float64Array,
  count: number,
  projected: Float64Array,
  to: number,
): void {
  let k = 0;
  for (; k + 3 <= j; k += 4) {
    const r0 = root[j * p + k]!;
    const r1 = root[j * p + k + 1]!;
    const r2 = root[j * p + k + 2]!;
    const r3 = root[j * p + k + 3]!;
    const at = k * STRIDE;
    for (let i = 0; i < count; i++) {
      const m = at + i;
      projected[to + i]! +=
        r0 * block[m]! +
        r1 * block[m + STRIDE]! +
        (r2 * block[m + 2 * STRIDE]! + r3 * block[m + 3 * STRIDE]!);
    }
  }
  for (; k <= j; k++) {
    const r = root[j * p + k]!;
    const at = k * STRIDE;
    for (let i = 0; i < count; i++) projected[to + i]! += r * block[at + i]!;
  }
}

/** What is left of a column in which all rows before are without information; columns of Q have length 1. */
const NOTHING = 1e-10;

export interface RecursiveResiduals {
  /** w_t = (y_t − x_t′b_{t−1})/√(1 + x_t′(X′_{t−1}X_{t−1})⁻¹x_t), in order. */
  readonly values: Float64Array;
  /** Position of each among the rows. Rows that add a new direction to the columns have none. */
  readonly positions: Int32Array;
}

/**
 * Recursive residuals (Brown, Durbin & Evans 1975): each row predicted from those before it. The factor [R | z] of the rows
 * so far is updated by plane rotations that take the new row in, and what they leave of the response is the residual
 * itself. They depend on the space of the columns only, so any orthonormal basis of it will do, and they are those of y as
 * well as of its residuals.
 * @param q n × p, column-major, orthonormal columns
 */
export function recursiveResiduals(
  q: Float64Array,
  y: Float64Array,
  n: number,
  p: number,
): RecursiveResiduals {
  const values = new Float64Array(n);
  const positions = new Int32Array(n);
  const width = p + 1;
  const r = new Float64Array(p * width);
  const row = new Float64Array(width);
  let count = 0;
  for (let t = 0; t < n; t++) {
    for (let j = 0; j < p; j++) row[j] = q[j * n + t]!;
    row[p] = y[t]!;
    if (absorbed(r, row, p)) continue;
    values[count] = row[p]!;
    positions[count++] = t;
  }
  return { values: values.slice(0, count), positions: positions.slice(0, count) };
}

/** Takes a row into the triangle (rows of p + 1); true where the row opens a direction and nothing of it is left. */
function absorbed(r: Float64Array, row: Float64Array, p: number): boolean {
  const width = p + 1;
  for (let j = 0; j < p; j++) {
    const x = row[j]!;
    if (Math.abs(x) <= NOTHING) continue;
    const at = j * width;
    const diagonal = r[at + j]!;
    if (diagonal === 0) {
      // Positive, so that the cosine of the next rotation is, and the residual keeps its sign.
      const sign = x < 0 ? -1 : 1;
      for (let k = j; k < width; k++) r[at + k] = sign * row[k]!;
      return true;
    }
    const length = Math.hypot(diagonal, x);
    const c = diagonal / length;
    const s = x / length;
    for (let k = j; k < width; k++) {
      const above = r[at + k]!;
      const below = row[k]!;
      r[at + k] = c * above + s * below;
      row[k] = c * below - s * above;
    }
  }
  return false;
}

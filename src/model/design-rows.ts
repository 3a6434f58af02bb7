import type { CategoryColumn, Column } from '../data/table.ts';
import { multiplyPair, pair, twoSum } from '../stats/double-double.ts';
import type { DesignColumn, Piece } from './design.ts';

/**
 * Rows of [X | Y], formed block by block from the columns of the sample; the whole matrix is never held.
 *
 * Every row is multiplied by the square root of its weight, and every column by a power of two that keeps
 * extreme magnitudes (beyond 1e±100) from overflowing in squares; `scales` undoes that exactly.
 */
export interface DesignRows {
  /** n. */
  readonly rowCount: number;
  /** P + q: the union's columns, then the responses. */
  readonly width: number;
  /** P. */
  readonly predictorCount: number;
  /** Column j of a block is scales[j] times the true column. Length P + q, powers of two. */
  readonly scales: Float64Array;
  /** √w per row, or null where every weight is 1. */
  readonly rootWeights: Float64Array | null;
  /** Each response on its fitted scale, unweighted, unscaled. q arrays of length n. */
  readonly responses: readonly Float64Array[];
  /**
   * Writes rows from…to−1 of the listed columns into `hi` (column-major, column c at c · stride). With `lo`,
   * powers, products and weights are carried in double-double; without, `hi` is the rounded product.
   */
  readonly fill: (
    columns: readonly number[],
    from: number,
    to: number,
    stride: number,
    hi: Float64Array,
    lo: Float64Array | null,
  ) => void;
}

/** The columns of a sample that rows are formed from: those of a `Sample`, or of rows to be predicted. */
export interface DesignSource {
  readonly rowCount: number;
  readonly columns: ReadonlyMap<string, Column>;
}

/**
 * Compiles design columns over the columns of a sample.
 * @param responses what to put after the predictors, each of length n, on the scale it is fitted on; may be none
 * @param weights name of the weights variable, or null
 */
export function designRows(
  columns: readonly DesignColumn[],
  source: DesignSource,
  responses: readonly Float64Array[],
  weights: string | null,
): DesignRows {
  const n = source.rowCount;
  const predictorCount = columns.length;
  const rootWeights = weights === null ? null : numbersOf(source, weights).map(Math.sqrt);
  const bounds = columnBounds(source);
  const weightBound = rootWeights === null ? 1 : largestSize(rootWeights);
  const writers = [
    ...columns.map((column) => columnWriter(column, source)),
    ...responses.map((values) => copyWriter(values)),
  ];
  const scales = Float64Array.from([
    ...columns.map((column, j) => {
      // A bound may be far from what the rows hold, and only a bound: an extreme one is looked into.
      if (powerOfTwoFor(bounds(column) * weightBound) === 1) return 1;
      return powerOfTwoFor(largestWritten(writers[j]!, n) * weightBound);
    }),
    ...responses.map((values) => powerOfTwoFor(largestSize(values) * weightBound)),
  ]);

  return {
    rowCount: n,
    width: predictorCount + responses.length,
    predictorCount,
    scales,
    rootWeights,
    responses,
    fill(wanted, from, to, stride, hi, lo) {
      for (let c = 0; c < wanted.length; c++) {
        const column = wanted[c]!;
        const at = c * stride;
        if (lo !== null) lo.fill(0, at, at + to - from);
        writers[column]!(from, to, hi, lo, at);
        if (rootWeights !== null) weigh(rootWeights, from, to, hi, lo, at);
        const scale = scales[column]!;
        if (scale !== 1) rescale(scale, to - from, hi, lo, at);
      }
    },
  };
}

type Writer = (from: number, to: number, hi: Float64Array, lo: Float64Array | null, at: number) => void;

function columnWriter(column: DesignColumn, source: DesignSource): Writer {
  const [first, ...rest] = column.pieces;
  if (first === undefined) {
    return (from, to, hi, _lo, at) => {
      hi.fill(1, at, at + to - from);
    };
  }
  if (rest.length === 0) {
    if (first.kind === 'variable') return copyWriter(numbersOf(source, first.variable));
    if (first.kind === 'level') return levelWriter(first.level, categoryOf(source, first.variable));
  }
  const values = column.pieces.map((piece) => pieceValue(piece, source));
  const product = pair();
  const factor = pair();
  return (from, to, hi, lo, at) => {
    for (let i = from; i < to; i++) {
      values[0]!(i, product);
      for (let k = 1; k < values.length; k++) {
        values[k]!(i, factor);
        multiplyPair(product[0]!, product[1]!, factor[0]!, factor[1]!, product);
      }
      hi[at + i - from] = product[0]!;
      if (lo !== null) lo[at + i - from] = product[1]!;
    }
  };
}

function copyWriter(values: Float64Array): Writer {
  return (from, to, hi, _lo, at) => {
    hi.set(values.subarray(from, to), at);
  };
}

function levelWriter(level: string, column: CategoryColumn): Writer {
  const code = column.levels.indexOf(level);
  return (from, to, hi, _lo, at) => {
    for (let i = from; i < to; i++) hi[at + i - from] = column.codes[i] === code ? 1 : 0;
  };
}

/** The value of one piece at a row, as a pair. */
function pieceValue(piece: Piece, source: DesignSource): (row: number, out: Float64Array) => void {
  if (piece.kind === 'level') {
    const column = categoryOf(source, piece.variable);
    const code = column.levels.indexOf(piece.level);
    return (row, out) => {
      out[0] = column.codes[row] === code ? 1 : 0;
      out[1] = 0;
    };
  }
  const values = numbersOf(source, piece.variable);
  switch (piece.kind) {
    case 'variable':
      return (row, out) => {
        out[0] = values[row]!;
        out[1] = 0;
      };
    case 'power':
      return (row, out) => powerPair(values[row]!, piece.to, out);
    case 'bend':
      return (row, out) => {
        if (piece.side === 'above') twoSum(values[row]!, -piece.at, out);
        else twoSum(piece.at, -values[row]!, out);
        if (out[0]! < 0) {
          out[0] = 0;
          out[1] = 0;
        }
      };
    case 'spline': {
      const { knots, index } = piece;
      const scratch = pair();
      return (row, out) => splinePair(values[row]!, knots, index, out, scratch);
    }
  }
}

/** x^k: integer powers by repeated exact products, other exponents by the rounded power. */
function powerPair(x: number, to: number, out: Float64Array): void {
  if (!Number.isInteger(to) || Math.abs(to) > 64) {
    out[0] = x ** to;
    out[1] = 0;
    return;
  }
  if (to < 0) {
    out[0] = x ** to;
    out[1] = 0;
    return;
  }
  out[0] = 1;
  out[1] = 0;
  for (let k = 0; k < to; k++) multiplyPair(out[0]!, out[1]!, x, 0, out);
}

/**
 * Curved column `index` ≥ 1 of the natural cubic spline on knots t_1 < … < t_k: d_j(x) − d_{k−1}(x) with
 * d_j(x) = ((x − t_j)₊³ − (x − t_k)₊³)/(t_k − t_j), j = index (Hastie, Tibshirani & Friedman, The Elements of
 * Statistical Learning, 5.2.1). Beyond the outer knots it is linear.
 */
function splinePair(
  x: number,
  knots: readonly number[],
  index: number,
  out: Float64Array,
  scratch: Float64Array,
): void {
  const k = knots.length;
  const last = knots[k - 1]!;
  ratioOfCubes(x, knots[index - 1]!, last, out, scratch);
  const hi = out[0]!;
  const lo = out[1]!;
  ratioOfCubes(x, knots[k - 2]!, last, out, scratch);
  twoSum(hi, -out[0]!, scratch);
  const low = scratch[1]! + lo - out[1]!;
  twoSum(scratch[0]!, low, out);
}

function ratioOfCubes(x: number, knot: number, last: number, out: Float64Array, scratch: Float64Array): void {
  cubePair(x - knot, out);
  const hi = out[0]!;
  const lo = out[1]!;
  cubePair(x - last, out);
  twoSum(hi, -out[0]!, scratch);
  // The quotient is rounded to a double: the column is then defined by that double, the same for every use.
  out[0] = (scratch[0]! + (scratch[1]! + lo - out[1]!)) / (last - knot);
  out[1] = 0;
}

function cubePair(distance: number, out: Float64Array): void {
  if (distance <= 0) {
    out[0] = 0;
    out[1] = 0;
  } else powerPair(distance, 3, out);
}

const product = pair();

function weigh(
  rootWeights: Float64Array,
  from: number,
  to: number,
  hi: Float64Array,
  lo: Float64Array | null,
  at: number,
): void {
  if (lo === null) {
    for (let i = from; i < to; i++) hi[at + i - from]! *= rootWeights[i]!;
    return;
  }
  for (let i = from; i < to; i++) {
    const k = at + i - from;
    multiplyPair(hi[k]!, lo[k]!, rootWeights[i]!, 0, product);
    hi[k] = product[0]!;
    lo[k] = product[1]!;
  }
}

function rescale(scale: number, count: number, hi: Float64Array, lo: Float64Array | null, at: number): void {
  for (let k = at; k < at + count; k++) hi[k]! *= scale;
  if (lo !== null) for (let k = at; k < at + count; k++) lo[k]! *= scale;
}

/** The values of a column of numbers; the study's check has made sure that it is one. */
export function numbersOf(source: DesignSource, name: string): Float64Array {
  const column = source.columns.get(name);
  if (column === undefined || column.kind === 'category' || column.kind === 'text') {
    throw new TypeError(`${name} is not a column of numbers`);
  }
  return column.values;
}

function categoryOf(source: DesignSource, name: string): CategoryColumn {
  const column = source.columns.get(name);
  if (column?.kind !== 'category') throw new TypeError(`${name} is not a category`);
  return column;
}

function largestSize(values: Float64Array): number {
  let largest = 0;
  for (let i = 0; i < values.length; i++) {
    const size = Math.abs(values[i]!);
    if (size > largest) largest = size;
  }
  return largest;
}

function largestWritten(write: Writer, rowCount: number): number {
  const block = new Float64Array(1024);
  let largest = 0;
  for (let from = 0; from < rowCount; from += block.length) {
    const to = Math.min(rowCount, from + block.length);
    write(from, to, block, null, 0);
    largest = Math.max(largest, largestSize(block.subarray(0, to - from)));
  }
  return largest;
}

/** An upper bound of a column's size, from the largest sizes of its variables: that of any combination of their values. */
export function columnBounds(source: DesignSource): (column: DesignColumn) => number {
  const sizes = new Map<string, number>();
  const sizeOf = (variable: string): number => {
    let size = sizes.get(variable);
    if (size === undefined) {
      size = largestSize(numbersOf(source, variable));
      sizes.set(variable, size);
    }
    return size;
  };
  const boundOf = (piece: Piece): number => {
    switch (piece.kind) {
      case 'level':
        return 1;
      case 'variable':
        return sizeOf(piece.variable);
      case 'power':
        return piece.to > 0 ? sizeOf(piece.variable) ** piece.to : 1;
      case 'bend':
        return sizeOf(piece.variable) + Math.abs(piece.at);
      case 'spline':
        return (sizeOf(piece.variable) + Math.max(...piece.knots.map(Math.abs))) ** 2;
    }
  };
  return (column) => column.pieces.reduce((bound, piece) => bound * boundOf(piece), 1);
}

/** 1 for ordinary magnitudes and those that are none, else the power of two that brings the bound near 1. */
function powerOfTwoFor(bound: number): number {
  if (!(bound > 0) || !Number.isFinite(bound) || (bound < 1e100 && bound > 1e-100)) return 1;
  // 2¹⁰⁷⁴, for the smallest number of all, cannot be held.
  return 2 ** Math.min(1000, -Math.round(Math.log2(bound)));
}

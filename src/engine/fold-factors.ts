import type { DesignRows } from '../model/design-rows.ts';
import { absorb, type Factor, factorRows, mergeFactors } from './factor.ts';
import { matrix } from './kernel.ts';
import { rowsAt } from './rows-at.ts';

/** Rows that a fold gathers before they are taken into its factor: fewer where there are many folds, to stay in the cache. */
const GATHERED = 512;
const GATHERED_OF_MANY = 64;
const MANY = 64;

/**
 * The factor of every part of the rows, in one pass: rows are scattered to a buffer of their part, which is taken into the
 * part's factor when it is full. Double arithmetic.
 * @param partOf 0 … count − 1 per row, or −1 for a row that is in no part
 */
export function factorParts(
  rows: DesignRows,
  partOf: Int32Array,
  count: number,
  onProgress?: (done: number) => void,
): Factor[] {
  const m = rows.width;
  const capacity = count <= MANY ? GATHERED : GATHERED_OF_MANY;
  const block = capacity / 2;
  const triangles = Array.from({ length: count }, () => matrix(m, m, false));
  const gathered = Array.from({ length: count }, () => new Float64Array(capacity * m));
  const held = new Int32Array(count);
  const sizes = new Int32Array(count);
  const filled = new Float64Array(block * m);
  const places = new Int32Array(block);
  const all = Array.from({ length: m }, (_, j) => j);
  const absorbHeld = (part: number) => {
    absorb(triangles[part]!.hi, m, gathered[part]!, capacity, held[part]!);
    held[part] = 0;
  };
  for (let from = 0; from < rows.rowCount; from += block) {
    const size = Math.min(block, rows.rowCount - from);
    rows.fill(all, from, from + size, block, filled, null);
    for (let i = 0; i < size; i++) {
      const part = partOf[from + i]!;
      if (part < 0) continue;
      places[i] = held[part]!;
      held[part]!++;
      sizes[part]!++;
    }
    for (let i = 0; i < size; i++) {
      const part = partOf[from + i]!;
      if (part < 0) continue;
      const target = gathered[part]!;
      const place = places[i]!;
      for (let j = 0; j < m; j++) target[j * capacity + place] = filled[j * block + i]!;
    }
    // Half of a buffer is free before each block, so none can overflow within one.
    for (let i = from; i < from + size; i++) {
      const part = partOf[i]!;
      if (part >= 0 && held[part]! > block) absorbHeld(part);
    }
    if (onProgress !== undefined && ((from / block) & 127) === 127) onProgress(from + size);
  }
  for (let part = 0; part < count; part++) absorbHeld(part);
  return triangles.map((triangle, part) => ({
    width: m,
    predictorCount: rows.predictorCount,
    rowCount: sizes[part]!,
    triangle,
    scales: rows.scales,
  }));
}

/**
 * For each part the factor of all the others, from the parts' factors alone: merged from the front and from the back, so that
 * k parts take some 3k merges.
 */
export function factorsOfOthers(parts: readonly Factor[]): Factor[] {
  const k = parts.length;
  if (k === 0) return [];
  const empty = emptyFactor(parts[0]!);
  const after: Factor[] = Array.from({ length: k + 1 }, () => empty);
  for (let part = k - 1; part > 0; part--) after[part] = joined(parts[part]!, after[part + 1]!);
  let before = empty;
  return parts.map((factor, part) => {
    const others = joined(before, after[part + 1]!);
    before = joined(before, factor);
    return others;
  });
}

/** A factor of no rows, for the same columns. */
export function emptyFactor({
  width,
  predictorCount,
  scales,
}: Omit<Factor, 'triangle' | 'rowCount'>): Factor {
  return { width, predictorCount, scales, rowCount: 0, triangle: matrix(width, width, false) };
}

function joined(a: Factor, b: Factor): Factor {
  if (a.rowCount === 0) return b;
  return b.rowCount === 0 ? a : mergeFactors(a, b);
}

/**
 * The factors of stretches of rows as they grow: calls `visit` with each part after the first and the factor of all parts before
 * it. One pass, and no factors are kept.
 * @param parts positions of the rows of each part, ascending within it
 */
export function visitGrowing(
  rows: DesignRows,
  parts: readonly Int32Array[],
  visit: (part: number, before: Factor, factor: Factor) => void,
): void {
  let before: Factor | null = null;
  parts.forEach((index, part) => {
    const factor = factorAt(rows, index);
    if (before !== null) visit(part, before, factor);
    before = before === null ? factor : joined(before, factor);
  });
}

/** The factor of the rows at the positions, which ascend. */
export function factorAt(rows: DesignRows, index: Int32Array): Factor {
  const n = index.length;
  const [first] = index;
  if (first === undefined) return emptyFactor(rows);
  return index[n - 1]! - first === n - 1
    ? factorRows(rows, first, first + n)
    : factorRows(rowsAt(rows, index, null));
}

import { rowsAt } from '../engine/rows-at.ts';
import { dependencyOf, type SolveScratch } from '../engine/solve-columns.ts';
import type { DesignRows } from '../model/design-rows.ts';
import { type Folds, rowsByPart } from './folds.ts';
import { type FoldLoss, MOST_UNPREDICTABLE, type ValidationInput } from './validation.ts';

/** A column that the training rows of a fold cannot tell from others: x = Σ z_k x_k in them. */
export interface Dependency {
  /** Union column. */
  readonly column: number;
  /** Union columns and their multipliers, in the rows' scaled units. */
  readonly others: readonly { readonly column: number; readonly z: number }[];
}

/** The columns that the last solve passed over. */
export function dependenciesOf(columns: ArrayLike<number>, m: number, scratch: SolveScratch): Dependency[] {
  const found: Dependency[] = [];
  for (let j = 0; j < columns.length; j++) {
    if (scratch.kept[j] === 1) continue;
    const z = dependencyOf(m, j, scratch);
    const others = Array.from(z, (value, k) => ({ column: columns[k]!, z: value })).filter(
      (one) => one.z !== 0,
    );
    found.push({ column: columns[j]!, others });
  }
  return found;
}

/** A row is taken to keep to a dependency when what is left of the column is below this share of the parts. */
const KEPT = 1e-8;
const BLOCK = 512;

/**
 * 1 for each row in which the dependency does not hold: whatever the column's coefficient, the training rows say nothing of
 * it, so such a row cannot be predicted. All others are predicted alike by every solution.
 * @param rows the rows held out
 */
export function rowsBeyond(dependency: Dependency, rows: DesignRows): Uint8Array {
  const columns = [dependency.column, ...dependency.others.map(({ column }) => column)];
  const block = new Float64Array(BLOCK * columns.length);
  const beyond = new Uint8Array(rows.rowCount);
  for (let from = 0; from < rows.rowCount; from += BLOCK) {
    const count = Math.min(BLOCK, rows.rowCount - from);
    rows.fill(columns, from, from + count, BLOCK, block, null);
    for (let i = 0; i < count; i++) {
      let left = block[i]!;
      let size = Math.abs(left);
      for (let k = 1; k < columns.length; k++) {
        const part = dependency.others[k - 1]!.z * block[k * BLOCK + i]!;
        left -= part;
        size += Math.abs(part);
      }
      if (Math.abs(left) > KEPT * size) beyond[from + i] = 1;
    }
  }
  return beyond;
}

/** A candidate that had columns passed over in a fold. */
export interface Pending {
  readonly set: number;
  readonly fold: number;
  readonly candidate: number;
  readonly dependencies: readonly Dependency[];
}

export interface Unpredictable {
  /** Candidates without figures, with the number of rows that they cannot predict. */
  readonly excluded: ReadonlyMap<number, number>;
  /** By fold over all sets: 1 for each held-out row to leave out. */
  readonly rowsOut: ReadonlyMap<number, Uint8Array>;
  readonly losses: readonly FoldLoss[];
}

/** Finds the rows that the dependencies make unpredictable, and which candidates lose too many. */
export function unpredictable(
  input: ValidationInput,
  pending: readonly Pending[],
  heldOut: number,
): Unpredictable {
  const { rows, folds } = input;
  const heldOutRows = heldOutRowsOf(folds, pending);
  const marks = new Map<string, Uint8Array>();
  const perCandidate = new Map<number, Map<number, Uint8Array>>();
  const perColumn = new Map<
    number,
    { folds: Set<number>; candidates: Set<number>; rows: Map<number, Uint8Array> }
  >();
  for (const { set, fold, candidate, dependencies } of pending) {
    const at = set * folds.count + fold;
    const index = heldOutRows.get(at)!;
    for (const dependency of dependencies) {
      const key = `${at} ${JSON.stringify(dependency)}`;
      let beyond = marks.get(key);
      if (beyond === undefined) {
        beyond = rowsBeyond(dependency, rowsAt(rows, index, null));
        marks.set(key, beyond);
      }
      if (!beyond.includes(1)) continue;
      const of = perCandidate.get(candidate) ?? new Map<number, Uint8Array>();
      perCandidate.set(candidate, of);
      addMarks(of, at, beyond);
      const told = perColumn.get(dependency.column) ?? {
        folds: new Set(),
        candidates: new Set(),
        rows: new Map(),
      };
      perColumn.set(dependency.column, told);
      told.folds.add(fold);
      told.candidates.add(candidate);
      addMarks(told.rows, at, beyond);
    }
  }
  const excluded = new Map<number, number>();
  const rowsOut = new Map<number, Uint8Array>();
  for (const [candidate, of] of perCandidate) {
    const count = countMarks(of);
    if (count > MOST_UNPREDICTABLE * heldOut) excluded.set(candidate, count);
    else for (const [at, beyond] of of) addMarks(rowsOut, at, beyond);
  }
  const losses = [...perColumn].map(
    ([column, told]): FoldLoss => ({
      column,
      folds: [...told.folds].sort((a, b) => a - b).map(folds.nameOf),
      rows: countMarks(told.rows),
      candidates: [...told.candidates].sort((a, b) => a - b),
    }),
  );
  return { excluded, rowsOut, losses };
}

/** By fold over all sets: positions of its held-out rows, for the folds that are wanted. */
function heldOutRowsOf(folds: Folds, pending: readonly Pending[]): Map<number, Int32Array> {
  const found = new Map<number, Int32Array>();
  const wanted = new Set(pending.map(({ set, fold }) => set * folds.count + fold));
  folds.sets.forEach((set, s) => {
    if (set.kind === 'single') return;
    const parts = set.kind === 'growing' ? set.parts.slice(1) : rowsByPart(set.partOf, set.count);
    parts.forEach((part, fold) => {
      if (wanted.has(s * folds.count + fold)) found.set(s * folds.count + fold, part);
    });
  });
  return found;
}

function addMarks(to: Map<number, Uint8Array>, at: number, marks: Uint8Array): void {
  const own = to.get(at) ?? new Uint8Array(marks.length);
  to.set(at, own);
  marks.forEach((mark, i) => {
    if (mark === 1) own[i] = 1;
  });
}

function countMarks(marks: ReadonlyMap<number, Uint8Array>): number {
  let count = 0;
  for (const one of marks.values()) for (const mark of one) count += mark;
  return count;
}

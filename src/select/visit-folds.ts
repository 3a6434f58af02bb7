import type { Factor } from '../engine/factor.ts';
import { factorParts, factorsOfOthers, visitGrowing } from '../engine/fold-factors.ts';
import type { DesignRows } from '../model/design-rows.ts';
import { type FoldSet, rowsByPart } from './folds.ts';

/** One fold: what is held out, and what it is predicted from. */
export interface Fold {
  readonly fold: number;
  readonly training: Factor;
  readonly heldOut: Factor;
  /** Positions of the rows of each, ascending. */
  readonly trainingRows: () => Int32Array;
  readonly heldOutRows: () => Int32Array;
}

/** Calls `visit` with every fold that has rows on both sides; one pass over the rows. Not for rows held out one at a time. */
export function visitFolds(
  rows: DesignRows,
  set: FoldSet,
  visit: (fold: Fold) => void,
  onProgress?: (done: number) => void,
): void {
  if (set.kind === 'growing') {
    const { parts } = set;
    visitGrowing(rows, parts, (part, training, heldOut) => {
      visit({
        fold: part - 1,
        training,
        heldOut,
        trainingRows: () => joinedParts(parts.slice(0, part)),
        heldOutRows: () => parts[part]!,
      });
    });
    return;
  }
  if (set.kind === 'single') throw new Error('Rows held out one at a time have no factors of their own.');
  const { partOf, count } = set;
  const factors = factorParts(rows, partOf, count, onProgress);
  const others = factorsOfOthers(factors);
  let lists: Int32Array[] | null = null;
  factors.forEach((heldOut, fold) => {
    if (heldOut.rowCount === 0 || others[fold]!.rowCount === 0) return;
    visit({
      fold,
      training: others[fold]!,
      heldOut,
      trainingRows: () =>
        rowsByPart(
          partOf.map((part) => (part < 0 || part === fold ? -1 : 0)),
          1,
        )[0]!,
      heldOutRows: () => {
        lists ??= rowsByPart(partOf, count);
        return lists[fold]!;
      },
    });
  });
}

function joinedParts(parts: readonly Int32Array[]): Int32Array {
  const all = new Int32Array(parts.reduce((sum, part) => sum + part.length, 0));
  let at = 0;
  for (const part of parts) {
    all.set(part, at);
    at += part.length;
  }
  return all.sort();
}

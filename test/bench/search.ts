/**
 * The search of subsets beside one pass over its rows: 50 columns on 500 rows, 40 columns on 1,000,000 rows, and fifteen columns as
 * a bootstrap searches them again. Ratios of times in one run on one machine.
 */
import { bestSubsets, type SubsetsFound } from '../../src/engine/best-subsets.ts';
import { type Factor, factorRows } from '../../src/engine/factor.ts';
import type { SubsetSearch } from '../../src/engine/subset-search.ts';
import { testModel, variable } from '../engine/models.ts';
import { invented, line, ratio, time } from './measure.ts';

/** Invented predictors, alike to each other by `likeness`; ten of them, spread out, make the response. */
function rowsOf(rows: number, predictors: number, likeness: number, size: number) {
  const shared = invented(rows, 999);
  const columns = Array.from({ length: predictors }, (_, j) =>
    invented(rows, j + 2).map((value, i) => value + likeness * shared[i]!),
  );
  const noise = [1, 2, 3].map((k) => invented(rows, 5000 + k));
  const y = Array.from({ length: rows }, (_, i) => {
    let sum = noise[0]![i]! + noise[1]![i]! + noise[2]![i]!;
    for (let k = 0; k < 10; k++)
      sum += size * (1 + (k % 3)) * columns[Math.floor((k * predictors) / 10)]![i]!;
    return sum;
  });
  const data: Record<string, number[]> = { y };
  columns.forEach((column, j) => {
    data[`x${j}`] = column;
  });
  const names = columns.map((_, j) => variable(`x${j}`));
  return testModel(data, names, []).rows;
}

function search(factor: Factor, keep: number, more: Partial<SubsetSearch> = {}): SubsetsFound {
  const predictors = factor.predictorCount - 1;
  return bestSubsets(factor, {
    always: [0],
    groups: Array.from({ length: predictors }, (_, j) => ({ columns: [j + 1], needs: [] })),
    responseColumn: 0,
    atLeast: 0,
    atMost: predictors,
    keep,
    mostColumns: factor.rowCount - 1,
    ...more,
  });
}

function told(found: SubsetsFound): string {
  return `${found.visited} places for ${found.covered.toExponential(1)} subsets${found.finished ? '' : ', given up'}`;
}

export function benchSearch(): void {
  for (const likeness of [0, 0.5]) {
    const factor = factorRows(rowsOf(500, 50, likeness, 0.4));
    const alike = likeness === 0 ? 'unlike' : 'alike';
    for (const keep of [1, 3]) {
      const one = time(
        `best ${keep} of every size of 50 columns (${alike}), 500 rows`,
        () => search(factor, keep),
        keep === 1 ? 3 : 1,
      );
      line('', told(one.value));
    }
  }

  const rows = rowsOf(1_000_000, 40, 0.5, 0.1);
  const pass = time('one pass over 1,000,000 × 40', () => factorRows(rows), 2);
  const found = time('best of every size of these 40 columns', () => search(pass.value, 1), 3);
  line('', told(found.value));
  ratio('pass and search / one pass', pass.seconds + found.seconds, pass.seconds);

  const fewRows = rowsOf(1000, 15, 0.5, 0.2);
  const small = factorRows(fewRows);
  const again = time(
    'best of every size of 15 columns, 1,000 times',
    () => {
      for (let k = 0; k < 1000; k++) search(small, 1);
    },
    1,
  );
  const smallPass = time('one pass over 1,000 × 15', () => factorRows(fewRows), 20);
  ratio('one such search / one pass', again.seconds / 1000, smallPass.seconds);
}

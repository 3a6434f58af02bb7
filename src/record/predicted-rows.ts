import { PREDICTED_FIGURES, type PredictedColumns } from '../predict/predicted-columns.ts';
import { cell } from './tables.ts';

/** The rows of a file, each with its prediction or with the reason why it has none. */
export interface PredictedRowColumns {
  readonly labels: readonly string[];
  /** By row: which of the predictions is its own; −1 for none. */
  readonly at: Int32Array;
  /** By row: null where there is a prediction. */
  readonly because: readonly (string | null)[];
  readonly predicted: PredictedColumns;
}

export interface TotalRow {
  /** Null for the total of all rows. */
  readonly group: string | null;
  readonly rows: number;
  readonly estimate: number;
  readonly lower: number | null;
  readonly upper: number | null;
}

/** Rows written at a time. */
const BLOCK = 4096;

/**
 * Predictions as CSV, one line for each row of the file in its order, so that the two can be laid side by side: full
 * precision, empty where there is no figure, with the reason in the last column where a row has no prediction.
 */
export function* predictedRowsTable({
  labels,
  at,
  because,
  predicted,
}: PredictedRowColumns): Generator<string> {
  yield `label,${PREDICTED_FIGURES.join(',')},outside,not_predicted\n`;
  const empty = ','.repeat(PREDICTED_FIGURES.length - 1);
  for (let start = 0; start < labels.length; start += BLOCK) {
    const end = Math.min(start + BLOCK, labels.length);
    const figures = figureTexts(
      predicted,
      at.subarray(start, end).filter((k) => k >= 0),
    );
    let text = '';
    let next = 0;
    for (let row = start; row < end; row++) {
      const k = at[row]!;
      const here = k < 0 ? empty : figures[next++];
      const ways = k < 0 ? undefined : predicted.outside.get(k);
      const reason = k < 0 ? cell(because[row] ?? '') : '';
      text += `${cell(labels[row]!)},${here},${ways === undefined ? '' : cell(ways.join('; '))},${reason}\n`;
    }
    yield text;
  }
}

/**
 * The figures of each of the predictions as cells. Many numbers are written at once by `JSON.stringify` in about half the
 * time, a NaN as null: one ends each row, and one more stands where a figure is absent. Where such a figure is not between
 * two others, all go one by one.
 */
function figureTexts({ figures }: PredictedColumns, wanted: Int32Array): string[] {
  if (wanted.length === 0) return [];
  const columns = PREDICTED_FIGURES.map((figure) => figures[figure]);
  const numbers = new Array<number>(wanted.length * (columns.length + 1)).fill(0.5);
  const gaps = new Uint8Array(wanted.length);
  let to = 0;
  let between = true;
  for (let i = 0; i < wanted.length; i++) {
    let absent = true;
    for (const column of columns) {
      const value = column[wanted[i]!]!;
      const here = Number.isNaN(value);
      if (here && absent) between = false;
      if (here) gaps[i]!++;
      absent = here;
      numbers[to++] = value;
    }
    if (absent) between = false;
    numbers[to++] = Number.NaN;
  }
  if (!between) {
    return Array.from(wanted, (k) =>
      columns.map((column) => (Number.isNaN(column[k]) ? '' : JSON.stringify(column[k]))).join(','),
    );
  }
  const pieces = JSON.stringify(numbers).slice(1, -',null]'.length).split(',null,');
  let next = 0;
  return Array.from(gaps, (count) => {
    let text = pieces[next++]!;
    for (let gap = 0; gap < count; gap++) text += `,,${pieces[next++]}`;
    return text;
  });
}

/** Totals as CSV, that of all rows first, with an empty group. */
export function totalsTable(totals: readonly TotalRow[], by: string | null): string {
  const lines = totals.map(({ group, rows, estimate, lower, upper }) =>
    [...(by === null ? [] : [cell(group ?? '')]), rows, estimate, lower ?? '', upper ?? ''].join(','),
  );
  const header = [...(by === null ? [] : [cell(by)]), 'rows', 'estimate', 'lower', 'upper'].join(',');
  return `${[header, ...lines].join('\n')}\n`;
}

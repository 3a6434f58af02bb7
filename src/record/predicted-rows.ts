import type { RecordPrediction } from './record.ts';
import { cell } from './tables.ts';

/** A row with its prediction, or with the reason why it has none. */
export interface PredictedRow {
  readonly label: string;
  readonly prediction: Omit<RecordPrediction, 'values'> | null;
  readonly because: string | null;
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

const FIGURES = ['estimate', 'lower', 'upper', 'mean_lower', 'mean_upper', 'mean', 'leverage'] as const;

/**
 * Predictions as CSV, one line for each row of the file in its order, so that the two can be laid side by side: full
 * precision, empty where there is no figure, with the reason in the last column where a row has no prediction.
 */
export function* predictedRowsTable(rows: readonly PredictedRow[]): Generator<string> {
  yield `label,${FIGURES.join(',')},outside,not_predicted\n`;
  const empty = ','.repeat(FIGURES.length - 1);
  for (let start = 0; start < rows.length; start += BLOCK) {
    const block = rows.slice(start, start + BLOCK);
    const figures = figureTexts(block.flatMap(({ prediction }) => prediction ?? []));
    let text = '';
    let next = 0;
    for (const { label, prediction, because } of block) {
      const outside = prediction === null ? '' : prediction.outside.join('; ');
      const reason = prediction === null ? (because ?? '') : '';
      const here = prediction === null ? empty : figures[next++];
      text += `${cell(label)},${here},${cell(outside)},${cell(reason)}\n`;
    }
    yield text;
  }
}

/** The figures of each prediction as cells. Many numbers are written at once by `JSON.stringify` in about half the time. */
function figureTexts(predictions: readonly Omit<RecordPrediction, 'values'>[]): string[] {
  const lists = predictions.map((prediction) => FIGURES.map((figure) => prediction[figure]));
  return JSON.stringify(lists).slice(2, -2).replaceAll('null', '').split('],[');
}

/** Totals as CSV, that of all rows first, with an empty group. */
export function totalsTable(totals: readonly TotalRow[], by: string | null): string {
  const lines = totals.map(({ group, rows, estimate, lower, upper }) =>
    [...(by === null ? [] : [cell(group ?? '')]), rows, estimate, lower ?? '', upper ?? ''].join(','),
  );
  const header = [...(by === null ? [] : [cell(by)]), 'rows', 'estimate', 'lower', 'upper'].join(',');
  return `${[header, ...lines].join('\n')}\n`;
}

import { orNull, PREDICTED_FIGURES, type PredictedColumns } from '../predict/predicted-columns.ts';
import { figureTexts } from './figure-texts.ts';
import { cell } from './tables.ts';

/** The rows of a file, each with its prediction or with the reason why it has none. */
export interface PredictedRowColumns {
  /** The label of a row, worked out when it is asked for: many rows are only counted. */
  readonly labelOf: (row: number) => string;
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
  /** Rows that cannot be predicted and so are missing from the total. */
  readonly rows_not_predicted: number;
  readonly estimate: number;
  readonly lower: number | null;
  readonly upper: number | null;
}

/**
 * Predictions as CSV, one line for each row of the file in its order, so that the two can be laid side by side: full
 * precision, empty where there is no figure, with the reason in the last column where a row has no prediction.
 */
export function* predictedRowsTable(rows: PredictedRowColumns): Generator<string> {
  const { labelOf, at, because, predicted } = rows;
  const columns = PREDICTED_FIGURES.map((figure) => predicted.figures[figure]);
  const empty = ','.repeat(PREDICTED_FIGURES.length - 1);
  yield `label,${PREDICTED_FIGURES.join(',')},outside,not_predicted\n`;
  for (let from = 0; from < at.length; from += BLOCK) {
    const to = Math.min(from + BLOCK, at.length);
    // What a row without a prediction gets here is not used.
    const figures = figureTexts(
      columns,
      Array.from(at.subarray(from, to), (k) => Math.max(0, k)),
    );
    const lines: string[] = [];
    for (let row = from; row < to; row++) {
      const label = cell(labelOf(row));
      if (at[row]! < 0) {
        lines.push(`${label},${empty},,${cell(because[row] ?? '')}\n`);
        continue;
      }
      const ways = predicted.outside.get(at[row]!);
      lines.push(`${label},${figures[row - from]},${ways === undefined ? '' : cell(ways.join('; '))},\n`);
    }
    yield lines.join('');
  }
}

/** The same as objects of JSON, one to a line, to stand in an array. */
export function* predictedRowsJson(
  rows: PredictedRowColumns & { readonly lines: Uint32Array },
): Generator<string> {
  const { labelOf, lines, at, because, predicted } = rows;
  for (let from = 0; from < at.length; from += BLOCK) {
    const to = Math.min(from + BLOCK, at.length);
    const objects: string[] = [];
    for (let row = from; row < to; row++) {
      const k = at[row]!;
      const label = labelOf(row);
      const line = lines[row]!;
      objects.push(
        JSON.stringify(
          k < 0
            ? { label, line, not_predicted: because[row] }
            : { label, ...figuresAt(predicted, k), outside: predicted.outside.get(k) ?? [], line },
        ),
      );
    }
    yield `${from === 0 ? '' : ',\n'}${objects.join(',\n')}`;
  }
}

/** Rows whose texts are handed on at once. */
const BLOCK = 256;

function figuresAt({ figures }: PredictedColumns, k: number): Record<string, number | null> {
  const own: Record<string, number | null> = {};
  for (const figure of PREDICTED_FIGURES) own[figure] = orNull(figures[figure][k]!);
  return own;
}

/** Totals as CSV, that of all rows first, with an empty group. */
export function totalsTable(totals: readonly TotalRow[], by: string | null): string {
  const lines = totals.map(({ group, rows, estimate, lower, upper, rows_not_predicted: lacking }) =>
    [...(by === null ? [] : [cell(group ?? '')]), rows, estimate, lower ?? '', upper ?? '', lacking].join(
      ',',
    ),
  );
  const header = [
    ...(by === null ? [] : [cell(by)]),
    'rows',
    'estimate',
    'lower',
    'upper',
    'rows_not_predicted',
  ].join(',');
  return `${[header, ...lines].join('\n')}\n`;
}

import { PREDICTED_FIGURES, type PredictedColumns } from '../predict/predicted-columns.ts';
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
  const empty = ','.repeat(PREDICTED_FIGURES.length);
  yield `label,${PREDICTED_FIGURES.join(',')},outside,not_predicted\n`;
  yield* rowTexts(rows, {
    before: PREDICTED_FIGURES.map(() => ','),
    absent: '',
    head: (row) => cell(labelOf(row)),
    tail: (row) => {
      if (at[row]! < 0) return `${empty},,${cell(because[row] ?? '')}\n`;
      const ways = predicted.outside.get(at[row]!);
      return ways === undefined ? ',,\n' : `,${cell(ways.join('; '))},\n`;
    },
  });
}

/** The same as objects of JSON, one to a line, to stand in an array. */
export function predictedRowsJson(
  rows: PredictedRowColumns & { readonly lines: Uint32Array },
): Generator<string> {
  const { labelOf, lines, at, because, predicted } = rows;
  return rowTexts(rows, {
    before: PREDICTED_FIGURES.map((figure) => `,"${figure}":`),
    absent: 'null',
    head: (row) => `${row === 0 ? '' : ',\n'}{"label":${JSON.stringify(labelOf(row))}`,
    tail: (row) => {
      if (at[row]! < 0) return `,"line":${lines[row]},"not_predicted":${JSON.stringify(because[row])}}`;
      const ways = predicted.outside.get(at[row]!);
      return `,"outside":${ways === undefined ? '[]' : JSON.stringify(ways)},"line":${lines[row]}}`;
    },
  });
}

/** How a row is written: a head, the figures of its prediction where it has one, a tail. */
interface RowForm {
  readonly head: (row: number) => string;
  readonly tail: (row: number) => string;
  /** What stands before each figure. */
  readonly before: readonly string[];
  readonly absent: string;
}

/** The most characters of a number as text. */
const LONGEST_NUMBER = 25;
/** Bytes gathered before they are handed on: few enough that their string is not a large object of its own. */
const BLOCK = 1 << 16;

/** Texts are gathered as bytes: strings of rows would cost more than their digits. */
function* rowTexts(
  { at, predicted }: PredictedRowColumns,
  { head, tail, before, absent }: RowForm,
): Generator<string> {
  const columns = PREDICTED_FIGURES.map((figure) => predicted.figures[figure]);
  const most = before.reduce((sum, text) => sum + text.length + LONGEST_NUMBER, 0);
  let block = Buffer.allocUnsafe(BLOCK);
  let to = 0;
  let plain = true;
  const gathered = () => block.toString(plain ? 'latin1' : 'utf8', 0, to);
  for (let row = 0; row < at.length; row++) {
    const [first, last] = [head(row), tail(row)];
    const room = 3 * (first.length + last.length) + most;
    if (to + room > block.length) {
      yield gathered();
      to = 0;
      plain = true;
      if (room > block.length) block = Buffer.allocUnsafe(room);
    }
    let start = to;
    to = writeText(first, block, to);
    // Any character but ASCII takes more bytes than it has code units.
    plain &&= to - start === first.length;
    const k = at[row]!;
    for (let j = 0; k >= 0 && j < columns.length; j++) {
      const figure = columns[j]![k]!;
      to = writeText(before[j]!, block, to);
      to = Number.isNaN(figure) ? writeText(absent, block, to) : writeText(String(figure), block, to);
    }
    start = to;
    to = writeText(last, block, to);
    plain &&= to - start === last.length;
  }
  if (to > 0) yield gathered();
}

/** Writes a text as UTF-8 and says where it ends; most are short and ASCII. */
function writeText(text: string, block: Buffer, at: number): number {
  for (let k = 0; k < text.length; k++) {
    const code = text.charCodeAt(k);
    if (code > 127) return at + block.write(text, at);
    block[at + k] = code;
  }
  return at + text.length;
}

/** Totals as CSV, that of all rows first, with an empty group. */
export function totalsTable(totals: readonly TotalRow[], by: string | null): string {
  const lines = totals.map(({ group, rows, estimate, lower, upper }) =>
    [...(by === null ? [] : [cell(group ?? '')]), rows, estimate, lower ?? '', upper ?? ''].join(','),
  );
  const header = [...(by === null ? [] : [cell(by)]), 'rows', 'estimate', 'lower', 'upper'].join(',');
  return `${[header, ...lines].join('\n')}\n`;
}

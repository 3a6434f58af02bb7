import type { OnBadCell } from './data/faults.ts';
import { formatDate } from './data/format-date.ts';
import { readTable } from './data/read-table.ts';
import type { Column, Table } from './data/table.ts';
import { nearest } from './expression/nearest.ts';
import { wholeNumber } from './numerals.ts';
import {
  type Prediction,
  type PredictionTotal,
  predictRows,
  reportWithoutWeight,
} from './predict/predict.ts';
import { emptyFigures, predictionAt } from './predict/predicted-columns.ts';
import { gatherUnread, rowsOfTable, usableRows } from './predict/prediction-rows.ts';
import type { Problem, Report } from './problem.ts';
import type { PredictedRowColumns } from './record/predicted-rows.ts';
import { readRecord } from './record/read-record.ts';
import type { StudyRecord } from './record/record.ts';
import { type RecordedPredictor, recordedPredictor } from './record/recorded-predictor.ts';
import type { DataPlan, VariablePlan } from './study/study.ts';

export interface PredictRecordOptions {
  /** Confidence of the intervals, between 0 and 1; left out: the study's own. */
  readonly interval?: number;
  /** A variable of the model, or the header of a column of the rows, by which totals are given. */
  readonly totalBy?: string;
  /** Bytes of the rows instead of those of a file. */
  readonly bytes?: AsyncIterable<Uint8Array>;
  readonly onProgress?: (stage: string, done: number, total: number | null) => void;
}

/** A prediction as the record has them, without the values that it was made at: those stand in the file. */
export type PredictedFigures = Omit<Prediction, 'values'>;

/** One row of the file: its prediction, or why there is none. */
export interface RowOutcome {
  readonly label: string;
  /** Line in the file as a person counts it. */
  readonly line: number;
  readonly prediction: PredictedFigures | null;
  /** A clause such as "cargo is missing"; null where there is a prediction. */
  readonly because: string | null;
}

export interface GroupTotal extends PredictionTotal {
  /** The value of the grouping variable; null for the total of all rows. */
  readonly group: string | null;
  /** Rows of the file, or of the group in it, that cannot be predicted and so are missing from the total. */
  readonly rows_not_predicted: number;
}

export interface RecordPredictions {
  /** Null where nothing could be predicted; the problems say why. */
  readonly record: StudyRecord | null;
  readonly interval: number;
  /** Every row of the file in order. */
  readonly rows: readonly RowOutcome[];
  /** Of all rows predicted, then of each group in the order of its first row; empty where the scale is not natural. */
  readonly totals: readonly GroupTotal[];
  readonly problems: readonly Problem[];
}

/** Rows that cannot be predicted are named one by one up to this many. */
const MOST_NAMED = 20;

/** As `RecordPredictions`, in columns: what a table of many rows is written from. */
export interface RecordPredictionColumns extends Omit<RecordPredictions, 'rows'> {
  readonly rows: PredictedRowColumns & { readonly lines: Uint32Array };
}

/**
 * Predictions at the rows of a file from a record alone: record ─ predictor ─ rows ─ predictions. Rows are read
 * under the contract of the study; one with a value missing or not allowed, or a level that no row fitted has, is
 * listed, and the rest predicted.
 */
export async function predictFromRecord(
  recordPath: string,
  rowsPath: string,
  options: PredictRecordOptions = {},
): Promise<RecordPredictions> {
  const found = await predictColumnsFromRecord(recordPath, rowsPath, options);
  return { ...found, rows: outcomesOf(found.rows) };
}

/** Row by row. */
export function outcomesOf({
  labelOf,
  lines,
  at,
  because,
  predicted,
}: RecordPredictionColumns['rows']): RowOutcome[] {
  return Array.from(at, (k, row) => ({
    label: labelOf(row),
    line: lines[row]!,
    prediction: k < 0 ? null : predictionAt(predicted, k, labelOf(row), []),
    because: because[row]!,
  }));
}

const NO_ROWS: RecordPredictionColumns['rows'] = {
  labelOf: () => '',
  lines: new Uint32Array(0),
  at: new Int32Array(0),
  because: [],
  predicted: {
    count: 0,
    figures: emptyFigures(0),
    outside: new Map(),
    source: new Int32Array(0),
    row: new Int32Array(0),
  },
};

/** `predictFromRecord`, with its rows in columns. */
export async function predictColumnsFromRecord(
  recordPath: string,
  rowsPath: string,
  options: PredictRecordOptions = {},
): Promise<RecordPredictionColumns> {
  const problems: Problem[] = [];
  const report: Report = (problem) => problems.push(problem);
  const failed = () => ({ record: null, interval: 0, rows: NO_ROWS, totals: [], problems });

  const record = await readRecord(recordPath, report);
  if (record === null) return failed();
  const recorded = predictorIn(record, recordPath, report);
  if (recorded === null) return failed();
  const unread = gatherUnread(recorded.predictor);
  const table = await readRows(recorded, rowsPath, options, unread.onBadCell, report);
  if (table === null) return failed();

  const { predictor } = recorded;
  const listing = limited(report, table.file);
  const because = new Array<string | null>(table.rowCount).fill(null);
  const all = rowsOfTable(table, recorded.rowId === null ? null : ROW_ID);
  const leaveOut = (row: number, clause: string) => {
    because[row] = clause;
  };
  const { rows, kept } = usableRows(predictor, all, listing.report, leaveOut, unread);
  const group =
    options.totalBy === undefined ? null : groupsOf(table.columns.get(groupName(recorded, options.totalBy))!);
  const interval = options.interval ?? record.study.prediction_interval;
  const { predicted, totals } = predictRows(
    predictor,
    [rows],
    {
      interval,
      ...(group === null
        ? {}
        : { groups: { count: group.names.length, of: [kept.map((row) => group.codes[row]!)] } }),
    },
    listing.report,
  );
  listing.close();
  if (predicted.count === 0) {
    const message = 'None of the rows can be predicted.';
    report({
      code: 'predictions_none',
      severity: 'error',
      place: { kind: 'file', file: table.file },
      message,
    });
    return failed();
  }
  reportWithoutWeight(predictor, rows, report);
  if (predicted.outside.size > 0) report(rowsOutside(table.file, predicted.outside.size, predicted.count));
  const at = new Int32Array(table.rowCount).fill(-1);
  for (let k = 0; k < predicted.count; k++) at[kept[predicted.row[k]!]!] = k;
  at.forEach((k, row) => {
    if (k < 0) because[row] ??= 'the model has no answer there';
  });
  const lacking = new Int32Array(totals.length);
  at.forEach((k, row) => {
    if (k >= 0) return;
    lacking[0]!++;
    if (group !== null) lacking[group.codes[row]! + 1]!++;
  });
  return {
    record,
    interval,
    rows: { labelOf: all.labelOf, lines: table.lines, at, because, predicted },
    totals: totals.flatMap((total, k) =>
      total === null
        ? []
        : [{ group: k === 0 ? null : group!.names[k - 1]!, ...total, rows_not_predicted: lacking[k]! }],
    ),
    problems,
  };
}

function rowsOutside(file: string, outside: number, count: number): Problem {
  const rows =
    count === 1
      ? 'The row predicted lies'
      : `${wholeNumber(outside)} of the ${wholeNumber(count)} rows predicted ${outside === 1 ? 'lies' : 'lie'}`;
  const units = outside * 2 > count ? ' Look whether the file is in the units of the study.' : '';
  return {
    code: 'prediction_outside',
    severity: 'warning',
    place: { kind: 'file', file },
    message: `${rows} outside the data that the model was fitted to.`,
    hint: `Each prediction says how, under "outside".${units}`,
  };
}

function predictorIn(record: StudyRecord, path: string, report: Report): RecordedPredictor | null {
  const refuse = (message: string, hint?: string) => {
    report({
      code: 'record_cannot_predict',
      severity: 'error',
      place: { kind: 'file', file: path },
      message,
      ...(hint === undefined ? {} : { hint }),
    });
    return null;
  };
  if (record.model === null)
    return refuse('No candidate was admitted, so the record holds no model to predict with.');
  if (record.model.prediction === undefined) {
    return refuse(
      `The record was made by version ${record.tool.version}, which kept too little to predict from it alone.`,
      'Fit the study again.',
    );
  }
  const recorded = recordedPredictor(record.model, record.model.prediction);
  return typeof recorded === 'string' ? refuse(`The record does not hang together: ${recorded}.`) : recorded;
}

/** Names under which columns are read that are not among the model's variables; no variable can have such a name. */
const ROW_ID = ' row identity';
const GROUP = ' group';

function groupName({ predictor }: RecordedPredictor, totalBy: string): string {
  return predictor.inputs.some(({ name }) => name === totalBy) ? totalBy : GROUP;
}

async function readRows(
  recorded: RecordedPredictor,
  file: string,
  { totalBy, bytes, onProgress }: PredictRecordOptions,
  onBadCell: OnBadCell,
  report: Report,
): Promise<Table | null> {
  const { inputs, extras } = recorded.predictor;
  const byColumn = totalBy !== undefined && groupName(recorded, totalBy) === GROUP;
  const variables = [
    ...inputs,
    ...extras,
    ...(recorded.rowId === null ? [] : [plainVariable(ROW_ID, 'text', recorded.rowId)]),
    ...(byColumn ? [plainVariable(GROUP, 'category', totalBy)] : []),
  ];
  const plan: DataPlan = {
    file,
    format: recorded.format,
    missing: recorded.missing,
    rowId: recorded.rowId === null ? null : ROW_ID,
    time: null,
    variables,
    onBadValue: 'set_missing',
  };
  const table = await readTable(plan, '.', report, {
    require: new Set(inputs.map(({ name }) => name)),
    optional: new Set([...extras.map(({ name }) => name), GROUP]),
    ...(bytes === undefined ? {} : { bytes }),
    onBadCell,
    onProgress: (rows) => onProgress?.('reading rows', rows, null),
  });
  if (table === null) return null;
  const header = [...table.ignored, ...variables.map(({ column }) => column)].filter(
    (name) => name !== totalBy,
  );
  if (byColumn && !table.columns.has(GROUP)) {
    const near = nearest(totalBy, header);
    report({
      code: 'command_unusable',
      severity: 'error',
      place: { kind: 'command' },
      message: `--total-by names "${totalBy}", which is neither a variable of the model nor a column of ${file}.`,
      ...(near === null ? {} : { hint: `Did you mean ${near}?` }),
    });
    return null;
  }
  return table;
}

function plainVariable(name: string, type: VariablePlan['type'], column: string): VariablePlan {
  return {
    name,
    type,
    column,
    unit: null,
    label: null,
    atLeast: null,
    atMost: null,
    levels: null,
    baseline: null,
    flagValues: null,
    pattern: null,
    missing: [],
  };
}

/** The groups of a column's values in the order of their first rows; missing values are a group of their own. */
function groupsOf(column: Column): { readonly names: readonly string[]; readonly codes: Int32Array } {
  const codeOf = new Map<string, number>();
  const count = column.kind === 'category' ? column.codes.length : column.values.length;
  const codes = new Int32Array(count);
  for (let row = 0; row < count; row++) {
    const text = textAt(column, row);
    let code = codeOf.get(text);
    if (code === undefined) {
      code = codeOf.size;
      codeOf.set(text, code);
    }
    codes[row] = code;
  }
  return { names: [...codeOf.keys()], codes };
}

function textAt(column: Column, row: number): string {
  if (column.kind === 'category') return column.levels[column.codes[row]!] ?? '';
  if (column.kind === 'text') return column.values[row] ?? '';
  const value = column.values[row]!;
  if (Number.isNaN(value)) return '';
  if (column.kind === 'date') return formatDate(value);
  return column.kind === 'flag' ? (column.flagTexts?.[value as 0 | 1] ?? String(value)) : String(value);
}

/** Passes on the first problems of rows and counts the rest. */
function limited(report: Report, file: string): { readonly report: Report; readonly close: () => void } {
  let count = 0;
  return {
    report: (problem) => {
      count++;
      if (count <= MOST_NAMED) report(problem);
    },
    close: () => {
      const more = count - MOST_NAMED;
      if (more <= 0) return;
      const message = `${more} more reasons why rows cannot be predicted are not listed; the output has one for each row.`;
      report({ code: 'problems_more', severity: 'warning', place: { kind: 'file', file }, message });
    },
  };
}

import { setImmediate } from 'node:timers/promises';
import { predictColumnsFromRecord, type RecordPredictionColumns } from '../predict-record.ts';
import { hasError, type Problem } from '../problem.ts';
import { predictedRowsJson, predictedRowsTable, totalsTable } from '../record/predicted-rows.ts';
import type { CommonOptions } from './common-options.ts';
import { DONE, UNUSABLE } from './exit-status.ts';
import { progressOn } from './progress.ts';
import { showProblems } from './show-problems.ts';
import { sourceTexts } from './source-texts.ts';
import type { Terminal } from './terminal.ts';
import { writeText } from './write-text.ts';

export interface PredictCommandOptions extends CommonOptions {
  readonly out?: string;
  readonly format: 'csv' | 'json';
  readonly interval?: string;
  readonly total?: boolean;
  readonly totalBy?: string;
}

/** `plumbrule predict RECORD ROWS`: predictions from a recorded model; its study and data are not needed. */
export async function predictCommand(
  record: string,
  rows: string,
  options: PredictCommandOptions,
  terminal: Terminal,
): Promise<number> {
  const interval = options.interval === undefined ? undefined : intervalOf(options.interval);
  if (interval === null) {
    const message = `--interval is ${JSON.stringify(options.interval)}, but must be a number between 0 and 1.`;
    return refused([{ code: 'command_unusable', severity: 'error', place: { kind: 'command' }, message }]);
  }
  if (options.out === undefined && options.problems === 'json') {
    const message = '--problems json leaves no place for predictions on standard output.';
    const hint = 'Name a file with --out.';
    return refused([
      { code: 'command_unusable', severity: 'error', place: { kind: 'command' }, message, hint },
    ]);
  }
  const progress = progressOn(terminal, options.quiet === true);
  let predicted: RecordPredictionColumns;
  try {
    predicted = await predictColumnsFromRecord(record, rows === '-' ? 'standard input' : rows, {
      onProgress: progress.show,
      ...(interval === undefined ? {} : { interval }),
      ...(options.totalBy === undefined ? {} : { totalBy: options.totalBy }),
      ...(rows === '-' ? { bytes: process.stdin } : {}),
    });
  } finally {
    progress.clear();
  }
  const problems = [...predicted.problems];
  const wantsTotal = options.total === true || options.totalBy !== undefined;
  if (!hasError(problems) && wantsTotal && predicted.totals.length === 0) {
    problems.push({
      code: 'record_cannot_predict',
      severity: 'error',
      place: { kind: 'file', file: record },
      message: `No total is given: its interval is known on the natural scale only, and the model's response is on the ${predicted.record?.response.scale ?? ''} scale.`,
    });
  }
  if (!hasError(problems)) {
    const text =
      options.format === 'json'
        ? jsonTexts(predicted, wantsTotal)
        : wantsTotal
          ? [totalsTable(totalsAsked(predicted, options), options.totalBy ?? null)]
          : predictedRowsTable(predicted.rows);
    if (options.out === undefined) {
      for (const piece of text) {
        terminal.out(piece);
        // That a reader has had enough is only told between two turns of the loop of events.
        await setImmediate();
      }
    } else await writeText(options.out, text, (problem) => problems.push(problem));
  }
  await showProblems(problems, await sourceTexts(problems), options.problems, terminal);
  return hasError(problems) ? UNUSABLE : DONE;

  async function refused(found: readonly Problem[]): Promise<number> {
    await showProblems(found, new Map(), options.problems, terminal);
    return UNUSABLE;
  }
}

function totalsAsked({ totals }: RecordPredictionColumns, { totalBy }: PredictCommandOptions) {
  return totalBy === undefined ? totals.slice(0, 1) : totals;
}

function intervalOf(text: string): number | null {
  const value = /^\d*\.?\d+(?:[eE][-+]?\d+)?$/.test(text) ? Number(text) : Number.NaN;
  return value > 0 && value < 1 ? value : null;
}

/** One row to a line, so that the text can be read and compared by lines. */
function* jsonTexts(
  { record, interval, rows, totals }: RecordPredictionColumns,
  withTotals: boolean,
): Generator<string> {
  const head = {
    format: 'plumbrule-predictions/1',
    record: {
      study: record!.study.file,
      sha256: record!.study.sha256,
      data_sha256: record!.data.sha256,
      candidate: record!.selection.chosen,
      response: record!.response,
    },
    interval,
  };
  yield `${JSON.stringify(head).slice(0, -1)},\n"predictions":[\n`;
  yield* predictedRowsJson(rows);
  yield '\n]';
  if (withTotals) yield `,\n"totals":[\n${totals.map((total) => JSON.stringify(total)).join(',\n')}\n]`;
  yield '}\n';
}

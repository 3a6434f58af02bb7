import type { Problem, ProblemCode, Report } from '../problem.ts';
import type { DataPlan } from '../study/study.ts';
import { checkRowIds } from './check-row-ids.ts';
import { decodeText } from './decode-text.ts';
import { gatherFaults, type OnBadCell } from './faults.ts';
import { checkBaseline, type Filling, finishColumn, startColumns, takeWholeRows } from './fill-columns.ts';
import { findDelimiter } from './find-delimiter.ts';
import { type HeaderMatch, matchHeader } from './match-header.ts';
import { type ByteSource, brokenOff, isReadingError, openBytes, streamedBytes } from './read-bytes.ts';
import { splitRows } from './split-rows.ts';
import { summarise } from './summarise.ts';
import type { Table } from './table.ts';
import { warnOfLikeLevels } from './warn-of-like-levels.ts';
import { watchEncoding } from './watch-encoding.ts';

export interface ReadTableOptions {
  /** Faulty rows and cells listed one by one; the rest are counted. Default 20. */
  readonly limit?: number;
  /** Called with the rows read so far, after each stretch of the file. */
  readonly onProgress?: (rows: number) => void;
  /**
   * Names of the variables that must be there, for a file that need not hold them all: the others are not read,
   * except the row identity where it is present, which then need not be unique. Default: all that are declared.
   */
  readonly require?: 'all' | ReadonlySet<string>;
  /** With `require`: names of variables that are read where they are present. */
  readonly optional?: ReadonlySet<string>;
  readonly onBadCell?: OnBadCell;
  /** Bytes to read instead of those of the file, whose name is then only shown. */
  readonly bytes?: AsyncIterable<Uint8Array>;
  /** Bytes read at a time; the table does not depend on it. */
  readonly chunkSize?: number;
  /** Bytes by which the delimiter is judged where none is declared. */
  readonly headSize?: number;
}

/**
 * A CSV file (RFC 4180) as typed columns, checked against its declared contract:
 * bytes → text → rows → header → columns → identities → table. Null where it cannot be used; every fault is
 * reported with its place. Cells are trimmed, except texts; lines that are blank are left out; codes for missing are
 * compared before anything else, whether or not the cell stands in quotes.
 */
export async function readTable(
  plan: DataPlan,
  folder: string,
  report: Report,
  options: ReadTableOptions = {},
): Promise<Table | null> {
  const source =
    options.bytes === undefined
      ? await openBytes(plan.file, folder, options.chunkSize ?? 65_536, report)
      : streamedBytes(options.bytes);
  if (source === null) return null;
  try {
    const read = await readRows(plan, source, report, options);
    const sha256 = read === null ? null : await source.finish();
    if (await source.hasChanged()) {
      report(
        fileProblem(
          plan,
          'data_changed',
          'changed while it was being read.',
          'Run it again when nothing writes to the file.',
        ),
      );
      return null;
    }
    return read === null || sha256 === null ? null : { ...read, sha256 };
  } catch (error) {
    if (!isReadingError(error)) throw error;
    report(brokenOff(plan.file, error));
    return null;
  } finally {
    await source.close();
  }
}

async function readRows(
  plan: DataPlan,
  source: ByteSource,
  report: Report,
  {
    limit = 20,
    onProgress,
    require = 'all',
    optional: wanted,
    onBadCell,
    headSize = 65_536,
  }: ReadTableOptions,
): Promise<Omit<Table, 'sha256'> | null> {
  const whole = require === 'all';
  const required = whole ? new Set(plan.variables.map((variable) => variable.name)) : require;
  const optional = new Set([...(wanted ?? []), ...(plan.rowId === null ? [] : [plan.rowId])]);

  const decoded = await decodeText(source.bytes, plan.format.encoding, headSize);
  if (decoded.utf16) {
    report(
      fileProblem(plan, 'cell_encoding', 'begins with the byte-order mark of UTF-16.', 'Save it as UTF-8.'),
    );
    return null;
  }
  const expected = plan.variables.filter((one) => required.has(one.name)).map((one) => one.column);
  const { newline, head } = decoded;
  const delimiter = plan.format.delimiter ?? findDelimiter(head, newline, new Set(expected));

  if (/^$|["\r\n\ufeff]/.test(delimiter)) {
    report(fileProblem(plan, 'data_unreadable', 'cannot be divided by a quote, a line end or nothing.'));
    return null;
  }

  const faults = gatherFaults(plan, limit, onBadCell);
  const encoding = watchEncoding(plan);
  const lines: (readonly number[])[] = [];
  let header: { cells: readonly string[]; match: HeaderMatch; fillings: readonly Filling[] } | null = null;
  let rowCount = 0;
  let rowsExpected = 0;
  let broken: Problem | null = null;

  for await (const batch of splitRows(decoded.pieces, { delimiter, newline }, plan.file)) {
    broken = batch.fault;
    let first = 0;
    if (header === null) {
      const cells = batch.cells[0];
      if (cells === undefined) continue;
      const line = batch.lines[0]!;
      if (batch.replaced) encoding.rejects(cells, line, cells);
      const match = matchHeader(plan, cells, line, required, optional, report);
      const fillings = startColumns(plan, match.found, faults, report);
      if (fillings === null || (fillings.length === 0 && !match.complete)) {
        encoding.settle(report);
        return null;
      }
      header = { cells, match, fillings };
      first = 1;
    }
    const rows = takeWholeRows(batch, first, header.cells, faults, encoding);
    if (rowsExpected === 0 && rows.cells.length > 0)
      rowsExpected = expectedRows(source.size, rows.cells.length / decoded.headBytes);
    for (const { builder } of header.fillings) builder.fill(rows, rowCount, rowsExpected);
    lines.push(rows.lines);
    rowCount += rows.cells.length;
    onProgress?.(rowCount);
  }

  if (header === null) {
    report(broken ?? fileProblem(plan, 'data_empty', 'is empty.'));
    return null;
  }
  const { match, fillings } = header;
  const rowLines = joinLines(lines, rowCount);
  const filled = fillings.map((filling) => finishColumn(plan, filling, rowCount));
  const id = whole ? filled.find(({ variable }) => variable.name === plan.rowId) : undefined;
  if (id !== undefined) checkRowIds(plan, id, faults, rowLines);

  const sound = faults.settle(report);
  const decodable = encoding.settle(report);
  const based = !whole || filled.filter((one) => !checkBaseline(plan, one, report)).length === 0;
  if (whole) for (const one of filled) warnOfLikeLevels(plan, one, report);
  if (broken !== null) report(broken);
  const noRows = broken === null && sound && decodable && rowCount === 0;
  if (noRows) report(fileProblem(plan, 'data_no_rows', 'has a header and no rows.'));
  if (!match.complete || !sound || !decodable || !based || broken !== null || noRows) return null;

  const declared = plan.variables.flatMap((one) => filled.filter(({ variable }) => variable === one));
  return {
    file: plan.file,
    rowCount,
    columns: new Map(declared.map(({ column }) => [column.name, column])),
    lines: rowLines,
    ignored: match.ignored,
    badValues: faults.badValues(),
    badValueCount: faults.badValueCount(),
    badRows: faults.badRows(rowCount),
    summaries: declared.map(({ variable, column, bad }) => summarise(variable, column, bad)),
    format: { delimiter, encoding: decoded.encoding },
  };
}

/** Rows to make room for, at as many a byte as the first of them have, and a few more; 0 where the size is not known. */
function expectedRows(size: number | null, perByte: number): number {
  return size === null ? 0 : Math.ceil(size * perByte * 1.05) + 16;
}

function joinLines(parts: readonly (readonly number[])[], rowCount: number): Uint32Array {
  const all = new Uint32Array(rowCount);
  let at = 0;
  for (const part of parts) {
    all.set(part, at);
    at += part.length;
  }
  return all;
}

function fileProblem(plan: DataPlan, code: ProblemCode, what: string, hint?: string): Problem {
  return {
    code,
    severity: 'error',
    place: { kind: 'file', file: plan.file },
    message: `The data file ${plan.file} ${what}`,
    ...(hint === undefined ? {} : { hint }),
  };
}

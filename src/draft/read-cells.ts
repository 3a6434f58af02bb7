import { decodeText } from '../data/decode-text.ts';
import { findDelimiter } from '../data/find-delimiter.ts';
import { brokenOff, isReadingError, openBytes } from '../data/read-bytes.ts';
import { splitRows } from '../data/split-rows.ts';
import type { Problem, Report } from '../problem.ts';

/** The cells of a data file that nothing is declared of yet, trimmed, by column. */
export interface Cells {
  readonly header: readonly string[];
  /** By column: the cells of all rows. */
  readonly columns: readonly (readonly string[])[];
  readonly rowCount: number;
  readonly delimiter: string;
  readonly encoding: 'utf-8' | 'latin-1';
}

const CHUNK = 65_536;

/**
 * Reads a file as UTF-8, or as Latin-1 where it is none. A row with another number of cells than the header, and whatever
 * else keeps a study from reading the file, is an error here too. Null after one.
 */
export async function readCells(file: string, report: Report): Promise<Cells | null> {
  const first = await read(file, 'utf-8', report);
  return first === 'not UTF-8' ? ((await read(file, 'latin-1', report)) as Cells | null) : first;
}

async function read(
  file: string,
  encoding: 'utf-8' | 'latin-1',
  report: Report,
): Promise<Cells | 'not UTF-8' | null> {
  const source = await openBytes(file, '.', CHUNK, report);
  if (source === null) return null;
  const refuse = (code: Problem['code'], message: string, row?: number) => {
    const place =
      row === undefined ? ({ kind: 'file', file } as const) : ({ kind: 'cell', file, row } as const);
    report({ code, severity: 'error', place, message });
    return null;
  };
  try {
    const decoded = await decodeText(source.bytes, encoding, CHUNK);
    if (decoded.utf16) return refuse('cell_encoding', `The data file ${file} is UTF-16; save it as UTF-8.`);
    const { newline } = decoded;
    const delimiter = findDelimiter(decoded.head, newline, new Set());
    let header: string[] | null = null;
    const columns: string[][] = [];
    let rowCount = 0;
    for await (const batch of splitRows(decoded.pieces, { delimiter, newline }, file)) {
      if (batch.replaced) return 'not UTF-8';
      if (batch.fault !== null) {
        report(batch.fault);
        return null;
      }
      for (const [k, row] of batch.cells.entries()) {
        if (header === null) {
          header = row.map((name) => name.trim());
          for (const _ of header) columns.push([]);
          continue;
        }
        if (row.length !== header.length) {
          const message = `The row has ${row.length} cells where the header has ${header.length}.`;
          return refuse('row_ragged', message, batch.lines[k]!);
        }
        row.forEach((cell, column) => {
          columns[column]!.push(cell.trim());
        });
        rowCount++;
      }
    }
    if (header === null) return refuse('data_empty', `The data file ${file} is empty.`);
    if (rowCount === 0) return refuse('data_no_rows', `The data file ${file} has a header and no rows.`);
    return { header, columns, rowCount, delimiter, encoding };
  } catch (error) {
    if (!isReadingError(error)) throw error;
    report(brokenOff(file, error));
    return null;
  } finally {
    await source.close();
  }
}

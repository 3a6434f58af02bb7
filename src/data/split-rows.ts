import Papa from 'papaparse';
import type { Problem } from '../problem.ts';
import type { TextPiece } from './decode-text.ts';

/** No row may hold more characters than this (16 Mi): beyond it a quote has been left open. */
export const LONGEST_ROW = 1 << 24;

export interface RowBatch {
  /** Rows of cells, blank lines left out. */
  readonly cells: string[][];
  /** Line on which each row starts, counted from 1 by the file's own line ends, also those inside quoted cells. */
  readonly lines: number[];
  /** Whether bytes that are not UTF-8 have been replaced so far. */
  readonly replaced: boolean;
  /** Set on the last batch where the rows cannot be told apart any further. */
  readonly fault: Problem | null;
}

export interface Dialect {
  readonly delimiter: string;
  readonly newline: '\n' | '\r';
}

interface Parsed {
  data: string[][];
  errors: { code: string; row: number; index: number }[];
  meta: { cursor: number };
}

/** The row parser of RFC 4180 for a dialect; `partial` keeps back a last row that may go on in later text. */
export function rowParser(
  { delimiter, newline }: Dialect,
  preview = 0,
): (text: string, partial: boolean) => Parsed {
  const parser = new Papa.Parser({ delimiter, newline, ...(preview > 0 ? { preview } : {}) });
  return (text, partial) => parser.parse(text, 0, partial) as Parsed;
}

/**
 * Text to rows. The pieces may be cut anywhere: what is not yet a whole row waits for the next piece, and a row
 * that spans many pieces is tried again only when its text has doubled, so that its cost stays linear.
 */
export async function* splitRows(
  pieces: AsyncIterable<TextPiece>,
  dialect: Dialect,
  file: string,
): AsyncGenerator<RowBatch> {
  const parse = rowParser(dialect);
  const { newline } = dialect;
  let rest = '';
  let line = 1;
  let tryAt = 0;
  let replaced = false;

  for await (const piece of pieces) {
    rest += piece.text;
    replaced ||= piece.replaced;
    const nul = piece.text.includes('\0') ? rest.indexOf('\0') : -1;
    if (rest.length < tryAt && !piece.last && nul < 0) continue;
    const text = nul < 0 ? rest : rest.slice(0, nul);
    const { data, errors, meta } = parse(text, !piece.last || nul >= 0);
    // A fault in a row that is not whole yet may only be for want of the text to come.
    const broken = errors.find((error) => error.row < data.length);
    if (broken !== undefined) data.length = broken.row;
    const startLine = line;
    const lines = new Array<number>(data.length);
    const quoted = text.includes('"');
    const returns = newline === '\n' && text.includes('\r');
    let kept = 0;
    for (const row of data) {
      if (returns) dropReturn(row);
      const at = line;
      line += 1;
      if (quoted) for (const cell of row) line += count(cell, newline);
      if (row.length === 1 && row[0]!.trim() === '') continue;
      data[kept] = row;
      lines[kept] = at;
      kept++;
    }
    data.length = kept;
    lines.length = kept;
    let fault: Problem | null = null;
    if (broken !== undefined) {
      const opens = startLine + count(text.slice(0, broken.index), newline);
      fault = quoteFault(file, opens, broken.code === 'MissingQuotes');
    } else if (nul >= 0) {
      fault = nulFault(file, startLine + count(text, newline));
    } else if (piece.last) {
      rest = '';
    } else {
      rest = text.slice(meta.cursor);
      tryAt = meta.cursor === 0 ? text.length * 2 : 0;
      if (rest.length > LONGEST_ROW) fault = longFault(file, line, rest, parse, newline);
    }
    yield { cells: data, lines, replaced, fault };
    if (fault !== null) return;
  }
}

/** The row end is taken at LF, so the CR of a CRLF is still on the row's last cell. */
function dropReturn(row: string[]): void {
  const last = row.length - 1;
  const cell = row[last]!;
  if (cell.endsWith('\r')) row[last] = cell.slice(0, -1);
}

function count(text: string, character: string): number {
  let found = 0;
  for (let at = text.indexOf(character); at >= 0; at = text.indexOf(character, at + 1)) found++;
  return found;
}

function quoteFault(file: string, row: number, unclosed: boolean): Problem {
  const place = { kind: 'cell', file, row } as const;
  return {
    code: 'quote_unclosed',
    severity: 'error',
    place,
    message: unclosed
      ? `The quote that opens in line ${row} is not closed before the end of the file.`
      : `The quote that opens in line ${row} is not closed where its cell ends.`,
    hint: 'Inside a quoted cell a quote is written twice, and the closing quote is followed by the delimiter or the end of the line.',
  };
}

function longFault(
  file: string,
  line: number,
  text: string,
  parse: (text: string, partial: boolean) => Parsed,
  newline: string,
): Problem {
  const open = parse(text, false).errors[0];
  if (open !== undefined) {
    const row = line + count(text.slice(0, open.index), newline);
    return {
      code: 'quote_unclosed',
      severity: 'error',
      place: { kind: 'cell', file, row },
      message: `The quote that opens in line ${row} is not closed within ${LONGEST_ROW} characters.`,
    };
  }
  return {
    code: 'data_unreadable',
    severity: 'error',
    place: { kind: 'cell', file, row: line },
    message: `The row that starts in line ${line} is longer than ${LONGEST_ROW} characters.`,
    hint: 'Check that the file is a table of text with one row a line.',
  };
}

function nulFault(file: string, row: number): Problem {
  return {
    code: 'cell_encoding',
    severity: 'error',
    place: { kind: 'cell', file, row },
    message: 'The line holds a character of code 0, which no text has.',
    hint: 'The file may be UTF-16 or not a text file; save it as CSV in UTF-8.',
  };
}

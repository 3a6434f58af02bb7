import { endianness } from 'node:os';
import type { Problem } from '../problem.ts';
import type { TextPiece } from './decode-text.ts';

/** No row may hold more characters than this (16 Mi): beyond it a quote has been left open. */
export const LONGEST_ROW = 1 << 24;

/**
 * Rows of cells as places in one text, so that a number is read where it stands and no string is made of it. All of it
 * holds until the next rows are parsed.
 */
export interface CellRows {
  readonly text: string;
  /** The text's UTF-16 code units, which are quicker to look at than those of a string. */
  readonly codes: Uint16Array;
  /** By cell: where it starts and ends in `text`. */
  readonly starts: Int32Array;
  readonly ends: Int32Array;
  /** By row: its first cell, how many it has, and the line on which it starts. */
  readonly first: Int32Array;
  readonly widths: Int32Array;
  readonly lines: Uint32Array;
  readonly count: number;
}

/** One cell of a row. */
export function cellText({ text, starts, ends, first }: CellRows, row: number, position: number): string {
  const cell = first[row]! + position;
  return text.slice(starts[cell]!, ends[cell]!);
}

/** All cells of a row. */
export function rowTexts(rows: CellRows, row: number): string[] {
  return Array.from({ length: rows.widths[row]! }, (_, position) => cellText(rows, row, position));
}

export interface RowBatch {
  /** Blank lines left out; lines are counted from 1 by the file's own line ends, also those inside quoted cells. */
  readonly rows: CellRows;
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
  readonly rows: CellRows;
  /** Where the first character after the rows stands, and its line. */
  readonly cursor: number;
  readonly line: number;
  /** A quote that opens just before `at` and is not closed, or not where its cell ends: no row is told apart after it. */
  readonly fault: { readonly at: number; readonly unclosed: boolean } | null;
}

const QUOTE = 34;
const RETURN = 13;

/**
 * The row parser of RFC 4180 for a dialect. Besides what it asks, a quote within a cell that does not start with one is
 * a character like any other, and blanks may stand between a closing quote and the end of its cell. `partial` keeps back a
 * last row that may go on in later text.
 */
export function rowParser(
  { delimiter, newline }: Dialect,
  preview = Number.POSITIVE_INFINITY,
): (text: string, partial: boolean, firstLine: number) => Parsed {
  const ending = newline.charCodeAt(0);
  const dividing = delimiter.charCodeAt(0);
  const single = delimiter.length === 1;
  const returns = newline === '\n';
  // Used again for every text: a file has many.
  const held = { starts: new Int32Array(1024), ends: new Int32Array(1024) };
  const codesIn = codeReader();
  let [first, widths, lines] = [new Int32Array(128), new Int32Array(128), new Uint32Array(128)];

  return (text, partial, firstLine) => {
    const { length } = text;
    const codes = codesIn(text);
    // Quoted cells with doubled quotes, undoubled: they are put behind the text.
    const undoubled: string[] = [];
    let behind = length;
    let fault: Parsed['fault'] = null;
    let { starts, ends } = held;
    let cursor = 0;
    let line = firstLine;
    let cells = 0;
    let count = 0;

    reading: while (cursor < length && count < preview) {
      const firstCell = cells;
      let within = 0;
      let i = cursor;
      for (;;) {
        if (cells === starts.length) {
          starts = held.starts = larger(starts);
          ends = held.ends = larger(ends);
        }
        if (codes[i] === QUOTE) {
          const opens = i + 1;
          let doubled = false;
          let closes = text.indexOf('"', opens);
          while (closes >= 0 && codes[closes + 1] === QUOTE) {
            doubled = true;
            closes = text.indexOf('"', closes + 2);
          }
          if (closes < 0) {
            if (!partial) fault = { at: opens, unclosed: true };
            break reading;
          }
          i = closes + 1;
          while (i < length && !text.startsWith(delimiter, i) && codes[i] !== ending) {
            if (text.charAt(i).trim() !== '') {
              fault = { at: opens, unclosed: false };
              break reading;
            }
            i++;
          }
          const value = text.slice(opens, closes);
          within += occurrences(value, newline);
          if (doubled) {
            const single = value.replaceAll('""', '"');
            undoubled.push(single);
            starts[cells] = behind;
            behind += single.length;
            ends[cells] = behind;
          } else {
            starts[cells] = opens;
            ends[cells] = closes;
          }
        } else {
          starts[cells] = i;
          for (; i < length; i++) {
            const code = codes[i];
            if (code === ending || (code === dividing && (single || text.startsWith(delimiter, i)))) break;
          }
          // The row end is taken at LF, so the CR of a CRLF is still on the row's last cell.
          const returned = returns && i > starts[cells]! && codes[i - 1] === RETURN;
          ends[cells] = returned && (i >= length || codes[i] === ending) ? i - 1 : i;
        }
        cells++;
        if (i >= length) {
          if (partial) break reading;
          break;
        }
        if (codes[i] === ending) break;
        i += delimiter.length;
      }
      const blank = cells === firstCell + 1 && isBlank(text, undoubled, starts[firstCell]!, ends[firstCell]!);
      if (blank) {
        cells = firstCell;
      } else {
        if (count === first.length) [first, widths, lines] = [larger(first), larger(widths), larger(lines)];
        first[count] = firstCell;
        widths[count] = cells - firstCell;
        lines[count] = line;
        count++;
      }
      line += 1 + within;
      cursor = Math.min(length, i + 1);
    }
    const all = undoubled.length === 0 ? text : text + undoubled.join('');
    const allCodes = undoubled.length === 0 ? codes : codesIn(all);
    return {
      rows: { text: all, codes: allCodes, starts, ends, first, widths, lines, count },
      cursor,
      line,
      fault,
    };
  };
}

/** A text's code units and one 0 after them, in an array that is used again. */
function codeReader(): (text: string) => Uint16Array {
  let bytes = Buffer.alloc(0);
  let codes = new Uint16Array(0);
  return (text) => {
    if (codes.length <= text.length) {
      codes = new Uint16Array(Math.max(1 << 17, text.length + 1));
      bytes = Buffer.from(codes.buffer);
    }
    const written = bytes.write(text, 'utf16le');
    if (BIG_ENDIAN) bytes.subarray(0, written).swap16();
    codes[text.length] = 0;
    return codes;
  };
}

const BIG_ENDIAN = endianness() === 'BE';

function isBlank(text: string, undoubled: readonly string[], start: number, end: number): boolean {
  // What was undoubled holds a quote.
  return (undoubled.length === 0 || end <= text.length) && text.slice(start, end).trim() === '';
}

function larger<V extends Int32Array | Uint32Array>(places: V): V {
  const more = new (places.constructor as new (length: number) => V)(places.length * 2);
  more.set(places);
  return more;
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
    const startLine = line;
    const parsed = parse(text, !piece.last || nul >= 0, startLine);
    line = parsed.line;
    let fault: Problem | null = null;
    if (parsed.fault !== null) {
      const { at, unclosed } = parsed.fault;
      fault = quoteFault(file, startLine + occurrences(text.slice(0, at), newline), unclosed);
    } else if (nul >= 0) {
      fault = nulFault(file, startLine + occurrences(text, newline));
    } else if (piece.last) {
      rest = '';
    } else {
      rest = text.slice(parsed.cursor);
      tryAt = parsed.cursor === 0 ? text.length * 2 : 0;
      if (rest.length > LONGEST_ROW) fault = longFault(file, line, rest, dialect);
    }
    yield { rows: parsed.rows, replaced, fault };
    if (fault !== null) return;
  }
}

function occurrences(text: string, character: string): number {
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

function longFault(file: string, line: number, text: string, dialect: Dialect): Problem {
  const open = rowParser(dialect)(text, false, line).fault;
  if (open !== null) {
    const row = line + occurrences(text.slice(0, open.at), dialect.newline);
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

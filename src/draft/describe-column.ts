import { datePatternReader, readIsoDate } from '../data/read-date.ts';
import { readUsualFlag } from '../data/read-flag.ts';
import { readNumber } from '../data/read-number.ts';
import type { VariableType } from '../study/study.ts';

/** What a column of cells seems to hold. */
export interface ColumnSeen {
  readonly type: VariableType;
  /** Cells beside the usual ones that seem to mean a missing value. */
  readonly missingCodes: readonly string[];
  readonly missing: number;
  /** Levels of a category, most frequent first. */
  readonly levels: readonly { readonly text: string; readonly rows: number }[];
  /** Of a date; null for ISO 8601. */
  readonly pattern: string | null;
  /** Other patterns that fit every date as well. */
  readonly otherPatterns: readonly string[];
  /** Numbers, days of dates, 0 and 1 of flags, or codes of levels; NaN where missing. Empty for texts. */
  readonly values: Float64Array;
  /** Whether a flag is written as 0 and 1. */
  readonly isDigits: boolean;
  /** Whether no two rows have the same text and none is missing. */
  readonly unique: boolean;
  /** The smallest and the largest as spelt, of numbers and dates. */
  readonly range: readonly [string, string] | null;
}

/** Cells read as missing in every column where a study does not say otherwise. */
export const USUAL_MISSING: readonly string[] = ['', 'NA', 'n/a'];

/** Further cells that mean a missing value among numbers and dates. */
const CODES: ReadonlySet<string> = new Set([
  'N/A',
  '#N/A',
  'NaN',
  'nan',
  'null',
  'NULL',
  'None',
  'none',
  '-',
  '–',
  '--',
  '.',
  '..',
  '?',
  'missing',
]);

const PATTERNS: readonly string[] = [
  'DD.MM.YYYY',
  'DD/MM/YYYY',
  'MM/DD/YYYY',
  'YYYY/MM/DD',
  'DD-MM-YYYY',
  'YYYY-MM',
  'MM/YYYY',
];

/** A text of more levels than this is not proposed as a category … */
const MOST_LEVELS = 30;
/** … nor one with fewer rows a level than this, on average. */
const FEWEST_ROWS = 3;

/** How a file writes its numbers: with a comma where more columns are all numbers that way. */
export function findDecimalMark(columns: readonly (readonly string[])[], delimiter: string): '.' | ',' {
  if (delimiter === ',') return '.';
  const numeric = (mark: '.' | ',') =>
    columns.filter((cells) => numbersOf(cells, mark) !== null && cells.some((cell) => cell !== '')).length;
  return numeric(',') > numeric('.') ? ',' : '.';
}

/** What a column seems to hold, from all of its cells. */
export function describeColumn(cells: readonly string[], decimalMark: '.' | ','): ColumnSeen {
  const present = cells.filter((cell) => !USUAL_MISSING.includes(cell));
  const codes = [...new Set(present.filter((cell) => CODES.has(cell)))];
  const base = {
    missingCodes: codes,
    levels: [],
    pattern: null,
    otherPatterns: [],
    isDigits: present.every((cell) => /^[01]$/.test(cell) || CODES.has(cell)),
    unique: present.length === cells.length && new Set(cells).size === cells.length,
    range: null,
  };
  const real = present.filter((cell) => !CODES.has(cell));
  const missing = cells.length - real.length;
  if (real.length > 0) {
    const flags = valuesOf(cells, readUsualFlag);
    if (flags !== null && new Set(real.map((cell) => cell.toLowerCase())).size === 2) {
      return { ...base, type: 'flag', missing, values: flags };
    }
    const numbers = numbersOf(cells, decimalMark);
    if (numbers !== null) {
      const whole = numbers.every((value) => Number.isNaN(value) || Number.isSafeInteger(value));
      return {
        ...base,
        type: whole ? 'integer' : 'number',
        missing,
        values: numbers,
        range: rangeOf(cells, numbers),
      };
    }
    const iso = valuesOf(cells, readIsoDate);
    if (iso !== null) return { ...base, type: 'date', missing, values: iso, range: rangeOf(cells, iso) };
    const fitting = PATTERNS.filter((pattern) => valuesOf(cells, datePatternReader(pattern)!) !== null);
    const [pattern, ...others] = fitting;
    if (pattern !== undefined) {
      const days = valuesOf(cells, datePatternReader(pattern)!)!;
      return {
        ...base,
        type: 'date',
        missing,
        values: days,
        pattern,
        otherPatterns: others,
        range: rangeOf(cells, days),
      };
    }
  }
  // Among texts, a word such as "none" is as likely a level as a missing value.
  const words = { ...base, missingCodes: [], missing: cells.length - present.length };
  const counts = new Map<string, number>();
  for (const cell of present) counts.set(cell, (counts.get(cell) ?? 0) + 1);
  const fewest = present.length / FEWEST_ROWS;
  if (counts.size >= 2 && counts.size <= MOST_LEVELS && counts.size <= fewest) {
    const levels = [...counts].sort((a, b) => b[1] - a[1]).map(([text, rows]) => ({ text, rows }));
    const codeOf = new Map(levels.map(({ text }, code) => [text, code]));
    const values = Float64Array.from(cells, (cell) => codeOf.get(cell) ?? Number.NaN);
    return { ...words, type: 'category', levels, values };
  }
  const type = words.unique && cells.every((cell) => cell.length <= 40) ? 'identifier' : 'text';
  return { ...words, type, values: new Float64Array(0) };
}

/** The cells as values; null where one that is neither empty nor a code for missing is none. */
function valuesOf(cells: readonly string[], readCell: (cell: string) => number): Float64Array | null {
  const values = new Float64Array(cells.length);
  for (let row = 0; row < cells.length; row++) {
    const cell = cells[row]!;
    const value = USUAL_MISSING.includes(cell) ? Number.NaN : readCell(cell);
    if (Number.isNaN(value) && !USUAL_MISSING.includes(cell) && !CODES.has(cell)) return null;
    values[row] = value;
  }
  return values;
}

function numbersOf(cells: readonly string[], mark: '.' | ','): Float64Array | null {
  return valuesOf(cells, (cell) => readNumber(cell, mark));
}

function rangeOf(cells: readonly string[], values: Float64Array): readonly [string, string] | null {
  let [least, most] = [-1, -1];
  for (let row = 0; row < values.length; row++) {
    if (Number.isNaN(values[row]!)) continue;
    if (least < 0 || values[row]! < values[least]!) least = row;
    if (most < 0 || values[row]! > values[most]!) most = row;
  }
  return least < 0 ? null : [cells[least]!, cells[most]!];
}

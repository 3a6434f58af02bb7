import { wholeNumber } from '../numerals.ts';
import type { Problem, Report } from '../problem.ts';
import type { DataPlan } from '../study/study.ts';

/** Rows in which bytes were not UTF-8: one problem for the file, with the first place and the count. */
export interface EncodingWatch {
  /** Whether a row, decoded with replacements, holds one; it is counted, and nothing more can be said of it. */
  readonly rejects: (row: readonly string[], line: number, header: readonly string[]) => boolean;
  /** Reports what was found, and says whether all was UTF-8. */
  readonly settle: (report: Report) => boolean;
}

export function watchEncoding(plan: DataPlan): EncodingWatch {
  let rows = 0;
  let first: { row: number; variable: string | null } | null = null;
  return {
    rejects: (row, line, header) => {
      const position = row.findIndex((cell) => cell.includes('\ufffd'));
      if (position < 0) return false;
      rows++;
      if (first === null) {
        const column = header[position]?.trim() || null;
        const declared = plan.variables.find((variable) => variable.column === column);
        first = { row: line, variable: declared?.name ?? column };
      }
      return true;
    },
    settle: (report) => {
      if (first === null) return true;
      report(notUtf8(plan.file, first, rows));
      return false;
    },
  };
}

function notUtf8(file: string, first: { row: number; variable: string | null }, rows: number): Problem {
  const { row, variable } = first;
  const count = rows === 1 ? 'One row holds' : `${wholeNumber(rows)} rows hold`;
  return {
    code: 'cell_encoding',
    severity: 'error',
    place: { kind: 'cell', file, row, ...(variable === null ? {} : { variable }) },
    message: `${count} bytes that are not UTF-8${rows === 1 ? '' : `, line ${row} first`}.`,
    hint: 'Declare encoding: latin-1 under data.format, or save the file as UTF-8.',
  };
}

import { wholeNumber } from '../numerals.ts';
import type { Problem, Report } from '../problem.ts';
import type { DataPlan, VariablePlan } from '../study/study.ts';
import { type CellFault, FAULT_KINDS, faultSentence, showText } from './fault-sentence.ts';
import { listedValues } from './listed-values.ts';
import { readNumber } from './read-number.ts';
import type { BadValue } from './table.ts';

/** The text of a listed bad value is cut here; the whole cell stands in the file. */
const LONGEST_LISTED_TEXT = 200;

/** The bad cells of one variable. */
export interface ColumnFaults {
  readonly variable: VariablePlan;
  /** Order of the column in the file. */
  readonly position: number;
  /** One more bad cell; `row` is the row's index in the table, `text` is trimmed; `earlierLine` is that of the row with the same identity. */
  readonly add: (code: CellFault, row: number, line: number, text: string, earlierLine?: number) => void;
  readonly count: () => number;
}

/**
 * Everything wrong with rows and cells. Each column keeps only its first `limit` faults and counts the rest, so a
 * file that is wrong in every cell costs no more memory than a good one; the first `limit` of the file are among
 * them in whatever order the columns are filled.
 */
export interface Faults {
  readonly ofColumn: (variable: VariablePlan, position: number) => ColumnFaults;
  readonly ragged: (line: number, cells: number, expected: number) => void;
  /** Whether the row is to be left out because of a fault met so far. */
  readonly leftOut: (row: number) => boolean;
  /** Reports everything, and says whether the table can be used. */
  readonly settle: (report: Report) => boolean;
  /** At most `limit` bad cells in file order, the first of each text among them. */
  readonly badValues: () => BadValue[];
  readonly badValueCount: () => number;
  /** 1 for each row to be left out, or null. */
  readonly badRows: (rowCount: number) => Uint8Array | null;
}

interface Listed {
  readonly line: number;
  readonly position: number;
  readonly problem: Problem;
  readonly text: string;
  /** How many more cells of the column have the same undeclared level; absent for a row. */
  readonly again?: () => number;
}

interface KindCount {
  readonly code: CellFault;
  readonly firstLine: number;
  readonly firstText: string;
  count: number;
}

interface Gathered {
  readonly variable: VariablePlan;
  readonly position: number;
  /** Faults that stop, and faults that are only listed. */
  readonly stopping: Listed[];
  readonly borne: Listed[];
  readonly kinds: Map<CellFault, KindCount>;
  /** Of the listed undeclared levels, how many more cells have each. */
  readonly again: Map<string, number>;
  stoppingCount: number;
  borneCount: number;
}

/** Told of every bad cell; `row` is its row in the table, `text` is trimmed. */
export type OnBadCell = (variable: string, row: number, code: CellFault, text: string) => void;

export function gatherFaults(plan: DataPlan, limit: number, onBadCell: OnBadCell = () => {}): Faults {
  const columns: Gathered[] = [];
  const ragged: Listed[] = [];
  let raggedCount = 0;
  let marks = new Uint8Array(0);

  const mark = (row: number): void => {
    if (row >= marks.length) {
      const grown = new Uint8Array(Math.max(row + 1, marks.length * 2, 1024));
      grown.set(marks);
      marks = grown;
    }
    marks[row] = 1;
  };

  const stops = (code: CellFault): boolean =>
    plan.onBadValue === 'stop' ||
    (plan.onBadValue === 'set_missing' && (code === 'row_id_missing' || code === 'row_id_twice'));

  const ofColumn = (variable: VariablePlan, position: number): ColumnFaults => {
    const own: Gathered = {
      variable,
      position,
      stopping: [],
      borne: [],
      kinds: new Map(),
      again: new Map(),
      stoppingCount: 0,
      borneCount: 0,
    };
    columns.push(own);
    const add: ColumnFaults['add'] = (code, row, line, text, earlierLine) => {
      onBadCell(variable.name, row, code, text);
      const stopping = stops(code);
      const told = stopping && code === 'cell_level_undeclared' ? own.again.get(text) : undefined;
      if (told !== undefined) {
        own.again.set(text, told + 1);
        return;
      }
      if (stopping) {
        own.stoppingCount++;
      } else {
        own.borneCount++;
        if (plan.onBadValue === 'leave_out_row') mark(row);
        const kind = own.kinds.get(code);
        if (kind === undefined) own.kinds.set(code, { code, firstLine: line, firstText: text, count: 1 });
        else kind.count++;
      }
      const list = stopping ? own.stopping : own.borne;
      if (list.length >= limit) return;
      const { message, hint } = faultSentence(plan, variable, code, text, earlierLine ?? null);
      const place = { kind: 'cell', file: plan.file, row: line, variable: variable.name } as const;
      const problem: Problem = {
        code,
        severity: 'error',
        place,
        message,
        ...(hint === null ? {} : { hint }),
      };
      if (stopping && code === 'cell_level_undeclared') own.again.set(text, 0);
      list.push({
        line,
        position,
        problem,
        text: text.slice(0, LONGEST_LISTED_TEXT),
        again: () => own.again.get(text) ?? 0,
      });
    };
    return { variable, position, add, count: () => own.stoppingCount + own.borneCount };
  };

  const settle = (report: Report): boolean => {
    const errors = [...ragged, ...columns.flatMap((column) => column.stopping)].sort(inFileOrder);
    const count = columns.reduce((sum, column) => sum + column.stoppingCount, raggedCount);
    const listed = errors.slice(0, limit);
    for (const each of listed) report(withRepeats(each));
    if (count > listed.length) report(andMore(plan.file, count - listed.length));
    for (const column of columns) {
      for (const kind of column.kinds.values()) report(borneWarning(plan, column.variable, kind));
    }
    return count === 0;
  };

  return {
    ofColumn,
    ragged: (line, cells, expected) => {
      raggedCount++;
      if (ragged.length < limit) {
        ragged.push({
          line,
          position: -1,
          text: '',
          problem: raggedProblem(plan.file, line, cells, expected),
        });
      }
    },
    leftOut: (row) => marks[row] === 1,
    settle,
    badValues: () =>
      listedValues(
        columns
          .flatMap((column) => column.borne.map((listed) => ({ listed, name: column.variable.name })))
          .sort((a, b) => inFileOrder(a.listed, b.listed))
          .map(({ listed, name }) => ({
            row: listed.line,
            variable: name,
            text: listed.text,
            because: listed.problem.message,
          })),
        limit,
      ),
    badValueCount: () => columns.reduce((sum, column) => sum + column.borneCount, 0),
    badRows: (rowCount) => {
      if (plan.onBadValue !== 'leave_out_row' || marks.length === 0) return null;
      const all = new Uint8Array(rowCount);
      all.set(marks.subarray(0, rowCount));
      return all;
    },
  };
}

function inFileOrder(a: Listed, b: Listed): number {
  return a.line - b.line || a.position - b.position;
}

function withRepeats({ problem, again }: Listed): Problem {
  const more = again?.() ?? 0;
  if (more === 0) return problem;
  const cells = more === 1 ? '1 more cell has it' : `${wholeNumber(more)} more cells have it`;
  const message = `${problem.message.replace(/\.$/, '')}; ${cells}.`;
  return { ...problem, message };
}

function andMore(file: string, count: number): Problem {
  const message =
    count === 1
      ? 'One more row or cell is faulty and is not listed.'
      : `${wholeNumber(count)} more rows or cells are faulty and are not listed.`;
  return { code: 'problems_more', severity: 'error', place: { kind: 'file', file }, message };
}

function raggedProblem(file: string, line: number, cells: number, expected: number): Problem {
  return {
    code: 'row_ragged',
    severity: 'error',
    place: { kind: 'cell', file, row: line },
    message: `The row has ${cells} ${cells === 1 ? 'cell' : 'cells'} where the header has ${expected}.`,
    ...(cells > expected ? { hint: 'A cell that holds the delimiter must stand in quotes.' } : {}),
  };
}

function borneWarning(plan: DataPlan, variable: VariablePlan, kind: KindCount): Problem {
  const { code, count } = kind;
  const place = { kind: 'cell', file: plan.file, row: kind.firstLine, variable: variable.name } as const;
  const [isWrong, areWrong] = FAULT_KINDS[code];
  const setMissing = plan.onBadValue === 'set_missing';
  const text = showText(kind.firstText);
  const message =
    count === 1
      ? `One cell of ${variable.name} ${isWrong} (${text} in line ${kind.firstLine}) and ${setMissing ? 'was set to missing' : 'its row is left out'}.`
      : `${wholeNumber(count)} cells of ${variable.name} ${areWrong} (the first is ${text} in line ${kind.firstLine}) and ${setMissing ? 'were set to missing' : 'their rows are left out'}.`;
  const { decimalMark } = plan.format;
  const otherMark = decimalMark === '.' ? ',' : '.';
  const hint =
    code === 'cell_not_number' && Number.isFinite(readNumber(kind.firstText, otherMark))
      ? `Numbers are read with the decimal mark "${decimalMark}", that of the study.`
      : null;
  return { code, severity: 'warning', place, message, ...(hint === null ? {} : { hint }) };
}

import { nearest } from '../expression/nearest.ts';
import type { Report } from '../problem.ts';
import type { DataPlan, VariablePlan } from '../study/study.ts';
import { buildColumn, type ColumnBuilder, type Rows } from './build-column.ts';
import type { ColumnFaults, Faults } from './faults.ts';
import type { HeaderMatch } from './match-header.ts';
import { datePatternReader } from './read-date.ts';
import type { RowBatch } from './split-rows.ts';
import type { Column } from './table.ts';
import type { EncodingWatch } from './watch-encoding.ts';

/** A variable on its way from cells to a column. */
export interface Filling {
  readonly variable: VariablePlan;
  readonly builder: ColumnBuilder;
  readonly faults: ColumnFaults;
}

export interface Filled {
  readonly variable: VariablePlan;
  readonly faults: ColumnFaults;
  readonly column: Column;
  /** Cells left empty because of a fault, in rows that are left out. */
  readonly bad: number;
}

/** Makes ready to read the variables found in the header; null where one cannot be read at all. */
export function startColumns(
  plan: DataPlan,
  found: HeaderMatch['found'],
  faults: Faults,
  report: Report,
): Filling[] | null {
  let readable = true;
  const fillings = found.map(({ variable, position }): Filling => {
    const readDate = variable.pattern === null ? null : datePatternReader(variable.pattern);
    if (variable.type === 'date' && variable.pattern !== null && readDate === null) {
      readable = false;
      report({
        code: 'cell_not_date',
        severity: 'error',
        place: { kind: 'cell', file: plan.file, variable: variable.name },
        message: `The pattern "${variable.pattern}" does not tell one day from another.`,
        hint: 'Make it of YYYY MM DD hh mm ss, each at most once, with YYYY, and with MM where there is DD.',
      });
    }
    const own = faults.ofColumn(variable, position);
    return { variable, faults: own, builder: buildColumn(plan, variable, own, readDate) };
  });
  return readable ? fillings : null;
}

/** The rows of a batch from `first` on that can be read and have as many cells as the header; the others are noted. */
export function takeWholeRows(
  batch: RowBatch,
  first: number,
  header: readonly string[],
  faults: Faults,
  encoding: EncodingWatch,
): Rows {
  const { cells, lines, replaced } = batch;
  let kept = 0;
  for (let i = first; i < cells.length; i++) {
    const row = cells[i]!;
    const line = lines[i]!;
    if (replaced && encoding.rejects(row, line, header)) continue;
    if (row.length !== header.length) {
      faults.ragged(line, row.length, header.length);
      continue;
    }
    cells[kept] = row;
    lines[kept] = line;
    kept++;
  }
  cells.length = kept;
  lines.length = kept;
  return { cells, lines };
}

/** The finished column. */
export function finishColumn(plan: DataPlan, filling: Filling, rowCount: number): Filled {
  const { variable, faults, builder } = filling;
  const bad = plan.onBadValue === 'leave_out_row' ? faults.count() : 0;
  return { variable, faults, column: builder.finish(rowCount), bad };
}

/** A declared baseline must be among the levels that were found; says whether it is. */
export function checkBaseline(
  plan: DataPlan,
  { variable, column }: Pick<Filled, 'variable' | 'column'>,
  report: Report,
): boolean {
  if (column.kind !== 'category' || variable.baseline === null || variable.levels !== null) return true;
  if (column.levels.length === 0 || column.levels.includes(variable.baseline)) return true;
  const near = nearest(variable.baseline, column.levels);
  report({
    code: 'cell_level_undeclared',
    severity: 'error',
    place: { kind: 'cell', file: plan.file, variable: variable.name },
    message: `No row has the baseline "${variable.baseline}" of ${variable.name}.`,
    ...(near === null ? {} : { hint: `Did you mean ${near}?` }),
  });
  return false;
}

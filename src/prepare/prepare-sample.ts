import type { Column, Table } from '../data/table.ts';
import type { Report } from '../problem.ts';
import type { Study } from '../study/study.ts';
import { applyExclusions } from './apply-exclusions.ts';
import { applyWeights } from './apply-weights.ts';
import { checkScales } from './check-scales.ts';
import { baseVariables, evaluateDerived } from './derive.ts';
import { gatherColumn, gatherLines } from './gather.ts';
import { isMissing } from './is-missing.ts';
import { rowCountText } from './line-list.ts';
import { neededVariables, sampleVariables } from './needed-variables.ts';
import { rowIds } from './row-ids.ts';
import { loseMissing, loseWhere, type RowLosses, rowsLeft, startLosses } from './row-losses.ts';
import type { Sample } from './sample.ts';
import { setAside } from './set-aside.ts';
import { timeOrder } from './time-order.ts';
import { warnOfUndefined } from './warn-of-undefined.ts';

/**
 * From the table to the rows that every candidate is fitted on. A row goes under the first reason that
 * applies: a bad value, the study's own exclusions in order, a weight of zero, the first needed variable
 * that is missing or undefined, then the rule that holds rows out. Null, with at least one error reported, where nothing can be fitted.
 */
export function prepareSample(study: Study, table: Table, report: Report): Sample | null {
  const derived = evaluateDerived(study.derive, table.columns, table.rowCount);
  const { columns, undefinedRows } = derived;
  const needed = neededVariables(study);
  const rows = startLosses(table.rowCount);

  if (table.badRows?.includes(1)) {
    loseWhere(rows, table.badRows, { because: 'bad value', kind: 'bad_value', variable: null });
  }
  applyExclusions(study, table, derived, rows, report);
  warnOfUndefined(study, table, derived, rows, report);
  if (study.weights !== null && !applyWeights(study.weights, columns, table, rows, report)) return null;
  if (anyAllMissing(study, needed, columns, table, rows, report)) return null;
  loseMissing(rows, needed, columns, undefinedRows, (name) => baseVariables(name, study.derive));

  const kept = keptRows(rows);
  if (kept.length === 0) {
    reportNothingLeft(table, rows, report);
    return null;
  }
  const whole = kept.length === table.rowCount;
  const gather = (column: Column): Column => (whole ? column : gatherColumn(column, kept));
  const lines = whole ? table.lines : gatherLines(table.lines, kept);
  const gathered = new Map(
    sampleVariables(study, needed).map((name) => [name, gather(columns.get(name)!)] as const),
  );
  if (!checkScales(study, gathered.get(study.response.variable)!, lines, table.file, report)) return null;

  const { time, rowId } = study.data;
  const all: Sample = {
    rowCount: kept.length,
    rows: kept,
    lines,
    ids: rowId === null ? null : rowIds(columns.get(rowId)!, kept),
    columns: gathered,
    timeOrder: time === null ? null : timeOrder(gathered.get(time)!, kept.length),
    losses: rows.losses,
  };
  return setAside(study, table, derived, all, report);
}

/**
 * Reports the needed variables without a single value in the rows still in. A derived one is not named beside
 * a variable that it rests on.
 */
function anyAllMissing(
  study: Study,
  needed: readonly string[],
  columns: ReadonlyMap<string, Column>,
  table: Table,
  rows: RowLosses,
  report: Report,
): boolean {
  const left = rowsLeft(rows);
  if (left === 0) return false;
  const empty = new Set<string>();
  for (const variable of needed) {
    const column = columns.get(variable)!;
    if (rows.reasonOf.some((reason, row) => reason === 0 && !isMissing(column, row))) continue;
    const bases = [...baseVariables(variable, study.derive)];
    const explained = bases.some((base) => base !== variable && empty.has(base));
    empty.add(variable);
    if (explained) continue;
    const of = left === table.rowCount ? 'read' : 'that are not left out';
    report({
      code: 'column_all_missing',
      severity: 'error',
      place: { kind: 'cell', file: table.file, variable },
      message: `"${variable}" has no value in any of the ${rowCountText(left)} ${of}.`,
      hint: 'Look at the data and its missing codes, or declare candidates without it.',
    });
  }
  return empty.size > 0;
}

/** Indexes of the rows still in. */
function keptRows(rows: RowLosses): Int32Array {
  const kept = new Int32Array(rowsLeft(rows));
  let next = 0;
  for (let row = 0; row < rows.reasonOf.length; row++) {
    if (rows.reasonOf[row] === 0) kept[next++] = row;
  }
  return kept;
}

function reportNothingLeft(table: Table, rows: RowLosses, report: Report): void {
  const reasons = rows.losses
    .filter((loss) => loss.rows > 0)
    .map((loss) => `${loss.rows} for "${loss.because}"`);
  const lost = reasons.length > 0 ? `, and all are lost: ${reasons.join(', ')}` : '';
  report({
    code: 'nothing_left',
    severity: 'error',
    place: { kind: 'file', file: table.file },
    message: `No row is left to fit. ${rowCountText(table.rowCount)} ${table.rowCount === 1 ? 'was' : 'were'} read${lost}.`,
    hint: 'Look at leave_out, and at the variables with most values missing.',
  });
}

import type { Table } from '../data/table.ts';
import { namesIn } from '../expression/names-in.ts';
import type { Report } from '../problem.ts';
import type { Study } from '../study/study.ts';
import type { Derived } from './derive.ts';
import { evaluateExpression } from './evaluate-expression.ts';
import { rowCountText } from './line-list.ts';
import { loseWhere, type RowLosses } from './row-losses.ts';
import { freshlyUndefined, UNDEFINED_HINT } from './warn-of-undefined.ts';

/** `leave_out`, in order. A condition that is missing or undefined leaves the row in. */
export function applyExclusions(
  study: Study,
  table: Table,
  derived: Derived,
  rows: RowLosses,
  report: Report,
): void {
  study.leaveOut.forEach((rule, index) => {
    const { columns, undefinedRows } = derived;
    const condition = evaluateExpression(rule.where, columns, table.rowCount, undefinedRows);
    if (condition.undefinedRows !== null) {
      const inherited = [...namesIn(rule.where)].flatMap((name) => undefinedRows.get(name)?.flags ?? []);
      const { count, first } = freshlyUndefined(condition.undefinedRows.flags, inherited, rows);
      if (count > 0) {
        report({
          code: 'value_not_finite',
          severity: 'warning',
          place: { kind: 'cell', file: table.file, row: table.lines[first]! },
          message: `leave_out[${index}].where, "${rule.text}", has no finite value in ${rowCountText(count)}, of which this is the first; it leaves none of them out.`,
          hint: UNDEFINED_HINT,
        });
      }
    }
    loseWhere(rows, condition.values, { because: rule.because, kind: 'left_out', variable: null });
  });
}

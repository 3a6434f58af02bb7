import type { Table } from '../data/table.ts';
import { namesIn } from '../expression/names-in.ts';
import type { Report } from '../problem.ts';
import type { Study } from '../study/study.ts';
import type { Derived } from './derive.ts';
import { rowCountText } from './line-list.ts';
import type { RowLosses } from './row-losses.ts';

export const UNDEFINED_HINT =
  'A logarithm of 0 or less, a root of a negative number, a division by 0 and an overflow have none.';

/** One warning for each derived variable that is undefined, by itself, in rows that have not been left out. */
export function warnOfUndefined(
  study: Study,
  table: Table,
  derived: Derived,
  rows: RowLosses,
  report: Report,
): void {
  for (const plan of study.derive) {
    const own = derived.undefinedRows.get(plan.name);
    if (own === undefined) continue;
    const inherited = [...namesIn(plan.expression)].flatMap(
      (name) => derived.undefinedRows.get(name)?.flags ?? [],
    );
    const { count, first } = freshlyUndefined(own.flags, inherited, rows);
    if (count === 0) continue;
    report({
      code: 'value_not_finite',
      severity: 'warning',
      place: { kind: 'cell', file: table.file, row: table.lines[first]!, variable: plan.name },
      message: `"${plan.name}", which is ${plan.text}, has no finite value in ${rowCountText(count)}, of which this is the first.`,
      hint: UNDEFINED_HINT,
    });
  }
}

/** Counts rows still in that are undefined here and in nothing that went in, so that each is told of once. */
export function freshlyUndefined(
  flags: Uint8Array,
  inherited: readonly Uint8Array[],
  rows: RowLosses,
): { readonly count: number; readonly first: number } {
  let count = 0;
  let first = -1;
  for (let row = 0; row < flags.length; row++) {
    if (flags[row] !== 1 || rows.reasonOf[row] !== 0) continue;
    if (inherited.some((earlier) => earlier[row] === 1)) continue;
    if (count === 0) first = row;
    count++;
  }
  return { count, first };
}

import type { Column, NumberColumn } from '../data/table.ts';
import { namesIn } from '../expression/names-in.ts';
import type { DerivationPlan } from '../study/study.ts';
import { evaluateExpression, type UndefinedRows } from './evaluate-expression.ts';

export interface Derived {
  /** The columns given and the derived ones, in the order of declaration. */
  readonly columns: ReadonlyMap<string, Column>;
  /** By derived variable: the rows in which it is undefined, also through an earlier derived one. */
  readonly undefinedRows: ReadonlyMap<string, UndefinedRows>;
}

/**
 * Adds the derived variables to base columns, in order, so that a later one may use an earlier one. It serves
 * the data (`rowCount` rows) and the rows to be predicted alike; every column that an expression reads must be
 * there. A derived value is NaN where it is missing or undefined.
 */
export function evaluateDerived(
  derive: readonly DerivationPlan[],
  base: ReadonlyMap<string, Column>,
  rowCount: number,
): Derived {
  const columns = new Map(base);
  const undefinedRows = new Map<string, UndefinedRows>();
  for (const plan of derive) {
    const result = evaluateExpression(plan.expression, columns, rowCount, undefinedRows);
    const column: NumberColumn = { kind: plan.type, name: plan.name, values: result.values };
    columns.set(plan.name, column);
    if (result.undefinedRows !== null) undefinedRows.set(plan.name, result.undefinedRows);
  }
  return { columns, undefinedRows };
}

/** The declared variables that a variable rests on: itself, or those under a derived one through any number of steps. */
export function baseVariables(name: string, derive: readonly DerivationPlan[]): ReadonlySet<string> {
  const bases = new Set<string>();
  const seen = new Set<string>();
  const follow = (current: string): void => {
    if (seen.has(current)) return;
    seen.add(current);
    const plan = derive.find((candidate) => candidate.name === current);
    if (plan === undefined) {
      bases.add(current);
      return;
    }
    for (const used of namesIn(plan.expression)) follow(used);
  };
  follow(name);
  return bases;
}

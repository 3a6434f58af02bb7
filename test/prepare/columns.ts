import type { CategoryColumn, Column, NumberColumn, TextColumn } from '../../src/data/table.ts';
import type { Expression } from '../../src/expression/expression.ts';
import { parseExpression } from '../../src/expression/parse-expression.ts';

/** null is missing. */
export function numbers(
  name: string,
  values: readonly (number | null)[],
  kind: NumberColumn['kind'] = 'number',
): NumberColumn {
  return { kind, name, values: Float64Array.from(values, (value) => value ?? Number.NaN) };
}

export function flags(name: string, values: readonly (boolean | null)[]): NumberColumn {
  return numbers(
    name,
    values.map((value) => (value === null ? null : Number(value))),
    'flag',
  );
}

export function category(
  name: string,
  values: readonly (string | null)[],
  levels: readonly string[] = [...new Set(values.filter((value) => value !== null))].sort(),
): CategoryColumn {
  const codes = Int32Array.from(values, (value) => (value === null ? -1 : levels.indexOf(value)));
  return { kind: 'category', name, codes, levels, baseline: levels[0] ?? '' };
}

export function texts(name: string, values: readonly (string | null)[]): TextColumn {
  return { kind: 'text', name, values };
}

export function byName(columns: readonly Column[]): ReadonlyMap<string, Column> {
  return new Map(columns.map((column) => [column.name, column]));
}

export function expressionOf(text: string): Expression {
  const result = parseExpression(text);
  if ('fault' in result) throw new Error(`${text}: ${result.fault.message}`);
  return result.expression;
}

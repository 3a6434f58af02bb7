import type { Expression, ExpressionFault, Span, ValueType } from './expression.ts';
import { isoDays } from './iso-date.ts';

/** Adds a fault to those found so far. */
export function addFault(
  faults: ExpressionFault[],
  span: Span,
  code: 'expression_name' | 'expression_type',
  message: string,
  hint?: string,
): void {
  faults.push({
    code,
    start: span.start,
    end: span.end,
    message,
    ...(hint === undefined ? {} : { hint }),
  });
}

/** A fault where a part that must be a number is of another known type; `user` begins the sentence. */
export function requireNumber(
  faults: ExpressionFault[],
  node: Expression,
  type: ValueType | null,
  user: string,
): void {
  if (type === null || type === 'number') return;
  const hint =
    type === 'flag'
      ? `To count a flag as 1 or 0, write if(${node.kind === 'name' ? node.name : '…'}, 1, 0).`
      : type === 'date'
        ? 'Use days_between(from, to), or year, month, day or weekday of the date.'
        : node.kind === 'text' && Number.isFinite(Number.parseFloat(node.value))
          ? 'Write the number without quotation marks.'
          : undefined;
  addFault(
    faults,
    node,
    'expression_type',
    `${user} works on numbers, and this is ${WITH_ARTICLE[type]}.`,
    hint,
  );
}

/** The same for a condition. */
export function requireFlag(
  faults: ExpressionFault[],
  node: Expression,
  type: ValueType | null,
  user: string,
): void {
  if (type === null || type === 'flag') return;
  const name = node.kind === 'name' ? node.name : '…';
  const hint = type === 'number' ? `Compare it with something: ${name} > 0.` : undefined;
  const message = `${user} works on conditions (true or false), and this is ${WITH_ARTICLE[type]}.`;
  addFault(faults, node, 'expression_type', message, hint);
}

/** A fault where a text that must be an ISO 8601 date is none. */
export function requireDateText(faults: ExpressionFault[], node: Expression & { kind: 'text' }): void {
  if (isoDays(node.value) !== null) return;
  const message = `"${node.value}" is not a date.`;
  addFault(faults, node, 'expression_type', message, 'Write it as year, month and day: "2024-03-01".');
}

export const WITH_ARTICLE: Readonly<Record<ValueType, string>> = {
  number: 'a number',
  flag: 'a flag',
  category: 'a category',
  text: 'a text',
  date: 'a date',
};

export const PLURAL: Readonly<Record<ValueType, string>> = {
  number: 'numbers',
  flag: 'flags',
  category: 'categories',
  text: 'texts',
  date: 'dates',
};

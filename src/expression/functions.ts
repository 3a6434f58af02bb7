import type { ValueType } from './expression.ts';

/**
 * What an argument may be. "variable": the name of any variable. "same": a number, flag or date, of one type
 * with the function's other arguments of this kind. A date may also be written as a text ("2024-03-01").
 */
export type ArgumentKind = 'number' | 'flag' | 'date' | 'variable' | 'same';

export interface FunctionArgument {
  readonly name: string;
  readonly kind: ArgumentKind;
  /** May be left out. */
  readonly optional?: true;
}

export interface FunctionDescription {
  readonly name: string;
  readonly arguments: readonly FunctionArgument[];
  /** Whether the last argument may be given again and again. */
  readonly repeats?: true;
  /** Type of the result; "same": that of the arguments of this kind. */
  readonly result: Exclude<ValueType, 'category' | 'text'> | 'same';
  /** One line for the key reference. */
  readonly description: string;
}

const x: FunctionArgument = { name: 'x', kind: 'number' };
const when: FunctionArgument = { name: 'date', kind: 'date' };

/** Every function that an expression can call. The type check, the evaluation and the key reference read it. */
export const FUNCTIONS = [
  { name: 'log', arguments: [x], result: 'number', description: 'Natural logarithm; undefined for x ≤ 0.' },
  {
    name: 'log10',
    arguments: [x],
    result: 'number',
    description: 'Logarithm to base 10; undefined for x ≤ 0.',
  },
  { name: 'exp', arguments: [x], result: 'number', description: 'e to the power x.' },
  { name: 'sqrt', arguments: [x], result: 'number', description: 'Square root; undefined for x < 0.' },
  { name: 'abs', arguments: [x], result: 'number', description: 'Size of x without its sign.' },
  {
    name: 'min',
    arguments: [
      { name: 'a', kind: 'number' },
      { name: 'b', kind: 'number' },
    ],
    repeats: true,
    result: 'number',
    description: 'Smallest of two or more numbers; missing if any of them is.',
  },
  {
    name: 'max',
    arguments: [
      { name: 'a', kind: 'number' },
      { name: 'b', kind: 'number' },
    ],
    repeats: true,
    result: 'number',
    description: 'Largest of two or more numbers; missing if any of them is.',
  },
  {
    name: 'round',
    arguments: [x, { name: 'digits', kind: 'number', optional: true }],
    result: 'number',
    description:
      'Nearest whole number, or nearest number with so many digits after the point (−15 to 15); halves go away from zero.',
  },
  {
    name: 'if',
    arguments: [
      { name: 'condition', kind: 'flag' },
      { name: 'value', kind: 'same' },
      { name: 'other value', kind: 'same' },
    ],
    result: 'same',
    description:
      'The first value where the condition holds, the second where it does not, missing where that is not known.',
  },
  {
    name: 'is_missing',
    arguments: [{ name: 'variable', kind: 'variable' }],
    result: 'flag',
    description: 'Whether the variable has no value in this row.',
  },
  { name: 'year', arguments: [when], result: 'number', description: 'Year of the date.' },
  { name: 'month', arguments: [when], result: 'number', description: 'Month of the date, 1 to 12.' },
  { name: 'day', arguments: [when], result: 'number', description: 'Day of the month, 1 to 31.' },
  {
    name: 'weekday',
    arguments: [when],
    result: 'number',
    description: 'Day of the week, 1 for Monday to 7 for Sunday (ISO 8601).',
  },
  {
    name: 'days_between',
    arguments: [
      { name: 'from', kind: 'date' },
      { name: 'to', kind: 'date' },
    ],
    result: 'number',
    description: 'Days from the first date to the second; negative where the second is earlier.',
  },
] as const satisfies readonly FunctionDescription[];

export type FunctionName = (typeof FUNCTIONS)[number]['name'];

export function functionNamed(name: string): (FunctionDescription & { readonly name: FunctionName }) | null {
  return FUNCTIONS.find((known) => known.name === name) ?? null;
}

/** How a call is written: "round(x, digits)", "min(a, b, …)". */
export function callPattern(known: FunctionDescription): string {
  const names = known.arguments.map((argument) => argument.name);
  return `${known.name}(${[...names, ...(known.repeats ? ['…'] : [])].join(', ')})`;
}

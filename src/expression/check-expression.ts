import type { BinaryOperator, Expression, ExpressionFault, Span, ValueType } from './expression.ts';
import { callPattern, FUNCTIONS, type FunctionArgument, functionNamed } from './functions.ts';
import { isoDays } from './iso-date.ts';
import { nearest } from './nearest.ts';

/** What a whole expression is: its type (null where it is not known because of a fault) and what it reads. */
export interface CheckedExpression {
  readonly type: ValueType | null;
  /** In the order of the text. */
  readonly faults: ExpressionFault[];
  /** Variables that the expression reads, each once, in the order of the text. Unknown names are not among them. */
  readonly names: string[];
}

interface Check {
  readonly typeOf: (name: string) => ValueType | null;
  readonly known: readonly string[];
  readonly faults: ExpressionFault[];
  readonly names: Set<string>;
}

/**
 * The type of an expression, and everything that is wrong with its names and types. `typeOf` gives the type
 * of a variable, null where there is none of that name; `names` are those that a hint may propose.
 */
export function checkExpression(
  expression: Expression,
  typeOf: (name: string) => ValueType | null,
  names: readonly string[],
): CheckedExpression {
  const check: Check = { typeOf, known: names, faults: [], names: new Set() };
  const type = checkNode(check, expression);
  const faults = check.faults.sort((a, b) => a.start - b.start || a.end - b.end);
  return { type, faults, names: [...check.names] };
}

function checkNode(check: Check, node: Expression): ValueType | null {
  switch (node.kind) {
    case 'number':
      return 'number';
    case 'text':
      return 'text';
    case 'truth':
      return 'flag';
    case 'name':
      return checkName(check, node);
    case 'negate':
      requireNumber(check, node.of, checkNode(check, node.of), 'The minus sign');
      return 'number';
    case 'not':
      requireFlag(check, node.of, checkNode(check, node.of), '"not"');
      return 'flag';
    case 'binary':
      return checkBinary(check, node.operator, node.left, node.right, node);
    case 'call':
      return checkCall(check, node);
  }
}

/** `besideWord`: the name is compared with a category or a text, so a missing quotation mark is likely. */
function checkName(check: Check, node: Expression & { kind: 'name' }, besideWord = false): ValueType | null {
  const type = check.typeOf(node.name);
  if (type !== null) {
    check.names.add(node.name);
    return type;
  }
  const message = `The expression names "${node.name}", which is neither a variable nor derived.`;
  const quote = besideWord ? `A text stands in quotation marks: "${node.name}".` : undefined;
  addFault(check, node, 'expression_name', message, nameHint(check, node.name) ?? quote);
  return null;
}

function nameHint(check: Check, name: string): string | undefined {
  const lower = name.toLowerCase();
  if (lower === 'true' || lower === 'false') return `Write ${lower} in small letters.`;
  const near = nearest(name, check.known);
  if (near !== null) return `Did you mean ${near}?`;
  const called = functionNamed(name);
  if (called !== null) return `${name} is a function: write ${callPattern(called)}.`;
  return undefined;
}

function checkBinary(
  check: Check,
  operator: BinaryOperator,
  left: Expression,
  right: Expression,
  whole: Span,
): ValueType {
  const leftType = checkNode(check, left);
  const rightType =
    right.kind === 'name' && isWord(leftType) ? checkName(check, right, true) : checkNode(check, right);
  switch (operator) {
    case '+':
    case '-':
      if (leftType === 'date' || rightType === 'date') {
        const message = `"${operator}" does not work on dates.`;
        addFault(check, whole, 'expression_type', message, 'Use days_between(from, to).');
        return 'number';
      }
      break;
    case 'and':
    case 'or':
      requireFlag(check, left, leftType, `"${operator}"`);
      requireFlag(check, right, rightType, `"${operator}"`);
      return 'flag';
    case '==':
    case '!=':
    case '<':
    case '<=':
    case '>':
    case '>=':
      if (leftType !== null && rightType !== null) {
        checkComparison(
          check,
          operator,
          { node: left, type: leftType },
          { node: right, type: rightType },
          whole,
        );
      }
      return 'flag';
  }
  requireNumber(check, left, leftType, `"${operator}"`);
  requireNumber(check, right, rightType, `"${operator}"`);
  return 'number';
}

function isWord(type: ValueType | null): boolean {
  return type === 'text' || type === 'category';
}

interface Typed {
  readonly node: Expression;
  readonly type: ValueType;
}

function checkComparison(
  check: Check,
  operator: BinaryOperator,
  left: Typed,
  right: Typed,
  whole: Span,
): void {
  const equality = operator === '==' || operator === '!=';
  for (const [date, other] of [
    [left, right],
    [right, left],
  ] as const) {
    if (date.type === 'date' && other.node.kind === 'text') {
      requireDateText(check, other.node);
      return;
    }
  }
  const comparable = left.type === right.type || (isWord(left.type) && isWord(right.type));
  if (!comparable) {
    const message = `"${operator}" compares ${WITH_ARTICLE[left.type]} with ${WITH_ARTICLE[right.type]}.`;
    addFault(check, whole, 'expression_type', message, comparisonHint(left, right));
    return;
  }
  if (!equality && left.type !== 'number' && left.type !== 'date') {
    const message = `"${operator}" puts values in order, and ${PLURAL[left.type]} have none.`;
    addFault(check, whole, 'expression_type', message, 'Only == and != work here.');
  }
}

function comparisonHint(left: Typed, right: Typed): string | undefined {
  for (const [one, other] of [
    [left, right],
    [right, left],
  ] as const) {
    if (one.type === 'flag' && other.type !== 'date') {
      const name = one.node.kind === 'name' ? one.node.name : 'the condition';
      return `A flag is a condition by itself: write ${name} or not ${name}.`;
    }
    if ((one.type === 'category' || one.type === 'text') && other.node.kind === 'number') {
      return `Write the value as a text: "${other.node.value}".`;
    }
    if (one.type === 'number' && other.node.kind === 'text')
      return 'Write the number without quotation marks.';
    if (one.type === 'category' && other.node.kind === 'name') return undefined;
  }
  return undefined;
}

function checkCall(check: Check, node: Expression & { kind: 'call' }): ValueType | null {
  const known = functionNamed(node.function);
  if (known === null) {
    for (const argument of node.arguments) checkNode(check, argument);
    const message = `There is no function "${node.function}".`;
    addFault(check, node.functionSpan, 'expression_name', message, functionHint(check, node.function));
    return null;
  }

  const least = known.arguments.filter((argument) => argument.optional !== true).length;
  const most = known.repeats ? Number.POSITIVE_INFINITY : known.arguments.length;
  const given = node.arguments.length;
  if (given < least || given > most) {
    const message = `${known.name} takes ${countOf(least, most)}, and ${given} ${given === 1 ? 'is' : 'are'} given.`;
    addFault(check, node, 'expression_type', message, `Write ${callPattern(known)}.`);
  }

  let same: ValueType | null = null;
  node.arguments.forEach((argument, index) => {
    const wanted = known.arguments[index] ?? known.arguments.at(-1)!;
    const type = checkArgument(check, known.name, wanted, argument, same);
    if (wanted.kind === 'same') same ??= type;
  });
  if (known.name === 'round' && node.arguments[1] !== undefined) checkDigits(check, node.arguments[1]);
  return known.result === 'same' ? same : known.result;
}

function functionHint(check: Check, name: string): string | undefined {
  if (name === 'ln') return 'The natural logarithm is written log(x).';
  if (name === 'pow' || name === 'power') return 'A power is written x ^ 2.';
  if (check.typeOf(name) !== null) return `${name} is a variable; a product is written ${name} * (…).`;
  const near = nearest(
    name,
    FUNCTIONS.map((known) => known.name),
  );
  if (near !== null) return `Did you mean ${near}?`;
  return `There are ${FUNCTIONS.map((known) => known.name).join(', ')}.`;
}

/** Checks one argument and returns its type; `same` is the type of the earlier arguments of kind "same". */
function checkArgument(
  check: Check,
  caller: string,
  wanted: FunctionArgument,
  argument: Expression,
  same: ValueType | null,
): ValueType | null {
  const type = checkNode(check, argument);
  switch (wanted.kind) {
    case 'number':
      requireNumber(check, argument, type, caller);
      break;
    case 'flag':
      requireFlag(check, argument, type, `The ${wanted.name} of ${caller}`);
      break;
    case 'date':
      if (argument.kind === 'text') requireDateText(check, argument);
      else if (type !== null && type !== 'date') {
        addFault(
          check,
          argument,
          'expression_type',
          `${caller} works on dates, and this is ${WITH_ARTICLE[type]}.`,
        );
      }
      break;
    case 'variable':
      if (argument.kind !== 'name') {
        const message = `${caller} works on the name of a variable, not on a formula.`;
        const hint = 'Derive the formula as a variable of its own first.';
        addFault(check, argument, 'expression_type', message, hint);
      }
      break;
    case 'same':
      if (type === 'text' || type === 'category') {
        const message = `${caller} chooses between numbers, flags or dates, and this is ${WITH_ARTICLE[type]}.`;
        addFault(check, argument, 'expression_type', message);
        return null;
      }
      if (type !== null && same !== null && type !== same) {
        const message = `Both values of ${caller} must be of one type, and these are ${WITH_ARTICLE[same]} and ${WITH_ARTICLE[type]}.`;
        addFault(check, argument, 'expression_type', message);
      }
  }
  return type;
}

function checkDigits(check: Check, digits: Expression): void {
  const sign = digits.kind === 'negate' ? -1 : 1;
  const written = digits.kind === 'negate' ? digits.of : digits;
  if (written.kind !== 'number') return;
  const value = sign * written.value;
  if (Number.isInteger(value) && Math.abs(value) <= 15) return;
  addFault(check, digits, 'expression_type', 'The digits of round are a whole number from -15 to 15.');
}

function requireNumber(check: Check, node: Expression, type: ValueType | null, user: string): void {
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
    check,
    node,
    'expression_type',
    `${user} works on numbers, and this is ${WITH_ARTICLE[type]}.`,
    hint,
  );
}

function requireFlag(check: Check, node: Expression, type: ValueType | null, user: string): void {
  if (type === null || type === 'flag') return;
  const name = node.kind === 'name' ? node.name : '…';
  const hint = type === 'number' ? `Compare it with something: ${name} > 0.` : undefined;
  const message = `${user} works on conditions (true or false), and this is ${WITH_ARTICLE[type]}.`;
  addFault(check, node, 'expression_type', message, hint);
}

function requireDateText(check: Check, node: Expression & { kind: 'text' }): void {
  if (isoDays(node.value) !== null) return;
  const message = `"${node.value}" is not a date.`;
  addFault(check, node, 'expression_type', message, 'Write it as year, month and day: "2024-03-01".');
}

const WITH_ARTICLE: Readonly<Record<ValueType, string>> = {
  number: 'a number',
  flag: 'a flag',
  category: 'a category',
  text: 'a text',
  date: 'a date',
};

const PLURAL: Readonly<Record<ValueType, string>> = {
  number: 'numbers',
  flag: 'flags',
  category: 'categories',
  text: 'texts',
  date: 'dates',
};

function countOf(least: number, most: number): string {
  if (most === Number.POSITIVE_INFINITY) return `${least} or more arguments`;
  if (least !== most) return `${least} or ${most} arguments`;
  return `${least} ${least === 1 ? 'argument' : 'arguments'}`;
}

function addFault(
  check: Check,
  span: Span,
  code: 'expression_name' | 'expression_type',
  message: string,
  hint?: string,
): void {
  check.faults.push({
    code,
    start: span.start,
    end: span.end,
    message,
    ...(hint === undefined ? {} : { hint }),
  });
}

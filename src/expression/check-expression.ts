import type { BinaryOperator, Expression, ExpressionFault, Span, ValueType } from './expression.ts';
import { callPattern, FUNCTIONS, type FunctionArgument, functionNamed } from './functions.ts';
import { nearest } from './nearest.ts';
import {
  addFault,
  PLURAL,
  requireDateText,
  requireFlag,
  requireNumber,
  WITH_ARTICLE,
} from './type-faults.ts';

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
      requireNumber(check.faults, node.of, checkNode(check, node.of), 'The minus sign');
      return 'number';
    case 'not':
      requireFlag(check.faults, node.of, checkNode(check, node.of), '"not"');
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
  addFault(check.faults, node, 'expression_name', message, nameHint(check, node.name) ?? quote);
  return null;
}

/** A name that needs no back-quotes. */
const PLAIN_NAME = /^(?!(?:and|or|not|true|false)$)[A-Za-z_][A-Za-z0-9_]*$/;

function nameHint(check: Check, name: string): string | undefined {
  const lower = name.toLowerCase();
  if (lower === 'true' || lower === 'false') return `Write ${lower} in small letters.`;
  const near = nearest(name, check.known);
  if (near !== null) return `Did you mean ${PLAIN_NAME.test(near) ? near : `\`${near}\``}?`;
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
        addFault(check.faults, whole, 'expression_type', message, 'Use days_between(from, to).');
        return 'number';
      }
      break;
    case 'and':
    case 'or':
      requireFlag(check.faults, left, leftType, `"${operator}"`);
      requireFlag(check.faults, right, rightType, `"${operator}"`);
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
  requireNumber(check.faults, left, leftType, `"${operator}"`);
  requireNumber(check.faults, right, rightType, `"${operator}"`);
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
      requireDateText(check.faults, other.node);
      return;
    }
  }
  const comparable = left.type === right.type || (isWord(left.type) && isWord(right.type));
  if (!comparable) {
    const message = `"${operator}" compares ${WITH_ARTICLE[left.type]} with ${WITH_ARTICLE[right.type]}.`;
    addFault(check.faults, whole, 'expression_type', message, comparisonHint(left, right));
    return;
  }
  if (!equality && left.type !== 'number' && left.type !== 'date') {
    const message = `"${operator}" puts values in order, and ${PLURAL[left.type]} have none.`;
    addFault(check.faults, whole, 'expression_type', message, 'Only == and != work here.');
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
    addFault(check.faults, node.functionSpan, 'expression_name', message, functionHint(check, node.function));
    return null;
  }

  const least = known.arguments.filter((argument) => argument.optional !== true).length;
  const most = known.repeats ? Number.POSITIVE_INFINITY : known.arguments.length;
  const given = node.arguments.length;
  if (given < least || given > most) {
    const message = `${known.name} takes ${countOf(least, most)}, and ${given} ${given === 1 ? 'is' : 'are'} given.`;
    addFault(check.faults, node, 'expression_type', message, `Write ${callPattern(known)}.`);
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
      requireNumber(check.faults, argument, type, caller);
      break;
    case 'flag':
      requireFlag(check.faults, argument, type, `The ${wanted.name} of ${caller}`);
      break;
    case 'date':
      if (argument.kind === 'text') requireDateText(check.faults, argument);
      else if (type !== null && type !== 'date') {
        addFault(
          check.faults,
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
        addFault(check.faults, argument, 'expression_type', message, hint);
      }
      break;
    case 'same':
      if (type === 'text' || type === 'category') {
        const message = `${caller} chooses between numbers, flags or dates, and this is ${WITH_ARTICLE[type]}.`;
        addFault(check.faults, argument, 'expression_type', message);
        return null;
      }
      if (type !== null && same !== null && type !== same) {
        const message = `Both values of ${caller} must be of one type, and these are ${WITH_ARTICLE[same]} and ${WITH_ARTICLE[type]}.`;
        addFault(check.faults, argument, 'expression_type', message);
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
  addFault(check.faults, digits, 'expression_type', 'The digits of round are a whole number from -15 to 15.');
}

function countOf(least: number, most: number): string {
  if (most === Number.POSITIVE_INFINITY) return `${least} or more arguments`;
  if (least !== most) return `${least} or ${most} arguments`;
  return `${least} ${least === 1 ? 'argument' : 'arguments'}`;
}

import type { Expression } from '../../src/expression/expression.ts';

/** A value of the plain interpreter: null is missing, "undefined" is undefined, a Date is in milliseconds. */
export type Value = number | boolean | Date | { readonly word: string } | null | 'undefined';

/**
 * One row at a time, on the engine's own numbers, booleans and Dates: the reference that the evaluation by
 * blocks is held against. It shares no code with it.
 */
export function interpret(node: Expression, row: ReadonlyMap<string, Value>): Value {
  const value = (part: Expression): Value => interpret(part, row);
  switch (node.kind) {
    case 'number':
      return node.value;
    case 'truth':
      return node.value;
    case 'text':
      return { word: node.value };
    case 'name':
      return row.get(node.name)!;
    case 'negate':
      return strict([value(node.of)], ([x]) => -(x as number));
    case 'not':
      return strict([value(node.of)], ([x]) => !(x as boolean));
    case 'call':
      return interpretCall(node.function, node.arguments, row);
    case 'binary': {
      const a = value(node.left);
      const b = value(node.right);
      if (node.operator === 'and') {
        if (a === false || b === false) return false;
        return strict([a, b], () => true);
      }
      if (node.operator === 'or') {
        if (a === true || b === true) return true;
        return strict([a, b], () => false);
      }
      if (node.operator === '^' && node.right.kind === 'number') {
        const { value: to } = node.right;
        return strict([a], ([x]) => literalPower(x as number, to));
      }
      return strict([a, b], ([x, y]) => operate(node.operator, x!, y!));
    }
  }
}

/** Missing before undefined; a number that is not finite is undefined. */
function strict(operands: Value[], result: (operands: Value[]) => Value): Value {
  if (operands.includes(null)) return null;
  if (operands.includes('undefined')) return 'undefined';
  const value = result(operands);
  return typeof value === 'number' && !Number.isFinite(value) ? 'undefined' : value;
}

function comparable(value: Value, other: Value): number | boolean | string {
  if (value instanceof Date) return value.getTime();
  if (value !== null && typeof value === 'object') {
    return other instanceof Date ? new Date(value.word).getTime() : value.word;
  }
  return value as number;
}

/** Small whole powers are declared to be multiplied out. */
function literalPower(x: number, to: number): number {
  if (to === 2) return x * x;
  if (to === 3) return x * x * x;
  return to === 4 ? x * x * (x * x) : x ** to;
}

function operate(operator: string, left: Value, right: Value): Value {
  const a = comparable(left, right);
  const b = comparable(right, left);
  const [x, y] = [a as number, b as number];
  switch (operator) {
    case '+':
      return x + y;
    case '-':
      return x - y;
    case '*':
      return x * y;
    case '/':
      return x / y;
    case '^':
      return x ** y;
    case '==':
      return a === b;
    case '!=':
      return a !== b;
    case '<':
      return x < y;
    case '<=':
      return x <= y;
    case '>':
      return x > y;
    case '>=':
      return x >= y;
    default:
      throw new Error(operator);
  }
}

function interpretCall(name: string, given: readonly Expression[], row: ReadonlyMap<string, Value>): Value {
  const values = given.map((argument) => interpret(argument, row));
  if (name === 'is_missing') return values[0] === null || values[0] === 'undefined';
  if (name === 'if') {
    const [condition, yes, no] = values;
    if (condition === null || condition === 'undefined') return condition;
    return condition ? yes! : no!;
  }
  return strict(values, () => {
    const numbers = values as number[];
    const date = values[0] as Date;
    const [x, y] = numbers;
    switch (name) {
      case 'log':
        return Math.log(x!);
      case 'log10':
        return Math.log10(x!);
      case 'exp':
        return Math.exp(x!);
      case 'sqrt':
        return Math.sqrt(x!);
      case 'abs':
        return Math.abs(x!);
      case 'min':
        return Math.min(...numbers);
      case 'max':
        return Math.max(...numbers);
      case 'round':
        return roundDecimally(x!, y ?? 0);
      case 'year':
        return date.getUTCFullYear();
      case 'month':
        return date.getUTCMonth() + 1;
      case 'day':
        return date.getUTCDate();
      case 'weekday':
        return date.getUTCDay() || 7;
      case 'days_between':
        return ((values[1] as Date).getTime() - date.getTime()) / 86_400_000;
      default:
        throw new Error(name);
    }
  });
}

/** Halves away from zero on the shortest decimal digits, with whole-number arithmetic of any length. */
export function roundDecimally(x: number, digits: number): number {
  const [mantissa, exponent] = Math.abs(x).toExponential().split('e');
  const [whole, fraction = ''] = mantissa!.split('.');
  const unit = BigInt(`${whole}${fraction}`);
  const power = Number(exponent) - fraction.length + digits;
  const shifted =
    power >= 0
      ? unit * 10n ** BigInt(power)
      : (2n * unit + 10n ** BigInt(-power)) / (2n * 10n ** BigInt(-power));
  const size = Number(`${shifted}e${-digits}`);
  return x < 0 ? -size : size;
}

import type { Column } from '../data/table.ts';
import type { BinaryOperator, Expression } from '../expression/expression.ts';
import type { FunctionName } from '../expression/functions.ts';
import { calendarDay, isoDays, isoWeekday } from '../expression/iso-date.ts';
import { compareWords } from './compare-words.ts';
import { isMissing } from './is-missing.ts';
import { add, type Block, both, choose, combine, divide, either, map, multiply, subtract } from './loops.ts';
import { roundTo } from './round-to.ts';

/** Rows worked on at a time: temporary memory does not grow with the data and stays in the processor's cache. */
const BLOCK = 4096;

/** Rows in which a calculation has no result although nothing it needs is missing. */
export interface UndefinedRows {
  /** 1 where undefined, one entry per row. */
  readonly flags: Uint8Array;
  readonly count: number;
}

export interface Evaluated {
  /** A number, a date in days since 1970-01-01, or a flag as 0 or 1; NaN where missing or undefined. */
  readonly values: Float64Array;
  /** Null where no row is undefined. */
  readonly undefinedRows: UndefinedRows | null;
}

/** Gives the values of rows `start` … `start + n − 1`, in a scratch block or as a view of a column. */
type Step = (start: number, n: number) => Block;

interface Scope {
  readonly columns: ReadonlyMap<string, Column>;
  readonly undefinedRows: ReadonlyMap<string, UndefinedRows>;
  readonly blockSize: number;
  /** One scratch block per depth of the calculation. */
  readonly scratch: Block[];
}

/**
 * The values of a checked expression in every row. A missing operand makes the result missing, except in
 * `is_missing`, in the branch of `if` that is not taken, and where `and` and `or` are settled by the other
 * side. A result that is not finite (log of zero, division by zero, overflow) is undefined: NaN, and flagged.
 * `undefinedRows` flags, by variable, rows of `columns` that are undefined themselves. An expression that the
 * check would refuse is a fault of the program and throws.
 */
export function evaluateExpression(
  expression: Expression,
  columns: ReadonlyMap<string, Column>,
  rowCount: number,
  undefinedRows: ReadonlyMap<string, UndefinedRows> = new Map(),
): Evaluated {
  const blockSize = Math.min(BLOCK, rowCount);
  const scope: Scope = { columns, undefinedRows, blockSize, scratch: [] };
  const step = compile(expression, scope, 0);
  const values = new Float64Array(rowCount);
  let flags: Uint8Array | null = null;
  let count = 0;
  for (let start = 0; start < rowCount; start += blockSize) {
    const n = Math.min(blockSize, rowCount - start);
    const block = step(start, n);
    for (let i = 0; i < n; i++) {
      const value = block[i]!;
      if (value === Number.POSITIVE_INFINITY) {
        flags ??= new Uint8Array(rowCount);
        flags[start + i] = 1;
        count++;
        values[start + i] = Number.NaN;
      } else {
        // Adding 0 turns a negative zero into zero, which reads the same everywhere.
        values[start + i] = value + 0;
      }
    }
  }
  return { values, undefinedRows: flags === null ? null : { flags, count } };
}

function compile(node: Expression, scope: Scope, depth: number): Step {
  switch (node.kind) {
    case 'number':
      return constant(node.value, scope);
    case 'truth':
      return constant(node.value ? 1 : 0, scope);
    case 'text':
      throw new Error(`The text "${node.value}" stands where a number is needed.`);
    case 'name':
      return readColumn(node.name, scope, depth);
    case 'negate':
      return compileMap(node.of, scope, depth, (x) => -x);
    case 'not':
      return compileMap(node.of, scope, depth, (x) => 1 - x);
    case 'binary':
      return compileBinary(node, scope, depth);
    case 'call':
      return compileCall(node, scope, depth);
  }
}

function scratchAt(scope: Scope, depth: number): Block {
  const existing = scope.scratch[depth];
  if (existing !== undefined) return existing;
  const made = new Float64Array(scope.blockSize);
  scope.scratch[depth] = made;
  return made;
}

function constant(value: number, scope: Scope): Step {
  const block = new Float64Array(scope.blockSize).fill(value);
  return () => block;
}

function columnOf(name: string, scope: Scope): Column {
  const column = scope.columns.get(name);
  if (column === undefined) throw new Error(`There is no column "${name}".`);
  return column;
}

function readColumn(name: string, scope: Scope, depth: number): Step {
  const column = columnOf(name, scope);
  if (column.kind === 'category' || column.kind === 'text') {
    throw new Error(`The ${column.kind} "${name}" stands where a number is needed.`);
  }
  const { values } = column;
  const undefinedHere = scope.undefinedRows.get(name);
  if (undefinedHere === undefined) return (start, n) => values.subarray(start, start + n);
  const { flags } = undefinedHere;
  const out = scratchAt(scope, depth);
  return (start, n) => {
    for (let i = 0; i < n; i++) {
      out[i] = flags[start + i] === 1 ? Number.POSITIVE_INFINITY : values[start + i]!;
    }
    return out;
  };
}

function compileMap(of: Expression, scope: Scope, depth: number, each: (x: number) => number): Step {
  const operand = compile(of, scope, depth);
  const out = scratchAt(scope, depth);
  return (start, n) => {
    map(out, operand(start, n), n, each);
    return out;
  };
}

type Loop = (out: Block, a: Block, b: Block, n: number) => void;

const LOOPS: Readonly<Record<BinaryOperator, Loop>> = {
  '+': add,
  '-': subtract,
  '*': multiply,
  '/': divide,
  '^': (out, a, b, n) => combine(out, a, b, n, (x, y) => x ** y),
  '==': (out, a, b, n) => combine(out, a, b, n, (x, y) => (x === y ? 1 : 0)),
  '!=': (out, a, b, n) => combine(out, a, b, n, (x, y) => (x !== y ? 1 : 0)),
  '<': (out, a, b, n) => combine(out, a, b, n, (x, y) => (x < y ? 1 : 0)),
  '<=': (out, a, b, n) => combine(out, a, b, n, (x, y) => (x <= y ? 1 : 0)),
  '>': (out, a, b, n) => combine(out, a, b, n, (x, y) => (x > y ? 1 : 0)),
  '>=': (out, a, b, n) => combine(out, a, b, n, (x, y) => (x >= y ? 1 : 0)),
  and: both,
  or: either,
};

/** Small whole powers by multiplication: squares are then correctly rounded, and quicker. */
const POWERS: ReadonlyMap<number, (x: number) => number> = new Map([
  [1, (x: number) => x],
  [2, (x: number) => x * x],
  [3, (x: number) => x * x * x],
  [4, (x: number) => x * x * (x * x)],
]);

function compileBinary(node: Expression & { kind: 'binary' }, scope: Scope, depth: number): Step {
  const { operator, left, right } = node;
  if (operator === '==' || operator === '!=') {
    const words = compareWords(left, right, operator === '==', scope.columns);
    if (words !== null) {
      const out = scratchAt(scope, depth);
      return (start, n) => {
        words(out, start, n);
        return out;
      };
    }
  }
  if (operator === '^' && right.kind === 'number') {
    const power = POWERS.get(right.value);
    if (power !== undefined) return compileMap(left, scope, depth, power);
  }
  return compileTwo(compileOrdered(left, scope, depth), right, scope, depth, LOOPS[operator]);
}

/** `left` has been compiled for the same depth; the right operand takes the next. */
function compileTwo(left: Step, right: Expression, scope: Scope, depth: number, loop: Loop): Step {
  const second = compileOrdered(right, scope, depth + 1);
  const out = scratchAt(scope, depth);
  return (start, n) => {
    const a = left(start, n);
    loop(out, a, second(start, n), n);
    return out;
  };
}

/** An operand in which a written text can only be a date. */
function compileOrdered(node: Expression, scope: Scope, depth: number): Step {
  if (node.kind !== 'text') return compile(node, scope, depth);
  const days = isoDays(node.value);
  if (days === null) throw new Error(`"${node.value}" is not a date.`);
  return constant(days, scope);
}

const OF_ONE: Readonly<Partial<Record<FunctionName, (x: number) => number>>> = {
  log: Math.log,
  log10: Math.log10,
  exp: Math.exp,
  sqrt: Math.sqrt,
  abs: Math.abs,
  year: (days) => calendarDay(days).year,
  month: (days) => calendarDay(days).month,
  day: (days) => calendarDay(days).day,
  weekday: isoWeekday,
};

const FOLDS: Readonly<Partial<Record<FunctionName, Loop>>> = {
  min: (out, a, b, n) => combine(out, a, b, n, Math.min),
  max: (out, a, b, n) => combine(out, a, b, n, Math.max),
  round: (out, a, b, n) => combine(out, a, b, n, roundTo),
  days_between: (out, a, b, n) => subtract(out, b, a, n),
};

function compileCall(node: Expression & { kind: 'call' }, scope: Scope, depth: number): Step {
  const name = node.function as FunctionName;
  const [first, second, third] = node.arguments;
  if (first === undefined) throw new Error(`${name} is called without arguments.`);
  if (name === 'is_missing' && first.kind === 'name') return compileIsMissing(first.name, scope, depth);
  if (name === 'if' && second !== undefined && third !== undefined) {
    const condition = compile(first, scope, depth);
    const value = compile(second, scope, depth + 1);
    const other = compile(third, scope, depth + 2);
    const out = scratchAt(scope, depth);
    return (start, n) => {
      const holds = condition(start, n);
      const a = value(start, n);
      choose(out, holds, a, other(start, n), n);
      return out;
    };
  }
  const ofOne = OF_ONE[name];
  if (ofOne !== undefined) {
    const operand = compileOrdered(first, scope, depth);
    const out = scratchAt(scope, depth);
    return (start, n) => {
      map(out, operand(start, n), n, ofOne);
      return out;
    };
  }
  if (name === 'round' && second === undefined) return compileMap(first, scope, depth, (x) => roundTo(x, 0));
  const fold = FOLDS[name];
  if (fold === undefined) throw new Error(`There is no function "${name}".`);
  // One argument after the other, so that a long list needs no more memory than a short one.
  return node.arguments
    .slice(1)
    .reduce(
      (before, argument) => compileTwo(before, argument, scope, depth, fold),
      compileOrdered(first, scope, depth),
    );
}

function compileIsMissing(name: string, scope: Scope, depth: number): Step {
  const column = columnOf(name, scope);
  const out = scratchAt(scope, depth);
  return (start, n) => {
    for (let i = 0; i < n; i++) out[i] = isMissing(column, start + i) ? 1 : 0;
    return out;
  };
}

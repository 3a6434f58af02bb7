import type { BinaryOperator, Expression, ExpressionFault, Span } from './expression.ts';
import { readToken, type Token } from './tokens.ts';

/** Longer texts are refused: they are slips or attacks, and every part of one would be walked recursively. */
const LONGEST = 4_000;
/** Parentheses, calls, signs, powers and `not` inside one another. */
const DEEPEST = 100;

const LEVEL = { or: 1, and: 2, not: 3, comparison: 4, sum: 5, product: 6, sign: 7, power: 8 } as const;

const LEVEL_OF: Readonly<Record<BinaryOperator, number>> = {
  or: LEVEL.or,
  and: LEVEL.and,
  '==': LEVEL.comparison,
  '!=': LEVEL.comparison,
  '<': LEVEL.comparison,
  '<=': LEVEL.comparison,
  '>': LEVEL.comparison,
  '>=': LEVEL.comparison,
  '+': LEVEL.sum,
  '-': LEVEL.sum,
  '*': LEVEL.product,
  '/': LEVEL.product,
  '^': LEVEL.power,
};

/** Where the reading stands. `fault` is set as soon as anything is wrong; every reader then returns null. */
interface Cursor {
  readonly text: string;
  token: Token;
  depth: number;
  fault: ExpressionFault | null;
}

/**
 * The tree of an expression, or the first thing that is wrong with its form. From loose to tight: `or`, `and`,
 * `not`, comparisons (which do not chain), `+ -`, `* /`, the minus sign, `^` (from the right: 2^3^2 is 2^9, and
 * −x^2 is −(x²)). Names that are not plain words stand in back-quotes; texts in either quotation mark.
 */
export function parseExpression(
  text: string,
): { readonly expression: Expression } | { readonly fault: ExpressionFault } {
  if (text.length > LONGEST) {
    const message = `The expression has ${text.length} characters; the most is ${LONGEST}.`;
    return { fault: syntaxFault({ start: 0, end: text.length }, message, SPLIT_HINT) };
  }
  const first = readToken(text, 0);
  if (first.kind === 'end') {
    return { fault: syntaxFault({ start: 0, end: text.length }, 'The expression is empty.') };
  }
  const cursor: Cursor = { text, token: first, depth: 0, fault: null };
  const expression = parseFrom(cursor, LEVEL.or);
  if (expression !== null && cursor.token.kind !== 'end') failAfterValue(cursor, expression);
  if (cursor.fault !== null) return { fault: cursor.fault };
  return { expression: expression! };
}

const SPLIT_HINT = 'Split it over several derived variables.';

/** An operand, then every operator that binds at least as tightly as `level`. */
function parseFrom(cursor: Cursor, level: number): Expression | null {
  let left = parseOperand(cursor, level);
  while (left !== null) {
    const token: Token = cursor.token;
    if (token.kind !== 'operator' || LEVEL_OF[token.operator] < level) return left;
    const { operator } = token;
    const own = LEVEL_OF[operator];
    advance(cursor);
    const right: Expression | null =
      own === LEVEL.power
        ? nested(cursor, token, () => parseFrom(cursor, LEVEL.sign))
        : parseFrom(cursor, own + 1);
    if (right === null) return null;
    if (own === LEVEL.comparison && failOnChain(cursor, operator, left, right)) return null;
    left = { kind: 'binary', operator, left, right, start: left.start, end: right.end };
  }
  return null;
}

function parseOperand(cursor: Cursor, level: number): Expression | null {
  const { token } = cursor;
  const { start, end } = token;
  switch (token.kind) {
    case 'number':
      advance(cursor);
      return { kind: 'number', value: token.value, start, end };
    case 'text':
      advance(cursor);
      return { kind: 'text', value: token.value, start, end };
    case 'truth':
      advance(cursor);
      return { kind: 'truth', value: token.value, start, end };
    case 'name':
      advance(cursor);
      if (cursor.token.kind === '(' && !token.quoted) return parseCall(cursor, token.name, token);
      return { kind: 'name', name: token.name, start, end };
    case '(':
      return parseParentheses(cursor, token);
    case 'operator': {
      if (token.operator !== '-') return failBeforeValue(cursor);
      advance(cursor);
      const of = nested(cursor, token, () => parseFrom(cursor, LEVEL.sign));
      return of && { kind: 'negate', of, start, end: of.end };
    }
    case 'not': {
      if (level > LEVEL.not) {
        return fail(cursor, token, '"not" cannot follow this operator.', 'Put it in parentheses: (not …).');
      }
      advance(cursor);
      const of = nested(cursor, token, () => parseFrom(cursor, LEVEL.not));
      return of && { kind: 'not', of, start, end: of.end };
    }
    default:
      return failBeforeValue(cursor);
  }
}

/** The span of what is returned takes in the parentheses. */
function parseParentheses(cursor: Cursor, open: Span): Expression | null {
  advance(cursor);
  const inner = nested(cursor, open, () => parseFrom(cursor, LEVEL.or));
  if (inner === null) return null;
  const close = cursor.token;
  if (close.kind === 'end') return fail(cursor, open, 'This parenthesis is not closed.');
  if (close.kind !== ')') return failAfterValue(cursor, inner);
  advance(cursor);
  return { ...inner, start: open.start, end: close.end };
}

function parseCall(cursor: Cursor, name: string, functionSpan: Span): Expression | null {
  const open = cursor.token;
  const given: Expression[] = [];
  advance(cursor);
  while (cursor.token.kind !== ')' || given.length > 0) {
    const argument = nested(cursor, open, () => parseFrom(cursor, LEVEL.or));
    if (argument === null) return null;
    given.push(argument);
    if (cursor.token.kind === ')') break;
    if (cursor.token.kind === 'end') {
      return fail(cursor, open, `The parenthesis after "${name}" is not closed.`);
    }
    if (cursor.token.kind !== ',') return failAfterValue(cursor, argument);
    advance(cursor);
  }
  const { end } = cursor.token;
  advance(cursor);
  return {
    kind: 'call',
    function: name,
    functionSpan: { start: functionSpan.start, end: functionSpan.end },
    arguments: given,
    start: functionSpan.start,
    end,
  };
}

function nested(cursor: Cursor, opening: Span, parse: () => Expression | null): Expression | null {
  if (cursor.depth === DEEPEST) {
    return fail(cursor, opening, `The expression nests more than ${DEEPEST} levels deep.`, SPLIT_HINT);
  }
  cursor.depth++;
  const result = parse();
  cursor.depth--;
  return result;
}

function advance(cursor: Cursor): void {
  cursor.token = readToken(cursor.text, cursor.token.end);
}

/** `a < b < c` would compare a flag with a number; say how to write what was meant. */
function failOnChain(cursor: Cursor, operator: BinaryOperator, left: Expression, right: Expression): boolean {
  const { token } = cursor;
  if (token.kind !== 'operator' || LEVEL_OF[token.operator] !== LEVEL.comparison) return false;
  const written = (part: Span) => cursor.text.slice(part.start, part.end);
  const middle = written(right);
  const rest = middle.length > 40 ? '…' : middle;
  const first = written(left).length > 40 ? '…' : written(left);
  const hint = `Write ${first} ${operator} ${rest} and ${rest} ${token.operator} ….`;
  fail(cursor, token, 'Comparisons cannot be chained.', hint);
  return true;
}

/** The token stands where an operand should. */
function failBeforeValue(cursor: Cursor): null {
  const { token } = cursor;
  switch (token.kind) {
    case 'fault':
      cursor.fault ??= token.fault;
      return null;
    case 'end':
      return fail(cursor, token, 'The expression ends where a value is expected.');
    case 'operator':
      return fail(
        cursor,
        token,
        `A value is expected before "${token.operator}".`,
        token.operator === '+' ? 'Leave out the plus sign.' : undefined,
      );
    default:
      return fail(cursor, token, `A value is expected before "${token.kind}".`);
  }
}

/** The token stands where an operator, a comma, a closing parenthesis or the end should. */
function failAfterValue(cursor: Cursor, before: Expression): null {
  const { token } = cursor;
  const written = cursor.text.slice(token.start, token.end);
  switch (token.kind) {
    case 'fault':
      cursor.fault ??= token.fault;
      return null;
    case ')':
      return fail(cursor, token, 'This closing parenthesis has no opening one.');
    case ',':
      return fail(
        cursor,
        token,
        'A comma stands only between the arguments of a function.',
        'The decimal mark of an expression is the point: 1.5.',
      );
    case 'name': {
      const lower = token.name.toLowerCase();
      const isWord = !token.quoted && (lower === 'and' || lower === 'or' || lower === 'not');
      const hint = isWord
        ? `Write "${lower}" in small letters.`
        : before.kind === 'number'
          ? 'A product is written with *.'
          : 'A name with spaces or other signs stands in back-quotes.';
      return fail(cursor, token, `An operator is missing before "${written}".`, hint);
    }
    case '(':
      return fail(cursor, token, 'An operator is missing before "(".', 'A product is written with *.');
    default:
      return fail(cursor, token, `An operator is missing before ${quotedOnce(written)}.`);
  }
}

function quotedOnce(written: string): string {
  return written.startsWith('"') ? written : `"${written}"`;
}

function fail(cursor: Cursor, span: Span, message: string, hint?: string): null {
  cursor.fault ??= syntaxFault(span, message, hint);
  return null;
}

function syntaxFault(span: Span, message: string, hint?: string): ExpressionFault {
  return {
    code: 'expression_syntax',
    start: span.start,
    end: span.end,
    message,
    ...(hint === undefined ? {} : { hint }),
  };
}

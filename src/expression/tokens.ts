import type { BinaryOperator, ExpressionFault, Span } from './expression.ts';

export type Token = Span &
  (
    | { readonly kind: 'number'; readonly value: number }
    | { readonly kind: 'text'; readonly value: string }
    | { readonly kind: 'name'; readonly name: string; readonly quoted: boolean }
    | { readonly kind: 'truth'; readonly value: boolean }
    | { readonly kind: 'operator'; readonly operator: BinaryOperator }
    | { readonly kind: 'not' | '(' | ')' | ',' | 'end' }
    | { readonly kind: 'fault'; readonly fault: ExpressionFault }
  );

const NUMBER = /(?:\d+(?:\.\d+)?|\.\d+)(?:[eE][+-]?\d+)?/y;
const NAME = /[A-Za-z_][A-Za-z0-9_]*/y;
const BLANK = /[ \t\r\n\u00a0]*/y;
/** A word as a person would see it, with letters that a plain name may not have. */
const ANY_WORD = /[\p{L}\p{M}\p{Nd}_]+/uy;
const OPERATOR = /==|!=|<=|>=|[-+*/^<>]/y;

/** Signs that other notations use here, longest first, with what to write instead. */
const FOREIGN: readonly (readonly [sign: string, hint: string])[] = [
  ['===', 'Equality is written ==.'],
  ['!==', 'Inequality is written !=.'],
  ['**', 'A power is written ^.'],
  ['<>', 'Inequality is written !=.'],
  ['=<', '"At most" is written <=.'],
  ['=>', '"At least" is written >=.'],
  ['&&', 'Write the word "and".'],
  ['||', 'Write the word "or".'],
  ['++', 'Write one + only.'],
  ['//', 'A division is written /.'],
  ['=', 'Equality is written ==.'],
  ['&', 'Write the word "and".'],
  ['|', 'Write the word "or".'],
  ['!', 'Write the word "not".'],
  ['?', 'A choice is written if(condition, value, other value).'],
  ['%', 'A percentage is written as a fraction: 0.05 for 5 %.'],
  [';', 'Arguments are separated by commas; an expression is a single formula.'],
  ['[', 'Use parentheses.'],
  [']', 'Use parentheses.'],
  ['{', 'Use parentheses.'],
  ['}', 'Use parentheses.'],
  ['≤', '"At most" is written <=.'],
  ['≥', '"At least" is written >=.'],
  ['≠', 'Inequality is written !=.'],
  ['×', 'A product is written *.'],
  ['·', 'A product is written *.'],
  ['÷', 'A division is written /.'],
  ['−', 'The minus sign is the hyphen of the keyboard: -.'],
  ['–', 'The minus sign is the hyphen of the keyboard: -.'],
  ['²', 'A square is written ^ 2.'],
  ['³', 'A cube is written ^ 3.'],
  ['√', 'A square root is written sqrt(…).'],
  ['“', 'Texts stand in straight quotation marks: "text".'],
  ['”', 'Texts stand in straight quotation marks: "text".'],
  ['‘', "Texts stand in straight quotation marks: 'text'."],
  ['’', "Texts stand in straight quotation marks: 'text'."],
];

/** The token that begins at or after `from`. At the end of the text, a token of kind "end" and no length. */
export function readToken(text: string, from: number): Token {
  const start = from + (match(BLANK, text, from)?.length ?? 0);
  if (start >= text.length) return { kind: 'end', start: text.length, end: text.length };
  const first = text[start]!;

  if (first === '"' || first === "'" || first === '`') return readQuoted(text, start, first);
  if (first === '(' || first === ')' || first === ',') return { kind: first, start, end: start + 1 };

  const foreign = FOREIGN.find(([sign]) => text.startsWith(sign, start) && !isOurs(sign, text, start));
  if (foreign !== undefined) {
    const [sign, hint] = foreign;
    return fault(start, start + sign.length, `"${sign}" has no meaning in an expression.`, hint);
  }

  const number = match(NUMBER, text, start);
  if (number !== null) return readNumber(text, start, number);

  const operator = match(OPERATOR, text, start);
  if (operator !== null) {
    return {
      kind: 'operator',
      operator: operator as BinaryOperator,
      start,
      end: start + operator.length,
    };
  }

  const word = match(ANY_WORD, text, start);
  const name = match(NAME, text, start);
  if (name !== null && word === name) return readWord(start, name);
  if (word !== null) {
    const message = `"${word}" has letters other than A to Z, digits and _.`;
    return fault(start, start + word.length, message, `Write it in back-quotes: \`${word}\`.`);
  }

  const character = String.fromCodePoint(text.codePointAt(start)!);
  return fault(start, start + character.length, `"${character}" has no meaning in an expression.`);
}

/** "!=" and "==" begin with signs that are foreign on their own. */
function isOurs(sign: string, text: string, start: number): boolean {
  return (sign === '!' || sign === '=') && text[start + 1] === '=';
}

function readWord(start: number, word: string): Token {
  const end = start + word.length;
  if (word === 'and' || word === 'or') return { kind: 'operator', operator: word, start, end };
  if (word === 'not') return { kind: 'not', start, end };
  if (word === 'true' || word === 'false') return { kind: 'truth', value: word === 'true', start, end };
  return { kind: 'name', name: word, quoted: false, start, end };
}

function readNumber(text: string, start: number, digits: string): Token {
  const end = start + digits.length;
  if (text[end] === '.' && !digits.includes('.') && !/\d/.test(text[end + 1] ?? '')) {
    return fault(
      start,
      end + 1,
      `"${digits}." has no digits after the point.`,
      `Write ${digits} or ${digits}.0.`,
    );
  }
  const value = Number(digits);
  if (!Number.isFinite(value)) {
    return fault(start, end, `The number ${digits} is too large.`, 'The largest is about 1.8e308.');
  }
  return { kind: 'number', value, start, end };
}

/** A text in " or ', or a name in `. The quotation mark itself is written twice inside. */
function readQuoted(text: string, start: number, quote: '"' | "'" | '`'): Token {
  let value = '';
  let at = start + 1;
  for (;;) {
    const close = text.indexOf(quote, at);
    if (close === -1) {
      const what = quote === '`' ? 'name in back-quotes' : 'text';
      return fault(start, text.length, `This ${what} is not closed.`, `Close it with ${quote}.`);
    }
    value += text.slice(at, close);
    at = close + 1;
    if (text[at] !== quote) break;
    value += quote;
    at++;
  }
  if (quote !== '`') return { kind: 'text', value, start, end: at };
  if (value === '') return fault(start, at, 'There is no name between the back-quotes.');
  return { kind: 'name', name: value, quoted: true, start, end: at };
}

function fault(start: number, end: number, message: string, hint?: string): Token {
  const found: ExpressionFault = {
    code: 'expression_syntax',
    start,
    end,
    message,
    ...(hint === undefined ? {} : { hint }),
  };
  return { kind: 'fault', fault: found, start, end };
}

function match(pattern: RegExp, text: string, at: number): string | null {
  pattern.lastIndex = at;
  return pattern.exec(text)?.[0] ?? null;
}

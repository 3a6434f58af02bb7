import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Expression } from '../../src/expression/expression.ts';
import { parseExpression } from '../../src/expression/parse-expression.ts';
import { anyExpression } from './any-expression.ts';
import { bare, writeExpression, writeSparingly } from './write-expression.ts';

function parsed(text: string): Expression {
  const result = parseExpression(text);
  if ('fault' in result) throw new Error(`${text}: ${result.fault.message}`);
  return result.expression;
}

/** Fully parenthesised, without the back-quotes. */
function shape(text: string): string {
  return writeExpression(parsed(text)).replaceAll('`', '');
}

describe('precedence', () => {
  test.each([
    ['-x^2', '(-(x ^ 2))'],
    ['2^-3', '(2 ^ (-3))'],
    ['2^3^2', '(2 ^ (3 ^ 2))'],
    ['2^-3^2', '(2 ^ (-(3 ^ 2)))'],
    ['2^-3*4', '((2 ^ (-3)) * 4)'],
    ['-x*y', '((-x) * y)'],
    ['x*-y', '(x * (-y))'],
    ['--x', '(-(-x))'],
    ['a - b - c', '((a - b) - c)'],
    ['a / b * c', '((a / b) * c)'],
    ['a + b * c ^ d', '(a + (b * (c ^ d)))'],
    ['(a + b) * c', '((a + b) * c)'],
    ['not a == b', '(not (a == b))'],
    ['not not a', '(not (not a))'],
    ['not a and b', '((not a) and b)'],
    ['a or b and c', '(a or (b and c))'],
    ['a + 1 < b * 2 and c != 3', '(((a + 1) < (b * 2)) and (c != 3))'],
    ['(a < b) == c', '((a < b) == c)'],
    ['if(a > 0, -1, b) + 2', '(if((a > 0), (-1), b) + 2)'],
    ['f()', 'f()'],
    ['min(a, (b), c)', 'min(a, b, c)'],
    ['min', 'min'],
    ["status == 'it''s'", '(status == "it\'s")'],
  ])('%s is %s', (text, expected) => {
    expect(shape(text)).toBe(expected);
  });

  test.each([
    ['1', 1],
    ['1.5', 1.5],
    ['.5', 0.5],
    ['1e-3', 1e-3],
    ['2.5E+2', 250],
    ['1e-400', 0],
  ])('the number %s', (text, value) => {
    expect(bare(parsed(text))).toEqual({ kind: 'number', value });
  });

  test('a name in back-quotes may be anything, also a word of the language', () => {
    expect(bare(parsed('`wind, m/s` + `and` * `a``b`'))).toEqual({
      kind: 'binary',
      operator: '+',
      left: { kind: 'name', name: 'wind, m/s' },
      right: {
        kind: 'binary',
        operator: '*',
        left: { kind: 'name', name: 'and' },
        right: { kind: 'name', name: 'a`b' },
      },
    });
  });

  test('blanks and line breaks do not matter', () => {
    expect(shape(' a\n  +\tb ')).toBe(shape('a+b'));
  });
});

describe('places', () => {
  test('of every node, parentheses included', () => {
    const sum = parsed(' (a + bb) * log(c)');
    expect(sum).toMatchObject({ start: 1, end: 18 });
    if (sum.kind !== 'binary') throw new Error('not a product');
    expect(sum.left).toMatchObject({ kind: 'binary', start: 1, end: 9 });
    if (sum.left.kind !== 'binary') throw new Error('not a sum');
    expect(sum.left.right).toMatchObject({ kind: 'name', start: 6, end: 8 });
    expect(sum.right).toMatchObject({ start: 12, end: 18, functionSpan: { start: 12, end: 15 } });
    expect(parsed('not -x')).toMatchObject({ start: 0, end: 6, of: { start: 4, end: 6 } });
  });
});

describe('faults', () => {
  test.each([
    ['', 0, 0, 'empty', undefined],
    ['  ', 0, 2, 'empty', undefined],
    ['a = b', 2, 3, '"="', '=='],
    ['a === b', 2, 5, '"==="', '=='],
    ['a !== b', 2, 5, '"!=="', '!='],
    ['a <> b', 2, 4, '"<>"', '!='],
    ['a => b', 2, 4, '"=>"', '>='],
    ['a =< b', 2, 4, '"=<"', '<='],
    ['a && b', 2, 4, '"&&"', '"and"'],
    ['a || b', 2, 4, '"||"', '"or"'],
    ['a & b', 2, 3, '"&"', '"and"'],
    ['!a', 0, 1, '"!"', '"not"'],
    ['a ** 2', 2, 4, '"**"', '^'],
    ['a ≤ b', 2, 3, '"≤"', '<='],
    ['a − b', 2, 3, '"−"', 'hyphen'],
    ['speed²', 5, 6, '"²"', '^ 2'],
    ['a ? b : c', 2, 3, '"?"', 'if(condition'],
    ['s == “x”', 5, 6, '"“"', 'straight'],
    ['a[1]', 1, 2, '"["', 'parentheses'],
    ['a @ b', 2, 3, '"@"', undefined],
    ['a 😀', 2, 4, '"😀"', undefined],
    ['a < b < c', 6, 7, 'chained', 'a < b and b < …'],
    ['a == b != c', 7, 9, 'chained', 'a == b and b != …'],
    ['+a', 0, 1, 'before "+"', 'plus sign'],
    ['a + * b', 4, 5, 'before "*"', undefined],
    ['a +', 3, 3, 'ends where', undefined],
    ['a or or b', 5, 7, 'before "or"', undefined],
    ['(a', 0, 1, 'not closed', undefined],
    ['a)', 1, 2, 'no opening', undefined],
    ['()', 1, 2, 'before ")"', undefined],
    ['log(a', 3, 4, 'after "log" is not closed', undefined],
    ['log(a,)', 6, 7, 'before ")"', undefined],
    ['log(,a)', 4, 5, 'before ","', undefined],
    ['log(a b)', 6, 7, 'missing before "b"', 'back-quotes'],
    ['a, b', 1, 2, 'comma', '1.5'],
    ['2 a', 2, 3, 'missing before "a"', '*'],
    ['2(a)', 1, 2, 'missing before "("', '*'],
    ['`a`(b)', 3, 4, 'missing before "("', '*'],
    ['a 2', 2, 3, 'missing before "2"', undefined],
    ['a "b"', 2, 5, 'missing before "b"', undefined],
    ['a AND b', 2, 5, 'missing before "AND"', 'small letters'],
    ['a not b', 2, 5, 'missing before "not"', undefined],
    ['a == not b', 5, 8, '"not" cannot follow', '(not …)'],
    ['-not a', 1, 4, '"not" cannot follow', '(not …)'],
    ['"abc', 0, 4, 'not closed', '"'],
    ["x == 'abc", 5, 9, 'not closed', "'"],
    ['`abc', 0, 4, 'not closed', '`'],
    ['``', 0, 2, 'no name between', undefined],
    ['1.', 0, 2, 'no digits after', '1.0'],
    ['a * 1e400', 4, 9, 'too large', '1.8e308'],
    ['größe + 1', 0, 5, '"größe"', '`größe`'],
  ])('%s', (text, start, end, message, hint) => {
    const result = parseExpression(text);
    if (!('fault' in result)) throw new Error('no fault was found');
    expect(result.fault).toMatchObject({ code: 'expression_syntax', start, end });
    expect(result.fault.message).toContain(message);
    expect(result.fault.message).toMatch(/\.$/);
    if (hint === undefined) expect(result.fault.hint).toBeUndefined();
    else expect(result.fault.hint).toContain(hint);
  });

  test('of two the earlier is told', () => {
    expect(parseExpression('a b = c')).toMatchObject({ fault: { start: 2 } });
  });

  test.each(['(', '-', 'not ', 'abs(', '2^'])('deep nesting of %s is refused, not tried', (opening) => {
    const result = parseExpression(opening.repeat(900));
    expect(result).toMatchObject({ fault: { hint: 'Split it over several derived variables.' } });
    if ('fault' in result) expect(result.fault.message).toContain('100 levels');
    expect(parseExpression(`${'('.repeat(100)}a${')'.repeat(100)}`)).toHaveProperty('expression');
  });

  test('a long text is refused, a long sum within the limit is read', () => {
    expect(parseExpression('a+'.repeat(3000))).toMatchObject({
      fault: { message: 'The expression has 6000 characters; the most is 4000.' },
    });
    expect(parseExpression(`${'a+'.repeat(1999)}a`)).toHaveProperty('expression');
  });

  test('any text gives a tree or one fault inside it', () => {
    const piece = fc.oneof(
      fc.string({ unit: 'grapheme' }),
      fc.constantFrom(
        ...'( ) , + - * / ^ == = < not and or "x" \'y\' `z` 1 2.5 name log( if( 1e9 ! é'.split(' '),
      ),
    );
    fc.assert(
      fc.property(fc.array(piece, { maxLength: 30 }), fc.constantFrom('', ' '), (pieces, between) => {
        const text = pieces.join(between);
        const result = parseExpression(text);
        const span = 'fault' in result ? result.fault : result.expression;
        expect(span.start).toBeGreaterThanOrEqual(0);
        expect(span.end).toBeGreaterThanOrEqual(span.start);
        expect(span.end).toBeLessThanOrEqual(text.length);
      }),
      { numRuns: 2000 },
    );
  });
});

describe('writing and reading again', () => {
  test('gives the same tree, with all parentheses or the fewest', () => {
    fc.assert(
      fc.property(anyExpression, (tree) => {
        for (const text of [writeExpression(tree), writeSparingly(tree)]) {
          const again = parsed(text);
          expect(bare(again)).toEqual(bare(tree));
          expectInside(again, { start: 0, end: text.length });
        }
      }),
      { numRuns: 500 },
    );
  });
});

/** Every part lies within the whole. */
function expectInside(node: Expression, whole: { start: number; end: number }): void {
  expect(node.start).toBeGreaterThanOrEqual(whole.start);
  expect(node.end).toBeLessThanOrEqual(whole.end);
  expect(node.end).toBeGreaterThan(node.start);
  if (node.kind === 'binary') for (const part of [node.left, node.right]) expectInside(part, node);
  if (node.kind === 'negate' || node.kind === 'not') expectInside(node.of, node);
  if (node.kind === 'call') for (const part of node.arguments) expectInside(part, node);
}

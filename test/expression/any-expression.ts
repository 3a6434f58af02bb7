import fc from 'fast-check';
import type { BinaryOperator, Expression } from '../../src/expression/expression.ts';

const place = { start: 0, end: 0 };

export const numberNode = (value: number): Expression => ({ kind: 'number', value, ...place });
export const nameNode = (name: string): Expression => ({ kind: 'name', name, ...place });
export const textNode = (value: string): Expression => ({ kind: 'text', value, ...place });
export const truthNode = (value: boolean): Expression => ({ kind: 'truth', value, ...place });
export const negateNode = (of: Expression): Expression => ({ kind: 'negate', of, ...place });
export const notNode = (of: Expression): Expression => ({ kind: 'not', of, ...place });
export const binaryNode = (operator: BinaryOperator, left: Expression, right: Expression): Expression => ({
  kind: 'binary',
  operator,
  left,
  right,
  ...place,
});
export const callNode = (name: string, ...given: Expression[]): Expression => ({
  kind: 'call',
  function: name,
  functionSpan: place,
  arguments: given,
  ...place,
});

const OPERATORS: readonly BinaryOperator[] = [
  '+',
  '-',
  '*',
  '/',
  '^',
  '==',
  '!=',
  '<',
  '<=',
  '>',
  '>=',
  'and',
  'or',
];

/** Any tree that can be written, whatever its types. */
export const anyExpression: fc.Arbitrary<Expression> = fc.letrec<{ node: Expression }>((tie) => ({
  node: fc.oneof(
    { maxDepth: 5, withCrossShrink: true },
    fc.oneof(
      fc.double({ min: 0, max: 1e12, noNaN: true }).map((value) => numberNode(Math.abs(value))),
      fc.string().map(textNode),
      fc.boolean().map(truthNode),
      fc
        .oneof(fc.constantFrom('speed', 'and', 'true', 'a b', 'log'), fc.string({ minLength: 1 }))
        .map(nameNode),
    ),
    tie('node').map(negateNode),
    tie('node').map(notNode),
    fc
      .tuple(fc.constantFrom(...OPERATORS), tie('node'), tie('node'))
      .map(([operator, left, right]) => binaryNode(operator, left, right)),
    fc
      .tuple(fc.constantFrom('log', 'min', 'if', 'anything_1'), fc.array(tie('node'), { maxLength: 3 }))
      .map(([name, given]) => callNode(name, ...given)),
  ),
})).node;

import fc from 'fast-check';
import type { Expression } from '../../src/expression/expression.ts';
import {
  binaryNode,
  callNode,
  nameNode,
  negateNode,
  notNode,
  numberNode,
  textNode,
  truthNode,
} from '../expression/any-expression.ts';

/**
 * Trees without type faults over x and y (numbers), p and q (flags), d and e (dates), c (category with levels
 * A, B, C) and t (text).
 */
const trees = fc.letrec<{ number: Expression; flag: Expression; date: Expression }>((tie) => {
  const number = tie('number');
  const flag = tie('flag');
  const date = tie('date');
  const word = fc.constantFrom(nameNode('c'), nameNode('t'), textNode('A'), textNode('Z'));
  const isoText = fc
    .date({ min: new Date(0), max: new Date('2040-01-01'), noInvalidDate: true })
    .map((moment) => textNode(moment.toISOString().slice(0, 10)));
  const order = fc.constantFrom('==', '!=', '<', '<=', '>', '>=');
  const equality = fc.constantFrom('==', '!=');
  return {
    number: fc.oneof(
      { maxDepth: 5, withCrossShrink: true },
      fc.constantFrom(nameNode('x'), nameNode('y'), ...[0, 1, 2, 3, 4, 0.5, 1e200].map(numberNode)),
      number.map(negateNode),
      fc
        .tuple(fc.constantFrom('+', '-', '*', '/', '^'), number, number)
        .map(([operator, a, b]) => binaryNode(operator, a, b)),
      fc
        .tuple(fc.constantFrom('log', 'log10', 'exp', 'sqrt', 'abs', 'round'), number)
        .map(([name, a]) => callNode(name, a)),
      fc
        .tuple(number, fc.constantFrom(0, 1, 2, 5))
        .map(([a, digits]) => callNode('round', a, numberNode(digits))),
      fc
        .tuple(fc.constantFrom('min', 'max'), fc.array(number, { minLength: 2, maxLength: 4 }))
        .map(([name, given]) => callNode(name, ...given)),
      fc.tuple(flag, number, number).map(([condition, a, b]) => callNode('if', condition, a, b)),
      fc
        .tuple(fc.constantFrom('year', 'month', 'day', 'weekday'), date)
        .map(([name, when]) => callNode(name, when)),
      fc.tuple(date, date).map(([from, to]) => callNode('days_between', from, to)),
    ),
    flag: fc.oneof(
      { maxDepth: 5, withCrossShrink: true },
      fc.oneof(
        fc.constantFrom(nameNode('p'), nameNode('q')),
        fc.boolean().map(truthNode),
        fc.constantFrom(...'xypqdect').map((name) => callNode('is_missing', nameNode(name))),
        fc.tuple(equality, word, word).map(([operator, a, b]) => binaryNode(operator, a, b)),
      ),
      flag.map(notNode),
      fc
        .tuple(fc.constantFrom('and', 'or', '==', '!='), flag, flag)
        .map(([operator, a, b]) => binaryNode(operator, a, b)),
      fc.tuple(order, number, number).map(([operator, a, b]) => binaryNode(operator, a, b)),
      fc.tuple(order, date, date).map(([operator, a, b]) => binaryNode(operator, a, b)),
      fc.tuple(order, date, isoText).map(([operator, a, b]) => binaryNode(operator, a, b)),
      fc.tuple(order, isoText, date).map(([operator, a, b]) => binaryNode(operator, a, b)),
      fc.tuple(flag, flag, flag).map(([condition, a, b]) => callNode('if', condition, a, b)),
    ),
    date: fc.oneof(
      { maxDepth: 3, withCrossShrink: true },
      fc.constantFrom(nameNode('d'), nameNode('e')),
      fc.tuple(flag, date, date).map(([condition, a, b]) => callNode('if', condition, a, b)),
    ),
  };
});

export const anyTypedExpression: fc.Arbitrary<Expression> = fc.oneof(trees.number, trees.flag, trees.date);

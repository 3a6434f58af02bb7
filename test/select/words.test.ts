import { expect, test } from 'vitest';
import {
  beside,
  counted,
  limitText,
  listed,
  listedUpTo,
  named,
  probability,
  probabilityBeside,
  significant,
} from '../../src/select/words.ts';

test.each([
  [0, 3, '0'],
  [14.2331, 3, '14.2'],
  [9.999, 3, '10.0'],
  [-0.14406, 3, '−0.144'],
  [1234567, 3, '1\u202f234\u202f567'],
  [1.25e12, 3, '1.25 × 10¹²'],
  [3.14e-8, 2, '3.1 × 10⁻⁸'],
  [9.96e-5, 2, '0.00010'],
  [0.00071, 2, '0.00071'],
])('%d to %d significant digits is %s', (value, digits, text) => {
  expect(significant(value, digits)).toBe(text);
});

test('a figure beside its limit has as many digits as it takes to lie on its side', () => {
  expect(beside(14.2331, 10)).toBe('14.2');
  expect(beside(10.004, 10)).toBe('10.004');
  expect(beside(0.7496, 0.75)).toBe('0.7496');
  expect(beside(10 + 2e-15, 10)).toBe('10.000000000000002');
  expect(probabilityBeside(0.42, 0.1)).toBe('0.42');
  expect(probabilityBeside(0.1003, 0.1)).toBe('0.1003');
  expect(probability(0)).toBe('below 10⁻³⁰⁰');
  expect(limitText(-0.5)).toBe('−0.5');
});

test('lists and counts', () => {
  expect(listed([])).toBe('');
  expect(listed(['a', 'b', 'c'], 'or')).toBe('a, b or c');
  expect(listedUpTo(['a', 'b', 'c', 'd'], 3)).toBe('a, b, c and d');
  expect(listedUpTo(['a', 'b', 'c', 'd', 'e'], 3)).toBe('a, b, c and 2 more');
  expect(counted(1, 'row')).toBe('1 row');
  expect(counted(2, 'row')).toBe('2 rows');
  expect(counted(1461, 'row')).toBe('1\u202f461 rows');
  expect(named('By vessel')).toBe('By vessel');
  expect(named('By vessel, booked')).toBe('“By vessel, booked”');
});

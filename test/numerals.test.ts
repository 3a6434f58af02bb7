import fc from 'fast-check';
import { expect, test } from 'vitest';
import { decimalNumber, dressed, wholeNumber } from '../src/numerals.ts';

test.each([
  ['0', '0'],
  ['999', '999'],
  ['1461', '1\u202f461'],
  ['-1234567.8901', '−1\u202f234\u202f567.8901'],
  ['-0.00', '0.00'],
  ['-0.01', '−0.01'],
])('%s is written %s', (text, written) => {
  expect(dressed(text)).toBe(written);
});

test('numbers', () => {
  expect(wholeNumber(120_000)).toBe('120\u202f000');
  expect(decimalNumber(-0.004, 2)).toBe('0.00');
  expect(decimalNumber(-0.14, 2)).toBe('−0.14');
});

test('what is written reads back', () => {
  fc.assert(
    fc.property(fc.integer(), (n) => {
      expect(Number(wholeNumber(n).replaceAll('\u202f', '').replace('−', '-')) + 0).toBe(n + 0);
    }),
  );
});

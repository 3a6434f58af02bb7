import fc from 'fast-check';
import { expect, test } from 'vitest';
import { readNumber, readPlainNumber } from '../../src/data/read-number.ts';

const digits = (least: number, most: number) =>
  fc
    .array(fc.constantFrom(...'0123456789'), { minLength: least, maxLength: most })
    .map((all) => all.join(''));

const plain = fc
  .tuple(fc.constantFrom('', '-', '+'), digits(0, 20), fc.boolean(), digits(0, 20))
  .filter(([, whole, , part]) => whole.length + part.length > 0)
  .map(([sign, whole, mark, part]) => `${sign}${whole}${mark || whole === '' ? '.' : ''}${part}`);

test('a plain number is exactly the double that the language reads', () => {
  fc.assert(
    fc.property(plain, (text) => {
      expect(Object.is(readPlainNumber(text, 46), Number(text))).toBe(true);
      expect(Object.is(readPlainNumber(text.replace('.', ','), 44), Number(text))).toBe(true);
    }),
    { numRuns: 20_000 },
  );
});

test('every double comes back from its shortest text', () => {
  fc.assert(
    fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (value) => {
      const expected = value === 0 ? 0 : value;
      expect(readNumber(String(value), '.')).toBe(expected);
      expect(readNumber(` ${String(value).replace('.', ',')}\t`, ',')).toBe(expected);
      const quick = readPlainNumber(String(value), 46);
      expect(Number.isNaN(quick) || quick === expected).toBe(true);
    }),
    { numRuns: 5_000 },
  );
});

test('halves of the last place: sums of powers of two written out in full', () => {
  // Midpoints between neighbouring doubles are where a doubly rounded reading goes wrong.
  for (let k = 0; k < 200; k++) {
    const integer = 2n ** 53n + BigInt(2 * k + 1);
    for (const text of [
      String(integer),
      `${integer}.0`,
      `${String(integer).slice(0, 5)}.${String(integer).slice(5)}`,
    ]) {
      expect(readPlainNumber(text, 46)).toBe(Number(text));
    }
  }
});

test('what is not a plain number is left to the full reading', () => {
  for (const text of [
    '',
    '.',
    '-',
    '+.',
    ' 1',
    '1 ',
    '1e3',
    '1.2.3',
    '1,5',
    '0x1',
    '1_0',
    'NaN',
    'Infinity',
    '１',
  ]) {
    expect(readPlainNumber(text, 46)).toBeNaN();
  }
});

test('what is not a number at all', () => {
  for (const text of [
    '',
    ' ',
    '.',
    'e3',
    '1e',
    '1e+',
    '1e400',
    '-1e400',
    '0b1',
    '1_000',
    '−5',
    '1 e3',
    '$5',
    '5%',
  ]) {
    expect(readNumber(text, '.')).toBeNaN();
  }
  expect(readNumber('9'.repeat(400), '.')).toBeNaN();
  expect(readPlainNumber('9'.repeat(400), 46)).toBeNaN();
});

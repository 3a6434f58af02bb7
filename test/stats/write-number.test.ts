import fc from 'fast-check';
import { expect, test } from 'vitest';
import { LONGEST_NUMBER, writeNumber } from '../../src/stats/write-number.ts';

// Expected texts are the language's own (ECMA-262, Number::toString).
const out = Buffer.alloc(100);
const written = (value: number) => out.toString('latin1', 3, writeNumber(value, out, 3));

const bits = new DataView(new ArrayBuffer(8));

test('any double is written as the language writes it', () => {
  fc.assert(
    fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (value) => {
      expect(written(value)).toBe(String(value));
      expect(String(value).length).toBeLessThanOrEqual(LONGEST_NUMBER);
    }),
    { numRuns: 20_000 },
  );
});

test('doubles of every size that has a quick way, spread evenly over their bits', () => {
  // A generator of its own, since 300,000 are wanted.
  let state = 1;
  const random = () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return state / 2 ** 32;
  };
  const wrong: number[] = [];
  for (let k = 0; k < 300_000; k++) {
    bits.setUint32(0, (1023 - 21 + Math.floor(random() * 79)) * 2 ** 20 + Math.floor(random() * 2 ** 20));
    bits.setUint32(4, Math.floor(random() * 2 ** 32));
    const value = bits.getFloat64(0) * (k % 2 === 0 ? 1 : -1);
    if (written(value) !== String(value)) wrong.push(value);
  }
  expect(wrong).toEqual([]);
});

test('numbers of few digits, whole numbers, and the doubles beside them', () => {
  const decimal = fc
    .tuple(
      fc.integer({ min: -(10 ** 9), max: 10 ** 9 }),
      fc.integer({ min: -12, max: 20 }),
      fc.constantFrom(-1, 0, 1),
    )
    .map(([digits, exponent, step]) => beside(Number(`${digits}e${exponent}`), step));
  fc.assert(
    fc.property(decimal, (value) => {
      expect(written(value)).toBe(String(value));
    }),
    { numRuns: 20_000 },
  );
});

test('powers of two and of ten, halves, the ends of the quick way', () => {
  const values = [
    0,
    1e-6,
    1e17,
    1e-7,
    1e21,
    0.1,
    0.3,
    0.1 + 0.2,
    2 ** 53 + 2,
    5e-324,
    1.7976931348623157e308,
  ];
  for (let k = -40; k < 70; k++) values.push(2 ** k, 1.5 * 2 ** k);
  for (let k = -8; k < 22; k++) values.push(Number(`1e${k}`), Number(`5e${k}`), Number(`9.5e${k}`));
  for (const value of values) {
    for (const step of [-2, -1, 0, 1, 2]) {
      const near = beside(value, step);
      expect(written(near)).toBe(String(near));
      expect(written(-near)).toBe(String(-near));
    }
  }
});

/** The double so many steps away from a positive one. */
function beside(value: number, steps: number): number {
  if (!(value > 0 && value < 1e300)) return value;
  bits.setFloat64(0, value);
  bits.setBigUint64(0, bits.getBigUint64(0) + BigInt(value > 1e-300 ? steps : 0));
  return bits.getFloat64(0);
}

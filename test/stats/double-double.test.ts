import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  addPair,
  dividePair,
  multiplyPair,
  pair,
  squareRootPair,
  twoProduct,
  twoSum,
} from '../../src/stats/double-double.ts';

/** A double as an exact fraction numerator · 2^exponent, in whole numbers of any size. */
function exact(value: number): { numerator: bigint; exponent: number } {
  if (value === 0) return { numerator: 0n, exponent: 0 };
  let exponent = Math.floor(Math.log2(Math.abs(value))) - 60;
  let scaled = value;
  // Two steps, since 2^-exponent alone may overflow.
  const half = Math.trunc(-exponent / 2);
  scaled = value * 2 ** half * 2 ** (-exponent - half);
  while (!Number.isInteger(scaled)) {
    scaled *= 2;
    exponent -= 1;
  }
  return { numerator: BigInt(scaled), exponent };
}

/** Σ of exact terms over 2^exponent of the smallest. */
function sumOf(...terms: { numerator: bigint; exponent: number }[]): { numerator: bigint; exponent: number } {
  const exponent = Math.min(...terms.map((term) => term.exponent));
  return {
    numerator: terms.reduce((sum, term) => sum + (term.numerator << BigInt(term.exponent - exponent)), 0n),
    exponent,
  };
}

const product = (a: { numerator: bigint; exponent: number }, b: { numerator: bigint; exponent: number }) => ({
  numerator: a.numerator * b.numerator,
  exponent: a.exponent + b.exponent,
});
const negative = (a: { numerator: bigint; exponent: number }) => ({ ...a, numerator: -a.numerator });
const value = (a: { numerator: bigint; exponent: number }) => {
  const bits = a.numerator.toString(2).length;
  const shift = Math.max(0, bits - 60);
  return Number(a.numerator >> BigInt(shift)) * 2 ** (a.exponent + shift);
};

const doubles = fc
  .double({ min: -1e60, max: 1e60, noNaN: true })
  .filter((x) => x === 0 || Math.abs(x) > 1e-60);
const pairs = fc
  .tuple(doubles, fc.double({ min: -0.5, max: 0.5, noNaN: true }))
  .map(([hi, share]): [number, number] => [hi, hi * 2 ** -53 * share]);
const ofPair = ([hi, lo]: readonly [number, number] | Float64Array) => sumOf(exact(hi!), exact(lo!));

describe('double-double', () => {
  test('sums and products of doubles are exact', () => {
    fc.assert(
      fc.property(doubles, doubles, (a, b) => {
        const out = pair();
        twoSum(a, b, out);
        expect(sumOf(ofPair(out), negative(exact(a)), negative(exact(b))).numerator).toBe(0n);
        twoProduct(a, b, out);
        expect(sumOf(ofPair(out), negative(product(exact(a), exact(b)))).numerator).toBe(0n);
      }),
    );
  });

  test('products, quotients and roots of pairs are right to 2^-100', () => {
    fc.assert(
      fc.property(pairs, pairs, (a, b) => {
        fc.pre(a[0] !== 0 && b[0] !== 0);
        const out = pair();
        multiplyPair(a[0], a[1], b[0], b[1], out);
        const wanted = product(ofPair(a), ofPair(b));
        expect(Math.abs(value(sumOf(ofPair(out), negative(wanted))) / value(wanted))).toBeLessThan(2 ** -100);
        dividePair(a[0], a[1], b[0], b[1], out);
        const back = product(ofPair(out), ofPair(b));
        expect(Math.abs(value(sumOf(back, negative(ofPair(a)))) / a[0])).toBeLessThan(2 ** -100);
        squareRootPair(Math.abs(a[0]), a[1] * Math.sign(a[0]), out);
        const square = product(ofPair(out), ofPair(out));
        const of = ofPair([Math.abs(a[0]), a[1] * Math.sign(a[0])]);
        expect(Math.abs(value(sumOf(square, negative(of))) / a[0])).toBeLessThan(2 ** -99);
      }),
    );
  });

  test('sums of pairs of one sign are right to 2^-100', () => {
    fc.assert(
      fc.property(pairs, pairs, (a, b) => {
        fc.pre(a[0] > 0 && b[0] > 0);
        const out = pair();
        addPair(a[0], a[1], b[0], b[1], out);
        const wanted = sumOf(ofPair(a), ofPair(b));
        expect(Math.abs(value(sumOf(ofPair(out), negative(wanted))) / value(wanted))).toBeLessThan(2 ** -100);
      }),
    );
  });
});

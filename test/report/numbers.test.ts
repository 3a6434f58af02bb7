import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  count,
  decimalExponent,
  fixed,
  isoDate,
  longDate,
  NBSP,
  NONE,
  percent,
  powerOfTen,
  pPhrase,
  pValue,
  range,
  rangeWithUnit,
  rounded,
  roundingFor,
  roundingOfInterval,
  scientific,
  share,
  significant,
  THIN,
  value,
  withUnit,
} from '../../src/report/numbers.ts';

/** Special spaces as plain ones, so that expectations can be read. */
const plain = (text: string): string => text.replace(/[\u00a0\u202f]/g, ' ');

describe('fixed', () => {
  it('groups thousands and uses a true minus sign', () => {
    expect(fixed(1234567.891, 1)).toBe(`1${THIN}234${THIN}567.9`);
    expect(fixed(-1234, 0)).toBe(`−1${THIN}234`);
    expect(fixed(999, 0)).toBe('999');
  });
  it('has no minus zero', () => {
    expect(fixed(-0.001, 2)).toBe('0.00');
    expect(fixed(-0, 0)).toBe('0');
  });
  it('rounds to tens and hundreds for negative decimals', () => {
    expect(fixed(1849, -2)).toBe(`1${THIN}800`);
    expect(fixed(-15, -1)).toBe('−10');
  });
  it('shows what is missing or without end', () => {
    expect(fixed(null, 2)).toBe(NONE);
    expect(fixed(Number.NaN, 2)).toBe(NONE);
    expect(fixed(Number.NEGATIVE_INFINITY, 2)).toBe('−∞');
    expect(plain(fixed(1.5e30, 0))).toBe('1.50 × 10³⁰');
  });
});

describe('rounding by the standard error', () => {
  it.each([
    [1.9284, 0.1491, '1.93'],
    [133.93, 11.2, '134'],
    [1234.5, 120, `1${THIN}230`],
    [0.20896, 0.0049, '0.2090'],
    [1.9284, 0.0996, '1.93'],
    [5, null, '5.000'],
    [0, 0, '0.000'],
  ])('%f with standard error %s reads %s', (estimate, error, text) => {
    expect(rounded(estimate, roundingFor(estimate, error))).toBe(text);
  });
  it('takes a power of ten out of numbers of extreme size, once for an interval', () => {
    const rounding = roundingFor(1.234e-7, 1.1e-9);
    expect(plain(rounded(1.234e-7, rounding))).toBe('1.234 × 10⁻⁷');
    expect(plain(range(1.1e-7, 1.3e-7, rounding))).toBe('(1.100 to 1.300) × 10⁻⁷');
    expect(plain(rounded(6.02e23, roundingFor(6.02e23, 1.5e21)))).toBe('6.020 × 10²³');
    expect(plain(rounded(3e-300, roundingFor(3e-300, 1e-301)))).toBe('3.00 × 10⁻³⁰⁰');
  });
  it('shows the standard error itself with two significant digits, whatever its size', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-5, max: 1e5, noNaN: true }), (error) => {
        const text = rounded(error, roundingFor(error, error)).replace(/[^0-9.]/g, '');
        // In hundreds and more, the digits behind the second are zeros that only hold the place.
        const digits = text
          .replace('.', '')
          .replace(/^0+/, '')
          .replace(/(?<=^..)0+$/, '');
        expect(digits.length).toBe(2);
        expect(Math.abs(Number(text) - error)).toBeLessThanOrEqual(0.05 * error * (1 + 1e-9));
      }),
    );
  });
  it('keeps estimate and interval at the same number of decimals', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -1e4, max: 1e4, noNaN: true }),
        fc.double({ min: 1e-3, max: 1e3, noNaN: true }),
        (b, se) => {
          const rounding = roundingFor(b, se);
          const [low, high] = range(b - 2 * se, b + 2 * se, rounding).split(' to ') as [string, string];
          const decimals = (text: string): number => text.split('.')[1]?.length ?? 0;
          expect(decimals(low)).toBe(decimals(high));
          expect(decimals(low)).toBe(decimals(rounded(b, rounding)));
        },
      ),
    );
  });
  it('works from an interval where the standard error is not at hand', () => {
    expect(range(1.6, 2.2, roundingOfInterval(1.9, 1.6, 2.2))).toBe('1.60 to 2.20');
    // exp(1 ± 2): by a quarter of the width (4.9) both ends would be whole numbers, the lower one 0.
    expect(range(0.3679, 20.0855, roundingOfInterval(Math.E, 0.3679, 20.0855))).toBe('0.4 to 20.1');
  });
});

describe('p-values', () => {
  it.each([
    [0.0432, '0.043'],
    [0.5, '0.50'],
    [0.9999, '1.0'],
    [1, '1.0'],
    [0.000432, '0.00043'],
    [3.14e-8, '3.1 × 10⁻⁸'],
    [9.99e-5, '1.0 × 10⁻⁴'],
    [1e-300, '1.0 × 10⁻³⁰⁰'],
    [1e-301, 'below 10⁻³⁰⁰'],
    [0, 'below 10⁻³⁰⁰'],
    [null, NONE],
  ])('%s reads %s', (p, text) => {
    expect(plain(pValue(p))).toBe(text);
  });
  it('are never zero and never symbols', () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 1, noNaN: true }), (p) => {
        expect(pValue(p)).toMatch(/[1-9]/);
        expect(pValue(p)).not.toMatch(/[<*]/);
      }),
    );
  });
  it('make a phrase', () => {
    expect(plain(pPhrase(0.043))).toBe('p = 0.043');
    expect(plain(pPhrase(0))).toBe('p below 10⁻³⁰⁰');
  });
});

describe('other numbers', () => {
  it('describes values with few digits and no trailing zeros', () => {
    expect(value(12.3456)).toBe('12.35');
    expect(value(12)).toBe('12');
    expect(value(0.0001234)).toBe('0.0001234');
    expect(value(1234567.8)).toBe(`1${THIN}234${THIN}568`);
    expect(plain(value(1.5e12))).toBe('1.5 × 10¹²');
    expect(plain(value(1e-9))).toBe('1 × 10⁻⁹');
    expect(value(0)).toBe('0');
    expect(value(undefined)).toBe(NONE);
  });
  it('keeps the zeros of statistics', () => {
    expect(significant(2, 3)).toBe('2.00');
    expect(significant(0.06, 2)).toBe('0.060');
    expect(plain(significant(1.2e-7, 2))).toBe('1.2 × 10⁻⁷');
    expect(significant(427.3, 3)).toBe('427');
    expect(significant(null, 3)).toBe(NONE);
  });
  it('knows R², counts and per cent', () => {
    expect(share(0.9317)).toBe('0.932');
    expect(count(1500)).toBe(`1${THIN}500`);
    expect(percent(0.95)).toBe(`95${THIN}%`);
    expect(percent(0.999)).toBe(`99.9${THIN}%`);
    // Nearly all is not all, and nearly none is not none.
    expect(percent(1)).toBe(`100${THIN}%`);
    expect(percent(0)).toBe(`0${THIN}%`);
    expect(percent(0.99981)).toBe(`99.98${THIN}%`);
    expect(percent(0.999999)).toBe(`over 99.99${THIN}%`);
    expect(percent(0.0003)).toBe(`0.03${THIN}%`);
    expect(percent(1e-9)).toBe(`under 0.01${THIN}%`);
    expect(share(0.99981)).toBe('0.9998');
    expect(share(1)).toBe('1.000');
    expect(share(1 - 1e-12)).toBe('1.000000');
  });
  it('puts units behind numbers and the usual currency signs before', () => {
    expect(withUnit('5', 'L')).toBe(`5${NBSP}L`);
    expect(withUnit('−5', '£')).toBe('−£5');
    expect(withUnit('5', '%')).toBe(`5${THIN}%`);
    expect(withUnit('5', null)).toBe('5');
    expect(withUnit(NONE, 'L')).toBe(NONE);
    expect(rangeWithUnit(1, 2, { decimals: 1, exponent: 0 }, '$')).toBe('$1.0 to $2.0');
    expect(rangeWithUnit(null, 2, { decimals: 1, exponent: 0 }, 'L')).toBe(NONE);
  });
  it('writes powers of ten and exponents that rounding raises', () => {
    expect(powerOfTen(-12)).toBe('10⁻¹²');
    expect(decimalExponent(9.99, 2)).toBe(1);
    expect(decimalExponent(0, 2)).toBe(0);
    expect(plain(scientific(-1234, 2))).toBe('−1.2 × 10³');
  });
  it('writes dates', () => {
    expect(plain(longDate('2024-02-27'))).toBe('27 February 2024');
    expect(plain(longDate('2024-02-27T12:40:00Z'))).toBe('27 February 2024 12:40');
    expect(longDate('week 9')).toBe('week 9');
    expect(isoDate(19000)).toBe('2022-01-08');
    expect(isoDate(Number.NaN)).toBe(NONE);
  });
});

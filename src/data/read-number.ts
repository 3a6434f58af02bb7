const POWERS_OF_TEN = Float64Array.from({ length: 23 }, (_, k) => Number(`1e${k}`));

const NUMBER = /^[+-]?(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?$/;

/**
 * A plain decimal ("12", "-3.25", "+.5", "5."), without surrounding spaces or an exponent: exactly the double that
 * `Number` gives; NaN for any other text. `mark` is the character code of the decimal mark.
 *
 * Up to 15 digits are gathered as an integer below 10^15, which is exact, and divided once by an exact power of
 * ten: one correctly rounded operation on exact numbers is correctly rounded (Clinger 1990, the fast path).
 */
export function readPlainNumber(text: string, mark: number): number {
  const length = text.length;
  let i = 0;
  let negative = false;
  if (length > 0) {
    const sign = text.charCodeAt(0);
    if (sign === 45 || sign === 43) {
      negative = sign === 45;
      i = 1;
    }
  }
  let integer = 0;
  let digits = 0;
  let afterMark = -1;
  for (; i < length; i++) {
    const code = text.charCodeAt(i);
    if (code >= 48 && code <= 57) {
      integer = integer * 10 + (code - 48);
      digits++;
    } else if (code === mark && afterMark < 0) {
      afterMark = digits;
    } else {
      return Number.NaN;
    }
  }
  if (digits === 0) return Number.NaN;
  if (digits > 15) return finite(Number(mark === 46 ? text : text.replace(',', '.')));
  const value = afterMark < 0 ? integer : integer / POWERS_OF_TEN[digits - afterMark]!;
  return negative ? -value : value;
}

/**
 * Any number a cell may hold: spaces around it are dropped, an exponent is allowed ("1e3"), a digit is needed on
 * one side of the mark at least. Not numbers (NaN): separators of thousands, hexadecimal, NaN, Infinity, and a
 * value beyond the largest double ("1e400"). A value too small to hold becomes 0, the nearest double.
 */
export function readNumber(text: string, decimalMark: '.' | ','): number {
  const trimmed = text.trim();
  const pointed = decimalMark === '.' ? trimmed : trimmed.includes('.') ? '' : trimmed.replace(',', '.');
  return NUMBER.test(pointed) ? finite(Number(pointed)) : Number.NaN;
}

function finite(value: number): number {
  return Number.isFinite(value) ? value : Number.NaN;
}

/** Whether a text has the form of a number but is too large for a double. */
export function overflows(text: string, decimalMark: '.' | ','): boolean {
  const pointed = decimalMark === '.' ? text : text.replace(',', '.');
  return NUMBER.test(pointed) && !Number.isFinite(Number(pointed));
}

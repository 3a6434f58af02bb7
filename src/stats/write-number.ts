/** Powers of ten that a double holds exactly. */
const POWERS_OF_TEN = Float64Array.from({ length: 23 }, (_, k) => Number(`1e${k}`));

const LEAST = 1e-6;
const MOST = 1e17;

/** Closer than this to where a choice between two digits turns, the choice is left to the language. */
const TOO_CLOSE = 1e-6;

/** 2²⁷ + 1: splits a double into halves whose products are exact (Veltkamp; Dekker 1971). */
const SPLITTER = 134217729;

const bits = new DataView(new ArrayBuffer(8));
const [ZERO, POINT, MINUS] = [48, 46, 45];

/** By four digits as a number: their characters. */
const FOUR_DIGITS = new Uint8Array(40_000);
for (let k = 0; k < 10_000; k++) {
  for (let at = 3, rest = k; at >= 0; at--, rest = Math.floor(rest / 10)) {
    FOUR_DIGITS[4 * k + at] = ZERO + (rest % 10);
  }
}

/** The most bytes that `writeNumber` writes. */
export const LONGEST_NUMBER = 25;

/**
 * Writes a finite number as ASCII into `out` from `at` on, and says where it ends: the very text that the language
 * itself gives it (ECMA-262, Number::toString), which is the shortest that reads back as the same double, and of the
 * shortest the closest; several times as fast where many are written.
 *
 * From 10⁻⁶ to 10¹⁷ the number times an exact power of ten, chosen so that 17 digits stand before the point, is known
 * without error as the sum of two doubles, and so is half the distance to the next double, within which a text reads back
 * as this one. Whatever lies outside, or too close to where a choice turns, is written by the language.
 */
export function writeNumber(value: number, out: Uint8Array, at: number): number {
  const size = Math.abs(value);
  if (!(size >= LEAST && size < MOST)) return writeText(String(value), out, at);
  bits.setFloat64(0, size);
  const high = bits.getUint32(0);
  // Below a power of two the next double is half as far.
  if ((high & 0xfffff) === 0 && bits.getUint32(4) === 0) return writeText(String(value), out, at);

  // Of the decimal exponent and that of two: size is in [2^two, 2^(two + 1)).
  const two = (high >>> 20) - 1023;
  let ten = Math.floor(two * 0.30102999566398114);
  if (size >= (ten + 1 >= 0 ? POWERS_OF_TEN[ten + 1]! : 1 / POWERS_OF_TEN[-ten - 1]!)) ten++;
  const power = POWERS_OF_TEN[16 - ten]!;
  bits.setUint32(0, (two - 53 + 1023) << 20);
  bits.setUint32(4, 0);
  const half = bits.getFloat64(0) * power;

  // size · power = product + error, exactly (Dekker 1971).
  const product = size * power;
  let split = SPLITTER * size;
  const sizeHigh = split - (split - size);
  const sizeLow = size - sizeHigh;
  split = SPLITTER * power;
  const powerHigh = split - (split - power);
  const powerLow = power - powerHigh;
  const error =
    sizeLow * powerLow - (product - sizeHigh * powerHigh - sizeLow * powerHigh - sizeHigh * powerLow);

  // As upper · 10⁸ + lower + fraction: 9 digits, 8 digits, and what is behind the point.
  const whole = Math.floor(error);
  const fraction = error - whole;
  let upper = (product / 1e8) | 0;
  let lower = (product - upper * 1e8 + whole) | 0;
  if (lower < 0) {
    upper--;
    lower += 1e8;
  } else if (lower >= 1e8) {
    upper++;
    lower -= 1e8;
  }
  if (upper < 1e8 || upper >= 1e9) return writeText(String(value), out, at);

  // The fewest digits: a multiple of a hundred, at most one of which is near enough, or of ten, or any.
  const hundredth = lower % 100;
  const tenth = lower % 10;
  const pastHundred = hundredth + fraction;
  const toHundred = pastHundred < 50 ? pastHundred : 100 - pastHundred;
  const pastTen = tenth + fraction;
  const toTen = pastTen < 5 ? pastTen : 10 - pastTen;
  const unclear =
    Math.abs(toHundred - half) < TOO_CLOSE ||
    Math.abs(toTen - half) < TOO_CLOSE ||
    Math.abs(pastTen - 5) < TOO_CLOSE ||
    Math.abs(fraction - 0.5) < TOO_CLOSE;
  if (unclear) return writeText(String(value), out, at);
  if (toHundred < half) lower += (pastHundred < 50 ? 0 : 100) - hundredth;
  else if (toTen < half) lower += (pastTen < 5 ? 0 : 10) - tenth;
  else if (fraction > 0.5) lower++;
  if (lower >= 1e8) {
    upper++;
    lower -= 1e8;
    if (upper >= 1e9) return writeText(String(value), out, at);
  }

  let to = at;
  if (value < 0) out[to++] = MINUS;
  if (ten < 0) {
    out[to++] = ZERO;
    out[to++] = POINT;
    for (let k = ten + 1; k < 0; k++) out[to++] = ZERO;
    writeDigits(upper, lower, out, to);
    return pastZeros(out, to + 17);
  }
  // One place further on, and then those before the point back by one.
  writeDigits(upper, lower, out, to + 1);
  for (let k = 0; k <= ten; k++) out[to + k] = out[to + k + 1]!;
  const point = to + ten + 1;
  out[point] = POINT;
  const end = pastZeros(out, to + 18);
  return end === point + 1 ? point : end;
}

/** 9 digits and 8. */
function writeDigits(upper: number, lower: number, out: Uint8Array, at: number): void {
  const first = (upper / 1e8) | 0;
  const rest = upper - first * 1e8;
  const left = (rest / 1e4) | 0;
  const middle = (lower / 1e4) | 0;
  out[at] = ZERO + first;
  writeFour(left, out, at + 1);
  writeFour(rest - left * 1e4, out, at + 5);
  writeFour(middle, out, at + 9);
  writeFour(lower - middle * 1e4, out, at + 13);
}

function writeFour(number: number, out: Uint8Array, at: number): void {
  const from = 4 * number;
  out[at] = FOUR_DIGITS[from]!;
  out[at + 1] = FOUR_DIGITS[from + 1]!;
  out[at + 2] = FOUR_DIGITS[from + 2]!;
  out[at + 3] = FOUR_DIGITS[from + 3]!;
}

/** Where digits end, the noughts at their end left out. */
function pastZeros(out: Uint8Array, end: number): number {
  let to = end;
  while (out[to - 1] === ZERO) to--;
  return to;
}

function writeText(text: string, out: Uint8Array, at: number): number {
  for (let k = 0; k < text.length; k++) out[at + k] = text.charCodeAt(k);
  return at + text.length;
}

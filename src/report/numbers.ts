import { dressed, MINUS, THIN } from '../numerals.ts';

/**
 * Numbers for people. Nothing here depends on the machine's locale, so that the same record gives the
 * same bytes everywhere. A missing number (null, NaN) reads as an en dash.
 */

export { THIN };

/** No-break space: between a number and its unit. */
export const NBSP = '\u00a0';
export const NONE = '–';

const SUPERSCRIPT = '⁰¹²³⁴⁵⁶⁷⁸⁹';

/** How a family of numbers is rounded: to `decimals` places (negative: tens, hundreds) of x / 10^exponent. */
export interface Rounding {
  readonly decimals: number;
  /** Power of ten taken out and written behind; 0 for none. */
  readonly exponent: number;
}

/** 10ⁿ with the exponent in superscript. */
export function powerOfTen(exponent: number): string {
  const digits = [...String(Math.abs(exponent))].map((d) => SUPERSCRIPT[Number(d)]).join('');
  return `10${exponent < 0 ? '⁻' : ''}${digits}`;
}

/** The decimal exponent of |x| when it is rounded to `digits` significant digits; 0 for 0. */
export function decimalExponent(x: number, digits: number): number {
  if (x === 0 || !Number.isFinite(x)) return 0;
  // Through the text, because Math.log10 is one off at some powers of ten and knows nothing of 9.99 → 10.
  return Number(
    Math.abs(x)
      .toExponential(digits - 1)
      .split('e')[1],
  );
}

/** Rounded to a number of decimals; a negative number of decimals rounds to tens, hundreds … */
export function fixed(x: number | null | undefined, decimals: number): string {
  if (x === null || x === undefined || Number.isNaN(x)) return NONE;
  if (!Number.isFinite(x)) return x > 0 ? '∞' : `${MINUS}∞`;
  if (Math.abs(x) >= 1e21) return scientific(x, 3);
  if (decimals >= 0) return dressed(x.toFixed(Math.min(decimals, 20)));
  const step = 10 ** -decimals;
  return dressed((Math.round(x / step) * step).toFixed(0));
}

/** "1.23 × 10⁻⁷" with so many significant digits. */
export function scientific(x: number, digits: number): string {
  const [mantissa, exponent] = x.toExponential(digits - 1).split('e') as [string, string];
  return `${dressed(mantissa)}${NBSP}×${NBSP}${powerOfTen(Number(exponent))}`;
}

/**
 * The rounding at which `standardError` shows two significant digits; four digits of `estimate` where
 * there is no standard error. Numbers of extreme size have a power of ten taken out.
 */
export function roundingFor(estimate: number, standardError: number | null | undefined): Rounding {
  const usable =
    standardError !== null &&
    standardError !== undefined &&
    Number.isFinite(standardError) &&
    standardError > 0;
  const last = usable ? decimalExponent(standardError, 2) - 1 : decimalExponent(estimate, 4) - 3;
  const first = Math.max(decimalExponent(estimate, 4), last);
  const exponent = last < -6 || first >= 9 ? first : 0;
  return { decimals: exponent - last, exponent };
}

/** The number in its rounding, without the power of ten. */
function mantissa(x: number | null | undefined, rounding: Rounding): string {
  if (x === null || x === undefined) return NONE;
  if (rounding.exponent === 0) return fixed(x, rounding.decimals);
  // Division by 10^n where n is large and negative would overflow in one step.
  const scaled = Number(`${x.toExponential().split('e')[0]}e${exponentOf(x) - rounding.exponent}`);
  return fixed(scaled, rounding.decimals);
}

function exponentOf(x: number): number {
  return Number(x.toExponential().split('e')[1] ?? 0);
}

function behind(rounding: Rounding): string {
  return rounding.exponent === 0 ? '' : `${NBSP}×${NBSP}${powerOfTen(rounding.exponent)}`;
}

/** A number in a rounding. */
export function rounded(x: number | null | undefined, rounding: Rounding): string {
  if (x === null || x === undefined || Number.isNaN(x)) return NONE;
  if (!Number.isFinite(x)) return fixed(x, 0);
  return `${mantissa(x, rounding)}${behind(rounding)}`;
}

/**
 * "1.6 to 2.2"; the power of ten, where there is one, is written once: "(1.6 to 2.2) × 10⁻⁷". Without an upper end
 * "1.6 or more".
 */
export function range(lower: number | null, upper: number | null, rounding: Rounding): string {
  if (lower !== null && upper === null) return `${rounded(lower, rounding)} or more`;
  if (lower === null || upper === null || Number.isNaN(lower) || Number.isNaN(upper)) return NONE;
  const inner = `${mantissa(lower, rounding)} to ${mantissa(upper, rounding)}`;
  return rounding.exponent === 0 ? inner : `(${inner})${behind(rounding)}`;
}

/**
 * The rounding for an interval whose standard error is not at hand: from its half-width at about two errors. Of an
 * interval that another scale has made lopsided the shorter half tells, since the longer would round away its other end.
 */
export function roundingOfInterval(estimate: number, lower: number | null, upper: number | null): Rounding {
  return roundingFor(estimate, lower === null || upper === null ? null : spreadOf(estimate, lower, upper));
}

/** A quarter of the width, of a lopsided interval half of its shorter half. */
export function spreadOf(estimate: number, lower: number, upper: number): number {
  const shorter = 2 * Math.min(estimate - lower, upper - estimate);
  return (shorter > 0 && lopsided(estimate, lower, upper) ? shorter : upper - lower) / 4;
}

/** Whether the halves differ by more than rounding. */
export function lopsided(estimate: number, lower: number, upper: number): boolean {
  return Math.abs(upper - estimate - (estimate - lower)) > 1e-6 * (upper - lower);
}

/** A described value (a range's end, a mean): at most `digits` significant digits, whole numbers in full. */
export function value(x: number | null | undefined, digits = 4): string {
  if (x === null || x === undefined || Number.isNaN(x)) return NONE;
  if (!Number.isFinite(x)) return fixed(x, 0);
  if (x === 0) return '0';
  const size = decimalExponent(x, digits);
  if (size >= 9 || size < -5) return scientific(x, digits).replace(/\.?0+(\u00a0×)/, '$1');
  if (Number.isInteger(x)) return fixed(x, 0);
  const text = fixed(x, Math.max(0, digits - 1 - size));
  return text.includes('.') ? text.replace(/\.?0+$/, '') : text;
}

/** So many significant digits, zeros kept: for statistics. */
export function significant(x: number | null | undefined, digits: number): string {
  if (x === null || x === undefined || !Number.isFinite(x)) return fixed(x, 0);
  const size = decimalExponent(x, digits);
  return size >= 6 || size < -4 ? scientific(x, digits) : fixed(x, digits - 1 - size);
}

/** A count of rows, columns, candidates. */
export function count(n: number): string {
  return fixed(n, 0);
}

/** R² and its kin: three decimals, up to six where it would read as 1 and is not. */
export function share(x: number | null | undefined): string {
  if (x === null || x === undefined || !(x < 1)) return fixed(x, 3);
  let decimals = 3;
  while (decimals < 6 && Number(x.toFixed(decimals)) === 1) decimals++;
  return fixed(x, decimals);
}

/**
 * A proportion as "95 %", with as many decimals as it has, at most one; a second where it would read as none or all
 * and is neither, then "under 0.01 %" and "over 99.99 %".
 */
export function percent(proportion: number): string {
  const hundred = Math.round(proportion * 1000) / 10;
  const misread = (x: number): boolean => (x === 0 || x === 100) && x !== proportion * 100;
  if (!misread(hundred)) return `${fixed(hundred, Number.isInteger(hundred) ? 0 : 1)}${THIN}%`;
  if (!misread(Number((proportion * 100).toFixed(2)))) return `${fixed(proportion * 100, 2)}${THIN}%`;
  return hundred === 0 ? `under 0.01${THIN}%` : `over 99.99${THIN}%`;
}

/** A p-value to two significant digits: "0.043", "3.1 × 10⁻⁸", "below 10⁻³⁰⁰"; never 0. */
export function pValue(p: number | null | undefined): string {
  if (p === null || p === undefined || Number.isNaN(p)) return NONE;
  if (p < 1e-300) return `below ${powerOfTen(-300)}`;
  if (p < 1e-4) return scientific(p, 2);
  return fixed(p, Math.max(1, 1 - decimalExponent(p, 2)));
}

/** "p = 0.043", "p below 10⁻³⁰⁰". */
export function pPhrase(p: number): string {
  return p < 1e-300 ? `p${NBSP}${pValue(p)}` : `p${NBSP}=${NBSP}${pValue(p)}`;
}

/** Puts the unit to a formatted number: behind it, or in front for the usual currency signs. */
export function withUnit(text: string, unit: string | null | undefined): string {
  if (unit === null || unit === undefined || unit === '' || text === NONE) return text;
  if (/^[$£€¥]$/.test(unit)) {
    return text.startsWith(MINUS) ? `${MINUS}${unit}${text.slice(1)}` : `${unit}${text}`;
  }
  return unit === '%' || unit === '°' ? `${text}${unit === '%' ? THIN : ''}${unit}` : `${text}${NBSP}${unit}`;
}

/** "1.6 to 2.2 L"; with a currency sign "$1 600 to $2 200". */
export function rangeWithUnit(
  lower: number | null,
  upper: number | null,
  rounding: Rounding,
  unit: string | null | undefined,
): string {
  if (lower !== null && upper === null) return `${withUnit(rounded(lower, rounding), unit)} or more`;
  if (unit && /^[$£€¥]$/.test(unit) && lower !== null && upper !== null) {
    return `${withUnit(rounded(lower, rounding), unit)} to ${withUnit(rounded(upper, rounding), unit)}`;
  }
  return withUnit(range(lower, upper, rounding), unit);
}

const MONTHS = [
  'January',
  'February',
  'March',
  'April',
  'May',
  'June',
  'July',
  'August',
  'September',
  'October',
  'November',
  'December',
];

/** "3 March 2024" for an ISO date; any time of day is kept behind it; other text comes back as it is. */
export function longDate(iso: string): string {
  const parts = /^(\d{4})-(\d{2})-(\d{2})(?:T(.*))?$/.exec(iso);
  const month = parts && MONTHS[Number(parts[2]) - 1];
  if (!parts || !month) return iso;
  const clock = parts[4]?.replace(/(:00)?(\.0+)?Z?$/, '');
  return `${Number(parts[3])}${NBSP}${month}${NBSP}${parts[1]}${clock && clock !== '00:00' ? ` ${clock}` : ''}`;
}

/** ISO date of a number of days since 1970-01-01. */
export function isoDate(days: number): string {
  if (!(Math.abs(days) < 1e8)) return NONE;
  return new Date(Math.floor(days) * 86_400_000).toISOString().slice(0, 10);
}

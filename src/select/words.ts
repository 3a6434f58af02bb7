import { dressed, wholeNumber } from '../numerals.ts';

/** Numbers and lists inside the sentences of this room. The report has its own, richer forms. */

/** "a", "a and b", "a, b and c". */
export function listed(items: readonly string[], word = 'and'): string {
  return items.length <= 1 ? (items[0] ?? '') : `${items.slice(0, -1).join(', ')} ${word} ${items.at(-1)}`;
}

/** The first `most` items as they are, the rest as a number: "a, b, c and 4 more". */
export function listedUpTo(items: readonly string[], most: number): string {
  if (items.length <= most + 1) return listed(items);
  return listed([...items.slice(0, most), `${items.length - most} more`]);
}

/** A candidate's name inside a sentence; in quotation marks where its own punctuation could be taken for the sentence's. */
export function named(name: string): string {
  return /[.,;:()]/.test(name) ? `“${name}”` : name;
}

/** "1 row", "1 461 rows". */
export function counted(n: number, one: string, many = `${one}s`): string {
  return `${wholeNumber(n)} ${n === 1 ? one : many}`;
}

/** A number to so many significant digits, whole digits never replaced by zeros: "1 234 567", "14.2", "0.00071", "−3.2", "3.1 × 10⁻⁸". */
export function significant(value: number, digits: number): string {
  if (value === 0) return '0';
  const [mantissa, power] = value.toExponential(digits - 1).split('e') as [string, string];
  const exponent = Number(power);
  if (exponent < -4 || exponent > 8) return `${dressed(mantissa)} × 10${raisedDigits(exponent)}`;
  if (exponent >= digits) return dressed(value.toFixed(0));
  return dressed(Number(`${mantissa}e${exponent}`).toFixed(Math.max(0, digits - 1 - exponent)));
}

/** A count in a sentence: whole up to a billion, then as a power of ten. */
export function countText(count: number): string {
  return count < 1e9 ? wholeNumber(count) : significant(count, 2);
}

/** A declared limit as it was written, with a true minus sign. */
export function limitText(limit: number): string {
  return String(limit).replace('-', '−');
}

/**
 * A figure beside the limit that it breaks: three significant digits, or as many more as it takes for the
 * rounded figure to break the limit as well ("10.02, above 10").
 */
export function beside(value: number, limit: number, fewest = 3): string {
  for (let digits = fewest; digits < 17; digits++) {
    const shown = Number(value.toExponential(digits - 1));
    if (shown !== limit && shown > limit === value > limit) return significant(value, digits);
  }
  return significant(value, 17);
}

/** A p-value to two significant digits; one too small to be held is said to be below 10⁻³⁰⁰. */
export function probability(p: number): string {
  return p < 1e-300 ? 'below 10⁻³⁰⁰' : significant(p, 2);
}

/** A p-value beside the limit that it breaks: two significant digits, or as many more as it takes. */
export function probabilityBeside(p: number, limit: number): string {
  return p < 1e-300 ? probability(p) : beside(p, limit, 2);
}

const SUPERSCRIPT = '⁰¹²³⁴⁵⁶⁷⁸⁹';

function raisedDigits(exponent: number): string {
  const digits = [...String(Math.abs(exponent))].map((digit) => SUPERSCRIPT[Number(digit)]).join('');
  return exponent < 0 ? `⁻${digits}` : digits;
}

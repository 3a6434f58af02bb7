/**
 * How a number is written in any sentence of the program, whichever room makes it: thousands apart, a true minus,
 * and never a negative zero. The report's richer forms rest on these.
 */

/** Narrow no-break space: between thousands and before a percent sign. */
export const THIN = '\u202f';
export const MINUS = '−';

/** Puts thin spaces and a true minus into plain decimal notation: "-1461.50" → "−1 461.50"; "-0.00" → "0.00". */
export function dressed(text: string): string {
  const negative = text.startsWith('-');
  const [whole, fraction] = (negative ? text.slice(1) : text).split('.') as [string, string?];
  const grouped = whole.replace(/\B(?=(\d{3})+$)/g, THIN);
  const body = fraction === undefined ? grouped : `${grouped}.${fraction}`;
  // "−0.0" says nothing that "0.0" does not.
  return negative && /[1-9]/.test(body) ? MINUS + body : body;
}

/** A whole number: "1 461". A line of a file is none: it is written as an editor shows it. */
export function wholeNumber(n: number): string {
  return dressed(n.toFixed(0));
}

/** With so many decimals: "−0.14". */
export function decimalNumber(x: number, decimals: number): string {
  return dressed(x.toFixed(decimals));
}

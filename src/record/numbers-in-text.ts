/** Digits with separators of thousands, a decimal part and an exponent, as sentences show them. */
const NUMBER = /([-−]?\d[\d\u202f\u00a0,]*(?:\.\d+)?(?:[eE][-+]?\d+)?)/;
const WHOLE = new RegExp(`^${NUMBER.source}$`);

/** A text cut into words and numbers, in turn. */
export function splitNumbers(text: string): string[] {
  return text.split(NUMBER);
}

/** A number as a sentence shows it, and one step of its last digit; null where the text is none. */
export function parseNumber(text: string): { readonly value: number; readonly step: number } | null {
  if (!WHOLE.test(text)) return null;
  const plain = text.replaceAll('−', '-').replaceAll(/[\u202f\u00a0,]/g, '');
  const [digits = '', exponent = '0'] = plain.split(/[eE]/);
  const decimals = digits.split('.')[1]?.length ?? 0;
  return { value: Number(plain), step: 10 ** (Number(exponent) - decimals) };
}

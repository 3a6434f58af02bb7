/** One column that another depends on. */
export interface DependencyPart {
  readonly name: string;
  readonly isIntercept: boolean;
  readonly coefficient: number;
  /** Length of coefficient · column as a share of the dependent column's length. */
  readonly share: number;
}

/** Parts below this share of the dependent column are rounding. */
const NEGLIGIBLE = 1e-7;

/**
 * "total equals laden + empty in these rows"; "cargo is 3 in every row used"; "b is within 0.002 % of 2 × a − 5".
 * @param share for a near dependency, what is left of the column as a share of its spread
 */
export function dependencySentence(
  name: string,
  parts: readonly DependencyPart[],
  how: 'exact' | 'nearly',
  share: number,
): string {
  const told = parts.filter((part) => part.share > (how === 'exact' ? NEGLIGIBLE : 1e-3));
  if (told.length === 0) return `${name} is 0 in every row used`;
  const [only] = told;
  if (how === 'exact' && told.length === 1 && only!.isIntercept)
    return `${name} is ${plainNumber(only!.coefficient)} in every row used`;
  const signed = told.map((part) => {
    const size = plainNumber(Math.abs(part.coefficient));
    return {
      negative: part.coefficient < 0,
      text: part.isIntercept ? size : size === '1' ? part.name : `${size} × ${part.name}`,
    };
  });
  const sum = [...signed.filter((part) => !part.negative), ...signed.filter((part) => part.negative)]
    .map(({ negative, text }, k) =>
      k === 0 ? (negative ? `−${text}` : text) : `${negative ? '−' : '+'} ${text}`,
    )
    .join(' ');
  return how === 'exact'
    ? `${name} equals ${sum} in these rows`
    : `${name} is nearly ${sum} in these rows (what is left is ${plainNumber(share * 100)} % of its spread)`;
}

/** Up to six significant digits, small fractions as themselves: coefficients come from rounding. */
function plainNumber(value: number): string {
  return String(Number(value.toPrecision(6)));
}

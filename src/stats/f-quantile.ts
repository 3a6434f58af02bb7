import { fUpper } from './distributions.ts';

/**
 * The f > 0 with P(F > f) = p on d1 and d2 degrees of freedom, 0 < p < 1: by halving an interval of its logarithm,
 * which the tail's monotony makes safe, down to the last bits. NaN for arguments out of the domain.
 */
export function fUpperQuantile(p: number, d1: number, d2: number): number {
  if (!(p > 0) || !(p < 1) || !(d1 > 0) || !(d2 > 0)) return Number.NaN;
  let low = -1;
  let high = 1;
  while (fUpper(Math.exp(low), d1, d2) < p && low > -700) low *= 2;
  while (fUpper(Math.exp(high), d1, d2) > p && high < 700) high *= 2;
  for (let step = 0; step < 200; step++) {
    const middle = low / 2 + high / 2;
    if (middle === low || middle === high) break;
    if (fUpper(Math.exp(middle), d1, d2) > p) low = middle;
    else high = middle;
  }
  return Math.exp(low / 2 + high / 2);
}

import type { Fit } from '../engine/fit.ts';
import { type FTest, fTest, testable } from './f-test.ts';

/**
 * Whether the column space of `smaller` lies inside that of `larger` and is smaller, on the same response.
 * Decided on the spans that the factor gave, not on names.
 */
export function isNested(smaller: Fit, larger: Fit): boolean {
  if (smaller.columns.length >= larger.columns.length) return false;
  if (smaller.candidate.responseColumn !== larger.candidate.responseColumn) return false;
  const { own } = smaller;
  const { span } = larger;
  for (let word = 0; word < own.length; word++) if ((own[word]! & ~span[word]!) !== 0) return false;
  return true;
}

/** Partial F of a nested pair: ((RSS_S − RSS_L)/(p_L − p_S))/(RSS_L/(n − p_L)). */
export function partialFTest(smaller: Fit, larger: Fit): FTest {
  const df1 = larger.columns.length - smaller.columns.length;
  const df2 = larger.degreesOfFreedom;
  if (!testable(larger)) return fTest(null, df1, df2);
  // A larger model fits no worse; a negative difference is rounding.
  const gain = Math.max(0, smaller.residualSumOfSquares - larger.residualSumOfSquares);
  return fTest(gain / df1 / (larger.residualSumOfSquares / df2), df1, df2);
}

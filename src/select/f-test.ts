import type { Fit } from '../engine/fit.ts';
import { fUpper } from '../stats/distributions.ts';

/** An F test, spelled as in the record. */
export interface FTest {
  /** Null where it is not defined: an exact fit, or no degrees of freedom. */
  readonly statistic: number | null;
  readonly df1: number;
  readonly df2: number;
  /** P(F > statistic); null with it. */
  readonly p_value: number | null;
}

/** The test for a statistic; one that is null or not finite is not defined. */
export function fTest(statistic: number | null, df1: number, df2: number): FTest {
  const defined = statistic !== null && Number.isFinite(statistic) && df1 > 0 && df2 > 0;
  return {
    statistic: defined ? statistic : null,
    df1,
    df2,
    p_value: defined ? fUpper(statistic, df1, df2) : null,
  };
}

/** Whether the fit leaves an error variance to test against. */
export function testable(fit: Fit): boolean {
  return fit.degreesOfFreedom >= 1 && !fit.exact;
}

/**
 * Overall F = ((TSS − RSS)/(p − 1))/s² on p − 1 and n − p, with p in place of p − 1 without an intercept
 * (common practice, no single source). Null where the model has no column but the intercept.
 */
export function overallF(fit: Fit): FTest | null {
  const df1 = fit.columns.length - (fit.candidate.intercept ? 1 : 0);
  const df2 = fit.degreesOfFreedom;
  if (df1 < 1) return null;
  if (!testable(fit)) return fTest(null, df1, df2);
  const explained = Math.max(0, fit.totalSumOfSquares - fit.residualSumOfSquares);
  return fTest(explained / df1 / (fit.residualSumOfSquares / df2), df1, df2);
}

import type { DesignRows } from '../model/design-rows.ts';
import { wholeNumber } from '../numerals.ts';
import type { Sample } from '../prepare/sample.ts';
import type { Report } from '../problem.ts';
import type { Study } from '../study/study.ts';
import { type Covariance, classicalCovariance, declaredCovariance } from './covariance.ts';
import type { Fit } from './fit.ts';

/** Multiplications (rows × columns², summed over candidates) up to which every candidate gets the declared covariance. */
export const COVARIANCE_BUDGET = 5e8;

/**
 * The declared covariance of every candidate. All but the classical one need a pass over the rows for each, so that
 * beyond a budget there are none (only the chosen model gets its own, later): an error where admission rests on
 * p-values.
 */
export function candidateCovariances(
  study: Study,
  sample: Sample,
  fits: readonly Fit[],
  rows: DesignRows,
  report: Report,
  budget = COVARIANCE_BUDGET,
): (Covariance | null)[] {
  const plan = study.inference.standardErrors;
  if (plan.kind === 'classical') return fits.map(classicalCovariance);
  const cost = fits.reduce((sum, fit) => sum + rows.rowCount * fit.columns.length ** 2, 0);
  if (cost <= budget) return fits.map((fit) => declaredCovariance(plan, fit, rows, sample));
  if (study.selection.admit.pValue !== null) {
    report({
      code: 'standard_errors_costly',
      severity: 'error',
      place: study.placeOf(['selection', 'admit', 'p_value']),
      message: `selection.admit.p_value needs a pass over ${wholeNumber(rows.rowCount)} rows for each of ${wholeNumber(fits.length)} candidates, because inference.standard_errors is not classical: more work than a run is to take.`,
      hint: 'Admit by another rule, declare fewer candidates, or let the standard errors be classical.',
    });
  }
  return fits.map(() => null);
}

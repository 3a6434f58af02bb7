import { wholeNumber } from '../numerals.ts';
import type { Sample } from '../prepare/sample.ts';
import type { Report } from '../problem.ts';
import type { Study } from '../study/study.ts';
import { clustersOf } from './clusters.ts';

/** Whether the rows bear the declared standard errors: two clusters at least, and fewer lags than rows. */
export function checkStandardErrors(study: Study, sample: Sample, report: Report): void {
  const plan = study.inference.standardErrors;
  const path = ['inference', 'standard_errors'];
  if (plan.kind === 'clustered') {
    if (clustersOf(sample.columns.get(plan.by)!).count > 1) return;
    report({
      code: 'clusters_too_few',
      severity: 'error',
      place: study.placeOf([...path, 'clustered_by']),
      message: `${plan.by} has one value in all ${wholeNumber(sample.rowCount)} rows used: with a single cluster nothing can be told of how clusters differ.`,
      hint: 'Name a variable that puts the rows into several clusters, or declare other standard errors.',
    });
  }
  if (plan.kind === 'hac' && plan.lags !== 'auto' && plan.lags >= sample.rowCount) {
    report({
      code: 'lags_too_many',
      severity: 'error',
      place: study.placeOf([...path, 'hac_lags']),
      message: `inference.standard_errors.hac_lags is ${plan.lags}, but there are only ${wholeNumber(sample.rowCount)} rows.`,
      hint: 'Write auto, or a number that is small beside the number of rows.',
    });
  }
}

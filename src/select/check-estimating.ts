import type { Fit } from '../engine/fit.ts';
import type { Report } from '../problem.ts';
import type { Study } from '../study/study.ts';
import { counted, named } from './words.ts';

/** Whether the chosen candidate can be estimated from the rows that the choice was not made on. */
export function checkEstimating(study: Study, fit: Fit, report: Report): void {
  const place = study.placeOf(['selection', 'split_sample']);
  const name = named(fit.candidate.name);
  if (fit.degreesOfFreedom < 1) {
    report({
      code: 'split_too_small',
      severity: 'error',
      place,
      message: `selection.split_sample leaves ${counted(fit.rowCount, 'row')} for estimating ${name}, which has ${counted(fit.candidate.columns.length, 'coefficient')}.`,
      hint: 'Leave a larger share for estimating, or do not split.',
    });
    return;
  }
  for (const { sentence } of fit.dropped) {
    report({
      code: 'columns_dependent',
      severity: 'warning',
      place,
      message: `Of the rows that ${name} is estimated from, ${sentence}, so it is estimated without that column.`,
    });
  }
}

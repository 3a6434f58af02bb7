import { nearest } from '../expression/nearest.ts';
import type { Report } from '../problem.ts';
import type { Study } from '../study/study.ts';
import { DIAGNOSTICS } from './examine.ts';

/** Reports the names under `acceptance.p_value` that no diagnostic has. */
export function checkFindingNames(study: Study, report: Report): void {
  const names = DIAGNOSTICS.map(({ name }) => name);
  for (const plan of study.acceptance) {
    if (plan.criterion !== 'p_value' || names.includes(plan.of)) continue;
    const meant = nearest(plan.of, names);
    report({
      code: 'name_unknown',
      severity: 'error',
      place: study.placeOf(['acceptance', 'p_value', plan.of]),
      message: `acceptance.p_value names "${plan.of}", which is not a question put to the chosen model.`,
      hint: meant === null ? `The names are ${names.join(', ')}.` : `Did you mean ${meant}?`,
    });
  }
}

import { nearest } from '../expression/nearest.ts';
import type { Design } from '../model/design.ts';
import type { Report } from '../problem.ts';
import { listedUpTo } from '../select/words.ts';
import type { Study } from '../study/study.ts';

/** Reports the coefficients named under `inference.hypotheses` that no candidate has or can have. */
export function checkHypotheses(study: Study, design: Design, report: Report): void {
  const used = new Set([
    ...design.candidates.flatMap((candidate) => candidate.columns),
    ...design.families.flatMap(({ plan, terms }) => [
      ...(plan.intercept ? [0] : []),
      ...terms.flatMap(({ columns }) => columns),
    ]),
  ]);
  const known = design.columns.filter((_, column) => used.has(column)).map((column) => column.name);
  const terms = [...design.candidates, ...design.families].flatMap((one) => one.terms);
  for (const { equalities } of study.inference.hypotheses) {
    for (const { combination, path } of equalities) {
      for (const name of combination.keys()) {
        if (known.includes(name)) continue;
        const term = terms.find((each) => each.name === name);
        const meant = term === undefined ? nearest(name, known) : null;
        const among = (term?.columns ?? [...used]).map((column) => `"${design.columns[column]!.name}"`);
        report({
          code: 'hypothesis_name_unknown',
          severity: 'error',
          place: study.placeOf([...path, 'combination', name]),
          message:
            term === undefined
              ? `A hypothesis names "${name}", which is not a coefficient of any candidate.`
              : `A hypothesis names "${name}", a term of ${term.columns.length} columns, not a coefficient.`,
          hint:
            meant !== null
              ? `Did you mean ${meant}?`
              : `The coefficients${term === undefined ? '' : ' of the term'} are ${listedUpTo(among, 8)}.`,
        });
      }
    }
  }
}

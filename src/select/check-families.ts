import { fitCandidate } from '../engine/fit-candidate.ts';
import type { Design, FamilyModel } from '../model/design.ts';
import { wholeNumber } from '../numerals.ts';
import type { Report } from '../problem.ts';
import type { Study } from '../study/study.ts';
import { familyCandidate } from './family-model.ts';
import type { FoundFamilies, FoundFamily, SearchGround } from './search-families.ts';
import { counted, countText } from './words.ts';

/**
 * What the searches say about the families: one that was given up or left sizes aside, one that found nothing, and
 * terms that depend on each other, so that no model has all of them.
 */
export function checkFamilies(
  study: Study,
  design: Design,
  ground: SearchGround,
  found: FoundFamilies,
  report: Report,
): void {
  const isAlone = design.candidates.length + found.candidates.length === 0;
  found.families.forEach((family, index) => {
    const place = study.placeOf(['candidates', family.plan.position]);
    const { name, kind } = family.plan;
    if (kind === 'subsets' && family.exactFor !== 'every size') {
      const subsets = `${countText(family.covered)} subsets of ${name}`;
      report(
        family.exactFor === null
          ? {
              code: 'search_unfinished',
              severity: 'error',
              place,
              message: `The ${subsets} are too many to search in these rows; it was given up after ${wholeNumber(family.visited)} places.`,
              hint: `Lower at_most or keep, or choose from fewer terms.${isRanked(study) ? '' : ' Ranked by aicc, bic or another criterion that follows from the residual sum of squares, a search may leave more aside.'}`,
            }
          : {
              code: 'search_unfinished',
              severity: 'warning',
              place,
              message: `The ${subsets} are too many to find the best of every size; only those that could be chosen were looked for.`,
              hint: 'Lower at_most or keep, or choose from fewer terms, to have the others too.',
            },
      );
    }
    if (family.models.length === 0 && (kind !== 'subsets' || family.exactFor !== null)) {
      report({
        code: 'search_empty',
        severity: isAlone ? 'error' : 'warning',
        place,
        message: `${name} has no model: ${whyEmpty(family, design.families[index]!, ground.factor.rowCount)}.`,
        hint: 'Take terms out, loosen its limits, or wait for more rows.',
      });
    }
    reportDependencies(study, design.families[index]!, ground, report);
  });
}

function isRanked(study: Study): boolean {
  return !['press', 'cross_validation', 'partial_f'].includes(study.selection.rankBy);
}

function whyEmpty({ plan }: FoundFamily, family: FamilyModel, n: number): string {
  const terms = plan.terms.map((_, index) => index);
  const all = familyCandidate(family, terms, plan.name).columns.length;
  switch (plan.kind) {
    case 'backward':
      return `it begins with ${counted(all, 'coefficient')} for ${counted(n, 'row')}, so that nothing can be tested`;
    case 'forward':
      return 'no term enters, and there is no intercept';
    case 'subsets':
      return `none within its limits leaves a degree of freedom in ${counted(n, 'row')}`;
  }
}

/** With fewer rows than columns every column depends on others, which says nothing of the terms. */
function reportDependencies(
  study: Study,
  family: FamilyModel,
  { factor, facts }: SearchGround,
  report: Report,
): void {
  const { plan } = family;
  const terms = plan.terms.map((_, index) => index);
  const whole = fitCandidate(factor, familyCandidate(family, terms, plan.name), facts, 'no condition number');
  if (whole.candidate.columns.length >= factor.rowCount) return;
  const stop = study.inference.dependentColumns === 'stop';
  for (const { column, sentence } of whole.dropped) {
    const index = family.terms.findIndex((term) => term.columns.includes(column));
    report({
      code: 'columns_dependent',
      severity: stop ? 'error' : 'warning',
      place: study.placeOf(plan.terms[index]!.path),
      message: `${sentence}${stop ? '' : `, so no model of ${plan.name} has all of them as columns of their own`}.`,
      hint: stop
        ? 'Take it out, or let the search go on by inference.dependent_columns: drop.'
        : 'Take one of them out.',
    });
  }
}
